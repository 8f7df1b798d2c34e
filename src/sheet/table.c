#include "sheet/table.h"

#include <math.h>
#include <stdio.h>
#include <string.h>
#include <strings.h>

#include "sheet/piece.h"
#include "sheet/table_form.h"

const char *gas_quantity_name(char buffer[GAS_NAME_TEXT], enum gas_symbol symbol, int state)
{
    int used = snprintf(buffer, GAS_NAME_TEXT, "%s", gas_symbol_text(symbol));
    if (state > 0)
        snprintf(buffer + used, GAS_NAME_TEXT - (size_t)used, "%d", state);
    return buffer;
}

/* A table being read. */
struct opening {
    struct gas_table *table;
    struct gas_refusal *refusal;
    const char *what; /* the argument that the headings stand in */
};

static bool same_quantity(const struct gas_heading *a, const struct gas_heading *b)
{
    return a->symbol == b->symbol && a->state == b->state && a->tolerance == b->tolerance &&
           a->unit.dimension == b->unit.dimension;
}

static bool add(struct opening *opening, const struct gas_heading *heading, double figure)
{
    struct gas_table *table = opening->table;
    char name[GAS_NAME_TEXT], first[80], second[80];
    if (table->columns == GAS_COLUMNS)
        return gas_refuse(opening->refusal, opening->what, "more than %d quantities are given; leave some out.",
                          GAS_COLUMNS);
    for (size_t i = 0; i < table->columns; i++)
        if (same_quantity(&table->heading[i], heading))
            return gas_refuse(opening->refusal, opening->what, "%s is given twice, as %s and as %s; leave one out.",
                              gas_quantity_name(name, heading->symbol, heading->state),
                              gas_quoted(first, sizeof first, table->heading[i].text, strlen(table->heading[i].text)),
                              gas_quoted(second, sizeof second, heading->text, strlen(heading->text)));
    table->heading[table->columns] = *heading;
    table->figure[table->columns++] = figure;
    return true;
}

/* "7 kg" is a figure; as a unit it would mean seven of them. */
static bool refuse_figure(const char *what, const char *text, size_t length, struct gas_refusal *refusal)
{
    char shown[80];
    double figure;
    size_t used;
    if (!gas_number_parse(text, length, &figure, &used))
        return true;
    return gas_refuse(refusal, what, "%s is a figure where a heading such as \"m, kg\" is due.",
                      gas_quoted(shown, sizeof shown, text, length));
}

static bool add_heading(struct opening *opening, const char *text, size_t length)
{
    struct gas_heading heading;
    struct gas_heading_fault fault;
    if (!refuse_figure(opening->what, text, length, opening->refusal))
        return false;
    if (!gas_heading_parse(text, length, &opening->table->references, &heading, &fault))
        return gas_refuse_heading(opening->refusal, opening->what, text, length, &fault);
    return add(opening, &heading, NAN);
}

static bool add_item(struct opening *opening, const char *text, size_t length)
{
    struct gas_heading heading;
    struct gas_heading_fault fault;
    double figure;
    if (!gas_given_parse(text, length, &opening->table->references, &heading, &figure, &fault))
        return gas_refuse_heading(opening->refusal, opening->what, text, length, &fault);
    return add(opening, &heading, figure);
}

static bool add_items(struct opening *opening, struct gas_piece rest)
{
    for (struct gas_piece item; gas_piece_next(&rest, &item);)
        if (!add_item(opening, item.at, item.length))
            return false;
    return true;
}

/* "7 bar(g)" in a cell under a heading in psi: its own unit, turned to the heading's. */
static bool figure_with_unit(const struct gas_table *table, const struct gas_heading *heading, struct gas_piece text,
                             double *figure, struct gas_refusal *refusal)
{
    char name[GAS_NAME_TEXT], shown[80];
    struct gas_unit unit;
    struct gas_unit_fault fault;
    gas_quantity_name(name, heading->symbol, heading->state);
    if (!gas_unit_parse(text.at, text.length, &table->references, &unit, &fault))
        return gas_refuse_unit(refusal, name, &fault);
    if (unit.dimension != heading->unit.dimension)
        return gas_refuse(refusal, name, "%s is the unit of %s, but its heading asks for %s.",
                          gas_quoted(shown, sizeof shown, text.at, text.length), gas_dimension_words(unit.dimension),
                          gas_dimension_words(heading->unit.dimension));
    if (heading->tolerance)
        *figure = gas_unit_difference_from_si(&heading->unit, gas_unit_difference_to_si(&unit, *figure));
    else
        *figure = gas_unit_from_si(&heading->unit, gas_unit_to_si(&unit, *figure, table->barometer), table->barometer);
    return true;
}

static bool cell_figure(const struct gas_table *table, const struct gas_heading *heading, const struct gas_cell *cell,
                        double *figure, struct gas_refusal *refusal)
{
    char name[GAS_NAME_TEXT], shown[80];
    size_t used;
    if (cell->kind == GAS_CELL_NUMBER) {
        *figure = cell->number;
        return true;
    }
    gas_quantity_name(name, heading->symbol, heading->state);
    if (cell->kind != GAS_CELL_TEXT)
        return gas_refuse(refusal, name, "its cell holds an error; mend that cell first.");
    if (gas_cell_is_sentence(cell))
        return gas_refuse_sentence(refusal, cell->text);
    struct gas_piece text = gas_piece_trim((struct gas_piece){cell->text, cell->length});
    if (!gas_number_parse(text.at, text.length, figure, &used))
        return gas_refuse(refusal, name, "%s is not a number; write a figure, or leave the cell blank.",
                          gas_quoted(shown, sizeof shown, text.at, text.length));
    struct gas_piece unit = gas_piece_trim((struct gas_piece){text.at + used, text.length - used});
    return unit.length == 0 || figure_with_unit(table, heading, unit, figure, refusal);
}

/* heading | value and label | value | unit, one row. The heading text is put together before it is read. */
static bool add_pair(struct opening *opening, const struct gas_cell *label, const struct gas_cell *value,
                     const struct gas_cell *unit)
{
    char text[3 * GAS_HEADING_TEXT];
    bool unit_cell = unit && !gas_cell_blank(unit);
    if (gas_cell_blank(value))
        return true;
    if (gas_cell_blank(label))
        return gas_refuse(opening->refusal, opening->what, "a value has no heading beside it; name it.");
    if (unit_cell && unit->kind != GAS_CELL_TEXT)
        return gas_refuse(opening->refusal, opening->what, "the third column holds a number where a unit is due.");
    if (gas_cell_is_sentence(value))
        return gas_refuse_sentence(opening->refusal, value->text);
    snprintf(text, sizeof text, "%s%s%s", label->text, unit_cell ? ", " : "", unit_cell ? unit->text : "");
    if (!add_heading(opening, text, strlen(text)))
        return false;
    struct gas_table *table = opening->table;
    size_t last = table->columns - 1;
    if (table->heading[last].has_unit || value->kind != GAS_CELL_TEXT)
        return cell_figure(table, &table->heading[last], value, &table->figure[last], opening->refusal);
    table->columns--; /* the unit stands with the value: "P1" | "7 bar(g)" */
    snprintf(text, sizeof text, "%s = %s", label->text, value->text);
    return add_item(opening, text, strlen(text));
}

static bool is_title(const struct gas_cell *value)
{
    struct gas_piece text = {value->text, value->length};
    return value->kind == GAS_CELL_TEXT && gas_piece_take(&text, "value") && text.length == 0;
}

static bool read_pairs(struct opening *opening, const struct gas_block *given)
{
    for (size_t row = 0; row < given->rows; row++) {
        const struct gas_cell *value = gas_cell_at(given, row, 1);
        if (row == 0 && is_title(value))
            continue;
        if (!add_pair(opening, gas_cell_at(given, row, 0), value, given->columns > 2 ? value + 1 : NULL))
            return false;
    }
    return true;
}

static bool read_items(struct opening *opening, const struct gas_block *given)
{
    const struct gas_cell *sentence = gas_block_sentence(given);
    if (sentence)
        return gas_refuse_sentence(opening->refusal, sentence->text);
    for (size_t i = 0; i < given->rows * given->columns; i++)
        if (!gas_cell_blank(&given->cell[i]) &&
            !add_items(opening, (struct gas_piece){given->cell[i].text, given->cell[i].length}))
            return false;
    return true;
}

/* Headings from cells that stand side by side or one above another; a single text may hold several. */
static bool read_headings(struct opening *opening, const struct gas_block *block, size_t count, size_t step)
{
    for (size_t i = 0; i < count; i++) {
        const struct gas_cell *cell = &block->cell[i * step];
        if (gas_cell_is_sentence(cell))
            return gas_refuse_sentence(opening->refusal, cell->text);
        if (cell->kind == GAS_CELL_NUMBER)
            return gas_refuse(opening->refusal, opening->what,
                              "a heading is a number; give the row (or column) of headings as it stands by the table.");
        struct gas_piece rest = {cell->text, cell->kind == GAS_CELL_TEXT ? cell->length : 0}, item;
        if (count > 1 || gas_cell_blank(cell)) {
            if (!add_heading(opening, rest.at ? rest.at : "", rest.length))
                return false;
        } else
            while (gas_piece_next(&rest, &item))
                if (!add_heading(opening, item.at, item.length))
                    return false;
    }
    return true;
}

static bool refuse_count(struct opening *opening, const struct gas_block *given, bool beside)
{
    size_t lines = beside ? given->rows : given->columns;
    const char *kind = beside ? "row" : "column";
    return gas_refuse(opening->refusal, "headings",
                      "there %s %zu heading%s for %zu %s%s of figures; give one for each %s.",
                      opening->table->columns == 1 ? "is" : "are", opening->table->columns,
                      opening->table->columns == 1 ? "" : "s", lines, kind, lines == 1 ? "" : "s", kind);
}

/* A table of figures with `headings` naming its columns, or its rows. */
static bool read_with_headings(struct opening *opening, const struct gas_block *given, const struct gas_block *headings)
{
    struct gas_table *table = opening->table;
    opening->what = "headings";
    if (headings->rows > 1 && headings->columns > 1)
        return gas_refuse(opening->refusal, "headings",
                          "they fill %zu rows and %zu columns; give one row or one column of headings.", headings->rows,
                          headings->columns);
    if (!read_headings(opening, headings, headings->rows * headings->columns, 1))
        return false;
    bool fits = table->columns == given->columns;
    bool fits_beside = table->columns == given->rows;
    if (headings->rows > 1)
        table->across = true;
    else if (gas_single(headings))
        table->across = !fits && fits_beside;
    if (table->across ? !fits_beside : !fits)
        return refuse_count(opening, given, table->across);
    table->block = given;
    table->rows = table->across ? given->columns : given->rows;
    return true;
}

/* Headings inside the table itself. */
static bool read_headed(struct opening *opening, const struct gas_block *given, bool beside)
{
    struct gas_table *table = opening->table;
    table->across = beside;
    table->block = given;
    table->first_row = beside ? 0 : 1;
    table->first_column = beside ? 1 : 0;
    table->rows = beside ? given->columns - 1 : given->rows - 1;
    return read_headings(opening, given, beside ? given->rows : given->columns, beside ? given->columns : 1);
}

static bool read_form(struct opening *opening, const struct gas_block *given)
{
    opening->table->one_case = true;
    opening->table->rows = 1;
    enum gas_form form = gas_form_of(given);
    switch (form) {
    case GAS_FORM_ITEMS:
        return read_items(opening, given);
    case GAS_FORM_PAIRS:
    case GAS_FORM_TRIPLES:
        return read_pairs(opening, given);
    case GAS_FORM_HEADED:
    case GAS_FORM_SIDED:
        opening->table->one_case = false;
        return read_headed(opening, given, form == GAS_FORM_SIDED);
    default:
        return gas_refuse(opening->refusal, "given",
                          gas_single(given) ? "a bare number does not say what it is; write it like \"7 bar(g)\"."
                                            : "the table has no headings; give its row of headings (such as "
                                              "\"P1, bar(g)\") as the argument headings.");
    }
}

bool gas_table_read(const struct gas_block *given, const struct gas_block *headings, const struct gas_options *options,
                    struct gas_table *table, struct gas_refusal *refusal)
{
    struct opening opening = {table, refusal, "given"};
    memset(table, 0, sizeof *table);
    table->barometer = options->barometer;
    table->references = options->references;
    if (gas_omitted(given))
        return gas_refuse(refusal, "given", "nothing is given; write figures like \"7 bar(g); 35 °C; 12 m3\".");
    bool good =
        headings && !gas_omitted(headings) ? read_with_headings(&opening, given, headings) : read_form(&opening, given);
    if (good && table->columns == 0)
        return gas_refuse(refusal, "given", "it is blank; write figures like \"7 bar(g); 35 °C; 12 m3\".");
    return good;
}

bool gas_table_row(const struct gas_table *table, size_t row, struct gas_row *figures, struct gas_refusal *refusal)
{
    figures->given = 0;
    for (size_t i = 0; i < table->columns; i++) {
        double *figure = &figures->figure[i];
        *figure = table->one_case ? table->figure[i] : NAN;
        if (!table->one_case) {
            size_t down = table->first_row + (table->across ? i : row);
            size_t right = table->first_column + (table->across ? row : i);
            const struct gas_cell *cell = gas_cell_at(table->block, down, right);
            if (gas_cell_blank(cell))
                continue;
            if (!cell_figure(table, &table->heading[i], cell, figure, refusal))
                return false;
        }
        figures->given |= UINT32_C(1) << i;
    }
    return true;
}

static bool want(struct gas_wanted *wanted, struct gas_piece item, const struct gas_options *options,
                 struct gas_refusal *refusal)
{
    struct gas_heading_fault fault;
    if (wanted->columns == GAS_COLUMNS)
        return gas_refuse(refusal, "wanted", "more than %d quantities are wanted; ask for some of them elsewhere.",
                          GAS_COLUMNS);
    if (!refuse_figure("wanted", item.at, item.length, refusal))
        return false;
    if (!gas_heading_parse(item.at, item.length, &options->references, &wanted->heading[wanted->columns], &fault))
        return gas_refuse_heading(refusal, "wanted", item.at, item.length, &fault);
    wanted->columns++;
    return true;
}

static bool want_cell(struct gas_wanted *wanted, const struct gas_cell *cell, bool alone,
                      const struct gas_options *options, struct gas_refusal *refusal)
{
    struct gas_piece rest = {cell->text, cell->length}, item;
    if (gas_cell_is_sentence(cell))
        return gas_refuse_sentence(refusal, cell->text);
    if (cell->kind != GAS_CELL_TEXT || gas_cell_blank(cell))
        return gas_refuse(refusal, "wanted", "%s where a heading such as \"m, kg\" is due.",
                          cell->kind == GAS_CELL_NUMBER ? "there is a number" : "there is a blank");
    if (!alone)
        return want(wanted, gas_piece_trim(rest), options, refusal);
    while (gas_piece_next(&rest, &item))
        if (!want(wanted, item, options, refusal))
            return false;
    return true;
}

bool gas_wanted_read(const struct gas_block *argument, const struct gas_options *options, struct gas_wanted *wanted,
                     struct gas_refusal *refusal)
{
    wanted->columns = 0;
    wanted->down = false;
    if (!argument || gas_omitted(argument))
        return true;
    if (argument->rows > 1 && argument->columns > 1)
        return gas_refuse(refusal, "wanted",
                          "it fills %zu rows and %zu columns; give one row or one column of headings.", argument->rows,
                          argument->columns);
    wanted->down = argument->rows > 1;
    for (size_t i = 0; i < argument->rows * argument->columns; i++)
        if (!want_cell(wanted, &argument->cell[i], gas_single(argument), options, refusal))
            return false;
    return true;
}
