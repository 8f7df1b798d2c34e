#include "sheet/table.h"

#include <math.h>
#include <stdio.h>
#include <string.h>
#include <strings.h>

#include <gasleaf/species.h>
#include <gasleaf/state.h>

#include "sheet/item.h"
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
    size_t lines;     /* columns (or rows) of figures that are named so far, with those passed over */
};

static bool same_quantity(const struct gas_heading *a, const struct gas_heading *b)
{
    bool same = a->symbol == b->symbol && a->state == b->state && a->tolerance == b->tolerance;
    bool share = a->unit.dimension == GAS_DIM_NUMBER || b->unit.dimension == GAS_DIM_NUMBER;
    return same && (a->unit.dimension == b->unit.dimension || (a->tolerance && share));
}

static bool add(struct opening *opening, const struct gas_heading *heading, double figure)
{
    struct gas_table *table = opening->table;
    char name[GAS_NAME_TEXT], first[80], second[80];
    if (table->columns == GAS_COLUMNS)
        return gas_refuse(opening->refusal, opening->what, "more than %d quantities are given; leave some out.",
                          GAS_COLUMNS);
    for (size_t i = 0; i < table->columns; i++)
        if (same_quantity(&table->heading[i], heading) && strcmp(table->heading[i].text, heading->text) == 0)
            return gas_refuse(opening->refusal, opening->what, "%s is given twice; leave one out.",
                              gas_quantity_name(name, heading->symbol, heading->state));
        else if (same_quantity(&table->heading[i], heading))
            return gas_refuse(opening->refusal, opening->what, "%s is given twice, as %s and as %s; leave one out.",
                              gas_quantity_name(name, heading->symbol, heading->state),
                              gas_quoted(first, sizeof first, table->heading[i].text, strlen(table->heading[i].text)),
                              gas_quoted(second, sizeof second, heading->text, strlen(heading->text)));
    table->heading[table->columns] = *heading;
    table->line[table->columns] = (unsigned short)opening->lines;
    table->figure[table->columns++] = figure;
    return true;
}

static bool add_heading(struct opening *opening, const char *text, size_t length)
{
    struct gas_heading heading;
    struct gas_heading_fault fault;
    if (!gas_refuse_figure(opening->what, text, length, opening->refusal))
        return false;
    if (!gas_heading_parse(text, length, &opening->table->references, &heading, &fault))
        return gas_refuse_heading(opening->refusal, opening->what, text, length, &fault);
    return add(opening, &heading, NAN);
}

static bool add_item(struct opening *opening, const char *text, size_t length)
{
    struct gas_item item;
    if (!gas_item_read(text, length, &opening->table->references, opening->what, &item, opening->refusal))
        return false;
    for (size_t i = 0; i < item.count; i++)
        if (!add(opening, &item.heading[i], item.figure[i]))
            return false;
    return true;
}

static bool add_items(struct opening *opening, struct gas_piece rest)
{
    for (struct gas_piece item; gas_piece_next(&rest, &item);)
        if (!add_item(opening, item.at, item.length))
            return false;
    return true;
}

/* Must a value with a unit be read as an item of its own? Without a unit in the heading, and where its unit has another
 * basis: a gauge reading under an absolute heading waits for its barometer. */
static bool own_unit(const struct gas_heading *heading, const struct gas_cell *value)
{
    double figure;
    size_t used;
    struct gas_unit unit;
    if (!heading->has_unit)
        return true;
    struct gas_piece text = gas_piece_trim((struct gas_piece){value->text, value->length});
    return !heading->tolerance && gas_number_parse(text.at, text.length, &figure, &used) && used < text.length &&
           gas_unit_parse(text.at + used, text.length - used, NULL, &unit, NULL) &&
           unit.dimension == heading->unit.dimension && unit.basis != heading->unit.basis;
}

/* heading | value and label | value | unit, one row. The heading text is put together before it is read. */
static bool add_pair(struct opening *opening, const struct gas_cell *label, bool third)
{
    char text[3 * GAS_HEADING_TEXT], name[GAS_NAME_TEXT];
    const struct gas_cell *value = label + 1, *unit = value + third;
    bool unit_cell = third && !gas_cell_blank(unit);
    if (gas_cell_blank(value))
        return true;
    if (gas_cell_blank(label))
        return gas_refuse(opening->refusal, opening->what, "a value has no heading beside it; name it.");
    if (unit_cell && unit->kind != GAS_CELL_TEXT)
        return gas_refuse(opening->refusal, opening->what, "the third column holds a number where a unit is due.");
    if (gas_cell_is_sentence(value))
        return gas_refuse_sentence(opening->refusal, value->text);
    snprintf(text, sizeof text, "%s%s%s", label->text, unit_cell ? ", " : "", unit_cell ? unit->text : "");
    if (value->kind == GAS_CELL_TEXT && gas_word_constant(value->text, value->length)) {
        size_t used = strlen(text);
        snprintf(text + used, sizeof text - used, " = constant");
        return add_item(opening, text, strlen(text));
    }
    if (!add_heading(opening, text, strlen(text)))
        return false;
    struct gas_table *table = opening->table;
    size_t last = table->columns - 1;
    if (value->kind == GAS_CELL_TEXT && own_unit(&table->heading[last], value)) {
        table->columns--; /* the unit stands with the value: "P1" | "7 bar(g)" */
        snprintf(text, sizeof text, "%s = %s",
                 table->heading[last].has_unit
                     ? gas_quantity_name(name, table->heading[last].symbol, table->heading[last].state)
                     : label->text,
                 value->text);
        return add_item(opening, text, strlen(text));
    }
    return gas_table_cell(table, last, 0, value, &table->figure[last], opening->refusal);
}

static bool read_pairs(struct opening *opening, const struct gas_block *given)
{
    for (size_t row = 0; row < given->rows; row++) {
        const struct gas_cell *label = gas_cell_at(given, row, 0);
        if (row == 0 && gas_cell_is_title(label + 1))
            continue;
        if (!add_pair(opening, label, given->columns > 2))
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

/* A heading cell, with the cell of its unit where there is a second line of them (NULL: none). */
static bool read_heading(struct opening *opening, const struct gas_cell *cell, const struct gas_cell *unit,
                         struct gas_line figures)
{
    char text[3 * GAS_HEADING_TEXT];
    if (gas_cell_is_sentence(cell))
        return gas_refuse_sentence(opening->refusal, cell->text);
    if (cell->kind == GAS_CELL_NUMBER)
        return gas_refuse(opening->refusal, opening->what,
                          "a heading is a number; give the row (or column) of headings as it stands by the table.");
    bool blank = gas_cell_blank(cell), has_unit = unit && !gas_cell_blank(unit);
    struct gas_piece name = gas_piece_trim((struct gas_piece){blank ? "" : cell->text, blank ? 0 : cell->length});
    bool pass = blank ? !has_unit && !gas_line_figures(figures) : gas_passed_over(name);
    snprintf(text, sizeof text, "%.*s%s%s", (int)name.length, name.at, has_unit && !blank ? ", " : "",
             has_unit ? unit->text : "");
    if (!pass && !add_heading(opening, text, strlen(text)))
        return false;
    opening->lines++;
    return true;
}

/* Several headings in one text. */
static bool read_heading_text(struct opening *opening, const struct gas_cell *cell)
{
    struct gas_piece rest = {cell->text, cell->length}, item;
    if (cell->kind != GAS_CELL_TEXT || gas_cell_blank(cell) || gas_cell_is_sentence(cell))
        return read_heading(opening, cell, NULL, (struct gas_line){0});
    for (; gas_piece_next(&rest, &item); opening->lines++)
        if (!gas_passed_over(item) && !add_heading(opening, item.at, item.length))
            return false;
    return true;
}

/* The line of figures below (or beside) heading number i. */
static struct gas_line line_of(const struct gas_table *table, const struct gas_block *given, size_t i)
{
    size_t lines = table->across ? given->rows - table->first_row : given->columns - table->first_column;
    if (i >= lines)
        return (struct gas_line){0};
    return table->across ? gas_line_across(given, table->first_row + i, table->first_column)
                         : gas_line_down(given, table->first_column + i, table->first_row);
}

static bool read_headings(struct opening *opening, const struct gas_block *given, struct gas_line names,
                          const struct gas_cell *units)
{
    for (size_t i = 0; i < names.count; i++)
        if (!read_heading(opening, &names.cell[i * names.step], units ? &units[i * names.step] : NULL,
                          line_of(opening->table, given, i)))
            return false;
    return true;
}

static bool refuse_count(struct opening *opening, const struct gas_block *given, bool beside)
{
    size_t lines = beside ? given->rows : given->columns;
    const char *kind = beside ? "row" : "column";
    return gas_refuse(opening->refusal, "headings",
                      "there %s %zu heading%s for %zu %s%s of figures; give one for each %s.",
                      opening->lines == 1 ? "is" : "are", opening->lines, opening->lines == 1 ? "" : "s", lines, kind,
                      lines == 1 ? "" : "s", kind);
}

static bool belong_together(const struct gas_cell *name, const struct gas_cell *unit)
{
    char text[3 * GAS_HEADING_TEXT];
    snprintf(text, sizeof text, "%s, %s", name->text ? name->text : "", unit->text ? unit->text : "");
    return gas_heading_parse(text, strlen(text), NULL, &(struct gas_heading){0}, NULL);
}

/* Headings beside the table in one or two lines: names, or names and units. Across or down is told here. */
static bool read_heading_block(struct opening *opening, const struct gas_block *given, const struct gas_block *headings)
{
    bool rectangle = headings->rows > 1 && headings->columns > 1;
    bool units_below = rectangle && headings->rows == 2 && gas_line_of_units(gas_line_across(headings, 1, 0));
    bool units_beside = rectangle && headings->columns == 2 && gas_line_of_units(gas_line_down(headings, 1, 0));
    if (gas_single(headings))
        return read_heading_text(opening, headings->cell);
    if (units_below && units_beside) /* two by two, and "T1" could be a unit as well */
        units_below = belong_together(headings->cell, gas_cell_at(headings, 1, 0));
    if (rectangle && !units_below && !units_beside)
        return gas_refuse(opening->refusal, "headings",
                          "they fill %zu rows and %zu columns; give one row or one column of headings, or a second one "
                          "with the units.",
                          headings->rows, headings->columns);
    opening->table->across = headings->rows > 1 && !units_below;
    struct gas_line names = opening->table->across ? gas_line_down(headings, 0, 0) : gas_line_across(headings, 0, 0);
    const struct gas_cell *units = !rectangle ? NULL : units_below ? gas_cell_at(headings, 1, 0) : headings->cell + 1;
    return read_headings(opening, given, names, units);
}

/* A table of figures with `headings` naming its columns, or its rows. */
static bool read_with_headings(struct opening *opening, const struct gas_block *given, const struct gas_block *headings)
{
    struct gas_table *table = opening->table;
    opening->what = "headings";
    if (!read_heading_block(opening, given, headings))
        return false;
    bool fits = opening->lines == given->columns;
    bool fits_beside = opening->lines == given->rows;
    if (gas_single(headings))
        table->across = !fits && fits_beside;
    if (table->across ? !fits_beside : !fits)
        return refuse_count(opening, given, table->across);
    table->block = given;
    table->rows = table->across ? given->columns : given->rows;
    return true;
}

/* Headings inside the table itself, perhaps with a line of units after them. */
static bool read_headed(struct opening *opening, const struct gas_block *given, bool beside)
{
    struct gas_table *table = opening->table;
    size_t lines = beside ? given->columns : given->rows;
    struct gas_line names = beside ? gas_line_down(given, 0, 0) : gas_line_across(given, 0, 0);
    bool units = lines > 2 && gas_line_of_units(beside ? gas_line_down(given, 1, 0) : gas_line_across(given, 1, 0));
    size_t first = units ? 2 : 1;
    table->across = beside;
    table->block = given;
    table->first_row = beside ? 0 : first;
    table->first_column = beside ? first : 0;
    table->rows = lines - first;
    return read_headings(opening, given, names, units ? gas_cell_at(given, beside ? 0 : 1, beside ? 1 : 0) : NULL);
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

/* "±V, %" beside "V, Nm3": the figure is an amount, so its share is one too. */
static void share_of_reference_volumes(struct gas_table *table)
{
    for (size_t i = 0; i < table->columns; i++) {
        struct gas_heading *share = &table->heading[i];
        bool is_share = share->tolerance && share->unit.dimension == GAS_DIM_NUMBER && share->symbol == GAS_SYM_V;
        for (size_t k = 0; k < table->columns && is_share; k++)
            if (table->heading[k].unit.reference_volume && table->heading[k].state == share->state)
                share->symbol = GAS_SYM_N;
    }
}

bool gas_table_read(const struct gas_block *given, const struct gas_block *headings, const struct gas_options *options,
                    struct gas_table *table, struct gas_refusal *refusal)
{
    memset(table, 0, sizeof *table);
    struct opening opening = {table, refusal, "given", 0};
    table->barometer = options->barometer;
    table->references = options->references;
    if (gas_omitted(given))
        return gas_refuse(refusal, "given", "nothing is given; write figures like \"7 bar(g); 35 °C; 12 m3\".");
    bool good =
        headings && !gas_omitted(headings) ? read_with_headings(&opening, given, headings) : read_form(&opening, given);
    if (good)
        share_of_reference_volumes(table);
    if (good && table->columns == 0)
        return gas_refuse(refusal, "given", "it is blank; write figures like \"7 bar(g); 35 °C; 12 m3\".");
    return good;
}
