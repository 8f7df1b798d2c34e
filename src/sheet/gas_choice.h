/*
 * gas_choice.h - the first argument of most functions: a name, a mixture, a card, any of them with a rule after '|'.
 *
 * A choice is built once per text or range content and cached (bounded). It does not change afterwards and is counted,
 * so a choice in use outlives its place in the cache and several documents can share it.
 */
#ifndef SHEET_GAS_CHOICE_H
#define SHEET_GAS_CHOICE_H

#include <gasleaf/gas.h>
#include <gasleaf/species.h>

#include "sheet/cell.h"
#include "sheet/sentence.h"

struct gas_part {
    const struct gas_species *species; /* NULL for a part whose heat capacity came from a card */
    const char *label;
    double x;          /* mole fraction, adds to 1 */
    double molar_mass; /* kg/mol */
};

struct gas_choice {
    struct gas gas;    /* ready to compute with; owned by the choice */
    const char *label; /* "nitrogen", "79 % nitrogen + 21 % oxygen", a card's name: for sentences */
    const char *rule;  /* the words after '|' as understood: "cp = 1.04 kJ/kg-K"; "" without */
    size_t part_count; /* 1 for a species; parts of nested mixtures are merged */
    const struct gas_part *part;
    const char *source;     /* where the heat capacity comes from, in words */
    const char *source_key; /* its key in the table of sources; "" when it was given with the gas */
};

/* gas_choose - NULL after a refusal. Give every choice back with gas_choice_release. */
const struct gas_choice *gas_choose(const struct gas_block *argument, struct gas_refusal *refusal);
const struct gas_choice *gas_choose_text(const char *text, size_t length, struct gas_refusal *refusal);
void gas_choice_release(const struct gas_choice *choice);

#endif
