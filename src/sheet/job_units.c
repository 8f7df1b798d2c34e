#include "sheet/job_units.h"

#include <math.h>
#include <string.h>

struct gas_unit gas_job_unit(const struct gas_job *job, enum gas_dimension dimension, const char *otherwise)
{
    struct gas_unit unit;
    struct gas_unit_fault fault;
    for (size_t i = 0; i < job->table.columns; i++)
        if (job->table.heading[i].unit.dimension == dimension && !job->table.heading[i].tolerance)
            return job->table.heading[i].unit;
    return gas_unit_parse(otherwise, strlen(otherwise), NULL, &unit, &fault) ? unit : gas_unit_si(dimension);
}

const char *gas_shown_pressure(const struct gas_job *job, const struct gas_case *figures, char buffer[GAS_SHOWN],
                               double P)
{
    struct gas_unit unit = gas_job_unit(job, GAS_DIM_PRESSURE, "bar");
    return gas_figure(buffer, GAS_SHOWN, gas_unit_from_si(&unit, P, figures->barometer), &unit);
}

const char *gas_shown_temperature(const struct gas_job *job, const struct gas_case *figures, char buffer[GAS_SHOWN],
                                  double T)
{
    struct gas_unit unit = gas_job_unit(job, GAS_DIM_TEMPERATURE, "°C");
    return gas_figure(buffer, GAS_SHOWN, gas_unit_from_si(&unit, T, figures->barometer), &unit);
}

bool gas_refuse_no_basis(const struct gas_heading *heading, double n, struct gas_refusal *refusal)
{
    if (isnan(n) && gas_dimension_extent(heading->unit.dimension) != GAS_EXTENT_NONE)
        return gas_refuse(refusal, "wanted",
                          "\"%s\" needs the amount of gas, which does not follow from the givens; give m, n, V or Nm3, "
                          "or their flows, or ask per kg or per mol.",
                          heading->text);
    return gas_refuse(refusal, heading->text, "it has no value here; ask for another quantity or unit.");
}
