/*
 * old_sheet.h - a sheet of the old kind, as plain arithmetic: the sums that the audit is tried on, right or with slips.
 *
 * Nothing of the audit is used here: a slip is a changed member, and each sum is written out. Formulas: P V = n R T;
 * W = n R T ln(P2/P1) isothermal, n R T/(x-1) ((P2/P1)^((x-1)/x) - 1) polytropic, times x in flow (Moran & Shapiro,
 * Fundamentals of Engineering Thermodynamics, ch. 2, 3, 6).
 */
#ifndef TESTS_OLD_SHEET_H
#define TESTS_OLD_SHEET_H

#include <math.h>
#include <stdbool.h>
#include <stdio.h>
#include <string.h>

#include "check.h"

enum sheet_sum {
    SUM_MASS,       /* P, T, V -> m or n */
    SUM_RIGID,      /* P1, T1, T2 -> P2 at constant volume */
    SUM_NORMAL,     /* flow at P, T -> Nm3/h */
    SUM_NORMAL_IN,  /* Nm3/h -> kg/h */
    SUM_ISOTHERMAL, /* m, T, P1 to P2 -> W */
    SUM_POLYTROPIC, /* m, T1, P1 to P2 with exponent -> W, closed or flow */
    SUM_COMPRESSOR, /* m, T1, P1 to P2, k, efficiency -> power in flow */
    SUM_DUTY,       /* m, T1, T2 -> dH with a formula for cp */
    SUMS
};

/* How the heat capacity of SUM_DUTY is taken. */
enum sheet_cp { CP_FORMULA, CP_START, CP_END, CP_25, CP_MEAN, CP_AT_MEAN, CP_K14, CP_CELSIUS };

struct sheet_unit {
    const char *text;
    double scale; /* SI of one unit */
    bool gauge;
};

struct sheet {
    enum sheet_sum sum;
    bool flow;
    const char *gas;
    char gas_text[120], given[200], wanted[60], legs[80], options[40];
    double M, P1, P2, T1, T2, V, m, x, efficiency; /* M in kg/kmol, the rest in the units below */
    struct sheet_unit P_unit, T_unit, V_unit, m_unit, answer_unit;
    /* what may go wrong */
    double R, molar_mass, T_zero, barometer, P_scale, answer_scale, factor, ref_T, ref_P, shift;
    bool T1_bare, T2_bare, P1_bare, P2_bare, answer_bare, twice, absolute_plus;
    bool log10, inverted, other_system, reversible, turned, isothermal, exponent;
    enum sheet_cp cp;
};

static const double SHEET_R = 8.31446261815324; /* BIPM SI Brochure, 9th ed. */
static const double SHEET_PSI = 6894.757293168361, SHEET_LB = 0.45359237, SHEET_FT3 = 0.028316846592; /* NIST SP 811 */
static const double SHEET_A = 28.58, SHEET_B = 3.77e-3, SHEET_D = -0.50e5; /* cp, J/(mol K): the form is the trade's */

/* -- right cases --------------------------------------------------------------------------------------------------- */

static double sheet_pick(double low, double high, int digits)
{
    double x = check_random(low, high), unit = pow(10, floor(log10(fabs(x))) + 1 - digits);
    return round(x / unit) * unit;
}

static size_t sheet_choose(size_t count)
{
    return (size_t)check_random(0, (double)count);
}

/* clang-format off */
static const struct { const char *name; double M; } sheet_gases[] = { /* IUPAC 2021, abridged atomic weights */
    {"N2", 28.014}, {"O2", 31.998}, {"CO2", 44.009}, {"CH4", 16.043}, {"H2", 2.016}, {"C3H8", 44.097}, {"NH3", 17.031}};
static const struct sheet_unit sheet_pressures[] = {
    {"bar(g)", 1e5, true}, {"bar", 1e5, false}, {"kPa(g)", 1e3, true}, {"psig", 6894.757293168361, true},
    {"bar(g)", 1e5, true}, {"psia", 6894.757293168361, false}, {"kgf/cm2(g)", 98066.5, true}, {"MPa", 1e6, false}};
static const struct sheet_unit sheet_temperatures[] = {{"°C", 1, false}, {"°C", 1, false}, {"°F", 1 / 1.8, false}};
static const struct sheet_unit sheet_volumes[] = {{"m3", 1, false}, {"L", 1e-3, false}, {"ft3", 0.028316846592, false}};
static const struct sheet_unit sheet_masses[] = {{"kg", 1, false}, {"lb", 0.45359237, false}};
static const struct sheet_unit sheet_energies[] = {{"kJ", 1e3, false}, {"kcal", 4184, false}, {"Btu", 1055.05585262, false}};
/* clang-format on */
#define SHEET_PICK(table) table[sheet_choose(sizeof(table) / sizeof(table)[0])]

static double sheet_temperature(const struct sheet *s, double low, double high)
{
    double celsius = check_random(low, high);
    return round(s->T_unit.scale < 1 ? 1.8 * celsius + 32 : celsius);
}

static void sheet_state_texts(struct sheet *s)
{
    const char *P = s->P_unit.text, *T = s->T_unit.text;
    char *given = s->given;
    snprintf(s->wanted, sizeof s->wanted, "%s", s->answer_unit.text);
    if (s->sum == SUM_NORMAL_IN) {
        snprintf(given, sizeof s->given, "V = %.10g Nm3/h", s->V);
        snprintf(s->wanted, sizeof s->wanted, "m, kg/h");
    } else if (s->sum == SUM_RIGID) {
        snprintf(given, sizeof s->given, "V = 3 m3; P1 = %.10g %s; T1 = %.10g %s; T2 = %.10g %s", s->P1, P, s->T1, T,
                 s->T2, T);
        snprintf(s->wanted, sizeof s->wanted, "P2, %s", P);
    } else if (s->sum == SUM_DUTY) {
        snprintf(s->gas_text, sizeof s->gas_text, "%s | cp = 28.58 + 3.77e-3 T - 0.50e5/T^2 J/mol-K, 250 to 3000 K",
                 s->gas);
        snprintf(given, sizeof s->given, "m = %.10g %s; T1 = %.10g %s; T2 = %.10g %s", s->m, s->m_unit.text, s->T1, T,
                 s->T2, T);
        snprintf(s->wanted, sizeof s->wanted, "dH, %s", s->answer_unit.text);
    } else
        snprintf(given, sizeof s->given, "P = %.10g %s; T = %.10g %s; V = %.10g %s", s->P1, P, s->T1, T, s->V,
                 s->V_unit.text);
}

static void sheet_path_texts(struct sheet *s)
{
    const char *P = s->P_unit.text;
    snprintf(s->given, sizeof s->given, "m = %.10g %s%s; P1 = %.10g %s; T1 = %.10g %s; P2 = %.10g %s", s->m,
             s->m_unit.text, s->flow ? "/s" : "", s->P1, P, s->T1, s->T_unit.text, s->P2, P);
    snprintf(s->wanted, sizeof s->wanted, "W, %s", s->answer_unit.text);
    snprintf(s->options, sizeof s->options, "%s", s->flow ? "flow" : "closed");
    if (s->sum == SUM_ISOTHERMAL)
        snprintf(s->legs, sizeof s->legs, "isothermal to P2");
    else if (s->sum == SUM_POLYTROPIC)
        snprintf(s->legs, sizeof s->legs, "polytropic n=%.10g to P2", s->x);
    else {
        snprintf(s->gas_text, sizeof s->gas_text, "%s | k = %.10g", s->gas, s->x);
        snprintf(s->legs, sizeof s->legs, "adiabatic %.10g %% to P2", 100 * s->efficiency);
    }
}

static bool sheet_is_path(const struct sheet *s)
{
    return s->sum == SUM_ISOTHERMAL || s->sum == SUM_POLYTROPIC || s->sum == SUM_COMPRESSOR;
}

static void sheet_figures(struct sheet *s)
{
    s->P1 = sheet_pick(1.2e5 / s->P_unit.scale, 40e5 / s->P_unit.scale, 3);
    s->P2 = sheet_pick(s->P1 * 2, s->P1 * 6, 3);
    s->T1 = sheet_temperature(s, 5, 90);
    s->T2 = sheet_temperature(s, 110, 600);
    s->V = sheet_pick(0.3, 40, 3) / s->V_unit.scale;
    s->V = sheet_pick(s->V * 0.999, s->V * 1.001, 3);
    s->m = sheet_pick(0.5, 50, 3);
    s->x = sheet_pick(1.12, 1.38, 3);
    s->efficiency = sheet_pick(0.65, 0.88, 2);
    if (s->sum == SUM_NORMAL || s->sum == SUM_NORMAL_IN)
        s->V = sheet_pick(5, 900, 3);
}

/* A realistic case, right in every respect. */
static void sheet_random(struct sheet *s, enum sheet_sum sum)
{
    memset(s, 0, sizeof *s);
    size_t gas = sheet_choose(sizeof sheet_gases / sizeof *sheet_gases);
    s->sum = sum;
    s->gas = sheet_gases[gas].name;
    snprintf(s->gas_text, sizeof s->gas_text, "%s", s->gas);
    s->M = s->molar_mass = sheet_gases[gas].M;
    s->P_unit = SHEET_PICK(sheet_pressures);
    s->T_unit = SHEET_PICK(sheet_temperatures);
    s->V_unit = SHEET_PICK(sheet_volumes);
    s->m_unit = SHEET_PICK(sheet_masses);
    s->answer_unit = SHEET_PICK(sheet_energies);
    s->flow = sum == SUM_COMPRESSOR || ((sum == SUM_ISOTHERMAL || sum == SUM_POLYTROPIC) && sheet_choose(3) == 0);
    if (s->flow)
        s->answer_unit = (struct sheet_unit){"kW", 1e3, false};
    if (sum == SUM_MASS)
        s->answer_unit =
            sheet_choose(3) ? (struct sheet_unit){"m, kg", 1, false} : (struct sheet_unit){"n, kmol", 1e3, false};
    if (sum == SUM_NORMAL) {
        s->V_unit = (struct sheet_unit){"m3/h", 1 / 3600., false};
        s->answer_unit = (struct sheet_unit){"Nm3/h", 1, false};
    }
    s->R = SHEET_R;
    s->T_zero = s->T_unit.scale < 1 ? 459.67 : 273.15;
    s->barometer = s->ref_P = 101325;
    s->ref_T = 273.15;
    s->P_scale = s->P_unit.scale;
    s->answer_scale = s->answer_unit.scale;
    s->factor = 1;
    sheet_figures(s);
    if (sheet_is_path(s))
        sheet_path_texts(s);
    else
        sheet_state_texts(s);
}

/* -- the sums ------------------------------------------------------------------------------------------------------ */

static double sheet_kelvin(const struct sheet *s, double T, bool bare)
{
    return s->T_unit.scale * (T + (bare ? 0 : s->T_zero));
}

static double sheet_added(const struct sheet *s, bool bare)
{
    double times = s->P_unit.gauge ? (bare ? 0 : s->twice ? 2 : 1) : s->absolute_plus ? 1 : 0;
    return times * s->barometer;
}

static double sheet_cp(double T)
{
    return SHEET_A + SHEET_B * T + SHEET_D / (T * T);
}

static double sheet_dh(const struct sheet *s)
{
    double T1 = sheet_kelvin(s, s->T1, false), T2 = sheet_kelvin(s, s->T2, false), rise = T2 - T1 + s->shift;
    double held[] = {[CP_START] = sheet_cp(T1),
                     [CP_END] = sheet_cp(T2),
                     [CP_25] = sheet_cp(298.15),
                     [CP_MEAN] = (sheet_cp(T1) + sheet_cp(T2)) / 2,
                     [CP_AT_MEAN] = sheet_cp((T1 + T2) / 2),
                     [CP_K14] = 3.5 * s->R};
    double from = T1, to = T1 + rise;
    if (s->cp != CP_FORMULA && s->cp != CP_CELSIUS)
        return held[s->cp] * rise;
    if (s->cp == CP_CELSIUS) {
        from -= 273.15;
        to -= 273.15;
    }
    return SHEET_A * (to - from) + SHEET_B / 2 * (to * to - from * from) - SHEET_D * (1 / to - 1 / from);
}

static double sheet_work(const struct sheet *s, double P1, double P2, double T)
{
    double ratio = s->inverted ? P1 / P2 : P2 / P1, x = s->x;
    if (s->sum == SUM_ISOTHERMAL || s->isothermal)
        return s->R * T * (s->log10 ? log10(ratio) : log(ratio));
    double reversible = s->R * T / (x - 1) * (pow(ratio, s->exponent ? x - 1 : (x - 1) / x) - 1);
    if (s->flow != s->other_system)
        reversible *= x;
    if (s->sum == SUM_POLYTROPIC || s->reversible)
        return reversible;
    return s->turned ? reversible * s->efficiency : reversible / s->efficiency;
}

/* The sum as this sheet does it, in the unit of its answer; NAN when it cannot be. */
static double sheet_value(const struct sheet *s)
{
    double P1 = s->P1 * s->P_scale + sheet_added(s, s->P1_bare), P2 = s->P2 * s->P_scale + sheet_added(s, s->P2_bare);
    double T1 = sheet_kelvin(s, s->T1, s->T1_bare), T2 = sheet_kelvin(s, s->T2, s->T2_bare);
    double V = s->V * s->V_unit.scale, moles = s->m * s->m_unit.scale / s->molar_mass * 1000;
    bool mass = strstr(s->answer_unit.text, "kg") != NULL;
    switch (s->sum) {
    case SUM_MASS:
        return s->factor * P1 * V / (s->R * T1) * (mass ? s->molar_mass / 1000 : 1) / s->answer_scale;
    case SUM_NORMAL:
        return s->factor * P1 * V / T1 * s->ref_T / s->ref_P * 3600;
    case SUM_NORMAL_IN:
        return s->factor * s->V * s->ref_P / (s->R * s->ref_T) * s->molar_mass / 1000;
    case SUM_RIGID:
        return (P1 * T2 / T1 - sheet_added(s, s->answer_bare)) / s->P_scale;
    case SUM_DUTY:
        return s->factor * moles * sheet_dh(s) / s->answer_scale;
    default:
        return s->factor * moles * sheet_work(s, P1, P2, T1) / s->answer_scale;
    }
}

/* -- slips --------------------------------------------------------------------------------------------------------- */

static bool has_P(const struct sheet *s)
{
    return s->sum != SUM_NORMAL_IN && s->sum != SUM_DUTY;
}
static bool has_gauge(const struct sheet *s)
{
    return has_P(s) && s->P_unit.gauge;
}
static bool has_P_unit(const struct sheet *s, const char *unit)
{
    return has_P(s) && s->sum != SUM_RIGID && strncmp(s->P_unit.text, unit, strlen(unit)) == 0;
}
static bool has_R(const struct sheet *s)
{
    return s->sum != SUM_RIGID && s->sum != SUM_NORMAL && s->sum != SUM_DUTY;
}
static bool has_M(const struct sheet *s)
{
    return s->sum != SUM_RIGID && s->sum != SUM_NORMAL && (s->sum != SUM_MASS || strstr(s->answer_unit.text, "kg"));
}
static bool has_degrees(const struct sheet *s, double scale)
{
    return s->sum != SUM_NORMAL_IN && s->sum != SUM_DUTY && s->T_unit.scale == scale;
}

/* One function per slip: when it applies, and what it changes. */
/* clang-format off */
#define SLIP(name, when, ...) static bool name(struct sheet *s) { __VA_ARGS__; return when; }
SLIP(slip_gauge_all,     has_gauge(s), s->P1_bare = s->P2_bare = s->answer_bare = true)
SLIP(slip_gauge_first,   has_gauge(s), s->P1_bare = true)
SLIP(slip_gauge_second,  has_gauge(s) && sheet_is_path(s), s->P2_bare = true)
SLIP(slip_absolute,      has_P(s) && !s->P_unit.gauge, s->absolute_plus = true)
SLIP(slip_twice,         has_gauge(s), s->twice = true)
SLIP(slip_bar,           has_gauge(s), s->barometer = 1e5)
SLIP(slip_147,           has_gauge(s), s->barometer = 14.7 * SHEET_PSI)
SLIP(slip_1013,          has_gauge(s), s->barometer = 101300)
SLIP(slip_degrees,       has_degrees(s, s->T_unit.scale), s->T1_bare = s->T2_bare = true)
SLIP(slip_degrees_first, has_degrees(s, s->T_unit.scale), s->T1_bare = true)
SLIP(slip_273,           has_degrees(s, 1), s->T_zero = 273)
SLIP(slip_460,           has_degrees(s, 1 / 1.8), s->T_zero = 460)
SLIP(slip_R_8314,        has_R(s), s->R = 8.314)
SLIP(slip_R_831,         has_R(s), s->R = 8.31)
SLIP(slip_R_00821,       has_R(s), s->R = 0.0821 * 101.325)
SLIP(slip_R_atm,         has_R(s), s->R = 0.082057366 * 100) /* L atm/(mol K) with bar and L */
SLIP(slip_R_thousand,    has_R(s), s->R = 1000 * SHEET_R)
SLIP(slip_M_whole,       has_M(s), s->molar_mass = round(s->M))
SLIP(slip_M_decimal,     has_M(s), s->molar_mass = round(10 * s->M) / 10)
SLIP(slip_mass,          has_M(s), s->molar_mass = 1)
SLIP(slip_moles,         s->sum == SUM_MASS && !has_M(s), s->factor = s->M)
SLIP(slip_15,            s->sum == SUM_NORMAL || s->sum == SUM_NORMAL_IN, s->ref_T = 288.15)
SLIP(slip_20,            s->sum == SUM_NORMAL || s->sum == SUM_NORMAL_IN, s->ref_T = 293.15)
SLIP(slip_25,            s->sum == SUM_NORMAL || s->sum == SUM_NORMAL_IN, s->ref_T = 298.15)
SLIP(slip_0_bar,         s->sum == SUM_NORMAL || s->sum == SUM_NORMAL_IN, s->ref_P = 1e5)
SLIP(slip_60F,           s->sum == SUM_NORMAL || s->sum == SUM_NORMAL_IN, s->ref_T = (60 + 459.67) / 1.8; s->ref_P = 14.696 * SHEET_PSI)
SLIP(slip_log10,         s->sum == SUM_ISOTHERMAL, s->log10 = true)
SLIP(slip_inverted,      s->sum == SUM_POLYTROPIC, s->inverted = true)
SLIP(slip_sign,          sheet_is_path(s), s->factor *= -1)
SLIP(slip_system,        s->sum == SUM_POLYTROPIC, s->other_system = true)
SLIP(slip_reversible,    s->sum == SUM_COMPRESSOR, s->reversible = true)
SLIP(slip_turned,        s->sum == SUM_COMPRESSOR, s->turned = true)
SLIP(slip_isothermal,    s->sum == SUM_POLYTROPIC, s->isothermal = true)
SLIP(slip_exponent,      s->sum == SUM_POLYTROPIC, s->exponent = true)
SLIP(slip_cp_start,      s->sum == SUM_DUTY, s->cp = CP_START)
SLIP(slip_cp_end,        s->sum == SUM_DUTY, s->cp = CP_END)
SLIP(slip_cp_25,         s->sum == SUM_DUTY, s->cp = CP_25)
SLIP(slip_cp_mean,       s->sum == SUM_DUTY, s->cp = CP_MEAN)
SLIP(slip_cp_at_mean,    s->sum == SUM_DUTY, s->cp = CP_AT_MEAN)
SLIP(slip_k,             s->sum == SUM_DUTY, s->cp = CP_K14)
SLIP(slip_celsius,       s->sum == SUM_DUTY, s->cp = CP_CELSIUS)
SLIP(slip_level,         s->sum == SUM_DUTY, s->shift = s->T_unit.scale < 1 ? -32 / 1.8 : 273.15)
SLIP(slip_cal_IT,        strcmp(s->answer_unit.text, "kcal") == 0 && (s->sum == SUM_DUTY || sheet_is_path(s)), s->answer_scale = 4186.8)
SLIP(slip_Btu_th,        strcmp(s->answer_unit.text, "Btu") == 0 && (s->sum == SUM_DUTY || sheet_is_path(s)), s->answer_scale = 1054.3502644888889)
SLIP(slip_thousand,      s->sum != SUM_RIGID, s->factor *= 1000)
SLIP(slip_thousandth,    s->sum != SUM_RIGID, s->factor *= 1e-3)
SLIP(slip_atm,           has_P_unit(s, "bar"), s->P_scale = 101325)
SLIP(slip_kgf,           has_P_unit(s, "bar"), s->P_scale = 98066.5)
SLIP(slip_bar_for_kgf,   has_P_unit(s, "kgf"), s->P_scale = 1e5)
SLIP(slip_kPa,           has_P_unit(s, "bar") && s->sum == SUM_MASS, s->P_scale = 1e3)
SLIP(slip_hour,          s->sum == SUM_NORMAL || s->sum == SUM_NORMAL_IN, s->factor = 3600)
SLIP(slip_pound,         (sheet_is_path(s) || s->sum == SUM_DUTY) && strcmp(s->m_unit.text, "lb") == 0, s->m_unit.scale = 1)

/* id: as the audit's table names it; often: among the commonest (common practice). */
static const struct injection {
    const char *id;
    bool often, rounding;
    bool (*inject)(struct sheet *s); /* false where it does not apply */
    const char *where;               /* NULL: everywhere it can be */
} injections[] = {
    {"gauge as absolute",   true,  false, slip_gauge_all, NULL},     {"gauge as absolute",   true,  false, slip_gauge_first, "P1"},
    {"gauge as absolute",   true,  false, slip_gauge_second, "P2"},  {"absolute as gauge",   true,  false, slip_absolute, NULL},
    {"barometer twice",     false, false, slip_twice, NULL},         {"barometer 1 bar",     true,  false, slip_bar, NULL},
    {"barometer 14.7 psi",  false, true,  slip_147, NULL},           {"barometer 1.013 bar", false, true,  slip_1013, NULL},
    {"degrees as absolute", true,  false, slip_degrees, NULL},       {"degrees as absolute", true,  false, slip_degrees_first, "T1"},
    {"273",                 true,  true,  slip_273, NULL},           {"460",                 true,  true,  slip_460, NULL},
    {"R 8.314",             true,  true,  slip_R_8314, NULL},        {"R 8.31",              false, true,  slip_R_831, NULL},
    {"R 0.0821",            false, true,  slip_R_00821, NULL},       {"R L atm as bar",      true,  false, slip_R_atm, NULL},
    {"R x 1000",            false, false, slip_R_thousand, NULL},    {"M whole",             true,  true,  slip_M_whole, NULL},
    {"M 1 decimal",         false, true,  slip_M_decimal, NULL},     {"R for R/M",           true,  false, slip_mass, NULL},
    {"answer in mass",      true,  false, slip_moles, NULL},         {"ref 15 C 1 atm",      true,  false, slip_15, NULL},
    {"ref 20 C 1 atm",      true,  false, slip_20, NULL},            {"ref 25 C 1 atm",      false, false, slip_25, NULL},
    {"ref 0 C 1 bar",       true,  false, slip_0_bar, NULL},         {"ref 60 F",            true,  false, slip_60F, NULL},
    {"log10 for ln",        true,  false, slip_log10, NULL},         {"ratio inverted",      true,  false, slip_inverted, NULL},
    {"sign",                true,  false, slip_sign, NULL},          {"flow for closed",     true,  false, slip_system, NULL},
    {"reversible",          true,  false, slip_reversible, NULL},    {"efficiency turned",   true,  false, slip_turned, NULL},
    {"isothermal formula",  false, false, slip_isothermal, NULL},    {"exponent n-1",        true,  false, slip_exponent, NULL},
    {"cp at start",         true,  false, slip_cp_start, NULL},      {"cp at end",           false, false, slip_cp_end, NULL},
    {"cp at 25",            true,  false, slip_cp_25, NULL},         {"cp mean",             false, false, slip_cp_mean, NULL},
    {"cp at mean",          false, false, slip_cp_at_mean, NULL},    {"k 1.4",               true,  false, slip_k, NULL},
    {"cp in Celsius",       true,  false, slip_celsius, NULL},       {"difference as level", true,  false, slip_level, NULL},
    {"calorie or Btu",      true,  false, slip_cal_IT, "cal"},        {"calorie or Btu",      true,  false, slip_Btu_th, "Btu"},
    {"1000 too large answer", true, false, slip_thousand, NULL},     {"1000 too small answer", true, false, slip_thousandth, NULL},
    {"as atm",              true,  false, slip_atm, NULL},           {"as kgf/cm2",          true,  false, slip_kgf, NULL},
    {"as bar",              true,  false, slip_bar_for_kgf, NULL},   {"as kPa",              true,  false, slip_kPa, NULL},
    {"answer per h",        true,  false, slip_hour, NULL},          {"lb as kg",            false, false, slip_pound, NULL},
};
/* clang-format on */
enum { INJECTIONS = sizeof injections / sizeof *injections };

#endif
