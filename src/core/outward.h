/*
 * outward.h - the root nearest to a start, for functions that may turn back. (layer: core, internal)
 */
#ifndef CORE_OUTWARD_H
#define CORE_OUTWARD_H

#include "root.h"

/*
 * root_outward - the root of f nearest to `from`, looked for in growing steps towards `limit`.
 *
 *   Given      step        first step, > 0
 *              step_most   the longest one: two roots closer than that may be missed
 *   Status     GAS_UNREACHABLE     none up to the limit
 *              GAS_NO_CONVERGENCE  f is NAN on the way
 */
struct gas_result root_outward(root_function *f, const void *given, double from, double limit, double step,
                               double step_most);

#endif
