/*
 * vessel_refusal.h - why a vessel cannot be filled or vented so: core's result in the words and units of the sheet.
 */
#ifndef SHEET_VESSEL_REFUSAL_H
#define SHEET_VESSEL_REFUSAL_H

#include "sheet/vessel_task.h"

/* Arguments of gas_fill, gas_vent and gas_vent_time that a result can be about. */
enum {
    AT_VESSEL_V = 1,
    AT_VESSEL_P1,
    AT_VESSEL_T1,
    AT_VESSEL_P2,
    AT_VESSEL_LINE,
    AT_VESSEL_WALL,
    AT_VESSEL_SETTLED,
    AT_ORIFICE_P,
    AT_ORIFICE_AREA,
    AT_ORIFICE_CD
};

bool gas_refuse_vessel(struct gas_refusal *refusal, const struct gas_job *job, const struct gas_case *figures,
                       const struct gas_vessel_case *solved, const struct gas_result *fault);

/* gas_refuse_no_level - a quantity of the vessel that has no value from these givens. */
bool gas_refuse_no_level(struct gas_refusal *refusal, const struct gas_heading *heading);

#endif
