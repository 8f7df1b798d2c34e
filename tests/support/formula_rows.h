/*
 * formula_rows.h - rows of a formula and what its first cell must be.
 */
#ifndef TESTS_FORMULA_ROWS_H
#define TESTS_FORMULA_ROWS_H

#include <stddef.h>

struct formula_row {
    const char *id, *formula;
    double expected;
    const char *part; /* of a text; NULL: the answer is the figure */
};

void check_formula_rows(const struct formula_row *rows, size_t count, double relative);

#endif
