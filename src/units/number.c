/* Numbers as texts, the same in every locale. */
#include <locale.h>
#include <math.h>
#include <pthread.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "units.h"

enum { NUMBER_TEXT = 64 };

static locale_t c_locale;
static pthread_once_t c_locale_once = PTHREAD_ONCE_INIT;

static void make_c_locale(void)
{
    c_locale = newlocale(LC_ALL_MASK, "C", (locale_t)0);
}

/* Bytes of a space (also a no-break one) at text, else 0. */
static size_t space_bytes(const char *text, size_t length)
{
    static const char *const spaces[] = {"\xc2\xa0", "\xe2\x80\xaf", "\xe2\x80\x89"};
    if (length > 0 && gas_is_space(text[0]))
        return 1;
    for (size_t i = 0; i < sizeof spaces / sizeof *spaces; i++)
        if (length >= strlen(spaces[i]) && memcmp(text, spaces[i], strlen(spaces[i])) == 0)
            return strlen(spaces[i]);
    return 0;
}

static size_t skip_spaces(const char *text, size_t length, size_t at)
{
    for (size_t bytes; (bytes = space_bytes(text + at, length - at)) > 0;)
        at += bytes;
    return at;
}

/* Bytes of a sign; *minus says which. The minus of typesetters counts. */
static size_t read_sign(const char *text, size_t length, bool *minus)
{
    static const char minus_sign[] = "\xe2\x88\x92";
    *minus = false;
    if (length >= 3 && memcmp(text, minus_sign, 3) == 0)
        return *minus = true, 3;
    if (length > 0 && (text[0] == '-' || text[0] == '+'))
        return *minus = text[0] == '-', 1;
    return 0;
}

struct digits {
    char text[NUMBER_TEXT];
    size_t used;
};

static bool put(struct digits *digits, char c)
{
    if (digits->used + 1 >= NUMBER_TEXT)
        return false;
    digits->text[digits->used++] = c;
    digits->text[digits->used] = '\0';
    return true;
}

static size_t read_digits(const char *text, size_t length, size_t at, struct digits *digits, bool *good)
{
    while (at < length && gas_is_digit(text[at]))
        *good = put(digits, text[at++]) && *good;
    return at;
}

static size_t read_exponent(const char *text, size_t length, size_t at, struct digits *digits, bool *good)
{
    bool minus;
    if (at >= length || (text[at] != 'e' && text[at] != 'E'))
        return at;
    size_t from = at + 1 + read_sign(text + at + 1, length - at - 1, &minus);
    if (from >= length || !gas_is_digit(text[from]))
        return at; /* a unit that begins with e */
    *good = put(digits, 'e') && put(digits, minus ? '-' : '+') && *good;
    return read_digits(text, length, from, digits, good);
}

bool gas_number_parse(const char *text, size_t length, double *number, size_t *used)
{
    struct digits digits = {.used = 0};
    bool minus, good = true;
    size_t at = skip_spaces(text, length, 0);
    at += read_sign(text + at, length - at, &minus);
    at = skip_spaces(text, length, at);
    if (minus)
        put(&digits, '-');
    size_t before = digits.used;
    at = read_digits(text, length, at, &digits, &good);
    if (at < length && (text[at] == '.' || text[at] == ',') &&
        (digits.used > before || (at + 1 < length && gas_is_digit(text[at + 1])))) {
        bool comma = text[at] == ',' && (at + 1 >= length || !gas_is_digit(text[at + 1]));
        good = !comma && put(&digits, '.') && good;
        at = read_digits(text, length, at + 1, &digits, &good);
    }
    if (!good || digits.used == before)
        return false;
    at = read_exponent(text, length, at, &digits, &good);
    size_t unit = skip_spaces(text, length, at);
    bool more = unit < length && (gas_is_digit(text[unit]) || text[unit] == '.' || text[unit] == ',');
    pthread_once(&c_locale_once, make_c_locale);
    if (!good || more || !c_locale)
        return false;
    *number = strtod_l(digits.text, NULL, c_locale);
    *used = unit;
    return isfinite(*number);
}

/* "1.50e+07" -> "1.5e7", "1.200" -> "1.2" */
static void trim(char *text)
{
    char *e = strchr(text, 'e'), power[16] = "";
    if (e) {
        snprintf(power, sizeof power, "e%d", atoi(e + 1));
        *e = '\0';
    }
    if (strchr(text, '.')) {
        char *end = text + strlen(text);
        while (end[-1] == '0')
            *--end = '\0';
        if (end[-1] == '.')
            end[-1] = '\0';
    }
    strcat(text, power);
}

void gas_number_format(char *buffer, size_t size, double x, int digits)
{
    char text[NUMBER_TEXT];
    pthread_once(&c_locale_once, make_c_locale);
    if (size == 0)
        return;
    if (!isfinite(x) || x == 0.0 || !c_locale) {
        snprintf(buffer, size, "%s", isnan(x) ? "nan" : x > 0.0 ? "inf" : x < 0.0 ? "-inf" : "0");
        return;
    }
    int places = digits < 1 ? 1 : digits > 17 ? 17 : digits;
    locale_t before = uselocale(c_locale);
    snprintf(text, sizeof text, "%.*e", places - 1, x);
    int power = atoi(strchr(text, 'e') + 1); /* of the rounded figure */
    if (power >= -4 && power < 15) {
        double rounded = strtod(text, NULL);
        snprintf(text, sizeof text, "%.*f", places - 1 - power > 0 ? places - 1 - power : 0, rounded);
    }
    uselocale(before);
    trim(text);
    snprintf(buffer, size, "%s", text);
}
