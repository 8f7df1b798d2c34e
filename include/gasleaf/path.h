/*
 * path.h - work and heat along a path of legs. (layer: core)
 *
 * Sign: W and Q are positive INTO the gas, everywhere in core. All figures are per mole; the caller multiplies by the
 * amount. In a closed system W is the boundary work, -integral of P dV, and Q + W = dU; in steady flow W is the shaft
 * work, integral of V dP, and Q + W = dH (kinetic and potential energy neglected).
 */
#ifndef GASLEAF_PATH_H
#define GASLEAF_PATH_H

#include <stddef.h>

#include <gasleaf/gas.h>
#include <gasleaf/status.h>

struct gas_point {
    double P; /* Pa */
    double T; /* K */
    double v; /* m3/mol */
};

enum gas_system { GAS_CLOSED, GAS_FLOW };

enum gas_process {
    GAS_ISOTHERMAL,
    GAS_ISOBARIC,
    GAS_ISOCHORIC,
    GAS_ADIABATIC,      /* reversible, or with an isentropic efficiency below 1 */
    GAS_POLYTROPIC,     /* P v^n constant, or with a polytropic efficiency when n is NAN (flow) */
    GAS_FREE_EXPANSION, /* against nothing: W = Q = 0 */
    GAS_AGAINST,        /* constant outside pressure, adiabatic */
    GAS_AGAINST_ISOTHERMAL,
    GAS_STRAIGHT,          /* straight line in P-v */
    GAS_THROUGH_POINTS,    /* straight between given points: trapezoids */
    GAS_THROUGH_POLYTROPES /* P v^n between given points, n of each stretch from its two ends */
};

enum gas_ending {
    GAS_TO_P,         /* Pa */
    GAS_TO_T,         /* K */
    GAS_TO_V,         /* m3/mol */
    GAS_BY_P_RATIO,   /* P2/P1 */
    GAS_BY_V_RATIO,   /* V2/V1 */
    GAS_BY_T_RATIO,   /* T2/T1 */
    GAS_WITH_Q,       /* J/mol into the gas */
    GAS_WITH_W,       /* J/mol into the gas */
    GAS_TO_START,     /* back to the start of the path: P, T, v as far as the process can */
    GAS_TO_P_AND_V,   /* straight lines: value = P, second = v */
    GAS_TO_BALANCE,   /* against an outside pressure: until the gas pressure equals it */
    GAS_TO_LAST_POINT /* the two GAS_THROUGH processes: the points say where the leg ends; value is not read */
};

struct gas_leg {
    enum gas_process process;
    enum gas_ending ending;
    double value;                  /* figure of the ending */
    double second;                 /* v of GAS_TO_P_AND_V */
    double n;                      /* polytropic exponent; NAN when not used */
    double efficiency;             /* 1: reversible; isentropic for GAS_ADIABATIC, polytropic for GAS_POLYTROPIC */
    double P_outside;              /* Pa, for the two GAS_AGAINST processes */
    size_t point_count;            /* for the two GAS_THROUGH processes; at least 2 */
    const struct gas_point *point; /* P and v used. The first point is the start of the leg: volumes count relative to
                                      its v, so totals serve as well as molar ones; its P must be the start's within
                                      0.1 %, and the leg begins at the start itself */
};

struct gas_change {
    struct gas_point end;
    double W, Q;            /* J/mol into the gas */
    double dU, dH;          /* J/mol */
    double dS;              /* J/(mol K), of the gas */
    double S_made;          /* J/(mol K), >= 0: 0 where reversible; dS where adiabatic; dS - Q/T where isothermal */
    double Q_in, Q_out;     /* J/mol, both >= 0, Q = Q_in - Q_out; split where the heat changes sign within a leg */
    double v_least, v_most; /* m3/mol, reached on the way, ends included */
};

/* gas_point_from - the third of P, T, v from the other two (NAN marks the unknown one). */
struct gas_result gas_point_complete(const struct gas *gas, struct gas_point *point);

/*
 * gas_leg_run - one leg from `start`.
 *
 *   Given      path_start   where the whole path began, for GAS_TO_START
 *   Returned   value: W in J/mol; *change complete
 *   Status     GAS_UNREACHABLE     the ending cannot be met by this process (figure: the ending's figure)
 *              GAS_NOT_APPLICABLE  ending or efficiency that makes no sense here
 *              GAS_WRONG_SIDE      outside pressure on the wrong side of the ending
 *              GAS_OUTSIDE_DATA    the end temperature leaves the data (figure: temperature)
 *              GAS_NOT_POSITIVE, GAS_NOT_FINITE, GAS_NOT_A_FRACTION
 *   Argument   1 start, 2 ending value, 3 n, 4 efficiency, 5 outside pressure, 6 points
 *   Notes      The law holds by construction: Q = dU - W (closed) or dH - W (flow).
 */
struct gas_result gas_leg_run(const struct gas *gas, enum gas_system system, const struct gas_point *start,
                              const struct gas_point *path_start, const struct gas_leg *leg, struct gas_change *change);

/*
 * gas_leg_at - the state at a fraction (0 to 1) along a leg that has been run, equal steps in the variable that moves
 * (v, or P where v does not change); fraction 1 is exactly the end. For charts.
 */
struct gas_result gas_leg_at(const struct gas *gas, enum gas_system system, const struct gas_point *start,
                             const struct gas_leg *leg, const struct gas_change *change, double fraction,
                             struct gas_point *at);

/* A path: legs in order; changes[i] is leg i, total adds them (total.end is the end of the last leg). On failure the
 * argument is the leg's number, from 1, and *fault the leg's own result. */
struct gas_result gas_path_run(const struct gas *gas, enum gas_system system, const struct gas_point *start,
                               const struct gas_leg *legs, size_t count, struct gas_change *changes,
                               struct gas_change *total, struct gas_result *fault);

/* A cycle's figures, per mole, from the legs of a closed path. */
struct gas_cycle {
    double W_net;                    /* J/mol into the gas: negative for an engine */
    double Q_in, Q_out;              /* J/mol, both >= 0: sums of the legs' positive and negative heats */
    double efficiency;               /* -W_net/Q_in; NAN unless W_net < 0 */
    double cop_heating, cop_cooling; /* Q_out/W_net, Q_in/W_net; NAN unless W_net > 0 */
    double mep;                      /* |W_net| / (v_max - v_min), Pa */
    double gap_P, gap_T, gap_v;      /* end less start, relative to the start */
};
/* Status GAS_CONTRADICTION when the gap exceeds `closes_within` (relative; 1e-6): *cycle is filled nevertheless. */
struct gas_result gas_cycle_of(const struct gas_point *start, const struct gas_change *changes, size_t count,
                               double closes_within, struct gas_cycle *cycle);

#endif
