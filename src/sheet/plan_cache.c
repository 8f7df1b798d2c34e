#include "sheet/plan_cache.h"

#include <pthread.h>
#include <stdint.h>
#include <string.h>

enum { PATTERNS = 64, KNOWNS = 32 };

/* What a plan depends on, as bytes. */
struct pattern {
    unsigned char count, states, open;
    unsigned char variable[KNOWNS];
    signed char state[KNOWNS];
};

static struct {
    bool filled;
    struct pattern pattern;
    struct gas_plan plan;
} kept[PATTERNS];
static pthread_mutex_t lock = PTHREAD_MUTEX_INITIALIZER;

static struct pattern pattern_of(const struct gas_known *known, size_t count, int states, bool open)
{
    struct pattern pattern = {.count = (unsigned char)count, .states = (unsigned char)states, .open = open};
    for (size_t i = 0; i < count; i++) {
        pattern.variable[i] = (unsigned char)known[i].variable;
        pattern.state[i] = (signed char)known[i].state;
    }
    return pattern;
}

/* Every byte counts: a pattern has no padding. */
static size_t place_of(const struct pattern *pattern)
{
    _Static_assert(sizeof *pattern == 3 + 2 * KNOWNS, "a pattern has no padding");
    uint64_t hash = 1469598103934665603u;
    for (size_t i = 0; i < 3 + (size_t)pattern->count; i++)
        hash = (hash ^ ((const unsigned char *)pattern)[i]) * 1099511628211u;
    for (size_t i = 0; i < pattern->count; i++)
        hash = (hash ^ (unsigned char)pattern->state[i]) * 1099511628211u;
    return (size_t)((hash ^ hash >> 32) % PATTERNS);
}

static bool find(size_t place, const struct pattern *pattern, struct gas_plan *plan)
{
    pthread_mutex_lock(&lock);
    bool found = kept[place].filled && memcmp(&kept[place].pattern, pattern, sizeof *pattern) == 0;
    if (found)
        *plan = kept[place].plan;
    pthread_mutex_unlock(&lock);
    return found;
}

static void keep(size_t place, const struct pattern *pattern, const struct gas_plan *plan)
{
    pthread_mutex_lock(&lock);
    kept[place].filled = true;
    kept[place].pattern = *pattern;
    kept[place].plan = *plan;
    pthread_mutex_unlock(&lock);
}

static struct gas_result make(struct gas_plan *plan, const struct gas_known *known, size_t count, int states, bool open)
{
    return open ? gas_plan_make_open(plan, known, count, states) : gas_plan_make(plan, known, count, states);
}

/* States that a pattern can hold; others are refused by the plan itself. */
static bool fits(const struct gas_known *known, size_t count, int states)
{
    bool good = count <= KNOWNS && states >= 0 && states <= GAS_STATES;
    for (size_t i = 0; good && i < count; i++)
        good = known[i].state >= GAS_CONSTANT && known[i].state <= GAS_STATES;
    return good;
}

struct gas_result gas_plan_for(struct gas_plan *plan, const struct gas_known *known, size_t count, int states,
                               bool open)
{
    if (!fits(known, count, states))
        return make(plan, known, count, states, open);
    struct pattern pattern = pattern_of(known, count, states, open);
    size_t place = place_of(&pattern);
    if (find(place, &pattern, plan))
        return gas_good(plan->step_count);
    struct gas_result made = make(plan, known, count, states, open);
    if (made.status == GAS_OK)
        keep(place, &pattern, plan);
    return made;
}
