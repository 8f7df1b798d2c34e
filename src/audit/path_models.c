/* Slips in the legs of a path. */
#include <math.h>

#include <gasleaf/heat.h>

#include "audit/models.h"

/* Calls change for every leg; true when one of them changed. */
static bool change_legs(struct replay *replay,
                        bool (*change)(const struct replay *replay, size_t index, struct gas_typed_leg *leg))
{
    struct gas_typed_legs *legs = replay_legs(replay);
    bool any = false;
    for (size_t i = 0; legs && i < legs->count; i++)
        any = change(replay, i, &legs->leg[i]) || any;
    return any;
}

static const struct gas_point *start_of(const struct replay *replay, size_t index)
{
    const struct gas_path_case *path = &replay->truth->path;
    return index == 0 ? &path->start : &path->change[index - 1].end;
}

/* r used for 1/r: the leg ends as far on the other side. */
static bool invert_ratio(const struct replay *replay, size_t index, struct gas_typed_leg *leg)
{
    const struct gas_leg *solved = &replay->truth->path.leg[index];
    const struct gas_point *start = start_of(replay, index);
    if (leg->process == GAS_ISOBARIC || leg->process == GAS_ISOCHORIC)
        return false;
    switch (leg->ending) {
    case GAS_TO_P:
        leg->value = replay_fixed(start->P * start->P / solved->value, GAS_DIM_PRESSURE);
        return true;
    case GAS_TO_V:
        leg->value = replay_fixed(start->v * start->v / solved->value, GAS_DIM_MOLAR_VOLUME);
        return true;
    case GAS_BY_P_RATIO:
    case GAS_BY_V_RATIO:
        leg->value = replay_fixed(1 / solved->value, GAS_DIM_NUMBER);
        return true;
    default:
        return false;
    }
}

bool model_ratio_inverted(struct replay *replay, double parameter)
{
    (void)parameter;
    return change_legs(replay, invert_ratio);
}

/* The reversible formula where the change is not: an efficiency left out, a constant outside pressure ignored. */
static bool make_reversible(const struct replay *replay, size_t index, struct gas_typed_leg *leg)
{
    (void)replay, (void)index;
    if (leg->process == GAS_AGAINST || leg->process == GAS_AGAINST_ISOTHERMAL) {
        if (leg->ending == GAS_TO_BALANCE)
            return false;
        leg->process = leg->process == GAS_AGAINST ? GAS_ADIABATIC : GAS_ISOTHERMAL;
        leg->outside.kind = GAS_FIGURE_NONE;
        return true;
    }
    if (leg->process == GAS_POLYTROPIC && leg->efficiency.kind != GAS_FIGURE_NONE)
        leg->process = GAS_ADIABATIC;
    else if (leg->process != GAS_ADIABATIC || leg->efficiency.kind == GAS_FIGURE_NONE)
        return false;
    leg->efficiency.kind = GAS_FIGURE_NONE;
    return true;
}

bool model_reversible(struct replay *replay, double parameter)
{
    (void)parameter;
    return change_legs(replay, make_reversible);
}

bool model_efficiency_turned(struct replay *replay, double parameter)
{
    (void)parameter;
    const struct gas_typed_legs *legs = replay->desk->legs;
    for (size_t i = 0; legs && i < legs->count; i++)
        if (legs->leg[i].process == GAS_ADIABATIC && legs->leg[i].efficiency.kind != GAS_FIGURE_NONE)
            return replay->efficiency_turned = true;
    return false;
}

static bool make_isothermal(const struct replay *replay, size_t index, struct gas_typed_leg *leg)
{
    (void)replay, (void)index;
    if ((leg->process != GAS_ADIABATIC && leg->process != GAS_POLYTROPIC) || leg->ending == GAS_TO_T ||
        leg->ending == GAS_BY_T_RATIO)
        return false;
    leg->process = GAS_ISOTHERMAL;
    leg->efficiency.kind = leg->n.kind = GAS_FIGURE_NONE;
    return true;
}

bool model_isothermal(struct replay *replay, double parameter)
{
    (void)parameter;
    return change_legs(replay, make_isothermal);
}

static bool make_adiabatic(const struct replay *replay, size_t index, struct gas_typed_leg *leg)
{
    (void)replay, (void)index;
    if (leg->process != GAS_ISOTHERMAL && leg->process != GAS_POLYTROPIC)
        return false;
    leg->process = GAS_ADIABATIC;
    leg->efficiency.kind = leg->n.kind = GAS_FIGURE_NONE;
    return true;
}

bool model_adiabatic(struct replay *replay, double parameter)
{
    (void)parameter;
    return change_legs(replay, make_adiabatic);
}

/* -- exponents ----------------------------------------------------------------------------------------------------- */

/* The exponent a leg truly has: n, or k at its start when it is adiabatic and reversible. */
static double exponent_of(const struct replay *replay, size_t index, const struct gas_typed_leg *leg)
{
    if (leg->efficiency.kind != GAS_FIGURE_NONE)
        return NAN;
    if (leg->process == GAS_POLYTROPIC)
        return replay->truth->path.leg[index].n;
    return leg->process == GAS_ADIABATIC ? gas_gamma(&replay->desk->job->gas, start_of(replay, index)->T).value : NAN;
}

static bool set_exponent(struct gas_typed_leg *leg, double n)
{
    if (!isfinite(n) || fabs(n) > 50)
        return false;
    leg->process = GAS_POLYTROPIC;
    leg->n = replay_fixed(n, GAS_DIM_NUMBER);
    return true;
}

/* parameter: enum wrong_exponent */
bool model_exponent(struct replay *replay, double parameter)
{
    const struct gas_typed_legs *legs = replay->desk->legs;
    replay->exponent = (enum wrong_exponent)parameter;
    for (size_t i = 0; legs && i < legs->count; i++)
        if (isfinite(exponent_of(replay, i, &legs->leg[i])))
            return true;
    return false;
}

/* k = 1.4 for n */
static bool exponent_k(const struct replay *replay, size_t index, struct gas_typed_leg *leg)
{
    return leg->process == GAS_POLYTROPIC && isfinite(exponent_of(replay, index, leg)) && set_exponent(leg, 1.4);
}

bool model_exponent_k(struct replay *replay, double parameter)
{
    (void)parameter;
    return change_legs(replay, exponent_k);
}
