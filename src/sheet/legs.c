#include "sheet/legs.h"

#include <stdio.h>

#include "sheet/ascii.h"
#include "sheet/leg_text.h"

/* The legs of one cell. */
static bool add_text(const struct gas_options *options, struct gas_typed_legs *legs, const struct gas_cell *cell,
                     struct gas_refusal *refusal)
{
    struct gas_piece rest = {cell->text, cell->length}, text;
    while (gas_piece_next(&rest, &text)) {
        if (legs->count == GAS_LEGS)
            return gas_refuse(refusal, "legs", "there are more than %d; split the path.", GAS_LEGS);
        legs->count++;
        if (!gas_leg_read(&legs->leg[legs->count - 1], legs->count, text, options, refusal))
            return false;
    }
    return true;
}

/* A first row of the headings P and V over figures: one leg through points. */
static bool read_points(const struct gas_block *range, const struct gas_options *options, struct gas_typed_legs *legs,
                        bool *is_points)
{
    struct gas_heading heading[2];
    struct gas_heading_fault fault;
    *is_points = false;
    if (range->rows < 2 || range->columns < 2)
        return true;
    for (size_t i = 0; i < 2; i++) {
        const struct gas_cell *cell = gas_cell_at(range, 0, i);
        if (cell->kind != GAS_CELL_TEXT || gas_cell_at(range, 1, i)->kind != GAS_CELL_NUMBER ||
            !gas_heading_parse(cell->text, cell->length, &options->references, &heading[i], &fault))
            return true;
    }
    bool volume = heading[1].symbol == GAS_SYM_V || heading[1].symbol == GAS_SYM_V_SPECIFIC;
    if (heading[0].symbol != GAS_SYM_P || !volume)
        return true;
    *is_points = true;
    *legs =
        (struct gas_typed_legs){.count = 1, .points = range, .point_P = heading[0].unit, .point_V = heading[1].unit};
    const struct gas_cell *between = range->columns > 2 ? gas_cell_at(range, 0, 2) : NULL;
    bool curved = between && between->kind == GAS_CELL_TEXT && gas_ascii_starts(between->text, "polytropic");
    legs->leg[0].process = curved ? GAS_THROUGH_POLYTROPES : GAS_THROUGH_POINTS;
    snprintf(legs->leg[0].text, GAS_LEG_TEXT, "through %zu points", range->rows - 1);
    return true;
}

bool gas_legs_read(const struct gas_block *argument, const struct gas_options *options, struct gas_typed_legs *legs,
                   struct gas_refusal *refusal)
{
    bool is_points;
    const struct gas_cell *sentence = gas_block_sentence(argument);
    *legs = (struct gas_typed_legs){0};
    if (sentence)
        return gas_refuse_sentence(refusal, sentence->text);
    if (!read_points(argument, options, legs, &is_points) || is_points)
        return is_points;
    for (size_t i = 0; i < argument->rows * argument->columns; i++) {
        const struct gas_cell *cell = &argument->cell[i];
        if (gas_cell_blank(cell))
            continue;
        if (cell->kind != GAS_CELL_TEXT)
            return gas_refuse(refusal, "legs", "%s is a number; a leg is a text such as isothermal to 8 bar.",
                              gas_shown(cell->number).text);
        if (!add_text(options, legs, cell, refusal))
            return false;
    }
    return legs->count > 0 ||
           gas_refuse(refusal, "legs",
                      "there is none; write a process and where it ends, such as isothermal to 8 bar.");
}
