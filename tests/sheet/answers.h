/* answers.h - rows of formulas: a figure or a sentence in one cell of the answer. */
#ifndef TESTS_ANSWERS_H
#define TESTS_ANSWERS_H

#include <string.h>

#include "check.h"
#include "formula.h"

struct figure_row {
    const char *id, *formula;
    size_t row, column; /* of the answer, from 0 */
    double expected, relative, absolute;
};

struct sentence_row {
    const char *id, *formula;
    size_t row, column;
    const char *sentence; /* starting with "...": a part of it */
};

static inline const struct gas_cell *answer_of(const char *id, const char *formula, size_t row, size_t column,
                                               struct gas_arena *arena)
{
    struct gas_block value;
    if (!check_true(id, formula_evaluate(formula, arena, &value)))
        return NULL;
    bool there = row < value.rows && column < value.columns;
    if (!there)
        check_text(id, value.cell->kind == GAS_CELL_TEXT ? value.cell->text : "", "an answer of that size");
    return there ? gas_cell_at(&value, row, column) : NULL;
}

static inline void check_figures(const struct figure_row *rows, size_t count)
{
    struct gas_arena arena = {0};
    for (size_t i = 0; i < count; i++) {
        const struct gas_cell *cell = answer_of(rows[i].id, rows[i].formula, rows[i].row, rows[i].column, &arena);
        if (cell && cell->kind == GAS_CELL_NUMBER)
            check_close(rows[i].id, cell->number, rows[i].expected, rows[i].relative, rows[i].absolute);
        else if (cell)
            check_text(rows[i].id, cell->text ? cell->text : "#N/A", "a number");
        gas_arena_reset(&arena);
    }
    gas_arena_free(&arena);
}

static inline void check_sentences(const struct sentence_row *rows, size_t count)
{
    struct gas_arena arena = {0};
    for (size_t i = 0; i < count; i++) {
        const struct gas_cell *cell = answer_of(rows[i].id, rows[i].formula, rows[i].row, rows[i].column, &arena);
        bool part = strncmp(rows[i].sentence, "...", 3) == 0;
        if (cell && check_true(rows[i].id, cell->kind == GAS_CELL_TEXT) && part)
            check_contains(rows[i].id, cell->text, rows[i].sentence + 3);
        else if (cell && cell->kind == GAS_CELL_TEXT)
            check_text(rows[i].id, cell->text, rows[i].sentence);
        gas_arena_reset(&arena);
    }
    gas_arena_free(&arena);
}

#endif
