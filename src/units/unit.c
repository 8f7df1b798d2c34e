/* The public face of units: parsing through the cache, conversion. */
#include <float.h>
#include <math.h>
#include <stdio.h>
#include <string.h>

#include "units.h"

const struct gas_references gas_references_default = {
    .normal_T = 273.15,
    .normal_P = 101325.0,
    .standard_T = 288.15,
    .standard_P = 101325.0,
    .scf_T = (60.0 + 459.67) / 1.8,
    .scf_P = 14.696 * 0.45359237 * 9.80665 / (0.0254 * 0.0254), /* 14.696 psi */
};

const char *gas_dimension_si(enum gas_dimension dimension)
{
    static const char *const si[] = {
#define DIMENSION_SI(name, unit, words) unit,
        GAS_DIMENSION_LIST(DIMENSION_SI)
#undef DIMENSION_SI
    };
    return dimension < GAS_DIMENSIONS ? si[dimension] : "";
}

const char *gas_dimension_words(enum gas_dimension dimension)
{
    static const char *const sentence[] = {
#define DIMENSION_WORDS(name, unit, words) words,
        GAS_DIMENSION_LIST(DIMENSION_WORDS)
#undef DIMENSION_WORDS
    };
    return dimension < GAS_DIMENSIONS ? sentence[dimension] : "";
}

bool gas_unit_refuse(struct gas_unit_fault *fault, enum gas_unit_status status, const char *at, size_t length,
                     const char *hint)
{
    if (!fault)
        return false;
    *fault = (struct gas_unit_fault){.status = status};
    gas_copy_text(fault->at, sizeof fault->at, at, length);
    gas_copy_text(fault->hint, sizeof fault->hint, hint, strlen(hint));
    return false;
}

struct outcome {
    bool good;
    struct gas_unit unit;
    struct gas_unit_fault fault;
};

static bool references_sensible(const struct gas_references *r)
{
    const double values[] = {r->normal_T, r->normal_P, r->standard_T, r->standard_P, r->scf_T, r->scf_P};
    for (size_t i = 0; i < sizeof values / sizeof *values; i++)
        if (!(values[i] > 0.0) || !isfinite(values[i]))
            return false;
    return true;
}

static void parse_afresh(const char *text, size_t length, const struct gas_references *references, struct outcome *out)
{
    char plain[PLAIN_TEXT];
    struct gas_unit_fault *fault = &out->fault;
    *out = (struct outcome){.good = false};
    if (!references_sensible(references)) {
        gas_unit_refuse(fault, GAS_UNIT_REFERENCE, text, length, "the reference conditions in use make no sense");
        return;
    }
    if (!gas_spelling_plain(text, length, plain, fault))
        return;
    const char *at = gas_reference_mark(plain);
    out->good =
        at ? gas_reference_parse(plain, at, &out->unit, fault) : gas_basis_parse(plain, references, &out->unit, fault);
    gas_copy_text(out->unit.text, sizeof out->unit.text, text, length);
}

bool gas_unit_parse(const char *text, size_t length, const struct gas_references *references, struct gas_unit *unit,
                    struct gas_unit_fault *fault)
{
    struct outcome out;
    const struct gas_references *used = references ? references : &gas_references_default;
    gas_trim(&text, &length);
    if (length == 0)
        return gas_unit_refuse(fault, GAS_UNIT_EMPTY, "", 0, "give a unit");
    if (length >= GAS_UNIT_TEXT)
        return gas_unit_refuse(fault, GAS_UNIT_TOO_LONG, text, length, "no unit is this long");
    if (!gas_cache_get(&gas_unit_cache, text, length, used, &out, sizeof out)) {
        parse_afresh(text, length, used, &out);
        gas_cache_put(&gas_unit_cache, text, length, used, &out, sizeof out);
    }
    if (out.good && unit)
        *unit = out.unit;
    if (!out.good && fault)
        *fault = out.fault;
    return out.good;
}

bool gas_unit_compatible(const struct gas_unit *a, const struct gas_unit *b)
{
    return a->dimension == b->dimension && memcmp(a->power, b->power, sizeof a->power) == 0;
}

struct gas_unit gas_unit_si(enum gas_dimension dimension)
{
    struct gas_unit unit = {.dimension = dimension, .scale = 1.0};
    struct gas_unit parsed;
    const char *si = gas_dimension_si(dimension);
    if (dimension != GAS_DIM_OTHER && gas_unit_parse(si, strlen(si), NULL, &parsed, NULL))
        return parsed;
    return unit;
}

double gas_unit_to_si(const struct gas_unit *unit, double x, double barometer)
{
    double si = unit->scale * (x + unit->offset);
    switch (unit->basis) {
    case GAS_GAUGE:
        return si + barometer;
    case GAS_VACUUM:
        return barometer - si;
    case GAS_ABSOLUTE:
    default:
        return si;
    }
}

double gas_unit_from_si(const struct gas_unit *unit, double si, double barometer)
{
    double own = unit->basis == GAS_GAUGE ? si - barometer : unit->basis == GAS_VACUUM ? barometer - si : si;
    double level = own / unit->scale, x = level - unit->offset;
    /* 32 °F is 0 °C: what the rounding of 273.15 leaves is no reading */
    return fabs(x) <= 4 * DBL_EPSILON * unit->offset ? 0 : x;
}

double gas_unit_difference_to_si(const struct gas_unit *unit, double x)
{
    return unit->scale * x;
}

double gas_unit_difference_from_si(const struct gas_unit *unit, double si)
{
    return si / unit->scale;
}
