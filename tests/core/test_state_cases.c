/*
 * Questions of calculation sheets, answered by hand arithmetic.
 *
 * Expected figures are written out from P V = n R T, m = n M, h = cp (T - T0), u = h - R T and
 * s = cp ln(T/T0) - R ln(P/P0) for a constant cp; R is exact (SI Brochure, 9th ed.). Tolerance 1e-10: the inverses are
 * good to 1e-12, the rest is rounding.
 */
#include <math.h>
#include <stdio.h>
#include <string.h>

#include <gasleaf/state.h>

#include "check.h"

#define R         8.31446261815324
#define M         0.0280134
#define CP        29.37
#define T0        298.15
#define P0        1e5
#define TOLERANCE 1e-10

static const struct gas_interval interval = {.T_from = 50, .T_to = 5000, .power = {[-GAS_POWER_LOWEST] = CP}};
static const struct gas gas = {R, M, GAS_CP_INTEGRATED, 1, &interval};

/* Names of the rows: the symbol, with _n per mole and _m per mass. */
static const char *const names[GAS_VARIABLES] = {"P",   "T",   "V",   "n",   "m",   "v_n", "v_m", "rho", "c",
                                                 "h_n", "u_n", "s_n", "h_m", "u_m", "s_m", "H",   "U",   "S"};

struct row {
    const char *id, *given, *wanted;
    double expected;
};

static double h(double T)
{
    return CP * (T - T0);
}

static double s(double T, double P)
{
    return CP * log(T / T0) - R * log(P / P0);
}

enum { MOST = 12 };

/* "P1" -> P, 1. A name without a digit is of state 0. */
static bool read_name(const char *text, size_t length, struct gas_known *known)
{
    known->state = 0;
    if (length > 1 && text[length - 1] >= '1' && text[length - 1] <= '9')
        known->state = text[--length] - '0';
    for (int i = 0; i < GAS_VARIABLES; i++)
        if (strlen(names[i]) == length && strncmp(names[i], text, length) == 0) {
            known->variable = (enum gas_variable)i;
            return true;
        }
    return false;
}

/* "P1=1e5 V=const T1=300" */
static size_t read_given(const char *text, struct gas_known *known, double *figures)
{
    size_t count = 0;
    while (*text && count < MOST) {
        size_t length = strcspn(text, "=");
        if (!read_name(text, length, &known[count]) || text[length] != '=')
            return 0;
        if (strncmp(text + length + 1, "const", 5) == 0)
            known[count].state = GAS_CONSTANT;
        if (sscanf(text + length + 1, "%lf", &figures[count]) != 1)
            figures[count] = NAN;
        count++;
        text += strcspn(text, " ");
        text += strspn(text, " ");
    }
    return count;
}

static double answer(const struct row *row, bool trimmed)
{
    struct gas_known known[MOST], wanted = {GAS_VARIABLES, 0};
    double figures[MOST];
    struct gas_plan plan;
    struct gas_values values;
    size_t count = read_given(row->given, known, figures);
    bool read = count > 0 && read_name(row->wanted, strlen(row->wanted), &wanted);
    if (!check_true(row->id, read) || gas_plan_make(&plan, known, count, 0).status != GAS_OK)
        return NAN;
    if (trimmed)
        gas_plan_trim(&plan, &wanted, 1);
    struct gas_result result = gas_plan_run(&plan, &gas, NULL, 1e-3, figures, count, &wanted, 1, &values);
    double value = gas_plan_value(&plan, &values, wanted.variable, wanted.state);
    check_int(row->id, result.status == GAS_OK, !isnan(value));
    return value;
}

/* clang-format off */
static void check_rows(bool trimmed)
{
    const struct row rows[] = {
    /* one state, nameless */
    {"amount",           "P=2.385e5 V=1.7 T=311.3", "n", 2.385e5 * 1.7 / (R * 311.3)},
    {"mass",             "P=2.385e5 V=1.7 T=311.3", "m", 2.385e5 * 1.7 / (R * 311.3) * M},
    {"density",          "P=2.385e5 T=311.3", "rho", 2.385e5 * M / (R * 311.3)},
    {"molar volume",     "P=2.385e5 T=311.3", "v_n", R * 311.3 / 2.385e5},
    {"specific volume",  "P=2.385e5 T=311.3", "v_m", R * 311.3 / (2.385e5 * M)},
    {"concentration",    "P=2.385e5 T=311.3", "c", 2.385e5 / (R * 311.3)},
    {"P of n",           "n=91.7 V=3.3 T=289.4", "P", 91.7 * R * 289.4 / 3.3},
    {"T of n",           "n=91.7 V=3.3 P=1.07e5", "T", 1.07e5 * 3.3 / (91.7 * R)},
    {"V of n",           "n=91.7 T=289.4 P=1.07e5", "V", 91.7 * R * 289.4 / 1.07e5},
    {"P of m",           "m=4.7 V=3.3 T=289.4", "P", 4.7 / M * R * 289.4 / 3.3},
    {"T of m",           "m=4.7 V=3.3 P=1.21e5", "T", 1.21e5 * 3.3 * M / (4.7 * R)},
    {"V of m",           "m=4.7 T=289.4 P=1.21e5", "V", 4.7 * R * 289.4 / (M * 1.21e5)},
    {"P of rho",         "rho=1.37 T=303.3", "P", 1.37 * R * 303.3 / M},
    {"T of rho",         "rho=1.37 P=1.21e5", "T", 1.21e5 * M / (1.37 * R)},
    {"P of v mass",      "v_m=0.713 T=303.3", "P", R * 303.3 / (M * 0.713)},
    {"T of v mass",      "v_m=0.713 P=1.21e5", "T", 1.21e5 * 0.713 * M / R},
    {"P of v molar",     "v_n=0.0213 T=303.3", "P", R * 303.3 / 0.0213},
    {"T of c",           "c=47.3 P=1.21e5", "T", 1.21e5 / (47.3 * R)},
    {"m of rho",         "rho=1.37 V=2.9", "m", 1.37 * 2.9},
    {"n of rho",         "rho=1.37 V=2.9", "n", 1.37 * 2.9 / M},
    {"V of rho",         "rho=1.37 m=7.3", "V", 7.3 / 1.37},
    {"V of v mass",      "v_m=0.713 m=7.3", "V", 7.3 * 0.713},
    {"n of v mass",      "v_m=0.713 V=2.9", "n", 2.9 / 0.713 / M},
    {"V of c",           "c=47.3 n=11.9", "V", 11.9 / 47.3},
    {"rho of c",         "c=47.3", "rho", 47.3 * M},
    /* enthalpy, internal energy, entropy */
    {"h",                "T=411.7", "h_n", CP * (411.7 - T0)},
    {"h per mass",       "T=411.7", "h_m", CP * (411.7 - T0) / M},
    {"u",                "T=411.7", "u_n", CP * (411.7 - T0) - R * 411.7},
    {"u at the datum",   "T=298.15", "u_n", -R * 298.15},
    {"u per mass",       "T=411.7", "u_m", (CP * (411.7 - T0) - R * 411.7) / M},
    {"s",                "T=411.7 P=3.71e5", "s_n", CP * log(411.7 / T0) - R * log(3.71)},
    {"s per mass",       "T=411.7 P=3.71e5", "s_m", (CP * log(411.7 / T0) - R * log(3.71)) / M},
    {"T of h",           "h_n=3313", "T", T0 + 3313 / CP},
    {"T of h per mass",  "h_m=118.3e3", "T", T0 + 118.3e3 * M / CP},
    {"T of u",           "u_n=713", "T", (713 + CP * T0) / (CP - R)},
    {"T of u per mass",  "u_m=-31.7e3", "T", (-31.7e3 * M + CP * T0) / (CP - R)},
    {"h of u",           "u_n=713", "h_n", 713 + R * (713 + CP * T0) / (CP - R)},
    {"T of s and P",     "s_n=-3.17 P=3.71e5", "T", T0 * exp((-3.17 + R * log(3.71)) / CP)},
    {"P of s and T",     "s_n=-3.17 T=411.7", "P", P0 * exp((CP * log(411.7 / T0) + 3.17) / R)},
    {"T of s and v",     "s_n=7.31 v_n=0.0137", "T",
        T0 * exp((7.31 - R * log(0.0137 * P0 / (R * T0))) / (CP - R))},
    {"T of s and rho",   "s_n=7.31 rho=1.73", "T", T0 * exp((7.31 - R * log(M / 1.73 * P0 / (R * T0))) / (CP - R))},
    {"T of s mass, P",   "s_m=-113.7 P=3.71e5", "T", T0 * exp((-113.7 * M + R * log(3.71)) / CP)},
    {"H",                "T=411.7 n=13.1", "H", 13.1 * CP * (411.7 - T0)},
    {"T of H",           "H=-31.3e3 m=0.917", "T", T0 - 31.3e3 * M / 0.917 / CP},
    {"T of U",           "U=31.3e3 n=17.3", "T", (31.3e3 / 17.3 + CP * T0) / (CP - R)},
    {"T of S",           "S=-31.3 n=17.3 P=3.71e5", "T", T0 * exp((-31.3 / 17.3 + R * log(3.71)) / CP)},
    {"n of H",           "H=43.7e3 T=411.7", "n", 43.7e3 / (CP * (411.7 - T0))},
    {"m of U",           "U=-43.7e3 T=311.7", "m", -43.7e3 / (CP * (311.7 - T0) - R * 311.7) * M},
    {"n of S",           "S=-43.7 T=311.7 P=7.13e5", "n", -43.7 / (CP * log(311.7 / T0) - R * log(7.13))},
    {"U of H, P, V",     "H=7.13e5 P=2.17e5 V=1.31", "U", 7.13e5 - 2.17e5 * 1.31},
    {"H of U, P, V",     "U=7.13e5 P=2.17e5 V=1.31", "H", 7.13e5 + 2.17e5 * 1.31},
    {"n second way",     "H=0 U=-57.3e3 T=298.15", "n", 57.3e3 / (R * 298.15)},
    /* closed systems */
    {"rigid P2",         "V=2.3 P1=3.1e5 T1=291 T2=343", "P2", 3.1e5 * 343 / 291},
    {"rigid P2 no V",    "V=const P1=3.1e5 T1=291 T2=343", "P2", 3.1e5 * 343 / 291},
    {"rigid T2 no V",    "V=const P1=3.1e5 T1=291 P2=2.7e5", "T2", 291 * 2.7 / 3.1},
    {"isothermal V2",    "T=const P1=1.3e5 V1=0.71 P2=7.9e5", "V2", 0.71 * 1.3 / 7.9},
    {"isothermal P2",    "T=311 P1=1.3e5 V1=0.71 V2=0.13", "P2", 1.3e5 * 0.71 / 0.13},
    {"isobaric V2",      "P=const T1=283 V1=0.71 T2=511", "V2", 0.71 * 511 / 283},
    {"isobaric T2",      "P=1.9e5 T1=283 V1=0.71 V2=0.97", "T2", 283 * 0.97 / 0.71},
    {"ratio V2",         "P1=1.3e5 V1=0.71 T1=283 P2=7.9e5 T2=347", "V2", 1.3e5 * 0.71 * 347 / (283 * 7.9e5)},
    {"ratio T2",         "P1=1.3e5 V1=0.71 T1=283 P2=7.9e5 V2=0.17", "T2", 7.9e5 * 0.17 * 283 / (1.3e5 * 0.71)},
    {"m over states",    "P1=1.3e5 V1=0.71 T1=283 P2=7.9e5 T2=347", "m", 1.3e5 * 0.71 / (R * 283) * M},
    {"rho2",             "P1=1.3e5 V1=0.71 T1=283 V2=0.17", "rho2", 1.3e5 * 0.71 * M / (R * 283 * 0.17)},
    {"v2 of V2",         "v_n1=0.0231 V1=0.71 V2=0.17", "v_n2", 0.0231 * 0.17 / 0.71},
    {"third state",      "V=const P1=3.1e5 T1=291 T3=343", "P3", 3.1e5 * 343 / 291},
    {"chain of states",  "n=7.7 P1=3.1e5 T1=291 V2=0.077 T2=310 P3=2.2e5 V3=0.1", "T3", 2.2e5 * 0.1 / (7.7 * R)},
    {"T2 of h2",         "P1=1.3e5 T1=283 h_n2=4417", "T2", T0 + 4417 / CP},
    {"T2 of s2",         "s_n2=3.3 P2=4.7e5 T1=283", "T2", T0 * exp((3.3 + R * log(4.7)) / CP)},
    {"P2 of s2",         "s_n2=3.3 T2=447 T1=283", "P2", P0 * exp((CP * log(447 / T0) - 3.3) / R)},
    {"isentropic T2",    "s_n=const P1=1.3e5 T1=283 P2=4.7e5 s_n1=0", "T2", NAN}, /* named twice: refused */
    {"u2 per mass",      "P1=1.3e5 V1=0.71 T1=283 P2=7.9e5 V2=0.17", "u_m2",
        ((CP - R) * (7.9e5 * 0.17 * 283 / (1.3e5 * 0.71)) - CP * T0) / M},
    /* open systems: n or m numbered */
    {"vented n2",        "V=const n1=37 P1=9.1e5 T1=301 P2=2.3e5 T2=287", "n2", 37 * 2.3e5 * 301 / (9.1e5 * 287)},
    {"vented m2",        "V=const m1=1.9 P1=9.1e5 T1=301 P2=2.3e5 T2=287", "m2", 1.9 * 2.3e5 * 301 / (9.1e5 * 287)},
    {"vented P2",        "V=const m1=1.9 m2=0.7 P1=9.1e5 T1=301 T2=287", "P2", 9.1e5 * 0.7 * 287 / (1.9 * 301)},
    {"vented T2",        "V=0.3 m2=0.7 P1=9.1e5 T1=301 P2=2.3e5", "T2", 2.3e5 * 0.3 * M / (0.7 * R)},
    {"vented m1",        "V=0.3 m2=0.7 P1=9.1e5 T1=301 P2=2.3e5", "m1", 9.1e5 * 0.3 * M / (R * 301)},
    /* shared by what follows */
    {"shared rho",       "P=2.1e5 T=301 V2=0.9 n1=1.1", "rho2", 2.1e5 * M / (R * 301)},
    {"only state",       "P1=2.385e5 V1=1.7 T1=311.3", "n1", 2.385e5 * 1.7 / (R * 311.3)},
    {"only state bare",  "P1=2.385e5 T1=311.3", "rho", 2.385e5 * M / (R * 311.3)},
    {"only state 2",     "P2=2.385e5 T2=311.3", "rho", 2.385e5 * M / (R * 311.3)},
    {"bare as state 1",  "P=2.385e5 T=311.3", "rho1", 2.385e5 * M / (R * 311.3)},
    {"given itself",     "P=2.385e5 T=311.3", "T", 311.3},
    /* not determined */
    {"too little",       "P=2.385e5 T=311.3", "n", NAN},
    {"no T2",            "P1=3.1e5 T1=291 V1=0.3 P2=2e5", "T2", NAN},
    {"h of zero",        "H=0 T=298.15", "n", NAN},
    {"open n2",          "n1=3 P1=3.1e5 T1=291 P2=2e5 T2=310", "n2", NAN},
    {"no heat of H, S",  "H=3e4 S=100", "T", NAN},
    };
    for (size_t i = 0; i < sizeof rows / sizeof *rows; i++)
        check_close(rows[i].id, answer(&rows[i], trimmed), rows[i].expected, TOLERANCE, 0);
}
/* clang-format on */

static void rows_hold(void)
{
    check_rows(false);
}

static void rows_hold_when_trimmed(void)
{
    check_rows(true);
}

/* Isentropic changes: s of the first state holds in both, so it is given for every state. */
static void isentropic_changes(void)
{
    double s1 = s(311.3, 1.3e5), T2 = 311.3 * pow(4.7 / 1.3, R / CP);
    const struct gas_known known[] = {{GAS_VAR_S_MOLAR, GAS_CONSTANT}, {GAS_VAR_P, 1}, {GAS_VAR_T, 1}, {GAS_VAR_P, 2}};
    const struct gas_known wanted[] = {{GAS_VAR_T, 2}, {GAS_VAR_S_MOLAR, 0}, {GAS_VAR_H_MOLAR, 2}};
    const double figures[] = {NAN, 1.3e5, 311.3, 4.7e5};
    struct gas_plan plan;
    struct gas_values values;
    check_int("made", gas_plan_make(&plan, known, 4, 0).status, GAS_OK);
    check_int("run", gas_plan_run(&plan, &gas, NULL, 1e-3, figures, 4, wanted, 3, &values).status, GAS_OK);
    check_close("T2", gas_plan_value(&plan, &values, GAS_VAR_T, 2), T2, TOLERANCE, 0);
    check_close("s", gas_plan_value(&plan, &values, GAS_VAR_S_MOLAR, 0), s1, TOLERANCE, 0);
    check_close("h2", gas_plan_value(&plan, &values, GAS_VAR_H_MOLAR, 2), h(T2), 1e-9, 0);
}

const struct test_suite suite_state_cases = {
    "state_cases",
    (const struct test_case[]){
        {"rows", rows_hold}, {"rows when trimmed", rows_hold_when_trimmed}, {"isentropic", isentropic_changes}, {0}}};
