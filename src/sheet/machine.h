/*
 * machine.h - what the functions of machines and vessels share: which givens they take, figures by name, cards.
 */
#ifndef SHEET_MACHINE_H
#define SHEET_MACHINE_H

#include <stdint.h>

#include "sheet/job.h"

/* A heading that a task takes; states: a set of state numbers, bit 0 for none. */
struct gas_admitted {
    enum gas_symbol symbol;
    unsigned states;
};

/*
 * gas_admit_givens - refuse a given that the task would pass over: nothing that was typed is left unused in silence.
 *
 *   Given      list, count    what the task takes
 *              also           set of columns that are taken besides (a text names them)
 *              takes          the quantities in words: "P1, T1, P2 and a flow"
 */
bool gas_admit_givens(const struct gas_job *job, const struct gas_admitted *list, size_t count, uint32_t also,
                      const char *takes, struct gas_refusal *refusal);

/* gas_case_figure - a given in SI; NAN when it has no column or is blank. */
double gas_case_figure(const struct gas_job *job, const struct gas_case *figures, enum gas_symbol symbol, int state);

/* gas_job_one_case - the figures of a function that shows a single case; row and figures are filled. */
bool gas_job_one_case(struct gas_job *job, struct gas_arena *arena, struct gas_row *row, struct gas_case *figures,
                      struct gas_refusal *refusal);

#endif
