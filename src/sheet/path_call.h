/*
 * path_call.h - what the path functions share: arguments read, one case solved, columns when none are wanted.
 */
#ifndef SHEET_PATH_CALL_H
#define SHEET_PATH_CALL_H

#include "sheet/leg_refusal.h"
#include "sheet/path_task.h"

/* Where a function's arguments stand; 0: it has no such argument. */
struct gas_path_arguments {
    size_t given, legs, wanted, headings, options;
};

/* A call being worked on. */
struct gas_path_call {
    struct gas_job job;
    struct gas_typed_legs legs;
    struct gas_refusal refusal;
    struct gas_row row;      /* of a function that shows one case */
    struct gas_case figures; /* the same in SI */
};

/* gas_path_start - gas, given, wanted, options and legs read; job->wanted may be completed before the job is prepared.
 */
bool gas_path_start(struct gas_path_call *path, const struct gas_call *call, const struct gas_path_arguments *places);

/* gas_path_solve_one - the single case of a function that shows a whole path. */
bool gas_path_solve_one(struct gas_path_call *path, struct gas_call *call, struct gas_path_case *solved);

/* gas_path_columns - what is shown when nothing is wanted: the end of each leg in the units of the givens, then the
 * changes; or for a trace P, T, V and s. */
void gas_path_columns(struct gas_job *job, bool changes);

/* gas_path_energy_unit - kJ, in flow kW, without an amount kJ/kg. */
const char *gas_path_energy_unit(const struct gas_job *job);

/* gas_path_put_headings - the wanted headings into the first row, from a column on. */
void gas_path_put_headings(const struct gas_job *job, struct gas_call *call, size_t first);

#endif
