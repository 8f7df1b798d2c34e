#include "relations.h"

/* clang-format off */
#define IS(variable)       (1u << GAS_VAR_##variable)
#define UP(variable)       {GAS_VAR_##variable, 1}
#define DOWN(variable)     {GAS_VAR_##variable, -1}
#define TO(variable, text) [GAS_VAR_##variable] = text

/* kind | between two states | factors | exponents of R, M | firm | fragile | as written | solved for each */
const struct relation gas_relations[RELATIONS] = {
    [RELATION_PV_NRT] = {RELATION_PRODUCT, false, 4, {UP(P), UP(V), DOWN(N), DOWN(T)}, -1, 0,
        IS(P) | IS(V) | IS(N) | IS(T), 0, "P V = n R T",
        {TO(P, "P = n R T / V"), TO(V, "V = n R T / P"), TO(N, "n = P V / (R T)"), TO(T, "T = P V / (n R)")}},
    [RELATION_MASS] = {RELATION_PRODUCT, false, 2, {UP(MASS), DOWN(N)}, 0, -1,
        IS(MASS) | IS(N), 0, "m = n M",
        {TO(MASS, "m = n M"), TO(N, "n = m / M")}},
    [RELATION_PV_RT] = {RELATION_PRODUCT, false, 3, {UP(P), UP(V_MOLAR), DOWN(T)}, -1, 0,
        IS(P) | IS(V_MOLAR) | IS(T), 0, "P v = R T",
        {TO(P, "P = R T / v"), TO(V_MOLAR, "v = R T / P"), TO(T, "T = P v / R")}},
    [RELATION_V_NV] = {RELATION_PRODUCT, false, 3, {UP(V), DOWN(N), DOWN(V_MOLAR)}, 0, 0,
        IS(V) | IS(N) | IS(V_MOLAR), 0, "V = n v",
        {TO(V, "V = n v"), TO(N, "n = V / v"), TO(V_MOLAR, "v = V / n")}},
    [RELATION_RHO_STATE] = {RELATION_PRODUCT, false, 3, {UP(P), DOWN(RHO), DOWN(T)}, -1, 1,
        IS(P) | IS(RHO) | IS(T), 0, "P M = rho R T",
        {TO(P, "P = rho R T / M"), TO(RHO, "rho = P M / (R T)"), TO(T, "T = P M / (rho R)")}},
    [RELATION_M_RHO_V] = {RELATION_PRODUCT, false, 3, {UP(MASS), DOWN(RHO), DOWN(V)}, 0, 0,
        IS(MASS) | IS(RHO) | IS(V), 0, "m = rho V",
        {TO(MASS, "m = rho V"), TO(RHO, "rho = m / V"), TO(V, "V = m / rho")}},
    [RELATION_V_M_V] = {RELATION_PRODUCT, false, 3, {UP(V), DOWN(MASS), DOWN(V_MASS)}, 0, 0,
        IS(V) | IS(MASS) | IS(V_MASS), 0, "V = m v",
        {TO(V, "V = m v"), TO(MASS, "m = V / v"), TO(V_MASS, "v = V / m")}},
    [RELATION_RHO_V_MASS] = {RELATION_PRODUCT, false, 2, {UP(RHO), UP(V_MASS)}, 0, 0,
        IS(RHO) | IS(V_MASS), 0, "rho v = 1",
        {TO(RHO, "rho = 1 / v"), TO(V_MASS, "v = 1 / rho")}},
    [RELATION_PV_MASS] = {RELATION_PRODUCT, false, 3, {UP(P), UP(V_MASS), DOWN(T)}, -1, 1,
        IS(P) | IS(V_MASS) | IS(T), 0, "P v M = R T",
        {TO(P, "P = R T / (v M)"), TO(V_MASS, "v = R T / (P M)"), TO(T, "T = P v M / R")}},
    [RELATION_RHO_V_MOLAR] = {RELATION_PRODUCT, false, 2, {UP(RHO), UP(V_MOLAR)}, 0, -1,
        IS(RHO) | IS(V_MOLAR), 0, "rho v = M",
        {TO(RHO, "rho = M / v"), TO(V_MOLAR, "v = M / rho")}},
    [RELATION_V_BASES] = {RELATION_PRODUCT, false, 2, {UP(V_MOLAR), DOWN(V_MASS)}, 0, -1,
        IS(V_MOLAR) | IS(V_MASS), 0, "v [m3/mol] = v [m3/kg] M",
        {TO(V_MOLAR, "v [m3/mol] = v [m3/kg] M"), TO(V_MASS, "v [m3/kg] = v [m3/mol] / M")}},
    [RELATION_C_V] = {RELATION_PRODUCT, false, 2, {UP(C), UP(V_MOLAR)}, 0, 0,
        IS(C) | IS(V_MOLAR), 0, "c v = 1",
        {TO(C, "c = 1 / v"), TO(V_MOLAR, "v = 1 / c")}},
    [RELATION_P_C] = {RELATION_PRODUCT, false, 3, {UP(P), DOWN(C), DOWN(T)}, -1, 0,
        IS(P) | IS(C) | IS(T), 0, "P = c R T",
        {TO(P, "P = c R T"), TO(C, "c = P / (R T)"), TO(T, "T = P / (c R)")}},
    [RELATION_N_C] = {RELATION_PRODUCT, false, 3, {UP(N), DOWN(C), DOWN(V)}, 0, 0,
        IS(N) | IS(C) | IS(V), 0, "n = c V",
        {TO(N, "n = c V"), TO(C, "c = n / V"), TO(V, "V = n / c")}},
    [RELATION_RHO_C] = {RELATION_PRODUCT, false, 2, {UP(RHO), DOWN(C)}, 0, -1,
        IS(RHO) | IS(C), 0, "rho = c M",
        {TO(RHO, "rho = c M"), TO(C, "c = rho / M")}},
    [RELATION_H_BASES] = {RELATION_PRODUCT, false, 2, {UP(H_MOLAR), DOWN(H_MASS)}, 0, -1,
        IS(H_MOLAR) | IS(H_MASS), 0, "h [J/mol] = h [J/kg] M",
        {TO(H_MOLAR, "h [J/mol] = h [J/kg] M"), TO(H_MASS, "h [J/kg] = h [J/mol] / M")}},
    [RELATION_U_BASES] = {RELATION_PRODUCT, false, 2, {UP(U_MOLAR), DOWN(U_MASS)}, 0, -1,
        IS(U_MOLAR) | IS(U_MASS), 0, "u [J/mol] = u [J/kg] M",
        {TO(U_MOLAR, "u [J/mol] = u [J/kg] M"), TO(U_MASS, "u [J/kg] = u [J/mol] / M")}},
    [RELATION_S_BASES] = {RELATION_PRODUCT, false, 2, {UP(S_MOLAR), DOWN(S_MASS)}, 0, -1,
        IS(S_MOLAR) | IS(S_MASS), 0, "s [J/(mol K)] = s [J/(kg K)] M",
        {TO(S_MOLAR, "s [J/(mol K)] = s [J/(kg K)] M"), TO(S_MASS, "s [J/(kg K)] = s [J/(mol K)] / M")}},
    [RELATION_H_TOTAL] = {RELATION_PRODUCT, false, 3, {UP(H_TOTAL), DOWN(N), DOWN(H_MOLAR)}, 0, 0,
        IS(H_TOTAL) | IS(H_MOLAR), IS(N), "H = n h",
        {TO(H_TOTAL, "H = n h"), TO(H_MOLAR, "h = H / n"), TO(N, "n = H / h")}},
    [RELATION_U_TOTAL] = {RELATION_PRODUCT, false, 3, {UP(U_TOTAL), DOWN(N), DOWN(U_MOLAR)}, 0, 0,
        IS(U_TOTAL) | IS(U_MOLAR), IS(N), "U = n u",
        {TO(U_TOTAL, "U = n u"), TO(U_MOLAR, "u = U / n"), TO(N, "n = U / u")}},
    [RELATION_S_TOTAL] = {RELATION_PRODUCT, false, 3, {UP(S_TOTAL), DOWN(N), DOWN(S_MOLAR)}, 0, 0,
        IS(S_TOTAL) | IS(S_MOLAR), IS(N), "S = n s",
        {TO(S_TOTAL, "S = n s"), TO(S_MOLAR, "s = S / n"), TO(N, "n = S / s")}},
    [RELATION_H_TOTAL_MASS] = {RELATION_PRODUCT, false, 3, {UP(H_TOTAL), DOWN(MASS), DOWN(H_MASS)}, 0, 0,
        IS(H_TOTAL) | IS(H_MASS), IS(MASS), "H = m h",
        {TO(H_TOTAL, "H = m h"), TO(H_MASS, "h = H / m"), TO(MASS, "m = H / h")}},
    [RELATION_U_TOTAL_MASS] = {RELATION_PRODUCT, false, 3, {UP(U_TOTAL), DOWN(MASS), DOWN(U_MASS)}, 0, 0,
        IS(U_TOTAL) | IS(U_MASS), IS(MASS), "U = m u",
        {TO(U_TOTAL, "U = m u"), TO(U_MASS, "u = U / m"), TO(MASS, "m = U / u")}},
    [RELATION_S_TOTAL_MASS] = {RELATION_PRODUCT, false, 3, {UP(S_TOTAL), DOWN(MASS), DOWN(S_MASS)}, 0, 0,
        IS(S_TOTAL) | IS(S_MASS), IS(MASS), "S = m s",
        {TO(S_TOTAL, "S = m s"), TO(S_MASS, "s = S / m"), TO(MASS, "m = S / s")}},
    [RELATION_U_FROM_H] = {RELATION_ADDITIVE, false, 3, {UP(U_MOLAR), DOWN(H_MOLAR), DOWN(T)}, 0, 0,
        IS(U_MOLAR) | IS(H_MOLAR), 0, "u = h - R T",
        {TO(U_MOLAR, "u = h - R T"), TO(H_MOLAR, "h = u + R T")}},
    [RELATION_U_TOTAL_FROM_H] = {RELATION_ADDITIVE, false, 4, {UP(U_TOTAL), DOWN(H_TOTAL), DOWN(P), DOWN(V)}, 0, 0,
        IS(U_TOTAL) | IS(H_TOTAL), IS(P) | IS(V), "U = H - P V",
        {TO(U_TOTAL, "U = H - P V"), TO(H_TOTAL, "H = U + P V"), TO(P, "P = (H - U) / V"), TO(V, "V = (H - U) / P")}},
    [RELATION_H_OF_T] = {RELATION_FUNCTION, false, 2, {UP(H_MOLAR), DOWN(T)}, 0, 0,
        IS(H_MOLAR) | IS(T), 0, "h = integral of cp dT from T0 to T",
        {TO(H_MOLAR, "h = integral of cp dT from T0 to T"), TO(T, "T from h = integral of cp dT from T0 to T")}},
    [RELATION_U_OF_T] = {RELATION_FUNCTION, false, 2, {UP(U_MOLAR), DOWN(T)}, 0, 0,
        IS(T), 0, "u = integral of cv dT from T0 to T - R T0",
        {TO(T, "T from u = integral of cv dT from T0 to T - R T0")}},
    [RELATION_S_OF_T_P] = {RELATION_FUNCTION, false, 3, {UP(S_MOLAR), DOWN(T), DOWN(P)}, 0, 0,
        IS(S_MOLAR) | IS(T) | IS(P), 0, "s = integral of cp dlnT from T0 to T - R ln(P/P0)",
        {TO(S_MOLAR, "s = integral of cp dlnT from T0 to T - R ln(P/P0)"),
         TO(T, "T from s = integral of cp dlnT from T0 to T - R ln(P/P0)"),
         TO(P, "P = P0 exp((integral of cp dlnT from T0 to T - s)/R)")}},
    [RELATION_S_OF_T_V] = {RELATION_FUNCTION, false, 3, {UP(S_MOLAR), DOWN(T), DOWN(V_MOLAR)}, 0, 0,
        IS(T), 0, "s = integral of cv dlnT from T0 to T + R ln(v P0/(R T0))",
        {TO(T, "T from s = integral of cv dlnT from T0 to T + R ln(v P0/(R T0))")}},
    [RELATION_CLOSED] = {RELATION_PRODUCT, true, 4, {UP(P), UP(V), DOWN(N), DOWN(T)}, 0, 0,
        IS(P) | IS(V) | IS(N) | IS(T), 0, "P1 V1 / (n1 T1) = P2 V2 / (n2 T2)",
        {TO(P, "P2 = P1 V1 n2 T2 / (V2 n1 T1)"), TO(V, "V2 = P1 V1 n2 T2 / (P2 n1 T1)"),
         TO(N, "n2 = n1 P2 V2 T1 / (P1 V1 T2)"), TO(T, "T2 = P2 V2 n1 T1 / (P1 V1 n2)")}},
    [RELATION_CLOSED_V] = {RELATION_PRODUCT, true, 3, {UP(V), DOWN(N), DOWN(V_MOLAR)}, 0, 0,
        IS(V) | IS(N) | IS(V_MOLAR), 0, "V1 / (n1 v1) = V2 / (n2 v2)",
        {TO(V, "V2 = V1 n2 v2 / (n1 v1)"), TO(N, "n2 = n1 V2 v1 / (V1 v2)"), TO(V_MOLAR, "v2 = v1 V2 n1 / (V1 n2)")}},
};
/* clang-format on */

int gas_relation_terms(const struct gas_plan *plan, int relation, int state_a, int state_b,
                       struct relation_term term[2 * RELATION_FACTORS])
{
    const struct relation *row = &gas_relations[relation];
    int count = 0;
    for (int side = 0; side < (row->pair ? 2 : 1); side++) {
        int state = side == 0 ? state_a : state_b;
        for (int i = 0; i < row->count; i++) {
            unsigned char variable = row->factor[i].variable;
            if (row->pair && plan->shared[variable])
                continue;
            term[count++] = (struct relation_term){plan->slot[state][variable], variable,
                                                   plan->shared[variable] ? 0 : (unsigned char)state,
                                                   side == 0 ? row->factor[i].exponent : -row->factor[i].exponent};
        }
    }
    return count;
}

bool gas_variable_positive(enum gas_variable variable)
{
    return variable <= GAS_VAR_C;
}

const char *gas_variable_symbol(enum gas_variable variable)
{
    static const char *const symbols[GAS_VARIABLES] = {
#define SYMBOL(name, symbol, unit) symbol,
        GAS_VARIABLE_LIST(SYMBOL)
#undef SYMBOL
    };
    return (unsigned)variable < GAS_VARIABLES ? symbols[variable] : "";
}

const char *gas_variable_unit(enum gas_variable variable)
{
    static const char *const units[GAS_VARIABLES] = {
#define UNIT(name, symbol, unit) unit,
        GAS_VARIABLE_LIST(UNIT)
#undef UNIT
    };
    return (unsigned)variable < GAS_VARIABLES ? units[variable] : "";
}
