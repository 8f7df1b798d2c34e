/*
 * published_page.h - computes the rows of tests/check and writes docs/checks.md.
 */
#ifndef TESTS_PUBLISHED_PAGE_H
#define TESTS_PUBLISHED_PAGE_H

#include "published.h"
#include "sheet/cell.h"

/* published_compute - what a formula gives: NULL and a number, or the text it answered (in the arena). */
const char *published_compute(const char *formula, struct gas_arena *arena, double *number);

/* published_files - the tables under tests/check in the order of their names, `count` of them; NULL when there are
 * none. To be freed with published_forget. */
char **published_files(size_t *count);
void published_forget(char **files, size_t count);

/* published_page - the page for all tables; false with a sentence in `wrong` when a file cannot be read or a formula
 * gives no number. */
bool published_page(FILE *out, char wrong[PUBLISHED_WORDS]);

#define PUBLISHED_PAGE "docs/checks.md"

#endif
