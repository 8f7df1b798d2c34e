#include "sheet/machine.h"

#include <math.h>
#include <string.h>

#include "sheet/job_units.h"

static bool admitted(const struct gas_heading *heading, const struct gas_admitted *list, size_t count)
{
    for (size_t i = 0; i < count && heading->state != GAS_CONSTANT; i++)
        if (list[i].symbol == heading->symbol && (list[i].states >> heading->state & 1))
            return true;
    return false;
}

bool gas_admit_givens(const struct gas_job *job, const struct gas_admitted *list, size_t count, uint32_t also,
                      const char *takes, struct gas_refusal *refusal)
{
    char shown[GAS_SHOWN];
    for (size_t i = 0; i < job->table.columns; i++) {
        const struct gas_heading *heading = &job->table.heading[i];
        bool taken = admitted(heading, list, count) || (int)i == job->barometer_column ||
                     (int)i == job->altitude_column || (also >> i & 1);
        if (taken && !heading->tolerance)
            continue;
        gas_quoted(shown, sizeof shown, heading->text, strlen(heading->text));
        if (heading->tolerance)
            return gas_refuse(refusal, "given", "%s is a plus-minus figure, which GAS.%s does not take; leave it out.",
                              shown, job->task->name);
        return gas_refuse(refusal, "given", "%s is not taken by GAS.%s; it takes %s.", shown, job->task->name, takes);
    }
    return true;
}

double gas_case_figure(const struct gas_job *job, const struct gas_case *figures, enum gas_symbol symbol, int state)
{
    int column = gas_job_column(job, symbol, state);
    return column < 0 ? NAN : figures->si[column];
}

bool gas_job_one_case(struct gas_job *job, struct gas_arena *arena, struct gas_row *row, struct gas_case *figures,
                      struct gas_refusal *refusal)
{
    if (job->table.rows != 1)
        return gas_refuse(refusal, "wanted", "%zu cases are given; say what is wanted of each, in headings.",
                          job->table.rows);
    return gas_job_prepare(job, arena, refusal) && gas_table_row(&job->table, 0, row, refusal) &&
           gas_job_case(job, row, figures, refusal);
}
