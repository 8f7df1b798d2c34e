/*
 * stages_task.h - the task of staged compression: suction from the givens, stages from their text, figures from core.
 *
 * job->legs holds a struct gas_typed_staging. Wanted: shaft power, input power, cooler duty (or the same per kg, or as
 * energies where an amount is given), W, Q, stages, ratio (the largest of a stage), T2 (discharge of the last stage,
 * before an aftercooler), T without a number (the hottest discharge of all stages), and what is known of the suction.
 */
#ifndef SHEET_STAGES_TASK_H
#define SHEET_STAGES_TASK_H

#include <gasleaf/stages.h>

#include "sheet/job.h"
#include "sheet/staging_text.h"

extern const struct gas_task gas_stages_task;

struct gas_stages_case {
    double P1, T1, P2, n; /* n in mol or mol/s, NAN when it does not follow */
    struct gas_staging staging;
    struct gas_staged staged;
};

/* gas_stages_solver - the solver of the suction that a prepared job of this task holds, for a working. */
struct gas_solver *gas_stages_solver(const struct gas_job *job);

/* gas_stages_solve - one case; refuses in the user's units. */
bool gas_stages_solve(const struct gas_job *job, const struct gas_case *figures, struct gas_stages_case *stages,
                      struct gas_refusal *refusal);

#endif
