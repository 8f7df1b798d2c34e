/* Legs drawn in the P-v plane: one straight line, or a table of points joined by straight lines or power laws. */
#include "curve.h"
#include "leg.h"

enum { LINE_PIECES = 16, STRETCH_PIECES = 4 }; /* where a reversal of the heat is looked for */
static const double SAME_START = 1e-3;         /* the first pressure of a table against that of the gas */

static struct gas_point completed(const struct leg_case *lc, double P, double v)
{
    return (struct gas_point){.P = P, .T = P * v / lc->gas->R, .v = v};
}

struct gas_result leg_straight_run(const struct leg_case *lc, struct gas_change *change)
{
    change->end = completed(lc, lc->leg.value, lc->leg.second);
    const struct curve curve = curve_straight(&lc->start, &change->end);
    return leg_close_along(lc, &curve, LINE_PIECES, change);
}

struct gas_result leg_straight_at(const struct leg_case *lc, const struct gas_change *change, double fraction,
                                  struct gas_point *at)
{
    const struct curve curve = curve_straight(&lc->start, &change->end);
    *at = curve_at(lc->gas, &curve, fraction);
    return gas_good(at->P);
}

/* Point i as a state of the gas: volumes count relative to the first one; the first one is the start itself. */
static struct gas_point point_of(const struct leg_case *lc, size_t i)
{
    const struct gas_point *point = lc->leg.point;
    return i == 0 ? lc->start : completed(lc, point[i].P, lc->start.v * (point[i].v / point[0].v));
}

static struct curve stretch_of(const struct leg_case *lc, size_t i)
{
    const struct gas_point from = point_of(lc, i), to = point_of(lc, i + 1);
    return lc->leg.process == GAS_THROUGH_POINTS ? curve_straight(&from, &to) : curve_power(&from, &to);
}

static struct gas_result check_points(const struct leg_case *lc)
{
    const struct gas_point *point = lc->leg.point;
    bool moves = false;
    if (!point || lc->leg.point_count < 2)
        return gas_bad(GAS_UNDETERMINED, LEG_POINTS, point ? (double)lc->leg.point_count : 0);
    for (size_t i = 0; i < lc->leg.point_count; i++) {
        const double worse = point[i].P > 0 && isfinite(point[i].P) ? point[i].v : point[i].P;
        if (!isfinite(worse))
            return gas_bad(GAS_NOT_FINITE, LEG_POINTS, worse);
        if (!(worse > 0))
            return gas_bad(GAS_NOT_POSITIVE, LEG_POINTS, worse);
        moves = moves || fabs(point[i].v / point[0].v - 1) > 1e-12;
    }
    if (!moves)
        return gas_bad(GAS_UNREACHABLE, LEG_POINTS, point[0].v);
    if (fabs(point[0].P / lc->start.P - 1) > SAME_START)
        return gas_bad(GAS_CONTRADICTION, LEG_POINTS, point[0].P);
    return gas_good(0);
}

/* Heat along one stretch, by the law; NAN where the heat capacity is not known. */
static double heat_of(const struct leg_case *lc, const struct curve *curve)
{
    const struct gas_result du = leg_du(lc->gas, curve->from.T, curve_at(lc->gas, curve, 1).T);
    return du.value - curve_work(curve, GAS_CLOSED, 1);
}

struct gas_result leg_through_run(const struct leg_case *lc, struct gas_change *change)
{
    const struct gas_result good = check_points(lc);
    if (good.status)
        return good;
    const size_t last = lc->leg.point_count - 1;
    change->end = point_of(lc, last);
    change->W = 0;
    for (size_t i = 0; i < last; i++) {
        const struct curve curve = stretch_of(lc, i);
        change->W += curve_work(&curve, lc->system, 1);
    }
    const struct gas_result closed = leg_close(lc, change);
    if (closed.status)
        return closed;
    change->Q_in = change->Q_out = 0;
    for (size_t i = 0; i < last; i++) {
        const struct curve curve = stretch_of(lc, i);
        curve_heats(lc->gas, &curve, heat_of(lc, &curve), STRETCH_PIECES, &change->Q_in, &change->Q_out);
        change->v_least = fmin(change->v_least, curve.from.v);
        change->v_most = fmax(change->v_most, curve.from.v);
    }
    return closed;
}

/* Every stretch gets the same share of the way, so that corners show. */
struct gas_result leg_through_at(const struct leg_case *lc, const struct gas_change *change, double fraction,
                                 struct gas_point *at)
{
    (void)change;
    const struct gas_result good = check_points(lc);
    if (good.status)
        return good;
    const size_t last = lc->leg.point_count - 1;
    const double way = fraction * (double)last;
    const size_t i = way < (double)last ? (size_t)way : last - 1;
    const struct curve curve = stretch_of(lc, i);
    *at = curve_at(lc->gas, &curve, way - (double)i);
    return gas_good(at->P);
}
