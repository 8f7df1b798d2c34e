/*
 * gas_draft.h - a gas while it is being read; what the readers of names, mixtures, cards and rules share. (internal)
 *
 * The way of a gas: gas_choice.c looks a text or a range up in its cache; when it is new, one of gas_name.c,
 * gas_mixture.c, gas_card.c fills a draft, gas_rule.c changes it by what stands after '|', gas_draft.c checks it.
 */
#ifndef SHEET_GAS_DRAFT_H
#define SHEET_GAS_DRAFT_H

#include "sheet/gas_choice.h"
#include "sheet/piece.h"

enum {
    GAS_TEXT_MOST = 10000, /* characters of a gas text */
    GAS_RANGE_MOST = 2000, /* cells of a gas range */
    GAS_PARTS_MOST = 64    /* components of a mixture */
};

struct gas_draft {
    struct gas_arena *arena; /* of the choice: whatever the draft points at lives there or in the tables */
    struct gas_refusal *refusal;
    struct gas gas; /* molar_mass is NAN until it is known */
    size_t part_count;
    const struct gas_part *part;
    const char *label, *rule, *source, *source_key;
    bool to_be_checked; /* the heat capacity was typed, not taken from the tables */
};

/* gas_name.c: one species by name, formula or CAS number. */
bool gas_draft_name(struct gas_draft *draft, struct gas_piece name);
void gas_draft_species(struct gas_draft *draft, const struct gas_species *species);
/* "nitrogn" is not known; nearest are ...: always false. */
bool gas_refuse_name(struct gas_refusal *refusal, struct gas_piece name);
/* The heat capacity is that of the tables: its source goes with it. */
void gas_draft_source(struct gas_draft *draft, const struct gas_species *species);
/* gas_name_find - gas_species_find, and the ways of saying the same: "nitrogen gas", "Freon 22", "CO2 (g)". */
const struct gas_species *gas_name_find(const char *text, size_t length);

/* gas_blend.c: "natural gas", "C4", "sulphur" are names of the trade for no one gas: refused with an example of what to
 * write, and true. False, and nothing refused, for any other name. */
bool gas_refuse_blend(struct gas_refusal *refusal, struct gas_piece name);

/* gas_mixture.c: a name, or a mixture such as "N2 79 + O2 21"; a range component | fraction. */
bool gas_draft_text(struct gas_draft *draft, struct gas_piece text);
bool gas_draft_mixture_range(struct gas_draft *draft, const struct gas_block *block);

/* gas_card.c: label | value | unit. */
bool gas_is_card(const struct gas_block *block);
bool gas_draft_card(struct gas_draft *draft, const struct gas_block *block);

/* gas_rule.c: what stands after '|'. */
bool gas_draft_rules(struct gas_draft *draft, struct gas_piece rules);

/*
 * gas_draft_check - is a typed heat capacity one that a gas can have?
 *
 *   Notes      cp must stay above R (else cv would not be positive) in the range that was given. Where no range was
 *              given it must do so at 25 degC, and the range ends where it no longer does. Intervals must agree
 *              within 10 % where they meet.
 */
bool gas_draft_check(struct gas_draft *draft);

/* gas_draft.c: a sentence for memory being out; copies into the draft's arena. */
bool gas_refuse_memory(struct gas_refusal *refusal);
const char *gas_draft_copy(struct gas_draft *draft, const char *text);

/*
 * gas_fold - a label for comparing: lower case, without spaces, hyphens, underscores and full stops; the typesetter's
 * minus and dots as plain characters, superscript digits behind a '^'. Cut to fit.
 */
const char *gas_fold(char *buffer, size_t size, struct gas_piece text);

/* gas_listed - is a folded text one of "one|two|three"? */
bool gas_listed(const char *folded, const char *list);

#endif
