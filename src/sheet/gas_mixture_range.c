/* A mixture in cells: component | fraction, with or without a heading row that says mol or wt. */
#include "sheet/gas_mixture.h"

#include <stdio.h>
#include <string.h>

static struct gas_piece text_of(const struct gas_cell *cell)
{
    return gas_piece_trim((struct gas_piece){cell->text, cell->length});
}

/* "mol %", "Mass fraction", "x": the words of a heading, wherever they stand in it. */
static void read_heading(struct gas_piece heading, struct gas_marks *marks)
{
    while (heading.length) {
        size_t used = gas_marks_take(heading, marks);
        size_t step = used;
        while (!used && step < heading.length && !strchr(" ,(/", heading.at[step]))
            step++;
        step += !used;
        step = step > heading.length ? heading.length : step;
        heading = (struct gas_piece){heading.at + step, heading.length - step};
    }
}

static bool read_amount(const struct gas_cell *cell, struct gas_component *component, struct gas_marks *marks)
{
    *marks = (struct gas_marks){0};
    *component = (struct gas_component){.amount = cell->number};
    if (cell->kind == GAS_CELL_TEXT)
        return gas_amount_read(text_of(cell), component, marks);
    return cell->kind == GAS_CELL_NUMBER;
}

static bool refuse_row(struct gas_refusal *refusal, size_t row, const struct gas_cell *name)
{
    char shown[80] = "";
    if (name->kind == GAS_CELL_TEXT)
        gas_quoted(shown, sizeof shown, name->text, name->length);
    if (name->kind != GAS_CELL_TEXT)
        return gas_refuse(refusal, "gas", "row %zu of the mixture has no component name in its first cell.", row + 1);
    return gas_refuse(refusal, "gas", "%s in row %zu of the mixture has no fraction that is a number.", shown, row + 1);
}

static bool read_row(struct gas_recipe *recipe, const struct gas_block *block, size_t row, bool first,
                     struct gas_refusal *refusal)
{
    const struct gas_cell *name = gas_cell_at(block, row, 0), *amount = gas_cell_at(block, row, 1);
    struct gas_component component;
    struct gas_marks marks;
    bool named = name->kind == GAS_CELL_TEXT && !gas_cell_blank(name);
    bool figure = read_amount(amount, &component, &marks);
    if (first && !figure && amount->kind == GAS_CELL_TEXT && !(named && gas_species_find(name->text, name->length))) {
        read_heading(text_of(amount), &marks);
        if (named)
            read_heading(text_of(name), &marks);
        if (marks.contradiction)
            return gas_refuse(refusal, "gas",
                              "the heading of the mixture names both a mass and a mole basis; keep one.");
        recipe->basis = marks.basis;
        recipe->percent = marks.percent;
        return true;
    }
    if (!named || !figure)
        return refuse_row(refusal, row, name);
    if (!component.rest && component.amount == 0) /* a what-if row at the end of its scale */
        return true;
    return gas_recipe_add(recipe, text_of(name), component, &marks, refusal);
}

bool gas_draft_mixture_range(struct gas_draft *draft, const struct gas_block *block)
{
    struct gas_recipe recipe = {0};
    bool first = true;
    if (block->columns != 2)
        return gas_refuse(draft->refusal, "gas",
                          "the range has %zu columns; a mixture has two, component and fraction; a gas card has label, "
                          "value and unit, among them M or a heat-capacity form.",
                          block->columns);
    for (size_t row = 0; row < block->rows; row++) {
        if (gas_cell_blank(gas_cell_at(block, row, 0)) && gas_cell_blank(gas_cell_at(block, row, 1)))
            continue;
        if (!read_row(&recipe, block, row, first, draft->refusal))
            return false;
        first = false;
    }
    return gas_recipe_finish(&recipe, draft);
}
