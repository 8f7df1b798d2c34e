/*
 * catalogue.h - THE table of worksheet functions: the only place where one is declared.
 *
 * idl/, CalcAddIns.xcu and docs/functions.md are generated from it (make generate); a test regenerates, compares and
 * evaluates every example.
 */
#ifndef SHEET_CATALOGUE_H
#define SHEET_CATALOGUE_H

#include "sheet/cell.h"

typedef void gas_entry(struct gas_call *call);

enum { GAS_PARAMETERS = 8 };

enum gas_parameter_kind {
    GAS_PARAMETER_ANY,  /* a value, a range or an inline array */
    GAS_PARAMETER_TEXT, /* the same where texts are asked for: an empty cell counts as left out */
    GAS_PARAMETER_LIVE, /* a live cell range: sees host errors and true blanks; cannot be optional */
    GAS_PARAMETER_REST  /* repeats; only the last parameter can */
};

struct gas_parameter {
    const char *name; /* as the wizard shows it: "temperature unit"; the IDL name is this without the spaces */
    const char *help; /* one sentence: what, units, basis, sign; no trailing full stop */
    bool optional;
    enum gas_parameter_kind kind;
};

struct gas_function {
    const char *sheet_name; /* "GAS.SOLVE": shown and typed */
    const char *method;     /* "solve": stored in files as GASLEAF.FUNCTIONS.SOLVE, for ever */
    gas_entry *entry;
    const char *help;                               /* one sentence, no trailing full stop */
    struct gas_parameter parameter[GAS_PARAMETERS]; /* ends where a name is NULL */
    const char *example;                            /* a formula without the equals sign */
    const char *answer; /* what it gives: a figure to its last printed digit, or a text (its first cell) */
};

const struct gas_function *gas_catalogue(size_t *count);
size_t gas_parameter_count(const struct gas_function *function);

/* gas_function_call - run a row: passes a readable error in a single-cell argument on unchanged, then the entry. */
void gas_function_call(const struct gas_function *function, struct gas_call *call);

#endif
