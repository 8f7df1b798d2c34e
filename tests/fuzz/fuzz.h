/*
 * fuzz.h - calls of worksheet functions made from a seed: sensible arguments, arguments with one mistake, and rubbish.
 *
 * The same seed makes the same call, whatever was made before it, so a failing case is repeated by its number.
 */
#ifndef TESTS_FUZZ_H
#define TESTS_FUZZ_H

#include <stdint.h>
#include <stdio.h>

#include "sheet/catalogue.h"

struct fuzz {
    uint64_t state;
    struct gas_arena *arena;
};

/* fuzz_call - a call of some function of the catalogue, arguments in the arena; call->answer is not yet there. */
const struct gas_function *fuzz_call(uint64_t seed, struct gas_arena *arena, struct gas_call *call);

/* fuzz_show - the call as a formula, texts shortened. */
void fuzz_show(FILE *to, const struct gas_function *function, const struct gas_call *call);

/* fuzz_cell, fuzz_block - what stands for a parameter of that name ("gas", "given", "temperature unit" ...). */
struct gas_cell fuzz_cell(struct fuzz *fuzz, const char *parameter);
struct gas_block fuzz_block(struct fuzz *fuzz, const char *parameter);

uint64_t fuzz_bits(struct fuzz *fuzz);
size_t fuzz_below(struct fuzz *fuzz, size_t limit);

/* fuzz_fault - what is wrong with an answer of a call and in which cell, NULL when nothing is. */
const char *fuzz_fault(const struct gas_call *call, size_t *cell);

/* fuzz_hash - a number that tells answers apart. */
uint64_t fuzz_hash(const struct gas_block *answer);

#endif
