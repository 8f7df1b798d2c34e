#include "audit/legacy.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "sheet/piece.h"

enum { MOST_DIGITS = 9, SURE_DIGITS = 3 };

/* Digits of the shortest decimal that gives the number back, and its power of ten. */
static int shortest(double figure, int *exponent)
{
    char text[40];
    for (int digits = 1;; digits++) {
        snprintf(text, sizeof text, "%.*e", digits - 1, figure);
        if (digits == 17 || strtod(text, NULL) == figure) {
            *exponent = atoi(strchr(text, 'e') + 1);
            return digits;
        }
    }
}

int legacy_digits(double figure)
{
    int exponent = 0;
    if (figure == 0 || !isfinite(figure))
        return MOST_DIGITS;
    int digits = shortest(figure, &exponent);
    int whole = exponent + 1; /* places before the point */
    if (digits < whole && digits < SURE_DIGITS)
        digits = whole < SURE_DIGITS ? whole : SURE_DIGITS;
    return digits < MOST_DIGITS ? digits : MOST_DIGITS;
}

/* Digits as typed: "0.720" has three, "3500." four, "3500" what the number has. */
static int typed_digits(const char *text, size_t length, double figure)
{
    int digits = 0;
    bool point = false, started = false;
    for (size_t i = 0; i < length && text[i] != 'e' && text[i] != 'E'; i++) {
        point = point || text[i] == '.' || text[i] == ',';
        if (text[i] < '0' || text[i] > '9')
            continue;
        started = started || text[i] != '0';
        digits += started;
    }
    if (!point || digits == 0)
        return legacy_digits(figure);
    return digits < MOST_DIGITS ? digits : MOST_DIGITS;
}

static bool read_text(const struct gas_cell *cell, const struct gas_job *job, const struct gas_heading *heading,
                      struct legacy *legacy, struct gas_refusal *refusal)
{
    char shown[80];
    size_t used;
    struct gas_unit unit;
    struct gas_unit_fault fault;
    struct gas_piece text = gas_piece_of(cell);
    if (!gas_number_parse(text.at, text.length, &legacy->figure, &used))
        return gas_refuse(refusal, "legacy", "%s is not a number; give the old sheet's figure.",
                          gas_quoted(shown, sizeof shown, text.at, text.length));
    legacy->digits = typed_digits(text.at, used, legacy->figure);
    struct gas_piece rest = gas_piece_behind(text, used);
    if (rest.length == 0)
        return true;
    if (!gas_unit_parse(rest.at, rest.length, &job->options.references, &unit, &fault))
        return gas_refuse_unit(refusal, "legacy", &fault);
    if (unit.dimension != heading->unit.dimension)
        return gas_refuse(refusal, "legacy", "%s is the unit of %s, but %s is wanted.",
                          gas_quoted(shown, sizeof shown, rest.at, rest.length), gas_dimension_words(unit.dimension),
                          gas_dimension_words(heading->unit.dimension));
    double barometer = job->options.barometer;
    legacy->figure = gas_unit_from_si(&heading->unit, gas_unit_to_si(&unit, legacy->figure, barometer), barometer);
    return true;
}

bool legacy_read(const struct gas_cell *cell, const struct gas_job *job, const struct gas_heading *heading, int digits,
                 struct legacy *legacy, struct gas_refusal *refusal)
{
    *legacy = (struct legacy){0};
    if (gas_cell_blank(cell)) {
        legacy->blank = true;
        return true;
    }
    if (gas_cell_is_sentence(cell))
        return gas_refuse_sentence(refusal, cell->text);
    if (cell->kind == GAS_CELL_NUMBER) {
        legacy->figure = cell->number;
        legacy->digits = legacy_digits(cell->number);
    } else if (cell->kind != GAS_CELL_TEXT)
        return gas_refuse(refusal, "legacy", "its cell holds an error; mend that cell first.");
    else if (!read_text(cell, job, heading, legacy, refusal))
        return false;
    if (!isfinite(legacy->figure))
        return gas_refuse(refusal, "legacy", "it is not a finite number.");
    if (digits > 0)
        legacy->digits = digits;
    if (legacy->figure != 0)
        legacy->half = 0.5 * pow(10, floor(log10(fabs(legacy->figure)) + 1e-12) + 1 - legacy->digits);
    return true;
}
