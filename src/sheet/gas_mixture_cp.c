/* The heat capacity of an ideal-gas mixture: the mole-fraction sum of its parts', in the one shape of gas.h. */
#include "sheet/gas_mixture.h"

#include <math.h>
#include <stdlib.h>
#include <string.h>

#include <gasleaf/heat.h>

static int by_size(const void *left, const void *right)
{
    const double a = *(const double *)left, b = *(const double *)right;
    return (a > b) - (a < b);
}

/* Every temperature where a part changes its interval, inside the range that all parts share. */
static size_t break_points(const struct gas *gas, size_t count, double from, double to, double *point)
{
    size_t used = 0, kept = 1;
    point[used++] = from;
    point[used++] = to;
    for (size_t i = 0; i < count; i++)
        for (size_t j = 0; j + 1 < gas[i].interval_count; j++)
            if (gas[i].interval[j].T_to > from && gas[i].interval[j].T_to < to)
                point[used++] = gas[i].interval[j].T_to;
    qsort(point, used, sizeof *point, by_size);
    for (size_t i = 1; i < used; i++)
        if (point[i] > point[kept - 1] * (1 + 1e-9))
            point[kept++] = point[i];
    point[kept - 1] = to;
    return kept;
}

static const struct gas_interval *interval_at(const struct gas *gas, double T)
{
    size_t i = 0;
    while (i + 1 < gas->interval_count && T > gas->interval[i].T_to)
        i++;
    return &gas->interval[i];
}

static bool sum_interval(struct gas_draft *draft, const struct gas *gas, const struct gas_part *part, size_t count,
                         struct gas_interval *made)
{
    double middle = made->T_from + (made->T_to - made->T_from) / 2;
    size_t terms = 0;
    for (size_t i = 0; i < count; i++)
        terms += interval_at(&gas[i], middle)->term_count;
    struct gas_term *term = gas_arena_take(draft->arena, terms, sizeof *term);
    if (!term)
        return gas_refuse_memory(draft->refusal);
    made->term = term;
    for (size_t i = 0; i < count; i++) {
        const struct gas_interval *own = interval_at(&gas[i], middle);
        for (size_t k = 0; k < GAS_POWERS; k++)
            made->power[k] += part[i].x * own->power[k];
        for (size_t k = 0; k < own->term_count; k++) {
            term[made->term_count] = own->term[k];
            term[made->term_count++].factor *= part[i].x;
        }
    }
    return true;
}

/* The range that all parts share; false, and the two that share none, otherwise. */
static bool shared_range(struct gas_draft *draft, const struct gas *gas, const struct gas_part *part, size_t count,
                         struct gas_range *shared)
{
    size_t latest = 0, earliest = 0;
    *shared = (struct gas_range){0, INFINITY};
    for (size_t i = 0; i < count; i++) {
        struct gas_range own = gas_range_of(&gas[i]);
        if (!(own.T_from < own.T_to))
            return gas_refuse(draft->refusal, "gas", "%s has no heat capacity.", part[i].label);
        if (own.T_from > shared->T_from)
            shared->T_from = own.T_from, latest = i;
        if (own.T_to < shared->T_to)
            shared->T_to = own.T_to, earliest = i;
    }
    if (shared->T_from < shared->T_to)
        return true;
    return gas_refuse(draft->refusal, "gas",
                      "the data of %s begin at %s K, where those of %s have ended (%s K); they cannot be mixed.",
                      part[latest].label, gas_shown(shared->T_from).text, part[earliest].label,
                      gas_shown(shared->T_to).text);
}

static bool sum_heat(struct gas_draft *draft, const struct gas *gas, const struct gas_part *part, size_t count)
{
    struct gas_range shared;
    size_t most = 2;
    for (size_t i = 0; i < count; i++)
        most += gas[i].interval_count;
    double *point = gas_arena_take(draft->arena, most, sizeof *point);
    struct gas_interval *made = gas_arena_take(draft->arena, most, sizeof *made);
    if (!point || !made)
        return gas_refuse_memory(draft->refusal);
    if (!shared_range(draft, gas, part, count, &shared))
        return false;
    size_t points = break_points(gas, count, shared.T_from, shared.T_to, point);
    for (size_t i = 0; i + 1 < points; i++) {
        made[i] = (struct gas_interval){.T_from = point[i], .T_to = point[i + 1]};
        if (!sum_interval(draft, gas, part, count, &made[i]))
            return false;
    }
    draft->gas.interval = made;
    draft->gas.interval_count = points - 1;
    return true;
}

bool gas_draft_sum(struct gas_draft *draft, const struct gas_part *part, size_t count)
{
    struct gas gas[GAS_PARTS_MOST];
    double M = 0;
    for (size_t i = 0; i < count; i++) {
        gas[i] = gas_of_species(part[i].species);
        M += part[i].x * part[i].molar_mass;
    }
    draft->gas.molar_mass = M;
    draft->part = part;
    draft->part_count = count;
    gas_draft_source(draft, part[0].species);
    return sum_heat(draft, gas, part, count);
}
