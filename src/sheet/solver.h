/*
 * solver.h - states from the givens of a job: the state solver of core behind headings.
 *
 * SOLVE answers from it; a path, staged compression or vessel takes its start from it. Opened once per call, run per
 * case: one plan per pattern of given cells, cached.
 */
#ifndef SHEET_SOLVER_H
#define SHEET_SOLVER_H

#include <gasleaf/state.h>

#include "sheet/job.h"

enum { GAS_NEEDS = 3 * GAS_COLUMNS };

/* A variable that is asked for. state 0: the nameless or shared one. */
struct gas_need {
    struct gas_known known;
    bool optional; /* NAN when it does not follow, in place of a refusal */
};

struct gas_solver;

/*
 * gas_solver_open - from the arena; NULL after a refusal.
 *
 *   Given      job            its given headings; those that are no state variable (efficiency, P line ...) are passed
 *                             over, as are numbered ones above highest_state (0: none is)
 *              needs[count]   copied
 */
struct gas_solver *gas_solver_open(const struct gas_job *job, int highest_state, const struct gas_need *needs,
                                   size_t count, struct gas_arena *arena, struct gas_refusal *refusal);

/*
 * gas_solver_run - values[i] in SI for needs[i]. Refuses bad figures, contradictions, what is missing, temperatures
 * outside the data, each in the user's units.
 */
bool gas_solver_run(struct gas_solver *solver, const struct gas_job *job, const struct gas_case *figures,
                    double *values, struct gas_refusal *refusal);

/* Is the amount of gas the same in every state? */
enum gas_amounts {
    GAS_AMOUNTS_SAME,
    GAS_AMOUNTS_ASKED, /* m1 or n2 is asked for: of each state where that leads there, else the same */
    GAS_AMOUNTS_OPEN   /* of each state */
};

/* gas_solver_amounts - said before the first run; GAS_AMOUNTS_SAME when it is not. */
void gas_solver_amounts(struct gas_solver *solver, enum gas_amounts amounts);

/*
 * gas_solver_uncertainty - standard uncertainty (SI) of needs[need] as `wanted` shows it, from the plus-minus columns.
 *
 *   Notes      The readings are independent, but for the barometer: its own uncertainty is in every gauge and vacuum
 *              reading of the case at once, and in a wanted gauge pressure. A wanted share (±m, %) is of the value.
 *   Source     JCGM 100:2008, 5.1.2; 5.2.2 for what readings have in common
 */
bool gas_solver_uncertainty(struct gas_solver *solver, const struct gas_job *job, const struct gas_case *figures,
                            size_t need, const struct gas_heading *wanted, double *value, struct gas_refusal *refusal);

/* gas_solver_plan - the plan for a pattern of given columns, untrimmed, for a working; and the SI figures in its order.
 * NULL after a refusal. */
const struct gas_plan *gas_solver_plan(struct gas_solver *solver, const struct gas_job *job,
                                       const struct gas_case *figures, double ordered[GAS_COLUMNS],
                                       struct gas_refusal *refusal);

/* gas_variable_of - the state variable a heading names: V, m3/h is V; rho, mol/m3 is c; false when it is none. */
bool gas_variable_of(const struct gas_heading *heading, enum gas_variable *variable);

/* gas_refuse_outside - a temperature (K) outside the data, named and shown in the unit of the job's own temperature. */
bool gas_refuse_outside(struct gas_refusal *refusal, const struct gas_job *job, int state, double T);

#endif
