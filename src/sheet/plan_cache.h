/*
 * plan_cache.h - plans made once: the same pattern of knowns stands in hundreds of cells.
 */
#ifndef SHEET_PLAN_CACHE_H
#define SHEET_PLAN_CACHE_H

#include <gasleaf/state.h>

/*
 * gas_plan_for - gas_plan_make, or gas_plan_make_open, remembered. Bounded: a newer pattern takes the place of an older
 * one. Thread-safe; the lock is held for a copy, never while a plan is made. Plans that fail are made anew.
 */
struct gas_result gas_plan_for(struct gas_plan *plan, const struct gas_known *known, size_t count, int states,
                               bool open);

#endif
