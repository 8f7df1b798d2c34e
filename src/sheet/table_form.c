#include "sheet/table_form.h"

#include <gasleaf/unit.h>

bool gas_cell_is_word(const struct gas_cell *cell)
{
    double figure;
    size_t used;
    return cell->kind == GAS_CELL_TEXT && !gas_cell_blank(cell) && !gas_cell_is_sentence(cell) &&
           !gas_number_parse(cell->text, cell->length, &figure, &used);
}

static bool is_figure(const struct gas_cell *cell)
{
    return !gas_cell_blank(cell) && !gas_cell_is_word(cell);
}

static bool all_words_on_top(const struct gas_block *given)
{
    for (size_t i = 0; i < given->columns; i++)
        if (!gas_cell_is_word(gas_cell_at(given, 0, i)))
            return false;
    return true;
}

/* A word in the first column, from a row on. */
static bool word_below(const struct gas_block *given, size_t row)
{
    for (; row < given->rows; row++)
        if (gas_cell_is_word(gas_cell_at(given, row, 0)))
            return true;
    return false;
}

static bool words_or_blanks_beside(const struct gas_block *given)
{
    for (size_t row = 0; row < given->rows; row++)
        if (is_figure(gas_cell_at(given, row, 0)))
            return false;
    return word_below(given, 0);
}

static bool figures_from_column(const struct gas_block *given, size_t column)
{
    for (size_t row = 0; row < given->rows; row++)
        for (size_t i = column; i < given->columns; i++)
            if (is_figure(gas_cell_at(given, row, i)))
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
           (given->columns == 1 || !gas_cell_is_word(given->cell) || all_words_on_top(given));
}

enum gas_form gas_form_of(const struct gas_block *given)
{
    if (items_in_a_row(given))
        return GAS_FORM_ITEMS;
    if (given->rows > 1 && all_words_on_top(given) && !word_below(given, 1))
        return GAS_FORM_HEADED;
    if (given->columns == 1 && all_texts(given))
        return GAS_FORM_ITEMS;
    if (given->columns == 1 || !words_or_blanks_beside(given))
        return GAS_FORM_BARE;
    if (given->columns == 2)
        return GAS_FORM_PAIRS;
    if (figures_from_column(given, 2))
        return GAS_FORM_SIDED;
    return given->columns == 3 ? GAS_FORM_TRIPLES : GAS_FORM_BARE;
}
