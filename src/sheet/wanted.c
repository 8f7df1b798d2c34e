/* What is wanted: headings, in a text or in cells. */
#include <string.h>

#include "sheet/piece.h"
#include "sheet/table_form.h"

bool gas_refuse_figure(const char *what, const char *text, size_t length, struct gas_refusal *refusal)
{
    char shown[80];
    double figure;
    size_t used;
    if (!gas_number_parse(text, length, &figure, &used))
        return true;
    return gas_refuse(refusal, what, "%s is a figure where a heading such as \"m, kg\" is due.",
                      gas_quoted(shown, sizeof shown, text, length));
}

static bool want(struct gas_wanted *wanted, struct gas_piece item, const struct gas_options *options,
                 struct gas_refusal *refusal)
{
    struct gas_heading_fault fault;
    if (wanted->columns == GAS_COLUMNS)
        return gas_refuse(refusal, "wanted", "more than %d quantities are wanted; ask for some of them elsewhere.",
                          GAS_COLUMNS);
    if (!gas_refuse_figure("wanted", item.at, item.length, refusal))
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

struct gas_heading gas_heading_of(const char *text)
{
    struct gas_heading heading = {0};
    struct gas_heading_fault fault;
    gas_heading_parse(text, strlen(text), NULL, &heading, &fault);
    return heading;
}
