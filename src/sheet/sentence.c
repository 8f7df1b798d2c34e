#include "sheet/sentence.h"

#include <math.h>
#include <stdarg.h>
#include <stdio.h>
#include <string.h>

#include <gasleaf/unit.h>

/* Bytes of a character that may be shown: whole UTF-8, no control character; 0 otherwise. */
static size_t shown_bytes(const char *text)
{
    const unsigned char *at = (const unsigned char *)text;
    size_t bytes = *at < 0x80 ? 1 : *at < 0xC2 ? 0 : *at < 0xE0 ? 2 : *at < 0xF0 ? 3 : *at < 0xF5 ? 4 : 0;
    for (size_t i = 1; i < bytes; i++)
        if ((at[i] & 0xC0) != 0x80)
            return 0;
    bool control = *at < ' ' || *at == 0x7F || (*at == 0xC2 && at[1] < 0xA0);
    bool overlong = (*at == 0xE0 && at[1] < 0xA0) || (*at == 0xF0 && at[1] < 0x90);
    bool none = (*at == 0xED && at[1] > 0x9F) || (*at == 0xF4 && at[1] > 0x8F);
    return control || overlong || none ? 0 : bytes;
}

/* What cannot be shown becomes a question mark, white space of any kind a space. */
static void make_showable(char *text)
{
    for (size_t bytes; *text; text += bytes) {
        bytes = shown_bytes(text);
        if (bytes)
            continue;
        *text = strchr("\t\r\n", *text) ? ' ' : '?';
        bytes = 1;
    }
}

/* A sentence that was too long ends in an ellipsis and a full stop, after a whole character. */
static void end_early(char *text, size_t size)
{
    static const char ending[] = "\u2026.";
    size_t end = size - sizeof ending;
    while (end > 0 && ((unsigned char)text[end] & 0xC0) == 0x80)
        end--;
    memcpy(text + end, ending, sizeof ending);
}

bool gas_refuse(struct gas_refusal *refusal, const char *what, const char *format, ...)
{
    if (refusal->made)
        return false;
    refusal->made = true;
    int used = snprintf(refusal->text, sizeof refusal->text, "Check %.150s: ", what);
    size_t room = sizeof refusal->text - (size_t)used;
    va_list values;
    va_start(values, format);
    int needed =
        vsnprintf(refusal->text + used, room, format, values); /* NOLINT(clang-analyzer-valist.*): started above */
    va_end(values);
    if (needed >= 0 && (size_t)needed >= room)
        end_early(refusal->text, sizeof refusal->text);
    make_showable(refusal->text);
    return false;
}

bool gas_refuse_sentence(struct gas_refusal *refusal, const char *sentence)
{
    if (refusal->made)
        return false;
    refusal->made = true;
    if ((size_t)snprintf(refusal->text, sizeof refusal->text, "%s", sentence) >= sizeof refusal->text)
        end_early(refusal->text, sizeof refusal->text);
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

struct gas_shown gas_shown_to(double figure, int digits)
{
    struct gas_shown shown = {""};
    if (isfinite(figure))
        gas_number_format(shown.text, sizeof shown.text, figure, digits);
    else
        snprintf(shown.text, sizeof shown.text, "a figure without bounds");
    return shown;
}

struct gas_shown gas_shown(double figure)
{
    return gas_shown_to(figure, 6);
}

const char *gas_figure(char *buffer, size_t size, double figure, const struct gas_unit *unit)
{
    int length = snprintf(buffer, size, "%s", gas_shown(figure).text);
    size_t used = length < (int)size ? (size_t)length : size - 1;
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
        return gas_refuse(refusal, what, "%s is not a unit known here; %s.", at,
                          fault->hint[0] ? fault->hint : "write one such as bar(g), kPa, °C, kg/h or kJ/kg-K");
    }
}

bool gas_refuse_heading(struct gas_refusal *refusal, const char *what, const char *text, size_t length,
                        const struct gas_heading_fault *fault)
{
    char shown[80], where[160];
    gas_quoted(shown, sizeof shown, text, length);
    const char *hint = fault->hint;
    switch (fault->status) {
    case GAS_HEADING_EMPTY:
        return gas_refuse(refusal, what, "a heading is blank; write a quantity and its unit, such as \"P1, bar(g)\".");
    case GAS_HEADING_UNIT:
        if (fault->unit.at[0] == ',')
            return gas_refuse(refusal, what, "%s holds a comma; separate items with ';', such as 7 bar(g); 35 °C.",
                              shown);
        snprintf(where, sizeof where, "%s %s", what, shown);
        return gas_refuse_unit(refusal, where, &fault->unit);
    case GAS_HEADING_CONTRADICTION:
        return gas_refuse(refusal, what, "%s names a quantity and a unit that do not belong together%s%s.", shown,
                          hint[0] ? "; " : "", hint);
    case GAS_HEADING_STATE:
        return gas_refuse(refusal, what, "%s has a state number that is not 1 to 9; number the states from 1.", shown);
    case GAS_HEADING_TOO_LONG:
        return gas_refuse(refusal, what, "%s is too long for a heading; write a quantity and its unit.", shown);
    default:
        return gas_refuse(refusal, what, "%s names no known quantity; %s.", shown,
                          hint[0] ? hint : "write one such as \"P1, bar(g)\" or \"m, kg\"");
    }
}

/* The slip behind a figure in K that would be a usual temperature in degrees Celsius; "" when it is none. */
static void name_celsius(char *slip, size_t size, double T, const struct gas_unit *unit)
{
    slip[0] = '\0';
    if (T > -100 && T < 200 && unit->offset == 0 && unit->scale == 1)
        snprintf(slip, size, " If %s °C was meant, give the unit.", gas_shown(T).text);
}

bool gas_refuse_temperature(struct gas_refusal *refusal, const char *what, double T, const struct gas_unit *unit,
                            const char *gas_label, double T_from, double T_to)
{
    char figure[80], from[40], to[40], slip[80];
    gas_figure(figure, sizeof figure, gas_unit_from_si(unit, T, GAS_ATMOSPHERE), unit);
    gas_number_format(from, sizeof from, gas_unit_from_si(unit, T_from, GAS_ATMOSPHERE), 6);
    gas_figure(to, sizeof to, gas_unit_from_si(unit, T_to, GAS_ATMOSPHERE), unit);
    name_celsius(slip, sizeof slip, T, unit);
    return gas_refuse(refusal, what, "%s is outside the data for %s (%s to %s).%s", figure, gas_label, from, to, slip);
}

static bool refuse_level(struct gas_refusal *refusal, const char *what, double figure, const struct gas_unit *unit,
                         double barometer)
{
    char shown[80], limit[80], slip[80];
    gas_figure(shown, sizeof shown, figure, unit);
    if (unit->dimension == GAS_DIM_TEMPERATURE) {
        gas_figure(limit, sizeof limit, gas_unit_from_si(unit, 0, barometer), unit);
        name_celsius(slip, sizeof slip, figure, unit);
        return gas_refuse(refusal, what, "%s is %s absolute zero (%s).%s", shown,
                          gas_unit_to_si(unit, figure, barometer) < 0 ? "below" : "at", limit, slip);
    }
    if (unit->basis == GAS_ABSOLUTE)
        return gas_refuse(refusal, what,
                          "%s is below a perfect vacuum; if it is a gauge reading, write bar(g) or psig.", shown);
    return gas_refuse(refusal, what, "%s is below a perfect vacuum at a barometer of %s bar.", shown,
                      gas_shown(barometer / 1e5).text);
}

/* Called for every figure of every row: nothing is written unless it is refused. */
bool gas_accept_level(struct gas_refusal *refusal, const char *what, double figure, const struct gas_unit *unit,
                      double barometer)
{
    if (!isfinite(figure))
        return gas_refuse(refusal, what, "the figure is not finite; look for a division by zero where it comes from.");
    double si = gas_unit_to_si(unit, figure, barometer);
    bool good = unit->dimension == GAS_DIM_TEMPERATURE ? si > 0 : unit->dimension != GAS_DIM_PRESSURE || si >= 0;
    return good || refuse_level(refusal, what, figure, unit, barometer);
}
