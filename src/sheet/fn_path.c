/* Paths: WORK, HEAT and END for every row of givens; PATH, TRACE and CYCLE for one case. */
#include <math.h>
#include <stdio.h>
#include <string.h>

#include "sheet/functions.h"
#include "sheet/leg_refusal.h"
#include "sheet/path_task.h"

/* Where a function's arguments stand; 0: it has no such argument. */
struct path_arguments {
    size_t given, legs, wanted, headings, options;
};

static const struct gas_block *argument_at(const struct gas_call *call, size_t index)
{
    static const struct gas_block omitted = {0};
    return index ? gas_argument(call, index) : &omitted;
}

/* A call being worked on. */
struct path_call {
    struct gas_job job;
    struct gas_typed_legs legs;
    struct gas_refusal refusal;
};

static bool path_start(struct path_call *path, const struct gas_call *call, const struct path_arguments *places)
{
    struct gas_job_arguments arguments = {.gas = gas_argument(call, 0),
                                          .given = gas_argument(call, places->given),
                                          .wanted = argument_at(call, places->wanted),
                                          .headings = argument_at(call, places->headings),
                                          .options = gas_argument(call, places->options)};
    memset(path, 0, sizeof *path);
    return gas_path_open(&path->job, &path->legs, &arguments, gas_argument(call, places->legs), &path->refusal);
}

static bool is_energy(enum gas_dimension dimension)
{
    return dimension == GAS_DIM_ENERGY || dimension == GAS_DIM_POWER || dimension == GAS_DIM_MOLAR_ENERGY ||
           dimension == GAS_DIM_SPECIFIC_ENERGY;
}

static struct gas_heading heading_of(const char *text)
{
    struct gas_heading heading = {0};
    struct gas_heading_fault fault;
    gas_heading_parse(text, strlen(text), NULL, &heading, &fault);
    return heading;
}

/* "kJ" alone is the work for WORK, the heat for HEAT; nothing at all is J, or W in flow. */
static bool complete_wanted(struct path_call *path, enum gas_symbol symbol)
{
    struct gas_wanted *wanted = &path->job.wanted;
    if (wanted->columns == 0 && symbol != GAS_SYM_NONE) {
        wanted->heading[0] = heading_of(path->job.options.system == GAS_FLOW ? "W, W" : "W, J");
        wanted->heading[0].symbol = symbol;
        wanted->columns = 1;
    }
    for (size_t i = 0; i < wanted->columns; i++) {
        struct gas_heading *heading = &wanted->heading[i];
        if (heading->symbol == GAS_SYM_NONE && is_energy(heading->unit.dimension) && symbol != GAS_SYM_NONE)
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

/* (gas; given; legs; [wanted]; [headings]; [options]) */
static void answer_rows(struct gas_call *call, enum gas_symbol symbol)
{
    static const struct path_arguments places = {.given = 1, .legs = 2, .wanted = 3, .headings = 4, .options = 5};
    struct path_call path;
    if (path_start(&path, call, &places) && complete_wanted(&path, symbol) &&
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

/* The single case of a function that shows a whole path. */
static bool solve_one(struct path_call *path, struct gas_call *call, struct gas_path_case *solved)
{
    struct gas_row row;
    struct gas_case figures;
    struct gas_job *job = &path->job;
    if (job->table.rows != 1)
        return gas_refuse(&path->refusal, "given",
                          "%zu cases are given, but this function shows one; take one row, or "
                          "GAS.WORK, GAS.HEAT and GAS.END for tables.",
                          job->table.rows);
    return gas_job_prepare(job, call->arena, &path->refusal) && gas_table_row(&job->table, 0, &row, &path->refusal) &&
           gas_job_case(job, &row, &figures, &path->refusal) && gas_path_solve(job, &figures, solved, &path->refusal);
}

/* Is the amount told by the givens, so that totals can be shown? */
static bool has_amount(const struct gas_job *job)
{
    return job->extent != GAS_EXTENT_NONE;
}

static void add_wanted(struct gas_job *job, const char *format, const char *unit)
{
    char text[GAS_HEADING_TEXT];
    snprintf(text, sizeof text, format, unit);
    job->wanted.heading[job->wanted.columns++] = heading_of(text);
}

/* The columns of a path when none are wanted: the end of each leg in the units of the givens, then the changes. */
static void default_path_columns(struct gas_job *job, bool changes)
{
    bool flow = job->options.system == GAS_FLOW, total = has_amount(job);
    const char *energy = !total ? "kJ/kg" : flow ? "kW" : "kJ";
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

static bool put_row(const struct path_call *path, struct gas_call *call, size_t row, const char *label,
                    const struct gas_path_case *solved, const struct gas_change *change, struct gas_refusal *refusal)
{
    const struct gas_job *job = &path->job;
    gas_put_text(call, row, 0, label);
    for (size_t i = 0; i < job->wanted.columns; i++) {
        const struct gas_heading *heading = &job->wanted.heading[i];
        double si;
        if (!gas_path_quantity(job, solved, change, heading, &si, refusal))
            return false;
        gas_put_number(call, row, i + 1, gas_job_shown(job, heading, si));
    }
    return true;
}

static void put_headings(const struct gas_job *job, struct gas_call *call, size_t first)
{
    for (size_t i = 0; i < job->wanted.columns; i++)
        gas_put_text(call, 0, i + first, job->wanted.heading[i].text);
}

/* A heading row, one row per leg, a total. */
static bool answer_path(struct path_call *path, struct gas_call *call)
{
    struct gas_path_case solved;
    if (path->job.wanted.columns == 0)
        default_path_columns(&path->job, true);
    if (!solve_one(path, call, &solved) || !gas_answer_block(call, solved.count + 2, path->job.wanted.columns + 1))
        return !path->refusal.made;
    gas_put_text(call, 0, 0, "leg");
    put_headings(&path->job, call, 1);
    for (size_t i = 0; i < solved.count; i++)
        if (!put_row(path, call, i + 1, path->legs.leg[i].text, &solved, &solved.change[i], &path->refusal))
            return false;
    return put_row(path, call, solved.count + 1, "total", &solved, &solved.total, &path->refusal);
}

void gas_fn_path(struct gas_call *call)
{
    static const struct path_arguments places = {.given = 1, .legs = 2, .wanted = 3, .headings = 4, .options = 5};
    struct path_call path;
    if (!path_start(&path, call, &places) || !answer_path(&path, call))
        gas_job_refused(call, &path.job.options, &path.refusal);
    gas_job_close(&path.job);
}

enum { POINTS_PER_LEG = 20, POINTS_MOST = 5000 };

static bool read_points(struct path_call *path, const struct gas_block *argument, size_t *points)
{
    *points = POINTS_PER_LEG;
    if (gas_omitted(argument))
        return true;
    double count = argument->cell->number;
    if (!gas_single(argument) || argument->cell->kind != GAS_CELL_NUMBER || !(count >= 1 && count <= POINTS_MOST))
        return gas_refuse(&path->refusal, "points", "it is the number of steps along each leg, 1 to %d.", POINTS_MOST);
    *points = (size_t)count;
    return true;
}

static bool put_point(struct path_call *path, struct gas_call *call, size_t row, const struct gas_path_case *solved,
                      const struct gas_point *point)
{
    const struct gas_job *job = &path->job;
    for (size_t i = 0; i < job->wanted.columns; i++) {
        double si;
        if (!gas_point_quantity(job, point, solved->n, &job->wanted.heading[i], &si, &path->refusal))
            return false;
        gas_put_number(call, row, i, gas_job_shown(job, &job->wanted.heading[i], si));
    }
    return true;
}

/* The points of one leg behind its start; the last is exactly its end. */
static bool put_leg_points(struct path_call *path, struct gas_call *call, const struct gas_path_case *solved,
                           size_t leg, size_t points)
{
    const struct gas_point *start = leg ? &solved->change[leg - 1].end : &solved->start;
    for (size_t k = 1; k <= points; k++) {
        struct gas_point at;
        struct gas_result result = gas_leg_at(&path->job.gas, path->job.options.system, start, &solved->leg[leg],
                                              &solved->change[leg], (double)k / (double)points, &at);
        if (result.status != GAS_OK)
            return gas_refuse_leg(&path->refusal, &path->job, solved, leg + 1, &result);
        if (!put_point(path, call, 1 + leg * points + k, solved, &at))
            return false;
    }
    return true;
}

static bool answer_trace(struct path_call *path, struct gas_call *call, size_t points)
{
    struct gas_path_case solved;
    if (path->job.wanted.columns == 0)
        default_path_columns(&path->job, false);
    if (!solve_one(path, call, &solved) || !gas_answer_block(call, 2 + solved.count * points, path->job.wanted.columns))
        return !path->refusal.made;
    put_headings(&path->job, call, 0);
    if (!put_point(path, call, 1, &solved, &solved.start))
        return false;
    for (size_t leg = 0; leg < solved.count; leg++)
        if (!put_leg_points(path, call, &solved, leg, points))
            return false;
    return true;
}

/* (gas; given; legs; [wanted]; [points]; [options]) */
void gas_fn_trace(struct gas_call *call)
{
    static const struct path_arguments places = {.given = 1, .legs = 2, .wanted = 3, .options = 5};
    struct path_call path;
    size_t points;
    if (!path_start(&path, call, &places) || !read_points(&path, gas_argument(call, 4), &points) ||
        !answer_trace(&path, call, points))
        gas_job_refused(call, &path.job.options, &path.refusal);
    gas_job_close(&path.job);
}

/* What a cycle can be asked, by symbol. */
static const struct cycle_row {
    enum gas_symbol symbol;
    enum gas_dimension molar; /* MOLAR_ENERGY goes with the amount; others stand as they are */
    size_t offset;
    const char *unit;    /* on the card; NULL: an energy, in the unit that goes with the givens */
    const char *why_not; /* when it is NAN */
} cycle_rows[] = {
    {GAS_SYM_W_NET, GAS_DIM_MOLAR_ENERGY, offsetof(struct gas_cycle, W_net), NULL, ""},
    {GAS_SYM_Q_IN, GAS_DIM_MOLAR_ENERGY, offsetof(struct gas_cycle, Q_in), NULL, ""},
    {GAS_SYM_Q_OUT, GAS_DIM_MOLAR_ENERGY, offsetof(struct gas_cycle, Q_out), NULL, ""},
    {GAS_SYM_EFFICIENCY, GAS_DIM_NUMBER, offsetof(struct gas_cycle, efficiency), "%",
     "this cycle takes work in; ask for COP heating or COP cooling."},
    {GAS_SYM_COP_HEATING, GAS_DIM_NUMBER, offsetof(struct gas_cycle, cop_heating), "",
     "this cycle gives work; ask for the efficiency."},
    {GAS_SYM_COP_COOLING, GAS_DIM_NUMBER, offsetof(struct gas_cycle, cop_cooling), "",
     "this cycle gives work; ask for the efficiency."},
    {GAS_SYM_MEP, GAS_DIM_PRESSURE, offsetof(struct gas_cycle, mep), "kPa", "the volume does not change."},
};

static bool cycle_quantity(const struct path_call *path, const struct gas_path_case *solved,
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
        return !isnan(*si) || gas_refuse(refusal, heading->text,
                                         "the amount of gas does not follow from the "
                                         "givens; give m, n or V, or ask per kg.");
    }
    return gas_refuse(refusal, heading->text,
                      "a cycle gives W net, Q in, Q out, efficiency, COP heating, COP "
                      "cooling and mep; ask for those.");
}

static bool closed_cycle(struct path_call *path, const struct gas_path_case *solved, struct gas_cycle *cycle)
{
    struct gas_result result = gas_cycle_of(&solved->start, solved->change, solved->count, 1e-6, cycle);
    if (result.status == GAS_OK)
        return true;
    return gas_refuse(&path->refusal, "legs",
                      "the cycle does not close: P ends %.3g %% and T %.3g %% off its start; end "
                      "the last leg with `to start`.",
                      100 * cycle->gap_P, 100 * cycle->gap_T);
}

static struct gas_heading cycle_heading(const struct gas_job *job, const struct cycle_row *row)
{
    bool flow = job->options.system == GAS_FLOW;
    const char *energy = !has_amount(job) ? "kJ/kg" : flow ? "kW" : "kJ";
    const char *unit = row->unit ? row->unit : energy;
    char text[GAS_HEADING_TEXT];
    snprintf(text, sizeof text, "%s%s%s", gas_symbol_text(row->symbol), unit[0] ? ", " : "", unit);
    return heading_of(text);
}

/* Without wanted: label | value | unit of everything that has a value. */
static bool answer_cycle_card(struct path_call *path, struct gas_call *call, const struct gas_path_case *solved,
                              const struct gas_cycle *cycle)
{
    static const char *const headings[] = {"quantity", "value", "unit"};
    size_t rows = 1;
    if (!gas_answer_block(call, 1 + sizeof cycle_rows / sizeof *cycle_rows, 3))
        return true;
    for (size_t i = 0; i < 3; i++)
        gas_put_text(call, 0, i, headings[i]);
    for (size_t i = 0; i < sizeof cycle_rows / sizeof *cycle_rows; i++) {
        struct gas_heading heading = cycle_heading(&path->job, &cycle_rows[i]);
        struct gas_refusal no_value = {0};
        double si;
        if (!cycle_quantity(path, solved, cycle, &heading, &si, &no_value))
            continue;
        bool work = heading.symbol == GAS_SYM_W_NET;
        const char *by_gas = path->job.options.work_by_gas ? "W net by gas" : "W net on gas";
        gas_put_text(call, rows, 0, work ? by_gas : gas_symbol_text(heading.symbol));
        gas_put_number(call, rows, 1, gas_job_shown(&path->job, &heading, si));
        gas_put_text(call, rows++, 2, heading.has_unit ? heading.unit.text : "");
    }
    call->answer.rows = rows;
    return true;
}

static bool answer_cycle(struct path_call *path, struct gas_call *call)
{
    struct gas_path_case solved;
    struct gas_cycle cycle;
    const struct gas_wanted *wanted = &path->job.wanted;
    if (!solve_one(path, call, &solved) || !closed_cycle(path, &solved, &cycle))
        return false;
    if (wanted->columns == 0)
        return answer_cycle_card(path, call, &solved, &cycle);
    if (!gas_answer_block(call, wanted->down ? wanted->columns : 1, wanted->down ? 1 : wanted->columns))
        return true;
    for (size_t i = 0; i < wanted->columns; i++) {
        double si;
        if (!cycle_quantity(path, &solved, &cycle, &wanted->heading[i], &si, &path->refusal))
            return false;
        gas_put_number(call, wanted->down ? i : 0, wanted->down ? 0 : i,
                       gas_job_shown(&path->job, &wanted->heading[i], si));
    }
    return true;
}

/* (gas; given; legs; [wanted]; [options]) */
void gas_fn_cycle(struct gas_call *call)
{
    static const struct path_arguments places = {.given = 1, .legs = 2, .wanted = 3, .options = 4};
    struct path_call path;
    if (!path_start(&path, call, &places) || !answer_cycle(&path, call))
        gas_job_refused(call, &path.job.options, &path.refusal);
    gas_job_close(&path.job);
}
