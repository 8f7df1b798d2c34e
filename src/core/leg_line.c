/* Legs that are straight in ln P against ln v: isothermal, isobaric, isochoric, polytropic. */
#include <gasleaf/heat.h>

#include "curve.h"
#include "leg.h"
#include "outward.h"

enum { SIGN_PIECES = 8 }; /* stretches in which a reversal of the heat is looked for */

/* How ln v, ln P and ln T move with s, the length along the line. */
struct line {
    double v, P, T;
};

static struct line line_of(const struct gas_leg *leg)
{
    switch (leg->process) {
    case GAS_ISOTHERMAL:
        return (struct line){1, -1, 0};
    case GAS_ISOBARIC:
        return (struct line){1, 0, 1};
    case GAS_ISOCHORIC:
        return (struct line){0, 1, 1};
    default: /* scaled so that neither a small nor a huge exponent loses digits */
        return fabs(leg->n) <= 1 ? (struct line){1, -leg->n, 1 - leg->n}
                                 : (struct line){1 / leg->n, -1, (1 - leg->n) / leg->n};
    }
}

static struct curve curve_along(const struct leg_case *lc, struct line line, double s)
{
    return (struct curve){
        .kind = CURVE_POWER, .from = lc->start, .ln_v = s * line.v, .ln_P = s * line.P, .ln_T = s * line.T};
}

static struct gas_result length_to(const struct leg_case *lc, double held, double rate)
{
    if (rate == 0)
        return leg_held(lc, lc->leg.value, held);
    return gas_good(log_ratio(lc->leg.value, held) / rate);
}

/* W = -P1 v1 line.v (e^(s line.T) - 1)/line.T solved for s; with line.P and the other sign in flow. */
static struct gas_result length_with_work(const struct leg_case *lc, struct line line)
{
    const double rate = lc->system == GAS_FLOW ? line.P : -line.v;
    if (rate == 0)
        return leg_held(lc, lc->leg.value, 0);
    const double s = lc->leg.value / (rate * lc->start.P * lc->start.v), x = s * line.T;
    if (!(x > -1))
        return leg_unreachable(lc);
    return gas_good(x == 0 ? s : s * (log1p(x) / x));
}

struct heat_ending {
    const struct leg_case *lc;
    struct line line;
};

/* Heat taken in until s, less the heat asked for. */
static double heat_missing(const void *context, double s)
{
    const struct heat_ending *h = context;
    const struct curve curve = curve_along(h->lc, h->line, s);
    const double T1 = h->lc->start.T, T = curve_at(h->lc->gas, &curve, 1).T;
    const struct gas_range range = gas_range_of(h->lc->gas);
    const struct gas_result du = leg_du(h->lc->gas, T1, fmin(fmax(T, range.T_from), range.T_to));
    return du.value - curve_work(&curve, GAS_CLOSED, 1) - h->lc->leg.value;
}

/* The s at which the data end; where they do not, a temperature or volume ratio that nobody has. */
static double limit_of(const struct heat_ending *h, double way)
{
    const struct gas_range range = gas_range_of(h->lc->gas);
    const double T_end = way * h->line.T > 0 ? range.T_to : range.T_from;
    const double ln_T = T_end > 0 && isfinite(T_end) ? fabs(log(T_end / h->lc->start.T)) : 60;
    return way * fmin(ln_T / fabs(h->line.T), 300);
}

static struct gas_result heat_outward(const struct heat_ending *h, double way, double guess)
{
    const double most = fmax(0.15 / fmax(fabs(h->line.T), 0.3), guess / 50);
    const double first = fmin(fmax(guess / 4, 1e-12), most);
    return root_outward(heat_missing, h, 0, limit_of(h, way), first, most);
}

/* A polytropic heat may turn back on the way; the answer is the nearest end, sought first where the heat begins with
 * the right sign. */
static struct gas_result length_with_heat(const struct leg_case *lc, struct line line)
{
    const struct heat_ending h = {lc, line};
    const double T1 = lc->start.T, Q = lc->leg.value;
    if (line.T == 0)
        return gas_good(Q / (lc->start.P * lc->start.v * line.v));
    const struct gas_result cv = gas_cv(lc->gas, T1);
    if (cv.status)
        return leg_failure(cv);
    if (Q == 0)
        return gas_good(0);
    const double slope = T1 * (cv.value * line.T + lc->gas->R * line.v);
    const double guess = Q / slope, way = guess < 0 ? -1 : 1, size = fmin(fabs(guess), 100);
    struct gas_result s = heat_outward(&h, way, size);
    if (s.status == GAS_UNREACHABLE)
        s = heat_outward(&h, -way, size);
    if (s.status != GAS_UNREACHABLE)
        return s.status ? leg_failure(s) : s;
    const struct gas_range range = gas_range_of(lc->gas);
    const double T_end = way * line.T > 0 ? range.T_to : range.T_from;
    if (T_end > 0 && isfinite(T_end))
        return gas_bad(GAS_OUTSIDE_DATA, LEG_ENDING, T_end);
    return leg_unreachable(lc);
}

/* Isobaric and isochoric heats are enthalpy and internal-energy changes; the others are sought along the line. */
static struct gas_result length_with_known_heat(const struct leg_case *lc, struct line line)
{
    if (line.P != 0 && line.v != 0)
        return length_with_heat(lc, line);
    const struct gas_result T = line.P == 0 ? gas_T_after_dh(lc->gas, lc->start.T, lc->leg.value)
                                            : gas_T_after_du(lc->gas, lc->start.T, lc->leg.value);
    return T.status ? leg_failure(T) : gas_good(log_ratio(T.value, lc->start.T) / line.T);
}

static struct gas_result length_of(const struct leg_case *lc, struct line line)
{
    switch (lc->leg.ending) {
    case GAS_TO_P:
        return length_to(lc, lc->start.P, line.P);
    case GAS_TO_T:
        return length_to(lc, lc->start.T, line.T);
    case GAS_TO_V:
        return length_to(lc, lc->start.v, line.v);
    case GAS_WITH_W:
        return length_with_work(lc, line);
    case GAS_WITH_Q:
        return length_with_known_heat(lc, line);
    default:
        return gas_bad(GAS_NOT_APPLICABLE, LEG_ENDING, lc->leg.value);
    }
}

/* The asked figure is met to the last digit. */
static void set_asked(const struct gas_leg *leg, struct gas_point *end)
{
    if (leg->ending == GAS_TO_P)
        end->P = leg->value;
    if (leg->ending == GAS_TO_T)
        end->T = leg->value;
    if (leg->ending == GAS_TO_V)
        end->v = leg->value;
}

struct gas_result leg_line_run(const struct leg_case *lc, struct gas_change *change)
{
    const struct line line = line_of(&lc->leg);
    const struct gas_result s = length_of(lc, line);
    if (s.status)
        return s;
    const struct curve curve = curve_along(lc, line, s.value);
    change->end = curve_at(lc->gas, &curve, 1);
    set_asked(&lc->leg, &change->end);
    return leg_close_along(lc, &curve, SIGN_PIECES, change);
}

struct gas_result leg_line_at(const struct leg_case *lc, const struct gas_change *change, double fraction,
                              struct gas_point *at)
{
    const struct gas_point *from = &lc->start, *end = &change->end;
    const struct line line = line_of(&lc->leg);
    const bool by_v = fabs(line.v) > 1e-3; /* a nearly isochoric line is told apart by P alone */
    const double s = by_v ? log_ratio(from->v + fraction * (end->v - from->v), from->v) / line.v
                          : log_ratio(from->P + fraction * (end->P - from->P), from->P) / line.P;
    const struct curve curve = curve_along(lc, line, s);
    *at = curve_at(lc->gas, &curve, 1);
    return gas_good(at->P);
}
