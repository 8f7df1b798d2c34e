#include "sheet/gas_facts.h"

#include <math.h>
#include <string.h>

#include <gasleaf/heat.h>

#define ROOM_TEMPERATURE 298.15 /* K */

static const char at_room_temperature[] = "at 25 °C";

static void add(struct gas_facts *facts, struct gas_fact fact)
{
    bool known = fact.text ? fact.text[0] != '\0' : isfinite(fact.figure);
    if (known && facts->count < GAS_FACTS)
        facts->fact[facts->count++] = fact;
}

static void add_text(struct gas_facts *facts, const char *label, const char *names, const char *text,
                     const char *source)
{
    add(facts, (struct gas_fact){label, names, text, NAN, GAS_DIM_NUMBER, "", source});
}

static void add_figure(struct gas_facts *facts, const char *label, const char *names, double figure,
                       enum gas_dimension dimension, const char *source)
{
    const char *unit = dimension == GAS_DIM_NUMBER ? "" : gas_dimension_si(dimension);
    add(facts, (struct gas_fact){label, names, NULL, figure, dimension, unit, source});
}

static const char *molar_mass_source(const struct gas_choice *choice, const struct gas_species *species)
{
    if (choice->part_count > 1)
        return choice->rule[0] ? "as given, or from the composition" : "mole-fraction mean of the parts";
    if (!species || gas_species_molar_mass(species) != choice->gas.molar_mass)
        return "as given";
    return species->molar_mass > 0 ? "U.S. Standard Atmosphere, 1976" : "IUPAC standard atomic weights 2021";
}

static void add_heat(struct gas_facts *facts, const struct gas_choice *choice)
{
    const struct gas *gas = &choice->gas;
    struct gas_result cp = gas_cp(gas, ROOM_TEMPERATURE), cv = gas_cv(gas, ROOM_TEMPERATURE),
                      gamma = gas_gamma(gas, ROOM_TEMPERATURE);
    struct gas_range range = gas_range_of(gas);
    add_figure(facts, "cp at 25 °C", "cp|cpat25°c|cp25|cpmolar", cp.value, GAS_DIM_MOLAR_ENTROPY, choice->source);
    add_figure(facts, "cp at 25 °C, per mass", "cpmass|cppermass|cpspecific|cpat25°cpermass",
               cp.value / gas->molar_mass, GAS_DIM_SPECIFIC_ENTROPY, choice->source);
    add_figure(facts, "cv at 25 °C", "cv|cvat25°c|cv25", cv.value, GAS_DIM_MOLAR_ENTROPY, "cp - R");
    add_figure(facts, "gamma at 25 °C", "gamma|k|kappa|cp/cv|gammaat25°c|\u03b3|\u03ba", gamma.value, GAS_DIM_NUMBER,
               "cp/cv");
    add_figure(facts, "data from", "from|tmin|datafrom", range.T_from, GAS_DIM_TEMPERATURE, choice->source);
    add_figure(facts, "data to", "to|tmax|datato", range.T_to, GAS_DIM_TEMPERATURE, choice->source);
    if (gas->interval_count && cp.status)
        add_text(facts, "cp", at_room_temperature, "25 °C is outside the data", choice->source);
}

static const char *citation(const char *key)
{
    const struct gas_source *source = gas_source_find(key);
    return source ? source->citation : key;
}

static void add_species(struct gas_facts *facts, const struct gas_species *species)
{
    add_figure(facts, "Tc", "tc|criticaltemperature|tcritical", species->critical.T, GAS_DIM_TEMPERATURE,
               citation(species->critical_T_source));
    add_figure(facts, "Pc", "pc|criticalpressure|pcritical", species->critical.P, GAS_DIM_PRESSURE,
               citation(species->critical_P_source));
    add_figure(facts, "omega", "omega|acentricfactor|\u03c9", species->critical.omega, GAS_DIM_NUMBER,
               citation(species->omega_source));
    add_figure(facts, "boiling point", "tb|boilingpoint|normalboilingpoint|nbp", species->boiling_point,
               GAS_DIM_TEMPERATURE, citation(species->boiling_point_source));
    if (isfinite(species->dipole))
        add(facts, (struct gas_fact){"dipole moment", "dipole|dipolemoment", NULL, species->dipole, GAS_DIM_OTHER,
                                     "debye", citation(species->dipole_source)});
}

void gas_facts_of(const struct gas_choice *choice, struct gas_facts *facts)
{
    const struct gas_species *species = choice->part_count == 1 ? choice->part->species : NULL;
    const double M = choice->gas.molar_mass;
    facts->count = 0;
    add_text(facts, "name", "name|gas", choice->label, species ? citation(species->heat_source) : "");
    add_text(facts, "rule", "rule", choice->rule, "as given");
    if (species) {
        add_text(facts, "formula", "formula", species->formula, "");
        add_text(facts, "CAS number", "cas|casnumber|casno", species->cas, "");
    }
    add_figure(facts, "M", "m|mw|molarmass|molecularweight", M, GAS_DIM_MOLAR_MASS, molar_mass_source(choice, species));
    add_figure(facts, "R", "r|rspecific|gasconstant|specificgasconstant", choice->gas.R / M, GAS_DIM_SPECIFIC_ENTROPY,
               choice->gas.R == GAS_R ? "R/M with R = 8.31446261815324 J/(mol K), SI 2019" : "R/M with the R given");
    add_heat(facts, choice);
    if (species)
        add_species(facts, species);
    add_text(facts, "source of cp", "source|sources|sourceofcp", choice->source,
             species ? species->heat_reference : "");
}
