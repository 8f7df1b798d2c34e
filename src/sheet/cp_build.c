#include "sheet/cp_build.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "sheet/ascii.h"

const struct gas_T_unit gas_T_kelvin = {
    .scale = 1, .level = {.dimension = GAS_DIM_TEMPERATURE, .scale = 1, .text = "K"}, .text = "K"};

/* "T/1000", "K/1000", "degR/100": what follows the slash, 1 without one. */
static double divisor(struct gas_piece *text)
{
    static const double divisors[] = {10, 100, 1000, 10000};
    for (size_t i = 0; i < sizeof divisors / sizeof *divisors; i++) {
        char ending[16];
        size_t length = (size_t)snprintf(ending, sizeof ending, "/%.0f", divisors[i]);
        if (text->length >= length && memcmp(text->at + text->length - length, ending, length) == 0) {
            *text = gas_piece_front(*text, text->length - length);
            return divisors[i];
        }
    }
    return 1;
}

bool gas_T_unit_read(struct gas_piece text, struct gas_T_unit *unit, struct gas_refusal *refusal)
{
    struct gas_piece shown = gas_piece_trim(text), rest = shown;
    struct gas_unit parsed = gas_unit_si(GAS_DIM_TEMPERATURE);
    struct gas_unit_fault fault;
    char quoted[60];
    gas_piece_take(&rest, "t in");
    gas_piece_take(&rest, "in");
    double thousands = divisor(&rest);
    if (rest.length == 2 && memcmp(rest.at, "kK", 2) == 0)
        thousands *= 1000;
    else if (!(rest.length == 1 && (rest.at[0] == 'T' || rest.at[0] == 't') && thousands > 1) &&
             !gas_unit_parse(rest.at, rest.length, NULL, &parsed, &fault))
        return gas_refuse_unit(refusal, "T unit", &fault);
    gas_quoted(quoted, sizeof quoted, shown.at, shown.length);
    if (parsed.dimension != GAS_DIM_TEMPERATURE)
        return gas_refuse(refusal, "T unit", "%s is not a unit of temperature; write K, °C, °R, °F or T/1000.", quoted);
    *unit = (struct gas_T_unit){thousands * parsed.scale, parsed.offset / thousands, parsed, ""};
    snprintf(unit->text, sizeof unit->text, "%.*s", (int)shown.length, shown.at);
    return true;
}

static bool refuse_size(struct gas_cp_build *build)
{
    return gas_refuse(build->refusal, "cp", "it has more than %d terms; shorten it.", GAS_CP_TERMS);
}

bool gas_cp_add_term(struct gas_cp_build *build, enum gas_term_kind kind, double factor, double scale, double exponent)
{
    if (!isfinite(factor) || !isfinite(scale))
        return gas_refuse(build->refusal, "cp", "a constant is too large to compute with; check the figures.");
    if (factor == 0)
        return true;
    for (size_t i = 0; i < build->terms; i++) {
        struct gas_term *term = &build->term[i];
        if (term->kind == kind && term->scale == scale && term->exponent == exponent) {
            term->factor += factor;
            return true;
        }
    }
    if (build->terms == GAS_CP_TERMS)
        return refuse_size(build);
    build->term[build->terms++] = (struct gas_term){kind, factor, scale, exponent};
    return true;
}

static bool add_power_of_T(struct gas_cp_build *build, double factor, double exponent)
{
    double place = exponent - GAS_POWER_LOWEST;
    if (!isfinite(factor))
        return gas_refuse(build->refusal, "cp", "a constant is too large to compute with; check the figures.");
    if (place != floor(place) || place < 0 || place >= GAS_POWERS)
        return gas_cp_add_term(build, GAS_TERM_POWER, factor, 0, exponent);
    build->power[(size_t)place] += factor;
    return true;
}

bool gas_cp_add_power(struct gas_cp_build *build, double factor, double exponent, const struct gas_T_unit *unit)
{
    const double shift = -unit->offset; /* x = T/scale + shift */
    if (factor == 0)
        return true;
    if (shift == 0)
        return add_power_of_T(build, factor * pow(unit->scale, -exponent), exponent);
    if (exponent != floor(exponent) || exponent < 0)
        return gas_refuse(build->refusal, "cp",
                          "with T in %s only a polynomial can be used, and this has T to the power %s; give the "
                          "constants for T in K or °R.",
                          unit->text, gas_shown(exponent).text);
    double binomial = 1;
    for (double k = 0; k <= exponent; k++) { /* factor C(exponent, k) (T/scale)^k shift^(exponent - k) */
        if (!add_power_of_T(build, factor * binomial * pow(shift, exponent - k) * pow(unit->scale, -k), k))
            return false;
        binomial *= (exponent - k) / (k + 1);
    }
    return true;
}

bool gas_cp_finish(const struct gas_cp_build *build, double T_from, double T_to, struct gas_draft *draft,
                   struct gas_interval *interval)
{
    struct gas_term *term = gas_arena_take(draft->arena, build->terms, sizeof *term);
    if (!term)
        return gas_refuse_memory(draft->refusal);
    memcpy(term, build->term, build->terms * sizeof *term);
    *interval = (struct gas_interval){.T_from = T_from, .T_to = T_to, .term_count = build->terms, .term = term};
    memcpy(interval->power, build->power, sizeof interval->power);
    return true;
}

static bool is_word(struct gas_piece text, size_t i)
{
    return i < text.length && gas_ascii_letter(text.at[i]);
}

/* A C, F or R that stands alone or behind a degree sign or "deg": "J/mol-°C", "Btu/lb-F", "kJ/(kg degC)". */
static bool is_per_degree(struct gas_piece text)
{
    for (size_t i = 0; i < text.length; i++) {
        bool behind_deg = i >= 3 && memcmp(text.at + i - 3, "deg", 3) == 0;
        bool alone = (i == 0 || !is_word(text, i - 1)) && !is_word(text, i + 1);
        if (text.at[i] && strchr("CFR", text.at[i]) && (alone || behind_deg))
            return true;
        if (i + 3 <= text.length && (memcmp(text.at + i, "\u2103", 3) == 0 || memcmp(text.at + i, "\u2109", 3) == 0))
            return true;
    }
    return false;
}

static bool known_unit(struct gas_piece text, struct gas_cp_unit *unit, struct gas_unit_fault *fault)
{
    char folded[40];
    struct gas_unit parsed;
    *unit = (struct gas_cp_unit){.factor = 1};
    if (gas_listed(gas_fold(folded, sizeof folded, text), "r|1|cp/r|dimensionless|inr|perr|/r|unitsofr|none"))
        return unit->over_R = true;
    if (text.length == 1 && text.at[0] == '-')
        return unit->over_R = true;
    fault->status = GAS_UNIT_OK;
    if (!gas_unit_parse(text.at, text.length, NULL, &parsed, fault))
        return false;
    unit->factor = parsed.scale;
    unit->per_degree = is_per_degree(text);
    unit->per_mass = parsed.dimension == GAS_DIM_SPECIFIC_ENTROPY || parsed.dimension == GAS_DIM_SPECIFIC_ENERGY;
    unit->enthalpy = parsed.dimension == GAS_DIM_MOLAR_ENERGY || parsed.dimension == GAS_DIM_SPECIFIC_ENERGY;
    return unit->per_mass || unit->enthalpy || parsed.dimension == GAS_DIM_MOLAR_ENTROPY;
}

bool gas_cp_unit_known(struct gas_piece text, struct gas_cp_unit *unit)
{
    struct gas_unit_fault fault;
    return known_unit(gas_piece_trim(text), unit, &fault);
}

bool gas_cp_unit_read(struct gas_piece text, struct gas_cp_unit *unit, struct gas_refusal *refusal)
{
    char shown[60];
    struct gas_unit_fault fault;
    text = gas_piece_trim(text);
    if (known_unit(text, unit, &fault))
        return true;
    if (text.length > 1 && text.at[0] == 'T' && gas_ascii_digit(text.at[1]))
        return gas_refuse(refusal, "cp formula", "T%c is not known; write T^%c for a power.", text.at[1], text.at[1]);
    if (fault.status != GAS_UNIT_OK)
        return gas_refuse_unit(refusal, "cp unit", &fault);
    return gas_refuse(refusal, "cp unit",
                      "%s is not a unit of a heat capacity; write J/mol-K, kJ/kg-K, cal/mol-K or R.",
                      gas_quoted(shown, sizeof shown, text.at, text.length));
}

bool gas_cp_unit_factor(const struct gas_cp_unit *unit, double R, double molar_mass, double *factor,
                        struct gas_refusal *refusal)
{
    if (unit->per_mass && !isfinite(molar_mass))
        return gas_refuse(refusal, "gas card",
                          "cp is per mass, so the molar mass is needed; add a row M, such as 28.01 "
                          "g/mol.");
    *factor = unit->factor * (unit->over_R ? R : 1) * (unit->per_mass ? molar_mass : 1);
    return true;
}
