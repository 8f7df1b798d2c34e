#include "sheet/leg_refusal.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#include <gasleaf/heat.h>

enum { FIGURE = 80 };

/* Arguments of gas_leg_run that a result can be about. */
enum { ARG_START = 1, ARG_ENDING, ARG_EXPONENT, ARG_EFFICIENCY, ARG_OUTSIDE, ARG_POINTS };

struct gas_unit gas_job_unit(const struct gas_job *job, enum gas_dimension dimension, const char *otherwise)
{
    struct gas_unit unit;
    struct gas_unit_fault fault;
    for (size_t i = 0; i < job->table.columns; i++)
        if (job->table.heading[i].unit.dimension == dimension && !job->table.heading[i].tolerance)
            return job->table.heading[i].unit;
    return gas_unit_parse(otherwise, strlen(otherwise), NULL, &unit, &fault) ? unit : gas_unit_si(dimension);
}

static const char *pressure(const struct gas_job *job, const struct gas_path_case *path, char buffer[FIGURE], double P)
{
    struct gas_unit unit = gas_job_unit(job, GAS_DIM_PRESSURE, "bar");
    return gas_figure(buffer, FIGURE, gas_unit_from_si(&unit, P, path->figures->barometer), &unit);
}

static const char *temperature(const struct gas_job *job, char buffer[FIGURE], double T)
{
    struct gas_unit unit = gas_job_unit(job, GAS_DIM_TEMPERATURE, "°C");
    return gas_figure(buffer, FIGURE, gas_unit_from_si(&unit, T, GAS_ATMOSPHERE), &unit);
}

/* What cannot be met, as a phrase: from where this leg starts. */
static bool refuse_ending(struct gas_refusal *refusal, const char *what, const char *text, const struct gas_job *job,
                          const struct gas_path_case *path, const struct gas_point *start)
{
    char P[FIGURE], T[FIGURE];
    return gas_refuse(refusal, what, "\"%s\" cannot be reached from %s and %s; choose another process or ending.", text,
                      pressure(job, path, P, start->P), temperature(job, T, start->T));
}

bool gas_refuse_leg(struct gas_refusal *refusal, const struct gas_job *job, const struct gas_path_case *path,
                    size_t number, const struct gas_result *fault)
{
    const struct gas_typed_legs *legs = job->legs;
    const char *text = legs->leg[number - 1].text;
    const struct gas_leg *leg = &path->leg[number - 1];
    const struct gas_point *start = number > 1 ? &path->change[number - 2].end : &path->start;
    struct gas_range range = gas_range_of(&job->gas);
    struct gas_unit degrees = gas_job_unit(job, GAS_DIM_TEMPERATURE, "°C");
    char what[24], one[FIGURE], other[FIGURE];
    snprintf(what, sizeof what, "leg %zu", number);
    if (fault->status == GAS_OUTSIDE_DATA && leg->ending != GAS_TO_T)
        return gas_refuse(refusal, what, "\"%s\" takes the temperature out of the data for %s (%s to %s).", text,
                          job->choice->label, temperature(job, one, range.T_from), temperature(job, other, range.T_to));
    if (fault->status == GAS_OUTSIDE_DATA)
        return gas_refuse_temperature(refusal, what, fault->figure, &degrees, job->choice->label, range.T_from,
                                      range.T_to);
    if (fault->status == GAS_NO_HEAT_CAPACITY)
        return gas_refuse(refusal, "gas", "%s has no heat capacity, which \"%s\" needs; give one after '|'.",
                          job->choice->label, text);
    if (fault->argument == ARG_EFFICIENCY)
        return gas_refuse(refusal, what, "\"%s\": an efficiency of %s %s.", text, gas_shown(leg->efficiency).text,
                          fault->status == GAS_NOT_APPLICABLE
                              ? "does not apply to this process; leave it out, or use the "
                                "option flow for a machine"
                              : "is not above 0 and at most 1; 78 % is written 78 % or 0.78");
    if (fault->argument == ARG_EXPONENT)
        return gas_refuse(refusal, what, "\"%s\": the exponent %s %s; give n, such as n=1.3.", text,
                          gas_shown(leg->n).text, gas_status_words(fault->status));
    if (fault->status == GAS_WRONG_SIDE)
        return gas_refuse(refusal, what,
                          "\"%s\": the outside pressure %s is on the wrong side of the gas pressure %s for "
                          "this ending.",
                          text, pressure(job, path, one, leg->P_outside), pressure(job, path, other, start->P));
    if (fault->argument == ARG_OUTSIDE)
        return gas_refuse(refusal, what, "\"%s\": the outside pressure %s %s.", text,
                          pressure(job, path, one, leg->P_outside), gas_status_words(fault->status));
    if (fault->argument == ARG_POINTS)
        return gas_refuse(refusal, what,
                          "\"%s\": give at least two points with P and V above zero, starting where the gas "
                          "is (%s), with V moving.",
                          text, pressure(job, path, one, start->P));
    if (fault->status == GAS_NOT_APPLICABLE)
        return gas_refuse(refusal, what, "\"%s\": this ending does not apply to this process%s; choose another.", text,
                          job->options.system == GAS_FLOW ? " in flow" : "");
    if (fault->status == GAS_NOT_POSITIVE || fault->status == GAS_NOT_FINITE)
        return gas_refuse(refusal, what, "\"%s\": the figure of its ending %s.", text, gas_status_words(fault->status));
    return refuse_ending(refusal, what, text, job, path, start);
}
