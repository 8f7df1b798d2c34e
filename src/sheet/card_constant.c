/* The constants of a card by their letters, in SI. */
#include "sheet/gas_card.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#include "sheet/ascii.h"

#define WHAT "gas card"

static struct gas_constant *by_name(struct gas_card *card, const char *name)
{
    for (size_t i = 0; i < card->constants; i++)
        if (strcmp(card->constant[i].label.constant, name) == 0)
            return &card->constant[i];
    return NULL;
}

struct gas_constant *gas_constant_find(const struct gas_form_case *form_case, const char *letter, size_t index)
{
    struct gas_card *card = form_case->card;
    struct gas_constant *found = by_name(card, letter);
    char name[16];
    if (found || letter[1]) /* a1 is a1: only single letters go by other names */
        return found;
    snprintf(name, sizeof name, "c%zu", index + 1);
    if ((found = by_name(card, name)))
        return found;
    snprintf(name, sizeof name, "a%zu", by_name(card, "a0") ? index : index + 1);
    return by_name(card, name);
}

bool gas_refuse_constant(const struct gas_form_case *form_case, const char *letter)
{
    char shown[16];
    const struct gas_form *form = form_case->form;
    snprintf(shown, sizeof shown, "%s", letter);
    if (!letter[1])
        shown[0] = gas_ascii_upper(letter[0]);
    if (form_case->card->intervals > 1)
        return gas_refuse(form_case->card->refusal, WHAT, "constant %s is missing in interval %zu; the form %s is %s.",
                          shown, form_case->interval + 1, form->shown, form->equation);
    return gas_refuse(form_case->card->refusal, WHAT,
                      "constant %s is missing; the form %s is %s. Write 0 where it has none.", shown, form->shown,
                      form->equation);
}

/* The constant with a value in this interval; NULL, refused when it is needed. */
static struct gas_constant *look_up(struct gas_form_case *form_case, const char *letter, size_t index, bool needed)
{
    struct gas_constant *constant = gas_constant_find(form_case, letter, index);
    if (constant && !isnan(constant->value[form_case->interval])) {
        constant->used = true;
        return constant;
    }
    if (needed)
        gas_refuse_constant(form_case, letter);
    return NULL;
}

static bool refuse_unit(const struct gas_form_case *form_case, const struct gas_constant *constant,
                        const char *expected)
{
    char shown[60];
    gas_quoted(shown, sizeof shown, constant->unit.at, constant->unit.length);
    return gas_refuse(form_case->card->refusal, WHAT, "constant %.20s has the unit %s, where %s is expected.",
                      constant->label.letter, shown, expected);
}

bool gas_constant_number(struct gas_form_case *form_case, const char *letter, size_t index, bool needed, double *value)
{
    const struct gas_constant *constant = look_up(form_case, letter, index, needed);
    *value = constant ? constant->value[form_case->interval] : 0;
    if (constant && constant->unit.length && !(constant->unit.length == 1 && strchr("-1", constant->unit.at[0])))
        return refuse_unit(form_case, constant, "none");
    return constant || !needed;
}

static bool cp_factor(const struct gas_form_case *form_case, const struct gas_cp_unit *unit, double *factor)
{
    return gas_cp_unit_factor(unit, form_case->R, form_case->molar_mass, factor, form_case->card->refusal);
}

bool gas_constant_cp(struct gas_form_case *form_case, const char *letter, size_t index, bool needed, double *J_mol_K)
{
    const struct gas_constant *constant = look_up(form_case, letter, index, needed);
    struct gas_cp_unit unit = form_case->card->cp_unit;
    double factor;
    *J_mol_K = 0;
    if (!constant)
        return !needed;
    if (constant->unit.length && (!gas_cp_unit_known(constant->unit, &unit) || unit.enthalpy))
        return refuse_unit(form_case, constant, "that of a heat capacity");
    if (!cp_factor(form_case, &unit, &factor))
        return false;
    *J_mol_K = factor * constant->value[form_case->interval];
    return true;
}

bool gas_constant_K(struct gas_form_case *form_case, const char *letter, size_t index, bool needed, double *kelvin)
{
    const struct gas_constant *constant = look_up(form_case, letter, index, needed);
    struct gas_T_unit T_unit = form_case->T_unit;
    *kelvin = 0;
    if (!constant)
        return !needed;
    if (constant->unit.length && !gas_T_unit_read(constant->unit, &T_unit, form_case->card->refusal))
        return false;
    if (T_unit.offset != 0)
        return gas_refuse(form_case->card->refusal, WHAT,
                          "%s needs T in K or °R, not in %s; give the constants for one of them.",
                          form_case->form->shown, T_unit.text);
    *kelvin = T_unit.scale * constant->value[form_case->interval];
    return true;
}

/* A coefficient with a unit of its own, such as J/(mol K2) for B: its figure is for T in K, whatever the card says. */
static bool add_with_own_unit(struct gas_form_case *form_case, const struct gas_constant *constant, double exponent)
{
    struct gas_unit unit;
    struct gas_unit_fault fault;
    const double K = -1 - exponent;
    if (!gas_unit_parse(constant->unit.at, constant->unit.length, NULL, &unit, &fault))
        return gas_refuse_unit(form_case->card->refusal, constant->label.letter, &fault);
    const signed char *power = unit.power;
    bool energy = power[1] == 2 && power[2] == -2 && power[3] == K;
    bool molar = energy && power[0] == 1 && power[4] == -1, specific = energy && power[0] == 0 && power[4] == 0;
    bool over_R = power[0] == 0 && power[1] == 0 && power[2] == 0 && power[3] == -exponent && power[4] == 0;
    double factor;
    if (!molar && !specific && !over_R)
        return refuse_unit(form_case, constant, "that of cp divided by its power of T");
    struct gas_cp_unit cp_unit = {.factor = unit.scale, .per_mass = specific, .over_R = over_R && !molar && !specific};
    struct gas_T_unit T_unit = form_case->T_unit;
    T_unit.offset *= T_unit.scale;
    T_unit.scale = 1;
    return cp_factor(form_case, &cp_unit, &factor) &&
           gas_cp_add_power(&form_case->build, factor * constant->value[form_case->interval], exponent, &T_unit);
}

bool gas_constant_power(struct gas_form_case *form_case, const struct gas_power_letter *power, size_t index)
{
    const struct gas_constant *constant = look_up(form_case, power->letter, index, power->needed);
    struct gas_cp_unit unit = form_case->card->cp_unit;
    double factor;
    if (!constant)
        return !power->needed;
    if (constant->unit.length && !gas_cp_unit_known(constant->unit, &unit))
        return add_with_own_unit(form_case, constant, power->exponent);
    if (unit.enthalpy)
        return refuse_unit(form_case, constant, "that of a heat capacity");
    return cp_factor(form_case, &unit, &factor) &&
           gas_cp_add_power(&form_case->build, factor * constant->value[form_case->interval], power->exponent,
                            &form_case->T_unit);
}
