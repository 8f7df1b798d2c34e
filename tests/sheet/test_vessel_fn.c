/*
 * Filling and venting on cells. Expected figures are arithmetic written out beside the row for a gas of constant heat
 * capacity, or published examples, or refusals read against the rules for sentences. R as in the SI of 2019; atomic
 * weights IUPAC 2021.
 */
#include <math.h>

#include "check.h"
#include "formula.h"
#include "formula_rows.h"

#define R    8.31446261815324
#define M_N2 28.014e-3 /* kg/mol */
#define BAR  1e5

/* clang-format off */
/* n2 u(T2) - n1 u(T1) = (n2 - n1) h(T_line) + Q with constant cv, cp = cv + R, n = P V/(R T), solved for T2 by hand:
 * (P2 - P1) V cv/R = (P2 V/(R T2) - P1 V/(R T1)) cp T_line + Q. */
static void filling(void)
{
    const double cv = 2.5 * R, cp = 3.5 * R, V = 0.05, P1 = 2 * BAR, T1 = 290, P2 = 11 * BAR, T_line = 305;
    const double n1 = P1 * V / (R * T1), energy = (P2 - P1) * V * cv / R;
    const double n2 = n1 + energy / (cp * T_line), T2 = P2 * V / (R * n2);
    const double n2_Q = n1 + (energy + 2000) / (cp * T_line);
    const double iso = P2 * V / (R * T1), kept = (P2 - P1) * V * cv / R - (iso - n1) * cp * T_line; /* heat that keeps T1 */
    const double n2_half = n1 + (energy - 0.5 * kept) / (cp * T_line);
    const struct formula_row rows[] = {
        {"evacuated", "GAS.FILL(\"N2 | k = 1.4\";\"V = 50 L; P1 = 0 bar; P2 = 10 bar; T line = 300 K\";\"T2, K\")", 420, NULL},
        {"T2", "GAS.FILL(\"N2 | k = 1.4\";\"V = 50 L; P1 = 2 bar; T1 = 290 K; P2 = 11 bar; T line = 305 K\";\"T2, K\")", T2, NULL},
        {"m2", "GAS.FILL(\"N2 | k = 1.4\";\"V = 50 L; P1 = 2 bar; T1 = 290 K; P2 = 11 bar; T line = 305 K\";\"m2, g\")", n2 * M_N2 * 1000, NULL},
        {"m1", "GAS.FILL(\"N2 | k = 1.4\";\"V = 50 L; P1 = 2 bar; T1 = 290 K; P2 = 11 bar; T line = 305 K\";\"m1, kg\")", n1 * M_N2, NULL},
        {"m-added", "GAS.FILL(\"N2 | k = 1.4\";\"V = 50 L; P1 = 2 bar; T1 = 290 K; P2 = 11 bar; T line = 305 K\";\"m added, kg\")", (n2 - n1) * M_N2, NULL},
        {"Nm3-added", "GAS.FILL(\"N2 | k = 1.4\";\"V = 50 L; P1 = 2 bar; T1 = 290 K; P2 = 11 bar; T line = 305 K\";\"V added, Nm3\")", (n2 - n1) * R * 273.15 / 101325, NULL},
        {"settled", "GAS.FILL(\"N2 | k = 1.4\";\"V = 50 L; P1 = 2 bar; T1 = 290 K; P2 = 11 bar; T line = 305 K\";\"P settled, bar\")", n2 * R * T1 / V / BAR, NULL},
        {"settled-elsewhere", "GAS.FILL(\"N2 | k = 1.4\";\"V = 50 L; P1 = 2 bar; T1 = 290 K; P2 = 11 bar; T line = 305 K; T settled = 280 K\";\"P settled, bar\")", n2 * R * 280 / V / BAR, NULL},
        {"heat-lost", "GAS.FILL(\"N2 | k = 1.4\";\"V = 50 L; P1 = 2 bar; T1 = 290 K; P2 = 11 bar; T line = 305 K; Q = -2 kJ\";\"T2, K\")", P2 * V / (R * n2_Q), NULL},
        {"isothermal-m2", "GAS.FILL(\"N2 | k = 1.4\";\"V = 50 L; P1 = 2 bar; T1 = 290 K; P2 = 11 bar; T line = 305 K\";\"m2, kg\";;\"isothermal\")", iso * M_N2, NULL},
        {"isothermal-Q", "GAS.FILL(\"N2 | k = 1.4\";\"V = 50 L; P1 = 2 bar; T1 = 290 K; P2 = 11 bar; T line = 305 K\";\"Q, J\";;\"isothermal\")", kept, NULL},
        {"half-Q", "GAS.FILL(\"N2 | k = 1.4\";\"V = 50 L; P1 = 2 bar; T1 = 290 K; P2 = 11 bar; T line = 305 K\";\"Q, J\";;\"heat lost 50 %\")", 0.5 * kept, NULL},
        {"half-T2", "GAS.FILL(\"N2 | k = 1.4\";\"V = 50 L; P1 = 2 bar; T1 = 290 K; P2 = 11 bar; T line = 305 K\";\"T2, K\";;\"heat lost 50 %\")", P2 * V / (R * n2_half), NULL},
        {"from-m1", "GAS.FILL(\"N2 | k = 1.4\";\"m1 = 1 kg; P1 = 2 bar; T1 = 290 K; P2 = 11 bar; T line = 305 K\";\"V, m3\")", R * T1 / (M_N2 * P1), NULL},
        {"gauge", "GAS.FILL(\"N2 | k = 1.4\";\"V = 50 L; P1 = -0.95 bar(g); P2 = 10 bar(g); T line = 300 K; T settled = 300 K\";\"P settled, bar(g)\";;\"barometer 0.95 bar\")", 10.95 / 1.4 - 0.95, NULL},
        {"wall-none", "GAS.FILL(\"N2 | k = 1.4\";\"V = 50 L; P1 = 2 bar; T1 = 290 K; P2 = 11 bar; T line = 305 K; UA = 1e-9 W/K; T wall = 290 K; time = 60 s\";\"T2, K\")", T2, NULL},
    };
    check_formula_rows(rows, sizeof rows / sizeof *rows, 1e-6);
}

static void venting(void)
{
    const double V = 2, P1 = 8 * BAR, T1 = 300, P2 = 2 * BAR, m = 0.4 / 1.4;
    const double n1 = P1 * V / (R * T1), T2 = T1 * pow(P2 / P1, m), n2 = P2 * V / (R * T2);
    /* choked flow of a perfect gas: A Cd P sqrt(k/(R T)) (2/(k+1))^((k+1)/(2(k-1))), mol/s with R per mole over M */
    const double choked = 5e-5 * 0.62 * P1 * sqrt(1.4 * M_N2 / (R * T1)) * pow(2 / 2.4, 3); /* kg/s */
    const double iso_time = n1 * M_N2 / choked * log(P1 / P2);                               /* P falls exponentially */
    const struct formula_row rows[] = {
        {"T2", "GAS.VENT(\"N2 | k = 1.4\";\"V = 2 m3; P1 = 8 bar; T1 = 300 K; P2 = 2 bar\";\"T2, K\")", T2, NULL},
        {"m-out", "GAS.VENT(\"N2 | k = 1.4\";\"V = 2 m3; P1 = 8 bar; T1 = 300 K; P2 = 2 bar\";\"m out, kg\")", (n1 - n2) * M_N2, NULL},
        {"settled", "GAS.VENT(\"N2 | k = 1.4\";\"V = 2 m3; P1 = 8 bar; T1 = 300 K; P2 = 2 bar\";\"P settled, bar\")", n2 * R * T1 / V / BAR, NULL},
        {"isothermal-m-out", "GAS.VENT(\"N2 | k = 1.4\";\"V = 2 m3; P1 = 8 bar; T1 = 300 K; P2 = 2 bar\";\"m out, kg\";;\"isothermal\")", 0.75 * n1 * M_N2, NULL},
        {"isothermal-Q", "GAS.VENT(\"N2 | k = 1.4\";\"V = 2 m3; P1 = 8 bar; T1 = 300 K; P2 = 2 bar\";\"Q, kJ\";;\"isothermal\")", V * (P1 - P2) / 1000, NULL},
        {"polytrope", "GAS.VENT(\"N2 | k = 1.4\";\"V = 2 m3; P1 = 8 bar; T1 = 300 K; P2 = 2 bar\";\"T2, K\";;\"heat gained 25 %\")", T1 * pow(P2 / P1, 0.75 * m), NULL},
        {"flow", "GAS.VENT(\"N2 | k = 1.4\";\"V = 2 m3; P1 = 8 bar; T1 = 300 K; P2 = 2 bar; area = 50 mm2; Cd = 62 %; P outside = 0.5 bar\";\"m1, kg/s\")", choked, NULL},
        {"time", "GAS.VENT(\"N2 | k = 1.4\";\"V = 2 m3; P1 = 8 bar; T1 = 300 K; P2 = 2 bar; area = 50 mm2; Cd = 0.62; P outside = 0.5 bar\";\"time, s\";;\"isothermal\")", iso_time, NULL},
    };
    check_formula_rows(rows, sizeof rows / sizeof *rows, 1e-9);
}

/* Sandler, Chemical, Biochemical, and Engineering Thermodynamics, 4th ed., illustration of ch. 3 (compressed-air tank): line 50 bar and 20 degC,
 * tank 1 bar and 20 degC filled to 40 bar, cv = 21 J/(mol K): 405.2 K, 28.94 bar after cooling back; from memory. cp = 21 + R. */
static void published(void)
{
    const struct formula_row rows[] = {
        {"Sandler-T", "GAS.FILL(\"air | cp = 29.314 J/mol-K\";\"V = 1 m3; P1 = 1 bar; T1 = 20 °C; P2 = 40 bar; T line = 20 °C; P line = 50 bar\";\"T2, K\")", 405.2, NULL},
        {"Sandler-P", "GAS.FILL(\"air | cp = 29.314 J/mol-K\";\"V = 1 m3; P1 = 1 bar; T1 = 20 °C; P2 = 40 bar; T line = 20 °C; P line = 50 bar\";\"P settled, bar\")", 28.94, NULL},
    };
    check_formula_rows(rows, sizeof rows / sizeof *rows, 2.5e-4);
}

static void cards_and_tables(void)
{
    const char *table = "GAS.FILL(\"N2 | k = 1.4\";{50;0;15;200;15|50;50;15;200;15|50;0;15;\"\";15|50;250;15;200;15|50;0;-300;200;15|50;0;15;200;\"\"|0;0;15;200;20|50;-2;15;200;15};"
                        "\"T2, °C; m added, kg\";{\"V, L\";\"P1, bar(g)\";\"T1, °C\";\"P2, bar(g)\";\"T line, °C\"})";
    static const char *const parts[] = {NULL, NULL, "Check P2: the pressure at the end is missing", "Check P2: 200 bar(g) is below P1, 250 bar(g)", "Check T1: -300 °C is below absolute zero", "Check T line: the temperature of the line is missing", "Check V: 0 L must be above zero", "Check P1: -2 bar(g) is below a perfect vacuum"};
    struct gas_arena arena = {0};
    struct gas_block t = {0};
    if (check_true("table", formula_evaluate(table, &arena, &t)) && check_int("rows", (long)t.rows, 8))
        for (size_t row = 0; row < 8; row++) {
            const struct gas_cell *cell = gas_cell_at(&t, row, 1);
            if (parts[row])
                check_contains(parts[row], cell->kind == GAS_CELL_TEXT ? cell->text : "a number", parts[row]);
            else
                check_true("a figure", cell->kind == GAS_CELL_NUMBER && cell->number > 1 && cell->number < 20);
        }
    if (check_true("card", formula_evaluate("GAS.FILL(\"air\";\"V = 50 L; P1 = 0 bar(g); T1 = 15 °C; P2 = 200 bar(g); T line = 15 °C\")", &arena, &t)) && check_int("lines", (long)t.rows, 9)) {
        check_text("first", gas_cell_at(&t, 1, 0)->text, "T2");
        check_text("unit", gas_cell_at(&t, 1, 2)->text, "°C");
        check_text("last", gas_cell_at(&t, 8, 0)->text, "Z2, estimated");
    }
    gas_arena_free(&arena);
}

static void refusals(void)
{
    const struct formula_row rows[] = {
        {"line-below", "GAS.FILL(\"air\";\"V = 50 L; P1 = 0 bar(g); T1 = 15 °C; P2 = 200 bar(g); T line = 15 °C; P line = 150 bar(g)\";\"T2, K\")", 0, "Check P line: 150 bar(g) is below P2, 200 bar(g)"},
        {"line-cold", "GAS.FILL(\"air\";\"V = 50 L; P1 = 1 bar; T1 = 20 °C; P2 = 9 bar; T line = -100 °C\";\"T2, K\")", 0, "Check T line: -100 °C is outside the data for air"},
        {"line-bare", "GAS.FILL(\"air\";\"V = 50 L; P1 = 1 bar; T1 = 20 °C; P2 = 9 bar; T line = 20\";\"T2, K\")", 0, "If 20 °C was meant, give the unit"},
        {"evacuated-settled", "GAS.FILL(\"air\";\"V = 50 L; P1 = 0 bar; P2 = 9 bar; T line = 15 °C\";\"P settled, bar\")", 0, "Check T settled"},
        {"evacuated-isothermal", "GAS.FILL(\"air\";\"V = 50 L; P1 = 0 bar; P2 = 9 bar; T line = 15 °C\";\"T2, K\";;\"isothermal\")", 0, "Check T1: it is missing"},
        {"evacuated-no-V", "GAS.FILL(\"air\";\"P1 = 0 bar; P2 = 9 bar; T line = 15 °C\";\"T2, K\")", 0, "Check V: the volume of the vessel is missing"},
        {"no-P2", "GAS.FILL(\"air\";\"V = 50 L; P1 = 1 bar; T1 = 20 °C; T line = 20 °C\";\"T2, K\")", 0, "Check P2: the pressure at the end is missing"},
        {"no-T1", "GAS.FILL(\"air\";\"V = 50 L; P1 = 1 bar; P2 = 9 bar; T line = 20 °C\";\"T2, K\")", 0, "Check given: T1"},
        {"unnumbered", "GAS.FILL(\"air\";\"V = 50 L; P = 1 bar; T = 20 °C; P2 = 9 bar; T line = 20 °C\";\"T2, K\")", 0, "P and T need a number here"},
        {"two-walls", "GAS.FILL(\"air\";\"V = 50 L; P1 = 1 bar; T1 = 20 °C; P2 = 9 bar; T line = 20 °C; Q = 1 kJ\";\"T2, K\";;\"isothermal\")", 0, "is said twice"},
        {"wall-no-T", "GAS.FILL(\"air\";\"V = 50 L; P1 = 1 bar; T1 = 20 °C; P2 = 9 bar; T line = 20 °C; UA = 5 W/K\";\"T2, K\")", 0, "Check T wall"},
        {"wall-no-time", "GAS.FILL(\"air\";\"V = 50 L; P1 = 1 bar; T1 = 20 °C; P2 = 9 bar; T line = 20 °C; UA = 5 W/K; T wall = 20 °C\";\"T2, K\")", 0, "Check time"},
        {"time-no-UA", "GAS.FILL(\"air\";\"V = 50 L; P1 = 1 bar; T1 = 20 °C; P2 = 9 bar; T line = 20 °C; time = 60 s\";\"T2, K\")", 0, "Check UA: time is given"},
        {"wall-no-UA", "GAS.FILL(\"air\";\"V = 50 L; P1 = 1 bar; T1 = 20 °C; P2 = 9 bar; T line = 20 °C; T wall = 20 °C\";\"T2, K\")", 0, "Check UA"},
        {"too-much-lost", "GAS.FILL(\"air\";\"V = 10 L; P1 = 1 bar; T1 = 20 °C; P2 = 9 bar; T line = 20 °C; Q = -1e9 J\";\"T2, K\")", 0, "the gas gets colder than"},
        {"negative-mass", "GAS.FILL(\"air\";\"m1 = -1 kg; P1 = 1 bar; T1 = 20 °C; P2 = 9 bar; T line = 20 °C\";\"T2, K\")", 0, "Check m1: -1 kg"},
        {"other-given", "GAS.FILL(\"air\";\"V = 50 L; P1 = 1 bar; T1 = 20 °C; P2 = 9 bar; T line = 20 °C; h = 3 kJ/kg\";\"T2, K\")", 0, "is not taken by GAS.FILL"},
        {"other-wanted", "GAS.FILL(\"air\";\"V = 50 L; P1 = 1 bar; T1 = 20 °C; P2 = 9 bar; T line = 20 °C\";\"mep, bar\")", 0, "GAS.FILL gives T2"},
        {"vent-up", "GAS.VENT(\"air\";\"V = 1 m3; P1 = 9 bar; T1 = 20 °C; P2 = 10 bar\";\"T2, K\")", 0, "Check P2: 10 bar is above P1, 9 bar"},
        {"vent-cold", "GAS.VENT(\"air\";\"V = 1 m3; P1 = 9 bar; T1 = 20 °C; P2 = 1 bar\";\"T2, K\")", 0, "the gas gets colder than -73.15 °C"},
        {"vent-evacuated", "GAS.VENT(\"air\";\"V = 1 m3; P1 = 0 bar; T1 = 20 °C; P2 = 0 bar\";\"T2, K\")", 0, "Check P1: 0 bar must be above zero"},
        {"vent-outside", "GAS.VENT(\"air | k = 1.4\";\"V = 1 m3; P1 = 9 bar; T1 = 20 °C; P2 = 0.5 bar; area = 1 mm2; Cd = 0.6\";\"time, s\")", 0, "is below the pressure outside"},
        {"no-orifice", "GAS.VENT(\"air | k = 1.4\";\"V = 1 m3; P1 = 9 bar; T1 = 20 °C; P2 = 5 bar\";\"time, s\")", 0, "Check area"},
        {"no-Cd", "GAS.VENT(\"air | k = 1.4\";\"V = 1 m3; P1 = 9 bar; T1 = 20 °C; P2 = 5 bar; area = 1 mm2\";\"time, s\")", 0, "Check Cd"},
        {"Cd-160", "GAS.VENT(\"air | k = 1.4\";\"V = 1 m3; P1 = 9 bar; T1 = 20 °C; P2 = 5 bar; area = 1 mm2; Cd = 1.6\";\"time, s\")", 0, "Check Cd: 1.6"},
        {"area-negative", "GAS.VENT(\"air | k = 1.4\";\"V = 1 m3; P1 = 9 bar; T1 = 20 °C; P2 = 5 bar; area = -1 mm2; Cd = 0.6\";\"m1, kg/s\")", 0, "Check area: -1 mm2 must be above zero"},
        {"time-with-heat", "GAS.VENT(\"air | k = 1.4\";\"V = 1 m3; P1 = 9 bar; T1 = 20 °C; P2 = 5 bar; area = 1 mm2; Cd = 0.6\";\"time, s\";;\"heat gained 40 %\")", 0, "Check time"},
        {"option-elsewhere", "GAS.SOLVE(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"kg\";;\"isothermal\")", 0, "Check options: isothermal"},
        {"option-form", "GAS.FILL(\"air\";\"V = 50 L; P1 = 0 bar; P2 = 9 bar; T line = 15 °C\";\"T2, K\";;\"heat lost 130 %\")", 0, "Check options: \"heat lost 130 %\""},
    };
    check_formula_rows(rows, sizeof rows / sizeof *rows, 0);
}
/* clang-format on */

const struct test_suite suite_vessel_fn = {"vessel_fn",
                                           (const struct test_case[]){{"filling", filling},
                                                                      {"venting", venting},
                                                                      {"published", published},
                                                                      {"cards and tables", cards_and_tables},
                                                                      {"refusals", refusals},
                                                                      {0}}};
