/* Sentences of the solver: what is missing, what contradicts, what cannot be, in the user's own figures. */
#include "sheet/solver_parts.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#include "sheet/plan_cache.h"
#include <gasleaf/heat.h>

enum { LIST_TEXT = 200 };

static const char *variable_name(char buffer[GAS_NAME_TEXT], struct gas_known known)
{
    const char *symbol = gas_variable_symbol(known.variable);
    if (known.state > 0)
        snprintf(buffer, GAS_NAME_TEXT, "%s%d", symbol, known.state);
    else if (known.state == GAS_CONSTANT)
        snprintf(buffer, GAS_NAME_TEXT, "a constant %s", symbol);
    else
        snprintf(buffer, GAS_NAME_TEXT, "%s", symbol);
    return buffer;
}

/* "P1, T1 and V1" */
static const char *list(char buffer[LIST_TEXT], const struct gas_known *known, size_t count, const char *last)
{
    char name[GAS_NAME_TEXT];
    size_t used = 0;
    buffer[0] = '\0';
    for (size_t i = 0; i < count && used < LIST_TEXT - 1; i++)
        used += (size_t)snprintf(buffer + used, LIST_TEXT - used, "%s%s",
                                 i == 0           ? ""
                                 : i + 1 == count ? last
                                                  : ", ",
                                 variable_name(name, known[i]));
    return buffer;
}

/* -- what is missing ----------------------------------------------------------------------------------------------- */

/* The same figure in another dress: who lacks one lacks the other. */
static bool same_thing(struct gas_known a, struct gas_known b)
{
    static const unsigned dresses[] = {
        1u << GAS_VAR_N | 1u << GAS_VAR_MASS,
        1u << GAS_VAR_V_MOLAR | 1u << GAS_VAR_V_MASS | 1u << GAS_VAR_RHO | 1u << GAS_VAR_C,
        1u << GAS_VAR_H_MOLAR | 1u << GAS_VAR_H_MASS,
        1u << GAS_VAR_U_MOLAR | 1u << GAS_VAR_U_MASS,
        1u << GAS_VAR_S_MOLAR | 1u << GAS_VAR_S_MASS,
    };
    unsigned both = 1u << a.variable | 1u << b.variable;
    bool same = a.variable == b.variable;
    for (size_t i = 0; i < sizeof dresses / sizeof *dresses; i++)
        same = same || (both & ~dresses[i]) == 0;
    return same && a.state == b.state;
}

/* Single further figures that would do: those of everyday first, the others only when asked. */
static size_t missing_one(const struct gas_plan *plan, struct gas_known wanted, bool everyday, struct gas_known *more,
                          size_t room)
{
    struct gas_known candidate[4 * GAS_VARIABLES];
    size_t count = gas_plan_missing(plan, wanted, candidate, sizeof candidate / sizeof *candidate), kept = 0;
    for (size_t i = 0; i < count && kept < room; i++)
        if (!same_thing(candidate[i], wanted) && !(everyday && candidate[i].variable > GAS_VAR_MASS) &&
            !(kept && same_thing(candidate[i], more[kept - 1])))
            more[kept++] = candidate[i];
    return kept;
}

/* Two further figures of the wanted state that would do together. */
static size_t missing_pair(const struct solver_entry *entry, struct gas_known wanted, struct gas_known pair[2])
{
    static const enum gas_variable first[] = {GAS_VAR_P, GAS_VAR_T, GAS_VAR_V, GAS_VAR_N};
    struct gas_known known[GAS_COLUMNS + 1];
    struct gas_plan trial;
    memcpy(known, entry->known, entry->count * sizeof *known);
    for (size_t i = 0; i < sizeof first / sizeof *first; i++) {
        known[entry->count] = (struct gas_known){first[i], wanted.state};
        if (same_thing(known[entry->count], wanted) || gas_plan_finds(&entry->plan, first[i], wanted.state) ||
            gas_plan_for(&trial, known, entry->count + 1, entry->plan.states, entry->plan.open).status != GAS_OK)
            continue;
        pair[0] = known[entry->count];
        if (missing_one(&trial, wanted, true, &pair[1], 1))
            return 2;
    }
    return 0;
}

static bool state_is_unclear(const struct solver_entry *entry, struct gas_known wanted, struct gas_refusal *refusal)
{
    char name[GAS_NAME_TEXT], choices[LIST_TEXT];
    struct gas_known found[GAS_STATES];
    size_t count = 0;
    for (int state = 1; state <= entry->plan.states && wanted.state == 0; state++)
        if (gas_plan_finds(&entry->plan, wanted.variable, state))
            found[count++] = (struct gas_known){wanted.variable, state};
    if (count == 0)
        return false;
    gas_refuse(refusal, "wanted", "%s is not the same in every state; write %s.", variable_name(name, wanted),
               list(choices, found, count, " or "));
    return true;
}

bool solver_refuse_missing(const struct solver_entry *entry, struct gas_known wanted, struct gas_refusal *refusal)
{
    enum { SHOWN = 3 };
    char name[GAS_NAME_TEXT], from[LIST_TEXT], what[LIST_TEXT];
    struct gas_known more[SHOWN];
    if (state_is_unclear(entry, wanted, refusal))
        return false;
    bool leg = wanted.state > 1; /* a process from state 1 would lead there as well */
    const char *last = leg ? ", " : " or ";
    size_t count = missing_one(&entry->plan, wanted, true, more, SHOWN);
    if (count == 0) {
        count = missing_pair(entry, wanted, more);
        last = leg ? ", " : count ? " and " : " or ";
    }
    if (count == 0)
        count = missing_one(&entry->plan, wanted, false, more, SHOWN);
    list(what, more, count, last);
    if (count == 0)
        snprintf(what, sizeof what, "more figures, such as P, T and V");
    if (entry->count == 0)
        return gas_refuse(refusal, "given", "%s cannot be found, nothing of a state is given here; give %s.",
                          variable_name(name, wanted), what);
    return gas_refuse(refusal, "given", "%s cannot be found from %s; give %s%s.", variable_name(name, wanted),
                      list(from, entry->known, entry->count, " and "), what, leg ? " or a leg" : "");
}

bool solver_refuse_knowns(const struct gas_job *job, const struct solver_entry *entry, struct gas_result result,
                          struct gas_refusal *refusal)
{
    char shown[80], name[GAS_NAME_TEXT], other[GAS_NAME_TEXT];
    size_t second = (size_t)result.argument - 1;
    if (result.status != GAS_CONTRADICTION || result.argument < 1 || second >= entry->count)
        return gas_refuse(refusal, "given", "there are more states than can be told apart; use 1 to %d.", GAS_STATES);
    const char *text = job->table.heading[entry->column[second]].text;
    struct gas_known bare = {entry->known[second].variable, 0};
    gas_quoted(shown, sizeof shown, text, strlen(text));
    for (size_t i = 0; i < entry->count; i++)
        if (entry->known[i].variable == bare.variable && entry->known[i].state == GAS_CONSTANT)
            return gas_refuse(refusal, "given",
                              "%s is said to be constant, but given for more than one state; leave the others out.",
                              variable_name(other, bare));
    if (entry->known[second].state == 0)
        return gas_refuse(refusal, "given",
                          "%s holds in every state, but %s is given for one state as well; number it "
                          "or leave one out.",
                          shown, variable_name(other, bare));
    return gas_refuse(refusal, "given",
                      "%s is given once for every state and again as %s; number the first or leave "
                      "one out.",
                      variable_name(other, bare), variable_name(name, entry->known[second]));
}

/* -- figures that cannot be ---------------------------------------------------------------------------------------- */

/* The column in whose unit the user would read a variable; -1: none is given. */
static int column_for(const struct gas_solver *solver, struct gas_known known)
{
    int other = -1;
    for (size_t i = 0; i < solver->columns; i++) {
        if (!solver->column[i].used || solver->column[i].known.variable != known.variable)
            continue;
        if (solver->column[i].known.state == known.state)
            return (int)i;
        other = (int)i;
    }
    return other;
}

static const char *figure_of(char buffer[80], const struct gas_solver *solver, const struct gas_job *job,
                             const struct gas_case *figures, struct gas_known known, double si)
{
    int column = column_for(solver, known);
    const struct gas_heading *heading = &job->table.heading[column < 0 ? 0 : column];
    if (column >= 0)
        return gas_figure(buffer, 80, gas_job_shown(job, figures, heading, si), &heading->unit);
    gas_number_format(buffer, 60, si, 6);
    size_t used = strlen(buffer);
    snprintf(buffer + used, 80 - used, " %s%s", gas_variable_unit(known.variable),
             job->extent == GAS_EXTENT_FLOW && known.variable <= GAS_VAR_MASS && known.variable >= GAS_VAR_V ? "/s"
                                                                                                             : "");
    return buffer;
}

static bool refuse_figure(const struct gas_job *job, const struct solver_entry *entry, const struct gas_case *figures,
                          struct gas_result result, struct gas_refusal *refusal)
{
    char name[GAS_NAME_TEXT], shown[80];
    size_t column = entry->column[result.argument - 1];
    const struct gas_heading *heading = &job->table.heading[column];
    gas_figure(shown, sizeof shown, figures->row->figure[column], &heading->unit);
    gas_quantity_name(name, heading->symbol, heading->state);
    if (result.status == GAS_NOT_POSITIVE && heading->symbol == GAS_SYM_P)
        return gas_refuse(refusal, name, "%s is a perfect vacuum, which holds no gas; give a pressure above it.",
                          shown);
    return gas_refuse(refusal, name, "%s %s.", shown, gas_status_words(result.status));
}

/* The figure given for a variable, NAN when none is. */
static double given_figure(const struct solver_entry *entry, const struct gas_case *figures, struct gas_known known)
{
    double si = NAN;
    for (size_t i = 0; i < entry->count; i++)
        if (entry->known[i].variable == known.variable && entry->known[i].state != GAS_CONSTANT &&
            (entry->known[i].state == known.state || entry->known[i].state == 0 || known.state == 0))
            si = figures->si[entry->column[i]];
    return si;
}

/* What to do about a balance that fails. Between two states of one vessel gas may have been let out. */
static const char *remedy(const struct solver_entry *entry, const struct gas_step *check)
{
    bool told = !entry->plan.shared[GAS_VAR_N];
    for (size_t i = 0; i < entry->count; i++)
        told = told || entry->known[i].variable == GAS_VAR_N || entry->known[i].variable == GAS_VAR_MASS;
    return check->state_b == 0 || told ? "correct one or leave one out"
                                       : "correct one, leave one out, or add the option \"open\" where gas came in or "
                                         "went out between them";
}

/* Both sides in SI, where no single figure can be named. */
static bool refuse_sides(const struct gas_values *values, const char *balance, const char *allowed, const char *todo,
                         struct gas_refusal *refusal)
{
    char left[40], right[40], apart[40];
    gas_number_format(left, sizeof left, values->left, 6);
    gas_number_format(right, sizeof right, values->right, 6);
    gas_number_format(apart, sizeof apart, fabs(values->left / values->right - 1) * 100, 3);
    return gas_refuse(refusal, "given",
                      "the figures disagree in %s: %s on the left, %s on the right (SI), %s %% apart where %s %% is "
                      "allowed; %s.",
                      balance, left, right, apart, allowed, todo);
}

static bool refuse_contradiction(const struct gas_solver *solver, const struct gas_job *job,
                                 const struct solver_entry *entry, const struct gas_case *figures,
                                 const struct gas_values *values, struct gas_refusal *refusal)
{
    const struct gas_step *check = &entry->plan.check[values->failed_check];
    struct gas_known doubted = {(enum gas_variable)check->target, check->target_state};
    char name[GAS_NAME_TEXT], given[80], other[80], apart[40], allowed[40], balance[GAS_STEP_TEXT];
    double si = given_figure(entry, figures, doubted);
    const char *todo = remedy(entry, check);
    gas_step_balance_text(&entry->plan, check, balance, sizeof balance);
    gas_number_format(allowed, sizeof allowed, job->options.agree * 100, 3);
    if (isnan(si) || isnan(values->balanced))
        return refuse_sides(values, balance, allowed, todo, refusal);
    figure_of(given, solver, job, figures, doubted, si);
    figure_of(other, solver, job, figures, doubted, values->balanced);
    variable_name(name, doubted);
    if (!(si > 0 && values->balanced > 0))
        return gas_refuse(refusal, "given", "%s is given as %s, but the other figures make it %s (%s); %s.", name,
                          given, other, balance, todo);
    gas_number_format(apart, sizeof apart, fabs(si / values->balanced - 1) * 100, 3);
    return gas_refuse(refusal, "given",
                      "%s is given as %s, but the other figures make it %s (%s): %s %% apart where %s %% is allowed; "
                      "%s.",
                      name, given, other, balance, apart, allowed, todo);
}

/* -- outside the data ---------------------------------------------------------------------------------------------- */

static bool same_temperature(double a, double b)
{
    return fabs(a - b) <= 1e-9 * fabs(b);
}

/* The given temperature of a state, else of any state; NULL: none is given. */
static const struct gas_heading *temperature_heading(const struct gas_job *job, int state)
{
    int column = gas_job_column(job, GAS_SYM_T, state);
    for (int other = 0; column < 0 && other <= GAS_STATES; other++)
        column = gas_job_column(job, GAS_SYM_T, other);
    return column < 0 ? NULL : &job->table.heading[column];
}

bool gas_refuse_outside(struct gas_refusal *refusal, const struct gas_job *job, int state, double T)
{
    char name[GAS_NAME_TEXT], shown[80], from[40], to[80];
    struct gas_range range = gas_range_of(&job->gas);
    const struct gas_heading *heading = temperature_heading(job, state);
    const struct gas_unit unit = heading ? heading->unit : gas_unit_si(GAS_DIM_TEMPERATURE);
    gas_quantity_name(name, GAS_SYM_T, heading && heading->state == 0 ? 0 : state);
    if (!heading || !heading->has_unit) /* 25 may be degrees Celsius only where no unit was written */
        return gas_refuse_temperature(refusal, name, T, &unit, job->choice->label, range.T_from, range.T_to);
    gas_figure(shown, sizeof shown, gas_unit_from_si(&unit, T, 0), &unit);
    gas_number_format(from, sizeof from, gas_unit_from_si(&unit, range.T_from, 0), 6);
    gas_figure(to, sizeof to, gas_unit_from_si(&unit, range.T_to, 0), &unit);
    return gas_refuse(refusal, name, "%s is outside the data for %s (%s to %s).", shown, job->choice->label, from, to);
}

static bool refuse_datum(struct gas_refusal *refusal, const struct gas_job *job)
{
    char datum[40], from[40], to[40];
    struct gas_range range = gas_range_of(&job->gas);
    gas_number_format(datum, sizeof datum, job->options.datum.T, 6);
    gas_number_format(from, sizeof from, range.T_from, 6);
    gas_number_format(to, sizeof to, range.T_to, 6);
    return gas_refuse(
        refusal, "options",
        "the datum of h and s, %s K, is outside the data for %s (%s to %s K); move it with an option such "
        "as \"datum 100 °C\".",
        datum, job->choice->label, from, to);
}

/* The temperature that should have come out of h, u or s. */
static bool refuse_unreached(const struct gas_job *job, int state, struct gas_refusal *refusal)
{
    char name[GAS_NAME_TEXT], from[40], to[40];
    struct gas_range range = gas_range_of(&job->gas);
    gas_number_format(from, sizeof from, range.T_from, 6);
    gas_number_format(to, sizeof to, range.T_to, 6);
    return gas_refuse(refusal, gas_quantity_name(name, GAS_SYM_T, state),
                      "it would be outside the data for %s (%s to %s K); check the enthalpy, energy or entropy given.",
                      job->choice->label, from, to);
}

static bool refuse_answer(const struct gas_solver *solver, const struct gas_job *job, const struct solver_entry *entry,
                          const struct gas_case *figures, struct gas_result result, const struct gas_values *values,
                          struct gas_refusal *refusal)
{
    const struct gas_step *step = values->failed_step >= 0 ? &entry->plan.step[values->failed_step] : NULL;
    struct gas_known known =
        values->failed_needed >= 0 ? solver->must[values->failed_needed] : (struct gas_known){GAS_VAR_T, 0};
    char name[GAS_NAME_TEXT], shown[80];
    if (step)
        known = (struct gas_known){(enum gas_variable)step->target, step->target_state};
    variable_name(name, known);
    switch (result.status) {
    case GAS_NO_HEAT_CAPACITY:
        return gas_refuse(refusal, "gas", "%s %s.", job->choice->label, gas_status_words(result.status));
    case GAS_OUTSIDE_DATA:
        if (same_temperature(result.figure, job->options.datum.T))
            return refuse_datum(refusal, job);
        return known.variable == GAS_VAR_T ? refuse_unreached(job, known.state, refusal)
                                           : gas_refuse_outside(refusal, job, step ? step->state_a : 0, result.figure);
    case GAS_NOT_POSITIVE:
        return gas_refuse(refusal, "given", "%s comes out as %s, which cannot be; check the figures.", name,
                          figure_of(shown, solver, job, figures, known, result.figure));
    case GAS_UNDETERMINED:
        return gas_refuse(refusal, "given", "%s does not follow where figures are zero; give another figure.", name);
    default:
        return gas_refuse(refusal, "given", "%s %s.", name, gas_status_words(result.status));
    }
}

bool solver_refuse_run(const struct gas_solver *solver, const struct gas_job *job, const struct solver_entry *entry,
                       const struct gas_case *figures, struct gas_result result, const struct gas_values *values,
                       struct gas_refusal *refusal)
{
    if (result.argument > 0 && (size_t)result.argument <= entry->count)
        return refuse_figure(job, entry, figures, result, refusal);
    if (result.status == GAS_CONTRADICTION && values->failed_check >= 0)
        return refuse_contradiction(solver, job, entry, figures, values, refusal);
    return refuse_answer(solver, job, entry, figures, result, values, refusal);
}
