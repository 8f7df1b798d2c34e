/* Printed examples that need no table of data; the source stands beside each row. */
#include <math.h>

#include "check.h"
#include "path_gases.h"

static const double AIR_R = 287.0, AIR_M = 0.02897; /* J/(kg K), kg/mol: what the books use for air */

/* Moran & Shapiro, Fundamentals of Engineering Thermodynamics, 5th ed. SI (2006), Ex. 2.1: P V^n, 3 bar, 0.1 to 0.2 m3.
 * Work by the gas: 17.6 kJ (n = 1.5), 20.79 kJ (n = 1), 30 kJ (n = 0). From memory. */
static void piston_polytropic(void)
{
    const struct {
        double n, W;
    } rows[] = {{1.5, 17.6e3}, {1.0, 20.79e3}, {0.0, 30e3}};
    const struct gas_point start = point_PT(3e5, 300);
    for (int i = 0; i < 3; i++) {
        struct gas_leg leg = leg_of(GAS_POLYTROPIC, GAS_BY_V_RATIO, 2);
        struct gas_change c;
        leg.n = rows[i].n;
        check_int("2.1", gas_leg_run(&bare, GAS_CLOSED, &start, NULL, &leg, &c).status, GAS_OK);
        check_close("2.1", -c.W * 0.1 / start.v, rows[i].W, 5e-3, 0); /* 3 figures printed */
    }
}

/* Cengel & Boles, Thermodynamics: An Engineering Approach, Ex. 4-3: air, 100 kPa, 80 C, 0.4 to 0.1 m3 isothermally;
 * 55.5 kJ into the gas. From memory. */
static void isothermal_compression(void)
{
    const struct gas_point start = point_PT(100e3, 353.15);
    const struct gas_leg leg = leg_of(GAS_ISOTHERMAL, GAS_BY_V_RATIO, 0.25);
    struct gas_change c;
    gas_leg_run(&bare, GAS_CLOSED, &start, NULL, &leg, &c);
    check_close("4-3 W", c.W * 0.4 / start.v, 55.5e3, 1e-3, 0);
    check_close("4-3 Q", c.Q * 0.4 / start.v, -55.5e3, 1e-3, 0);
}

/* Engel & Reid, Physical Chemistry, ch. 2, problem: 2.50 mol, Cv 12.47 J/(mol K), 325 K, 2.50 bar to 1.25 bar
 * adiabatically against 1.00 bar; Tf 268 K, w = -1.78 kJ, dH = -2.96 kJ (with Tf rounded). From memory. */
static void against_one_bar(void)
{
    struct gas_interval interval;
    const struct gas gas = constant_gas(&interval, 12.47 + GAS_R, GAS_R, 0.040);
    const struct gas_point start = point_PT(2.5e5, 325);
    struct gas_leg leg = leg_of(GAS_AGAINST, GAS_TO_P, 1.25e5);
    struct gas_change c;
    leg.P_outside = 1e5;
    check_int("against", gas_leg_run(&gas, GAS_CLOSED, &start, NULL, &leg, &c).status, GAS_OK);
    check_close("against T", c.end.T, 268, 0, 0.5);
    check_close("against W", 2.5 * c.W, -1.78e3, 0, 0.5 * 2.5 * 12.47 + 5); /* half a kelvin of Tf, 5 J */
    check_close("against dH", 2.5 * c.dH, -2.96e3, 0, 0.5 * 2.5 * 20.78 + 5);
}

/* Atkins & de Paula, Physical Chemistry, ch. 3: a perfect gas doubles its volume; dS = +5.76 J/(mol K), also into a
 * vacuum, where nothing is taken from outside. From memory. */
static void doubled_volume(void)
{
    const struct gas_point start = point_PT(1e5, 298.15);
    const enum gas_process processes[] = {GAS_FREE_EXPANSION, GAS_ISOTHERMAL};
    for (int i = 0; i < 2; i++) {
        const struct gas_leg leg = leg_of(processes[i], GAS_BY_V_RATIO, 2);
        struct gas_change c;
        check_int("doubled", gas_leg_run(&diatomic, GAS_CLOSED, &start, NULL, &leg, &c).status, GAS_OK);
        check_close("doubled dS", c.dS, 5.76, 0, 0.005);
        check_close("doubled T", c.end.T, 298.15, 0, 0);
        check_close("entropy made", c.S_made, i == 0 ? 5.76 : 0, 0, 0.005);
        check_close("doubled Q", c.Q, i == 0 ? 0 : 298.15 * c.dS, 1e-13, 0);
    }
}

/* Cengel & Boles, Ex. 7-11: helium, 14 psia, 50 F compressed adiabatically to 320 F, k = 1.667; 40.5 psia.
 * From memory. */
static void helium_compressor(void)
{
    struct gas_interval interval;
    const struct gas helium = constant_gas(&interval, GAS_R * 1.667 / 0.667, GAS_R, 0.0040026);
    const struct gas_point start = point_PT(14, 510); /* psia and degrees Rankine: ratios are the same */
    const struct gas_leg leg = leg_of(GAS_ADIABATIC, GAS_TO_T, 780);
    struct gas_change c;
    check_int("7-11", gas_leg_run(&helium, GAS_FLOW, &start, NULL, &leg, &c).status, GAS_OK);
    check_close("7-11 P", c.end.P, 40.5, 2e-3, 0);
}

/* Moran & Shapiro, Ex. 3.11: air, 1 bar, 295 K to 5 bar with n = 1.3, closed; T2 = 428 K, W = 127.2 kJ/kg in,
 * Q = -31.16 kJ/kg by the air table; here with cv between 295 and 428 K: 721.8 J/(kg K), which is what
 * the table's u (306.53 - 210.49 kJ/kg) gives over 133 K. From memory. */
static void polytropic_compression(void)
{
    struct gas_interval interval;
    const double cv = (306.53e3 - 210.49e3) / 133;
    const struct gas air = constant_gas(&interval, (cv + AIR_R) * AIR_M, AIR_R * AIR_M, AIR_M);
    const struct gas_point start = {.P = 1e5, .T = 295, .v = NAN};
    struct gas_leg leg = leg_of(GAS_POLYTROPIC, GAS_TO_P, 5e5);
    struct gas_change c;
    leg.n = 1.3;
    check_int("3.11", gas_leg_run(&air, GAS_CLOSED, &start, NULL, &leg, &c).status, GAS_OK);
    check_close("3.11 T", c.end.T, 428, 0, 0.5);
    check_close("3.11 W", c.W / AIR_M, 127.2e3, 0, 0.5 * AIR_R / 0.3); /* half a kelvin of T2 */
    check_close("3.11 Q", c.Q / AIR_M, -31.16e3, 0, 0.4e3);            /* the difference of two large figures */
}

/* Common practice (any text on compressors): with constant cp a machine of polytropic efficiency e follows
 * n/(n - 1) = e k/(k - 1), and its isentropic efficiency is (r^((k-1)/k) - 1)/(r^((n-1)/n) - 1). */
static void machine_exponent(void)
{
    const double k = 1.4, e = 0.82, r = 6.3, x = (k - 1) / k / e;
    const struct gas_point start = point_PT(1.013e5, 288.15);
    struct gas_leg machine = leg_of(GAS_POLYTROPIC, GAS_BY_P_RATIO, r);
    struct gas_leg efficient = leg_of(GAS_ADIABATIC, GAS_BY_P_RATIO, r);
    struct gas_change a, b;
    machine.efficiency = e;
    efficient.efficiency = (pow(r, (k - 1) / k) - 1) / (pow(r, x) - 1);
    gas_leg_run(&diatomic, GAS_FLOW, &start, NULL, &machine, &a);
    gas_leg_run(&diatomic, GAS_FLOW, &start, NULL, &efficient, &b);
    check_close("machine T", a.end.T, 288.15 * pow(r, x), 1e-12, 0);
    check_close("two efficiencies, T", b.end.T, a.end.T, 1e-11, 0);
    check_close("two efficiencies, W", b.W, a.W, 1e-11, 0);
}

/* A throttle in flow: no work, no heat, the temperature of an ideal gas stays (any text). */
static void throttle(void)
{
    const struct gas_point start = point_PT(12.7e5, 311);
    const struct gas_leg leg = leg_of(GAS_FREE_EXPANSION, GAS_TO_P, 1.9e5);
    struct gas_change c;
    check_int("throttle", gas_leg_run(&nitrogen, GAS_FLOW, &start, NULL, &leg, &c).status, GAS_OK);
    check_true("throttle", c.W == 0 && c.Q == 0 && c.dH == 0 && c.end.T == 311);
    check_close("throttle dS", c.dS, GAS_R * log(12.7 / 1.9), 1e-14, 0);
}

/* clang-format off */
const struct test_suite suite_leg_examples = {"leg_examples", (const struct test_case[]){
    {"piston polytropic", piston_polytropic},
    {"isothermal compression", isothermal_compression},
    {"against one bar", against_one_bar},
    {"doubled volume", doubled_volume},
    {"helium compressor", helium_compressor},
    {"polytropic compression", polytropic_compression},
    {"machine exponent", machine_exponent},
    {"throttle", throttle},
    {0}}};
/* clang-format on */
