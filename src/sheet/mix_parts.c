/* What the blend is made of, and the entropy that shared components do not make. */
#include <math.h>
#include <string.h>

#include "sheet/mix.h"

static bool is_air(const struct gas_part *part)
{
    return part->species && strcmp(part->species->name, "air") == 0;
}

static bool only_air(const struct gas_mix *mix)
{
    for (size_t i = 0; i < mix->count; i++)
        if (mix->rows[i].choice->part_count != 1 || !is_air(mix->rows[i].choice->part))
            return false;
    return true;
}

/* Adds a component to a list, or to its like in it. */
static void add_part(struct gas_part *list, size_t *count, const struct gas_part *part, double x)
{
    for (size_t i = 0; i < *count; i++)
        if (list[i].species && list[i].species == part->species) {
            list[i].x += x;
            return;
        }
    list[*count] = *part;
    list[(*count)++].x = x;
}

/* Air as nitrogen, oxygen, argon and carbon dioxide; the traces, below 1 in 10 000, are left out. */
static void add_air(struct gas_part *list, size_t *count, double x)
{
    const double least = 1e-4;
    const struct gas_air_part *air;
    size_t parts = gas_air_parts(&air);
    double sum = 0;
    for (size_t i = 0; i < parts; i++)
        sum += air[i].fraction > least ? air[i].fraction : 0;
    for (size_t i = 0; i < parts; i++) {
        if (!(air[i].fraction > least))
            continue;
        const struct gas_species *species = gas_species_find(air[i].formula, strlen(air[i].formula));
        if (species)
            add_part(list, count, &(struct gas_part){species, species->name, 0, gas_species_molar_mass(species)},
                     x * air[i].fraction / sum);
    }
}

static bool content_of(const struct gas_choice *choice, bool split_air, struct gas_arena *arena,
                       struct gas_content *content)
{
    const struct gas_air_part *air;
    bool has_air = false;
    for (size_t i = 0; i < choice->part_count; i++)
        has_air = has_air || is_air(&choice->part[i]);
    *content = (struct gas_content){choice->part_count, choice->part};
    if (!has_air || !split_air)
        return true;
    struct gas_part *list = gas_arena_take(arena, choice->part_count + gas_air_parts(&air), sizeof *list);
    content->count = 0;
    content->part = list;
    for (size_t i = 0; list && i < choice->part_count; i++)
        if (is_air(&choice->part[i]))
            add_air(list, &content->count, choice->part[i].x);
        else
            add_part(list, &content->count, &choice->part[i], choice->part[i].x);
    return list != NULL;
}

static struct gas_mixed_part *part_like(struct gas_mix *mix, const struct gas_part *part)
{
    for (size_t i = 0; i < mix->parts; i++) {
        const struct gas_part *known = mix->part[i].part;
        if (known->species ? known->species == part->species : !part->species && strcmp(known->label, part->label) == 0)
            return &mix->part[i];
    }
    mix->part[mix->parts] = (struct gas_mixed_part){.part = part};
    return &mix->part[mix->parts++];
}

bool gas_mix_merge(struct gas_mix *mix, struct gas_arena *arena, struct gas_refusal *refusal)
{
    size_t most = 0;
    double n = 0, mass = 0;
    bool split_air = !only_air(mix);
    for (size_t i = 0; i < mix->count; i++) {
        if (!content_of(mix->rows[i].choice, split_air, arena, &mix->rows[i].content))
            return gas_refuse(refusal, "streams", "there are too many for the memory at hand; give fewer.");
        most += mix->rows[i].content.count;
    }
    mix->part = gas_arena_take(arena, most, sizeof *mix->part);
    if (!mix->part)
        return gas_refuse(refusal, "streams", "there are too many for the memory at hand; give fewer.");
    for (size_t i = 0; i < mix->count; i++) {
        n += mix->portion[i].n;
        mass += mix->portion[i].n * mix->rows[i].choice->gas.molar_mass;
        for (size_t k = 0; mix->portion[i].n > 0 && k < mix->rows[i].content.count; k++)
            part_like(mix, &mix->rows[i].content.part[k])->n += mix->portion[i].n * mix->rows[i].content.part[k].x;
    }
    mix->molar_mass = mass / n;
    return true;
}

/* Core takes unlike gases as wholly distinct; what two mixtures share does not mix. For a component i of portion p the
 * partial pressure goes from x_pi P_p to y_i P, where core took the portion as one gas of its group g:
 * R sum over p of n_p (ln(n_g/n) + sum over i of x_pi ln(x_pi/y_i)), which is 0 for distinct gases and never above 0.
 */
double gas_mix_shared_entropy(struct gas_mix *mix)
{
    double sum = 0;
    for (size_t p = 0; p < mix->count; p++) {
        double group = 0, own = 0;
        for (size_t k = 0; k < mix->count; k++)
            group += mix->same[k] == mix->same[p] ? mix->portion[k].n : 0;
        if (mix->portion[p].n <= 0)
            continue;
        for (size_t i = 0; i < mix->rows[p].content.count; i++) {
            const struct gas_part *part = &mix->rows[p].content.part[i];
            own += part->x > 0 ? part->x * log(part->x * mix->blend.n / part_like(mix, part)->n) : 0;
        }
        sum += mix->portion[p].n * (log(group / mix->blend.n) + own);
    }
    return GAS_R * sum;
}
