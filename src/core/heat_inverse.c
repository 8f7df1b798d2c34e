/*
 * The end temperature of a given change: Newton's method, kept between limits. The change grows with T2, so the start
 * temperature bounds the answer on one side; the end of the data bounds it on the other, and is looked at only when
 * the search runs into it.
 */
#include <math.h>

#include "heat_change.h"

/* Stand-ins for a range without an end. */
static const double COLDEST = 1e-9, HOTTEST = 1e12; /* K */

struct search {
    const struct gas *gas;
    struct gas_change_kind kind;
    double T1, change;
    double near, far; /* the answer lies between them; near is T1 or has been tried and fell short */
    bool far_tried;   /* the change at far is known to be enough */
};

/* How much of the change is still missing at T, positive until the answer is passed, whichever way it lies. */
static double missing(const struct search *search, double T)
{
    double rest = search->change - gas_change_unchecked(search->gas, search->kind, search->T1, T);
    return search->change > 0 ? rest : -rest;
}

static double slope(const struct search *search, double T)
{
    return gas_cp_unchecked(search->gas, T) - (search->kind.at_constant_volume ? search->gas->R : 0);
}

/* The Newton step, in ln T for entropies: with a constant heat capacity it lands at once. */
static double stepped(const struct search *search, double T, double rest, double c)
{
    double signed_rest = search->change > 0 ? rest : -rest;
    return search->kind.over_T ? T * exp(signed_rest / c) : T + signed_rest / c;
}

/* A mean-cp rule has a slope of its own, taken from the last two points. */
static double secant(const struct search *search, double T, double rest, double T_before, double rest_before)
{
    double sign = search->change > 0 ? 1 : -1;
    double run = search->kind.over_T ? log(T / T_before) : T - T_before;
    return sign * (rest_before - rest) / run;
}

static double inside(const struct search *search, double T)
{
    double low = fmin(search->near, search->far), high = fmax(search->near, search->far);
    if (T > low && T < high)
        return T;
    if (!search->far_tried && (T - search->near) * (search->far - search->near) > 0)
        return search->far;
    return low + (high - low) / 2;
}

static struct gas_result beyond(const struct search *search)
{
    struct gas_range range = gas_range_of(search->gas);
    double limit = search->change > 0 ? range.T_to : range.T_from;
    return limit > 0 && isfinite(limit) ? gas_bad(GAS_OUTSIDE_DATA, 0, limit) : gas_bad(GAS_UNREACHABLE, 0, NAN);
}

static struct gas_result found(struct search *search)
{
    enum { MOST = 200 };
    static const double close = 1e-13;
    double T_before = search->T1, rest_before = fabs(search->change);
    double T = inside(search, stepped(search, T_before, rest_before, slope(search, T_before)));
    for (int i = 0; i < MOST; i++) {
        double rest = missing(search, T);
        if (rest == 0)
            return gas_good(T);
        if (rest > 0 && T == search->far)
            return beyond(search);
        if (rest > 0)
            search->near = T;
        else
            search->far = T, search->far_tried = true;
        double c =
            search->gas->rule == GAS_CP_INTEGRATED ? slope(search, T) : secant(search, T, rest, T_before, rest_before);
        double next = stepped(search, T, rest, c);
        if (fabs(next - T) <= close * T || fabs(search->far - search->near) <= close * T)
            return gas_good(isfinite(next) && fabs(next - T) <= close * T ? next : T);
        T_before = T, rest_before = rest;
        T = inside(search, next);
    }
    return gas_bad(GAS_NO_CONVERGENCE, 0, NAN);
}

static struct gas_result after(const struct gas *gas, struct gas_change_kind kind, double T1, double change)
{
    struct gas_result checked = gas_check_temperature(gas, T1, 2);
    if (checked.status)
        return checked;
    if (!isfinite(change))
        return gas_bad(GAS_NOT_FINITE, 3, change);
    if (change == 0)
        return gas_good(T1);
    struct gas_range range = gas_range_with_slack(gas);
    double far = change > 0 ? fmin(range.T_to, HOTTEST) : fmax(range.T_from, COLDEST);
    struct search search = {gas, kind, T1, change, .near = T1, .far = far};
    if ((far - T1) * change <= 0)
        return beyond(&search);
    return found(&search);
}

struct gas_result gas_T_after_dh(const struct gas *gas, double T1, double dh)
{
    return after(gas, GAS_CHANGE_H, T1, dh);
}

struct gas_result gas_T_after_du(const struct gas *gas, double T1, double du)
{
    return after(gas, GAS_CHANGE_U, T1, du);
}

struct gas_result gas_T_after_ds_isobaric(const struct gas *gas, double T1, double ds)
{
    return after(gas, GAS_CHANGE_S_AT_P, T1, ds);
}

struct gas_result gas_T_after_ds_isochoric(const struct gas *gas, double T1, double ds)
{
    return after(gas, GAS_CHANGE_S_AT_V, T1, ds);
}
