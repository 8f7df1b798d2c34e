#include "audit/path_replay.h"

#include <math.h>

#include <gasleaf/heat.h>

static const double ln10 = 2.302585092994045684; /* mathematical constant */

/* log10 for ln: work, heat and entropy of an isothermal leg alike. */
static void log10_for_ln(const struct gas_leg *leg, struct gas_change *change)
{
    if (leg->process != GAS_ISOTHERMAL)
        return;
    change->W /= ln10;
    change->Q /= ln10;
    change->dS /= ln10;
    change->Q_in /= ln10;
    change->Q_out /= ln10;
}

/* n cv dT where n cp dT is due, and the reverse: the heat of a leg without work, the work of one without heat. */
static void heat_swapped(const struct gas_leg *leg, enum gas_system system, struct gas_change *change)
{
    double right = system == GAS_CLOSED ? change->dU : change->dH;
    double other = system == GAS_CLOSED ? change->dH : change->dU;
    if (leg->process == GAS_ADIABATIC)
        change->W = other;
    else if (leg->process == GAS_ISOCHORIC && system == GAS_CLOSED)
        change->Q = other;
    else if (leg->process == GAS_ISOBARIC)
        change->Q = system == GAS_CLOSED ? change->dU : other;
    else
        change->Q += other - right;
    double kept = change->dU;
    change->dU = change->dH;
    change->dH = kept;
}

/* W efficiency where W / efficiency is due, and the reverse in an expansion. */
static void efficiency_turned(const struct replay *replay, const struct gas_point *start, const struct gas_leg *leg,
                              struct gas_change *change)
{
    const struct gas *gas = &replay->job.gas;
    double turn = change->W > 0 ? leg->efficiency * leg->efficiency : 1 / (leg->efficiency * leg->efficiency);
    if (leg->efficiency >= 1 || leg->process != GAS_ADIABATIC)
        return;
    bool flow = replay->job.options.system == GAS_FLOW;
    change->W *= turn;
    struct gas_result T =
        flow ? gas_T_after_dh(gas, start->T, change->dH * turn) : gas_T_after_du(gas, start->T, change->dU * turn);
    change->end.T = T.value;
    change->end.v = gas->R * T.value / change->end.P;
    change->dH = gas_dh(gas, start->T, T.value).value;
    change->dU = gas_du(gas, start->T, T.value).value;
}

/* T2 by a wrong exponent; the work by the right formula from that T2. */
static void exponent_wrong(const struct replay *replay, const struct gas_point *start, const struct gas_leg *leg,
                           struct gas_change *change)
{
    const struct gas *gas = &replay->job.gas;
    bool flow = replay->job.options.system == GAS_FLOW, polytropic = leg->process == GAS_POLYTROPIC;
    bool by_volume = leg->ending == GAS_TO_V || leg->ending == GAS_BY_V_RATIO;
    double n = polytropic ? leg->n : gas_gamma(gas, start->T).value;
    double ratio = by_volume ? start->v / change->end.v : change->end.P / start->P;
    double power[] = {
        [EXPONENT_N_1] = n - 1, [EXPONENT_N_1_N] = (n - 1) / n, [EXPONENT_INVERSE] = 1 / n, [EXPONENT_N] = n};
    if ((!polytropic && leg->process != GAS_ADIABATIC) || leg->efficiency < 1 || !isfinite(n) ||
        replay->exponent == (by_volume ? EXPONENT_N_1 : EXPONENT_N_1_N))
        return;
    change->end.T = start->T * pow(ratio, power[replay->exponent]);
    change->dH = gas_dh(gas, start->T, change->end.T).value;
    change->dU = gas_du(gas, start->T, change->end.T).value;
    change->W = flow ? change->dH : change->dU;
    if (polytropic)
        change->W = (flow ? n : 1) * gas->R / (n - 1) * (change->end.T - start->T);
    change->Q = (flow ? change->dH : change->dU) - change->W;
    *(by_volume ? &change->end.P : &change->end.v) =
        gas->R * change->end.T / (by_volume ? change->end.v : change->end.P);
}

static void add_up(struct gas_path_case *path)
{
    struct gas_change sum = {.end = path->change[path->count - 1].end};
    for (size_t i = 0; i < path->count; i++) {
        const struct gas_change *part = &path->change[i];
        sum.W += part->W;
        sum.Q += part->Q;
        sum.dU += part->dU;
        sum.dH += part->dH;
        sum.dS += part->dS;
        sum.S_made += part->S_made;
        sum.Q_in += part->Q_in;
        sum.Q_out += part->Q_out;
    }
    path->total = sum;
}

bool path_replay(struct replay *replay, double *si)
{
    struct gas_path_case path;
    struct gas_refusal refusal = {.made = true};
    if (!gas_path_solve(&replay->job, &replay->figures, &path, &refusal))
        return false;
    for (size_t i = 0; i < path.count; i++) {
        struct gas_change *change = &path.change[i];
        if (replay->log10)
            log10_for_ln(&path.leg[i], change);
        if (replay->heat_swapped)
            heat_swapped(&path.leg[i], replay->job.options.system, change);
        if (replay->efficiency_turned)
            efficiency_turned(replay, i ? &path.change[i - 1].end : &path.start, &path.leg[i], change);
        if (replay->exponent)
            exponent_wrong(replay, i ? &path.change[i - 1].end : &path.start, &path.leg[i], change);
    }
    if (replay->log10 || replay->heat_swapped || replay->efficiency_turned || replay->exponent)
        add_up(&path);
    return gas_path_quantity(&replay->job, &path, &path.total, &replay->job.wanted.heading[0], si, &refusal);
}
