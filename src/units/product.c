/*
 * A plain unit text -> a product of powers of trade units.
 *
 *   unit   = [number] part { [* - . space /] part }      everything after the first / of a level is below the line
 *   part   = name [power] | number [^ power] | ( unit ) [power]
 *   power  = ^3 | ^-1 | 3 | -1                             glued to its name
 */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "units.h"

enum { DEEPEST = 8, PHRASE_WORDS = 4, WORD_TEXT = 48 };

struct reader {
    const char *start, *p;
    struct unit_product *product;
    struct gas_unit_fault *fault;
};

static bool refuse(struct reader *reader, enum gas_unit_status status, const char *from, const char *to,
                   const char *hint)
{
    return gas_unit_refuse(reader->fault, status, from, (size_t)(to - from), hint);
}

static void skip_spaces(struct reader *reader)
{
    while (gas_is_space(*reader->p))
        reader->p++;
}

static const char *after_word(const char *p)
{
    while (gas_is_letter(*p))
        p++;
    return p;
}

/* A power glued to what it raises; 1 when there is none. False: a power that cannot be one. */
static bool read_power(struct reader *reader, int *power, bool *written)
{
    const char *p = reader->p;
    while (gas_is_space(*p))
        p++;
    bool caret = *p == '^';
    p = caret ? p + 1 : reader->p;
    while (caret && (gas_is_space(*p) || *p == '('))
        p++;
    int sign = *p == '-' ? -1 : 1;
    const char *digits = p + (*p == '-' || (caret && *p == '+'));
    *power = 1;
    *written = caret || gas_is_digit(*digits);
    if (!gas_is_digit(*digits))
        return !caret || refuse(reader, GAS_UNIT_SYNTAX, reader->p, digits, "a power is a whole number: m3, m^3, s-1");
    int value = 0;
    for (p = digits; gas_is_digit(*p) && value < 100; p++)
        value = 10 * value + (*p - '0');
    if (value == 0 || value > POWER_LIMIT || (*p == '.' && gas_is_digit(p[1])))
        return refuse(reader, GAS_UNIT_SYNTAX, digits, p, "a power is a whole number from 1 to 12");
    reader->p = caret && *p == ')' && digits[-1 - (sign < 0)] == '(' ? p + 1 : p;
    *power = sign * value;
    return true;
}

static bool add_factor(struct reader *reader, struct unit_name name, enum unit_kind kind, int power)
{
    struct unit_product *product = reader->product;
    if (product->count == PRODUCT_FACTORS)
        return refuse(reader, GAS_UNIT_SYNTAX, reader->start, reader->p, "too many units in one product");
    product->factor[product->count++] = (struct unit_factor){name, kind, power};
    return true;
}

static bool is_amount_or_mass(const struct trade_unit *unit)
{
    const signed char *power = unit->power;
    return power[1] == 0 && power[2] == 0 && power[3] == 0 && power[0] + power[4] == 1;
}

/* "kgK", "molK", "lbF": a mass or an amount and a temperature without anything between. */
static bool split_word(const char *word, struct unit_name *first, struct unit_name *second)
{
    char stem[WORD_TEXT];
    size_t length = strlen(word);
    if (length < 2 || !strchr("KCFR", word[length - 1]))
        return false;
    snprintf(stem, sizeof stem, "%.*s", (int)(length - 1), word);
    return gas_unit_name_find(stem, false, first) == NAME_FOUND && is_amount_or_mass(first->unit) &&
           gas_unit_name_find(word + length - 1, false, second) == NAME_FOUND;
}

/* Words that change the power of the length after them, or nothing. */
static int solid_word(const char *from, const char *to)
{
    static const struct {
        const char *word;
        int power;
    } words[] = {{"cu", 3}, {"cubic", 3}, {"sq", 2}, {"square", 2}};
    for (size_t i = 0; i < sizeof words / sizeof *words; i++)
        if (strlen(words[i].word) == (size_t)(to - from) && gas_same_folded(from, words[i].word, (size_t)(to - from)))
            return words[i].power;
    return 0;
}

struct phrase {
    enum name_found found;
    struct unit_name name;
    char text[PLAIN_TEXT]; /* the words with one space between */
    const char *end;
};

static bool append(char text[PLAIN_TEXT], const char *from, const char *to)
{
    size_t used = strlen(text);
    if (used + (size_t)(to - from) >= PLAIN_TEXT)
        return false;
    memcpy(text + used, from, (size_t)(to - from));
    text[used + (size_t)(to - from)] = '\0';
    return true;
}

/* A name may carry digits or a bracket of its own: Nm3, cal(IT), ton(short). */
static void look_up(struct phrase *best, const char *text, const char *end, bool alone)
{
    char whole[PLAIN_TEXT];
    const char *after[3] = {end, end, end};
    const char *p = end + (*end == '^');
    if (*p == '3' && !gas_is_digit(p[1]))
        after[1] = p + 1;
    const char *open = end;
    while (gas_is_space(*open))
        open++;
    if (*open == '(' && gas_is_letter(open[1]) && *after_word(open + 1) == ')')
        after[2] = after_word(open + 1) + 1;
    for (int i = 0; i < 3; i++) {
        if (i > 0 && after[i] == end)
            continue;
        snprintf(whole, sizeof whole, "%s", text);
        if ((i == 1 && !append(whole, p, after[i])) || (i == 2 && !append(whole, open, after[i])))
            continue;
        struct unit_name name;
        enum name_found found = gas_unit_name_find(whole, alone && !*after[i], &name);
        if (found != NAME_NONE) {
            *best = (struct phrase){.found = found, .name = name, .end = after[i]};
            snprintf(best->text, sizeof best->text, "%s", whole);
        }
    }
}

/* The longest run of words from here that is a name. */
static struct phrase read_phrase(const struct reader *reader, bool alone)
{
    struct phrase best = {.found = NAME_NONE};
    char text[PLAIN_TEXT] = "";
    static const char space[] = " ";
    const char *p = reader->p;
    for (int words = 0; words < PHRASE_WORDS && gas_is_letter(*p); words++) {
        const char *end = after_word(p);
        if ((words > 0 && !append(text, space, space + 1)) || !append(text, p, end))
            break;
        look_up(&best, text, end, alone);
        for (p = end; gas_is_space(*p) || *p == '-' || *p == '*';)
            p++;
        if (p == end)
            break;
    }
    return best;
}

static bool is_length(const struct trade_unit *unit)
{
    static const signed char length[5] = {0, 1, 0, 0, 0};
    return memcmp(unit->power, length, sizeof length) == 0;
}

/* "m3(N)", "m3 (n)", "m3N", "L(N)": marks after a volume. The mark STP and its kin are words of the table. */
static enum unit_kind read_reference_mark(struct reader *reader, const struct trade_unit *unit, int power)
{
    bool volume = unit->power[1] * power == 3 && unit->power[0] == 0 && unit->power[2] == 0 && unit->power[4] == 0;
    const char *p = reader->p;
    if (!volume)
        return unit->kind;
    while (gas_is_space(*p))
        p++;
    bool bracket = *p == '(';
    char mark = p[bracket];
    bool closed = bracket ? p[2] == ')' : p == reader->p && mark && !gas_is_letter(p[1]);
    if (unit->kind != UNIT_PLAIN || !mark || !closed || !strchr(bracket ? "NnSs" : "Nn", mark))
        return unit->kind;
    reader->p = p + (bracket ? 3 : 1);
    return mark == 'N' || mark == 'n' ? UNIT_NORMAL : UNIT_STANDARD;
}

static bool unknown_name(struct reader *reader, const char *from, const char *to)
{
    char word[PLAIN_TEXT] = "", hint[sizeof reader->fault->hint] = "";
    append(word, from, to);
    if (reader->fault)
        gas_unit_name_nearest(word, hint, sizeof hint);
    return refuse(reader, GAS_UNIT_UNKNOWN, from, to, hint);
}

static bool ambiguous_name(struct reader *reader, const struct phrase *phrase)
{
    char hint[sizeof reader->fault->hint] = "";
    gas_unit_name_choices(phrase->text, hint, sizeof hint);
    return refuse(reader, GAS_UNIT_AMBIGUOUS, reader->p, phrase->end, hint);
}

static bool raise_and_add(struct reader *reader, const struct phrase *phrase, int solid, int sign, bool below)
{
    int power;
    bool written;
    reader->p = phrase->end;
    if (!read_power(reader, &power, &written))
        return false;
    if (below && power < 0)
        return refuse(reader, GAS_UNIT_SYNTAX, phrase->end, reader->p,
                      "a negative power below the line: write kJ/(kg K) or kJ kg-1 K-1");
    if (solid > 0 && (written || !is_length(phrase->name.unit)))
        return refuse(reader, GAS_UNIT_SYNTAX, phrase->end, reader->p, "cubic and square stand before a length");
    power *= solid > 0 ? solid : 1;
    enum unit_kind kind = read_reference_mark(reader, phrase->name.unit, power);
    return add_factor(reader, phrase->name, kind, sign * power);
}

/* "kgK", "molK", "lbF" with a capital behind small letters; "lbF" is not lbf, "KGF" is not a glued word. */
static const char *glued_word(const char *from, struct unit_name *first, struct unit_name *second)
{
    char word[PLAIN_TEXT] = "";
    const char *to = after_word(from);
    bool small = to - from >= 2 && to - from < WORD_TEXT && to[-2] >= 'a' && to[-2] <= 'z';
    return small && append(word, from, to) && split_word(word, first, second) ? to : NULL;
}

static bool read_name(struct reader *reader, int sign, bool below)
{
    const char *from = reader->p;
    struct unit_name first, second;
    const char *glued = glued_word(from, &first, &second);
    if (glued) {
        reader->p = glued;
        return add_factor(reader, first, first.unit->kind, sign) && add_factor(reader, second, second.unit->kind, sign);
    }
    struct phrase phrase = read_phrase(reader, from == reader->start);
    int solid = phrase.found == NAME_NONE ? solid_word(from, after_word(from)) : 0;
    if (solid > 0) {
        reader->p = after_word(from);
        while (gas_is_space(*reader->p) || *reader->p == '-' || *reader->p == '*')
            reader->p++;
        phrase = read_phrase(reader, false);
    }
    if (phrase.found == NAME_AMBIGUOUS)
        return ambiguous_name(reader, &phrase);
    if (phrase.found == NAME_FOUND)
        return raise_and_add(reader, &phrase, solid, sign, below);
    return unknown_name(reader, from, after_word(from));
}

static bool read_number(struct reader *reader, int sign)
{
    double number;
    size_t used;
    int power;
    bool written = false;
    const char *from = reader->p, *end = from;
    while (gas_is_digit(*end) || *end == '.')
        end++;
    if ((*end == 'e' || *end == 'E') && gas_is_digit(end[1 + (end[1] == '-' || end[1] == '+')]))
        for (end += 2; gas_is_digit(*end);)
            end++;
    if (!gas_number_parse(from, (size_t)(end - from), &number, &used) || !(number > 0.0))
        return refuse(reader, GAS_UNIT_SYNTAX, from, end, "not a number");
    reader->p = end;
    if ((*end == '^' && !read_power(reader, &power, &written)) || gas_is_digit(*reader->p))
        return refuse(reader, GAS_UNIT_SYNTAX, from, end, "not a number");
    reader->product->number *= pow(number, sign * (written ? power : 1));
    return true;
}

static bool read_level(struct reader *reader, int sign, int depth);

static bool read_group(struct reader *reader, int sign, bool below, int depth)
{
    const char *open = reader->p++;
    struct unit_product *product = reader->product;
    int before = product->count, power;
    double number = product->number;
    bool written;
    if (depth == DEEPEST)
        return refuse(reader, GAS_UNIT_SYNTAX, open, open + 1, "too many parentheses");
    product->number = 1.0;
    if (!read_level(reader, sign, depth + 1))
        return false;
    if (*reader->p != ')')
        return refuse(reader, GAS_UNIT_SYNTAX, open, reader->p, "a parenthesis is not closed");
    reader->p++;
    if (!read_power(reader, &power, &written))
        return false;
    if (below && power < 0)
        return refuse(reader, GAS_UNIT_SYNTAX, open, reader->p, "a negative power below the line");
    for (int i = before; i < product->count; i++) {
        product->factor[i].power *= power;
        if (abs(product->factor[i].power) > POWER_LIMIT)
            return refuse(reader, GAS_UNIT_SYNTAX, open, reader->p, "a power is a whole number from 1 to 12");
    }
    product->number = number * pow(product->number, power);
    return true;
}

static bool read_part(struct reader *reader, int sign, bool below, bool first, int depth)
{
    char c = *reader->p;
    if (c == '(')
        return read_group(reader, sign, below, depth);
    if (gas_is_letter(c))
        return read_name(reader, sign, below);
    if ((gas_is_digit(c) || (c == '.' && gas_is_digit(reader->p[1]))) && first)
        return read_number(reader, sign);
    return refuse(reader, GAS_UNIT_SYNTAX, reader->p, reader->p + (c != '\0'),
                  c ? "a unit was expected here" : "the unit ends too early");
}

static bool is_per(const char *p)
{
    return gas_same_folded(p, "per", strnlen(p, 3)) && strnlen(p, 3) == 3 && !gas_is_letter(p[3]) && p[3] &&
           !gas_is_digit(p[3]);
}

/* The operator before the next part, one of space, *, - and /. Returned: is it the line? */
static bool read_operator(struct reader *reader)
{
    skip_spaces(reader);
    char c = *reader->p;
    bool per = is_per(reader->p);
    if (per)
        reader->p += 3;
    else if (c == '/' || c == '*' || c == '-')
        reader->p++;
    skip_spaces(reader);
    return per || c == '/';
}

/* One level up to its end or closing parenthesis. `sign` is -1 below an outer line. */
static bool read_level(struct reader *reader, int sign, int depth)
{
    bool below = false, first = true;
    skip_spaces(reader);
    do {
        bool slash = !first && read_operator(reader);
        below |= slash;
        if (!read_part(reader, below ? -sign : sign, below, first || slash, depth))
            return false;
        first = false;
        skip_spaces(reader);
    } while (*reader->p && *reader->p != ')');
    return true;
}

/* "kg/cm2" and "lb/in2" are always meant as a force on an area. */
static void settle_force(struct unit_product *product)
{
    struct unit_factor *mass = &product->factor[0], *area = &product->factor[1];
    if (product->count != 2 || mass->power != 1 || area->power * area->name.unit->power[1] != -2)
        return;
    bool only_length = !area->name.unit->power[0] && !area->name.unit->power[2] && !area->name.unit->power[4];
    bool kilogram = mass->name.prefix && mass->name.prefix->symbol[0] == 'k' && !strcmp(mass->name.unit->symbol, "g");
    bool pound = !mass->name.prefix && !strcmp(mass->name.unit->symbol, "lb");
    if (only_length && (kilogram || pound))
        gas_unit_name_find(kilogram ? "kgf" : "lbf", false, &mass->name);
}

bool gas_product_parse(const char *plain, struct unit_product *product, struct gas_unit_fault *fault)
{
    *product = (struct unit_product){.number = 1.0};
    struct reader reader = {plain, plain, product, fault};
    skip_spaces(&reader);
    if (reader.p[0] == '-' && !reader.p[1]) { /* a dash in a unit column: a plain number */
        product->count = gas_unit_name_find("-", true, &product->factor[0].name) == NAME_FOUND;
        product->factor[0].power = 1;
        return product->count == 1;
    }
    reader.start = reader.p;
    if (!read_level(&reader, 1, 0))
        return false;
    if (*reader.p)
        return refuse(&reader, GAS_UNIT_SYNTAX, reader.p, reader.p + 1, "a parenthesis is closed that was not opened");
    settle_force(product);
    return true;
}
