/*
 * vessel_task.h - the tasks of filling and venting a rigid vessel.
 *
 * Given: V, P1, T1, P2; filling: T line, P line; both: T settled, and what passes the wall: an option (adiabatic,
 * isothermal, heat lost 30 %), Q (heat into the gas), or UA with T wall and time. Venting through an orifice: area, Cd,
 * P outside (the barometer when left out). m1 or n1 may stand for one of V, P1 and T1.
 */
#ifndef SHEET_VESSEL_TASK_H
#define SHEET_VESSEL_TASK_H

#include <gasleaf/vessel.h>

#include "sheet/job.h"

extern const struct gas_task gas_fill_task, gas_vent_task;

struct gas_vessel_case {
    struct gas_vessel vessel;
    struct gas_vessel_end end;
    double P_line;
    double P_outside, area, discharge; /* of an orifice; area NAN: none given */
    double time;                       /* as given, s; NAN */
};

/* gas_vessel_solve - one case; refuses in the user's units. */
bool gas_vessel_solve(const struct gas_job *job, const struct gas_case *figures, struct gas_vessel_case *vessel,
                      struct gas_refusal *refusal);

/* gas_vessel_quantity - a wanted heading's figure in SI. */
bool gas_vessel_quantity(const struct gas_job *job, const struct gas_case *figures,
                         const struct gas_vessel_case *vessel, const struct gas_heading *heading, double *si,
                         struct gas_refusal *refusal);

#endif
