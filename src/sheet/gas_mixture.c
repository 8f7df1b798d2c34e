/* A recipe of components and figures -> mole fractions -> a gas. */
#include "sheet/gas_mixture.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define SUM_TOLERANCE 0.005 /* of the whole: what rounded analyses miss */

static bool refuse_component(struct gas_refusal *refusal, struct gas_piece name, const char *rest)
{
    char shown[80];
    return gas_refuse(refusal, "gas", "%s %s", gas_quoted(shown, sizeof shown, name.at, name.length), rest);
}

static bool accept_figure(const struct gas_component *component, struct gas_piece name, struct gas_refusal *refusal)
{
    if (component->rest)
        return true;
    if (!isfinite(component->amount))
        return refuse_component(refusal, name, "has no finite fraction; write one.");
    if (component->amount < 0)
        return refuse_component(refusal, name, "has a fraction below zero; fractions are above 0.");
    if (component->amount == 0)
        return refuse_component(refusal, name, "has the fraction 0; leave it out.");
    return true;
}

static bool accept_marks(struct gas_recipe *recipe, const struct gas_marks *marks, struct gas_refusal *refusal)
{
    if (marks->contradiction || (recipe->basis && marks->basis && recipe->basis != marks->basis))
        return gas_refuse(refusal, "gas",
                          "the fractions are partly by mass and partly by mole; give one basis for all "
                          "parts, such as \"CO2 40 + N2 60 wt%%\".");
    recipe->basis = marks->basis ? marks->basis : recipe->basis;
    recipe->percent |= marks->percent;
    return true;
}

bool gas_recipe_add(struct gas_recipe *recipe, struct gas_piece name, struct gas_component component,
                    const struct gas_marks *marks, struct gas_refusal *refusal)
{
    component.species = gas_name_find(name.at, name.length);
    if (!component.species)
        return gas_refuse_name(refusal, name);
    for (size_t i = 0; i < recipe->count; i++)
        if (recipe->component[i].species == component.species)
            return refuse_component(refusal, name, "stands there twice; add its fractions up.");
    if (recipe->count == GAS_PARTS_MOST)
        return gas_refuse(refusal, "gas", "the mixture has more than %d parts; leave out the smallest.",
                          GAS_PARTS_MOST);
    if (!accept_figure(&component, name, refusal) || !accept_marks(recipe, marks, refusal))
        return false;
    recipe->component[recipe->count++] = component;
    return true;
}

/* 1 or 100. Without a percent sign the sum tells, or, beside a rest, whether the figures fit below 1. */
static double whole_of(const struct gas_recipe *recipe, double plain, bool rest)
{
    if (recipe->percent)
        return 100;
    return plain < (rest ? 1 : 1.5) ? 1 : 100;
}

static bool refuse_sum(struct gas_refusal *refusal, double sum, bool marked, bool rest)
{
    char figure[40];
    gas_number_format(figure, sizeof figure, sum, 6);
    const char *percent = marked ? " %" : "";
    if (rest)
        return gas_refuse(refusal, "gas", "the fractions add up to %s%s already, which leaves nothing for the rest.",
                          figure, percent);
    return gas_refuse(refusal, "gas",
                      "the fractions add up to %s%s, not to 1 or 100 %%; correct them, or write \"rest\" for one of "
                      "them.",
                      figure, percent);
}

static bool refuse_total(struct gas_refusal *refusal, double total, double sum)
{
    return gas_refuse(refusal, "gas",
                      "the total of the mixture says %s and its parts add up to %s; correct one of them.",
                      gas_shown(total).text, gas_shown(sum).text);
}

/* Parts per million become parts of the whole, the rest its figure; then the sum is looked at. */
static bool settle_amounts(struct gas_recipe *recipe, struct gas_refusal *refusal)
{
    struct gas_component *rest = NULL;
    double plain = 0, sum = 0;
    for (size_t i = 0; i < recipe->count; i++) {
        struct gas_component *component = &recipe->component[i];
        if (component->rest && rest)
            return gas_refuse(refusal, "gas", "only one part can be the rest; write the fraction of the others.");
        if (component->rest)
            rest = component;
        else if (!component->ppm)
            plain += component->amount;
    }
    double whole = whole_of(recipe, plain, rest != NULL);
    for (size_t i = 0; i < recipe->count; i++) {
        struct gas_component *component = &recipe->component[i];
        if (component->ppm)
            component->amount *= whole * 1e-6;
        sum += component->rest ? 0 : component->amount;
    }
    if (rest ? sum >= whole : fabs(sum - whole) > SUM_TOLERANCE * whole * (1 + 1e-9))
        return refuse_sum(refusal, sum, recipe->percent, rest != NULL);
    if (rest)
        rest->amount = whole - sum;
    if (recipe->total > 0 && fabs(recipe->total - whole) > SUM_TOLERANCE * whole)
        return refuse_total(refusal, recipe->total, rest ? whole : sum);
    return true;
}

static const char *mixture_label(struct gas_draft *draft, const struct gas_part *part, size_t count)
{
    char label[300], percent[40], one[120];
    size_t used = 0;
    for (size_t i = 0; i < count; i++) {
        gas_number_format(percent, sizeof percent, 100 * part[i].x, 4);
        int bytes = snprintf(one, sizeof one, "%s%s %% %.60s", i ? " + " : "", percent, part[i].label);
        if (used + (size_t)bytes + 24 > sizeof label) {
            snprintf(label + used, sizeof label - used, " + %zu more", count - i);
            break;
        }
        memcpy(label + used, one, (size_t)bytes + 1);
        used += (size_t)bytes;
    }
    return gas_draft_copy(draft, label);
}

bool gas_recipe_finish(struct gas_recipe *recipe, struct gas_draft *draft)
{
    if (recipe->count == 0)
        return gas_refuse(draft->refusal, "gas", "the mixture has no parts; give component and fraction.");
    if (!settle_amounts(recipe, draft->refusal))
        return false;
    if (recipe->count == 1) {
        gas_draft_species(draft, recipe->component[0].species);
        return !draft->refusal->made;
    }
    struct gas_part *part = gas_arena_take(draft->arena, recipe->count, sizeof *part);
    if (!part)
        return gas_refuse_memory(draft->refusal);
    double sum = 0;
    for (size_t i = 0; i < recipe->count; i++) {
        const struct gas_component *component = &recipe->component[i];
        double M = gas_species_molar_mass(component->species);
        double x = recipe->basis == GAS_BASIS_MASS ? component->amount / M : component->amount;
        part[i] = (struct gas_part){component->species, component->species->name, x, M};
        sum += x;
    }
    for (size_t i = 0; i < recipe->count; i++)
        part[i].x /= sum;
    draft->label = mixture_label(draft, part, recipe->count);
    return gas_draft_sum(draft, part, recipe->count);
}
