#include "sheet/arena.h"

#include <stdalign.h>
#include <stdint.h>
#include <stdlib.h>
#include <string.h>

enum { FIRST_CHUNK = 16 * 1024, KEPT_CHUNK = 1024 * 1024 };

struct gas_arena_chunk {
    struct gas_arena_chunk *before;
    size_t size, used;
    alignas(max_align_t) unsigned char bytes[];
};

static struct gas_arena_chunk *chunk_for(struct gas_arena *arena, size_t bytes)
{
    struct gas_arena_chunk *now = arena->chunk;
    if (now && now->size - now->used >= bytes)
        return now;
    size_t size = now ? 2 * now->size : FIRST_CHUNK;
    if (size < bytes)
        size = bytes;
    if (size > SIZE_MAX - sizeof(struct gas_arena_chunk))
        return NULL;
    struct gas_arena_chunk *made = malloc(sizeof *made + size);
    if (made) {
        *made = (struct gas_arena_chunk){now, size, 0};
        arena->chunk = made;
    }
    return made;
}

void *gas_arena_take(struct gas_arena *arena, size_t count, size_t size)
{
    const size_t step = alignof(max_align_t);
    if (size && count > (SIZE_MAX - step) / size)
        return NULL;
    size_t bytes = (count * size + step - 1) / step * step;
    struct gas_arena_chunk *chunk = chunk_for(arena, bytes);
    if (!chunk)
        return NULL;
    void *taken = chunk->bytes + chunk->used;
    chunk->used += bytes;
    return taken;
}

char *gas_arena_copy(struct gas_arena *arena, const char *text, size_t length)
{
    char *copy = length < SIZE_MAX ? gas_arena_take(arena, length + 1, 1) : NULL;
    if (copy) {
        memcpy(copy, text, length);
        copy[length] = '\0';
    }
    return copy;
}

void gas_arena_reset(struct gas_arena *arena)
{
    struct gas_arena_chunk *kept = arena->chunk;
    if (!kept)
        return;
    struct gas_arena before = {kept->before};
    gas_arena_free(&before);
    kept->before = NULL;
    kept->used = 0;
    if (kept->size > KEPT_CHUNK)
        gas_arena_free(arena);
}

void gas_arena_free(struct gas_arena *arena)
{
    while (arena->chunk) {
        struct gas_arena_chunk *before = arena->chunk->before;
        free(arena->chunk);
        arena->chunk = before;
    }
}
