/*
 * gas_mixture.h - a mixture while it is being read, from a text or from a range. (internal)
 */
#ifndef SHEET_GAS_MIXTURE_H
#define SHEET_GAS_MIXTURE_H

#include "sheet/gas_draft.h"

enum gas_basis { GAS_BASIS_UNSAID, GAS_BASIS_MOLE, GAS_BASIS_MASS };

/* What stands beside the figure of a component. */
struct gas_marks {
    enum gas_basis basis;
    bool percent, ppm;
    bool contradiction; /* wt and mol at once */
};

struct gas_component {
    const struct gas_species *species;
    double amount; /* as written */
    bool ppm;
    bool rest; /* "rest" or "balance" stands in place of the figure */
};

struct gas_recipe {
    size_t count;
    struct gas_component component[GAS_PARTS_MOST];
    enum gas_basis basis;
    bool percent;
    double total;     /* of a row total, as written; 0: none */
    const char *line; /* "row" or "column" of a range, for sentences */
};

/* gas_marks_read - "%", "wt%", "mol %", "by volume", "ppm": all of the text must be marks. */
bool gas_marks_read(struct gas_piece text, struct gas_marks *marks);
/* gas_marks_take - the marks at the front of a text; how many bytes they are, 0 for none. */
size_t gas_marks_take(struct gas_piece text, struct gas_marks *marks);

/* gas_amount_read - "79", "79 %", "400 ppm", "rest": a figure with its marks and nothing else. */
bool gas_amount_read(struct gas_piece text, struct gas_component *component, struct gas_marks *marks);

/* gas_recipe_add - a component found by its name; refuses unknown ones, duplicates, figures below zero, two bases. */
bool gas_recipe_add(struct gas_recipe *recipe, struct gas_piece name, struct gas_component component,
                    const struct gas_marks *marks, struct gas_refusal *refusal);

/* gas_recipe_finish - fractions that add to 1, then the gas. */
bool gas_recipe_finish(struct gas_recipe *recipe, struct gas_draft *draft);

/* gas_mixture_cp.c: the mole-fraction sum of the parts' heat capacities over the range that they share. */
bool gas_draft_sum(struct gas_draft *draft, const struct gas_part *part, size_t count);

#endif
