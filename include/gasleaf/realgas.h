/*
 * realgas.h - how far the ideal gas is off: Lee-Kesler compressibility and vapour pressure. (layer: core)
 *
 *   Source  Lee & Kesler, AIChE Journal 21 (1975) 510
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

/* Reduced form: Z at Tr, Pr and acentric factor; the vapour root where two exist.
 * Status GAS_OUTSIDE_DATA outside 0.3 <= Tr <= 4, 0 <= Pr <= 10 (argument 1 or 2). */
struct gas_result gas_z_reduced(double Tr, double Pr, double omega);
/* Simple-fluid and deviation parts, as tabulated: Z = Z0 + omega Z1. */
struct gas_result gas_z0(double Tr, double Pr);
struct gas_result gas_z1(double Tr, double Pr);
/* Reduced vapour pressure, 0.3 <= Tr <= 1. */
struct gas_result gas_reduced_vapour_pressure(double Tr, double omega);
/* Pseudo-critical constants of a mixture by Kay's rule or by Lee and Kesler's own (their eqs 20-25). */
struct gas_critical gas_critical_kay(const struct gas_critical *part, const double *x, size_t count);
struct gas_critical gas_critical_lee_kesler(const struct gas_critical *part, const double *x, size_t count);
/* The pressure (Pa) up to which |Z - 1| <= tolerance at T; NAN when no such limit exists below Pr = 10. */
struct gas_result gas_ideal_up_to(const struct gas_critical *critical, double T, double tolerance);

#endif
