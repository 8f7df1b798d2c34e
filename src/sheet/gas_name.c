/* A gas by name, formula or CAS number; a near miss is answered with the nearest names. */
#include "sheet/gas_draft.h"

#include <stdio.h>
#include <string.h>

const char *gas_species_source_words(const struct gas_species *species)
{
    const struct gas_source *source = gas_source_find(species->heat_source);
    return source ? source->citation : species->heat_source;
}

void gas_draft_species(struct gas_draft *draft, const struct gas_species *species)
{
    struct gas_part *part = gas_arena_take(draft->arena, 1, sizeof *part);
    if (!part) {
        gas_refuse_memory(draft->refusal);
        return;
    }
    draft->gas = gas_of_species(species);
    *part = (struct gas_part){species, species->name, 1, draft->gas.molar_mass};
    draft->part = part;
    draft->part_count = 1;
    draft->label = species->name;
    draft->source = gas_species_source_words(species);
}

static size_t name_and_formula(char *to, size_t size, const struct gas_species *species, bool more)
{
    const char *comma = more ? ", " : "", *formula = species->formula;
    int used = formula[0] ? snprintf(to, size, "%s%s (%s)", comma, species->name, formula)
                          : snprintf(to, size, "%s%s", comma, species->name);
    return used < 0 ? 0 : (size_t)used;
}

bool gas_refuse_name(struct gas_refusal *refusal, struct gas_piece name)
{
    enum { MOST = 3 };
    const struct gas_species *near[MOST];
    char shown[80], list[240] = "";
    size_t used = 0, count = gas_species_nearest(name.at, name.length, near, MOST);
    for (size_t i = 0; i < count && used < sizeof list; i++)
        used += name_and_formula(list + used, sizeof list - used, near[i], i > 0);
    gas_quoted(shown, sizeof shown, name.at, name.length);
    if (count == 0)
        return gas_refuse(
            refusal, "gas",
            "%s is not known; use GAS.LIST to search, or give a gas card. A mixture is written N2 79 + O2 21.", shown);
    return gas_refuse(refusal, "gas", "%s is not known; nearest %s %s; use GAS.LIST to search.", shown,
                      count == 1 ? "is" : "are", list);
}

bool gas_draft_name(struct gas_draft *draft, struct gas_piece name)
{
    const struct gas_species *species = gas_species_find(name.at, name.length);
    if (!species)
        return gas_refuse_name(draft->refusal, name);
    gas_draft_species(draft, species);
    return !draft->refusal->made;
}
