/*
 * heat_change.h - changes between temperatures that were checked before, for heat.c and its inverses. (core, internal)
 */
#ifndef CORE_HEAT_CHANGE_H
#define CORE_HEAT_CHANGE_H

#include <stdbool.h>

#include <gasleaf/heat.h>

/* Which integral: of c dT or of c/T dT, with c = cp or cv. */
struct gas_change_kind {
    bool over_T;
    bool at_constant_volume;
};

static const struct gas_change_kind GAS_CHANGE_H = {false, false};
static const struct gas_change_kind GAS_CHANGE_U = {false, true};
static const struct gas_change_kind GAS_CHANGE_S_AT_P = {true, false};
static const struct gas_change_kind GAS_CHANGE_S_AT_V = {true, true};

struct gas_range gas_range_with_slack(const struct gas *gas);
struct gas_result gas_check_temperature(const struct gas *gas, double T, int argument);
double gas_cp_unchecked(const struct gas *gas, double T);
double gas_change_unchecked(const struct gas *gas, struct gas_change_kind kind, double T1, double T2);

#endif
