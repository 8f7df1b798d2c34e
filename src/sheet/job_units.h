/*
 * job_units.h - SI figures in the units of a job's givens, so that sentences and cards speak as the givens do.
 */
#ifndef SHEET_JOB_UNITS_H
#define SHEET_JOB_UNITS_H

#include "sheet/job.h"

/* gas_job_unit - the unit of the job's first given of a dimension; otherwise the given text, such as "bar". */
struct gas_unit gas_job_unit(const struct gas_job *job, enum gas_dimension dimension, const char *otherwise);

/* gas_shown_pressure, gas_shown_temperature - SI figures as a sentence shows them. */
enum { GAS_SHOWN = 80 };
const char *gas_shown_pressure(const struct gas_job *job, const struct gas_case *figures, char buffer[GAS_SHOWN],
                               double P);
const char *gas_shown_temperature(const struct gas_job *job, const struct gas_case *figures, char buffer[GAS_SHOWN],
                                  double T);

/* gas_refuse_no_basis - a wanted figure that is NAN: the amount is not known, or the unit does not fit. */
bool gas_refuse_no_basis(const struct gas_heading *heading, double n, struct gas_refusal *refusal);

#endif
