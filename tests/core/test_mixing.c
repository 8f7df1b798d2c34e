#include <math.h>
#include <stdio.h>

#include <gasleaf/heat.h>
#include <gasleaf/mixing.h>
#include <gsl/gsl_errno.h>
#include <gsl/gsl_integration.h>
#include <gsl/gsl_roots.h>

#include "check.h"
#include "some_gases.h"

/* Cengel & Boles, Thermodynamics: An Engineering Approach, Ex. 13-3: 4 kg N2 at 20 C and 150 kPa with 7 kg O2 at 40 C
 * and 100 kPa, cv 0.743 and 0.658 kJ/(kg K): 32.2 C, 114.5 kPa; answer from memory. */
static void cengel_tanks(void)
{
    struct gas_interval n2_interval, o2_interval;
    const double R = 8.314;
    const struct gas n2 = constant_gas(&n2_interval, 743 * 0.028 + R, R, 0.028);
    const struct gas o2 = constant_gas(&o2_interval, 658 * 0.032 + R, R, 0.032);
    const struct gas_portion tank[] = {{.gas = &n2, .n = 4 / 0.028, .P = 150e3, .T = 293},
                                       {.gas = &o2, .n = 7 / 0.032, .P = 100e3, .T = 313}};
    struct gas_blend blend;
    gas_mix_vessels(tank, NULL, 2, &blend);
    check_close("Cengel 13-3 T", blend.T, 273 + 32.2, 0, 0.05);
    check_close("Cengel 13-3 P", blend.P, 114.5e3, 0, 0.1e3);
    check_close("Cengel 13-3 n", blend.n, 4 / 0.028 + 7 / 0.032, 1e-14, 0);
    check_true("Cengel 13-3 entropy", blend.entropy_made > 0);
}

/* Rajput, Engineering Thermodynamics, 3rd ed., Ex. 9.12: nitrogen, A 0.6 kmol at 16 bar and 55 C, B 3 kg at 6.4 bar and
 * 25 C, gamma 1.4; the givens evaluate by hand to 50.5 C and 13.2 bar; brought to 30 C, 12.4 bar. */
static void rajput_vessels(void)
{
    struct gas_interval interval;
    const struct gas n2 = constant_gas(&interval, 3.5 * 8.314, 8.314, 0.028);
    const struct gas_portion vessel[] = {{.gas = &n2, .n = 600, .P = 16e5, .T = 328},
                                         {.gas = &n2, .n = 3 / 0.028, .P = 6.4e5, .T = 298}};
    struct gas_blend blend;
    gas_mix_vessels(vessel, (const int[]){1, 1}, 2, &blend);
    check_close("Rajput 9.12 T", blend.T, 273 + 50.5, 0, 0.06);
    check_close("Rajput 9.12 P", blend.P, 13.2e5, 0, 0.05e5);
    check_close("Rajput 9.12 cooled", blend.P * 303 / blend.T, 12.4e5, 0, 0.05e5);
}

/* Atkins & de Paula, Physical Chemistry, ch. 3: one mole of a perfect gas that doubles its volume at constant T gains
 * 5.76 J/K, and free expansion leaves T as it was; from memory. */
static void into_the_empty_vessel(void)
{
    const struct gas_portion vessel[] = {{.gas = &nitrogen, .n = 1, .P = 2e5, .T = 300},
                                         {.n = 0, .V_empty = GAS_R * 300 / 2e5}};
    struct gas_blend blend;
    gas_mix_vessels(vessel, NULL, 2, &blend);
    check_close("T stays", blend.T, 300, 0, 0);
    check_close("P halves", blend.P, 1e5, 1e-14, 0);
    check_close("R ln 2", blend.entropy_made, 5.76, 0, 0.005);
}

static void unlike_and_like(void)
{
    const struct gas_portion part[] = {{.gas = &nitrogen, .n = 0.79, .P = 1.3e5, .T = 310},
                                       {.gas = &steep, .n = 0.21, .P = 1.3e5, .T = 310}};
    struct gas_blend blend;
    double ideal = -GAS_R * (0.79 * log(0.79) + 0.21 * log(0.21)); /* Gibbs's formula for ideal mixing */
    gas_mix_vessels(part, NULL, 2, &blend);
    check_close("unlike, vessels", blend.entropy_made, ideal, 1e-13, 0);
    gas_mix_streams(part, (const int[]){4, 7}, 2, NAN, &blend);
    check_close("unlike, streams", blend.entropy_made, ideal, 1e-13, 0);
    check_close("at the inlet pressure", blend.P, 1.3e5, 0, 0);
    const struct gas_portion like[] = {part[0], part[0], part[0]};
    gas_mix_vessels(like, (const int[]){2, 2, 2}, 3, &blend);
    check_close("like makes none", blend.entropy_made, 0, 0, 1e-12);
    check_close("like keeps P", blend.P, 1.3e5, 1e-14, 0);
    /* throttling alone: n R ln(P/P_out) */
    gas_mix_streams(part, NULL, 1, 0.4e5, &blend);
    check_close("throttled", blend.entropy_made, 0.79 * GAS_R * log(1.3 / 0.4), 1e-13, 0);
    check_close("throttled T", blend.T, 310, 0, 0);
}

/* ---- variable cp by a second method: GSL's quadrature of the printed heat capacities and its root finder ------ */

static double nitrogen_cp(double T, void *unused)
{
    (void)unused; /* the fit of NASA/TP-2002-211556 once more, 200 to 1000 K */
    return 8.314510 * (2.210371497E+04 / (T * T) - 3.818461820E+02 / T + 6.082738360E+00 - 8.530914410E-03 * T +
                       1.384646189E-05 * pow(T, 2) - 9.625793620E-09 * pow(T, 3) + 2.519705809E-12 * pow(T, 4));
}

static double steep_cp(double T, void *unused)
{
    (void)unused;
    return 23.7 + 0.0413 * T + 1.9e5 / (T * T);
}

struct pair {
    double n[2], T[2], less; /* less: R for internal energies */
};

static double integral(double (*cp)(double, void *), double from, double to)
{
    gsl_function f = {cp, NULL};
    double value, error;
    size_t calls;
    gsl_integration_qng(&f, from, to, 0, 1e-12, &value, &error, &calls);
    return value;
}

static double gained(double T, void *given)
{
    const struct pair *at = given;
    return at->n[0] * (integral(nitrogen_cp, at->T[0], T) - at->less * (T - at->T[0])) +
           at->n[1] * (integral(steep_cp, at->T[1], T) - at->less * (T - at->T[1]));
}

static double gsl_temperature(struct pair at)
{
    gsl_function f = {gained, &at};
    gsl_root_fsolver *solver = gsl_root_fsolver_alloc(gsl_root_fsolver_brent);
    gsl_root_fsolver_set(solver, &f, fmin(at.T[0], at.T[1]), fmax(at.T[0], at.T[1]));
    for (int i = 0; i < 60; i++)
        gsl_root_fsolver_iterate(solver);
    double T = gsl_root_fsolver_root(solver);
    gsl_root_fsolver_free(solver);
    return T;
}

static void variable_cp(void)
{
    gsl_error_handler_t *handler = gsl_set_error_handler_off();
    check_seed(41);
    for (int i = 0; i < 40; i++) {
        struct pair at = {{check_random(0.1, 3), check_random(0.1, 3)},
                          {check_random(210, 990), check_random(210, 990)},
                          i % 2 ? GAS_R : 0};
        const struct gas_portion part[] = {{.gas = &nitrogen, .n = at.n[0], .P = 2e5, .T = at.T[0]},
                                           {.gas = &steep, .n = at.n[1], .P = 3e5, .T = at.T[1]}};
        struct gas_blend blend;
        double T = gsl_temperature(at);
        if (i % 2)
            gas_mix_vessels(part, NULL, 2, &blend);
        else
            gas_mix_streams(part, NULL, 2, 1.1e5, &blend);
        check_close(i % 2 ? "vessels, T" : "streams, T", blend.T, T, 1e-10, 0);
        double V = GAS_R * (at.n[0] * at.T[0] / 2e5 + at.n[1] * at.T[1] / 3e5);
        check_close("P", blend.P, i % 2 ? (at.n[0] + at.n[1]) * GAS_R * T / V : 1.1e5, 1e-10, 0);
        check_true("entropy is made", blend.entropy_made > 0);
    }
    gsl_set_error_handler(handler);
}

/* Cutting a portion in two, or adding an empty one, changes nothing. */
static void cut_in_two(void)
{
    const struct gas_portion whole[] = {{.gas = &nitrogen, .n = 2.3, .P = 2e5, .T = 333},
                                        {.gas = &steep, .n = 1.1, .P = 7e5, .T = 480}};
    const struct gas_portion cut[] = {{.gas = &nitrogen, .n = 0.9, .P = 2e5, .T = 333},
                                      {.gas = &steep, .n = 1.1, .P = 7e5, .T = 480},
                                      {.gas = &nitrogen, .n = 1.4, .P = 2e5, .T = 333},
                                      {.n = 0, .P = NAN, .T = NAN}};
    const int same[] = {0, 1, 0, 1};
    struct gas_blend one, two;
    for (int streams = 0; streams < 2; streams++) {
        if (streams) {
            gas_mix_streams(whole, NULL, 2, NAN, &one);
            gas_mix_streams(cut, same, 4, NAN, &two);
        } else {
            gas_mix_vessels(whole, NULL, 2, &one);
            gas_mix_vessels(cut, same, 4, &two);
        }
        check_close("T", two.T, one.T, 1e-13, 0);
        check_close("P", two.P, one.P, 1e-13, 0);
        check_close("n", two.n, one.n, 1e-15, 0);
        check_close("entropy", two.entropy_made, one.entropy_made, 1e-11, 0);
    }
}

/* ---- bad inputs ---------------------------------------------------------------------------------------------- */

static void bad(const char *id, const struct gas_portion *part, size_t count, double P_out, enum gas_status status,
                int argument)
{
    struct gas_blend blend;
    struct gas_result got = gas_mix_streams(part, NULL, count, P_out, &blend);
    check_int(id, (long)got.status, (long)status);
    check_int(id, got.argument, argument);
    check_true(id, isnan(got.value) && isnan(blend.T) && isnan(blend.entropy_made));
    if (argument > (int)count || status == GAS_UNREACHABLE) /* about P_out: streams only */
        return;
    got = gas_mix_vessels(part, NULL, count, &blend);
    check_int(id, (long)got.status, (long)status);
    check_int(id, got.argument, argument);
    check_true(id, isnan(got.value) && isnan(blend.T) && isnan(blend.P));
}

static void bad_second(const char *id, struct gas_portion second, enum gas_status status)
{
    const struct gas_portion part[] = {{.gas = &nitrogen, .n = 1, .P = 1e5, .T = 300}, second};
    bad(id, part, 2, NAN, status, 2);
}

static void bad_inputs(void)
{
    const struct gas_portion fine[] = {{.gas = &nitrogen, .n = 1, .P = 1e5, .T = 300},
                                       {.gas = &nitrogen, .n = 1, .P = 2e5, .T = 300}};
    bad_second("n negative", (struct gas_portion){.gas = &steep, .n = -1, .P = 1e5, .T = 300}, GAS_NEGATIVE);
    bad_second("n NaN", (struct gas_portion){.gas = &steep, .n = NAN, .P = 1e5, .T = 300}, GAS_NOT_FINITE);
    bad_second("P zero", (struct gas_portion){.gas = &steep, .n = 1, .P = 0, .T = 300}, GAS_NOT_POSITIVE);
    bad_second("P infinite", (struct gas_portion){.gas = &steep, .n = 1, .P = INFINITY, .T = 300}, GAS_NOT_FINITE);
    bad_second("T negative", (struct gas_portion){.gas = &steep, .n = 1, .P = 1e5, .T = -3}, GAS_NOT_POSITIVE);
    bad_second("T outside", (struct gas_portion){.gas = &steep, .n = 1, .P = 1e5, .T = 1400}, GAS_OUTSIDE_DATA);
    bad_second("no cp", (struct gas_portion){.gas = &bare, .n = 1, .P = 1e5, .T = 300}, GAS_NO_HEAT_CAPACITY);
    bad("nothing", fine, 0, NAN, GAS_UNDETERMINED, 0);
    bad("all empty", (const struct gas_portion[]){{.n = 0}, {.n = 0}}, 2, NAN, GAS_NOT_POSITIVE, 0);
    bad("P_out zero", fine, 2, 0, GAS_NOT_POSITIVE, 3);
    bad("P_out infinite", fine, 2, INFINITY, GAS_NOT_FINITE, 3);
    bad("P_out above what the second law allows", fine, 2, 9e5, GAS_UNREACHABLE, 3);
    /* the mixture would be hotter than the second gas is known for */
    const struct gas_portion hot[] = {{.gas = &nitrogen, .n = 90, .P = 1e5, .T = 3000},
                                      {.gas = &steep, .n = 1, .P = 1e5, .T = 300}};
    bad("mixed T outside", hot, 2, NAN, GAS_OUTSIDE_DATA, 2);
    struct gas_blend blend;
    const struct gas_portion negative[] = {fine[0], {.n = 0, .V_empty = -1}};
    struct gas_result got = gas_mix_vessels(negative, NULL, 2, &blend);
    check_int("negative volume", (long)got.status, GAS_NEGATIVE);
    check_int("negative volume", got.argument, 2);
}

const struct test_suite suite_mixing = {"mixing",
                                        (const struct test_case[]){{"Cengel tanks", cengel_tanks},
                                                                   {"Rajput vessels", rajput_vessels},
                                                                   {"into the empty vessel", into_the_empty_vessel},
                                                                   {"unlike and like", unlike_and_like},
                                                                   {"variable cp", variable_cp},
                                                                   {"cut in two", cut_in_two},
                                                                   {"bad inputs", bad_inputs},
                                                                   {0}}};
