/* What must hold for every leg and path, over random gases, starts and ends. */
#include <math.h>
#include <stdio.h>

#include <gsl/gsl_integration.h>

#include <gasleaf/heat.h>

#include "check.h"
#include "path_gases.h"

enum { ROUNDS = 60 };

struct sample {
    const struct gas *gas;
    struct gas_point start;
    struct gas_leg leg;
    struct gas_point points[4];
    char id[80];
};

static const char *const process_name[] = {"isothermal", "isobaric", "isochoric", "adiabatic",
                                           "polytropic", "free",     "against",   "against isothermal",
                                           "straight",   "points",   "polytropes"};

static bool reversible(const struct gas_leg *leg)
{
    return leg->process != GAS_FREE_EXPANSION && leg->process != GAS_AGAINST &&
           leg->process != GAS_AGAINST_ISOTHERMAL && leg->efficiency == 1;
}

/* The temperature changes of these samples stay inside 200 to 2500 K, whatever the leg. */
static struct sample random_sample(int i, enum gas_process process)
{
    struct sample s = {.gas = path_gases[i % PATH_GASES],
                       .start = point_PT(check_random(0.2e5, 60e5), check_random(420, 900))};
    const double ratio = exp(check_random(-0.6, 0.6));
    s.leg = leg_of(process, process == GAS_ISOCHORIC ? GAS_BY_P_RATIO : GAS_BY_V_RATIO, ratio);
    s.leg.n = process == GAS_POLYTROPIC ? check_random(-0.9, 1.9) : NAN;
    if (process == GAS_FREE_EXPANSION)
        s.leg.value = fmax(ratio, 1 / ratio);
    if (process == GAS_AGAINST || process == GAS_AGAINST_ISOTHERMAL) /* never past the balance */
        s.leg.P_outside = s.start.P * (ratio > 1 ? 0.3 : 4.5);
    if (process == GAS_STRAIGHT) {
        s.leg.ending = GAS_TO_P_AND_V;
        s.leg.value = s.start.P * exp(check_random(-0.5, 0.5));
        s.leg.second = s.start.v * exp(check_random(-0.2, 0.5));
    }
    if (process == GAS_THROUGH_POINTS || process == GAS_THROUGH_POLYTROPES)
        s.leg.ending = GAS_TO_LAST_POINT;
    snprintf(s.id, sizeof s.id, "%s %d", process_name[process], i);
    return s;
}

static void give_points(struct sample *s)
{
    double P = s->start.P, v = 3.17; /* volumes of any amount */
    for (int k = 0; k < 4; k++) {
        s->points[k] = (struct gas_point){.P = P, .v = v};
        P *= exp(check_random(-0.15, 0.15));
        v *= exp(check_random(-0.15, 0.15));
    }
    s->leg.point = s->points;
    s->leg.point_count = 4;
}

static bool run(struct sample *s, enum gas_system system, struct gas_change *change)
{
    if (s->leg.process == GAS_THROUGH_POINTS || s->leg.process == GAS_THROUGH_POLYTROPES)
        give_points(s);
    const struct gas_result r = gas_leg_run(s->gas, system, &s->start, NULL, &s->leg, change);
    return check_int(s->id, r.status, GAS_OK) && check_close(s->id, r.value, change->W, 0, 0);
}

/* The scale of an energy at this sample, for absolute tolerances: R T1. */
static double scale(const struct sample *s)
{
    return GAS_R * s->start.T;
}

static bool in_flow(enum gas_process process)
{
    return process != GAS_AGAINST && process != GAS_AGAINST_ISOTHERMAL;
}

static void over_all(void (*test)(struct sample *, enum gas_system, const struct gas_change *), int seed)
{
    check_seed((unsigned long long)seed);
    for (int process = GAS_ISOTHERMAL; process <= GAS_THROUGH_POLYTROPES; process++)
        for (int i = 0; i < ROUNDS; i++)
            for (int system = GAS_CLOSED; system <= (in_flow((enum gas_process)process) ? GAS_FLOW : GAS_CLOSED);
                 system++) {
                struct sample s = random_sample(i, (enum gas_process)process);
                struct gas_change change;
                if (run(&s, (enum gas_system)system, &change))
                    test(&s, (enum gas_system)system, &change);
            }
}

/* Q + W = dU or dH, P v = R T, and the state functions are those of the two ends. */
static void law(struct sample *s, enum gas_system system, const struct gas_change *c)
{
    const double energy = system == GAS_FLOW ? c->dH : c->dU;
    check_close(s->id, c->Q + c->W, energy, 1e-14, 1e-13 * scale(s));
    check_close(s->id, c->Q_in - c->Q_out, c->Q, 1e-12, 1e-12 * scale(s));
    check_true(s->id, c->Q_in >= 0 && c->Q_out >= 0);
    check_close(s->id, c->end.P * c->end.v, GAS_R * c->end.T, 1e-14, 0);
    check_close(s->id, c->dH - c->dU, GAS_R * (c->end.T - s->start.T), 1e-12, 1e-12 * scale(s));
    check_close(s->id, c->dU, gas_du(s->gas, s->start.T, c->end.T).value, 1e-11, 1e-11 * scale(s));
    check_close(s->id, c->dS, gas_ds(s->gas, s->start.T, s->start.P, c->end.T, c->end.P).value, 1e-11, 1e-10);
    check_true(s->id, c->v_least <= fmin(s->start.v, c->end.v) && c->v_most >= fmax(s->start.v, c->end.v));
    check_true(s->id, reversible(&s->leg) ? c->S_made == 0 : c->S_made > 0);
}

static void law_of_every_leg(void)
{
    over_all(law, 1);
}

/* A reversible leg taken back to where it began gives back work, heat and entropy. */
static void back(struct sample *s, enum gas_system system, const struct gas_change *c)
{
    struct gas_leg leg = s->leg;
    struct gas_change again;
    if (!reversible(&leg) || leg.process >= GAS_THROUGH_POINTS)
        return;
    leg.ending = GAS_TO_START;
    const struct gas_result r = gas_leg_run(s->gas, system, &c->end, &s->start, &leg, &again);
    check_int(s->id, r.status, GAS_OK);
    check_close(s->id, again.W, -c->W, 1e-11, 1e-11 * scale(s));
    check_close(s->id, again.Q, -c->Q, 1e-11, 1e-11 * scale(s));
    check_close(s->id, again.dS, -c->dS, 1e-11, 1e-11);
    check_close(s->id, again.Q_in, c->Q_out, 1e-10, 1e-10 * scale(s));
    check_close(s->id, again.end.P, s->start.P, 1e-11, 0);
    check_close(s->id, again.end.v, s->start.v, 1e-11, 0);
}

static void reversed(void)
{
    over_all(back, 2);
}

/* Two legs by way of a place on the leg are as good as one. */
static void halved(struct sample *s, enum gas_system system, const struct gas_change *c)
{
    struct gas_point middle;
    struct gas_change first, second;
    if (s->leg.process >= GAS_THROUGH_POINTS || s->leg.efficiency < 1)
        return;
    check_int(s->id, gas_leg_at(s->gas, system, &s->start, &s->leg, c, 0.37, &middle).status, GAS_OK);
    struct gas_leg to_middle = s->leg, on = s->leg;
    to_middle.ending = on.ending = s->leg.process == GAS_ISOCHORIC ? GAS_TO_P : GAS_TO_V;
    to_middle.value = s->leg.process == GAS_ISOCHORIC ? middle.P : middle.v;
    on.value = s->leg.process == GAS_ISOCHORIC ? c->end.P : c->end.v;
    if (s->leg.process == GAS_STRAIGHT) {
        to_middle.ending = on.ending = GAS_TO_P_AND_V;
        to_middle.value = middle.P;
        to_middle.second = middle.v;
        on.value = c->end.P;
        on.second = c->end.v;
    }
    check_int(s->id, gas_leg_run(s->gas, system, &s->start, NULL, &to_middle, &first).status, GAS_OK);
    check_close(s->id, first.end.P, middle.P, 1e-11, 0);
    check_close(s->id, first.end.T, middle.T, 1e-11, 0);
    check_int(s->id, gas_leg_run(s->gas, system, &first.end, NULL, &on, &second).status, GAS_OK);
    check_close(s->id, first.W + second.W, c->W, 1e-11, 1e-11 * scale(s));
    check_close(s->id, first.Q + second.Q, c->Q, 1e-11, 1e-11 * scale(s));
    check_close(s->id, first.Q_in + second.Q_in, c->Q_in, 1e-10, 1e-10 * scale(s));
    check_close(s->id, first.dS + second.dS, c->dS, 1e-11, 1e-11);
    check_close(s->id, first.S_made + second.S_made, c->S_made, 1e-11, 1e-11);
    check_close(s->id, second.end.T, c->end.T, 1e-11, 0);
}

static void split(void)
{
    over_all(halved, 3);
}

struct along {
    const struct sample *s;
    enum gas_system system;
    const struct gas_change *change;
};

/* The outside pressure where there is one, the gas pressure elsewhere. */
static double pressure_along(double fraction, void *context)
{
    const struct along *a = context;
    struct gas_point at = {NAN, NAN, NAN};
    gas_leg_at(a->s->gas, a->system, &a->s->start, &a->s->leg, a->change, fraction, &at);
    return at.P;
}

/* -integral of P dv with GSL; v is linear in the fraction. For v dP: d(P v) = P dv + v dP. */
static void quadrature(struct sample *s, enum gas_system system, const struct gas_change *c)
{
    if (!reversible(&s->leg) || s->leg.process >= GAS_THROUGH_POINTS || s->leg.process == GAS_ISOCHORIC)
        return;
    struct along a = {s, system, c};
    gsl_function f = {pressure_along, &a};
    double mean, error;
    size_t evaluations;
    gsl_integration_qng(&f, 0, 1, 0, 1e-11, &mean, &error, &evaluations);
    const double P_dv = mean * (c->end.v - s->start.v);
    const double expected = system == GAS_CLOSED ? -P_dv : c->end.P * c->end.v - s->start.P * s->start.v - P_dv;
    check_close(s->id, c->W, expected, 1e-9, 1e-10 * scale(s));
}

static void work_by_quadrature(void)
{
    over_all(quadrature, 4);
}

/* Through a table: the trapezoids, and the power laws, each stretch by GSL on its own. */
struct stretch {
    double P, v, P2, v2;
    bool power;
};

static double stretch_pressure(double v, void *context)
{
    const struct stretch *k = context;
    if (k->power)
        return k->P * pow(v / k->v, log(k->P2 / k->P) / log(k->v2 / k->v));
    return k->P + (k->P2 - k->P) * (v - k->v) / (k->v2 - k->v);
}

static void table(struct sample *s, enum gas_system system, const struct gas_change *c)
{
    double P_dv = 0, error;
    size_t evaluations;
    if (s->leg.process < GAS_THROUGH_POINTS)
        return;
    for (int k = 0; k < 3; k++) {
        const struct gas_point *p = &s->points[k];
        struct stretch stretch = {p[0].P, p[0].v, p[1].P, p[1].v, s->leg.process == GAS_THROUGH_POLYTROPES};
        gsl_function f = {stretch_pressure, &stretch};
        double part;
        gsl_integration_qng(&f, p[0].v, p[1].v, 0, 1e-11, &part, &error, &evaluations);
        P_dv += part * s->start.v / s->points[0].v;
    }
    const double expected = system == GAS_CLOSED ? -P_dv : c->end.P * c->end.v - s->start.P * s->start.v - P_dv;
    check_close(s->id, c->W, expected, 1e-9, 1e-10 * scale(s));
    check_close(s->id, c->end.v, s->start.v * s->points[3].v / s->points[0].v, 1e-14, 0);
}

static void table_by_quadrature(void)
{
    over_all(table, 5);
}

/* The law each process is named after, at a place on the way. */
static void on_the_way(struct sample *s, enum gas_system system, const struct gas_change *c)
{
    struct gas_point at, end;
    const double fraction = check_random(0.05, 0.95);
    const struct gas_point *a = &s->start;
    check_int(s->id, gas_leg_at(s->gas, system, a, &s->leg, c, fraction, &at).status, GAS_OK);
    gas_leg_at(s->gas, system, a, &s->leg, c, 1, &end);
    check_close(s->id, end.P, c->end.P, 0, 0);
    check_close(s->id, at.P * at.v, GAS_R * at.T, 1e-12, 0);
    switch (s->leg.process) {
    case GAS_ISOTHERMAL:
    case GAS_FREE_EXPANSION:
    case GAS_AGAINST_ISOTHERMAL:
        check_close(s->id, at.T, a->T, 1e-13, 0);
        break;
    case GAS_ISOBARIC:
        check_close(s->id, at.P, a->P, 1e-13, 0);
        break;
    case GAS_ISOCHORIC:
        check_close(s->id, at.v, a->v, 1e-13, 0);
        break;
    case GAS_ADIABATIC:
        check_close(s->id, gas_ds(s->gas, a->T, a->P, at.T, at.P).value, 0, 0, 1e-10);
        break;
    case GAS_POLYTROPIC:
        check_close(s->id, log(at.P / a->P), -s->leg.n * log(at.v / a->v), 1e-11, 1e-12);
        break;
    case GAS_AGAINST:
        check_close(s->id, gas_du(s->gas, a->T, at.T).value, -s->leg.P_outside * (at.v - a->v), 1e-10,
                    1e-11 * scale(s));
        break;
    default:
        check_true(s->id, at.P > 0);
    }
}

static void states_on_the_way(void)
{
    over_all(on_the_way, 6);
}

/* Random legs, then straight back to the start: the state functions come back to zero. */
static void round_trip(void)
{
    check_seed(7);
    for (int i = 0; i < 200; i++) {
        const struct sample s = random_sample(i, (enum gas_process)(i % GAS_STRAIGHT));
        const struct gas_leg legs[] = {s.leg, leg_of(GAS_ISOBARIC, GAS_BY_T_RATIO, check_random(0.9, 1.1)),
                                       leg_of(GAS_ADIABATIC, GAS_BY_P_RATIO, check_random(0.9, 1.1)),
                                       leg_of(GAS_STRAIGHT, GAS_TO_START, 0)};
        struct gas_change changes[4], total;
        struct gas_cycle cycle;
        struct gas_result fault;
        const struct gas_result r = gas_path_run(s.gas, GAS_CLOSED, &s.start, legs, 4, changes, &total, &fault);
        check_int(s.id, r.status, GAS_OK);
        check_close(s.id, total.dU, 0, 0, 1e-10 * scale(&s));
        check_close(s.id, total.dH, 0, 0, 1e-10 * scale(&s));
        check_close(s.id, total.dS, 0, 0, 1e-10);
        check_close(s.id, total.Q + total.W, 0, 0, 1e-10 * scale(&s));
        check_int(s.id, gas_cycle_of(&s.start, changes, 4, 1e-6, &cycle).status, GAS_OK);
        check_close(s.id, cycle.W_net, total.W, 1e-13, 0);
        check_close(s.id, cycle.Q_in - cycle.Q_out, -cycle.W_net, 1e-10, 1e-10 * scale(&s));
    }
}

/* clang-format off */
const struct test_suite suite_path = {"path", (const struct test_case[]){
    {"law of every leg", law_of_every_leg},
    {"reversed", reversed},
    {"split", split},
    {"work by quadrature", work_by_quadrature},
    {"tables by quadrature", table_by_quadrature},
    {"states on the way", states_on_the_way},
    {"round trip", round_trip},
    {0}}};
/* clang-format on */
