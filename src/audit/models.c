#include "audit/models.h"

#include <math.h>
#include <string.h>

#include <gasleaf/heat.h>

#include "audit/readings.h"

/* -- constants ----------------------------------------------------------------------------------------------------- */

/* parameter: J/(mol K), as the figure was used */
bool model_R(struct replay *replay, double parameter)
{
    if (fabs(replay->job.gas.R / parameter - 1) < 1e-12)
        return false;
    double ratio = parameter / replay->job.gas.R;
    replay->job.gas.R = parameter;
    if (replay->desk->job->choice->rule[0] == 'k') { /* k stays, and cp = R k/(k - 1) goes with R */
        replay->interval = *replay->desk->job->gas.interval;
        for (int i = 0; i < GAS_POWERS; i++)
            replay->interval.power[i] *= ratio;
        replay->job.gas.interval = &replay->interval;
    }
    return true;
}

/* parameter: kg/mol; for air alone, where several round figures are in use */
bool model_molar_mass(struct replay *replay, double parameter)
{
    double ratio = replay->job.gas.molar_mass / parameter;
    if (!(fabs(ratio - 1) < 0.005) || fabs(ratio - 1) < 1e-9)
        return false;
    replay->job.gas.molar_mass = parameter;
    return true;
}

/* parameter: decimals of kg/kmol */
bool model_molar_mass_digits(struct replay *replay, double parameter)
{
    double unit = pow(10, parameter), M = replay->job.gas.molar_mass;
    double rounded = round(1000 * M * unit) / unit / 1000;
    if (!(rounded > 0) || fabs(rounded / M - 1) < 1e-9)
        return false;
    replay->job.gas.molar_mass = rounded;
    return true;
}

/* R/M in kJ/(kg K) to so many digits: 0.287 for air */
bool model_specific_R_digits(struct replay *replay, double parameter)
{
    struct gas *gas = &replay->job.gas;
    double rounded = gas->R / rounded_to(gas->R / gas->molar_mass, (int)parameter);
    if (!(rounded > 0) || fabs(rounded / gas->molar_mass - 1) < 1e-9)
        return false;
    gas->molar_mass = rounded;
    return true;
}

/* 8.314 where R/M is due: as if M were 1 kg/kmol */
bool model_R_for_specific(struct replay *replay, double parameter)
{
    (void)parameter;
    replay->job.gas.molar_mass = 1e-3;
    return true;
}

/* -- heat capacities ----------------------------------------------------------------------------------------------- */

static bool hold_cp(struct replay *replay, double cp)
{
    if (!(cp > replay->job.gas.R) || replay->job.gas.interval_count == 0)
        return false;
    replay_hold_cp(replay, cp);
    return true;
}

static bool hold_cp_at(struct replay *replay, double T)
{
    struct gas_result cp = gas_cp(&replay->desk->job->gas, T);
    return cp.status == GAS_OK && hold_cp(replay, cp.value);
}

bool model_cp_at_start(struct replay *replay, double parameter)
{
    (void)parameter;
    return hold_cp_at(replay, replay->truth->T_start);
}

bool model_cp_at_end(struct replay *replay, double parameter)
{
    (void)parameter;
    return hold_cp_at(replay, replay->truth->T_end);
}

bool model_cp_at(struct replay *replay, double parameter)
{
    return hold_cp_at(replay, parameter);
}

/* parameter: k = cp/cv */
bool model_cp_of_k(struct replay *replay, double parameter)
{
    return hold_cp(replay, replay->job.gas.R * parameter / (parameter - 1));
}

static bool cp_rule(struct replay *replay, enum gas_cp_rule rule)
{
    if (replay->job.gas.interval_count == 0 || replay->job.gas.rule == rule)
        return false;
    replay->job.gas.rule = rule;
    return true;
}

bool model_cp_mean(struct replay *replay, double parameter)
{
    (void)parameter;
    return cp_rule(replay, GAS_CP_MEAN_OF_ENDS);
}

bool model_cp_at_mean(struct replay *replay, double parameter)
{
    (void)parameter;
    return cp_rule(replay, GAS_CP_AT_MEAN);
}

/* The integral of the powers of an interval between two figures of one sign. */
static double integral_of(const struct gas_interval *interval, double from, double to)
{
    double sum = 0;
    for (int i = 0; i < GAS_POWERS; i++) {
        int power = i + GAS_POWER_LOWEST + 1;
        if (interval->power[i] != 0)
            sum += interval->power[i] * (power == 0 ? log(to / from) : (pow(to, power) - pow(from, power)) / power);
    }
    return sum;
}

/* A formula in K used with degC, as its mean between the two temperatures. */
bool model_cp_celsius(struct replay *replay, double parameter)
{
    (void)parameter;
    const struct gas *gas = &replay->desk->job->gas;
    double from = replay->truth->T_start - 273.15, to = replay->truth->T_end - 273.15;
    if (gas->interval_count != 1 || gas->interval->term_count > 0 || !isfinite(from))
        return false;
    if (!isfinite(to) || fabs(to - from) < 1e-6)
        to = from * (1 + 1e-6);
    return hold_cp(replay, integral_of(gas->interval, from, to) / (to - from));
}

bool model_cp_for_cv(struct replay *replay, double parameter)
{
    (void)parameter;
    if (replay->desk->legs) {
        replay->heat_swapped = true;
        return true;
    }
    if (!replay->desk->other)
        return false;
    replay->job.own = replay->desk->other->own;
    replay->job.wanted.heading[0].symbol = replay->desk->other->wanted.heading[0].symbol;
    return true;
}

/* -- the sum itself ------------------------------------------------------------------------------------------------ */

static bool wanted_is_energy(const struct replay *replay)
{
    enum gas_dimension dimension = replay->desk->job->wanted.heading[0].unit.dimension;
    return dimension == GAS_DIM_ENERGY || dimension == GAS_DIM_POWER;
}

static bool wanted_is_entropy(const struct replay *replay)
{
    enum gas_symbol symbol = replay->desk->job->wanted.heading[0].symbol;
    return symbol == GAS_SYM_DS || symbol == GAS_SYM_S_TOTAL || symbol == GAS_SYM_S_SPECIFIC;
}

/* parameter: on an energy that comes from a heat capacity per degree */
bool model_factor(struct replay *replay, double parameter)
{
    enum gas_symbol symbol = replay->desk->job->wanted.heading[0].symbol;
    if (symbol != GAS_SYM_DH && symbol != GAS_SYM_DU && symbol != GAS_SYM_Q && symbol != GAS_SYM_H_SPECIFIC &&
        symbol != GAS_SYM_H_TOTAL)
        return false;
    replay->factor *= parameter;
    return true;
}

/* cp per kmol with kg (parameter 1), cp per kg with kmol (-1) */
bool model_energy_by_molar_mass(struct replay *replay, double parameter)
{
    double M = 1000 * replay->desk->job->gas.molar_mass;
    if (!wanted_is_energy(replay) || !(M > 0))
        return false;
    replay->factor *= parameter > 0 ? M : 1 / M;
    return true;
}

static bool has_process(const struct replay *replay, enum gas_process process)
{
    const struct gas_typed_legs *legs = replay->desk->legs;
    for (size_t i = 0; legs && i < legs->count; i++)
        if (legs->leg[i].process == process)
            return true;
    return false;
}

bool model_log10(struct replay *replay, double parameter)
{
    (void)parameter;
    if (has_process(replay, GAS_ISOTHERMAL)) {
        replay->log10 = true;
        return true;
    }
    if (replay->desk->legs || !wanted_is_entropy(replay))
        return false;
    replay->factor /= log(10);
    return true;
}

bool model_flow_for_closed(struct replay *replay, double parameter)
{
    (void)parameter;
    if (!replay->desk->legs)
        return false;
    enum gas_system *system = &replay->job.options.system;
    *system = *system == GAS_CLOSED ? GAS_FLOW : GAS_CLOSED;
    return true;
}

/* The figures of state 1 and state 2 put in each other's place; parameter: the symbol. */
bool model_exchanged(struct replay *replay, double parameter)
{
    enum gas_symbol symbol = (enum gas_symbol)parameter;
    int first = gas_job_column(replay->desk->job, symbol, 1), second = gas_job_column(replay->desk->job, symbol, 2);
    if (first < 0 || second < 0)
        return false;
    double kept = replay->figures.si[first];
    replay->figures.si[first] = replay->figures.si[second];
    replay->figures.si[second] = kept;
    return isfinite(kept) && isfinite(replay->figures.si[first]);
}
