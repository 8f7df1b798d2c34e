/* The print of GAS.CARD read back as a gas, its lines one by one, compositions on cards, and names of the trade. */
#include <math.h>
#include <stdio.h>
#include <string.h>

#include "formula.h"
#include "formula_rows.h"
#include "gas_cases.h"

#define RU 8.31446261815324 /* J/(mol K), SI 2019, exact */

static struct gas_arena arena;

static struct gas_block ask(const char *formula)
{
    struct gas_block value = {0};
    gas_arena_reset(&arena);
    check_true(formula, formula_evaluate(formula, &arena, &value));
    return value;
}

/* A print and the gas it was made of are two ways to the same data: molar mass, cp, its integral and its range. */
static void a_print_is_the_gas(void)
{
    static const char *const gas[] = {"N2",
                                      "isobutane",
                                      "1-butene",
                                      "air",
                                      "R-22",
                                      "neopentane",
                                      "air | k = 1.4",
                                      "CO2 | cp mean",
                                      "N2 | R = 8.314 J/mol-K",
                                      "CO2 | cp at 25 °C",
                                      "CH4 92 + C2H6 8",
                                      "CO2 40 + N2 60 wt%",
                                      "N2 79 + O2 21 | cp = 1.01 kJ/kg-K",
                                      "C1 90 + C2 6 + C3 2 + iC4 1 + nC4 1"};
    for (size_t i = 0; i < sizeof gas / sizeof *gas; i++) {
        char formula[200];
        struct gas_refusal refusal = {0};
        const struct gas_choice *own = case_text(gas[i]);
        snprintf(formula, sizeof formula, "GAS.CARD(\"%s\")", gas[i]);
        struct gas_block print = ask(formula);
        const struct gas_choice *back = gas_choose(&print, &refusal);
        if (!check_true(gas[i], own && back))
            check_text(gas[i], refusal.text, "(no refusal)");
        for (double T = 220; own && back && T < 1400; T *= 1.4) {
            check_close(gas[i], gas_cp(&back->gas, T).value, gas_cp(&own->gas, T).value, 1e-13, 0);
            check_close(gas[i], gas_dh(&back->gas, 298.15, T).value, gas_dh(&own->gas, 298.15, T).value, 1e-13, 0);
        }
        if (own && back) {
            check_close(gas[i], back->gas.molar_mass, own->gas.molar_mass, 1e-14, 0);
            check_true(gas[i], gas_range_of(&back->gas).T_to == gas_range_of(&own->gas).T_to);
        }
        gas_choice_release(own);
        gas_choice_release(back);
    }
}

/* Every figure that the card prints is the answer to its own label, alone and with the unit that it prints. */
static void every_line_is_an_item(const char *gas)
{
    char formula[300], label[120], unit[40];
    snprintf(formula, sizeof formula, "GAS.CARD(\"%s\")", gas);
    const size_t rows = ask(formula).rows;
    for (size_t row = 1; row < rows; row++) {
        snprintf(formula, sizeof formula, "GAS.CARD(\"%s\")", gas);
        struct gas_block card = ask(formula);
        const struct gas_cell value = *gas_cell_at(&card, row, 1);
        snprintf(label, sizeof label, "%s", gas_cell_at(&card, row, 0)->text);
        snprintf(unit, sizeof unit, "%s", gas_cell_at(&card, row, 2)->text);
        bool fraction = strncmp(label, "x ", 2) == 0 || strncmp(label, "w ", 2) == 0;
        snprintf(formula, sizeof formula, "GAS.CARD(\"%s\";\"%s\")", gas, label);
        struct gas_block alone = ask(formula);
        if (value.kind == GAS_CELL_NUMBER)
            check_close(formula, alone.cell->number, fraction ? value.number / 100 : value.number, 1e-14, 0);
        else
            check_true(formula, alone.cell->kind == GAS_CELL_TEXT && strncmp(alone.cell->text, "Check", 5) != 0);
        if (value.kind != GAS_CELL_NUMBER || !unit[0])
            continue;
        snprintf(formula, sizeof formula, "GAS.CARD(\"%s\";\"%s, %s\")", gas, label, unit);
        check_close(formula, ask(formula).cell->number, value.number, 1e-14, 0);
    }
}

static void lines(void)
{
    every_line_is_an_item("N2");
    every_line_is_an_item("R-22");
    every_line_is_an_item("air | k = 1.4");
    every_line_is_an_item("CH4 92 + 1,3-butadiene 8");
}

/* Each publication stands once in full, behind the key beside its figures, and no cell of the first three columns is
 * longer than a column is wide. */
static void the_print_is_readable(void)
{
    struct gas_block card = ask("GAS.CARD(\"N2\")");
    size_t nasa = 0, keys = 0;
    for (size_t row = 0; row < card.rows; row++) {
        const struct gas_cell *cell = gas_cell_at(&card, row, 0);
        nasa +=
            strcmp(cell[0].text, "source") == 0 && strncmp(cell[3].text, "NASA/TP-2002-211556: B. J. McBride", 34) == 0;
        keys += strcmp(cell[3].text, "NASA/TP-2002-211556") == 0;
        check_true("label", strlen(cell[0].text) < 30);
        check_true("value", cell[1].kind == GAS_CELL_NUMBER || strlen(cell[1].text) < 30);
        check_true("unit", strlen(cell[2].text) < 12);
        check_true("source", strlen(cell[3].text) < 60 || strcmp(cell[0].text, "source") == 0);
    }
    check_int("in full once", (long)nasa, 1);
    check_true("its key beside the figures", keys >= 4);
}

static const struct formula_row rows[] = {
    /* a composition on a card; by hand: M = 0.79 28.014 + 0.21 31.998 = 28.85064 g/mol (IUPAC 2021) */
    {"x", "GAS.CARD({\"x N2\";79;\"mol %\"|\"x O2\";21;\"mol %\"};\"M, g/mol\")", 28.85064, NULL},
    {"x, bare", "GAS.CARD({\"x N2\";0.79|\"x O2\";0.21};\"M, g/mol\")", 28.85064, NULL},
    {"x, rest", "GAS.CARD({\"x N2\";\"rest\"|\"x O2\";\"21 %\"};\"M, g/mol\")", 28.85064, NULL},
    {"x with k", "GAS.CP({\"name\";\"old air\"|\"x N2\";79|\"x O2\";21|\"k\";1.4};700)", 3.5 * RU, NULL},
    {"x with rule", "GAS.CP({\"x N2\";79|\"x O2\";21|\"rule\";\"k = 1.4\"};700)", 3.5 * RU, NULL},
    {"w", "GAS.CARD({\"w N2\";60|\"w CO2\";40};\"w CO2\")", 0.4, NULL},
    {"w in %", "GAS.CARD({\"w N2\";60|\"w CO2\";40};\"w CO2, wt %\")", 40, NULL},
    {"own cp, one argument", "GAS.CP({\"name\";\"N2\"|\"cp\";\"1.04 kJ/kg-K\"};400)", 1.04 * 28.014, NULL},
    /* cp of nitrogen at 298.15 K: JANAF table N-023, 29.124 J/(mol K) */
    {"name alone", "GAS.CP({\"name\";\"N2\"};298.15)", 29.124, NULL},
    {"CAS alone", "GAS.CP({\"CAS number\";\"7727-37-9\"};298.15)", 29.124, NULL},
    /* names of the trade; cp at 298.15 K: JANAF tables H-083 (ammonia) and C-095 (carbon dioxide) */
    {"ammonia gas", "GAS.CP(\"ammonia gas\";298.15)", 35.652, NULL},
    {"CO2 (g)", "GAS.CP(\"CO2 (g)\";298.15)", 37.129, NULL},
    {"gaseous nitrogen", "GAS.CP(\"gaseous nitrogen\";298.15)", 29.124, NULL},
    /* molar masses, IUPAC 2021, by hand: CHClF2 86.465, C4H10 58.124, H2O 18.015 */
    {"Freon 22", "GAS.CARD(\"Freon 22\";\"M, g/mol\")", 86.465, NULL},
    {"refrigerant R-22", "GAS.CARD(\"refrigerant R-22\";\"M, g/mol\")", 86.465, NULL},
    {"HCFC-22", "GAS.CARD(\"HCFC-22\";\"M, g/mol\")", 86.465, NULL},
    {"iC4", "GAS.CARD(\"iC4\";\"M, g/mol\")", 58.124, NULL},
    {"n-C4", "GAS.CARD(\"n-C4\";\"M, g/mol\")", 58.124, NULL},
    {"steam", "GAS.CARD(\"steam\";\"M, g/mol\")", 18.015, NULL},
    {"source of Pc", "GAS.CARD(\"N2\";\"source of Pc\")", 0, "The Properties of Gases and Liquids"},
    {"source of M", "GAS.CARD(\"N2\";\"source of M\")", 0, "Pure Appl. Chem. 94 (2022) 573"},
    {"source, given", "GAS.CARD({\"M\";28|\"cp\";\"29 J/mol-K\"|\"source\";\"Old book, table 7\"};\"source\")", 0,
     "Old book, table 7"},
    {"note", "GAS.CARD(\"N2\";\"note on cp\")", 0, "Gurvich"},
    {"not there", "GAS.CARD(\"N2\";\"colour\")", 0, "its lines are name, formula, CAS number, M, R"},
    {"print of a card", "GAS.CP(GAS.CARD({\"name\";\"mine\"|\"M\";28|\"form\";\"cubic\"|\"A\";29|\"B\";0.001});300)", 0,
     "not the constants behind it"},
    {"cp at 25 °C alone", "GAS.CP({\"name\";\"mine\"|\"M\";28|\"cp at 25 °C\";30};300)", 0,
     "write the label cp for a constant"},
    {"cp at 25 °C, another", "GAS.CP({\"name\";\"N2\"|\"cp at 25 °C\";30};300)", 0,
     "while its heat capacity gives 29.124"},
    {"two gases", "GAS.CP({\"name\";\"N2\"|\"formula\";\"O2\"};300)", 0, "nitrogen and oxygen"},
    {"two bases", "GAS.CP({\"x N2\";79;\"wt %\"|\"x O2\";21;\"mol %\"};300)", 0, "the other basis"},
    {"no fraction", "GAS.CP({\"x N2\";\"much\"|\"x O2\";21};300)", 0, "needs a fraction"},
    {"C4", "GAS.CP(\"C4\";300)", 0, "nC4"},
    {"C6+", "GAS.CP(\"CH4 99 + C6+ 1\";300)", 0, "such as nC6"},
    {"sulphur", "GAS.CP(\"sulphur\";300)", 0, "S2 or S8"},
    {"T2", "GAS.CP(\"N2 | cp = 28 + 3 T2\";300)", 0, "write T^2"},
};

static void formulas(void)
{
    check_formula_rows(rows, sizeof rows / sizeof *rows, 1e-3); /* cp: as far as the two data sets agree */
}

/* The composition that a sentence proposes for a name of the trade is one that is read. */
static void what_is_proposed_is_read(void)
{
    static const char *const names[] = {
        "natural gas", "Flue gas", "biogas",      "syngas",          "water gas", "producer gas",
        "town gas",    "LPG",      "fuel gas",    "coke-oven gas",   "moist air", "forming gas",
        "acid gas",    "heliox",   "welding gas", "cracked ammonia", "nitrox",    "blast furnace gas"};
    for (size_t i = 0; i < sizeof names / sizeof *names; i++) {
        struct gas_refusal refusal = {0};
        const struct gas_choice *none = gas_choose_text(names[i], strlen(names[i]), &refusal);
        char *example = strstr(refusal.text, "such as ");
        case_refused(names[i], none, &refusal, "such as ");
        if (!example)
            continue;
        example += strlen("such as ");
        example[strlen(example) - 1] = '\0'; /* the full stop */
        const struct gas_choice *read = case_text(example);
        check_true(example, read && isfinite(gas_cp(&read->gas, 300).value));
        gas_choice_release(read);
    }
}

const struct test_suite suite_card_print = {"card_print",
                                            (const struct test_case[]){{"back", a_print_is_the_gas},
                                                                       {"lines", lines},
                                                                       {"readable", the_print_is_readable},
                                                                       {"formulas", formulas},
                                                                       {"proposed", what_is_proposed_is_read},

                                                                       {0}}};
