#include "addin/text.h"

#include <stdint.h>
#include <string.h>

enum { REPLACEMENT = 0xFFFD, BYTES_PER_UNIT = 3 }; /* a pair of units makes four bytes, a single one at most three */

static uint32_t next_character(const sal_Unicode *unit, size_t left, size_t *used)
{
    uint32_t first = unit[0];
    *used = 1;
    if (first == 0)
        return REPLACEMENT;
    if ((first & 0xF800) != 0xD800)
        return first;
    if (first >= 0xDC00 || left < 2 || (unit[1] & 0xFC00) != 0xDC00)
        return REPLACEMENT;
    *used = 2;
    return 0x10000 + ((first - 0xD800) << 10) + (unit[1] - 0xDC00U);
}

static char *put_character(char *to, uint32_t character)
{
    static const unsigned char lead[] = {0, 0, 0xC0, 0xE0, 0xF0};
    int bytes = character < 0x80 ? 1 : character < 0x800 ? 2 : character < 0x10000 ? 3 : 4;
    if (bytes == 1) {
        *to = (char)character;
        return to + 1;
    }
    for (int i = bytes - 1; i > 0; i--, character >>= 6)
        to[i] = (char)(0x80 | (character & 0x3F));
    to[0] = (char)(lead[bytes] | character);
    return to + bytes;
}

struct gas_cell addin_text(const rtl_uString *string, struct gas_arena *arena)
{
    if (string->length <= 0)
        return addin_message("");
    size_t units = (size_t)string->length;
    char *text = gas_arena_take(arena, BYTES_PER_UNIT * units + 1, 1);
    if (!text)
        return addin_message("Check the argument: its text is too long for the memory at hand; give a shorter one.");
    char *end = text;
    for (size_t i = 0, used; i < units; i += used)
        end = put_character(end, next_character(string->buffer + i, units - i, &used));
    *end = '\0';
    return (struct gas_cell){GAS_CELL_TEXT, 0, text, (size_t)(end - text)};
}

struct gas_cell addin_message(const char *text)
{
    return (struct gas_cell){GAS_CELL_TEXT, 0, text, strlen(text)};
}
