#include "audit/slips.h"

#include "audit/models.h"
#include "audit/readings.h"

/* clang-format off */
#define READ(id, kind, spread, likelihood, words, given, wanted, read, parameter) \
    {id, SLIP_##kind, SPREAD_##spread, false, likelihood, words, given, wanted, read, NULL, parameter}
#define ROUND_READ(id, kind, likelihood, words, read, parameter) \
    {id, SLIP_##kind, SPREAD_EVERYWHERE, true, likelihood, words, words, words, read, NULL, parameter}
#define MODEL(id, kind, likelihood, words, model, parameter) \
    {id, SLIP_##kind, SPREAD_MODEL, false, likelihood, words, NULL, NULL, NULL, model, parameter}
#define ROUND_MODEL(id, kind, likelihood, words, model, parameter) \
    {id, SLIP_##kind, SPREAD_MODEL, true, likelihood, words, NULL, NULL, NULL, model, parameter}
#define AS_UNIT(id, likelihood, name, pascals) \
    READ(id, UNIT, SITES, likelihood, "every pressure taken as " name, "taken as " name, "answer given in " name, read_pressure_unit, pascals)
#define REFERENCE(id, likelihood, name, index) \
    READ(id, REFERENCE, EVERYWHERE, likelihood, "reference conditions " name, "referred to " name, "answer referred to " name, read_reference, index)
#define SIZE(id, likelihood, name, factor) \
    READ(id, FACTOR, GIVENS, likelihood, name, name, name, read_factor, factor), \
    READ(id " answer", FACTOR, WANTED, likelihood, "answer " name, "answer " name, "answer " name, read_factor, 1. / (factor))

/* THE table of slips. Likelihoods: common practice. */
static const struct slip table[] = {
    /* gauge and absolute */
    READ("gauge as absolute",   BASIS, SITES, 1.00, "gauge pressures taken as absolute", "taken as absolute", "answer left absolute, not turned to gauge", read_gauge_as_absolute, 0),
    READ("absolute as gauge",   BASIS, SITES, 0.50, "absolute pressures taken as gauge", "taken as gauge", "barometer taken off an absolute answer", read_absolute_as_gauge, 0),
    READ("barometer twice",     BASIS, SITES, 0.30, "barometer added twice", "has the barometer added twice", "barometer taken off twice", read_barometer_twice, 0),

    /* another barometer; the site's own rounded barometer is a rounding */
    READ("barometer 1 bar",     BAROMETER, EVERYWHERE, 0.60, "barometer 1 bar", "barometer 1 bar", "barometer 1 bar", read_other_barometer, 1e5),
    READ("barometer 1.01325",   BAROMETER, EVERYWHERE, 0.60, "barometer 1.01325 bar", "barometer 1.01325 bar", "barometer 1.01325 bar", read_other_barometer, 101325),
    READ("barometer 1 kgf/cm2", BAROMETER, EVERYWHERE, 0.20, "barometer 1 kgf/cm2", "barometer 1 kgf/cm2", "barometer 1 kgf/cm2", read_other_barometer, 98066.5),
    ROUND_READ("barometer 14.7 psi",     BAROMETER, 0.60, "barometer 14.7 psi",     read_other_barometer, 14.7 * 6894.757293168361),
    ROUND_READ("barometer 14.696 psi",   BAROMETER, 0.40, "barometer 14.696 psi",   read_other_barometer, 14.696 * 6894.757293168361),
    ROUND_READ("barometer 1.013 bar",    BAROMETER, 0.60, "barometer 1.013 bar",    read_other_barometer, 101300),
    ROUND_READ("barometer 1.01 bar",     BAROMETER, 0.40, "barometer 1.01 bar",     read_other_barometer, 101000),
    ROUND_READ("barometer 1.02 bar",     BAROMETER, 0.05, "barometer 1.02 bar",     read_other_barometer, 102000),
    ROUND_READ("barometer 1.033 kgf/cm2",BAROMETER, 0.30, "barometer 1.033 kgf/cm2",read_other_barometer, 1.033 * 98066.5),
    ROUND_READ("barometer 1.03 kgf/cm2", BAROMETER, 0.20, "barometer 1.03 kgf/cm2", read_other_barometer, 1.03 * 98066.5),
    ROUND_READ("barometer 4 digits",     BAROMETER, 0.30, "barometer rounded to 4 digits", read_barometer_digits, 4),
    ROUND_READ("barometer 3 digits",     BAROMETER, 0.30, "barometer rounded to 3 digits", read_barometer_digits, 3),

    /* temperatures */
    READ("degrees as absolute", TEMPERATURE, SITES, 0.90, "temperatures not made absolute", "not made absolute", "answer left absolute, not turned to degrees", read_degrees_as_absolute, 0),
    READ("kelvin as degrees",   TEMPERATURE, SITES, 0.30, "absolute temperatures made absolute once more", "made absolute once more", "absolute answer turned to degrees", read_kelvin_as_degrees, 0),
    READ("sign lost",           TEMPERATURE, GIVENS, 0.40, "minus signs of temperatures lost", "read without its minus sign", "", read_lost_sign, 0),
    READ("C as F",              TEMPERATURE, SITES, 0.15, "°C and °F mistaken for each other", "read on the other scale (°C, °F)", "answer on the other scale (°C, °F)", read_other_degree_size, 0),
    READ("273 for F",           TEMPERATURE, SITES, 0.15, "273.15 added to °F", "made absolute with 273.15", "made absolute with 273.15", read_other_zero_f, 273.15),
    READ("460 for C",           TEMPERATURE, SITES, 0.10, "459.67 added to °C", "made absolute with 459.67", "made absolute with 459.67", read_other_zero_c, 459.67),
    ROUND_READ("273",           TEMPERATURE, 1.00, "273 for 273.15", read_other_zero_c, 273),
    ROUND_READ("273.2",         TEMPERATURE, 0.20, "273.2 for 273.15", read_other_zero_c, 273.2),
    ROUND_READ("273.16",        TEMPERATURE, 0.20, "273.16 for 273.15", read_other_zero_c, 273.16),
    ROUND_READ("460",           TEMPERATURE, 1.00, "460 for 459.67", read_other_zero_f, 460),
    ROUND_READ("459.7",         TEMPERATURE, 0.30, "459.7 for 459.67", read_other_zero_f, 459.7),
    READ("difference as level", DIFFERENCE, GIVENS, 0.30, "a temperature difference converted as a level", "less T1 converted as a level, not as a difference", "", read_difference_as_level, 0),
    MODEL("difference per F",   DIFFERENCE, 0.20, "a heat capacity per °F used per K", model_factor, 1.8),
    MODEL("difference per K",   DIFFERENCE, 0.20, "a heat capacity per K used per °F", model_factor, 1 / 1.8),

    /* the gas constant, in J/(mol K) as it acts */
    ROUND_MODEL("R 8.314",    R, 1.00, "R = 8.314",              model_R, 8.314),
    ROUND_MODEL("R 8.3145",   R, 0.60, "R = 8.3145",             model_R, 8.3145),
    ROUND_MODEL("R 8.31",     R, 0.50, "R = 8.31",               model_R, 8.31),
    ROUND_MODEL("R 8.3144",   R, 0.20, "R = 8.3144",             model_R, 8.3144),
    ROUND_MODEL("R 8.31451",  R, 0.40, "R = 8.31451 (1986)",     model_R, 8.31451),
    ROUND_MODEL("R 8.314472", R, 0.20, "R = 8.314472 (2002)",    model_R, 8.314472),
    ROUND_MODEL("R 8.31441",  R, 0.10, "R = 8.31441 (1973)",     model_R, 8.31441),
    ROUND_MODEL("R 8.3143",   R, 0.30, "R = 8.3143 (1963)",      model_R, 8.3143),
    ROUND_MODEL("R 8.315",    R, 0.10, "R = 8.315",              model_R, 8.315),
    ROUND_MODEL("R 8.32",     R, 0.05, "R = 8.32",               model_R, 8.32),
    ROUND_MODEL("R 8.3",      R, 0.10, "R = 8.3",                model_R, 8.3),
    ROUND_MODEL("R 0.08206",  R, 0.60, "R = 0.08206 L atm",      model_R, 0.08206 * 101.325),
    ROUND_MODEL("R 0.0821",   R, 0.50, "R = 0.0821 L atm",       model_R, 0.0821 * 101.325),
    ROUND_MODEL("R 0.082",    R, 0.20, "R = 0.082 L atm",        model_R, 0.082 * 101.325),
    ROUND_MODEL("R 1.987",    R, 0.40, "R = 1.987 cal",          model_R, 1.987 * 4.184),
    ROUND_MODEL("R 1.986",    R, 0.20, "R = 1.986 cal",          model_R, 1.986 * 4.184),
    ROUND_MODEL("R 10.73",    R, 0.40, "R = 10.73 psi ft3/lbmol-°R", model_R, 10.73 * 6894.757293168361 * 0.028316846592 * 1.8 / 453.59237),
    ROUND_MODEL("R 1545",     R, 0.30, "R = 1545 ft lbf/lbmol-°R",   model_R, 1545 * 1.3558179483314004 * 1.8 / 453.59237),
    ROUND_MODEL("R 848",      R, 0.15, "R = 848 kgf m/kmol-K",   model_R, 848 * 9.80665 / 1000),
    ROUND_MODEL("R 847.8",    R, 0.05, "R = 847.8 kgf m/kmol-K", model_R, 847.8 * 9.80665 / 1000),
    ROUND_MODEL("R 62.36",    R, 0.10, "R = 62.36 L mmHg",       model_R, 62.36 * 101.325 / 760),
    MODEL("R L atm as bar",   R, 0.40, "R = 0.082057 (L atm) used with bar",  model_R, 8.2057366),
    MODEL("R L bar as atm",   R, 0.30, "R = 0.083145 (L bar) used with atm",  model_R, 0.08314462618 * 101.325),
    MODEL("R cal as J",       R, 0.20, "R = 1.987 (cal) used as J",           model_R, 1.9872),
    MODEL("R J as cal",       R, 0.05, "R = 8.314 (J) used as cal",           model_R, 8.31446261815324 * 4.184),
    MODEL("R kgf as bar",     R, 0.10, "R = 0.08478 (L kgf/cm2) used with bar", model_R, 8.478),
    MODEL("R x 1000",         R, 0.20, "R 1000 times too large (J and kJ)",   model_R, 8314.46261815324),
    MODEL("R / 1000",         R, 0.20, "R 1000 times too small (J and kJ)",   model_R, 8.31446261815324e-3),
    MODEL("R x 10",           R, 0.05, "R = 83.14 used with a unit of bar and L", model_R, 83.1446261815324),
    MODEL("R / 10",           R, 0.05, "R ten times too small",               model_R, 0.831446261815324),
    MODEL("R / 100",          R, 0.10, "R = 0.08314 (L bar) used with kPa and m3", model_R, 0.0831446261815324),
    MODEL("R per R",          R, 0.05, "R per °R used with K",         model_R, 8.31446261815324 / 1.8),
    MODEL("R per K",          R, 0.05, "R per K used with °R",         model_R, 8.31446261815324 * 1.8),

    /* molar mass and basis */
    ROUND_MODEL("M whole",      MOLAR_MASS, 1.00, "molar mass rounded to a whole number", model_molar_mass_digits, 0),
    ROUND_MODEL("M 1 decimal",  MOLAR_MASS, 0.50, "molar mass rounded to one decimal",    model_molar_mass_digits, 1),
    ROUND_MODEL("M 2 decimals", MOLAR_MASS, 0.80, "molar mass rounded to two decimals",   model_molar_mass_digits, 2),
    ROUND_MODEL("M 3 decimals", MOLAR_MASS, 0.30, "molar mass rounded to three decimals", model_molar_mass_digits, 3),
    ROUND_MODEL("R/M 3 digits", MOLAR_MASS, 0.60, "specific gas constant rounded to three digits", model_specific_R_digits, 3),
    ROUND_MODEL("R/M 4 digits", MOLAR_MASS, 0.40, "specific gas constant rounded to four digits",  model_specific_R_digits, 4),
    ROUND_MODEL("M air 28.96",  MOLAR_MASS, 0.40, "M = 28.96 kg/kmol", model_molar_mass, 28.96e-3),
    ROUND_MODEL("M air 28.97",  MOLAR_MASS, 0.50, "M = 28.97 kg/kmol", model_molar_mass, 28.97e-3),
    ROUND_MODEL("M air 28.85",  MOLAR_MASS, 0.20, "M = 28.85 kg/kmol", model_molar_mass, 28.85e-3),
    ROUND_MODEL("M air 28.84",  MOLAR_MASS, 0.20, "M = 28.84 kg/kmol", model_molar_mass, 28.84e-3),
    MODEL("R for R/M",          MOLE, 0.60, "the universal R used for the specific one", model_R_for_specific, 0),
    READ("mass as moles",       MOLE, GIVENS, 0.50, "masses taken as moles", "taken as moles", "", read_mass_as_moles, 0),
    READ("moles as mass",       MOLE, GIVENS, 0.40, "moles taken as mass", "taken as mass", "", read_moles_as_mass, 0),
    READ("answer in moles",     MOLE, WANTED, 0.50, "", "", "answer per mole or in moles where mass is asked", read_mass_as_moles, 0),
    READ("answer in mass",      MOLE, WANTED, 0.40, "", "", "answer per mass or in mass where moles are asked", read_moles_as_mass, 0),
    MODEL("cp molar with mass", MOLE, 0.40, "a figure per kmol used with kg", model_energy_by_molar_mass, 1),
    MODEL("cp mass with moles", MOLE, 0.40, "a figure per kg used with kmol", model_energy_by_molar_mass, -1),

    /* normal and standard */
    REFERENCE("ref 0 C 1 atm",    0.80, "0 °C, 1 atm", 0),
    REFERENCE("ref 0 C 1 bar",    0.50, "0 °C, 1 bar", 1),
    REFERENCE("ref 15 C 1 atm",   0.70, "15 °C, 1 atm", 2),
    REFERENCE("ref 15 C 1 bar",   0.20, "15 °C, 1 bar", 3),
    REFERENCE("ref 20 C 1 atm",   0.60, "20 °C, 1 atm", 4),
    REFERENCE("ref 20 C 1 bar",   0.30, "20 °C, 1 bar", 5),
    REFERENCE("ref 25 C 1 atm",   0.30, "25 °C, 1 atm", 6),
    REFERENCE("ref 25 C 1 bar",   0.30, "25 °C, 1 bar", 7),
    REFERENCE("ref 60 F",         0.60, "60 °F, 14.696 psi", 8),
    REFERENCE("ref 60 F 14.73",   0.40, "60 °F, 14.73 psi", 9),
    REFERENCE("ref 68 F",         0.40, "68 °F, 14.696 psi", 10),
    REFERENCE("ref 70 F",         0.40, "70 °F, 14.696 psi", 11),
    ROUND_READ("molar volume 3",  REFERENCE, 0.80, "molar volume rounded to three digits (22.4 L/mol)", read_rounded_molar_volume, 3),
    ROUND_READ("molar volume 4",  REFERENCE, 0.50, "molar volume rounded to four digits", read_rounded_molar_volume, 4),

    /* heat capacity */
    MODEL("cp at start",   CP, 0.60, "cp taken at the start temperature",   model_cp_at_start, 0),
    MODEL("cp at end",     CP, 0.30, "cp taken at the end temperature",     model_cp_at_end, 0),
    MODEL("cp at 25",      CP, 0.60, "cp taken at 25 °C",          model_cp_at, 298.15),
    MODEL("cp at 0",       CP, 0.15, "cp taken at 0 °C",           model_cp_at, 273.15),
    MODEL("cp at 300 K",   CP, 0.30, "cp taken at 300 K",                   model_cp_at, 300),
    MODEL("k 1.4",         CP, 0.60, "k = 1.4",                             model_cp_of_k, 1.4),
    MODEL("k 1.3",         CP, 0.15, "k = 1.3",                             model_cp_of_k, 1.3),
    MODEL("k 1.67",        CP, 0.15, "k = 1.67",                            model_cp_of_k, 1.67),
    MODEL("cp mean",       CP, 0.20, "cp as the mean of both ends",         model_cp_mean, 0),
    MODEL("cp at mean",    CP, 0.20, "cp at the mean temperature",          model_cp_at_mean, 0),
    MODEL("cp in Celsius", CP, 0.40, "T in °C in the cp formula",  model_cp_celsius, 0),
    MODEL("cp for cv",     FORMULA, 0.50, "cp and cv mistaken for each other", model_cp_for_cv, 0),

    /* energies */
    READ("calorie or Btu", CALORIE, EVERYWHERE, 0.40, "thermochemical and IT calories or Btu exchanged", "thermochemical and IT exchanged", "thermochemical and IT exchanged", read_calorie, 0),
    READ("sign",           SIGN, WANTED, 0.70, "", "", "the other sign convention", read_sign, 0),
    READ("sign of a given",SIGN, GIVENS, 0.40, "", "taken with the other sign", "", read_sign, 0),

    /* the formula of the process */
    MODEL("flow for closed",     FORMULA, 0.60, "shaft work of a flow and boundary work exchanged", model_flow_for_closed, 0),
    MODEL("log10 for ln",        FORMULA, 0.60, "log10 used for ln", model_log10, 0),
    MODEL("ratio inverted",      FORMULA, 0.40, "pressure or volume ratio inverted", model_ratio_inverted, 0),
    MODEL("P exchanged",         FORMULA, 0.30, "P1 and P2 exchanged", model_exchanged, GAS_SYM_P),
    MODEL("T exchanged",         FORMULA, 0.30, "T1 and T2 exchanged", model_exchanged, GAS_SYM_T),
    MODEL("V exchanged",         FORMULA, 0.30, "V1 and V2 exchanged", model_exchanged, GAS_SYM_V),
    MODEL("reversible",          EFFICIENCY, 0.60, "the reversible formula used for an irreversible change", model_reversible, 0),
    MODEL("efficiency turned",   EFFICIENCY, 0.60, "efficiency multiplied where it divides, or the reverse", model_efficiency_turned, 0),
    MODEL("isothermal formula",  FORMULA, 0.20, "the isothermal formula used", model_isothermal, 0),
    MODEL("adiabatic formula",   FORMULA, 0.20, "the adiabatic formula used", model_adiabatic, 0),
    MODEL("exponent n-1",        EXPONENT, 0.40, "exponent n-1 in place of (n-1)/n", model_exponent, EXPONENT_N_1),
    MODEL("exponent (n-1)/n",    EXPONENT, 0.40, "exponent (n-1)/n in place of n-1", model_exponent, EXPONENT_N_1_N),
    MODEL("exponent 1/n",        EXPONENT, 0.15, "exponent 1/n in place of (n-1)/n or n-1", model_exponent, EXPONENT_INVERSE),
    MODEL("exponent n",          EXPONENT, 0.15, "exponent n in place of (n-1)/n or n-1", model_exponent, EXPONENT_N),
    MODEL("exponent 1.4",        EXPONENT, 0.30, "exponent 1.4 in place of n", model_exponent_k, 0),

    /* machines and vessels */
    MODEL("ratio divided",       FORMULA, 0.50, "each stage at r/N in place of the N-th root of r", model_ratio_divided, 0),
    MODEL("single stage",        FORMULA, 0.30, "one stage over the whole ratio", model_single_stage, 0),
    MODEL("no cooling",          FORMULA, 0.30, "no cooling between the stages", model_no_cooling, 0),
    MODEL("stages reversible",   EFFICIENCY, 0.60, "the efficiency left out", model_stages_reversible, 0),
    MODEL("stages efficiency turned", EFFICIENCY, 0.60, "efficiency multiplied where it divides", model_stages_efficiency_turned, 0),
    MODEL("drive turned",        EFFICIENCY, 0.50, "drive efficiency multiplied where it divides", model_drive, 1),
    MODEL("drive left out",      EFFICIENCY, 0.50, "drive efficiency left out", model_drive, 0),
    MODEL("fill at line",        FORMULA, 0.80, "filling temperature taken as the line's", model_fill_at_line, 0),
    MODEL("fill at k line",      FORMULA, 0.40, "T2 = k T line, true of an evacuated vessel alone", model_fill_at_k_line, 0),
    MODEL("wall isothermal",     FORMULA, 0.60, "temperature of the vessel taken as unchanged", model_wall_isothermal, 0),
    MODEL("wall adiabatic",      FORMULA, 0.40, "heat through the vessel's wall left out", model_wall_adiabatic, 0),

    /* units */
    AS_UNIT("as bar",     0.50, "bar",     1e5),
    AS_UNIT("as kPa",     0.50, "kPa",     1e3),
    AS_UNIT("as MPa",     0.20, "MPa",     1e6),
    AS_UNIT("as Pa",      0.50, "Pa",      1),
    AS_UNIT("as mbar",    0.10, "mbar",    100),
    AS_UNIT("as atm",     0.50, "atm",     101325),
    AS_UNIT("as psi",     0.30, "psi",     6894.757293168361),
    AS_UNIT("as kgf/cm2", 0.40, "kgf/cm2", 98066.5),
    AS_UNIT("as mmHg",    0.10, "mmHg",    133.322387415),
    SIZE("1000 too large", 0.50, "1000 times too large", 1000),
    SIZE("1000 too small", 0.50, "1000 times too small", 1e-3),
    SIZE("lb as kg",       0.15, "2.205 times too large (lb as kg)", 1 / 0.45359237),
    SIZE("kg as lb",       0.15, "2.205 times too small (kg as lb)", 0.45359237),
    SIZE("ft3 as m3",      0.10, "35.31 times too large (ft3 as m3)", 1 / 0.028316846592),
    SIZE("m3 as ft3",      0.10, "35.31 times too small (m3 as ft3)", 0.028316846592),
    SIZE("cal as J",       0.20, "4.184 times too large (cal as J)", 4.184),
    SIZE("J as cal",       0.20, "4.184 times too small (J as cal)", 1 / 4.184),
    READ("per h as per s", FACTOR, GIVENS, 0.50, "", "per hour taken as per second", "", read_flow_factor, 3600),
    READ("per s as per h", FACTOR, GIVENS, 0.40, "", "per second taken as per hour", "", read_flow_factor, 1. / 3600),
    READ("per min as per s", FACTOR, GIVENS, 0.25, "", "per minute taken as per second", "", read_flow_factor, 60),
    READ("per s as per min", FACTOR, GIVENS, 0.15, "", "per second taken as per minute", "", read_flow_factor, 1. / 60),
    READ("answer per h",   FACTOR, WANTED, 0.40, "", "", "answer 3600 times too large (per hour, per second)", read_flow_factor, 1. / 3600),
    READ("answer per s",   FACTOR, WANTED, 0.40, "", "", "answer 3600 times too small (per hour, per second)", read_flow_factor, 3600),
    READ("answer per min", FACTOR, WANTED, 0.15, "", "", "answer 60 times too large (per minute, per second)", read_flow_factor, 1. / 60),
    ROUND_READ("factor 4 digits",  FACTOR, 0.50, "a unit's factor rounded to four digits",  read_rounded_factor, 4),
    ROUND_READ("factor 3 digits",  FACTOR, 0.50, "a unit's factor rounded to three digits", read_rounded_factor, 3),
    ROUND_READ("inverse 4 digits", FACTOR, 0.40, "a unit's inverse factor rounded to four digits",  read_rounded_inverse, 4),
    ROUND_READ("inverse 3 digits", FACTOR, 0.40, "a unit's inverse factor rounded to three digits", read_rounded_inverse, 3),
};
/* clang-format on */

const struct slip *slip_table(size_t *count)
{
    *count = sizeof table / sizeof *table;
    return table;
}
