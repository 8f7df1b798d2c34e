/* The reader: sum of products of powers of primaries, by recursive descent of bounded depth. */
#include "sheet/expression.h"

#include <stdio.h>
#include <string.h>

#include <gasleaf/unit.h>

#include "sheet/ascii.h"
#include "sheet/expression_sum.h"

#define WHAT "cp formula"

enum { DEPTH = 40 };

struct reader {
    struct gas_piece rest;
    const struct gas_letter *letter;
    size_t letters;
    int depth;
    struct gas_refusal *refusal;
};

static bool read_sum(struct reader *reader, struct gas_sum *sum);

static void advance(struct reader *reader, size_t bytes)
{
    reader->rest.at += bytes;
    reader->rest.length -= bytes;
}

static void skip_spaces(struct reader *reader)
{
    struct gas_piece trimmed = gas_piece_trim(reader->rest);
    if (trimmed.length)
        advance(reader, (size_t)(trimmed.at - reader->rest.at));
    else
        reader->rest = trimmed;
}

/* A token at the front, behind spaces. */
static bool take(struct reader *reader, const char *token)
{
    size_t length = strlen(token);
    skip_spaces(reader);
    if (reader->rest.length < length || memcmp(reader->rest.at, token, length) != 0)
        return false;
    advance(reader, length);
    return true;
}

static bool take_minus(struct reader *reader)
{
    return take(reader, "-") || take(reader, "\u2212") || take(reader, "\u2013");
}

static char next(struct reader *reader)
{
    skip_spaces(reader);
    return reader->rest.length ? reader->rest.at[0] : '\0';
}

static bool refuse_here(struct reader *reader, const char *expected)
{
    char shown[60];
    size_t length = reader->rest.length < 24 ? reader->rest.length : 24;
    while (length < reader->rest.length && ((unsigned char)reader->rest.at[length] & 0xC0) == 0x80)
        length++;
    if (length == 0)
        return gas_refuse(reader->refusal, WHAT, "it ends where %s is expected.", expected);
    gas_quoted(shown, sizeof shown, reader->rest.at, length);
    return gas_refuse(reader->refusal, WHAT, "%s stands where %s is expected.", shown, expected);
}

/* Bytes of T, or of the longest letter of a constant, at the front; 0 for another word. */
static size_t name_at(const struct reader *reader, struct gas_piece text, struct gas_sum *sum)
{
    size_t found = 0;
    for (size_t i = 0; i < reader->letters; i++) {
        size_t length = strlen(reader->letter[i].name);
        if (length > found && length <= text.length && memcmp(text.at, reader->letter[i].name, length) == 0) {
            found = length;
            *sum = gas_sum_of(reader->letter[i].value, 0);
        }
    }
    if (found == 0 && text.length && text.at[0] == 'T') {
        found = 1;
        *sum = gas_sum_of(1, 1);
    }
    char after = found < text.length ? text.at[found] : '\0';
    if (found && (gas_ascii_digit(after) || (gas_ascii_letter(after) && reader->letters == 0)))
        return 0; /* "T2", "Torr" */
    return found;
}

static bool is_function(struct gas_piece text)
{
    static const char *const functions[] = {"exp", "ln", "log", "sqrt", "sinh", "cosh", "tanh", "coth", "sin", "cos"};
    for (size_t i = 0; i < sizeof functions / sizeof *functions; i++) {
        size_t length = strlen(functions[i]);
        if (text.length > length && memcmp(text.at, functions[i], length) == 0 && !gas_ascii_letter(text.at[length]))
            return true;
    }
    return false;
}

static bool refuse_word(struct reader *reader)
{
    const struct gas_piece rest = reader->rest;
    if (is_function(rest))
        return gas_refuse(reader->refusal, WHAT,
                          "only sums of powers of T are read, no functions such as exp or ln; a gas card knows the "
                          "hyperbolic forms.");
    if (rest.length > 1 && rest.at[0] == 'T' && gas_ascii_digit(rest.at[1]))
        return gas_refuse(reader->refusal, WHAT, "T%c is not known; write T^%c for a power.", rest.at[1], rest.at[1]);
    if (rest.at[0] == 't')
        return gas_refuse(reader->refusal, WHAT,
                          "t is not known; write T, and behind the formula \"T in °C\" or (T/1000) where it is meant.");
    return refuse_here(reader, reader->letters ? "a number, T, a constant's letter or '('" : "a number, T or '('");
}

static bool read_parentheses(struct reader *reader, struct gas_sum *sum)
{
    if (++reader->depth > DEPTH)
        return gas_refuse(reader->refusal, WHAT, "parentheses stand more than %d deep; simplify it.", DEPTH);
    if (!read_sum(reader, sum))
        return false;
    reader->depth--;
    return take(reader, ")") || refuse_here(reader, "')'");
}

static bool read_primary(struct reader *reader, struct gas_sum *sum)
{
    size_t used;
    double number;
    char c = next(reader);
    if (take(reader, "("))
        return read_parentheses(reader, sum);
    if (gas_ascii_digit(c) || c == '.' || c == ',') {
        if (!gas_number_parse(reader->rest.at, reader->rest.length, &number, &used))
            return refuse_here(reader, "a number (without spaces or grouping)");
        *sum = gas_sum_of(number, 0);
        advance(reader, used);
        return true;
    }
    used = name_at(reader, reader->rest, sum);
    if (used == 0)
        return reader->rest.length ? refuse_word(reader) : refuse_here(reader, "a number or T");
    advance(reader, used);
    return true;
}

/* Superscript digits, with their minus: "T²", "T⁻¹". */
static bool take_superscript(struct reader *reader, double *power)
{
    static const char *const digit[] = {"\u2070", "\u00b9", "\u00b2", "\u00b3", "\u2074",
                                        "\u2075", "\u2076", "\u2077", "\u2078", "\u2079"};
    const struct gas_piece before = reader->rest;
    bool minus = take(reader, "\u207b"), any = false;
    double value = 0;
    for (int i = 0; i < 10;) {
        bool found = value < 1000 && take(reader, digit[i]);
        value = found ? 10 * value + i : value;
        any |= found;
        i = found ? 0 : i + 1;
    }
    if (!any)
        reader->rest = before;
    *power = minus ? -value : value;
    return any;
}

static bool read_power(struct reader *reader, struct gas_sum *sum);

/* Behind '^': a sign may stand there; T^-2^2 binds to the right. */
static bool read_exponent(struct reader *reader, struct gas_sum *sum)
{
    struct gas_sum power, minus_one = gas_sum_of(-1, 0);
    if (++reader->depth > DEPTH)
        return gas_refuse(reader->refusal, WHAT, "exponents stand more than %d deep; simplify it.", DEPTH);
    bool minus = take_minus(reader);
    if (!minus)
        take(reader, "+");
    if (!read_power(reader, &power) || (minus && !gas_sum_multiply(&power, &minus_one, reader->refusal)))
        return false;
    reader->depth--;
    return gas_sum_raise(sum, &power, reader->refusal);
}

static bool read_power(struct reader *reader, struct gas_sum *sum)
{
    double power;
    if (!read_primary(reader, sum))
        return false;
    if (take_superscript(reader, &power)) {
        struct gas_sum exponent = gas_sum_of(power, 0);
        return gas_sum_raise(sum, &exponent, reader->refusal);
    }
    return take(reader, "^") || take(reader, "**") ? read_exponent(reader, sum) : true;
}

/* A multiplication left out: T, a letter or '(' follows. A '(' before a unit, as in "(J/mol-K)", does not count. */
static bool product_goes_on(struct reader *reader)
{
    struct gas_sum unused;
    struct gas_piece rest;
    if (next(reader) != '(')
        return name_at(reader, reader->rest, &unused) > 0;
    rest = gas_piece_behind(reader->rest, 1);
    return !(rest.length && gas_ascii_letter(rest.at[0])) || name_at(reader, rest, &unused) > 0;
}

static bool take_times(struct reader *reader)
{
    const struct gas_piece before = reader->rest;
    if (take(reader, "**")) {
        reader->rest = before;
        return false;
    }
    return take(reader, "*") || take(reader, "\u00b7") || take(reader, "\u22c5") || take(reader, "\u00d7");
}

static bool read_product(struct reader *reader, struct gas_sum *sum)
{
    bool divided = false;
    if (!read_power(reader, sum))
        return false;
    for (;;) {
        struct gas_sum factor;
        bool times = take_times(reader), over = !times && take(reader, "/");
        if (!times && !over && !product_goes_on(reader))
            return true;
        if (!times && !over && divided)
            return gas_refuse(reader->refusal, WHAT,
                              "a product behind '/' can be read in two ways; write 1/(2 T) or (1/2) T.");
        divided = over;
        if (!read_power(reader, &factor))
            return false;
        if (!(over ? gas_sum_divide(sum, &factor, reader->refusal) : gas_sum_multiply(sum, &factor, reader->refusal)))
            return false;
    }
}

static bool read_sum(struct reader *reader, struct gas_sum *sum)
{
    *sum = (struct gas_sum){0};
    double sign = take_minus(reader) ? -1 : 1;
    if (sign > 0)
        take(reader, "+");
    for (;;) {
        struct gas_sum term;
        if (!read_product(reader, &term) || !gas_sum_add(sum, &term, sign, reader->refusal))
            return false;
        if (take_minus(reader))
            sign = -1;
        else if (take(reader, "+"))
            sign = 1;
        else
            return true;
    }
}

bool gas_expression_read(struct gas_piece text, const struct gas_letter *letter, size_t letters, struct gas_sum *sum,
                         size_t *used, struct gas_refusal *refusal)
{
    struct reader reader = {text, letter, letters, 0, refusal};
    if (refusal->made || !read_sum(&reader, sum))
        return false;
    skip_spaces(&reader);
    if (reader.rest.length && is_function(reader.rest))
        return refuse_word(&reader);
    *used = reader.rest.length ? (size_t)(reader.rest.at - text.at) : text.length;
    return true;
}
