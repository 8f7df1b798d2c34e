/* A mixture in cells: component | fraction (| unit), with or without a heading that says mol or wt, down or across. */
#include "sheet/gas_mixture.h"

#include <stdio.h>
#include <stdlib.h>
#include <string.h>

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
        return gas_amount_read(gas_piece_of(cell), component, marks);
    return cell->kind == GAS_CELL_NUMBER;
}

static bool refuse_row(struct gas_refusal *refusal, const char *line, size_t row, const struct gas_cell *name)
{
    char shown[80] = "";
    if (name->kind == GAS_CELL_TEXT)
        gas_quoted(shown, sizeof shown, name->text, name->length);
    if (name->kind != GAS_CELL_TEXT || gas_cell_blank(name))
        return gas_refuse(refusal, "gas",
                          "%s %zu of the mixture has no component; write its name, or \"total\" beside a total.", line,
                          row + 1);
    return gas_refuse(refusal, "gas", "%s in %s %zu of the mixture has no fraction that is a number.", shown, line,
                      row + 1);
}

static bool is_total(const struct gas_cell *name)
{
    char folded[40];
    return gas_listed(gas_fold(folded, sizeof folded, gas_piece_of(name)), "total|sum|totals|\u03a3|\u2211|intotal");
}

/* A heading names no gas and has words where a fraction would stand, or is a basis alone: "mol %" and a blank. */
static bool is_heading(const struct gas_cell *name, const struct gas_cell *amount)
{
    struct gas_marks marks = {0};
    bool named = name->kind == GAS_CELL_TEXT && !gas_cell_blank(name);
    if (gas_cell_blank(amount))
        return named && gas_marks_read(gas_piece_of(name), &marks);
    return amount->kind == GAS_CELL_TEXT && !(named && gas_name_find(name->text, name->length));
}

static bool take_heading(struct gas_recipe *recipe, const struct gas_cell *name, const struct gas_cell *amount,
                         struct gas_refusal *refusal)
{
    struct gas_marks marks = {0};
    if (amount->kind == GAS_CELL_TEXT)
        read_heading(gas_piece_of(amount), &marks);
    if (name->kind == GAS_CELL_TEXT)
        read_heading(gas_piece_of(name), &marks);
    if (marks.contradiction)
        return gas_refuse(refusal, "gas", "the heading of the mixture names both a mass and a mole basis; keep one.");
    recipe->basis = marks.basis;
    recipe->percent = marks.percent;
    return true;
}

/* The unit beside a fraction, "mol %", where the range has a column for it. */
static bool take_unit(const struct gas_cell *unit, struct gas_marks *marks, struct gas_refusal *refusal)
{
    char shown[60];
    if (!unit || gas_cell_blank(unit))
        return true;
    if (unit->kind == GAS_CELL_TEXT && gas_marks_read(gas_piece_of(unit), marks))
        return true;
    if (unit->kind != GAS_CELL_TEXT)
        return gas_refuse(refusal, "gas",
                          "the mixture has a second number beside a fraction; give component, fraction and perhaps the "
                          "unit.");
    return gas_refuse(refusal, "gas", "%s beside a fraction of the mixture is no unit of one; write mol %% or wt %%.",
                      gas_quoted(shown, sizeof shown, unit->text, unit->length));
}

static bool read_row(struct gas_recipe *recipe, const struct gas_block *block, size_t row, bool first,
                     struct gas_refusal *refusal)
{
    const struct gas_cell *name = gas_cell_at(block, row, 0), *amount = gas_cell_at(block, row, 1);
    const struct gas_cell *unit = block->columns > 2 ? gas_cell_at(block, row, 2) : NULL;
    struct gas_component component;
    struct gas_marks marks;
    bool named = name->kind == GAS_CELL_TEXT && !gas_cell_blank(name);
    bool figure = read_amount(amount, &component, &marks);
    if (first && !figure && is_heading(name, amount))
        return take_heading(recipe, name, amount, refusal);
    if (!named || !figure)
        return refuse_row(refusal, recipe->line, row, name);
    if (recipe->count && is_total(name)) {
        recipe->total = component.amount;
        return true;
    }
    if (!take_unit(unit, &marks, refusal))
        return false;
    component.ppm = marks.ppm;
    if (!component.rest && component.amount == 0) /* a what-if row at the end of its scale */
        return true;
    return gas_recipe_add(recipe, gas_piece_of(name), component, &marks, refusal);
}

static bool read_down(struct gas_draft *draft, const struct gas_block *block, const char *line)
{
    struct gas_recipe recipe = {.line = line};
    bool first = true;
    for (size_t row = 0; row < block->rows; row++) {
        if (gas_cell_blank(gas_cell_at(block, row, 0)) && gas_cell_blank(gas_cell_at(block, row, 1)))
            continue;
        if (!read_row(&recipe, block, row, first, draft->refusal))
            return false;
        first = false;
    }
    return gas_recipe_finish(&recipe, draft);
}

/* Components side by side, their fractions below: the second cell names a gas and is no fraction. */
static bool runs_across(const struct gas_block *block)
{
    struct gas_component component;
    struct gas_marks marks;
    if (block->columns < 2 || block->rows < 2 || block->rows > 3)
        return false;
    const struct gas_cell *second = gas_cell_at(block, 0, 1), *below = gas_cell_at(block, 1, 0);
    if (second->kind != GAS_CELL_TEXT || gas_cell_blank(second) || read_amount(second, &component, &marks))
        return false;
    return gas_name_find(second->text, second->length) || (block->columns > 3 && below->kind == GAS_CELL_NUMBER);
}

static bool read_across(struct gas_draft *draft, const struct gas_block *block)
{
    struct gas_cell *cell = calloc(block->rows * block->columns, sizeof *cell);
    if (!cell)
        return gas_refuse_memory(draft->refusal);
    for (size_t row = 0; row < block->rows; row++)
        for (size_t column = 0; column < block->columns; column++)
            cell[column * block->rows + row] = *gas_cell_at(block, row, column);
    const struct gas_block turned = {block->columns, block->rows, cell, block->range};
    bool good = read_down(draft, &turned, "column");
    free(cell);
    return good;
}

bool gas_draft_mixture_range(struct gas_draft *draft, const struct gas_block *block)
{
    if (runs_across(block))
        return read_across(draft, block);
    if (block->columns == 2 || block->columns == 3)
        return read_down(draft, block, "row");
    return gas_refuse(draft->refusal, "gas",
                      "the range has %zu row%s and %zu column%s; a mixture has two columns, component and fraction, or "
                      "two such rows; a gas card has label, value and unit, among them M or a form.",
                      block->rows, block->rows == 1 ? "" : "s", block->columns, block->columns == 1 ? "" : "s");
}
