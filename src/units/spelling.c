/* UTF-8 as engineers type it -> the plain characters that the product parser reads. */
#include <string.h>

#include "units.h"

struct respelling {
    unsigned from, to; /* code points, a range */
    const char *plain; /* what stands for it; NULL: the digit that follows from the position in the range */
};

/* clang-format off */
static const struct respelling respellings[] = {
    {0x00a0, 0x00a0, " "},      /* no-break space */
    {0x00ad, 0x00ad, ""},       /* soft hyphen */
    {0x00b0, 0x00b0, " deg"},   /* degree */
    {0x00b5, 0x00b5, "u"},      /* micro */
    {0x00b7, 0x00b7, "*"},      /* middle dot */
    {0x00ba, 0x00ba, " deg"},   /* ordinal typed for a degree */
    {0x00d7, 0x00d7, "*"},      /* times */
    {0x00f7, 0x00f7, "/"},
    {0x02da, 0x02da, " deg"},   /* ring above */
    {0x03bc, 0x03bc, "u"},      /* Greek mu */
    {0x2000, 0x200a, " "},
    {0x200b, 0x200d, ""},       /* zero width */
    {0x2010, 0x2015, "-"},      /* hyphens and dashes */
    {0x2022, 0x2022, "*"},      /* bullet */
    {0x2027, 0x2027, "*"},
    {0x202f, 0x202f, " "},
    {0x2044, 0x2044, "/"},      /* fraction slash */
    {0x2080, 0x2089, NULL},     /* subscript digits */
    {0x2103, 0x2103, " degC"},
    {0x2109, 0x2109, " degF"},
    {0x212a, 0x212a, "K"},      /* Kelvin sign */
    {0x2212, 0x2212, "-"},      /* minus */
    {0x2215, 0x2215, "/"},
    {0x2219, 0x2219, "*"},
    {0x22c5, 0x22c5, "*"},      /* dot operator */
    {0xfeff, 0xfeff, ""},
    {0xff05, 0xff05, "%"},
};
/* clang-format on */

/* The digit or minus of a raised character, else 0. */
static char raised(unsigned point)
{
    switch (point) {
    case 0xb9:
        return '1';
    case 0xb2:
        return '2';
    case 0xb3:
        return '3';
    case 0x207b:
        return '-';
    default:
        return point == 0x2070 || (point >= 0x2074 && point <= 0x2079) ? (char)('0' + (point - 0x2070)) : 0;
    }
}

static bool put(char plain[PLAIN_TEXT], size_t *used, const char *piece, size_t length)
{
    if (*used + length >= PLAIN_TEXT)
        return false;
    memcpy(plain + *used, piece, length);
    *used += length;
    return true;
}

/* Characters above ASCII; unknown letters stay as they are, for the message that will name them. */
static bool put_beyond(char plain[PLAIN_TEXT], size_t *used, const char *text, size_t bytes, unsigned point)
{
    for (size_t i = 0; i < sizeof respellings / sizeof *respellings; i++) {
        const struct respelling *row = &respellings[i];
        if (point < row->from || point > row->to)
            continue;
        char digit = (char)('0' + (point - row->from));
        return row->plain ? put(plain, used, row->plain, strlen(row->plain)) : put(plain, used, &digit, 1);
    }
    return put(plain, used, text, bytes);
}

static bool is_name_character(char c)
{
    return gas_is_letter(c) || gas_is_digit(c);
}

/* A full stop between names is a product ("kJ/kg.K"), after a name an abbreviation ("cu. ft.", "hr."). */
static void settle_stops(char *plain)
{
    for (char *p = plain; *p; p++)
        if (*p == '.' && !(gas_is_digit(p[1]) && (p == plain || !gas_is_letter(p[-1]))))
            *p = p > plain && is_name_character(p[-1]) && gas_is_letter(p[1]) ? '*' : ' ';
}

/* H2O is a name, not a power of H; "**" raises. Both replacements are shorter. */
static void settle_pairs(char *plain)
{
    char *to = plain;
    for (const char *p = plain; *p;) {
        if (gas_same_folded(p, "H2O", strnlen(p, 3) < 3 ? 1 : 3) && strnlen(p, 3) == 3) {
            memcpy(to, "Aq", 2);
            to += 2;
            p += 3;
        } else if (p[0] == '*' && p[1] == '*') {
            *to++ = '^';
            p += 2;
        } else {
            *to++ = *p++;
        }
    }
    *to = '\0';
}

bool gas_spelling_plain(const char *text, size_t length, char plain[PLAIN_TEXT], struct gas_unit_fault *fault)
{
    size_t used = 0;
    bool in_power = false;
    for (size_t i = 0; i < length;) {
        unsigned point = 0;
        size_t bytes = gas_utf8_next(text + i, length - i, &point);
        bool space = point >= '\t' && point <= '\r';
        if (bytes == 0 || (point < 0x20 && !space) || point == 0x7f)
            return gas_unit_refuse(fault, GAS_UNIT_UNKNOWN, text + i, bytes ? bytes : 1,
                                   "a character that is not text stands here");
        char up = raised(point);
        bool good = up           ? (in_power || put(plain, &used, "^", 1)) && put(plain, &used, &up, 1)
                    : space      ? put(plain, &used, " ", 1)
                    : bytes == 1 ? put(plain, &used, text + i, 1)
                                 : put_beyond(plain, &used, text + i, bytes, point);
        if (!good)
            return gas_unit_refuse(fault, GAS_UNIT_TOO_LONG, text, length, "shorten the unit");
        in_power = up != 0;
        i += bytes;
    }
    plain[used] = '\0';
    settle_pairs(plain);
    settle_stops(plain);
    for (size_t end = strlen(plain); end > 0 && gas_is_space(plain[end - 1]);)
        plain[--end] = '\0'; /* an abbreviation at the end leaves a space */
    return true;
}
