/* Uncertainty of a wanted value from those of the figures, by differences over the plan itself. */
#include <math.h>
#include <string.h>

#include <gasleaf/state.h>

struct sweep {
    const struct gas_plan *plan;
    const struct gas *gas;
    const struct gas_datum *datum;
    size_t count;
    struct gas_known wanted;
    double figures[GAS_SLOTS];
    struct gas_values values;
};

static struct gas_result value_at(struct sweep *sweep, size_t i, double x)
{
    double kept = sweep->figures[i];
    sweep->figures[i] = x;
    struct gas_result result = gas_plan_run(sweep->plan, sweep->gas, sweep->datum, INFINITY, sweep->figures,
                                            sweep->count, &sweep->wanted, 1, &sweep->values);
    sweep->figures[i] = kept;
    if (result.status != GAS_OK)
        return result;
    return gas_good(gas_plan_value(sweep->plan, &sweep->values, sweep->wanted.variable, sweep->wanted.state));
}

static struct gas_result difference(struct sweep *sweep, size_t i, double below, double above, double u)
{
    double x = sweep->figures[i];
    struct gas_result low = value_at(sweep, i, x - below), high = value_at(sweep, i, x + above);
    if (low.status != GAS_OK)
        return low;
    return high.status == GAS_OK ? gas_good((high.value - low.value) * (u / (below + above))) : high;
}

/* An end that cannot be computed (below zero, outside the data) calls for a smaller step, at last for one side. */
static struct gas_result part_of(struct sweep *sweep, size_t i, double u)
{
    double least = 1e-6 * fabs(sweep->figures[i]), d = u > least ? u : least;
    struct gas_result part = difference(sweep, i, d, d, u);
    for (int turn = 0; turn < 3 && part.status != GAS_OK; turn++) {
        d = d / 10 > least ? d / 10 : least > 0 ? least : d / 10;
        part = difference(sweep, i, d, d, u);
    }
    if (part.status != GAS_OK)
        part = difference(sweep, i, 0, d, u);
    return part.status == GAS_OK ? part : difference(sweep, i, d, 0, u);
}

static struct gas_result sum_of_squares(struct sweep *sweep, const double *uncertainty, double *part)
{
    double sum = 0;
    for (size_t i = 0; i < sweep->count; i++) {
        if (part)
            part[i] = 0;
        if (isnan(uncertainty[i]) || uncertainty[i] == 0)
            continue;
        if (uncertainty[i] < 0 || isinf(uncertainty[i]))
            return gas_bad(uncertainty[i] < 0 ? GAS_NEGATIVE : GAS_NOT_FINITE, (int)i + 1, uncertainty[i]);
        struct gas_result one = part_of(sweep, i, uncertainty[i]);
        if (one.status != GAS_OK)
            return one;
        if (part)
            part[i] = one.value;
        sum = hypot(sum, one.value);
    }
    return gas_good(sum);
}

struct gas_result gas_plan_uncertainty(const struct gas_plan *plan, const struct gas *gas,
                                       const struct gas_datum *datum, const double *figures, const double *uncertainty,
                                       size_t count, struct gas_known wanted, double *part)
{
    struct sweep sweep = {plan, gas, datum, count, wanted, {0}, {{0}, 0, 0, -1, 0, -1, -1}};
    if (count != (size_t)plan->known_count)
        return gas_bad(GAS_TOO_MANY, 0, (double)count);
    if (count > 0)
        memcpy(sweep.figures, figures, count * sizeof *figures);
    struct gas_result here = gas_plan_run(plan, gas, datum, INFINITY, figures, count, &wanted, 1, &sweep.values);
    return here.status == GAS_OK ? sum_of_squares(&sweep, uncertainty, part) : here;
}
