#include <math.h>
#include <stdbool.h>

#include <gasleaf/path.h>

static bool missing(double x)
{
    return isnan(x);
}

static struct gas_result check_one(double x, int argument)
{
    if (missing(x) || x > 0)
        return isinf(x) ? gas_bad(GAS_NOT_FINITE, argument, x) : gas_good(x);
    return gas_bad(GAS_NOT_POSITIVE, argument, x);
}

static struct gas_result check_three(const struct gas_point *point)
{
    struct gas_result good = check_one(point->P, 1);
    if (!good.status)
        good = check_one(point->T, 2);
    if (!good.status)
        good = check_one(point->v, 3);
    return good;
}

struct gas_result gas_point_complete(const struct gas *gas, struct gas_point *point)
{
    const int unknown = missing(point->P) + missing(point->T) + missing(point->v);
    const struct gas_result good = check_three(point);
    if (good.status)
        return good;
    if (unknown > 1)
        return gas_bad(GAS_UNDETERMINED, missing(point->P) ? 1 : 2, NAN);
    if (unknown == 0 && fabs(point->P * point->v / (gas->R * point->T) - 1) > 1e-6)
        return gas_bad(GAS_CONTRADICTION, 3, point->v);
    double *const found = missing(point->T) ? &point->T : missing(point->v) ? &point->v : &point->P;
    if (found == &point->T)
        point->T = point->P * point->v / gas->R;
    else if (found == &point->v)
        point->v = gas->R * point->T / point->P;
    else if (unknown)
        point->P = gas->R * point->T / point->v;
    return *found > 0 && isfinite(*found) ? gas_good(*found) : gas_bad(GAS_NOT_FINITE, 0, *found);
}

static void add(struct gas_change *total, const struct gas_change *leg)
{
    total->end = leg->end;
    total->W += leg->W;
    total->Q += leg->Q;
    total->dU += leg->dU;
    total->dH += leg->dH;
    total->dS += leg->dS;
    total->S_made += leg->S_made;
    total->Q_in += leg->Q_in;
    total->Q_out += leg->Q_out;
    total->v_least = fmin(total->v_least, leg->v_least);
    total->v_most = fmax(total->v_most, leg->v_most);
}

struct gas_result gas_path_run(const struct gas *gas, enum gas_system system, const struct gas_point *start,
                               const struct gas_leg *legs, size_t count, struct gas_change *changes,
                               struct gas_change *total, struct gas_result *fault)
{
    struct gas_point first = *start;
    struct gas_result r = gas_point_complete(gas, &first);
    *total = (struct gas_change){.end = first, .v_least = first.v, .v_most = first.v};
    if (r.status)
        r.argument = 1;
    else if (count == 0)
        r = gas_bad(GAS_UNDETERMINED, 0, NAN);
    if (fault)
        *fault = r;
    if (r.status)
        return r;
    for (size_t i = 0; i < count; i++) {
        r = gas_leg_run(gas, system, &total->end, &first, &legs[i], &changes[i]);
        if (fault)
            *fault = r;
        if (r.status)
            return gas_bad(r.status, (int)i + 1, r.figure);
        add(total, &changes[i]);
    }
    return gas_good(total->W);
}
