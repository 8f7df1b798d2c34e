/* Volumes at a reference that is written out: "m3@20 degC,101.325 kPa", "ft3/h @ 60 degF; 14.73 psia". */
#include <string.h>

#include <gasleaf/gas.h>

#include "units.h"

static const char *const wanted_words = "give a temperature and a pressure: m3@20°C,101.325kPa";

/* The @, or the word "at" before a figure; "at" alone is a pressure unit. */
const char *gas_reference_mark(const char *plain)
{
    const char *at = strchr(plain, '@');
    for (const char *p = plain; !at && *p; p++) {
        bool word = p > plain && gas_is_space(p[-1]) && gas_lower(p[0]) == 'a' && gas_lower(p[1]) == 't';
        if (word && (gas_is_space(p[2]) || p[2] == '('))
            at = gas_is_digit(p[2 + strspn(p + 2, " (-+")]) ? p : NULL;
    }
    return at;
}

static bool refuse(struct gas_unit_fault *fault, const char *from, const char *hint)
{
    return gas_unit_refuse(fault, GAS_UNIT_REFERENCE, from, strlen(from), hint);
}

/* Where the unit of a reference value ends: at a separator, "and", or a figure behind a space. */
static const char *value_end(const char *p)
{
    for (; *p; p++) {
        if (*p == ',' || *p == ';' || *p == '&')
            return p;
        if (gas_is_space(*p) && (gas_is_digit(p[1]) || strncmp(p, " and ", 5) == 0))
            return p;
    }
    return p;
}

static const char *next_value(const char *p)
{
    while (gas_is_space(*p) || *p == ',' || *p == ';' || *p == '&')
        p++;
    return strncmp(p, "and ", 4) == 0 ? next_value(p + 4) : p;
}

static void copy_trimmed(char *to, const char *from, const char *end)
{
    while (end > from && gas_is_space(end[-1]))
        end--;
    memcpy(to, from, (size_t)(end - from));
    to[end - from] = '\0';
}

/* One figure with its unit, put where its dimension says. */
static bool read_value(const char **p, struct gas_unit *unit, struct gas_unit_fault *fault)
{
    char text[PLAIN_TEXT];
    double number;
    size_t used;
    struct gas_unit value;
    const char *from = *p, *end = from + strlen(from);
    if (!gas_number_parse(from, (size_t)(end - from), &number, &used))
        return refuse(fault, from, wanted_words);
    end = value_end(from + used);
    copy_trimmed(text, from + used, end);
    if (!text[0])
        return refuse(fault, from, "each value of a reference needs its unit: m3@20°C,101.325kPa");
    if (!gas_basis_parse(text, &gas_references_default, &value, fault))
        return false;
    *p = next_value(end);
    double *place = value.dimension == GAS_DIM_TEMPERATURE ? &unit->reference_T
                    : value.dimension == GAS_DIM_PRESSURE  ? &unit->reference_P
                                                           : NULL;
    if (!place || *place != 0.0 || value.basis != GAS_ABSOLUTE)
        return refuse(fault, from, place ? "one temperature and one absolute pressure are wanted" : wanted_words);
    *place = gas_unit_to_si(&value, number, GAS_ATMOSPHERE);
    return true;
}

/* Reference conditions are those of a room, not of a process: a slip of units shows here. */
static bool sensible(const struct gas_unit *unit)
{
    return unit->reference_T > 150.0 && unit->reference_T < 500.0 && unit->reference_P > 1e3 && unit->reference_P < 1e7;
}

static bool read_base(const char *plain, const char *at, struct gas_unit *unit, struct gas_unit_fault *fault)
{
    char base[PLAIN_TEXT];
    struct unit_product product = {.number = 1.0};
    copy_trimmed(base, plain, at);
    if (!gas_product_parse(base, &product, fault) ||
        !gas_engine_resolve(&product, &gas_references_default, unit, fault))
        return false;
    if (unit->reference_volume)
        return refuse(fault, plain, "this unit has its reference already; write m3 or ft3 before the @");
    if (unit->dimension != GAS_DIM_VOLUME && unit->dimension != GAS_DIM_VOLUME_FLOW)
        return refuse(fault, plain, "a reference belongs to a volume or a volume flow: m3/h@0°C,101.325kPa");
    return true;
}

bool gas_reference_parse(const char *plain, const char *at, struct gas_unit *unit, struct gas_unit_fault *fault)
{
    char values[PLAIN_TEXT];
    const char *p = next_value(at + (*at == '@' ? 1 : 2));
    copy_trimmed(values, p, p + strlen(p));
    size_t length = strlen(values);
    bool bracket = values[0] == '(' && values[length - 1] == ')';
    if (bracket)
        values[length - 1] = '\0';
    p = values + bracket;
    if (!read_base(plain, at, unit, fault) || !read_value(&p, unit, fault))
        return false;
    if (!*p)
        return refuse(fault, values, wanted_words);
    if (!read_value(&p, unit, fault))
        return false;
    if (*p || !sensible(unit))
        return refuse(fault, values, *p ? wanted_words : "no reference conditions are like that");
    unit->scale *= unit->reference_P / (GAS_R * unit->reference_T);
    unit->dimension = unit->dimension == GAS_DIM_VOLUME ? GAS_DIM_AMOUNT : GAS_DIM_AMOUNT_FLOW;
    unit->reference_volume = true;
    unit->power[1] = 0;
    unit->power[4] = 1;
    return true;
}
