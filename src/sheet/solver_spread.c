/* The uncertainty of what a solver finds, from the plus-minus columns. */
#include "sheet/solver_parts.h"

#include <math.h>

/* How a pressure moves with the barometer. */
static double barometer_sign(const struct gas_heading *heading)
{
    return heading->unit.basis == GAS_GAUGE ? 1 : heading->unit.basis == GAS_VACUUM ? -1 : 0;
}

/* One sum of squares being put together. */
struct spread {
    const struct gas_solver *solver;
    const struct gas_job *job;
    const struct gas_case *figures;
    const struct solver_entry *entry;
    struct gas_known wanted;
    double ordered[GAS_COLUMNS];
};

/* The plus-minus of a column in SI, NAN when it has none here. */
static double spread_of_column(const struct spread *spread, size_t column)
{
    int tolerance = spread->solver->column[column].tolerance;
    if (tolerance < 0 || !(spread->figures->row->given >> tolerance & 1))
        return NAN;
    double si = spread->figures->si[tolerance];
    if (!gas_heading_is_share(&spread->job->table.heading[tolerance]))
        return si;
    const struct gas_unit *unit = &spread->job->table.heading[column].unit; /* a share of the figure as it was read */
    return si * fabs(gas_unit_difference_to_si(unit, spread->figures->row->figure[column]));
}

static struct gas_result propagate(const struct spread *spread, const double *each, double *part)
{
    return gas_plan_uncertainty(&spread->entry->plan, &spread->job->gas, &spread->job->options.datum, spread->ordered,
                                each, spread->entry->count, spread->wanted, part);
}

/* The readings one by one. */
static struct gas_result of_readings(const struct spread *spread, bool *any)
{
    double each[GAS_COLUMNS];
    for (size_t i = 0; i < spread->entry->count; i++) {
        each[i] = spread_of_column(spread, spread->entry->column[i]);
        *any = *any || !isnan(each[i]);
    }
    return propagate(spread, each, NULL);
}

/* The barometer moves every gauge reading at once, and the reading that is wanted the other way. */
static struct gas_result of_barometer(const struct spread *spread, const struct gas_heading *wanted, double u)
{
    double each[GAS_COLUMNS], part[GAS_COLUMNS], sum = 0;
    for (size_t i = 0; i < spread->entry->count; i++)
        each[i] = barometer_sign(&spread->job->table.heading[spread->entry->column[i]]) != 0 ? u : NAN;
    struct gas_result result = propagate(spread, each, part);
    if (result.status != GAS_OK)
        return result;
    for (size_t i = 0; i < spread->entry->count; i++)
        sum += barometer_sign(&spread->job->table.heading[spread->entry->column[i]]) * part[i];
    if (spread->wanted.variable == GAS_VAR_P && barometer_sign(wanted) != 0)
        sum -= u;
    return gas_good(sum);
}

static double barometer_spread(const struct gas_job *job, const struct gas_case *figures)
{
    int column = gas_job_tolerance_column(job, GAS_SYM_BAROMETER, 0);
    if (column < 0 || !(figures->row->given >> column & 1))
        return 0;
    double si = figures->si[column];
    return gas_heading_is_share(&job->table.heading[column]) ? si * figures->barometer : si;
}

static bool refuse_figures(struct gas_refusal *refusal)
{
    return gas_refuse(refusal, "wanted",
                      "the uncertainty cannot be found; the figures less or more their plus-minus "
                      "leave what is possible.");
}

/* A share is of the value itself. */
static bool share(const struct spread *spread, double *value, struct gas_refusal *refusal)
{
    struct gas_values found;
    struct gas_result result =
        gas_plan_run(&spread->entry->plan, &spread->job->gas, &spread->job->options.datum, INFINITY, spread->ordered,
                     spread->entry->count, &spread->wanted, 1, &found);
    if (result.status != GAS_OK)
        return refuse_figures(refusal);
    *value /= gas_plan_value(&spread->entry->plan, &found, spread->wanted.variable, spread->wanted.state);
    return true;
}

bool gas_solver_uncertainty(struct gas_solver *solver, const struct gas_job *job, const struct gas_case *figures,
                            size_t need, const struct gas_heading *wanted, double *value, struct gas_refusal *refusal)
{
    struct spread spread = {
        solver, job, figures, solver_entry_for(solver, job, figures->row->given), solver->need[need].known, {0}};
    if (spread.entry->refusal.made)
        return gas_refuse_sentence(refusal, spread.entry->refusal.text);
    solver_in_order(spread.entry, figures, spread.ordered);
    double barometer = barometer_spread(job, figures);
    bool any = barometer > 0;
    struct gas_result readings = of_readings(&spread, &any);
    if (!any)
        return gas_refuse(refusal, "wanted",
                          "an uncertainty needs those of the givens; add columns such as \"±P1, bar\".");
    struct gas_result shared = barometer > 0 ? of_barometer(&spread, wanted, barometer) : gas_good(0);
    if (readings.status != GAS_OK || shared.status != GAS_OK)
        return refuse_figures(refusal);
    *value = hypot(readings.value, shared.value);
    return !gas_heading_is_share(wanted) || share(&spread, value, refusal);
}
