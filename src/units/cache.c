/*
 * Texts already understood. Fixed in size, set-associative, oldest out first; one lock per set, held while one entry is
 * compared and copied, so that threads which read different texts do not meet.
 */
#include <pthread.h>
#include <stdint.h>
#include <string.h>

#include "units.h"

struct entry {
    uint64_t hash;
    size_t length; /* 0: free */
    struct gas_references references;
    char text[CACHE_TEXT];
    unsigned char value[CACHE_VALUE];
};

struct set {
    pthread_mutex_t lock;
    unsigned oldest;
    struct entry entry[CACHE_WAYS];
};

struct gas_text_cache {
    pthread_once_t once;
    void (*make)(void);
    struct set set[CACHE_SETS];
};

static void make_locks(struct gas_text_cache *cache)
{
    for (int i = 0; i < CACHE_SETS; i++)
        pthread_mutex_init(&cache->set[i].lock, NULL);
}

static void make_unit_cache(void)
{
    make_locks(&gas_unit_cache);
}

static void make_heading_cache(void)
{
    make_locks(&gas_heading_cache);
}

struct gas_text_cache gas_unit_cache = {.once = PTHREAD_ONCE_INIT, .make = make_unit_cache};
struct gas_text_cache gas_heading_cache = {.once = PTHREAD_ONCE_INIT, .make = make_heading_cache};

/* FNV-1a. */
static uint64_t hash_text(const char *text, size_t length)
{
    uint64_t hash = 14695981039346656037u;
    for (size_t i = 0; i < length; i++)
        hash = (hash ^ (unsigned char)text[i]) * 1099511628211u;
    return hash ^ hash >> 29;
}

static bool same_references(const struct gas_references *a, const struct gas_references *b)
{
    return a->normal_T == b->normal_T && a->normal_P == b->normal_P && a->standard_T == b->standard_T &&
           a->standard_P == b->standard_P && a->scf_T == b->scf_T && a->scf_P == b->scf_P;
}

static bool same(const struct entry *entry, uint64_t hash, const char *text, size_t length,
                 const struct gas_references *references)
{
    return entry->hash == hash && entry->length == length && memcmp(entry->text, text, length) == 0 &&
           same_references(&entry->references, references);
}

static bool fits(size_t length, size_t size)
{
    return length > 0 && length <= CACHE_TEXT && size <= CACHE_VALUE;
}

bool gas_cache_get(struct gas_text_cache *cache, const char *text, size_t length,
                   const struct gas_references *references, void *value, size_t size)
{
    bool found = false;
    if (!fits(length, size))
        return false;
    pthread_once(&cache->once, cache->make);
    uint64_t hash = hash_text(text, length);
    struct set *set = &cache->set[hash % CACHE_SETS];
    pthread_mutex_lock(&set->lock);
    for (int i = 0; i < CACHE_WAYS && !found; i++)
        if (same(&set->entry[i], hash, text, length, references)) {
            memcpy(value, set->entry[i].value, size);
            found = true;
        }
    pthread_mutex_unlock(&set->lock);
    return found;
}

void gas_cache_put(struct gas_text_cache *cache, const char *text, size_t length,
                   const struct gas_references *references, const void *value, size_t size)
{
    if (!fits(length, size))
        return;
    pthread_once(&cache->once, cache->make);
    uint64_t hash = hash_text(text, length);
    struct set *set = &cache->set[hash % CACHE_SETS];
    pthread_mutex_lock(&set->lock);
    struct entry *entry = &set->entry[set->oldest++ % CACHE_WAYS];
    *entry = (struct entry){.hash = hash, .length = length, .references = *references};
    memcpy(entry->text, text, length);
    memcpy(entry->value, value, size);
    pthread_mutex_unlock(&set->lock);
}
