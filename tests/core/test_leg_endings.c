/* Each ending finds the same leg: a leg is run to a volume, then asked for again by every other figure it gave. */
#include <math.h>
#include <stdio.h>

#include <gsl/gsl_integration.h>

#include "check.h"
#include "path_gases.h"

struct asked {
    enum gas_ending ending;
    double value;
    bool sensible; /* the figure moves along this leg */
};

static void ask_again(const char *id, const struct gas *gas, enum gas_system system, const struct gas_point *start,
                      struct gas_leg leg, const struct gas_change *c)
{
    const struct gas_point *end = &c->end;
    const bool p = leg.process != GAS_ISOBARIC && leg.n != 0, v = leg.process != GAS_ISOCHORIC,
               t = fabs(end->T / start->T - 1) > 1e-4;
    const bool w = fabs(c->W) > 1e-3 && leg.process != GAS_FREE_EXPANSION;
    const bool q = c->Q != 0 && leg.process != GAS_FREE_EXPANSION;
    const struct asked asked[] = {
        {GAS_TO_P, end->P, p},   {GAS_BY_P_RATIO, end->P / start->P, p},
        {GAS_TO_V, end->v, v},   {GAS_BY_V_RATIO, end->v / start->v, v},
        {GAS_TO_T, end->T, t},   {GAS_BY_T_RATIO, end->T / start->T, t},
        {GAS_WITH_W, c->W, w},   {GAS_WITH_Q, c->Q, q},
        {GAS_TO_START, 0, true}, /* the end is told as the start of the path */
    };
    for (size_t i = 0; i < sizeof asked / sizeof asked[0]; i++) {
        struct gas_change again;
        char row[120];
        if (!asked[i].sensible)
            continue;
        leg.ending = asked[i].ending;
        leg.value = asked[i].value;
        snprintf(row, sizeof row, "%s by %d", id, (int)asked[i].ending);
        const struct gas_result r = gas_leg_run(gas, system, start, end, &leg, &again);
        if (!check_int(row, r.status, GAS_OK))
            continue;
        check_close(row, again.end.P, end->P, 2e-10, 0);
        check_close(row, again.end.T, end->T, 2e-10, 0);
        check_close(row, again.W, c->W, 2e-10, 1e-6);
        check_close(row, again.Q, c->Q, 2e-10, 1e-6);
    }
}

/* clang-format off */
/* The exponents keep cv - R/(n - 1) off zero, so that a heat has one end only. */
static const struct {
    enum gas_process process;
    double n, efficiency;
    bool closed, flow;
} kinds[] = {
    {GAS_ISOTHERMAL, NAN, 1, true, true},
    {GAS_ISOBARIC, NAN, 1, true, true},
    {GAS_ISOCHORIC, NAN, 1, true, true},
    {GAS_ADIABATIC, NAN, 1, true, true},
    {GAS_ADIABATIC, NAN, 0.78, false, true},
    {GAS_POLYTROPIC, 1, 1, true, true},
    {GAS_POLYTROPIC, 0, 1, true, true},
    {GAS_POLYTROPIC, 1 + 1e-9, 1, true, true},
    {GAS_POLYTROPIC, 1 - 1e-12, 1, true, true},
    {GAS_POLYTROPIC, 1.12, 1, true, true},
    {GAS_POLYTROPIC, -0.7, 1, true, true},
    {GAS_POLYTROPIC, 2.4, 1, true, true},
    {GAS_POLYTROPIC, NAN, 0.82, false, true},
    {GAS_POLYTROPIC, NAN, 1, false, true},
    {GAS_FREE_EXPANSION, NAN, 1, true, true},
    {GAS_AGAINST, NAN, 1, true, false},
    {GAS_AGAINST_ISOTHERMAL, NAN, 1, true, false},
};
/* clang-format on */

static void endings_agree(void)
{
    check_seed(21);
    for (size_t k = 0; k < sizeof kinds / sizeof kinds[0]; k++)
        for (int i = 0; i < 24; i++) {
            const struct gas *gas = path_gases[i % PATH_GASES];
            const struct gas_point start = point_PT(check_random(0.4e5, 30e5), check_random(420, 800));
            const bool out = i % 2 || kinds[k].process == GAS_FREE_EXPANSION;
            struct gas_leg leg = leg_of(kinds[k].process, GAS_BY_V_RATIO, out ? 1.513 : 0.724);
            if (leg.process == GAS_ISOCHORIC)
                leg = leg_of(GAS_ISOCHORIC, GAS_BY_P_RATIO, out ? 1.513 : 0.724);
            leg.n = kinds[k].n;
            leg.efficiency = kinds[k].efficiency;
            leg.P_outside = start.P * (out ? 0.41 : 2.17);
            for (int system = kinds[k].closed ? GAS_CLOSED : GAS_FLOW; system <= (int)kinds[k].flow; system++) {
                struct gas_change c;
                char id[60];
                snprintf(id, sizeof id, "kind %zu round %d", k, i);
                if (check_int(id, gas_leg_run(gas, (enum gas_system)system, &start, NULL, &leg, &c).status, GAS_OK))
                    ask_again(id, gas, (enum gas_system)system, &start, leg, &c);
            }
        }
}

/* A huge exponent is an isochoric leg but for a sliver of volume. */
static void huge_exponent(void)
{
    const struct gas_point start = point_PT(1.7e5, 310);
    struct gas_leg leg = leg_of(GAS_POLYTROPIC, GAS_TO_P, 4.1e5), rigid = leg_of(GAS_ISOCHORIC, GAS_TO_P, 4.1e5);
    for (double n = 1e7; n < 1e16; n *= 31) {
        struct gas_change c, r;
        leg.n = n;
        check_int("huge", gas_leg_run(&nitrogen, GAS_FLOW, &start, NULL, &leg, &c).status, GAS_OK);
        gas_leg_run(&nitrogen, GAS_FLOW, &start, NULL, &rigid, &r);
        check_close("huge T", c.end.T, r.end.T, 1e-6, 0);
        check_close("huge Q", c.Q, r.Q, 1e-6, 0);
        check_close("huge W", c.W, start.v * (4.1e5 - 1.7e5), 1e-6, 0);
        check_int("huge closed", gas_leg_run(&nitrogen, GAS_CLOSED, &start, NULL, &leg, &c).status, GAS_OK);
        check_close("huge closed W", c.W, (c.end.P * c.end.v - start.P * start.v) / (n - 1), 1e-8, 0);
    }
}

/* ---- losses: from the definitions, with cp integrated by GSL ---- */

static double cp_over_T(double T, void *gas)
{
    return cp_by_hand(gas, T) / T;
}

static double cp_itself(double T, void *gas)
{
    return cp_by_hand(gas, T);
}

static double by_gsl(double (*function)(double, void *), const struct gas *gas, double T1, double T2)
{
    struct gas copy = *gas; /* GSL hands on what is not const */
    gsl_function f = {function, &copy};
    double middle = T1 < 1000 && T2 > 1000 ? 1000 : T2, part, rest = 0, error; /* nitrogen's join */
    size_t evaluations;
    gsl_integration_qng(&f, T1, middle, 0, 1e-12, &part, &error, &evaluations);
    if (middle != T2)
        gsl_integration_qng(&f, middle, T2, 0, 1e-12, &rest, &error, &evaluations);
    return part + rest;
}

static void isentropic_efficiency(void)
{
    check_seed(22);
    for (int i = 0; i < 80; i++) {
        const struct gas *gas = path_gases[i % PATH_GASES];
        const struct gas_point start = point_PT(3.3e5, check_random(420, 700));
        const double eta = check_random(0.4, 0.98), r = i % 3 ? check_random(1.2, 4) : check_random(0.4, 0.9);
        const enum gas_system system = i % 2 ? GAS_FLOW : GAS_CLOSED;
        struct gas_leg leg = leg_of(GAS_ADIABATIC, i % 5 ? GAS_BY_P_RATIO : GAS_BY_V_RATIO, r);
        struct gas_change ideal, real;
        if (system == GAS_FLOW)
            leg.ending = GAS_BY_P_RATIO;
        gas_leg_run(gas, system, &start, NULL, &leg, &ideal);
        leg.efficiency = eta;
        check_int("eta", gas_leg_run(gas, system, &start, NULL, &leg, &real).status, GAS_OK);
        check_close("eta W", real.W, ideal.W > 0 ? ideal.W / eta : ideal.W * eta, 1e-11, 0);
        const double dh = by_gsl(cp_itself, gas, start.T, real.end.T);
        check_close("eta law", real.W, system == GAS_FLOW ? dh : dh - GAS_R * (real.end.T - start.T), 1e-10, 0);
        check_close("eta Q", real.Q, 0, 0, 0);
        check_close("eta dS", real.S_made,
                    by_gsl(cp_over_T, gas, start.T, real.end.T) - GAS_R * log(real.end.P / start.P), 1e-9, 1e-10);
        check_close("ideal dS", by_gsl(cp_over_T, gas, start.T, ideal.end.T), GAS_R * log(ideal.end.P / start.P), 1e-10,
                    0);
    }
}

static void polytropic_efficiency(void)
{
    check_seed(23);
    for (int i = 0; i < 60; i++) {
        const struct gas *gas = path_gases[i % PATH_GASES];
        const struct gas_point start = point_PT(1.9e5, check_random(420, 700));
        const double eta = check_random(0.5, 1), r = i % 3 ? check_random(1.2, 4) : check_random(0.4, 0.9);
        struct gas_leg leg = leg_of(GAS_POLYTROPIC, GAS_BY_P_RATIO, r);
        struct gas_change c;
        leg.efficiency = eta;
        check_int("machine", gas_leg_run(gas, GAS_FLOW, &start, NULL, &leg, &c).status, GAS_OK);
        check_close("machine T", by_gsl(cp_over_T, gas, start.T, c.end.T), GAS_R * log(r) * (r > 1 ? 1 / eta : eta),
                    1e-10, 0);
        check_close("machine W", c.W, by_gsl(cp_itself, gas, start.T, c.end.T), 1e-10, 0);
        check_close("machine Q", c.Q, 0, 0, 0);
        check_true("machine S", c.S_made >= 0);
    }
}

/* U + P_out v is kept, and at balance the gas pressure is the outside one. */
static void against_to_balance(void)
{
    check_seed(24);
    for (int i = 0; i < 60; i++) {
        const struct gas *gas = path_gases[i % PATH_GASES];
        const struct gas_point start = point_PT(2.7e5, check_random(500, 800));
        struct gas_leg leg = leg_of(GAS_AGAINST, GAS_TO_BALANCE, 0);
        struct gas_change c;
        leg.P_outside = start.P * check_random(0.3, 2.5);
        check_int("balance", gas_leg_run(gas, GAS_CLOSED, &start, NULL, &leg, &c).status, GAS_OK);
        const double dU = by_gsl(cp_itself, gas, start.T, c.end.T) - GAS_R * (c.end.T - start.T);
        check_close("balance P", c.end.P, leg.P_outside, 1e-14, 0);
        check_close("balance U", dU, -leg.P_outside * (c.end.v - start.v), 1e-9, 1e-7);
        check_true("balance S", c.S_made > 0 && c.Q == 0);
        leg.process = GAS_AGAINST_ISOTHERMAL;
        check_int("isothermal", gas_leg_run(gas, GAS_CLOSED, &start, NULL, &leg, &c).status, GAS_OK);
        check_close("isothermal W", c.W, GAS_R * start.T * (leg.P_outside / start.P - 1), 1e-12, 1e-12);
        check_close("isothermal S", c.S_made, GAS_R * log(start.P / leg.P_outside) + c.W / start.T, 1e-10, 1e-12);
    }
}

/* clang-format off */
const struct test_suite suite_leg_endings = {"leg_endings", (const struct test_case[]){
    {"endings agree", endings_agree},
    {"huge exponent", huge_exponent},
    {"isentropic efficiency", isentropic_efficiency},
    {"polytropic efficiency", polytropic_efficiency},
    {"against to balance", against_to_balance},
    {0}}};
/* clang-format on */
