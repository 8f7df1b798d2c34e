/*
 * leg_refusal.h - why a leg cannot be: core's result in the words and units of the sheet.
 */
#ifndef SHEET_LEG_REFUSAL_H
#define SHEET_LEG_REFUSAL_H

#include "sheet/path_task.h"

/* gas_refuse_leg - number: the leg, from 1; the legs before it are worked out in path. Returns false. */
bool gas_refuse_leg(struct gas_refusal *refusal, const struct gas_job *job, const struct gas_path_case *path,
                    size_t number, const struct gas_result *fault);

#endif
