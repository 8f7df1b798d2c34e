/*
 * vessel.h - filling a rigid vessel from a line, and emptying one. (layer: core)
 *
 * Ideal-gas estimates of a well-mixed vessel. Not for relief sizing, vessel rating or minimum metal temperature: there
 * the pressure-equipment and relief codes and licensed practice decide. Filling heats the gas well above the line's
 * temperature and emptying chills it well below the start; the wall follows later, and nothing here says how far.
 *
 * Heat is positive INTO the gas.
 */
#ifndef GASLEAF_VESSEL_H
#define GASLEAF_VESSEL_H

#include <gasleaf/gas.h>
#include <gasleaf/status.h>

enum gas_wall {
    GAS_WALL_ADIABATIC,
    GAS_WALL_ISOTHERMAL, /* the gas stays at T1 */
    GAS_WALL_HEAT,       /* a given heat into the gas, J; venting: spread evenly over the fall of pressure */
    GAS_WALL_FRACTION,   /* this fraction of the heat that would keep the gas at T1 passes the wall */
    GAS_WALL_UA          /* UA in W/K over a time in which the pressure moves evenly, wall at T_wall, lumped */
};

struct gas_vessel {
    double V;      /* m3 */
    double P1, T1; /* Pa, K at the start; P1 = 0: evacuated (T1 then is only the settling temperature) */
    double P2;     /* Pa at the end */
    double T_line; /* K, filling: temperature of the line gas; kinetic energy neglected */
    enum gas_wall wall;
    double heat;             /* J into the gas, for GAS_WALL_HEAT */
    double fraction;         /* 0 (adiabatic) to 1 (isothermal), for GAS_WALL_FRACTION */
    double UA, time, T_wall; /* W/K, s, K for GAS_WALL_UA */
    double T_settled;        /* K, where the gas comes to rest; NAN: T1 */
};

struct gas_vessel_end {
    double T2;         /* K */
    double n1, n2;     /* mol */
    double moved;      /* mol in (filling) or out (venting), >= 0 */
    double P_settled;  /* Pa, after the vessel has come to T_settled; NAN when neither T_settled nor T1 is given */
    double heat;       /* J into the gas through the wall */
    double T_out_mean; /* K, venting: mixed mean temperature of what left (by enthalpy); filling: NAN */
};

/*
 * gas_fill - a rigid vessel filled to P2 from a line of steady temperature; variable cp.
 *
 *   Returned   value: T2; *end complete (all NAN unless GAS_OK)
 *   Status     GAS_NOT_FINITE, GAS_NOT_POSITIVE, GAS_NEGATIVE, GAS_NOT_A_FRACTION, GAS_NO_HEAT_CAPACITY,
 *              GAS_WRONG_SIDE      P2 below P1
 *              GAS_OUTSIDE_DATA    argument 0 and the limit as figure when it is T2 that leaves the data
 *              GAS_UNREACHABLE     so much heat that P2 is passed without any gas coming in
 *              GAS_NOT_APPLICABLE  a wall exchanging over a time with no change of pressure to spread it over
 *   Argument   1 V, 2 P1, 3 T1, 4 P2, 5 T_line, 6 wall data, 7 T_settled; 0 the gas (no heat capacity)
 *   Notes      Evacuated and adiabatic with constant k: T2 = k T_line. T1 may be NAN when evacuated, unless the wall
 *              mode refers to it. Isothermal with T_line NAN: everything but the heat, which is NAN.
 *   Method     n2 u(T2) - n1 u(T1) = (n2 - n1) h(T_line) + Q with n = P V/(R T): one bracketed root in T2. GAS_WALL_UA
 *              integrates d(n u) = h dn + UA (T_wall - T) dt with the pressure rising evenly in time, by an L-stable
 *              three-stage implicit Runge-Kutta method in 64 steps (Alexander, SIAM J. Numer. Anal. 14 (1977) 1006),
 *              which any UA from 0 to very large leaves steady; T2 to about 1e-6 of itself.
 *   Source     Sandler, Chemical, Biochemical, and Engineering Thermodynamics, ch. 3; Cengel & Boles, Thermodynamics:
 *              An Engineering Approach, ch. 5 (charging of a rigid tank)
 *   Check      tests/core/test_vessel.c
 */
struct gas_result gas_fill(const struct gas *gas, const struct gas_vessel *vessel, struct gas_vessel_end *end);

/*
 * gas_vent - a rigid vessel emptied to P2; variable cp.
 *
 *   Returned   value: T2; *end complete (all NAN unless GAS_OK)
 *   Status     as gas_fill; GAS_WRONG_SIDE: P2 above P1; GAS_UNREACHABLE: so much heat drawn out that P2 is passed
 *              without any gas leaving, or heat without a fall of pressure
 *   Argument   as gas_fill; T_line is not looked at
 *   Notes      Isothermal needs no heat capacity, and takes the heat V (P1 - P2).
 *   Method     What remains expands reversibly: n (cp dT - R T dP/P) = dQ. Adiabatic: integral of cp/T = R ln(P2/P1).
 *              Heat spread evenly over the fall of pressure: integral of cp/T = R (1 - f) ln(P2/P1), f being the
 *              heat as a fraction of V (P1 - P2): a polytrope between the adiabatic and the isothermal one.
 *              GAS_WALL_UA as in gas_fill, the pressure falling evenly in time. T_out_mean from the energy balance.
 *   Source     Moran & Shapiro, Fundamentals of Engineering Thermodynamics, ch. 4 (transient analysis)
 *   Check      tests/core/test_vessel.c
 */
struct gas_result gas_vent(const struct gas *gas, const struct gas_vessel *vessel, struct gas_vessel_end *end);

/*
 * gas_nozzle_flow - mol/s through an orifice, isentropic nozzle flow, choked where the ratio says so.
 *
 *   Given      P, T         Pa, K   upstream, at rest
 *              P_down       Pa      downstream, 0 for vacuum
 *              area         m2
 *              coefficient  of discharge, above 0 and at most 1
 *   Returned   mol/s
 *   Status     GAS_NOT_FINITE, GAS_NOT_POSITIVE, GAS_NEGATIVE, GAS_NOT_A_FRACTION, GAS_OUTSIDE_DATA,
 *              GAS_WRONG_SIDE P_down above P
 *   Argument   1 gas (no molar mass, no heat capacity), 2 P, 3 T, 4 P_down, 5 area, 6 coefficient
 *   Notes      Not for relief sizing.
 *   Method     perfect gas with gamma at T upstream
 *   Source     Shapiro, The Dynamics and Thermodynamics of Compressible Fluid Flow, vol. 1, ch. 4; NACA Report 1135
 *   Check      tests/core/test_nozzle.c
 */
struct gas_result gas_nozzle_flow(const struct gas *gas, double P, double T, double P_down, double area,
                                  double coefficient);

/*
 * gas_vent_time - time to fall from P1 to P2 through that orifice, isothermal or adiabatic vessel (gamma at T1).
 *
 *   Returned   s
 *   Status     as gas_nozzle_flow; GAS_WRONG_SIDE: P2 above P1 or below P_down; GAS_NOT_APPLICABLE: another wall mode
 *   Argument   1 V, 2 P1, 3 T1, 4 P2, 6 wall; 8 P_down, 9 area, 10 coefficient; 0 the gas
 *   Notes      The time to come down to P_down itself is finite. Not for relief sizing.
 *   Method     choked: closed form. Below: the rate of fall integrated in the square root of 1 - (P_down/P)^((k-1)/k),
 *              which takes the infinite slope at P_down out of it, by 16-point Gauss-Legendre quadrature.
 *   Source     as gas_nozzle_flow
 *   Check      tests/core/test_nozzle.c
 */
struct gas_result gas_vent_time(const struct gas *gas, const struct gas_vessel *vessel, double P_down, double area,
                                double coefficient);

#endif
