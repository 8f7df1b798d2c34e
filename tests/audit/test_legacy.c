/* How many digits an old figure claims, and figures that come with all of theirs. */
#include <stdio.h>
#include <string.h>

#include "audit/legacy.h"
#include "check.h"
#include "formula.h"

/* clang-format off */
static const struct { double figure; int digits; } numbers[] = { /* counted by hand */
    {105.1, 4}, {105.14, 5}, {0.72, 2}, {3500, 3}, {3512, 4}, {100, 3}, {90, 2}, {7, 1}, {1.23456e-7, 6}, {-105.1, 4},
    {0.1 + 0.2, 9}, {1e300, 3}, {123456789012., 9}};
static const struct { const char *text; int digits; double figure; } texts[] = {
    {"0.720", 3, 0.72}, {"3500.", 4, 3500}, {"3500", 3, 3500}, {"1,150", 4, 1.15}, {"105.1 kg", 4, 105.1},
    {"105100 g", 4, 105.1}, {" 7.00 ", 3, 7}};
/* clang-format on */

static void digits_are_counted(void)
{
    for (size_t i = 0; i < sizeof numbers / sizeof *numbers; i++) {
        char id[40];
        snprintf(id, sizeof id, "%.15g", numbers[i].figure);
        check_int(id, legacy_digits(numbers[i].figure), numbers[i].digits);
    }
}

static void texts_keep_their_digits(void)
{
    struct gas_job job = {.options = gas_options_default};
    struct gas_heading heading;
    struct gas_heading_fault fault;
    check_true("m, kg", gas_heading_parse("m, kg", 5, NULL, &heading, &fault));
    for (size_t i = 0; i < sizeof texts / sizeof *texts; i++) {
        struct gas_refusal refusal = {0};
        struct legacy legacy;
        struct gas_cell cell = {GAS_CELL_TEXT, 0, texts[i].text, strlen(texts[i].text)};
        check_true(texts[i].text, legacy_read(&cell, &job, &heading, 0, &legacy, &refusal));
        check_int(texts[i].text, legacy.digits, texts[i].digits);
        check_close(texts[i].text, legacy.figure, texts[i].figure, 1e-12, 0);
    }
}

static const char *verdict_on(double figure, struct gas_arena *arena)
{
    char formula[200];
    struct gas_block answer = {0};
    snprintf(formula, sizeof formula, "GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";%.17g)", figure);
    return formula_evaluate(formula, arena, &answer) && answer.rows == 1 ? answer.cell->text : "(no answer)";
}

/* m = P V M/(R T) as an old sheet computes it, with all its digits: by arithmetic. */
static void computed_figures_tell_all(void)
{
    struct gas_arena arena = {0};
    const char *text = verdict_on(801325 * 12 * 0.028 / (8.314 * 308), &arena);
    check_contains("three rounded constants", text, "rounded constant");
    check_contains("three rounded constants", text, "R = 8.314");
    check_contains("three rounded constants", text, "273 for 273.15");
    check_contains("three rounded constants", text, "molar mass rounded to a whole number");
    text = verdict_on(7e5 * 12 * 0.028014 / (8.314 * 308), &arena);
    check_contains("a slip and two", text, "7 bar(g) taken as absolute");
    check_contains("a slip and two", text, "R = 8.314");
    check_contains("a slip and two", text, "273 for 273.15");
    check_contains("right to the last", verdict_on(801325 * 12 * 0.028014 / (8.31446261815324 * 308.15), &arena),
                   "agrees");
    gas_arena_free(&arena);
}

const struct test_suite suite_legacy = {
    "legacy", (const struct test_case[]){{"digits are counted", digits_are_counted},
                                         {"texts keep their digits", texts_keep_their_digits},
                                         {"computed figures tell all", computed_figures_tell_all},
                                         {0}}};
