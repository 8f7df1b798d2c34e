#include "sheet/solver_parts.h"

#include <math.h>
#include <string.h>

#include "sheet/plan_cache.h"

/* clang-format off */
/* Extensive and intensive figures are told by their dimension (a normal volume is an amount), energies by symbol too. */
static const struct {
    enum gas_symbol symbol; /* GAS_SYM_NONE: any */
    enum gas_dimension dimension;
    enum gas_variable variable;
} names[] = {
    {GAS_SYM_P,          GAS_DIM_PRESSURE,         GAS_VAR_P},
    {GAS_SYM_T,          GAS_DIM_TEMPERATURE,      GAS_VAR_T},
    {GAS_SYM_V,          GAS_DIM_VOLUME,           GAS_VAR_V},
    {GAS_SYM_V,          GAS_DIM_VOLUME_FLOW,      GAS_VAR_V},
    {GAS_SYM_V,          GAS_DIM_AMOUNT,           GAS_VAR_N},
    {GAS_SYM_V,          GAS_DIM_AMOUNT_FLOW,      GAS_VAR_N},
    {GAS_SYM_N,          GAS_DIM_AMOUNT,           GAS_VAR_N},
    {GAS_SYM_N,          GAS_DIM_AMOUNT_FLOW,      GAS_VAR_N},
    {GAS_SYM_M,          GAS_DIM_MASS,             GAS_VAR_MASS},
    {GAS_SYM_M,          GAS_DIM_MASS_FLOW,        GAS_VAR_MASS},
    {GAS_SYM_V_SPECIFIC, GAS_DIM_MOLAR_VOLUME,     GAS_VAR_V_MOLAR},
    {GAS_SYM_V_SPECIFIC, GAS_DIM_SPECIFIC_VOLUME,  GAS_VAR_V_MASS},
    {GAS_SYM_RHO,        GAS_DIM_DENSITY,          GAS_VAR_RHO},
    {GAS_SYM_RHO,        GAS_DIM_CONCENTRATION,    GAS_VAR_C},
    {GAS_SYM_H_SPECIFIC, GAS_DIM_MOLAR_ENERGY,     GAS_VAR_H_MOLAR},
    {GAS_SYM_H_SPECIFIC, GAS_DIM_SPECIFIC_ENERGY,  GAS_VAR_H_MASS},
    {GAS_SYM_U_SPECIFIC, GAS_DIM_MOLAR_ENERGY,     GAS_VAR_U_MOLAR},
    {GAS_SYM_U_SPECIFIC, GAS_DIM_SPECIFIC_ENERGY,  GAS_VAR_U_MASS},
    {GAS_SYM_S_SPECIFIC, GAS_DIM_MOLAR_ENTROPY,    GAS_VAR_S_MOLAR},
    {GAS_SYM_S_SPECIFIC, GAS_DIM_SPECIFIC_ENTROPY, GAS_VAR_S_MASS},
    {GAS_SYM_H_TOTAL,    GAS_DIM_ENERGY,           GAS_VAR_H_TOTAL},
    {GAS_SYM_H_TOTAL,    GAS_DIM_POWER,            GAS_VAR_H_TOTAL},
    {GAS_SYM_U_TOTAL,    GAS_DIM_ENERGY,           GAS_VAR_U_TOTAL},
    {GAS_SYM_U_TOTAL,    GAS_DIM_POWER,            GAS_VAR_U_TOTAL},
    {GAS_SYM_S_TOTAL,    GAS_DIM_ENTROPY,          GAS_VAR_S_TOTAL},
    {GAS_SYM_S_TOTAL,    GAS_DIM_ENTROPY_FLOW,     GAS_VAR_S_TOTAL},
};
/* clang-format on */

bool gas_variable_of(const struct gas_heading *heading, enum gas_variable *variable)
{
    for (size_t i = 0; i < sizeof names / sizeof *names; i++)
        if (names[i].symbol == heading->symbol && names[i].dimension == heading->unit.dimension) {
            *variable = names[i].variable;
            return true;
        }
    return false;
}

/* -- opening ------------------------------------------------------------------------------------------------------- */

static void read_columns(struct gas_solver *solver, const struct gas_job *job, int highest_state)
{
    solver->columns = job->table.columns;
    for (size_t i = 0; i < job->table.columns; i++) {
        const struct gas_heading *heading = &job->table.heading[i];
        enum gas_variable variable;
        if (heading->tolerance || !gas_variable_of(heading, &variable))
            continue;
        if (highest_state && heading->state > highest_state)
            continue;
        solver->column[i].used = true;
        solver->column[i].known = (struct gas_known){variable, heading->state};
        solver->column[i].tolerance = gas_job_tolerance_column(job, heading->symbol, heading->state);
        solver->used |= UINT32_C(1) << i;
    }
}

static void read_needs(struct gas_solver *solver, const struct gas_need *needs, size_t count)
{
    solver->needs = count;
    for (size_t i = 0; i < count; i++) {
        solver->need[i] = needs[i];
        if (needs[i].known.state > solver->states)
            solver->states = needs[i].known.state;
        if (!needs[i].optional)
            solver->must[solver->required++] = needs[i].known;
    }
}

struct gas_solver *gas_solver_open(const struct gas_job *job, int highest_state, const struct gas_need *needs,
                                   size_t count, struct gas_arena *arena, struct gas_refusal *refusal)
{
    enum { PATTERNS = 16 };
    size_t room = job->table.rows > 1 ? PATTERNS : 1;
    struct gas_solver *solver = count <= GAS_NEEDS ? gas_arena_take(arena, 1, sizeof *solver) : NULL;
    struct solver_entry *entries = gas_arena_take(arena, room, sizeof *entries);
    if (!solver || !entries) {
        gas_refuse(refusal, "given", "there is not enough memory for it; close other documents.");
        return NULL;
    }
    memset(solver, 0, sizeof *solver);
    solver->arena = arena;
    solver->entry = entries;
    solver->room = room;
    read_columns(solver, job, highest_state);
    read_needs(solver, needs, count);
    return solver;
}

/* -- plans --------------------------------------------------------------------------------------------------------- */

void gas_solver_amounts(struct gas_solver *solver, enum gas_amounts amounts)
{
    solver->amounts = amounts;
}

/* "T constant; T1 = 25 degC": the one figure given for it holds in every state, and the constant has done its work. */
static void merge_constant(struct solver_entry *entry, size_t constant)
{
    size_t figures = 0, last = 0;
    for (size_t i = 0; i < entry->count; i++)
        if (i != constant && entry->known[i].variable == entry->known[constant].variable) {
            figures++;
            last = i;
        }
    if (figures != 1)
        return;
    entry->known[last].state = 0;
    entry->count--;
    for (size_t i = constant; i < entry->count; i++) {
        entry->known[i] = entry->known[i + 1];
        entry->column[i] = entry->column[i + 1];
    }
}

static void take_knowns(const struct gas_solver *solver, uint32_t mask, struct solver_entry *entry)
{
    entry->count = 0;
    for (size_t i = 0; i < solver->columns; i++)
        if (mask >> i & 1) {
            entry->known[entry->count] = solver->column[i].known;
            entry->column[entry->count++] = (unsigned char)i;
        }
    for (size_t i = entry->count; i-- > 0;)
        if (entry->known[i].state == GAS_CONSTANT)
            merge_constant(entry, i);
}

static bool finds_all(const struct gas_solver *solver, const struct gas_plan *plan)
{
    for (size_t i = 0; i < solver->required; i++)
        if (!gas_plan_finds(plan, solver->must[i].variable, solver->must[i].state))
            return false;
    return true;
}

static bool make_plan(const struct gas_solver *solver, const struct gas_job *job, uint32_t mask,
                      struct solver_entry *entry)
{
    entry->mask = mask;
    entry->refusal.made = false;
    take_knowns(solver, mask, entry);
    bool open = solver->amounts != GAS_AMOUNTS_SAME;
    struct gas_result made = gas_plan_for(&entry->plan, entry->known, entry->count, solver->states, open);
    if (made.status == GAS_OK && solver->amounts == GAS_AMOUNTS_ASKED && !finds_all(solver, &entry->plan))
        made = gas_plan_for(&entry->plan, entry->known, entry->count, solver->states, false);
    return made.status == GAS_OK || solver_refuse_knowns(job, entry, made, &entry->refusal);
}

static void make_entry(const struct gas_solver *solver, const struct gas_job *job, uint32_t mask,
                       struct solver_entry *entry)
{
    struct gas_known keep[GAS_NEEDS];
    if (!make_plan(solver, job, mask, entry))
        return;
    for (size_t i = 0; i < solver->required; i++)
        if (!gas_plan_finds(&entry->plan, solver->must[i].variable, solver->must[i].state)) {
            solver_refuse_missing(entry, solver->must[i], &entry->refusal);
            return;
        }
    for (size_t i = 0; i < solver->needs; i++)
        keep[i] = solver->need[i].known;
    gas_plan_trim(&entry->plan, keep, solver->needs);
}

struct solver_entry *solver_entry_for(struct gas_solver *solver, const struct gas_job *job, uint32_t given)
{
    uint32_t mask = given & solver->used;
    if (solver->entries && solver->entry[solver->last].mask == mask)
        return &solver->entry[solver->last];
    for (size_t i = 0; i < solver->entries; i++)
        if (solver->entry[i].mask == mask) {
            solver->last = i;
            return &solver->entry[i];
        }
    if (solver->entries < solver->room)
        solver->last = solver->entries++;
    else
        solver->last = solver->last + 1 < solver->room ? solver->last + 1 : 0;
    make_entry(solver, job, mask, &solver->entry[solver->last]);
    return &solver->entry[solver->last];
}

/* -- running ------------------------------------------------------------------------------------------------------- */

void solver_in_order(const struct solver_entry *entry, const struct gas_case *figures, double *ordered)
{
    for (size_t i = 0; i < entry->count; i++)
        ordered[i] = figures->si[entry->column[i]];
}

bool gas_solver_run(struct gas_solver *solver, const struct gas_job *job, const struct gas_case *figures,
                    double *values, struct gas_refusal *refusal)
{
    struct gas_values found;
    double ordered[GAS_COLUMNS];
    const struct solver_entry *entry = solver_entry_for(solver, job, figures->row->given);
    if (entry->refusal.made)
        return gas_refuse_sentence(refusal, entry->refusal.text);
    solver_in_order(entry, figures, ordered);
    struct gas_result result = gas_plan_run(&entry->plan, &job->gas, &job->options.datum, job->options.agree, ordered,
                                            entry->count, solver->must, solver->required, &found);
    if (result.status != GAS_OK)
        return solver_refuse_run(solver, job, entry, figures, result, &found, refusal);
    for (size_t i = 0; i < solver->needs; i++)
        values[i] =
            gas_plan_finds(&entry->plan, solver->need[i].known.variable, solver->need[i].known.state)
                ? gas_plan_value(&entry->plan, &found, solver->need[i].known.variable, solver->need[i].known.state)
                : NAN;
    return true;
}

const struct gas_plan *gas_solver_plan(struct gas_solver *solver, const struct gas_job *job,
                                       const struct gas_case *figures, double ordered[GAS_COLUMNS],
                                       struct gas_refusal *refusal)
{
    if (!solver->whole)
        solver->whole = gas_arena_take(solver->arena, 1, sizeof *solver->whole);
    if (!solver->whole) {
        gas_refuse(refusal, "given", "there is not enough memory for it; close other documents.");
        return NULL;
    }
    if (!make_plan(solver, job, figures->row->given & solver->used, solver->whole)) {
        gas_refuse_sentence(refusal, solver->whole->refusal.text);
        return NULL;
    }
    solver_in_order(solver->whole, figures, ordered);
    return &solver->whole->plan;
}
