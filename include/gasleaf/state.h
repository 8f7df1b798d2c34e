/*
 * state.h - what follows from what: states of an ideal gas and the closed-system links between them. (layer: core)
 *
 * One propagation engine over a table of relations. A problem is a set of known variables in numbered states; a plan
 * is the order in which the relations give the unknown ones. The plan depends only on WHICH variables are known, so a
 * table of a hundred thousand rows makes one plan per pattern of blanks and runs it without allocating.
 * A plan is also the record of how a figure was found: its steps name relation, state and variable.
 *
 * State 0 in a gas_known means "in every state". n and m are the same in every state unless a known one is numbered.
 * What follows from shared variables alone is shared too: V and n shared make v, rho and c shared; P and T shared, all.
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

enum { GAS_CONSTANT = -1 }; /* as the state of a gas_known: the same in every state, its figure unknown */

struct gas_known {
    enum gas_variable variable;
    int state; /* 1 to GAS_STATES; 0: the same in every state; GAS_CONSTANT */
};

/* Where h = 0 and s = 0. u = h - P v, so u at the datum is -R T. */
struct gas_datum {
    double T; /* K,  298.15 by default */
    double P; /* Pa, 1e5 by default */
};

/* One application of a relation: `relation` is a row of the table in src/core/relations.c; state_b is 0 unless the
 * relation links two states. */
struct gas_step {
    unsigned char relation;
    unsigned char state_a, state_b;
    unsigned char target;       /* enum gas_variable: found by this step; of a check: the figure to doubt */
    unsigned char target_state; /* 0: shared by every state, or the nameless one */
};

enum {
    GAS_SLOTS = (GAS_STATES + 1) * GAS_VARIABLES,
    GAS_STEPS = 200, /* one per variable and state, and some second ways */
    GAS_CHECKS = 32,
    GAS_STEP_INPUTS = 8,
    GAS_STEP_TEXT = 96 /* room for any text of gas_step_formula_text and gas_step_balance_text */
};

/* A plan holds no pointers and may be copied and cached. Members are for src/core alone, but for step, step_count,
 * check, check_count, states and unnumbered, which a working may read. */
struct gas_plan {
    int states;                                /* highest state number in use, at least 1 */
    bool unnumbered;                           /* every known was unnumbered: one nameless state */
    bool open;                                 /* made by gas_plan_make_open */
    bool shared[GAS_VARIABLES];                /* the same in every state */
    short slot[GAS_STATES + 1][GAS_VARIABLES]; /* where a variable of a state is kept; shared ones share a slot */
    int slots;
    bool found[GAS_SLOTS]; /* by slot: known, or found by a step */
    int known_count;
    struct {
        signed char variable, state;
    } known[GAS_SLOTS];
    int step_count;
    struct gas_step step[GAS_STEPS];
    int check_count; /* independent balances between figures that are all known: they must hold */
    struct gas_step check[GAS_CHECKS];
};

/*
 * gas_plan_make - find the order of relations that reaches everything that follows.
 *
 *   Given      known[count]   what will be known; the same variable of the same state twice is GAS_CONTRADICTION
 *              states         highest state number that is asked about (0: only those of `known`)
 *   Returned   the number of steps
 *   Status     GAS_TOO_MANY         a state above GAS_STATES or below GAS_CONSTANT (argument: index in known, from 1;
 *                                   0: `states`)
 *              GAS_CONTRADICTION    named twice, in one state or once for every state and once for one
 *                                   (argument: index of the second one, from 1)
 *   Notes      Never fails for lack of knowns: ask gas_plan_finds.
 *              Direct products come first, functions of the heat capacity where no product serves, divisions by a
 *              quantity that may be zero (n = H / h) last; among equals the fewest steps.
 *   Method     Propagation in rounds. A relation left over is a check when it is independent of the steps, told by
 *              the rank of the derivatives at a generic point, so a rounding error can never make a contradiction.
 *   Check      tests/core/test_state.c
 */
struct gas_result gas_plan_make(struct gas_plan *plan, const struct gas_known *known, size_t count, int states);

/* gas_plan_make_open - the same for an open system: n and m are of each state even where no known one is numbered
 * (venting at constant V from P1, T1, P2, T2: m1 and m2 asked). Unnumbered knowns of n and m still hold everywhere. */
struct gas_result gas_plan_make_open(struct gas_plan *plan, const struct gas_known *known, size_t count, int states);

/* gas_plan_finds - is this variable of this state known or found? state 0: the nameless or shared one; where only one
 * state is in use, state 0 addresses it. */
bool gas_plan_finds(const struct gas_plan *plan, enum gas_variable variable, int state);

/*
 * gas_plan_trim - keep only the steps that the wanted variables and the checks need, in order.
 *
 *   Notes      gas_plan_finds is false afterwards for what is no longer computed. Tables trim once and run
 *              often. Checks stay as they are.
 *   Check      tests/core/test_state.c, test_state_cases.c: trimmed and untrimmed plans give the same figures
 */
void gas_plan_trim(struct gas_plan *plan, const struct gas_known *wanted, size_t count);

/*
 * gas_plan_slice - which steps a working should print for the wanted variables: indices into plan->step, in order.
 *
 *   Given      order[GAS_STEPS]
 *   Returned   how many
 *   Check      tests/core/test_state.c
 */
int gas_plan_slice(const struct gas_plan *plan, const struct gas_known *wanted, size_t count, int *order);

/*
 * gas_plan_missing - which single further figure would make a wanted variable follow.
 *
 *   Given      candidate[room]  filled: P, T, V, n, m first, then v, rho, s, h; states of the wanted one first
 *   Returned   how many; 0 when it is found already or when one more figure is not enough
 *   Notes      Makes a plan for each trial: for the sentence of a refusal, not for every row. The plan must not be a
 *              trimmed one.
 *   Check      tests/core/test_state.c
 */
size_t gas_plan_missing(const struct gas_plan *plan, struct gas_known wanted, struct gas_known *candidate, size_t room);

/* The outcome of one run. values are read through gas_plan_value; only the first plan->slots slots are written. */
struct gas_values {
    double slot[GAS_SLOTS];
    /* On GAS_CONTRADICTION: both sides of the balance that fails, in SI, its check step, and the value that the other
     * figures give for the target of that check (NAN when they give none). */
    double left, right;
    int failed_check; /* -1: none */
    double balanced;
    /* On any other failure of a needed value: the step that could not be carried out, -1: no step leads there; and the
     * index of the value in `needed`, from 0. */
    int failed_step;
    int failed_needed;
};

/*
 * gas_plan_run - carry the plan out for one row.
 *
 *   Given      gas, datum      datum NULL: 298.15 K, 1e5 Pa
 *              figures[count]  SI values, in the order of the knowns the plan was made from; the place of a
 *                              GAS_CONSTANT is not read
 *              agree           relative disagreement allowed between over-determined figures, 1e-3 by default; below
 *                              1e-9 it is taken as 1e-9; INFINITY: no checks
 *   Returned   value: 0; the figures are read by gas_plan_value
 *   Status     GAS_NOT_FINITE    a given figure (argument: index from 1)
 *              GAS_NOT_POSITIVE  a given P, T, V, n, m, v, rho or c (argument: index from 1); a needed one that comes
 *                                out so (argument 0, its figure)
 *              GAS_CONTRADICTION see values->left, right, failed_check, balanced
 *              GAS_UNDETERMINED  a needed value does not follow, or only by dividing zero by zero
 *              GAS_TOO_MANY      count is not that of the plan
 *              GAS_OUTSIDE_DATA ... from the heat-capacity functions (argument 0); see values->failed_step
 *   Notes      A step that fails does not stop the others: values it would have fed are NAN. The result is bad only
 *              when a given is bad, a balance fails, or `needed` (NULL: nothing) contains a NAN value.
 *              h, u and s may be near zero: they are compared against R T and R.
 *              A check with a value that could not be computed is left out.
 *   Check      tests/core/test_state.c, test_state_cases.c, test_state_relations.c
 */
struct gas_result gas_plan_run(const struct gas_plan *plan, const struct gas *gas, const struct gas_datum *datum,
                               double agree, const double *figures, size_t count, const struct gas_known *needed,
                               size_t needed_count, struct gas_values *values);

/* gas_plan_value - a value of a run, NAN when it was not found. */
double gas_plan_value(const struct gas_plan *plan, const struct gas_values *values, enum gas_variable variable,
                      int state);

/*
 * gas_plan_uncertainty - standard uncertainty of one wanted value from those of the figures.
 *
 *   Given      figures, uncertainty[count]  SI; uncertainty 0 or NAN: exact. The figures are taken as uncorrelated
 *              wanted                       one variable
 *              part[count]                  filled with the part of each figure, signed; NULL: not asked
 *   Returned   the root of the sum of squares of the parts, in the SI unit of the wanted variable
 *   Status     that of gas_plan_run at the figures themselves; GAS_NEGATIVE an uncertainty below zero, GAS_NOT_FINITE
 *              an infinite one (argument: index from 1)
 *   Method     part = (f(x + d) - f(x - d)) u / (2 d), d = u but at least 1e-6 |x|; where x - d or x + d cannot be
 *              computed, d is made smaller, then one-sided.
 *   Source     JCGM 100:2008, 5.1.2 and 5.1.3 note 2
 *   Check      tests/core/test_state.c
 */
struct gas_result gas_plan_uncertainty(const struct gas_plan *plan, const struct gas *gas,
                                       const struct gas_datum *datum, const double *figures, const double *uncertainty,
                                       size_t count, struct gas_known wanted, double *part);

/* Names for the working. gas_step_formula is the formula of a relation solved for the step's target, "P = n R T / V",
 * for two states "P2 = P1 V1 n2 T2 / (V2 n1 T1)" with 2 for the target's; gas_step_balance the relation itself,
 * "P V = n R T". Static storage, never NULL. */
const char *gas_variable_symbol(enum gas_variable variable);
const char *gas_variable_unit(enum gas_variable variable);
const char *gas_step_formula(const struct gas_step *step);
const char *gas_step_balance(const struct gas_step *step);

/*
 * gas_step_formula_text, gas_step_balance_text - the same with the state numbers of the plan: "P2 = P1 T2 / T1" in a
 * rigid vessel, "n = P1 V / (R T1)". Shared variables carry no number and cancel between two states. The two sides of
 * a balance stand around " = "; values->left and right are their figures. GAS_STEP_TEXT is room enough.
 */
void gas_step_formula_text(const struct gas_plan *plan, const struct gas_step *step, char *buffer, size_t size);
void gas_step_balance_text(const struct gas_plan *plan, const struct gas_step *step, char *buffer, size_t size);

/* gas_step_inputs - the variables a step is computed from, for the line of figures in a working.
 *   Given inputs[GAS_STEP_INPUTS]; state 0 for shared ones.   Returned how many. */
int gas_step_inputs(const struct gas_plan *plan, const struct gas_step *step, struct gas_known *inputs);

#endif
