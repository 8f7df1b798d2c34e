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

/*
 * gas_cp, gas_cv, gas_gamma - heat capacity at constant pressure, at constant volume, and their ratio.
 *
 *   Given      gas             with a heat capacity
 *              T       K       inside its range (1e-9 relative beyond the ends is let pass, for converted figures)
 *   Returned   J/(mol K), J/(mol K), -
 *   Status     GAS_NO_HEAT_CAPACITY  argument 1
 *              GAS_NOT_FINITE, GAS_NOT_POSITIVE, GAS_OUTSIDE_DATA  argument 2, figure T
 *              GAS_NOT_POSITIVE  argument 1, figure cv: a written cp at or below R has no ratio (gas_gamma only)
 *   Notes      cv = cp - R with the R of the gas. On a join the colder interval counts.
 *   Method     Horner's scheme on the dense powers, then the further terms; hyperbolic terms through e^(-2x), so that
 *              nothing overflows when the gas is cold.
 *   Source     Aly & Lee, Fluid Phase Equilib. 6 (1981) 169; Wilhoit, TRC Current Data News 3 (1975) 2;
 *              McBride, Zehe & Gordon, NASA/TP-2002-211556 (2002)
 *   Check      tests/core/test_heat.c, heat capacities
 */
struct gas_result gas_cp(const struct gas *gas, double T);
struct gas_result gas_cv(const struct gas *gas, double T);
struct gas_result gas_gamma(const struct gas *gas, double T);

/*
 * gas_dh, gas_du - change of enthalpy, of internal energy: integral of cp dT, of cv dT.
 * gas_ds_isobaric, gas_ds_isochoric - change of entropy: integral of cp/T dT, of cv/T dT.
 *
 *   Given      gas             with a heat capacity
 *              T1, T2  K       start, end, inside its range
 *   Returned   J/mol, J/(mol K); negative on cooling, exactly 0 for T2 = T1, exactly opposite when the ends are swapped
 *   Status     as gas_cp, argument 2 for T1, 3 for T2
 *   Notes      The rule of the gas may replace cp by a constant between T1 and T2 (enum gas_cp_rule).
 *   Method     T2^k - T1^k with T2 - T1 taken out, logarithms by log1p, coth and tanh through the difference of their
 *              arguments, ratio terms by recurrence or, for T below 2/3 of the scale, by series: a step of 1e-9 keeps
 *              12 digits. Summed interval by interval.
 *   Source     as gas_cp; the integrals of ratio terms: heat_terms.c
 *   Check      tests/core/test_heat.c, against GSL quadrature to 1e-11
 */
struct gas_result gas_dh(const struct gas *gas, double T1, double T2);
struct gas_result gas_du(const struct gas *gas, double T1, double T2);
struct gas_result gas_ds_isobaric(const struct gas *gas, double T1, double T2);
struct gas_result gas_ds_isochoric(const struct gas *gas, double T1, double T2);

/*
 * gas_ds - change of entropy between two states: integral of cp/T dT - R ln(P2/P1).
 *
 *   Given      T1, T2  K       inside the range of the gas
 *              P1, P2  Pa      absolute, > 0
 *   Returned   J/(mol K)
 *   Status     as gas_cp; argument 2 T1, 3 P1, 4 T2, 5 P2, the first offender in this order
 *   Check      tests/core/test_heat.c, splits and reversals
 */
struct gas_result gas_ds(const struct gas *gas, double T1, double P1, double T2, double P2);

/* gas_cp_mean - dh/(T2 - T1), J/(mol K); cp(T1) when they are equal. Status as gas_dh.  Check: test_heat.c */
struct gas_result gas_cp_mean(const struct gas *gas, double T1, double T2);

/*
 * gas_T_after_dh, _du, _ds_isobaric, _ds_isochoric - the end temperature of a given change.
 *
 *   Given      T1      K                   start, inside the range
 *              dh, du  J/mol               change from T1 on
 *              ds      J/(mol K)           change from T1 on
 *   Returned   K, to 1e-12 relative; exactly T1 for a change of 0
 *   Status     as gas_cp for T1 (argument 2); GAS_NOT_FINITE argument 3
 *              GAS_OUTSIDE_DATA  argument 0, figure: the end of the range it lies beyond
 *              GAS_UNREACHABLE   argument 0: below 0 K, or past 1e12 K, for a gas whose range has no end
 *              GAS_NO_CONVERGENCE
 *   Method     Newton, in ln T for entropies, halving whenever it leaves the bracket; the secant under a mean-cp rule.
 *   Check      tests/core/test_heat.c, inverses
 */
struct gas_result gas_T_after_dh(const struct gas *gas, double T1, double dh);
struct gas_result gas_T_after_du(const struct gas *gas, double T1, double du);
struct gas_result gas_T_after_ds_isobaric(const struct gas *gas, double T1, double ds);
struct gas_result gas_T_after_ds_isochoric(const struct gas *gas, double T1, double ds);

#endif
