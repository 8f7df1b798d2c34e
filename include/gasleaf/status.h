/*
 * status.h - errors are values: a figure, a status, the argument it is about. (layer: core)
 *
 * No globals, no handlers, no sentinels, no abort. A function that cannot answer returns value NAN, a status other
 * than GAS_OK, the position of the first offending argument and the offending figure in SI units; the layer that
 * knows the user's own units and headings composes the sentence, and nobody else does.
 */
#ifndef GASLEAF_STATUS_H
#define GASLEAF_STATUS_H

/* clang-format off */
/*     name             class         what the sentence says after the figure */
#define GAS_STATUS_LIST(X)                                                                                            \
    X(OK,               FINE,         "")                                                                             \
    X(NOT_FINITE,       ARGUMENT,     "is not a finite number")                                                       \
    X(NOT_POSITIVE,     ARGUMENT,     "must be above zero")                                                           \
    X(NEGATIVE,         ARGUMENT,     "must not be below zero")                                                       \
    X(NOT_A_FRACTION,   ARGUMENT,     "must be above 0 and at most 1")                                                \
    X(OUTSIDE_DATA,     ARGUMENT,     "is outside the data for the gas")                                              \
    X(NO_HEAT_CAPACITY, GAS,          "has no heat capacity; give one after '|' or on its card")                      \
    X(UNREACHABLE,      PROCESS,      "cannot be reached this way")                                                   \
    X(WRONG_SIDE,       PROCESS,      "is on the wrong side of the gas pressure")                                     \
    X(NOT_APPLICABLE,   PROCESS,      "does not apply to this process")                                               \
    X(UNDETERMINED,     PROBLEM,      "does not follow from what is given")                                           \
    X(CONTRADICTION,    PROBLEM,      "disagrees with the other figures given")                                       \
    X(NO_CONVERGENCE,   NUMERICS,     "could not be found to the stated accuracy")                                    \
    X(TOO_MANY,         PROBLEM,      "is more than fits")
/* clang-format on */

enum gas_status {
#define GAS_STATUS_NAME(name, class, words) GAS_##name,
    GAS_STATUS_LIST(GAS_STATUS_NAME)
#undef GAS_STATUS_NAME
        GAS_STATUS_COUNT
};

struct gas_result {
    double value;           /* NAN unless status is GAS_OK */
    enum gas_status status; /* GAS_OK or the reason */
    int argument;           /* position (from 1) of the first offending argument in the call; 0: none */
    double figure;          /* the offending figure in SI units; NAN: none */
};

/*
 * gas_status_words - what the list above says about a status, "" for GAS_OK. Never NULL, static storage.
 */
const char *gas_status_words(enum gas_status status);

static inline struct gas_result gas_good(double value)
{
    return (struct gas_result){value, GAS_OK, 0, __builtin_nan("")};
}

static inline struct gas_result gas_bad(enum gas_status status, int argument, double figure)
{
    return (struct gas_result){__builtin_nan(""), status, argument, figure};
}

#endif
