#include "sheet/cell.h"

#include <math.h>
#include <stdint.h>
#include <string.h>

#define NO_MEMORY  "Check the range: it is too large for the memory at hand; give fewer rows."
#define NOT_FINITE "Check the result: it is not a finite number; look for a figure out of all proportion."
static struct gas_cell no_memory = {GAS_CELL_TEXT, 0, NO_MEMORY, sizeof NO_MEMORY - 1};
static const struct gas_cell not_finite = {GAS_CELL_TEXT, 0, NOT_FINITE, sizeof NOT_FINITE - 1};

bool gas_cell_blank(const struct gas_cell *cell)
{
    if (cell->kind != GAS_CELL_TEXT)
        return cell->kind == GAS_CELL_EMPTY;
    return strspn(cell->text, " \t\r\n") == cell->length;
}

bool gas_cell_is_sentence(const struct gas_cell *cell)
{
    return cell->kind == GAS_CELL_TEXT && strncmp(cell->text, "Check ", 6) == 0;
}

const struct gas_cell *gas_block_sentence(const struct gas_block *block)
{
    for (size_t i = 0; i < block->rows * block->columns; i++)
        if (gas_cell_is_sentence(&block->cell[i]))
            return &block->cell[i];
    return NULL;
}

const struct gas_block *gas_argument(const struct gas_call *call, size_t index)
{
    static const struct gas_block omitted = {0};
    return index < call->count ? &call->argument[index] : &omitted;
}

bool gas_answer_block(struct gas_call *call, size_t rows, size_t columns)
{
    struct gas_cell *cells = NULL;
    if (columns == 0 || rows <= SIZE_MAX / sizeof *cells / columns)
        cells = gas_arena_take(call->arena, rows * columns, sizeof *cells);
    if (!cells) {
        call->answer = (struct gas_block){1, 1, &no_memory, false};
        return false;
    }
    memset(cells, 0, rows * columns * sizeof *cells);
    call->answer = (struct gas_block){rows, columns, cells, rows * columns > 1};
    return true;
}

void gas_answer_number(struct gas_call *call, double number)
{
    if (gas_answer_block(call, 1, 1))
        gas_put_number(call, 0, 0, number);
}

void gas_answer_text(struct gas_call *call, const char *text)
{
    if (gas_answer_block(call, 1, 1))
        gas_put_text(call, 0, 0, text);
}

static struct gas_cell *answer_cell(struct gas_call *call, size_t row, size_t column)
{
    return &call->answer.cell[row * call->answer.columns + column];
}

void gas_put_number(struct gas_call *call, size_t row, size_t column, double number)
{
    *answer_cell(call, row, column) = isfinite(number) ? gas_cell_number(number) : not_finite;
}

void gas_put_text(struct gas_call *call, size_t row, size_t column, const char *text)
{
    size_t length = strlen(text);
    const char *copy = gas_arena_copy(call->arena, text, length);
    *answer_cell(call, row, column) = copy ? (struct gas_cell){GAS_CELL_TEXT, 0, copy, length} : no_memory;
}

void gas_put_texts(struct gas_call *call, size_t row, const char *const *texts, size_t count)
{
    for (size_t i = 0; i < count; i++)
        gas_put_text(call, row, i, texts[i]);
}

void gas_put_not_available(struct gas_call *call, size_t row, size_t column)
{
    *answer_cell(call, row, column) = (struct gas_cell){.kind = GAS_CELL_NOT_AVAILABLE};
}
