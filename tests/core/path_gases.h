/*
 * path_gases.h - gases for the tests of legs and paths (nitrogen and the others: some_gases.h), and their cp by hand:
 * no function of the project is used.
 */
#ifndef TESTS_PATH_GASES_H
#define TESTS_PATH_GASES_H

#include <math.h>

#include <gasleaf/path.h>

#include "some_gases.h"

/* clang-format off */
/* cp = 7/2 R: what a diatomic gas has by equipartition */
static const struct gas_interval diatomic_cp[] = {{0, INFINITY, {0, 0, 3.5 * GAS_R}, 0, NULL}};
static const struct gas_interval monatomic_cp[] = {{0, INFINITY, {0, 0, 2.5 * GAS_R}, 0, NULL}};
/* a made-up cubic with a 1/T^2 term, rising over its whole range */
static const struct gas_interval cubic_cp[] = {{200, 2500, {-1.7e5, 0, 26.3, 2.31e-2, -7.9e-6, 1.13e-9}, 0, NULL}};

static const struct gas diatomic = {GAS_R, 0.029, GAS_CP_INTEGRATED, 1, diatomic_cp};
static const struct gas monatomic = {GAS_R, 0.004, GAS_CP_INTEGRATED, 1, monatomic_cp};
static const struct gas cubic = {GAS_R, 0.044, GAS_CP_INTEGRATED, 1, cubic_cp};
/* clang-format on */

static const struct gas *const path_gases[] = {&diatomic, &monatomic, &cubic, &nitrogen};
enum { PATH_GASES = sizeof path_gases / sizeof path_gases[0] };

static inline double cp_by_hand(const struct gas *gas, double T)
{
    const struct gas_interval *interval = gas->interval;
    while (interval + 1 < gas->interval + gas->interval_count && T > interval->T_to)
        interval++;
    double cp = 0;
    for (int i = 0; i < GAS_POWERS; i++)
        cp += interval->power[i] * pow(T, i + GAS_POWER_LOWEST);
    return cp;
}

static inline struct gas_point point_PT(double P, double T)
{
    return (struct gas_point){.P = P, .T = T, .v = GAS_R * T / P};
}

/* A leg with nothing special about it. */
static inline struct gas_leg leg_of(enum gas_process process, enum gas_ending ending, double value)
{
    return (struct gas_leg){.process = process, .ending = ending, .value = value, .n = NAN, .efficiency = 1};
}

#endif
