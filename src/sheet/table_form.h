/*
 * table_form.h - which of its forms a `given` argument has, and how its headings are laid out. (for table.c,
 * table_row.c and wanted.c)
 */
#ifndef SHEET_TABLE_FORM_H
#define SHEET_TABLE_FORM_H

#include "sheet/cell.h"
#include "sheet/piece.h"
#include "sheet/table.h"

enum gas_form {
    GAS_FORM_ITEMS,   /* every cell is a text of items: "7 bar(g); 35 degC" */
    GAS_FORM_PAIRS,   /* heading | value */
    GAS_FORM_TRIPLES, /* label | value | unit */
    GAS_FORM_HEADED,  /* headings in the first row, cases in rows */
    GAS_FORM_SIDED,   /* headings in the first column, cases in columns */
    GAS_FORM_BARE     /* figures without headings */
};

enum gas_form gas_form_of(const struct gas_block *given);

/* gas_cell_is_title - the word "value" over a block of pairs. */
bool gas_cell_is_title(const struct gas_cell *cell);

/* gas_passed_over - a heading that names no quantity and is known to name none: case, tag, date, remark, "-". The line
 * below it is not read. */
bool gas_passed_over(struct gas_piece heading);

/* Cells of a block, from one on: every step-th. */
struct gas_line {
    const struct gas_cell *cell;
    size_t count, step;
};
struct gas_line gas_line_across(const struct gas_block *block, size_t row, size_t from);
struct gas_line gas_line_down(const struct gas_block *block, size_t column, size_t from);

/* gas_line_of_units - units and blanks, at least one unit: the second row (or column) of headings. */
bool gas_line_of_units(struct gas_line line);

/* gas_line_figures - does a figure stand in it? */
bool gas_line_figures(struct gas_line line);

/* gas_table_cell - a figure in the unit of its column, for the barometer of its row. */
bool gas_table_cell(const struct gas_table *table, size_t column, size_t row, const struct gas_cell *cell,
                    double *figure, struct gas_refusal *refusal);

/* gas_refuse_figure - "7 kg" is a figure where a heading is due; as a unit it would mean seven of them. */
bool gas_refuse_figure(const char *what, const char *text, size_t length, struct gas_refusal *refusal);

#endif
