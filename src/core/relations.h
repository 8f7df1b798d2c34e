/* relations.h - the table of relations between the variables of a state, and of two states. Internal to core. */
#ifndef GASLEAF_CORE_RELATIONS_H
#define GASLEAF_CORE_RELATIONS_H

#include <gasleaf/state.h>

enum relation_kind {
    RELATION_PRODUCT,  /* a product of powers is 1; exponents are 1 and -1 */
    RELATION_ADDITIVE, /* left = a sum of products */
    RELATION_FUNCTION  /* left = a function of the heat capacity */
};

/* Order is preference: among relations that could give a variable in the same round the first one does. */
enum relation_name {
    RELATION_PV_NRT,
    RELATION_MASS,
    RELATION_PV_RT,
    RELATION_V_NV,
    RELATION_RHO_STATE,
    RELATION_M_RHO_V,
    RELATION_V_M_V,
    RELATION_RHO_V_MASS,
    RELATION_PV_MASS,
    RELATION_RHO_V_MOLAR,
    RELATION_V_BASES,
    RELATION_C_V,
    RELATION_P_C,
    RELATION_N_C,
    RELATION_RHO_C,
    RELATION_H_BASES,
    RELATION_U_BASES,
    RELATION_S_BASES,
    RELATION_H_TOTAL,
    RELATION_U_TOTAL,
    RELATION_S_TOTAL,
    RELATION_H_TOTAL_MASS,
    RELATION_U_TOTAL_MASS,
    RELATION_S_TOTAL_MASS,
    RELATION_U_FROM_H,
    RELATION_U_TOTAL_FROM_H,
    RELATION_H_OF_T,
    RELATION_U_OF_T,
    RELATION_S_OF_T_P,
    RELATION_S_OF_T_V,
    RELATION_CLOSED, /* from here on between two states */
    RELATION_CLOSED_V,
    RELATIONS
};

enum { RELATION_FACTORS = 4 };

struct relation {
    enum relation_kind kind;
    bool pair; /* the product of the factors is the same in two states */
    int count;
    struct {
        unsigned char variable;
        signed char exponent; /* of a sum or function: 1 on the left, -1 on the right */
    } factor[RELATION_FACTORS];
    int R, M;         /* exponents */
    unsigned firm;    /* set of variables it gives whenever the others are known */
    unsigned fragile; /* the same, but dividing by what may be zero or be of either sign */
    const char *balance;
    const char *formula[GAS_VARIABLES]; /* solved, for those in firm and fragile */
};

extern const struct relation gas_relations[RELATIONS];

/* The variables of one application with their exponents, shared ones cancelled between two states. */
struct relation_term {
    int slot;
    unsigned char variable;
    unsigned char state;
    int exponent;
};
int gas_relation_terms(const struct gas_plan *plan, int relation, int state_a, int state_b,
                       struct relation_term term[2 * RELATION_FACTORS]);

/* Is every value of this variable above zero? (h, u, s, H, U and S depend on the datum.) */
bool gas_variable_positive(enum gas_variable variable);

/* plan_checks.c: the independent balances among the relations that no step used. */
void gas_plan_add_checks(struct gas_plan *plan);

/* plan_slice.c: mark by slot what a step is computed from. */
void gas_step_mark_inputs(const struct gas_plan *plan, const struct gas_step *step, bool *mark);

#endif
