/*
 * call.h - a call of a checking function opened: the job of whichever task the argument `legs` asks for.
 *
 * legs left out: states (as SOLVE); "fill", "vent": vessels; a text that begins with stages: staged compression;
 * anything else: a path.
 */
#ifndef AUDIT_CALL_H
#define AUDIT_CALL_H

#include "sheet/job.h"
#include "sheet/legs.h"
#include "sheet/staging_text.h"

/* Where the arguments stand in the call. */
struct check_arguments {
    size_t given, wanted, legs, headings, options;
};

struct check_call {
    struct gas_job job; /* read, not prepared: wanted may hold several headings */
    struct gas_typed_legs legs;
    struct gas_typed_staging staging;
    struct gas_refusal refusal;
};

/* check_open - give it back with gas_job_close(&check->job) whether or not it succeeds. */
bool check_open(struct check_call *check, const struct gas_call *call, const struct check_arguments *places);

/* check_one - a copy of the job with one of its wanted headings, prepared. */
bool check_one(struct check_call *check, size_t wanted, struct gas_job *job, struct gas_arena *arena);

#endif
