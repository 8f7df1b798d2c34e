/* What stands after '|'. */
#include <math.h>
#include <stdio.h>

#include "gas_cases.h"

#define RU 8.31446261815324 /* J/(mol K), SI 2019, exact */

struct cp_row {
    const char *text;
    double T, cp, tolerance; /* cp J/(mol K) at T, worked out by hand */
    const char *how;
};

/* Molar masses: N2 28.014, air 28.9644 g/mol. cal = 4.184 J, Btu(IT)/(lb degF) = 4186.8 J/(kg K) exactly. */
static const struct cp_row cps[] = {
    {"N2 | cp = 1.04 kJ/kg-K", 500, 1040 * 28.014e-3, 1e-12, "cp M"},
    {"N2|cp=1,04 kJ/kg-K", 500, 1040 * 28.014e-3, 1e-12, "cp M"},
    {"N2 | Cp: 1.04 kJ/(kg·K)", 500, 1040 * 28.014e-3, 1e-12, "cp M"},
    {"N2 | cp = 29.1", 500, 29.1, 1e-15, "bare: J/(mol K)"},
    {"N2 | cp = 29.1 J/mol-K", 500, 29.1, 1e-15, "as written"},
    {"N2 | cp = 6.95 cal/mol-K", 500, 6.95 * 4.184, 1e-15, "cal"},
    {"air | cp = 0.24 Btu/lb-°F", 500, 0.24 * 4186.8 * 28.9644e-3, 1e-12, "Btu"},
    {"air | cp = 0.24 Btu/lb-R", 500, 0.24 * 4186.8 * 28.9644e-3, 1e-12, "Btu"},
    {"N2 | cp = 3.5 R", 500, 3.5 * RU, 1e-15, "R"},
    {"N2 | cp/R = 3.5", 500, 3.5 * RU, 1e-15, "R"},
    {"N2 | cv = 0.743 kJ/kg-K", 500, 743 * 28.014e-3 + RU, 1e-12, "cv M + R"},
    {"air | k = 1.4", 500, 3.5 * RU, 1e-14, "R k/(k - 1)"},
    {"air | gamma = 1,4", 500, 3.5 * RU, 1e-14, "R k/(k - 1)"},
    {"air | κ = 1.4", 500, 3.5 * RU, 1e-14, "R k/(k - 1)"},
    {"air | cp/cv = 1.4", 500, 3.5 * RU, 1e-14, "R k/(k - 1)"},
    {"air | k = 1.4; R = 8.314 J/mol-K", 500, 3.5 * 8.314, 1e-14, "with the R given"},
    {"N2 79 + O2 21 | k = 1.4", 500, 3.5 * RU, 1e-14, "a mixture"},
    {"N2 | cp = 28.58 + 3.77e-3 T - 0.50e5/T^2 J/mol-K, 298 to 2000 K", 1000, 28.58 + 3.77 - 0.05, 1e-14, "by hand"},
    {"N2 | cp = 28,58 + 3,77e-3 T - 0,50e5/T^2 J/mol-K, 298 to 2000 K", 1000, 28.58 + 3.77 - 0.05, 1e-14, "by hand"},
    {"N2 | cp(T) = 28.58 + 3.77 (T/1000) J/mol-K", 1000, 28.58 + 3.77, 1e-14, "by hand"},
    {"N2 | cp/R = 3.280 + 0.593e-3 T + 0.040e5 T^-2", 1000, RU *(3.28 + 0.593 + 0.004), 1e-14, "by hand"},
    {"N2 | cp = 0.029 + 0.2199e-5 T kJ/mol-°C; T in °C", 373.15, 29.0 + 0.2199, 1e-13, "100 degC"},
    {"N2 | cp = 6.9 + 1e-3 T Btu/lbmol-R, T in °R", 500, (6.9 + 0.9) * 4.1868, 1e-14, "900 degR"},
    {"N2 | cp = 6.4 + 1e-3 T Btu/lbmol-°F, T in °F", 310.927777777778, 6.5 * 4.1868, 1e-13, "100 degF"},
    {"N2 | cp = 28.58 + 3.77 T J/mol-K, T in K/1000", 1000, 28.58 + 3.77, 1e-14, "thousands"},
    {"N2 | cp = 28.58 + 3.77e-3 T J/mol-K 298 to 2000 K", 1000, 28.58 + 3.77, 1e-14, "range behind the unit"},
    {"N2 | cp = 28.58 + 3.77e-3 T J/mol-K from 298 to 2000 K", 1000, 28.58 + 3.77, 1e-14, "range behind the unit"},
    {"N2 | cp = 29.1 J/mol-K (300 to 400 K)", 350, 29.1, 1e-15, "range behind the unit"},
};

static void heat_capacities(void)
{
    for (size_t i = 0; i < sizeof cps / sizeof *cps; i++) {
        const struct gas_choice *choice = case_text(cps[i].text);
        if (!choice)
            continue;
        check_close(cps[i].text, gas_cp(&choice->gas, cps[i].T).value, cps[i].cp, cps[i].tolerance, 0);
        check_true("the rule is kept", choice->rule[0] != '\0');
        gas_choice_release(choice);
    }
}

static void at_temperatures(void)
{
    const struct gas_choice *CO2 = case_text("CO2"), *at = case_text("CO2 | cp at 25 °C"),
                            *bare = case_text("CO2|cp at 298.15"), *mean = case_text("CO2 | cp mean"),
                            *at_mean = case_text("CO2 | cp at mean T"),
                            *both = case_text("CO2 | cp = 20 + 0.04 T J/mol-K; cp mean");
    double cp1 = gas_cp(&CO2->gas, 300).value, cp2 = gas_cp(&CO2->gas, 700).value, cpm = gas_cp(&CO2->gas, 500).value;
    check_close("at 25 degC", gas_cp(&at->gas, 1234).value, gas_cp(&CO2->gas, 298.15).value, 1e-14, 0);
    check_close("bare: K", gas_cp(&bare->gas, 1234).value, gas_cp(&CO2->gas, 298.15).value, 1e-14, 0);
    check_true("no range", isinf(gas_range_of(&at->gas).T_to));
    check_close("mean of the ends", gas_dh(&mean->gas, 300, 700).value, 400 * (cp1 + cp2) / 2, 1e-13, 0);
    check_close("at the mean", gas_dh(&at_mean->gas, 300, 700).value, 400 * cpm, 1e-13, 0);
    check_close("both", gas_dh(&both->gas, 300, 700).value, 400 * 40.0, 1e-13, 0);
    const struct gas_choice *all[] = {CO2, at, bare, mean, at_mean, both};
    for (size_t i = 0; i < sizeof all / sizeof all[0]; i++)
        gas_choice_release(all[i]);
}

static void constants(void)
{
    static const struct {
        const char *text;
        double R_universal, M; /* M in kg/mol */
    } rows[] = {
        {"N2 | R = 8.314 J/mol-K", 8.314, 28.014e-3},
        {"N2 | R = 8,314 kJ/(kmol K)", 8.314, 28.014e-3},
        {"N2 | R = 1.987 cal/mol-K", 1.987 * 4.184, 28.014e-3},
        {"air | R = 0.287 kJ/kg-K", RU, RU / 287},
        {"air | R = 287 J/kg-K, M = 28.97 kg/kmol", 287 * 28.97e-3, 28.97e-3},
        {"air | M = 29", RU, 29e-3},
        {"air | MW = 28.97 g/mol | k = 1.4", RU, 28.97e-3},
        {"air | molar mass = 0.02897", RU, 0.02897},
        {"air | R = 8.31 J/mol-K; R = 0.287 kJ/kg-K", 0, 0},
    };
    for (size_t i = 0; i < sizeof rows / sizeof *rows; i++) {
        if (rows[i].M == 0) {
            case_text_refused(rows[i].text, "twice");
            continue;
        }
        const struct gas_choice *choice = case_text(rows[i].text);
        check_close(rows[i].text, choice->gas.R, rows[i].R_universal, 1e-15, 0);
        check_close(rows[i].text, choice->gas.molar_mass, rows[i].M, 1e-12, 0);
        gas_choice_release(choice);
    }
}

static void ranges(void)
{
    static const struct {
        const char *rule;
        double from, to;
    } rows[] = {
        {"298 to 2000 K", 298, 2000},
        {"from 298 K to 2000 K", 298, 2000},
        {"298-2000 K", 298, 2000},
        {"T = 298 … 2000 K", 298, 2000},
        {"298–2000 K", 298, 2000},
        {"25 to 1000 °C", 298.15, 1273.15},
        {"-40 to 100 °C", 233.15, 373.15},
        {"298 to 2000", 298, 2000},
        {"77 °F to 1500 °F", 298.15, 1088.70555555556},
    };
    for (size_t i = 0; i < sizeof rows / sizeof *rows; i++) {
        char text[100];
        snprintf(text, sizeof text, "N2 | cp = 29.1 J/mol-K; %s", rows[i].rule);
        const struct gas_choice *choice = case_text(text);
        check_close(text, choice ? gas_range_of(&choice->gas).T_from : NAN, rows[i].from, 1e-13, 0);
        check_close(text, choice ? gas_range_of(&choice->gas).T_to : NAN, rows[i].to, 1e-13, 0);
        gas_choice_release(choice);
    }
    const struct gas_choice *none = case_text("N2 | cp = 29.1 J/mol-K");
    check_true("without a range", isinf(gas_range_of(&none->gas).T_to));
    gas_choice_release(none);
}

/* cp = 50 - 0.02 T passes R at (50 - R)/0.02 K: a formula without a range ends there. */
static void a_formula_ends_where_it_means_nothing(void)
{
    const struct gas_choice *choice = case_text("N2 | cp = 50 - 0.02 T J/mol-K");
    check_close("end", gas_range_of(&choice->gas).T_to, (50 - RU) / 0.02, 1e-8, 0);
    check_int("beyond", gas_cp(&choice->gas, 2100).status, GAS_OUTSIDE_DATA);
    gas_choice_release(choice);
}

static const struct {
    const char *text, *part;
} refused[] = {
    {"N2 |", "nothing stands after"},
    {"N2 | ;", "nothing stands after"},
    {"N2 | cq = 3", "is not known; write one such as"},
    {"N2 | cp", "ends where"},
    {"N2 | cp = 1.04", "without a unit would be J/(mol K)"},
    {"N2 | cp = 1.04 J/kg-K", "must be above R"},
    {"N2 | cp = -29 J/mol-K", "must be above R"},
    {"N2 | cp = 1.04 kJ", "not a unit of a heat capacity"},
    {"N2 | cp = 1.04 kJ/kg", "unit of an energy"},
    {"N2 | cp = 1.04 foo/kg-K", "is not a unit known"},
    {"N2 | cp = 29 J/mol-K; k = 1.4", "two ways"},
    {"N2 | cp = 29 J/mol-K; cp = 30 J/mol-K", "two ways"},
    {"N2 | cp mean; cp at 25 °C", "two temperatures"},
    {"N2 | k = 0.9", "above 1"},
    {"N2 | k = 1", "above 1"},
    {"N2 | k = 14", "above 1"},
    {"N2 | k = 1.4 kJ", "no unit"},
    {"N2 | k = abc", "not a number"},
    {"N2 | cp at -300 °C", "absolute zero"},
    {"N2 | cp at 25", "outside the data for nitrogen"},
    {"N2 | cp at 25", "If 25 °C was meant"},
    {"N2 | cp at 25 kg", "not a temperature"},
    {"N2 | cp = 29 + 1e-3 T kJ/mol-°C", "not certain what T is"},
    {"N2 | cp = 29 + 1e-3 T J/mol-C", "not certain what T is"},
    {"N2 | cp = 7 + 1e-3 T Btu/lbmol-F", "not certain what T is"},
    {"N2 | cp = 7 + 1e-3 T Btu/(lbmol degR)", "not certain what T is"},
    {"N2 | cp = 29 kJ/mol-K", "far more than any gas"},
    {"N2 | cp = 29 + 1e3/T^2 J/mol-K; T in °C", "only a polynomial"},
    {"N2 | cp = 29 J/mol-K, 2000 to 298 K", "lower temperature first"},
    {"N2 | cp = 29 J/mol-K, 298 to K", "not a temperature"},
    {"N2 | cp = 29 J/mol-K, -500 to 298 °C", "absolute zero"},
    {"N2 | cp = 29 J/mol-K, 298 to 300 K, 1 to 2 K", "two ranges"},
    {"N2 | cp = 50 - 0.02 T J/mol-K, 300 to 3000 K", "must be above R"},
    {"N2 | 298 to 2000 K", "has its own"},
    {"N2 | T in °C", "there is none"},
    {"N2 | R = 83.14 J/mol-K", "1 % away"},
    {"N2 | R = 0.287", "1 % away"},
    {"N2 | R = 8.314 kg", "not a gas constant"},
    {"N2 | R = 0.287 kJ/kg-K; M = 40 g/mol", "together give"},
    {"N2 | M = 28 kg/mol", "no molar mass of a gas"},
    {"N2 | M = 28 J", "not a molar mass"},
    {"N2 | cp = 28 + exp(T) J/mol-K", "no functions"},
    {"N2 | cp/R = 3.5 J/mol-K", "leave the unit out"},
    {"nitrogn | k = 1.4", "nearest"},
};

static void wrong_rules_are_refused(void)
{
    for (size_t i = 0; i < sizeof refused / sizeof *refused; i++)
        case_text_refused(refused[i].text, refused[i].part);
}

/* Felder & Rousseau, Elementary Principles of Chemical Processes, 3rd ed. (2000), constants of Table B.2, kJ/(mol degC)
 * with T in degC. The answers are from memory; each was compared with the integral worked out by hand. */
static void printed_examples_with_cubic_cp(void)
{
    /* Ex. 8.3-2: N2, 20 to 100 degC: 2.332 kJ/mol; 100 mol/min: 233 kJ/min */
    const struct gas_choice *N2 =
        case_text("N2 | cp = 0.02900 + 0.2199e-5 T + 0.5723e-8 T^2 - 2.871e-12 T^3 kJ/mol-°C, T in °C");
    double dh = gas_dh(&N2->gas, 293.15, 373.15).value / 1e3;
    check_close("8.3-2", dh, 2.332, 0, 0.0005);
    check_close("8.3-2 duty", 100 * dh, 233, 0, 0.5);
    /* Ex. 8.3-4: 60 % C2H6 + 40 % C3H8, 0 to 400 degC: 34.89 kJ/mol; 150 mol/h: 5230 kJ/h */
    const struct gas_choice *mix =
        case_text("C2H6 60 + C3H8 40 | cp = 0.6 (0.04937 + 13.92e-5 T - 5.816e-8 T^2 + 7.280e-12 T^3) "
                  "+ 0.4 (0.068032 + 22.59e-5 T - 13.11e-8 T^2 + 31.71e-12 T^3) kJ/mol-°C, T in °C, 0 to 1200 °C");
    dh = gas_dh(&mix->gas, 273.15, 673.15).value / 1e3;
    check_close("8.3-4", dh, 34.89, 0, 0.005);
    check_close("8.3-4 duty", 150 * dh, 5230, 0, 5);
    gas_choice_release(N2);
    gas_choice_release(mix);
}

/* Cengel & Boles, Thermodynamics, Ex. 4-9 (from memory): cp = 1.039 and R = 0.297 kJ/(kg K) replay the book's mass. */
static void printed_example_with_specific_R(void)
{
    const struct gas_choice *N2 = case_text("N2 | cp = 1.039 kJ/kg-K; R = 0.297 kJ/kg-K");
    /* m = P V/(R T) = 400 kPa 0.5 m3/(0.297 300) = 2.245 kg; T2 = 300 K + (72 - 2.8)/(2.245 1.039) K = 56.7 degC */
    double m = 400e3 * 0.5 / (N2->gas.R / N2->gas.molar_mass * 300);
    check_close("m", m, 2.245, 0, 0.0005);
    double T2 = gas_T_after_dh(&N2->gas, 300, (72000 - 2800) / m * N2->gas.molar_mass).value;
    check_close("T2", T2 - 273, 56.7, 0, 0.05);
    gas_choice_release(N2);
}

const struct test_suite suite_rule = {"rule",
                                      (const struct test_case[]){{"heat capacities", heat_capacities},
                                                                 {"at temperatures", at_temperatures},
                                                                 {"constants", constants},
                                                                 {"ranges", ranges},
                                                                 {"end", a_formula_ends_where_it_means_nothing},
                                                                 {"wrong rules", wrong_rules_are_refused},
                                                                 {"cubic cp", printed_examples_with_cubic_cp},
                                                                 {"specific R", printed_example_with_specific_R},
                                                                 {0}}};
