/* Carrying a plan out for one row of figures: straight arithmetic, nothing is allocated. */
#include <math.h>

#include <gasleaf/heat.h>

#include "relations.h"

struct run {
    const struct gas_plan *plan;
    const struct gas *gas;
    struct gas_datum datum;
    const double *slot;
};

static double of(const struct run *run, int state, enum gas_variable variable)
{
    return run->slot[run->plan->slot[state][variable]];
}

static void times_constants(const struct run *run, const struct relation *row, double *over, double *under)
{
    if (row->R < 0)
        *under *= run->gas->R;
    if (row->M != 0)
        *(row->M > 0 ? over : under) *= run->gas->molar_mass;
}

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

/* u = h - R T, and R T0 is what u lacks of h at the datum. */
static struct gas_result h_of(const struct run *run, double T)
{
    return gas_dh(run->gas, run->datum.T, T);
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
                                         : h_of(run, of(run, a, GAS_VAR_T));
    default: /* RELATION_U_OF_T */
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

static bool inputs_there(const struct run *run, const struct gas_step *step)
{
    const struct relation *row = &gas_relations[step->relation];
    for (int i = 0; i < row->count; i++)
        if (row->factor[i].variable != step->target && isnan(of(run, step->state_a, row->factor[i].variable)))
            return false;
    return true;
}

static struct gas_result solve(const struct run *run, const struct gas_step *step)
{
    struct gas_result result;
    if (gas_relations[step->relation].kind == RELATION_PRODUCT)
        result = solve_product(run, step);
    else if (!inputs_there(run, step))
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

/* What counts as small for a relation with h, u or s, which may be near zero: R T or R, times the amount in it. */
static double natural_scale(const struct run *run, const struct gas_step *check)
{
    const struct relation *row = &gas_relations[check->relation];
    double T = of(run, check->state_a, GAS_VAR_T), scale = run->gas->R;
    enum gas_variable first = (enum gas_variable)row->factor[0].variable;
    if (gas_variable_positive(first))
        return 0;
    if (check->relation == RELATION_U_TOTAL_FROM_H)
        return of(run, check->state_a, GAS_VAR_P) * of(run, check->state_a, GAS_VAR_V);
    if (first != GAS_VAR_S_MOLAR && first != GAS_VAR_S_TOTAL)
        scale *= isnan(T) ? run->datum.T : T;
    for (int i = 1; i < row->count; i++) {
        enum gas_variable variable = (enum gas_variable)row->factor[i].variable;
        double x = of(run, check->state_a, variable);
        scale *= variable == GAS_VAR_N ? x : variable == GAS_VAR_MASS ? x / run->gas->molar_mass : 1;
    }
    return scale;
}

static void product_sides(const struct run *run, const struct gas_step *check, double *left, double *right)
{
    const struct relation *row = &gas_relations[check->relation];
    double side[2] = {1, 1};
    for (int s = 0; s < 1 + row->pair; s++)
        for (int i = 0; i < row->count; i++) {
            int variable = row->factor[i].variable, exponent = row->factor[i].exponent;
            double x = of(run, s == 0 ? check->state_a : check->state_b, (enum gas_variable)variable);
            if (row->pair && run->plan->shared[variable])
                continue;
            if (row->pair)
                side[s] *= exponent > 0 ? x : 1 / x;
            else
                side[exponent < 0] *= x;
        }
    times_constants(run, row, &side[0], &side[1]);
    *left = side[0];
    *right = side[1];
}

static struct gas_result u_of(const struct run *run, double T)
{
    struct gas_result h = h_of(run, T);
    return h.status == GAS_OK ? gas_good(h.value - run->gas->R * T) : h;
}

static void caloric_sides(const struct run *run, const struct gas_step *check, double *left, double *right)
{
    struct gas_step step = *check;
    step.target = gas_relations[check->relation].factor[0].variable;
    double T = of(run, check->state_a, GAS_VAR_T), v = of(run, check->state_a, GAS_VAR_V_MOLAR);
    *left = of(run, check->state_a, (enum gas_variable)step.target);
    if (!inputs_there(run, &step))
        *right = NAN;
    else if (check->relation == RELATION_U_OF_T)
        *right = u_of(run, T).value;
    else if (check->relation == RELATION_S_OF_T_V)
        *right = gas_ds(run->gas, run->datum.T, run->datum.P, T, run->gas->R * T / v).value;
    else
        *right = solve(run, &step).value;
}

static bool balanced(const struct run *run, const struct gas_step *check, double agree, struct gas_values *values)
{
    double left, right;
    if (gas_relations[check->relation].kind == RELATION_PRODUCT)
        product_sides(run, check, &left, &right);
    else
        caloric_sides(run, check, &left, &right);
    double scale = fmax(fmax(fabs(left), fabs(right)), natural_scale(run, check));
    if (!(fabs(left - right) > fmax(agree, 1e-9) * scale))
        return true;
    values->left = left;
    values->right = right;
    bool solvable = gas_relations[check->relation].formula[check->target];
    values->balanced = solvable ? solve(run, check).value : NAN;
    return false;
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
        return solve(run, &run->plan->step[values->failed_step]);
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
            slot[target] = solve(run, step).value;
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
        if (!balanced(&run, &plan->check[i], agree, values)) {
            values->failed_check = i;
            return gas_bad(GAS_CONTRADICTION, 0, values->balanced);
        }
    return needed_there(&run, needed, needed_count, values);
}
