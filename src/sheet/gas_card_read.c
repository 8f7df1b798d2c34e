/* The rows of a gas card, collected. */
#include "sheet/gas_card.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#include "sheet/gas_rule.h"

#define WHAT "gas card"

/* One row of the card: where its values and its unit stand. */
struct row {
    struct gas_card *card;
    const struct gas_block *block;
    size_t number;
    size_t values; /* value columns of the card */
    struct gas_card_label label;
    struct gas_piece unit; /* of the unit cell or the label; length 0: none */
};

static const struct gas_cell *value_cell(const struct row *row, size_t interval)
{
    return gas_cell_at(row->block, row->number, 1 + interval);
}

static bool refuse_row(const struct row *row, const char *words)
{
    return gas_refuse(row->card->refusal, WHAT, "\"%.40s\" in row %zu %s", row->label.letter, row->number + 1, words);
}

/* A number, or a text with a number and perhaps its unit; NAN for a blank cell. */
static bool read_number(struct row *row, size_t interval, double *value)
{
    const struct gas_cell *cell = value_cell(row, interval);
    struct gas_piece text = gas_piece_of(cell);
    size_t used;
    *value = cell->kind == GAS_CELL_NUMBER ? cell->number : NAN;
    if (cell->kind == GAS_CELL_NUMBER)
        return isfinite(*value) || refuse_row(row, "is not a finite number.");
    if (gas_cell_blank(cell))
        return true;
    if (!gas_number_parse(text.at, text.length, value, &used))
        return refuse_row(row, "needs a number as its value.");
    if (used < text.length)
        row->unit = (struct gas_piece){text.at + used, text.length - used};
    return true;
}

static bool read_one_number(struct row *row, double *value)
{
    if (!read_number(row, 0, value))
        return false;
    return !isnan(*value) || refuse_row(row, "has no value; give one or delete the row.");
}

static bool row_unit(struct row *row, struct gas_unit *unit)
{
    struct gas_unit_fault fault;
    *unit = gas_unit_si(GAS_DIM_NUMBER);
    unit->text[0] = '\0';
    if (row->unit.length == 0 || gas_unit_parse(row->unit.at, row->unit.length, NULL, unit, &fault))
        return true;
    return gas_refuse_unit(row->card->refusal, row->label.letter, &fault);
}

static bool read_M(struct row *row)
{
    double figure;
    struct gas_unit unit;
    return read_one_number(row, &figure) && row_unit(row, &unit) &&
           gas_molar_mass_read(figure, &unit, &row->card->M, row->card->refusal);
}

static bool read_R(struct row *row, bool of_fit)
{
    double figure, specific = 0;
    struct gas_unit unit;
    struct gas_card *card = row->card;
    return read_one_number(row, &figure) && row_unit(row, &unit) &&
           gas_constant_read(figure, &unit, of_fit ? &card->R_of_fit : &card->R, of_fit ? &specific : &card->R_specific,
                             card->refusal);
}

static bool read_cp(struct row *row)
{
    struct gas_card *card = row->card;
    card->cp = gas_piece_of(value_cell(row, 0));
    card->cp_text_unit = row->unit;
    if (value_cell(row, 0)->kind == GAS_CELL_NUMBER)
        return read_one_number(row, &card->cp_value);
    return card->cp.length || refuse_row(row, "has no value; give one or delete the row.");
}

static bool read_ends(struct row *row, double *end, struct gas_piece *unit)
{
    for (size_t i = 0; i < row->values && i < GAS_CARD_INTERVALS; i++)
        if (!read_number(row, i, &end[i]))
            return false;
    *unit = row->unit;
    return true;
}

static bool read_constant(struct row *row)
{
    struct gas_card *card = row->card;
    for (size_t i = 0; i < card->constants; i++)
        if (strcmp(card->constant[i].label.constant, row->label.constant) == 0)
            return refuse_row(row, "stands there twice; keep one.");
    if (card->constants == GAS_CARD_CONSTANTS)
        return gas_refuse(card->refusal, WHAT, "it has more than %d constants.", GAS_CARD_CONSTANTS);
    struct gas_constant *constant = &card->constant[card->constants];
    *constant = (struct gas_constant){.label = row->label};
    bool any = false;
    for (size_t i = 0; i < GAS_CARD_INTERVALS; i++) {
        constant->value[i] = NAN;
        if (i < row->values && !read_number(row, i, &constant->value[i]))
            return false;
        constant->value[i] *= row->label.factor;
        any |= !isnan(constant->value[i]);
    }
    constant->unit = row->unit;
    card->constants += any;
    return true;
}

/* Of the rows cp unit and T unit: in the value cell or in that of the unit. */
static struct gas_piece unit_said(const struct row *row)
{
    struct gas_piece text = gas_piece_of(value_cell(row, 0));
    return text.length ? text : row->unit;
}

static bool read_cp_unit(struct row *row)
{
    row->card->cp_unit_said = true;
    return gas_cp_unit_read(unit_said(row), &row->card->cp_unit, row->card->refusal);
}

static bool read_T_unit(struct row *row)
{
    row->card->T_unit_said = true;
    return gas_T_unit_read(unit_said(row), &row->card->T_unit, row->card->refusal);
}

static bool read_text(struct row *row, struct gas_piece *kept)
{
    if (row->unit.length && (row->label.item == GAS_CARD_RULE || row->label.item == GAS_CARD_RANGE))
        return refuse_row(row, "is read from its value cell alone; write the unit there.");
    *kept = gas_piece_of(value_cell(row, 0));
    return true;
}

/* Of names and sources, which a print may show twice, the first one stays. */
static bool read_first(struct row *row, struct gas_piece *kept)
{
    return kept->length || read_text(row, kept);
}

static bool read_cp_at_25(struct row *row)
{
    struct gas_card *card = row->card;
    if (!read_number(row, 0, &card->cp_at_25))
        return false;
    card->cp_at_25_unit = row->unit;
    return true;
}

static bool read_part(struct row *row)
{
    const struct gas_cell *cell = value_cell(row, 0);
    const bool by_mass = row->label.item == GAS_CARD_MASS_PART;
    struct gas_recipe *recipe = by_mass ? &row->card->by_mass : &row->card->by_mole;
    struct gas_component component = {.amount = cell->number};
    struct gas_marks marks = {0};
    if (cell->kind == GAS_CELL_TEXT && !gas_amount_read(gas_piece_of(cell), &component, &marks))
        return refuse_row(row, "needs a fraction as its value, such as 0.21 or 21 %.");
    if (cell->kind == GAS_CELL_EMPTY || (!component.rest && component.amount == 0))
        return true;
    if (row->unit.length && !gas_marks_read(row->unit, &marks))
        return refuse_row(row, "has a unit that is not one of a fraction; write mol % or wt %.");
    if (marks.basis && by_mass != (marks.basis == GAS_BASIS_MASS))
        return refuse_row(row, "has the unit of the other basis; x is by mole and w by mass.");
    marks.basis = by_mass ? GAS_BASIS_MASS : GAS_BASIS_MOLE;
    component.ppm = marks.ppm;
    return gas_recipe_add(recipe, row->label.part, component, &marks, row->card->refusal);
}

/* What a card can say once only; read_single takes these. */
static bool is_single(enum gas_card_item item)
{
    return item >= GAS_CARD_M && item <= GAS_CARD_RULE;
}

static bool read_single(struct row *row)
{
    struct gas_card *card = row->card;
    switch (row->label.item) {
    case GAS_CARD_M:
        return read_M(row);
    case GAS_CARD_FORM:
        card->unit_of_form = row->unit;
        return read_text(row, &card->form);
    case GAS_CARD_CP_UNIT:
        return read_cp_unit(row);
    case GAS_CARD_T_UNIT:
        return read_T_unit(row);
    case GAS_CARD_FROM:
        return read_ends(row, card->from, &card->from_unit);
    case GAS_CARD_TO:
        return read_ends(row, card->to, &card->to_unit);
    case GAS_CARD_RANGE:
        return read_text(row, &card->range);
    case GAS_CARD_R:
    case GAS_CARD_R_OF_FIT:
        return read_R(row, row->label.item == GAS_CARD_R_OF_FIT);
    case GAS_CARD_CP:
        return read_cp(row);
    case GAS_CARD_K:
        return read_one_number(row, &card->k);
    case GAS_CARD_RULE:
        return read_text(row, &card->rule);
    default:
        return refuse_row(row, "is not a label known on a gas card; those are name, M, form, cp unit, T unit, the "
                               "constants, from, to, cp, k, R, rule, x with a component, source and note.");
    }
}

static bool read_row(struct row *row)
{
    struct gas_card *card = row->card;
    const unsigned bit = 1U << row->label.item;
    if (is_single(row->label.item) && (card->seen & bit))
        return refuse_row(row, "stands there twice; keep one.");
    card->seen |= bit;
    switch (row->label.item) {
    case GAS_CARD_NAME:
        return read_first(row, &card->name);
    case GAS_CARD_FORMULA:
        return read_first(row, &card->formula);
    case GAS_CARD_CAS:
        return read_first(row, &card->cas);
    case GAS_CARD_SOURCE:
        return read_first(row, &card->source);
    case GAS_CARD_CP_AT_25:
        return read_cp_at_25(row);
    case GAS_CARD_MOLE_PART:
    case GAS_CARD_MASS_PART:
        return read_part(row);
    case GAS_CARD_CONSTANT:
        return read_constant(row);
    case GAS_CARD_REMARK:
        return true;
    default:
        return read_single(row);
    }
}

static bool holds_number(const struct gas_cell *cell)
{
    struct gas_piece text = gas_piece_of(cell);
    double number;
    size_t used;
    return cell->kind == GAS_CELL_NUMBER ||
           (text.length && gas_number_parse(text.at, text.length, &number, &used) && used == text.length);
}

/* Values stand in every column up to the first one, from the third on, that holds no number: there the units stand. */
static size_t value_columns(const struct gas_block *block)
{
    for (size_t column = 2; column < block->columns; column++) {
        bool any = false;
        for (size_t row = 0; row < block->rows && !any; row++)
            any = holds_number(gas_cell_at(block, row, column));
        if (!any)
            return column - 1;
    }
    return block->columns - 1;
}

static bool accept_shape(const struct gas_card *card, const struct gas_block *block, size_t values)
{
    for (size_t row = 0; row < block->rows; row++)
        for (size_t column = values + 2; column < block->columns; column++)
            if (holds_number(gas_cell_at(block, row, column)))
                return gas_refuse(card->refusal, WHAT,
                                  "a number stands behind the unit column in row %zu; the columns are label, one value "
                                  "for each interval, unit.",
                                  row + 1);
    if (values > GAS_CARD_INTERVALS)
        return gas_refuse(card->refusal, WHAT, "it has %zu value columns; at most %d intervals are read.", values,
                          GAS_CARD_INTERVALS);
    return true;
}

/* Intervals in use: columns with a constant or an end of a range. */
static void count_intervals(struct gas_card *card)
{
    card->intervals = 1;
    for (size_t i = 1; i < GAS_CARD_INTERVALS; i++) {
        bool used = !isnan(card->from[i]) || !isnan(card->to[i]);
        for (size_t k = 0; k < card->constants; k++)
            used |= !isnan(card->constant[k].value[i]);
        if (used)
            card->intervals = i + 1;
    }
}

bool gas_card_read(struct gas_card *card, const struct gas_block *block)
{
    size_t values = value_columns(block);
    for (size_t i = 0; i < GAS_CARD_INTERVALS; i++)
        card->from[i] = card->to[i] = NAN;
    card->cp_value = card->k = card->cp_at_25 = NAN;
    card->T_unit = gas_T_kelvin;
    if (!accept_shape(card, block, values))
        return false;
    for (size_t number = 0; number < block->rows; number++) {
        struct gas_piece text = gas_piece_of(gas_cell_at(block, number, 0));
        struct row row = {card, block, number, values, gas_card_label_read(text), {"", 0}};
        row.unit = row.label.unit;
        if (values + 1 < block->columns && !gas_cell_blank(gas_cell_at(block, number, values + 1)))
            row.unit = gas_piece_of(gas_cell_at(block, number, values + 1));
        if (text.length == 0 && gas_cell_blank(value_cell(&row, 0)))
            continue;
        if (text.length == 0)
            return gas_refuse(card->refusal, WHAT, "row %zu has a value and no label.", number + 1);
        if (!read_row(&row))
            return false;
    }
    count_intervals(card);
    return true;
}
