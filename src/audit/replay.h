/*
 * replay.h - a case worked out again with a slip in it.
 *
 * A desk is one wanted quantity of one call: the job ready to run, and the places where its figures are read (sites).
 * A replay starts as the true sum of one case; slips change how a site is read, a constant, the heat capacity or the
 * process, in any combination; then the whole sum is run again. What cannot be run gives NAN.
 *
 * Nothing here knows which task the job has, except that a path shows its legs.
 */
#ifndef AUDIT_REPLAY_H
#define AUDIT_REPLAY_H

#include "sheet/job.h"
#include "sheet/path_task.h"
#include "sheet/stages_task.h"

enum { SITES = 48 };

enum site_kind { SITE_GIVEN, SITE_LEG, SITE_STAGING, SITE_WANTED };
enum leg_place { LEG_VALUE, LEG_SECOND, LEG_OUTSIDE };

/* A place where a figure with a unit enters the sum, or leaves it. */
struct site {
    enum site_kind kind;
    int index;            /* column of the givens, leg, or enum gas_staging_item */
    enum leg_place place; /* of a leg */
    enum gas_symbol symbol;
    int state; /* 0: none written; of a leg's end 2 */
    const struct gas_unit *unit;
};

/* How a site is read in a replay. */
struct reading {
    bool changed;
    struct gas_unit unit;
    double barometer; /* Pa */
    double shift;     /* SI, added after conversion */
};

struct desk {
    struct gas_job *job;                     /* prepared; one wanted heading */
    const struct gas_typed_legs *legs;       /* of a path; NULL otherwise */
    const struct gas_typed_staging *staging; /* of staged compression; NULL otherwise */
    struct gas_job *start, *end; /* the same givens with T at the start, at the end wanted; NULL: not found */
    struct gas_job *other;       /* the same with h wanted for u, u for h; NULL: not one of these */
    size_t sites;
    struct site site[SITES];
};

/* One case as it truly is. */
struct desk_case {
    struct gas_row row;
    struct gas_case figures;
    double truth;              /* the wanted figure, in its unit */
    double T_start, T_end;     /* K; NAN when not known */
    struct gas_path_case path; /* when desk->legs */
};

/* What stands in place of (n-1)/n over a pressure ratio, or of n-1 over a volume ratio. */
enum wrong_exponent { EXPONENT_RIGHT, EXPONENT_N_1, EXPONENT_N_1_N, EXPONENT_INVERSE, EXPONENT_N };

/* What the end temperature of a filling is mistaken for. */
enum wrong_filling { FILL_RIGHT, FILL_AT_LINE, FILL_AT_K_LINE };

struct replay {
    const struct desk *desk;
    const struct desk_case *truth;
    struct gas_job job; /* gas, options, own, legs and the wanted symbol may be changed */
    struct gas_case figures;
    struct reading reading[SITES];
    double factor;                /* on the answer */
    struct gas_interval interval; /* of a changed heat capacity */
    struct gas_typed_legs legs;   /* copied when changed */
    bool legs_changed;
    bool log10;                   /* ln read as log10 in isothermal legs */
    bool heat_swapped;            /* cp for cv and the reverse where heat or work is counted */
    bool efficiency_turned;       /* multiplied where it divides */
    enum wrong_exponent exponent; /* of T2/T1 in adiabatic and polytropic legs */
    enum wrong_filling filling;
    struct gas_typed_staging staging; /* copied when changed */
    bool staging_changed;
};

/* desk_open - the sites of a prepared job; what cannot be had beside them (start, end, other) is NULL. */
void desk_open(struct desk *desk, struct gas_job *job, struct gas_arena *arena);

/* desk_read - a case of the job's table as it truly is; a refusal in the user's words when it cannot be. */
bool desk_read(const struct desk *desk, size_t row, struct desk_case *truth, struct gas_refusal *refusal);

/* replay_open - once per desk; replay_reset - back to the true sum of a case. */
void replay_open(struct replay *replay, const struct desk *desk);
void replay_reset(struct replay *replay, const struct desk_case *truth);

/* replay_reading - the reading of a site, to be changed. */
struct reading *replay_reading(struct replay *replay, size_t site);

/* replay_legs - the legs, to be changed; NULL when the job has none. */
struct gas_typed_legs *replay_legs(struct replay *replay);

/* replay_staging - the stages text, to be changed; NULL when the job has none. */
struct gas_typed_staging *replay_staging(struct replay *replay);

/* replay_figure - of a site in the user's own unit; NAN when it has none in this case. */
double replay_figure(const struct desk *desk, const struct desk_case *truth, size_t site);

/* replay_fixed - a figure in SI as a leg or a stages text holds it. */
struct gas_leg_figure replay_fixed(double si, enum gas_dimension dimension);

/* replay_hold_cp - a constant heat capacity, J/(mol K), at any temperature. */
void replay_hold_cp(struct replay *replay, double cp);

/* replay_run - the wanted figure in the user's unit, NAN when it cannot be. */
double replay_run(struct replay *replay);

#endif
