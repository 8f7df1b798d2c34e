#include "sheet/gas_facts.h"

#include <math.h>
#include <string.h>

#include <gasleaf/heat.h>

#define ROOM_TEMPERATURE 298.15 /* K */

#define LONGEST_NAME 28 /* beside its label; a longer one stands in the last column */
#define AS_GIVEN     "as given"

static void cite(struct gas_facts *facts, const char *key)
{
    const struct gas_source *source = gas_source_find(key);
    for (size_t i = 0; i < facts->cited; i++)
        if (facts->citation[i] == source)
            return;
    if (source && facts->cited < GAS_CITED)
        facts->citation[facts->cited++] = source;
}

static void add(struct gas_facts *facts, struct gas_fact fact)
{
    bool known = fact.text ? fact.text[0] != '\0' : isfinite(fact.figure);
    if (!known || facts->count >= GAS_FACTS)
        return;
    facts->fact[facts->count++] = fact;
    cite(facts, fact.source);
}

static void add_text(struct gas_facts *facts, const char *label, const char *names, const char *text,
                     const char *source)
{
    add(facts, (struct gas_fact){label, names, text, NAN, GAS_DIM_NUMBER, "", source, false});
}

static void add_figure(struct gas_facts *facts, const char *label, const char *names, double figure,
                       enum gas_dimension dimension, const char *source)
{
    const char *unit = dimension == GAS_DIM_NUMBER ? "" : gas_dimension_si(dimension);
    add(facts, (struct gas_fact){label, names, NULL, figure, dimension, unit, source, false});
}

static const char *molar_mass_source(const struct gas_choice *choice, const struct gas_species *species)
{
    if (choice->part_count > 1)
        return choice->rule[0] ? "as given, or from the composition" : "mole-fraction mean of the parts";
    if (!species || gas_species_molar_mass(species) != choice->gas.molar_mass)
        return AS_GIVEN;
    return species->molar_mass > 0 ? "US Standard Atmosphere 1976" : "IUPAC atomic weights 2021";
}

static void add_heat(struct gas_facts *facts, const struct gas_choice *choice)
{
    const struct gas *gas = &choice->gas;
    const char *source = choice->source_key[0] ? choice->source_key : AS_GIVEN;
    struct gas_result cp = gas_cp(gas, ROOM_TEMPERATURE), cv = gas_cv(gas, ROOM_TEMPERATURE),
                      gamma = gas_gamma(gas, ROOM_TEMPERATURE);
    struct gas_range range = gas_range_of(gas);
    add_figure(facts, "cp at 25 °C", "cp|cpat25°c|cp25|cpmolar", cp.value, GAS_DIM_MOLAR_ENTROPY, source);
    add_figure(facts, "cp at 25 °C, per mass", "cpmass|cppermass|cpspecific|cpat25°c,permass|cpat25°cpermass",
               cp.value / gas->molar_mass, GAS_DIM_SPECIFIC_ENTROPY, source);
    add_figure(facts, "cv at 25 °C", "cv|cvat25°c|cv25", cv.value, GAS_DIM_MOLAR_ENTROPY, "cp - R");
    add_figure(facts, "gamma at 25 °C", "gamma|k|kappa|cp/cv|gammaat25°c|\u03b3|\u03ba", gamma.value, GAS_DIM_NUMBER,
               "cp/cv");
    if (range.T_from > 0 || isfinite(range.T_to)) {
        add_figure(facts, "data from", "from|tmin|datafrom", range.T_from, GAS_DIM_TEMPERATURE, source);
        add_figure(facts, "data to", "to|tmax|datato", range.T_to, GAS_DIM_TEMPERATURE, source);
    }
}

static void add_species(struct gas_facts *facts, const struct gas_species *species)
{
    add_figure(facts, "Tc", "tc|criticaltemperature|tcritical", species->critical.T, GAS_DIM_TEMPERATURE,
               species->critical_T_source);
    add_figure(facts, "Pc", "pc|criticalpressure|pcritical", species->critical.P, GAS_DIM_PRESSURE,
               species->critical_P_source);
    add_figure(facts, "omega", "omega|acentricfactor|\u03c9", species->critical.omega, GAS_DIM_NUMBER,
               species->omega_source);
    add_figure(facts, "boiling point", "tb|boilingpoint|normalboilingpoint|nbp", species->boiling_point,
               GAS_DIM_TEMPERATURE, species->boiling_point_source);
    add(facts, (struct gas_fact){"dipole moment", "dipole|dipolemoment", NULL, species->dipole, GAS_DIM_OTHER, "debye",
                                 species->dipole_source, false});
}

void gas_facts_of(const struct gas_choice *choice, struct gas_facts *facts)
{
    const struct gas_species *species = choice->part_count == 1 ? choice->part->species : NULL;
    const double M = choice->gas.molar_mass;
    *facts = (struct gas_facts){0};
    add(facts, (struct gas_fact){"name", "name|gas", choice->label, NAN, GAS_DIM_NUMBER, "", "",
                                 strlen(choice->label) > LONGEST_NAME});
    add_text(facts, "rule", "rule", choice->rule, AS_GIVEN);
    if (species) {
        add_text(facts, "formula", "formula", species->formula, "");
        add_text(facts, "CAS number", "cas|casnumber|casno", species->cas, "");
    }
    add_figure(facts, "M", "m|mw|molarmass|molecularweight", M, GAS_DIM_MOLAR_MASS, molar_mass_source(choice, species));
    add_figure(facts, "R", "r|rspecific|gasconstant|specificgasconstant", choice->gas.R / M, GAS_DIM_SPECIFIC_ENTROPY,
               choice->gas.R == GAS_R ? "R/M, R = 8.31446261815324 J/(mol K)" : "R/M with the R given");
    add_heat(facts, choice);
    if (species)
        add_species(facts, species);
    if (species && choice->source_key[0])
        add(facts, (struct gas_fact){"note on cp", "noteoncp|note", species->heat_reference, NAN, GAS_DIM_NUMBER, "",
                                     "", true});
    if (!choice->source_key[0])
        add(facts, (struct gas_fact){"source", "source|sources", choice->source, NAN, GAS_DIM_NUMBER, "", "", true});
}
