/*
 * some_gases.h - gases for the tests of the core, written out so that they need no other layer.
 */
#ifndef TESTS_SOME_GASES_H
#define TESTS_SOME_GASES_H

#include <math.h>

#include <gasleaf/gas.h>

/* A gas of constant cp, in J/(mol K); R and M free, for books that round them. The interval is the caller's. */
static inline struct gas constant_gas(struct gas_interval *interval, double cp, double R, double M)
{
    *interval = (struct gas_interval){.T_from = 0, .T_to = INFINITY};
    interval->power[-GAS_POWER_LOWEST] = cp;
    return (struct gas){R, M, GAS_CP_INTEGRATED, 1, interval};
}

/* Nitrogen, 200 to 6000 K: NASA/TP-2002-211556 (2002), constants of cp/R, with its R = 8.314510. */
#define TIMES_R(a) (8.314510 * (a))
static const struct gas_interval nitrogen_intervals[] = {
    {200,
     1000,
     {TIMES_R(2.210371497E+04), TIMES_R(-3.818461820E+02), TIMES_R(6.082738360E+00), TIMES_R(-8.530914410E-03),
      TIMES_R(1.384646189E-05), TIMES_R(-9.625793620E-09), TIMES_R(2.519705809E-12)},
     0,
     NULL},
    {1000,
     6000,
     {TIMES_R(5.877124060E+05), TIMES_R(-2.239249073E+03), TIMES_R(6.066949220E+00), TIMES_R(-6.139685500E-04),
      TIMES_R(1.491806679E-07), TIMES_R(-1.923105485E-11), TIMES_R(1.061954386E-15)},
     0,
     NULL},
};
static const struct gas nitrogen = {GAS_R, 0.0280134, GAS_CP_INTEGRATED, 2, nitrogen_intervals};

/* A made-up gas whose cp rises steeply: 23.7 + 0.0413 T + 1.9e5/T^2 J/(mol K), 150 to 1300 K. */
static const struct gas_interval steep_interval = {150, 1300, {1.9e5, 0, 23.7, 0.0413}, 0, NULL};
static const struct gas steep = {GAS_R, 0.0373, GAS_CP_INTEGRATED, 1, &steep_interval};

/* No heat capacity at all. */
static const struct gas bare = {GAS_R, 0.0373, GAS_CP_INTEGRATED, 0, NULL};

#endif
