/*
 * vessel.h - filling a rigid vessel from a line, and emptying one. (layer: core)
 *
 * Ideal-gas estimates of a well-mixed vessel. Not for relief sizing, vessel rating or minimum metal temperature.
 */
#ifndef GASLEAF_VESSEL_H
#define GASLEAF_VESSEL_H

#include <gasleaf/gas.h>
#include <gasleaf/status.h>

enum gas_wall {
    GAS_WALL_ADIABATIC,
    GAS_WALL_ISOTHERMAL,    /* the gas stays at T1 */
    GAS_WALL_HEAT,          /* a given heat into the gas, J */
    GAS_WALL_FRACTION,      /* this fraction of the adiabatic temperature change's heat is lost to the wall */
    GAS_WALL_UA             /* UA in W/K over a time, wall at T_wall, lumped */
};

struct gas_vessel {
    double V;           /* m3 */
    double P1, T1;      /* Pa, K at the start; P1 = 0: evacuated (T1 then is only the settling temperature) */
    double P2;          /* Pa at the end */
    double T_line;      /* K, filling: temperature of the line gas; kinetic energy neglected */
    enum gas_wall wall;
    double heat;        /* J into the gas, for GAS_WALL_HEAT */
    double fraction;    /* for GAS_WALL_FRACTION */
    double UA, time, T_wall; /* W/K, s, K for GAS_WALL_UA */
    double T_settled;   /* K, where the gas comes to rest; NAN: T1 */
};

struct gas_vessel_end {
    double T2;          /* K */
    double n1, n2;      /* mol */
    double moved;       /* mol in (filling) or out (venting), >= 0 */
    double P_settled;   /* Pa, after the vessel has come to T_settled */
    double heat;        /* J into the gas through the wall */
    double T_out_mean;  /* K, venting: mixed mean temperature of what left (by enthalpy) */
};

/* Argument of a bad result: 1 V, 2 P1, 3 T1, 4 P2, 5 T_line, 6 wall data, 7 T_settled. */
struct gas_result gas_fill(const struct gas *gas, const struct gas_vessel *vessel, struct gas_vessel_end *end);
struct gas_result gas_vent(const struct gas *gas, const struct gas_vessel *vessel, struct gas_vessel_end *end);

/*
 * gas_nozzle_flow - mol/s through an orifice, isentropic nozzle flow, choked where the ratio says so.
 *   Given   P, T upstream; P_down; area m2; coefficient of discharge (0 to 1]
 *   Method  perfect gas with gamma at T upstream.
 */
struct gas_result gas_nozzle_flow(const struct gas *gas, double P, double T, double P_down, double area,
                                  double coefficient);

/* gas_vent_time - s to fall from P1 to P2 through that orifice, isothermal or adiabatic vessel (gamma at T1). */
struct gas_result gas_vent_time(const struct gas *gas, const struct gas_vessel *vessel, double P_down, double area,
                                double coefficient);

#endif
