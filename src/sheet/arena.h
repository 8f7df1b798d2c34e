/*
 * arena.h - memory of one call: everything an answer needs, given back at once.
 *
 * The worksheet functions allocate from here and never free; the caller resets the arena when the answer has been
 * copied out.
 */
#ifndef SHEET_ARENA_H
#define SHEET_ARENA_H

#include <stddef.h>

struct gas_arena_chunk;

struct gas_arena {
    struct gas_arena_chunk *chunk;
};

/* gas_arena_take - room for count things of a size, aligned for any type; NULL when memory is out or it overflows. */
void *gas_arena_take(struct gas_arena *arena, size_t count, size_t size);

/* gas_arena_copy - a NUL-terminated copy of a text; NULL when memory is out. */
char *gas_arena_copy(struct gas_arena *arena, const char *text, size_t length);

/* gas_arena_reset - forget everything, keep at most one moderate chunk; gas_arena_free keeps nothing. */
void gas_arena_reset(struct gas_arena *arena);
void gas_arena_free(struct gas_arena *arena);

#endif
