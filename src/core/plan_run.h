/* plan_run.h - one run of a plan, shared by the solving and the balancing of relations. Internal to core. */
#ifndef GASLEAF_CORE_PLAN_RUN_H
#define GASLEAF_CORE_PLAN_RUN_H

#include "relations.h"

struct run {
    const struct gas_plan *plan;
    const struct gas *gas;
    struct gas_datum datum;
    const double *slot;
};

static inline double of(const struct run *run, int state, enum gas_variable variable)
{
    return run->slot[run->plan->slot[state][variable]];
}

/* The constants of a product: over belongs to the positive exponents, under to the negative ones. */
static inline void times_constants(const struct run *run, const struct relation *row, double *over, double *under)
{
    if (row->R < 0)
        *under *= run->gas->R;
    if (row->M != 0)
        *(row->M > 0 ? over : under) *= run->gas->molar_mass;
}

/* Is every value there that the target of the step is computed from? */
bool gas_step_ready(const struct run *run, const struct gas_step *step);

/* The target of a step from the values so far; argument 0 in what is bad. */
struct gas_result gas_step_solve(const struct run *run, const struct gas_step *step);

/* Do both sides agree? If not, values->left, right and balanced are filled. What cannot be computed holds. */
bool gas_check_holds(const struct run *run, const struct gas_step *check, double agree, struct gas_values *values);

#endif
