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
    int count;           /* number of stages; 0: as few as keep every stage at or below ratio_limit */
    double ratio_limit;  /* used when count is 0, > 1 */
    int ratio_count;     /* 0: equal ratios; else `ratio` holds one per stage, scaled to reach P2 */
    double ratio[GAS_STAGES_MAX];
    enum gas_stage_efficiency kind;
    double efficiency;   /* > 0, <= 1 */
    double T_cool;       /* K, after each intercooler; NAN: no intercooling */
    double P_drop;       /* Pa lost in each intercooler */
    double P_drop_fraction; /* of the stage's discharge pressure; 0 unless given instead of P_drop */
    int aftercooler;     /* 1: the last stage is cooled to T_cool too */
    double drive;        /* drive efficiency: shaft power / input power, > 0, <= 1 */
};

struct gas_stage {
    double P_in, P_out, T_in, T_out; /* Pa, K; T_out before cooling */
    double ratio;
    double work;     /* J/mol into the gas (shaft) */
    double cooling;  /* J/mol out of the gas in the cooler behind this stage */
};

struct gas_staged {
    int count;
    struct gas_stage stage[GAS_STAGES_MAX];
    double work, cooling;    /* totals, J/mol */
    double input;            /* work / drive */
    double single_work;      /* one stage over the whole ratio with the same efficiency, J/mol; NAN when that leaves
                                the data */
};

/*
 * gas_stages_run - stage pressures, temperatures, work and duties from P1, T1 to P2.
 *
 *   Status  GAS_NOT_POSITIVE, GAS_NOT_A_FRACTION, GAS_UNREACHABLE (P2 not above P1, or drops eat the ratio),
 *           GAS_TOO_MANY (count above GAS_STAGES_MAX), GAS_OUTSIDE_DATA
 *   Argument 1 P1, 2 T1, 3 P2, 4 count, 5 ratio, 6 efficiency, 7 T_cool, 8 P_drop, 9 drive
 *   Notes   Ratios are equal per stage such that P2 is met with the drops taken out.
 */
struct gas_result gas_stages_run(const struct gas *gas, double P1, double T1, double P2,
                                 const struct gas_staging *staging, struct gas_staged *staged);

#endif
