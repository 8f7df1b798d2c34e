/*
 * Which of the relations that no step used are real checks. Every value is, near one generic point, a linear function
 * of small changes of the knowns (in logarithms). A relation is implied by the steps when its own derivative is zero
 * along every change; otherwise it is a check, and once it is accepted only the changes that keep it remain.
 * Enough random directions stand for all changes. No real figures enter: a plan depends on the pattern alone.
 */
#include <math.h>
#include <stdint.h>
#include <string.h>

#include "relations.h"

enum { DIRECTIONS = GAS_CHECKS };

struct slopes {
    int directions;
    bool given[GAS_SLOTS];
    double by_slot[GAS_SLOTS][DIRECTIONS];
};

/* A number in [0.5, 1.5) that is always the same for a key (SplitMix64 of Steele, Lea, Flood, OOPSLA 2014). */
static double generic(uint64_t key)
{
    uint64_t z = (key + 1) * 0x9e3779b97f4a7c15u;
    z = (z ^ (z >> 30)) * 0xbf58476d1ce4e5b9u;
    z = (z ^ (z >> 27)) * 0x94d049bb133111ebu;
    return 0.5 + (double)((z ^ (z >> 31)) >> 11) * 0x1p-53;
}

/* Derivatives of a relation with respect to the logarithms of its variables, at a generic point: h/u is beta, d ln h/
 * d ln T is alpha, R/s is sigma, cp/R is kappa; they belong to the slot of T or of s, so that relations which follow
 * from each other do so here as well. */
static void function_slopes(int relation, const struct relation_term *term, int count, double *slope)
{
    uint64_t first = (uint64_t)term[0].slot * 8, last = (uint64_t)term[count - 1].slot * 8;
    uint64_t T = relation == RELATION_U_FROM_H ? last : (uint64_t)term[1].slot * 8;
    double alpha = generic(T), beta = 1 + generic(T + 1), kappa = 2 + generic(T + 2), sigma = generic(first + 3);
    switch (relation) {
    case RELATION_U_FROM_H:
        slope[0] = 1, slope[1] = -beta, slope[2] = beta - 1;
        break;
    case RELATION_H_OF_T:
        slope[0] = 1, slope[1] = -alpha;
        break;
    case RELATION_U_OF_T:
        slope[0] = 1, slope[1] = -(beta * alpha - beta + 1);
        break;
    case RELATION_S_OF_T_P:
        slope[0] = 1, slope[1] = -sigma * kappa, slope[2] = sigma;
        break;
    default: /* RELATION_S_OF_T_V */
        slope[0] = 1, slope[1] = -sigma * (kappa - 1), slope[2] = -sigma;
        break;
    }
}

/* U = H - P V names no temperature; its h/u is that of the T of the same state. */
static void total_slopes(const struct gas_plan *plan, int state, double *slope)
{
    double beta = 1 + generic((uint64_t)plan->slot[state][GAS_VAR_T] * 8 + 1);
    slope[0] = 1, slope[1] = -beta, slope[2] = slope[3] = beta - 1;
}

static int relation_slopes(const struct gas_plan *plan, const struct gas_step *step, struct relation_term *term,
                           double *slope)
{
    int count = gas_relation_terms(plan, step->relation, step->state_a, step->state_b, term);
    if (gas_relations[step->relation].kind == RELATION_PRODUCT)
        for (int i = 0; i < count; i++)
            slope[i] = term[i].exponent;
    else if (step->relation == RELATION_U_TOTAL_FROM_H)
        total_slopes(plan, step->state_a, slope);
    else
        function_slopes(step->relation, term, count, slope);
    return count;
}

static void follow_steps(const struct gas_plan *plan, struct slopes *slopes)
{
    bool known[GAS_SLOTS];
    memcpy(known, slopes->given, sizeof known);
    for (int i = 0; i < plan->step_count; i++) {
        const struct gas_step *step = &plan->step[i];
        int target = plan->slot[step->target_state][step->target];
        struct relation_term term[2 * RELATION_FACTORS];
        double slope[2 * RELATION_FACTORS] = {0}, own = 1;
        int count = relation_slopes(plan, step, term, slope);
        for (int k = 0; k < count && !known[target]; k++)
            own = term[k].slot == target ? slope[k] : own;
        for (int d = 0; d < slopes->directions && !known[target]; d++) {
            double sum = 0;
            for (int k = 0; k < count; k++)
                sum += term[k].slot == target ? 0 : slope[k] * slopes->by_slot[term[k].slot][d];
            slopes->by_slot[target][d] = -sum / own;
        }
        known[target] = true;
    }
}

static void start_slopes(const struct gas_plan *plan, struct slopes *slopes)
{
    memset(slopes->given, 0, sizeof slopes->given);
    slopes->directions = plan->known_count < DIRECTIONS ? plan->known_count : DIRECTIONS;
    for (int i = 0; i < plan->known_count; i++) {
        if (plan->known[i].state < 0)
            continue;
        int slot = plan->slot[plan->known[i].state][plan->known[i].variable];
        slopes->given[slot] = true;
        for (int d = 0; d < slopes->directions; d++)
            slopes->by_slot[slot][d] = 2 * generic((uint64_t)slot * DIRECTIONS + (uint64_t)d + 100000) - 2;
    }
}

/* Keep only the changes along which the accepted check stays balanced: one direction is spent. */
static void spend_direction(const struct gas_plan *plan, struct slopes *slopes, const double *balance, int pivot)
{
    int last = --slopes->directions;
    for (int slot = 0; slot < plan->slots; slot++) {
        double *row = slopes->by_slot[slot];
        if (!plan->found[slot])
            continue;
        for (int d = 0; d <= last; d++)
            row[d] -= d == pivot ? 0 : row[pivot] * balance[d] / balance[pivot];
        row[pivot] = row[last];
    }
}

/* The figure to name when the check fails: the given one that was listed last. */
static void doubt(const struct gas_plan *plan, const struct relation_term *term, int count, struct gas_step *check)
{
    check->target = term[0].variable;
    check->target_state = term[0].state;
    for (int i = 0; i < plan->known_count; i++)
        for (int k = 0; k < count && plan->known[i].state >= 0; k++)
            if (term[k].slot == plan->slot[plan->known[i].state][plan->known[i].variable]) {
                check->target = term[k].variable;
                check->target_state = term[k].state;
            }
}

/* How far a relation is from being implied: its balance along each direction, and the largest of them. */
static int unbalanced(const struct slopes *slopes, const struct relation_term *term, const double *slope, int count,
                      double *balance)
{
    int pivot = 0;
    for (int d = 0; d < slopes->directions; d++) {
        balance[d] = 0;
        for (int k = 0; k < count; k++)
            balance[d] += slope[k] * slopes->by_slot[term[k].slot][d];
        pivot = fabs(balance[d]) > fabs(balance[pivot]) ? d : pivot;
    }
    return slopes->directions > 0 && fabs(balance[pivot]) > 1e-7 ? pivot : -1;
}

/* How many of the variables were not given; -1: one is not even found. */
static int derived_count(const struct gas_plan *plan, const struct slopes *slopes, const struct relation_term *term,
                         int count)
{
    int derived = 0;
    for (int k = 0; k < count; k++) {
        if (!plan->found[term[k].slot])
            return -1;
        derived += !slopes->given[term[k].slot];
    }
    return count > 0 ? derived : -1;
}

enum { ANY = -1 };

/* Accept the relation as a check if it is one and exactly `derived` of its variables were not given; ANY: only ask.
 * Returned: is it a check. */
static bool consider(struct gas_plan *plan, struct slopes *slopes, int derived, struct gas_step check)
{
    struct relation_term term[2 * RELATION_FACTORS];
    double slope[2 * RELATION_FACTORS], balance[DIRECTIONS];
    int count = relation_slopes(plan, &check, term, slope);
    int own = derived_count(plan, slopes, term, count);
    if (own < 0 || (derived != ANY && own != derived))
        return false;
    int pivot = unbalanced(slopes, term, slope, count, balance);
    if (pivot < 0)
        return false;
    if (derived != ANY) {
        doubt(plan, term, count, &check);
        plan->check[plan->check_count++] = check;
        spend_direction(plan, slopes, balance, pivot);
    }
    return true;
}

static bool consider_all(struct gas_plan *plan, struct slopes *slopes, int derived)
{
    int states = plan->unnumbered ? 1 : plan->states;
    bool any = false;
    for (int relation = 0; relation < RELATIONS; relation++)
        for (int a = 1; a <= states; a++) {
            struct gas_step check = {(unsigned char)relation, (unsigned char)a, 0, 0, 0};
            if (!gas_relations[relation].pair)
                any |= consider(plan, slopes, derived, check);
            for (int b = a + 1; gas_relations[relation].pair && b <= states; b++) {
                check.state_b = (unsigned char)b;
                any |= consider(plan, slopes, derived, check);
            }
        }
    return any;
}

/* Relations between given figures alone come first: they read best and carry the least rounding. */
void gas_plan_add_checks(struct gas_plan *plan)
{
    struct slopes slopes;
    plan->check_count = 0;
    start_slopes(plan, &slopes);
    follow_steps(plan, &slopes);
    if (!consider_all(plan, &slopes, ANY))
        return;
    for (int derived = 0; derived <= 2 * RELATION_FACTORS && slopes.directions > 0; derived++)
        consider_all(plan, &slopes, derived);
}
