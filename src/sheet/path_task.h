/*
 * path_task.h - the path functions' task: a start from the givens, legs from their texts, changes from core.
 *
 * WORK, HEAT and END answer by wanted heading for every row; PATH, TRACE and CYCLE look at the whole path of one case.
 * The end of leg i is state i + 1; a wanted quantity without a number is that of the end.
 */
#ifndef SHEET_PATH_TASK_H
#define SHEET_PATH_TASK_H

#include <gasleaf/path.h>

#include "sheet/job.h"
#include "sheet/legs.h"

extern const struct gas_task gas_path_task;

/* One case of a path, worked out. Energies per mole, into the gas. */
struct gas_path_case {
    const struct gas_case *figures;
    struct gas_point start;
    double n; /* mol, or mol/s in flow; NAN when the givens do not tell it */
    size_t count;
    struct gas_leg leg[GAS_LEGS];
    struct gas_change change[GAS_LEGS];
    struct gas_change total;
};

/*
 * gas_path_open - read the arguments of a path function: job->task and job->legs are set, `legs` is filled, a bare
 * heading n is told from the amount by the legs' use of it. wanted is left to the caller to complete, then
 * gas_job_prepare. Give the job back with gas_job_close.
 */
bool gas_path_open(struct gas_job *job, struct gas_typed_legs *legs, const struct gas_job_arguments *arguments,
                   const struct gas_block *legs_argument, struct gas_refusal *refusal);

/* gas_path_solve - all legs of one case; refuses in the user's units, naming the leg. */
bool gas_path_solve(const struct gas_job *job, const struct gas_case *figures, struct gas_path_case *path,
                    struct gas_refusal *refusal);

/* gas_path_solver - the solver of the start that a prepared job of this task holds, for a working. */
struct gas_solver *gas_path_solver(const struct gas_job *job);

/* gas_path_quantity - a wanted heading's figure in SI: of the whole path, or of one leg (total = that leg's change,
 * start = its start). NAN and a refusal when it does not follow. */
bool gas_path_quantity(const struct gas_job *job, const struct gas_path_case *path, const struct gas_change *change,
                       const struct gas_heading *heading, double *si, struct gas_refusal *refusal);

/* gas_point_quantity - P, T, V, v, rho, n, m, h, u, s, H, U, S at one point of the path. */
bool gas_point_quantity(const struct gas_job *job, const struct gas_point *point, double n,
                        const struct gas_heading *heading, double *si, struct gas_refusal *refusal);

#endif
