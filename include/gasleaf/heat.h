/*
 * heat.h - heat capacities, their integrals and the inverses. (layer: core)
 *
 * All per mole. h and u depend on T alone; s also on pressure. Every change is computed as a difference of powers in
 * factored form, interval by interval, so that digits survive when T2 is near T1 and no formation offset is involved.
 * Temperatures outside the data give GAS_OUTSIDE_DATA with the argument's position and the temperature as figure.
 */
#ifndef GASLEAF_HEAT_H
#define GASLEAF_HEAT_H

#include <gasleaf/gas.h>
#include <gasleaf/status.h>

struct gas_range {
    double T_from, T_to; /* K */
};

/* gas_range_of - the temperatures the heat capacity is known for; {NAN, NAN} when none is. */
struct gas_range gas_range_of(const struct gas *gas);

struct gas_result gas_cp(const struct gas *gas, double T);    /* J/(mol K) */
struct gas_result gas_cv(const struct gas *gas, double T);    /* J/(mol K), cp - R */
struct gas_result gas_gamma(const struct gas *gas, double T); /* cp/cv */

/* Changes from T1 to T2, J/mol and J/(mol K). gas_ds_isobaric is the integral of cp/T, gas_ds_isochoric of cv/T. */
struct gas_result gas_dh(const struct gas *gas, double T1, double T2);
struct gas_result gas_du(const struct gas *gas, double T1, double T2);
struct gas_result gas_ds_isobaric(const struct gas *gas, double T1, double T2);
struct gas_result gas_ds_isochoric(const struct gas *gas, double T1, double T2);
struct gas_result gas_ds(const struct gas *gas, double T1, double P1, double T2, double P2);
struct gas_result gas_cp_mean(const struct gas *gas, double T1, double T2); /* dh/(T2 - T1), cp(T1) when equal */

/* Inverses: the end temperature T2, to 1e-12 relative. An answer outside the data is GAS_OUTSIDE_DATA with the
 * nearest limit as figure and argument 0. */
struct gas_result gas_T_after_dh(const struct gas *gas, double T1, double dh);
struct gas_result gas_T_after_du(const struct gas *gas, double T1, double du);
struct gas_result gas_T_after_ds_isobaric(const struct gas *gas, double T1, double ds);
struct gas_result gas_T_after_ds_isochoric(const struct gas *gas, double T1, double ds);

#endif
