/* One leg: the table of processes, what makes sense for each, and what all of them share. */
#include <float.h>

#include <gasleaf/heat.h>

#include "curve.h"
#include "leg.h"

#define CAN(ending) (1u << GAS_##ending)
#define PLAIN       (CAN(TO_P) | CAN(TO_T) | CAN(TO_V) | CAN(BY_P_RATIO) | CAN(BY_V_RATIO) | CAN(BY_T_RATIO) | CAN(TO_START))
#define WORK        CAN(WITH_W)
#define HEAT        CAN(WITH_Q)
#define BALANCE     CAN(TO_BALANCE)
#define DRAWN       (CAN(TO_P_AND_V) | CAN(TO_START))
#define TABLE       (CAN(TO_LAST_POINT) | CAN(TO_START))

enum takes { NOTHING, EXPONENT, EFFICIENCY, OUTSIDE, POINTS };

/* clang-format off */
static const struct process {
    unsigned endings;        /* those that make sense */
    enum gas_ending home;    /* what "to start" asks of it */
    bool flow;               /* has a steady-flow counterpart */
    enum takes takes;
    leg_run *run;
    leg_at *at;
} processes[] = {
    /*                          endings                 home              flow   takes       */
    [GAS_ISOTHERMAL]         = {PLAIN | WORK | HEAT,    GAS_TO_V,         true,  NOTHING,    leg_line_run,       leg_line_at},
    [GAS_ISOBARIC]           = {PLAIN | WORK | HEAT,    GAS_TO_V,         true,  NOTHING,    leg_line_run,       leg_line_at},
    [GAS_ISOCHORIC]          = {PLAIN | WORK | HEAT,    GAS_TO_P,         true,  NOTHING,    leg_line_run,       leg_line_at},
    [GAS_ADIABATIC]          = {PLAIN | WORK,           GAS_TO_P,         true,  EFFICIENCY, leg_adiabatic_run,  leg_adiabatic_at},
    [GAS_POLYTROPIC]         = {PLAIN | WORK | HEAT,    GAS_TO_P,         true,  EXPONENT,   leg_polytropic_run, leg_polytropic_at},
    [GAS_FREE_EXPANSION]     = {PLAIN,                  GAS_TO_V,         true,  NOTHING,    leg_free_run,       leg_free_at},
    [GAS_AGAINST]            = {PLAIN | WORK | BALANCE, GAS_TO_V,         false, OUTSIDE,    leg_against_run,    leg_against_at},
    [GAS_AGAINST_ISOTHERMAL] = {PLAIN | WORK | HEAT | BALANCE, GAS_TO_V,  false, OUTSIDE,    leg_against_run,    leg_against_at},
    [GAS_STRAIGHT]           = {DRAWN,                  GAS_TO_P_AND_V,   true,  NOTHING,    leg_straight_run,   leg_straight_at},
    [GAS_THROUGH_POINTS]     = {TABLE,                  GAS_TO_LAST_POINT, true, POINTS,     leg_through_run,    leg_through_at},
    [GAS_THROUGH_POLYTROPES] = {TABLE,                  GAS_TO_LAST_POINT, true, POINTS,     leg_through_run,    leg_through_at},
};
/* clang-format on */

enum { PROCESSES = sizeof processes / sizeof processes[0] };
static const double CLOSES_WITHIN = 1e-6; /* a leg "to start" hits the start */

struct gas_result leg_du(const struct gas *gas, double T1, double T2)
{
    return T1 == T2 ? gas_good(0) : gas_du(gas, T1, T2);
}

struct gas_result leg_dh(const struct gas *gas, double T1, double T2)
{
    return T1 == T2 ? gas_good(0) : gas_dh(gas, T1, T2);
}

struct gas_result leg_energy(const struct leg_case *lc, double T1, double T2)
{
    return lc->system == GAS_FLOW ? leg_dh(lc->gas, T1, T2) : leg_du(lc->gas, T1, T2);
}

struct gas_result leg_T_after_energy(const struct leg_case *lc, double T1, double energy)
{
    return lc->system == GAS_FLOW ? gas_T_after_dh(lc->gas, T1, energy) : gas_T_after_du(lc->gas, T1, energy);
}

struct gas_result leg_unreachable(const struct leg_case *lc)
{
    return gas_bad(GAS_UNREACHABLE, LEG_ENDING, lc->leg.value);
}

struct gas_result leg_held(const struct leg_case *lc, double asked, double held)
{
    const bool same = fabs(asked - held) <= 1e-9 * fabs(held);
    return gas_bad(same ? GAS_UNDETERMINED : GAS_UNREACHABLE, LEG_ENDING, lc->leg.value);
}

/* The heat functions call the start temperature 2, what was asked 3 and the answer 0; only the first is no ending. */
struct gas_result leg_failure(struct gas_result failure)
{
    const bool start = failure.status == GAS_OUTSIDE_DATA && failure.argument == 2;
    if (failure.argument > LEG_N)
        return failure;
    failure.argument = failure.status == GAS_NO_HEAT_CAPACITY ? 0 : start ? LEG_START : LEG_ENDING;
    return failure;
}

/* An extreme ending may leave the numbers before it leaves the gas. */
static bool is_a_state(const struct gas_point *p)
{
    return p->P >= DBL_MIN && p->T >= DBL_MIN && p->v >= DBL_MIN && isfinite(p->P) && isfinite(p->T) && isfinite(p->v);
}

static struct gas_result add_state_changes(const struct leg_case *lc, struct gas_change *change)
{
    const struct gas_point *from = &lc->start, *to = &change->end;
    const struct gas_result du = leg_du(lc->gas, from->T, to->T), dh = leg_dh(lc->gas, from->T, to->T);
    const struct gas_result ds = from->T == to->T ? gas_good(0) : gas_ds_isobaric(lc->gas, from->T, to->T);
    const struct gas_result worst = du.status ? du : dh.status ? dh : ds;
    if (worst.status && worst.status != GAS_NO_HEAT_CAPACITY)
        return leg_failure(worst);
    change->dU = du.value;
    change->dH = dh.value;
    change->dS = ds.value - lc->gas->R * log_ratio(to->P, from->P);
    return gas_good(0);
}

struct gas_result leg_close(const struct leg_case *lc, struct gas_change *change)
{
    if (!is_a_state(&change->end) || !isfinite(change->W))
        return leg_unreachable(lc);
    const struct gas_result states = add_state_changes(lc, change);
    if (states.status)
        return states;
    change->Q = (lc->system == GAS_FLOW ? change->dH : change->dU) - change->W;
    change->Q_in = isnan(change->Q) ? NAN : fmax(change->Q, 0);
    change->Q_out = isnan(change->Q) ? NAN : fmax(-change->Q, 0);
    change->v_least = fmin(lc->start.v, change->end.v);
    change->v_most = fmax(lc->start.v, change->end.v);
    return gas_good(change->W);
}

struct gas_result leg_close_along(const struct leg_case *lc, const struct curve *curve, int pieces,
                                  struct gas_change *change)
{
    change->W = curve_work(curve, lc->system, 1);
    const struct gas_result closed = leg_close(lc, change);
    if (closed.status)
        return closed;
    change->Q_in = change->Q_out = 0;
    curve_heats(lc->gas, curve, change->Q, pieces, &change->Q_in, &change->Q_out);
    return closed;
}

struct gas_result leg_close_adiabatic(const struct leg_case *lc, struct gas_change *change)
{
    const struct gas_result closed = leg_close(lc, change);
    if (closed.status)
        return closed;
    const double moved = lc->gas->R * (change->end.T - lc->start.T);
    change->dU = lc->system == GAS_FLOW ? change->W - moved : change->W;
    change->dH = lc->system == GAS_FLOW ? change->W : change->W + moved;
    change->Q = change->Q_in = change->Q_out = 0;
    change->S_made = fmax(change->dS, 0);
    return closed;
}

static struct gas_result check_ending(const struct gas_leg *leg, enum gas_system system)
{
    const struct process *process = &processes[leg->process];
    const bool figureless =
        leg->ending == GAS_TO_START || leg->ending == GAS_TO_BALANCE || leg->ending == GAS_TO_LAST_POINT;
    if ((unsigned)leg->ending > GAS_TO_LAST_POINT || !(process->endings & (1u << leg->ending)))
        return gas_bad(GAS_NOT_APPLICABLE, LEG_ENDING, leg->value);
    if (leg->process == GAS_POLYTROPIC && isnan(leg->n) && leg->ending == GAS_WITH_Q)
        return gas_bad(GAS_NOT_APPLICABLE, LEG_ENDING, leg->value);
    if (system == GAS_FLOW && !process->flow)
        return gas_bad(GAS_NOT_APPLICABLE, 0, NAN);
    if (figureless)
        return gas_good(0);
    if (leg->ending == GAS_WITH_Q || leg->ending == GAS_WITH_W)
        return isfinite(leg->value) ? gas_good(0) : gas_bad(GAS_NOT_FINITE, LEG_ENDING, leg->value);
    const struct gas_result value = check_positive(LEG_ENDING, leg->value);
    return value.status || leg->ending != GAS_TO_P_AND_V ? value : check_positive(LEG_ENDING, leg->second);
}

static struct gas_result check_efficiency(const struct gas_leg *leg)
{
    if (isnan(leg->efficiency))
        return gas_bad(GAS_NOT_FINITE, LEG_EFFICIENCY, leg->efficiency);
    return leg->efficiency > 0 && leg->efficiency <= 1 ? gas_good(0)
                                                       : gas_bad(GAS_NOT_A_FRACTION, LEG_EFFICIENCY, leg->efficiency);
}

/* A polytropic leg goes by its exponent, or in flow, without one, by its efficiency. */
static struct gas_result check_exponent(const struct gas_leg *leg, enum gas_system system)
{
    const bool lossless = leg->efficiency == 1 || isnan(leg->efficiency);
    if (isnan(leg->n) && lossless && (system == GAS_CLOSED || isnan(leg->efficiency)))
        return gas_bad(GAS_NOT_FINITE, LEG_N, leg->n);
    if (isnan(leg->n) && system == GAS_CLOSED)
        return gas_bad(GAS_NOT_APPLICABLE, LEG_EFFICIENCY, leg->efficiency);
    if (isnan(leg->n))
        return check_efficiency(leg);
    if (!isfinite(leg->n))
        return gas_bad(GAS_NOT_FINITE, LEG_N, leg->n);
    return lossless ? gas_good(0) : gas_bad(GAS_NOT_APPLICABLE, LEG_EFFICIENCY, leg->efficiency);
}

static struct gas_result check_data(const struct gas_leg *leg, enum gas_system system)
{
    const enum takes takes = processes[leg->process].takes;
    if (takes == EXPONENT)
        return check_exponent(leg, system);
    if (takes == EFFICIENCY)
        return check_efficiency(leg);
    if (leg->efficiency != 1 && !isnan(leg->efficiency))
        return gas_bad(GAS_NOT_APPLICABLE, LEG_EFFICIENCY, leg->efficiency);
    if (takes == OUTSIDE && !isfinite(leg->P_outside))
        return gas_bad(GAS_NOT_FINITE, LEG_OUTSIDE, leg->P_outside);
    if (takes == OUTSIDE && leg->P_outside < 0)
        return gas_bad(GAS_NEGATIVE, LEG_OUTSIDE, leg->P_outside);
    return gas_good(0);
}

static struct gas_result take_case(const struct gas *gas, enum gas_system system, const struct gas_point *start,
                                   const struct gas_leg *leg, struct leg_case *lc)
{
    *lc = (struct leg_case){gas, system, *start, *leg};
    struct gas_result good = gas_point_complete(gas, &lc->start);
    good.argument = LEG_START;
    if (good.status)
        return good;
    if ((unsigned)leg->process >= PROCESSES)
        return gas_bad(GAS_NOT_APPLICABLE, 0, NAN);
    good = check_ending(leg, system);
    return good.status ? good : check_data(leg, system);
}

/* Ratios become figures; "to start" becomes the ending that brings this process home, if it can get there. */
static void resolve(struct leg_case *lc, const struct gas_point *home)
{
    struct gas_leg *leg = &lc->leg;
    if (leg->ending == GAS_TO_START) {
        leg->ending = processes[leg->process].home;
        if (leg->process == GAS_POLYTROPIC && fabs(leg->n) <= 1)
            leg->ending = GAS_TO_V;
        leg->value = leg->ending == GAS_TO_V ? home->v : home->P;
        leg->second = home->v;
    }
    if (leg->ending == GAS_BY_P_RATIO)
        leg->value *= lc->start.P;
    if (leg->ending == GAS_BY_V_RATIO)
        leg->value *= lc->start.v;
    if (leg->ending == GAS_BY_T_RATIO)
        leg->value *= lc->start.T;
    if (leg->ending >= GAS_BY_P_RATIO && leg->ending <= GAS_BY_T_RATIO)
        leg->ending = leg->ending == GAS_BY_P_RATIO ? GAS_TO_P : leg->ending == GAS_BY_V_RATIO ? GAS_TO_V : GAS_TO_T;
}

static bool misses(double end, double home)
{
    return !(fabs(end / home - 1) <= CLOSES_WITHIN);
}

static struct gas_result check_home(const struct gas_point *end, const struct gas_point *home, double W)
{
    if (misses(end->P, home->P))
        return gas_bad(GAS_UNREACHABLE, LEG_ENDING, home->P);
    if (misses(end->T, home->T))
        return gas_bad(GAS_UNREACHABLE, LEG_ENDING, home->T);
    return misses(end->v, home->v) ? gas_bad(GAS_UNREACHABLE, LEG_ENDING, home->v) : gas_good(W);
}

struct gas_result gas_leg_run(const struct gas *gas, enum gas_system system, const struct gas_point *start,
                              const struct gas_point *path_start, const struct gas_leg *leg, struct gas_change *change)
{
    struct leg_case lc;
    struct gas_point home = {NAN, NAN, NAN};
    *change = (struct gas_change){0};
    struct gas_result r = take_case(gas, system, start, leg, &lc);
    if (r.status)
        return r;
    if (leg->ending == GAS_TO_START) {
        home = path_start ? *path_start : home;
        if (gas_point_complete(gas, &home).status)
            return gas_bad(GAS_UNDETERMINED, LEG_ENDING, NAN);
    }
    resolve(&lc, &home);
    r = processes[leg->process].run(&lc, change);
    if (!r.status && leg->ending == GAS_TO_START)
        return check_home(&change->end, &home, r.value);
    /* the user's own figure, not the pressure or volume made of a ratio; temperatures outside the data stay */
    if (r.status && r.argument == LEG_ENDING && r.status != GAS_OUTSIDE_DATA && leg->ending != GAS_TO_START)
        r.figure = leg->value;
    return r;
}

struct gas_result gas_leg_at(const struct gas *gas, enum gas_system system, const struct gas_point *start,
                             const struct gas_leg *leg, const struct gas_change *change, double fraction,
                             struct gas_point *at)
{
    struct leg_case lc;
    const struct gas_result r = take_case(gas, system, start, leg, &lc);
    if (r.status)
        return r;
    if (!(fraction >= 0 && fraction <= 1))
        return gas_bad(isfinite(fraction) ? GAS_UNREACHABLE : GAS_NOT_FINITE, 6, fraction);
    *at = fraction > 0 ? change->end : lc.start;
    if (fraction == 0 || fraction == 1)
        return gas_good(at->P);
    /* the family a closed leg with an efficiency belongs to is told by its ending, so ratios count as what they are */
    resolve(&lc, &change->end);
    /* cppcheck-suppress returnDanglingLifetime ; the result holds no pointer */
    return processes[leg->process].at(&lc, change, fraction, at);
}
