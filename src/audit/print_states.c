/* Steps of a state calculation: those of the plan that led to the wanted figures, in its order. */
#include <math.h>
#include <stdio.h>
#include <string.h>

#include "audit/print.h"
#include "sheet/job_solve.h"

struct wants {
    size_t count;
    struct gas_known known[4 * GAS_COLUMNS];
};

static void want(struct wants *wants, enum gas_variable variable, int state)
{
    if (wants->count < sizeof wants->known / sizeof *wants->known)
        wants->known[wants->count++] = (struct gas_known){variable, state};
}

/* What a wanted heading needs of the states. */
static void want_heading(struct wants *wants, const struct gas_job *job, const struct gas_heading *heading)
{
    enum gas_variable variable;
    int last = gas_job_last_state(job);
    if (gas_variable_of(heading, &variable)) {
        want(wants, variable, heading->state);
        return;
    }
    switch (heading->symbol) {
    case GAS_SYM_CP:
    case GAS_SYM_CV:
    case GAS_SYM_GAMMA:
        want(wants, GAS_VAR_T, heading->state);
        break;
    case GAS_SYM_DS:
        want(wants, GAS_VAR_P, 1);
        want(wants, GAS_VAR_P, last);
        /* fall through */
    case GAS_SYM_DU:
    case GAS_SYM_DH:
        want(wants, GAS_VAR_T, 1);
        want(wants, GAS_VAR_T, last);
        if (gas_dimension_extent(heading->unit.dimension) != GAS_EXTENT_NONE)
            want(wants, GAS_VAR_N, 0);
        break;
    default:
        break;
    }
}

static const char *variable_name(char buffer[16], enum gas_variable variable, int state)
{
    if (state > 0)
        snprintf(buffer, 16, "%s%d", gas_variable_symbol(variable), state);
    else
        snprintf(buffer, 16, "%s", gas_variable_symbol(variable));
    return buffer;
}

static void print_plan_step(struct print *print, const struct gas_plan *plan, const struct gas_values *values,
                            const struct gas_step *step)
{
    char name[16], formula[GAS_STEP_TEXT], balance[GAS_STEP_TEXT];
    struct gas_known inputs[GAS_STEP_INPUTS];
    enum gas_variable target = (enum gas_variable)step->target;
    gas_step_formula_text(plan, step, formula, sizeof formula);
    gas_step_balance_text(plan, step, balance, sizeof balance);
    bool heat = strstr(formula, "integral") != NULL;
    struct line *line = print_step(print, variable_name(name, target, step->target_state), formula,
                                   gas_plan_value(plan, values, target, step->target_state), gas_variable_unit(target),
                                   heat ? print_cp_source : balance);
    int count = gas_step_inputs(plan, step, inputs);
    for (int i = 0; i < count; i++)
        print_figure(line, variable_name(name, inputs[i].variable, inputs[i].state),
                     gas_plan_value(plan, values, inputs[i].variable, inputs[i].state),
                     gas_variable_unit(inputs[i].variable));
}

/* Changes and heat capacities, which stand behind the plan. */
static void print_heading(struct print *print, const struct gas_plan *plan, const struct gas_values *values,
                          size_t index)
{
    const struct gas_heading *heading = &print->job->wanted.heading[index];
    const char *formula = NULL;
    switch (heading->symbol) {
    case GAS_SYM_DH:
        formula = "integral of cp dT from T1 to T2";
        break;
    case GAS_SYM_DU:
        formula = "integral of cv dT from T1 to T2, cv = cp - R";
        break;
    case GAS_SYM_DS:
        formula = "integral of cp dT/T from T1 to T2, less R ln(P2/P1)";
        break;
    case GAS_SYM_CP:
        formula = "cp at T";
        break;
    case GAS_SYM_CV:
        formula = "cp at T, less R";
        break;
    case GAS_SYM_GAMMA:
        formula = "cp/(cp - R) at T";
        break;
    default:
        return;
    }
    struct wants wants = {0};
    char words[160], name[16];
    want_heading(&wants, print->job, heading);
    bool total = gas_dimension_extent(heading->unit.dimension) != GAS_EXTENT_NONE;
    snprintf(words, sizeof words, "%s%s", total ? "n times the " : "", formula);
    struct line *line = print_step(print, gas_symbol_text(heading->symbol), words, print->si[index],
                                   gas_dimension_si(heading->unit.dimension), print_cp_source);
    for (size_t i = 0; i < wants.count; i++)
        print_figure(line, variable_name(name, wants.known[i].variable, wants.known[i].state),
                     gas_plan_value(plan, values, wants.known[i].variable, wants.known[i].state),
                     gas_variable_unit(wants.known[i].variable));
}

const struct gas_plan *print_plan(struct print *print, struct gas_solver *solver, const struct gas_known *wanted,
                                  size_t count, struct gas_values *values, struct gas_refusal *refusal)
{
    const struct gas_job *job = print->job;
    double ordered[GAS_COLUMNS];
    int order[GAS_STEPS];
    const struct gas_plan *plan = gas_solver_plan(solver, job, &print->figures, ordered, refusal);
    if (!plan)
        return NULL;
    gas_plan_run(plan, &job->gas, &job->options.datum, job->options.agree, ordered, (size_t)plan->known_count, NULL, 0,
                 values);
    int steps = gas_plan_slice(plan, wanted, count, order);
    for (int i = 0; i < steps; i++)
        print_plan_step(print, plan, values, &plan->step[order[i]]);
    return plan;
}

bool print_states(struct print *print, struct gas_refusal *refusal)
{
    const struct gas_job *job = print->job;
    struct wants wants = {0};
    struct gas_values values;
    for (size_t i = 0; i < job->wanted.columns; i++)
        want_heading(&wants, job, &job->wanted.heading[i]);
    const struct gas_plan *plan = print_plan(print, gas_job_solver(job), wants.known, wants.count, &values, refusal);
    for (size_t i = 0; plan && i < job->wanted.columns; i++) {
        enum gas_variable variable;
        if (gas_variable_of(&job->wanted.heading[i], &variable) && !job->wanted.heading[i].tolerance)
            print->si[i] = gas_plan_value(plan, &values, variable, job->wanted.heading[i].state);
        else
            print_heading(print, plan, &values, i);
    }
    return plan != NULL;
}
