/*
 * table_form.h - which of its forms a `given` argument without headings has. (for table.c)
 */
#ifndef SHEET_TABLE_FORM_H
#define SHEET_TABLE_FORM_H

#include "sheet/cell.h"

enum gas_form {
    GAS_FORM_ITEMS,   /* every cell is a text of items: "7 bar(g); 35 degC" */
    GAS_FORM_PAIRS,   /* heading | value */
    GAS_FORM_TRIPLES, /* label | value | unit */
    GAS_FORM_HEADED,  /* headings in the first row, cases in rows */
    GAS_FORM_SIDED,   /* headings in the first column, cases in columns */
    GAS_FORM_BARE     /* figures without headings */
};

enum gas_form gas_form_of(const struct gas_block *given);

/* gas_cell_is_word - a text that does not start with a figure: a heading, a label, a unit. */
bool gas_cell_is_word(const struct gas_cell *cell);

#endif
