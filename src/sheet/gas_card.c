/* A gas card -> a gas. */
#include "sheet/gas_card.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include <gasleaf/heat.h>

#include "sheet/gas_rule.h"

#define WHAT "gas card"

/* Rows that only a card has: "name" may also head a mixture. */
static bool only_on_cards(enum gas_card_item item)
{
    return (item >= GAS_CARD_M && item <= GAS_CARD_RULE) || item == GAS_CARD_MOLE_PART || item == GAS_CARD_MASS_PART;
}

static const struct gas_species *species_in(const struct gas_cell *cell)
{
    return cell->kind == GAS_CELL_TEXT ? gas_name_find(cell->text, cell->length) : NULL;
}

/* "name | N2": of a card, unless further components stand beside it. */
static bool names_gas(const struct gas_block *block, size_t row, enum gas_card_item item)
{
    return (item == GAS_CARD_NAME || item == GAS_CARD_FORMULA || item == GAS_CARD_CAS) &&
           species_in(gas_cell_at(block, row, 1)) && !(block->columns > 2 && species_in(gas_cell_at(block, row, 2)));
}

bool gas_is_card(const struct gas_block *block)
{
    for (size_t row = 0; row < block->rows && block->columns > 1; row++) {
        const struct gas_cell *cell = gas_cell_at(block, row, 0);
        if (cell->kind != GAS_CELL_TEXT)
            continue;
        enum gas_card_item item = gas_card_label_read((struct gas_piece){cell->text, cell->length}).item;
        if (only_on_cards(item) || names_gas(block, row, item))
            return true;
    }
    return false;
}

/* The molar mass: of its row, of a specific R, of a gas known by the formula or the name. */
static bool settle_constants(const struct gas_card *card, struct gas_draft *draft, const struct gas_species *species)
{
    if (species)
        draft->gas.molar_mass = gas_species_molar_mass(species);
    return gas_constants_apply(draft, card->M, card->R, card->R_specific);
}

static void settle_units(struct gas_card *card, const struct gas_form *form)
{
    struct gas_cp_unit unit;
    if (card->cp_unit_said)
        return;
    card->cp_unit = (struct gas_cp_unit){.factor = 1, .over_R = form->over_R};
    if (card->unit_of_form.length && gas_cp_unit_known(card->unit_of_form, &unit)) {
        card->cp_unit = unit;
        return;
    }
    for (size_t i = 0; i < card->constants; i++)
        if (card->constant[i].unit.length && gas_cp_unit_known(card->constant[i].unit, &unit)) {
            card->cp_unit = unit;
            return;
        }
}

static bool read_level(const struct gas_card *card, const char *label, double figure, struct gas_piece unit_text,
                       double *T)
{
    struct gas_unit unit = card->T_unit.level;
    struct gas_unit_fault fault;
    if (unit_text.length && !gas_unit_parse(unit_text.at, unit_text.length, NULL, &unit, &fault))
        return gas_refuse_unit(card->refusal, label, &fault);
    if (unit.dimension != GAS_DIM_TEMPERATURE)
        return gas_refuse(card->refusal, WHAT, "%s has the unit %s, which is not one of temperature.", label,
                          unit.text);
    *T = gas_unit_to_si(&unit, figure, GAS_ATMOSPHERE);
    return gas_accept_level(card->refusal, label, figure, &unit, GAS_ATMOSPHERE);
}

/* From and to of one interval in K. */
static bool interval_range(const struct gas_card *card, size_t i, double *from, double *to)
{
    bool has_from = !isnan(card->from[i]), has_to = !isnan(card->to[i]);
    *from = 0;
    *to = INFINITY;
    if (card->range.length && card->intervals == 1 && !has_from && !has_to)
        return gas_T_range_read(card->range, &card->T_unit.level, from, to, card->refusal);
    if (card->range.length)
        return gas_refuse(card->refusal, WHAT, "give the range either as a row range or as rows from and to.");
    if (!has_from && !has_to && card->intervals == 1)
        return true;
    if (!has_from || !has_to)
        return gas_refuse(card->refusal, WHAT, "column %zu of its values has no \"%s\"; give both ends of the range.",
                          i + 1, has_from ? "to" : "from");
    if (!read_level(card, "from", card->from[i], card->from_unit, from) ||
        !read_level(card, "to", card->to[i], card->to_unit, to))
        return false;
    return *from < *to ||
           gas_refuse(card->refusal, WHAT,
                      "the range from %s to %s is reversed; write the lower temperature in the row from.",
                      gas_shown(card->from[i]).text, gas_shown(card->to[i]).text);
}

static bool build_powers(struct gas_form_case *form_case)
{
    const struct gas_power_letter *power = form_case->form->power;
    const struct gas_power_letter *missing = NULL;
    for (size_t i = 0; power[i].letter; i++) {
        const struct gas_constant *constant = gas_constant_find(form_case, power[i].letter, i);
        bool there = constant && !isnan(constant->value[form_case->interval]);
        if (there && missing && form_case->form->power[i].exponent > 0) /* a gap: C is there and B is not */
            return gas_refuse_constant(form_case, missing->letter);
        if (!there && !missing && power[i].exponent > 0)
            missing = &power[i];
        if (!gas_constant_power(form_case, &power[i], i))
            return false;
    }
    return true;
}

static bool build_interval(struct gas_card *card, const struct gas_form *form, size_t i, struct gas_draft *draft,
                           struct gas_interval *interval)
{
    double from, to;
    struct gas_form_case form_case = {.card = card,
                                      .form = form,
                                      .interval = i,
                                      .R = draft->gas.R,
                                      .molar_mass = draft->gas.molar_mass,
                                      .T_unit = card->T_unit,
                                      .build = {.refusal = card->refusal}};
    if (form->R_of_fit > 0 && !(card->R > 0))
        form_case.R = form->R_of_fit;
    if (card->R_of_fit > 0)
        form_case.R = card->R_of_fit;
    if (form->thousands && card->T_unit.scale < 100) { /* the form itself means thousands */
        form_case.T_unit.scale *= 1000;
        form_case.T_unit.offset /= 1000;
    }
    return (form->build ? form->build(&form_case) : build_powers(&form_case)) && interval_range(card, i, &from, &to) &&
           gas_cp_finish(&form_case.build, from, to, draft, interval);
}

static int by_from(const void *left, const void *right)
{
    const struct gas_interval *a = left, *b = right;
    return (a->T_from > b->T_from) - (a->T_from < b->T_from);
}

/* Old files print the hot interval first. */
static bool join_intervals(const struct gas_card *card, struct gas_interval *interval)
{
    qsort(interval, card->intervals, sizeof *interval, by_from);
    for (size_t i = 0; i + 1 < card->intervals; i++) {
        double gap = interval[i + 1].T_from - interval[i].T_to;
        if (fabs(gap) > 1e-6 * interval[i].T_to)
            return gas_refuse(card->refusal, WHAT,
                              "one interval ends at %s K and the next begins at %s K; they must meet.",
                              gas_shown(interval[i].T_to).text, gas_shown(interval[i + 1].T_from).text);
        interval[i + 1].T_from = interval[i].T_to;
    }
    return true;
}

static bool every_constant_is_used(const struct gas_card *card, const struct gas_form *form)
{
    for (size_t i = 0; i < card->constants; i++)
        if (!card->constant[i].used && !gas_listed(card->constant[i].label.constant, form->spare))
            return gas_refuse(card->refusal, WHAT, "constant %.20s does not belong to the form %s, which is %s.",
                              card->constant[i].label.letter, form->shown, form->equation);
    return true;
}

static bool refuse_form(const struct gas_card *card)
{
    char shown[60], list[300] = "";
    size_t count, used = 0;
    const struct gas_form *form = gas_forms(&count);
    for (size_t i = 0; i < count && used < sizeof list; i++)
        used += (size_t)snprintf(list + used, sizeof list - used, "%s%s", i ? ", " : "", form[i].shown);
    gas_quoted(shown, sizeof shown, card->form.at, card->form.length);
    if (card->form.length == 0)
        return gas_refuse(card->refusal, WHAT, "it has constants and no form; add a row form with one of: %s.", list);
    return gas_refuse(card->refusal, WHAT, "%s is not a form known; write one of: %s; or a formula.", shown, list);
}

static bool build_form(struct gas_card *card, struct gas_draft *draft)
{
    const struct gas_form *form = gas_form_find(card->form);
    struct gas_interval *interval = gas_arena_take(draft->arena, card->intervals, sizeof *interval);
    if (!interval)
        return gas_refuse_memory(draft->refusal);
    if (!form || card->form.length == 0)
        return refuse_form(card);
    settle_units(card, form);
    if (card->cp_unit.enthalpy && form->build != gas_form_find((struct gas_piece){"passutdanner", 12})->build)
        return gas_refuse(card->refusal, WHAT, "the cp unit is that of an energy; write it such as kJ/kg-K.");
    if (card->cp_unit.per_degree && !card->T_unit_said &&
        form->power != gas_form_find((struct gas_piece){"constant", 8})->power)
        return gas_refuse(card->refusal, WHAT,
                          "cp is per °C, °F or °R, so it is not certain what T is in the form; add a "
                          "row T unit with K, °C, °F or °R.");
    for (size_t i = 0; i < card->intervals; i++)
        if (!build_interval(card, form, i, draft, &interval[i]))
            return false;
    draft->gas.interval = interval;
    draft->gas.interval_count = card->intervals;
    draft->to_be_checked = true;
    return every_constant_is_used(card, form) && join_intervals(card, interval);
}

/* The rule that a row cp or k stands for, as text in the arena; NULL without memory. */
static const char *row_rule(const struct gas_card *card, struct gas_draft *draft)
{
    const struct gas_piece unit = card->cp_text_unit;
    size_t size = card->cp.length + unit.length + 80;
    char *text = gas_arena_take(draft->arena, size, 1);
    if (!text)
        return NULL;
    if (!isnan(card->k))
        snprintf(text, size, "k = %s", gas_shown_to(card->k, 17).text);
    else if (!isnan(card->cp_value))
        snprintf(text, size, "cp = %s %.*s", gas_shown_to(card->cp_value, 17).text, (int)unit.length, unit.at);
    else
        snprintf(text, size, "cp = %.*s %.*s", (int)card->cp.length, card->cp.at, (int)unit.length, unit.at);
    return text;
}

/* What the other rows of the card say for its cp: unit, unit of T, range. */
static bool complete_rules(const struct gas_card *card, struct gas_rules *rules)
{
    double from, to;
    if (!interval_range(card, 0, &from, &to))
        return false;
    if (rules->bare && card->cp_unit_said) {
        rules->unit = card->cp_unit;
        rules->bare = false;
    }
    if (!rules->range_said && isfinite(to)) {
        rules->range_said = true;
        rules->T_from = from;
        rules->T_to = to;
    }
    rules->T_said = rules->T_said && rules->source == GAS_CP_FROM_FORMULA;
    return true;
}

static bool build_row_cp(const struct gas_card *card, struct gas_draft *draft)
{
    struct gas_rules rules = {
        .refusal = draft->refusal, .T_unit = card->T_unit, .T_said = card->T_unit_said, .unit = {.factor = 1}};
    if (!isnan(card->k) && (!isnan(card->cp_value) || card->cp.length))
        return gas_refuse(card->refusal, WHAT, "it gives both cp and k; keep one.");
    const char *text = row_rule(card, draft);
    if (!text)
        return gas_refuse_memory(draft->refusal);
    return gas_rules_read(&rules, (struct gas_piece){text, strlen(text)}) && complete_rules(card, &rules) &&
           gas_rules_apply(&rules, draft);
}

static bool has_row_cp(const struct gas_card *card)
{
    return !isnan(card->cp_value) || card->cp.length || !isnan(card->k);
}

static bool has_own_heat(const struct gas_card *card)
{
    return has_row_cp(card) || card->constants || card->form.length;
}

static bool build_heat(struct gas_card *card, struct gas_draft *draft, const struct gas_species *species)
{
    const bool row_cp = has_row_cp(card);
    const struct gas_form *form = gas_form_find(card->form);
    if (row_cp && (card->constants || (card->form.length && !(form && strcmp(form->shown, "constant") == 0))))
        return gas_refuse(card->refusal, WHAT,
                          "it gives cp in two ways; keep the row cp or the form with its constants.");
    if (row_cp)
        return build_row_cp(card, draft);
    if (card->constants || card->form.length)
        return build_form(card, draft);
    if (species) {
        draft->gas.interval = species->interval;
        draft->gas.interval_count = species->interval_count;
        gas_draft_source(draft, species);
    }
    return true;
}

static const char *copy_piece(struct gas_draft *draft, struct gas_piece piece, const char *otherwise)
{
    const char *copy = piece.length ? gas_arena_copy(draft->arena, piece.at, piece.length) : otherwise;
    if (!copy)
        gas_refuse_memory(draft->refusal);
    return copy ? copy : "";
}

static bool set_part(struct gas_draft *draft, const struct gas_species *species)
{
    struct gas_part *part = gas_arena_take(draft->arena, 1, sizeof *part);
    if (!part)
        return gas_refuse_memory(draft->refusal);
    *part = (struct gas_part){species, draft->label, 1, draft->gas.molar_mass};
    draft->part = part;
    draft->part_count = 1;
    return true;
}

static const struct gas_species *find(struct gas_piece name)
{
    return name.length ? gas_name_find(name.at, name.length) : NULL;
}

/* The gas of the tables that the card speaks of, if any. The name goes before the formula, which isomers share. */
static bool species_of(const struct gas_card *card, const struct gas_species **species)
{
    const struct gas_species *by_cas = find(card->cas), *by_name = find(card->name), *by_formula = find(card->formula);
    *species = by_cas ? by_cas : by_name ? by_name : by_formula;
    const struct gas_species *first = *species;
    bool one = (!by_name || strcmp(first->formula, by_name->formula) == 0) &&
               (!by_formula || strcmp(first->formula, by_formula->formula) == 0);
    return one || gas_refuse(card->refusal, WHAT,
                             "its rows name, formula and CAS number speak of %s and %s; correct one of them.",
                             first->name, by_formula ? by_formula->name : by_name->name);
}

/* A print of GAS.CARD shows cp at one temperature: it has to be that of the gas which the card describes. */
static bool agrees_with_print(const struct gas_card *card, const struct gas_draft *draft)
{
    struct gas_cp_unit unit = {.factor = 1};
    double factor;
    struct gas_result cp = gas_cp(&draft->gas, 298.15);
    if (isnan(card->cp_at_25))
        return true;
    if (draft->gas.interval_count == 0)
        return gas_refuse(card->refusal, WHAT,
                          "it shows cp at 25 °C, but not the constants behind it; use the card that has them, or write "
                          "the label cp for a constant.");
    if ((card->cp_at_25_unit.length && !gas_cp_unit_read(card->cp_at_25_unit, &unit, card->refusal)) ||
        !gas_cp_unit_factor(&unit, draft->gas.R, draft->gas.molar_mass, &factor, card->refusal))
        return false;
    if (cp.status || fabs(factor * card->cp_at_25 - cp.value) <= 0.01 * cp.value)
        return true;
    return gas_refuse(card->refusal, WHAT,
                      "cp at 25 °C is %s J/(mol K) on it, while its heat capacity gives %s; write the label cp for a "
                      "constant, or delete the row.",
                      gas_shown_to(factor * card->cp_at_25, 5).text, gas_shown_to(cp.value, 5).text);
}

/* The composition on the card, by mole where both bases are printed. */
static bool build_mixture(struct gas_card *card, struct gas_draft *draft)
{
    struct gas_recipe *recipe = card->by_mole.count ? &card->by_mole : &card->by_mass;
    return recipe->count == 0 || gas_recipe_finish(recipe, draft);
}

static bool build_card(struct gas_draft *draft, struct gas_card *card)
{
    const struct gas_species *species = NULL;
    if (!build_mixture(card, draft) || (draft->part_count == 0 && !species_of(card, &species)))
        return false;
    if (card->name.length || draft->part_count == 0)
        draft->label = copy_piece(draft, card->name.length ? card->name : card->formula, "the gas of the card");
    if (has_own_heat(card))
        draft->source = copy_piece(draft, card->source, "as given on the gas card"), draft->source_key = "";
    return settle_constants(card, draft, species) && build_heat(card, draft, species) &&
           (draft->part_count > 0 || set_part(draft, has_own_heat(card) ? NULL : species));
}

static bool read_card(struct gas_draft *draft, struct gas_card *card, const struct gas_block *block)
{
    if (!gas_card_read(card, block) || !build_card(draft, card))
        return false;
    if (!(draft->gas.molar_mass > 0))
        return gas_refuse(draft->refusal, WHAT, "the molar mass is missing; add a row M, such as 28.01 g/mol.");
    return (card->rule.length == 0 || gas_draft_rules(draft, card->rule)) && agrees_with_print(card, draft);
}

bool gas_draft_card(struct gas_draft *draft, const struct gas_block *block)
{
    struct gas_card *card = calloc(1, sizeof *card); /* not in the arena: it is not needed once the gas is made */
    if (!card)
        return gas_refuse_memory(draft->refusal);
    card->refusal = draft->refusal;
    bool good = read_card(draft, card, block);
    free(card);
    return good;
}
