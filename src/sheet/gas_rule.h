/*
 * gas_rule.h - the rules after '|', read and then applied. (internal)
 */
#ifndef SHEET_GAS_RULE_H
#define SHEET_GAS_RULE_H

#include "sheet/cp_build.h"
#include "sheet/expression.h"
#include "sheet/gas_draft.h"

#define GAS_R_TOLERANCE 0.01 /* of the exact R: the rounded constants of old sheets lie well inside */

enum gas_cp_source { GAS_CP_OF_THE_GAS, GAS_CP_FROM_FORMULA, GAS_CP_FROM_CV, GAS_CP_FROM_K };
enum gas_cp_mode { GAS_MODE_INTEGRATED, GAS_MODE_AT, GAS_MODE_MEAN, GAS_MODE_AT_MEAN };

struct gas_rules {
    struct gas_refusal *refusal;
    enum gas_cp_source source;
    struct gas_sum sum; /* of cp or cv, in `unit`, T in `T_unit` */
    struct gas_cp_unit unit;
    bool bare; /* no unit was written: J/(mol K) */
    struct gas_T_unit T_unit;
    bool T_said;
    double k;
    enum gas_cp_mode mode;
    double T_at; /* in T_at_unit */
    struct gas_unit T_at_unit;
    bool range_said;
    double T_from, T_to; /* K */
    bool M_said, R_said;
    double M, R, R_specific; /* kg/mol, J/(mol K), J/(kg K); 0: not given */
};

bool gas_rules_read(struct gas_rules *rules, struct gas_piece text);
bool gas_rules_apply(const struct gas_rules *rules, struct gas_draft *draft);

/* "298 to 2000 K", "from 25 degC to 1000 degC", "298-2000 K". */
bool gas_rules_range(struct gas_rules *rules, struct gas_piece text);
bool gas_T_range_read(struct gas_piece text, const struct gas_unit *bare, double *T_from, double *T_to,
                      struct gas_refusal *refusal);

/* A molar mass and a gas constant with their units as typed (unit->text "": none); refuse what cannot be one. */
bool gas_molar_mass_read(double figure, const struct gas_unit *unit, double *M, struct gas_refusal *refusal);
bool gas_constant_read(double figure, const struct gas_unit *unit, double *universal, double *specific,
                       struct gas_refusal *refusal);
/* M and R of the draft from what was given; 0: not given. */
bool gas_constants_apply(struct gas_draft *draft, double M, double universal, double specific);

#endif
