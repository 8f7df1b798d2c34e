/* Questions about a plan, and the part of one that some variables need. */
#include <math.h>
#include <string.h>

#include "relations.h"

static int slot_of(const struct gas_plan *plan, enum gas_variable variable, int state)
{
    bool real = (unsigned)variable < GAS_VARIABLES && state >= 0 && state <= GAS_STATES;
    return real ? plan->slot[state][variable] : -1;
}

bool gas_plan_finds(const struct gas_plan *plan, enum gas_variable variable, int state)
{
    int slot = slot_of(plan, variable, state);
    return slot >= 0 && plan->found[slot];
}

double gas_plan_value(const struct gas_plan *plan, const struct gas_values *values, enum gas_variable variable,
                      int state)
{
    int slot = slot_of(plan, variable, state);
    return slot >= 0 ? values->slot[slot] : NAN;
}

void gas_step_mark_inputs(const struct gas_plan *plan, const struct gas_step *step, bool *mark)
{
    struct relation_term term[2 * RELATION_FACTORS];
    int target = plan->slot[step->target_state][step->target];
    int count = gas_relation_terms(plan, step->relation, step->state_a, step->state_b, term);
    for (int i = 0; i < count; i++)
        if (term[i].slot != target)
            mark[term[i].slot] = true;
}

int gas_step_inputs(const struct gas_plan *plan, const struct gas_step *step, struct gas_known *inputs)
{
    struct relation_term term[2 * RELATION_FACTORS];
    int target = plan->slot[step->target_state][step->target], inputs_count = 0;
    int count = gas_relation_terms(plan, step->relation, step->state_a, step->state_b, term);
    for (int i = 0; i < count; i++)
        if (term[i].slot != target)
            inputs[inputs_count++] = (struct gas_known){(enum gas_variable)term[i].variable, term[i].state};
    return inputs_count;
}

static void mark_wanted(const struct gas_plan *plan, const struct gas_known *wanted, size_t count, bool *mark)
{
    memset(mark, 0, GAS_SLOTS * sizeof *mark);
    for (size_t i = 0; i < count; i++) {
        int slot = slot_of(plan, wanted[i].variable, wanted[i].state);
        if (slot >= 0)
            mark[slot] = true;
    }
}

/* Backwards: a step is needed when its target is, and then its inputs are. */
static void mark_steps(const struct gas_plan *plan, bool *mark, bool *needed)
{
    for (int i = plan->step_count - 1; i >= 0; i--) {
        needed[i] = mark[plan->slot[plan->step[i].target_state][plan->step[i].target]];
        if (needed[i])
            gas_step_mark_inputs(plan, &plan->step[i], mark);
    }
}

int gas_plan_slice(const struct gas_plan *plan, const struct gas_known *wanted, size_t count, int *order)
{
    bool mark[GAS_SLOTS], needed[GAS_STEPS];
    int steps = 0;
    mark_wanted(plan, wanted, count, mark);
    mark_steps(plan, mark, needed);
    for (int i = 0; i < plan->step_count; i++)
        if (needed[i])
            order[steps++] = i;
    return steps;
}

static void mark_checks(const struct gas_plan *plan, bool *mark)
{
    for (int i = 0; i < plan->check_count; i++) {
        const struct gas_step *check = &plan->check[i];
        mark[plan->slot[check->target_state][check->target]] = true;
        gas_step_mark_inputs(plan, check, mark);
        if (!gas_variable_positive((enum gas_variable)gas_relations[check->relation].factor[0].variable))
            mark[plan->slot[check->state_a][GAS_VAR_T]] = true; /* R T is what h and u are compared against */
    }
}

/* Lay the marked slots together, so that a run resets few; all others become one slot that is never found. */
static void compact_slots(struct gas_plan *plan, const bool *mark)
{
    short place[GAS_SLOTS];
    short slots = 0;
    for (int slot = 0; slot < plan->slots; slot++) {
        place[slot] = mark[slot] ? slots : -1;
        plan->found[slots] = plan->found[slot];
        slots = (short)(slots + mark[slot]);
    }
    for (int state = 0; state <= GAS_STATES; state++)
        for (int variable = 0; variable < GAS_VARIABLES; variable++) {
            short *slot = &plan->slot[state][variable];
            if (*slot >= 0)
                *slot = place[*slot] >= 0 ? place[*slot] : slots;
        }
    if (slots < plan->slots)
        plan->found[slots++] = false;
    plan->slots = slots;
}

void gas_plan_trim(struct gas_plan *plan, const struct gas_known *wanted, size_t count)
{
    bool mark[GAS_SLOTS], needed[GAS_STEPS];
    int kept = 0;
    mark_wanted(plan, wanted, count, mark);
    mark_checks(plan, mark);
    mark_steps(plan, mark, needed);
    for (int i = 0; i < plan->step_count; i++)
        if (needed[i])
            plan->step[kept++] = plan->step[i];
    plan->step_count = kept;
    for (int i = 0; i < plan->known_count; i++)
        if (plan->known[i].state >= 0)
            mark[plan->slot[plan->known[i].state][plan->known[i].variable]] = true;
    compact_slots(plan, mark);
}

static bool serves(const struct gas_plan *plan, struct gas_known more, struct gas_known wanted)
{
    struct gas_known known[GAS_SLOTS + 1];
    struct gas_plan trial;
    int count = plan->known_count;
    for (int i = 0; i < count; i++)
        known[i] = (struct gas_known){(enum gas_variable)plan->known[i].variable, plan->known[i].state};
    known[count] = more;
    struct gas_result made = plan->open ? gas_plan_make_open(&trial, known, (size_t)count + 1, plan->states)
                                        : gas_plan_make(&trial, known, (size_t)count + 1, plan->states);
    return made.status == GAS_OK && gas_plan_finds(&trial, wanted.variable, wanted.state);
}

size_t gas_plan_missing(const struct gas_plan *plan, struct gas_known wanted, struct gas_known *candidate, size_t room)
{
    static const enum gas_variable common[] = {GAS_VAR_P,   GAS_VAR_T,       GAS_VAR_V,
                                               GAS_VAR_N,   GAS_VAR_MASS,    GAS_VAR_V_MOLAR,
                                               GAS_VAR_RHO, GAS_VAR_S_MOLAR, GAS_VAR_H_MOLAR};
    size_t count = 0;
    if (gas_plan_finds(plan, wanted.variable, wanted.state))
        return 0;
    for (int turn = 0; turn <= plan->states; turn++)
        for (size_t i = 0; i < sizeof common / sizeof *common && count < room; i++) {
            struct gas_known more = {common[i], turn == 0 ? wanted.state : turn};
            bool itself = more.variable == wanted.variable && more.state == wanted.state;
            bool seen = turn > 0 && turn == wanted.state;
            if (!itself && !seen && !(plan->unnumbered && turn > 0) &&
                !gas_plan_finds(plan, more.variable, more.state) && serves(plan, more, wanted))
                candidate[count++] = more;
        }
    return count;
}
