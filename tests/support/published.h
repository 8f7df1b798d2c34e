/*
 * published.h - rows of the tables in tests/check: what a publication prints beside the formula that should give it.
 * The columns and the rules of the files are set down in tests/check/README.md.
 */
#ifndef TESTS_PUBLISHED_H
#define TESTS_PUBLISHED_H

#include <stdbool.h>
#include <stddef.h>
#include <stdio.h>

struct published_row {
    char *id, *formula, *unit, *source, *provenance, *note;
    double printed;
    double precision; /* the place of the last printed digit: 0.001 */
    double allowed;   /* units of that digit, or percent of the printed value */
    bool percent;
};

struct published {
    char *title; /* of the publication: what stands before the semicolon in every source of the file */
    struct published_row *row;
    size_t count, room;
};

enum { PUBLISHED_WORDS = 400 };

/* published_read - a whole file. False with a sentence in `wrong` at the first row that breaks a rule, or when there is
 * no row. The table is to be freed either way. */
bool published_read(FILE *in, struct published *table, char wrong[PUBLISHED_WORDS]);
void published_free(struct published *table);

/* published_deviation - of our value, in units of the last printed digit. */
double published_deviation(const struct published_row *row, double ours);

/* published_margin - the largest deviation allowed, in the unit of the row; PUBLISHED_CLOSE: in units of the last
 * printed digit, what counts as agreeing with the print. */
double published_margin(const struct published_row *row);
#define PUBLISHED_CLOSE 1.0

#endif
