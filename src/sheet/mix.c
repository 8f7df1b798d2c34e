#include "sheet/mix.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#include <gasleaf/heat.h>

#include "sheet/job_units.h"
#include "sheet/machine.h"
#include "sheet/piece.h"
#include "sheet/solver.h"

enum { NEED_P, NEED_T, NEED_N, NEEDS };
enum { ROWS_MOST = 1000 }; /* every row is held against every other */

/* -- the range ----------------------------------------------------------------------------------------------------- */

static bool refuse_memory(struct gas_refusal *refusal)
{
    return gas_refuse(refusal, "streams", "there are too many for the memory at hand; give fewer.");
}

static bool cell_says(const struct gas_cell *cell, const char *word)
{
    struct gas_piece text = gas_piece_of(cell);
    return gas_piece_take(&text, word) && text.length == 0;
}

static bool is_label(const struct gas_cell *cell)
{
    return gas_cell_blank(cell) || cell_says(cell, "stream") || cell_says(cell, "vessel") || cell_says(cell, "name");
}

/* The range without its heading row and its columns of texts. */
struct split {
    struct gas_block headings, figures;
    size_t gas_column;
};

static bool find_gas(const struct gas_block *streams, size_t *column, struct gas_refusal *refusal)
{
    const struct gas_cell *sentence = gas_block_sentence(streams);
    if (sentence)
        return gas_refuse_sentence(refusal, sentence->text);
    for (*column = 0; *column < streams->columns && streams->rows > 1; ++*column)
        if (cell_says(gas_cell_at(streams, 0, *column), "gas"))
            return true;
    return gas_refuse(
        refusal, "streams",
        "the range needs a heading row: gas, P and T with their units, and one of m, n, V or a flow; then "
        "one row for each.");
}

static bool split_streams(const struct gas_block *streams, struct gas_arena *arena, struct split *split,
                          struct gas_refusal *refusal)
{
    size_t kept = 0;
    if (!find_gas(streams, &split->gas_column, refusal))
        return false;
    struct gas_cell *cells = gas_arena_take(arena, streams->rows * streams->columns, sizeof *cells);
    if (!cells)
        return refuse_memory(refusal);
    for (size_t i = 0; i < streams->columns; i++)
        kept += i != split->gas_column && !is_label(gas_cell_at(streams, 0, i));
    if (kept == 0)
        return gas_refuse(refusal, "streams", "only gases are given; add P, T and one of m, n, V or a flow.");
    struct gas_cell *next = cells;
    for (size_t row = 0; row < streams->rows; row++)
        for (size_t i = 0; i < streams->columns; i++)
            if (i != split->gas_column && !is_label(gas_cell_at(streams, 0, i)))
                *next++ = *gas_cell_at(streams, row, i);
    split->headings = (struct gas_block){1, kept, cells, true};
    split->figures = (struct gas_block){streams->rows - 1, kept, cells + kept, true};
    return true;
}

/* -- the rows ------------------------------------------------------------------------------------------------------ */

/* clang-format off */
static const struct gas_admitted admitted[] = {
    {GAS_SYM_P, 1}, {GAS_SYM_T, 1}, {GAS_SYM_V, 1}, {GAS_SYM_N, 1}, {GAS_SYM_M, 1}, {GAS_SYM_RHO, 1}, {GAS_SYM_V_SPECIFIC, 1},
};
/* clang-format on */

static bool prepare(struct gas_job *job, struct gas_arena *arena, struct gas_refusal *refusal)
{
    static const struct gas_need needs[NEEDS] = {
        [NEED_P] = {{GAS_VAR_P, 0}, false}, [NEED_T] = {{GAS_VAR_T, 0}, false}, [NEED_N] = {{GAS_VAR_N, 0}, false}};
    if (!gas_admit_givens(job, admitted, sizeof admitted / sizeof *admitted, 0,
                          "gas, P, T and m, n, V or a flow, without numbers", refusal))
        return false;
    if (job->extent == GAS_EXTENT_NONE)
        return gas_refuse(refusal, "streams", "how much of each is missing; add one of m, n, V or a flow.");
    job->own = gas_solver_open(job, 0, needs, NEEDS, arena, refusal);
    return job->own != NULL;
}

static const struct gas_task mix_task = {.name = "MIX", .prepare = prepare};

/* A row's refusal with its number in front: "Check row 2, T: ...". */
static bool refuse_row(struct gas_refusal *refusal, size_t row, const struct gas_refusal *why)
{
    static const char start[] = "Check ";
    char what[40];
    const char *rest = why->text + (strncmp(why->text, start, sizeof start - 1) == 0 ? sizeof start - 1 : 0);
    const char *colon = strstr(rest, ": ");
    if (!colon || colon - rest > 24)
        return gas_refuse_sentence(refusal, why->text);
    snprintf(what, sizeof what, "row %zu, %.*s", row, (int)(colon - rest), rest);
    return gas_refuse(refusal, what, "%s", colon + 2);
}

/* Nothing of it: a flow or an amount of zero. */
static bool is_nothing(const struct gas_job *job, const struct gas_case *figures)
{
    for (size_t i = 0; i < job->table.columns; i++)
        if (gas_dimension_extent(job->table.heading[i].unit.dimension) != GAS_EXTENT_NONE && figures->si[i] == 0)
            return true;
    return false;
}

static bool portion_of(const struct gas_job *job, const struct gas_case *figures, struct gas_portion *portion,
                       struct gas_refusal *refusal)
{
    double values[NEEDS];
    *portion = (struct gas_portion){.gas = &job->choice->gas};
    if (is_nothing(job, figures))
        return true;
    if (job->extent == GAS_EXTENT_TOTAL && gas_case_figure(job, figures, GAS_SYM_P, 0) == 0) {
        portion->V_empty = gas_case_figure(job, figures, GAS_SYM_V, 0);
        return !isnan(portion->V_empty) || gas_refuse(refusal, "V", "an evacuated vessel needs its volume; give it.");
    }
    if (!gas_solver_run(job->own, job, figures, values, refusal))
        return false;
    portion->P = values[NEED_P];
    portion->T = values[NEED_T];
    portion->n = values[NEED_N];
    return true;
}

static bool same_gas(const struct gas_choice *a, const struct gas_choice *b)
{
    if (a->part_count != b->part_count)
        return false;
    for (size_t i = 0; i < a->part_count; i++)
        if (a->part[i].species != b->part[i].species || fabs(a->part[i].x - b->part[i].x) > 1e-12 ||
            (!a->part[i].species && strcmp(a->part[i].label, b->part[i].label) != 0))
            return false;
    return true;
}

static int group_of(const struct gas_mix *mix, const struct gas_choice *choice)
{
    for (size_t i = 0; i < mix->count; i++)
        if (same_gas(mix->rows[i].choice, choice))
            return mix->same[i];
    return (int)mix->count;
}

static bool add_row(struct gas_mix *mix, const struct gas_cell *gas, size_t row, struct gas_refusal *refusal)
{
    struct gas_job *job = &mix->job;
    struct gas_row given;
    struct gas_case figures;
    if (!gas_table_row(&job->table, row, &given, refusal))
        return false;
    if (given.given == 0 && gas_cell_blank(gas))
        return true;
    if (gas->kind != GAS_CELL_TEXT || gas_cell_blank(gas))
        return gas_refuse(refusal, "gas", "it is missing; give its name, formula or a mixture.");
    if (mix->count == ROWS_MOST)
        return gas_refuse(refusal, "streams", "there are more than %d; mix them in parts.", ROWS_MOST);
    const struct gas_choice *choice = gas_choose_text(gas->text, gas->length, refusal);
    if (!choice)
        return false;
    int same = group_of(mix, choice);
    mix->rows[mix->count++].choice = choice; /* given back with the others, whatever follows */
    job->choice = choice;
    job->gas = choice->gas;
    mix->same[mix->count - 1] = same;
    mix->rows[mix->count - 1].number = row + 1;
    return gas_job_case(job, &given, &figures, refusal) &&
           portion_of(job, &figures, &mix->portion[mix->count - 1], refusal);
}

static bool add_rows(struct gas_mix *mix, const struct gas_block *streams, const struct split *split,
                     struct gas_arena *arena, struct gas_refusal *refusal)
{
    size_t rows = split->figures.rows;
    mix->rows = gas_arena_take(arena, rows, sizeof *mix->rows);
    mix->portion = gas_arena_take(arena, rows, sizeof *mix->portion);
    mix->same = gas_arena_take(arena, rows, sizeof *mix->same);
    if (!mix->rows || !mix->portion || !mix->same)
        return refuse_memory(refusal);
    for (size_t row = 0; row < rows; row++) {
        struct gas_refusal why = {0};
        if (!add_row(mix, gas_cell_at(streams, row + 1, split->gas_column), row, &why))
            return refuse_row(refusal, row + 1, &why);
    }
    return mix->count > 0 || gas_refuse(refusal, "streams", "all rows are blank; give at least one.");
}

/* -- the blend ----------------------------------------------------------------------------------------------------- */

static bool refuse_temperature(const struct gas_mix *mix, size_t index, double limit, struct gas_refusal *refusal)
{
    char what[40];
    const struct gas_choice *choice = mix->rows[index].choice;
    struct gas_range range = gas_range_of(&choice->gas);
    struct gas_unit unit = gas_job_unit(&mix->job, GAS_DIM_TEMPERATURE, "°C");
    double T = mix->portion[index].T;
    bool own = T < range.T_from || T > range.T_to;
    snprintf(what, sizeof what, "row %zu, T", mix->rows[index].number);
    if (own)
        return gas_refuse_temperature(refusal, what, T, &unit, choice->label, range.T_from, range.T_to);
    char shown[GAS_SHOWN];
    return gas_refuse(refusal, what, "the temperature after mixing is past %s, where the data for %s ends.",
                      gas_figure(shown, sizeof shown, gas_unit_from_si(&unit, limit, GAS_ATMOSPHERE), &unit),
                      choice->label);
}

static bool refuse_mixing(const struct gas_mix *mix, const struct gas_result *fault, struct gas_refusal *refusal)
{
    char what[40];
    size_t index = fault->argument > 0 ? (size_t)fault->argument - 1 : 0;
    if (fault->argument == 0 || index >= mix->count)
        return fault->status == GAS_UNREACHABLE
                   ? gas_refuse(refusal, "options",
                                "the outlet pressure is too high: no mixing of these streams reaches it.")
                   : gas_refuse(refusal, "streams", "there is nothing to mix: every amount is zero.");
    snprintf(what, sizeof what, "row %zu", mix->rows[index].number);
    if (fault->status == GAS_NO_HEAT_CAPACITY)
        return gas_refuse(refusal, what, "%s has no heat capacity; give one after '|', such as | k = 1.4.",
                          mix->rows[index].choice->label);
    if (fault->status == GAS_OUTSIDE_DATA)
        return refuse_temperature(mix, index, fault->figure, refusal);
    return gas_refuse(refusal, what, "%s %s.", gas_shown(fault->figure).text, gas_status_words(fault->status));
}

static bool mix_all(struct gas_mix *mix, struct gas_arena *arena, struct gas_refusal *refusal)
{
    const struct gas_options *options = &mix->job.options;
    bool flow = mix->job.extent == GAS_EXTENT_FLOW;
    if (!flow && options->outlet_said)
        return gas_refuse(refusal, "options",
                          "outlet is for streams; vessels that are let together find their own pressure.");
    struct gas_result result = flow ? gas_mix_streams(mix->portion, mix->same, mix->count,
                                                      options->outlet_said ? options->P_outlet : NAN, &mix->blend)
                                    : gas_mix_vessels(mix->portion, mix->same, mix->count, &mix->blend);
    if (result.status != GAS_OK)
        return refuse_mixing(mix, &result, refusal);
    if (!gas_mix_merge(mix, arena, refusal))
        return false;
    double made = mix->blend.entropy_made + gas_mix_shared_entropy(mix);
    if (made < -1e-9 * mix->blend.n * GAS_R)
        return gas_refuse(refusal, "options",
                          "the outlet pressure is too high: no mixing of these streams reaches it.");
    mix->blend.entropy_made = fmax(made, 0);
    mix->job.gas.molar_mass = mix->molar_mass;
    return true;
}

bool gas_mix_open(struct gas_mix *mix, const struct gas_block *streams, const struct gas_block *wanted,
                  const struct gas_block *options, struct gas_arena *arena, struct gas_refusal *refusal)
{
    struct gas_job *job = &mix->job;
    struct split split = {0};
    memset(mix, 0, sizeof *mix);
    job->task = &mix_task;
    job->options = gas_options_default;
    if (!gas_options_read(options, &job->options, refusal))
        return false;
    if (job->options.wall_said)
        return gas_refuse(refusal, "options",
                          "isothermal, adiabatic and heat lost are options of FILL and VENT; mixing "
                          "here is adiabatic.");
    return split_streams(streams, arena, &split, refusal) &&
           gas_table_read(&split.figures, &split.headings, &job->options, &job->table, refusal) &&
           gas_wanted_read(wanted, &job->options, &job->wanted, refusal) && gas_job_prepare(job, arena, refusal) &&
           add_rows(mix, streams, &split, arena, refusal) && mix_all(mix, arena, refusal);
}

void gas_mix_close(struct gas_mix *mix)
{
    for (size_t i = 0; i < mix->count; i++)
        gas_choice_release(mix->rows[i].choice);
    mix->count = 0;
}

/* -- answers ------------------------------------------------------------------------------------------------------- */

bool gas_mix_quantity(const struct gas_mix *mix, const struct gas_heading *heading, double *si,
                      struct gas_refusal *refusal)
{
    const struct gas_blend *blend = &mix->blend;
    double molar = GAS_R * blend->T / blend->P; /* m3/mol */
    enum gas_dimension dimension = GAS_DIM_MOLAR_VOLUME;
    switch (heading->symbol) {
    case GAS_SYM_T:
        *si = blend->T;
        return true;
    case GAS_SYM_P:
        *si = blend->P;
        return true;
    case GAS_SYM_M_MOLAR:
        *si = mix->molar_mass;
        return true;
    case GAS_SYM_RHO:
        *si = heading->unit.dimension == GAS_DIM_CONCENTRATION ? 1 / molar : mix->molar_mass / molar;
        return true;
    case GAS_SYM_V:
    case GAS_SYM_V_SPECIFIC:
        break;
    case GAS_SYM_N:
    case GAS_SYM_M:
        molar = 1;
        dimension = GAS_DIM_NUMBER;
        break;
    case GAS_SYM_S_MADE:
        molar = blend->entropy_made / blend->n;
        dimension = GAS_DIM_MOLAR_ENTROPY;
        break;
    default:
        return gas_refuse(refusal, heading->text, "mixing gives T, P, n, m, V, v, rho, M and S made; ask for those.");
    }
    *si = gas_job_from_molar(&mix->job, dimension, molar, blend->n, heading->unit.dimension);
    return !isnan(*si) || gas_refuse(refusal, heading->text, "it has no value here; ask for another unit.");
}
