/* Z and VALID: how far the ideal gas is off, cell by cell. */
#include <math.h>
#include <stdarg.h>
#include <stdio.h>
#include <string.h>

#include "sheet/elementwise.h"
#include "sheet/estimate.h"
#include "sheet/functions.h"

enum { T, P, INPUTS, SHOWN = 96 };

#define TR_LEAST 0.3 /* the range of the correlation */
#define TR_MOST  4.0
#define PR_MOST  10.0

/* A call being worked on. */
struct real_call {
    const struct gas_choice *choice;
    struct gas_critical critical;
    struct gas_input input[INPUTS];
    struct gas_refusal refusal;
};

/* One cell: the figures read, and what a sentence needs of them. */
struct spot {
    struct gas_reading reading[INPUTS];
    char T[SHOWN], P[SHOWN];
    struct gas_condensing condensing;
};

static const char *shown_pressure(const struct spot *spot, char buffer[SHOWN], double pressure, int digits)
{
    const struct gas_unit *unit = &spot->reading[P].unit;
    char figure[40];
    gas_number_format(figure, sizeof figure, gas_unit_from_si(unit, pressure, GAS_ATMOSPHERE), digits);
    snprintf(buffer, SHOWN, "%s %s", figure, unit->text);
    return buffer;
}

/* A partial or a vapour pressure: absolute, whatever the reading stands on. */
static const char *shown_absolute(const struct spot *spot, char buffer[SHOWN], double pressure)
{
    if (spot->reading[P].unit.basis == GAS_ABSOLUTE)
        return shown_pressure(spot, buffer, pressure, 3);
    snprintf(buffer, SHOWN, "%s bar", gas_shown_to(pressure / 1e5, 3).text);
    return buffer;
}

static const char *shown(char buffer[SHOWN], const struct gas_reading *reading)
{
    return gas_figure(buffer, SHOWN, gas_unit_from_si(&reading->unit, reading->si, GAS_ATMOSPHERE), &reading->unit);
}

static bool open_call(struct real_call *real, const struct gas_call *call)
{
    static const char *const names[] = {"temperature", "pressure"};
    static const enum gas_dimension dimensions[] = {GAS_DIM_TEMPERATURE, GAS_DIM_PRESSURE};
    memset(real, 0, sizeof *real);
    real->choice = gas_choose(gas_argument(call, 0), &real->refusal);
    for (size_t i = 0; i < INPUTS && !real->refusal.made; i++) {
        real->input[i] = (struct gas_input){.name = names[i], .dimension = dimensions[i], .other = dimensions[i]};
        gas_input_open(&real->input[i], gas_argument(call, i + 1), gas_argument(call, i + 3), &real->refusal);
    }
    const char *unknown = real->refusal.made ? NULL : gas_critical_of(real->choice, &real->critical);
    return !unknown ? !real->refusal.made
                    : gas_refuse(&real->refusal, "gas",
                                 "the critical constants of %s are not known, so how real it is cannot be estimated.",
                                 unknown);
}

static bool read_spot(struct real_call *real, size_t row, size_t column, struct spot *spot)
{
    for (size_t i = 0; i < INPUTS; i++)
        if (!gas_input_read(&real->input[i], row, column, &spot->reading[i], &real->refusal))
            return false;
    shown(spot->T, &spot->reading[T]);
    shown(spot->P, &spot->reading[P]);
    double Tr = spot->reading[T].si / real->critical.T;
    if (Tr < TR_LEAST)
        return gas_refuse(&real->refusal, "temperature",
                          "%s is %s of the critical temperature of %s, %s K; the correlation starts at 0.3, where next "
                          "to nothing is a gas.",
                          spot->T, gas_shown_to(Tr, 2).text, real->choice->label,
                          gas_shown_to(real->critical.T, 4).text);
    spot->condensing = gas_condensing_of(real->choice, spot->reading[T].si, spot->reading[P].si);
    return true;
}

/* -- Z ------------------------------------------------------------------------------------------------------------- */

static bool refuse_liquid(struct real_call *real, const struct spot *spot)
{
    char vapour[SHOWN];
    const struct gas_part *part = spot->condensing.part;
    shown_absolute(spot, vapour, spot->condensing.vapour);
    if (real->choice->part_count == 1)
        return gas_refuse(&real->refusal, "pressure",
                          "%s is above the vapour pressure of %s at %s, about %s: it condenses.", spot->P, part->label,
                          spot->T, vapour);
    return gas_refuse(&real->refusal, "pressure",
                      "at %s and %s the mixture is past its dew point, first of all of %s (vapour pressure about %s).",
                      spot->T, spot->P, part->label, vapour);
}

static bool Z_of(struct real_call *real, const struct spot *spot, double *Z)
{
    struct gas_result result = gas_estimated_Z(&real->critical, spot->reading[T].si, spot->reading[P].si);
    *Z = result.value;
    if (result.status == GAS_OK && spot->condensing.load > 1)
        return refuse_liquid(real, spot);
    if (result.status == GAS_OK)
        return true;
    bool hot = result.argument == 1;
    double times = hot ? spot->reading[T].si / real->critical.T : spot->reading[P].si / real->critical.P;
    return gas_refuse(&real->refusal, hot ? "temperature" : "pressure",
                      "%s is %s times the critical %s of %s, %s %s; the correlation ends at %s.",
                      hot ? spot->T : spot->P, gas_shown_to(times, 3).text, hot ? "temperature" : "pressure",
                      real->choice->label, gas_shown_to(hot ? real->critical.T : real->critical.P / 1e5, 4).text,
                      hot ? "K" : "bar", hot ? "4" : "10");
}

static void answer_Z(struct real_call *real, struct gas_call *call, size_t row, size_t column)
{
    struct spot spot;
    double Z;
    if (read_spot(real, row, column, &spot) && Z_of(real, &spot, &Z))
        gas_put_number(call, row, column, Z);
    else
        gas_put_text(call, row, column, real->refusal.text);
}

/* -- VALID --------------------------------------------------------------------------------------------------------- */

struct text {
    char at[480];
    size_t used;
};

static void add(struct text *text, const char *format, ...) __attribute__((format(printf, 2, 3)));

static void add(struct text *text, const char *format, ...)
{
    char *at = text->at + text->used;
    size_t room = sizeof text->at - text->used;
    va_list values;
    va_start(values, format);
    int needed = vsnprintf(at, room, format, values); /* NOLINT(clang-analyzer-valist.*): started above */
    va_end(values);
    text->used += needed > 0 ? (size_t)needed : 0;
    if (text->used >= sizeof text->at)
        text->used = sizeof text->at - 1;
}

/* Verdict, Z and the error of the ideal density; hot: beyond the correlation, estimated at its edge. */
static void add_verdict(struct text *text, double Z, bool hot)
{
    double error = fabs(Z - 1);
    const char *verdict = error <= 0.01 ? "Good within 1 %" : error <= 0.05 ? "Usable within 5 %" : "Not good";
    char off[40];
    gas_number_format(off, sizeof off, 100 * error, error < 0.1 ? 2 : 3);
    if (error < 5e-5)
        add(text, "%s: Z is 1 within 0.005 %%", verdict);
    else
        add(text, "%s: Z is about %s, the ideal density %s %% too %s", verdict,
            gas_shown_to(Z, (error < 0.0095 ? 4 : 3) + (Z >= 1)).text, off, Z < 1 ? "low" : "high");
    add(text, hot ? " (hotter than the correlation reaches: the figure of its edge, 4 times the critical temperature)."
                  : ".");
}

/* Where the correlation lets the gas condense: there gas_ideal_up_to stops. */
static bool is_end_of_gas(const struct real_call *real, double temperature, double limit)
{
    double Tr = temperature / real->critical.T;
    struct gas_result vapour = gas_reduced_vapour_pressure(Tr, real->critical.omega);
    return vapour.status == GAS_OK && limit > 0.999 * vapour.value * real->critical.P;
}

static void add_limit(struct text *text, const struct real_call *real, const struct spot *spot)
{
    char limit[SHOWN];
    double temperature = fmin(spot->reading[T].si, TR_MOST * real->critical.T);
    struct gas_condensing condensing = gas_condensing_of(real->choice, temperature, 1);
    double dew = condensing.load > 0 ? 1 / condensing.load : INFINITY; /* Pa: the load goes with the pressure */
    struct gas_result up_to = gas_ideal_up_to(&real->critical, temperature, 0.01);
    if (up_to.status != GAS_OK)
        return;
    if (is_end_of_gas(real, temperature, up_to.value) || dew < up_to.value)
        add(text, " At %s 1 %% holds until %s condenses, at about %s.", spot->T,
            condensing.part ? condensing.part->label : "it", shown_pressure(spot, limit, dew, 2));
    else if (isnan(up_to.value))
        add(text, " At %s 1 %% holds over all pressures of the correlation, up to %s.", spot->T,
            shown_pressure(spot, limit, PR_MOST * real->critical.P, 2));
    else
        add(text, " At %s 1 %% holds up to about %s.", spot->T, shown_pressure(spot, limit, up_to.value, 2));
}

static void add_condensing(struct text *text, const struct spot *spot)
{
    char partial[SHOWN], vapour[SHOWN];
    const struct gas_condensing *condensing = &spot->condensing;
    if (!condensing->part || condensing->load < 0.8)
        return;
    bool alone = condensing->part->x > 0.999999;
    shown_absolute(spot, partial, condensing->partial);
    shown_absolute(spot, vapour, condensing->vapour);
    if (alone)
        add(text, " Near its dew point: the vapour pressure is about %s.", vapour);
    else
        add(text, " Near the dew point: %s at %s of its vapour pressure, about %s.", condensing->part->label, partial,
            vapour);
}

static void add_weakness(struct text *text, const struct real_call *real, const struct spot *spot)
{
    const char *why;
    const struct gas_part *rough = gas_rough_part(real->choice, &why);
    double Tr = spot->reading[T].si / real->critical.T, Pr = spot->reading[P].si / real->critical.P;
    if (rough)
        add(text, " The estimate is rough: %s is %s.", rough->label, why);
    if (Tr > 0.95 && Tr < 1.05 && Pr > 0.6)
        add(text, " The estimate is rough: near the critical point.");
}

static bool judge(struct real_call *real, const struct spot *spot, struct text *text)
{
    double temperature = spot->reading[T].si, Pr = spot->reading[P].si / real->critical.P;
    bool hot = temperature > TR_MOST * real->critical.T;
    char vapour[SHOWN];
    if (spot->condensing.load > 1) {
        add(text, "%s: at %s and %s %s condenses (vapour pressure about %s).",
            real->choice->part_count == 1 ? "Not a gas" : "Not a gas alone", spot->T, spot->P,
            spot->condensing.part->label, shown_absolute(spot, vapour, spot->condensing.vapour));
        add_weakness(text, real, spot);
        return true;
    }
    if (Pr > PR_MOST) {
        add(text, "Not good: %s is %s times the critical pressure, beyond the correlation (10); no estimate.", spot->P,
            gas_shown_to(Pr, 3).text);
        return true;
    }
    struct gas_result Z =
        gas_estimated_Z(&real->critical, hot ? TR_MOST * real->critical.T : temperature, spot->reading[P].si);
    if (Z.status != GAS_OK)
        return gas_refuse(&real->refusal, "pressure", "%s has no estimate at %s: %s.", spot->P, spot->T,
                          gas_status_words(Z.status));
    add_verdict(text, Z.value, hot);
    add_limit(text, real, spot);
    add_condensing(text, spot);
    add_weakness(text, real, spot);
    return true;
}

static void answer_valid(struct real_call *real, struct gas_call *call, size_t row, size_t column)
{
    struct spot spot;
    struct text text = {.used = 0};
    bool good = read_spot(real, row, column, &spot) && judge(real, &spot, &text);
    gas_put_text(call, row, column, good ? text.at : real->refusal.text);
}

/* -- the functions ------------------------------------------------------------------------------------------------- */

/* (gas; temperature; pressure; [temperature unit]; [pressure unit]) */
static void answer(struct gas_call *call,
                   void (*cell)(struct real_call *real, struct gas_call *call, size_t row, size_t column))
{
    struct real_call real;
    size_t rows, columns;
    bool good = open_call(&real, call) && gas_inputs_shape(real.input, INPUTS, &rows, &columns, &real.refusal);
    if (!good)
        gas_answer_text(call, real.refusal.text);
    else if (gas_answer_block(call, rows, columns))
        for (size_t i = 0; i < rows * columns; i++) {
            real.refusal.made = false;
            cell(&real, call, i / columns, i % columns);
        }
    gas_choice_release(real.choice);
}

void gas_fn_z(struct gas_call *call)
{
    answer(call, answer_Z);
}

void gas_fn_valid(struct gas_call *call)
{
    answer(call, answer_valid);
}
