/*
 * gas_card.h - a gas card while it is being read: label | value | unit, further intervals in further value columns.
 * (internal)
 *
 * gas_card_label.c tells what a label means, gas_card_read.c collects the rows, gas_card.c makes the gas,
 * card_forms.c holds THE table of heat-capacity forms and card_constant.c brings their constants to SI.
 */
#ifndef SHEET_GAS_CARD_H
#define SHEET_GAS_CARD_H

#include "sheet/cp_build.h"
#include "sheet/gas_draft.h"
#include "sheet/gas_mixture.h"

enum { GAS_CARD_INTERVALS = 8, GAS_CARD_CONSTANTS = 48, GAS_CARD_LABEL = 40 };

enum gas_card_item {
    GAS_CARD_UNKNOWN,
    GAS_CARD_NAME,
    GAS_CARD_FORMULA,
    GAS_CARD_CAS,
    GAS_CARD_M,
    GAS_CARD_FORM,
    GAS_CARD_CP_UNIT,
    GAS_CARD_T_UNIT,
    GAS_CARD_FROM,
    GAS_CARD_TO,
    GAS_CARD_RANGE,
    GAS_CARD_R,
    GAS_CARD_R_OF_FIT,
    GAS_CARD_CP,
    GAS_CARD_K,
    GAS_CARD_RULE,
    GAS_CARD_SOURCE,
    GAS_CARD_CP_AT_25,  /* printed by GAS.CARD: compared with what the card gives */
    GAS_CARD_MOLE_PART, /* "x methane" */
    GAS_CARD_MASS_PART, /* "w methane" */
    GAS_CARD_REMARK,    /* a heading row, a note, a figure of GAS.CARD that follows from others: read over */
    GAS_CARD_CONSTANT
};

struct gas_card_label {
    enum gas_card_item item;
    char constant[GAS_CARD_LABEL]; /* folded: "a", "b1", "theta2"; as written for a written form: see `letter` */
    char letter[GAS_CARD_LABEL];
    double factor;         /* value times this is the constant: 1e-3 under "10^3 B" */
    struct gas_piece unit; /* in the label itself: "M, g/mol" */
    struct gas_piece part; /* the component in "x methane" */
};

struct gas_card_label gas_card_label_read(struct gas_piece text);

struct gas_constant {
    struct gas_card_label label;
    double value[GAS_CARD_INTERVALS]; /* NAN: blank */
    struct gas_piece unit;
    bool used;
};

struct gas_card {
    struct gas_refusal *refusal;
    unsigned seen; /* items that stand there once: a bit each */
    struct gas_piece name, formula, cas, form, rule, source;
    struct gas_recipe by_mole, by_mass; /* the composition, where it has one */
    struct gas_piece cp, cp_text_unit;  /* a row cp: figure or formula */
    double cp_value, k;                 /* NAN: none */
    double cp_at_25;                    /* as printed; NAN: none */
    struct gas_piece cp_at_25_unit;
    double M, R, R_specific, R_of_fit; /* SI; 0: none */
    bool cp_unit_said, T_unit_said;
    struct gas_cp_unit cp_unit;
    struct gas_T_unit T_unit;
    struct gas_piece unit_of_form;
    double from[GAS_CARD_INTERVALS], to[GAS_CARD_INTERVALS]; /* as written, NAN: blank */
    struct gas_piece from_unit, to_unit;
    struct gas_piece range;
    size_t intervals; /* value columns in use, at least 1 */
    size_t constants;
    struct gas_constant constant[GAS_CARD_CONSTANTS];
};

/* gas_card_read.c */
bool gas_card_read(struct gas_card *card, const struct gas_block *block);

/* A form of printed heat-capacity equations. */
struct gas_form_case;
typedef bool gas_form_builder(struct gas_form_case *form_case);

struct gas_power_letter {
    const char *letter; /* folded */
    double exponent;    /* of T */
    bool needed;
};

struct gas_form {
    const char *shown;                    /* in sentences */
    const char *names;                    /* folded, separated by '|' */
    const char *equation;                 /* as printed, for sentences */
    const char *spare;                    /* constants of the same printed set that cp does not need: b1, b2 */
    const struct gas_power_letter *power; /* of a sum of powers; ends with {0} */
    gas_form_builder *build;              /* of any other */
    bool over_R;                          /* the constants are those of cp/R unless the card says otherwise */
    bool thousands;                       /* T/1000 is meant by the form itself */
    double R_of_fit;                      /* R that cp/R was fitted with, 0: the exact one */
};

const struct gas_form *gas_forms(size_t *count);
const struct gas_form *gas_form_find(struct gas_piece text);

/* One interval of a card being brought to the shape of gas.h. */
struct gas_form_case {
    struct gas_card *card;
    const struct gas_form *form;
    size_t interval;
    double R, molar_mass; /* for units over R, per mass */
    struct gas_T_unit T_unit;
    struct gas_cp_build build;
};

/* card_constant.c: constants by their letters; index: their place among the letters of the form, for C1, C2, ...
 * Each needed one that is missing is refused by its letter. */
struct gas_constant *gas_constant_find(const struct gas_form_case *form_case, const char *letter, size_t index);
bool gas_constant_number(struct gas_form_case *form_case, const char *letter, size_t index, bool needed, double *value);
bool gas_constant_cp(struct gas_form_case *form_case, const char *letter, size_t index, bool needed, double *J_mol_K);
bool gas_constant_K(struct gas_form_case *form_case, const char *letter, size_t index, bool needed, double *kelvin);
bool gas_constant_power(struct gas_form_case *form_case, const struct gas_power_letter *power, size_t index);
bool gas_refuse_constant(const struct gas_form_case *form_case, const char *letter);

#endif
