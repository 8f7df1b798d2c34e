/*
 * realgas.h - how far the ideal gas is off: Lee-Kesler compressibility and vapour pressure. (layer: core)
 *
 * An estimate for normal fluids, good to some per cent; poorer for strongly polar gases, for hydrogen and helium, and
 * close to the critical point. It serves to say whether P V = n R T is good enough, not to replace an equation of
 * state.
 *
 *   Source  Lee & Kesler, AIChE Journal 21 (1975) 510
 *   Check   tests/core/test_realgas.c
 */
#ifndef GASLEAF_REALGAS_H
#define GASLEAF_REALGAS_H

#include <stddef.h>

#include <gasleaf/status.h>

struct gas_critical {
    double T;     /* K */
    double P;     /* Pa */
    double omega; /* acentric factor */
};

/*
 * gas_z_reduced - compressibility factor of a fluid from its reduced temperature, pressure and acentric factor.
 *
 *   Given      Tr      T/Tc   0.3 to 4
 *              Pr      P/Pc   0 to 10
 *              omega   acentric factor, -1 to 2
 *   Returned   Z = Z0 + (omega/0.3978)(Zr - Z0); exactly 1 at Pr = 0
 *   Status     GAS_NOT_FINITE, GAS_NEGATIVE (Pr), GAS_OUTSIDE_DATA; argument 1 Tr, 2 Pr, 3 omega
 *   Notes      The vapour root where two exist, also somewhat above the vapour pressure, where it is that of a
 *              supersaturated vapour: ask gas_reduced_vapour_pressure whether there still is a gas. Further up, where
 *              one of the two fluids has no vapour root left, the liquid root of both. The other way round, below the
 *              vapour pressure of the fluid itself, a fluid of the pair that has no vapour root stays at the
 *              turning point of its isotherm (this concerns small omega, near Tr = 0.98).
 *   Method     Newton in reduced density from the ideal gas, which runs monotonically into the vapour root below
 *              Tr = 1 because the isotherm is concave there; bracketed elsewhere.
 */
struct gas_result gas_z_reduced(double Tr, double Pr, double omega);

/* gas_z0, gas_z1 - simple-fluid and deviation parts, as tabulated: Z = Z0 + omega Z1. Same range, roots and status. */
struct gas_result gas_z0(double Tr, double Pr);
struct gas_result gas_z1(double Tr, double Pr);

/*
 * gas_reduced_vapour_pressure - Psat/Pc at Tr, 0.3 to 1, for an acentric factor (-1 to 2); Lee and Kesler's eqs 15-17.
 *
 *   Status     GAS_NOT_FINITE, GAS_OUTSIDE_DATA; argument 1 Tr, 2 omega
 */
struct gas_result gas_reduced_vapour_pressure(double Tr, double omega);

/*
 * gas_critical_kay, gas_critical_lee_kesler - pseudo-critical constants of a mixture by Kay's rule (mole-fraction
 * means) or by Lee and Kesler's own (their eqs 20-25).
 *
 *   Given      part[count], x[count]  constants and amounts; x is scaled to add to 1
 *   Returned   all NAN when count is 0, an x is negative or not finite, all are 0, or a constant cannot be used
 *   Notes      Parts with x = 0 are not looked at. One part alone comes back unchanged.
 */
struct gas_critical gas_critical_kay(const struct gas_critical *part, const double *x, size_t count);
struct gas_critical gas_critical_lee_kesler(const struct gas_critical *part, const double *x, size_t count);

/*
 * gas_ideal_up_to - the pressure (Pa) up to which |Z - 1| <= tolerance at T, counting up from vacuum.
 *
 *   Returned   status GAS_OK with value NAN when no such limit exists below Pr = 10; never above the vapour pressure,
 *              where the gas condenses
 *   Status     GAS_NOT_FINITE, GAS_NOT_POSITIVE, GAS_OUTSIDE_DATA; argument 1 critical, 2 T, 3 tolerance
 *   Method     the first crossing on a grid of 100 steps in Pr, then a bracketed root
 */
struct gas_result gas_ideal_up_to(const struct gas_critical *critical, double T, double tolerance);

#endif
