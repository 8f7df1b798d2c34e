/* A gas by name, formula or CAS number; a near miss is answered with the nearest names. */
#include "sheet/gas_draft.h"

#include <stdio.h>
#include <string.h>

#include "sheet/ascii.h"

void gas_draft_source(struct gas_draft *draft, const struct gas_species *species)
{
    const struct gas_source *source = gas_source_find(species->heat_source);
    draft->source = source ? source->citation : species->heat_source;
    draft->source_key = species->heat_source;
}

static const struct gas_species *find_piece(struct gas_piece name)
{
    return gas_species_find(name.at, name.length);
}

/* Words at the end of a name, whatever their case, behind at least one other character. */
static bool ends_in(struct gas_piece name, const char *words)
{
    size_t length = strlen(words);
    if (name.length <= length)
        return false;
    for (size_t i = 0; i < length; i++)
        if (gas_ascii_lower(name.at[name.length - length + i]) != words[i])
            return false;
    return true;
}

/* "Freon 22", "refrigerant R-22": by its number. */
static const struct gas_species *find_refrigerant(struct gas_piece name)
{
    char number[16];
    if (!gas_piece_take(&name, "freon") && !gas_piece_take(&name, "refrigerant"))
        return NULL;
    if (!name.length || name.length > 8)
        return NULL;
    int length = snprintf(number, sizeof number, "%s%.*s", gas_ascii_lower(name.at[0]) == 'r' ? "" : "R-",
                          (int)name.length, name.at);
    return gas_species_find(number, (size_t)length);
}

const struct gas_species *gas_name_find(const char *text, size_t length)
{
    static const char *const before[] = {"gaseous", "compressed", "dry", "pure"};
    static const char *const behind[] = {" gas", "(g)", "(gas)", " vapour", " vapor"};
    struct gas_piece name = gas_piece_trim((struct gas_piece){text, length});
    struct gas_refusal unused = {0};
    const struct gas_species *found = find_piece(name);
    if (found || gas_refuse_blend(&unused, name)) /* "water gas" is no water */
        return found;
    for (size_t i = 0; i < sizeof before / sizeof *before; i++)
        if (gas_piece_take(&name, before[i]))
            break;
    for (size_t i = 0; i < sizeof behind / sizeof *behind; i++)
        if (ends_in(name, behind[i])) {
            name = gas_piece_front(name, name.length - strlen(behind[i]));
            break;
        }
    return (found = find_piece(name)) ? found : find_refrigerant(name);
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
    gas_draft_source(draft, species);
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
    if (gas_refuse_blend(refusal, name))
        return false;
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
    const struct gas_species *species = gas_name_find(name.at, name.length);
    if (!species)
        return gas_refuse_name(draft->refusal, name);
    gas_draft_species(draft, species);
    return !draft->refusal->made;
}
