/*
 * cell.h - what a worksheet function gets and gives: cells in blocks. No office type appears here.
 */
#ifndef SHEET_CELL_H
#define SHEET_CELL_H

#include <stdbool.h>
#include <stddef.h>

#include "sheet/arena.h"

enum gas_cell_kind {
    GAS_CELL_EMPTY,
    GAS_CELL_NUMBER,
    GAS_CELL_TEXT,
    GAS_CELL_HOST_ERROR,   /* only in a live range: the host does not call us with errors otherwise */
    GAS_CELL_NOT_AVAILABLE /* only in answers: shows as #N/A */
};

struct gas_cell {
    enum gas_cell_kind kind;
    double number;
    const char *text; /* UTF-8, ends in NUL; NULL unless kind is GAS_CELL_TEXT */
    size_t length;    /* bytes of text */
};

/* A rectangle of cells, row by row. rows = 0: the argument was omitted. */
struct gas_block {
    size_t rows, columns;
    struct gas_cell *cell;
    bool range; /* came as a range or an inline array, even of one cell */
};

/* One call of a worksheet function. The answer lives in the arena. */
struct gas_call {
    const struct gas_block *argument; /* omitted ones have rows = 0 */
    size_t count;                     /* may be more than the row's parameters when its last one repeats */
    struct gas_arena *arena;
    struct gas_block answer;
};

static inline struct gas_cell gas_cell_number(double number)
{
    return (struct gas_cell){.kind = GAS_CELL_NUMBER, .number = number};
}

static inline bool gas_omitted(const struct gas_block *block)
{
    return block->rows == 0;
}

static inline bool gas_single(const struct gas_block *block)
{
    return block->rows == 1 && block->columns == 1;
}

static inline const struct gas_cell *gas_cell_at(const struct gas_block *block, size_t row, size_t column)
{
    return &block->cell[row * block->columns + column];
}

/* gas_cell_blank - empty, or a text of nothing but white space (what a blank cell of a range arrives as). */
bool gas_cell_blank(const struct gas_cell *cell);

/* gas_cell_is_sentence - a readable error of ours: a text that starts with "Check ". */
bool gas_cell_is_sentence(const struct gas_cell *cell);

/* gas_block_sentence - the first readable error in a block, NULL when there is none. */
const struct gas_cell *gas_block_sentence(const struct gas_block *block);

/* gas_argument - the argument at an index; an omitted one where the call has fewer. */
const struct gas_block *gas_argument(const struct gas_call *call, size_t index);

/* Answers. gas_answer_block makes rows x columns of empty cells, or false when memory is out (the answer then is a
 * sentence). Texts are copied; a number that is not finite becomes a sentence. */
bool gas_answer_block(struct gas_call *call, size_t rows, size_t columns);
void gas_answer_number(struct gas_call *call, double number);
void gas_answer_text(struct gas_call *call, const char *text);
void gas_put_number(struct gas_call *call, size_t row, size_t column, double number);
void gas_put_text(struct gas_call *call, size_t row, size_t column, const char *text);
void gas_put_texts(struct gas_call *call, size_t row, const char *const *texts, size_t count); /* from column 0 on */
void gas_put_not_available(struct gas_call *call, size_t row, size_t column);

#endif
