#include "sheet/stages_task.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#include <gasleaf/heat.h>

#include "sheet/job_units.h"
#include "sheet/machine.h"
#include "sheet/solver.h"

enum { NEED_P, NEED_T, NEED_N, NEEDS };

struct own {
    struct gas_solver *solver; /* of the suction */
};

/* Arguments of gas_stages_run that a result can be about. */
enum { AT_P1 = 1, AT_T1, AT_P2, AT_COUNT, AT_RATIO, AT_EFFICIENCY, AT_T_COOL, AT_DROP, AT_DRIVE };

static const struct gas_typed_staging *typed_of(const struct gas_job *job)
{
    return job->legs;
}

/* -- prepare ------------------------------------------------------------------------------------------------------- */

/* clang-format off */
#define SUCTION (1u << 0 | 1u << 1)
static const struct gas_admitted admitted[] = {
    {GAS_SYM_P, SUCTION | 1u << 2}, {GAS_SYM_T, SUCTION}, {GAS_SYM_V, SUCTION}, {GAS_SYM_N, SUCTION | 1u << 2},
    {GAS_SYM_M, SUCTION | 1u << 2}, {GAS_SYM_RHO, SUCTION}, {GAS_SYM_V_SPECIFIC, SUCTION}, {GAS_SYM_RATIO, 1u << 0},
};
/* clang-format on */

/* The columns that the text names; false when one is not there. */
static bool named_columns(const struct gas_job *job, uint32_t *columns, struct gas_refusal *refusal)
{
    const struct gas_typed_staging *typed = typed_of(job);
    char name[GAS_NAME_TEXT];
    *columns = 0;
    for (size_t i = 0; i < GAS_STAGING_FIGURES; i++) {
        const struct gas_leg_figure *figure = &typed->figure[i];
        if (figure->kind != GAS_FIGURE_COLUMN)
            continue;
        int column = gas_job_column(job, figure->symbol, figure->state);
        bool start = figure->symbol == GAS_SYM_T && figure->state == 1; /* known even without a column */
        if (column < 0 && !start)
            return gas_refuse(refusal, "stages",
                              "the text takes %s from the givens, but none is headed so; add it there, or write a "
                              "figure in the text.",
                              gas_quantity_name(name, figure->symbol, figure->state));
        if (column >= 0)
            *columns |= UINT32_C(1) << column;
    }
    return true;
}

static bool accept_wanted(const struct gas_job *job, struct gas_refusal *refusal)
{
    for (size_t i = 0; i < job->wanted.columns; i++)
        if (job->wanted.heading[i].symbol == GAS_SYM_NONE)
            return gas_refuse(
                refusal, "wanted",
                "\"%s\" does not say which quantity; write shaft power, input power or cooler duty before "
                "it.",
                job->wanted.heading[i].text);
    return true;
}

static bool prepare(struct gas_job *job, struct gas_arena *arena, struct gas_refusal *refusal)
{
    static const struct gas_need needs[NEEDS] = {
        [NEED_P] = {{GAS_VAR_P, 1}, false}, [NEED_T] = {{GAS_VAR_T, 1}, false}, [NEED_N] = {{GAS_VAR_N, 1}, true}};
    struct own *own = gas_arena_take(arena, 1, sizeof *own);
    uint32_t named;
    if (!own)
        return gas_refuse(refusal, "given", "there is no memory for the calculation.");
    job->own = own;
    if (!named_columns(job, &named, refusal) ||
        !gas_admit_givens(job, admitted, sizeof admitted / sizeof *admitted, named,
                          "P1, T1, P2 (or the ratio) and an amount or a flow at the suction, and what the stages text "
                          "names",
                          refusal) ||
        !accept_wanted(job, refusal))
        return false;
    if (gas_job_column(job, GAS_SYM_P, 2) < 0 && gas_job_column(job, GAS_SYM_RATIO, 0) < 0)
        return gas_refuse(refusal, "P2", "the discharge pressure is missing; give it, such as P2 = 9 bar(g).");
    own->solver = gas_solver_open(job, 1, needs, NEEDS, arena, refusal);
    return own->solver != NULL;
}

/* -- one case ------------------------------------------------------------------------------------------------------ */

/* A figure of the text in SI. A drop is a difference; NAN where the text has none. */
static bool figure_si(const struct gas_job *job, const struct gas_case *figures, enum gas_staging_item item, double T1,
                      double *si, struct gas_refusal *refusal)
{
    const struct gas_leg_figure *figure = &typed_of(job)->figure[item];
    char name[GAS_NAME_TEXT];
    *si = NAN;
    if (figure->kind == GAS_FIGURE_NONE)
        return true;
    if (figure->kind == GAS_FIGURE_FIXED) {
        *si = item == GAS_SAYS_DROP ? gas_unit_difference_to_si(&figure->unit, figure->figure)
                                    : gas_unit_to_si(&figure->unit, figure->figure, figures->barometer);
        return true;
    }
    *si = gas_case_figure(job, figures, figure->symbol, figure->state);
    if (figure->symbol == GAS_SYM_T && figure->state == 1)
        *si = T1;
    return !isnan(*si) || gas_refuse(refusal, gas_quantity_name(name, figure->symbol, figure->state),
                                     "it is blank here, but the stages text takes it from the givens; give it.");
}

static bool refuse_share(struct gas_refusal *refusal, const char *what, double share)
{
    return gas_refuse(refusal, "stages", "%s of %s is not above 0 and at most 1; 78 %% is written 78 %% or 0.78.", what,
                      gas_shown(share).text);
}

/* What core would take another way, or name less well. */
static bool sensible(const struct gas_typed_staging *typed, const double *si, struct gas_refusal *refusal)
{
    double count = si[GAS_SAYS_COUNT], limit = si[GAS_SAYS_LIMIT], efficiency = si[GAS_SAYS_EFFICIENCY];
    if (!isnan(count) && !(count >= 1 && count <= GAS_STAGES_MAX && count == floor(count)))
        return gas_refuse(refusal, "stages", "%s is no number of stages; give a whole number from 1 to %d.",
                          gas_shown(count).text, GAS_STAGES_MAX);
    if (!isnan(limit) && !(limit > 1))
        return gas_refuse(refusal, "stages",
                          "a ratio of %s per stage does not raise the pressure; give one above 1, such as ratio at "
                          "most 3.5.",
                          gas_shown(limit).text);
    if (!(efficiency > 0 && efficiency <= 1))
        return refuse_share(refusal, "an efficiency", efficiency);
    if (!isnan(si[GAS_SAYS_DRIVE]) && !(si[GAS_SAYS_DRIVE] > 0 && si[GAS_SAYS_DRIVE] <= 1))
        return refuse_share(refusal, "a drive efficiency", si[GAS_SAYS_DRIVE]);
    if (typed->ratio_count && !isnan(count) && count != typed->ratio_count)
        return gas_refuse(refusal, "stages", "%s stages are asked for, but %d ratios are given; make them agree.",
                          gas_shown(count).text, typed->ratio_count);
    return true;
}

static bool staging_of(const struct gas_job *job, const struct gas_case *figures, struct gas_stages_case *stages,
                       struct gas_refusal *refusal)
{
    const struct gas_typed_staging *typed = typed_of(job);
    double si[GAS_STAGING_FIGURES];
    for (size_t i = 0; i < GAS_STAGING_FIGURES; i++)
        if (!figure_si(job, figures, (enum gas_staging_item)i, stages->T1, &si[i], refusal))
            return false;
    if (!sensible(typed, si, refusal))
        return false;
    bool share = typed->figure[GAS_SAYS_DROP].unit.dimension == GAS_DIM_NUMBER;
    double drop = isnan(si[GAS_SAYS_DROP]) ? 0 : si[GAS_SAYS_DROP];
    stages->staging = (struct gas_staging){.count = isnan(si[GAS_SAYS_COUNT]) ? 0 : (int)si[GAS_SAYS_COUNT],
                                           .ratio_limit = si[GAS_SAYS_LIMIT],
                                           .ratio_count = typed->ratio_count,
                                           .kind = typed->kind,
                                           .efficiency = si[GAS_SAYS_EFFICIENCY],
                                           .T_cool = si[GAS_SAYS_COOLING],
                                           .P_drop = share ? 0 : drop,
                                           .P_drop_fraction = share ? drop : 0,
                                           .aftercooler = typed->aftercooler,
                                           .drive = isnan(si[GAS_SAYS_DRIVE]) ? 1 : si[GAS_SAYS_DRIVE]};
    memcpy(stages->staging.ratio, typed->ratio, sizeof typed->ratio);
    return true;
}

/* A discharge that leaves the data: the limit it passed is the figure. */
static bool refuse_hot(const struct gas_job *job, const struct gas_case *figures, double limit,
                       struct gas_refusal *refusal)
{
    char T[GAS_SHOWN];
    return gas_refuse(refusal, "stages",
                      "a discharge temperature passes %s, where the data for %s ends; take more stages, cool between "
                      "them, or check the efficiency.",
                      gas_shown_temperature(job, figures, T, limit), job->choice->label);
}

static bool refuse_drop(const struct gas_job *job, const struct gas_stages_case *stages, const struct gas_result *fault,
                        struct gas_refusal *refusal)
{
    struct gas_unit unit = typed_of(job)->figure[GAS_SAYS_DROP].unit;
    char shown[GAS_SHOWN];
    double drop = stages->staging.P_drop > 0 || fault->figure >= 1 ? stages->staging.P_drop : fault->figure;
    if (unit.dimension == GAS_DIM_NUMBER)
        drop = stages->staging.P_drop_fraction;
    gas_figure(shown, sizeof shown, gas_unit_difference_from_si(&unit, drop), &unit);
    return gas_refuse(refusal, "stages", "a drop of %s between stages %s; check figure and unit.", shown,
                      fault->status == GAS_UNREACHABLE ? "takes away what a stage has gained"
                                                       : "cannot be: it lies from zero to less than the pressure");
}

static bool refuse_ratio(const struct gas_stages_case *stages, const struct gas_result *fault,
                         struct gas_refusal *refusal)
{
    if (fault->status == GAS_TOO_MANY)
        return gas_refuse(refusal, "stages", "a ratio of at most %s would take more than %d stages; allow more.",
                          gas_shown(stages->staging.ratio_limit).text, GAS_STAGES_MAX);
    return gas_refuse(refusal, "stages",
                      "the ratios, scaled to reach P2, leave a stage with %s, which does not raise the pressure; take "
                      "fewer stages or other ratios.",
                      gas_shown(fault->figure).text);
}

static bool refuse_cooling(const struct gas_job *job, double T_cool, struct gas_refusal *refusal)
{
    const struct gas_leg_figure *typed = &typed_of(job)->figure[GAS_SAYS_COOLING];
    struct gas_range range = gas_range_of(&job->gas);
    struct gas_unit unit = typed->kind == GAS_FIGURE_FIXED ? typed->unit : gas_unit_si(GAS_DIM_TEMPERATURE);
    return gas_refuse_temperature(refusal, "stages", T_cool, &unit, job->choice->label, range.T_from, range.T_to);
}

static bool refuse_result(const struct gas_job *job, const struct gas_case *figures,
                          const struct gas_stages_case *stages, const struct gas_result *fault,
                          struct gas_refusal *refusal)
{
    char one[GAS_SHOWN], other[GAS_SHOWN];
    if (fault->status == GAS_NO_HEAT_CAPACITY || job->gas.interval_count == 0)
        return gas_refuse(refusal, "gas", "%s has no heat capacity; give one after '|', such as | k = 1.4.",
                          job->choice->label);
    switch (fault->argument) {
    case 0:
        return refuse_hot(job, figures, fault->figure, refusal);
    case AT_T1:
        return gas_refuse_outside(refusal, job, 1, stages->T1);
    case AT_P2:
        return gas_refuse(refusal, "P2", "%s is not above P1, %s; a compressor raises the pressure.",
                          gas_shown_pressure(job, figures, one, stages->P2),
                          gas_shown_pressure(job, figures, other, stages->P1));
    case AT_COUNT:
        return gas_refuse(refusal, "stages", "%s %s; give 1 to %d.", gas_shown(fault->figure).text,
                          gas_status_words(fault->status), GAS_STAGES_MAX);
    case AT_RATIO:
        return refuse_ratio(stages, fault, refusal);
    case AT_T_COOL:
        return refuse_cooling(job, stages->staging.T_cool, refusal);
    case AT_DROP:
        return refuse_drop(job, stages, fault, refusal);
    default:
        return gas_refuse(refusal, "stages", "%s %s; check the figures.", gas_shown(fault->figure).text,
                          gas_status_words(fault->status));
    }
}

/* P2, or P1 times the ratio; both are balanced. */
static bool discharge_pressure(const struct gas_job *job, const struct gas_case *figures,
                               struct gas_stages_case *stages, struct gas_refusal *refusal)
{
    double ratio = gas_case_figure(job, figures, GAS_SYM_RATIO, 0);
    bool limit = typed_of(job)->figure[GAS_SAYS_LIMIT].kind == GAS_FIGURE_COLUMN; /* the column is the limit */
    stages->P2 = gas_case_figure(job, figures, GAS_SYM_P, 2);
    if (isnan(stages->P2) && !limit)
        stages->P2 = stages->P1 * ratio;
    else if (!limit && fabs(stages->P2 - stages->P1 * ratio) > job->options.agree * stages->P2)
        return gas_refuse(refusal, "given", "P2/P1 is %s, but a ratio of %s is given; leave one of them out.",
                          gas_shown(stages->P2 / stages->P1).text, gas_shown(ratio).text);
    return !isnan(stages->P2) ||
           gas_refuse(refusal, "P2", "the discharge pressure is missing; give it, such as P2 = 9 bar(g).");
}

struct gas_solver *gas_stages_solver(const struct gas_job *job)
{
    const struct own *own = job->own;
    return own->solver;
}

bool gas_stages_solve(const struct gas_job *job, const struct gas_case *figures, struct gas_stages_case *stages,
                      struct gas_refusal *refusal)
{
    const struct own *own = job->own;
    double suction[NEEDS];
    if (!gas_solver_run(own->solver, job, figures, suction, refusal))
        return false;
    stages->P1 = suction[NEED_P];
    stages->T1 = suction[NEED_T];
    stages->n = suction[NEED_N];
    if (!discharge_pressure(job, figures, stages, refusal) || !staging_of(job, figures, stages, refusal))
        return false;
    struct gas_result result =
        gas_stages_run(&job->gas, stages->P1, stages->T1, stages->P2, &stages->staging, &stages->staged);
    return result.status == GAS_OK || refuse_result(job, figures, stages, &result, refusal);
}

/* -- answers ------------------------------------------------------------------------------------------------------- */

static double hottest(const struct gas_staged *staged)
{
    double T = 0;
    for (int i = 0; i < staged->count; i++)
        T = fmax(T, staged->stage[i].T_out);
    return T;
}

static double largest_ratio(const struct gas_staged *staged)
{
    double ratio = 0;
    for (int i = 0; i < staged->count; i++)
        ratio = fmax(ratio, staged->stage[i].ratio);
    return ratio;
}

static bool intensive(const struct gas_stages_case *stages, const struct gas_heading *heading, double *si)
{
    const struct gas_staged *staged = &stages->staged;
    switch (heading->symbol) {
    case GAS_SYM_STAGE_COUNT:
        *si = staged->count;
        return true;
    case GAS_SYM_RATIO:
        *si = largest_ratio(staged);
        return true;
    case GAS_SYM_T:
        *si = heading->state == 0   ? hottest(staged)
              : heading->state == 1 ? stages->T1
                                    : staged->stage[staged->count - 1].T_out;
        return heading->state <= 2;
    case GAS_SYM_P:
        *si = heading->state == 1 ? stages->P1 : stages->P2;
        return heading->state == 1 || heading->state == 2;
    default:
        return false;
    }
}

/* Figures that go with the amount: energies per mole, and the flow itself at the suction. */
static bool extensive(const struct gas_stages_case *stages, const struct gas_job *job,
                      const struct gas_heading *heading, double *molar, enum gas_dimension *dimension)
{
    const struct gas_staged *staged = &stages->staged;
    *dimension = GAS_DIM_MOLAR_ENERGY;
    switch (heading->symbol) {
    case GAS_SYM_W:
    case GAS_SYM_POWER_SHAFT:
        *molar = staged->work;
        return true;
    case GAS_SYM_POWER_INPUT:
        *molar = staged->input;
        return true;
    case GAS_SYM_DUTY:
        *molar = staged->cooling;
        return true;
    case GAS_SYM_Q:
        *molar = -staged->cooling;
        return true;
    case GAS_SYM_N:
    case GAS_SYM_M:
        *molar = 1;
        *dimension = GAS_DIM_NUMBER;
        return true;
    case GAS_SYM_V:
        *molar = job->gas.R * stages->T1 / stages->P1;
        *dimension = GAS_DIM_MOLAR_VOLUME;
        return heading->state <= 1;
    default:
        return false;
    }
}

static bool quantity(const struct gas_job *job, const struct gas_stages_case *stages, const struct gas_heading *heading,
                     double *si, struct gas_refusal *refusal)
{
    double molar;
    enum gas_dimension dimension;
    if (intensive(stages, heading, si))
        return true;
    if (!extensive(stages, job, heading, &molar, &dimension))
        return gas_refuse(refusal, heading->text,
                          "staged compression gives shaft power, input power, cooler duty, T2, T (the hottest "
                          "discharge), ratio, stages, and m, n, V at the suction; ask for those.");
    *si = gas_job_from_molar(job, dimension, molar, stages->n, heading->unit.dimension);
    return !isnan(*si) || gas_refuse_no_basis(heading, stages->n, refusal);
}

static bool run(const struct gas_job *job, const struct gas_case *figures, double *answers, struct gas_refusal *refusal)
{
    struct gas_stages_case stages;
    if (!gas_stages_solve(job, figures, &stages, refusal))
        return false;
    for (size_t i = 0; i < job->wanted.columns; i++)
        if (!quantity(job, &stages, &job->wanted.heading[i], &answers[i], refusal))
            return false;
    return true;
}

const struct gas_task gas_stages_task = {.name = "STAGES", .prepare = prepare, .run = run};
