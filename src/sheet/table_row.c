/* The figures of a table, case by case. */
#include <math.h>

#include <gasleaf/species.h>

#include "sheet/piece.h"
#include "sheet/table_form.h"

static const struct gas_cell *cell_of(const struct gas_table *table, size_t column, size_t row)
{
    size_t line = table->line[column];
    return gas_cell_at(table->block, table->first_row + (table->across ? line : row),
                       table->first_column + (table->across ? row : line));
}

/* The barometer of one case: its own column, or its altitude; else that of the options. */
static double barometer_of(const struct gas_table *table, size_t row)
{
    struct gas_refusal ignored = {0};
    for (size_t i = 0; i < table->columns && !table->one_case; i++) {
        const struct gas_heading *heading = &table->heading[i];
        bool altitude = heading->symbol == GAS_SYM_ALTITUDE;
        const struct gas_cell *cell = cell_of(table, i, row);
        double figure = NAN;
        if (heading->tolerance || !(altitude || heading->symbol == GAS_SYM_BAROMETER) || gas_cell_blank(cell) ||
            heading->unit.basis != GAS_ABSOLUTE || !gas_table_cell(table, i, row, cell, &figure, &ignored))
            continue;
        double si = gas_unit_to_si(&heading->unit, figure, table->barometer);
        return altitude ? gas_standard_atmosphere_pressure(si).value : si;
    }
    return table->barometer;
}

/* "7 bar(g)" in a cell under a heading in psi: its own unit, turned to the heading's. */
static bool figure_with_unit(const struct gas_table *table, size_t column, size_t row, struct gas_piece text,
                             double *figure, struct gas_refusal *refusal)
{
    char name[GAS_NAME_TEXT], shown[80];
    struct gas_unit unit;
    struct gas_unit_fault fault;
    const struct gas_heading *heading = &table->heading[column];
    gas_quantity_name(name, heading->symbol, heading->state);
    if (!gas_unit_parse(text.at, text.length, &table->references, &unit, &fault))
        return gas_refuse_unit(refusal, name, &fault);
    if (unit.dimension != heading->unit.dimension)
        return gas_refuse(refusal, name, "%s is the unit of %s, but its heading asks for %s.",
                          gas_quoted(shown, sizeof shown, text.at, text.length), gas_dimension_words(unit.dimension),
                          gas_dimension_words(heading->unit.dimension));
    double barometer = unit.basis == heading->unit.basis ? table->barometer : barometer_of(table, row);
    if (heading->tolerance)
        *figure = gas_unit_difference_from_si(&heading->unit, gas_unit_difference_to_si(&unit, *figure));
    else
        *figure = gas_unit_from_si(&heading->unit, gas_unit_to_si(&unit, *figure, barometer), barometer);
    return true;
}

bool gas_table_cell(const struct gas_table *table, size_t column, size_t row, const struct gas_cell *cell,
                    double *figure, struct gas_refusal *refusal)
{
    char name[GAS_NAME_TEXT], shown[80];
    size_t used;
    const struct gas_heading *heading = &table->heading[column];
    if (cell->kind == GAS_CELL_NUMBER) {
        *figure = cell->number;
        return true;
    }
    gas_quantity_name(name, heading->symbol, heading->state);
    if (cell->kind != GAS_CELL_TEXT)
        return gas_refuse(refusal, name, "its cell holds an error; mend that cell first.");
    if (gas_cell_is_sentence(cell))
        return gas_refuse_sentence(refusal, cell->text);
    struct gas_piece text = gas_piece_of(cell);
    if (!gas_number_parse(text.at, text.length, figure, &used))
        return gas_refuse(refusal, name, "%s is not a number; write a figure, or leave the cell blank.",
                          gas_quoted(shown, sizeof shown, text.at, text.length));
    struct gas_piece unit = gas_piece_behind(text, used);
    return unit.length == 0 || figure_with_unit(table, column, row, unit, figure, refusal);
}

bool gas_table_row(const struct gas_table *table, size_t row, struct gas_row *figures, struct gas_refusal *refusal)
{
    figures->given = 0;
    for (size_t i = 0; i < table->columns; i++) {
        double *figure = &figures->figure[i];
        *figure = table->one_case ? table->figure[i] : NAN;
        if (!table->one_case) {
            const struct gas_cell *cell = cell_of(table, i, row);
            if (gas_cell_blank(cell))
                continue;
            if (!gas_table_cell(table, i, row, cell, figure, refusal))
                return false;
        }
        figures->given |= UINT32_C(1) << i;
    }
    return true;
}
