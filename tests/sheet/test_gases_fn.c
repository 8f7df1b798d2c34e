/* GAS.CARD and GAS.LIST. */
#include <math.h>
#include <string.h>

#include "check.h"
#include "formula.h"

#define RU 8.31446261815324 /* J/(mol K), SI 2019, exact */

static struct gas_arena arena;

static struct gas_block ask(const char *formula)
{
    struct gas_block value = {0};
    gas_arena_reset(&arena);
    check_true(formula, formula_evaluate(formula, &arena, &value));
    return value;
}

static double figure(const char *formula)
{
    struct gas_block value = ask(formula);
    bool number = gas_single(&value) && value.cell->kind == GAS_CELL_NUMBER;
    if (!number)
        check_text(formula, value.rows && value.cell->text ? value.cell->text : "", "a number");
    return number ? value.cell->number : NAN;
}

static const char *text(const char *formula)
{
    struct gas_block value = ask(formula);
    return gas_single(&value) && value.cell->kind == GAS_CELL_TEXT ? value.cell->text : "(no text)";
}

static void items(void)
{
    /* IUPAC 2021: Ar 39.95, N2 28.014; a monatomic gas has cp = 5/2 R (kinetic theory) */
    check_close("M", figure("GAS.CARD(\"Ar\";\"M\")"), 39.95e-3, 1e-4, 0);
    check_close("M in a unit", figure("GAS.CARD(\"N2\";\"M, kg/kmol\")"), 28.014, 1e-5, 0);
    check_close("R", figure("GAS.CARD(\"N2\";\"R, kJ/kg-K\")"), RU / 28.014, 1e-5, 0);
    check_close("cp", figure("GAS.CARD(\"Ar\";\"cp\")"), 2.5 * RU, 1e-5, 0);
    check_close("cp per mass", figure("GAS.CARD(\"Ar\";\"cp, kJ/kg-K\")"), 2.5 * RU / 39.95, 1e-4, 0);
    check_close("gamma", figure("GAS.CARD(\"Ar\";\"gamma\")"), 5. / 3, 1e-5, 0);
    /* Span et al., J. Phys. Chem. Ref. Data 29 (2000) 1361: Tc 126.192 K, pc 3.3958 MPa, omega 0.0372 (from memory) */
    check_close("Tc", figure("GAS.CARD(\"N2\";\"Tc\")"), 126.192, 1e-3, 0);
    check_close("Pc", figure("GAS.CARD(\"N2\";\"Pc, MPa\")"), 3.3958, 5e-3, 0);
    check_close("omega", figure("GAS.CARD(\"N2\";\"omega\")"), 0.0372, 0, 0.003);
    check_close("from", figure("GAS.CARD(\"N2\";\"from, °C\")"), 200 - 273.15, 1e-12, 0);
    check_text("formula", text("GAS.CARD(\"nitrogen\";\"formula\")"), "N2");
    check_text("CAS", text("GAS.CARD(\"N2\";\"CAS\")"), "7727-37-9");
    check_contains("source", text("GAS.CARD(\"N2\";\"source\")"), "NASA/TP-2002-211556");
    check_close("x", figure("GAS.CARD(\"N2 79 + O2 21\";\"x N2\")"), 0.79, 1e-14, 0);
    check_close("w", figure("GAS.CARD(\"CO2 40 + N2 60 wt%\";\"w CO2\")"), 0.4, 1e-14, 0);
    check_contains("unknown item", text("GAS.CARD(\"N2\";\"colour\")"), "Check item");
    check_contains("wrong unit", text("GAS.CARD(\"N2\";\"M, kJ\")"), "Check item");
    check_contains("wrong gas", text("GAS.CARD(\"nitrogn\")"), "nitrogen (N2)");
    check_contains("bad item", text("GAS.CARD(\"N2\";{1;2})"), "Check item");
}

static const struct gas_cell *value_of(const struct gas_block *card, const char *label, const char *unit)
{
    for (size_t row = 1; row < card->rows; row++)
        if (strcmp(gas_cell_at(card, row, 0)->text, label) == 0 &&
            (!unit || strcmp(gas_cell_at(card, row, 2)->text, unit) == 0))
            return gas_cell_at(card, row, 1);
    static const struct gas_cell none = {.kind = GAS_CELL_EMPTY};
    return &none;
}

static void cards(void)
{
    struct gas_block card = ask("GAS.CARD(\"CO2 40 + N2 60 wt%\")");
    check_int("columns", (long)card.columns, 4);
    check_text("heading", card.cell[3].text, "source");
    /* by hand with M 44.009 and 28.014 */
    double x = 40 / 44.009 / (40 / 44.009 + 60 / 28.014);
    check_close("mol %", value_of(&card, "x carbon dioxide", "mol %")->number, 100 * x, 1e-5, 0);
    check_close("wt %", value_of(&card, "w carbon dioxide", "wt %")->number, 40, 1e-13, 0);
    check_close("wt %", value_of(&card, "w nitrogen", "wt %")->number, 60, 1e-13, 0);
    card = ask("GAS.CARD(\"N2 | k = 1.4\")");
    check_text("rule", value_of(&card, "rule", NULL)->text, "k = 1.4");
    check_close("gamma", value_of(&card, "gamma at 25 °C", NULL)->number, 1.4, 1e-14, 0);
    for (size_t i = 0; i < card.rows * card.columns; i++)
        check_true("every cell is filled", card.cell[i].kind == GAS_CELL_NUMBER || card.cell[i].kind == GAS_CELL_TEXT);
    /* the function takes a typed card like any other gas */
    check_close("card in, card out",
                figure("GAS.CARD({\"name\";\"N2\";\"\"|\"M\";28.0134;\"g/mol\"|\"k\";1.4;\"\"};\"M\")"), 28.0134e-3,
                1e-14, 0);
}

static void lists(void)
{
    struct gas_block list = ask("GAS.LIST()");
    check_true("all gases", list.rows > 100 && list.columns == 5);
    list = ask("GAS.LIST(\"element He\")");
    check_int("helium alone has helium", (long)list.rows, 2);
    check_text("helium", gas_cell_at(&list, 1, 0)->text, "helium");
    check_close("M", gas_cell_at(&list, 1, 3)->number, 4.0026, 1e-5, 0);
    list = ask("GAS.LIST(\"7727-37-9\")");
    check_text("by CAS", gas_cell_at(&list, 1, 1)->text, "N2");
    check_text("range", gas_cell_at(&list, 1, 4)->text, "200 to 20000 K");
    list = ask("GAS.LIST(\"elements C F\")");
    bool all = list.rows > 3;
    for (size_t row = 1; row < list.rows; row++)
        all = all && strchr(gas_cell_at(&list, row, 1)->text, 'C') && strchr(gas_cell_at(&list, row, 1)->text, 'F');
    check_true("carbon and fluorine", all);
    list = ask("GAS.LIST(\"buten\")");
    check_true("part of a name", list.rows >= 4);
    check_contains("nothing", text("GAS.LIST(\"nitrogn\")"), "nitrogen (N2)");
    check_contains("number", text("GAS.LIST(5)"), "Check search");
}

const struct test_suite suite_gases_fn = {
    "gases_fn", (const struct test_case[]){{"items", items}, {"cards", cards}, {"lists", lists}, {0}}};
