/* Legs that no gas can take back: free expansion, and a piston against a constant outside pressure. */
#include <gasleaf/heat.h>

#include "curve.h"
#include "leg.h"
#include "root.h"

static const double ALIKE = 1e-9; /* pressures and volumes as near as this are the same */

static struct gas_point at_v(const struct leg_case *lc, double v, double T)
{
    return (struct gas_point){.P = lc->gas->R * T / v, .T = T, .v = v};
}

static struct gas_point at_P(const struct leg_case *lc, double P, double T)
{
    return (struct gas_point){.P = P, .T = T, .v = lc->gas->R * T / P};
}

/* Nothing is pushed, nothing heated: u, h and T stay, the volume can only grow. In flow this is a throttle. */
struct gas_result leg_free_run(const struct leg_case *lc, struct gas_change *change)
{
    const struct gas_point *start = &lc->start;
    if (lc->leg.ending == GAS_TO_T)
        return leg_held(lc, lc->leg.value, start->T);
    change->end = lc->leg.ending == GAS_TO_P ? at_P(lc, lc->leg.value, start->T) : at_v(lc, lc->leg.value, start->T);
    if (change->end.v < start->v * (1 - ALIKE))
        return leg_unreachable(lc);
    change->W = 0;
    return leg_close_adiabatic(lc, change);
}

struct gas_result leg_free_at(const struct leg_case *lc, const struct gas_change *change, double fraction,
                              struct gas_point *at)
{
    *at = at_v(lc, lc->start.v + fraction * (change->end.v - lc->start.v), lc->start.T);
    return gas_good(at->P);
}

/* The piston moves out only while the outside pressure is below the gas pressure, in only while it is above, and
 * stops where they are equal. */
static struct gas_result check_side(const struct leg_case *lc, const struct gas_point *end)
{
    const double P1 = lc->start.P, P_out = lc->leg.P_outside;
    const double moved = end->v / lc->start.v - 1;
    const bool out = moved > ALIKE, in = moved < -ALIKE;
    if ((out && P_out > fmin(P1, end->P) * (1 + ALIKE)) || (in && P_out < fmax(P1, end->P) * (1 - ALIKE)))
        return gas_bad(GAS_WRONG_SIDE, LEG_OUTSIDE, P_out);
    return gas_good(0);
}

static struct gas_result adiabatic_at_v(const struct leg_case *lc, double v, struct gas_point *at)
{
    const struct gas_result T = gas_T_after_du(lc->gas, lc->start.T, -lc->leg.P_outside * (v - lc->start.v));
    *at = at_v(lc, v, T.value);
    return T;
}

/* dU + P_out (v2 - v1) = 0 with v2 = R T2/P2 is dU + R q (T2 - T1) = R T1 (P_out/P1 - q), q = P_out/P2. */
struct pressure_ending {
    const struct leg_case *lc;
    double q, right;
};

static double balance_missing(const void *context, double T)
{
    const struct pressure_ending *e = context;
    const double T1 = e->lc->start.T;
    return leg_du(e->lc->gas, T1, T).value + e->lc->gas->R * e->q * (T - T1) - e->right;
}

static struct gas_result adiabatic_at_P(const struct leg_case *lc, double P, struct gas_point *at)
{
    const double P1 = lc->start.P, T1 = lc->start.T, P_out = lc->leg.P_outside;
    if (P < fmin(P1, P_out) * (1 - ALIKE) || P > fmax(P1, P_out) * (1 + ALIKE))
        return gas_bad(GAS_WRONG_SIDE, LEG_OUTSIDE, P_out);
    const struct pressure_ending e = {lc, P_out / P, lc->gas->R * T1 * (P_out / P1 - P_out / P)};
    struct gas_result T = gas_good(T1);
    if (e.q == 1) {
        T = gas_T_after_dh(lc->gas, T1, e.right);
    } else if (e.right != 0) {
        const struct gas_range range = gas_range_of(lc->gas);
        const struct gas_result known = gas_cv(lc->gas, T1);
        if (known.status)
            return known;
        const double farthest = T1 + e.right / (lc->gas->R * e.q); /* cv above 0 leaves T2 nearer than that */
        const double limit = fmin(fmax(farthest, range.T_from), range.T_to);
        T = root_between(balance_missing, &e, T1, limit > 0 ? limit : 1e-6 * T1);
        if (T.status == GAS_UNREACHABLE)
            return gas_bad(GAS_OUTSIDE_DATA, 0, limit);
    }
    *at = at_P(lc, P, T.value);
    return T;
}

static struct gas_result adiabatic_at_T(const struct leg_case *lc, struct gas_point *at)
{
    if (lc->leg.P_outside == 0)
        return leg_held(lc, lc->leg.value, lc->start.T);
    const struct gas_result du = leg_du(lc->gas, lc->start.T, lc->leg.value);
    const double v = lc->start.v - du.value / lc->leg.P_outside;
    if (!du.status && !(v > 0))
        return leg_unreachable(lc);
    *at = at_v(lc, v, lc->leg.value);
    return du;
}

/* The volume after work or, isothermally, heat; both are P_out times the volume swept. */
static struct gas_result volume_after(const struct leg_case *lc, double work, double *v)
{
    if (lc->leg.P_outside == 0)
        return leg_held(lc, work, 0);
    *v = lc->start.v - work / lc->leg.P_outside;
    return *v > 0 ? gas_good(*v) : leg_unreachable(lc);
}

static struct gas_result against_end(const struct leg_case *lc, struct gas_point *end)
{
    const bool isothermal = lc->leg.process == GAS_AGAINST_ISOTHERMAL;
    const double T1 = lc->start.T;
    double v = lc->leg.value, P = v; /* whichever the ending means */
    struct gas_result r;
    switch (lc->leg.ending) {
    case GAS_TO_BALANCE:
        P = lc->leg.P_outside;
        if (!(P > 0))
            return gas_bad(GAS_UNREACHABLE, LEG_OUTSIDE, P);
        /* falls through */
    case GAS_TO_P:
        if (!isothermal)
            return adiabatic_at_P(lc, P, end);
        *end = at_P(lc, P, T1);
        return gas_good(T1);
    case GAS_TO_T:
        return isothermal ? leg_held(lc, lc->leg.value, T1) : adiabatic_at_T(lc, end);
    case GAS_WITH_W:
    case GAS_WITH_Q:
        r = volume_after(lc, lc->leg.ending == GAS_WITH_W ? lc->leg.value : -lc->leg.value, &v);
        if (r.status)
            return r;
        /* falls through */
    case GAS_TO_V:
        if (!isothermal)
            return adiabatic_at_v(lc, v, end);
        *end = at_v(lc, v, T1);
        return gas_good(T1);
    default:
        return gas_bad(GAS_NOT_APPLICABLE, LEG_ENDING, lc->leg.value);
    }
}

struct gas_result leg_against_run(const struct leg_case *lc, struct gas_change *change)
{
    const struct gas_result end = against_end(lc, &change->end);
    if (end.status)
        return leg_failure(end);
    const struct gas_result side = check_side(lc, &change->end);
    if (side.status)
        return side;
    change->W = -lc->leg.P_outside * (change->end.v - lc->start.v);
    if (lc->leg.process == GAS_AGAINST)
        return leg_close_adiabatic(lc, change);
    const struct gas_result closed = leg_close(lc, change);
    change->S_made = fmax(change->dS - change->Q / lc->start.T, 0);
    return closed;
}

struct gas_result leg_against_at(const struct leg_case *lc, const struct gas_change *change, double fraction,
                                 struct gas_point *at)
{
    const double v = lc->start.v + fraction * (change->end.v - lc->start.v);
    if (lc->leg.process == GAS_AGAINST)
        return adiabatic_at_v(lc, v, at);
    *at = at_v(lc, v, lc->start.T);
    return gas_good(at->P);
}
