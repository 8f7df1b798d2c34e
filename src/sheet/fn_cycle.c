/* CYCLE: the figures of a path that closes. */
#include <math.h>
#include <stdio.h>
#include <string.h>

#include "sheet/functions.h"
#include "sheet/job_units.h"
#include "sheet/path_call.h"

#define TURNING "the heat changes sign on a leg whose temperatures leave the data; split that leg."

/* What a cycle can be asked, by symbol. */
static const struct cycle_row {
    enum gas_symbol symbol;
    enum gas_dimension molar; /* MOLAR_ENERGY goes with the amount; others stand as they are */
    size_t offset;
    const char *unit;    /* on the card; NULL: an energy, in the unit that goes with the givens */
    const char *why_not; /* when it is NAN */
} cycle_rows[] = {
    {GAS_SYM_W_NET, GAS_DIM_MOLAR_ENERGY, offsetof(struct gas_cycle, W_net), NULL, ""},
    {GAS_SYM_Q_IN, GAS_DIM_MOLAR_ENERGY, offsetof(struct gas_cycle, Q_in), NULL, TURNING},
    {GAS_SYM_Q_OUT, GAS_DIM_MOLAR_ENERGY, offsetof(struct gas_cycle, Q_out), NULL, TURNING},
    {GAS_SYM_EFFICIENCY, GAS_DIM_NUMBER, offsetof(struct gas_cycle, efficiency), "%",
     "this cycle takes work in; ask for COP heating or COP cooling."},
    {GAS_SYM_COP_HEATING, GAS_DIM_NUMBER, offsetof(struct gas_cycle, cop_heating), "",
     "this cycle gives work; ask for the efficiency."},
    {GAS_SYM_COP_COOLING, GAS_DIM_NUMBER, offsetof(struct gas_cycle, cop_cooling), "",
     "this cycle gives work; ask for the efficiency."},
    {GAS_SYM_MEP, GAS_DIM_PRESSURE, offsetof(struct gas_cycle, mep), "kPa", "the volume does not change."},
};

static bool cycle_quantity(const struct gas_path_call *path, const struct gas_path_case *solved,
                           const struct gas_cycle *cycle, const struct gas_heading *heading, double *si,
                           struct gas_refusal *refusal)
{
    for (size_t i = 0; i < sizeof cycle_rows / sizeof *cycle_rows; i++) {
        const struct cycle_row *row = &cycle_rows[i];
        if (row->symbol != heading->symbol)
            continue;
        double figure;
        memcpy(&figure, (const char *)cycle + row->offset, sizeof figure);
        if (isnan(figure))
            return gas_refuse(refusal, heading->text, "%s", row->why_not);
        bool energy = row->molar == GAS_DIM_MOLAR_ENERGY;
        *si = energy ? gas_job_from_molar(&path->job, row->molar, figure, solved->n, heading->unit.dimension) : figure;
        return !isnan(*si) || gas_refuse_no_basis(heading, solved->n, refusal);
    }
    return gas_refuse(refusal, heading->text,
                      "a cycle gives W net, Q in, Q out, efficiency, COP heating, COP "
                      "cooling and mep; ask for those.");
}

static bool closed_cycle(struct gas_path_call *path, const struct gas_path_case *solved, struct gas_cycle *cycle)
{
    struct gas_result result = gas_cycle_of(&solved->start, solved->change, solved->count, 1e-6, cycle);
    if (result.status == GAS_OK)
        return true;
    return gas_refuse(&path->refusal, "legs",
                      "the cycle does not close: P ends %s %% and T %s %% off its start; end "
                      "the last leg with \"to start\".",
                      gas_shown_to(100 * cycle->gap_P, 3).text, gas_shown_to(100 * cycle->gap_T, 3).text);
}

static struct gas_heading cycle_heading(const struct gas_job *job, const struct cycle_row *row)
{
    const char *unit = row->unit ? row->unit : gas_path_energy_unit(job);
    char text[GAS_HEADING_TEXT];
    snprintf(text, sizeof text, "%s%s%s", gas_symbol_text(row->symbol), unit[0] ? ", " : "", unit);
    return gas_heading_of(text);
}

/* Without wanted: label | value | unit of everything that has a value. */
static bool answer_cycle_card(struct gas_path_call *path, struct gas_call *call, const struct gas_path_case *solved,
                              const struct gas_cycle *cycle)
{
    static const char *const headings[] = {"quantity", "value", "unit"};
    size_t rows = 1;
    if (!gas_answer_block(call, 2 + sizeof cycle_rows / sizeof *cycle_rows, 3))
        return true;
    gas_put_texts(call, 0, headings, 3);
    for (size_t i = 0; i < sizeof cycle_rows / sizeof *cycle_rows; i++) {
        struct gas_heading heading = cycle_heading(&path->job, &cycle_rows[i]);
        struct gas_refusal no_value = {0};
        double si = NAN;
        if (!cycle_quantity(path, solved, cycle, &heading, &si, &no_value))
            continue;
        bool work = heading.symbol == GAS_SYM_W_NET;
        const char *by_gas = path->job.options.work_by_gas ? "W net by gas" : "W net on gas";
        gas_put_text(call, rows, 0, work ? by_gas : gas_symbol_text(heading.symbol));
        gas_put_number(call, rows, 1, gas_job_shown(&path->job, &path->figures, &heading, si));
        gas_put_text(call, rows++, 2, heading.has_unit ? heading.unit.text : "");
    }
    gas_put_text(call, rows, 0, "direction");
    gas_put_text(call, rows++, 1,
                 cycle->W_net < 0 ? "clockwise in P-V, gives work" : "anticlockwise in P-V, takes work");
    call->answer.rows = rows;
    return true;
}

static bool answer_cycle(struct gas_path_call *path, struct gas_call *call)
{
    struct gas_path_case solved;
    struct gas_cycle cycle;
    const struct gas_wanted *wanted = &path->job.wanted;
    if (!gas_path_solve_one(path, call, &solved) || !closed_cycle(path, &solved, &cycle))
        return false;
    if (wanted->columns == 0)
        return answer_cycle_card(path, call, &solved, &cycle);
    if (!gas_answer_block(call, wanted->down ? wanted->columns : 1, wanted->down ? 1 : wanted->columns))
        return true;
    for (size_t i = 0; i < wanted->columns; i++) {
        double si = NAN;
        if (!cycle_quantity(path, &solved, &cycle, &wanted->heading[i], &si, &path->refusal))
            return false;
        gas_put_number(call, wanted->down ? i : 0, wanted->down ? 0 : i,
                       gas_job_shown(&path->job, &path->figures, &wanted->heading[i], si));
    }
    return true;
}

/* (gas; given; legs; [wanted]; [options]) */
void gas_fn_cycle(struct gas_call *call)
{
    static const struct gas_path_arguments places = {.given = 1, .legs = 2, .wanted = 3, .options = 4};
    struct gas_path_call path;
    if (!gas_path_start(&path, call, &places) || !answer_cycle(&path, call))
        gas_job_refused(call, &path.job.options, &path.refusal);
    gas_job_close(&path.job);
}
