/* WORK, HEAT and END for every row of givens, PATH for the legs of one case. */
#include "sheet/functions.h"
#include "sheet/path_call.h"

/* "kJ" alone is the work for WORK, the heat for HEAT; nothing at all is J, or W in flow. */
static bool complete_wanted(struct gas_path_call *path, enum gas_symbol symbol)
{
    struct gas_wanted *wanted = &path->job.wanted;
    if (wanted->columns == 0 && symbol != GAS_SYM_NONE) {
        wanted->heading[0] = gas_heading_of(path->job.options.system == GAS_FLOW ? "W, W" : "W, J");
        wanted->heading[0].symbol = symbol;
        wanted->columns = 1;
    }
    for (size_t i = 0; i < wanted->columns; i++) {
        struct gas_heading *heading = &wanted->heading[i];
        if (heading->symbol == GAS_SYM_NONE && gas_is_energy(heading->unit.dimension) && symbol != GAS_SYM_NONE)
            heading->symbol = symbol;
        else if (heading->symbol == GAS_SYM_NONE)
            return gas_refuse(&path->refusal, "wanted",
                              "\"%s\" does not say which quantity; write one such as W, kJ or "
                              "Q, kJ.",
                              heading->text);
        else if (symbol != GAS_SYM_NONE && heading->symbol != symbol)
            return gas_refuse(&path->refusal, "wanted", "\"%s\" is not %s; GAS.END and GAS.PATH give other quantities.",
                              heading->text, gas_symbol_words(symbol));
    }
    return wanted->columns > 0 ||
           gas_refuse(&path->refusal, "wanted", "nothing is asked for; write one such as P, bar(g) or T, °C.");
}

/* Boundary work of a flow is seldom what was meant: the sheet has to say which work it is. */
static bool system_is_clear(struct gas_path_call *path)
{
    if (path->job.extent != GAS_EXTENT_FLOW || path->job.options.system_said)
        return true;
    return gas_refuse(&path->refusal, "options",
                      "a flow is given; add the option flow for the shaft work of a machine, or "
                      "closed for boundary work per time.");
}

/* (gas; given; legs; [wanted]; [headings]; [options]) */
static void answer_rows(struct gas_call *call, enum gas_symbol symbol)
{
    static const struct gas_path_arguments places = {.given = 1, .legs = 2, .wanted = 3, .headings = 4, .options = 5};
    struct gas_path_call path;
    if (gas_path_start(&path, call, &places) && system_is_clear(&path) && complete_wanted(&path, symbol) &&
        gas_job_prepare(&path.job, call->arena, &path.refusal))
        gas_job_answer(&path.job, call);
    else
        gas_job_refused(call, &path.job.options, &path.refusal);
    gas_job_close(&path.job);
}

void gas_fn_work(struct gas_call *call)
{
    answer_rows(call, GAS_SYM_W);
}

void gas_fn_heat(struct gas_call *call)
{
    answer_rows(call, GAS_SYM_Q);
}

void gas_fn_end(struct gas_call *call)
{
    answer_rows(call, GAS_SYM_NONE);
}

static bool put_row(const struct gas_path_call *path, struct gas_call *call, size_t row, const char *label,
                    const struct gas_path_case *solved, const struct gas_change *change, struct gas_refusal *refusal)
{
    const struct gas_job *job = &path->job;
    gas_put_text(call, row, 0, label);
    for (size_t i = 0; i < job->wanted.columns; i++) {
        const struct gas_heading *heading = &job->wanted.heading[i];
        double si;
        if (!gas_path_quantity(job, solved, change, heading, &si, refusal))
            return false;
        gas_put_number(call, row, i + 1, gas_job_shown(job, &path->figures, heading, si));
    }
    return true;
}

/* A heading row, one row per leg, a total. */
static bool answer_path(struct gas_path_call *path, struct gas_call *call)
{
    struct gas_path_case solved;
    if (path->job.wanted.columns == 0)
        gas_path_columns(&path->job, true);
    if (!gas_path_solve_one(path, call, &solved) ||
        !gas_answer_block(call, solved.count + 2, path->job.wanted.columns + 1))
        return !path->refusal.made;
    gas_put_text(call, 0, 0, "leg");
    gas_path_put_headings(&path->job, call, 1);
    for (size_t i = 0; i < solved.count; i++)
        if (!put_row(path, call, i + 1, path->legs.leg[i].text, &solved, &solved.change[i], &path->refusal))
            return false;
    return put_row(path, call, solved.count + 1, "total", &solved, &solved.total, &path->refusal);
}

void gas_fn_path(struct gas_call *call)
{
    static const struct gas_path_arguments places = {.given = 1, .legs = 2, .wanted = 3, .headings = 4, .options = 5};
    struct gas_path_call path;
    if (!gas_path_start(&path, call, &places) || !system_is_clear(&path) || !answer_path(&path, call))
        gas_job_refused(call, &path.job.options, &path.refusal);
    gas_job_close(&path.job);
}
