/* Small helpers on texts, none of which looks at the locale. */
#include <string.h>

#include "units.h"

bool gas_is_digit(char c)
{
    return c >= '0' && c <= '9';
}

bool gas_is_letter(char c)
{
    return (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z') || c == '_' || c == '%' || (unsigned char)c >= 0x80;
}

bool gas_is_space(char c)
{
    return c == ' ' || (c >= '\t' && c <= '\r');
}

char gas_lower(char c)
{
    return c >= 'A' && c <= 'Z' ? (char)(c - 'A' + 'a') : c;
}

bool gas_same_folded(const char *a, const char *b, size_t length)
{
    for (size_t i = 0; i < length; i++)
        if (gas_lower(a[i]) != gas_lower(b[i]))
            return false;
    return true;
}

void gas_trim(const char **text, size_t *length)
{
    while (*length > 0 && gas_is_space((*text)[0]))
        ++*text, --*length;
    while (*length > 0 && gas_is_space((*text)[*length - 1]))
        --*length;
}

/* Bytes of the character at text and its code point; 0 when it is not valid UTF-8. Overlong forms and surrogates are
 * refused, so that no two byte sequences mean the same text. */
size_t gas_utf8_next(const char *text, size_t length, unsigned *point)
{
    static const unsigned least[] = {0, 0, 0x80, 0x800, 0x10000};
    unsigned char first = length ? (unsigned char)text[0] : 0xff;
    size_t bytes = first < 0x80 ? 1 : first >> 5 == 6 ? 2 : first >> 4 == 14 ? 3 : first >> 3 == 30 ? 4 : 0;
    if (bytes == 0 || bytes > length)
        return 0;
    unsigned value = bytes == 1 ? first : first & (0x7fu >> bytes);
    for (size_t i = 1; i < bytes; i++) {
        unsigned char next = (unsigned char)text[i];
        if (next >> 6 != 2)
            return 0;
        value = value << 6 | (next & 0x3fu);
    }
    if (value < least[bytes] || value > 0x10ffff || (value >= 0xd800 && value < 0xe000))
        return 0;
    *point = value;
    return bytes;
}

/* Bytes that are no text become '?', so that a message made with the copy is always valid UTF-8. */
void gas_copy_text(char *to, size_t size, const char *from, size_t length)
{
    size_t used = 0;
    for (size_t i = 0; i < length;) {
        unsigned point;
        size_t bytes = gas_utf8_next(from + i, length - i, &point);
        bool good = bytes > 0 && point >= 0x20 && point != 0x7f;
        size_t put = good ? bytes : 1;
        if (used + put >= size)
            break;
        if (good)
            memcpy(to + used, from + i, bytes);
        else
            to[used] = '?';
        used += put;
        i += bytes ? bytes : 1;
    }
    to[used] = '\0';
}

/* Levenshtein's distance without regard to case, or limit + 1 when it is more than limit. */
int gas_edit_distance(const char *a, const char *b, int limit)
{
    enum { LONGEST = 40 };
    int row[LONGEST + 1];
    size_t m = strlen(a), n = strlen(b);
    if (m > LONGEST || n > LONGEST || (m > n ? m - n : n - m) > (size_t)limit)
        return limit + 1;
    for (size_t j = 0; j <= n; j++)
        row[j] = (int)j;
    for (size_t i = 1; i <= m; i++) {
        int diagonal = row[0];
        row[0] = (int)i;
        for (size_t j = 1; j <= n; j++) {
            int change = diagonal + (gas_lower(a[i - 1]) != gas_lower(b[j - 1]));
            diagonal = row[j];
            int step = 1 + (row[j] < row[j - 1] ? row[j] : row[j - 1]);
            row[j] = change < step ? change : step;
        }
    }
    return row[n] <= limit ? row[n] : limit + 1;
}
