/*
 * The gas argument: looked up by its content in a bounded cache, read when it is new. The lock is held for the look-up
 * only; a choice is counted, so one that leaves the cache lives on until its last user gives it back.
 */
#include "sheet/gas_choice.h"

#include <math.h>
#include <pthread.h>
#include <stdatomic.h>
#include <stdint.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "sheet/gas_draft.h"

enum { SETS = 64, WAYS = 4 };

struct kept {
    struct gas_choice shown; /* first: a choice handed out is a pointer to this */
    struct gas_arena arena;
    atomic_size_t uses;
    uint64_t hash;
    size_t key_length;
    const unsigned char *key;
    uint64_t turn; /* when it was last asked for */
};

static pthread_mutex_t lock = PTHREAD_MUTEX_INITIALIZER;
static struct kept *cache[SETS][WAYS];
static uint64_t turns;

/* The content of an argument as bytes: hashed, compared or copied on the way, without a buffer. */
struct key {
    uint64_t hash;
    size_t length;
    unsigned char *copy;
    const unsigned char *against;
    bool differs;
};

static void feed(struct key *key, const void *bytes, size_t length)
{
    const unsigned char *byte = bytes;
    if (key->copy)
        memcpy(key->copy + key->length, byte, length);
    if (key->against)
        key->differs = key->differs || memcmp(key->against + key->length, byte, length) != 0;
    else if (!key->copy)
        for (size_t i = 0; i < length; i++)
            key->hash = (key->hash ^ byte[i]) * 1099511628211U; /* FNV-1a */
    key->length += length;
}

static void feed_block(struct key *key, const struct gas_block *block)
{
    /* at most GAS_RANGE_MOST cells: two bytes each */
    const unsigned char shape[] = {block->rows & 0xff, block->rows >> 8 & 0xff, block->columns & 0xff,
                                   block->columns >> 8 & 0xff};
    feed(key, shape, sizeof shape);
    for (size_t i = 0; i < block->rows * block->columns; i++) {
        const struct gas_cell *cell = &block->cell[i];
        const unsigned char kind = (unsigned char)cell->kind;
        feed(key, &kind, 1);
        if (cell->kind == GAS_CELL_NUMBER)
            feed(key, &cell->number, sizeof cell->number);
        if (cell->kind == GAS_CELL_TEXT) {
            feed(key, &cell->length, sizeof cell->length);
            feed(key, cell->text, cell->length);
        }
    }
}

static bool same_key(const struct kept *kept, const struct gas_block *block, const struct key *key)
{
    if (kept->hash != key->hash || kept->key_length != key->length)
        return false;
    struct key compared = {.against = kept->key};
    feed_block(&compared, block);
    return !compared.differs;
}

/* Under the lock. */
static struct kept *find(const struct gas_block *block, const struct key *key)
{
    struct kept **set = cache[key->hash % SETS];
    for (int way = 0; way < WAYS; way++)
        if (set[way] && same_key(set[way], block, key)) {
            atomic_fetch_add(&set[way]->uses, 1);
            set[way]->turn = ++turns;
            return set[way];
        }
    return NULL;
}

static struct kept *look_up(const struct gas_block *block, const struct key *key)
{
    pthread_mutex_lock(&lock);
    struct kept *found = find(block, key);
    pthread_mutex_unlock(&lock);
    return found;
}

static void drop(struct kept *kept)
{
    if (kept && atomic_fetch_sub(&kept->uses, 1) == 1) {
        gas_arena_free(&kept->arena);
        free(kept);
    }
}

void gas_choice_release(const struct gas_choice *choice)
{
    /* the choice is the first member of what is kept; it was lent as const, but its counter is not */
    const union {
        const struct gas_choice *lent;
        struct kept *kept;
    } whole = {choice};
    drop(whole.kept);
}

/* Into the place of the one asked for longest ago; when somebody else was quicker with the same gas, theirs is used. */
static struct kept *keep(struct kept *made, const struct gas_block *block, const struct key *key)
{
    struct kept **oldest = cache[key->hash % SETS], *out = made;
    pthread_mutex_lock(&lock);
    struct kept *used = find(block, key);
    if (!used) {
        for (struct kept **way = oldest + 1; *oldest && way < cache[key->hash % SETS] + WAYS; way++)
            if (!*way || (*way)->turn < (*oldest)->turn)
                oldest = way;
        out = *oldest;
        *oldest = used = made;
        made->turn = ++turns;
        atomic_fetch_add(&made->uses, 1); /* one for the cache, one for the caller */
    }
    pthread_mutex_unlock(&lock);
    drop(out);
    return used;
}

static bool read_text(struct gas_draft *draft, struct gas_piece text)
{
    const char *bar = memchr(text.at, '|', text.length);
    struct gas_piece base = {text.at, bar ? (size_t)(bar - text.at) : text.length};
    struct gas_piece rules = {bar ? bar + 1 : text.at + text.length, bar ? text.length - base.length - 1 : 0};
    base = gas_piece_trim(base);
    if (base.length == 0)
        return gas_refuse(draft->refusal, "gas",
                          "no gas stands before '|'; write one, such as N2 | cp = 1.04 kJ/kg-K.");
    return gas_draft_text(draft, base) && (!bar || gas_draft_rules(draft, rules));
}

static bool read_block(struct gas_draft *draft, const struct gas_block *block)
{
    if (gas_single(block))
        return read_text(draft, (struct gas_piece){block->cell->text, block->cell->length});
    return gas_is_card(block) ? gas_draft_card(draft, block) : gas_draft_mixture_range(draft, block);
}

static bool copy_key(struct kept *made, const struct gas_block *block, const struct key *key)
{
    struct key copied = {.copy = gas_arena_take(&made->arena, key->length, 1)};
    if (!copied.copy)
        return false;
    feed_block(&copied, block);
    made->hash = key->hash;
    made->key_length = key->length;
    made->key = copied.copy;
    return true;
}

static struct kept *make(const struct gas_block *block, const struct key *key, struct gas_refusal *refusal)
{
    struct kept *made = calloc(1, sizeof *made);
    if (!made || !copy_key(made, block, key)) {
        free(made);
        gas_refuse_memory(refusal);
        return NULL;
    }
    struct gas_draft draft = {.arena = &made->arena,
                              .refusal = refusal,
                              .gas = {.R = GAS_R, .molar_mass = NAN},
                              .label = "",
                              .rule = "",
                              .source = "",
                              .source_key = ""};
    if (!read_block(&draft, block) || !gas_draft_check(&draft) || refusal->made) {
        gas_arena_free(&made->arena);
        free(made);
        return NULL;
    }
    made->shown = (struct gas_choice){.gas = draft.gas,
                                      .label = draft.label,
                                      .rule = draft.rule,
                                      .part_count = draft.part_count,
                                      .part = draft.part,
                                      .source = draft.source,
                                      .source_key = draft.source_key};
    atomic_init(&made->uses, 1);
    return made;
}

static const struct gas_choice *choose(const struct gas_block *block, struct gas_refusal *refusal)
{
    struct key key = {.hash = 14695981039346656037U};
    feed_block(&key, block);
    struct kept *found = look_up(block, &key);
    if (!found) {
        struct kept *made = make(block, &key, refusal);
        found = made ? keep(made, block, &key) : NULL;
    }
    return found ? &found->shown : NULL;
}

static void pass_on(struct gas_piece sentence, struct gas_refusal *refusal)
{
    char copy[sizeof refusal->text];
    snprintf(copy, sizeof copy, "%.*s", (int)sentence.length, sentence.at);
    gas_refuse_sentence(refusal, copy);
}

const struct gas_choice *gas_choose_text(const char *text, size_t length, struct gas_refusal *refusal)
{
    struct gas_piece trimmed = gas_piece_trim((struct gas_piece){text, length});
    struct gas_cell cell = {GAS_CELL_TEXT, 0, trimmed.at, trimmed.length};
    if (refusal->made)
        return NULL;
    if (trimmed.length == 0)
        gas_refuse(refusal, "gas", "it is blank; write a name, a formula or a mixture, such as N2 or N2 79 + O2 21.");
    else if (trimmed.length > GAS_TEXT_MOST)
        gas_refuse(refusal, "gas", "the text has %zu characters; at most %d are read. Give a range instead.",
                   trimmed.length, GAS_TEXT_MOST);
    else if (trimmed.length > 6 && memcmp(trimmed.at, "Check ", 6) == 0)
        pass_on(trimmed, refusal);
    if (refusal->made)
        return NULL;
    struct gas_block block = {1, 1, &cell, false};
    return choose(&block, refusal);
}

static const struct gas_choice *refuse_cell(const struct gas_cell *cell, struct gas_refusal *refusal)
{
    if (cell->kind == GAS_CELL_NUMBER) {
        gas_refuse(refusal, "gas", "%s is a number; write a name, a formula or a mixture, such as N2.",
                   gas_shown(cell->number).text);
    } else if (cell->kind == GAS_CELL_EMPTY) {
        gas_choose_text("", 0, refusal);
    } else {
        gas_refuse(refusal, "gas", "the cell holds an error; correct it first.");
    }
    return NULL;
}

const struct gas_choice *gas_choose(const struct gas_block *argument, struct gas_refusal *refusal)
{
    if (refusal->made)
        return NULL;
    if (gas_omitted(argument))
        return gas_choose_text("", 0, refusal);
    if (argument->rows > GAS_RANGE_MOST / argument->columns) {
        gas_refuse(refusal, "gas",
                   "the range has %zu rows and %zu columns; a mixture or a gas card has at most %d cells.",
                   argument->rows, argument->columns, GAS_RANGE_MOST);
        return NULL;
    }
    const struct gas_cell *sentence = gas_block_sentence(argument);
    if (sentence) {
        gas_refuse_sentence(refusal, sentence->text);
        return NULL;
    }
    if (gas_single(argument)) {
        const struct gas_cell *cell = argument->cell;
        return cell->kind == GAS_CELL_TEXT ? gas_choose_text(cell->text, cell->length, refusal)
                                           : refuse_cell(cell, refusal);
    }
    return choose(argument, refusal);
}
