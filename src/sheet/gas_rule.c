/*
 * What stands after '|': a heat capacity to be used in place of the gas's own, or another R or M.
 *
 * A universal R (per mole) replays an old constant. A specific R (per mass) sets the molar mass, so that R/M is what
 * was written while R stays exact: amounts, masses and volumes then agree with the sheet that used it. Given together
 * with M it sets R instead, since all three cannot hold.
 */
#include "sheet/gas_rule.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#include "sheet/ascii.h"

#define WHAT "gas rule"

static bool once(struct gas_rules *rules, bool *said, const char *name)
{
    if (*said)
        return gas_refuse(rules->refusal, WHAT, "%s is given twice; keep one.", name);
    return *said = true;
}

static bool one_cp(struct gas_rules *rules, enum gas_cp_source source)
{
    if (rules->source)
        return gas_refuse(rules->refusal, WHAT, "cp is given in two ways; keep one of cp, cv and k.");
    rules->source = source;
    return true;
}

/* A figure with its unit and nothing behind; bare: *unit is of dimension NUMBER with empty text. */
static bool read_figure(struct gas_rules *rules, const char *name, struct gas_piece text, double *figure,
                        struct gas_unit *unit)
{
    size_t used;
    struct gas_unit_fault fault;
    char shown[80];
    if (text.length == 0)
        return gas_refuse(rules->refusal, WHAT,
                          "a figure is missing behind \"%s\"; give one, such as | k = 1.4 or "
                          "| cp at 25 °C.",
                          name);
    if (!gas_number_parse(text.at, text.length, figure, &used))
        return gas_refuse(rules->refusal, WHAT, "%s = %s is not a number with a unit.", name,
                          gas_quoted(shown, sizeof shown, text.at, text.length));
    *unit = gas_unit_si(GAS_DIM_NUMBER);
    unit->text[0] = '\0';
    if (used == text.length || gas_unit_parse(text.at + used, text.length - used, NULL, unit, &fault))
        return true;
    return gas_refuse_unit(rules->refusal, WHAT, &fault);
}

static bool read_k(struct gas_rules *rules, struct gas_piece text)
{
    struct gas_unit unit = {0};
    if (!one_cp(rules, GAS_CP_FROM_K) || !read_figure(rules, "k", text, &rules->k, &unit))
        return false;
    if (unit.text[0])
        return gas_refuse(rules->refusal, WHAT, "k is a ratio and has no unit.");
    if (!(rules->k > 1 && rules->k <= 2))
        return gas_refuse(rules->refusal, WHAT,
                          "k = %s is no ratio cp/cv of a gas; those lie above 1 and at most at 5/3.",
                          gas_shown(rules->k).text);
    return true;
}

static bool read_M(struct gas_rules *rules, struct gas_piece text)
{
    struct gas_unit unit = {0};
    double M = NAN;
    if (!once(rules, &rules->M_said, "M") || !read_figure(rules, "M", text, &M, &unit))
        return false;
    return gas_molar_mass_read(M, &unit, &rules->M, rules->refusal);
}

bool gas_molar_mass_read(double figure, const struct gas_unit *unit, double *M, struct gas_refusal *refusal)
{
    char shown[80];
    gas_figure(shown, sizeof shown, figure, unit);
    if (unit->text[0] && unit->dimension != GAS_DIM_MOLAR_MASS)
        return gas_refuse(refusal, "M", "%s is not a molar mass; write it such as 28.97 kg/kmol.", shown);
    /* Printed without a unit it is the relative molar mass; in kg/mol no gas reaches 1. */
    *M = figure * (unit->text[0] ? unit->scale : figure >= 1 ? 1e-3 : 1);
    if (!(*M >= 0.9e-3 && *M <= 1))
        return gas_refuse(refusal, "M", "%s is no molar mass of a gas; write it such as 28.97 kg/kmol.", shown);
    return true;
}

static bool read_R(struct gas_rules *rules, struct gas_piece text)
{
    struct gas_unit unit = {0};
    double figure = NAN;
    return once(rules, &rules->R_said, "R") && read_figure(rules, "R", text, &figure, &unit) &&
           gas_constant_read(figure, &unit, &rules->R, &rules->R_specific, rules->refusal);
}

bool gas_constant_read(double figure, const struct gas_unit *unit, double *universal, double *specific,
                       struct gas_refusal *refusal)
{
    char shown[80];
    double R = figure * (unit->text[0] ? unit->scale : 1);
    gas_figure(shown, sizeof shown, figure, unit);
    if (unit->text[0] && unit->dimension == GAS_DIM_SPECIFIC_ENTROPY) {
        if (!(R > 5 && R < 1e4))
            return gas_refuse(refusal, "R", "%s is no gas constant of a gas; check figure and unit.", shown);
        *specific = R;
        return true;
    }
    if (unit->text[0] && unit->dimension != GAS_DIM_MOLAR_ENTROPY)
        return gas_refuse(refusal, "R", "%s is not a gas constant; write it such as 8.314 J/mol-K or 0.287 kJ/kg-K.",
                          shown);
    if (!(fabs(R - GAS_R) <= GAS_R_TOLERANCE * GAS_R))
        return gas_refuse(refusal, "R", "%s is more than 1 %% away from 8.31446 J/(mol K); check figure and unit%s.",
                          shown, unit->text[0] ? "" : ", such as J/mol-K or kJ/kg-K");
    *universal = R;
    return true;
}

/* The unit behind a formula, in brackets or not; a range may follow: "J/mol-K, from 298 to 2000 K". */
static bool read_formula_unit(struct gas_rules *rules, struct gas_piece text)
{
    for (size_t i = 0; i + 1 < text.length; i++) {
        struct gas_piece tail = {text.at + i, text.length - i};
        bool apart = i == 0 || text.at[i - 1] == ' ';
        bool range = (text.at[i] == '(' && gas_ascii_digit(text.at[i + 1])) ||
                     (apart && (gas_ascii_digit(text.at[i]) || gas_piece_take(&tail, "from")));
        if (!range)
            continue;
        tail = (struct gas_piece){text.at + i, text.length - i};
        if (tail.at[0] == '(' && tail.at[tail.length - 1] == ')')
            tail = (struct gas_piece){tail.at + 1, tail.length - 2};
        if (!gas_rules_range(rules, tail))
            return false;
        text = gas_piece_front(text, i);
        break;
    }
    if (text.length > 2 && strchr("([", text.at[0]) && strchr(")]", text.at[text.length - 1]))
        text = gas_piece_trim((struct gas_piece){text.at + 1, text.length - 2});
    rules->bare = text.length == 0;
    return rules->bare || gas_cp_unit_read(text, &rules->unit, rules->refusal);
}

static bool read_cp(struct gas_rules *rules, enum gas_cp_source source, struct gas_piece text)
{
    size_t used;
    if (!one_cp(rules, source) || !gas_expression_read(text, NULL, 0, &rules->sum, &used, rules->refusal))
        return false;
    return read_formula_unit(rules, (struct gas_piece){text.at + used, text.length - used});
}

static bool read_cp_over_R(struct gas_rules *rules, struct gas_piece text)
{
    if (!read_cp(rules, GAS_CP_FROM_FORMULA, text))
        return false;
    if (!rules->bare)
        return gas_refuse(rules->refusal, WHAT, "cp/R is a plain number; leave the unit out.");
    rules->unit = (struct gas_cp_unit){.factor = 1, .over_R = true};
    rules->bare = false;
    return true;
}

static bool read_mode(struct gas_rules *rules, enum gas_cp_mode mode)
{
    if (rules->mode)
        return gas_refuse(rules->refusal, WHAT, "cp is given at two temperatures; keep one.");
    rules->mode = mode;
    return true;
}

static bool read_cp_at(struct gas_rules *rules, struct gas_piece text)
{
    if (!read_mode(rules, GAS_MODE_AT) || !read_figure(rules, "cp at", text, &rules->T_at, &rules->T_at_unit))
        return false;
    if (!rules->T_at_unit.text[0])
        rules->T_at_unit = gas_unit_si(GAS_DIM_TEMPERATURE);
    if (rules->T_at_unit.dimension != GAS_DIM_TEMPERATURE)
        return gas_refuse(rules->refusal, WHAT, "cp is asked at %s, which is not a temperature.",
                          gas_dimension_words(rules->T_at_unit.dimension));
    return gas_accept_level(rules->refusal, "cp at", rules->T_at, &rules->T_at_unit, GAS_ATMOSPHERE);
}

static bool refuse_rule(struct gas_rules *rules, struct gas_piece text)
{
    char shown[80];
    return gas_refuse(rules->refusal, WHAT,
                      "%s is not known; write one such as cp = 1.04 kJ/kg-K, k = 1.4, cp at 25 °C, cp mean, cp at mean "
                      "T, R = 8.314 J/mol-K, M = 28.97 kg/kmol, or a range such as 298 to 2000 K.",
                      gas_quoted(shown, sizeof shown, text.at, text.length));
}

static bool begins_with_figure(struct gas_piece text)
{
    double figure;
    size_t used;
    return gas_number_parse(text.at, text.length, &figure, &used);
}

static bool take_any(struct gas_piece *text, const char *const *words)
{
    for (; *words; words++)
        if (gas_piece_take(text, *words))
            return true;
    return false;
}

static bool read_rule(struct gas_rules *rules, struct gas_piece text)
{
    static const char *const at_mean[] = {"cp at mean temperature", "cp at the mean temperature", "cp at mean t", NULL};
    static const char *const mean[] = {"cp mean", "mean cp", "cp average", "average cp", NULL};
    static const char *const ratio[] = {"k", "gamma", "kappa", "γ", "κ", "cp/cv", NULL};
    static const char *const molar_mass[] = {"m", "mw", "molar mass", NULL};
    struct gas_piece rest = text;
    if (take_any(&rest, at_mean))
        return rest.length ? refuse_rule(rules, text) : read_mode(rules, GAS_MODE_AT_MEAN);
    if (take_any(&rest, mean))
        return rest.length ? refuse_rule(rules, text) : read_mode(rules, GAS_MODE_MEAN);
    if (gas_piece_take(&rest, "cp at"))
        return read_cp_at(rules, rest);
    if (take_any(&rest, ratio))
        return read_k(rules, rest);
    if (gas_piece_take(&rest, "cp/r"))
        return read_cp_over_R(rules, rest);
    if (gas_piece_take(&rest, "cp(t)") || gas_piece_take(&rest, "cp"))
        return read_cp(rules, GAS_CP_FROM_FORMULA, rest);
    if (gas_piece_take(&rest, "cv(t)") || gas_piece_take(&rest, "cv"))
        return read_cp(rules, GAS_CP_FROM_CV, rest);
    if (take_any(&rest, molar_mass))
        return read_M(rules, rest);
    if (gas_piece_take(&rest, "r"))
        return read_R(rules, rest);
    if (gas_piece_take(&rest, "t in"))
        return once(rules, &rules->T_said, "the unit of T") && gas_T_unit_read(rest, &rules->T_unit, rules->refusal);
    if (gas_piece_take(&rest, "from") || gas_piece_take(&rest, "t") || begins_with_figure(text))
        return gas_rules_range(rules, text);
    return refuse_rule(rules, text);
}

/* Rules end at ';', '|', a line break, and at a comma that is not inside a number. */
static bool ends_rule(struct gas_piece text, size_t i)
{
    if (text.at[i] && strchr(";|\r\n", text.at[i]))
        return true;
    if (text.at[i] != ',')
        return false;
    bool inside = i > 0 && i + 1 < text.length && gas_ascii_digit(text.at[i - 1]) && gas_ascii_digit(text.at[i + 1]);
    return !inside;
}

bool gas_rules_read(struct gas_rules *rules, struct gas_piece text)
{
    size_t from = 0, count = 0;
    for (size_t i = 0; i <= text.length; i++) {
        if (i < text.length && !ends_rule(text, i))
            continue;
        struct gas_piece rule = gas_piece_trim((struct gas_piece){text.at + from, i - from});
        from = i + 1;
        if (rule.length == 0)
            continue;
        count++;
        if (!read_rule(rules, rule))
            return false;
    }
    return count
               ? true
               : gas_refuse(rules->refusal, WHAT, "nothing stands after '|'; write a rule such as cp = 1.04 kJ/kg-K.");
}

bool gas_draft_rules(struct gas_draft *draft, struct gas_piece text)
{
    struct gas_rules rules = {.refusal = draft->refusal, .T_unit = gas_T_kelvin, .unit = {.factor = 1}};
    text = gas_piece_trim(text);
    if (!gas_rules_read(&rules, text) || !gas_rules_apply(&rules, draft))
        return false;
    const char *copy = gas_arena_copy(draft->arena, text.at, text.length);
    if (!copy)
        return gas_refuse_memory(draft->refusal);
    draft->rule = copy;
    if (rules.source)
        draft->source = "as given with the gas", draft->source_key = "";
    return true;
}
