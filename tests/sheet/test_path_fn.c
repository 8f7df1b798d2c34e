/*
 * The path functions on cells. Expected figures are arithmetic written out beside the row, for gases whose heat
 * capacity is constant; R and atomic weights as published (SI 2019; IUPAC 2021: N 14.007, Ar 39.95).
 */
#include <math.h>

#include "check.h"
#include "formula.h"

#define R        8.31446261815324
#define M_N2     28.014e-3 /* kg/mol */
#define M_AR     39.95e-3
#define K        1.4
#define BAR      1e5
#define R_FIT    8.314510 /* J/(mol K), of the NASA fits: cp of a monatomic gas is 2.5 times this */
#define ARGON_CP (2.5 * R_FIT)
#define ARGON_CV (ARGON_CP - R)

struct row {
    const char *id, *formula;
    double expected;
    const char *part; /* of a text; NULL: the answer is the figure */
};

static const struct gas_cell *first_cell(const char *formula, struct gas_arena *arena)
{
    struct gas_block value = {0};
    check_true(formula, formula_evaluate(formula, arena, &value) && value.rows > 0);
    return value.rows ? value.cell : NULL;
}

static void check_rows(const struct row *rows, size_t count, double tolerance)
{
    for (size_t i = 0; i < count; i++) {
        struct gas_arena arena = {0};
        const struct gas_cell *cell = first_cell(rows[i].formula, &arena);
        if (cell && rows[i].part)
            check_contains(rows[i].id, cell->kind == GAS_CELL_TEXT ? cell->text : "a number", rows[i].part);
        else if (cell)
            check_close(rows[i].id, cell->kind == GAS_CELL_NUMBER ? cell->number : (double)NAN, rows[i].expected,
                        tolerance, 0);
        if (cell && !rows[i].part && cell->kind == GAS_CELL_TEXT)
            check_text(rows[i].id, cell->text, "a number");
        gas_arena_free(&arena);
    }
}
#define CHECK_ROWS(rows, tolerance) check_rows(rows, sizeof(rows) / sizeof *(rows), tolerance)

static void works_and_heats(void)
{
    const double n = 2 / M_N2, isothermal = n * R * 298.15 * log(8) / 1000;
    const double T2 = 300 * pow(8, (K - 1) / K), cp = K / (K - 1) * R, cv = cp - R;
    const double n13 = 300 * pow(5, 0.3 / 1.3);
    const struct row rows[] = {
        {"isothermal-W", "GAS.WORK(\"N2\";\"2 kg; 25 °C; 1 bar\";\"isothermal to 8 bar\";\"kJ\")", isothermal, NULL},
        {"isothermal-Q", "GAS.HEAT(\"N2\";\"2 kg; 25 °C; 1 bar\";\"isothermal to 8 bar\";\"kJ\")", -isothermal, NULL},
        {"by-gas-option", "GAS.WORK(\"N2\";\"2 kg; 25 °C; 1 bar\";\"isothermal to 8 bar\";\"kJ\";;\"work by gas\")",
         -isothermal, NULL},
        {"by-gas-heading", "GAS.WORK(\"N2\";\"2 kg; 25 °C; 1 bar\";\"isothermal to 8 bar\";\"W by gas, kJ\")",
         -isothermal, NULL},
        {"bare-is-J", "GAS.WORK(\"N2\";\"2 kg; 25 °C; 1 bar\";\"isothermal to 8 bar\")", 1000 * isothermal, NULL},
        {"per-kg", "GAS.WORK(\"N2\";\"25 °C; 1 bar\";\"isothermal to 8 bar\";\"kJ/kg\")", isothermal / 2, NULL},
        {"per-mol", "GAS.WORK(\"N2\";\"25 °C; 1 bar\";\"isothermal to 8 bar\";\"J/mol\")", R * 298.15 * log(8), NULL},
        {"adiabatic-closed", "GAS.WORK(\"N2 | k = 1.4\";\"300 K; 1 bar\";\"adiabatic to 8 bar\";\"J/mol\")",
         cv * (T2 - 300), NULL},
        {"adiabatic-flow", "GAS.WORK(\"N2 | k = 1.4\";\"300 K; 1 bar\";\"adiabatic to 8 bar\";\"J/mol\";;\"flow\")",
         cp * (T2 - 300), NULL},
        {"closed-per-time",
         "GAS.WORK(\"N2 | k = 1.4\";\"1 mol/s; 300 K; 1 bar\";\"adiabatic to 8 bar\";\"W\";;\"closed\")",
         cv * (T2 - 300), NULL},
        {"adiabatic-78-flow",
         "GAS.WORK(\"N2 | k = 1.4\";\"300 K; 1 bar\";\"adiabatic 78 % to 8 bar\";\"J/mol\";;\"flow\")",
         cp * (T2 - 300) / 0.78, NULL},
        {"power", "GAS.WORK(\"N2 | k = 1.4\";\"0.5 kg/s; 300 K; 1 bar\";\"adiabatic to 8 bar\";\"kW\";;\"flow\")",
         0.5 / M_N2 * cp * (T2 - 300) / 1000, NULL},
        {"polytropic", "GAS.WORK(\"N2\";\"300 K; 1 bar\";\"polytropic n=1.3 to 5 bar\";\"J/mol\")",
         R * (n13 - 300) / 0.3, NULL},
        {"polytropic-comma", "GAS.WORK(\"N2\";\"300 K; 1 bar\";\"polytropic n=1,3 to 5 bar\";\"J/mol\")",
         R * (n13 - 300) / 0.3, NULL},
        {"isobaric-Q", "GAS.HEAT(\"Ar\";\"1 mol; 300 K; 2 bar\";\"isobaric to 400 K\";\"J\")", 100 * ARGON_CP, NULL},
        {"isobaric-W", "GAS.WORK(\"Ar\";\"1 mol; 300 K; 2 bar\";\"isobaric to 400 K\";\"J\")", -100 * R, NULL},
        {"isochoric-flow-W", "GAS.WORK(\"Ar\";\"1 mol/s; 300 K; 2 bar\";\"isochoric to 600 K\";\"W\";;\"flow\")",
         300 * R, NULL},
        {"two-legs", "GAS.WORK(\"Ar\";\"1 mol; 300 K; 1 bar\";\"isobaric to 600 K; isothermal to 2 bar\";\"J\")",
         -300 * R + 600 * R * log(2), NULL},
        {"legs-in-cells",
         "GAS.WORK(\"Ar\";\"1 mol; 300 K; 1 bar\";{\"isobaric to 600 K\"|\"isothermal to 2 bar\"};\"J\")",
         -300 * R + 600 * R * log(2), NULL},
        {"free-expansion", "GAS.WORK(\"Ar\";\"1 mol; 300 K; 1 bar\";\"free expansion to V x 2\";\"J\")", 0, NULL},
        {"throttle-dS", "GAS.END(\"Ar\";\"1 mol; 300 K; 4 bar\";\"free expansion to 1 bar\";\"dS, J/K\")", R * log(4),
         NULL},
        {"with-Q", "GAS.END(\"Ar\";\"1 mol; 300 K; 1 bar\";\"isochoric with Q = 1 kJ\";\"T, K\")",
         300 + 1000 / ARGON_CV, NULL},
        {"with-W", "GAS.END(\"Ar\";\"1 mol; 300 K; 1 bar\";\"adiabatic with W = 1 kJ\";\"T, K\")",
         300 + 1000 / ARGON_CV, NULL},
        {"with-W-by-gas",
         "GAS.END(\"Ar\";\"1 mol; 300 K; 1 bar\";\"adiabatic with W = -1 kJ\";\"T, K\";;\"work by gas\")",
         300 + 1000 / ARGON_CV, NULL},
        {"against", "GAS.WORK(\"Ar\";\"1 mol; 300 K; 4 bar\";\"isothermal against 1 bar to V x 2\";\"J\")",
         -BAR * R * 300 / (4 * BAR), NULL},
        {"straight", "GAS.WORK(\"Ar\";\"0.2 m3; 300 K; 1 bar\";\"straight to 3 bar and 0.5 m3\";\"kJ\")",
         -(1 + 3) * BAR / 2 * 0.3 / 1000, NULL},
        {"points", "GAS.WORK(\"Ar\";\"0.1 m3; 300 K; 1 bar\";{\"P, bar\";\"V, m3\"|1;0.1|2;0.15|1.5;0.3};\"kJ\")",
         -(1.5 * 0.05 + 1.75 * 0.15) * 100, NULL},
        {"points-polytropic",
         "GAS.WORK(\"Ar\";\"0.1 m3; 300 K; 1 bar\";{\"P, bar\";\"V, m3\";\"polytropic\"|1;0.1;0|2;0.05;0};\"kJ\")",
         10 * log(2), NULL},
        {"points-back", "GAS.WORK(\"Ar\";\"0.1 m3; 300 K; 1 bar\";{\"P, bar\";\"V, m3\"|1;0.1|2;0.05|1.5;0.08};\"kJ\")",
         1.5 * 5 - 1.75 * 3, NULL},
        {"ratio", "GAS.END(\"Ar\";\"1 mol; 300 K; 1 bar\";\"isothermal to V x 0.25\";\"P, bar(a)\")", 4, NULL},
        {"gauge-leg", "GAS.WORK(\"N2\";\"25 °C; 0 bar(g)\";\"isothermal to 7 bar(g)\";\"J/mol\")",
         R * 298.15 * log(8.01325 / 1.01325), NULL},
        {"barometer",
         "GAS.WORK(\"N2\";\"25 °C; 0 bar(g)\";\"isothermal to 7 bar(g)\";\"J/mol\";;\"barometer 0.95 bar\")",
         R * 298.15 * log(7.95 / 0.95), NULL},
        {"state-2", "GAS.END(\"Ar\";\"1 mol; 300 K; 1 bar\";\"isobaric to 600 K; isochoric to 300 K\";\"T2, K\")", 600,
         NULL},
        {"end-m", "GAS.END(\"Ar\";\"2 mol; 300 K; 1 bar\";\"isobaric to 600 K\";\"m, kg\")", 2 * M_AR, NULL},
        {"agreeing-P2",
         "GAS.WORK(\"Ar\";\"P1 = 1 bar; T1 = 300 K; P2 = 8 bar; T2 = 300 K\";\"isothermal to 8 bar\";\"J/mol\")",
         R * 300 * log(8), NULL},
        {"no-cp-W", "GAS.WORK(\"R-134a\";\"300 K; 1 bar; 1 mol\";\"isobaric to 400 K\";\"J\")", -100 * R, NULL},
        {"plus-minus-P2",
         "GAS.WORK(\"Ar\";\"P1 = 1 bar; T1 = 300 K; P2 = 8 ± 0.1 bar\";\"isothermal to 8 bar\";\"J/mol\")",
         R * 300 * log(8), NULL},
        {"agreeing-h2",
         "GAS.WORK(\"Ar\";\"P1 = 1 bar; T1 = 298.15 K; h2 = 0 J/mol\";\"isothermal to 8 bar\";\"J/mol\")",
         R * 298.15 * log(8), NULL},
        {"cycle-otto",
         "GAS.CYCLE(\"air | k = 1.4\";\"300 K; 1 bar\";\"adiabatic to V x 0.125; isochoric to 1800 K; adiabatic to V x "
         "8; isochoric to start\";\"efficiency\")",
         1 - pow(8, -0.4), NULL},
    };
    CHECK_ROWS(rows, 1e-9);
}

static void tables(void)
{
    const struct row rows[] = {
        {"column-P2",
         "GAS.WORK(\"Ar\";{1;300;4|1;300;8};\"isothermal to P2\";\"J/mol\";{\"P1, bar\";\"T1, K\";\"P2, bar\"})",
         R * 300 * log(4), NULL},
        {"column-n",
         "GAS.END(\"Ar\";{1;300;4;1.2|1;300;8;1.3};\"polytropic n to P2\";\"T, K\";{\"P1, bar\";\"T1, K\";\"P2, "
         "bar\";\"n\"})",
         300 * pow(4, 0.2 / 1.2), NULL},
        {"column-efficiency",
         "GAS.WORK(\"Ar\";{1;300;4;80};\"adiabatic efficiency to P2\";\"J/mol\";{\"P1, bar\";\"T1, K\";\"P2, "
         "bar\";\"efficiency, %\"};\"flow\")",
         ARGON_CP * 300 * (pow(4, R / ARGON_CP) - 1) / 0.8, NULL},
        {"points-barometer",
         "GAS.WORK(\"Ar\";{0;300;0.1;0.95};{\"P, bar(g)\";\"V, m3\"|0;0.1|1;0.2};\"kJ\";{\"P1, bar(g)\";\"T1, "
         "K\";\"V1, m3\";\"barometer, bar\"})",
         -(0.95 + 1.95) / 2 * 10, NULL},
        {"row-barometer",
         "GAS.WORK(\"Ar\";{0;300;7;0.95};\"isothermal to P2\";\"J/mol\";{\"P1, bar(g)\";\"T1, K\";\"P2, "
         "bar(g)\";\"barometer, bar\"})",
         R * 300 * log(7.95 / 0.95), NULL},
    };
    CHECK_ROWS(rows, 1e-9);
}

static void refusals(void)
{
    const struct row rows[] = {
        {"no-process", "GAS.WORK(\"N2\";\"1 kg; 25 °C; 1 bar\";\"squeeze to 8 bar\";\"kJ\")", 0,
         "Check leg 1: \"squeeze to 8 bar\": it does not start with a process"},
        {"no-ending", "GAS.WORK(\"N2\";\"1 kg; 25 °C; 1 bar\";\"isothermal\";\"kJ\")", 0, "it has no ending"},
        {"empty", "GAS.WORK(\"N2\";\"1 kg; 25 °C; 1 bar\";\"\";\"kJ\")", 0, "Check legs: there is none"},
        {"left-out", "GAS.WORK(\"N2\";\"1 kg; 25 °C; 1 bar\";;\"kJ\")", 0, "Check legs: there is none"},
        {"other-T", "GAS.WORK(\"N2\";\"1 kg; 25 °C; 1 bar\";\"isothermal to 60 °C\";\"kJ\")", 0,
         "Check leg 1: \"isothermal to 60 °C\""},
        {"zero-ratio", "GAS.WORK(\"N2\";\"1 kg; 25 °C; 1 bar\";\"isothermal to V x 0\";\"kJ\")", 0, "Check leg 1"},
        {"efficiency-0", "GAS.WORK(\"N2\";\"25 °C; 1 bar\";\"adiabatic 0 % to 3 bar\";\"kJ/kg\";;\"flow\")", 0,
         "efficiency of 0"},
        {"efficiency-120", "GAS.WORK(\"N2\";\"25 °C; 1 bar\";\"adiabatic 120 % to 3 bar\";\"kJ/kg\";;\"flow\")", 0,
         "efficiency of 1.2"},
        {"wrong-side", "GAS.WORK(\"N2\";\"1 kg; 25 °C; 1 bar\";\"against 3 bar to V x 2\";\"kJ\")", 0, "Check leg 1"},
        {"one-point", "GAS.WORK(\"Ar\";\"0.1 m3; 300 K; 1 bar\";{\"P, bar\";\"V, m3\"|1;0.1};\"kJ\")", 0,
         "Check leg 1"},
        {"points-elsewhere", "GAS.WORK(\"Ar\";\"0.1 m3; 300 K; 1 bar\";{\"P, bar\";\"V, m3\"|1.5;0.1|2;0.2};\"kJ\")", 0,
         "starting where the gas is (1 bar)"},
        {"too-much-heat", "GAS.WORK(\"N2\";\"1 kg; 25 °C; 1 bar\";\"isochoric with Q = -500 kJ\";\"kJ\")", 0,
         "Check leg 1"},
        {"no-amount", "GAS.WORK(\"N2\";\"25 °C; 1 bar\";\"isothermal to 8 bar\";\"kJ\")", 0,
         "the amount of gas, which does not follow"},
        {"no-start", "GAS.WORK(\"N2\";\"1 kg; 25 °C\";\"isothermal to 8 bar\";\"kJ\")", 0, "Check given"},
        {"no-column", "GAS.WORK(\"N2\";\"25 °C; 1 bar\";\"isothermal to P2\";\"kJ/kg\")", 0,
         "takes P2 from the givens"},
        {"wrong-wanted", "GAS.WORK(\"N2\";\"1 kg; 25 °C; 1 bar\";\"isothermal to 8 bar\";\"T, K\")", 0, "Check wanted"},
        {"open-cycle", "GAS.CYCLE(\"N2\";\"1 kg; 25 °C; 1 bar\";\"isothermal to 8 bar\";\"W net, kJ\")", 0,
         "does not close"},
        {"bad-unit", "GAS.WORK(\"N2\";\"1 kg; 25 °C; 1 bar\";\"isothermal to 8 baar\";\"kJ\")", 0, "Check leg 1"},
        {"mass-ending", "GAS.WORK(\"N2\";\"1 kg; 25 °C; 1 bar\";\"isothermal to 8 kg\";\"kJ\")", 0, "Check leg 1"},
        {"points-0", "GAS.TRACE(\"N2\";\"1 kg; 25 °C; 1 bar\";\"isothermal to 8 bar\";;0)", 0, "Check points"},
        {"idle-P2", "GAS.WORK(\"Ar\";\"P1 = 1 bar; T1 = 300 K; P2 = 7 bar\";\"isothermal to 8 bar\";\"J/mol\")", 0,
         "Check P2: 7 bar is given, but the legs lead to 8 bar"},
        {"idle-P4", "GAS.WORK(\"Ar\";\"P1 = 1 bar; T1 = 300 K; P4 = 7 bar\";\"isothermal to 8 bar\";\"J/mol\")", 0,
         "Check P4: the path ends at state 2"},
        {"no-cp", "GAS.HEAT(\"R-134a\";\"300 K; 1 bar; 1 mol\";\"isobaric to 400 K\";\"J\")", 0,
         "has no heat capacity"},
        {"which-work", "GAS.WORK(\"N2\";\"1 kg/s; 25 °C; 1 bar\";\"adiabatic to 3 bar\";\"kW\")", 0,
         "Check options: a flow is given; add the option flow"},
        {"blank-n-flow",
         "GAS.END(\"Ar\";{1;300;4;\"\"};\"polytropic n to P2\";\"T, K\";{\"P1, bar\";\"T1, K\";\"P2, "
         "bar\";\"n\"};\"flow\")",
         0, "blank here"},
        {"blank-efficiency",
         "GAS.END(\"Ar\";{1;300;4;\"\"};\"adiabatic efficiency to P2\";\"T, K\";{\"P1, bar\";\"T1, K\";\"P2, "
         "bar\";\"efficiency, %\"};\"flow\")",
         0, "blank here"},
        {"idle-Q", "GAS.END(\"Ar\";\"P1 = 1 bar; T1 = 300 K; n = 1 mol; Q = 1 kJ\";\"isobaric to 400 K\";\"T, K\")", 0,
         "no leg uses \"Q, kJ\"; name it in a leg"},
        {"idle-h2", "GAS.WORK(\"Ar\";\"P1 = 1 bar; T1 = 300 K; h2 = 9 kJ/mol\";\"isothermal to 8 bar\";\"J/mol\")", 0,
         "Check h2: 9 kJ/mol is given, but the legs lead to"},
        {"passed-on", "GAS.WORK(\"N2\";\"1 kg; 25 °C; 1 bar\";\"Check P1: from elsewhere.\";\"kJ\")", 0,
         "Check P1: from elsewhere."},
    };
    CHECK_ROWS(rows, 0);
}

/* A path table: heading row, a row per leg, a total that adds the legs. */
static void path_table(void)
{
    struct gas_arena arena = {0};
    struct gas_block table = {0};
    const char *formula = "GAS.PATH(\"Ar\";\"1 mol; 300 K; 1 bar\";\"isobaric to 600 K; isothermal to 2 bar\")";
    check_true("evaluates", formula_evaluate(formula, &arena, &table));
    if (check_int("rows", (long)table.rows, 4) && check_int("columns", (long)table.columns, 9)) {
        check_text("label", gas_cell_at(&table, 1, 0)->text, "isobaric to 600 K");
        check_text("sign", gas_cell_at(&table, 0, 4)->text, "W on gas, kJ");
        check_text("total", gas_cell_at(&table, 3, 0)->text, "total");
        for (size_t column = 4; column < 9; column++)
            check_close(gas_cell_at(&table, 0, column)->text, gas_cell_at(&table, 3, column)->number,
                        gas_cell_at(&table, 1, column)->number + gas_cell_at(&table, 2, column)->number, 1e-12, 1e-12);
        check_close("T at the end", gas_cell_at(&table, 2, 2)->number, 600, 1e-12, 0);
    }
    gas_arena_free(&arena);
}

/* A trace hits corners exactly and steps evenly in V along an isobar. */
static void trace_points(void)
{
    struct gas_arena arena = {0};
    struct gas_block table = {0};
    const char *formula =
        "GAS.TRACE(\"Ar\";\"1 mol; 300 K; 1 bar\";\"isobaric to 600 K; isochoric to 2 bar\";\"V, L; P, bar; T, K\";4)";
    check_true("evaluates", formula_evaluate(formula, &arena, &table));
    if (check_int("rows", (long)table.rows, 10)) {
        check_close("start", gas_cell_at(&table, 1, 2)->number, 300, 1e-12, 0);
        check_close("corner", gas_cell_at(&table, 5, 2)->number, 600, 1e-12, 0);
        check_close("middle", gas_cell_at(&table, 3, 0)->number, 1000 * R * 450 / BAR, 1e-12, 0);
        check_close("end", gas_cell_at(&table, 9, 1)->number, 2, 1e-12, 0);
    }
    gas_arena_free(&arena);
}

const struct test_suite suite_path_fn = {"path_fn", (const struct test_case[]){{"work and heat", works_and_heats},
                                                                               {"tables", tables},
                                                                               {"refusals", refusals},
                                                                               {"path table", path_table},
                                                                               {"trace", trace_points},
                                                                               {0}}};
