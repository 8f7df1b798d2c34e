/* Do figures that are all known balance? */
#include <math.h>

#include <gasleaf/heat.h>

#include "plan_run.h"

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
            int variable = (int)row->factor[i].variable, exponent = (int)row->factor[i].exponent;
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
    struct gas_result h = gas_dh(run->gas, run->datum.T, T);
    return h.status == GAS_OK ? gas_good(h.value - run->gas->R * T) : h;
}

static void caloric_sides(const struct run *run, const struct gas_step *check, double *left, double *right)
{
    struct gas_step step = *check;
    step.target = gas_relations[check->relation].factor[0].variable;
    double T = of(run, check->state_a, GAS_VAR_T), v = of(run, check->state_a, GAS_VAR_V_MOLAR);
    *left = of(run, check->state_a, (enum gas_variable)step.target);
    if (!gas_step_ready(run, &step))
        *right = NAN;
    else if (check->relation == RELATION_U_OF_T)
        *right = u_of(run, T).value;
    else if (check->relation == RELATION_S_OF_T_V)
        *right = gas_ds(run->gas, run->datum.T, run->datum.P, T, run->gas->R * T / v).value;
    else
        *right = gas_step_solve(run, &step).value;
}

bool gas_check_holds(const struct run *run, const struct gas_step *check, double agree, struct gas_values *values)
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
    values->balanced = solvable ? gas_step_solve(run, check).value : NAN;
    return false;
}
