#include <gasleaf/heat.h>

#include <math.h>

#include "figures.h"
#include "heat_change.h"
#include "heat_terms.h"

struct gas_range gas_range_of(const struct gas *gas)
{
    if (gas->interval_count == 0)
        return (struct gas_range){NAN, NAN};
    return (struct gas_range){gas->interval[0].T_from, gas->interval[gas->interval_count - 1].T_to};
}

/* Figures that came through a unit conversion may miss the end of a range by a rounding. */
struct gas_range gas_range_with_slack(const struct gas *gas)
{
    static const double slack = 1e-9;
    struct gas_range range = gas_range_of(gas);
    return (struct gas_range){range.T_from * (1 - slack), range.T_to * (1 + slack)};
}

struct gas_result gas_check_temperature(const struct gas *gas, double T, int argument)
{
    if (gas->interval_count == 0)
        return gas_bad(GAS_NO_HEAT_CAPACITY, 1, NAN);
    if (!isfinite(T))
        return gas_bad(GAS_NOT_FINITE, argument, T);
    if (T <= 0)
        return gas_bad(GAS_NOT_POSITIVE, argument, T);
    struct gas_range range = gas_range_with_slack(gas);
    if (T < range.T_from || T > range.T_to)
        return gas_bad(GAS_OUTSIDE_DATA, argument, T);
    return gas_good(T);
}

static struct gas_result check_two(const struct gas *gas, double T1, double T2)
{
    struct gas_result checked = gas_check_temperature(gas, T1, 2);
    return checked.status ? checked : gas_check_temperature(gas, T2, 3);
}

double gas_cp_unchecked(const struct gas *gas, double T)
{
    size_t i = 0;
    while (i + 1 < gas->interval_count && T > gas->interval[i].T_to)
        i++;
    return gas_interval_cp(&gas->interval[i], T);
}

static double integral(const struct gas *gas, bool over_T, double T1, double T2)
{
    double sum = 0;
    size_t last = gas->interval_count - 1;
    for (size_t i = 0; i <= last; i++) {
        const struct gas_interval *interval = &gas->interval[i];
        double from = i == 0 ? T1 : fmax(T1, interval->T_from);
        double to = i == last ? T2 : fmin(T2, interval->T_to);
        if (from < to)
            sum += over_T ? gas_interval_ds(interval, from, to) : gas_interval_dh(interval, from, to);
    }
    return sum;
}

static double constant_cp(const struct gas *gas, double T1, double T2)
{
    if (gas->rule == GAS_CP_AT_MEAN)
        return gas_cp_unchecked(gas, T1 + (T2 - T1) / 2);
    return (gas_cp_unchecked(gas, T1) + gas_cp_unchecked(gas, T2)) / 2;
}

double gas_change_unchecked(const struct gas *gas, struct gas_change_kind kind, double T1, double T2)
{
    if (T1 == T2)
        return 0;
    if (T1 > T2)
        return -gas_change_unchecked(gas, kind, T2, T1);
    double measure = kind.over_T ? log_ratio(T2, T1) : T2 - T1;
    double change =
        gas->rule == GAS_CP_INTEGRATED ? integral(gas, kind.over_T, T1, T2) : constant_cp(gas, T1, T2) * measure;
    return kind.at_constant_volume ? change - gas->R * measure : change;
}

static struct gas_result change(const struct gas *gas, struct gas_change_kind kind, double T1, double T2)
{
    struct gas_result checked = check_two(gas, T1, T2);
    return checked.status ? checked : if_finite(gas_change_unchecked(gas, kind, T1, T2));
}

struct gas_result gas_cp(const struct gas *gas, double T)
{
    struct gas_result checked = gas_check_temperature(gas, T, 2);
    return checked.status ? checked : if_finite(gas_cp_unchecked(gas, T));
}

struct gas_result gas_cv(const struct gas *gas, double T)
{
    struct gas_result cp = gas_cp(gas, T);
    return cp.status ? cp : gas_good(cp.value - gas->R);
}

struct gas_result gas_gamma(const struct gas *gas, double T)
{
    struct gas_result cv = gas_cv(gas, T);
    if (cv.status)
        return cv;
    return cv.value > 0 ? if_finite((cv.value + gas->R) / cv.value) : gas_bad(GAS_NOT_POSITIVE, 1, cv.value);
}

struct gas_result gas_dh(const struct gas *gas, double T1, double T2)
{
    return change(gas, GAS_CHANGE_H, T1, T2);
}

struct gas_result gas_du(const struct gas *gas, double T1, double T2)
{
    return change(gas, GAS_CHANGE_U, T1, T2);
}

struct gas_result gas_ds_isobaric(const struct gas *gas, double T1, double T2)
{
    return change(gas, GAS_CHANGE_S_AT_P, T1, T2);
}

struct gas_result gas_ds_isochoric(const struct gas *gas, double T1, double T2)
{
    return change(gas, GAS_CHANGE_S_AT_V, T1, T2);
}

struct gas_result gas_ds(const struct gas *gas, double T1, double P1, double T2, double P2)
{
    struct gas_result checked[] = {gas_check_temperature(gas, T1, 2), check_positive(3, P1),
                                   gas_check_temperature(gas, T2, 4), check_positive(5, P2)};
    for (size_t i = 0; i < sizeof checked / sizeof checked[0]; i++)
        if (checked[i].status)
            return checked[i];
    return if_finite(gas_change_unchecked(gas, GAS_CHANGE_S_AT_P, T1, T2) - gas->R * log_ratio(P2, P1));
}

struct gas_result gas_cp_mean(const struct gas *gas, double T1, double T2)
{
    struct gas_result dh = gas_dh(gas, T1, T2);
    if (dh.status)
        return dh;
    return T1 == T2 ? gas_cp(gas, T1) : if_finite(dh.value / (T2 - T1));
}
