/*
 * units.h - what the files of the units layer share; nothing outside src/units includes it.
 *
 * The way of a unit text: spelling.c brings it to plain characters, basis.c takes gauge and vacuum off, product.c reads
 * a product of powers of trade units, engine.c lets UDUNITS-2 work out its scale and its dimension.
 */
#ifndef GASLEAF_UNITS_INTERNAL_H
#define GASLEAF_UNITS_INTERNAL_H

#include <stdbool.h>
#include <stddef.h>

#include <gasleaf/unit.h>

enum { PLAIN_TEXT = 160, PRODUCT_FACTORS = 12, POWER_LIMIT = 12 };

/* What a row of the table is, besides a factor. */
enum unit_kind {
    UNIT_PLAIN,
    UNIT_NORMAL,   /* a volume that counts as an amount: reference normal_T, normal_P */
    UNIT_STANDARD, /* ... standard_T, standard_P */
    UNIT_SCF,      /* ... scf_T, scf_P */
    UNIT_AMBIGUOUS /* a name with several meanings: `source` holds the choices */
};

struct trade_unit {
    const char *symbol;   /* what the engine calls it; of a temperature level, the difference */
    const char *names;    /* "symbols, case counts where it can;words, any case, plural s" */
    const char *prefixes; /* which prefixes its symbols take, e.g. "mhkM" */
    double factor;        /* in base units */
    signed char power[5]; /* of kg, m, s, K, mol */
    double offset;        /* of a temperature level, in this unit */
    enum unit_kind kind;
    const char *source;
};
extern const struct trade_unit gas_trade_units[];
extern const size_t gas_trade_unit_count;

struct unit_prefix {
    char symbol[2];
    const char *word;
    double factor;
};
extern const struct unit_prefix gas_unit_prefixes[];
extern const size_t gas_unit_prefix_count;

struct unit_name { /* a row and the prefix in front of it */
    const struct trade_unit *unit;
    const struct unit_prefix *prefix; /* may be NULL */
};

struct unit_factor {
    struct unit_name name;
    enum unit_kind kind; /* that of the row, or given by words around it: "m3(N)", "standard m3" */
    int power;
};

struct unit_product {
    double number;
    int count;
    struct unit_factor factor[PRODUCT_FACTORS];
};

/* spelling.c: UTF-8 as engineers type it -> plain characters; false at something that is no text. */
bool gas_spelling_plain(const char *text, size_t length, char plain[PLAIN_TEXT], struct gas_unit_fault *fault);
size_t gas_utf8_next(const char *text, size_t length, unsigned *point); /* bytes of one character, 0 when invalid */

/* names.c: a word or a phrase of words -> a row of the table. */
enum name_found { NAME_NONE, NAME_FOUND, NAME_AMBIGUOUS };
enum name_found gas_unit_name_find(const char *word, bool alone, struct unit_name *name);
void gas_unit_name_nearest(const char *word, char *hint, size_t size);
void gas_unit_name_choices(const char *word, char *hint, size_t size);

/* product.c */
bool gas_product_parse(const char *plain, struct unit_product *product, struct gas_unit_fault *fault);

/* engine.c: scale, dimension and powers of a product; reference volumes count as amounts. */
bool gas_engine_resolve(const struct unit_product *product, const struct gas_references *references,
                        struct gas_unit *unit, struct gas_unit_fault *fault);

/* basis.c: a plain text with its gauge, absolute or vacuum marks. */
bool gas_basis_parse(const char *plain, const struct gas_references *references, struct gas_unit *unit,
                     struct gas_unit_fault *fault);

/* reference.c: "m3@20 degC,101.325 kPa". */
bool gas_reference_parse(const char *plain, const char *at, struct gas_unit *unit, struct gas_unit_fault *fault);
const char *gas_reference_mark(const char *plain); /* the @, or NULL */

/* faults; a NULL fault is allowed. Returns false, so that a parser can return it. `at` is cut and cleaned. */
bool gas_unit_refuse(struct gas_unit_fault *fault, enum gas_unit_status status, const char *at, size_t length,
                     const char *hint);

/* small helpers on plain ASCII, whatever the locale */
bool gas_is_letter(char c); /* ASCII letters, '_', and bytes of letters beyond ASCII */
bool gas_is_digit(char c);
bool gas_is_space(char c);
char gas_lower(char c);
bool gas_same_folded(const char *a, const char *b, size_t length);
void gas_trim(const char **text, size_t *length);                           /* spaces at both ends taken off */
void gas_copy_text(char *to, size_t size, const char *from, size_t length); /* cut at a whole character */
int gas_edit_distance(const char *a, const char *b, int limit);

/* cache.c: texts already understood. */
enum { CACHE_TEXT = 96, CACHE_VALUE = 768, CACHE_WAYS = 4, CACHE_SETS = 128 };
struct gas_text_cache;
extern struct gas_text_cache gas_unit_cache, gas_heading_cache;
bool gas_cache_get(struct gas_text_cache *cache, const char *text, size_t length,
                   const struct gas_references *references, void *value, size_t size);
void gas_cache_put(struct gas_text_cache *cache, const char *text, size_t length,
                   const struct gas_references *references, const void *value, size_t size);

#endif
