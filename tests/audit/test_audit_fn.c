/* AUDIT and AUDITLIST on cells: verdicts in words, tables, and what users get wrong. */
#include <math.h>
#include <stdio.h>
#include <string.h>

#include "check.h"
#include "formula.h"

static struct gas_arena arena;

static struct gas_block answer_of(const char *formula)
{
    struct gas_block answer = {0};
    gas_arena_reset(&arena);
    check_true(formula, formula_evaluate(formula, &arena, &answer) && answer.rows > 0);
    return answer;
}

static const char *text_at(const struct gas_block *answer, size_t row, size_t column)
{
    if (row >= answer->rows || column >= answer->columns)
        return "(no cell)";
    const struct gas_cell *cell = gas_cell_at(answer, row, column);
    return cell->kind == GAS_CELL_TEXT ? cell->text : "(no text)";
}

/* m = P V M/(R T), by hand: 8.01325e5 x 12 x 0.028014/(8.314463 x 308.15) = 105.140 kg; with 7e5 Pa 91.846 kg; with
 * R = 8.31 105.197 kg. W = n R T ln 8 = (2000/28.014) x 8.314463 x 298.15 x ln 8 = 368.02 kJ, with log10 159.83 kJ. */
/* clang-format off */
static const struct { const char *formula, *part; } verdicts[] = {
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";105.1)", "agrees: 105.14 kg (within its own 4 digits)"},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";\"105\")", "agrees: 105.14 kg (within its own 3 digits)"},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";105.3;;;\"digits 3\")", "agrees"},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";91.85)", "Likely: 7 bar(g) taken as absolute (gives 91.846)"},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";91.85)", "differs by -12.6 %: 91.85 against 105.14 kg"},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";105.197)", "rounded constant, not an error: 105.197 against 105.14 kg: R = 8.31 (gives 105.197)"},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";77.7777)", "No known slip gives this figure."},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";\"105140 g\")", "agrees"},
    {"GAS.AUDIT(\"N2\";\"2 kg; 25 °C; 1 bar\";\"W, kJ\";368;\"isothermal to 8 bar\")", "agrees: 368.02 kJ"},
    /* (150 + 1.01325) bar 0.05 m3 28.014 kg/kmol / (R (273.15 + 12) K) = 8.9218 kg */
    {"GAS.AUDIT(\"N2\";\"150 bar(g); -12 °C; 50 L\";\"m, kg\";8.922)", "Likely: -12 °C read without its minus sign (gives 8.9218)"},
    {"GAS.AUDIT(\"N2\";\"2 kg; 25 °C; 1 bar\";\"W, kJ\";159.83;\"isothermal to 8 bar\")", "Likely: log10 used for ln (gives 159.83)"},
    {"GAS.AUDIT(\"N2\";\"2 kg; 25 °C; 1 bar\";\"W, kJ\";-368.02;\"isothermal to 8 bar\")", "the other sign convention (gives -368.02)"},
    {"GAS.AUDIT(\"N2\";\"2 kg; 25 °C; 1 bar\";\"W, kJ\";368.02;\"isothermal to 8 bar\";;\"work by gas\")", "the other sign convention (gives 368.02)"},
    {"GAS.AUDIT(\"N2\";\"2 kg; 25 °C; 0 bar(g)\";\"W, kJ\";368;\"isothermal to 7 bar(g)\")", "differs"},
    /* what users get wrong */
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";\"about 105\")", "Check legacy: \"about 105\" is not a number"},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";\"105 kJ\")", "Check legacy: \"kJ\" is the unit of an energy, but a mass is wanted"},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";0)", "differs by -100 %: 0 against 105.14 kg. No known slip"},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";-105.1)", "differs by -200 %"},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";)", "Check legacy: there is none"},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C\";\"m, kg\";105)", "Check given: m cannot be found"},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"kJ\";105)", "Check wanted: \"kJ\" does not say which quantity"},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";{1;2})", "Check legacy: it has 1 rows and 2 columns"},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";105;;;\"digits 12\")", "Check options"},
    {"GAS.AUDIT(\"Check gas: gone.\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";105)", "Check gas: gone."},
    {"GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";1e308)", "differs"},
    {"GAS.AUDIT(\"N2\";\"2 kg; 25 °C; 1 bar\";\"W, kJ\";3;\"sideways to 8 bar\")", "Check leg"},
};
/* clang-format on */

static void verdicts_are_said(void)
{
    for (size_t i = 0; i < sizeof verdicts / sizeof *verdicts; i++) {
        struct gas_block answer = answer_of(verdicts[i].formula);
        check_contains(verdicts[i].formula, text_at(&answer, 0, 0), verdicts[i].part);
    }
}

#define TABLE "GAS.AUDIT%s(\"N2\";{7;35;12|3;20;4|10;15;2};\"m, kg\";{%s};;{\"P, bar(g)\";\"T, °C\";\"V, m3\"})"

static struct gas_block table_of(const char *list, const char *legacy)
{
    char formula[300];
    snprintf(formula, sizeof formula, TABLE, list, legacy);
    return answer_of(formula);
}

/* m with the gauge pressure as it stands: 91.846, 13.792, 23.386 kg; right: 105.140, 18.450, 25.755 kg. By hand, as
 * above. */
static void columns_are_judged(void)
{
    struct gas_block answer = table_of("", "91.85|13.79|23.39");
    for (size_t i = 0; i < 3; i++)
        check_contains("in every row", text_at(&answer, i, 0), "P, bar(g) taken as absolute");
    check_contains("in every row", text_at(&answer, 1, 0), "in every row that differs");
    answer = table_of("LIST", "91.85|18.45|23.39");
    check_int("rows", (long)answer.rows, 5);
    check_int("columns", (long)answer.columns, 8);
    check_text("verdict", text_at(&answer, 1, 5), "explained");
    check_text("verdict", text_at(&answer, 2, 5), "agrees");
    check_close("ours", gas_cell_at(&answer, 1, 3)->number, 105.140, 0, 5e-4);
    check_close("deviation", gas_cell_at(&answer, 1, 4)->number, 100 * (91.85 / 105.140 - 1), 0, 1e-3);
    check_close("would give", gas_cell_at(&answer, 1, 7)->number, 91.846, 0, 5e-4);
    check_text("all", text_at(&answer, 4, 5), "2 explained, 1 agrees");
    check_text("all", text_at(&answer, 4, 6), "P, bar(g) taken as absolute");
}

/* Each row its own slip: gauge as absolute, grams, T in degC as it stands (3 bar(g), 20 K: 270.43 kg). */
static void rows_may_differ(void)
{
    struct gas_block answer = table_of("", "91.85|270.43|25755");
    check_contains("first", text_at(&answer, 0, 0), "Likely: 7 bar(g) taken as absolute");
    check_contains("second", text_at(&answer, 1, 0), "Likely: 20 °C not made absolute");
    check_contains("third", text_at(&answer, 2, 0), "1000 times");
    answer = table_of("LIST", "91.85|\"\"|\"x\"");
    check_text("blank", text_at(&answer, 2, 5), "no figure");
    check_text("no number", text_at(&answer, 3, 5), "refused");
    check_contains("no number", text_at(&answer, 3, 6), "Check legacy");
    answer = table_of("", "91.85;13.79;23.39");
    check_int("figures may lie across", (long)answer.columns, 3);
}

/* A slip that the first row cannot have is found in the second: 8.9218 kg as above, the true figures 8.9218 and 9.7417.
 */
static void a_later_row_has_its_own_slip(void)
{
    struct gas_arena own = {0};
    struct gas_block table = {0};
    const char *typed = "GAS.AUDIT(\"N2\";{150;12;50|150;-12;50};\"m, kg\";{8.922|8.922};;"
                        "{\"P, bar(g)\";\"T, °C\";\"V, L\"})";
    if (check_true("evaluates", formula_evaluate(typed, &own, &table)) && check_int("rows", (long)table.rows, 2)) {
        check_contains("first", gas_cell_at(&table, 0, 0)->text, "agrees");
        check_contains("second", gas_cell_at(&table, 1, 0)->text, "-12 °C read without its minus sign (gives 8.9218)");
    }
    gas_arena_free(&own);
}

/* The same verdict for machines and vessels, the wrong figure by arithmetic: dh = cp T1 (r^(R/cp) - 1), cp = 3.5 R. */
static void machines_are_judged(void)
{
    const double R = 8.31446261815324, T1 = 298.15, M = 0.0289644; /* US Standard Atmosphere 1976 */
    const double rise = 3.5 * R * T1 * 100 / 1000;                 /* kW for 100 mol/s */
    const struct {
        double figure;
        const char *wanted, *legs, *given, *part;
    } rows[] = {
        {2 * rise * (pow(3, 2 / 7.) - 1) / 0.8, "shaft power, kW", "", "", "agrees"},
        {2 * rise * (pow(4.5, 2 / 7.) - 1) / 0.8, "shaft power, kW", "", "", "each stage at r/N"},
        {2 * rise * (pow(3, 2 / 7.) - 1), "shaft power, kW", "", "", "the efficiency left out"},
        {2 * rise * (pow(3, 2 / 7.) - 1) * 0.8, "shaft power, kW", "", "", "efficiency multiplied where it divides"},
        {rise * (pow(9, 2 / 7.) - 1) / 0.8, "shaft power, kW", "", "", "one stage over the whole ratio"},
        {2 * rise * (pow(3, 2 / 7.) - 1) / 0.8 * 0.9, "input power, kW", "", "", "drive efficiency multiplied"},
        {(200e5 / 303.15 - 2e5 / 293.15) * 0.05 * M / R, "m added, kg", "fill",
         "V = 50 L; P1 = 2 bar; T1 = 20 °C; P2 = 200 bar; T line = 30 °C; P line = 250 bar",
         "filling temperature taken as the line's"},
        {(200e5 - 20e5) / 293.15 * 0.05 * M / R, "m out, kg", "vent", "V = 50 L; P1 = 200 bar; T1 = 20 °C; P2 = 20 bar",
         "temperature of the vessel taken as unchanged"},
    };
    for (size_t i = 0; i < sizeof rows / sizeof *rows; i++) {
        char formula[500];
        snprintf(formula, sizeof formula, "GAS.AUDIT(\"air | k = 1.4\";\"%s\";\"%s\";%.6g;\"%s\")",
                 rows[i].given[0] ? rows[i].given : "100 mol/s; P1 = 1 bar; T1 = 25 °C; P2 = 9 bar", rows[i].wanted,
                 rows[i].figure,
                 rows[i].legs[0] ? rows[i].legs : "2 stages; isentropic 80 %; cool to 25 °C; drive 90 %");
        struct gas_block answer = answer_of(formula);
        check_contains(formula, text_at(&answer, 0, 0), rows[i].part);
    }
}

static void done(void)
{
    gas_arena_free(&arena);
}

const struct test_suite suite_audit_fn = {"audit_fn",
                                          (const struct test_case[]){{"verdicts are said", verdicts_are_said},
                                                                     {"columns are judged", columns_are_judged},
                                                                     {"rows may differ", rows_may_differ},
                                                                     {"a later row", a_later_row_has_its_own_slip},
                                                                     {"machines are judged", machines_are_judged},
                                                                     {"done", done},
                                                                     {0}}};
