/*
 * gas_facts.h - what is known of a chosen gas, line by line, each figure with its source. (internal)
 */
#ifndef SHEET_GAS_FACTS_H
#define SHEET_GAS_FACTS_H

#include "sheet/gas_choice.h"

enum { GAS_FACTS = 20, GAS_CITED = 8 };

struct gas_fact {
    const char *label;
    const char *names; /* folded, what it may be asked by, separated by '|' */
    const char *text;  /* NULL: a figure */
    double figure;     /* SI */
    enum gas_dimension dimension;
    const char *unit;   /* of the figure, as shown */
    const char *source; /* the key of a publication, or words */
    bool wide;          /* a text too long for the column of the figures */
};

struct gas_facts {
    size_t count;
    struct gas_fact fact[GAS_FACTS];
    size_t cited; /* the publications behind them, each once */
    const struct gas_source *citation[GAS_CITED];
};

/* gas_facts_of - unknown figures are left out. Texts belong to the choice and to the tables. */
void gas_facts_of(const struct gas_choice *choice, struct gas_facts *facts);

#endif
