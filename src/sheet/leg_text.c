#include "sheet/leg_text.h"

#include <stdio.h>
#include <string.h>

#include "sheet/ascii.h"

/* Where a word stands on its own in the piece; the length of the piece when it does not. */
static size_t find_word(struct gas_piece piece, const char *word)
{
    size_t length = strlen(word);
    for (size_t i = 0; i + length <= piece.length; i++)
        if (gas_ascii_starts(piece.at + i, word) && (i == 0 || piece.at[i - 1] == ' ') &&
            (i + length == piece.length || piece.at[i + length] == ' '))
            return i;
    return piece.length;
}

static const struct process_word {
    const char *word;
    enum gas_process process;
} process_words[] = {
    {"isothermal against", GAS_AGAINST_ISOTHERMAL},
    {"adiabatic against", GAS_AGAINST},
    {"isothermal", GAS_ISOTHERMAL},
    {"constant temperature", GAS_ISOTHERMAL},
    {"isobaric", GAS_ISOBARIC},
    {"constant pressure", GAS_ISOBARIC},
    {"isochoric", GAS_ISOCHORIC},
    {"constant volume", GAS_ISOCHORIC},
    {"adiabatic", GAS_ADIABATIC},
    {"isentropic", GAS_ADIABATIC},
    {"polytropic", GAS_POLYTROPIC},
    {"free expansion", GAS_FREE_EXPANSION},
    {"throttling", GAS_FREE_EXPANSION},
    {"against", GAS_AGAINST},
    {"straight", GAS_STRAIGHT},
};

static bool take_process(struct gas_piece *piece, enum gas_process *process)
{
    gas_piece_take(piece, "reversible");
    for (size_t i = 0; i < sizeof process_words / sizeof *process_words; i++)
        if (gas_piece_take(piece, process_words[i].word)) {
            *process = process_words[i].process;
            return true;
        }
    return false;
}

/* Reading one leg. */
struct reader {
    const struct gas_options *options;
    struct gas_refusal *refusal;
    struct gas_typed_leg *leg;
    char what[24]; /* "leg 2" */
};

static bool refuse_leg(const struct reader *reader, const char *why)
{
    return gas_refuse(reader->refusal, reader->what, "\"%s\": %s", reader->leg->text, why);
}

static bool is_column(const struct gas_leg_figure *figure, enum gas_symbol symbol)
{
    return figure->kind == GAS_FIGURE_COLUMN && figure->symbol == symbol;
}

/* "8 bar", "0,5 m3", or a heading's name such as P2. */
static bool read_figure(const struct reader *reader, struct gas_piece text, struct gas_leg_figure *figure)
{
    size_t used = 0;
    struct gas_unit_fault unit_fault;
    struct gas_heading heading;
    struct gas_heading_fault heading_fault;
    text = gas_piece_trim(text);
    if (gas_number_parse(text.at, text.length, &figure->figure, &used)) {
        struct gas_piece unit = gas_piece_behind(text, used);
        figure->kind = GAS_FIGURE_FIXED;
        figure->unit = gas_unit_si(GAS_DIM_NUMBER);
        return unit.length == 0 ||
               gas_unit_parse(unit.at, unit.length, &reader->options->references, &figure->unit, &unit_fault) ||
               gas_refuse_unit(reader->refusal, reader->what, &unit_fault);
    }
    if (!gas_heading_parse(text.at, text.length, &reader->options->references, &heading, &heading_fault) ||
        heading.symbol == GAS_SYM_NONE)
        return refuse_leg(reader, "a figure is missing or is neither a number with its unit nor a heading such as P2.");
    *figure = (struct gas_leg_figure){.kind = GAS_FIGURE_COLUMN, .symbol = heading.symbol, .state = heading.state};
    return true;
}

/* What an ending's figure says: its unit, or the symbol of its column. */
static const struct ending_kind {
    enum gas_dimension dimension;
    enum gas_symbol symbol;
    enum gas_ending ending;
} ending_kinds[] = {
    {GAS_DIM_PRESSURE, GAS_SYM_P, GAS_TO_P},
    {GAS_DIM_TEMPERATURE, GAS_SYM_T, GAS_TO_T},
    {GAS_DIM_VOLUME, GAS_SYM_V, GAS_TO_V},
    {GAS_DIM_VOLUME_FLOW, GAS_SYM_V, GAS_TO_V},
    {GAS_DIM_MOLAR_VOLUME, GAS_SYM_V_SPECIFIC, GAS_TO_V},
    {GAS_DIM_SPECIFIC_VOLUME, GAS_SYM_V_SPECIFIC, GAS_TO_V},
};

static bool ending_of(const struct gas_leg_figure *figure, enum gas_ending *ending)
{
    for (size_t i = 0; i < sizeof ending_kinds / sizeof *ending_kinds; i++)
        if (figure->kind == GAS_FIGURE_FIXED ? figure->unit.dimension == ending_kinds[i].dimension
                                             : figure->symbol == ending_kinds[i].symbol) {
            *ending = ending_kinds[i].ending;
            return true;
        }
    return false;
}

static bool take_times(struct gas_piece *piece)
{
    static const char *const signs[] = {"x ", "X ", "×", "*"};
    for (size_t i = 0; i < sizeof signs / sizeof *signs; i++) {
        size_t length = strlen(signs[i]);
        if (piece->length > length && strncmp(piece->at, signs[i], length) == 0) {
            *piece = gas_piece_behind(*piece, length);
            return true;
        }
    }
    return false;
}

/* "P x 3", "V x 0.125", also with the multiplication sign. */
static bool read_ratio(const struct reader *reader, struct gas_piece text, bool *is_ratio)
{
    static const struct {
        char letter;
        enum gas_ending ending;
    } letters[] = {{'P', GAS_BY_P_RATIO}, {'V', GAS_BY_V_RATIO}, {'T', GAS_BY_T_RATIO}};
    *is_ratio = false;
    for (size_t i = 0; text.length && i < sizeof letters / sizeof *letters; i++) {
        struct gas_piece rest = gas_piece_behind(text, 1);
        if (gas_ascii_upper(text.at[0]) != letters[i].letter || !take_times(&rest))
            continue;
        *is_ratio = true;
        reader->leg->ending = letters[i].ending;
        return read_figure(reader, rest, &reader->leg->value);
    }
    return true;
}

static bool read_end_point(const struct reader *reader, struct gas_piece text)
{
    struct gas_typed_leg *leg = reader->leg;
    enum gas_ending kind = GAS_TO_P, other = GAS_TO_P;
    const char *joint = "and";
    size_t first = find_word(text, joint);
    if (!read_figure(reader, gas_piece_front(text, first), &leg->value))
        return false;
    if (!ending_of(&leg->value, &kind))
        return refuse_leg(reader,
                          "a leg ends at a pressure, a temperature or a volume; give one with its unit, a ratio "
                          "such as V x 0.125, or \"with Q = 50 kJ\".");
    leg->ending = kind;
    if (first == text.length)
        return true;
    if (!read_figure(reader, gas_piece_behind(text, first + strlen(joint)), &leg->second))
        return false;
    if (!ending_of(&leg->second, &other) || kind == other || kind == GAS_TO_T || other == GAS_TO_T)
        return refuse_leg(reader, "two figures at the end must be a pressure and a volume.");
    if (kind == GAS_TO_V) {
        struct gas_leg_figure pressure = leg->second;
        leg->second = leg->value;
        leg->value = pressure;
    }
    leg->ending = GAS_TO_P_AND_V;
    return true;
}

/* After "to". */
static bool read_destination(const struct reader *reader, struct gas_piece text)
{
    bool is_ratio;
    if (text.length == 5 && gas_ascii_starts(text.at, "start")) {
        reader->leg->ending = GAS_TO_START;
        return true;
    }
    if (text.length == 7 && gas_ascii_starts(text.at, "balance")) {
        reader->leg->ending = GAS_TO_BALANCE;
        return true;
    }
    if (!read_ratio(reader, text, &is_ratio) || is_ratio)
        return !reader->refusal->made;
    return read_end_point(reader, text);
}

bool gas_is_energy(enum gas_dimension dimension)
{
    return dimension == GAS_DIM_ENERGY || dimension == GAS_DIM_POWER || dimension == GAS_DIM_MOLAR_ENERGY ||
           dimension == GAS_DIM_SPECIFIC_ENERGY;
}

/* After "with": "Q = 50 kJ", "W = -20 kJ", "Q" for the column. */
static bool read_transfer(const struct reader *reader, struct gas_piece text)
{
    struct gas_leg_figure *value = &reader->leg->value;
    bool heat = gas_piece_take(&text, "q") || gas_piece_take(&text, "heat");
    if (!heat && !gas_piece_take(&text, "w") && !gas_piece_take(&text, "work"))
        return refuse_leg(reader, "after \"with\" comes Q or W, such as \"with Q = 50 kJ\".");
    reader->leg->ending = heat ? GAS_WITH_Q : GAS_WITH_W;
    if (text.length == 0) {
        *value = (struct gas_leg_figure){.kind = GAS_FIGURE_COLUMN, .symbol = heat ? GAS_SYM_Q : GAS_SYM_W};
        return true;
    }
    if (!read_figure(reader, text, value))
        return false;
    if (value->kind == GAS_FIGURE_FIXED && !gas_is_energy(value->unit.dimension))
        return refuse_leg(reader, "heat and work need a unit of energy, such as kJ, kW or kJ/kg.");
    return true;
}

/* Between the process and its ending: an exponent, an efficiency, an outside pressure. */
static bool read_modifier(const struct reader *reader, struct gas_piece text)
{
    struct gas_typed_leg *leg = reader->leg;
    struct gas_leg_figure figure = {0};
    bool against = leg->process == GAS_AGAINST || leg->process == GAS_AGAINST_ISOTHERMAL;
    bool exponent = leg->process == GAS_POLYTROPIC && gas_piece_take(&text, "n");
    if (exponent && text.length == 0) {
        leg->n = (struct gas_leg_figure){.kind = GAS_FIGURE_COLUMN, .symbol = GAS_SYM_EXPONENT};
        return true;
    }
    if (text.length == 0)
        return leg->process != GAS_POLYTROPIC && !against
                   ? true
                   : refuse_leg(reader, against ? "give the outside pressure, such as \"against 1 bar\"."
                                                : "give the exponent, such as n=1.3, or an efficiency, such as 82 %.");
    if (!read_figure(reader, text, &figure))
        return false;
    if (against) {
        leg->outside = figure;
        return (figure.kind == GAS_FIGURE_FIXED ? figure.unit.dimension == GAS_DIM_PRESSURE : true) ||
               refuse_leg(reader, "what follows \"against\" must be a pressure.");
    }
    bool percent = figure.kind == GAS_FIGURE_FIXED && figure.unit.scale != 1;
    if (exponent || is_column(&figure, GAS_SYM_EXPONENT))
        leg->n = figure;
    else if (percent || is_column(&figure, GAS_SYM_EFFICIENCY) || leg->process == GAS_ADIABATIC)
        leg->efficiency = figure;
    else
        return refuse_leg(reader, leg->process == GAS_POLYTROPIC
                                      ? "write the exponent as n=1.3, an efficiency as 82 %."
                                      : "this process takes no further figure before its ending.");
    return true;
}

static bool read_leg(const struct reader *reader, struct gas_piece text)
{
    struct gas_typed_leg *leg = reader->leg;
    snprintf(leg->text, sizeof leg->text, "%.*s", (int)(text.length < 90 ? text.length : 90), text.at);
    if (!take_process(&text, &leg->process))
        return refuse_leg(reader, "it does not start with a process; these are known: isothermal, isobaric, isochoric, "
                                  "adiabatic, polytropic, free expansion, against P, straight.");
    size_t to = find_word(text, "to"), with = find_word(text, "with");
    size_t end = to < with ? to : with;
    if (!read_modifier(reader, gas_piece_front(text, end)))
        return false;
    if (end == text.length && leg->process == GAS_AGAINST) {
        leg->ending = GAS_TO_BALANCE;
        return true;
    }
    if (end == text.length)
        return refuse_leg(
            reader, "it has no ending; write \"to 8 bar\", \"to 400 °C\", \"to V x 0.125\", \"with Q = 50 kJ\" or "
                    "\"to start\".");
    size_t skip = end + (to < with ? 2 : 4);
    struct gas_piece rest = gas_piece_behind(text, skip);
    return to < with ? read_destination(reader, rest) : read_transfer(reader, rest);
}

bool gas_leg_read(struct gas_typed_leg *leg, size_t number, struct gas_piece text, const struct gas_options *options,
                  struct gas_refusal *refusal)
{
    struct reader reader = {options, refusal, leg, ""};
    *leg = (struct gas_typed_leg){0};
    snprintf(reader.what, sizeof reader.what, "leg %zu", number);
    return read_leg(&reader, text);
}
