#include <math.h>
#include <stdio.h>

#include <gasleaf/heat.h>
#include <gasleaf/stages.h>
#include <gsl/gsl_errno.h>
#include <gsl/gsl_odeiv2.h>
#include <gsl/gsl_poly.h>

#include "check.h"
#include "some_gases.h"

static const struct gas_staging plain = {
    .count = 1, .kind = GAS_ISENTROPIC_EFFICIENCY, .efficiency = 1, .T_cool = NAN, .drive = 1};

static void constant_k(void)
{
    struct gas_interval interval;
    const double k = 1.37, cp = GAS_R * k / (k - 1), m = (k - 1) / k;
    const struct gas gas = constant_gas(&interval, cp, GAS_R, 0.029);
    struct gas_staging staging = plain;
    struct gas_staged staged;
    gas_stages_run(&gas, 1.1e5, 293, 7.3e5, &staging, &staged);
    double T2 = 293 * pow(7.3 / 1.1, m);
    check_close("one stage T", staged.stage[0].T_out, T2, 1e-12, 0);
    check_close("one stage work", staged.work, cp * (T2 - 293), 1e-12, 0);
    check_close("one stage alone", staged.single_work, staged.work, 1e-15, 0);
    staging.efficiency = 0.78;
    gas_stages_run(&gas, 1.1e5, 293, 7.3e5, &staging, &staged);
    check_close("isentropic 78 %", staged.stage[0].T_out, 293 + (T2 - 293) / 0.78, 1e-12, 0);
    staging.kind = GAS_POLYTROPIC_EFFICIENCY;
    gas_stages_run(&gas, 1.1e5, 293, 7.3e5, &staging, &staged);
    check_close("polytropic 78 %", staged.stage[0].T_out, 293 * pow(7.3 / 1.1, m / 0.78), 1e-12, 0);
    staging.kind = GAS_ISOTHERMAL_EFFICIENCY;
    gas_stages_run(&gas, 1.1e5, 293, 7.3e5, &staging, &staged);
    check_close("isothermal 78 %", staged.work, GAS_R * 293 * log(7.3 / 1.1) / 0.78, 1e-14, 0);
    staging = (struct gas_staging){
        .count = 3, .kind = GAS_ISENTROPIC_EFFICIENCY, .efficiency = 1, .T_cool = 293, .aftercooler = 1, .drive = 0.93};
    gas_stages_run(&gas, 1.1e5, 293, 7.3e5, &staging, &staged);
    double step = 293 * (pow(7.3 / 1.1, m / 3) - 1);
    check_close("three stages", staged.work, 3 * cp * step, 1e-12, 0);
    check_close("cooled back", staged.cooling, 3 * cp * step, 1e-12, 0);
    check_close("input", staged.input, 3 * cp * step / 0.93, 1e-12, 0);
    check_close("against one stage", staged.single_work, cp * (T2 - 293), 1e-12, 0);
    check_int("stages", staged.count, 3);
}

/* Cengel & Boles, Thermodynamics: An Engineering Approach, Ex. 7-13, air at 100 kPa and 300 K to 900 kPa, R = 0.287:
 * isentropic (k = 1.4) 263.2, polytropic (n = 1.3) 246.4, isothermal 189.2, two stages of n = 1.3 with cooling back
 * 215.3 kJ/kg; from memory. A reversible polytrope takes the work of an isentrope of a gas with k = n. */
static void published(void)
{
    struct gas_interval interval;
    const double M = 0.001; /* per gram: J/mol is kJ/kg */
    struct gas gas = constant_gas(&interval, 0.287 * 1.4 / 0.4, 0.287, M);
    struct gas_staging staging = plain;
    struct gas_staged staged;
    check_close("Cengel 7-13 a", gas_stages_run(&gas, 1e5, 300, 9e5, &staging, &staged).value, 263.2, 0, 0.05);
    gas = constant_gas(&interval, 0.287 * 1.3 / 0.3, 0.287, M);
    check_close("Cengel 7-13 b", gas_stages_run(&gas, 1e5, 300, 9e5, &staging, &staged).value, 246.4, 0, 0.05);
    staging.count = 2;
    staging.T_cool = 300;
    check_close("Cengel 7-13 d", gas_stages_run(&gas, 1e5, 300, 9e5, &staging, &staged).value, 215.3, 0, 0.1);
    check_close("Cengel 7-13 d, pressure", staged.stage[0].P_out, 3e5, 1e-12, 0);
    staging.count = 1;
    staging.kind = GAS_ISOTHERMAL_EFFICIENCY;
    check_close("Cengel 7-13 c", gas_stages_run(&gas, 1e5, 300, 9e5, &staging, &staged).value, 189.2, 0, 0.05);
}

static double work_of_split(const struct gas *gas, double share)
{
    struct gas_staging staging = plain;
    struct gas_staged staged;
    staging.count = staging.ratio_count = 2;
    staging.ratio[0] = pow(12, share);
    staging.ratio[1] = pow(12, 1 - share) * 1.7; /* only the proportion counts */
    staging.ratio[0] *= 1.7;
    staging.T_cool = 310;
    return gas_stages_run(gas, 1e5, 310, 12e5, &staging, &staged).value;
}

/* The work of two stages with cooling back to the start is least at equal ratios (calculus; any textbook). */
static void least_work(void)
{
    struct gas_interval interval;
    const struct gas gas = constant_gas(&interval, 29.3, GAS_R, 0.029);
    double least = work_of_split(&gas, 0.5);
    for (double share = 0.1; share < 0.95; share += 0.1)
        if (fabs(share - 0.5) > 0.01)
            check_true("equal ratios take the least work", work_of_split(&gas, share) > least * (1 + 1e-6));
    check_close("and the bottom is flat", work_of_split(&gas, 0.5001), least, 1e-7, 0);
}

/* The ratio with absolute drops as the positive root of the polynomial P1 r^n - drop (r + ... + r^(n-1)) - P2, by the
 * eigenvalues of its companion matrix. */
static double polynomial_ratio(int n, double P1, double P2, double drop)
{
    double coefficient[8] = {-P2}, roots[14];
    for (int i = 1; i < n; i++)
        coefficient[i] = -drop;
    coefficient[n] = P1;
    gsl_poly_complex_workspace *space = gsl_poly_complex_workspace_alloc((size_t)n + 1);
    gsl_poly_complex_solve(coefficient, (size_t)n + 1, space, roots);
    gsl_poly_complex_workspace_free(space);
    for (size_t i = 0; i < (size_t)n; i++)
        if (roots[2 * i] > 0 && fabs(roots[2 * i + 1]) < 1e-9)
            return roots[2 * i];
    return NAN;
}

static void drops(void)
{
    struct gas_staging staging = plain;
    struct gas_staged staged;
    staging.T_cool = 310;
    for (int n = 2; n < 7; n++) {
        staging.count = n;
        staging.P_drop = 0.17e5;
        staging.P_drop_fraction = 0;
        gas_stages_run(&nitrogen, 0.97e5, 300, 31e5, &staging, &staged);
        check_close("ratio with drops in Pa", staged.stage[n - 1].ratio, polynomial_ratio(n, 0.97, 31, 0.17), 1e-11, 0);
        for (int i = 1; i < n; i++)
            check_close("drop", staged.stage[i].P_in, staged.stage[i - 1].P_out - 0.17e5, 1e-14, 0);
        check_close("end", staged.stage[n - 1].P_in * staged.stage[n - 1].ratio, 31e5, 1e-12, 0);
        staging.P_drop = 0;
        staging.P_drop_fraction = 0.03;
        gas_stages_run(&nitrogen, 0.97e5, 300, 31e5, &staging, &staged);
        double r = pow(31 / 0.97 / pow(0.97, n - 1), 1.0 / n);
        check_close("ratio with drops by fraction", staged.stage[0].ratio, r, 1e-13, 0);
        check_close("end by fraction", staged.stage[n - 1].P_in * r, 31e5, 1e-12, 0);
    }
    staging = plain;
    staging.ratio_count = 3; /* count from the ratios */
    staging.count = 0;
    staging.ratio[0] = 4, staging.ratio[1] = 3, staging.ratio[2] = 2;
    staging.P_drop = 0.3e5;
    gas_stages_run(&nitrogen, 1e5, 250, 20e5, &staging, &staged);
    check_int("as many as ratios", staged.count, 3);
    check_close("kept in proportion", staged.stage[0].ratio / staged.stage[2].ratio, 2, 1e-13, 0);
    check_close("kept in proportion", staged.stage[1].ratio / staged.stage[2].ratio, 1.5, 1e-13, 0);
    check_close("end met", staged.stage[2].P_in * staged.stage[2].ratio, 20e5, 1e-12, 0);
    check_close("no cooler: on it goes", staged.stage[1].T_in, staged.stage[0].T_out, 0, 0);
}

struct polytrope {
    const struct gas *gas;
    double efficiency;
};

/* dT/d(ln P) = R T/(efficiency cp), dh/d(ln P) = R T/efficiency */
static int polytrope_slope(double log_P, const double y[], double slope[], void *given)
{
    const struct polytrope *at = given;
    (void)log_P;
    slope[0] = GAS_R * y[0] / (at->efficiency * gas_cp(at->gas, y[0]).value);
    slope[1] = GAS_R * y[0] / at->efficiency;
    return GSL_SUCCESS;
}

static void polytrope_end(const struct gas *gas, double T1, double ratio, double efficiency, double y[2])
{
    struct polytrope at = {gas, efficiency};
    gsl_odeiv2_system system = {polytrope_slope, NULL, 2, &at};
    gsl_odeiv2_driver *driver = gsl_odeiv2_driver_alloc_y_new(&system, gsl_odeiv2_step_rk8pd, 1e-2, 1e-13, 1e-13);
    double log_P = 0;
    y[0] = T1, y[1] = 0;
    gsl_odeiv2_driver_apply(driver, &log_P, log(ratio), y);
    gsl_odeiv2_driver_free(driver);
}

/* Variable cp against the differential equation of the compression. */
static void variable_cp(void)
{
    struct gas_staging staging = plain;
    struct gas_staged staged;
    double y[2], s[2];
    staging.kind = GAS_POLYTROPIC_EFFICIENCY;
    staging.efficiency = 0.81;
    gas_stages_run(&steep, 1e5, 280, 6.7e5, &staging, &staged);
    polytrope_end(&steep, 280, 6.7, 0.81, y);
    check_close("polytropic T", staged.stage[0].T_out, y[0], 1e-10, 0);
    check_close("polytropic work", staged.work, y[1], 1e-10, 0);
    staging.kind = GAS_ISENTROPIC_EFFICIENCY;
    gas_stages_run(&steep, 1e5, 280, 6.7e5, &staging, &staged);
    polytrope_end(&steep, 280, 6.7, 1, s);
    check_close("isentropic work", staged.work, s[1] / 0.81, 1e-10, 0);
    check_close("isentropic T carries that work", gas_dh(&steep, 280, staged.stage[0].T_out).value, s[1] / 0.81, 1e-10,
                0);
}

static void energy_balance(void)
{
    check_seed(5);
    for (int i = 0; i < 300; i++) {
        struct gas_staging staging = plain;
        struct gas_staged staged;
        staging.count = 1 + i % 6;
        staging.kind = (enum gas_stage_efficiency)(i % 3);
        staging.efficiency = check_random(0.6, 1);
        staging.T_cool = i % 5 ? check_random(260, 340) : NAN;
        staging.aftercooler = i % 5 && i % 2;
        staging.P_drop = i % 2 ? check_random(0, 0.1e5) : 0;
        double T1 = check_random(250, 330), P2 = check_random(3e5, 20e5);
        struct gas_result done = gas_stages_run(&nitrogen, 1e5, T1, P2, &staging, &staged);
        if (!check_int("runs", (long)done.status, GAS_OK))
            continue;
        const struct gas_stage *last = &staged.stage[staged.count - 1];
        double T_end = staging.aftercooler ? fmin(staging.T_cool, last->T_out) : last->T_out;
        check_close("work less cooling is dh", staged.work - staged.cooling, gas_dh(&nitrogen, T1, T_end).value, 1e-10,
                    1e-7);
        for (int n = 0; n < staged.count; n++) {
            check_true("a cooler takes heat out or does nothing", staged.stage[n].cooling >= 0);
            check_true("work goes in", staged.stage[n].work > 0);
        }
    }
}

static void fewest_stages(void)
{
    struct gas_staging staging = plain;
    struct gas_staged staged, fewer;
    check_seed(6);
    staging.T_cool = 310;
    for (int i = 0; i < 200; i++) {
        staging.count = 0;
        staging.ratio_limit = check_random(1.6, 5);
        staging.P_drop_fraction = i % 2 ? 0.02 : 0;
        staging.P_drop = i % 2 ? 0 : 0.1e5;
        double P2 = 1e5 * exp(check_random(0.1, 5));
        struct gas_result done = gas_stages_run(&nitrogen, 1e5, 300, P2, &staging, &staged);
        if (!check_int("found", (long)done.status, GAS_OK))
            continue;
        check_true("below the limit", staged.stage[0].ratio <= staging.ratio_limit * (1 + 1e-11));
        staging.count = staged.count - 1;
        if (staging.count == 0)
            continue;
        done = gas_stages_run(&nitrogen, 1e5, 300, P2, &staging, &fewer);
        check_true("one less is too few", done.status || fewer.stage[0].ratio > staging.ratio_limit);
    }
    staging = plain;
    staging.count = 0;
    staging.T_cool = 300;
    staging.ratio_limit = 3;
    for (int n = 1; n < 7; n++) {
        gas_stages_run(&nitrogen, 1e5, 300, 1e5 * pow(3, n), &staging, &staged);
        check_int("a limit met exactly", staged.count, n);
    }
}

static void coolers(void)
{
    struct gas_staging staging = plain;
    struct gas_staged staged;
    staging.count = 2;
    staging.T_cool = 280; /* below the suction: chilled water */
    gas_stages_run(&nitrogen, 1e5, 300, 9e5, &staging, &staged);
    check_close("chilled", staged.stage[1].T_in, 280, 0, 0);
    check_close("duty", staged.cooling, -gas_dh(&nitrogen, staged.stage[0].T_out, 280).value, 1e-14, 0);
    staging.T_cool = 320; /* cold suction: the first discharge is colder than the cooler */
    gas_stages_run(&nitrogen, 1e5, 210, 4e5, &staging, &staged);
    check_close("nothing to cool", staged.stage[0].cooling, 0, 0, 0);
    check_close("nothing to cool", staged.stage[1].T_in, staged.stage[0].T_out, 0, 0);
    staging = plain;
    staging.count = 2;
    staging.T_cool = 300;
    check_int("two stages stay in the data", (long)gas_stages_run(&steep, 1e5, 300, 1e11, &staging, &staged).status,
              GAS_OK);
    check_true("a single stage may leave the data", isnan(staged.single_work));
}

static void bad(const char *id, const struct gas *gas, double P1, double T1, double P2,
                const struct gas_staging *staging, enum gas_status status, int argument)
{
    struct gas_staged staged;
    struct gas_result got = gas_stages_run(gas, P1, T1, P2, staging, &staged);
    check_int(id, (long)got.status, (long)status);
    check_int(id, got.argument, argument);
    check_true(id, isnan(got.value) && isnan(staged.work) && isnan(staged.input) && staged.count == 0);
}

static void bad_staging(const char *id, struct gas_staging staging, enum gas_status status, int argument)
{
    bad(id, &nitrogen, 1e5, 300, 8e5, &staging, status, argument);
}

#define WITH(...)                                                                                                      \
    (struct gas_staging)                                                                                               \
    {                                                                                                                  \
        .count = 2, .kind = GAS_ISENTROPIC_EFFICIENCY, .efficiency = 1, .T_cool = NAN, .drive = 1, __VA_ARGS__         \
    }
#pragma GCC diagnostic push
#pragma GCC diagnostic ignored "-Woverride-init"

static void bad_inputs(void)
{
    bad("P1 zero", &nitrogen, 0, 300, 8e5, &plain, GAS_NOT_POSITIVE, 1);
    bad("P1 NaN", &nitrogen, NAN, 300, 8e5, &plain, GAS_NOT_FINITE, 1);
    bad("T1 cold", &nitrogen, 1e5, 30, 8e5, &plain, GAS_OUTSIDE_DATA, 2);
    bad("T1 negative", &nitrogen, 1e5, -30, 8e5, &plain, GAS_NOT_POSITIVE, 2);
    bad("P2 below", &nitrogen, 1e5, 300, 0.8e5, &plain, GAS_UNREACHABLE, 3);
    bad("P2 the same", &nitrogen, 1e5, 300, 1e5, &plain, GAS_UNREACHABLE, 3);
    bad("P2 infinite", &nitrogen, 1e5, 300, INFINITY, &plain, GAS_NOT_FINITE, 3);
    bad("no heat capacity", &bare, 1e5, 300, 8e5, &plain, GAS_NO_HEAT_CAPACITY, 0);
    bad("too hot", &steep, 1e5, 300, 1e10, &plain, GAS_OUTSIDE_DATA, 0);
    bad_staging("count negative", WITH(.count = -1), GAS_NEGATIVE, 4);
    bad_staging("count", WITH(.count = 21), GAS_TOO_MANY, 4);
    bad_staging("no limit", WITH(.count = 0), GAS_NOT_POSITIVE, 5);
    bad_staging("limit 1", WITH(.count = 0, .ratio_limit = 1), GAS_UNREACHABLE, 5);
    bad_staging("limit NaN", WITH(.count = 0, .ratio_limit = NAN), GAS_NOT_FINITE, 5);
    bad_staging("limit too low", WITH(.count = 0, .ratio_limit = 1.05), GAS_TOO_MANY, 5);
    bad_staging("ratios for other stages", WITH(.ratio_count = 3, .ratio = {2, 2, 2}), GAS_CONTRADICTION, 5);
    bad_staging("ratio zero", WITH(.ratio_count = 2, .ratio = {2, 0}), GAS_NOT_POSITIVE, 5);
    bad_staging("ratio below 1", WITH(.ratio_count = 2, .ratio = {20, 0.9}), GAS_UNREACHABLE, 5);
    bad_staging("too many ratios", WITH(.ratio_count = 21), GAS_TOO_MANY, 5);
    bad_staging("ratios negative", WITH(.ratio_count = -2), GAS_NEGATIVE, 5);
    bad_staging("efficiency 0", WITH(.efficiency = 0), GAS_NOT_A_FRACTION, 6);
    bad_staging("efficiency in %", WITH(.efficiency = 78), GAS_NOT_A_FRACTION, 6);
    bad_staging("efficiency NaN", WITH(.efficiency = NAN), GAS_NOT_FINITE, 6);
    bad_staging("efficiency kind", WITH(.kind = (enum gas_stage_efficiency)9), GAS_NOT_APPLICABLE, 6);
    bad_staging("T_cool", WITH(.T_cool = 40), GAS_OUTSIDE_DATA, 7);
    bad_staging("T_cool 0", WITH(.T_cool = 0), GAS_NOT_POSITIVE, 7);
    bad_staging("aftercooler without temperature", WITH(.aftercooler = 1), GAS_NOT_FINITE, 7);
    bad_staging("drop negative", WITH(.P_drop = -1), GAS_NEGATIVE, 8);
    bad_staging("drop NaN", WITH(.P_drop = NAN), GAS_NOT_FINITE, 8);
    bad_staging("fraction 1", WITH(.P_drop_fraction = 1), GAS_NOT_A_FRACTION, 8);
    bad_staging("drop twice", WITH(.P_drop = 10, .P_drop_fraction = 0.1), GAS_CONTRADICTION, 8);
    bad_staging("drop eats the stage", WITH(.P_drop = 20e5), GAS_UNREACHABLE, 8);
    bad_staging("fraction eats the stage", WITH(.P_drop_fraction = 0.95), GAS_UNREACHABLE, 8);
    bad_staging("drive 0", WITH(.drive = 0), GAS_NOT_A_FRACTION, 9);
    bad_staging("drive above 1", WITH(.drive = 1.01), GAS_NOT_A_FRACTION, 9);
}
#pragma GCC diagnostic pop

const struct test_suite suite_stages = {"stages", (const struct test_case[]){{"constant k", constant_k},
                                                                             {"published", published},
                                                                             {"least work", least_work},
                                                                             {"drops", drops},
                                                                             {"variable cp", variable_cp},
                                                                             {"energy balance", energy_balance},
                                                                             {"fewest stages", fewest_stages},
                                                                             {"coolers", coolers},
                                                                             {"bad inputs", bad_inputs},
                                                                             {0}}};
