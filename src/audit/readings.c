#include "audit/readings.h"

#include <math.h>
#include <string.h>
#include <strings.h>

double rounded_to(double x, int digits)
{
    if (x == 0 || !isfinite(x))
        return x;
    double unit = pow(10, floor(log10(fabs(x))) + 1 - digits);
    return round(x / unit) * unit;
}

static bool is_pressure(const struct site *site)
{
    return site->unit->dimension == GAS_DIM_PRESSURE;
}

static bool is_celsius(const struct gas_unit *unit)
{
    return unit->dimension == GAS_DIM_TEMPERATURE && fabs(unit->offset - 273.15) < 1e-6;
}

static bool is_fahrenheit(const struct gas_unit *unit)
{
    return unit->dimension == GAS_DIM_TEMPERATURE && fabs(unit->offset - 459.67) < 1e-6;
}

/* -- pressures ----------------------------------------------------------------------------------------------------- */

bool read_gauge_as_absolute(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay, (void)parameter;
    if (!is_pressure(site) || reading->unit.basis != GAS_GAUGE)
        return false;
    reading->unit.basis = GAS_ABSOLUTE;
    return true;
}

bool read_absolute_as_gauge(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay, (void)parameter;
    if (!is_pressure(site) || reading->unit.basis != GAS_ABSOLUTE)
        return false;
    reading->unit.basis = GAS_GAUGE;
    return true;
}

bool read_barometer_twice(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay, (void)parameter;
    if (!is_pressure(site) || reading->unit.basis == GAS_ABSOLUTE)
        return false;
    reading->barometer *= 2;
    return true;
}

/* parameter: Pa */
bool read_other_barometer(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay;
    if (!is_pressure(site) || reading->unit.basis == GAS_ABSOLUTE || fabs(reading->barometer / parameter - 1) < 1e-9)
        return false;
    reading->barometer = parameter;
    return true;
}

/* The barometer rounded in the unit of the pressure itself; parameter: digits. */
bool read_barometer_digits(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    double in_unit = reading->barometer / reading->unit.scale;
    double rounded = rounded_to(in_unit, (int)parameter) * reading->unit.scale;
    return read_other_barometer(replay, site, reading, rounded);
}

/* parameter: Pa of one unit */
bool read_pressure_unit(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay;
    if (!is_pressure(site) || fabs(reading->unit.scale / parameter - 1) < 1e-9)
        return false;
    reading->unit.scale = parameter;
    return true;
}

/* -- temperatures -------------------------------------------------------------------------------------------------- */

bool read_degrees_as_absolute(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay, (void)site, (void)parameter;
    if (!is_celsius(&reading->unit) && !is_fahrenheit(&reading->unit))
        return false;
    reading->unit.offset = 0;
    return true;
}

bool read_kelvin_as_degrees(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay, (void)parameter;
    if (site->unit->dimension != GAS_DIM_TEMPERATURE || reading->unit.offset != 0)
        return false;
    reading->unit.offset = reading->unit.scale < 1 ? 459.67 : 273.15;
    return true;
}

/* -12 degC read as 12 degC; a reading above zero stays what it is. */
bool read_lost_sign(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)parameter;
    double figure = replay_figure(replay->desk, replay->truth, (size_t)(site - replay->desk->site));
    if (site->kind == SITE_WANTED || (!is_celsius(&reading->unit) && !is_fahrenheit(&reading->unit)))
        return false;
    reading->shift -= figure < 0 ? 2 * figure * reading->unit.scale : 0;
    return true;
}

bool read_other_zero_c(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay, (void)site;
    if (!is_celsius(&reading->unit))
        return false;
    reading->unit.offset = parameter;
    return true;
}

bool read_other_zero_f(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay, (void)site;
    if (!is_fahrenheit(&reading->unit))
        return false;
    reading->unit.offset = parameter;
    return true;
}

/* A reading in degC taken as degF and the reverse. */
bool read_other_degree_size(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay, (void)site, (void)parameter;
    bool celsius = is_celsius(&reading->unit);
    if (!celsius && !is_fahrenheit(&reading->unit))
        return false;
    reading->unit.offset = celsius ? 459.67 : 273.15;
    reading->unit.scale = celsius ? 1 / 1.8 : 1;
    return true;
}

static bool counts_a_difference(enum gas_symbol wanted)
{
    return wanted == GAS_SYM_DH || wanted == GAS_SYM_DU || wanted == GAS_SYM_Q || wanted == GAS_SYM_W;
}

/* T2 - T1 turned from one scale to another as if it were a temperature: 273.15 K more, or 32 degF less. */
bool read_difference_as_level(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)parameter;
    if (site->symbol != GAS_SYM_T || site->state < 2 || site->kind == SITE_WANTED ||
        !counts_a_difference(replay->desk->job->wanted.heading[0].symbol))
        return false;
    reading->shift += is_fahrenheit(site->unit) ? -32 / 1.8 : 273.15;
    return true;
}

/* -- sizes of units ------------------------------------------------------------------------------------------------ */

/* parameter: so many times too much */
bool read_factor(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay;
    if (site->unit->dimension == GAS_DIM_TEMPERATURE || site->unit->dimension == GAS_DIM_NUMBER ||
        site->unit->dimension == GAS_DIM_PRESSURE)
        return false;
    reading->unit.scale *= parameter;
    return true;
}

bool read_flow_factor(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    return gas_dimension_extent(site->unit->dimension) == GAS_EXTENT_FLOW &&
           read_factor(replay, site, reading, parameter);
}

static bool power_of_ten(double scale)
{
    double power = log10(scale);
    return fabs(power - round(power)) < 1e-12;
}

/* A conversion factor as it is remembered, to so many digits: 6.895 kPa, 0.4536 kg. parameter: digits. */
bool read_rounded_factor(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay;
    if (site->unit->dimension == GAS_DIM_TEMPERATURE || reading->unit.reference_volume ||
        power_of_ten(reading->unit.scale))
        return false;
    double rounded = rounded_to(reading->unit.scale, (int)parameter);
    if (fabs(rounded / reading->unit.scale - 1) < 1e-9)
        return false;
    reading->unit.scale = rounded;
    return true;
}

/* The same the other way round: 14.5 psi to the bar, 2.205 lb to the kg. */
bool read_rounded_inverse(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay;
    if (site->unit->dimension == GAS_DIM_TEMPERATURE || reading->unit.reference_volume ||
        power_of_ten(reading->unit.scale))
        return false;
    double rounded = 1 / rounded_to(1 / reading->unit.scale, (int)parameter);
    if (fabs(rounded / reading->unit.scale - 1) < 1e-9)
        return false;
    reading->unit.scale = rounded;
    return true;
}

/* -- mass and moles ------------------------------------------------------------------------------------------------ */

/* clang-format off */
/* Which way a mass basis lies: +1 where a mass read as moles makes the figure M times as much. */
static int mass_side(enum gas_dimension dimension)
{
    switch (dimension) {
    case GAS_DIM_MASS: case GAS_DIM_MASS_FLOW: return 1;
    case GAS_DIM_SPECIFIC_ENERGY: case GAS_DIM_SPECIFIC_ENTROPY: case GAS_DIM_SPECIFIC_VOLUME: return -1;
    default: return 0;
    }
}
static int mole_side(enum gas_dimension dimension)
{
    switch (dimension) {
    case GAS_DIM_AMOUNT: case GAS_DIM_AMOUNT_FLOW: return -1;
    case GAS_DIM_MOLAR_ENERGY: case GAS_DIM_MOLAR_ENTROPY: case GAS_DIM_MOLAR_VOLUME: return 1;
    default: return 0;
    }
}
/* clang-format on */

static bool by_molar_mass(const struct replay *replay, struct reading *reading, int side)
{
    double M = 1000 * replay->desk->job->gas.molar_mass; /* kg/kmol */
    if (side == 0 || !(M > 0) || reading->unit.reference_volume)
        return false;
    reading->unit.scale *= side > 0 ? M : 1 / M;
    return true;
}

bool read_mass_as_moles(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)parameter;
    return by_molar_mass(replay, reading, mass_side(site->unit->dimension));
}

bool read_moles_as_mass(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)parameter;
    return by_molar_mass(replay, reading, mole_side(site->unit->dimension));
}

/* -- reference volumes --------------------------------------------------------------------------------------------- */

/* clang-format off */
/* What normal and standard have been taken to mean (common practice). A slip names one by its index. */
static const struct {
    double T, P; /* K, Pa */
} reference_conditions[] = {
    {273.15, 101325}, {273.15, 1e5},  {288.15, 101325}, {288.15, 1e5}, {293.15, 101325}, {293.15, 1e5},
    {298.15, 101325}, {298.15, 1e5},
    {288.7055555555556, 101325}, {288.7055555555556, 101559.774928982}, {293.15, 101325.353861092},
    {294.2611111111111, 101325.353861092},
};
/* clang-format on */

bool read_reference(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay, (void)site;
    double T = reference_conditions[(int)parameter].T, P = reference_conditions[(int)parameter].P;
    if (!reading->unit.reference_volume)
        return false;
    double ratio = (P / T) / (reading->unit.reference_P / reading->unit.reference_T);
    if (fabs(ratio - 1) < 1e-5)
        return false;
    reading->unit.scale *= ratio;
    return true;
}

/* The molar volume at the reference conditions to so many digits: 22.4 L/mol, 379.5 ft3/lbmol. parameter: digits. */
bool read_rounded_molar_volume(struct replay *replay, const struct site *site, struct reading *reading,
                               double parameter)
{
    (void)replay, (void)site;
    if (!reading->unit.reference_volume)
        return false;
    bool feet = strcasestr(reading->unit.text, "ft") || strcasestr(reading->unit.text, "scf");
    double unit = feet ? 0.028316846592 / 453.59237 : 1e-3; /* ft3/lbmol, L/mol; exact */
    double v = GAS_R * reading->unit.reference_T / reading->unit.reference_P;
    double rounded = rounded_to(v / unit, (int)parameter) * unit;
    reading->unit.scale *= v / rounded;
    return fabs(v / rounded - 1) > 1e-9;
}

/* -- energies ------------------------------------------------------------------------------------------------------ */

/* International table for thermochemical and the reverse, for calories and Btu alike: 4.1868 against 4.184 J. */
bool read_calorie(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay, (void)site, (void)parameter;
    const char *text = reading->unit.text;
    bool btu = strcasestr(text, "btu") != NULL, calorie = strcasestr(text, "cal") != NULL;
    if (!btu && !calorie)
        return false;
    bool table = strcasestr(text, "(IT)") || (btu && !strcasestr(text, "(th)"));
    reading->unit.scale *= table ? 4.184 / 4.1868 : 4.1868 / 4.184;
    return true;
}

bool read_sign(struct replay *replay, const struct site *site, struct reading *reading, double parameter)
{
    (void)replay, (void)parameter;
    enum gas_symbol symbol = site->symbol;
    if (symbol != GAS_SYM_W && symbol != GAS_SYM_Q && symbol != GAS_SYM_W_NET && symbol != GAS_SYM_DH &&
        symbol != GAS_SYM_DU && symbol != GAS_SYM_DS)
        return false;
    reading->unit.scale = -reading->unit.scale;
    return true;
}
