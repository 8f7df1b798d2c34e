#include "sheet/piece.h"

#include <stdio.h>
#include <string.h>

#include <gasleaf/unit.h>

#include "sheet/ascii.h"

/* Bytes of white space at the front; a no-break space is two bytes. */
static size_t space_at(struct gas_piece piece)
{
    if (piece.length && strchr(" \t\r\n", piece.at[0]) && piece.at[0])
        return 1;
    return piece.length >= 2 && memcmp(piece.at, "\u00a0", 2) == 0 ? 2 : 0;
}

static size_t space_before_end(struct gas_piece piece)
{
    if (space_at((struct gas_piece){piece.at + piece.length - 1, 1}))
        return 1;
    return piece.length >= 2 && space_at((struct gas_piece){piece.at + piece.length - 2, 2}) == 2 ? 2 : 0;
}

struct gas_piece gas_piece_trim(struct gas_piece piece)
{
    for (size_t space; (space = space_at(piece));)
        piece = (struct gas_piece){piece.at + space, piece.length - space};
    for (size_t space; piece.length && (space = space_before_end(piece));)
        piece.length -= space;
    return piece;
}

struct gas_piece gas_piece_front(struct gas_piece piece, size_t bytes)
{
    return gas_piece_trim((struct gas_piece){piece.at, bytes});
}

struct gas_piece gas_piece_behind(struct gas_piece piece, size_t bytes)
{
    return gas_piece_trim((struct gas_piece){piece.at + bytes, piece.length - bytes});
}

struct gas_piece gas_piece_of(const struct gas_cell *cell)
{
    bool text = cell->kind == GAS_CELL_TEXT;
    return gas_piece_trim((struct gas_piece){text ? cell->text : "", text ? cell->length : 0});
}

struct gas_piece gas_piece_of_row(const struct gas_block *block, size_t row, char *buffer, size_t size)
{
    size_t used = 0;
    for (size_t i = 0; i < block->columns && used < size; i++) {
        const struct gas_cell *cell = gas_cell_at(block, row, i);
        char number[40] = "";
        if (cell->kind == GAS_CELL_NUMBER)
            gas_number_format(number, sizeof number, cell->number, 15);
        used += (size_t)snprintf(buffer + used, size - used, "%s ", cell->kind == GAS_CELL_TEXT ? cell->text : number);
    }
    return (struct gas_piece){buffer, strlen(buffer)};
}

bool gas_piece_next(struct gas_piece *rest, struct gas_piece *item)
{
    while (rest->length) {
        size_t end = 0;
        while (end < rest->length && rest->at[end] != ';' && rest->at[end] != '\n' && rest->at[end] != '\r')
            end++;
        *item = gas_piece_front(*rest, end);
        size_t used = end < rest->length ? end + 1 : end;
        *rest = (struct gas_piece){rest->at + used, rest->length - used};
        if (item->length)
            return true;
    }
    return false;
}

/* Bytes of the piece that the words match, 0 when they do not. */
static size_t matched(struct gas_piece piece, const char *words)
{
    size_t i = 0;
    for (; *words; words++) {
        size_t before = i;
        if (*words == ' ')
            while (i < piece.length && piece.at[i] == ' ')
                i++;
        else if (i < piece.length && gas_ascii_lower(piece.at[i]) == *words)
            i++;
        if (i == before)
            return 0;
    }
    return i;
}

bool gas_piece_take(struct gas_piece *piece, const char *words)
{
    size_t used = matched(*piece, words);
    if (used == 0 || (used < piece->length && gas_ascii_letter(piece->at[used])))
        return false;
    struct gas_piece rest = gas_piece_behind(*piece, used);
    if (rest.length && (rest.at[0] == '=' || rest.at[0] == ':'))
        rest = gas_piece_behind(rest, 1);
    *piece = rest;
    return true;
}
