/*
 * figures.h - what the files of the core ask of a figure, and the logarithm of a ratio. (layer: core, internal)
 */
#ifndef CORE_FIGURES_H
#define CORE_FIGURES_H

#include <math.h>

#include <gasleaf/status.h>

/* The figure itself, or why it is refused; argument is its position in the call. */
static inline struct gas_result check_positive(int argument, double figure)
{
    if (!isfinite(figure))
        return gas_bad(GAS_NOT_FINITE, argument, figure);
    return figure > 0 ? gas_good(figure) : gas_bad(GAS_NOT_POSITIVE, argument, figure);
}

static inline struct gas_result check_not_negative(int argument, double figure)
{
    if (!isfinite(figure))
        return gas_bad(GAS_NOT_FINITE, argument, figure);
    return figure >= 0 ? gas_good(figure) : gas_bad(GAS_NEGATIVE, argument, figure);
}

/* Above 0, at most 1. */
static inline struct gas_result check_fraction(int argument, double figure)
{
    if (!isfinite(figure))
        return gas_bad(GAS_NOT_FINITE, argument, figure);
    return figure > 0 && figure <= 1 ? gas_good(figure) : gas_bad(GAS_NOT_A_FRACTION, argument, figure);
}

/* A result too large for a double, or a term without a value at this temperature, is no answer. */
static inline struct gas_result if_finite(double value)
{
    return isfinite(value) ? gas_good(value) : gas_bad(GAS_NOT_FINITE, 0, NAN);
}

/* ln(b/a) for positive a and b, with all digits when b is near a. */
static inline double log_ratio(double b, double a)
{
    const double ratio = b / a;
    return ratio > 0.5 && ratio < 2 ? log1p((b - a) / a) : log(ratio);
}

#endif
