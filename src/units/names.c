/* A word or a phrase -> a row of the table of trade units, with its prefix. */
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

struct name_cursor {
    const char *next;
    char text[NAME_TEXT];
    size_t length;
    bool word; /* after the semicolon */
};

static struct name_cursor names_of(const struct trade_unit *unit)
{
    struct name_cursor cursor = {.next = unit->names};
    return cursor;
}

static bool next_name(struct name_cursor *cursor)
{
    while (*cursor->next == ';' || *cursor->next == ',') {
        cursor->word |= *cursor->next == ';';
        cursor->next++;
    }
    size_t length = strcspn(cursor->next, ",;");
    if (length == 0 || length >= NAME_TEXT)
        return false;
    memcpy(cursor->text, cursor->next, length);
    cursor->text[length] = '\0';
    cursor->length = length;
    cursor->next += length;
    return true;
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

static bool symbol_fits(const struct name_cursor *name, const char *word, enum pass pass)
{
    if (strlen(word) != name->length)
        return false;
    return pass == PASS_SYMBOL ? memcmp(word, name->text, name->length) == 0
                               : gas_same_folded(word, name->text, name->length);
}

static void try_symbol(struct hits *hits, const struct trade_unit *unit, const struct name_cursor *name,
                       const char *word, enum pass pass)
{
    if (symbol_fits(name, word, pass))
        add_hit(hits, unit, NULL);
    for (size_t i = 0; i < gas_unit_prefix_count && word[0]; i++) {
        const struct unit_prefix *prefix = &gas_unit_prefixes[i];
        if (strchr(unit->prefixes, prefix->symbol[0]) && prefix_fits(prefix, word, pass) &&
            symbol_fits(name, word + 1, pass))
            add_hit(hits, unit, prefix);
    }
}

static bool word_fits(const struct name_cursor *name, const char *word)
{
    size_t length = strlen(word);
    if (length == name->length + 1 && gas_lower(word[length - 1]) == 's' && name->length > 1)
        length--;
    return length == name->length && gas_same_folded(word, name->text, length);
}

static void try_word(struct hits *hits, const struct trade_unit *unit, const struct name_cursor *name, const char *word)
{
    if (word_fits(name, word))
        add_hit(hits, unit, NULL);
    for (size_t i = 0; i < gas_unit_prefix_count; i++) {
        const struct unit_prefix *prefix = &gas_unit_prefixes[i];
        size_t length = strlen(prefix->word);
        if (strchr(unit->prefixes, prefix->symbol[0]) && strlen(word) > length &&
            gas_same_folded(word, prefix->word, length) && word_fits(name, word + length))
            add_hit(hits, unit, prefix);
    }
}

static void collect(struct hits *hits, const char *word, enum pass pass, bool alone)
{
    hits->count = 0;
    if (pass == PASS_FOLDED && alone && !word[1])
        return; /* a single letter alone says too little to forgive its case */
    for (size_t i = 0; i < gas_trade_unit_count; i++) {
        const struct trade_unit *unit = &gas_trade_units[i];
        for (struct name_cursor name = names_of(unit); next_name(&name);) {
            if (name.word && pass == PASS_WORD)
                try_word(hits, unit, &name, word);
            else if (!name.word && pass != PASS_WORD)
                try_symbol(hits, unit, &name, word, pass);
        }
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
    struct name_cursor first = names_of(name->unit);
    next_name(&first);
    snprintf(text, size, "%s%s", name->prefix ? name->prefix->symbol : "", first.text);
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

static void consider(struct nearest *nearest, const char *word, const char *text)
{
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
    size_t length = strlen(word);
    struct nearest nearest = {.distance = length < 2 ? 0 : length < 6 ? 1 : 2};
    for (size_t i = 0; i < gas_trade_unit_count && length < NAME_TEXT; i++) {
        const struct trade_unit *unit = &gas_trade_units[i];
        for (struct name_cursor name = names_of(unit); unit->kind != UNIT_AMBIGUOUS && next_name(&name);) {
            consider(&nearest, word, name.text);
            for (size_t k = 0; k < gas_unit_prefix_count; k++) {
                char whole[NAME_TEXT + 8];
                const struct unit_prefix *prefix = &gas_unit_prefixes[k];
                snprintf(whole, sizeof whole, "%s%s", name.word ? prefix->word : prefix->symbol, name.text);
                if (strchr(unit->prefixes, prefix->symbol[0]) && strlen(whole) < NAME_TEXT)
                    consider(&nearest, word, whole);
            }
        }
    }
    if (nearest.count == 1)
        snprintf(hint, size, "did you mean %s?", nearest.text[0]);
    else if (nearest.count == 2)
        snprintf(hint, size, "did you mean %s or %s?", nearest.text[0], nearest.text[1]);
    else
        snprintf(hint, size, "no such unit is known");
}
