/*
 * solver_parts.h - what solver.c (plans and figures) and solver_words.c (sentences) share.
 */
#ifndef SHEET_SOLVER_PARTS_H
#define SHEET_SOLVER_PARTS_H

#include <stdint.h>

#include "sheet/solver.h"

/* What one pattern of given columns leads to. */
struct solver_entry {
    uint32_t mask;
    struct gas_refusal refusal; /* made: this pattern cannot answer, whatever its figures */
    size_t count;
    unsigned char column[GAS_COLUMNS]; /* of each known of the plan */
    struct gas_known known[GAS_COLUMNS];
    struct gas_plan plan;
};

struct gas_solver {
    size_t columns;
    struct {
        bool used;
        struct gas_known known;
        int tolerance; /* its plus-minus column, -1: none */
    } column[GAS_COLUMNS];
    uint32_t used; /* set of columns that are state variables */
    int states;    /* highest state asked about */
    enum gas_amounts amounts;
    size_t needs;
    struct gas_need need[GAS_NEEDS];
    size_t required; /* needs that are not optional, in order */
    struct gas_known must[GAS_NEEDS];
    size_t entries, room, last;
    struct solver_entry *entry;
    struct solver_entry *whole; /* an untrimmed one, for gas_solver_plan; NULL until asked */
    struct gas_arena *arena;
};

/* The entry for a pattern of given columns, made when it is new. */
struct solver_entry *solver_entry_for(struct gas_solver *solver, const struct gas_job *job, uint32_t given);

/* The SI figures of a case in the order of the knowns. */
void solver_in_order(const struct solver_entry *entry, const struct gas_case *figures, double *ordered);

/* Why a required variable does not follow, and what would do. */
bool solver_refuse_missing(const struct solver_entry *entry, struct gas_known wanted, struct gas_refusal *refusal);

/* Why two knowns cannot stand side by side; argument: index of the second, from 1. */
bool solver_refuse_knowns(const struct gas_job *job, const struct solver_entry *entry, struct gas_result result,
                          struct gas_refusal *refusal);

/* Why a run failed. */
bool solver_refuse_run(const struct gas_solver *solver, const struct gas_job *job, const struct solver_entry *entry,
                       const struct gas_case *figures, struct gas_result result, const struct gas_values *values,
                       struct gas_refusal *refusal);

#endif
