/*
 * mix.h - streams or vessels that are let together: a range of them, and what comes of it.
 *
 * The range has a heading row: gas, P, T and one of m, n, V (vessels) or of their flows (streams). A column headed
 * stream, vessel or name is a label and passed over. A row of zero flow counts for nothing; P = 0 is an evacuated
 * vessel, which needs V alone.
 */
#ifndef SHEET_MIX_H
#define SHEET_MIX_H

#include <gasleaf/mixing.h>

#include "sheet/job.h"

/* What a row is made of; air stands as its own components, so that it shares them with others. */
struct gas_content {
    size_t count;
    const struct gas_part *part;
};

/* A row that holds something. */
struct gas_mix_row {
    const struct gas_choice *choice;
    struct gas_content content;
    size_t number; /* of the range, from 1 behind the headings: for sentences */
};

/* A component of the blend, merged over all rows. */
struct gas_mixed_part {
    const struct gas_part *part; /* of one of the contents */
    double n;                    /* mol, mol/s */
};

struct gas_mix {
    struct gas_job job; /* headings, options, wanted; its gas is that of the row last looked at */
    size_t count;
    struct gas_mix_row *rows;
    struct gas_portion *portion;
    int *same; /* rows of the same gas have the same number */
    struct gas_blend blend;
    double molar_mass; /* kg/mol of the blend */
    size_t parts;
    struct gas_mixed_part *part;
};

/* gas_mix_open - read the range and mix. Whether or not it succeeds, give back with gas_mix_close. */
bool gas_mix_open(struct gas_mix *mix, const struct gas_block *streams, const struct gas_block *wanted,
                  const struct gas_block *options, struct gas_arena *arena, struct gas_refusal *refusal);
void gas_mix_close(struct gas_mix *mix);

/* gas_mix_quantity - a wanted heading's figure in SI. */
bool gas_mix_quantity(const struct gas_mix *mix, const struct gas_heading *heading, double *si,
                      struct gas_refusal *refusal);

/* gas_mix_merge, gas_mix_shared_entropy - (mix_parts.c) the components of the blend; what is to be added to core's
 * entropy, which is never above 0. */
bool gas_mix_merge(struct gas_mix *mix, struct gas_arena *arena, struct gas_refusal *refusal);
double gas_mix_shared_entropy(struct gas_mix *mix);

#endif
