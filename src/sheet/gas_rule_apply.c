/* Rules that were read, put into force on a gas; and the temperature range of a rule. */
#include "sheet/gas_rule.h"

#include <math.h>
#include <string.h>

#include <gasleaf/heat.h>

#define WHAT "gas rule"

/* The least cp of any gas, 5/2 R, is about 20.8 J/(mol K): a bare figure below it has lost its unit. */
#define LEAST_BARE_CP 20.0

/* Where "to", a dash or dots part the two ends of a range; *bytes long. 0: nowhere. */
static size_t parting(struct gas_piece text, size_t from, size_t *bytes)
{
    static const char *const marks[] = {" to ", "...", "..", "\u2026", "\u2013", "-"};
    for (size_t i = from; i < text.length; i++)
        for (size_t k = 0; k < sizeof marks / sizeof *marks; k++) {
            *bytes = strlen(marks[k]);
            if (i + *bytes <= text.length && memcmp(text.at + i, marks[k], *bytes) == 0)
                return i;
        }
    return 0;
}

static bool read_level(struct gas_piece text, const struct gas_unit *other, double *T, struct gas_unit *unit,
                       struct gas_refusal *refusal)
{
    char shown[80];
    size_t used;
    double figure;
    struct gas_unit_fault fault;
    text = gas_piece_trim(text);
    if (!gas_number_parse(text.at, text.length, &figure, &used))
        return gas_refuse(refusal, "range", "%s is not a temperature; write a range such as 298 to 2000 K.",
                          gas_quoted(shown, sizeof shown, text.at, text.length));
    *unit = *other;
    if (used < text.length && !gas_unit_parse(text.at + used, text.length - used, NULL, unit, &fault))
        return gas_refuse_unit(refusal, "range", &fault);
    if (unit->dimension != GAS_DIM_TEMPERATURE)
        return gas_refuse(refusal, "range", "%s is not a unit of temperature; write a range such as 298 to 2000 K.",
                          unit->text);
    *T = gas_unit_to_si(unit, figure, GAS_ATMOSPHERE);
    return gas_accept_level(refusal, "range", figure, unit, GAS_ATMOSPHERE);
}

bool gas_T_range_read(struct gas_piece text, const struct gas_unit *bare, double *T_from, double *T_to,
                      struct gas_refusal *refusal)
{
    struct gas_unit upper, lower;
    char shown[80];
    double figure;
    size_t used = 0, bytes, part;
    gas_piece_take(&text, "from");
    gas_piece_take(&text, "t");
    gas_piece_take(&text, "from");
    gas_number_parse(text.at, text.length, &figure, &used);
    part = parting(text, used && text.at[used - 1] == ' ' ? used - 1 : used, &bytes);
    if (!used || !part)
        return gas_refuse(refusal, "range", "%s is not a range of temperatures; write one such as 298 to 2000 K.",
                          gas_quoted(shown, sizeof shown, text.at, text.length));
    if (!read_level((struct gas_piece){text.at + part + bytes, text.length - part - bytes}, bare, T_to, &upper,
                    refusal) ||
        !read_level((struct gas_piece){text.at, part}, &upper, T_from, &lower, refusal))
        return false;
    if (*T_from >= *T_to)
        return gas_refuse(refusal, "range", "%s runs from high to low; write the lower temperature first.",
                          gas_quoted(shown, sizeof shown, text.at, text.length));
    return true;
}

bool gas_rules_range(struct gas_rules *rules, struct gas_piece text)
{
    if (rules->range_said)
        return gas_refuse(rules->refusal, WHAT, "two ranges are given; keep one.");
    rules->range_said = true;
    const struct gas_unit kelvin = gas_unit_si(GAS_DIM_TEMPERATURE);
    return gas_T_range_read(text, &kelvin, &rules->T_from, &rules->T_to, rules->refusal);
}

bool gas_constants_apply(struct gas_draft *draft, double M, double universal, double specific)
{
    if (universal > 0)
        draft->gas.R = universal;
    if (M > 0)
        draft->gas.molar_mass = M;
    if (!(specific > 0))
        return true;
    if (!(M > 0)) {
        draft->gas.molar_mass = draft->gas.R / specific;
        return true;
    }
    draft->gas.R = specific * M;
    if (fabs(draft->gas.R - GAS_R) <= 1e-12 * GAS_R) /* R/M as GAS.CARD prints it */
        draft->gas.R = GAS_R;
    if (fabs(draft->gas.R - GAS_R) > GAS_R_TOLERANCE * GAS_R)
        return gas_refuse(draft->refusal, "R",
                          "R and M together give %s J/(mol K), more than 1 %% away from 8.31446 J/(mol K); "
                          "correct one of them.",
                          gas_shown_to(draft->gas.R, 5).text);
    return true;
}

static bool set_interval(struct gas_draft *draft, const struct gas_cp_build *build, const struct gas_rules *rules)
{
    struct gas_interval *interval = gas_arena_take(draft->arena, 1, sizeof *interval);
    double from = rules->range_said ? rules->T_from : 0, to = rules->range_said ? rules->T_to : INFINITY;
    if (!interval)
        return gas_refuse_memory(draft->refusal);
    if (!gas_cp_finish(build, from, to, draft, interval))
        return false;
    draft->gas.interval = interval;
    draft->gas.interval_count = 1;
    draft->to_be_checked = true;
    return true;
}

static bool set_constant(struct gas_draft *draft, double cp, const struct gas_rules *rules)
{
    struct gas_cp_build build = {.refusal = draft->refusal};
    return gas_cp_add_power(&build, cp, 0, &gas_T_kelvin) && set_interval(draft, &build, rules);
}

static bool is_constant(const struct gas_sum *sum)
{
    return sum->count == 1 && sum->term[0].exponent == 0;
}

static bool accept_formula(const struct gas_rules *rules)
{
    if (rules->unit.enthalpy)
        return gas_refuse(rules->refusal, WHAT, "cp has the unit of an energy; write it such as kJ/kg-K.");
    if (rules->bare && is_constant(&rules->sum) && rules->sum.term[0].factor < LEAST_BARE_CP)
        return gas_refuse(rules->refusal, WHAT,
                          "cp = %s without a unit would be J/(mol K), less than any gas has; give the unit, such as "
                          "kJ/kg-K.",
                          gas_shown(rules->sum.term[0].factor).text);
    if (rules->unit.per_degree && !rules->T_said && !is_constant(&rules->sum))
        return gas_refuse(
            rules->refusal, WHAT,
            "cp is per °C, °F or °R, so it is not certain what T is in the formula; add \"T in °C\" or \"T in "
            "K\".");
    return true;
}

static bool set_formula(struct gas_draft *draft, const struct gas_rules *rules)
{
    struct gas_cp_build build = {.refusal = draft->refusal};
    double factor;
    if (!accept_formula(rules) ||
        !gas_cp_unit_factor(&rules->unit, draft->gas.R, draft->gas.molar_mass, &factor, draft->refusal))
        return false;
    for (size_t i = 0; i < rules->sum.count; i++)
        if (!gas_cp_add_power(&build, factor * rules->sum.term[i].factor, rules->sum.term[i].exponent, &rules->T_unit))
            return false;
    if (rules->source == GAS_CP_FROM_CV && !gas_cp_add_power(&build, draft->gas.R, 0, &gas_T_kelvin))
        return false;
    return set_interval(draft, &build, rules);
}

static bool set_cp_at(struct gas_draft *draft, const struct gas_rules *rules)
{
    double T = gas_unit_to_si(&rules->T_at_unit, rules->T_at, GAS_ATMOSPHERE);
    struct gas_result cp = gas_cp(&draft->gas, T);
    struct gas_range range = gas_range_of(&draft->gas);
    static const struct gas_rules unbounded = {0};
    if (cp.status == GAS_OUTSIDE_DATA)
        return gas_refuse_temperature(draft->refusal, "cp at", T, &rules->T_at_unit, draft->label, range.T_from,
                                      range.T_to);
    if (cp.status != GAS_OK)
        return gas_refuse(draft->refusal, WHAT, "cp of %s %s.", draft->label, gas_status_words(cp.status));
    return set_constant(draft, cp.value, rules->range_said && !rules->source ? rules : &unbounded);
}

static bool set_source(struct gas_draft *draft, const struct gas_rules *rules)
{
    if (rules->source == GAS_CP_FROM_K)
        return set_constant(draft, draft->gas.R * rules->k / (rules->k - 1), rules);
    return rules->source == GAS_CP_OF_THE_GAS || set_formula(draft, rules);
}

bool gas_rules_apply(const struct gas_rules *rules, struct gas_draft *draft)
{
    if (!gas_constants_apply(draft, rules->M, rules->R, rules->R_specific) || !set_source(draft, rules))
        return false;
    if (rules->source != GAS_CP_FROM_FORMULA && rules->source != GAS_CP_FROM_CV && rules->T_said)
        return gas_refuse(draft->refusal, WHAT, "\"T in\" belongs to a formula for cp, and there is none.");
    if (rules->range_said && !rules->source && rules->mode != GAS_MODE_AT)
        return gas_refuse(draft->refusal, WHAT, "a range belongs to a given cp; %s has its own.", draft->label);
    if (rules->mode == GAS_MODE_AT)
        return gas_draft_check(draft) && set_cp_at(draft, rules);
    if (rules->mode == GAS_MODE_MEAN)
        draft->gas.rule = GAS_CP_MEAN_OF_ENDS;
    if (rules->mode == GAS_MODE_AT_MEAN)
        draft->gas.rule = GAS_CP_AT_MEAN;
    return true;
}
