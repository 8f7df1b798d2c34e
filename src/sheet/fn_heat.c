/* Heat capacities, their integrals and the inverse: CP, CV, GAMMA, CPMEAN, DH, DU, DS, TEMP. */
#include <string.h>

#include <gasleaf/heat.h>

#include "sheet/ascii.h"
#include "sheet/elementwise.h"
#include "sheet/functions.h"
#include "sheet/gas_choice.h"

enum { INPUTS = 4 };

/* What one function asks of the core: its figures in SI, in the order of its inputs. */
struct heat_question {
    enum gas_dimension molar, specific; /* of the answer; both NUMBER for a ratio */
    struct gas_result (*ask)(const struct gas *gas, const double *figure);
};

static struct gas_result ask_cp(const struct gas *gas, const double *x)
{
    return gas_cp(gas, x[0]);
}

static struct gas_result ask_cv(const struct gas *gas, const double *x)
{
    return gas_cv(gas, x[0]);
}

static struct gas_result ask_gamma(const struct gas *gas, const double *x)
{
    return gas_gamma(gas, x[0]);
}

static struct gas_result ask_cp_mean(const struct gas *gas, const double *x)
{
    return gas_cp_mean(gas, x[0], x[1]);
}

static struct gas_result ask_dh(const struct gas *gas, const double *x)
{
    return gas_dh(gas, x[0], x[1]);
}

static struct gas_result ask_du(const struct gas *gas, const double *x)
{
    return gas_du(gas, x[0], x[1]);
}

static struct gas_result ask_ds_isobaric(const struct gas *gas, const double *x)
{
    return gas_ds_isobaric(gas, x[0], x[1]);
}

static struct gas_result ask_ds(const struct gas *gas, const double *x)
{
    /* The core takes state by state, the sheet temperatures first: tell the arguments in the sheet's order. */
    static const int sheet_order[] = {0, 1, 2, 4, 3, 5};
    struct gas_result result = gas_ds(gas, x[0], x[2], x[1], x[3]);
    result.argument = sheet_order[result.argument];
    return result;
}

static struct gas_result ask_T_after_dh(const struct gas *gas, const double *x)
{
    return gas_T_after_dh(gas, x[0], x[1]);
}

static struct gas_result ask_T_after_du(const struct gas *gas, const double *x)
{
    return gas_T_after_du(gas, x[0], x[1]);
}

static struct gas_result ask_T_after_ds(const struct gas *gas, const double *x)
{
    return gas_T_after_ds_isobaric(gas, x[0], x[1]);
}

#define HEAT_CAPACITY GAS_DIM_MOLAR_ENTROPY, GAS_DIM_SPECIFIC_ENTROPY
#define ENERGY        GAS_DIM_MOLAR_ENERGY, GAS_DIM_SPECIFIC_ENERGY

/* A call being worked on. */
struct heat_call {
    const struct gas_choice *choice;
    struct gas_input input[INPUTS];
    size_t inputs;
    const struct heat_question *question;
    struct gas_unit unit;   /* of the answer */
    bool unit_of_the_start; /* TEMP without a unit: the answer comes in the unit of `from` */
    struct gas_refusal refusal;
};

static bool refuse_answer_unit(struct heat_call *heat, const struct gas_unit *unit)
{
    char shown[80];
    gas_quoted(shown, sizeof shown, unit->text, strlen(unit->text));
    if (heat->question->molar == GAS_DIM_NUMBER)
        return gas_refuse(&heat->refusal, "wanted", "%s is the unit of %s, but the answer is a ratio; leave it out.",
                          shown, gas_dimension_words(unit->dimension));
    return gas_refuse(&heat->refusal, "wanted", "%s is the unit of %s; the answer needs one such as %s or %s.", shown,
                      gas_dimension_words(unit->dimension), gas_dimension_si(heat->question->molar),
                      gas_dimension_si(heat->question->specific));
}

/* The wanted unit, alone ("kJ/kg-K") or in a heading ("cp, kJ/kg-K"). */
static bool read_wanted(struct heat_call *heat, const struct gas_block *wanted)
{
    struct gas_heading heading;
    struct gas_heading_fault fault;
    heat->unit = gas_unit_si(heat->question->molar);
    if (gas_omitted(wanted))
        return true;
    if (!gas_single(wanted) || wanted->cell->kind != GAS_CELL_TEXT)
        return gas_refuse(&heat->refusal, "wanted", "it is a text such as kJ/kg-K, in one cell.");
    if (!gas_heading_parse(wanted->cell->text, wanted->cell->length, NULL, &heading, &fault))
        return gas_refuse_heading(&heat->refusal, "wanted", wanted->cell->text, wanted->cell->length, &fault);
    if (!heading.has_unit)
        return true;
    if (heading.unit.dimension != heat->question->molar && heading.unit.dimension != heat->question->specific)
        return refuse_answer_unit(heat, &heading.unit);
    heat->unit = heading.unit;
    return true;
}

/* Molar figures per mass where the unit says so. */
static double per_mass(const struct heat_call *heat, const struct gas_unit *unit, double x)
{
    const struct heat_question *question = heat->question;
    bool specific = question->specific != question->molar && unit->dimension == question->specific;
    return specific ? x / heat->choice->gas.molar_mass : x;
}

static void refuse_result(struct heat_call *heat, const struct gas_result *result, const struct gas_reading *reading)
{
    const struct gas_choice *choice = heat->choice;
    struct gas_range range = gas_range_of(&choice->gas);
    size_t index = result->argument > 1 ? (size_t)result->argument - 2 : heat->inputs - 1;
    const char *name = heat->input[index].name;
    char shown[80];
    gas_figure(shown, sizeof shown, gas_unit_from_si(&reading[index].unit, reading[index].si, GAS_ATMOSPHERE),
               &reading[index].unit);
    if (result->status == GAS_NO_HEAT_CAPACITY)
        gas_refuse(&heat->refusal, "gas", "%s has no heat capacity; give one after '|', such as | cp = 1.04 kJ/kg-K.",
                   choice->label);
    else if (result->status == GAS_OUTSIDE_DATA && result->argument > 1)
        gas_refuse_temperature(&heat->refusal, name, result->figure, &reading[index].unit, choice->label, range.T_from,
                               range.T_to);
    else if (result->status == GAS_OUTSIDE_DATA)
        gas_refuse(&heat->refusal, name,
                   "%s would take the temperature outside the data for %s (%s to %s K); give a "
                   "smaller change.",
                   shown, choice->label, gas_shown(range.T_from).text, gas_shown(range.T_to).text);
    else
        gas_refuse(&heat->refusal, name, "%s %s; check figure and unit.", shown, gas_status_words(result->status));
}

static void answer_cell(struct heat_call *heat, struct gas_call *call, size_t row, size_t column)
{
    struct gas_reading reading[INPUTS] = {0};
    double figure[INPUTS] = {0};
    heat->refusal.made = false;
    for (size_t i = 0; i < heat->inputs; i++) {
        if (!gas_input_read(&heat->input[i], row, column, &reading[i], &heat->refusal))
            break;
        bool specific = reading[i].unit.dimension == GAS_DIM_SPECIFIC_ENERGY ||
                        reading[i].unit.dimension == GAS_DIM_SPECIFIC_ENTROPY;
        figure[i] = specific ? reading[i].si * heat->choice->gas.molar_mass : reading[i].si;
    }
    struct gas_result result = {0};
    if (!heat->refusal.made) {
        result = heat->question->ask(&heat->choice->gas, figure);
        if (result.status != GAS_OK)
            refuse_result(heat, &result, reading);
    }
    const struct gas_unit *unit = heat->unit_of_the_start ? &reading[0].unit : &heat->unit;
    if (heat->refusal.made)
        gas_put_text(call, row, column, heat->refusal.text);
    else
        gas_put_number(call, row, column, gas_unit_from_si(unit, per_mass(heat, unit, result.value), GAS_ATMOSPHERE));
}

/* Everything is read: answer each cell, or say what is wrong in one. */
static void finish(struct heat_call *heat, struct gas_call *call)
{
    size_t rows, columns;
    if (!heat->refusal.made)
        gas_inputs_shape(heat->input, heat->inputs, &rows, &columns, &heat->refusal);
    if (heat->refusal.made)
        gas_answer_text(call, heat->refusal.text);
    else if (gas_answer_block(call, rows, columns))
        for (size_t row = 0; row < rows; row++)
            for (size_t column = 0; column < columns; column++)
                answer_cell(heat, call, row, column);
    gas_choice_release(heat->choice);
}

static bool open_input(struct heat_call *heat, const struct gas_call *call, struct gas_input input, size_t argument,
                       size_t unit_argument)
{
    struct gas_input *made = &heat->input[heat->inputs++];
    *made = input;
    return gas_input_open(made, gas_argument(call, argument), gas_argument(call, unit_argument), &heat->refusal);
}

static bool open_temperature(struct heat_call *heat, const struct gas_call *call, const char *name, size_t argument,
                             size_t unit_argument)
{
    struct gas_input input = {.name = name, .dimension = GAS_DIM_TEMPERATURE, .other = GAS_DIM_TEMPERATURE};
    return open_input(heat, call, input, argument, unit_argument);
}

static bool open_pressure(struct heat_call *heat, const struct gas_call *call, const char *name, size_t argument)
{
    struct gas_input input = {.name = name, .dimension = GAS_DIM_PRESSURE, .other = GAS_DIM_PRESSURE};
    return open_input(heat, call, input, argument, 7);
}

static void heat_start(struct heat_call *heat, const struct gas_call *call, const struct heat_question *question)
{
    memset(heat, 0, sizeof *heat);
    heat->question = question;
    heat->choice = gas_choose(gas_argument(call, 0), &heat->refusal);
}

/* (gas; temperature; [wanted]; [temperature unit]) */
static void at_one_temperature(struct gas_call *call, const struct heat_question *question)
{
    struct heat_call heat;
    heat_start(&heat, call, question);
    if (!heat.refusal.made && open_temperature(&heat, call, "temperature", 1, 3))
        read_wanted(&heat, gas_argument(call, 2));
    finish(&heat, call);
}

/* (gas; from; to; [wanted]; [temperature unit]) */
static void between_temperatures(struct gas_call *call, const struct heat_question *question)
{
    struct heat_call heat;
    heat_start(&heat, call, question);
    if (!heat.refusal.made && open_temperature(&heat, call, "from", 1, 4) && open_temperature(&heat, call, "to", 2, 4))
        read_wanted(&heat, gas_argument(call, 3));
    finish(&heat, call);
}

void gas_fn_cp(struct gas_call *call)
{
    at_one_temperature(call, &(const struct heat_question){HEAT_CAPACITY, ask_cp});
}

void gas_fn_cv(struct gas_call *call)
{
    at_one_temperature(call, &(const struct heat_question){HEAT_CAPACITY, ask_cv});
}

void gas_fn_gamma(struct gas_call *call)
{
    at_one_temperature(call, &(const struct heat_question){GAS_DIM_NUMBER, GAS_DIM_NUMBER, ask_gamma});
}

void gas_fn_cp_mean(struct gas_call *call)
{
    between_temperatures(call, &(const struct heat_question){HEAT_CAPACITY, ask_cp_mean});
}

void gas_fn_dh(struct gas_call *call)
{
    between_temperatures(call, &(const struct heat_question){ENERGY, ask_dh});
}

void gas_fn_du(struct gas_call *call)
{
    between_temperatures(call, &(const struct heat_question){ENERGY, ask_du});
}

static bool open_pressures(struct heat_call *heat, const struct gas_call *call)
{
    bool from_missing = gas_omitted(gas_argument(call, 3));
    if (from_missing != gas_omitted(gas_argument(call, 4)))
        return gas_refuse(&heat->refusal, from_missing ? "pressure from" : "pressure to",
                          "only one pressure is given; give both, or none for constant pressure.");
    return open_pressure(heat, call, "pressure from", 3) && open_pressure(heat, call, "pressure to", 4);
}

/* (gas; from; to; [pressure from]; [pressure to]; [wanted]; [temperature unit]; [pressure unit]) */
void gas_fn_ds(struct gas_call *call)
{
    static const struct heat_question isobaric = {HEAT_CAPACITY, ask_ds_isobaric}, full = {HEAT_CAPACITY, ask_ds};
    struct heat_call heat;
    bool pressures = !gas_omitted(gas_argument(call, 3)) || !gas_omitted(gas_argument(call, 4));
    heat_start(&heat, call, pressures ? &full : &isobaric);
    if (!heat.refusal.made && open_temperature(&heat, call, "from", 1, 6) &&
        open_temperature(&heat, call, "to", 2, 6) && (!pressures || open_pressures(&heat, call)))
        read_wanted(&heat, gas_argument(call, 5));
    finish(&heat, call);
}

/* What TEMP can start from: the kind of change, its dimensions and its question. */
static const struct temp_kind {
    const char *word;
    enum gas_dimension molar, specific;
    struct heat_question question;
} temp_kinds[] = {
    {"dh", ENERGY, {GAS_DIM_TEMPERATURE, GAS_DIM_TEMPERATURE, ask_T_after_dh}},
    {"du", ENERGY, {GAS_DIM_TEMPERATURE, GAS_DIM_TEMPERATURE, ask_T_after_du}},
    {"ds", HEAT_CAPACITY, {GAS_DIM_TEMPERATURE, GAS_DIM_TEMPERATURE, ask_T_after_ds}},
};

static const struct temp_kind *temp_kind_of(const struct gas_block *argument, struct gas_refusal *refusal)
{
    char shown[60];
    if (gas_omitted(argument))
        return &temp_kinds[0];
    const struct gas_cell *cell = argument->cell;
    for (size_t i = 0; cell->kind == GAS_CELL_TEXT && i < sizeof temp_kinds / sizeof *temp_kinds; i++)
        if (gas_ascii_same(cell->text, temp_kinds[i].word))
            return &temp_kinds[i];
    if (cell->kind == GAS_CELL_TEXT)
        gas_refuse(refusal, "kind", "%s is none of dh, du and ds; give one of them.",
                   gas_quoted(shown, sizeof shown, cell->text, cell->length));
    else
        gas_refuse(refusal, "kind", "%s is a number; give dh, du or ds.", gas_shown(cell->number).text);
    return &temp_kinds[0];
}

/* (gas; from; change; [kind]; [change unit]; [temperature unit]) */
void gas_fn_temp(struct gas_call *call)
{
    struct heat_call heat;
    heat_start(&heat, call, NULL);
    const struct temp_kind *kind = temp_kind_of(gas_argument(call, 3), &heat.refusal);
    heat.question = &kind->question;
    heat.unit_of_the_start = gas_omitted(gas_argument(call, 5));
    struct gas_input change = {.name = "change", .dimension = kind->molar, .other = kind->specific};
    if (!heat.refusal.made && open_temperature(&heat, call, "from", 1, 5) && open_input(&heat, call, change, 2, 4))
        heat.unit = heat.input[0].unit;
    finish(&heat, call);
}
