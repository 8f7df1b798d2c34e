#include "audit/call.h"

#include <string.h>

#include "sheet/job_solve.h"
#include "sheet/path_task.h"
#include "sheet/piece.h"
#include "sheet/stages_task.h"
#include "sheet/vessel_task.h"

/* Does the text speak of stages, as GAS.STAGES takes them? A leg never does. */
static bool speaks_of_stages(const struct gas_block *legs)
{
    for (size_t i = 0; i < legs->rows * legs->columns; i++)
        if (legs->cell[i].kind == GAS_CELL_TEXT &&
            (strcasestr(legs->cell[i].text, "stage") || strcasestr(legs->cell[i].text, "ratio")))
            return true;
    return false;
}

/* The argument is one word. */
static bool says(const struct gas_block *legs, const char *word)
{
    if (!gas_single(legs) || legs->cell->kind != GAS_CELL_TEXT)
        return false;
    struct gas_piece text = gas_piece_of(legs->cell);
    return gas_piece_take(&text, word) && text.length == 0;
}

static bool read_arguments(struct check_call *check, const struct gas_call *call, const struct check_arguments *places)
{
    const struct gas_job_arguments arguments = {.gas = gas_argument(call, 0),
                                                .given = gas_argument(call, places->given),
                                                .wanted = gas_argument(call, places->wanted),
                                                .headings = gas_argument(call, places->headings),
                                                .options = gas_argument(call, places->options)};
    const struct gas_block *legs = gas_argument(call, places->legs);
    if (says(legs, "fill") || says(legs, "vent")) {
        check->job.task = says(legs, "fill") ? &gas_fill_task : &gas_vent_task;
        return gas_job_read(&check->job, &arguments, &check->refusal);
    }
    if (speaks_of_stages(legs)) {
        check->job.task = &gas_stages_task;
        check->job.legs = &check->staging;
        return gas_job_read(&check->job, &arguments, &check->refusal) &&
               gas_staging_read(legs, &check->job.options, &check->staging, &check->refusal);
    }
    if (!gas_omitted(legs) && !(gas_single(legs) && gas_cell_blank(legs->cell)))
        return gas_path_open(&check->job, &check->legs, &arguments, legs, &check->refusal);
    check->job.task = &gas_task_solve;
    return gas_job_read(&check->job, &arguments, &check->refusal);
}

bool check_open(struct check_call *check, const struct gas_call *call, const struct check_arguments *places)
{
    memset(check, 0, sizeof *check);
    check->job.options = gas_options_default;
    if (!read_arguments(check, call, places))
        return false;
    for (size_t i = 0; i < check->job.wanted.columns; i++)
        if (check->job.wanted.heading[i].symbol == GAS_SYM_NONE)
            return gas_refuse(&check->refusal, "wanted",
                              "\"%s\" does not say which quantity; write one such as W, kJ or Q, kJ.",
                              check->job.wanted.heading[i].text);
    return check->job.wanted.columns > 0 ||
           gas_refuse(&check->refusal, "wanted", "nothing is asked for; write one such as m, kg or P2, bar(g).");
}

bool check_one(struct check_call *check, size_t wanted, struct gas_job *job, struct gas_arena *arena)
{
    *job = check->job;
    job->wanted.columns = 1;
    job->wanted.heading[0] = check->job.wanted.heading[wanted];
    return gas_job_prepare(job, arena, &check->refusal);
}
