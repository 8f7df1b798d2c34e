/*
 * item.h - one item of a typed `given`, with the forms that are more than a heading and a figure.
 *
 * "7 bar(g)" · "P1 = 1 bar" · "T constant", "V = constant", "isothermal" (the same in every state, figure unknown) ·
 * "P1 = 7 ± 0.05 bar(g)" (a figure and its plus-minus)
 */
#ifndef SHEET_ITEM_H
#define SHEET_ITEM_H

#include <gasleaf/heading.h>

#include "sheet/sentence.h"

struct gas_item {
    size_t count;                  /* headings: 2 with a plus-minus */
    struct gas_heading heading[2]; /* of a constant: state GAS_CONSTANT */
    double figure[2];              /* NAN of a constant */
};

/* gas_item_read - what: the argument the item stands in, for the sentence. */
bool gas_item_read(const char *text, size_t length, const struct gas_references *references, const char *what,
                   struct gas_item *item, struct gas_refusal *refusal);

/* gas_word_constant - "constant" or "const", alone. */
bool gas_word_constant(const char *text, size_t length);

#endif
