#include <stdbool.h>

#include <gasleaf/heat.h>

#include "curve.h"
#include "root.h"

struct curve curve_straight(const struct gas_point *from, const struct gas_point *to)
{
    return (struct curve){.kind = CURVE_STRAIGHT, .from = *from, .dP = to->P - from->P, .dv = to->v - from->v};
}

struct curve curve_power(const struct gas_point *from, const struct gas_point *to)
{
    const double ln_v = log_ratio(to->v, from->v), ln_P = log_ratio(to->P, from->P);
    return (struct curve){.kind = CURVE_POWER, .from = *from, .ln_v = ln_v, .ln_P = ln_P, .ln_T = ln_v + ln_P};
}

struct gas_point curve_at(const struct gas *gas, const struct curve *curve, double x)
{
    const struct gas_point *from = &curve->from;
    if (curve->kind == CURVE_POWER)
        return (struct gas_point){.P = from->P * exp(x * curve->ln_P),
                                  .T = from->T * exp(x * curve->ln_T),
                                  .v = from->v * exp(x * curve->ln_v)};
    struct gas_point at = {.P = from->P + x * curve->dP, .v = from->v + x * curve->dv};
    at.T = at.P * at.v / gas->R;
    return at;
}

/* Along a power law P dv = P v d(ln v), and P v grows as exp(x ln_T): the integral is P1 v1 ln_v (e^ln_T - 1)/ln_T. */
double curve_work(const struct curve *curve, enum gas_system system, double x)
{
    const struct gas_point *from = &curve->from;
    if (curve->kind == CURVE_POWER) {
        const double stretch = from->P * from->v * x * exp_relative(x * curve->ln_T);
        return system == GAS_FLOW ? stretch * curve->ln_P : -stretch * curve->ln_v;
    }
    if (system == GAS_FLOW)
        return (from->v + 0.5 * x * curve->dv) * x * curve->dP;
    return -(from->P + 0.5 * x * curve->dP) * x * curve->dv;
}

struct heat_context {
    const struct gas *gas;
    const struct curve *curve;
};

/* dQ/dx = cv dT/dx + P dv/dx */
static double heat_rate(const void *context, double x)
{
    const struct heat_context *c = context;
    const struct gas_point at = curve_at(c->gas, c->curve, x);
    const bool power = c->curve->kind == CURVE_POWER;
    const double P_dv = power ? at.P * at.v * c->curve->ln_v : at.P * c->curve->dv;
    const double v_dP = power ? at.P * at.v * c->curve->ln_P : at.v * c->curve->dP;
    return gas_cv(c->gas, at.T).value / c->gas->R * (P_dv + v_dP) + P_dv;
}

static double heat_until(const struct heat_context *c, double x)
{
    return gas_du(c->gas, c->curve->from.T, curve_at(c->gas, c->curve, x).T).value -
           curve_work(c->curve, GAS_CLOSED, x);
}

static void add_heat(double heat, double *in, double *out)
{
    *in += heat < 0 ? 0 : heat;
    *out += heat > 0 ? 0 : -heat;
}

/* Heat and temperature go one way when volume and temperature do (or when only one of them moves). */
static bool keeps_its_sign(const struct curve *curve)
{
    if (curve->kind == CURVE_POWER)
        return curve->ln_T == 0 || curve->ln_v * curve->ln_T >= 0;
    return curve->dP * curve->dv >= 0;
}

/* A rate or heat that cannot be had is NAN and stays NAN in both sums. A place where the rate is just 0 is passed over:
 * the sign is told by the places before and after it. */
static void split(const struct heat_context *c, double heat, int pieces, double *in, double *out)
{
    double done = 0, x = 0, rate = heat_rate(c, 0);
    for (int i = 1; i <= pieces; i++) {
        const double x_next = (double)i / pieces, next = heat_rate(c, x_next);
        if (next == 0)
            continue;
        if (rate * next < 0) {
            const double until = heat_until(c, root_between(heat_rate, c, x, x_next).value);
            add_heat(until - done, in, out);
            done = until;
        }
        if (isnan(rate + next))
            done = NAN;
        x = x_next;
        rate = next;
    }
    add_heat(heat - done, in, out);
}

void curve_heats(const struct gas *gas, const struct curve *curve, double heat, int pieces, double *in, double *out)
{
    const struct heat_context c = {gas, curve};
    if (keeps_its_sign(curve))
        add_heat(heat, in, out);
    else
        split(&c, heat, pieces, in, out);
}
