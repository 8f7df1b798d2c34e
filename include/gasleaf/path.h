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

/*
 * gas_point_complete - the third of P, T, v from the other two; NAN marks the unknown one.
 *
 *   Given      gas     its R alone is used
 *              *point  two or three figures, > 0
 *   Returned   the figure found (P when all three were given); *point complete
 *   Status     GAS_NOT_POSITIVE, GAS_NOT_FINITE  argument 1 P, 2 T, 3 v
 *              GAS_UNDETERMINED   two unknown
 *              GAS_CONTRADICTION  three given, P v and R T more than 1e-6 apart
 *   Check      tests/core/test_leg_refusals.c; every leg of test_path.c starts with it
 */
struct gas_result gas_point_complete(const struct gas *gas, struct gas_point *point);

/*
 * gas_leg_run - one leg from `start`.
 *
 *   Given      start        two or three of P, T, v (gas_point_complete)
 *              path_start   where the whole path began, for GAS_TO_START; NULL where no leg ends so
 *              leg          efficiency 1 (or NAN) where the process has none; n NAN where it has none
 *   Returned   value: W in J/mol; *change complete
 *   Status     GAS_UNREACHABLE     the ending cannot be met by this process (figure: the ending's figure; the figure
 *                                  of the path's start that is missed)
 *              GAS_UNDETERMINED    the ending asks for what the process holds fixed anyway (isobaric to its own
 *                                  pressure): the leg could end anywhere. Also a table of fewer than two points
 *              GAS_NOT_APPLICABLE  ending, efficiency or system (argument 0) that makes no sense here
 *              GAS_WRONG_SIDE      the gas cannot get there, or not past its balance, against this outside pressure
 *              GAS_OUTSIDE_DATA    a temperature leaves the data (figure: temperature, or the end of the data)
 *              GAS_CONTRADICTION   start at odds with itself; first point at odds with the start
 *              GAS_NOT_POSITIVE, GAS_NEGATIVE, GAS_NOT_FINITE, GAS_NOT_A_FRACTION, GAS_NO_HEAT_CAPACITY
 *   Argument   0 gas or system, 1 start, 2 ending value, 3 n, 4 efficiency, 5 outside pressure, 6 points
 *   Notes      The law holds by construction: Q = dU - W (closed) or dH - W (flow); adiabatic legs have Q = 0 exactly.
 *              A gas without heat capacity still has its work where the end follows from P, T and v: dU, dH, dS and Q
 *              are then NAN unless the temperature stays.
 *              Isentropic efficiency: ideal work / work in compression, work / ideal work in expansion, the ideal leg
 *              ending at the same pressure; in a closed system ended by its volume, at the same volume.
 *              Free expansion in flow is a throttle. Legs against an outside pressure are closed systems only.
 *              A polytropic leg with a given heat ends at the nearest place that takes it, sought first where the
 *              heat begins with the right sign (the heat turns round where cv = R/(n - 1)).
 *              Q_in and Q_out are NAN where the heat changes its sign and the temperature leaves the data on the way.
 *   Method     With ln v, ln P, ln T of the end against the start, P v^n legs have W = -P1 v1 ln_v (e^ln_T - 1)/ln_T
 *              closed and P1 v1 ln_P (e^ln_T - 1)/ln_T in flow, by expm1 and log1p, for every n alike. Isentropic
 *              ends by the entropy integral of cp/T; polytropic efficiency e: cp dT/T = R dP/P / e in compression,
 *              R dP/P * e in expansion. Against P_out: dU = -P_out (v2 - v1).
 *   Source     Moran & Shapiro, Fundamentals of Engineering Thermodynamics, 5th ed. (2006), chapters 2, 3 and 6
 *   Check      tests/core/test_path.c (laws, quadrature), test_leg_endings.c, test_leg_refusals.c, test_leg_examples.c
 */
struct gas_result gas_leg_run(const struct gas *gas, enum gas_system system, const struct gas_point *start,
                              const struct gas_point *path_start, const struct gas_leg *leg, struct gas_change *change);

/*
 * gas_leg_at - the state at a fraction (0 to 1) along a leg that has been run; fraction 1 is exactly the end. For
 * charts.
 *
 *   Returned   the pressure there, Pa; *at complete
 *   Status     as gas_leg_run; GAS_UNREACHABLE, argument 6: the fraction is not between 0 and 1
 *   Notes      Equal steps in v; in P where v does not move and for machines with an efficiency; through points every
 *              stretch gets the same share. Of irreversible legs: the states the gas would be found in, were it stopped
 *              there.
 *   Check      tests/core/test_path.c, test_leg_refusals.c
 */
struct gas_result gas_leg_at(const struct gas *gas, enum gas_system system, const struct gas_point *start,
                             const struct gas_leg *leg, const struct gas_change *change, double fraction,
                             struct gas_point *at);

/*
 * gas_path_run - legs in order.
 *
 *   Given      legs[count], changes[count]
 *   Returned   value: W of the whole path; changes[i] is leg i; total adds them (total.end is the end of the last leg)
 *   Status     that of the leg that failed, argument: its number, from 1; *fault (may be NULL) is the leg's own result.
 *              A faulty start counts as leg 1. GAS_UNDETERMINED: no legs
 *   Notes      Changes before the failing leg are filled, and total adds them.
 *   Check      tests/core/test_path.c, test_cycle.c, test_leg_refusals.c
 */
struct gas_result gas_path_run(const struct gas *gas, enum gas_system system, const struct gas_point *start,
                               const struct gas_leg *legs, size_t count, struct gas_change *changes,
                               struct gas_change *total, struct gas_result *fault);

/* A cycle's figures, per mole, from the legs of a closed path. */
struct gas_cycle {
    double W_net;                    /* J/mol into the gas: negative for an engine */
    double Q_in, Q_out;              /* J/mol, both >= 0: sums over the legs */
    double efficiency;               /* -W_net/Q_in; NAN unless W_net < 0 */
    double cop_heating, cop_cooling; /* Q_out/W_net, Q_in/W_net; NAN unless W_net > 0 */
    double mep;                      /* |W_net| / (v_max - v_min), Pa */
    double gap_P, gap_T, gap_v;      /* end less start, relative to the start */
};

/*
 * gas_cycle_of - the figures of a cycle from its legs.
 *
 *   Status     GAS_CONTRADICTION when the gap exceeds `closes_within` (relative; 1e-6), figure: the widest gap;
 *              *cycle is filled nevertheless. GAS_UNDETERMINED: no legs
 *   Notes      Q_in and Q_out add the legs' own, which are split where the heat turns round within a polytropic,
 *              straight or tabled leg: heat taken in at one end of a leg does not hide behind heat given off at the
 *              other.
 *   Check      tests/core/test_cycle.c
 */
struct gas_result gas_cycle_of(const struct gas_point *start, const struct gas_change *changes, size_t count,
                               double closes_within, struct gas_cycle *cycle);

#endif
