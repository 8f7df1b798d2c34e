/*
 * The solver at its edges: over- and under-determined questions, faulty figures, trimming, texts of the working and
 * uncertainty, against states made by arithmetic (state_truth.h).
 */
#include <string.h>

#include <gasleaf/state.h>

#include "check.h"
#include "state_truth.h"

/* Degrees of freedom of an ideal gas: P, T and n fix a state; every further figure is one check. */
static void checks_are_counted(void)
{
    double truth[GAS_VARIABLES];
    struct gas_plan plan;
    struct gas_values values;
    truth_state(3.171e5, 413.7, 17.3, truth);
    struct question q = {.count = 0};
    for (int variable = 0; variable < GAS_VARIABLES; variable++)
        ask(&q, variable, 0, truth[variable]);
    for (; q.count >= 4; q.count--) { /* the first four, P T V n, hold three independent figures */
        gas_plan_make(&plan, q.known, q.count, 0);
        check_int("checks", plan.check_count, (long)q.count - 3);
        check_int("consistent", run(&plan, &q, &values).status, GAS_OK);
    }
    q.count = 3;
    gas_plan_make(&plan, q.known, q.count, 0);
    check_int("P T V need no check", plan.check_count, 0);
}

/* Any one figure of an over-determined set that is off by 5 % (of R T or R for h, u, s) must be noticed. */
static void contradictions_are_noticed(void)
{
    double truth[GAS_VARIABLES];
    struct gas_plan plan;
    struct gas_values values;
    truth_state(3.171e5, 413.7, 17.3, truth);
    for (int off = 0; off < GAS_VARIABLES; off++) {
        struct question q = {.count = 0};
        ask(&q, GAS_VAR_P, 0, truth[GAS_VAR_P]);
        ask(&q, GAS_VAR_T, 0, truth[GAS_VAR_T]);
        ask(&q, GAS_VAR_N, 0, truth[GAS_VAR_N]);
        if (off != GAS_VAR_P && off != GAS_VAR_T && off != GAS_VAR_N)
            ask(&q, off, 0, truth[off]);
        else
            ask(&q, GAS_VAR_V, 0, truth[GAS_VAR_V]);
        for (size_t i = 0; i < q.count; i++)
            if (q.known[i].variable == (enum gas_variable)off)
                q.figures[i] = truth[off] + 0.3 * fabs(truth[off]) + (off >= GAS_VAR_H_MOLAR ? 1 : 0);
        gas_plan_make(&plan, q.known, q.count, 0);
        check_int(gas_variable_symbol((enum gas_variable)off), run(&plan, &q, &values).status, GAS_CONTRADICTION);
        check_int("which check", values.failed_check, 0);
        check_true("sides differ", fabs(values.left - values.right) > 0);
    }
}

static void a_contradiction_tells_both_sides(void)
{
    struct gas_plan plan;
    struct gas_values values;
    char text[GAS_STEP_TEXT];
    struct question q = {.count = 0};
    ask(&q, GAS_VAR_V, GAS_CONSTANT, NAN);
    ask(&q, GAS_VAR_P, 1, 3e5);
    ask(&q, GAS_VAR_T, 1, 300);
    ask(&q, GAS_VAR_T, 2, 360);
    ask(&q, GAS_VAR_P, 2, 3.7e5);
    gas_plan_make(&plan, q.known, q.count, 0);
    check_int("disagrees", run(&plan, &q, &values).status, GAS_CONTRADICTION);
    check_close("left", values.left, 1000, 1e-12, 0);
    check_close("right", values.right, 3.7e5 / 360, 1e-12, 0);
    check_close("what P2 would agree", values.balanced, 3.6e5, 1e-12, 0);
    gas_step_balance_text(&plan, &plan.check[0], text, sizeof text);
    check_text("balance", text, "P1 / T1 = P2 / T2");
    check_int("doubted", plan.check[0].target, GAS_VAR_P);
    check_int("doubted in", plan.check[0].target_state, 2);
    q.figures[4] = 3.603e5;
    check_int("within 0.1 %", run(&plan, &q, &values).status, GAS_OK);
}

/* h given as 0.5 J/mol at the datum: far off relatively, nothing beside R T. */
static void near_zero_agrees(void)
{
    struct gas_plan plan;
    struct gas_values values;
    struct question q = {.count = 0};
    ask(&q, GAS_VAR_T, 0, TRUTH_T0);
    ask(&q, GAS_VAR_H_MOLAR, 0, 0.5);
    ask(&q, GAS_VAR_P, 0, TRUTH_P0);
    ask(&q, GAS_VAR_S_MOLAR, 0, -0.001);
    gas_plan_make(&plan, q.known, q.count, 0);
    check_int("two checks", plan.check_count, 2);
    check_int("agrees", run(&plan, &q, &values).status, GAS_OK);
    q.figures[1] = 5;
    check_int("does not", run(&plan, &q, &values).status, GAS_CONTRADICTION);
}

static void knowns_are_refused(void)
{
    struct gas_plan plan;
    const struct gas_known twice[] = {{GAS_VAR_P, 1}, {GAS_VAR_T, 1}, {GAS_VAR_P, 1}};
    const struct gas_known both[] = {{GAS_VAR_P, 1}, {GAS_VAR_P, 0}};
    const struct gas_known above[] = {{GAS_VAR_P, 1}, {GAS_VAR_T, 10}};
    const struct gas_known below[] = {{GAS_VAR_P, -2}};
    struct gas_result result = gas_plan_make(&plan, twice, 3, 0);
    check_int("twice", result.status, GAS_CONTRADICTION);
    check_int("twice, which", result.argument, 3);
    result = gas_plan_make(&plan, both, 2, 0);
    check_int("everywhere and in one", result.status, GAS_CONTRADICTION);
    check_int("everywhere and in one, which", result.argument, 2);
    result = gas_plan_make(&plan, above, 2, 0);
    check_int("state 10", result.status, GAS_TOO_MANY);
    check_int("state 10, which", result.argument, 2);
    check_int("state -2", gas_plan_make(&plan, below, 1, 0).status, GAS_TOO_MANY);
    check_int("states", gas_plan_make(&plan, below, 0, 10).status, GAS_TOO_MANY);
    check_int("nothing known", gas_plan_make(&plan, NULL, 0, 0).status, GAS_OK);
    check_true("nothing found", !gas_plan_finds(&plan, GAS_VAR_P, 0));
    check_true("no such state", !gas_plan_finds(&plan, GAS_VAR_P, 12));
}

static void faulty_figures_are_refused(void)
{
    const struct gas_known known[] = {{GAS_VAR_H_MOLAR, 0}, {GAS_VAR_P, 0}, {GAS_VAR_T, 0}};
    const struct {
        const char *id;
        double figures[3];
        enum gas_status status;
        int argument;
    } rows[] = {
        {"zero P", {0, 0, 300}, GAS_NOT_POSITIVE, 2},    {"negative T", {0, 1e5, -3}, GAS_NOT_POSITIVE, 3},
        {"nan", {0, NAN, 300}, GAS_NOT_FINITE, 2},       {"inf", {INFINITY, 1e5, 300}, GAS_NOT_FINITE, 1},
        {"first one", {NAN, -1, -1}, GAS_NOT_FINITE, 1}, {"h may be negative", {truth_h(250), 1e5, 250}, GAS_OK, 0}};
    struct gas_plan plan;
    struct gas_values values;
    gas_plan_make(&plan, known, 3, 0);
    for (size_t i = 0; i < sizeof rows / sizeof *rows; i++) {
        struct gas_result result = gas_plan_run(&plan, &truth_gas, NULL, 1e-3, rows[i].figures, 3, NULL, 0, &values);
        check_int(rows[i].id, result.status, rows[i].status);
        check_int(rows[i].id, result.argument, rows[i].argument);
    }
    check_int("short of figures", gas_plan_run(&plan, &truth_gas, NULL, 1e-3, NULL, 2, NULL, 0, &values).status,
              GAS_TOO_MANY);
}

/* A failure matters only where it is needed, and is told by its cause. */
static void failures_reach_only_what_needs_them(void)
{
    const struct gas_known known[] = {{GAS_VAR_P, 0}, {GAS_VAR_T, 0}, {GAS_VAR_N, 0}};
    const struct gas_known needed[] = {{GAS_VAR_V, 0}, {GAS_VAR_U_TOTAL, 0}};
    const double hot[] = {1e5, 4000, 2};
    const struct gas bare = {TRUTH_R, TRUTH_M, GAS_CP_INTEGRATED, 0, NULL};
    struct gas_plan plan;
    struct gas_values values;
    gas_plan_make(&plan, known, 3, 0);
    struct gas_result result = gas_plan_run(&plan, &truth_gas, NULL, 1e-3, hot, 3, needed, 1, &values);
    check_int("V is found", result.status, GAS_OK);
    check_close("V", gas_plan_value(&plan, &values, GAS_VAR_V, 0), 2 * TRUTH_R * 4000 / 1e5, 1e-14, 0);
    result = gas_plan_run(&plan, &truth_gas, NULL, 1e-3, hot, 3, needed, 2, &values);
    check_int("U is not", result.status, GAS_OUTSIDE_DATA);
    check_close("because of T", result.figure, 4000, 0, 0);
    check_int("needed", values.failed_needed, 1);
    check_int("the step of h", values.failed_step >= 0 ? plan.step[values.failed_step].target : -1, GAS_VAR_H_MOLAR);
    result = gas_plan_run(&plan, &bare, NULL, 1e-3, hot, 3, needed, 2, &values);
    check_int("no heat capacity", result.status, GAS_NO_HEAT_CAPACITY);
    result = gas_plan_run(&plan, &bare, NULL, 1e-3, hot, 3, needed, 1, &values);
    check_int("none needed", result.status, GAS_OK);
}

static void undetermined_is_said(void)
{
    struct gas_plan plan;
    struct gas_values values;
    struct question q = {.count = 0};
    const struct gas_known n = {GAS_VAR_N, 0};
    ask(&q, GAS_VAR_H_TOTAL, 0, 0);
    ask(&q, GAS_VAR_T, 0, TRUTH_T0);
    gas_plan_make(&plan, q.known, q.count, 0);
    struct gas_result result = gas_plan_run(&plan, &truth_gas, NULL, 1e-3, q.figures, q.count, &n, 1, &values);
    check_int("0 = n 0", result.status, GAS_UNDETERMINED);
    q.figures[0] = -5, q.figures[1] = 350;
    result = gas_plan_run(&plan, &truth_gas, NULL, 1e-3, q.figures, q.count, &n, 1, &values);
    check_int("negative amount", result.status, GAS_NOT_POSITIVE);
}

static void expect_text(const char *expected, const struct question *q, int variable, int state)
{
    struct gas_plan plan;
    char text[GAS_STEP_TEXT] = "";
    int order[GAS_STEPS];
    const struct gas_known wanted = {(enum gas_variable)variable, state};
    gas_plan_make(&plan, q->known, q->count, 0);
    int steps = gas_plan_slice(&plan, &wanted, 1, order);
    if (check_true(expected, steps > 0))
        gas_step_formula_text(&plan, &plan.step[order[steps - 1]], text, sizeof text);
    check_text(expected, text, expected);
}

static void formulas_carry_state_numbers(void)
{
    struct question rigid = {.count = 0}, one = {.count = 0}, isothermal = {.count = 0}, specific = {.count = 0};
    ask(&rigid, GAS_VAR_V, GAS_CONSTANT, NAN), ask(&rigid, GAS_VAR_P, 1, 1), ask(&rigid, GAS_VAR_T, 1, 1);
    ask(&rigid, GAS_VAR_T, 2, 1);
    expect_text("P2 = P1 T2 / T1", &rigid, GAS_VAR_P, 2);
    expect_text("h2 = integral of cp dT from T0 to T2", &rigid, GAS_VAR_H_MOLAR, 2);
    ask(&one, GAS_VAR_P, 0, 1), ask(&one, GAS_VAR_V, 0, 1), ask(&one, GAS_VAR_T, 0, 1);
    expect_text("n = P V / (R T)", &one, GAS_VAR_N, 0);
    expect_text("m = n M", &one, GAS_VAR_MASS, 1);
    ask(&isothermal, GAS_VAR_T, 0, 1), ask(&isothermal, GAS_VAR_V, 1, 1), ask(&isothermal, GAS_VAR_P, 1, 1);
    ask(&isothermal, GAS_VAR_P, 2, 1);
    expect_text("n = P1 V1 / (R T)", &isothermal, GAS_VAR_N, 0);
    expect_text("V2 = P1 V1 / P2", &isothermal, GAS_VAR_V, 2);
    ask(&specific, GAS_VAR_H_MASS, 2, 1);
    expect_text("h2 [J/mol] = h2 [J/kg] M", &specific, GAS_VAR_H_MOLAR, 2);
    expect_text("T2 from h2 = integral of cp dT from T0 to T2", &specific, GAS_VAR_T, 2);
}

/* A text that does not fit is cut and ended. */
static void short_buffers_are_respected(void)
{
    const struct gas_known known[] = {{GAS_VAR_P, 1}, {GAS_VAR_V, 1}, {GAS_VAR_T, 1}, {GAS_VAR_P, 2}, {GAS_VAR_T, 2}};
    struct gas_plan plan;
    char whole[GAS_STEP_TEXT], part[8] = "xxxxxxx";
    gas_plan_make(&plan, known, 5, 0);
    for (int i = 0; i < plan.step_count; i++) {
        gas_step_formula_text(&plan, &plan.step[i], whole, sizeof whole);
        gas_step_formula_text(&plan, &plan.step[i], part, sizeof part);
        check_true(whole, strlen(whole) + 1 < sizeof whole && strncmp(whole, part, strlen(part)) == 0);
        check_int(whole, (long)strlen(part), (long)(strlen(whole) < 7 ? strlen(whole) : 7));
        gas_step_formula_text(&plan, &plan.step[i], NULL, 0);
    }
}

static void slices_hold_what_is_needed(void)
{
    const struct gas_known known[] = {{GAS_VAR_P, 0}, {GAS_VAR_V, 0}, {GAS_VAR_T, 0}};
    const struct gas_known mass = {GAS_VAR_MASS, 0}, given = {GAS_VAR_T, 0};
    struct gas_known inputs[GAS_STEP_INPUTS];
    struct gas_plan plan;
    int order[GAS_STEPS];
    gas_plan_make(&plan, known, 3, 0);
    check_int("n, then m", gas_plan_slice(&plan, &mass, 1, order), 2);
    check_int("n", plan.step[order[0]].target, GAS_VAR_N);
    check_int("of P, V, T", gas_step_inputs(&plan, &plan.step[order[0]], inputs), 3);
    check_int("of n", gas_step_inputs(&plan, &plan.step[order[1]], inputs), 1);
    check_int("n it is", inputs[0].variable, GAS_VAR_N);
    check_int("a given needs none", gas_plan_slice(&plan, &given, 1, order), 0);
    gas_plan_trim(&plan, &mass, 1);
    check_int("trimmed", plan.step_count, 2);
    check_true("still found", gas_plan_finds(&plan, GAS_VAR_MASS, 0));
    check_true("given still", gas_plan_finds(&plan, GAS_VAR_T, 0));
    check_true("no longer", !gas_plan_finds(&plan, GAS_VAR_S_MOLAR, 0));
}

/* Trimming must not lose a disagreement. */
static void trimmed_plans_still_check(void)
{
    struct question q = {.count = 0};
    struct gas_plan plan;
    struct gas_values values;
    const struct gas_known density = {GAS_VAR_RHO, 0};
    ask(&q, GAS_VAR_P, 0, 1e5), ask(&q, GAS_VAR_T, 0, 300), ask(&q, GAS_VAR_V, 0, 1), ask(&q, GAS_VAR_MASS, 0, 7);
    gas_plan_make(&plan, q.known, q.count, 0);
    gas_plan_trim(&plan, &density, 1);
    check_int("7 kg are too much", run(&plan, &q, &values).status, GAS_CONTRADICTION);
}

static void missing_figures_are_named(void)
{
    const struct gas_known known[] = {{GAS_VAR_P, 1}, {GAS_VAR_T, 1}, {GAS_VAR_V, 1}};
    const struct gas_known T2 = {GAS_VAR_T, 2};
    struct gas_known candidate[8] = {{GAS_VAR_P, 0}};
    struct gas_plan plan;
    gas_plan_make(&plan, known, 3, 2);
    size_t count = gas_plan_missing(&plan, T2, candidate, 8);
    bool h2 = false;
    for (size_t i = 0; i < count; i++)
        h2 |= candidate[i].variable == GAS_VAR_H_MOLAR && candidate[i].state == 2;
    check_true("h2 would do", h2);
    check_int("nothing for what is found",
              (long)gas_plan_missing(&plan, (struct gas_known){GAS_VAR_N, 0}, candidate, 8), 0);
    gas_plan_make(&plan, known, 2, 0);
    count = gas_plan_missing(&plan, (struct gas_known){GAS_VAR_MASS, 0}, candidate, 8);
    check_true("V or n", count >= 2 && candidate[0].variable == GAS_VAR_V && candidate[1].variable == GAS_VAR_N);
    check_int("room", (long)gas_plan_missing(&plan, (struct gas_known){GAS_VAR_MASS, 0}, candidate, 1), 1);
}

static void open_systems(void)
{
    const struct gas_known known[] = {{GAS_VAR_V, 0}, {GAS_VAR_P, 1}, {GAS_VAR_T, 1}, {GAS_VAR_P, 2}, {GAS_VAR_T, 2}};
    const double figures[] = {0.4, 9e5, 310, 2e5, 280};
    struct gas_plan plan;
    struct gas_values values;
    gas_plan_make(&plan, known, 5, 0);
    struct gas_result result = gas_plan_run(&plan, &truth_gas, NULL, 1e-3, figures, 5, NULL, 0, &values);
    check_int("closed: too little gas left", result.status, GAS_CONTRADICTION);
    gas_plan_make_open(&plan, known, 5, 0);
    check_int("open: no check", plan.check_count, 0);
    result = gas_plan_run(&plan, &truth_gas, NULL, 1e-3, figures, 5, NULL, 0, &values);
    check_int("open", result.status, GAS_OK);
    check_close("m1", gas_plan_value(&plan, &values, GAS_VAR_MASS, 1), 9e5 * 0.4 * TRUTH_M / (TRUTH_R * 310), 1e-13, 0);
    check_close("m2", gas_plan_value(&plan, &values, GAS_VAR_MASS, 2), 2e5 * 0.4 * TRUTH_M / (TRUTH_R * 280), 1e-13, 0);
    check_close("no common m", gas_plan_value(&plan, &values, GAS_VAR_MASS, 0), NAN, 0, 0);
}

static void garbage_does_no_harm(void)
{
    static const double garbage[] = {0, -1, NAN, INFINITY, -INFINITY, 1e308, 5e-324, -1e-300, 1e-200, 300, 1e5};
    check_seed(7);
    for (int i = 0; i < 3000; i++) {
        struct question q = {.count = 0};
        struct gas_plan plan;
        struct gas_values values;
        for (int k = (int)check_random(0, 9); k > 0; k--)
            ask(&q, (int)check_random(0, GAS_VARIABLES), (int)check_random(-3, 11), garbage[(int)check_random(0, 11)]);
        if (gas_plan_make(&plan, q.known, q.count, 0).status != GAS_OK)
            continue;
        run(&plan, &q, &values);
        for (int slot = 0; slot < plan.slots; slot++)
            if (isinf(values.slot[slot])) {
                check_true("infinite value", false);
                return;
            }
    }
    check_true("came through", true);
}

/* n = P V/(R T): relative uncertainties add in squares (JCGM 100:2008, 5.1.6). */
static void uncertainty_of_a_product(void)
{
    const struct gas_known known[] = {{GAS_VAR_P, 0}, {GAS_VAR_V, 0}, {GAS_VAR_T, 0}}, mass = {GAS_VAR_MASS, 0};
    const double figures[] = {2e5, 3, 310}, u[] = {1e3, 0.02, 0.5};
    double m = 2e5 * 3 * TRUTH_M / (TRUTH_R * 310), part[3];
    struct gas_plan plan;
    gas_plan_make(&plan, known, 3, 0);
    struct gas_result result = gas_plan_uncertainty(&plan, &truth_gas, NULL, figures, u, 3, mass, part);
    check_int("status", result.status, GAS_OK);
    check_close("sum", result.value, m * sqrt(pow(1e3 / 2e5, 2) + pow(0.02 / 3, 2) + pow(0.5 / 310, 2)), 1e-4, 0);
    check_close("part of P", part[0], m * 1e3 / 2e5, 1e-9, 0);
    check_close("part of T", part[2], -m * 0.5 / 310, 1e-5, 0); /* 1/T over +-0.5 K: third order, (u/T)^2 */
    const double exact[] = {0, NAN, 0.5};
    result = gas_plan_uncertainty(&plan, &truth_gas, NULL, figures, exact, 3, mass, part);
    check_close("only T", result.value, m * 0.5 / 310, 1e-5, 0);
    const double bad[] = {0, -1, 0.5};
    result = gas_plan_uncertainty(&plan, &truth_gas, NULL, figures, bad, 3, mass, NULL);
    check_int("negative", result.status, GAS_NEGATIVE);
    check_int("negative, which", result.argument, 2);
}

/* dT/dh = 1/cp; also for an uncertainty far below the digits of h, and at the edge of the data. */
static void uncertainty_through_a_function(void)
{
    const struct gas_known h = {GAS_VAR_H_MOLAR, 0}, T = {GAS_VAR_T, 0};
    const double tiny = 1e-7, some = 10, much = 500;
    double at[] = {truth_h(700), truth_h(2999.9)};
    struct gas_plan plan;
    gas_plan_make(&plan, &h, 1, 0);
    struct gas_result result = gas_plan_uncertainty(&plan, &truth_gas, NULL, at, &some, 1, T, NULL);
    check_close("u(T)", result.value, some / (TRUTH_A + TRUTH_B * 700), 1e-6, 0);
    result = gas_plan_uncertainty(&plan, &truth_gas, NULL, at, &tiny, 1, T, NULL);
    check_close("tiny", result.value, tiny / (TRUTH_A + TRUTH_B * 700), 1e-6, 0);
    result = gas_plan_uncertainty(&plan, &truth_gas, NULL, at + 1, &much, 1, T, NULL);
    check_int("at the edge", result.status, GAS_OK);
    check_close("at the edge", result.value, much / (TRUTH_A + TRUTH_B * 2999.9), 1e-2, 0);
}

const struct test_suite suite_state = {"state", (const struct test_case[]){

                                                    {"checks counted", checks_are_counted},
                                                    {"contradictions", contradictions_are_noticed},
                                                    {"both sides", a_contradiction_tells_both_sides},
                                                    {"near zero", near_zero_agrees},
                                                    {"refused knowns", knowns_are_refused},
                                                    {"refused figures", faulty_figures_are_refused},
                                                    {"failures", failures_reach_only_what_needs_them},
                                                    {"undetermined", undetermined_is_said},
                                                    {"texts", formulas_carry_state_numbers},
                                                    {"short buffers", short_buffers_are_respected},
                                                    {"slices", slices_hold_what_is_needed},
                                                    {"trimmed checks", trimmed_plans_still_check},
                                                    {"missing", missing_figures_are_named},
                                                    {"open", open_systems},

                                                    {"garbage", garbage_does_no_harm},
                                                    {"uncertainty of a product", uncertainty_of_a_product},
                                                    {"uncertainty of a function", uncertainty_through_a_function},
                                                    {0}}};
