/*
 * leg.h - what the files of the processes share. (layer: core, internal)
 *
 * leg.c checks a leg and turns every ratio and "to start" into a plain ending; a process then only has to find the
 * end state and the work. leg_close adds what follows from them.
 */
#ifndef CORE_LEG_H
#define CORE_LEG_H

#include <stdbool.h>

#include <gasleaf/path.h>

struct leg_case {
    const struct gas *gas;
    enum gas_system system;
    struct gas_point start; /* complete and positive */
    struct gas_leg leg;     /* ending is none of the ratios and not GAS_TO_START */
};

typedef struct gas_result leg_run(const struct leg_case *lc, struct gas_change *change);
typedef struct gas_result leg_at(const struct leg_case *lc, const struct gas_change *change, double fraction,
                                 struct gas_point *at);

leg_run leg_line_run, leg_adiabatic_run, leg_polytropic_run, leg_free_run, leg_against_run, leg_straight_run,
    leg_through_run;
leg_at leg_line_at, leg_adiabatic_at, leg_polytropic_at, leg_free_at, leg_against_at, leg_straight_at, leg_through_at;

enum { LEG_START = 1, LEG_ENDING, LEG_N, LEG_EFFICIENCY, LEG_OUTSIDE, LEG_POINTS }; /* arguments of gas_leg_run */

/* Internal-energy and enthalpy changes that do not ask for a heat capacity when the temperature stays. */
struct gas_result leg_du(const struct gas *gas, double T1, double T2);
struct gas_result leg_dh(const struct gas *gas, double T1, double T2);

/* The energy whose change is the work of an adiabatic leg: u in a closed system, h in flow. */
struct gas_result leg_energy(const struct leg_case *lc, double T1, double T2);
struct gas_result leg_T_after_energy(const struct leg_case *lc, double T1, double energy);

/* dU, dH, dS, Q (by the law), Q_in and Q_out (by the sign of Q), v_least and v_most (of the two ends) from end and W.
 * A gas without heat capacity leaves them NAN where the temperature moves; S_made is left alone. */
struct gas_result leg_close(const struct leg_case *lc, struct gas_change *change);

/* The same for a leg along one curve, which gives its work too; a reversal of the heat is looked for in that many
 * pieces of it. */
struct curve;
struct gas_result leg_close_along(const struct leg_case *lc, const struct curve *curve, int pieces,
                                  struct gas_change *change);

/* The same for an adiabatic leg, whose W is the energy change: Q is 0 and S_made is dS. */
struct gas_result leg_close_adiabatic(const struct leg_case *lc, struct gas_change *change);

/* Refusals about the ending: a quantity that this process holds fixed, asked to another value (GAS_UNREACHABLE) or to
 * the value it has (GAS_UNDETERMINED: the leg could end anywhere). */
struct gas_result leg_unreachable(const struct leg_case *lc);
struct gas_result leg_held(const struct leg_case *lc, double asked, double held);

/* A failure, with the arguments of the heat functions told as gas_leg_run's. */
struct gas_result leg_failure(struct gas_result failure);

#endif
