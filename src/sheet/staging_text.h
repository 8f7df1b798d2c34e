/*
 * staging_text.h - staged compression as it is typed: "3 stages; isentropic 78 %; cool to 40 degC; drop 0.2 bar".
 *
 *   how many        "3 stages"   "ratio at most 3.5"   "ratios 3 / 2.8 / 2.5"   "stages" for a column so headed
 *   how well        "isentropic 78 %"   "polytropic 80 %"   "isothermal 70 %"   "isentropic" alone: reversible
 *   between stages  "cool to 40 degC"   "cool to T1"   "drop 0.2 bar"   "drop 2 %"   "aftercooler"
 *   in front        "drive 95 %"
 *
 * Items are separated by ';' or line breaks, or stand in the cells of a range, also in pieces: cool to | 40 | degC. A
 * figure can be the name of a heading, as in legs. How many and how well must be said.
 */
#ifndef SHEET_STAGING_TEXT_H
#define SHEET_STAGING_TEXT_H

#include <gasleaf/stages.h>

#include "sheet/legs.h"

/* What an item says; in the order of the figures below, then those without one. */
enum gas_staging_item {
    GAS_SAYS_COUNT,
    GAS_SAYS_LIMIT,
    GAS_SAYS_EFFICIENCY,
    GAS_SAYS_COOLING,
    GAS_SAYS_DROP,
    GAS_SAYS_DRIVE,
    GAS_STAGING_FIGURES,
    GAS_SAYS_RATIOS = GAS_STAGING_FIGURES,
    GAS_SAYS_AFTERCOOLER,
    GAS_STAGING_ITEMS
};

struct gas_typed_staging {
    struct gas_leg_figure figure[GAS_STAGING_FIGURES]; /* in the user's units; none where not said */
    enum gas_stage_efficiency kind;
    int ratio_count;
    double ratio[GAS_STAGES_MAX];
    bool aftercooler;
    bool said[GAS_STAGING_ITEMS];
};

/* gas_staging_read - what is wrong is said with the item as typed. */
bool gas_staging_read(const struct gas_block *argument, const struct gas_options *options,
                      struct gas_typed_staging *staging, struct gas_refusal *refusal);

#endif
