#include "formula_rows.h"

#include <math.h>

#include "check.h"
#include "formula.h"

static void check_row(const struct formula_row *row, const struct gas_cell *cell, double relative)
{
    if (row->part)
        check_contains(row->id, cell->kind == GAS_CELL_TEXT ? cell->text : "a number", row->part);
    else if (cell->kind == GAS_CELL_TEXT)
        check_text(row->id, cell->text, "a number");
    else
        check_close(row->id, cell->kind == GAS_CELL_NUMBER ? cell->number : (double)NAN, row->expected, relative, 0);
}

void check_formula_rows(const struct formula_row *rows, size_t count, double relative)
{
    for (size_t i = 0; i < count; i++) {
        struct gas_arena arena = {0};
        struct gas_block value = {0};
        if (check_true(rows[i].id, formula_evaluate(rows[i].formula, &arena, &value) && value.rows > 0))
            check_row(&rows[i], value.cell, relative);
        gas_arena_free(&arena);
    }
}
