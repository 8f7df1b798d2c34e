/* WORKING: a calculation step by step, as a check print. */
#include <math.h>
#include <stdio.h>
#include <string.h>

#include "audit/functions.h"
#include "audit/print.h"
#include "sheet/job_solve.h"
#include "sheet/path_task.h"
#include "sheet/stages_task.h"
#include "sheet/vessel_task.h"

/* -- what the sum stands on ---------------------------------------------------------------------------------------- */

static struct line *print_basis(struct print *print, const char *quantity, const char *formula, const char *source)
{
    struct line *line = print_line(print, "basis");
    snprintf(line->quantity, sizeof line->quantity, "%s", quantity);
    snprintf(line->formula, sizeof line->formula, "%s", formula);
    snprintf(line->source, sizeof line->source, "%s", source);
    return line;
}

static void set_result(struct line *line, double result, const char *unit)
{
    line->has_result = isfinite(result);
    line->result = result;
    snprintf(line->unit, sizeof line->unit, "%s", unit);
}

/* Does any given or wanted heading satisfy a question? */
static bool any_heading(const struct gas_job *job, bool (*is)(const struct gas_heading *heading))
{
    for (size_t i = 0; i < job->table.columns; i++)
        if (is(&job->table.heading[i]))
            return true;
    for (size_t i = 0; i < job->wanted.columns; i++)
        if (is(&job->wanted.heading[i]))
            return true;
    return false;
}

static bool is_gauge(const struct gas_heading *heading)
{
    return heading->unit.dimension == GAS_DIM_PRESSURE && heading->unit.basis != GAS_ABSOLUTE;
}

static bool is_reference(const struct gas_heading *heading)
{
    return heading->unit.reference_volume;
}

static bool has_datum(const struct gas_heading *heading)
{
    enum gas_symbol symbol = heading->symbol;
    return symbol == GAS_SYM_H_SPECIFIC || symbol == GAS_SYM_U_SPECIFIC || symbol == GAS_SYM_S_SPECIFIC ||
           symbol == GAS_SYM_H_TOTAL || symbol == GAS_SYM_U_TOTAL || symbol == GAS_SYM_S_TOTAL;
}

static bool leg_is_gauge(const struct gas_job *job)
{
    const struct gas_typed_legs *legs = job->task == &gas_path_task ? job->legs : NULL;
    for (size_t i = 0; legs && i < legs->count; i++)
        if (legs->leg[i].value.kind == GAS_FIGURE_FIXED && legs->leg[i].value.unit.basis != GAS_ABSOLUTE)
            return true;
    return false;
}

static void print_references(struct print *print)
{
    const struct gas_job *job = print->job;
    for (size_t i = 0; i < job->table.columns + job->wanted.columns; i++) {
        char words[160];
        const struct gas_heading *heading =
            i < job->table.columns ? &job->table.heading[i] : &job->wanted.heading[i - job->table.columns];
        if (!is_reference(heading))
            continue;
        snprintf(words, sizeof words, "%.40s is an amount: a volume at %s K and %s Pa", heading->unit.text,
                 gas_shown(heading->unit.reference_T).text, gas_shown_to(heading->unit.reference_P, 8).text);
        print_basis(print, "reference conditions", words, "the unit as written, or the options");
    }
}

static void print_conventions(struct print *print)
{
    char words[160];
    const struct gas_job *job = print->job;
    const struct gas_options *options = &job->options;
    if (any_heading(job, is_gauge) || leg_is_gauge(job))
        set_result(print_basis(print, "barometer", "absolute = gauge + barometer", "options; 101325 Pa unless given"),
                   print->figures.barometer, "Pa");
    print_references(print);
    if (any_heading(job, has_datum)) {
        snprintf(words, sizeof words, "h = 0 and s = 0 at %s K and %s Pa; u = h - P v",
                 gas_shown(options->datum.T).text, gas_shown(options->datum.P).text);
        print_basis(print, "datum", words, "options; 25 °C and 1 bar unless given");
    }
    if (job->task == &gas_fill_task || job->task == &gas_vent_task)
        print_basis(print, "Q", "heat into the gas is positive; the gas in the vessel is well mixed", "convention");
    else if (job->task != &gas_task_solve) {
        bool flow = options->system == GAS_FLOW || job->task == &gas_stages_task;
        print_basis(print, "W",
                    options->work_by_gas ? "work by the gas is positive in the answer" : "work on the gas is positive",
                    "convention");
        print_basis(print, "system", flow ? "steady flow: shaft work, Q + W = dH" : "closed: boundary work, Q + W = dU",
                    "convention");
    }
}

static void print_gas(struct print *print)
{
    const struct gas_job *job = print->job;
    const struct gas_choice *choice = job->choice;
    struct line *line = print_basis(print, "gas", "", choice->source_key[0] ? choice->source_key : choice->source);
    snprintf(line->formula, sizeof line->formula, "%.80s%s%.60s", choice->label, choice->rule[0] ? " | " : "",
             choice->rule);
    set_result(print_basis(print, "R", "molar gas constant", "BIPM SI Brochure, 9th ed.; exact"), job->gas.R,
               "J/(mol K)");
    set_result(print_basis(print, "M", "molar mass", "IUPAC standard atomic weights 2021, or the card"),
               1000 * job->gas.molar_mass, "kg/kmol");
}

/* -- the givens ---------------------------------------------------------------------------------------------------- */

/* "T constant": the same in every state, without a figure. */
static void print_constant(struct print *print, const struct gas_heading *heading)
{
    struct line *line = print_line(print, "given");
    snprintf(line->quantity, sizeof line->quantity, "%s", gas_symbol_text(heading->symbol));
    snprintf(line->figures, sizeof line->figures, "the same in every state");
    snprintf(line->source, sizeof line->source, "given: %.70s", heading->text);
}

static void print_given(struct print *print, size_t column)
{
    char shown[80];
    const struct gas_heading *heading = &print->job->table.heading[column];
    char name[GAS_NAME_TEXT];
    if (!(print->row.given >> column & 1))
        return;
    if (heading->state == GAS_CONSTANT) {
        print_constant(print, heading);
        return;
    }
    struct line *line = print_line(print, "given");
    snprintf(line->quantity, sizeof line->quantity, "%s%s", heading->tolerance ? "±" : "",
             gas_quantity_name(name, heading->symbol, heading->state));
    gas_figure(shown, sizeof shown, print->row.figure[column], &heading->unit);
    bool gauge = is_gauge(heading), level = heading->unit.dimension == GAS_DIM_TEMPERATURE && heading->unit.offset != 0;
    const char *sign = heading->unit.basis == GAS_VACUUM ? "barometer less " : "";
    if (gauge)
        snprintf(line->figures, sizeof line->figures, "%s%s%s", sign, shown, *sign ? "" : " + barometer");
    else if (level)
        snprintf(line->figures, sizeof line->figures, "%s + %s", shown, gas_shown(heading->unit.offset).text);
    else
        snprintf(line->figures, sizeof line->figures, "%s", shown);
    snprintf(line->source, sizeof line->source, "given: %.70s", heading->text);
    set_result(line, print->figures.si[column], gas_dimension_si(heading->unit.dimension));
}

/* -- the print ----------------------------------------------------------------------------------------------------- */

static bool print_steps(struct print *print, struct gas_refusal *refusal)
{
    const struct gas_task *task = print->job->task;
    if (task == &gas_task_solve)
        return print_states(print, refusal);
    if (task == &gas_stages_task)
        return print_stages(print, refusal);
    return task == &gas_path_task ? print_path(print, refusal) : print_vessel(print, refusal);
}

static void print_answers(struct print *print)
{
    const struct gas_job *job = print->job;
    for (size_t i = 0; i < job->wanted.columns; i++) {
        const struct gas_heading *heading = &job->wanted.heading[i];
        struct line *line = print_line(print, "answer");
        snprintf(line->quantity, sizeof line->quantity, "%s", heading->text);
        snprintf(line->formula, sizeof line->formula, "%s", is_gauge(heading) ? "less the barometer" : "in its unit");
        print_figure(line, gas_symbol_text(heading->symbol), print->si[i], gas_dimension_si(heading->unit.dimension));
        set_result(line, gas_job_shown(job, &print->figures, heading, print->si[i]), heading->unit.text);
    }
}

static bool make_print(struct print *print, struct gas_job *job, struct gas_arena *arena, struct gas_refusal *refusal)
{
    print->job = job;
    if (job->table.rows != 1)
        return gas_refuse(refusal, "given", "%zu cases are given, but a working shows one; take one row.",
                          job->table.rows);
    if (!gas_job_prepare(job, arena, refusal) || !gas_table_row(&job->table, 0, &print->row, refusal) ||
        !gas_job_case(job, &print->row, &print->figures, refusal) ||
        !job->task->run(job, &print->figures, print->si, refusal))
        return false;
    print_gas(print);
    print_conventions(print);
    for (size_t i = 0; i < job->table.columns; i++)
        print_given(print, i);
    if (!print_steps(print, refusal))
        return false;
    print_answers(print);
    return true;
}

enum { SHOWN_COLUMNS = 7 };

static void answer_print(const struct print *print, struct gas_call *call)
{
    static const char *const titles[SHOWN_COLUMNS] = {"step",   "quantity", "formula", "figures put in",
                                                      "result", "unit",     "source"};
    if (!gas_answer_block(call, print->lines + 1, SHOWN_COLUMNS))
        return;
    gas_put_texts(call, 0, titles, SHOWN_COLUMNS);
    for (size_t i = 0; i < print->lines; i++) {
        const struct line *line = &print->line[i];
        const char *texts[SHOWN_COLUMNS] = {line->step, line->quantity, line->formula, line->figures,
                                            "",         line->unit,     line->source};
        gas_put_texts(call, i + 1, texts, SHOWN_COLUMNS);
        if (line->has_result)
            gas_put_number(call, i + 1, 4, line->result);
    }
}

void gas_fn_working(struct gas_call *call)
{
    static const struct check_arguments places = {.given = 1, .wanted = 2, .legs = 3, .headings = 4, .options = 5};
    struct check_call *check = gas_arena_take(call->arena, 1, sizeof *check);
    struct print *print = gas_arena_take(call->arena, 1, sizeof *print);
    if (!check || !print) {
        gas_answer_text(call, "Check given: there is not enough memory for it; close other documents.");
        return;
    }
    memset(print, 0, sizeof *print);
    if (check_open(check, call, &places) && make_print(print, &check->job, call->arena, &check->refusal))
        answer_print(print, call);
    else
        gas_job_refused(call, &check->job.options, &check->refusal);
    gas_job_close(&check->job);
}
