#include "sheet/path_task.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#include "sheet/leg_refusal.h"
#include "sheet/solver.h"

enum { NEED_P, NEED_T, NEED_N, NEEDS };

/* What the task compiles: the solver of the start, and the points of a leg through points in SI. */
struct path_own {
    struct gas_solver *solver;
    struct gas_point *points;
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
enum { FIGURES = 5 };
static const struct gas_leg_figure *figure_at(const struct gas_typed_leg *leg, size_t index)
{
    const struct gas_leg_figure *const figures[FIGURES] = {&leg->value, &leg->second, &leg->n, &leg->efficiency,
                                                           &leg->outside};
    return figures[index];
}

static bool column_is_there(const struct gas_job *job, const struct gas_typed_leg *leg, size_t number,
                            const struct gas_leg_figure *figure, struct gas_refusal *refusal)
{
    char what[24], name[GAS_NAME_TEXT];
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

/* The points of a leg in SI; their volumes count relative to the first, so totals serve as well as specific ones. */
static bool compile_points(const struct gas_job *job, struct path_own *own, struct gas_arena *arena,
                           struct gas_refusal *refusal)
{
    const struct gas_typed_legs *legs = legs_of(job);
    if (!legs->points)
        return true;
    own->points = gas_arena_take(arena, legs->points->rows, sizeof *own->points);
    if (!own->points)
        return gas_refuse(refusal, "legs", "there are too many points for the memory at hand; give fewer.");
    for (size_t row = 1; row < legs->points->rows; row++) {
        const struct gas_cell *P = gas_cell_at(legs->points, row, 0), *V = gas_cell_at(legs->points, row, 1);
        if (gas_cell_blank(P) && gas_cell_blank(V))
            continue;
        if (P->kind != GAS_CELL_NUMBER || V->kind != GAS_CELL_NUMBER)
            return gas_refuse(refusal, "legs", "point %zu has no figure for P or for V; give both.", row);
        own->points[own->point_count++] =
            (struct gas_point){gas_unit_to_si(&legs->point_P, P->number, job->options.barometer), NAN,
                               gas_unit_to_si(&legs->point_V, V->number, job->options.barometer)};
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
    if (!columns_are_there(job, refusal) || !compile_points(job, own, arena, refusal))
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

static bool leg_figures(const struct gas_job *job, const struct gas_case *figures, const struct gas_typed_leg *typed,
                        double n, struct gas_leg *leg)
{
    enum gas_dimension dimension = GAS_DIM_NUMBER, second = GAS_DIM_NUMBER, unused;
    *leg = (struct gas_leg){.process = typed->process, .ending = typed->ending, .efficiency = 1};
    leg->value = figure_si(job, figures, &typed->value, &dimension);
    leg->value = per_mole(job, leg->value, dimension, n);
    if (typed->ending == GAS_WITH_W && typed->value.kind == GAS_FIGURE_FIXED && job->options.work_by_gas)
        leg->value = -leg->value;
    leg->second = figure_si(job, figures, &typed->second, &second);
    leg->second = per_mole(job, leg->second, second, n);
    leg->n = figure_si(job, figures, &typed->n, &unused);
    leg->P_outside = figure_si(job, figures, &typed->outside, &unused);
    if (typed->efficiency.kind != GAS_FIGURE_NONE)
        leg->efficiency = figure_si(job, figures, &typed->efficiency, &unused);
    bool needs_figure = typed->value.kind != GAS_FIGURE_NONE;
    return !needs_figure || !isnan(leg->value);
}

/* Why a leg's figure is not there: a blank cell of its column, or a total where the amount is unknown. */
static bool refuse_figure(const struct gas_job *job, const struct gas_case *figures, const struct gas_typed_leg *leg,
                          size_t number, struct gas_refusal *refusal)
{
    char what[24], name[GAS_NAME_TEXT];
    enum gas_dimension dimension = GAS_DIM_NUMBER;
    snprintf(what, sizeof what, "leg %zu", number);
    if (isnan(figure_si(job, figures, &leg->value, &dimension))) {
        gas_quantity_name(name, leg->value.symbol, leg->value.state);
        return gas_refuse(refusal, what, "\"%s\" needs %s, which is blank here; give it.", leg->text, name);
    }
    return gas_refuse(refusal, what,
                      "\"%s\" is a total, but the amount of gas does not follow from the givens; give m, "
                      "n or V, or write the figure per kg or per mol.",
                      leg->text);
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

/* A state given behind the start that no leg uses is a check: it must be what the path gives there. */
static bool given_end_agrees(const struct gas_job *job, const struct gas_case *figures,
                             const struct gas_path_case *path, size_t column, struct gas_refusal *refusal)
{
    const struct gas_heading *heading = &job->table.heading[column];
    char name[GAS_NAME_TEXT], given[80], found[80];
    double si;
    if (isnan(figures->si[column]) || heading->state < 2 || used_by_legs(legs_of(job), heading))
        return true;
    gas_quantity_name(name, heading->symbol, heading->state);
    if (heading->state > (int)path->count + 1)
        return gas_refuse(refusal, name, "the path ends at state %zu; name it in a leg or leave it out.",
                          path->count + 1);
    if (!gas_point_quantity(job, &path->change[heading->state - 2].end, path->n, heading, &si, refusal))
        return false;
    double apart = fabs(si - figures->si[column]) / fmax(fabs(si), fabs(figures->si[column]));
    bool energy = heading->symbol >= GAS_SYM_H_SPECIFIC;
    if (energy || !(apart > job->options.agree))
        return true;
    gas_figure(given, sizeof given, figures->row->figure[column], &heading->unit);
    gas_figure(found, sizeof found, gas_job_shown(job, figures, heading, si), &heading->unit);
    return gas_refuse(refusal, name,
                      "%s is given, but the legs lead to %s (%s %% apart); name %s in a leg, or correct "
                      "one of them.",
                      given, found, gas_shown_to(100 * apart, 2).text, name);
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
        if (!leg_figures(job, figures, &legs->leg[i], path->n, &path->leg[i]))
            return refuse_figure(job, figures, &legs->leg[i], i + 1, refusal);
    if (legs->points) {
        path->leg[0].ending = GAS_TO_LAST_POINT;
        path->leg[0].point = own->points;
        path->leg[0].point_count = own->point_count;
    }
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
