/* The gases themselves: CARD, what is known of one, with its sources; LIST, the ones known by name. */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "sheet/functions.h"
#include "sheet/gas_draft.h"
#include "sheet/gas_facts.h"

static void put_row(struct gas_call *call, size_t row, const char *label, double figure, const char *unit,
                    const char *source)
{
    gas_put_text(call, row, 0, label);
    gas_put_number(call, row, 1, figure);
    gas_put_text(call, row, 2, unit);
    gas_put_text(call, row, 3, source);
}

/* A text beside its label; a long one stands in the last column, where it has room. */
static void put_text_row(struct gas_call *call, size_t row, const char *label, const char *text, const char *wide)
{
    gas_put_text(call, row, 0, label);
    gas_put_text(call, row, 1, text);
    gas_put_text(call, row, 2, "");
    gas_put_text(call, row, 3, wide);
}

static double mass_fraction(const struct gas_choice *choice, size_t part)
{
    double M = 0;
    for (size_t i = 0; i < choice->part_count; i++)
        M += choice->part[i].x * choice->part[i].molar_mass;
    return choice->part[part].x * choice->part[part].molar_mass / M;
}

static void put_fact(struct gas_call *call, size_t row, const struct gas_fact *fact)
{
    if (!fact->text)
        put_row(call, row, fact->label, fact->figure, fact->unit, fact->source);
    else if (fact->wide)
        put_text_row(call, row, fact->label, "", fact->text);
    else
        put_text_row(call, row, fact->label, fact->text, fact->source);
}

static void put_part(struct gas_call *call, size_t row, const char *symbol, const char *name, double percent,
                     const char *unit)
{
    char label[120];
    snprintf(label, sizeof label, "%s %s", symbol, name);
    put_row(call, row, label, percent, unit, "composition");
}

/* A publication in full, behind the key that stands beside the figures. */
static void put_citation(struct gas_call *call, size_t row, const struct gas_source *source)
{
    char text[600];
    snprintf(text, sizeof text, "%s: %s", source->key, source->citation);
    put_text_row(call, row, "source", "", text);
}

static void answer_card(struct gas_call *call, const struct gas_choice *choice, const struct gas_facts *facts)
{
    const size_t parts = choice->part_count > 1 ? choice->part_count : 0;
    size_t row = 0;
    if (!gas_answer_block(call, 1 + facts->count + 2 * parts + facts->cited, 4))
        return;
    static const char *const heading[] = {"label", "value", "unit", "source"};
    gas_put_texts(call, 0, heading, 4);
    for (size_t i = 0; i < facts->count; i++)
        put_fact(call, ++row, &facts->fact[i]);
    for (size_t i = 0; i < parts; i++)
        put_part(call, ++row, "x", choice->part[i].label, 100 * choice->part[i].x, "mol %");
    for (size_t i = 0; i < parts; i++)
        put_part(call, ++row, "w", choice->part[i].label, 100 * mass_fraction(choice, i), "wt %");
    for (size_t i = 0; i < facts->cited; i++)
        put_citation(call, ++row, facts->citation[i]);
}

/* "x N2", "w oxygen, %": the mole and the mass fraction of a part. */
static bool answer_fraction(struct gas_call *call, const struct gas_choice *choice, struct gas_piece item,
                            struct gas_piece unit)
{
    bool mole = gas_piece_take(&item, "x"), mass = !mole && gas_piece_take(&item, "w");
    const struct gas_species *species = mole || mass ? gas_name_find(item.at, item.length) : NULL;
    char folded[40];
    bool percent = gas_listed(gas_fold(folded, sizeof folded, unit), mole ? "%|mol%|vol%" : "%|wt%");
    if (!species || (unit.length && !percent))
        return false;
    for (size_t i = 0; i < choice->part_count; i++)
        if (choice->part[i].species == species) {
            gas_answer_number(call, (percent ? 100 : 1) * (mole ? choice->part[i].x : mass_fraction(choice, i)));
            return true;
        }
    return false;
}

static const struct gas_fact *find_fact(const struct gas_facts *facts, struct gas_piece item)
{
    char folded[60];
    gas_fold(folded, sizeof folded, item);
    for (size_t i = 0; i < facts->count; i++)
        if (gas_listed(folded, facts->fact[i].names))
            return &facts->fact[i];
    return NULL;
}

/* "source": of the heat capacity; "source of Tc": of any figure. */
static bool answer_source(struct gas_call *call, const struct gas_choice *choice, const struct gas_facts *facts,
                          struct gas_piece item)
{
    if (!gas_piece_take(&item, "source") && !gas_piece_take(&item, "sources"))
        return false;
    if (item.length && !gas_piece_take(&item, "of"))
        return false;
    const struct gas_fact *fact = find_fact(facts, item);
    if (item.length && !fact)
        return false;
    const struct gas_source *source = fact ? gas_source_find(fact->source) : NULL;
    bool heat = !fact || strncmp(fact->label, "cp", 2) == 0;
    gas_answer_text(call, source ? source->citation : heat ? choice->source : fact->source);
    return true;
}

static bool answer_fact(struct gas_call *call, const struct gas_choice *choice, const struct gas_fact *fact,
                        struct gas_piece unit_text, struct gas_refusal *refusal)
{
    struct gas_unit unit = gas_unit_si(fact->dimension);
    struct gas_unit_fault fault;
    double figure = fact->figure;
    if (fact->text) {
        gas_answer_text(call, fact->text);
        return true;
    }
    if (unit_text.length == strlen(fact->unit) && memcmp(unit_text.at, fact->unit, unit_text.length) == 0)
        unit_text.length = 0; /* as the card shows it, "debye" too */
    if (unit_text.length && !gas_unit_parse(unit_text.at, unit_text.length, NULL, &unit, &fault))
        return gas_refuse_unit(refusal, "item", &fault);
    if (unit.dimension == GAS_DIM_SPECIFIC_ENTROPY && fact->dimension == GAS_DIM_MOLAR_ENTROPY)
        figure /= choice->gas.molar_mass;
    else if (unit.dimension == GAS_DIM_MOLAR_ENTROPY && fact->dimension == GAS_DIM_SPECIFIC_ENTROPY)
        figure *= choice->gas.molar_mass;
    else if (unit.dimension != fact->dimension)
        return gas_refuse(refusal, "item", "%s is the unit of %s, but %s is %s.", unit.text,
                          gas_dimension_words(unit.dimension), fact->label, gas_dimension_words(fact->dimension));
    gas_answer_number(call, unit_text.length ? gas_unit_from_si(&unit, figure, GAS_ATMOSPHERE) : figure);
    return true;
}

/* The lines that this card has. */
static bool refuse_item(struct gas_refusal *refusal, const struct gas_choice *choice, const struct gas_facts *facts,
                        struct gas_piece item)
{
    char shown[80], list[300] = "";
    size_t used = 0;
    for (size_t i = 0; i < facts->count && used + 40 < sizeof list; i++)
        used += (size_t)snprintf(list + used, sizeof list - used, "%s%s", i ? ", " : "", facts->fact[i].label);
    gas_quoted(shown, sizeof shown, item.at, item.length);
    return gas_refuse(refusal, "item", "%s is not on the card of %.60s; its lines are %s%s.", shown, choice->label,
                      list, choice->part_count > 1 ? ", x and w with a component" : "");
}

static bool answer_item(struct gas_call *call, const struct gas_choice *choice, const struct gas_facts *facts,
                        struct gas_piece item, struct gas_refusal *refusal)
{
    const struct gas_piece no_unit = {"", 0};
    const struct gas_fact *fact = find_fact(facts, item);
    const char *comma = memrchr(item.at, ',', item.length);
    if (fact)
        return answer_fact(call, choice, fact, no_unit, refusal);
    if (answer_source(call, choice, facts, item) || answer_fraction(call, choice, item, no_unit))
        return true;
    if (!comma)
        return refuse_item(refusal, choice, facts, item);
    const size_t front = (size_t)(comma - item.at);
    struct gas_piece name = gas_piece_front(item, front);
    struct gas_piece unit = gas_piece_behind(item, front + 1);
    fact = find_fact(facts, name);
    if (fact)
        return answer_fact(call, choice, fact, unit, refusal);
    return answer_fraction(call, choice, name, unit) || refuse_item(refusal, choice, facts, item);
}

static bool read_single_text(const struct gas_block *argument, const char *what, struct gas_piece *text,
                             struct gas_refusal *refusal)
{
    *text = (struct gas_piece){"", 0};
    if (gas_omitted(argument) || (gas_single(argument) && gas_cell_blank(argument->cell)))
        return true;
    if (!gas_single(argument) || argument->cell->kind != GAS_CELL_TEXT)
        return gas_refuse(refusal, what, "it is one text in one cell.");
    *text = gas_piece_of(argument->cell);
    return true;
}

void gas_fn_card(struct gas_call *call)
{
    struct gas_refusal refusal = {0};
    struct gas_facts facts;
    struct gas_piece item;
    const struct gas_choice *choice = gas_choose(gas_argument(call, 0), &refusal);
    if (choice && read_single_text(gas_argument(call, 1), "item", &item, &refusal)) {
        gas_facts_of(choice, &facts);
        if (item.length == 0)
            answer_card(call, choice, &facts);
        else
            answer_item(call, choice, &facts, item, &refusal);
    }
    if (refusal.made)
        gas_answer_text(call, refusal.text);
    gas_choice_release(choice);
}

static bool has_element(const struct gas_species *species, struct gas_piece symbol)
{
    for (size_t i = 0; i < GAS_ELEMENTS; i++) {
        const char *own = species->element[i].symbol;
        if (own[0] && strlen(own) == symbol.length && memcmp(own, symbol.at, symbol.length) == 0)
            return true;
    }
    return false;
}

/* All of the symbols in "C H F". */
static bool has_elements(const struct gas_species *species, struct gas_piece symbols)
{
    while (symbols.length) {
        size_t end = 0;
        while (end < symbols.length && !strchr(" ,;", symbols.at[end]))
            end++;
        if (end && !has_element(species, (struct gas_piece){symbols.at, end}))
            return false;
        end += end < symbols.length;
        symbols = (struct gas_piece){symbols.at + end, symbols.length - end};
    }
    return true;
}

static bool folded_contains(const char *text, const char *part)
{
    char folded[300];
    return strstr(gas_fold(folded, sizeof folded, (struct gas_piece){text, strlen(text)}), part) != NULL;
}

static bool matches(const struct gas_species *species, struct gas_piece search)
{
    char folded[80];
    struct gas_piece symbols = search;
    if (gas_piece_take(&symbols, "element") || gas_piece_take(&symbols, "elements"))
        return has_elements(species, symbols);
    gas_fold(folded, sizeof folded, search);
    return species == gas_species_find(search.at, search.length) || folded_contains(species->name, folded) ||
           folded_contains(species->formula, folded) || folded_contains(species->cas, folded) ||
           folded_contains(species->aliases, folded);
}

static void put_species(struct gas_call *call, size_t row, const struct gas_species *species)
{
    char range[80] = "no heat capacity", from[30], to[30];
    const struct gas gas = gas_of_species(species);
    if (gas.interval_count) {
        gas_number_format(from, sizeof from, gas.interval[0].T_from, 6);
        gas_number_format(to, sizeof to, gas.interval[gas.interval_count - 1].T_to, 6);
        snprintf(range, sizeof range, "%s to %s K", from, to);
    }
    gas_put_text(call, row, 0, species->name);
    gas_put_text(call, row, 1, species->formula);
    gas_put_text(call, row, 2, species->cas);
    gas_put_number(call, row, 3, 1e3 * gas.molar_mass);
    gas_put_text(call, row, 4, range);
}

static void refuse_search(struct gas_refusal *refusal, struct gas_piece search)
{
    char shown[80];
    const struct gas_species *near;
    if (gas_species_nearest(search.at, search.length, &near, 1) > 0)
        gas_refuse_name(refusal, search);
    else
        gas_refuse(refusal, "search",
                   "no gas known here has %s in its name, formula or CAS number; try a shorter part, or "
                   "element F.",
                   gas_quoted(shown, sizeof shown, search.at, search.length));
}

static void answer_list(struct gas_call *call, struct gas_piece search, struct gas_refusal *refusal)
{
    static const char *const heading[] = {"name", "formula", "CAS number", "M, kg/kmol", "range of cp"};
    const size_t species = gas_species_count();
    size_t found = 0;
    for (size_t i = 0; i < species; i++)
        found += matches(gas_species_at(i), search);
    if (found == 0) {
        refuse_search(refusal, search);
        return;
    }
    if (!gas_answer_block(call, found + 1, 5))
        return;
    gas_put_texts(call, 0, heading, 5);
    for (size_t i = 0, row = 0; i < species; i++)
        if (matches(gas_species_at(i), search))
            put_species(call, ++row, gas_species_at(i));
}

void gas_fn_list(struct gas_call *call)
{
    struct gas_refusal refusal = {0};
    struct gas_piece search;
    if (read_single_text(gas_argument(call, 0), "search", &search, &refusal))
        answer_list(call, search, &refusal);
    if (refusal.made)
        gas_answer_text(call, refusal.text);
}
