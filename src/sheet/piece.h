/*
 * piece.h - pieces of a typed text: items separated by ';' or line breaks, words at their start.
 */
#ifndef SHEET_PIECE_H
#define SHEET_PIECE_H

#include <stdbool.h>
#include <stddef.h>

#include "sheet/cell.h"

struct gas_piece {
    const char *at;
    size_t length;
};

/* gas_piece_trim - without the white space (no-break spaces too) around it. */
struct gas_piece gas_piece_trim(struct gas_piece piece);

/* gas_piece_front, gas_piece_behind - the first bytes of a piece, what stands behind them; trimmed. */
struct gas_piece gas_piece_front(struct gas_piece piece, size_t bytes);
struct gas_piece gas_piece_behind(struct gas_piece piece, size_t bytes);

/* gas_piece_of - the text of a cell, trimmed; empty when it holds none. */
struct gas_piece gas_piece_of(const struct gas_cell *cell);

/* gas_piece_of_row - the cells of a row one behind the other in a buffer: "cool to", 40, "degC" is "cool to 40 degC".
 */
struct gas_piece gas_piece_of_row(const struct gas_block *block, size_t row, char *buffer, size_t size);

/* gas_piece_next - takes the next item that is not blank off the front of *rest, trimmed; false at the end. */
bool gas_piece_next(struct gas_piece *rest, struct gas_piece *item);

/* gas_piece_take - takes words off the front, whatever their case and the spaces between them ("work by gas"); they
 * must end at a space, '=', ':', a digit's edge or the end. What follows is trimmed, a leading '=' or ':' dropped. */
bool gas_piece_take(struct gas_piece *piece, const char *words);

#endif
