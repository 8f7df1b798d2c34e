/* Steps of a path: each leg's end, work and heat by the formula of its process; of staged compression by stage. */
#include <math.h>
#include <stdio.h>
#include <string.h>

#include "audit/print.h"
#include "sheet/path_task.h"
#include "sheet/stages_task.h"

/* clang-format off */
/* What each process says, reversible where nothing else is said; W closed and in flow. Source: Moran & Shapiro,
 * Fundamentals of Engineering Thermodynamics, ch. 2, 3 and 6. */
static const struct process_words {
    const char *end, *closed, *flow, *heat;
    bool cp; /* the figures come from the heat capacity */
} processes[] = {
    [GAS_ISOTHERMAL]         = {"T constant, P v constant", "W = -n R T ln(v2/v1)", "W = n R T ln(P2/P1)", "Q = -W, since U and H depend on T alone", false},
    [GAS_ISOBARIC]           = {"P constant, v/T constant", "W = -n P (v2 - v1)", "W = 0", "Q = n times the integral of cp dT", true},
    [GAS_ISOCHORIC]          = {"v constant, P/T constant", "W = 0", "W = n v (P2 - P1)", "Q = dU - W (closed), dH - W (flow)", true},
    [GAS_ADIABATIC]          = {"integral of cp dT/T = R ln(P2/P1)", "W = dU = n times the integral of cv dT", "W = dH = n times the integral of cp dT", "Q = 0", true},
    [GAS_POLYTROPIC]         = {"P v^n constant", "W = n R (T2 - T1)/(x - 1), x the exponent", "W = x n R (T2 - T1)/(x - 1), x the exponent", "Q = dU - W (closed), dH - W (flow)", true},
    [GAS_FREE_EXPANSION]     = {"T constant, since U is", "W = 0", "W = 0", "Q = 0", false},
    [GAS_AGAINST]            = {"dU = W, with W = -n P outside (v2 - v1)", "W = -n P outside (v2 - v1)", "W = -n P outside (v2 - v1)", "Q = 0", true},
    [GAS_AGAINST_ISOTHERMAL] = {"T constant, P v constant", "W = -n P outside (v2 - v1)", "W = -n P outside (v2 - v1)", "Q = -W", false},
    [GAS_STRAIGHT]           = {"P straight in v", "W = -n (P1 + P2)/2 (v2 - v1)", "W = n (v1 + v2)/2 (P2 - P1)", "Q = dU - W (closed), dH - W (flow)", true},
    [GAS_THROUGH_POINTS]     = {"the points as given", "W = -n sum of (Pi + Pk)/2 (vk - vi)", "W = n sum of (vi + vk)/2 (Pk - Pi)", "Q = dU - W (closed), dH - W (flow)", true},
    [GAS_THROUGH_POLYTROPES] = {"P v^x between the points", "W = -n sum of integrals of P dv", "W = n sum of integrals of v dP", "Q = dU - W (closed), dH - W (flow)", true},
};
/* clang-format on */

static const char path_source[] = "Moran & Shapiro, ch. 2, 3, 6";

static const char *end_words(const struct gas_leg *leg, char buffer[160])
{
    bool machine = leg->process == GAS_POLYTROPIC && isnan(leg->n);
    if (machine)
        snprintf(buffer, 160, "integral of cp dT/T = (R/eta) ln(P2/P1); R eta ln(P2/P1) in expansion");
    else if (leg->process == GAS_ADIABATIC && leg->efficiency < 1)
        snprintf(buffer, 160,
                 "reversible end from integral of cp dT/T = R ln(P2/P1); its work / eta (times eta in expansion)");
    else
        snprintf(buffer, 160, "%s", processes[leg->process].end);
    return buffer;
}

static void put_point(struct line *line, const struct gas_point *point, size_t state)
{
    char name[24];
    snprintf(name, sizeof name, "P%zu", state);
    print_figure(line, name, point->P, "Pa");
    snprintf(name, sizeof name, "T%zu", state);
    print_figure(line, name, point->T, "K");
}

/* Energies as totals when the amount is known, per mole otherwise. */
static void print_energy(struct print *print, const struct gas_path_case *path, size_t index, const char *name,
                         const char *formula, double molar, bool cp)
{
    char quantity[80];
    bool total = isfinite(path->n), flow = print->job->extent == GAS_EXTENT_FLOW;
    const struct gas_leg *leg = &path->leg[index];
    const struct gas_point *start = index ? &path->change[index - 1].end : &path->start;
    snprintf(quantity, sizeof quantity, "%s of leg %zu", name, index + 1);
    struct line *line = print_step(print, quantity, formula, molar * (total ? path->n : 1),
                                   total ? (flow ? "W" : "J") : "J/mol", cp ? print_cp_source : path_source);
    if (total)
        print_figure(line, "n", path->n, flow ? "mol/s" : "mol");
    put_point(line, start, index + 1);
    put_point(line, &path->change[index].end, index + 2);
    if (leg->process == GAS_POLYTROPIC)
        print_figure(line, "x", leg->n, "");
    if (leg->efficiency < 1)
        print_figure(line, "eta", leg->efficiency, "");
    if (leg->process == GAS_AGAINST || leg->process == GAS_AGAINST_ISOTHERMAL)
        print_figure(line, "P outside", leg->P_outside, "Pa");
}

static void print_leg(struct print *print, const struct gas_path_case *path, size_t index)
{
    char quantity[80], formula[160];
    const struct gas_leg *leg = &path->leg[index];
    const struct gas_change *change = &path->change[index];
    const struct process_words *words = &processes[leg->process];
    const struct gas_typed_legs *typed = print->job->legs;
    bool flow = print->job->options.system == GAS_FLOW, by_cp = leg->process == GAS_ADIABATIC;
    bool machine = leg->process == GAS_POLYTROPIC && isnan(leg->n);
    snprintf(quantity, sizeof quantity, "T%zu, end of leg %zu", index + 2, index + 1);
    struct line *line = print_step(print, quantity, end_words(leg, formula), change->end.T, "K",
                                   words->cp ? print_cp_source : path_source);
    snprintf(line->figures, sizeof line->figures, "%.90s", typed->leg[index].text);
    put_point(line, index ? &path->change[index - 1].end : &path->start, index + 1);
    snprintf(quantity, sizeof quantity, "P%zu, end of leg %zu", index + 2, index + 1);
    print_step(print, quantity, "P v = R T", change->end.P, "Pa", path_source);
    print_energy(print, path, index, "W",
                 machine ? "W = dH = n times the integral of cp dT"
                 : flow  ? words->flow
                         : words->closed,
                 change->W, by_cp || machine);
    print_energy(print, path, index, "Q", machine ? "Q = 0" : words->heat, change->Q, words->cp && change->Q != 0);
}

/* How a wanted figure follows from the legs or the stages. */
static const struct {
    enum gas_symbol symbol;
    const char *path, *stages;
} sums[] = {
    {GAS_SYM_W, "sum of the legs' W", "n times the work"},
    {GAS_SYM_Q, "sum of the legs' Q", "less n times the cooling"},
    {GAS_SYM_DU, "n times the integral of cv dT from start to end", ""},
    {GAS_SYM_DH, "n times the integral of cp dT from start to end", ""},
    {GAS_SYM_DS, "n times (integral of cp dT/T less R ln(P end/P start))", ""},
    {GAS_SYM_S_MADE, "sum over the legs: dS, less Q/T where heat passes at T constant; 0 where reversible", ""},
    {GAS_SYM_Q_IN, "sum of the heats into the gas", ""},
    {GAS_SYM_Q_OUT, "sum of the heats out of the gas", ""},
    {GAS_SYM_P, "P of its state", "P of its state"},
    {GAS_SYM_T, "T of its state", "T of its state"},
    {GAS_SYM_V, "V = n R T/P", "V = n R T/P"},
    {GAS_SYM_V_SPECIFIC, "v = R T/P", "v = R T/P"},
    {GAS_SYM_RHO, "rho = P M/(R T)", "rho = P M/(R T)"},
    {GAS_SYM_M, "m = n M", "m = n M"},
    {GAS_SYM_N, "n", "n"},
    {GAS_SYM_H_SPECIFIC, "h = integral of cp dT from the datum", ""},
    {GAS_SYM_U_SPECIFIC, "u = h - P v", ""},
    {GAS_SYM_S_SPECIFIC, "s = integral of cp dT/T from the datum, less R ln(P/P0)", ""},
    {GAS_SYM_H_TOTAL, "H = n h", ""},
    {GAS_SYM_U_TOTAL, "U = n u", ""},
    {GAS_SYM_S_TOTAL, "S = n s", ""},
    {GAS_SYM_POWER_SHAFT, "", "n times the work"},
    {GAS_SYM_POWER_INPUT, "", "n times the work / drive efficiency"},
    {GAS_SYM_DUTY, "", "n times the cooling"},
    {GAS_SYM_RATIO, "", "the largest ratio of a stage"},
    {GAS_SYM_STAGE_COUNT, "", "the number of stages"},
};

static void print_wanted(struct print *print, bool stages)
{
    for (size_t i = 0; i < print->job->wanted.columns; i++) {
        const struct gas_heading *heading = &print->job->wanted.heading[i];
        const char *words = "";
        for (size_t k = 0; k < sizeof sums / sizeof *sums; k++)
            if (sums[k].symbol == heading->symbol)
                words = stages ? sums[k].stages : sums[k].path;
        print_step(print, gas_symbol_text(heading->symbol), words, print->si[i],
                   gas_dimension_si(heading->unit.dimension), "the steps above");
    }
}

/* How P, T and the amount at the start follow from the givens; what is given needs no step. */
static bool print_start(struct print *print, struct gas_solver *solver, struct gas_refusal *refusal)
{
    static const struct gas_known start[] = {{GAS_VAR_P, 1}, {GAS_VAR_T, 1}, {GAS_VAR_N, 1}};
    struct gas_values values;
    return print_plan(print, solver, start, sizeof start / sizeof *start, &values, refusal) != NULL;
}

bool print_path(struct print *print, struct gas_refusal *refusal)
{
    struct gas_path_case path;
    if (!gas_path_solve(print->job, &print->figures, &path, refusal) ||
        !print_start(print, gas_path_solver(print->job), refusal))
        return false;
    for (size_t i = 0; i < path.count; i++)
        print_leg(print, &path, i);
    print_wanted(print, false);
    return true;
}

/* -- staged compression -------------------------------------------------------------------------------------------- */

static const char *stage_words(enum gas_stage_efficiency kind)
{
    switch (kind) {
    case GAS_POLYTROPIC_EFFICIENCY:
        return "integral of cp dT/T = (R/eta) ln r";
    case GAS_ISOTHERMAL_EFFICIENCY:
        return "dh = R T ln r / eta";
    default:
        return "reversible end from integral of cp dT/T = R ln r; its dh / eta";
    }
}

static void print_stage(struct print *print, const struct gas_stages_case *stages, int index)
{
    char quantity[80];
    const struct gas_stage *stage = &stages->staged.stage[index];
    const char *source = print_cp_source;
    snprintf(quantity, sizeof quantity, "T out of stage %d", index + 1);
    struct line *line = print_step(print, quantity, stage_words(stages->staging.kind), stage->T_out, "K", source);
    print_figure(line, "P in", stage->P_in, "Pa");
    print_figure(line, "P out", stage->P_out, "Pa");
    print_figure(line, "r", stage->ratio, "");
    print_figure(line, "T in", stage->T_in, "K");
    print_figure(line, "eta", stages->staging.efficiency, "");
    snprintf(quantity, sizeof quantity, "work of stage %d", index + 1);
    print_step(print, quantity, "w = integral of cp dT from T in to T out", stage->work, "J/mol", source);
    snprintf(quantity, sizeof quantity, "cooling after stage %d", index + 1);
    if (stage->cooling != 0)
        print_step(print, quantity, "q = integral of cp dT from the cooler's end to T out", stage->cooling, "J/mol",
                   source);
}

bool print_stages(struct print *print, struct gas_refusal *refusal)
{
    struct gas_stages_case stages;
    static const char source[] = "Cengel & Boles, ch. 7";
    if (!gas_stages_solve(print->job, &print->figures, &stages, refusal) ||
        !print_start(print, gas_stages_solver(print->job), refusal))
        return false;
    for (int i = 0; i < stages.staged.count; i++)
        print_stage(print, &stages, i);
    print_step(print, "work", "sum of the stages", stages.staged.work, "J/mol", source);
    print_step(print, "cooling", "sum of the coolers", stages.staged.cooling, "J/mol", source);
    struct line *line = print_step(print, "input", "work / drive efficiency", stages.staged.input, "J/mol", source);
    print_figure(line, "drive", stages.staging.drive, "");
    print_wanted(print, true);
    return true;
}
