#include "sheet/job_solve.h"

#include <math.h>
#include <string.h>

#include <gasleaf/heat.h>

/* How one wanted heading is answered from the solver's values. */
enum answer_kind { VARIABLE, UNCERTAINTY, CP, CV, GAMMA, MOLAR_MASS, CHANGE_U, CHANGE_H, CHANGE_S, BAROMETER };

struct answer {
    enum answer_kind kind;
    int state;                      /* of cp, cv, gamma; the last one of a change */
    size_t need, T1, T2, P1, P2, n; /* indices of needs; those that the kind uses */
    bool total;                     /* of a change: multiplied by n */
};

struct solve {
    struct gas_solver *solver;
    size_t needs;
    struct gas_need need[GAS_NEEDS];
    struct answer answer[GAS_COLUMNS];
};

struct gas_solver *gas_job_solver(const struct gas_job *job)
{
    return ((const struct solve *)job->own)->solver;
}

/* The place of a need; the same variable of the same state is asked for once. */
static size_t need(struct solve *solve, enum gas_variable variable, int state)
{
    for (size_t i = 0; i < solve->needs; i++)
        if (solve->need[i].known.variable == variable && solve->need[i].known.state == state)
            return i;
    if (solve->needs == GAS_NEEDS)
        return GAS_NEEDS - 1;
    solve->need[solve->needs] = (struct gas_need){.known = {variable, state}};
    return solve->needs++;
}

/* The figure that a plus-minus belongs to: in its state or, unnumbered, in any. */
static const struct gas_heading *spread_of(const struct gas_job *job, const struct gas_heading *spread)
{
    for (size_t i = 0; i < job->table.columns; i++) {
        const struct gas_heading *heading = &job->table.heading[i];
        if (heading->symbol == spread->symbol && !heading->tolerance &&
            (heading->state == spread->state || spread->state == 0))
            return heading;
    }
    return NULL;
}

static bool share_has_sense(const struct gas_heading *share)
{
    switch (share->symbol) {
    case GAS_SYM_P:
    case GAS_SYM_V:
    case GAS_SYM_N:
    case GAS_SYM_M:
    case GAS_SYM_V_SPECIFIC:
    case GAS_SYM_RHO:
    case GAS_SYM_BAROMETER:
        return true;
    default:
        return false;
    }
}

static bool refuse_share(const struct gas_heading *share, const char *what, struct gas_refusal *refusal)
{
    char shown[80];
    const char *symbol = gas_symbol_text(share->symbol);
    return gas_refuse(refusal, what,
                      "%s has no sense in %%, its zero is arbitrary; write it with a unit, such as \"±%s%s\".",
                      gas_quoted(shown, sizeof shown, share->text, strlen(share->text)), symbol,
                      share->symbol == GAS_SYM_T ? ", K" : ", kJ/kg");
}

static bool accept_spread(const struct gas_job *job, const struct gas_heading *spread, struct gas_refusal *refusal)
{
    char shown[80];
    enum gas_variable variable;
    const struct gas_heading *heading = spread_of(job, spread);
    gas_quoted(shown, sizeof shown, spread->text, strlen(spread->text));
    if (gas_heading_is_share(spread) && !share_has_sense(spread))
        return refuse_share(spread, "given", refusal);
    if (spread->symbol == GAS_SYM_BAROMETER)
        return true;
    if (!heading)
        return gas_refuse(refusal, "given", "%s is the plus-minus of a figure that is not given; give that too.",
                          shown);
    if (!gas_variable_of(heading, &variable))
        return gas_refuse(refusal, "given",
                          "%s is not used; a plus-minus is taken of P, T, V, n, m, v, rho, h, u, s, "
                          "H, U, S and the barometer.",
                          shown);
    return true;
}

static bool refuse_given(const struct gas_heading *heading, struct gas_refusal *refusal)
{
    char shown[80];
    gas_quoted(shown, sizeof shown, heading->text, strlen(heading->text));
    switch (heading->symbol) {
    case GAS_SYM_W:
    case GAS_SYM_Q:
        return gas_refuse(refusal, "given",
                          "%s belongs to a process, not to a state; use PATH or WORK with a leg \"with %s = ...\".",
                          shown, gas_symbol_text(heading->symbol));
    case GAS_SYM_NONE:
        return gas_refuse(refusal, "given",
                          "%s does not say which quantity it is; write its symbol, such as \"H = 12 kJ\".", shown);
    default:
        return gas_refuse(refusal, "given",
                          "%s is not a quantity of a state; SOLVE takes P, T, V, n, m, v, rho, h, u, s, "
                          "H, U and S.",
                          shown);
    }
}

static bool accept_givens(const struct gas_job *job, struct gas_refusal *refusal)
{
    enum gas_variable variable;
    for (size_t i = 0; i < job->table.columns; i++) {
        const struct gas_heading *heading = &job->table.heading[i];
        bool time = heading->symbol == GAS_SYM_TIME && !job->table.one_case; /* of a reading: changes nothing */
        if (heading->tolerance ? !accept_spread(job, heading, refusal)
                               : !gas_variable_of(heading, &variable) && (int)i != job->barometer_column &&
                                     (int)i != job->altitude_column && !time && !refuse_given(heading, refusal))
            return false;
    }
    return true;
}

/* -- what is wanted ------------------------------------------------------------------------------------------------ */

static bool want_heat_capacity(struct solve *solve, struct answer *answer, const struct gas_heading *heading)
{
    answer->kind = heading->symbol == GAS_SYM_CP ? CP : heading->symbol == GAS_SYM_CV ? CV : GAMMA;
    answer->state = heading->state;
    answer->T1 = need(solve, GAS_VAR_T, heading->state);
    return true;
}

static bool amount_is_numbered(const struct gas_job *job)
{
    enum gas_variable variable;
    for (size_t i = 0; i < job->table.columns; i++)
        if (job->table.heading[i].state > 0 && gas_variable_of(&job->table.heading[i], &variable) &&
            (variable == GAS_VAR_N || variable == GAS_VAR_MASS))
            return true;
    return false;
}

static bool want_change(struct solve *solve, const struct gas_job *job, struct answer *answer,
                        const struct gas_heading *heading, struct gas_refusal *refusal)
{
    answer->kind = heading->symbol == GAS_SYM_DU ? CHANGE_U : heading->symbol == GAS_SYM_DH ? CHANGE_H : CHANGE_S;
    answer->state = gas_job_last_state(job);
    if (answer->state < 2)
        return gas_refuse(refusal, "wanted",
                          "%s is a change from one state to another; number the givens, such as T1 "
                          "and T2.",
                          gas_symbol_text(heading->symbol));
    answer->T1 = need(solve, GAS_VAR_T, 1);
    answer->T2 = need(solve, GAS_VAR_T, answer->state);
    if (answer->kind == CHANGE_S) {
        answer->P1 = need(solve, GAS_VAR_P, 1);
        answer->P2 = need(solve, GAS_VAR_P, answer->state);
    }
    answer->total = gas_dimension_extent(heading->unit.dimension) != GAS_EXTENT_NONE;
    if (answer->total && (job->options.open || amount_is_numbered(job)))
        return gas_refuse(refusal, "wanted",
                          "%s is for one amount of gas, but each state has its own here; ask "
                          "for it per mass or mole, such as %s, kJ/kg.",
                          gas_symbol_text(heading->symbol), gas_symbol_text(heading->symbol));
    if (answer->total)
        answer->n = need(solve, GAS_VAR_N, 0);
    return true;
}

static bool refuse_wanted(const struct gas_heading *heading, struct gas_refusal *refusal)
{
    char shown[80];
    gas_quoted(shown, sizeof shown, heading->text, strlen(heading->text));
    switch (heading->symbol) {
    case GAS_SYM_NONE:
        return gas_refuse(refusal, "wanted",
                          "%s is the unit of several quantities; write which, such as \"H, kJ\" or "
                          "\"dU, kJ\".",
                          shown);
    case GAS_SYM_W:
    case GAS_SYM_Q:
        return gas_refuse(refusal, "wanted", "%s depends on the process; use %s with legs.", shown,
                          heading->symbol == GAS_SYM_W ? "GAS.WORK" : "GAS.HEAT");
    case GAS_SYM_Z:
        return gas_refuse(refusal, "wanted", "SOLVE takes the gas as ideal; use GAS.Z for the compressibility factor.");
    default:
        return gas_refuse(refusal, "wanted",
                          "%s is not found by SOLVE; it finds P, T, V, n, m, v, rho, h, u, s, H, U, "
                          "S, cp, cv, gamma, M, dU, dH and dS.",
                          shown);
    }
}

/* "±m, %" names its variable by the symbol alone. */
static bool want_share(struct solve *solve, struct answer *answer, const struct gas_heading *heading,
                       struct gas_refusal *refusal)
{
    static const struct {
        enum gas_symbol symbol;
        enum gas_variable variable;
    } shares[] = {{GAS_SYM_P, GAS_VAR_P},    {GAS_SYM_V, GAS_VAR_V},     {GAS_SYM_N, GAS_VAR_N},
                  {GAS_SYM_M, GAS_VAR_MASS}, {GAS_SYM_RHO, GAS_VAR_RHO}, {GAS_SYM_V_SPECIFIC, GAS_VAR_V_MOLAR}};
    for (size_t i = 0; i < sizeof shares / sizeof *shares; i++)
        if (shares[i].symbol == heading->symbol) {
            answer->kind = UNCERTAINTY;
            answer->need = need(solve, shares[i].variable, heading->state);
            return true;
        }
    return refuse_share(heading, "wanted", refusal);
}

static bool want(struct solve *solve, const struct gas_job *job, struct answer *answer,
                 const struct gas_heading *heading, struct gas_refusal *refusal)
{
    enum gas_variable variable;
    if (gas_variable_of(heading, &variable)) {
        answer->kind = heading->tolerance ? UNCERTAINTY : VARIABLE;
        answer->need = need(solve, variable, heading->state);
        return true;
    }
    if (gas_heading_is_share(heading))
        return want_share(solve, answer, heading, refusal);
    if (heading->tolerance)
        return gas_refuse(refusal, "wanted",
                          "an uncertainty is found for P, T, V, n, m, v, rho, h, u, s, H, U and S only.");
    switch (heading->symbol) {
    case GAS_SYM_CP:
    case GAS_SYM_CV:
    case GAS_SYM_GAMMA:
        return want_heat_capacity(solve, answer, heading);
    case GAS_SYM_M_MOLAR:
        answer->kind = MOLAR_MASS;
        return true;
    case GAS_SYM_BAROMETER:
        answer->kind = BAROMETER;
        return true;
    case GAS_SYM_DU:
    case GAS_SYM_DH:
    case GAS_SYM_DS:
        return want_change(solve, job, answer, heading, refusal);
    default:
        return refuse_wanted(heading, refusal);
    }
}

/* Whoever asks for m1 and m2 numbers the amounts, as by giving them. */
static enum gas_amounts amounts_of(const struct gas_job *job)
{
    enum gas_variable variable;
    if (job->options.open)
        return GAS_AMOUNTS_OPEN;
    for (size_t i = 0; i < job->wanted.columns; i++)
        if (job->wanted.heading[i].state > 0 && gas_variable_of(&job->wanted.heading[i], &variable) &&
            (variable == GAS_VAR_N || variable == GAS_VAR_MASS))
            return GAS_AMOUNTS_ASKED;
    return GAS_AMOUNTS_SAME;
}

static bool prepare(struct gas_job *job, struct gas_arena *arena, struct gas_refusal *refusal)
{
    struct solve *solve = gas_arena_take(arena, 1, sizeof *solve);
    if (!solve)
        return gas_refuse(refusal, "given", "there is not enough memory for it; close other documents.");
    memset(solve, 0, sizeof *solve);
    job->own = solve;
    if (!accept_givens(job, refusal))
        return false;
    for (size_t i = 0; i < job->wanted.columns; i++)
        if (!want(solve, job, &solve->answer[i], &job->wanted.heading[i], refusal))
            return false;
    solve->solver = gas_solver_open(job, 0, solve->need, solve->needs, arena, refusal);
    if (solve->solver)
        gas_solver_amounts(solve->solver, amounts_of(job));
    return solve->solver != NULL;
}

/* -- one case ------------------------------------------------------------------------------------------------------ */

static bool refuse_heat(const struct gas_job *job, struct gas_result result, int state, struct gas_refusal *refusal)
{
    if (result.status == GAS_OUTSIDE_DATA)
        return gas_refuse_outside(refusal, job, state, result.figure);
    return gas_refuse(refusal, "gas", "%s %s.", job->choice->label, gas_status_words(result.status));
}

static bool heat_capacity(const struct gas_job *job, const struct answer *answer, const struct gas_heading *heading,
                          double T, double *found, struct gas_refusal *refusal)
{
    struct gas_result result = answer->kind == CP   ? gas_cp(&job->gas, T)
                               : answer->kind == CV ? gas_cv(&job->gas, T)
                                                    : gas_gamma(&job->gas, T);
    if (result.status != GAS_OK)
        return refuse_heat(job, result, answer->state, refusal);
    enum gas_dimension molar = answer->kind == GAMMA ? GAS_DIM_NUMBER : GAS_DIM_MOLAR_ENTROPY;
    *found = gas_job_from_molar(job, molar, result.value, NAN, heading->unit.dimension);
    return true;
}

static bool change(const struct gas_job *job, const struct answer *answer, const struct gas_heading *heading,
                   const double *value, double *found, struct gas_refusal *refusal)
{
    double T1 = value[answer->T1], T2 = value[answer->T2];
    struct gas_result result = answer->kind == CHANGE_U ? gas_du(&job->gas, T1, T2)
                               : answer->kind == CHANGE_H
                                   ? gas_dh(&job->gas, T1, T2)
                                   : gas_ds(&job->gas, T1, value[answer->P1], T2, value[answer->P2]);
    if (result.status != GAS_OK) {
        struct gas_range range = gas_range_of(&job->gas);
        bool first = T1 < range.T_from || T1 > range.T_to;
        return refuse_heat(job, result, first ? 1 : answer->state, refusal);
    }
    enum gas_dimension molar = answer->kind == CHANGE_S ? GAS_DIM_MOLAR_ENTROPY : GAS_DIM_MOLAR_ENERGY;
    *found =
        gas_job_from_molar(job, molar, result.value, answer->total ? value[answer->n] : NAN, heading->unit.dimension);
    return true;
}

static bool run(const struct gas_job *job, const struct gas_case *figures, double *answers, struct gas_refusal *refusal)
{
    const struct solve *solve = job->own;
    double value[GAS_NEEDS];
    if (!gas_solver_run(solve->solver, job, figures, value, refusal))
        return false;
    for (size_t i = 0; i < job->wanted.columns; i++) {
        const struct answer *answer = &solve->answer[i];
        const struct gas_heading *heading = &job->wanted.heading[i];
        bool good = true;
        if (answer->kind == VARIABLE)
            answers[i] = value[answer->need];
        else if (answer->kind == MOLAR_MASS)
            answers[i] = job->gas.molar_mass;
        else if (answer->kind == BAROMETER)
            answers[i] = figures->barometer;
        else if (answer->kind == UNCERTAINTY)
            good = gas_solver_uncertainty(solve->solver, job, figures, answer->need, heading, &answers[i], refusal);
        else if (answer->kind <= GAMMA)
            good = heat_capacity(job, answer, heading, value[answer->T1], &answers[i], refusal);
        else
            good = change(job, answer, heading, value, &answers[i], refusal);
        if (!good)
            return false;
    }
    return true;
}

const struct gas_task gas_task_solve = {.name = "SOLVE", .open = true, .prepare = prepare, .run = run};
