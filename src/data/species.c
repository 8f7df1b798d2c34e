#include <gasleaf/species.h>

#include <string.h>

#include "gases.h"

static const struct gas_family *const families[] = {
    &gas_family_elements,    &gas_family_inorganic,   &gas_family_hydrocarbons, &gas_family_organic,
    &gas_family_halocarbons, &gas_family_electronics, &gas_family_radicals,
};
enum { FAMILIES = sizeof families / sizeof families[0] };

size_t gas_species_count(void)
{
    size_t count = 0;
    for (size_t i = 0; i < FAMILIES; i++)
        count += families[i]->count;
    return count;
}

const struct gas_species *gas_species_at(size_t index)
{
    for (size_t i = 0; i < FAMILIES; i++) {
        if (index < families[i]->count)
            return &families[i]->species[index];
        index -= families[i]->count;
    }
    return NULL;
}

/* clang-format off */
/* IUPAC standard atomic weights 2021 (ATOMIC_WEIGHTS); D and radon-222 are atomic masses (ATOMIC_MASSES). */
static const struct {
    char symbol[3];
    double weight; /* g/mol */
} atoms[] = {
    {"H",  1.008},     {"D",  2.014101777844}, {"He", 4.002602},      {"B",  10.81},         {"C",  12.011},
    {"N",  14.007},    {"O",  15.999},         {"F",  18.998403162},  {"Ne", 20.1797},       {"Si", 28.085},
    {"P",  30.973761998}, {"S", 32.06},        {"Cl", 35.45},         {"Ar", 39.95},         {"Ti", 47.867},
    {"Ge", 72.630},    {"As", 74.921595},      {"Br", 79.904},        {"Kr", 83.798},        {"I",  126.90447},
    {"Xe", 131.293},   {"W",  183.84},         {"Hg", 200.592},       {"Rn", 222.0175763},   {"U",  238.02891},
};

/* US Standard Atmosphere 1976, Table 3. */
static const struct gas_air_part air_parts[] = {
    {"N2", 0.78084},     {"O2", 0.209476},    {"Ar", 0.00934},     {"CO2", 0.000314}, {"Ne", 0.00001818},
    {"He", 0.00000524},  {"CH4", 0.000002},   {"Kr", 0.00000114},  {"H2", 0.0000005}, {"Xe", 0.000000087},
};
/* clang-format on */

double gas_atomic_weight(const char *symbol)
{
    for (size_t i = 0; i < sizeof atoms / sizeof atoms[0]; i++)
        if (strcmp(atoms[i].symbol, symbol) == 0)
            return atoms[i].weight;
    return NAN;
}

double gas_species_molar_mass(const struct gas_species *species)
{
    if (species->molar_mass > 0)
        return species->molar_mass;
    double grams = 0;
    for (int i = 0; i < GAS_ELEMENTS && species->element[i].count > 0; i++)
        grams += species->element[i].count * gas_atomic_weight(species->element[i].symbol);
    return grams / 1000;
}

struct gas gas_of_species(const struct gas_species *species)
{
    return (struct gas){.R = GAS_R,
                        .molar_mass = gas_species_molar_mass(species),
                        .rule = GAS_CP_INTEGRATED,
                        .interval_count = species->interval_count,
                        .interval = species->interval};
}

size_t gas_air_parts(const struct gas_air_part **parts)
{
    *parts = air_parts;
    return sizeof air_parts / sizeof air_parts[0];
}
