/* SOLVE: states, closed-system changes, flows; with nothing wanted, a card of everything that follows. */
#include "sheet/functions.h"

#include <stdio.h>
#include <string.h>

#include "sheet/job_solve.h"

/* -- the card ------------------------------------------------------------------------------------------------------ */

/* clang-format off */
/* What a card shows of each state, and its unit when no given figure sets one. */
static const struct card_row {
    const char *unit;
    enum gas_symbol symbol;
    bool extensive; /* per time in a flow */
    bool per_gas; /* once, not in each state */
} card_rows[] = {
    {"bar",         GAS_SYM_P,          false, false},
    {"°C",          GAS_SYM_T,          false, false},
    {"m3",          GAS_SYM_V,          true,  false},
    {"mol",         GAS_SYM_N,          true,  false},
    {"kg",          GAS_SYM_M,          true,  false},
    {"kg/m3",       GAS_SYM_RHO,        false, false},
    {"m3/kg",       GAS_SYM_V_SPECIFIC, false, false},
    {"J/mol",       GAS_SYM_H_SPECIFIC, false, false},
    {"J/mol",       GAS_SYM_U_SPECIFIC, false, false},
    {"J/(mol·K)",   GAS_SYM_S_SPECIFIC, false, false},
    {"J/(mol·K)",   GAS_SYM_CP,         false, false},
    {"J/(mol·K)",   GAS_SYM_CV,         false, false},
    {"",            GAS_SYM_GAMMA,      false, false},
    {"J/mol",       GAS_SYM_DU,         false, true},
    {"J/mol",       GAS_SYM_DH,         false, true},
    {"J/(mol·K)",   GAS_SYM_DS,         false, true},
    {"kg/kmol",     GAS_SYM_M_MOLAR,    false, true},
    {"bar",         GAS_SYM_BAROMETER,  false, true},
};
/* clang-format on */
enum { CARD_KINDS = sizeof card_rows / sizeof *card_rows, CARD_ROWS = (GAS_STATES + 1) * CARD_KINDS };

struct card {
    struct gas_job *job;
    struct gas_plan plan;
    bool heat;        /* a heat capacity is known */
    bool spread;      /* a plus-minus is given: one more column */
    const char *time; /* what stands below the line in a flow: "h" */
    size_t rows;
    struct gas_heading row[CARD_ROWS];
};

/* The time unit of the first flow given: what follows its last slash, an hour when there is none. */
static const char *time_of(const struct gas_job *job)
{
    for (size_t i = 0; i < job->table.columns; i++) {
        const struct gas_unit *unit = &job->table.heading[i].unit;
        const char *slash = strrchr(unit->text, '/');
        if (gas_dimension_extent(unit->dimension) == GAS_EXTENT_FLOW && slash && slash[1] && !strchr(slash, ' '))
            return strchr(slash, '@') ? "h" : slash + 1;
    }
    return "h";
}

static bool default_unit(const struct card *card, const struct card_row *row, struct gas_unit *unit)
{
    char text[GAS_UNIT_TEXT];
    struct gas_unit_fault fault;
    if (!row->unit[0]) {
        *unit = gas_unit_si(GAS_DIM_NUMBER);
        unit->text[0] = '\0';
        return true;
    }
    bool flow = row->extensive && card->job->extent == GAS_EXTENT_FLOW;
    snprintf(text, sizeof text, "%s%s%s", row->unit, flow ? "/" : "", flow ? card->time : "");
    if (gas_unit_parse(text, strlen(text), NULL, unit, &fault))
        return true;
    snprintf(text, sizeof text, "%s/h", row->unit);
    return gas_unit_parse(text, strlen(text), NULL, unit, &fault);
}

/* The heading of a card row: the unit of the figure given for it, or for the same quantity in another state. */
static bool card_heading(const struct card *card, const struct card_row *row, int state, struct gas_heading *heading)
{
    const struct gas_table *table = &card->job->table;
    char name[GAS_NAME_TEXT];
    *heading = (struct gas_heading){.symbol = row->symbol, .state = state, .has_unit = true};
    snprintf(heading->text, sizeof heading->text, "%s", gas_quantity_name(name, row->symbol, state));
    const struct gas_heading *like = NULL;
    for (size_t i = 0; i < table->columns; i++) {
        const struct gas_heading *given = &table->heading[i];
        enum gas_variable variable;
        bool same = given->symbol == row->symbol && !given->tolerance && gas_variable_of(given, &variable);
        if (same && (!like || given->state == state))
            like = given;
    }
    if (like)
        heading->unit = like->unit;
    return like || default_unit(card, row, &heading->unit);
}

/* Does a reading stand on the barometer? */
static bool reads_gauge(const struct gas_job *job)
{
    for (size_t i = 0; i < job->table.columns; i++)
        if (job->table.heading[i].unit.basis != GAS_ABSOLUTE)
            return true;
    return false;
}

static bool follows(const struct card *card, const struct gas_heading *heading)
{
    const struct gas_plan *plan = &card->plan;
    enum gas_variable variable;
    switch (heading->symbol) {
    case GAS_SYM_CP:
    case GAS_SYM_CV:
    case GAS_SYM_GAMMA:
        return card->heat && gas_plan_finds(plan, GAS_VAR_T, heading->state);
    case GAS_SYM_DU:
    case GAS_SYM_DH:
        return card->heat && gas_plan_finds(plan, GAS_VAR_T, 1) && gas_plan_finds(plan, GAS_VAR_T, plan->states);
    case GAS_SYM_DS:
        return card->heat && gas_plan_finds(plan, GAS_VAR_T, 1) && gas_plan_finds(plan, GAS_VAR_T, plan->states) &&
               gas_plan_finds(plan, GAS_VAR_P, 1) && gas_plan_finds(plan, GAS_VAR_P, plan->states);
    case GAS_SYM_M_MOLAR:
        return true;
    case GAS_SYM_BAROMETER:
        return reads_gauge(card->job);
    case GAS_SYM_H_SPECIFIC:
    case GAS_SYM_U_SPECIFIC:
    case GAS_SYM_S_SPECIFIC:
        return card->heat && gas_variable_of(heading, &variable) && gas_plan_finds(plan, variable, heading->state);
    default:
        return gas_variable_of(heading, &variable) && gas_plan_finds(plan, variable, heading->state);
    }
}

static void add_row(struct card *card, const struct card_row *row, int state)
{
    struct gas_heading *heading = &card->row[card->rows];
    if (card->rows < CARD_ROWS && card_heading(card, row, state, heading) && follows(card, heading))
        card->rows++;
}

static bool is_change(enum gas_symbol symbol)
{
    return symbol == GAS_SYM_DU || symbol == GAS_SYM_DH || symbol == GAS_SYM_DS;
}

/* Shared by all states: m and n of a closed system. Shown once, without a number. */
static bool is_shared(const struct card *card, const struct card_row *row)
{
    enum gas_variable variable;
    struct gas_heading heading;
    return card_heading(card, row, 0, &heading) && gas_variable_of(&heading, &variable) && card->plan.shared[variable];
}

static void lay_out(struct card *card)
{
    bool states = !card->plan.unnumbered;
    for (int state = states ? 1 : 0; state <= (states ? card->plan.states : 0); state++)
        for (size_t i = 0; i < CARD_KINDS; i++)
            if (!card_rows[i].per_gas && !(states && is_shared(card, &card_rows[i])))
                add_row(card, &card_rows[i], state);
    for (size_t i = 0; i < CARD_KINDS; i++) {
        bool once = is_change(card_rows[i].symbol) ? states && card->plan.states > 1 : card_rows[i].per_gas;
        if (once || (states && is_shared(card, &card_rows[i])))
            add_row(card, &card_rows[i], 0);
    }
}

/* The plus-minus of a row, blank where it has none. */
static void answer_spread(struct card *card, struct gas_call *call, size_t index, const struct gas_row *row)
{
    struct gas_job *job = card->job;
    struct gas_refusal refusal = {0};
    enum gas_variable variable;
    double answer;
    job->wanted.heading[0].tolerance = true;
    gas_put_text(call, index + 1, 3, "");
    if (gas_variable_of(&card->row[index], &variable) && gas_job_prepare(job, call->arena, &refusal) &&
        gas_job_run(job, row, &answer, &refusal))
        gas_put_number(call, index + 1, 3, answer);
}

/* One row of the card: the task is run for that heading alone, so that a figure outside the data spoils no other. */
static void answer_row(struct card *card, struct gas_call *call, size_t index, const struct gas_row *row)
{
    struct gas_job *job = card->job;
    struct gas_refusal refusal = {0};
    double answer;
    job->wanted.columns = 1;
    job->wanted.heading[0] = card->row[index];
    gas_put_text(call, index + 1, 0, card->row[index].text);
    gas_put_text(call, index + 1, 2, card->row[index].unit.text);
    if (gas_job_prepare(job, call->arena, &refusal) && gas_job_run(job, row, &answer, &refusal))
        gas_put_number(call, index + 1, 1, answer);
    else if (job->options.hard_errors)
        gas_put_not_available(call, index + 1, 1);
    else
        gas_put_text(call, index + 1, 1, refusal.text);
    if (card->spread)
        answer_spread(card, call, index, row);
}

/* The givens must hold together before anything is shown of them. */
static bool open_card(struct card *card, struct gas_arena *arena, struct gas_row *row, struct gas_refusal *refusal)
{
    struct gas_job *job = card->job;
    struct gas_case figures;
    double ordered[GAS_COLUMNS], none[1];
    if (job->table.rows > 1)
        return gas_refuse(refusal, "wanted", "several cases are given; say what is wanted, such as \"m, kg\".");
    if (!gas_table_row(&job->table, 0, row, refusal) || !gas_job_prepare(job, arena, refusal) ||
        !gas_job_run(job, row, none, refusal) || !gas_job_case(job, row, &figures, refusal))
        return false;
    const struct gas_plan *plan = gas_solver_plan(gas_job_solver(job), job, &figures, ordered, refusal);
    if (!plan)
        return false;
    card->plan = *plan;
    card->heat = job->gas.interval_count > 0;
    for (size_t i = 0; i < job->table.columns; i++)
        card->spread = card->spread || job->table.heading[i].tolerance;
    card->time = time_of(job);
    lay_out(card);
    return true;
}

static bool answer_card(struct gas_job *job, struct gas_call *call, struct gas_refusal *refusal)
{
    static const char *const headings[] = {"quantity", "value", "unit", "±"};
    struct gas_row row;
    struct card *card = gas_arena_take(call->arena, 1, sizeof *card);
    if (!card)
        return gas_refuse(refusal, "given", "there is not enough memory for it; close other documents.");
    memset(card, 0, sizeof *card);
    card->job = job;
    if (!open_card(card, call->arena, &row, refusal))
        return false;
    if (!gas_answer_block(call, card->rows + 1, card->spread ? 4 : 3))
        return true;
    gas_put_texts(call, 0, headings, card->spread ? 4 : 3);
    for (size_t i = 0; i < card->rows; i++)
        answer_row(card, call, i, &row);
    return true;
}

/* -- the function -------------------------------------------------------------------------------------------------- */

void gas_fn_solve(struct gas_call *call)
{
    const struct gas_job_arguments arguments = {.gas = gas_argument(call, 0),
                                                .given = gas_argument(call, 1),
                                                .wanted = gas_argument(call, 2),
                                                .headings = gas_argument(call, 3),
                                                .options = gas_argument(call, 4)};
    struct gas_job job = {.task = &gas_task_solve, .options = gas_options_default};
    struct gas_refusal refusal = {0};
    bool good = gas_job_read(&job, &arguments, &refusal);
    if (good && job.wanted.columns == 0)
        good = answer_card(&job, call, &refusal);
    else if (good) {
        good = gas_job_prepare(&job, call->arena, &refusal);
        if (good)
            gas_job_answer(&job, call);
    }
    if (!good)
        gas_job_refused(call, &job.options, &refusal);
    gas_job_close(&job);
}
