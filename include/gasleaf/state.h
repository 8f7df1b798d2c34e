/*
 * state.h - what follows from what: states of an ideal gas and the closed-system links between them. (layer: core)
 *
 * One propagation engine over a table of relations. A problem is a set of known variables in numbered states; a plan
 * is the order in which the relations give the unknown ones. The plan depends only on WHICH variables are known, so a
 * table of a hundred thousand rows makes one plan per pattern of blanks and runs it without allocating.
 * A plan is also the record of how a figure was found: its steps name relation, state and variable.
 *
 * State 0 in a gas_known means "in every state". n and m are the same in every state unless a known one is numbered.
 * Extensive variables may all be flows (per second); the relations are the same and the caller keeps the two apart.
 */
#ifndef GASLEAF_STATE_H
#define GASLEAF_STATE_H

#include <stdbool.h>
#include <stddef.h>

#include <gasleaf/gas.h>
#include <gasleaf/status.h>

enum { GAS_STATES = 9 };

/* clang-format off */
/*     name      symbol  SI unit       basis */
#define GAS_VARIABLE_LIST(X)                                       \
    X(P,         "P",    "Pa")        /* absolute pressure      */ \
    X(T,         "T",    "K")                                      \
    X(V,         "V",    "m3")        /* total, or m3/s         */ \
    X(N,         "n",    "mol")       /* amount, or mol/s       */ \
    X(MASS,      "m",    "kg")        /* or kg/s                */ \
    X(V_MOLAR,   "v",    "m3/mol")                                 \
    X(V_MASS,    "v",    "m3/kg")                                  \
    X(RHO,       "rho",  "kg/m3")                                  \
    X(C,         "c",    "mol/m3")                                 \
    X(H_MOLAR,   "h",    "J/mol")     /* above the datum        */ \
    X(U_MOLAR,   "u",    "J/mol")     /* h - P v                */ \
    X(S_MOLAR,   "s",    "J/(mol K)")                              \
    X(H_MASS,    "h",    "J/kg")                                   \
    X(U_MASS,    "u",    "J/kg")                                   \
    X(S_MASS,    "s",    "J/(kg K)")                               \
    X(H_TOTAL,   "H",    "J")         /* or W                   */ \
    X(U_TOTAL,   "U",    "J")                                      \
    X(S_TOTAL,   "S",    "J/K")       /* or W/K                 */
/* clang-format on */

enum gas_variable {
#define GAS_VARIABLE_NAME(name, symbol, unit) GAS_VAR_##name,
    GAS_VARIABLE_LIST(GAS_VARIABLE_NAME)
#undef GAS_VARIABLE_NAME
        GAS_VARIABLES
};

struct gas_known {
    enum gas_variable variable;
    int state; /* 1 to GAS_STATES; 0: the same in every state */
};

/* Where h = 0 and s = 0. u = h - P v, so u at the datum is -R T. */
struct gas_datum {
    double T; /* K,  298.15 by default */
    double P; /* Pa, 1e5 by default */
};

/* One application of a relation: `relation` is a row of the table in src/core/relations.c; state_b is 0 unless the
 * relation links two states. */
struct gas_step {
    int relation;
    int state_a, state_b;
    enum gas_variable target; /* found by this step, in target_state */
    int target_state;
};

enum { GAS_STEPS = 256 };

/* A plan holds no pointers and may be copied and cached. Members are for src/core/plan.c alone. */
struct gas_plan {
    int states;                                 /* highest state number in use, at least 1 */
    bool unnumbered;                            /* every known was unnumbered: one nameless state */
    short slot[GAS_STATES + 1][GAS_VARIABLES];  /* where a variable of a state is kept; shared ones share a slot */
    int slots;
    bool found[(GAS_STATES + 1) * GAS_VARIABLES]; /* by slot */
    int step_count;
    struct gas_step step[GAS_STEPS];
    int check_count;              /* relations with every variable known: they must balance */
    struct gas_step check[GAS_STEPS];
};

/*
 * gas_plan_make - find the order of relations that reaches everything that follows.
 *
 *   Given      known[count]   what will be known; the same variable of the same state twice is GAS_CONTRADICTION
 *              states         highest state number that is asked about (0: only those of `known`)
 *   Status     GAS_TOO_MANY         a state above GAS_STATES or below 0 (argument: index in known, from 1)
 *              GAS_CONTRADICTION    named twice (argument: index of the second one, from 1)
 *   Notes      Never fails for lack of knowns: ask gas_plan_finds.
 */
struct gas_result gas_plan_make(struct gas_plan *plan, const struct gas_known *known, size_t count, int states);

/* gas_plan_finds - is this variable of this state known or found? state 0: the nameless or shared one. */
bool gas_plan_finds(const struct gas_plan *plan, enum gas_variable variable, int state);

/* The outcome of one run. values are read through gas_plan_value. */
struct gas_values {
    double slot[(GAS_STATES + 1) * GAS_VARIABLES];
    /* On GAS_CONTRADICTION: both sides of the balance that fails, in SI, and its check step. */
    double left, right;
    int failed_check;
    /* On any other failure: the step that could not be carried out. */
    int failed_step;
};

/*
 * gas_plan_run - carry the plan out for one row.
 *
 *   Given      figures[count]  SI values, in the order of the knowns the plan was made from
 *              agree           relative disagreement allowed between over-determined figures, 1e-3 by default
 *   Status     GAS_NOT_FINITE, GAS_NOT_POSITIVE  a given P, T, V, n, m, v, rho (argument: index from 1)
 *              GAS_CONTRADICTION                 see values->left, right, failed_check
 *              GAS_OUTSIDE_DATA ...              from the heat-capacity functions; see values->failed_step
 *   Notes      A step that fails does not stop the others: values it would have fed are NAN. The result is bad only
 *              when a given is bad, a balance fails, or `needed` (a slot set; NULL: nothing) contains a NAN value.
 */
struct gas_result gas_plan_run(const struct gas_plan *plan, const struct gas *gas, const struct gas_datum *datum,
                               double agree, const double *figures, size_t count, const struct gas_known *needed,
                               size_t needed_count, struct gas_values *values);

/* gas_plan_value - a value of a run, NAN when it was not found. */
double gas_plan_value(const struct gas_plan *plan, const struct gas_values *values, enum gas_variable variable,
                      int state);

/* Names for the working: the symbol of a variable, and the formula of a relation solved for a target
 * ("P = n R T / V"); static storage. */
const char *gas_variable_symbol(enum gas_variable variable);
const char *gas_variable_unit(enum gas_variable variable);
const char *gas_step_formula(const struct gas_step *step);

#endif
