#include <math.h>
#include <stdbool.h>
#include <string.h>

#include <gasleaf/species.h>

enum { KEY = 64 }; /* longer than any name; a longer text is no name */

/* ---- the common spelling of a text ----------------------------------------------------------------------- */

/* Bytes of UTF-8 that stand for a subscript digit, a kind of hyphen or a kind of space. */
static size_t special(const char *text, size_t left, char *made)
{
    const unsigned char *u = (const unsigned char *)text;
    *made = 0;
    if (left >= 2 && u[0] == 0xC2 && (u[1] == 0xA0 || u[1] == 0xAD)) /* no-break space, soft hyphen */
        return 2;
    if (left < 3 || u[0] != 0xE2)
        return 0;
    if (u[1] == 0x82 && u[2] >= 0x80 && u[2] <= 0x89) { /* U+2080 to U+2089 */
        *made = (char)('0' + u[2] - 0x80);
        return 3;
    }
    return (u[1] == 0x80 && u[2] >= 0x80 && u[2] <= 0x95) || (u[1] == 0x88 && u[2] == 0x92) ? 3 : 0;
}

/* The next character as it counts: 0 for one that does not matter, in lower case unless keep_case. Bytes taken. */
static size_t counted(const char *text, size_t left, bool keep_case, char *made)
{
    size_t taken = special(text, left, made);
    if (taken)
        return taken;
    char c = text[0];
    if (c == ' ' || c == '-' || c == '_' || c == '(' || c == ')' || c == '\t' || c == '\r' || c == '\n')
        c = 0;
    *made = !keep_case && c >= 'A' && c <= 'Z' ? (char)(c - 'A' + 'a') : c;
    return 1;
}

/* Writes the text without what does not matter, as it is (keep_case) or in lower case; 0 when it does not fit. */
static size_t spelt(const char *text, size_t length, bool keep_case, char key[KEY])
{
    size_t used = 0;
    for (size_t i = 0; i < length;) {
        char c;
        i += counted(text + i, length - i, keep_case, &c);
        if (c && used + 1 >= KEY)
            return 0;
        if (c)
            key[used++] = c;
    }
    key[used] = 0;
    return used;
}

/* ---- the names of a species ------------------------------------------------------------------------------ */

/* Is a text the one of a key (which is not empty)? Stops at the first difference: a search looks at every name. */
static bool same(const char *key, const char *text, size_t length, bool keep_case)
{
    for (size_t i = 0; i < length;) {
        char c;
        i += counted(text + i, length - i, keep_case, &c);
        if (c && c != *key++)
            return false;
    }
    return *key == 0;
}

/* Calls back with each alias of a list "a|b|c" by moving a cursor. */
static const char *next_alias(const char **cursor, size_t *length)
{
    const char *alias = *cursor;
    *length = strcspn(alias, "|");
    *cursor = alias + *length + (alias[*length] == '|');
    return *length ? alias : NULL;
}

static bool is_alias(const struct gas_species *species, const char *key, bool keep_case)
{
    const char *cursor = species->aliases, *alias;
    size_t length;
    while ((alias = next_alias(&cursor, &length)))
        if (same(key, alias, length, keep_case))
            return true;
    return false;
}

/* A free atom: a single atom that does not boil as such, unlike argon. */
static bool is_atom(const struct gas_species *species)
{
    return species->element[0].count == 1 && species->element[1].count == 0 && isnan(species->boiling_point);
}

/* ---- finding --------------------------------------------------------------------------------------------- */

/* The one species of a formula; NULL when several isomers share it. */
static const struct gas_species *by_formula(const char *key, bool keep_case)
{
    const struct gas_species *found = NULL, *species;
    for (size_t i = 0; (species = gas_species_at(i)); i++) {
        if (!keep_case && is_atom(species))
            continue;
        if (!same(key, species->formula, strlen(species->formula), keep_case))
            continue;
        if (found)
            return NULL;
        found = species;
    }
    return found;
}

static const struct gas_species *by_name(const char *key)
{
    const struct gas_species *species;
    for (size_t i = 0; (species = gas_species_at(i)); i++)
        if (same(key, species->name, strlen(species->name), false) || is_alias(species, key, false) ||
            same(key, species->cas, strlen(species->cas), false))
            return species;
    return NULL;
}

const struct gas_species *gas_species_find(const char *text, size_t length)
{
    char as_written[KEY], lower[KEY];
    if (!spelt(text, length, true, as_written) || !spelt(text, length, false, lower))
        return NULL;
    const struct gas_species *found = by_formula(as_written, true);
    if (!found)
        found = by_name(lower);
    return found ? found : by_formula(lower, false);
}

/* ---- near misses ----------------------------------------------------------------------------------------- */

static unsigned least(unsigned a, unsigned b)
{
    return a < b ? a : b;
}

/* Damerau-Levenshtein distance: letters added, dropped, changed, or two neighbours swapped. */
static unsigned distance(const char *a, const char *b)
{
    unsigned rows[3][KEY + 1], *above = rows[0], *before = rows[1], *row = rows[2];
    size_t wide = strlen(b);
    for (size_t j = 0; j <= wide; j++)
        above[j] = before[j] = (unsigned)j;
    for (size_t i = 1; a[i - 1]; i++) {
        row[0] = (unsigned)i;
        for (size_t j = 1; j <= wide; j++) {
            row[j] = least(least(before[j], row[j - 1]) + 1, before[j - 1] + (a[i - 1] != b[j - 1]));
            if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1])
                row[j] = least(row[j], above[j - 2] + 1);
        }
        unsigned *spare = above;
        above = before, before = row, row = spare;
    }
    return before[wide];
}

static unsigned away_from(const char *key, const char *text, size_t length)
{
    char other[KEY];
    size_t size = strlen(key);
    if (!spelt(text, length, false, other))
        return KEY;
    unsigned away = distance(key, other);
    return size >= 3 && strncmp(key, other, size) == 0 ? least(away, 1) : away;
}

static unsigned away_from_species(const char *key, const struct gas_species *species)
{
    unsigned away = away_from(key, species->name, strlen(species->name));
    const char *cursor = species->aliases, *alias;
    size_t length;
    while ((alias = next_alias(&cursor, &length)))
        away = least(away, away_from(key, alias, length));
    return is_atom(species) ? away : least(away, away_from(key, species->formula, strlen(species->formula)));
}

size_t gas_species_nearest(const char *text, size_t length, const struct gas_species **found, size_t most)
{
    enum { MOST = 16 };
    unsigned away[MOST];
    size_t count = 0;
    char key[KEY];
    size_t size = spelt(text, length, false, key);
    const struct gas_species *species;
    if (size == 0)
        return 0;
    most = most < MOST ? most : MOST;
    for (size_t i = 0; (species = gas_species_at(i)); i++) {
        unsigned here = away_from_species(key, species);
        if (here > (size < 3 ? 1 : size / 3))
            continue;
        size_t at = count;
        while (at > 0 && away[at - 1] > here)
            at--;
        if (at >= most)
            continue;
        count = count < most ? count + 1 : most;
        for (size_t j = count - 1; j > at; j--)
            found[j] = found[j - 1], away[j] = away[j - 1];
        found[at] = species, away[at] = here;
    }
    return count;
}
