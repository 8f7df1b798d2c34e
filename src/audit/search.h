/*
 * search.h - which slips explain the figures of an old sheet.
 *
 * Each case is worked out; where the old figure differs by more than its own last digit, every slip at every place is
 * put into the sum, alone, then in pairs, at last with two rounded constants on top. Pairs are told apart by the
 * product or the sum of the single effects first, and only those that come near are worked out; a bound keeps a long
 * column in hand. What fits is ranked by likelihood; what fits in every case comes first.
 */
#ifndef AUDIT_SEARCH_H
#define AUDIT_SEARCH_H

#include "audit/legacy.h"
#include "audit/slips.h"

enum { NAMED = 3, TOGETHER = 3 }; /* explanations kept per case; slips in one explanation */

enum audit_status { AUDIT_REFUSED, AUDIT_BLANK, AUDIT_AGREES, AUDIT_ROUNDING, AUDIT_EXPLAINED, AUDIT_DIFFERS };

struct explanation {
    short part[TOGETHER]; /* instances; -1 after the last */
    double score, figure; /* the figure it would give */
    bool everywhere;      /* fits every case of a table that differs */
};

struct audited {
    enum audit_status status;
    const char *refusal; /* AUDIT_REFUSED: the sentence */
    double truth;
    struct legacy legacy;
    size_t count;
    struct explanation explanation[NAMED];
};

struct audit {
    const struct desk *desk;
    struct gas_arena *arena;
    size_t rows;
    struct audited *row;
    struct replay *replay;
    size_t instances;
    struct instance *instance;
    long tried; /* replays of pairs and triples so far in this call */
};

/* audit_open - room for the desk's cases; false when memory is out. The legacy figures are filled in by the caller. */
bool audit_open(struct audit *audit, const struct desk *desk, struct gas_arena *arena, struct gas_refusal *refusal);

/* audit_run - every case: truth, status, explanations. */
void audit_run(struct audit *audit);

/* audit_figure - what a set of slips would give in a case; NAN when they do not apply. */
double audit_figure(struct audit *audit, const struct desk_case *truth, const short part[TOGETHER]);

#endif
