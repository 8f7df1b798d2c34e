/* UNIT: conversion that knows gauge, differences and reference volumes. */
#include <math.h>
#include <string.h>

#include "sheet/ascii.h"
#include "sheet/elementwise.h"
#include "sheet/functions.h"

/* A unit of the call, and whether it was marked as a difference: "Δ°C". */
struct side {
    struct gas_unit unit;
    bool difference;
};

/* Returns what follows a mark that makes a unit a difference, or the text itself. */
static const char *after_difference_mark(const char *text)
{
    static const char *const marks[] = {"Δ", "delta ", "difference "};
    for (size_t i = 0; i < sizeof marks / sizeof *marks; i++)
        if (gas_ascii_starts(text, marks[i]))
            return text + strlen(marks[i]);
    return text;
}

static bool read_side(const struct gas_block *argument, const char *name, struct side *side,
                      struct gas_refusal *refusal)
{
    struct gas_unit_fault fault;
    if (!gas_single(argument) || argument->cell->kind != GAS_CELL_TEXT)
        return gas_refuse(refusal, name, "a unit is a text in one cell, such as psig or kg/h.");
    const char *text = after_difference_mark(argument->cell->text);
    side->difference = text != argument->cell->text;
    if (gas_unit_parse(text, strlen(text), NULL, &side->unit, &fault))
        return true;
    return gas_refuse_unit(refusal, name, &fault);
}

static const char *way_out(enum gas_dimension from, enum gas_dimension to)
{
    bool flow = from == GAS_DIM_VOLUME_FLOW || from == GAS_DIM_AMOUNT_FLOW || from == GAS_DIM_MASS_FLOW;
    bool volume =
        from == GAS_DIM_VOLUME || to == GAS_DIM_VOLUME || from == GAS_DIM_VOLUME_FLOW || to == GAS_DIM_VOLUME_FLOW;
    bool stuff = from == GAS_DIM_AMOUNT || from == GAS_DIM_MASS || from == GAS_DIM_VOLUME || flow;
    if (stuff && volume)
        return "that takes pressure and temperature: use GAS.SOLVE";
    return stuff ? "that takes the gas: use GAS.SOLVE" : "give two units of the same kind";
}

static bool sides_match(const struct side *from, const struct side *to, struct gas_refusal *refusal)
{
    char one[80], other[80];
    gas_quoted(one, sizeof one, from->unit.text, strlen(from->unit.text));
    gas_quoted(other, sizeof other, to->unit.text, strlen(to->unit.text));
    if (!gas_unit_compatible(&from->unit, &to->unit))
        return gas_refuse(refusal, "to", "%s is %s and %s is %s; %s.", one, gas_dimension_words(from->unit.dimension),
                          other, gas_dimension_words(to->unit.dimension),
                          way_out(from->unit.dimension, to->unit.dimension));
    if (from->difference != to->difference)
        return gas_refuse(refusal, from->difference ? "to" : "from",
                          "only one of the units is marked as a difference; "
                          "mark both, such as Δ°C and Δ°F.");
    return true;
}

/* Bare numbers are Pa; a text has its own unit: "0.98 bar". */
static bool read_barometer(const struct gas_block *argument, double *barometer, struct gas_refusal *refusal)
{
    static const struct gas_block no_unit = {0};
    struct gas_input input = {.name = "barometer", .dimension = GAS_DIM_PRESSURE, .other = GAS_DIM_PRESSURE};
    struct gas_reading reading;
    if (gas_omitted(argument))
        return true;
    if (!gas_single(argument))
        return gas_refuse(refusal, "barometer", "it is one figure, in Pa or with its unit.");
    if (!gas_input_open(&input, argument, &no_unit, refusal) || !gas_input_read(&input, 0, 0, &reading, refusal))
        return false;
    *barometer = reading.si;
    return reading.si > 0 || gas_refuse(refusal, "barometer",
                                        "%s Pa is not a pressure of air; give it in Pa or with "
                                        "its unit, such as 0.98 bar.",
                                        gas_shown(reading.si).text);
}

static bool convert(const struct gas_cell *cell, const struct side *from, const struct side *to, double barometer,
                    double *converted, struct gas_refusal *refusal)
{
    char shown[80];
    size_t used = 0;
    double x = cell->number;
    if (gas_cell_is_sentence(cell))
        return gas_refuse_sentence(refusal, cell->text);
    if (gas_cell_blank(cell))
        return gas_refuse(refusal, "value", "the cell is blank; give a figure.");
    if (cell->kind == GAS_CELL_TEXT && (!gas_number_parse(cell->text, cell->length, &x, &used) || used != cell->length))
        return gas_refuse(refusal, "value", "%s is not a plain number; the units go into the other arguments.",
                          gas_quoted(shown, sizeof shown, cell->text, cell->length));
    if (from->difference) {
        *converted = gas_unit_difference_from_si(&to->unit, gas_unit_difference_to_si(&from->unit, x));
        return true;
    }
    if (!gas_accept_level(refusal, "value", x, &from->unit, barometer))
        return false;
    *converted = gas_unit_from_si(&to->unit, gas_unit_to_si(&from->unit, x, barometer), barometer);
    return true;
}

void gas_fn_unit(struct gas_call *call)
{
    struct gas_refusal refusal = {0};
    struct side from = {0}, to = {0};
    double barometer = GAS_ATMOSPHERE;
    const struct gas_block *value = gas_argument(call, 0);
    if (gas_omitted(value))
        gas_refuse(&refusal, "value", "it is left out; give a figure, a cell or a range.");
    if (!refusal.made && read_side(gas_argument(call, 1), "from", &from, &refusal) &&
        read_side(gas_argument(call, 2), "to", &to, &refusal) && sides_match(&from, &to, &refusal))
        read_barometer(gas_argument(call, 3), &barometer, &refusal);
    if (refusal.made) {
        gas_answer_text(call, refusal.text);
        return;
    }
    if (!gas_answer_block(call, value->rows, value->columns))
        return;
    for (size_t i = 0; i < value->rows * value->columns; i++) {
        double converted = NAN;
        refusal.made = false;
        if (convert(&value->cell[i], &from, &to, barometer, &converted, &refusal))
            gas_put_number(call, i / value->columns, i % value->columns, converted);
        else
            gas_put_text(call, i / value->columns, i % value->columns, refusal.text);
    }
}
