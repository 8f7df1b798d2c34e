/*
 * stages.h - staged compression with intercooling. (layer: core)
 *
 * Steady flow, per mole of gas; work into the gas positive, cooler duty positive OUT of the gas (a duty).
 */
#ifndef GASLEAF_STAGES_H
#define GASLEAF_STAGES_H

#include <stddef.h>

#include <gasleaf/gas.h>
#include <gasleaf/status.h>

enum { GAS_STAGES_MAX = 20 };

enum gas_stage_efficiency { GAS_ISENTROPIC_EFFICIENCY, GAS_POLYTROPIC_EFFICIENCY, GAS_ISOTHERMAL_EFFICIENCY };

struct gas_staging {
    int count;          /* number of stages; 0: as few as keep every stage at or below ratio_limit, or ratio_count */
    double ratio_limit; /* used when count and ratio_count are 0, > 1 */
    int ratio_count;    /* 0: equal ratios; else `ratio` holds one per stage, scaled by one factor to reach P2 */
    double ratio[GAS_STAGES_MAX];
    enum gas_stage_efficiency kind;
    double efficiency;      /* > 0, <= 1 */
    double T_cool;          /* K, after each intercooler; NAN: no intercooling */
    double P_drop;          /* Pa lost between two stages */
    double P_drop_fraction; /* of the stage's discharge pressure; 0 unless given instead of P_drop */
    int aftercooler;        /* 1: the last stage is cooled to T_cool too */
    double drive;           /* drive efficiency: shaft power / input power, > 0, <= 1 */
};

struct gas_stage {
    double P_in, P_out, T_in, T_out; /* Pa, K; T_out before cooling */
    double ratio;
    double work;    /* J/mol into the gas (shaft) */
    double cooling; /* J/mol out of the gas in the cooler behind this stage */
};

struct gas_staged {
    int count;
    struct gas_stage stage[GAS_STAGES_MAX];
    double work, cooling; /* totals, J/mol */
    double input;         /* work / drive */
    double single_work;   /* one stage over the whole ratio with the same efficiency, J/mol; NAN when that leaves
                             the data */
};

/*
 * gas_stages_run - stage pressures, temperatures, work and duties from P1, T1 to P2.
 *
 *   Given      P1, T1   Pa, K   suction of the first stage
 *              P2       Pa      discharge of the last stage; an aftercooler's own drop is not counted
 *   Returned   value: total work in J/mol; *staged complete (all NAN and no stages unless GAS_OK)
 *   Status     GAS_NOT_FINITE, GAS_NOT_POSITIVE, GAS_NEGATIVE, GAS_NOT_A_FRACTION, GAS_OUTSIDE_DATA,
 *              GAS_UNREACHABLE    P2 not above P1; a limit not above 1; a scaled ratio not above 1; a drop that
 *                                 takes a stage's whole rise
 *              GAS_TOO_MANY       more than GAS_STAGES_MAX stages asked or needed
 *              GAS_CONTRADICTION  ratios not one per stage; a drop both in Pa and as a fraction
 *   Argument   1 P1, 2 T1, 3 P2, 4 count, 5 ratio or ratio_limit, 6 efficiency, 7 T_cool, 8 drop, 9 drive;
 *              0 a discharge temperature outside the data (figure: the limit it passed)
 *   Notes      Ratios are equal per stage such that P2 is met with the drops taken out. Drops count between stages
 *              also where nothing cools. A cooler never heats: gas that comes colder than T_cool passes unchanged.
 *              T_cool may lie below T1. A stage is adiabatic whatever its efficiency is measured against, so its work
 *              is the rise of enthalpy: work - cooling = dh, first suction to the end.
 *   Method     isentropic: integral of cp/T = R ln r, then dh/efficiency; polytropic (small-stage): integral of cp/T
 *              = (R/efficiency) ln r; isothermal: work = R T ln r / efficiency. cp varies with T throughout.
 *   Source     Moran & Shapiro, Fundamentals of Engineering Thermodynamics, ch. 6 and 9; Cengel & Boles,
 *              Thermodynamics: An Engineering Approach, ch. 7 (multistage compression with intercooling)
 *   Check      tests/core/test_stages.c
 */
struct gas_result gas_stages_run(const struct gas *gas, double P1, double T1, double P2,
                                 const struct gas_staging *staging, struct gas_staged *staged);

#endif
