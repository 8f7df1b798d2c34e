/* Species by any of their names. All names are spelt in the common way once, at the first look-up. */
#include <math.h>
#include <pthread.h>
#include <stdbool.h>
#include <stdint.h>
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

/* ---- the names, spelt once ------------------------------------------------------------------------------- */

enum { NAMES = 1536 };

struct name {
    const struct gas_species *species;
    const char *text; /* a formula as the table has it; NULL where case never matters */
    bool cas;         /* a number: nothing is near to it */
    size_t length;
    char lower[KEY];
};

/* In the order of the species; the hashes lie by themselves, so that a look-up reads little memory. */
static struct name names[NAMES];
static uint32_t lower_hash[NAMES];
static size_t name_count;
static pthread_once_t names_once = PTHREAD_ONCE_INIT;

static uint32_t hash_of(const char *key)
{
    uint32_t hash = 2166136261U; /* FNV-1a */
    for (; *key; key++)
        hash = (hash ^ (unsigned char)*key) * 16777619U;
    return hash;
}

enum kind { NAME, FORMULA, CAS };

static void add_name(const struct gas_species *species, const char *text, size_t length, enum kind kind)
{
    struct name *name = &names[name_count];
    if (name_count == NAMES)
        return; /* tests/data walks all names: none is lost */
    name->length = spelt(text, length, false, name->lower);
    if (name->length == 0)
        return;
    name->species = species;
    name->text = kind == FORMULA ? text : NULL;
    name->cas = kind == CAS;
    lower_hash[name_count++] = hash_of(name->lower);
}

static void add_species(const struct gas_species *species)
{
    add_name(species, species->formula, strlen(species->formula), FORMULA);
    add_name(species, species->name, strlen(species->name), NAME);
    add_name(species, species->cas, strlen(species->cas), CAS);
    for (const char *alias = species->aliases; *alias;) {
        size_t length = strcspn(alias, "|");
        add_name(species, alias, length, NAME);
        alias += length + (alias[length] == '|');
    }
}

static void add_names(void)
{
    const struct gas_species *species;
    for (size_t i = 0; (species = gas_species_at(i)); i++)
        add_species(species);
}

/* A free atom: a single atom that does not boil as such, unlike argon. */
static bool is_atom(const struct gas_species *species)
{
    return species->element[0].count == 1 && species->element[1].count == 0 && isnan(species->boiling_point);
}

/* ---- finding --------------------------------------------------------------------------------------------- */

static bool same_case(const char *formula, const char *key)
{
    char other[KEY];
    return spelt(formula, strlen(formula), true, other) && strcmp(key, other) == 0;
}

/* The one species of a formula; NULL when several isomers share it. as_written: NULL when case does not matter. */
static const struct gas_species *by_formula(const char *lower, uint32_t hash, const char *as_written)
{
    const struct gas_species *found = NULL;
    for (size_t i = 0; i < name_count; i++) {
        const struct name *name = &names[i];
        if (lower_hash[i] != hash || !name->text || strcmp(name->lower, lower) != 0)
            continue;
        if (as_written ? !same_case(name->text, as_written) : is_atom(name->species))
            continue;
        if (found)
            return NULL;
        found = name->species;
    }
    return found;
}

static const struct gas_species *by_name(const char *lower, uint32_t hash)
{
    for (size_t i = 0; i < name_count; i++)
        if (lower_hash[i] == hash && !names[i].text && strcmp(names[i].lower, lower) == 0)
            return names[i].species;
    return NULL;
}

const struct gas_species *gas_species_find(const char *text, size_t length)
{
    char as_written[KEY], lower[KEY];
    if (!spelt(text, length, true, as_written) || !spelt(text, length, false, lower))
        return NULL;
    pthread_once(&names_once, add_names);
    uint32_t hash = hash_of(lower);
    const struct gas_species *found = by_formula(lower, hash, as_written);
    if (!found)
        found = by_name(lower, hash);
    return found ? found : by_formula(lower, hash, NULL);
}

/* ---- near misses ----------------------------------------------------------------------------------------- */

static unsigned least(unsigned a, unsigned b)
{
    return a < b ? a : b;
}

/* Damerau-Levenshtein distance: letters added, dropped, changed, or two neighbours swapped. KEY when more than `most`
 * is certain: a letter of a further on never brings it below the least of two rows. */
static unsigned distance(const char *a, const char *b, unsigned most)
{
    unsigned rows[3][KEY + 1], *above = rows[0], *before = rows[1], *row = rows[2];
    size_t wide = strlen(b);
    for (size_t j = 0; j <= wide; j++)
        above[j] = before[j] = (unsigned)j;
    for (size_t i = 1; a[i - 1]; i++) {
        row[0] = (unsigned)i;
        unsigned lowest = row[0];
        for (size_t j = 1; j <= wide; j++) {
            row[j] = least(least(before[j], row[j - 1]) + 1, before[j - 1] + (a[i - 1] != b[j - 1]));
            if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1])
                row[j] = least(row[j], above[j - 2] + 1);
            lowest = least(lowest, row[j]);
        }
        if (lowest > most + 1)
            return KEY;
        unsigned *spare = above;
        above = before, before = row, row = spare;
    }
    return before[wide];
}

/* KEY when it is more than `most`. */
static unsigned away_from(const char *key, size_t size, const struct name *name, unsigned most)
{
    bool begins = size >= 3 && strncmp(key, name->lower, size) == 0;
    size_t apart = size > name->length ? size - name->length : name->length - size;
    if (begins)
        return least(distance(key, name->lower, KEY), 1);
    return apart > most ? KEY : distance(key, name->lower, most);
}

/* The nearest of a species' names; *at moves on to the next species. */
static unsigned away_from_species(const char *key, size_t size, size_t *at, unsigned most)
{
    const struct gas_species *species = names[*at].species;
    unsigned away = KEY;
    for (; *at < name_count && names[*at].species == species; ++*at) {
        const struct name *name = &names[*at];
        if (!name->cas && !(name->text && is_atom(species)))
            away = least(away, away_from(key, size, name, most));
    }
    return away;
}

size_t gas_species_nearest(const char *text, size_t length, const struct gas_species **found, size_t most)
{
    enum { MOST = 16 };
    unsigned away[MOST];
    size_t count = 0;
    char key[KEY];
    size_t size = spelt(text, length, false, key);
    unsigned farthest = size < 3 ? 1 : (unsigned)size / 3;
    if (size == 0)
        return 0;
    most = most < MOST ? most : MOST;
    pthread_once(&names_once, add_names);
    for (size_t i = 0; i < name_count;) {
        const struct gas_species *species = names[i].species;
        unsigned here = away_from_species(key, size, &i, farthest);
        if (here > farthest)
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
