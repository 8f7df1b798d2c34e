/* WORKING: the last line is the answer, to the last digit; the steps are those that lead to it. */
#include <stdio.h>
#include <string.h>

#include "check.h"
#include "formula.h"

static struct gas_arena arena;

static const char *text_at(const struct gas_block *answer, size_t row, size_t column)
{
    if (row >= answer->rows || column >= answer->columns)
        return "(no cell)";
    const struct gas_cell *cell = gas_cell_at(answer, row, column);
    return cell->kind == GAS_CELL_TEXT ? cell->text : "(no text)";
}

/* clang-format off */
static const struct { const char *working, *function, *arguments; } pairs[] = {
    {"\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\"", "GAS.SOLVE", "\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\""},
    {"\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"P, psig\"", "GAS.SOLVE", "\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"P, psig\""},
    {"\"air\";\"V = 2 m3; P1 = 7 bar(g); T1 = 20 °C; T2 = -5 °C\";\"P2, bar(g)\"", "GAS.SOLVE", "\"air\";\"V = 2 m3; P1 = 7 bar(g); T1 = 20 °C; T2 = -5 °C\";\"P2, bar(g)\""},
    {"\"air\";\"2 kg; T1 = 25 °C; T2 = 400 °C\";\"dH, kJ\"", "GAS.SOLVE", "\"air\";\"2 kg; T1 = 25 °C; T2 = 400 °C\";\"dH, kJ\""},
    {"\"CO2\";\"P = 2 bar; s = 5 kJ/kg-K\";\"T, °C\"", "GAS.SOLVE", "\"CO2\";\"P = 2 bar; s = 5 kJ/kg-K\";\"T, °C\""},
    {"\"CO2\";\"T = 250 °C\";\"cp, kJ/kg-K\"", "GAS.SOLVE", "\"CO2\";\"T = 250 °C\";\"cp, kJ/kg-K\""},
    {"\"N2\";\"1200 Nm3/h\";\"m, kg/h\"", "GAS.SOLVE", "\"N2\";\"1200 Nm3/h\";\"m, kg/h\""},
    {"\"N2\";\"2 kg; 25 °C; 1 bar\";\"W, kJ\";\"isothermal to 8 bar; adiabatic 80 % to 2 bar(g)\";;\"flow\"", "GAS.WORK", "\"N2\";\"2 kg; 25 °C; 1 bar\";\"isothermal to 8 bar; adiabatic 80 % to 2 bar(g)\";\"W, kJ\";;\"flow\""},
    {"\"N2\";\"2 kg; 25 °C; 1 bar\";\"W, kJ\";\"polytropic n=1.3 to V x 0.2\";;\"work by gas\"", "GAS.WORK", "\"N2\";\"2 kg; 25 °C; 1 bar\";\"polytropic n=1.3 to V x 0.2\";\"W, kJ\";;\"work by gas\""},
    {"\"N2\";\"2 kg; 25 °C; 5 bar\";\"Q, Btu\";\"isothermal against 1 bar to 2 bar; isobaric to 200 °C\"", "GAS.HEAT", "\"N2\";\"2 kg; 25 °C; 5 bar\";\"isothermal against 1 bar to 2 bar; isobaric to 200 °C\";\"Q, Btu\""},
    {"\"N2\";\"25 °C; 5 bar\";\"T, °F\";\"adiabatic to 9 bar(g)\"", "GAS.END", "\"N2\";\"25 °C; 5 bar\";\"adiabatic to 9 bar(g)\";\"T, °F\""},
    {"\"N2\";\"2 kg/s; T1 = 25 °C; P1 = 1 bar; P2 = 9 bar\";\"shaft power, kW\";\"2 stages; isentropic 78 %; cool to 40 °C\"", "GAS.STAGES", "\"N2\";\"2 kg/s; T1 = 25 °C; P1 = 1 bar; P2 = 9 bar\";\"2 stages; isentropic 78 %; cool to 40 °C\";\"shaft power, kW\""},
    {"\"air\";\"V = 50 L; P1 = 1 bar; T1 = 20 °C; P2 = 200 bar; T line = 30 °C; P line = 250 bar\";\"m added, kg\";\"fill\"", "GAS.FILL", "\"air\";\"V = 50 L; P1 = 1 bar; T1 = 20 °C; P2 = 200 bar; T line = 30 °C; P line = 250 bar\";\"m added, kg\""},
    {"\"air\";\"V = 50 L; P1 = 9 bar; T1 = 20 °C; P2 = 4 bar\";\"T2, °C\";\"vent\"", "GAS.VENT", "\"air\";\"V = 50 L; P1 = 9 bar; T1 = 20 °C; P2 = 4 bar\";\"T2, °C\""},
};
/* clang-format on */

static void last_line_is_the_answer(void)
{
    for (size_t i = 0; i < sizeof pairs / sizeof *pairs; i++) {
        char formula[400];
        struct gas_block print = {0}, answer = {0};
        gas_arena_reset(&arena);
        snprintf(formula, sizeof formula, "GAS.WORKING(%s)", pairs[i].working);
        bool good =
            check_true(formula, formula_evaluate(formula, &arena, &print) && print.rows > 3 && print.columns == 7);
        snprintf(formula, sizeof formula, "%s(%s)", pairs[i].function, pairs[i].arguments);
        good = good && check_true(formula, formula_evaluate(formula, &arena, &answer) && answer.rows == 1);
        if (!good)
            continue;
        const struct gas_cell *last = gas_cell_at(&print, print.rows - 1, 4);
        check_text(formula, text_at(&print, print.rows - 1, 0), "answer");
        check_true(formula, last->kind == GAS_CELL_NUMBER && answer.cell->kind == GAS_CELL_NUMBER);
        check_close(formula, last->number, answer.cell->number, 1e-14, 0);
    }
}

/* 7 bar(g) + 1.01325 bar = 801325 Pa; n = P V/(R T) = 801325 x 12/(8.314463 x 308.15) = 3753.13 mol; by hand. */
static void steps_are_shown(void)
{
    struct gas_block print = {0};
    gas_arena_reset(&arena);
    formula_evaluate("GAS.WORKING(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\")", &arena, &print);
    check_int("lines", (long)print.rows, 11);
    check_text("title", text_at(&print, 0, 3), "figures put in");
    check_text("barometer", text_at(&print, 4, 1), "barometer");
    check_text("given", text_at(&print, 5, 3), "7 bar(g) + barometer");
    check_close("P", gas_cell_at(&print, 5, 4)->number, 801325, 1e-12, 0);
    check_text("formula", text_at(&print, 8, 2), "n = P V / (R T)");
    check_text("figures", text_at(&print, 8, 3), "P = 801325 Pa; V = 12 m3; T = 308.15 K");
    check_close("n", gas_cell_at(&print, 8, 4)->number, 3753.13, 0, 0.005);
    check_text("unit", text_at(&print, 10, 5), "kg");
}

/* clang-format off */
static const struct { const char *formula, *part; } refused[] = {
    {"GAS.WORKING(\"N2\";\"7 bar(g); 35 °C\";\"m, kg\")", "Check given: m cannot be found"},
    {"GAS.WORKING(\"N2\";{1;2|3;4};\"m, kg\";;{\"P, bar\";\"T, K\"})", "Check given"},
    {"GAS.WORKING(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"kJ\")", "Check wanted"},
    {"GAS.WORKING(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"\")", "Check wanted"},
    {"GAS.WORKING(\"unobtainium\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\")", "Check gas"},
};
/* clang-format on */

static void refusals_are_passed_on(void)
{
    for (size_t i = 0; i < sizeof refused / sizeof *refused; i++) {
        struct gas_block answer = {0};
        gas_arena_reset(&arena);
        check_true(refused[i].formula, formula_evaluate(refused[i].formula, &arena, &answer));
        check_contains(refused[i].formula, text_at(&answer, 0, 0), refused[i].part);
    }
    gas_arena_free(&arena);
}

const struct test_suite suite_working = {
    "working", (const struct test_case[]){{"the last line is the answer", last_line_is_the_answer},
                                          {"steps are shown", steps_are_shown},
                                          {"refusals are passed on", refusals_are_passed_on},
                                          {0}}};
