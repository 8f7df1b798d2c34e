/* MIX: adiabatic mixing of streams or of the contents of vessels; wanted quantities, or a card with the composition. */
#include <stdio.h>
#include <string.h>

#include "sheet/functions.h"
#include "sheet/job_units.h"
#include "sheet/mix.h"

/* What the card shows before the composition: a unit for vessels and one for streams, unless a given sets it. */
static const struct card_row {
    const char *name;
    enum gas_dimension total, flow;
    const char *unit, *per_time;
} card_rows[] = {
    {"T", GAS_DIM_TEMPERATURE, GAS_DIM_TEMPERATURE, "°C", "°C"},
    {"P", GAS_DIM_PRESSURE, GAS_DIM_PRESSURE, "bar", "bar"},
    {"n", GAS_DIM_AMOUNT, GAS_DIM_AMOUNT_FLOW, "mol", "kmol/h"},
    {"m", GAS_DIM_MASS, GAS_DIM_MASS_FLOW, "kg", "kg/h"},
    {"V", GAS_DIM_VOLUME, GAS_DIM_VOLUME_FLOW, "m3", "m3/h"},
    {"M", GAS_DIM_MOLAR_MASS, GAS_DIM_MOLAR_MASS, "kg/kmol", "kg/kmol"},
    {"S made", GAS_DIM_ENTROPY, GAS_DIM_ENTROPY_FLOW, "J/K", "W/K"},
};
enum { CARD_ROWS = sizeof card_rows / sizeof *card_rows };

static void put_line(struct gas_call *call, size_t row, const char *label, double value, const char *unit)
{
    gas_put_text(call, row, 0, label);
    gas_put_number(call, row, 1, value);
    gas_put_text(call, row, 2, unit);
}

static bool put_card_row(const struct gas_mix *mix, struct gas_call *call, size_t at, const struct card_row *row,
                         struct gas_refusal *refusal)
{
    bool flow = mix->job.extent == GAS_EXTENT_FLOW;
    char text[GAS_HEADING_TEXT];
    double si;
    const char *otherwise = flow ? row->per_time : row->unit;
    struct gas_unit unit = gas_job_unit(&mix->job, flow ? row->flow : row->total, otherwise);
    snprintf(text, sizeof text, "%s, %s", row->name, unit.text);
    struct gas_heading heading = gas_heading_of(text);
    heading.unit = unit; /* a reference volume keeps the meaning that the options give it */
    if (!gas_mix_quantity(mix, &heading, &si, refusal))
        return false;
    put_line(call, at, row->name, gas_unit_from_si(&unit, si, mix->job.options.barometer), unit.text);
    return true;
}

/* The blend as a gas to type: "nitrogen 79 + oxygen 21"; "" when it does not fit or a card is among its parts. */
static void write_gas(const struct gas_mix *mix, char *text, size_t size)
{
    size_t used = 0;
    for (size_t i = 0; i < mix->parts; i++) {
        const struct gas_part *part = mix->part[i].part;
        if (!part->species || used >= size)
            break;
        used += (size_t)snprintf(text + used, size - used, "%s%s %s", i ? " + " : "", part->species->name,
                                 gas_shown_to(100 * mix->part[i].n / mix->blend.n, 10).text);
        if (used < size && i + 1 == mix->parts)
            return;
    }
    text[0] = '\0';
}

static bool answer_card(const struct gas_mix *mix, struct gas_call *call, struct gas_refusal *refusal)
{
    static const char *const headings[] = {"quantity", "value", "unit"};
    char text[1000];
    size_t at = 1;
    double mass = 0;
    for (size_t i = 0; i < mix->parts; i++)
        mass += mix->part[i].n * mix->part[i].part->molar_mass;
    if (!gas_answer_block(call, 2 + CARD_ROWS + 2 * mix->parts, 3))
        return true;
    gas_put_texts(call, 0, headings, 3);
    for (size_t i = 0; i < CARD_ROWS; i++)
        if (!put_card_row(mix, call, at++, &card_rows[i], refusal))
            return false;
    for (size_t i = 0; i < mix->parts; i++)
        put_line(call, at++, mix->part[i].part->label, 100 * mix->part[i].n / mix->blend.n, "mol %");
    for (size_t i = 0; i < mix->parts; i++)
        put_line(call, at++, mix->part[i].part->label, 100 * mix->part[i].n * mix->part[i].part->molar_mass / mass,
                 "wt %");
    write_gas(mix, text, sizeof text);
    gas_put_text(call, at, 0, "gas");
    gas_put_text(call, at, 1, text);
    return true;
}

static bool answer_wanted(const struct gas_mix *mix, struct gas_call *call, struct gas_refusal *refusal)
{
    const struct gas_wanted *wanted = &mix->job.wanted;
    if (!gas_answer_block(call, wanted->down ? wanted->columns : 1, wanted->down ? 1 : wanted->columns))
        return true;
    for (size_t i = 0; i < wanted->columns; i++) {
        const struct gas_heading *heading = &wanted->heading[i];
        double si;
        if (!gas_mix_quantity(mix, heading, &si, refusal))
            return false;
        gas_put_number(call, wanted->down ? i : 0, wanted->down ? 0 : i,
                       gas_unit_from_si(&heading->unit, si, mix->job.options.barometer));
    }
    return true;
}

/* (streams; [wanted]; [options]) */
void gas_fn_mix(struct gas_call *call)
{
    struct gas_mix mix;
    struct gas_refusal refusal = {0};
    bool good =
        gas_mix_open(&mix, gas_argument(call, 0), gas_argument(call, 1), gas_argument(call, 2), call->arena, &refusal);
    if (good)
        good = mix.job.wanted.columns ? answer_wanted(&mix, call, &refusal) : answer_card(&mix, call, &refusal);
    if (!good)
        gas_job_refused(call, &mix.job.options, &refusal);
    gas_mix_close(&mix);
}
