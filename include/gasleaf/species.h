/*
 * species.h - the gases known by name, and where every figure comes from. (layer: data)
 */
#ifndef GASLEAF_SPECIES_H
#define GASLEAF_SPECIES_H

#include <stdbool.h>
#include <stddef.h>

#include <gasleaf/gas.h>
#include <gasleaf/realgas.h>

/* A publication. Rows of other tables cite one by its key, so a row can only cite a source that exists. */
struct gas_source {
    const char *key;      /* "NASA-TP-2002-211556" */
    const char *citation; /* authors, title, publisher, year */
};

struct gas_element_count {
    char symbol[3];
    double count; /* whole for compounds; dry air has fractions */
};

enum { GAS_ELEMENTS = 5 };

struct gas_species {
    const char *name;     /* "nitrogen": lower case, the trade's or IUPAC name */
    const char *formula;  /* "N2" */
    const char *cas;      /* "7727-37-9", "" when none */
    const char *aliases;  /* further names, separated by '|', "" when none: "steam|water vapour" */
    struct gas_element_count element[GAS_ELEMENTS];
    size_t interval_count;
    const struct gas_interval *interval; /* already in J/(mol K): multiplied by the R of the fits */
    const char *heat_source;             /* key of a gas_source */
    const char *heat_reference;          /* the fit's own reference note */
    double dipole;                       /* debye, NAN when unknown */
    double boiling_point;                /* K, NAN when unknown */
    struct gas_critical critical;        /* members NAN when unknown */
    const char *critical_T_source, *critical_P_source, *omega_source; /* citations as printed, "" when none */
};

size_t gas_species_count(void);
const struct gas_species *gas_species_at(size_t index);

/* kg/mol, from the IUPAC standard atomic weights (2021) of its elements; dry air from its composition. */
double gas_species_molar_mass(const struct gas_species *species);

/* The species as something to compute with. */
struct gas gas_of_species(const struct gas_species *species);

/*
 * gas_species_find - by name, alias, formula, CAS number or ASHRAE designation; case, spaces, hyphens and subscript
 * digits do not matter ("co" is carbon monoxide: formulas are tried in their exact case first).
 *   Returned  NULL when there is none.
 */
const struct gas_species *gas_species_find(const char *text, size_t length);

/* gas_species_nearest - up to `most` species whose name or formula is nearest to a misspelt text; returns how many. */
size_t gas_species_nearest(const char *text, size_t length, const struct gas_species **found, size_t most);

/* g/mol, NAN for an element without one. */
double gas_atomic_weight(const char *symbol);

const struct gas_source *gas_source_find(const char *key);
size_t gas_source_count(void);
const struct gas_source *gas_source_at(size_t index);

/* Composition of dry air (mole fractions), US Standard Atmosphere 1976. */
struct gas_air_part {
    const char *formula;
    double fraction;
};
size_t gas_air_parts(const struct gas_air_part **parts);

/* US Standard Atmosphere 1976, troposphere and lower stratosphere: Pa at a geometric altitude in m (-500 to 20000). */
struct gas_result gas_standard_atmosphere_pressure(double altitude);

#endif
