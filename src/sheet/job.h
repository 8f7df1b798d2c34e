/*
 * job.h - a calculation understood: gas, options, given and wanted headings, ready to run on any case.
 *
 * The way of a row: cells -> gas_table_row -> figures in the user's units -> SI (gas_case) -> task -> SI answers ->
 * the wanted units. This file does everything but the task: it knows units, signs, the barometer and names for
 * sentences, and nothing of states or paths. A task (SOLVE, PATH, STAGES, FILL ...) gets figures in SI by column and
 * answers in SI by wanted heading.
 *
 * A job may be copied by assignment, changed (a unit of table.heading or wanted.heading, gas.R, gas.molar_mass,
 * options.barometer, options.datum) and run again. What a task compiled in prepare is shared by the copies and stays
 * valid as long as no heading changes its symbol, state or dimension and no option changes that the task compiled
 * (system); after such a change call gas_job_prepare on the copy. Only the job that was opened is closed.
 * gas_job_run does not allocate.
 */
#ifndef SHEET_JOB_H
#define SHEET_JOB_H

#include <gasleaf/gas.h>

#include "sheet/cell.h"
#include "sheet/gas_choice.h"
#include "sheet/options.h"
#include "sheet/sentence.h"
#include "sheet/table.h"

/* Whether extensive givens are totals (m3, kg, mol, J) or flows (per time). */
enum gas_extent { GAS_EXTENT_NONE, GAS_EXTENT_TOTAL, GAS_EXTENT_FLOW };

/* One case in SI. si[i] belongs to table.heading[i]: absolute Pa, K, W and Q into the gas, plus-minus columns as
 * differences or, in %, as shares of the figure; NAN where not given and of what is constant. */
struct gas_case {
    const struct gas_row *row; /* as the user gave it: for sentences */
    double barometer;          /* Pa: of the options, or of the case's own barometer or altitude */
    double si[GAS_COLUMNS];
};

struct gas_job;

struct gas_task {
    const char *name;   /* of the worksheet function, "SOLVE": for sentences */
    bool mixed_extents; /* totals may stand beside flows (a vessel's V and a line's flow) */
    bool open;          /* the option `open` means something here; elsewhere it is refused */
    bool wall;          /* the options of a vessel's wall mean something here; elsewhere they are refused */
    /* prepare - once per call and after a change of headings: refuse givens and wanted that are not of this task,
     * compile the rest into job->own (from the arena). */
    bool (*prepare)(struct gas_job *job, struct gas_arena *arena, struct gas_refusal *refusal);
    /* run - one case: answers[i] in the SI unit of wanted.heading[i].unit.dimension, W and Q into the gas. No
     * allocation. */
    bool (*run)(const struct gas_job *job, const struct gas_case *figures, double *answers,
                struct gas_refusal *refusal);
};

struct gas_job {
    const struct gas_task *task;
    struct gas gas;                  /* a copy of choice->gas */
    const struct gas_choice *choice; /* for labels */
    struct gas_options options;
    struct gas_table table;
    struct gas_wanted wanted; /* columns may be 0: the function decides what that means */
    enum gas_extent extent;   /* of the givens */
    int barometer_column;     /* of `given`, -1: none */
    int altitude_column;      /* the same in another dress: the barometer of the standard atmosphere there */
    const void *legs;         /* what else the function was given, set by it before gas_job_open; NULL for SOLVE */
    void *own;                /* the task's own */
};

/* The arguments of a call that make a job. NULL: the function has no such argument. */
struct gas_job_arguments {
    const struct gas_block *gas, *given, *wanted, *headings, *options;
};

/*
 * gas_job_open - read the arguments and prepare the task. job->task and job->legs are set by the caller, the rest is
 * filled. Whether or not it succeeds, give the job back with gas_job_close.
 */
bool gas_job_open(struct gas_job *job, const struct gas_job_arguments *arguments, struct gas_arena *arena,
                  struct gas_refusal *refusal);
/* gas_job_read - the same without preparing, for functions that complete job->wanted first. */
bool gas_job_read(struct gas_job *job, const struct gas_job_arguments *arguments, struct gas_refusal *refusal);
/* gas_job_tell_extent - job->extent from the givens; prepare does it too. */
bool gas_job_tell_extent(struct gas_job *job, struct gas_refusal *refusal);
/* gas_job_prepare - totals and flows told apart, then the task's prepare. */
bool gas_job_prepare(struct gas_job *job, struct gas_arena *arena, struct gas_refusal *refusal);
void gas_job_close(struct gas_job *job);

/* gas_job_case - the figures of a row in SI; refuses what cannot be: below absolute zero, below a perfect vacuum. */
bool gas_job_case(const struct gas_job *job, const struct gas_row *row, struct gas_case *figures,
                  struct gas_refusal *refusal);
/* gas_job_run - one case; answers[i] in the unit and sign of wanted.heading[i]. */
bool gas_job_run(const struct gas_job *job, const struct gas_row *row, double *answers, struct gas_refusal *refusal);
/* gas_job_shown - an SI answer as a heading shows it in a case: unit, barometer, sign of work. */
double gas_job_shown(const struct gas_job *job, const struct gas_case *figures, const struct gas_heading *heading,
                     double si);

/*
 * gas_job_answer - every case of the table into call->answer, one column per wanted heading (across: one row). A case
 * that fails carries its sentence in each of its cells, or #N/A with `hard errors`; a case that is wholly blank stays
 * blank.
 */
void gas_job_answer(const struct gas_job *job, struct gas_call *call);

/* gas_job_refused - a whole call that failed: the sentence, or #N/A with `hard errors` (options may be NULL). */
void gas_job_refused(struct gas_call *call, const struct gas_options *options, const struct gas_refusal *refusal);

/* gas_job_column - the column of `given` that holds a symbol in a state (0: unnumbered), -1 when there is none.
 * Plus-minus columns are passed over; gas_job_tolerance_column finds only them. An unnumbered plus-minus is that of
 * every reading of its symbol. */
int gas_job_column(const struct gas_job *job, enum gas_symbol symbol, int state);
int gas_job_tolerance_column(const struct gas_job *job, enum gas_symbol symbol, int state);

/* gas_job_last_state - the highest state that a heading of `given` names; 0: none does. */
int gas_job_last_state(const struct gas_job *job);

/* gas_heading_is_share - a plus-minus in %: a share of the figure it belongs to. */
bool gas_heading_is_share(const struct gas_heading *heading);

/*
 * gas_job_from_molar - a figure per mole in the dimension a heading asks for: J/mol to J/kg, or to J or W with the
 * amount n (mol, or mol/s in flow); J/(mol K), m3/mol and 1 (amount itself: mol, kg) alike. NAN when n is NAN and
 * needed, or when the dimension does not belong to `molar`.
 */
double gas_job_from_molar(const struct gas_job *job, enum gas_dimension molar, double figure, double n,
                          enum gas_dimension dimension);
/* gas_dimension_extent - VOLUME, AMOUNT, MASS, ENERGY, ENTROPY: TOTAL; their flows: FLOW; else NONE. */
enum gas_extent gas_dimension_extent(enum gas_dimension dimension);

#endif
