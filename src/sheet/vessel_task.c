#include "sheet/vessel_task.h"

#include <math.h>

#include <gasleaf/heat.h>

#include "sheet/estimate.h"
#include "sheet/job_units.h"
#include "sheet/machine.h"
#include "sheet/solver.h"
#include "sheet/vessel_refusal.h"

enum { NEED_P, NEED_T, NEED_V, NEEDS };

struct own {
    struct gas_solver *solver; /* of the start */
};

static bool is_filling(const struct gas_job *job)
{
    return job->task == &gas_fill_task;
}

/* -- prepare ------------------------------------------------------------------------------------------------------- */

/* clang-format off */
#define BARE  (1u << 0)
#define FIRST (1u << 1)
#define LAST  (1u << 2)
static const struct gas_admitted filling[] = {
    {GAS_SYM_P, FIRST | LAST}, {GAS_SYM_T, FIRST}, {GAS_SYM_V, BARE | FIRST}, {GAS_SYM_M, FIRST}, {GAS_SYM_N, FIRST},
    {GAS_SYM_Q, BARE}, {GAS_SYM_UA, BARE}, {GAS_SYM_T_WALL, BARE}, {GAS_SYM_TIME, BARE}, {GAS_SYM_T_SETTLED, BARE},
    {GAS_SYM_P_LINE, BARE}, {GAS_SYM_T_LINE, BARE},
};
static const struct gas_admitted venting[] = {
    {GAS_SYM_P, FIRST | LAST}, {GAS_SYM_T, FIRST}, {GAS_SYM_V, BARE | FIRST}, {GAS_SYM_M, FIRST}, {GAS_SYM_N, FIRST},
    {GAS_SYM_Q, BARE}, {GAS_SYM_UA, BARE}, {GAS_SYM_T_WALL, BARE}, {GAS_SYM_TIME, BARE}, {GAS_SYM_T_SETTLED, BARE},
    {GAS_SYM_AREA, BARE}, {GAS_SYM_DISCHARGE, BARE}, {GAS_SYM_P_OUTSIDE, BARE},
};
/* clang-format on */

static bool accept_givens(const struct gas_job *job, struct gas_refusal *refusal)
{
    bool fill = is_filling(job);
    if (gas_job_column(job, GAS_SYM_P, 0) >= 0 || gas_job_column(job, GAS_SYM_T, 0) >= 0)
        return gas_refuse(refusal, "given",
                          "P and T need a number here: P1 and T1 before, P2 after%s; the line is P line, T line.",
                          fill ? " the filling" : " the venting");
    if (!gas_admit_givens(job, fill ? filling : venting,
                          fill ? sizeof filling / sizeof *filling : sizeof venting / sizeof *venting, 0,
                          fill ? "V, P1, T1, P2, P line, T line, T settled, Q, UA, T wall and time"
                               : "V, P1, T1, P2, T settled, Q, UA, T wall, time, area, Cd and P outside",
                          refusal))
        return false;
    if (gas_job_column(job, GAS_SYM_P, 2) < 0)
        return gas_refuse(refusal, "P2", "the pressure at the end is missing; give it, such as P2 = %s.",
                          fill ? "200 bar(g)" : "0.5 bar(g)");
    return true;
}

static bool prepare(struct gas_job *job, struct gas_arena *arena, struct gas_refusal *refusal)
{
    static const struct gas_need needs[NEEDS] = {
        [NEED_P] = {{GAS_VAR_P, 1}, false}, [NEED_T] = {{GAS_VAR_T, 1}, false}, [NEED_V] = {{GAS_VAR_V, 1}, false}};
    struct own *own = gas_arena_take(arena, 1, sizeof *own);
    if (!own)
        return gas_refuse(refusal, "given", "there is no memory for the calculation.");
    job->own = own;
    if (!accept_givens(job, refusal))
        return false;
    own->solver = gas_solver_open(job, 1, needs, NEEDS, arena, refusal);
    return own->solver != NULL;
}

/* -- one case ------------------------------------------------------------------------------------------------------ */

/* V, P1, T1: from the solver, but an evacuated vessel has no state to solve for. */
static bool start_of(const struct gas_job *job, const struct gas_case *figures, struct gas_vessel *vessel,
                     struct gas_refusal *refusal)
{
    const struct own *own = job->own;
    double start[NEEDS], P1 = gas_case_figure(job, figures, GAS_SYM_P, 1);
    if (P1 == 0) {
        vessel->P1 = 0;
        vessel->T1 = gas_case_figure(job, figures, GAS_SYM_T, 1);
        vessel->V = gas_case_figure(job, figures, GAS_SYM_V, 0);
        if (isnan(vessel->V))
            vessel->V = gas_case_figure(job, figures, GAS_SYM_V, 1);
        return !isnan(vessel->V) ||
               gas_refuse(refusal, "V", "the volume of the vessel is missing; give it, such as V = 50 L.");
    }
    if (!gas_solver_run(own->solver, job, figures, start, refusal))
        return false;
    vessel->P1 = start[NEED_P];
    vessel->T1 = start[NEED_T];
    vessel->V = start[NEED_V];
    return true;
}

static bool refuse_two_walls(struct gas_refusal *refusal)
{
    return gas_refuse(refusal, "given",
                      "what passes the wall is said twice; keep one of Q, UA and the options isothermal, adiabatic, "
                      "heat lost.");
}

/* The wall of this case: an option, a heat, or a conductance. */
static bool wall_of(const struct gas_job *job, const struct gas_case *figures, struct gas_vessel *vessel,
                    struct gas_refusal *refusal)
{
    vessel->heat = gas_case_figure(job, figures, GAS_SYM_Q, 0);
    vessel->UA = gas_case_figure(job, figures, GAS_SYM_UA, 0);
    vessel->T_wall = gas_case_figure(job, figures, GAS_SYM_T_WALL, 0);
    vessel->time = gas_case_figure(job, figures, GAS_SYM_TIME, 0);
    vessel->fraction = job->options.wall_fraction;
    bool heat = !isnan(vessel->heat), conductance = !isnan(vessel->UA);
    if (heat + conductance + job->options.wall_said > 1)
        return refuse_two_walls(refusal);
    vessel->wall = heat ? GAS_WALL_HEAT : conductance ? GAS_WALL_UA : job->options.wall;
    if (conductance && isnan(vessel->T_wall))
        return gas_refuse(refusal, "T wall", "UA needs the temperature of the wall; give it, such as T wall = 20 °C.");
    if (conductance && isnan(vessel->time))
        return gas_refuse(refusal, "time", "UA needs the time that the wall has; give it, such as time = 5 min.");
    if (!conductance && (!isnan(vessel->T_wall) || !isnan(vessel->time)))
        return gas_refuse(refusal, "UA", "%s is given, but no conductance to go with it; give UA, such as UA = 12 W/K.",
                          isnan(vessel->T_wall) ? "time" : "T wall");
    return true;
}

static bool line_of(const struct gas_job *job, const struct gas_case *figures, struct gas_vessel_case *solved,
                    struct gas_refusal *refusal)
{
    char line[GAS_SHOWN], end[GAS_SHOWN];
    struct gas_vessel *vessel = &solved->vessel;
    vessel->T_line = gas_case_figure(job, figures, GAS_SYM_T_LINE, 0);
    solved->P_line = gas_case_figure(job, figures, GAS_SYM_P_LINE, 0);
    if (solved->P_line < vessel->P2 * (1 - 1e-9))
        return gas_refuse(refusal, "P line", "%s is below P2, %s; the vessel cannot be filled higher than the line.",
                          gas_shown_pressure(job, figures, line, solved->P_line),
                          gas_shown_pressure(job, figures, end, vessel->P2));
    if (isnan(vessel->T_line) && vessel->wall != GAS_WALL_ISOTHERMAL)
        return gas_refuse(refusal, "T line",
                          "the temperature of the line is missing; give it, such as T line = 20 °C.");
    return true;
}

static bool orifice_of(const struct gas_job *job, const struct gas_case *figures, struct gas_vessel_case *solved,
                       struct gas_refusal *refusal)
{
    solved->area = gas_case_figure(job, figures, GAS_SYM_AREA, 0);
    solved->discharge = gas_case_figure(job, figures, GAS_SYM_DISCHARGE, 0);
    solved->P_outside = gas_case_figure(job, figures, GAS_SYM_P_OUTSIDE, 0);
    if (isnan(solved->P_outside))
        solved->P_outside = figures->barometer;
    if (!isnan(solved->area) && isnan(solved->discharge))
        return gas_refuse(refusal, "Cd", "the orifice needs its coefficient of discharge; give it, such as Cd = 0.62.");
    return true;
}

bool gas_vessel_solve(const struct gas_job *job, const struct gas_case *figures, struct gas_vessel_case *solved,
                      struct gas_refusal *refusal)
{
    bool fill = is_filling(job);
    struct gas_vessel *vessel = &solved->vessel;
    *solved = (struct gas_vessel_case){0};
    vessel->P2 = gas_case_figure(job, figures, GAS_SYM_P, 2);
    vessel->T_settled = gas_case_figure(job, figures, GAS_SYM_T_SETTLED, 0);
    solved->time = gas_case_figure(job, figures, GAS_SYM_TIME, 0);
    if (isnan(vessel->P2))
        return gas_refuse(refusal, "P2", "the pressure at the end is missing; give it.");
    if (!start_of(job, figures, vessel, refusal) || !wall_of(job, figures, vessel, refusal) ||
        !(fill ? line_of(job, figures, solved, refusal) : orifice_of(job, figures, solved, refusal)))
        return false;
    struct gas_result result =
        fill ? gas_fill(&job->gas, vessel, &solved->end) : gas_vent(&job->gas, vessel, &solved->end);
    return result.status == GAS_OK || gas_refuse_vessel(refusal, job, figures, solved, &result);
}

/* -- answers ------------------------------------------------------------------------------------------------------- */

/* What flows out of the orifice at the start, or at the end of the venting. */
static bool orifice_flow(const struct gas_job *job, const struct gas_case *figures,
                         const struct gas_vessel_case *solved, int state, double *n, struct gas_refusal *refusal)
{
    const struct gas_vessel *vessel = &solved->vessel;
    if (isnan(solved->area))
        return gas_refuse(refusal, "area", "a flow needs the orifice; give area and Cd (and P outside).");
    struct gas_result flow =
        gas_nozzle_flow(&job->gas, state == 2 ? vessel->P2 : vessel->P1, state == 2 ? solved->end.T2 : vessel->T1,
                        solved->P_outside, solved->area, solved->discharge);
    *n = flow.value;
    if (flow.status == GAS_OK)
        return true;
    static const int as_time[] = {0, 0, AT_VESSEL_P1, AT_VESSEL_T1, AT_ORIFICE_P, AT_ORIFICE_AREA, AT_ORIFICE_CD};
    flow.argument = as_time[flow.argument];
    return gas_refuse_vessel(refusal, job, figures, solved, &flow);
}

static bool vent_time(const struct gas_job *job, const struct gas_case *figures, const struct gas_vessel_case *solved,
                      double *time, struct gas_refusal *refusal)
{
    if (!isnan(solved->time)) {
        *time = solved->time;
        return true;
    }
    if (isnan(solved->area))
        return gas_refuse(refusal, "area", "the time to vent needs the orifice; give area and Cd (and P outside).");
    struct gas_result result =
        gas_vent_time(&job->gas, &solved->vessel, solved->P_outside, solved->area, solved->discharge);
    *time = result.value;
    return result.status == GAS_OK || gas_refuse_vessel(refusal, job, figures, solved, &result);
}

static bool level(const struct gas_vessel_case *solved, const struct gas_heading *heading, double *si)
{
    bool first = heading->state == 1;
    switch (heading->symbol) {
    case GAS_SYM_T:
        *si = first ? solved->vessel.T1 : solved->end.T2;
        return true;
    case GAS_SYM_P:
        *si = first ? solved->vessel.P1 : solved->vessel.P2;
        return true;
    case GAS_SYM_V:
        *si = solved->vessel.V;
        return heading->unit.dimension == GAS_DIM_VOLUME;
    case GAS_SYM_P_SETTLED:
        *si = solved->end.P_settled;
        return true;
    case GAS_SYM_T_SETTLED:
        *si = isnan(solved->vessel.T_settled) ? solved->vessel.T1 : solved->vessel.T_settled;
        return true;
    case GAS_SYM_Q:
        *si = solved->end.heat;
        return heading->unit.dimension == GAS_DIM_ENERGY;
    default:
        return false;
    }
}

/* An amount in what the heading asks for; a flow is what leaves by the orifice. */
static bool amount(const struct gas_job *job, const struct gas_case *figures, const struct gas_vessel_case *solved,
                   const struct gas_heading *heading, double *si, struct gas_refusal *refusal)
{
    double n = heading->symbol == GAS_SYM_MOVED ? solved->end.moved
               : heading->state == 1            ? solved->end.n1
                                                : solved->end.n2;
    bool flow = gas_dimension_extent(heading->unit.dimension) == GAS_EXTENT_FLOW;
    if (flow && is_filling(job))
        return gas_refuse(refusal, heading->text, "a filling has no flow of its own; ask for m added.");
    if (flow && !orifice_flow(job, figures, solved, heading->state, &n, refusal))
        return false;
    *si = gas_job_from_molar(job, GAS_DIM_NUMBER, 1, n, heading->unit.dimension);
    return true;
}

static bool estimated_Z(const struct gas_job *job, const struct gas_vessel_case *solved,
                        const struct gas_heading *heading, double *si, struct gas_refusal *refusal)
{
    struct gas_critical critical;
    const char *unknown = gas_critical_of(job->choice, &critical);
    if (unknown)
        return gas_refuse(refusal, "gas", "the critical constants of %s are not known, so Z cannot be estimated.",
                          unknown);
    bool first = heading->state == 1;
    struct gas_result Z = gas_estimated_Z(&critical, first ? solved->vessel.T1 : solved->end.T2,
                                          first ? solved->vessel.P1 : solved->vessel.P2);
    *si = Z.value;
    return Z.status == GAS_OK || gas_refuse(refusal, "Z", "it is outside the range of its correlation; see GAS.VALID.");
}

bool gas_vessel_quantity(const struct gas_job *job, const struct gas_case *figures,
                         const struct gas_vessel_case *solved, const struct gas_heading *heading, double *si,
                         struct gas_refusal *refusal)
{
    if (heading->state > 2)
        return gas_refuse(refusal, heading->text,
                          "a vessel has two states, 1 before and 2 after; ask for one of them.");
    switch (heading->symbol) {
    case GAS_SYM_M:
    case GAS_SYM_N:
    case GAS_SYM_MOVED:
        return amount(job, figures, solved, heading, si, refusal);
    case GAS_SYM_Z:
        return estimated_Z(job, solved, heading, si, refusal);
    case GAS_SYM_TIME:
        if (!is_filling(job))
            return vent_time(job, figures, solved, si, refusal);
        break;
    default:
        if (!level(solved, heading, si))
            break;
        return !isnan(*si) || gas_refuse_no_level(refusal, heading);
    }
    return gas_refuse(refusal, heading->text, "GAS.%s gives T2, m2, n2, %s, P settled, Q and Z2%s; ask for those.",
                      job->task->name, is_filling(job) ? "m added" : "m out",
                      is_filling(job) ? "" : ", time and the flow at the start");
}

static bool run(const struct gas_job *job, const struct gas_case *figures, double *answers, struct gas_refusal *refusal)
{
    struct gas_vessel_case solved;
    if (!gas_vessel_solve(job, figures, &solved, refusal))
        return false;
    for (size_t i = 0; i < job->wanted.columns; i++)
        if (!gas_vessel_quantity(job, figures, &solved, &job->wanted.heading[i], &answers[i], refusal))
            return false;
    return true;
}

const struct gas_task gas_fill_task = {
    .name = "FILL", .mixed_extents = true, .wall = true, .prepare = prepare, .run = run};
const struct gas_task gas_vent_task = {
    .name = "VENT", .mixed_extents = true, .wall = true, .prepare = prepare, .run = run};
