#include "sheet/leg_refusal.h"

#include <stdio.h>

#include <gasleaf/heat.h>

#include "sheet/job_units.h"

/* Arguments of gas_leg_run that a result can be about, as path.h numbers them. */
enum { ARG_EXPONENT = 3, ARG_EFFICIENCY, ARG_OUTSIDE, ARG_POINTS };

/* A leg that cannot be, and what its sentences speak of. */
struct refused {
    struct gas_refusal *refusal;
    const struct gas_job *job;
    const struct gas_path_case *path;
    const struct gas_result *fault;
    const struct gas_leg *leg;
    const struct gas_point *start; /* of the leg */
    const char *text;              /* the leg as typed */
    char what[24];                 /* "leg 2" */
};

static bool refuse_outside_data(const struct refused *refused)
{
    const struct gas_job *job = refused->job;
    struct gas_range range = gas_range_of(&job->gas);
    struct gas_unit degrees = gas_job_unit(job, GAS_DIM_TEMPERATURE, "°C");
    char from[GAS_SHOWN], to[GAS_SHOWN];
    if (refused->leg->ending == GAS_TO_T)
        return gas_refuse_temperature(refused->refusal, refused->what, refused->fault->figure, &degrees,
                                      job->choice->label, range.T_from, range.T_to);
    gas_shown_temperature(job, refused->path->figures, from, range.T_from);
    gas_shown_temperature(job, refused->path->figures, to, range.T_to);
    return gas_refuse(refused->refusal, refused->what,
                      "\"%s\" takes the temperature out of the data for %s (%s to %s).", refused->text,
                      job->choice->label, from, to);
}

static bool refuse_efficiency(const struct refused *refused)
{
    return gas_refuse(refused->refusal, refused->what, "\"%s\": an efficiency of %s %s.", refused->text,
                      gas_shown(refused->leg->efficiency).text,
                      refused->fault->status == GAS_NOT_APPLICABLE
                          ? "does not apply to this process; leave it out, or use the option flow for a machine"
                          : "is not above 0 and at most 1; 78 % is written 78 % or 0.78");
}

static bool refuse_exponent(const struct refused *refused)
{
    return gas_refuse(refused->refusal, refused->what, "\"%s\": the exponent %s %s; give n, such as n=1.3.",
                      refused->text, gas_shown(refused->leg->n).text, gas_status_words(refused->fault->status));
}

static bool refuse_outside_pressure(const struct refused *refused)
{
    char outside[GAS_SHOWN], P[GAS_SHOWN];
    gas_shown_pressure(refused->job, refused->path->figures, outside, refused->leg->P_outside);
    gas_shown_pressure(refused->job, refused->path->figures, P, refused->start->P);
    if (refused->fault->status == GAS_WRONG_SIDE)
        return gas_refuse(
            refused->refusal, refused->what,
            "\"%s\": the outside pressure %s is on the wrong side of the gas pressure %s for this ending.",
            refused->text, outside, P);
    return gas_refuse(refused->refusal, refused->what, "\"%s\": the outside pressure %s %s.", refused->text, outside,
                      gas_status_words(refused->fault->status));
}

static bool refuse_points(const struct refused *refused)
{
    char P[GAS_SHOWN];
    return gas_refuse(refused->refusal, refused->what,
                      "\"%s\": give at least two points with P and V above zero, starting where the gas is (%s), with "
                      "V moving.",
                      refused->text, gas_shown_pressure(refused->job, refused->path->figures, P, refused->start->P));
}

static bool refuse_ending(const struct refused *refused)
{
    char P[GAS_SHOWN], T[GAS_SHOWN];
    enum gas_status status = refused->fault->status;
    if (status == GAS_NOT_APPLICABLE)
        return gas_refuse(refused->refusal, refused->what,
                          "\"%s\": this ending does not apply to this process%s; choose another.", refused->text,
                          refused->job->options.system == GAS_FLOW ? " in flow" : "");
    if (status == GAS_NOT_POSITIVE || status == GAS_NOT_FINITE)
        return gas_refuse(refused->refusal, refused->what, "\"%s\": the figure of its ending %s.", refused->text,
                          gas_status_words(status));
    return gas_refuse(refused->refusal, refused->what,
                      "\"%s\" cannot be reached from %s and %s; choose another process or ending.", refused->text,
                      gas_shown_pressure(refused->job, refused->path->figures, P, refused->start->P),
                      gas_shown_temperature(refused->job, refused->path->figures, T, refused->start->T));
}

bool gas_refuse_leg(struct gas_refusal *refusal, const struct gas_job *job, const struct gas_path_case *path,
                    size_t number, const struct gas_result *fault)
{
    const struct gas_typed_legs *legs = job->legs;
    struct refused refused = {.refusal = refusal,
                              .job = job,
                              .path = path,
                              .fault = fault,
                              .leg = &path->leg[number - 1],
                              .start = number > 1 ? &path->change[number - 2].end : &path->start,
                              .text = legs->leg[number - 1].text};
    snprintf(refused.what, sizeof refused.what, "leg %zu", number);
    if (fault->status == GAS_OUTSIDE_DATA)
        return refuse_outside_data(&refused);
    if (fault->status == GAS_NO_HEAT_CAPACITY)
        return gas_refuse(refusal, "gas", "%s has no heat capacity, which \"%s\" needs; give one after '|'.",
                          job->choice->label, refused.text);
    if (fault->argument == ARG_EFFICIENCY)
        return refuse_efficiency(&refused);
    if (fault->argument == ARG_EXPONENT)
        return refuse_exponent(&refused);
    if (fault->status == GAS_WRONG_SIDE || fault->argument == ARG_OUTSIDE)
        return refuse_outside_pressure(&refused);
    return fault->argument == ARG_POINTS ? refuse_points(&refused) : refuse_ending(&refused);
}
