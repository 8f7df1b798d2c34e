/*
 * formula.h - evaluates a typed formula of nothing but literals and our own functions, as the examples of the catalogue
 * are: numbers, texts in double quotes ("" is one quote), inline arrays {1;2|3;4} (`;` between columns, `|` between
 * rows), nested calls with `;` between arguments, empty arguments for omitted ones.
 */
#ifndef TESTS_FORMULA_H
#define TESTS_FORMULA_H

#include "sheet/catalogue.h"

/* Evaluates into the arena; false when the formula cannot be read (also when a function is not in the catalogue). */
bool formula_evaluate(const char *formula, struct gas_arena *arena, struct gas_block *value);

#endif
