/*
 * legs.h - the legs of a path as they are typed: a process and where it ends.
 *
 *   "isothermal to 8 bar"                 "adiabatic 78 % to P2"            "polytropic n=1.3 to V x 0.125"
 *   "isobaric with Q = 50 kJ"             "against 1 bar to 0.5 m3"         "straight to 3 bar and 0.5 m3"
 *   "isochoric to start"                  "free expansion to 2 m3"          "polytropic n to P2"
 *
 * Legs are separated by ';' or line breaks, or stand one per cell of a range; a range whose first row is the headings
 * P and V is one leg through those points. A figure is a number with its unit, or the name of a heading whose column
 * holds it. Figures stay in the user's units here: what they mean in SI can depend on the row (amount, barometer).
 */
#ifndef SHEET_LEGS_H
#define SHEET_LEGS_H

#include <gasleaf/heading.h>
#include <gasleaf/path.h>

#include "sheet/cell.h"
#include "sheet/options.h"
#include "sheet/sentence.h"

enum { GAS_LEGS = 24, GAS_LEG_TEXT = 96 };

enum gas_figure_kind { GAS_FIGURE_NONE, GAS_FIGURE_FIXED, GAS_FIGURE_COLUMN };

/* A figure of a leg. A fixed one has its unit; a column one is looked up by symbol and state in each row. */
struct gas_leg_figure {
    enum gas_figure_kind kind;
    double figure;          /* of a fixed one, in its unit */
    struct gas_unit unit;   /* of a fixed one */
    enum gas_symbol symbol; /* of a column one */
    int state;              /* of a column one; 0: without a number */
};

struct gas_typed_leg {
    enum gas_process process;
    enum gas_ending ending;
    struct gas_leg_figure value;      /* of the ending */
    struct gas_leg_figure second;     /* v of "straight to P and V" */
    struct gas_leg_figure n;          /* polytropic exponent */
    struct gas_leg_figure efficiency; /* fraction */
    struct gas_leg_figure outside;    /* outside pressure */
    char text[GAS_LEG_TEXT];          /* as typed, for labels and sentences */
};

struct gas_typed_legs {
    size_t count;
    struct gas_typed_leg leg[GAS_LEGS];
    const struct gas_block *points; /* of a leg through points: the range, headings in its first row; else NULL */
    struct gas_unit point_P, point_V;
};

/* gas_legs_read - an argument of legs; whatever is wrong is said with the leg's number and text. */
bool gas_legs_read(const struct gas_block *argument, const struct gas_options *options, struct gas_typed_legs *legs,
                   struct gas_refusal *refusal);

/* gas_is_energy - what work and heat can be in: total, per time, per mole, per mass. */
bool gas_is_energy(enum gas_dimension dimension);

#endif
