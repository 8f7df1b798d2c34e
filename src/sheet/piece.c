#include "sheet/piece.h"

#include <string.h>

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

bool gas_piece_next(struct gas_piece *rest, struct gas_piece *item)
{
    while (rest->length) {
        size_t end = 0;
        while (end < rest->length && rest->at[end] != ';' && rest->at[end] != '\n' && rest->at[end] != '\r')
            end++;
        *item = gas_piece_trim((struct gas_piece){rest->at, end});
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
    struct gas_piece rest = gas_piece_trim((struct gas_piece){piece->at + used, piece->length - used});
    if (rest.length && (rest.at[0] == '=' || rest.at[0] == ':'))
        rest = gas_piece_trim((struct gas_piece){rest.at + 1, rest.length - 1});
    *piece = rest;
    return true;
}
