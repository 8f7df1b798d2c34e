/*
 * estimate.h - how real a chosen gas is: its critical constants, those of a mixture, and an estimate of Z.
 *
 * Lee and Kesler's correlation with, for mixtures, their own pseudo-critical constants (AIChE Journal 21 (1975) 510).
 */
#ifndef SHEET_ESTIMATE_H
#define SHEET_ESTIMATE_H

#include <gasleaf/realgas.h>

#include "sheet/gas_choice.h"

/*
 * gas_critical_of - the critical or pseudo-critical constants of a chosen gas.
 *
 *   Returned   NULL, or the name of a part whose constants are not known (critical then is all NAN)
 */
const char *gas_critical_of(const struct gas_choice *choice, struct gas_critical *critical);

/* gas_estimated_Z - argument 1 T, 2 P where a status is not GAS_OK. */
struct gas_result gas_estimated_Z(const struct gas_critical *critical, double T, double P);

/* What could condense: the part whose partial pressure is highest against its vapour pressure at T. */
struct gas_condensing {
    const struct gas_part *part; /* NULL: nothing can condense at T */
    double partial, vapour;      /* Pa; vapour is an upper bound below 0.3 Tc */
    double load;                 /* sum over all parts of partial over vapour pressure: 1 is the dew point (Raoult) */
};
struct gas_condensing gas_condensing_of(const struct gas_choice *choice, double T, double P);

/* gas_rough_part - a part, a tenth of the gas or more, for which the correlation is weak; *why then says so. NULL:
 * none. */
const struct gas_part *gas_rough_part(const struct gas_choice *choice, const char **why);

#endif
