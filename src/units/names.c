/* A word or a phrase -> a row of the table of trade units, with its prefix. */
#include <pthread.h>
#include <stdio.h>
#include <string.h>

#include "units.h"

enum { NAME_TEXT = 48, HITS = 4 };

/* How strictly a word is read: symbols as printed; then words, in any case; then symbols in any case. */
enum pass { PASS_SYMBOL, PASS_WORD, PASS_FOLDED, PASSES };

struct hits {
    struct unit_name name[HITS];
    int count;
};

struct listed { /* one name of the table; the texts stay where they are */
    const struct trade_unit *unit;
    const char *text;
    size_t length;
    bool word; /* after the semicolon */
};

enum { LISTED_MOST = 1024 };

static struct {
    pthread_once_t once;
    size_t count;
    struct listed name[LISTED_MOST];
} list = {.once = PTHREAD_ONCE_INIT};

static void list_row(const struct trade_unit *unit)
{
    bool word = false;
    for (const char *p = unit->names; *p && list.count < LISTED_MOST;) {
        size_t length = strcspn(p, ",;");
        if (length > 0 && length < NAME_TEXT)
            list.name[list.count++] = (struct listed){unit, p, length, word};
        p += length;
        word |= *p == ';';
        p += *p != '\0';
    }
}

static void make_list(void)
{
    for (size_t i = 0; i < gas_trade_unit_count; i++)
        list_row(&gas_trade_units[i]);
}

static size_t listed_names(void)
{
    pthread_once(&list.once, make_list);
    return list.count;
}

static void add_hit(struct hits *hits, const struct trade_unit *unit, const struct unit_prefix *prefix)
{
    for (int i = 0; i < hits->count; i++)
        if (hits->name[i].unit == unit && hits->name[i].prefix == prefix)
            return;
    if (hits->count < HITS)
        hits->name[hits->count++] = (struct unit_name){unit, prefix};
}

static bool one_case(const char *word)
{
    bool upper = false, lower = false;
    for (; *word; word++) {
        upper |= *word >= 'A' && *word <= 'Z';
        lower |= *word >= 'a' && *word <= 'z';
    }
    return !(upper && lower);
}

/* Milli and mega differ by case alone: a folded reading may turn one into the other only in a word that shows no case
 * at all ("MBAR"), never in "Mbar". */
static bool prefix_fits(const struct unit_prefix *prefix, const char *word, enum pass pass)
{
    char sign = prefix->symbol[0];
    if (pass == PASS_SYMBOL || word[0] == sign)
        return word[0] == sign;
    return gas_lower(word[0]) == gas_lower(sign) && (gas_lower(sign) != 'm' || one_case(word));
}

static bool symbol_fits(const struct listed *name, const char *word, enum pass pass)
{
    return pass == PASS_SYMBOL ? memcmp(word, name->text, name->length) == 0
                               : gas_same_folded(word, name->text, name->length);
}

static void try_symbol(struct hits *hits, const struct listed *name, const char *word, size_t length, enum pass pass)
{
    if (length == name->length && symbol_fits(name, word, pass))
        add_hit(hits, name->unit, NULL);
    if (length != name->length + 1 || !name->unit->prefixes[0] || !symbol_fits(name, word + 1, pass))
        return;
    for (size_t i = 0; i < gas_unit_prefix_count; i++) {
        const struct unit_prefix *prefix = &gas_unit_prefixes[i];
        if (strchr(name->unit->prefixes, prefix->symbol[0]) && prefix_fits(prefix, word, pass))
            add_hit(hits, name->unit, prefix);
    }
}

static bool word_fits(const struct listed *name, const char *word, size_t length)
{
    if (length == name->length + 1 && gas_lower(word[length - 1]) == 's' && name->length > 1)
        length--;
    return length == name->length && gas_same_folded(word, name->text, length);
}

static void try_word(struct hits *hits, const struct listed *name, const char *word, size_t length)
{
    if (word_fits(name, word, length))
        add_hit(hits, name->unit, NULL);
    for (size_t i = 0; name->unit->prefixes[0] && i < gas_unit_prefix_count; i++) {
        const struct unit_prefix *prefix = &gas_unit_prefixes[i];
        size_t skip = strlen(prefix->word);
        if (strchr(name->unit->prefixes, prefix->symbol[0]) && length > skip &&
            gas_same_folded(word, prefix->word, skip) && word_fits(name, word + skip, length - skip))
            add_hit(hits, name->unit, prefix);
    }
}

static void collect(struct hits *hits, const char *word, enum pass pass, bool alone)
{
    size_t length = strlen(word), count = listed_names();
    hits->count = 0;
    if (pass == PASS_FOLDED && alone && length == 1)
        return; /* a single letter alone says too little to forgive its case */
    for (size_t i = 0; i < count; i++) {
        const struct listed *name = &list.name[i];
        if (name->word && pass == PASS_WORD)
            try_word(hits, name, word, length);
        else if (!name->word && pass != PASS_WORD)
            try_symbol(hits, name, word, length, pass);
    }
}

/* Of several folded readings: one that is no warning row, and in capitals mega before milli ("MPA", "MW"). */
static void narrow(struct hits *hits, const char *word)
{
    struct hits sure = {.count = 0}, mega = {.count = 0};
    for (int i = 0; i < hits->count; i++) {
        const struct unit_name *name = &hits->name[i];
        if (name->unit->kind != UNIT_AMBIGUOUS)
            add_hit(&sure, name->unit, name->prefix);
        if (word[0] == 'M' && name->prefix && name->prefix->symbol[0] == 'M')
            add_hit(&mega, name->unit, name->prefix);
    }
    if (mega.count == 1)
        *hits = mega;
    else if (sure.count > 0)
        *hits = sure;
}

enum name_found gas_unit_name_find(const char *word, bool alone, struct unit_name *name)
{
    struct hits hits = {.count = 0};
    if (!word[0])
        return NAME_NONE;
    for (enum pass pass = PASS_SYMBOL; pass < PASSES && hits.count == 0; pass++) {
        collect(&hits, word, pass, alone);
        if (pass == PASS_FOLDED && hits.count > 1)
            narrow(&hits, word);
    }
    if (hits.count == 0)
        return NAME_NONE;
    *name = hits.name[0];
    return hits.count > 1 || name->unit->kind == UNIT_AMBIGUOUS ? NAME_AMBIGUOUS : NAME_FOUND;
}

static void written(const struct unit_name *name, char *text, size_t size)
{
    const char *first = name->unit->names;
    snprintf(text, size, "%s%.*s", name->prefix ? name->prefix->symbol : "", (int)strcspn(first, ",;"), first);
}

/* What an ambiguous word may mean. */
void gas_unit_name_choices(const char *word, char *hint, size_t size)
{
    struct hits hits;
    for (enum pass pass = PASS_SYMBOL; pass < PASSES; pass++) {
        collect(&hits, word, pass, false);
        if (hits.count > 0)
            break;
    }
    if (hits.count == 1) {
        snprintf(hint, size, "%s", hits.name[0].unit->source);
    } else if (hits.count > 1) {
        char a[NAME_TEXT + 2], b[NAME_TEXT + 2];
        written(&hits.name[0], a, sizeof a);
        written(&hits.name[1], b, sizeof b);
        snprintf(hint, size, "write %s or %s", a, b);
    }
}

struct nearest {
    char text[2][NAME_TEXT];
    int distance;
    int count;
};

static void consider(struct nearest *nearest, const char *word, size_t length, const char *prefix,
                     const struct listed *name)
{
    char text[NAME_TEXT];
    size_t whole = strlen(prefix) + name->length;
    if (whole >= NAME_TEXT || (whole > length ? whole - length : length - whole) > (size_t)nearest->distance)
        return;
    snprintf(text, sizeof text, "%s%.*s", prefix, (int)name->length, name->text);
    int distance = gas_edit_distance(word, text, nearest->distance);
    if (distance > nearest->distance)
        return;
    if (distance < nearest->distance)
        nearest->count = 0;
    nearest->distance = distance;
    if (nearest->count < 2 && !(nearest->count == 1 && strcmp(nearest->text[0], text) == 0))
        snprintf(nearest->text[nearest->count++], NAME_TEXT, "%s", text);
}

void gas_unit_name_nearest(const char *word, char *hint, size_t size)
{
    size_t length = strlen(word), count = length < NAME_TEXT ? listed_names() : 0;
    struct nearest nearest = {.distance = length < 2 ? 0 : length < 6 ? 1 : 2};
    for (size_t i = 0; i < count; i++) {
        const struct listed *name = &list.name[i];
        if (name->unit->kind == UNIT_AMBIGUOUS)
            continue;
        consider(&nearest, word, length, "", name);
        for (size_t k = 0; name->unit->prefixes[0] && k < gas_unit_prefix_count; k++)
            if (strchr(name->unit->prefixes, gas_unit_prefixes[k].symbol[0]))
                consider(&nearest, word, length, name->word ? gas_unit_prefixes[k].word : gas_unit_prefixes[k].symbol,
                         name);
    }
    if (nearest.count == 1)
        snprintf(hint, size, "perhaps %s is meant", nearest.text[0]);
    else if (nearest.count == 2)
        snprintf(hint, size, "perhaps %s or %s is meant", nearest.text[0], nearest.text[1]);
    else
        snprintf(hint, size, "write one such as bar(g), kPa, °C, kg/h or kJ/kg-K");
}
