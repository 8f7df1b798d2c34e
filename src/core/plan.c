/* Making a plan: which variables share a slot, then propagation in rounds. */
#include <string.h>

#include "relations.h"

static const unsigned amounts = 1u << GAS_VAR_N | 1u << GAS_VAR_MASS;

/* What the knowns say about each variable. */
struct naming {
    unsigned unnumbered;            /* set of variables known or constant in every state */
    unsigned states[GAS_VARIABLES]; /* set of states a variable is known in */
    unsigned named;                 /* set of states that occur */
};

static struct gas_result read_known(struct naming *naming, struct gas_known known, int argument)
{
    if (known.state > GAS_STATES || known.state < GAS_CONSTANT || (unsigned)known.variable >= GAS_VARIABLES)
        return gas_bad(GAS_TOO_MANY, argument, known.state);
    unsigned variable = 1u << known.variable;
    unsigned state = known.state > 0 ? 1u << known.state : 0;
    bool twice = naming->unnumbered & variable ||
                 (state ? naming->states[known.variable] & state : naming->states[known.variable]);
    if (twice)
        return gas_bad(GAS_CONTRADICTION, argument, known.state);
    if (state == 0)
        naming->unnumbered |= variable;
    naming->states[known.variable] |= state;
    naming->named |= state;
    return gas_good(0);
}

static struct gas_result read_knowns(struct gas_plan *plan, struct naming *naming, const struct gas_known *known,
                                     size_t count)
{
    *naming = (struct naming){0};
    for (size_t i = 0; i < count; i++) {
        struct gas_result result = read_known(naming, known[i], (int)i + 1);
        if (result.status != GAS_OK)
            return result;
        plan->known[i].variable = (signed char)known[i].variable;
        plan->known[i].state = (signed char)known[i].state;
    }
    plan->known_count = (int)count;
    return gas_good(0);
}

/* A variable known in two states must not be merged, or one of the two figures would be lost. */
static bool may_share(const struct naming *naming, int variable)
{
    unsigned states = naming->states[variable];
    return (states & (states - 1)) == 0;
}

/* The one variable of a row that is not in the set, if the row gives it without a division by zero; else -1. */
static int only_missing(const struct relation *row, unsigned set)
{
    int missing = -1;
    for (int i = 0; i < row->count; i++) {
        int variable = row->factor[i].variable;
        if (set & 1u << variable)
            continue;
        if (missing >= 0)
            return -1;
        missing = variable;
    }
    return missing >= 0 && row->firm & 1u << missing ? missing : -1;
}

/* What follows from shared variables alone is shared as well: the relations are the same in every state. */
static unsigned share(const struct naming *naming, bool open)
{
    unsigned shared = naming->unnumbered;
    if (!open && !naming->states[GAS_VAR_N] && !naming->states[GAS_VAR_MASS])
        shared |= amounts;
    for (bool grown = true; grown;) {
        grown = false;
        for (int relation = 0; relation < RELATION_CLOSED; relation++) {
            int variable = only_missing(&gas_relations[relation], shared);
            if (variable < 0 || !may_share(naming, variable))
                continue;
            shared |= 1u << variable;
            grown = true;
        }
    }
    return shared;
}

/* The state that an unnumbered question means when nothing is shared: the only one in use. 0: there is none. */
static int only_state(const struct gas_plan *plan, const struct naming *naming)
{
    return naming->named == 1u << plan->states ? plan->states : 0;
}

static void lay_slots(struct gas_plan *plan, const struct naming *naming, unsigned shared)
{
    plan->slots = 0;
    for (int variable = 0; variable < GAS_VARIABLES; variable++) {
        bool everywhere = plan->unnumbered || shared & 1u << variable;
        plan->shared[variable] = everywhere;
        short common = everywhere ? (short)plan->slots++ : -1;
        for (int state = 0; state <= GAS_STATES; state++)
            plan->slot[state][variable] = common;
        for (int state = 1; state <= plan->states && !everywhere; state++)
            plan->slot[state][variable] = (short)plan->slots++;
        if (!everywhere && only_state(plan, naming))
            plan->slot[0][variable] = plan->slot[plan->states][variable];
    }
    memset(plan->found, 0, sizeof plan->found);
}

/* One round of propagation: what it finds becomes usable only in the next, so every variable is found by the shortest
 * way and the working stays short. */
struct round {
    struct gas_plan *plan;
    bool fragile;
    bool fresh[GAS_SLOTS];
};

/* Most relations miss no variable, or several: told before the terms are laid out. */
static bool misses_one(const struct gas_plan *plan, const struct relation *row, int state_a, int state_b)
{
    int missing = 0;
    for (int i = 0; i < row->count; i++) {
        unsigned char variable = row->factor[i].variable;
        if (row->pair && plan->shared[variable])
            continue;
        missing += !plan->found[plan->slot[state_a][variable]];
        if (row->pair)
            missing += !plan->found[plan->slot[state_b][variable]];
    }
    return missing == 1;
}

static void try_relation(struct round *round, int relation, int state_a, int state_b)
{
    struct gas_plan *plan = round->plan;
    const struct relation *row = &gas_relations[relation];
    struct relation_term term[2 * RELATION_FACTORS];
    if (!misses_one(plan, row, state_a, state_b))
        return;
    int count = gas_relation_terms(plan, relation, state_a, state_b, term), missing = 0;
    while (missing < count - 1 && plan->found[term[missing].slot])
        missing++;
    if ((round->fresh[term[missing].slot] && !round->fragile) || plan->step_count >= GAS_STEPS)
        return;
    if (!((round->fragile ? row->fragile : row->firm) & 1u << term[missing].variable))
        return;
    round->fresh[term[missing].slot] = true;
    plan->step[plan->step_count++] =
        (struct gas_step){(unsigned char)relation, (unsigned char)state_a, (unsigned char)state_b,
                          term[missing].variable, term[missing].state};
}

static void try_states(struct round *round, int relation)
{
    int states = round->plan->unnumbered ? 1 : round->plan->states;
    for (int a = 1; a <= states; a++) {
        if (!gas_relations[relation].pair)
            try_relation(round, relation, a, 0);
        for (int b = a + 1; gas_relations[relation].pair && b <= states; b++)
            try_relation(round, relation, a, b);
    }
}

/* With `fragile`, second ways to the same variable are kept too: a step whose target is there already is skipped. */
static bool propagate(struct gas_plan *plan, bool functions, bool fragile)
{
    struct round round = {plan, fragile, {false}};
    int before = plan->step_count;
    for (int relation = 0; relation < RELATIONS; relation++)
        if (fragile || functions == (gas_relations[relation].kind == RELATION_FUNCTION))
            try_states(&round, relation);
    for (int slot = 0; slot < plan->slots; slot++)
        plan->found[slot] |= round.fresh[slot];
    return plan->step_count > before;
}

static struct gas_result make(struct gas_plan *plan, const struct gas_known *known, size_t count, int states, bool open)
{
    struct naming naming;
    if (states > GAS_STATES || states < 0)
        return gas_bad(GAS_TOO_MANY, 0, states);
    struct gas_result result = read_knowns(plan, &naming, known, count);
    if (result.status != GAS_OK)
        return result;
    plan->states = states > 1 ? states : 1;
    for (int state = 1; state <= GAS_STATES; state++)
        if (naming.named & 1u << state && state > plan->states)
            plan->states = state;
    plan->unnumbered = naming.named == 0;
    plan->open = open;
    lay_slots(plan, &naming, share(&naming, open));
    for (size_t i = 0; i < count; i++)
        if (known[i].state >= 0)
            plan->found[plan->slot[known[i].state][known[i].variable]] = true;
    plan->step_count = 0;
    while (propagate(plan, false, false) || propagate(plan, true, false) || propagate(plan, false, true))
        ;
    gas_plan_add_checks(plan);
    return gas_good(plan->step_count);
}

struct gas_result gas_plan_make(struct gas_plan *plan, const struct gas_known *known, size_t count, int states)
{
    return make(plan, known, count, states, false);
}

struct gas_result gas_plan_make_open(struct gas_plan *plan, const struct gas_known *known, size_t count, int states)
{
    return make(plan, known, count, states, true);
}
