/*
 * state_truth.h - states of an ideal gas by plain arithmetic, for the tests of the solver.
 *
 * The gas has cp = a + b T, whose integrals are a (T - T0) + b (T^2 - T0^2)/2 and a ln(T/T0) + b (T - T0): nothing of
 * the library is used.
 */
#ifndef TESTS_CORE_STATE_TRUTH_H
#define TESTS_CORE_STATE_TRUTH_H

#include <math.h>

#include <gasleaf/state.h>

#define TRUTH_R  8.31446261815324 /* J/(mol K), SI Brochure, 9th ed. */
#define TRUTH_M  0.0280134        /* kg/mol, about that of nitrogen; any figure would do */
#define TRUTH_A  27.31            /* J/(mol K) */
#define TRUTH_B  5.23e-3          /* J/(mol K2) */
#define TRUTH_T0 298.15
#define TRUTH_P0 1e5

static const struct gas_interval truth_interval = {
    .T_from = 100, .T_to = 3000, .power = {[-GAS_POWER_LOWEST] = TRUTH_A, [1 - GAS_POWER_LOWEST] = TRUTH_B}};
static const struct gas truth_gas = {TRUTH_R, TRUTH_M, GAS_CP_INTEGRATED, 1, &truth_interval};

static inline double truth_h(double T)
{
    return TRUTH_A * (T - TRUTH_T0) + TRUTH_B * (T * T - TRUTH_T0 * TRUTH_T0) / 2;
}

static inline double truth_s(double T, double P)
{
    return TRUTH_A * log(T / TRUTH_T0) + TRUTH_B * (T - TRUTH_T0) - TRUTH_R * log(P / TRUTH_P0);
}

/* Every variable of the state P, T, n. */
static inline void truth_state(double P, double T, double n, double truth[GAS_VARIABLES])
{
    double v = TRUTH_R * T / P, h = truth_h(T), s = truth_s(T, P);
    double u = h - TRUTH_R * T, m = n * TRUTH_M;
    double all[GAS_VARIABLES] = {[GAS_VAR_P] = P,
                                 [GAS_VAR_T] = T,
                                 [GAS_VAR_V] = n * v,
                                 [GAS_VAR_N] = n,
                                 [GAS_VAR_MASS] = m,
                                 [GAS_VAR_V_MOLAR] = v,
                                 [GAS_VAR_V_MASS] = n * v / m,
                                 [GAS_VAR_RHO] = m / (n * v),
                                 [GAS_VAR_C] = P / (TRUTH_R * T),
                                 [GAS_VAR_H_MOLAR] = h,
                                 [GAS_VAR_U_MOLAR] = u,
                                 [GAS_VAR_S_MOLAR] = s,
                                 [GAS_VAR_H_MASS] = h / TRUTH_M,
                                 [GAS_VAR_U_MASS] = u / TRUTH_M,
                                 [GAS_VAR_S_MASS] = s / TRUTH_M,
                                 [GAS_VAR_H_TOTAL] = n * h,
                                 [GAS_VAR_U_TOTAL] = n * u,
                                 [GAS_VAR_S_TOTAL] = n * s};
    for (int i = 0; i < GAS_VARIABLES; i++)
        truth[i] = all[i];
}

/* A set of knowns with their true figures. */
struct question {
    struct gas_known known[GAS_SLOTS];
    double figures[GAS_SLOTS];
    size_t count;
};

static inline void ask(struct question *q, int variable, int state, double figure)
{
    q->known[q->count] = (struct gas_known){(enum gas_variable)variable, state};
    q->figures[q->count++] = figure;
}

static inline struct gas_result run(const struct gas_plan *plan, const struct question *q, struct gas_values *values)
{
    return gas_plan_run(plan, &truth_gas, NULL, 1e-3, q->figures, q->count, NULL, 0, values);
}

#endif
