/* The label of a heading: words and symbols -> a quantity, a state, a basis. */
#include <stdio.h>
#include <string.h>

#include "headings.h"
#include "units.h"

enum { WORDS = 10, WORD_SIZE = 32 };

struct words {
    int count;
    char word[WORDS][WORD_SIZE];
};

struct meaning { /* words that say something beside the quantity */
    const char *word;
    int state;
    int basis; /* enum gas_pressure_basis + 1 */
    bool filler;
};

/* clang-format off */
static const struct meaning meanings[] = {
    {"inlet", 1, 0, false}, {"in", 1, 0, false}, {"suction", 1, 0, false}, {"start", 1, 0, false}, {"initial", 1, 0, false},
    {"starting", 1, 0, false}, {"entry", 1, 0, false},
    {"outlet", 2, 0, false}, {"out", 2, 0, false}, {"discharge", 2, 0, false}, {"end", 2, 0, false}, {"final", 2, 0, false},
    {"exit", 2, 0, false}, {"delivery", 2, 0, false},
    {"absolute", 0, GAS_ABSOLUTE + 1, false}, {"abs", 0, GAS_ABSOLUTE + 1, false},
    {"gauge", 0, GAS_GAUGE + 1, false}, {"gage", 0, GAS_GAUGE + 1, false},
    {"vacuum", 0, GAS_VACUUM + 1, false}, {"vac", 0, GAS_VACUUM + 1, false},
    {"at", 0, 0, true}, {"of", 0, 0, true}, {"the", 0, 0, true}, {"state", 0, 0, true}, {"point", 0, 0, true},
    {"gas", 0, 0, true}, {"air", 0, 0, true}, {"vessel", 0, 0, true}, {"receiver", 0, 0, true}, {"tank", 0, 0, true},
    {"cylinder", 0, 0, true}, {"bottle", 0, 0, true}, {"done", 0, 0, true},
};
/* clang-format on */

static const struct meaning *meaning_of(const char *word)
{
    for (size_t i = 0; i < sizeof meanings / sizeof *meanings; i++)
        if (strlen(word) == strlen(meanings[i].word) && gas_same_folded(word, meanings[i].word, strlen(word)))
            return &meanings[i];
    return NULL;
}

/* Bytes of a Greek capital delta or of the sign of a difference, 0 when none stands here. */
static int delta_bytes(const char *p)
{
    return strncmp(p, "\xce\x94", 2) == 0 ? 2 : strncmp(p, "\xe2\x88\x86", 3) == 0 ? 3 : 0;
}

static bool is_separator(char c)
{
    return gas_is_space(c) || strchr("_-,.():;*", c);
}

/* One word into the list: letters, or digits; a delta in front becomes a d. */
static const char *take_word(const char *p, struct words *words)
{
    char *to = words->word[words->count];
    size_t used = 0;
    int delta = delta_bytes(p);
    bool digits = gas_is_digit(*p);
    if (delta > 0) {
        to[used++] = 'd';
        for (p += delta; gas_is_space(*p);)
            p++;
    }
    while (*p && *p != '_' && (digits ? gas_is_digit(*p) : gas_is_letter(*p)) && used + 1 < WORD_SIZE)
        to[used++] = *p++;
    to[used] = '\0';
    words->count++;
    return p;
}

static bool split_words(const char *plain, struct words *words)
{
    words->count = 0;
    for (const char *p = plain; *p;) {
        bool word = gas_is_digit(*p) || (gas_is_letter(*p) && *p != '_' && *p != '%');
        if (!word && !is_separator(*p))
            return false;
        if (word && words->count == WORDS)
            return false;
        p = word ? take_word(p, words) : p + 1;
    }
    return words->count > 0;
}

static void drop(struct words *words, int at, int count)
{
    memmove(words->word[at], words->word[at + count], (size_t)(words->count - at - count) * WORD_SIZE);
    words->count -= count;
}

static bool word_is(const struct words *words, int at, const char *text)
{
    return at < words->count && strlen(words->word[at]) == strlen(text) &&
           gas_same_folded(words->word[at], text, strlen(text));
}

/* "by gas", "by the gas", "on gas": whose work is counted positive. */
static void take_sign(struct words *words, struct label *label)
{
    for (int i = 0; i + 1 < words->count; i++) {
        bool by = word_is(words, i, "by"), on = word_is(words, i, "on");
        int gas = i + 1 + word_is(words, i + 1, "the");
        if ((by || on) && word_is(words, gas, "gas")) {
            label->by_gas |= by;
            label->on_gas |= on;
            drop(words, i, gas - i + 1);
            i--;
        }
    }
}

static void take_tolerance(struct words *words, struct label *label)
{
    for (int i = 0; i < words->count; i++)
        if (word_is(words, i, "tolerance") || word_is(words, i, "uncertainty") || word_is(words, i, "tol")) {
            label->tolerance = true;
            drop(words, i--, 1);
        }
}

static bool set_state(struct label *label, int state)
{
    bool same = !label->has_state || label->state == state;
    label->has_state = true;
    label->state = state;
    return same;
}

/* A number is a state; "01" and long numbers are none, and are told as such by the caller. */
static bool take_numbers(struct words *words, struct label *label)
{
    for (int i = 0; i < words->count; i++) {
        const char *word = words->word[i];
        if (!gas_is_digit(word[0]))
            continue;
        int state = strlen(word) == 1 ? word[0] - '0' : 99;
        if (label->has_state)
            return false;
        label->has_state = true;
        label->state = state;
        drop(words, i--, 1);
    }
    return true;
}

static bool in_list(const char *list, const char *text, bool fold)
{
    size_t length = strlen(text);
    for (const char *p = list; *p;) {
        size_t part = strcspn(p, ",");
        if (part == length && (fold ? gas_same_folded(p, text, length) : memcmp(p, text, length) == 0))
            return true;
        p += part + (p[part] == ',');
    }
    return false;
}

static const struct quantity *find_quantity(const struct words *words)
{
    char text[WORDS * WORD_SIZE] = "";
    size_t used = 0;
    for (int i = 0; i < words->count; i++)
        used += (size_t)snprintf(text + used, sizeof text - used, "%s%s", i ? " " : "", words->word[i]);
    for (size_t i = 0; i < gas_quantity_count && used > 0; i++)
        if (in_list(gas_quantities[i].symbols, text, false))
            return &gas_quantities[i];
    for (size_t i = 0; i < gas_quantity_count && used > 0; i++)
        if (in_list(gas_quantities[i].words, text, true))
            return &gas_quantities[i];
    return NULL;
}

/* "Pin", "Tout", "Pg", "Pabs": a symbol with its index glued to it. */
static void unglue(struct words *words)
{
    char *word = words->word[0];
    const struct meaning *meaning =
        words->count == 1 && word[0] && strchr("PTVpt", word[0]) ? meaning_of(word + 1) : NULL;
    if (meaning && !meaning->filler && words->count < WORDS) {
        snprintf(words->word[1], WORD_SIZE, "%s", word + 1);
        word[1] = '\0';
        words->count = 2;
    }
}

/* Takes states, bases and fillers out of the words. */
static bool take_meanings(struct words *words, struct label *label)
{
    for (int i = 0; i < words->count; i++) {
        const struct meaning *meaning = meaning_of(words->word[i]);
        if (!meaning)
            continue;
        if (meaning->state && !set_state(label, meaning->state))
            return false;
        if (meaning->basis) {
            if (label->has_basis && (int)label->basis != meaning->basis - 1)
                return false;
            label->has_basis = true;
            label->basis = (enum gas_pressure_basis)(meaning->basis - 1);
        }
        drop(words, i--, 1);
    }
    return true;
}

/* "P1 (g)", "P a": single letters behind a pressure symbol. */
static void take_basis_letter(struct words *words, struct label *label)
{
    bool pressure = words->count == 2 && (word_is(words, 0, "p") || word_is(words, 0, "pressure"));
    bool gauge = word_is(words, 1, "g"), absolute = word_is(words, 1, "a");
    if (!pressure || label->has_basis || !(gauge || absolute))
        return;
    label->has_basis = true;
    label->basis = gauge ? GAS_GAUGE : GAS_ABSOLUTE;
    drop(words, 1, 1);
}

static bool only_fillers(const struct words *words)
{
    for (int i = 0; i < words->count; i++) {
        const struct meaning *meaning = meaning_of(words->word[i]);
        if (!meaning || !meaning->filler)
            return false;
    }
    return true;
}

static bool make_plain(const char *text, size_t length, char plain[PLAIN_TEXT], struct label *label)
{
    static const char sign[] = "\xc2\xb1"; /* plus-minus */
    if (!gas_spelling_plain(text, length, plain, NULL))
        return false;
    for (char *p; (p = strstr(plain, sign)) != NULL;) {
        p[0] = p[1] = ' ';
        label->tolerance = true;
    }
    return true;
}

bool gas_label_parse(const char *text, size_t length, struct label *label)
{
    char plain[PLAIN_TEXT];
    struct words words;
    *label = (struct label){.quantity = NULL};
    if (length >= GAS_HEADING_TEXT || !make_plain(text, length, plain, label))
        return false;
    if (!split_words(plain, &words))
        return label->tolerance && !plain[strspn(plain, " ")]; /* a plus-minus sign alone */
    take_sign(&words, label);
    take_tolerance(&words, label);
    if (!take_numbers(&words, label))
        return false;
    label->quantity = find_quantity(&words); /* names that hold such words themselves: Q in, m out */
    if (label->quantity)
        return true;
    unglue(&words);
    bool empty = only_fillers(&words);
    if (!take_meanings(&words, label))
        return false;
    take_basis_letter(&words, label);
    label->quantity = find_quantity(&words);
    bool told = label->has_basis || label->tolerance || (label->has_state && !empty);
    return label->quantity || (words.count == 0 && told);
}

void gas_label_nearest(const char *text, size_t length, char *hint, size_t size)
{
    char plain[PLAIN_TEXT], best[WORD_SIZE] = "";
    struct words words;
    struct label label;
    int distance = 3;
    if (!make_plain(text, length, plain, &label) || !split_words(plain, &words))
        words.count = 0;
    for (int w = 0; w < words.count; w++)
        for (size_t i = 0; i < gas_quantity_count && strlen(words.word[w]) > 3; i++)
            for (const char *p = gas_quantities[i].words; *p;) {
                char word[64];
                size_t part = strcspn(p, ",");
                snprintf(word, sizeof word, "%.*s", (int)part, p);
                int most = strlen(words.word[w]) < 6 ? 1 : 2; /* "volts" is not nearly "moles" */
                int found = gas_edit_distance(words.word[w], word, most);
                if (found <= most && found < distance && strlen(word) > 3) {
                    distance = found;
                    snprintf(best, sizeof best, "%.31s", word);
                }
                p += part + (p[part] == ',');
            }
    if (best[0])
        snprintf(hint, size, "perhaps %s is meant", best);
    else
        snprintf(hint, size, "name a quantity and its unit, such as P1, bar(g)");
}
