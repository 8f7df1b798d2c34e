#include "sheet/path_call.h"

#include <stdio.h>
#include <string.h>

#include "sheet/job_units.h"

static const struct gas_block *argument_at(const struct gas_call *call, size_t index)
{
    static const struct gas_block omitted = {0};
    return index ? gas_argument(call, index) : &omitted;
}

bool gas_path_start(struct gas_path_call *path, const struct gas_call *call, const struct gas_path_arguments *places)
{
    struct gas_job_arguments arguments = {.gas = gas_argument(call, 0),
                                          .given = gas_argument(call, places->given),
                                          .wanted = argument_at(call, places->wanted),
                                          .headings = argument_at(call, places->headings),
                                          .options = gas_argument(call, places->options)};
    memset(path, 0, sizeof *path);
    return gas_path_open(&path->job, &path->legs, &arguments, gas_argument(call, places->legs), &path->refusal);
}

/* The single case of a function that shows a whole path. */
bool gas_path_solve_one(struct gas_path_call *path, struct gas_call *call, struct gas_path_case *solved)
{
    struct gas_job *job = &path->job;
    if (job->table.rows != 1)
        return gas_refuse(&path->refusal, "given",
                          "%zu cases are given, but this function shows one; take one row, or "
                          "GAS.WORK, GAS.HEAT and GAS.END for tables.",
                          job->table.rows);
    return gas_job_prepare(job, call->arena, &path->refusal) &&
           gas_table_row(&job->table, 0, &path->row, &path->refusal) &&
           gas_job_case(job, &path->row, &path->figures, &path->refusal) &&
           gas_path_solve(job, &path->figures, solved, &path->refusal);
}

/* Is the amount told by the givens, so that totals can be shown? */
static bool has_amount(const struct gas_job *job)
{
    return job->extent != GAS_EXTENT_NONE;
}

const char *gas_path_energy_unit(const struct gas_job *job)
{
    if (!has_amount(job))
        return "kJ/kg";
    return job->options.system == GAS_FLOW ? "kW" : "kJ";
}

static void add_wanted(struct gas_job *job, const char *format, const char *unit)
{
    char text[GAS_HEADING_TEXT];
    snprintf(text, sizeof text, format, unit);
    job->wanted.heading[job->wanted.columns++] = gas_heading_of(text);
}

/* The columns of a path when none are wanted: the end of each leg in the units of the givens, then the changes. */
void gas_path_columns(struct gas_job *job, bool changes)
{
    bool flow = job->options.system == GAS_FLOW, total = has_amount(job);
    const char *energy = gas_path_energy_unit(job);
    const char *entropy = !total ? "kJ/kg-K" : flow ? "kW/K" : "kJ/K";
    add_wanted(job, "P, %s", gas_job_unit(job, GAS_DIM_PRESSURE, "bar").text);
    add_wanted(job, "T, %s", gas_job_unit(job, GAS_DIM_TEMPERATURE, "°C").text);
    if (!total)
        add_wanted(job, "v, %s", "m3/kg");
    else
        add_wanted(job, "V, %s", flow ? "m3/s" : gas_job_unit(job, GAS_DIM_VOLUME, "m3").text);
    if (!changes) {
        add_wanted(job, "s, %s", "kJ/kg-K");
        return;
    }
    add_wanted(job, job->options.work_by_gas ? "W by gas, %s" : "W on gas, %s", energy);
    add_wanted(job, "Q, %s", energy);
    add_wanted(job, "dU, %s", energy);
    add_wanted(job, "dH, %s", energy);
    add_wanted(job, "dS, %s", entropy);
}

void gas_path_put_headings(const struct gas_job *job, struct gas_call *call, size_t first)
{
    for (size_t i = 0; i < job->wanted.columns; i++)
        gas_put_text(call, 0, i + first, job->wanted.heading[i].text);
}
