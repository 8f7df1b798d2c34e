/* FILL and VENT: a rigid vessel charged from a line, or emptied; one answer per case, or a card of one. */
#include <math.h>
#include <stdio.h>
#include <string.h>

#include "sheet/functions.h"
#include "sheet/job_units.h"
#include "sheet/machine.h"
#include "sheet/vessel_task.h"

/* What a card shows: the label and what it is read as. NULL as the unit: that of the givens. */
struct card_row {
    const char *label, *heading, *unit;
    enum gas_dimension like; /* the dimension whose unit is taken from the givens */
    bool orifice;            /* only where one is given */
};

static const struct card_row fill_rows[] = {
    {"T2", "T2", NULL, GAS_DIM_TEMPERATURE, false},
    {"m1", "m1", "kg", GAS_DIM_MASS, false},
    {"m2", "m2", "kg", GAS_DIM_MASS, false},
    {"m added", "m added", "kg", GAS_DIM_MASS, false},
    {"n added", "n added", "Nm3", GAS_DIM_AMOUNT, false},
    {"P settled", "P settled", NULL, GAS_DIM_PRESSURE, false},
    {"Q", "Q", "kJ", GAS_DIM_ENERGY, false},
    {"Z2, estimated", "Z2", "", GAS_DIM_NUMBER, false},
};

static const struct card_row vent_rows[] = {
    {"T2", "T2", NULL, GAS_DIM_TEMPERATURE, false},
    {"m1", "m1", "kg", GAS_DIM_MASS, false},
    {"m2", "m2", "kg", GAS_DIM_MASS, false},
    {"m out", "m out", "kg", GAS_DIM_MASS, false},
    {"n out", "n out", "Nm3", GAS_DIM_AMOUNT, false},
    {"P settled", "P settled", NULL, GAS_DIM_PRESSURE, false},
    {"Q", "Q", "kJ", GAS_DIM_ENERGY, false},
    {"Z1, estimated", "Z1", "", GAS_DIM_NUMBER, false},
    {"m flow at the start", "m1", "kg/s", GAS_DIM_MASS_FLOW, true},
    {"time", "time", "s", GAS_DIM_TIME, true},
};

/* A call being worked on. */
struct vessel_call {
    struct gas_job job;
    struct gas_refusal refusal;
    struct gas_row row;
    struct gas_case figures;
    struct gas_vessel_case solved;
};

static struct gas_heading row_heading(const struct gas_job *job, const struct card_row *row)
{
    char text[GAS_HEADING_TEXT];
    struct gas_unit like = gas_job_unit(job, row->like, row->like == GAS_DIM_PRESSURE ? "bar" : "°C");
    const char *unit = row->unit ? row->unit : like.text;
    snprintf(text, sizeof text, "%s%s%s", row->heading, unit[0] ? ", " : "", unit);
    return gas_heading_of(text);
}

/* One line of the card; a quantity that does not follow from these givens has none. */
static bool put_row(const struct vessel_call *vessel, struct gas_call *call, size_t at, const struct card_row *row)
{
    const struct gas_job *job = &vessel->job;
    struct gas_heading heading = row_heading(job, row);
    struct gas_refusal missing = {0};
    double si;
    if ((row->orifice && isnan(vessel->solved.area)) ||
        !gas_vessel_quantity(job, &vessel->figures, &vessel->solved, &heading, &si, &missing))
        return false;
    gas_put_text(call, at, 0, row->label);
    gas_put_number(call, at, 1, gas_job_shown(job, &vessel->figures, &heading, si));
    gas_put_text(call, at, 2, heading.has_unit ? heading.unit.text : "");
    return true;
}

static bool answer_card(struct vessel_call *vessel, struct gas_call *call)
{
    static const char *const headings[] = {"quantity", "value", "unit"};
    bool fill = vessel->job.task == &gas_fill_task;
    const struct card_row *rows = fill ? fill_rows : vent_rows;
    size_t count = fill ? sizeof fill_rows / sizeof *fill_rows : sizeof vent_rows / sizeof *vent_rows, used = 1;
    if (!gas_job_one_case(&vessel->job, call->arena, &vessel->row, &vessel->figures, &vessel->refusal) ||
        !gas_vessel_solve(&vessel->job, &vessel->figures, &vessel->solved, &vessel->refusal))
        return false;
    if (!gas_answer_block(call, count + 1, 3))
        return true;
    gas_put_texts(call, 0, headings, 3);
    for (size_t i = 0; i < count; i++)
        used += put_row(vessel, call, used, &rows[i]);
    call->answer.rows = used;
    return true;
}

/* (gas; given; [wanted]; [headings]; [options]) */
static void answer(struct gas_call *call, const struct gas_task *task)
{
    const struct gas_job_arguments arguments = {.gas = gas_argument(call, 0),
                                                .given = gas_argument(call, 1),
                                                .wanted = gas_argument(call, 2),
                                                .headings = gas_argument(call, 3),
                                                .options = gas_argument(call, 4)};
    struct vessel_call vessel;
    memset(&vessel, 0, sizeof vessel);
    struct gas_job *job = &vessel.job;
    job->task = task;
    job->options = gas_options_default;
    bool good = gas_job_read(job, &arguments, &vessel.refusal);
    if (good && job->wanted.columns == 0)
        good = answer_card(&vessel, call);
    else if (good && (good = gas_job_prepare(job, call->arena, &vessel.refusal)))
        gas_job_answer(job, call);
    if (!good)
        gas_job_refused(call, &job->options, &vessel.refusal);
    gas_job_close(job);
}

void gas_fn_fill(struct gas_call *call)
{
    answer(call, &gas_fill_task);
}

void gas_fn_vent(struct gas_call *call)
{
    answer(call, &gas_vent_task);
}
