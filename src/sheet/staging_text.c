#include "sheet/staging_text.h"

#include <math.h>
#include <string.h>

#include "sheet/piece.h"

/* One item being read. */
struct reader {
    struct gas_piece rest; /* behind the words */
    const struct item_words *words;
    char shown[80];
    const struct gas_options *options;
    struct gas_typed_staging *staging;
    struct gas_refusal *refusal;
};

struct item_words {
    const char *words; /* lower case; longer ones first */
    enum gas_staging_item item;
    int kind;         /* of an efficiency; of cooling and aftercooler: 0 for none */
    const char *form; /* as a sentence shows it; NULL: nothing follows the words */
};

/* clang-format off */
static const struct item_words table[] = {
    {"single stage",    GAS_SAYS_COUNT,       1, NULL},
    {"one stage",       GAS_SAYS_COUNT,       1, NULL},
    {"number of stages",GAS_SAYS_COUNT,       0, "3 stages"},
    {"stages",          GAS_SAYS_COUNT,       0, "3 stages"},
    {"ratio at most",   GAS_SAYS_LIMIT,       0, "ratio at most 3.5"},
    {"ratio up to",     GAS_SAYS_LIMIT,       0, "ratio at most 3.5"},
    {"ratios",          GAS_SAYS_RATIOS,      0, "ratios 3 / 2.8 / 2.5"},
    {"isentropic",      GAS_SAYS_EFFICIENCY,  GAS_ISENTROPIC_EFFICIENCY, "isentropic 78 %"},
    {"adiabatic",       GAS_SAYS_EFFICIENCY,  GAS_ISENTROPIC_EFFICIENCY, "isentropic 78 %"},
    {"polytropic",      GAS_SAYS_EFFICIENCY,  GAS_POLYTROPIC_EFFICIENCY, "polytropic 80 %"},
    {"isothermal",      GAS_SAYS_EFFICIENCY,  GAS_ISOTHERMAL_EFFICIENCY, "isothermal 70 %"},
    {"cool to",         GAS_SAYS_COOLING,     1, "cool to 40 °C"},
    {"cooled to",       GAS_SAYS_COOLING,     1, "cool to 40 °C"},
    {"intercool to",    GAS_SAYS_COOLING,     1, "cool to 40 °C"},
    {"intercooled to",  GAS_SAYS_COOLING,     1, "cool to 40 °C"},
    {"no cooling",      GAS_SAYS_COOLING,     0, NULL},
    {"no intercooling", GAS_SAYS_COOLING,     0, NULL},
    {"uncooled",        GAS_SAYS_COOLING,     0, NULL},
    {"drop",            GAS_SAYS_DROP,        0, "drop 0.2 bar"},
    {"pressure drop",   GAS_SAYS_DROP,        0, "drop 0.2 bar"},
    {"with aftercooler",GAS_SAYS_AFTERCOOLER, 1, NULL},
    {"aftercooler",     GAS_SAYS_AFTERCOOLER, 1, NULL},
    {"no aftercooler",  GAS_SAYS_AFTERCOOLER, 0, NULL},
    {"drive",           GAS_SAYS_DRIVE,       0, "drive 95 %"},
};
/* clang-format on */
enum { WORDS = sizeof table / sizeof *table };

static bool refuse_form(const struct reader *reader)
{
    return gas_refuse(reader->refusal, "stages", "%s cannot be read; write it like \"%s\".", reader->shown,
                      reader->words->form);
}

static struct gas_leg_figure plain_number(double figure)
{
    return (struct gas_leg_figure){
        .kind = GAS_FIGURE_FIXED, .figure = figure, .unit = gas_unit_si(GAS_DIM_NUMBER), .symbol = GAS_SYM_NONE};
}

/* What a figure of each item may be: its dimension, and the symbol of a column in its place. */
static const struct figure_kind {
    enum gas_dimension dimension, other;
    enum gas_symbol symbol;
} figure_kinds[GAS_STAGING_FIGURES] = {
    [GAS_SAYS_COUNT] = {GAS_DIM_NUMBER, GAS_DIM_NUMBER, GAS_SYM_STAGE_COUNT},
    [GAS_SAYS_LIMIT] = {GAS_DIM_NUMBER, GAS_DIM_NUMBER, GAS_SYM_RATIO},
    [GAS_SAYS_EFFICIENCY] = {GAS_DIM_NUMBER, GAS_DIM_NUMBER, GAS_SYM_EFFICIENCY},
    [GAS_SAYS_COOLING] = {GAS_DIM_TEMPERATURE, GAS_DIM_TEMPERATURE, GAS_SYM_T},
    [GAS_SAYS_DROP] = {GAS_DIM_PRESSURE, GAS_DIM_NUMBER, GAS_SYM_NONE},
    [GAS_SAYS_DRIVE] = {GAS_DIM_NUMBER, GAS_DIM_NUMBER, GAS_SYM_NONE},
};

/* The heading of a column in place of a figure. */
static bool read_column(const struct reader *reader, struct gas_piece text, const struct figure_kind *kind,
                        struct gas_leg_figure *figure)
{
    struct gas_heading heading;
    struct gas_heading_fault fault;
    bool good = gas_heading_parse(text.at, text.length, &reader->options->references, &heading, &fault);
    if (!good || kind->symbol == GAS_SYM_NONE || heading.symbol != kind->symbol)
        return refuse_form(reader);
    *figure = (struct gas_leg_figure){.kind = GAS_FIGURE_COLUMN, .symbol = heading.symbol, .state = heading.state};
    return true;
}

static bool read_figure(const struct reader *reader, struct gas_piece text)
{
    enum gas_staging_item item = reader->words->item;
    const struct figure_kind *kind = &figure_kinds[item];
    struct gas_leg_figure *figure = &reader->staging->figure[item];
    struct gas_unit_fault fault;
    double number;
    size_t used;
    if (!gas_number_parse(text.at, text.length, &number, &used))
        return read_column(reader, text, kind, figure);
    struct gas_piece unit = gas_piece_behind(text, used);
    *figure = plain_number(number);
    if (unit.length == 0 && item == GAS_SAYS_DROP) /* 0.2 of what? */
        return refuse_form(reader);
    if (unit.length == 0)
        figure->unit = gas_unit_si(kind->dimension);
    else if (!gas_unit_parse(unit.at, unit.length, &reader->options->references, &figure->unit, &fault))
        return gas_refuse_unit(reader->refusal, "stages", &fault);
    bool fits = figure->unit.dimension == kind->dimension || figure->unit.dimension == kind->other;
    return fits || refuse_form(reader);
}

/* "3 / 2.8 / 2.5", also with `and`, `:` or spaces between them. */
static bool read_ratios(const struct reader *reader)
{
    struct gas_typed_staging *staging = reader->staging;
    for (struct gas_piece rest = reader->rest; rest.length;) {
        double ratio;
        size_t used;
        if (!gas_number_parse(rest.at, rest.length, &ratio, &used))
            return refuse_form(reader);
        if (staging->ratio_count == GAS_STAGES_MAX)
            return gas_refuse(reader->refusal, "stages", "%s names more than %d stages; split the machine.",
                              reader->shown, GAS_STAGES_MAX);
        if (!(ratio > 0 && ratio < 1e6))
            return gas_refuse(reader->refusal, "stages", "%s has a ratio that is not above zero; write it like \"%s\".",
                              reader->shown, reader->words->form);
        staging->ratio[staging->ratio_count++] = ratio;
        rest = gas_piece_behind(rest, used);
        if (rest.length && (rest.at[0] == '/' || rest.at[0] == ':'))
            rest = gas_piece_behind(rest, 1);
        else
            gas_piece_take(&rest, "and");
    }
    return staging->ratio_count > 0 || refuse_form(reader);
}

/* "isentropic", "isentropic 78 %", "isentropic efficiency" (a column), "isentropic efficiency 78 %". */
static bool read_efficiency(const struct reader *reader)
{
    struct gas_typed_staging *staging = reader->staging;
    struct gas_piece rest = reader->rest, behind = rest;
    staging->kind = (enum gas_stage_efficiency)reader->words->kind;
    if (rest.length == 0) {
        staging->figure[GAS_SAYS_EFFICIENCY] = plain_number(1);
        return true;
    }
    return read_figure(reader, gas_piece_take(&behind, "efficiency") && behind.length ? behind : rest);
}

/* "single stage", "stages" (a column), "stages 3". */
static bool read_count(const struct reader *reader)
{
    struct gas_leg_figure *count = &reader->staging->figure[GAS_SAYS_COUNT];
    if (reader->words->form && reader->rest.length)
        return read_figure(reader, reader->rest);
    *count = reader->words->form ? (struct gas_leg_figure){.kind = GAS_FIGURE_COLUMN, .symbol = GAS_SYM_STAGE_COUNT}
                                 : plain_number(1);
    return true;
}

static bool read_drive(const struct reader *reader)
{
    struct gas_piece behind = reader->rest;
    return read_figure(reader, gas_piece_take(&behind, "efficiency") ? behind : reader->rest);
}

static bool read_known(struct reader *reader)
{
    const struct item_words *words = reader->words;
    struct gas_typed_staging *staging = reader->staging;
    if (staging->said[words->item])
        return gas_refuse(reader->refusal, "stages", "%s says a second time what was said before; keep one of them.",
                          reader->shown);
    staging->said[words->item] = true;
    if (!words->form && reader->rest.length)
        return gas_refuse(reader->refusal, "stages", "%s cannot be read; nothing follows \"%s\".", reader->shown,
                          words->words);
    switch (words->item) {
    case GAS_SAYS_COUNT:
        return read_count(reader);
    case GAS_SAYS_RATIOS:
        return read_ratios(reader);
    case GAS_SAYS_EFFICIENCY:
        return read_efficiency(reader);
    case GAS_SAYS_DRIVE:
        return read_drive(reader);
    case GAS_SAYS_AFTERCOOLER:
        staging->aftercooler = words->kind == 1;
        return true;
    default: /* "uncooled" says that there is no figure */
        return !words->form || read_figure(reader, reader->rest);
    }
}

/* "3 stages", "2 stage": the number comes first. */
static bool read_count_first(struct reader *reader, struct gas_piece item, bool *is_count)
{
    static const struct item_words words = {"", GAS_SAYS_COUNT, 0, "3 stages"};
    double number;
    size_t used;
    *is_count = false;
    if (!gas_number_parse(item.at, item.length, &number, &used))
        return true;
    struct gas_piece rest = gas_piece_behind(item, used);
    if (rest.length && rest.at[0] == '-')
        rest = gas_piece_behind(rest, 1);
    if (!gas_piece_take(&rest, "stages") && !gas_piece_take(&rest, "stage"))
        return true;
    *is_count = true;
    reader->words = &words;
    reader->rest = (struct gas_piece){item.at, used};
    return rest.length == 0 ? read_known(reader) : refuse_form(reader);
}

static bool read_item(struct gas_piece item, const struct gas_options *options, struct gas_typed_staging *staging,
                      struct gas_refusal *refusal)
{
    struct reader reader = {.options = options, .staging = staging, .refusal = refusal};
    bool is_count;
    gas_quoted(reader.shown, sizeof reader.shown, item.at, item.length);
    if (!read_count_first(&reader, item, &is_count) || is_count)
        return !refusal->made;
    for (size_t i = 0; i < WORDS; i++) {
        reader.rest = item;
        reader.words = &table[i];
        if (gas_piece_take(&reader.rest, table[i].words))
            return read_known(&reader);
    }
    return gas_refuse(refusal, "stages",
                      "%s is not understood; the words are: 3 stages; ratio at most 3.5; ratios 3 / 2.8; isentropic 78 "
                      "%%; polytropic 80 %%; isothermal 70 %%; cool to 40 °C; drop 0.2 bar; aftercooler; drive 95 %%.",
                      reader.shown);
}

static bool read_text(struct gas_piece rest, const struct gas_options *options, struct gas_typed_staging *staging,
                      struct gas_refusal *refusal)
{
    for (struct gas_piece item; gas_piece_next(&rest, &item);)
        if (!read_item(item, options, staging, refusal))
            return false;
    return true;
}

/* Does the row hold one item in pieces (cool to | 40 | degC), rather than items side by side? */
static bool in_pieces(const struct gas_block *block, size_t row)
{
    const struct gas_cell *first = gas_cell_at(block, row, 0);
    for (size_t i = 0; i < block->columns; i++)
        if (gas_cell_at(block, row, i)->kind == GAS_CELL_NUMBER)
            return true;
    for (size_t i = 0; i < WORDS && first->kind == GAS_CELL_TEXT && block->columns > 1; i++) {
        struct gas_piece label = gas_piece_of(first);
        if (table[i].form && gas_piece_take(&label, table[i].words) && label.length == 0)
            return true;
    }
    return false;
}

static bool read_cells(const struct gas_block *block, size_t row, const struct gas_options *options,
                       struct gas_typed_staging *staging, struct gas_refusal *refusal)
{
    for (size_t i = 0; i < block->columns; i++) {
        const struct gas_cell *cell = gas_cell_at(block, row, i);
        if (!gas_cell_blank(cell) && cell->kind == GAS_CELL_TEXT &&
            !read_text((struct gas_piece){cell->text, cell->length}, options, staging, refusal))
            return false;
    }
    return true;
}

/* Is all said that must be said? */
static bool complete(const struct gas_typed_staging *staging, struct gas_refusal *refusal)
{
    bool ratios = staging->said[GAS_SAYS_RATIOS], count = staging->said[GAS_SAYS_COUNT];
    bool limit = staging->said[GAS_SAYS_LIMIT];
    if (!count && !limit && !ratios)
        return gas_refuse(
            refusal, "stages",
            "the number of stages is missing; write 3 stages, ratio at most 3.5 or ratios 3 / 2.8 / 2.5.");
    if (limit && (count || ratios))
        return gas_refuse(refusal, "stages",
                          "`ratio at most` finds the number of stages, but that is given too; keep one of them.");
    if (!staging->said[GAS_SAYS_EFFICIENCY])
        return gas_refuse(refusal, "stages",
                          "the efficiency is missing; write isentropic 78 %%, polytropic 80 %% or isothermal 70 %%; "
                          "isentropic alone is the reversible machine.");
    if (staging->aftercooler && staging->figure[GAS_SAYS_COOLING].kind == GAS_FIGURE_NONE)
        return gas_refuse(refusal, "stages", "an aftercooler needs its temperature; write cool to 40 °C too.");
    return true;
}

bool gas_staging_read(const struct gas_block *argument, const struct gas_options *options,
                      struct gas_typed_staging *staging, struct gas_refusal *refusal)
{
    const struct gas_cell *sentence = gas_block_sentence(argument);
    *staging = (struct gas_typed_staging){0};
    if (sentence)
        return gas_refuse_sentence(refusal, sentence->text);
    if (gas_omitted(argument))
        return gas_refuse(refusal, "stages",
                          "nothing is said of them; write such as 3 stages; isentropic 78 %%; cool to 40 °C.");
    for (size_t row = 0; row < argument->rows; row++) {
        char text[200];
        bool good = in_pieces(argument, row)
                        ? read_text(gas_piece_of_row(argument, row, text, sizeof text), options, staging, refusal)
                        : read_cells(argument, row, options, staging, refusal);
        if (!good)
            return false;
    }
    return complete(staging, refusal);
}
