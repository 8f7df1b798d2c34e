/*
 * job_solve.h - the task behind GAS.SOLVE: states, closed-system links, flows.
 *
 * Wanted may be any state variable, cp, cv, gamma of a state, the molar mass, dU, dH, dS from state 1 to the last, the
 * barometer of the case, and the uncertainty of a state variable (a plus-minus heading). Amounts that are asked for by
 * number (m1, m2) are of each state where that leads there; the option `open` says so for the whole call.
 */
#ifndef SHEET_JOB_SOLVE_H
#define SHEET_JOB_SOLVE_H

#include "sheet/job.h"
#include "sheet/solver.h"

extern const struct gas_task gas_task_solve;

/* gas_job_solver - the solver that a prepared job of this task holds, for a working. */
struct gas_solver *gas_job_solver(const struct gas_job *job);

#endif
