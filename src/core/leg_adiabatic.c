/* Adiabatic legs, reversible or with an isentropic efficiency, and machines with a polytropic efficiency. */
#include <gasleaf/heat.h>

#include "curve.h"
#include "leg.h"
#include "outward.h"

static struct gas_point point_at(const struct leg_case *lc, double P, double T)
{
    return (struct gas_point){.P = P, .T = T, .v = lc->gas->R * T / P};
}

/* Where a leg without loss stands at a pressure, a volume or a temperature. */
static struct gas_result ideal_T_at_P(const struct leg_case *lc, double P)
{
    return gas_T_after_ds_isobaric(lc->gas, lc->start.T, lc->gas->R * log_ratio(P, lc->start.P));
}

static struct gas_result ideal_T_at_v(const struct leg_case *lc, double v)
{
    return gas_T_after_ds_isochoric(lc->gas, lc->start.T, -lc->gas->R * log_ratio(v, lc->start.v));
}

static struct gas_result ideal_P_at_T(const struct leg_case *lc, double T)
{
    const struct gas_result ds = gas_ds_isobaric(lc->gas, lc->start.T, T);
    return ds.status ? ds : gas_good(lc->start.P * exp(ds.value / lc->gas->R));
}

/* With an isentropic efficiency one of the two end temperatures, the ideal or the real one, is the farther from the
 * start: the real one in compression (work = ideal work / efficiency), the ideal one in expansion. */
static struct gas_result nearer_T(const struct leg_case *lc, double farther)
{
    const struct gas_result energy = leg_energy(lc, lc->start.T, farther);
    return energy.status ? energy : leg_T_after_energy(lc, lc->start.T, energy.value * lc->leg.efficiency);
}

static struct gas_result farther_T(const struct leg_case *lc, double nearer)
{
    const struct gas_result energy = leg_energy(lc, lc->start.T, nearer);
    return energy.status ? energy : leg_T_after_energy(lc, lc->start.T, energy.value / lc->leg.efficiency);
}

static struct gas_result real_T(const struct leg_case *lc, double T_ideal)
{
    if (lc->leg.efficiency == 1)
        return gas_good(T_ideal);
    return T_ideal > lc->start.T ? farther_T(lc, T_ideal) : nearer_T(lc, T_ideal);
}

static struct gas_result ideal_T(const struct leg_case *lc, double T_real)
{
    if (lc->leg.efficiency == 1)
        return gas_good(T_real);
    return T_real > lc->start.T ? nearer_T(lc, T_real) : farther_T(lc, T_real);
}

static struct gas_result end_at_P(const struct leg_case *lc, double P, struct gas_point *end)
{
    const struct gas_result ideal = ideal_T_at_P(lc, P), T = ideal.status ? ideal : real_T(lc, ideal.value);
    *end = point_at(lc, P, T.value);
    return T;
}

static struct gas_result end_at_T(const struct leg_case *lc, double T, struct gas_point *end)
{
    const struct gas_result ideal = ideal_T(lc, T), P = ideal.status ? ideal : ideal_P_at_T(lc, ideal.value);
    *end = point_at(lc, P.value, T);
    return P;
}

/* A closed system ended by its volume is compared with the ideal leg to the same volume. */
static struct gas_result end_at_v(const struct leg_case *lc, double v, struct gas_point *end)
{
    const struct gas_result ideal = ideal_T_at_v(lc, v), T = ideal.status ? ideal : real_T(lc, ideal.value);
    *end = (struct gas_point){.P = lc->gas->R * T.value / v, .T = T.value, .v = v};
    return T;
}

/* Volume reached by a machine when the farther of its two temperatures is T, less the volume asked for. */
static double volume_missing(const void *context, double T)
{
    const struct leg_case *lc = context;
    const struct gas_result nearer = nearer_T(lc, T);
    const bool rising = T > lc->start.T;
    const struct gas_result P = ideal_P_at_T(lc, rising ? nearer.value : T);
    return log_ratio(lc->gas->R * (rising ? T : nearer.value) / P.value, lc->leg.value);
}

/* Walks the temperature away from the start until the volume is met; the data end, or the gas cannot get there. */
static struct gas_result T_with_volume(const struct leg_case *lc, root_function *missing)
{
    const struct gas_range range = gas_range_of(lc->gas);
    const bool rising = lc->leg.value < lc->start.v;
    const double T1 = lc->start.T;
    const struct gas_result known = gas_cv(lc->gas, T1);
    if (known.status)
        return known;
    const double limit = rising ? fmin(range.T_to, 1e6 * T1) : fmax(range.T_from, 1e-6 * T1);
    const struct gas_result T = root_outward(missing, lc, T1, limit, 0.01 * T1, rising ? INFINITY : 0.1 * T1);
    if (T.status == GAS_UNREACHABLE && limit == (rising ? range.T_to : range.T_from))
        return gas_bad(GAS_OUTSIDE_DATA, 0, limit);
    if (T.status == GAS_UNREACHABLE)
        return leg_unreachable(lc);
    return T;
}

static struct gas_result machine_end_at_v(const struct leg_case *lc, struct gas_point *end)
{
    const struct gas_result farther = T_with_volume(lc, volume_missing);
    if (farther.status)
        return farther;
    const struct gas_result nearer = nearer_T(lc, farther.value);
    const bool rising = farther.value > lc->start.T;
    const double T = rising ? farther.value : nearer.value;
    *end = (struct gas_point){.P = lc->gas->R * T / lc->leg.value, .T = T, .v = lc->leg.value};
    return nearer;
}

static struct gas_result adiabatic_end(const struct leg_case *lc, struct gas_point *end)
{
    struct gas_result T;
    switch (lc->leg.ending) {
    case GAS_TO_P:
        return end_at_P(lc, lc->leg.value, end);
    case GAS_TO_T:
        return end_at_T(lc, lc->leg.value, end);
    case GAS_TO_V:
        if (lc->system == GAS_FLOW && lc->leg.efficiency < 1)
            return machine_end_at_v(lc, end);
        return end_at_v(lc, lc->leg.value, end);
    case GAS_WITH_W:
        T = leg_T_after_energy(lc, lc->start.T, lc->leg.value);
        return T.status ? T : end_at_T(lc, T.value, end);
    default:
        return gas_bad(GAS_NOT_APPLICABLE, LEG_ENDING, lc->leg.value);
    }
}

struct gas_result leg_adiabatic_run(const struct leg_case *lc, struct gas_change *change)
{
    const struct gas_result end = adiabatic_end(lc, &change->end);
    if (end.status)
        return leg_failure(end);
    const struct gas_result W = leg_energy(lc, lc->start.T, change->end.T);
    if (W.status)
        return leg_failure(W);
    change->W = W.value;
    const struct gas_result closed = leg_close_adiabatic(lc, change);
    if (lc->leg.efficiency == 1)
        change->dS = change->S_made = 0;
    return closed;
}

struct gas_result leg_adiabatic_at(const struct leg_case *lc, const struct gas_change *change, double fraction,
                                   struct gas_point *at)
{
    const double v = lc->start.v + fraction * (change->end.v - lc->start.v);
    const bool by_v = lc->leg.efficiency == 1 || (lc->leg.ending == GAS_TO_V && lc->system == GAS_CLOSED);
    if (by_v)
        return end_at_v(lc, v, at);
    return end_at_P(lc, lc->start.P + fraction * (change->end.P - lc->start.P), at);
}

/* A machine with a polytropic efficiency: every small step is a small machine of that efficiency, so that
 * cp dT/T = R dP/P / efficiency in compression and R dP/P * efficiency in expansion. */
static double machine_factor(const struct leg_case *lc, bool rising)
{
    return rising ? 1 / lc->leg.efficiency : lc->leg.efficiency;
}

static struct gas_result machine_at_P(const struct leg_case *lc, double P, struct gas_point *end)
{
    const double factor = machine_factor(lc, P > lc->start.P);
    const struct gas_result T =
        gas_T_after_ds_isobaric(lc->gas, lc->start.T, factor * lc->gas->R * log_ratio(P, lc->start.P));
    *end = point_at(lc, P, T.value);
    return T;
}

static struct gas_result machine_ln_P(const struct leg_case *lc, double T)
{
    const struct gas_result ds = gas_ds_isobaric(lc->gas, lc->start.T, T);
    return ds.status ? ds : gas_good(ds.value / (lc->gas->R * machine_factor(lc, T > lc->start.T)));
}

static struct gas_result machine_at_T(const struct leg_case *lc, double T, struct gas_point *end)
{
    const struct gas_result ln_P = machine_ln_P(lc, T);
    *end = point_at(lc, lc->start.P * exp(ln_P.value), T);
    return ln_P;
}

static double machine_volume_missing(const void *context, double T)
{
    const struct leg_case *lc = context;
    return log_ratio(T, lc->start.T) - machine_ln_P(lc, T).value - log_ratio(lc->leg.value, lc->start.v);
}

static struct gas_result machine_end(const struct leg_case *lc, struct gas_point *end)
{
    struct gas_result T;
    switch (lc->leg.ending) {
    case GAS_TO_P:
        return machine_at_P(lc, lc->leg.value, end);
    case GAS_TO_T:
        return machine_at_T(lc, lc->leg.value, end);
    case GAS_TO_V:
        T = T_with_volume(lc, machine_volume_missing);
        break;
    case GAS_WITH_W:
        T = gas_T_after_dh(lc->gas, lc->start.T, lc->leg.value);
        break;
    default:
        return gas_bad(GAS_NOT_APPLICABLE, LEG_ENDING, lc->leg.value);
    }
    if (T.status)
        return T;
    const struct gas_result r = machine_at_T(lc, T.value, end);
    if (lc->leg.ending == GAS_TO_V)
        *end = (struct gas_point){.P = lc->gas->R * T.value / lc->leg.value, .T = T.value, .v = lc->leg.value};
    return r;
}

struct gas_result leg_polytropic_run(const struct leg_case *lc, struct gas_change *change)
{
    if (!isnan(lc->leg.n))
        return leg_line_run(lc, change);
    const struct gas_result end = machine_end(lc, &change->end);
    if (end.status)
        return leg_failure(end);
    const struct gas_result W = leg_energy(lc, lc->start.T, change->end.T);
    if (W.status)
        return leg_failure(W);
    change->W = W.value;
    return leg_close_adiabatic(lc, change);
}

struct gas_result leg_polytropic_at(const struct leg_case *lc, const struct gas_change *change, double fraction,
                                    struct gas_point *at)
{
    if (!isnan(lc->leg.n))
        return leg_line_at(lc, change, fraction, at);
    return machine_at_P(lc, lc->start.P + fraction * (change->end.P - lc->start.P), at);
}
