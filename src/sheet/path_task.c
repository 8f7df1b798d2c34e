#include "sheet/path_task.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#include "sheet/leg_refusal.h"
#include "sheet/solver.h"

enum { NEED_P, NEED_T, NEED_N, NEEDS };

/* What the task compiles: the solver of the start, and the points of a leg through points: as they are given, and room
 * for them in SI, since a gauge pressure stands on the barometer of its case. */
struct path_own {
    struct gas_solver *solver;
    struct gas_point *given, *points;
    size_t point_count;
};

static const struct gas_typed_legs *legs_of(const struct gas_job *job)
{
    return job->legs;
}

struct gas_solver *gas_path_solver(const struct gas_job *job)
{
    const struct path_own *own = job->own;
    return own->solver;
}

/* A leg's column of exponents may be headed by a bare n, which otherwise is the amount. */
static void tell_exponent(struct gas_job *job, const struct gas_typed_legs *legs)
{
    bool used = false;
    for (size_t i = 0; i < legs->count; i++)
        used = used || (legs->leg[i].n.kind == GAS_FIGURE_COLUMN && legs->leg[i].n.symbol == GAS_SYM_EXPONENT);
    int column = gas_job_column(job, GAS_SYM_N, 0);
    if (!used || column < 0 || job->table.heading[column].has_unit)
        return;
    job->table.heading[column].symbol = GAS_SYM_EXPONENT;
    job->table.heading[column].unit = gas_unit_si(GAS_DIM_NUMBER);
}

bool gas_path_open(struct gas_job *job, struct gas_typed_legs *legs, const struct gas_job_arguments *arguments,
                   const struct gas_block *legs_argument, struct gas_refusal *refusal)
{
    job->task = &gas_path_task;
    job->legs = legs;
    if (!gas_job_read(job, arguments, refusal) || !gas_legs_read(legs_argument, &job->options, legs, refusal))
        return false;
    tell_exponent(job, legs);
    return gas_job_tell_extent(job, refusal);
}

/* The figures a leg can have, one after the other. */
enum { VALUE, SECOND, EXPONENT, EFFICIENCY, OUTSIDE, FIGURES };
static const struct gas_leg_figure *figure_at(const struct gas_typed_leg *leg, size_t index)
{
    const struct gas_leg_figure *const figures[FIGURES] = {[VALUE] = &leg->value,
                                                           [SECOND] = &leg->second,
                                                           [EXPONENT] = &leg->n,
                                                           [EFFICIENCY] = &leg->efficiency,
                                                           [OUTSIDE] = &leg->outside};
    return figures[index];
}

static bool column_is_there(const struct gas_job *job, const struct gas_typed_leg *leg, size_t number,
                            const struct gas_leg_figure *figure, struct gas_refusal *refusal)
{
    char what[32], name[GAS_NAME_TEXT];
    if (figure->kind != GAS_FIGURE_COLUMN || gas_job_column(job, figure->symbol, figure->state) >= 0)
        return true;
    snprintf(what, sizeof what, "leg %zu", number);
    gas_quantity_name(name, figure->symbol, figure->state);
    return gas_refuse(refusal, what,
                      "\"%s\" takes %s from the givens, but none is headed so; add it there, or write a "
                      "figure with its unit.",
                      leg->text, name);
}

static bool columns_are_there(const struct gas_job *job, struct gas_refusal *refusal)
{
    const struct gas_typed_legs *legs = legs_of(job);
    for (size_t i = 0; i < legs->count; i++) {
        const struct gas_typed_leg *leg = &legs->leg[i];
        for (size_t k = 0; k < FIGURES; k++)
            if (!column_is_there(job, leg, i + 1, figure_at(leg, k), refusal))
                return false;
    }
    return true;
}

static bool compile_points(const struct gas_job *job, struct path_own *own, struct gas_arena *arena,
                           struct gas_refusal *refusal)
{
    const struct gas_typed_legs *legs = legs_of(job);
    if (!legs->points)
        return true;
    own->given = gas_arena_take(arena, 2 * legs->points->rows, sizeof *own->given);
    if (!own->given)
        return gas_refuse(refusal, "legs", "there are too many points for the memory at hand; give fewer.");
    own->points = own->given + legs->points->rows;
    for (size_t row = 1; row < legs->points->rows; row++) {
        const struct gas_cell *P = gas_cell_at(legs->points, row, 0), *V = gas_cell_at(legs->points, row, 1);
        if (gas_cell_blank(P) && gas_cell_blank(V))
            continue;
        if (P->kind != GAS_CELL_NUMBER || V->kind != GAS_CELL_NUMBER)
            return gas_refuse(refusal, "legs", "point %zu has no figure for P or for V; give both.", row);
        own->given[own->point_count++] = (struct gas_point){P->number, NAN, V->number};
    }
    return true;
}

/* The points in SI; their volumes count relative to the first, so totals serve as well as specific ones. */
static void take_points(const struct gas_job *job, const struct gas_case *figures, struct gas_leg *leg)
{
    const struct path_own *own = job->own;
    const struct gas_typed_legs *legs = legs_of(job);
    for (size_t i = 0; i < own->point_count; i++)
        own->points[i] = (struct gas_point){gas_unit_to_si(&legs->point_P, own->given[i].P, figures->barometer), NAN,
                                            gas_unit_to_si(&legs->point_V, own->given[i].v, figures->barometer)};
    leg->ending = GAS_TO_LAST_POINT;
    leg->point = own->points;
    leg->point_count = own->point_count;
}

/* Is a given column the figure of some leg? */
static bool used_by_legs(const struct gas_typed_legs *legs, const struct gas_heading *heading)
{
    for (size_t i = 0; i < legs->count; i++)
        for (size_t k = 0; k < FIGURES; k++) {
            const struct gas_leg_figure *figure = figure_at(&legs->leg[i], k);
            if (figure->kind == GAS_FIGURE_COLUMN && figure->symbol == heading->symbol &&
                figure->state == heading->state)
                return true;
        }
    return false;
}

/* What is given must serve: as the start, as an end to check, or in a leg. */
static bool givens_serve(const struct gas_job *job, struct gas_refusal *refusal)
{
    enum gas_variable variable;
    char shown[80];
    for (size_t i = 0; i < job->table.columns; i++) {
        const struct gas_heading *heading = &job->table.heading[i];
        bool time = heading->symbol == GAS_SYM_TIME && !job->table.one_case; /* of a reading: changes nothing */
        bool serves = heading->tolerance || time || gas_variable_of(heading, &variable) ||
                      (int)i == job->barometer_column || (int)i == job->altitude_column ||
                      used_by_legs(legs_of(job), heading);
        if (!serves)
            return gas_refuse(refusal, "given",
                              "no leg uses %s; name it in a leg, such as \"with Q\", or leave it out.",
                              gas_quoted(shown, sizeof shown, heading->text, strlen(heading->text)));
    }
    return true;
}

static bool prepare(struct gas_job *job, struct gas_arena *arena, struct gas_refusal *refusal)
{
    static const struct gas_need needs[NEEDS] = {
        [NEED_P] = {{GAS_VAR_P, 1}, false}, [NEED_T] = {{GAS_VAR_T, 1}, false}, [NEED_N] = {{GAS_VAR_N, 1}, true}};
    struct path_own *own = gas_arena_take(arena, 1, sizeof *own);
    if (!own)
        return gas_refuse(refusal, "given", "there is no memory for the calculation.");
    *own = (struct path_own){0};
    job->own = own;
    if (!columns_are_there(job, refusal) || !givens_serve(job, refusal) || !compile_points(job, own, arena, refusal))
        return false;
    own->solver = gas_solver_open(job, 1, needs, NEEDS, arena, refusal);
    return own->solver != NULL;
}

/* A figure of a leg in SI with its dimension; NAN where the leg has none. W and Q are into the gas. */
static double figure_si(const struct gas_job *job, const struct gas_case *figures, const struct gas_leg_figure *figure,
                        enum gas_dimension *dimension)
{
    if (figure->kind == GAS_FIGURE_NONE)
        return NAN;
    if (figure->kind == GAS_FIGURE_FIXED) {
        *dimension = figure->unit.dimension;
        return gas_unit_to_si(&figure->unit, figure->figure, figures->barometer);
    }
    int column = gas_job_column(job, figure->symbol, figure->state);
    *dimension = job->table.heading[column].unit.dimension;
    return figures->si[column];
}

/* A volume or energy of a leg per mole, whatever basis it was written in. */
static double per_mole(const struct gas_job *job, double si, enum gas_dimension dimension, double n)
{
    switch (dimension) {
    case GAS_DIM_VOLUME:
    case GAS_DIM_VOLUME_FLOW:
    case GAS_DIM_ENERGY:
    case GAS_DIM_POWER:
        return si / n;
    case GAS_DIM_SPECIFIC_VOLUME:
    case GAS_DIM_SPECIFIC_ENERGY:
        return si * job->gas.molar_mass;
    default:
        return si;
    }
}

/* Why a leg's figure is not there: a blank cell of its column, or a total where the amount is unknown. */
static bool refuse_figure(const struct gas_typed_leg *leg, const struct gas_leg_figure *figure, size_t number,
                          bool blank, struct gas_refusal *refusal)
{
    char what[32], name[GAS_NAME_TEXT];
    snprintf(what, sizeof what, "leg %zu", number);
    gas_quantity_name(name, figure->symbol, figure->state);
    if (blank)
        return gas_refuse(refusal, what, "\"%s\" needs %s, which is blank here; give it.", leg->text, name);
    return gas_refuse(refusal, what,
                      "\"%s\" is a total, but the amount of gas does not follow from the givens; give m, "
                      "n or V, or write the figure per kg or per mol.",
                      leg->text);
}

/* The figures of a leg in SI and per mole; one that is named has to be there. */
static bool leg_figures(const struct gas_job *job, const struct gas_case *figures, struct gas_path_case *path,
                        size_t index, struct gas_refusal *refusal)
{
    const struct gas_typed_leg *typed = &legs_of(job)->leg[index];
    double si[FIGURES];
    for (size_t k = 0; k < FIGURES; k++) {
        const struct gas_leg_figure *figure = figure_at(typed, k);
        enum gas_dimension dimension = GAS_DIM_NUMBER;
        double given = figure_si(job, figures, figure, &dimension);
        si[k] = per_mole(job, given, dimension, path->n);
        if (figure->kind != GAS_FIGURE_NONE && isnan(si[k]))
            return refuse_figure(typed, figure, index + 1, isnan(given), refusal);
    }
    bool by_gas = typed->ending == GAS_WITH_W && typed->value.kind == GAS_FIGURE_FIXED && job->options.work_by_gas;
    path->leg[index] = (struct gas_leg){.process = typed->process,
                                        .ending = typed->ending,
                                        .value = by_gas ? -si[VALUE] : si[VALUE],
                                        .second = si[SECOND],
                                        .n = si[EXPONENT],
                                        .efficiency = typed->efficiency.kind == GAS_FIGURE_NONE ? 1 : si[EFFICIENCY],
                                        .P_outside = si[OUTSIDE]};
    return true;
}

/* How far two figures of a heading are apart, relative to the larger; energies and entropies, which may be near zero,
 * relative to R T and R at least. */
static double apart(const struct gas_job *job, const struct gas_path_case *path, const struct gas_heading *heading,
                    double a, double b)
{
    enum gas_dimension dimension = heading->unit.dimension;
    const struct gas_point *end = &path->change[heading->state - 2].end;
    double scale = fmax(fabs(a), fabs(b));
    double energy = gas_job_from_molar(job, GAS_DIM_MOLAR_ENERGY, job->gas.R * end->T, path->n, dimension);
    double entropy = gas_job_from_molar(job, GAS_DIM_MOLAR_ENTROPY, job->gas.R, path->n, dimension);
    return fabs(a - b) / fmax(scale, fmax(energy, entropy)); /* fmax passes over the NAN of another dimension */
}

/* A state given behind the start that no leg uses is a check: it must be what the path gives there. */
static bool given_end_agrees(const struct gas_job *job, const struct gas_case *figures,
                             const struct gas_path_case *path, size_t column, struct gas_refusal *refusal)
{
    const struct gas_heading *heading = &job->table.heading[column];
    char name[GAS_NAME_TEXT], given[80], found[80];
    double si;
    if (isnan(figures->si[column]) || heading->state < 2 || heading->tolerance || used_by_legs(legs_of(job), heading))
        return true;
    gas_quantity_name(name, heading->symbol, heading->state);
    if (heading->state > (int)path->count + 1)
        return gas_refuse(refusal, name, "the path ends at state %zu; name it in a leg or leave it out.",
                          path->count + 1);
    if (!gas_point_quantity(job, &path->change[heading->state - 2].end, path->n, heading, &si, refusal))
        return false;
    double gap = apart(job, path, heading, si, figures->si[column]);
    if (!(gap > job->options.agree))
        return true;
    gas_figure(given, sizeof given, figures->row->figure[column], &heading->unit);
    gas_figure(found, sizeof found, gas_job_shown(job, figures, heading, si), &heading->unit);
    return gas_refuse(refusal, name,
                      "%s is given, but the legs lead to %s (%s %% apart); name %s in a leg, or correct "
                      "one of them.",
                      given, found, gas_shown_to(100 * gap, 2).text, name);
}

bool gas_path_solve(const struct gas_job *job, const struct gas_case *figures, struct gas_path_case *path,
                    struct gas_refusal *refusal)
{
    const struct path_own *own = job->own;
    const struct gas_typed_legs *legs = legs_of(job);
    double start[NEEDS];
    if (!gas_solver_run(own->solver, job, figures, start, refusal))
        return false;
    path->figures = figures;
    path->start = (struct gas_point){start[NEED_P], start[NEED_T], job->gas.R * start[NEED_T] / start[NEED_P]};
    path->n = start[NEED_N];
    path->count = legs->count;
    for (size_t i = 0; i < legs->count; i++)
        if (!leg_figures(job, figures, path, i, refusal))
            return false;
    if (legs->points)
        take_points(job, figures, &path->leg[0]);
    struct gas_result fault;
    struct gas_result run = gas_path_run(&job->gas, job->options.system, &path->start, path->leg, path->count,
                                         path->change, &path->total, &fault);
    if (run.status != GAS_OK)
        return gas_refuse_leg(refusal, job, path, (size_t)run.argument, &fault);
    for (size_t column = 0; column < job->table.columns; column++)
        if (!given_end_agrees(job, figures, path, column, refusal))
            return false;
    return true;
}

static bool run(const struct gas_job *job, const struct gas_case *figures, double *answers, struct gas_refusal *refusal)
{
    struct gas_path_case path;
    if (!gas_path_solve(job, figures, &path, refusal))
        return false;
    for (size_t i = 0; i < job->wanted.columns; i++)
        if (!gas_path_quantity(job, &path, &path.total, &job->wanted.heading[i], &answers[i], refusal))
            return false;
    return true;
}

const struct gas_task gas_path_task = {.name = "PATH", .prepare = prepare, .run = run};
