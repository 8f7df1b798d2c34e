#include "sheet/elementwise.h"

#include <stdio.h>
#include <string.h>

/* A unit text in a single cell. */
static bool read_unit(const struct gas_block *argument, const char *name, struct gas_unit *unit,
                      struct gas_refusal *refusal)
{
    struct gas_unit_fault fault;
    if (!gas_single(argument) || argument->cell->kind != GAS_CELL_TEXT)
        return gas_refuse(refusal, name, "a unit is a text in one cell, such as °C or bar(g).");
    if (gas_unit_parse(argument->cell->text, argument->cell->length, NULL, unit, &fault))
        return true;
    return gas_refuse_unit(refusal, name, &fault);
}

static bool fits(const struct gas_input *input, const struct gas_unit *unit, struct gas_refusal *refusal)
{
    char shown[80];
    if (unit->dimension == input->dimension || unit->dimension == input->other)
        return true;
    return gas_refuse(refusal, input->name, "%s is the unit of %s; %s is needed, such as %s.",
                      gas_quoted(shown, sizeof shown, unit->text, strlen(unit->text)),
                      gas_dimension_words(unit->dimension), gas_dimension_words(input->dimension),
                      gas_dimension_si(input->dimension));
}

/* As the catalogue calls the argument that names the unit. */
static const char *kind_of(enum gas_dimension dimension)
{
    return dimension == GAS_DIM_TEMPERATURE ? "temperature" : dimension == GAS_DIM_PRESSURE ? "pressure" : "change";
}

bool gas_input_open(struct gas_input *input, const struct gas_block *block, const struct gas_block *unit,
                    struct gas_refusal *refusal)
{
    char unit_name[40];
    input->block = block;
    input->unit = gas_unit_si(input->dimension);
    if (gas_omitted(block))
        return gas_refuse(refusal, input->name, "it is left out; give a figure, a cell or a range.");
    if (gas_omitted(unit))
        return true;
    snprintf(unit_name, sizeof unit_name, "%s unit", kind_of(input->dimension));
    return read_unit(unit, unit_name, &input->unit, refusal) && fits(input, &input->unit, refusal);
}

bool gas_inputs_shape(const struct gas_input *inputs, size_t count, size_t *rows, size_t *columns,
                      struct gas_refusal *refusal)
{
    const struct gas_input *leader = NULL;
    for (size_t i = 0; i < count; i++) {
        const struct gas_block *block = inputs[i].block;
        if (gas_single(block))
            continue;
        if (leader && (block->rows != leader->block->rows || block->columns != leader->block->columns))
            return gas_refuse(refusal, inputs[i].name,
                              "%zu x %zu cells do not pair with the %zu x %zu of %s; give "
                              "ranges of one shape, or a single value.",
                              block->rows, block->columns, leader->block->rows, leader->block->columns, leader->name);
        leader = leader ? leader : &inputs[i];
    }
    *rows = leader ? leader->block->rows : 1;
    *columns = leader ? leader->block->columns : 1;
    return true;
}

static bool read_text(const struct gas_input *input, const struct gas_cell *cell, double *figure, struct gas_unit *unit,
                      struct gas_refusal *refusal)
{
    char shown[80];
    size_t used = 0;
    struct gas_unit_fault fault;
    if (!gas_number_parse(cell->text, cell->length, figure, &used))
        return gas_refuse(refusal, input->name, "%s is not a number; give %s.",
                          gas_quoted(shown, sizeof shown, cell->text, cell->length),
                          strchr("0123456789", cell->text[0]) ? "it without separators of thousands, such as 1234.5 K"
                                                              : "a figure, or a figure with its unit");
    if (used + strspn(cell->text + used, " ") == cell->length)
        return true;
    if (!gas_unit_parse(cell->text + used, cell->length - used, NULL, unit, &fault))
        return gas_refuse_unit(refusal, input->name, &fault);
    return fits(input, unit, refusal);
}

bool gas_input_read(const struct gas_input *input, size_t row, size_t column, struct gas_reading *reading,
                    struct gas_refusal *refusal)
{
    bool single = gas_single(input->block);
    const struct gas_cell *cell = gas_cell_at(input->block, single ? 0 : row, single ? 0 : column);
    double figure = cell->number;
    reading->unit = input->unit;
    if (gas_cell_is_sentence(cell))
        return gas_refuse_sentence(refusal, cell->text);
    if (gas_cell_blank(cell))
        return gas_refuse(refusal, input->name, "the cell is blank; give a figure.");
    if (cell->kind == GAS_CELL_TEXT && !read_text(input, cell, &figure, &reading->unit, refusal))
        return false;
    if (!gas_accept_level(refusal, input->name, figure, &reading->unit, GAS_ATMOSPHERE))
        return false;
    reading->si = gas_unit_to_si(&reading->unit, figure, GAS_ATMOSPHERE);
    return true;
}
