/*
 * gas.h - what the calculations know of a gas: numbers only. (layer: core)
 *
 * A gas is a molar mass and a heat capacity cp(T) in closed form: one or more temperature intervals, each a sum of
 * terms whose integrals are elementary. A mixture, a handbook card and a written formula are all brought to this one
 * shape, so nothing that computes with a gas needs to know where it came from.
 */
#ifndef GASLEAF_GAS_H
#define GASLEAF_GAS_H

#include <stddef.h>

#define GAS_R 8.31446261815324 /* J/(mol K), exact: k NA of the SI of 2019 (BIPM SI Brochure, 9th ed.) */

/* The dense powers of T in an interval: power[i] multiplies T^(i + GAS_POWER_LOWEST). */
enum { GAS_POWER_LOWEST = -2, GAS_POWERS = 7 };

/* Further terms of cp, in J/(mol K), x = scale / T:
 *   GAS_TERM_POWER    factor T^exponent                        any real exponent
 *   GAS_TERM_SINH     factor (x / sinh x)^2                    Aly-Lee; Planck-Einstein with scale = theta/2
 *   GAS_TERM_COSH     factor (x / cosh x)^2                    Aly-Lee
 *   GAS_TERM_RATIO    factor (T / (T + scale))^exponent        Wilhoit; exponent a whole number >= 0
 */
enum gas_term_kind { GAS_TERM_POWER, GAS_TERM_SINH, GAS_TERM_COSH, GAS_TERM_RATIO };

struct gas_term {
    enum gas_term_kind kind;
    double factor;   /* J/(mol K), or J/(mol K^(1 + exponent)) for GAS_TERM_POWER */
    double scale;    /* K */
    double exponent; /* - */
};

struct gas_interval {
    double T_from, T_to;      /* K; T_to of one interval is T_from of the next; T_to may be INFINITY */
    double power[GAS_POWERS]; /* J/(mol K^(1 + i + GAS_POWER_LOWEST)) */
    size_t term_count;        /* 0 for most gases */
    const struct gas_term *term;
};

/* How a change between two temperatures uses cp: integrated, or the short cuts of hand calculations. */
enum gas_cp_rule {
    GAS_CP_INTEGRATED,   /* cp varies with T: the integral */
    GAS_CP_MEAN_OF_ENDS, /* (cp(T1) + cp(T2))/2, taken as constant between T1 and T2 */
    GAS_CP_AT_MEAN       /* cp((T1 + T2)/2), taken as constant between T1 and T2 */
};

struct gas {
    double R;          /* J/(mol K); GAS_R except where an old constant is replayed */
    double molar_mass; /* kg/mol */
    enum gas_cp_rule rule;
    size_t interval_count; /* 0: no heat capacity known, only P, V, T questions can be answered */
    const struct gas_interval *interval;
};

#endif
