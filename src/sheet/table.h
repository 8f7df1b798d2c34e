/*
 * table.h - the `given` and `wanted` arguments, whatever their form, brought to headings and rows of figures.
 *
 * given:   a text "7 bar(g); 35 degC; 12 m3", with "T constant" and "P = 7 ± 0.05 bar(g)"
 *          a block heading | value, or label | value | unit (one case), or a column of such texts
 *          a table of numbers with `headings` beside it: one case per row, or per column when the headings stand in a
 *          column; a blank cell is "not given in this case". Headings may also stand inside the table itself, as its
 *          first row or first column. The units may have a row (or column) of their own after the names. Lines that
 *          name no quantity (case, tag, date, remark) are passed over
 * wanted:  a text "m, kg" or "P2, bar(g); V2, m3", or a range of headings
 */
#ifndef SHEET_TABLE_H
#define SHEET_TABLE_H

#include <stdint.h>

#include <gasleaf/heading.h>

#include "sheet/cell.h"
#include "sheet/options.h"
#include "sheet/sentence.h"

enum { GAS_COLUMNS = 32 };

struct gas_table {
    size_t columns;
    struct gas_heading heading[GAS_COLUMNS]; /* state GAS_CONSTANT: the same in every state, without a figure */
    unsigned short line[GAS_COLUMNS];        /* where the figures of a column stand in the table, from 0 */
    size_t rows;                             /* cases, at least 1 */
    bool across;                             /* the cases stand side by side: so do the answers */
    bool one_case;                           /* text or block: a single case whose figures are below */
    double figure[GAS_COLUMNS];              /* of a single case, in the units of the headings; NAN: blank */
    const struct gas_block *block;           /* of a table; headings inside it are left out by the next two */
    size_t first_row, first_column;
    double barometer; /* Pa, for cells that carry a unit of their own */
    struct gas_references references;
};

/* Figures of one case in the units of the headings; bit i of `given` tells whether column i is given. */
struct gas_row {
    uint32_t given;
    double figure[GAS_COLUMNS];
};

/*
 * gas_table_read - tell the form, read the headings, count the cases.
 *
 *   Notes      Figures of a table are read row by row. Names a quantity twice (same symbol, state and dimension,
 * neither a plus-minus column): refused. gas_row.given never has a blank cell's bit.
 */
bool gas_table_read(const struct gas_block *given, const struct gas_block *headings, const struct gas_options *options,
                    struct gas_table *table, struct gas_refusal *refusal);

/* gas_table_row - the figures of one case; a text that is no number, or a sentence, refuses this case only. Does not
 * allocate. given = 0: the whole case is blank. */
bool gas_table_row(const struct gas_table *table, size_t row, struct gas_row *figures, struct gas_refusal *refusal);

struct gas_wanted {
    size_t columns; /* 0: nothing wanted in particular */
    bool down;      /* came as a column of cells: the answers of a single case stand beside them */
    struct gas_heading heading[GAS_COLUMNS];
};

bool gas_wanted_read(const struct gas_block *argument, const struct gas_options *options, struct gas_wanted *wanted,
                     struct gas_refusal *refusal);

/* gas_heading_of - a heading written in the code, where nothing in particular is wanted. */
struct gas_heading gas_heading_of(const char *text);

enum { GAS_NAME_TEXT = 40 };
/* gas_quantity_name - "P1", "T", "P line": symbol and state as a sentence names them. Returns buffer. */
const char *gas_quantity_name(char buffer[GAS_NAME_TEXT], enum gas_symbol symbol, int state);

#endif
