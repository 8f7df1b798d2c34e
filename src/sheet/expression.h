/*
 * expression.h - a written heat-capacity formula brought to a sum of powers of T.
 *
 * Reads + - * / ^, numbers (decimal point or comma), T, parentheses and the multiplication that is left out
 * ("3.77e-3 T", "2 (T/1000)^2", "C T^2"). Products are expanded, whole powers of sums too; a division is by one term.
 * What cannot be a finite sum of powers of T is refused in words. Depth and size are bounded.
 */
#ifndef SHEET_EXPRESSION_H
#define SHEET_EXPRESSION_H

#include "sheet/piece.h"
#include "sheet/sentence.h"

enum { GAS_SUM_TERMS = 24 };

struct gas_sum_term {
    double factor, exponent; /* factor T^exponent */
};

struct gas_sum {
    size_t count;
    struct gas_sum_term term[GAS_SUM_TERMS]; /* exponents differ, no factor is 0 */
};

/* A constant that a formula may call by its letter, such as the A of a card. */
struct gas_letter {
    const char *name;
    double value;
};

/*
 * gas_expression_read - the formula at the front of a text.
 *
 *   Given      letter[letters]  constants with names; none for a formula written with figures
 *   Returned   true, *sum, and *used: where the formula ends (a unit may follow), behind any spaces
 *   Notes      "1/2 T" is refused, since it can be read in two ways.
 */
bool gas_expression_read(struct gas_piece text, const struct gas_letter *letter, size_t letters, struct gas_sum *sum,
                         size_t *used, struct gas_refusal *refusal);

#endif
