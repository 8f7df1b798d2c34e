#include "sheet/sentence.h"

#include <math.h>
#include <stdarg.h>
#include <stdio.h>
#include <string.h>

#include <gasleaf/unit.h>

/* Cut at a character boundary: a UTF-8 continuation byte is never the last thing dropped alone. */
static void cut_to_fit(char *text, size_t size)
{
    size_t end = size - 1;
    while (end > 0 && ((unsigned char)text[end] & 0xC0) == 0x80)
        end--;
    text[end] = '\0';
}

bool gas_refuse(struct gas_refusal *refusal, const char *what, const char *format, ...)
{
    if (refusal->made)
        return false;
    refusal->made = true;
    int used = snprintf(refusal->text, sizeof refusal->text, "Check %.60s: ", what);
    size_t room = sizeof refusal->text - (size_t)used;
    va_list values;
    va_start(values, format);
    int needed = vsnprintf(refusal->text + used, room, format, values);
    va_end(values);
    if (needed >= 0 && (size_t)needed >= room)
        cut_to_fit(refusal->text, sizeof refusal->text);
    return false;
}

bool gas_refuse_sentence(struct gas_refusal *refusal, const char *sentence)
{
    if (!refusal->made)
        snprintf(refusal->text, sizeof refusal->text, "%s", sentence);
    refusal->made = true;
    return false;
}

const char *gas_quoted(char *buffer, size_t size, const char *text, size_t length)
{
    const size_t most = size - 6; /* two quotes, an ellipsis of three bytes, the end */
    size_t used = 0, kept = length;
    if (kept > most)
        for (kept = most; kept > 0 && ((unsigned char)text[kept] & 0xC0) == 0x80;)
            kept--;
    buffer[used++] = '"';
    for (size_t i = 0; i < kept; i++)
        buffer[used++] = (unsigned char)text[i] < ' ' ? ' ' : text[i];
    snprintf(buffer + used, size - used, "%s\"", kept < length ? "\u2026" : "");
    return buffer;
}

const char *gas_figure(char *buffer, size_t size, double figure, const struct gas_unit *unit)
{
    gas_number_format(buffer, size, figure, 6);
    size_t used = strlen(buffer);
    if (unit && unit->text[0] && strcmp(unit->text, "1") != 0)
        snprintf(buffer + used, size - used, " %s", unit->text);
    return buffer;
}

bool gas_refuse_unit(struct gas_refusal *refusal, const char *what, const struct gas_unit_fault *fault)
{
    char at[80];
    gas_quoted(at, sizeof at, fault->at, strlen(fault->at));
    switch (fault->status) {
    case GAS_UNIT_EMPTY:
        return gas_refuse(refusal, what, "a unit is missing; write one, such as bar(g) or kg.");
    case GAS_UNIT_AMBIGUOUS:
        return gas_refuse(refusal, what, "%s can mean more than one unit; %s.", at, fault->hint);
    case GAS_UNIT_REFERENCE:
        return gas_refuse(refusal, what,
                          "the reference conditions in %s cannot be read; write them like m3@20°C,101.325kPa.", at);
    case GAS_UNIT_TOO_LONG:
        return gas_refuse(refusal, what, "the unit is too long to be one; write one such as kJ/kg-K.");
    default:
        return gas_refuse(refusal, what, "%s is not a unit known here%s%s.", at, fault->hint[0] ? "; " : "",
                          fault->hint[0] ? fault->hint : "; write one such as bar(g), kPa, °C, kg/h or kJ/kg-K");
    }
}

bool gas_refuse_heading(struct gas_refusal *refusal, const char *what, const char *text, size_t length,
                        const struct gas_heading_fault *fault)
{
    char shown[80];
    gas_quoted(shown, sizeof shown, text, length);
    const char *hint = fault->hint;
    switch (fault->status) {
    case GAS_HEADING_EMPTY:
        return gas_refuse(refusal, what, "a heading is blank; write a quantity and its unit, such as \"P1, bar(g)\".");
    case GAS_HEADING_UNIT:
        return gas_refuse_unit(refusal, shown, &fault->unit);
    case GAS_HEADING_CONTRADICTION:
        return gas_refuse(refusal, what, "%s names a quantity and a unit that do not belong together%s%s.", shown,
                          hint[0] ? "; " : "", hint);
    case GAS_HEADING_STATE:
        return gas_refuse(refusal, what, "%s has a state number that is not 1 to 9; number the states from 1.", shown);
    case GAS_HEADING_TOO_LONG:
        return gas_refuse(refusal, what, "%s is too long for a heading; write a quantity and its unit.", shown);
    default:
        return gas_refuse(refusal, what,
                          "%s names no known quantity%s%s; write one such as \"P1, bar(g)\" or \"m, kg\".", shown,
                          hint[0] ? "; " : "", hint);
    }
}

/* A bare or K figure that would be a usual room or process temperature in degrees Celsius. */
static bool looks_like_celsius(double T, const struct gas_unit *unit)
{
    return T > -100 && T < 200 && unit->offset == 0 && unit->scale == 1;
}

bool gas_refuse_temperature(struct gas_refusal *refusal, const char *what, double T, const struct gas_unit *unit,
                            const char *gas_label, double T_from, double T_to)
{
    char figure[80], from[40], to[40], slip[80] = "", celsius[40];
    gas_figure(figure, sizeof figure, gas_unit_from_si(unit, T, GAS_ATMOSPHERE), unit);
    gas_number_format(from, sizeof from, gas_unit_from_si(unit, T_from, GAS_ATMOSPHERE), 6);
    gas_figure(to, sizeof to, gas_unit_from_si(unit, T_to, GAS_ATMOSPHERE), unit);
    if (looks_like_celsius(T, unit)) {
        gas_number_format(celsius, sizeof celsius, T, 6);
        snprintf(slip, sizeof slip, " If %s °C was meant, give the unit.", celsius);
    }
    return gas_refuse(refusal, what, "%s is outside the data for %s (%s to %s).%s", figure, gas_label, from, to, slip);
}

bool gas_accept_level(struct gas_refusal *refusal, const char *what, double figure, const struct gas_unit *unit,
                      double barometer)
{
    char shown[80], limit[40];
    gas_figure(shown, sizeof shown, figure, unit);
    if (!isfinite(figure))
        return gas_refuse(refusal, what, "%s is not a finite number.", shown);
    double si = gas_unit_to_si(unit, figure, barometer);
    if (unit->dimension == GAS_DIM_TEMPERATURE && si <= 0) {
        gas_figure(limit, sizeof limit, gas_unit_from_si(unit, 0, barometer), unit);
        return gas_refuse(refusal, what, "%s is %s absolute zero (%s).", shown, si < 0 ? "below" : "at", limit);
    }
    if (unit->dimension != GAS_DIM_PRESSURE || si >= 0)
        return true;
    if (unit->basis == GAS_ABSOLUTE)
        return gas_refuse(refusal, what,
                          "%s is below a perfect vacuum; if it is a gauge reading, write bar(g) or psig.", shown);
    gas_number_format(limit, sizeof limit, barometer / 1e5, 6);
    return gas_refuse(refusal, what, "%s is below a perfect vacuum at a barometer of %s bar.", shown, limit);
}
