/*
 * species.h - the gases known by name, and where every figure comes from. (layer: data)
 */
#ifndef GASLEAF_SPECIES_H
#define GASLEAF_SPECIES_H

#include <stdbool.h>
#include <stddef.h>

#include <gasleaf/gas.h>
#include <gasleaf/realgas.h>

/* A publication. Rows of other tables cite one by its key, so a row can only cite a source that exists; a key reads
 * well enough to be printed beside a figure. */
struct gas_source {
    const char *key;      /* "NASA/TP-2002-211556", "Perry 8th ed. (2008) sec. 2" */
    const char *citation; /* authors, title, publisher, year */
};

struct gas_element_count {
    char symbol[3];
    double count; /* whole for compounds; dry air has fractions */
};

enum { GAS_ELEMENTS = 5 };

struct gas_species {
    const char *name;    /* "nitrogen": lower case, the trade's or IUPAC name */
    const char *formula; /* "N2" */
    const char *cas;     /* "7727-37-9", "" when none */
    const char *aliases; /* further names, separated by '|', "" when none: "steam|water vapour" */
    struct gas_element_count element[GAS_ELEMENTS];
    double molar_mass;                   /* kg/mol where a standard states it (dry air), 0: follows from the elements */
    size_t interval_count;               /* 0 where no heat capacity is known: P, V, T questions only */
    const struct gas_interval *interval; /* already in J/(mol K): multiplied by the R of the fits */
    const char *heat_source;             /* key of a gas_source, "" without a heat capacity */
    const char *heat_reference;          /* the fit's own reference note */
    double dipole;                       /* debye, NAN when unknown */
    double boiling_point;                /* K, NAN when unknown */
    struct gas_critical critical;        /* members NAN when unknown */
    const char *critical_T_source, *critical_P_source, *omega_source; /* keys of gas_source, "" when none */
    const char *boiling_point_source, *dipole_source;
};

size_t gas_species_count(void);
const struct gas_species *gas_species_at(size_t index); /* NULL past the end */

/*
 * gas_species_molar_mass - mass of one mole.
 *
 *   Returned   kg/mol
 *   Notes      Dry air: 28.9644 g/mol, the mean molar mass its standard states.
 *   Method     Sum of the standard atomic weights of the elements.
 *   Source     IUPAC standard atomic weights 2021, Pure Appl. Chem. 94 (2022) 573; US Standard Atmosphere 1976, Table 3
 *   Check      tests/data/test_species.c, molar masses
 */
double gas_species_molar_mass(const struct gas_species *species);

/*
 * gas_of_species - the species as something to compute with: R of the SI, heat capacity integrated.
 *
 *   Notes      Points into static tables: it may be copied and kept.
 */
struct gas gas_of_species(const struct gas_species *species);

/*
 * gas_species_find - by name, alias, formula, CAS number or ASHRAE 34 designation.
 *
 *   Given      text       UTF-8, need not end with 0
 *              length     bytes
 *   Returned   NULL when there is none, and for a formula that several isomers share (C2H6O, C4H8)
 *   Notes      A formula in its exact case goes first, so CO, NO and HF are what they say; then case, spaces, hyphens,
 *              brackets and subscript digits do not matter: "co" is carbon monoxide, "r 22" is R-22.
 *              Atoms (N, Cl) are found by formula in exact case alone, so "n" is nothing.
 *              Common practice: C4H10, C5H12, C8H18 mean the normal alkane, C3H6 means propylene.
 *   Check      tests/data/test_species.c, lookups
 */
const struct gas_species *gas_species_find(const char *text, size_t length);

/*
 * gas_species_nearest - species whose name, alias or formula is nearest to a misspelt text.
 *
 *   Given      text, length   as above
 *              most           room in found
 *   Returned   how many were found, nearest first; 0 when nothing is near
 *   Notes      The isomers of a shared formula are all near to it.
 *   Method     Damerau-Levenshtein distance (neighbours swapped count 1) of at most a third of the length; the
 *              beginning of a name counts 1.
 *   Source     F. J. Damerau, Commun. ACM 7 (1964) 171; V. I. Levenshtein, Sov. Phys. Dokl. 10 (1966) 707
 *   Check      tests/data/test_species.c, near misses
 */
size_t gas_species_nearest(const char *text, size_t length, const struct gas_species **found, size_t most);

/* g/mol, IUPAC 2021; D is deuterium; NAN for an element without one. */
double gas_atomic_weight(const char *symbol);

const struct gas_source *gas_source_find(const char *key); /* NULL when there is none */
size_t gas_source_count(void);
const struct gas_source *gas_source_at(size_t index); /* NULL past the end */

/* Composition of dry air, US Standard Atmosphere 1976, Table 3: fractions as listed, 3e-6 short of 1 in sum. */
struct gas_air_part {
    const char *formula;
    double fraction;
};
size_t gas_air_parts(const struct gas_air_part **parts);

/*
 * gas_standard_atmosphere_pressure - pressure of the US Standard Atmosphere 1976.
 *
 *   Given      altitude   m   geometric, above mean sea level   -500 to 20000
 *   Returned   Pa
 *   Status     GAS_NOT_FINITE, GAS_OUTSIDE_DATA   argument 1
 *   Method     Geopotential height H = r0 z/(r0 + z), r0 = 6356766 m; -6.5 K/km to 11 km, 216.65 K above.
 *   Source     US Standard Atmosphere 1976, NOAA-S/T 76-1562, equations 18, 33a, 33b
 *   Check      tests/data/test_species.c, standard atmosphere
 */
struct gas_result gas_standard_atmosphere_pressure(double altitude);

#endif
