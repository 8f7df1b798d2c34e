/*
 * cp_build.h - one temperature interval of a heat capacity while it is put together from typed constants. (internal)
 *
 * Figures arrive in J/(mol K) times powers of a printed temperature x, T = scale (x + offset): K, degC, degR, degF or
 * any of them in thousands. Polynomials in a shifted x are expanded into powers of T.
 */
#ifndef SHEET_CP_BUILD_H
#define SHEET_CP_BUILD_H

#include <gasleaf/gas.h>

#include "sheet/gas_draft.h"

enum { GAS_CP_TERMS = 32 };

struct gas_T_unit {
    double scale, offset;  /* K = scale (x + offset) */
    struct gas_unit level; /* K, degC, ...: the same without the thousands, for a range */
    char text[24];
};
extern const struct gas_T_unit gas_T_kelvin;

/* gas_T_unit_read - "K", "T in degC", "T/1000", "degR/1000", "kK". */
bool gas_T_unit_read(struct gas_piece text, struct gas_T_unit *unit, struct gas_refusal *refusal);

struct gas_cp_build {
    double power[GAS_POWERS];
    struct gas_term term[GAS_CP_TERMS];
    size_t terms;
    struct gas_refusal *refusal;
};

/* factor x^exponent; false (and a sentence) where a shifted x has a power that is not whole or below zero. */
bool gas_cp_add_power(struct gas_cp_build *build, double factor, double exponent, const struct gas_T_unit *unit);

/* One of the further terms of gas.h, its scale in K. */
bool gas_cp_add_term(struct gas_cp_build *build, enum gas_term_kind kind, double factor, double scale, double exponent);

/* gas_cp_finish - the interval, its terms copied into the draft's arena. */
bool gas_cp_finish(const struct gas_cp_build *build, double T_from, double T_to, struct gas_draft *draft,
                   struct gas_interval *interval);

/* How a printed cp is brought to J/(mol K): a factor, from its unit text. "R" and "-" mean cp/R. */
struct gas_cp_unit {
    double factor;   /* J/(mol K) per printed unit; of a unit per mass still to be multiplied by M */
    bool per_mass;   /* J/(kg K) */
    bool over_R;     /* factor is 1, still to be multiplied by R */
    bool enthalpy;   /* J/mol or J/kg: of an enthalpy polynomial */
    bool per_degree; /* per degC, degF or degR: T in the formula may be in them too, so it has to be said */
};
bool gas_cp_unit_read(struct gas_piece text, struct gas_cp_unit *unit, struct gas_refusal *refusal);
/* Is it the text of a cp (or enthalpy) unit at all? */
bool gas_cp_unit_known(struct gas_piece text, struct gas_cp_unit *unit);
/* J/(mol K) per printed unit; refuses a unit per mass without a molar mass. */
bool gas_cp_unit_factor(const struct gas_cp_unit *unit, double R, double molar_mass, double *factor,
                        struct gas_refusal *refusal);

#endif
