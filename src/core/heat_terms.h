/*
 * heat_terms.h - one temperature interval of a heat capacity: its value and its two integrals. (layer: core, internal)
 *
 * Both integrals want 0 < T1 < T2 inside the interval; heat.c sees to it. A term that has no value there (a ratio
 * over its pole, an exponent that is not whole) answers NAN.
 */
#ifndef CORE_HEAT_TERMS_H
#define CORE_HEAT_TERMS_H

#include <gasleaf/gas.h>

double gas_interval_cp(const struct gas_interval *interval, double T);             /* J/(mol K) */
double gas_interval_dh(const struct gas_interval *interval, double T1, double T2); /* integral of cp dT, J/mol */
double gas_interval_ds(const struct gas_interval *interval, double T1, double T2); /* integral of cp/T dT, J/(mol K) */

#endif
