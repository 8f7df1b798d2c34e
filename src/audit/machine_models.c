/* Slips in staged compression and in the filling and venting of vessels. */
#include <math.h>

#include <gasleaf/heat.h>

#include "audit/models.h"
#include "sheet/vessel_task.h"

/* -- staged compression -------------------------------------------------------------------------------------------- */

static bool solve_stages(const struct replay *replay, struct gas_stages_case *stages)
{
    struct gas_refusal refusal = {.made = true};
    return replay->desk->staging && gas_stages_solve(replay->desk->job, &replay->truth->figures, stages, &refusal);
}

/* r/N for each stage where the N-th root of r is due: as if the whole ratio were (r/N)^N. */
bool model_ratio_divided(struct replay *replay, double parameter)
{
    (void)parameter;
    struct gas_stages_case stages;
    int column = gas_job_column(replay->desk->job, GAS_SYM_P, 2);
    if (column < 0 || !solve_stages(replay, &stages) || stages.staged.count < 2)
        return false;
    double N = stages.staged.count, each = stages.P2 / stages.P1 / N;
    replay->figures.si[column] = stages.P1 * pow(each, N);
    return each > 1;
}

bool model_single_stage(struct replay *replay, double parameter)
{
    (void)parameter;
    struct gas_typed_staging *staging = replay_staging(replay);
    if (!staging || staging->ratio_count)
        return false;
    staging->figure[GAS_SAYS_COUNT] = replay_fixed(1, GAS_DIM_NUMBER);
    staging->figure[GAS_SAYS_LIMIT].kind = GAS_FIGURE_NONE;
    return true;
}

bool model_no_cooling(struct replay *replay, double parameter)
{
    (void)parameter;
    struct gas_typed_staging *staging = replay_staging(replay);
    if (!staging || staging->figure[GAS_SAYS_COOLING].kind == GAS_FIGURE_NONE)
        return false;
    staging->figure[GAS_SAYS_COOLING].kind = GAS_FIGURE_NONE;
    staging->aftercooler = false;
    return true;
}

bool model_stages_reversible(struct replay *replay, double parameter)
{
    (void)parameter;
    struct gas_typed_staging *staging = replay_staging(replay);
    if (!staging)
        return false;
    staging->figure[GAS_SAYS_EFFICIENCY] = replay_fixed(1, GAS_DIM_NUMBER);
    return true;
}

static bool wanted_is_power(const struct replay *replay)
{
    enum gas_symbol symbol = replay->desk->job->wanted.heading[0].symbol;
    return symbol == GAS_SYM_POWER_SHAFT || symbol == GAS_SYM_POWER_INPUT || symbol == GAS_SYM_W;
}

/* The work times the efficiency, where it is divided by it. */
bool model_stages_efficiency_turned(struct replay *replay, double parameter)
{
    (void)parameter;
    struct gas_stages_case stages;
    if (!wanted_is_power(replay) || !solve_stages(replay, &stages) || stages.staging.efficiency == 1)
        return false;
    model_stages_reversible(replay, 0);
    replay->factor *= stages.staging.efficiency;
    return true;
}

/* parameter 1: the drive multiplied where it divides; 0: left out */
bool model_drive(struct replay *replay, double parameter)
{
    struct gas_stages_case stages;
    if (replay->desk->job->wanted.heading[0].symbol != GAS_SYM_POWER_INPUT || !solve_stages(replay, &stages) ||
        stages.staging.drive == 1)
        return false;
    replay->factor *= parameter > 0 ? stages.staging.drive * stages.staging.drive : stages.staging.drive;
    return true;
}

/* -- vessels ------------------------------------------------------------------------------------------------------- */

static bool is_filling(const struct replay *replay)
{
    return replay->desk->job->task == &gas_fill_task;
}

bool model_fill_at_line(struct replay *replay, double parameter)
{
    (void)parameter;
    replay->filling = FILL_AT_LINE;
    return is_filling(replay);
}

/* T2 = k T line, which holds for an evacuated vessel alone */
bool model_fill_at_k_line(struct replay *replay, double parameter)
{
    (void)parameter;
    replay->filling = FILL_AT_K_LINE;
    return is_filling(replay);
}

/* The temperature taken as unchanged. */
bool model_wall_isothermal(struct replay *replay, double parameter)
{
    (void)parameter;
    const struct gas_options *options = &replay->desk->job->options;
    if (!is_filling(replay) && replay->desk->job->task != &gas_vent_task)
        return false;
    replay->job.options.wall = GAS_WALL_ISOTHERMAL;
    return options->wall != GAS_WALL_ISOTHERMAL;
}

/* The heat through the wall left out. */
bool model_wall_adiabatic(struct replay *replay, double parameter)
{
    (void)parameter;
    const struct gas_options *options = &replay->desk->job->options;
    if (!is_filling(replay) && replay->desk->job->task != &gas_vent_task)
        return false;
    replay->job.options.wall = GAS_WALL_ADIABATIC;
    return options->wall != GAS_WALL_ADIABATIC;
}

/* What the vessel holds at another end temperature. */
static void end_at(const struct replay *replay, struct gas_vessel_case *solved, double T)
{
    double R = replay->job.gas.R, V = solved->vessel.V;
    double settled = isnan(solved->vessel.T_settled) ? solved->vessel.T1 : solved->vessel.T_settled;
    solved->end.T2 = T;
    solved->end.n2 = solved->vessel.P2 * V / (R * T);
    solved->end.moved = solved->end.n2 - solved->end.n1;
    solved->end.P_settled = solved->end.n2 * R * settled / V;
}

bool vessel_replay(struct replay *replay, double *si)
{
    struct gas_vessel_case solved;
    struct gas_refusal refusal = {.made = true};
    if (!gas_vessel_solve(&replay->job, &replay->figures, &solved, &refusal))
        return false;
    double k = replay->filling == FILL_AT_K_LINE ? gas_gamma(&replay->job.gas, solved.vessel.T_line).value : 1;
    end_at(replay, &solved, k * solved.vessel.T_line);
    return gas_vessel_quantity(&replay->job, &replay->figures, &solved, &replay->job.wanted.heading[0], si, &refusal);
}
