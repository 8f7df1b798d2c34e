#include "sheet/table_form.h"

#include <string.h>

#include <gasleaf/heading.h>

/* A text that does not start with a figure: a heading, a label, a unit. */
static bool is_word(const struct gas_cell *cell)
{
    double figure;
    size_t used;
    return cell->kind == GAS_CELL_TEXT && !gas_cell_blank(cell) && !gas_cell_is_sentence(cell) &&
           !gas_number_parse(cell->text, cell->length, &figure, &used);
}

bool gas_cell_is_title(const struct gas_cell *cell)
{
    struct gas_piece text = {cell->text, cell->length};
    return cell->kind == GAS_CELL_TEXT && gas_piece_take(&text, "value") && text.length == 0;
}

bool gas_passed_over(struct gas_piece heading)
{
    static const char *const words[] = {
        "-",        "#",        "case",   "cases",    "row",     "no",        "no.",        "nr",    "nr.",    "tag",
        "name",     "label",    "id",     "item",     "run",     "test",      "note",       "notes", "point",  "remark",
        "remarks",  "comment",  "date",   "day",      "site",    "stream",    "line",       "unit",  "vessel", "tank",
        "receiver", "cylinder", "bottle", "comments", "service", "equipment", "description"};
    heading = gas_piece_trim(heading);
    for (size_t i = 0; i < sizeof words / sizeof *words; i++) {
        struct gas_piece rest = heading;
        bool sign = rest.length == 1 && rest.at[0] == words[i][0] && words[i][1] == '\0';
        if (sign || (gas_piece_take(&rest, words[i]) && rest.length == 0))
            return true;
    }
    return false;
}

struct gas_line gas_line_across(const struct gas_block *block, size_t row, size_t from)
{
    return (struct gas_line){&block->cell[row * block->columns + from], block->columns - from, 1};
}

struct gas_line gas_line_down(const struct gas_block *block, size_t column, size_t from)
{
    return (struct gas_line){&block->cell[from * block->columns + column], block->rows - from, block->columns};
}

static bool is_figure(const struct gas_cell *cell)
{
    return !gas_cell_blank(cell) && !is_word(cell);
}

bool gas_line_figures(struct gas_line line)
{
    for (size_t i = 0; i < line.count; i++)
        if (is_figure(&line.cell[i * line.step]))
            return true;
    return false;
}

static bool any_word(struct gas_line line)
{
    for (size_t i = 0; i < line.count; i++)
        if (is_word(&line.cell[i * line.step]))
            return true;
    return false;
}

static bool all_words(struct gas_line line)
{
    for (size_t i = 0; i < line.count; i++)
        if (!is_word(&line.cell[i * line.step]))
            return false;
    return true;
}

bool gas_line_of_units(struct gas_line line)
{
    size_t units = 0;
    for (size_t i = 0; i < line.count; i++) {
        const struct gas_cell *cell = &line.cell[i * line.step];
        struct gas_unit unit;
        if (gas_cell_blank(cell))
            continue;
        if (cell->kind != GAS_CELL_TEXT || !gas_unit_parse(cell->text, cell->length, NULL, &unit, NULL))
            return false;
        units++;
    }
    return units > 0;
}

static bool is_heading(const struct gas_cell *cell)
{
    struct gas_heading heading;
    return is_word(cell) && (gas_heading_parse(cell->text, cell->length, NULL, &heading, NULL) ||
                             gas_passed_over((struct gas_piece){cell->text, cell->length}));
}

/* How many cells of a line are headings that show a unit. */
static size_t headings_with_unit(struct gas_line line)
{
    size_t count = 0;
    for (size_t i = 0; i < line.count; i++) {
        const struct gas_cell *cell = &line.cell[i * line.step];
        struct gas_heading heading;
        count += is_word(cell) && gas_heading_parse(cell->text, cell->length, NULL, &heading, NULL) && heading.has_unit;
    }
    return count;
}

static bool figures_from_column(const struct gas_block *given, size_t column)
{
    for (size_t i = column; i < given->columns; i++)
        if (gas_line_figures(gas_line_down(given, i, 0)))
            return true;
    return false;
}

static bool all_texts(const struct gas_block *given)
{
    for (size_t i = 0; i < given->rows * given->columns; i++)
        if (given->cell[i].kind != GAS_CELL_TEXT && !gas_cell_blank(&given->cell[i]))
            return false;
    return true;
}

/* One row of texts, "P = 7 bar" | "35 degC", rather than a heading and its figures. */
static bool items_in_a_row(const struct gas_block *given)
{
    return given->rows == 1 && all_texts(given) &&
           (given->columns == 1 || !is_word(given->cell) || all_words(gas_line_across(given, 0, 0)));
}

/* Headings on top: no word below them in the first column, unless the column is one of names ("case", or no heading)
 * and what stands beside it on top are headings. */
static bool headed(const struct gas_block *given)
{
    if (given->rows < 2)
        return false;
    bool units = given->rows > 2 && gas_line_of_units(gas_line_across(given, 1, 0));
    struct gas_line top = gas_line_across(given, 0, 0);
    if (all_words(top) && !any_word(gas_line_down(given, 0, units ? 2 : 1)))
        return true;
    bool names = gas_cell_blank(top.cell) || gas_passed_over((struct gas_piece){top.cell->text, top.cell->length});
    return top.cell->kind != GAS_CELL_NUMBER && names && given->columns > 1 && !gas_cell_is_title(top.cell + 1) &&
           all_words(gas_line_across(given, 0, 1)) && is_heading(top.cell + 1) &&
           headings_with_unit(top) >= headings_with_unit(gas_line_down(given, 0, 1)); /* V-1 may be a vessel's name */
}

enum gas_form gas_form_of(const struct gas_block *given)
{
    struct gas_line first = gas_line_down(given, 0, 0);
    if (items_in_a_row(given))
        return GAS_FORM_ITEMS;
    if (headed(given))
        return GAS_FORM_HEADED;
    if (given->columns == 1 && all_texts(given))
        return GAS_FORM_ITEMS;
    if (given->columns == 1 || gas_line_figures(first) || !any_word(first))
        return GAS_FORM_BARE;
    if (given->columns == 2)
        return GAS_FORM_PAIRS;
    if (figures_from_column(given, 2))
        return GAS_FORM_SIDED;
    return given->columns == 3 ? GAS_FORM_TRIPLES : GAS_FORM_BARE;
}
