/*
 * Mixing on cells. Expected figures are arithmetic written out beside the row for gases of constant heat capacity, or
 * published examples, or refusals read against the rules for sentences. R as in the SI of 2019; atomic weights IUPAC
 * 2021.
 */
#include <math.h>

#include "check.h"
#include "formula.h"
#include "formula_rows.h"

#define R 8.31446261815324

/* clang-format off */
static void arithmetic(void)
{
    const double n1 = 5e5 / (R * 293.15), n2 = 2e5 / (R * 293.15); /* 1 m3 each */
    const double half = 1e5 / (R * 293.15); /* mol in 1 m3 at 1 bar */
    const struct formula_row rows[] = {
        {"T", "GAS.MIX({\"gas\";\"P, bar\";\"T, K\";\"n, mol\"|\"Ar\";1;300;1|\"He\";1;400;3};\"T, K\")", 375, NULL},
        {"vessel-P", "GAS.MIX({\"gas\";\"P, bar\";\"T, K\";\"n, mol\"|\"Ar\";1;300;1|\"He\";2;400;3};\"P, bar\")", 4 * 375 / (300.0 + 3 * 400 / 2.0), NULL},
        {"vessel-V", "GAS.MIX({\"gas\";\"P, bar\";\"T, K\";\"n, mol\"|\"Ar\";1;300;1|\"He\";2;400;3};\"V, m3\")", R * (300 + 600) / 1e5, NULL},
        {"stream-P", "GAS.MIX({\"gas\";\"P, bar\";\"T, K\";\"n, mol/s\"|\"Ar\";1;300;1|\"He\";2;400;3};\"P, bar\")", 1, NULL},
        {"outlet", "GAS.MIX({\"gas\";\"P, bar\";\"T, K\";\"n, mol/s\"|\"Ar\";1;300;1|\"He\";2;400;3};\"P, bar\";\"outlet 0.5 bar\")", 0.5, NULL},
        {"mass", "GAS.MIX({\"gas\";\"P, bar\";\"T, K\";\"n, mol\"|\"Ar\";1;300;1|\"He\";2;400;3};\"m, g\")", 39.95 + 3 * 4.002602, NULL},
        {"M", "GAS.MIX({\"gas\";\"P, bar\";\"T, K\";\"n, mol\"|\"Ar\";1;300;1|\"He\";2;400;3};\"M, g/mol\")", (39.95 + 3 * 4.002602) / 4, NULL},
        {"evacuated-P", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"V, m3\"|\"N2\";5;20;1|\"N2\";0;\"\";1};\"P, bar\")", 2.5, NULL},
        {"evacuated-S", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"V, m3\"|\"N2\";5;20;1|\"N2\";0;\"\";1};\"S made, J/K\")", n1 * R * log(2), NULL},
        /* same gas, P 5 and 2 bar in 1 m3 each at one temperature: to 3.5 bar */
        {"same-S", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"V, m3\"|\"N2\";5;20;1|\"N2\";2;20;1};\"S made, J/K\")", R * (n1 * log(5 / 3.5) + n2 * log(2 / 3.5)), NULL},
        {"unlike-S", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"V, m3\"|\"N2\";1;20;1|\"Ar\";1;20;1};\"S made, J/K\")", 2 * half * R * log(2), NULL},
        {"nothing-S", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"V, m3\"|\"N2 79 + O2 21\";1;20;1|\"O2 21 + N2 79\";1;20;1};\"S made, J/K\")", 0, NULL},
        /* N2 50 + O2 50 with as much N2: y = 0.75, 0.25; from partial pressures 0.5, 0.5 and 1 bar */
        {"shared-S", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"V, m3\"|\"N2 50 + O2 50\";1;20;1|\"N2\";1;20;1};\"S made, J/K\")", half * R * (0.5 * log(0.5 / 0.75) + 0.5 * log(0.5 / 0.25) + log(1 / 0.75)), NULL},
        {"zero-flow", "GAS.MIX({\"gas\";\"P, bar\";\"T, K\";\"n, mol/s\"|\"Ar\";1;300;1|\"He\";\"\";\"\";0};\"T, K\")", 300, NULL},
        {"blank-row", "GAS.MIX({\"gas\";\"P, bar\";\"T, K\";\"n, mol/s\"|\"Ar\";1;300;1|\"\";\"\";\"\";\"\"};\"T, K\")", 300, NULL},
        {"labels", "GAS.MIX({\"stream\";\"gas\";\"P, bar\";\"T, K\";\"n, mol\"|\"one\";\"Ar\";1;300;1|\"two\";\"He\";1;400;3};\"T, K\")", 375, NULL},
        {"gas-last", "GAS.MIX({\"P, bar\";\"T, K\";\"n, mol\";\"Gas\"|1;300;1;\"Ar\"|1;400;3;\"He\"};\"T, K\")", 375, NULL},
        {"gauge", "GAS.MIX({\"gas\";\"P, bar(g)\";\"T, K\";\"V, m3\"|\"Ar\";0;300;1|\"Ar\";1;300;1};\"P, bar(g)\";\"barometer 0.95 bar\")", 0.5, NULL},
    };
    check_formula_rows(rows, sizeof rows / sizeof *rows, 1e-9);
}

/* Cengel & Boles, Thermodynamics: An Engineering Approach, Ex. 13-3: 4 kg N2 at 20 degC, 150 kPa and 7 kg O2 at 40 degC, 100 kPa in insulated
 * tanks, cv 0.743 and 0.658 kJ/(kg K): 32.2 degC, 114.5 kPa; from memory. cp = cv + R/M.
 * Rajput, Engineering Thermodynamics, 3rd ed., Ex. 9.12: N2, 0.6 kmol at 16 bar, 55 degC and 3 kg at 6.4 bar, 25 degC, gamma 1.4: what the givens
 * evaluate to, 50.5 degC and 13.2 bar. */
static void published(void)
{
    const struct formula_row rows[] = {
        {"13-3-T", "GAS.MIX({\"gas\";\"P, kPa\";\"T, °C\";\"m, kg\"|\"N2 | cp = 1.0398 kJ/kg-K\";150;20;4|\"O2 | cp = 0.9178 kJ/kg-K\";100;40;7};\"T, °C\")", 32.2, NULL},
        {"13-3-P", "GAS.MIX({\"gas\";\"P, kPa\";\"T, °C\";\"m, kg\"|\"N2 | cp = 1.0398 kJ/kg-K\";150;20;4|\"O2 | cp = 0.9178 kJ/kg-K\";100;40;7};\"P, kPa\")", 114.5, NULL},
        {"9.12-T", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"n, kmol\";\"m, kg\"|\"N2 | k = 1.4\";16;55;0.6;\"\"|\"N2 | k = 1.4\";6.4;25;\"\";3};\"T, °C\")", 50.5, NULL},
        {"9.12-P", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"n, kmol\";\"m, kg\"|\"N2 | k = 1.4\";16;55;0.6;\"\"|\"N2 | k = 1.4\";6.4;25;\"\";3};\"P, bar\")", 13.2, NULL},
    };
    check_formula_rows(rows, sizeof rows / sizeof *rows, 2.5e-3); /* three figures */
}

/* Air with as much nitrogen: the oxygen of the card is half of that of air (US Standard Atmosphere 1976: 20.9476 %). */
static void card(void)
{
    struct gas_arena arena = {0};
    struct gas_block t = {0};
    double mol = 0, wt = 0, oxygen = NAN;
    if (check_true("card", formula_evaluate("GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"V, Nm3/h\"|\"air\";1;20;100|\"N2\";2;20;100})", &arena, &t)) && check_true("lines", t.rows > 12)) {
        for (size_t i = 8; i + 1 < t.rows; i++) {
            const char *label = gas_cell_at(&t, i, 0)->text;
            bool molar = gas_cell_at(&t, i, 2)->text[0] == 'm';
            *(molar ? &mol : &wt) += gas_cell_at(&t, i, 1)->number;
            if (molar && label[0] == 'o')
                oxygen = gas_cell_at(&t, i, 1)->number;
        }
        check_close("mol % add up", mol, 100, 1e-12, 0);
        check_close("wt % add up", wt, 100, 1e-12, 0);
        check_close("oxygen", oxygen, 20.9476 / 2, 1e-4, 0); /* the traces of air are scaled in */
        check_text("flow as given", gas_cell_at(&t, 3, 2)->text, "Nm3/h");
        check_close("flow", gas_cell_at(&t, 3, 1)->number, 200, 1e-12, 0);
        check_text("a gas to type", gas_cell_at(&t, t.rows - 1, 0)->text, "gas");
        check_contains("a gas to type", gas_cell_at(&t, t.rows - 1, 1)->text, "nitrogen 89.");
    }
    gas_arena_free(&arena);
}

static void refusals(void)
{
    const struct formula_row rows[] = {
        {"none", "GAS.MIX()", 0, "Check streams: the range needs a heading row"},
        {"no-heading", "GAS.MIX({\"N2\";1;20|\"N2\";1;20})", 0, "Check streams: the range needs a heading row"},
        {"only-gases", "GAS.MIX({\"gas\"|\"N2\"})", 0, "Check streams: only gases are given"},
        {"no-amount", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\"|\"N2\";1;20})", 0, "how much of each is missing"},
        {"unknown-gas", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\"|\"N2\";1;20;1|\"unobtainium\";1;20;1})", 0, "Check row 2, gas: \"unobtainium\""},
        {"no-gas", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\"|\"N2\";1;20;1|\"\";1;20;1})", 0, "Check row 2, gas: it is missing"},
        {"negative", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\"|\"N2\";1;20;1|\"N2\";1;20;-1})", 0, "Check row 2, m: -1 kg"},
        {"absolute-zero", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\"|\"N2\";1;-300;1})", 0, "Check row 1, T: -300 °C is below absolute zero"},
        {"cold", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\"|\"N2\";1;20;1|\"N2\";1;-100;1})", 0, "Check row 2, T: -100 °C is outside the data for nitrogen"},
        {"no-P", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\"|\"N2\";1;20;1|\"N2\";\"\";20;1})", 0, "Check row 2, given: P cannot be found"},
        {"evacuated-no-V", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\"|\"N2\";0;20;1|\"N2\";1;20;1})", 0, "Check row 1, V: an evacuated vessel needs its volume"},
        {"all-zero", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\"|\"N2\";1;20;0|\"N2\";1;20;0})", 0, "every amount is zero"},
        {"all-blank", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\"|\"\";\"\";\"\";\"\"})", 0, "all rows are blank"},
        {"mixed", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\";\"n, mol/s\"|\"N2\";1;20;1;1})", 0, "both per time or both as totals"},
        {"disagree", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\";\"V, L\"|\"N2\";1;20;1;1})", 0, "Check row 1, given: m is given as 1 kg"},
        {"numbered", "GAS.MIX({\"gas\";\"P1, bar\";\"T, °C\";\"m, kg\"|\"N2\";1;20;1})", 0, "is not taken by GAS.MIX"},
        {"outlet-too-high", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg/h\"|\"N2\";1;20;1|\"N2\";2;20;2};\"T, K\";\"outlet 1.99 bar\")", 0, "the outlet pressure is too high"},
        {"outlet-shared", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg/h\"|\"air\";1;20;2|\"N2\";2;20;1};\"T, K\";\"outlet 1.5 bar\")", 0, "the outlet pressure is too high"},
        {"outlet-vessels", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\"|\"N2\";1;20;1};\"T, K\";\"outlet 1 bar\")", 0, "outlet is for streams"},
        {"outlet-unit", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg/h\"|\"N2\";1;20;1};\"T, K\";\"outlet 1 kg\")", 0, "Check options"},
        {"other-option", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\"|\"N2\";1;20;1};\"T, K\";\"isothermal\")", 0, "Check options: isothermal"},
        {"other-wanted", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\"|\"N2\";1;20;1};\"W, kJ\")", 0, "mixing gives T, P, n"},
        {"rate-of-vessels", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\"|\"N2\";1;20;1};\"m, kg/h\")", 0, "Check wanted"},
        {"passed-on", "GAS.MIX({\"gas\";\"P, bar\";\"T, °C\";\"m, kg\"|\"N2\";\"Check x: from elsewhere.\";20;1};\"T, K\")", 0, "Check x: from elsewhere."},
    };
    check_formula_rows(rows, sizeof rows / sizeof *rows, 0);
}
/* clang-format on */

const struct test_suite suite_mix_fn = {
    "mix_fn", (const struct test_case[]){
                  {"arithmetic", arithmetic}, {"published", published}, {"card", card}, {"refusals", refusals}, {0}}};
