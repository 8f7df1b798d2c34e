/*
 * root.h - the one root finder of the core: no derivative, always bracketed. (layer: core, internal)
 */
#ifndef CORE_ROOT_H
#define CORE_ROOT_H

#include <gasleaf/status.h>

/* f(given, x); NAN where it cannot be had. */
typedef double root_function(const void *given, double x);

/*
 * root_between - x between a and b where f changes sign, to the last digits of x.
 *
 *   Status     GAS_UNREACHABLE no change of sign; GAS_NO_CONVERGENCE f is NAN between a and b
 *   Method     secant and inverse quadratic steps kept inside the bracket, else bisection; when to trust the
 *              parabola: Chandrupatla, Advances in Engineering Software 28 (1997) 145
 */
struct gas_result root_between(root_function *f, const void *given, double a, double b);

/*
 * root_rising - x > 0 where a rising f is zero, looked for outwards from a guess, never outside [lowest, highest].
 *
 *   Status     GAS_OUTSIDE_DATA the root lies beyond a limit (figure: that limit; argument 0)
 *   Notes      lowest may be 0 and highest INFINITY; those are never evaluated. Falling functions: hand in -f.
 */
struct gas_result root_rising(root_function *f, const void *given, double guess, double lowest, double highest);

#endif
