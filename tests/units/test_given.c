/* Items of typed texts. Meanings are common practice; figures are those of the text. */
#include <math.h>
#include <string.h>

#include <gasleaf/heading.h>

#include "check.h"

#define COUNT(table) (sizeof(table) / sizeof *(table))

static void items_are_understood(void)
{
    static const struct {
        const char *text;
        enum gas_symbol symbol;
        int state;
        double figure;
        const char *unit, *heading;
    } rows[] = {
        {"P1 = 1 bar", GAS_SYM_P, 1, 1, "bar", "P1, bar"},
        {"P1=1bar", GAS_SYM_P, 1, 1, "bar", "P1, bar"},
        {"7 bar(g)", GAS_SYM_P, 0, 7, "bar(g)", "bar(g)"},
        {"7bar(g)", GAS_SYM_P, 0, 7, "bar(g)", "bar(g)"},
        {" 35 °C ", GAS_SYM_T, 0, 35, "°C", "°C"},
        {"12 m3", GAS_SYM_V, 0, 12, "m3", "m3"},
        {"V = 2 m3", GAS_SYM_V, 0, 2, "m3", "V, m3"},
        {"V = 7,5 L", GAS_SYM_V, 0, 7.5, "L", "V, L"},
        {"T1: 25 degC", GAS_SYM_T, 1, 25, "degC", "T1, degC"},
        {"T2 = -20 °C", GAS_SYM_T, 2, -20, "°C", "T2, °C"},
        {"T2 = −20 °C", GAS_SYM_T, 2, -20, "°C", "T2, °C"},
        {"P1, bar = 3", GAS_SYM_P, 1, 3, "bar", "P1, bar"},
        {"P1 [bar(g)] = 3", GAS_SYM_P, 1, 3, "bar(g)", "P1 [bar(g)]"},
        {"P1 = 300000", GAS_SYM_P, 1, 300000, "Pa", "P1"},
        {"P1 8 bar", GAS_SYM_P, 1, 8, "bar", "P1, bar"},
        {"inlet pressure 3 bar", GAS_SYM_P, 1, 3, "bar", "inlet pressure, bar"},
        {"inlet pressure = 3 psig", GAS_SYM_P, 1, 3, "psig", "inlet pressure, psig"},
        {"gauge pressure = 3 bar", GAS_SYM_P, 0, 3, "bar(g)", "gauge pressure, bar(g)"},
        {"k = 1.4", GAS_SYM_GAMMA, 0, 1.4, "1", "k"},
        {"n = 1.3", GAS_SYM_N, 0, 1.3, "mol", "n"},
        {"n = 3 kmol", GAS_SYM_N, 0, 3, "kmol", "n, kmol"},
        {"efficiency = 78 %", GAS_SYM_EFFICIENCY, 0, 78, "%", "efficiency, %"},
        {"efficiency 78%", GAS_SYM_EFFICIENCY, 0, 78, "%", "efficiency, %"},
        {"Q = -2.5e3 kJ", GAS_SYM_Q, 0, -2500, "kJ", "Q, kJ"},
        {"50 kJ", GAS_SYM_NONE, 0, 50, "kJ", "kJ"},
        {"W by gas = 3 kJ", GAS_SYM_W, 0, 3, "kJ", "W by gas, kJ"},
        {"100 Nm3/h", GAS_SYM_N, 0, 100, "Nm3/h", "Nm3/h"},
        {"V = 100 Nm3", GAS_SYM_N, 0, 100, "Nm3", "V, Nm3"},
        {"5 m3@20°C,1atm", GAS_SYM_N, 0, 5, "m3@20°C,1atm", "m3@20°C,1atm"},
        {"P line = 200 bar(g)", GAS_SYM_P_LINE, 0, 200, "bar(g)", "P line, bar(g)"},
        {"T in = 5 °C", GAS_SYM_T, 1, 5, "°C", "T in, °C"},
        {"cp = 1.04 kJ/kg-K", GAS_SYM_CP, 0, 1.04, "kJ/kg-K", "cp, kJ/kg-K"},
        {"barometer 0.98 bar", GAS_SYM_BAROMETER, 0, 0.98, "bar", "barometer, bar"},
        {"m3 = 5 kg", GAS_SYM_M, 3, 5, "kg", "m3, kg"},
        {"3 stages", GAS_SYM_NONE, 0, NAN, NULL, NULL},
    };
    for (size_t i = 0; i < COUNT(rows); i++) {
        struct gas_heading heading;
        struct gas_heading_fault fault = {.status = GAS_HEADING_OK};
        double figure = NAN;
        bool good = gas_given_parse(rows[i].text, strlen(rows[i].text), NULL, &heading, &figure, &fault);
        if (!check_int(rows[i].text, good, rows[i].unit != NULL) || !good)
            continue;
        check_text(rows[i].text, gas_symbol_text(heading.symbol), gas_symbol_text(rows[i].symbol));
        check_int(rows[i].text, heading.state, rows[i].state);
        check_close(rows[i].text, figure, rows[i].figure, 0.0, 0.0);
        check_text(rows[i].text, heading.unit.text, rows[i].unit);
        check_text(rows[i].text, heading.text, rows[i].heading);
    }
}

static void items_become_SI(void)
{
    struct gas_heading heading;
    struct gas_heading_fault fault;
    double figure;
    check_true("7 bar(g)", gas_given_parse("7 bar(g)", 8, NULL, &heading, &figure, &fault));
    check_close("7 bar(g)", gas_unit_to_si(&heading.unit, figure, 101325.0), 801325.0, 1e-15, 0.0);
    check_true("gauge", gas_given_parse("gauge pressure = 3 bar", 22, NULL, &heading, &figure, &fault));
    check_close("gauge", gas_unit_to_si(&heading.unit, figure, 98000.0), 398000.0, 1e-15, 0.0);
    check_true("-40 °F", gas_given_parse("T1 = -40 °F", strlen("T1 = -40 °F"), NULL, &heading, &figure, &fault));
    check_close("-40 °F", gas_unit_to_si(&heading.unit, figure, 0.0), 233.15, 1e-15, 0.0);
}

static void what_is_not_an_item_is_refused(void)
{
    static const struct {
        const char *text;
        enum gas_heading_status status;
        const char *hint;
    } rows[] = {
        {"", GAS_HEADING_EMPTY, "7 bar(g)"},
        {"7", GAS_HEADING_UNKNOWN, "unit or a symbol"},
        {"P1 =", GAS_HEADING_UNKNOWN, "no figure"},
        {"P1 = bar", GAS_HEADING_UNKNOWN, "no figure"},
        {"P1", GAS_HEADING_UNKNOWN, "no figure"},
        {"= 3 bar", GAS_HEADING_OK, ""},
        {"1 234 kg", GAS_HEADING_UNKNOWN, "between groups of digits"},
        {"P1 = 1,234.5 bar", GAS_HEADING_UNKNOWN, "between groups of digits"},
        {"foo = 3 bar", GAS_HEADING_UNKNOWN, ""},
        {"5 kPaf", GAS_HEADING_UNIT, "kPa"},
        {"5 ton", GAS_HEADING_UNIT, "short ton"},
        {"P1 = 3 bar bar2", GAS_HEADING_CONTRADICTION, ""},
        {"P1 = 2 kg", GAS_HEADING_CONTRADICTION, "P1 is a pressure, kg is a mass"},
        {"P1, bar = 3 kPa", GAS_HEADING_CONTRADICTION, "two units"},
        {"3 mm", GAS_HEADING_UNKNOWN, "length"},
        {"P0 = 3 bar", GAS_HEADING_STATE, "1 to 9"},
    };
    for (size_t i = 0; i < COUNT(rows); i++) {
        struct gas_heading heading;
        struct gas_heading_fault fault = {.status = GAS_HEADING_OK};
        double figure;
        bool good = gas_given_parse(rows[i].text, strlen(rows[i].text), NULL, &heading, &figure, &fault);
        check_int(rows[i].text, good, rows[i].status == GAS_HEADING_OK);
        check_int(rows[i].text, fault.status, rows[i].status);
        check_contains(rows[i].text, fault.hint, rows[i].hint);
    }
}

const struct test_suite suite_given = {"given", (const struct test_case[]){{"understood", items_are_understood},
                                                                           {"SI", items_become_SI},
                                                                           {"refused", what_is_not_an_item_is_refused},
                                                                           {0}}};
