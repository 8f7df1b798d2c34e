/*
 * gases.h - how the tables of gases are written. (layer: data, internal)
 *
 * A gas is one block FIT ... and one row in the gases_*.c of its family. Rows cite sources by the names in sources.h.
 */
#ifndef DATA_GASES_H
#define DATA_GASES_H

#include <math.h>

#include <gasleaf/species.h>

#include "sources.h"

struct gas_family {
    size_t count;
    const struct gas_species *species;
};

extern const struct gas_family gas_family_elements, gas_family_inorganic, gas_family_hydrocarbons, gas_family_organic,
    gas_family_halocarbons, gas_family_electronics, gas_family_radicals;

/* clang-format off */
#define FIT_R 8.314510 /* J/(mol K): the R the fits were made with, CODATA 1986 */

/* One interval: from, to in K, then the constants of cp/R as printed, those of T^-2 to T^4. */
#define FIT(from, to, a1, a2, a3, a4, a5, a6, a7)                                                                     \
    {from, to, {FIT_R * (a1), FIT_R * (a2), FIT_R * (a3), FIT_R * (a4), FIT_R * (a5), FIT_R * (a6), FIT_R * (a7)}, 0, NULL}

/* The fit of a row, with the reference note the set prints beside it. */
#define HEAT(fit, note)                                                                                               \
    .interval_count = sizeof(fit) / sizeof((fit)[0]), .interval = (fit), .heat_source = NASA_GLENN, .heat_reference = (note)
#define NO_HEAT .interval_count = 0, .interval = NULL, .heat_source = NONE, .heat_reference = ""

#define BOILS(T, source)   .boiling_point = (T), .boiling_point_source = (source)     /* K at 101.325 kPa */
#define DIPOLE(mu, source) .dipole = (mu), .dipole_source = (source)                  /* debye */
#define CRITICAL(Tc, T_source, Pc, P_source, w, w_source)                             /* K, Pa, - */                  \
    .critical = {(Tc), (Pc), (w)}, .critical_T_source = (T_source), .critical_P_source = (P_source), .omega_source = (w_source)
/* clang-format on */

#endif
