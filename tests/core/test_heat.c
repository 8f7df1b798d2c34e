/*
 * Heat capacities and their integrals. Expected values are derived: the heat capacity is written out here a second
 * time with pow, sinh and cosh, and integrated by GSL's adaptive Gauss-Kronrod rule; tiny steps by the midpoint rule in
 * long double.
 */
#include <math.h>
#include <stdio.h>

#include <gasleaf/heat.h>
#include <gsl/gsl_errno.h>
#include <gsl/gsl_integration.h>

#include "check.h"

/* Constants are of the size met in print but invented, so that no factor is 0 or 1. */
static const struct gas_term sinh_term[] = {{GAS_TERM_SINH, 9.4, 1701.6, 0}};
static const struct gas_term cosh_term[] = {{GAS_TERM_COSH, 7.3, 909.79, 0}};
static const struct gas_term root_term[] = {{GAS_TERM_POWER, 131.7, 0, -0.5}, {GAS_TERM_POWER, 0.21, 0, 0.65}};
static const struct gas_term log_terms[] = {{GAS_TERM_POWER, 31.7, 0, 0}, {GAS_TERM_POWER, 2100, 0, -1}};
static const struct gas_term ratio_terms[] = {{GAS_TERM_RATIO, 4.1, 437, 0},
                                              {GAS_TERM_RATIO, 5.3, 437, 1},
                                              {GAS_TERM_RATIO, 61.7, 437, 2},
                                              {GAS_TERM_RATIO, -17.9, 437, 3},
                                              {GAS_TERM_RATIO, 8.7, 437, 6}};
static const struct gas_term small_ratio[] = {{GAS_TERM_RATIO, 71.3, 9500, 1}, {GAS_TERM_RATIO, 811.3, 9500, 4}};
static const struct gas_term stiff_pair[] = {{GAS_TERM_SINH, 11.3, 24000, 0}, {GAS_TERM_COSH, 3.9, 15000, 0}};
static const struct gas_term soft_pair[] = {{GAS_TERM_SINH, 13.1, 2.3, 0}, {GAS_TERM_COSH, 1e4, 2.1, 0}};

#define WHOLE 150, 6000
#define NO_POWERS                                                                                                      \
    {                                                                                                                  \
        0                                                                                                              \
    }
static const struct gas_interval dense[] = {{WHOLE, {2.2e5, -310.5, 41.3, -7.3e-3, 1.9e-5, -7.7e-9, 1.3e-12}, 0, NULL}};
static const struct gas_interval by_sinh[] = {{WHOLE, NO_POWERS, 1, sinh_term}};
static const struct gas_interval by_cosh[] = {{WHOLE, NO_POWERS, 1, cosh_term}};
static const struct gas_interval by_root[] = {{WHOLE, NO_POWERS, 2, root_term}};
static const struct gas_interval by_log[] = {{WHOLE, NO_POWERS, 2, log_terms}};
static const struct gas_interval by_ratio[] = {{WHOLE, NO_POWERS, 5, ratio_terms}};
static const struct gas_interval by_small_ratio[] = {{WHOLE, {0, 0, 29.3}, 2, small_ratio}};
static const struct gas_interval by_stiff[] = {{WHOLE, {0, 0, 29.1}, 2, stiff_pair}};
static const struct gas_interval by_soft[] = {{WHOLE, NO_POWERS, 2, soft_pair}};
/* Nitrogen: NASA/TP-2002-211556 (2002), constants of cp/R, here multiplied by 8.314510. */
#define N(a) (8.314510 * (a))
static const struct gas_interval nitrogen[] = {
    {200,
     1000,
     {N(2.210371497E+04), N(-3.818461820E+02), N(6.082738360E+00), N(-8.530914410E-03), N(1.384646189E-05),
      N(-9.625793620E-09), N(2.519705809E-12)},
     0,
     NULL},
    {1000,
     6000,
     {N(5.877124060E+05), N(-2.239249073E+03), N(6.066949220E+00), N(-6.139685500E-04), N(1.491806679E-07),
      N(-1.923105485E-11), N(1.061954386E-15)},
     0,
     NULL},
};
static const struct gas_interval mixed[] = {{150, 700, {0, 0, 27.3, 5e-3}, 1, sinh_term},
                                            {700, 2300, {0, 0, 24.1, 9e-3}, 1, cosh_term},
                                            {2300, 6000, {0, 0, 39.7, 2e-3}, 5, ratio_terms}};
static const struct gas_interval constant[] = {{0, INFINITY, {0, 0, 29.27}, 0, NULL}};
static const struct gas_interval rising[] = {{0, INFINITY, {0, 0, 28.58, 3.77e-3}, 0, NULL}};

#define GAS(row, count)                                                                                                \
    {                                                                                                                  \
        GAS_R, 0.028, GAS_CP_INTEGRATED, count, row                                                                    \
    }
static const struct row {
    const char *id;
    struct gas gas;
} rows[] = {{"dense", GAS(dense, 1)},
            {"sinh", GAS(by_sinh, 1)},
            {"cosh", GAS(by_cosh, 1)},
            {"root", GAS(by_root, 1)},
            {"log", GAS(by_log, 1)},
            {"ratio", GAS(by_ratio, 1)},
            {"far ratio", GAS(by_small_ratio, 1)},
            {"stiff", GAS(by_stiff, 1)},
            {"soft", GAS(by_soft, 1)},
            {"nitrogen", GAS(nitrogen, 2)},
            {"mixed", GAS(mixed, 3)}};
enum { ROWS = sizeof rows / sizeof rows[0] };

static const struct {
    double T1, T2;
} spans[] = {{300, 1200},    {211.3, 5873}, {1450, 310},   {990, 1010},
             {2309.7, 2311}, {210, 213.7},  {410.3, 2700}, {5900, 203}};
enum { SPANS = sizeof spans / sizeof spans[0] };

/* ---- the second method ----------------------------------------------------------------------------------- */

static long double term_by_hand(const struct gas_term *term, long double T)
{
    long double x = term->scale / T;
    switch (term->kind) {
    case GAS_TERM_POWER:
        return powl(T, term->exponent);
    case GAS_TERM_SINH:
        return x / sinhl(x) * x / sinhl(x);
    case GAS_TERM_COSH:
        return x / coshl(x) * x / coshl(x);
    case GAS_TERM_RATIO:
        return powl(T / (T + term->scale), term->exponent);
    }
    return NAN;
}

static long double cp_by_hand(const struct gas_interval *interval, long double T)
{
    long double cp = 0;
    for (int i = 0; i < GAS_POWERS; i++)
        cp += interval->power[i] * powl(T, i + GAS_POWER_LOWEST);
    for (size_t i = 0; i < interval->term_count; i++)
        cp += interval->term[i].factor * term_by_hand(&interval->term[i], T);
    return cp;
}

struct integrand {
    const struct gas_interval *interval;
    bool over_T;
};

static double integrand(double T, void *of)
{
    const struct integrand *what = of;
    return (double)(cp_by_hand(what->interval, T) / (what->over_T ? T : 1));
}

static double quadrature(const struct gas *gas, double T1, double T2, bool over_T)
{
    enum { ROOM = 200 };
    double low = fmin(T1, T2), high = fmax(T1, T2), sum = 0;
    gsl_set_error_handler_off();
    gsl_integration_workspace *space = gsl_integration_workspace_alloc(ROOM);
    for (size_t i = 0; i < gas->interval_count; i++) {
        struct integrand of = {&gas->interval[i], over_T};
        gsl_function function = {integrand, &of};
        double from = fmax(low, gas->interval[i].T_from), to = fmin(high, gas->interval[i].T_to), part, error;
        if (from >= to)
            continue;
        gsl_integration_qag(&function, from, to, 0, 1e-13, ROOM, GSL_INTEG_GAUSS61, space, &part, &error);
        sum += part;
    }
    gsl_integration_workspace_free(space);
    return T1 < T2 ? sum : -sum;
}

/* ---- rows ------------------------------------------------------------------------------------------------ */

static const char *label(const struct row *row, const char *what, double T1, double T2)
{
    static char text[100];
    snprintf(text, sizeof text, "%s %s %g to %g K", row->id, what, T1, T2);
    return text;
}

static void integrals_against_quadrature(void)
{
    for (int i = 0; i < ROWS; i++)
        for (int k = 0; k < SPANS; k++) {
            const struct gas *gas = &rows[i].gas;
            double T1 = spans[k].T1, T2 = spans[k].T2;
            double dh = quadrature(gas, T1, T2, false), ds = quadrature(gas, T1, T2, true);
            check_close(label(&rows[i], "dh", T1, T2), gas_dh(gas, T1, T2).value, dh, 1e-11, 0);
            check_close(label(&rows[i], "ds", T1, T2), gas_ds_isobaric(gas, T1, T2).value, ds, 1e-11, 0);
            check_close("du", gas_du(gas, T1, T2).value, dh - GAS_R * (T2 - T1), 0, 1e-10 * fabs(dh));
            check_close("ds at V", gas_ds_isochoric(gas, T1, T2).value, ds - GAS_R * log(T2 / T1), 0,
                        1e-10 * fabs(ds) + 1e-13);
            check_close("mean", gas_cp_mean(gas, T1, T2).value, dh / (T2 - T1), 1e-11, 0);
        }
}

/* Over so short a step the midpoint rule is exact to 1e-16; the step itself is T2 - T1 without error. */
static void tiny_steps_keep_their_digits(void)
{
    static const double steps[] = {1e-9, 1e-7, -1e-9, 3e-12};
    for (int i = 0; i < ROWS; i++)
        for (int k = 0; k < 4; k++)
            for (double T1 = 231.7; T1 < 4000; T1 *= 2.1) {
                const struct gas *gas = &rows[i].gas;
                double T2 = T1 * (1 + steps[k]);
                size_t at = 0;
                while (T1 > gas->interval[at].T_to)
                    at++;
                long double middle = ((long double)T1 + T2) / 2, step = (long double)T2 - T1;
                double dh = (double)(cp_by_hand(&gas->interval[at], middle) * step);
                double ds = (double)(cp_by_hand(&gas->interval[at], middle) * step / middle);
                check_close(label(&rows[i], "dh", T1, steps[k]), gas_dh(gas, T1, T2).value, dh, 1e-12, 0);
                check_close(label(&rows[i], "ds", T1, steps[k]), gas_ds_isobaric(gas, T1, T2).value, ds, 1e-12, 0);
            }
}

static void heat_capacities(void)
{
    for (int i = 0; i < ROWS; i++)
        for (double T = 201.3; T < 6000; T *= 1.31) {
            const struct gas *gas = &rows[i].gas;
            size_t at = 0;
            while (T > gas->interval[at].T_to)
                at++;
            double cp = (double)cp_by_hand(&gas->interval[at], T);
            check_close(label(&rows[i], "cp", T, T), gas_cp(gas, T).value, cp, 1e-13, 0);
            check_close("cp - cv", gas_cp(gas, T).value - gas_cv(gas, T).value, GAS_R, 1e-14, 1e-14 * cp);
            if (cp > 1.1 * GAS_R)
                check_close("gamma", gas_gamma(gas, T).value, cp / (cp - GAS_R), 1e-12, 0);
        }
}

/* Chase, NIST-JANAF Thermochemical Tables, 4th ed. (1998), N2 at 500 and 1500 K; cp of N2 differs from the fit by
 * less than 0.1 % there. */
static void nitrogen_as_tabulated(void)
{
    const struct gas gas = GAS(nitrogen, 2);
    check_close("cp 500", gas_cp(&gas, 500).value, 29.580, 1e-3, 0);
    check_close("cp 1500", gas_cp(&gas, 1500).value, 34.843, 1e-3, 0);
    check_close("dh 298.15 to 1500", gas_dh(&gas, 298.15, 1500).value, 38405, 1e-3, 0);
    check_close("ds 298.15 to 1500", gas_ds_isobaric(&gas, 298.15, 1500).value, 241.880 - 191.609, 1e-3, 0);
}

static void changes_split_and_reverse(void)
{
    for (int i = 0; i < ROWS; i++) {
        const struct gas *gas = &rows[i].gas;
        double whole = gas_dh(gas, 170, 5500).value;
        check_close(rows[i].id, gas_dh(gas, 170, 2300).value + gas_dh(gas, 2300, 5500).value, whole, 1e-13, 0);
        check_close(rows[i].id, gas_dh(gas, 5500, 170).value, -whole, 0, 0);
        check_close(rows[i].id, gas_dh(gas, 777.7, 777.7).value, 0, 0, 0);
        double ds = gas_ds(gas, 300, 1e5, 450, 7.3e5).value;
        check_close("pressure part", ds, quadrature(gas, 300, 450, true) - GAS_R * log(7.3), 0, 1e-10);
    }
    check_close("small pressure step", gas_ds(&rows[0].gas, 300, 1e5, 300, 1e5 * (1 + 1e-10)).value / GAS_R,
                -log1p((1e5 * (1 + 1e-10) - 1e5) / 1e5), 1e-14, 0);
}

static void inverses_go_back(void)
{
    check_seed(71);
    for (int n = 0; n < 3000; n++) {
        const struct gas *gas = &rows[n % 2 ? 9 : n % ROWS].gas;
        bool at_volume = gas->interval != by_sinh && gas->interval != by_cosh && gas->interval != by_stiff;
        double T1 = check_random(200, 5900),
               T2 = n % 7 ? check_random(200, 5900) : T1 * (1 + check_random(-1, 1) * 1e-6);
        if (n % 11 == 0)
            T2 = n % 2 ? 1000 : 6000; /* a join, an end */
        /* the change itself is a double: an ulp of it is worth this much of T2 */
        double ulp = 1e-15 * fabs(T2 - T1);
        check_close("dh", gas_T_after_dh(gas, T1, gas_dh(gas, T1, T2).value).value, T2, 1e-12, ulp);
        check_close("ds", gas_T_after_ds_isobaric(gas, T1, gas_ds_isobaric(gas, T1, T2).value).value, T2, 1e-12, ulp);
        if (!at_volume || gas_cv(gas, 200).value <= 0)
            continue;
        check_close("du", gas_T_after_du(gas, T1, gas_du(gas, T1, T2).value).value, T2, 1e-12, ulp);
        check_close("dsV", gas_T_after_ds_isochoric(gas, T1, gas_ds_isochoric(gas, T1, T2).value).value, T2, 1e-12,
                    ulp);
    }
}

static void inverses_without_a_range(void)
{
    const struct gas level = GAS(constant, 1), ramp = GAS(rising, 1);
    check_close("exact", gas_T_after_dh(&level, 300.3, 0).value, 300.3, 0, 0);
    check_close("constant", gas_T_after_dh(&level, 300, 29.27 * 512).value, 812, 1e-14, 0);
    check_close("cooled", gas_T_after_dh(&level, 300, -29.27 * 299).value, 1, 1e-12, 0);
    check_close("entropy", gas_T_after_ds_isobaric(&level, 300, 29.27 * 2).value, 300 * exp(2), 1e-14, 0);
    check_close("much", gas_T_after_ds_isobaric(&level, 300, -29.27 * 20).value, 300 * exp(-20), 1e-13, 0);
    /* 28.58 (T2 - T1) + 3.77e-3 (T2^2 - T1^2)/2 = dh, solved as a quadratic */
    double a = 3.77e-3 / 2, b = 28.58, c = -(b * 300 + a * 9e4) - 5e5;
    check_close("quadratic", gas_T_after_dh(&ramp, 300, 5e5).value, (-b + sqrt(b * b - 4 * a * c)) / (2 * a), 1e-13, 0);
    check_int("below nothing", gas_T_after_dh(&level, 300, -29.27 * 301).status, GAS_UNREACHABLE);
    check_int("too hot", gas_T_after_dh(&level, 300, 1e300).status, GAS_UNREACHABLE);
}

static void rules_of_hand_calculation(void)
{
    const struct gas integrated = GAS(nitrogen, 2);
    struct gas ends = integrated, middle = integrated;
    ends.rule = GAS_CP_MEAN_OF_ENDS;
    middle.rule = GAS_CP_AT_MEAN;
    double T1 = 313.7, T2 = 1571.9, at_ends = 0, at_middle = (double)cp_by_hand(&nitrogen[0], (T1 + T2) / 2);
    at_ends = (double)(cp_by_hand(&nitrogen[0], T1) + cp_by_hand(&nitrogen[1], T2)) / 2;
    check_close("ends dh", gas_dh(&ends, T1, T2).value, at_ends * (T2 - T1), 1e-13, 0);
    check_close("ends ds", gas_ds_isobaric(&ends, T1, T2).value, at_ends * log(T2 / T1), 1e-13, 0);
    check_close("ends du", gas_du(&ends, T1, T2).value, (at_ends - GAS_R) * (T2 - T1), 1e-13, 0);
    check_close("middle dh", gas_dh(&middle, T2, T1).value, at_middle * (T1 - T2), 1e-13, 0);
    check_close("middle dsV", gas_ds_isochoric(&middle, T1, T2).value, (at_middle - GAS_R) * log(T2 / T1), 1e-13, 0);
    check_close("mean of one", gas_cp_mean(&ends, T1, T1).value, gas_cp(&ends, T1).value, 0, 0);
    const struct gas *ruled[] = {&ends, &middle};
    for (int i = 0; i < 2; i++)
        for (T2 = 205; T2 < 6000; T2 *= 1.07) {
            check_close("dh back", gas_T_after_dh(ruled[i], T1, gas_dh(ruled[i], T1, T2).value).value, T2, 1e-12, 0);
            double ds = gas_ds_isochoric(ruled[i], T1, T2).value;
            check_close("ds back", gas_T_after_ds_isochoric(ruled[i], T1, ds).value, T2, 1e-12, 0);
        }
}

static void refused(const char *id, struct gas_result got, enum gas_status status, int argument, double figure)
{
    check_int(id, got.status, status);
    check_int(id, got.argument, argument);
    check_true(id, got.figure == figure || (isnan(got.figure) && isnan(figure)));
    check_true(id, isnan(got.value));
}

static void refusals(void)
{
    const struct gas gas = GAS(nitrogen, 2), unknown = GAS(NULL, 0), level = GAS(constant, 1);
    refused("cold", gas_cp(&gas, 25), GAS_OUTSIDE_DATA, 2, 25);
    refused("hot", gas_dh(&gas, 300, 6001), GAS_OUTSIDE_DATA, 3, 6001);
    refused("both", gas_du(&gas, 25, 6001), GAS_OUTSIDE_DATA, 2, 25);
    refused("fourth", gas_ds(&gas, 300, 1e5, 150, 1e5), GAS_OUTSIDE_DATA, 4, 150);
    refused("vacuum", gas_ds(&gas, 300, 0, 400, 1e5), GAS_NOT_POSITIVE, 3, 0);
    refused("pressure", gas_ds(&gas, 300, 1e5, 400, NAN), GAS_NOT_FINITE, 5, NAN);
    refused("nan", gas_cv(&gas, NAN), GAS_NOT_FINITE, 2, NAN);
    refused("infinite", gas_gamma(&level, INFINITY), GAS_NOT_FINITE, 2, INFINITY);
    refused("zero", gas_ds_isobaric(&level, 300, 0), GAS_NOT_POSITIVE, 3, 0);
    refused("negative", gas_cp_mean(&level, -5, 300), GAS_NOT_POSITIVE, 2, -5);
    refused("no cp", gas_ds_isochoric(&unknown, 300, 400), GAS_NO_HEAT_CAPACITY, 1, NAN);
    refused("no cp", gas_T_after_du(&unknown, 300, 400), GAS_NO_HEAT_CAPACITY, 1, NAN);
    refused("above data", gas_T_after_dh(&gas, 300, 1e6), GAS_OUTSIDE_DATA, 0, 6000);
    refused("below data", gas_T_after_ds_isobaric(&gas, 300, -40), GAS_OUTSIDE_DATA, 0, 200);
    refused("at the top", gas_T_after_dh(&gas, 6000, 1), GAS_OUTSIDE_DATA, 0, 6000);
    refused("nan change", gas_T_after_dh(&gas, 300, NAN), GAS_NOT_FINITE, 3, NAN);
    check_int("slack", gas_cp(&gas, 200 * (1 - 1e-10)).status, GAS_OK);
    check_int("slack", gas_dh(&gas, 300, 6000 * (1 + 1e-10)).status, GAS_OK);
    check_true("no range", isnan(gas_range_of(&unknown).T_from));
    check_close("range", gas_range_of(&gas).T_to, 6000, 0, 0);
}

const struct test_suite suite_heat = {
    "heat", (const struct test_case[]){{"integrals against quadrature", integrals_against_quadrature},
                                       {"tiny steps", tiny_steps_keep_their_digits},
                                       {"heat capacities", heat_capacities},
                                       {"nitrogen as tabulated", nitrogen_as_tabulated},
                                       {"splits and reversals", changes_split_and_reverse},
                                       {"inverses", inverses_go_back},
                                       {"inverses without a range", inverses_without_a_range},
                                       {"rules of hand calculation", rules_of_hand_calculation},
                                       {"refusals", refusals},
                                       {0}}};
