#include "sheet/options.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#include <gasleaf/species.h>

#include "sheet/piece.h"

const struct gas_options gas_options_default = {
    .barometer = GAS_ATMOSPHERE,
    .system = GAS_CLOSED,
    .datum = {.T = 298.15, .P = 1e5},
    .agree = 1e-3,
    .references = {.normal_T = 273.15,
                   .normal_P = GAS_ATMOSPHERE,
                   .standard_T = 288.15,
                   .standard_P = GAS_ATMOSPHERE,
                   .scf_T = (60 + 459.67) / 1.8,
                   .scf_P = 14.696 * 6894.757293168361},
};

/* One option being read: what stands behind its words. */
struct reader {
    struct gas_piece rest;
    char shown[80]; /* the whole option, in quotes */
    const char *form;
    struct gas_options *options;
    struct gas_refusal *refusal;
};

static bool refuse_form(struct reader *reader)
{
    return gas_refuse(reader->refusal, "options", "%s cannot be read; write it like \"%s\".", reader->shown,
                      reader->form);
}

/* A figure with a unit of one dimension, to SI at the barometer so far. */
static bool read_figure(struct reader *reader, struct gas_piece piece, enum gas_dimension dimension, double *si)
{
    struct gas_unit unit;
    struct gas_unit_fault fault;
    double figure;
    size_t used;
    piece = gas_piece_trim(piece);
    if (!gas_number_parse(piece.at, piece.length, &figure, &used))
        return refuse_form(reader);
    struct gas_piece text = gas_piece_behind(piece, used);
    if (text.length == 0)
        unit = gas_unit_si(dimension);
    else if (!gas_unit_parse(text.at, text.length, NULL, &unit, &fault))
        return gas_refuse_unit(reader->refusal, "options", &fault);
    if (unit.dimension != dimension)
        return refuse_form(reader);
    *si = gas_unit_to_si(&unit, figure, reader->options->barometer);
    return gas_accept_level(reader->refusal, "options", figure, &unit, reader->options->barometer);
}

/* A comma that is not a decimal comma: no digit on one of its sides. */
static size_t separating_comma(struct gas_piece piece)
{
    for (size_t i = 1; i + 1 < piece.length; i++) {
        bool digits = strchr("0123456789", piece.at[i - 1]) && strchr("0123456789", piece.at[i + 1]);
        if (piece.at[i] == ',' && !digits)
            return i;
    }
    return piece.length;
}

/* "0 degC, 1 atm"; without a pressure *P is left alone. */
static bool read_conditions(struct reader *reader, double *T, double *P)
{
    struct gas_piece rest = reader->rest;
    size_t comma = separating_comma(rest);
    if (!read_figure(reader, (struct gas_piece){rest.at, comma}, GAS_DIM_TEMPERATURE, T))
        return false;
    if (comma < rest.length &&
        !read_figure(reader, (struct gas_piece){rest.at + comma + 1, rest.length - comma - 1}, GAS_DIM_PRESSURE, P))
        return false;
    return *P > 0 || refuse_form(reader);
}

static bool read_barometer(struct reader *reader)
{
    double P = NAN;
    reader->options->barometer = 0; /* a gauge reading of the barometer itself is none: refused below */
    if (!read_figure(reader, reader->rest, GAS_DIM_PRESSURE, &P))
        return false;
    if (!(P >= GAS_BAROMETER_LEAST && P <= GAS_BAROMETER_MOST))
        return gas_refuse(reader->refusal, "options",
                          "%s is no air pressure; a barometer lies between 0.01 and 10 bar, so check its unit.",
                          reader->shown);
    reader->options->barometer = P;
    return true;
}

static bool read_altitude(struct reader *reader)
{
    double altitude = NAN;
    if (!read_figure(reader, reader->rest, GAS_DIM_LENGTH, &altitude))
        return false;
    struct gas_result P = gas_standard_atmosphere_pressure(altitude);
    if (P.status != GAS_OK)
        return gas_refuse(reader->refusal, "options",
                          "%s is outside the standard atmosphere (-500 to 20000 m); give the barometer itself.",
                          reader->shown);
    reader->options->barometer = P.value;
    return true;
}

static bool read_work_by(struct reader *reader)
{
    reader->options->work_by_gas = true;
    return true;
}

static bool read_work_on(struct reader *reader)
{
    reader->options->work_by_gas = false;
    return true;
}

static bool read_flow(struct reader *reader)
{
    reader->options->system = GAS_FLOW;
    reader->options->system_said = true;
    return true;
}

static bool read_open(struct reader *reader)
{
    reader->options->open = true;
    return true;
}

static bool read_closed(struct reader *reader)
{
    reader->options->open = false;
    reader->options->system = GAS_CLOSED;
    reader->options->system_said = true;
    return true;
}

static bool read_hard_errors(struct reader *reader)
{
    reader->options->hard_errors = true;
    return true;
}

static bool read_datum(struct reader *reader)
{
    return read_conditions(reader, &reader->options->datum.T, &reader->options->datum.P);
}

static bool read_normal(struct reader *reader)
{
    return read_conditions(reader, &reader->options->references.normal_T, &reader->options->references.normal_P);
}

static bool read_standard(struct reader *reader)
{
    return read_conditions(reader, &reader->options->references.standard_T, &reader->options->references.standard_P);
}

static bool read_scf(struct reader *reader)
{
    return read_conditions(reader, &reader->options->references.scf_T, &reader->options->references.scf_P);
}

/* "30 %", from nothing to the most, as a fraction. */
static bool read_percent(struct reader *reader, double most, double *fraction)
{
    double figure;
    size_t used;
    if (!gas_number_parse(reader->rest.at, reader->rest.length, &figure, &used))
        return refuse_form(reader);
    struct gas_piece unit = gas_piece_behind(reader->rest, used);
    if (unit.length != 1 || unit.at[0] != '%' || !(figure >= 0 && figure <= most))
        return refuse_form(reader);
    *fraction = figure / 100;
    return true;
}

static bool read_agree(struct reader *reader)
{
    return read_percent(reader, 50, &reader->options->agree);
}

static bool read_digits(struct reader *reader)
{
    double figure;
    size_t used;
    if (!gas_number_parse(reader->rest.at, reader->rest.length, &figure, &used) || used != reader->rest.length ||
        !(figure >= 1 && figure <= 9) || figure != floor(figure))
        return refuse_form(reader);
    reader->options->digits = (int)figure;
    return true;
}

static bool say_wall(struct reader *reader, enum gas_wall wall)
{
    reader->options->wall_said = true;
    reader->options->wall = wall;
    return true;
}

static bool read_isothermal(struct reader *reader)
{
    return say_wall(reader, GAS_WALL_ISOTHERMAL);
}

static bool read_adiabatic(struct reader *reader)
{
    return say_wall(reader, GAS_WALL_ADIABATIC);
}

static bool read_wall_heat(struct reader *reader)
{
    return read_percent(reader, 100, &reader->options->wall_fraction) && say_wall(reader, GAS_WALL_FRACTION);
}

static bool read_outlet(struct reader *reader)
{
    reader->options->outlet_said = true;
    return read_figure(reader, reader->rest, GAS_DIM_PRESSURE, &reader->options->P_outlet) &&
           (reader->options->P_outlet > 0 || refuse_form(reader));
}

/* THE table of options: words (lower case, longer ones first), what follows them, the reader. */
/* clang-format off */
static const struct option {
    const char *words;
    bool figure;      /* something must follow the words */
    const char *form; /* as the sentence shows it */
    bool (*read)(struct reader *reader);
} table[] = {
    {"barometer at", true,  "barometer at 2400 m",     read_altitude},
    {"barometer",    true,  "barometer 0.98 bar",      read_barometer},
    {"altitude",     true,  "altitude 2400 m",         read_altitude},
    {"work by gas",  false, "work by gas",             read_work_by},
    {"work on gas",  false, "work on gas",             read_work_on},
    {"flow",         false, "flow",                    read_flow},
    {"closed",       false, "closed",                  read_closed},
    {"open",         false, "open",                    read_open},
    {"datum",        true,  "datum 0 °C, 1 atm",       read_datum},
    {"agree",        true,  "agree 0.5 %",             read_agree},
    {"normal",       true,  "normal 0 °C, 1 bar",      read_normal},
    {"standard",     true,  "standard 20 °C, 1 atm",   read_standard},
    {"scf",          true,  "scf 60 °F, 14.73 psi",    read_scf},
    {"digits",       true,  "digits 4",                read_digits},
    {"hard errors",  false, "hard errors",             read_hard_errors},
    {"isothermal",   false, "isothermal",              read_isothermal},
    {"adiabatic",    false, "adiabatic",               read_adiabatic},
    {"heat lost",    true,  "heat lost 30 %",          read_wall_heat},
    {"heat gained",  true,  "heat gained 30 %",        read_wall_heat},
    {"outlet",       true,  "outlet 2 bar",            read_outlet},
};
/* clang-format on */
enum { OPTIONS = sizeof table / sizeof *table };

static bool refuse_unknown(const char *shown, struct gas_refusal *refusal)
{
    char known[480];
    size_t used = 0;
    for (size_t i = 0; i < OPTIONS && used < sizeof known; i++)
        used += (size_t)snprintf(known + used, sizeof known - used, "%s%s", i ? "; " : "", table[i].form);
    return gas_refuse(refusal, "options", "%s is not an option; the options are: %s.", shown, known);
}

static bool read_option(struct gas_piece item, struct gas_options *options, struct gas_refusal *refusal)
{
    struct reader reader = {.options = options, .refusal = refusal};
    gas_quoted(reader.shown, sizeof reader.shown, item.at, item.length);
    for (size_t i = 0; i < OPTIONS; i++) {
        reader.rest = item;
        reader.form = table[i].form;
        if (!gas_piece_take(&reader.rest, table[i].words))
            continue;
        if (table[i].figure != (reader.rest.length > 0))
            return refuse_form(&reader);
        return table[i].read(&reader);
    }
    return refuse_unknown(reader.shown, refusal);
}

static bool read_text(struct gas_piece rest, struct gas_options *options, struct gas_refusal *refusal)
{
    for (struct gas_piece item; gas_piece_next(&rest, &item);)
        if (!read_option(item, options, refusal))
            return false;
    return true;
}

/* Does the row hold one option in pieces (label | value | unit), rather than options side by side? */
static bool in_pieces(const struct gas_block *block, size_t row)
{
    for (size_t i = 1; i < block->columns; i++)
        if (gas_cell_at(block, row, i)->kind == GAS_CELL_NUMBER)
            return true;
    const struct gas_cell *first = gas_cell_at(block, row, 0);
    if (first->kind != GAS_CELL_TEXT || block->columns < 2)
        return false;
    for (size_t i = 0; i < OPTIONS; i++) {
        struct gas_piece label = gas_piece_of(first);
        if (table[i].figure && gas_piece_take(&label, table[i].words) && label.length == 0)
            return true;
    }
    return false;
}

/* "barometer, mbar" | 980: a heading and its figure. */
static bool unit_in_label(const struct gas_block *block, size_t row, char *text, size_t size)
{
    char number[40];
    const struct gas_cell *label = gas_cell_at(block, row, 0), *figure = gas_cell_at(block, row, 1);
    const char *comma = label->kind == GAS_CELL_TEXT ? strchr(label->text, ',') : NULL;
    if (!comma || figure->kind != GAS_CELL_NUMBER)
        return false;
    gas_number_format(number, sizeof number, figure->number, 15);
    snprintf(text, size, "%.*s %s %s", (int)(comma - label->text), label->text, number, comma + 1);
    return true;
}

static bool read_row_of_pieces(const struct gas_block *block, size_t row, struct gas_options *options,
                               struct gas_refusal *refusal)
{
    char text[160];
    if (unit_in_label(block, row, text, sizeof text))
        return read_text((struct gas_piece){text, strlen(text)}, options, refusal);
    return read_text(gas_piece_of_row(block, row, text, sizeof text), options, refusal);
}

static bool read_cells(const struct gas_block *block, size_t row, struct gas_options *options,
                       struct gas_refusal *refusal)
{
    for (size_t i = 0; i < block->columns; i++) {
        const struct gas_cell *cell = gas_cell_at(block, row, i);
        if (gas_cell_blank(cell))
            continue;
        if (cell->kind != GAS_CELL_TEXT)
            return gas_refuse(refusal, "options", "a bare number is not an option; write its name before it.");
        if (!read_text((struct gas_piece){cell->text, cell->length}, options, refusal))
            return false;
    }
    return true;
}

bool gas_options_read(const struct gas_block *argument, struct gas_options *options, struct gas_refusal *refusal)
{
    *options = gas_options_default;
    if (!argument || gas_omitted(argument))
        return true;
    const struct gas_cell *sentence = gas_block_sentence(argument);
    if (sentence)
        return gas_refuse_sentence(refusal, sentence->text);
    for (size_t row = 0; row < argument->rows; row++) {
        bool good = in_pieces(argument, row) ? read_row_of_pieces(argument, row, options, refusal)
                                             : read_cells(argument, row, options, refusal);
        if (!good)
            return false;
    }
    return true;
}
