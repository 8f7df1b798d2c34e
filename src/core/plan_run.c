/* Carrying a plan out for one row of figures: straight arithmetic, nothing is allocated. */
#include <math.h>

#include <gasleaf/heat.h>

#include "plan_run.h"

/* Both sides of a product relation, without the term of the target, as over = numerator, under = denominator. */
struct fraction {
    double over, under;
    int target; /* exponent of the target */
};

static struct fraction product_of(const struct run *run, const struct gas_step *step)
{
    const struct relation *row = &gas_relations[step->relation];
    struct fraction f = {1, 1, 1};
    for (int side = 0; side < 1 + row->pair; side++) {
        int state = side == 0 ? step->state_a : step->state_b;
        for (int i = 0; i < row->count; i++) {
            int variable = row->factor[i].variable;
            int exponent = side == 0 ? row->factor[i].exponent : -row->factor[i].exponent;
            if (row->pair && run->plan->shared[variable])
                continue;
            double x = run->slot[run->plan->slot[state][variable]];
            if (variable == step->target && (!row->pair || state == step->target_state))
                f.target = exponent;
            else if (exponent > 0)
                f.over *= x;
            else
                f.under *= x;
        }
    }
    return f;
}

static struct gas_result solve_product(const struct run *run, const struct gas_step *step)
{
    struct fraction f = product_of(run, step);
    times_constants(run, &gas_relations[step->relation], &f.over, &f.under);
    double by = f.target > 0 ? f.over : f.under;
    if (by == 0)
        return gas_bad(GAS_UNDETERMINED, 0, NAN);
    return gas_good(f.target > 0 ? f.under / by : f.over / by);
}

static struct gas_result solve_caloric(const struct run *run, const struct gas_step *step)
{
    const double R = run->gas->R;
    int a = step->state_a;
    switch (step->relation) {
    case RELATION_U_FROM_H:
        return gas_good(step->target == GAS_VAR_U_MOLAR ? of(run, a, GAS_VAR_H_MOLAR) - R * of(run, a, GAS_VAR_T)
                                                        : of(run, a, GAS_VAR_U_MOLAR) + R * of(run, a, GAS_VAR_T));
    case RELATION_H_OF_T:
        return step->target == GAS_VAR_T ? gas_T_after_dh(run->gas, run->datum.T, of(run, a, GAS_VAR_H_MOLAR))
                                         : gas_dh(run->gas, run->datum.T, of(run, a, GAS_VAR_T));
    default: /* RELATION_U_OF_T; u at the datum is -R T0 */
        return gas_T_after_du(run->gas, run->datum.T, of(run, a, GAS_VAR_U_MOLAR) + R * run->datum.T);
    }
}

static struct gas_result solve_total(const struct run *run, const struct gas_step *step)
{
    double P = of(run, step->state_a, GAS_VAR_P), V = of(run, step->state_a, GAS_VAR_V);
    double H = of(run, step->state_a, GAS_VAR_H_TOTAL), U = of(run, step->state_a, GAS_VAR_U_TOTAL);
    switch (step->target) {
    case GAS_VAR_U_TOTAL:
        return gas_good(H - P * V);
    case GAS_VAR_H_TOTAL:
        return gas_good(U + P * V);
    case GAS_VAR_P:
        return gas_good((H - U) / V);
    default:
        return gas_good((H - U) / P);
    }
}

static struct gas_result solve_entropy(const struct run *run, const struct gas_step *step)
{
    const struct gas_datum datum = run->datum;
    const double R = run->gas->R;
    double s = of(run, step->state_a, GAS_VAR_S_MOLAR), T = of(run, step->state_a, GAS_VAR_T);
    double P = of(run, step->state_a, GAS_VAR_P);
    if (step->relation == RELATION_S_OF_T_V) {
        double v_ratio = of(run, step->state_a, GAS_VAR_V_MOLAR) * datum.P / (R * datum.T);
        return gas_T_after_ds_isochoric(run->gas, datum.T, s - R * log(v_ratio));
    }
    if (step->target == GAS_VAR_S_MOLAR)
        return gas_ds(run->gas, datum.T, datum.P, T, P);
    if (step->target == GAS_VAR_T)
        return gas_T_after_ds_isobaric(run->gas, datum.T, s + R * log(P / datum.P));
    struct gas_result rise = gas_ds_isobaric(run->gas, datum.T, T);
    return rise.status == GAS_OK ? gas_good(datum.P * exp((rise.value - s) / R)) : rise;
}

bool gas_step_ready(const struct run *run, const struct gas_step *step)
{
    const struct relation *row = &gas_relations[step->relation];
    for (int i = 0; i < row->count; i++)
        if (row->factor[i].variable != step->target && isnan(of(run, step->state_a, row->factor[i].variable)))
            return false;
    return true;
}

struct gas_result gas_step_solve(const struct run *run, const struct gas_step *step)
{
    struct gas_result result;
    if (gas_relations[step->relation].kind == RELATION_PRODUCT)
        result = solve_product(run, step);
    else if (!gas_step_ready(run, step))
        return gas_bad(GAS_UNDETERMINED, 0, NAN);
    else if (step->relation == RELATION_U_TOTAL_FROM_H)
        result = solve_total(run, step);
    else if (step->relation >= RELATION_S_OF_T_P)
        result = solve_entropy(run, step);
    else
        result = solve_caloric(run, step);
    if (result.status != GAS_OK)
        return gas_bad(result.status, 0, result.figure);
    if (!isfinite(result.value))
        return gas_bad(GAS_NOT_FINITE, 0, result.value);
    if (result.value <= 0 && gas_variable_positive((enum gas_variable)step->target))
        return gas_bad(GAS_NOT_POSITIVE, 0, result.value);
    return result;
}

static struct gas_result take_figures(const struct gas_plan *plan, const double *figures, size_t count, double *slot)
{
    if (count != (size_t)plan->known_count)
        return gas_bad(GAS_TOO_MANY, 0, (double)count);
    for (size_t i = 0; i < count; i++) {
        enum gas_variable variable = (enum gas_variable)plan->known[i].variable;
        if (plan->known[i].state < 0)
            continue;
        if (!isfinite(figures[i]))
            return gas_bad(GAS_NOT_FINITE, (int)i + 1, figures[i]);
        if (figures[i] <= 0 && gas_variable_positive(variable))
            return gas_bad(GAS_NOT_POSITIVE, (int)i + 1, figures[i]);
        slot[plan->slot[plan->known[i].state][variable]] = figures[i];
    }
    return gas_good(0);
}

/* The first step on the way to a missing value that could not be carried out. */
static int root_failure(const struct run *run, int slot)
{
    const struct gas_plan *plan = run->plan;
    bool wanted[GAS_SLOTS] = {false};
    int first = -1;
    wanted[slot] = true;
    for (int i = plan->step_count - 1; i >= 0; i--) {
        const struct gas_step *step = &plan->step[i];
        int target = plan->slot[step->target_state][step->target];
        if (!wanted[target] || !isnan(run->slot[target]))
            continue;
        gas_step_mark_inputs(plan, step, wanted);
        first = i;
    }
    return first;
}

static struct gas_result needed_there(const struct run *run, const struct gas_known *needed, size_t count,
                                      struct gas_values *values)
{
    for (size_t i = 0; needed && i < count; i++) {
        if (!isnan(gas_plan_value(run->plan, values, needed[i].variable, needed[i].state)))
            continue;
        values->failed_needed = (int)i;
        if (gas_plan_finds(run->plan, needed[i].variable, needed[i].state))
            values->failed_step = root_failure(run, run->plan->slot[needed[i].state][needed[i].variable]);
        if (values->failed_step < 0)
            return gas_bad(GAS_UNDETERMINED, 0, NAN);
        return gas_step_solve(run, &run->plan->step[values->failed_step]);
    }
    return gas_good(0);
}

static void carry_out(const struct run *run, double *slot)
{
    const struct gas_plan *plan = run->plan;
    for (int i = 0; i < plan->step_count; i++) {
        const struct gas_step *step = &plan->step[i];
        int target = plan->slot[step->target_state][step->target];
        if (isnan(slot[target]))
            slot[target] = gas_step_solve(run, step).value;
    }
}

struct gas_result gas_plan_run(const struct gas_plan *plan, const struct gas *gas, const struct gas_datum *datum,
                               double agree, const double *figures, size_t count, const struct gas_known *needed,
                               size_t needed_count, struct gas_values *values)
{
    static const struct gas_datum usual = {298.15, 1e5};
    const struct run run = {plan, gas, datum ? *datum : usual, values->slot};
    values->left = values->right = values->balanced = NAN;
    values->failed_check = values->failed_step = values->failed_needed = -1;
    for (int i = 0; i < plan->slots; i++)
        values->slot[i] = NAN;
    struct gas_result result = take_figures(plan, figures, count, values->slot);
    if (result.status != GAS_OK)
        return result;
    carry_out(&run, values->slot);
    for (int i = 0; i < plan->check_count && agree < INFINITY; i++)
        if (!gas_check_holds(&run, &plan->check[i], agree, values)) {
            values->failed_check = i;
            return gas_bad(GAS_CONTRADICTION, 0, values->balanced);
        }
    return needed_there(&run, needed, needed_count, values);
}
