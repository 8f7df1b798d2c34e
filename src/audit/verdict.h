/*
 * verdict.h - what the audit says of a figure, in words.
 */
#ifndef AUDIT_VERDICT_H
#define AUDIT_VERDICT_H

#include "audit/search.h"

enum { VERDICT_TEXT = 700 };

/* verdict_text - the sentence of one case: "agrees: ...", "rounded constant: ...", "differs by ...". */
void verdict_text(struct audit *audit, size_t index, char *buffer, size_t size);

/* verdict_word - agrees, rounding, explained, differs, no figure, refused. */
const char *verdict_word(enum audit_status status);

/* verdict_slips - an explanation in words: "7 bar(g) taken as absolute and cp taken at 25 °C". */
void verdict_slips(struct audit *audit, size_t index, const struct explanation *explanation, char *buffer, size_t size);

/* verdict_deviation - of the old figure from the true one in %, NAN when the true one is zero. */
double verdict_deviation(const struct audited *row);

#endif
