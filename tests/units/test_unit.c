/* Units: every row of the table against GNU units, the printed factors of NIST SP 811, spellings, refusals, noise. */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <unistd.h>

#include <gasleaf/gas.h>
#include <gasleaf/unit.h>

#include "check.h"
#include "units/units.h"

#include "gnu_rows.h"
#include "spelling_rows.h"

#define COUNT(table) (sizeof(table) / sizeof *(table))

static bool parse(const char *text, struct gas_unit *unit)
{
    struct gas_unit_fault fault = {.status = GAS_UNIT_OK};
    bool good = gas_unit_parse(text, strlen(text), NULL, unit, &fault);
    if (!good)
        check_text(text, fault.hint, "(a unit)");
    return good;
}

/* One run of GNU units for the whole table: -t prints one bare figure a pair. */
static void gnu_units_agree(void)
{
    char name[] = "/tmp/gasleafXXXXXX", command[100], line[200];
    int file = mkstemp(name);
    FILE *pairs = file >= 0 ? fdopen(file, "w") : NULL;
    if (!check_true("a place for the pairs", pairs != NULL))
        return;
    for (size_t i = 0; i < COUNT(gnu_rows); i++)
        fprintf(pairs, "%s\n%s\n", gnu_rows[i].gnu, gnu_rows[i].base);
    fclose(pairs);
    snprintf(command, sizeof command, "LC_ALL=C units -t -o %%.17g < %s 2>&1", name);
    FILE *answers = popen(command, "r");
    for (size_t i = 0; i < COUNT(gnu_rows); i++) {
        const struct gnu_row *row = &gnu_rows[i];
        struct gas_unit unit;
        char *end = line;
        bool there = answers && fgets(line, sizeof line, answers);
        double factor = there ? strtod(line, &end) : NAN;
        if (check_true(row->gnu, there && end != line && (*end == '\n' || *end == '\0')) && parse(row->ours, &unit))
            check_close(row->ours, unit.scale, factor, 1e-12, 0.0);
    }
    if (answers)
        check_int("GNU units ran", pclose(answers), 0);
    remove(name);
}

/* A row or a prefix added to the table without a row above fails here. */
static void every_row_is_compared(void)
{
    for (size_t i = 0; i < gas_trade_unit_count; i++) {
        const struct trade_unit *row = &gas_trade_units[i];
        for (size_t p = 0; p <= strlen(row->prefixes) && row->kind != UNIT_AMBIGUOUS; p++) {
            char prefix = p == 0 ? 0 : row->prefixes[p - 1], id[100];
            bool found = false;
            for (size_t k = 0; k < COUNT(gnu_rows) && !found; k++) {
                struct unit_product product;
                char plain[PLAIN_TEXT];
                found = gas_spelling_plain(gnu_rows[k].ours, strlen(gnu_rows[k].ours), plain, NULL) &&
                        gas_product_parse(plain, &product, NULL) && product.count == 1 &&
                        product.factor[0].name.unit == row &&
                        (product.factor[0].name.prefix ? product.factor[0].name.prefix->symbol[0] : 0) == prefix;
            }
            snprintf(id, sizeof id, "%c %.60s is compared with GNU units", prefix ? prefix : ' ', row->names);
            if (strcmp(row->symbol, "cal_it") != 0 || prefix == 0 ||
                prefix == 'k') /* Mcal(IT), Gcal(IT): same prefix */
                check_true(id, found);
        }
        check_true(row->names, row->source[0] != '\0');
    }
}

/* Printed digits of NIST Special Publication 811, 2008 edition, Appendix B. */
static void printed_factors_agree(void)
{
    static const struct {
        const char *unit;
        double printed;
    } rows[] = {
        {"bar", 1.0e5},          {"atm", 1.01325e5},       {"at", 9.80665e4},
        {"torr", 1.333224e2},    {"mmHg", 1.333224e2},     {"cmHg", 1.333224e3},
        {"inHg", 3.386389e3},    {"mmH2O", 9.80665},       {"cmH2O", 98.0665},
        {"inH2O", 2.490889e2},   {"ftH2O", 2.989067e3},    {"psi", 6.894757e3},
        {"psf", 47.88026},       {"ksi", 6.894757e6},      {"dyn/cm2", 0.1},
        {"cal", 4.184},          {"cal(IT)", 4.1868},      {"Btu", 1.055056e3},
        {"Btu(th)", 1.054350e3}, {"therm(EC)", 1.05506e8}, {"therm(US)", 1.054804e8},
        {"kW h", 3.6e6},         {"ft lbf", 1.355818},     {"erg", 1e-7},
        {"kgf m", 9.80665},      {"hp", 7.456999e2},       {"PS", 7.354988e2},
        {"hp(electric)", 746},   {"hp(boiler)", 9.8095e3}, {"TR", 3.516853e3},
        {"Btu/h", 0.2930711},    {"Btu/s", 1.055056e3},    {"ft lbf/min", 2.259697e-2},
        {"in", 2.54e-2},         {"ft", 0.3048},           {"yd", 0.9144},
        {"mile", 1609.344},      {"lb", 0.4535924},        {"oz", 2.834952e-2},
        {"grain", 6.479891e-5},  {"slug", 14.5939},        {"short ton", 907.1847},
        {"long ton", 1016.047},  {"ft3", 2.831685e-2},     {"in3", 1.638706e-5},
        {"gal", 3.785412e-3},    {"Imp gal", 4.54609e-3},  {"bbl", 0.1589873},
        {"lbf", 4.448222},       {"kgf", 9.80665},         {"Btu/lb", 2326},
        {"Btu/lb-F", 4186.8},    {"lb/ft3", 16.01846},     {"lb/gal", 119.8264},
        {"cfm", 4.719474e-4},    {"lb/h", 1.259979e-4},
    };
    for (size_t i = 0; i < COUNT(rows); i++) {
        struct gas_unit unit;
        if (parse(rows[i].unit, &unit)) /* half a unit of the seventh digit; 1.0 E+03 rows with six digits: 5e-6 */
            check_close(rows[i].unit, unit.scale, rows[i].printed, strncmp(rows[i].unit, "therm", 5) ? 5e-7 : 5e-6, 0);
    }
}

static void spellings_are_understood(void)
{
    check_true("two hundred spellings", COUNT(spelling_rows) >= 200);
    for (size_t i = 0; i < COUNT(spelling_rows); i++) {
        const struct spelling_row *row = &spelling_rows[i];
        struct gas_unit unit;
        if (!parse(row->text, &unit))
            continue;
        check_close(row->text, unit.scale, row->scale, 4e-15, 0.0);
        check_close(row->text, unit.offset, row->offset, 0.0, 0.0);
        check_text(row->text, gas_dimension_words(unit.dimension), gas_dimension_words(row->dimension));
        check_int(row->text, unit.basis, row->basis);
        check_text(row->text, unit.text, row->text);
        bool amount = unit.dimension == GAS_DIM_AMOUNT || unit.dimension == GAS_DIM_AMOUNT_FLOW;
        check_int(row->text, unit.reference_volume, amount && !strstr(row->text, "mol") && !strstr(row->text, "MOL"));
    }
}

static void what_is_not_a_unit_is_refused(void)
{
    static const struct {
        const char *text;
        enum gas_unit_status status;
        const char *at, *hint; /* parts that must appear */
    } rows[] = {
        {"", GAS_UNIT_EMPTY, "", ""},
        {"  ", GAS_UNIT_EMPTY, "", ""},
        {"kPaf", GAS_UNIT_UNKNOWN, "kPaf", "kPa"},
        {"barr", GAS_UNIT_UNKNOWN, "barr", "bar"},
        {"kJ/kgg", GAS_UNIT_UNKNOWN, "kgg", "kg"},
        {"kJ/furlong", GAS_UNIT_UNKNOWN, "furlong", ""},
        {"xyzzy", GAS_UNIT_UNKNOWN, "xyzzy", "write one such as"},
        {"Mbar", GAS_UNIT_UNKNOWN, "Mbar", "mbar"}, /* not quietly a millibar */
        {"Mmol", GAS_UNIT_UNKNOWN, "Mmol", "mmol"},
        {"k", GAS_UNIT_UNKNOWN, "k", "K"},
        {"c", GAS_UNIT_UNKNOWN, "c", "C"},
        {"poise", GAS_UNIT_UNKNOWN, "poise", ""}, /* P is a pressure in a heading, never poise */
        {"P", GAS_UNIT_UNKNOWN, "P", ""},
        {"A", GAS_UNIT_UNKNOWN, "A", ""},
        {"€/kg", GAS_UNIT_UNKNOWN, "€", ""},
        {"bar\xff", GAS_UNIT_UNKNOWN, "?", ""},
        {"kg//h", GAS_UNIT_SYNTAX, "/", "expected"},
        {"kg/", GAS_UNIT_SYNTAX, "", "too early"},
        {"/h", GAS_UNIT_SYNTAX, "/", "expected"},
        {"kJ/(kg K", GAS_UNIT_SYNTAX, "(kg K", "not closed"},
        {"kg/h)", GAS_UNIT_SYNTAX, ")", "not opened"},
        {"()", GAS_UNIT_SYNTAX, ")", "expected"},
        {"m0", GAS_UNIT_SYNTAX, "0", "whole number"},
        {"m^0.5", GAS_UNIT_SYNTAX, "", "whole number"},
        {"m^x", GAS_UNIT_SYNTAX, "", "whole number"},
        {"m13", GAS_UNIT_SYNTAX, "13", "12"},
        {"kg 2", GAS_UNIT_SYNTAX, "2", ""},
        {"J/kg K-1", GAS_UNIT_SYNTAX, "-1", "below the line"},
        {"cubic kg", GAS_UNIT_SYNTAX, "", "length"},
        {"m3(g)", GAS_UNIT_SYNTAX, "(g)", "pressure"},
        {"kg gauge", GAS_UNIT_SYNTAX, "gauge", "pressure"},
        {"kg abs", GAS_UNIT_SYNTAX, "abs", "pressure"},
        {"standard", GAS_UNIT_AMBIGUOUS, "standard", "Nm3"},
        {"normal", GAS_UNIT_AMBIGUOUS, "normal", "Sm3"},
        {"m3 standard", GAS_UNIT_AMBIGUOUS, "standard", "scf"},
        {"m3/h std", GAS_UNIT_AMBIGUOUS, "std", "m3@20"},
        {"m3 (STP)", GAS_UNIT_AMBIGUOUS, "STP", "Nm3"},
        {"slpm", GAS_UNIT_AMBIGUOUS, "slpm", "NL"},
        {"SLPM", GAS_UNIT_AMBIGUOUS, "SLPM", "NL"},
        {"sccm", GAS_UNIT_AMBIGUOUS, "sccm", "makers"},
        {"ton", GAS_UNIT_AMBIGUOUS, "ton", "short ton"},
        {"tons/d", GAS_UNIT_AMBIGUOUS, "tons", "long ton"},
        {"mpa", GAS_UNIT_AMBIGUOUS, "mpa", "mPa or MPa"},
        {"mj", GAS_UNIT_AMBIGUOUS, "mj", "mJ or MJ"},
        {"mw", GAS_UNIT_AMBIGUOUS, "mw", "mW or MW"},
        {"MBtu", GAS_UNIT_AMBIGUOUS, "MBtu", "MMBtu"},
        {"Mcf", GAS_UNIT_AMBIGUOUS, "Mcf", "Mscf"},
        {"Cal", GAS_UNIT_AMBIGUOUS, "Cal", "kcal"},
        {"gr", GAS_UNIT_AMBIGUOUS, "gr", "grain"},
        {"deg", GAS_UNIT_AMBIGUOUS, "deg", "°C"},
        {"in w.g.", GAS_UNIT_AMBIGUOUS, "", "inH2O(g)"},
        {"psid", GAS_UNIT_AMBIGUOUS, "psid", "difference"},
        {"m3@20°C", GAS_UNIT_REFERENCE, "", "101.325kPa"},
        {"m3@", GAS_UNIT_REFERENCE, "", "101.325kPa"},
        {"m3@20,101.325", GAS_UNIT_REFERENCE, "", ""},
        {"m3@20°C,101.325", GAS_UNIT_REFERENCE, "", "unit"},
        {"m3@20°C,5°C", GAS_UNIT_REFERENCE, "", ""},
        {"m3@20°C,1bar(g)", GAS_UNIT_REFERENCE, "", "absolute"},
        {"m3@20°C,0kPa", GAS_UNIT_REFERENCE, "", ""},
        {"m3@-300°C,1bar", GAS_UNIT_REFERENCE, "", "no reference"},
        {"m3@20°C,101.325bar", GAS_UNIT_REFERENCE, "", ""},
        {"kg@20°C,1bar", GAS_UNIT_REFERENCE, "kg", "volume"},
        {"Nm3@0°C,1atm", GAS_UNIT_REFERENCE, "Nm3", "already"},
        {"m3@20 kg,1bar", GAS_UNIT_REFERENCE, "", ""},
        {"kilograms per hour of something very long indeed", GAS_UNIT_TOO_LONG, "kilo", ""},
    };
    for (size_t i = 0; i < COUNT(rows); i++) {
        struct gas_unit unit;
        struct gas_unit_fault fault = {.status = GAS_UNIT_OK};
        check_true(rows[i].text, !gas_unit_parse(rows[i].text, strlen(rows[i].text), NULL, &unit, &fault));
        check_int(rows[i].text, fault.status, rows[i].status);
        check_contains(rows[i].text, fault.at, rows[i].at);
        check_contains(rows[i].text, fault.hint, rows[i].hint);
    }
}

/* Arithmetic on the definitions: p_abs = p_gauge + barometer; vacuum is below it. */
static void readings_become_SI_and_return(void)
{
    static const struct {
        const char *unit;
        double reading, barometer, si;
    } rows[] = {
        {"bar(g)", 7.0, 101325.0, 801325.0},
        {"bar(g)", -1.01325, 101325.0, 0.0},
        {"bara", 7.0, 98000.0, 700000.0},
        {"psig", 100.0, 101325.0, 689475.7293168361 + 101325.0},
        {"psia", 14.7, 0.0, 14.7 * 6894.757293168361},
        {"kPag", 500.0, 98000.0, 598000.0},
        {"inHg vac", 20.0, 101325.0, 101325.0 - 67727.77280682},
        {"mbar vac", 300.0, 100000.0, 70000.0},
        {"kgf/cm2(g)", 2.0, 101325.0, 297458.0},
        {"°C", 35.0, 101325.0, 308.15},
        {"°C", -273.15, 101325.0, 0.0},
        {"°F", 32.0, 101325.0, 273.15},
        {"°F", 212.0, 101325.0, 373.15},
        {"°F", -40.0, 101325.0, 233.15},
        {"°R", 491.67, 101325.0, 273.15},
        {"m3", 12.0, 101325.0, 12.0},
    };
    for (size_t i = 0; i < COUNT(rows); i++) {
        struct gas_unit unit;
        if (!parse(rows[i].unit, &unit))
            continue;
        double si = gas_unit_to_si(&unit, rows[i].reading, rows[i].barometer);
        check_close(rows[i].unit, si, rows[i].si, 1e-14, 1e-10);
        check_close(rows[i].unit, gas_unit_from_si(&unit, si, rows[i].barometer), rows[i].reading, 1e-13, 1e-12);
        double half = gas_unit_difference_to_si(&unit, 0.5);
        check_close(rows[i].unit, half, 0.5 * unit.scale, 0.0, 0.0);
        check_close(rows[i].unit, gas_unit_difference_from_si(&unit, half), 0.5, 1e-15, 0.0);
    }
}

/* Molar volumes V = R T / P from R of the SI of 2019, worked out in rational arithmetic to 16 digits. */
static void reference_volumes_hold_their_amount(void)
{
    static const struct {
        const char *unit;
        double litres_per_mole, cubic_feet_per_pound_mole;
    } rows[] = {
        {"Nm3", 22.41396954501414, 0},
        {"m3@0°C,100kPa", 22.71095464148557506, 0},
        {"Sm3", 23.64483003622853, 0},
        {"m3@20°C,101.325kPa", 24.05511686663333, 0},
        {"m3@25°C,1bar", 24.78957029602388506, 0},
        {"m3@25 °C, 1 atm", 24.46540369703813, 0},
        {"scf", 0, 379.4827616935966},
        {"ft3@60°F,14.73psi", 0, 378.6068340698639},
        {"ft3@60°F,1atm", 0, 379.4840844261346},
        {"ft3@32°F,1atm", 0, 359.0373502218670},
    };
    for (size_t i = 0; i < COUNT(rows); i++) {
        struct gas_unit unit;
        if (!parse(rows[i].unit, &unit))
            continue;
        double expected = rows[i].litres_per_mole > 0 ? 1000.0 / rows[i].litres_per_mole
                                                      : 453.59237 / rows[i].cubic_feet_per_pound_mole;
        check_close(rows[i].unit, unit.scale, expected, 1e-14, 0.0);
        check_true(rows[i].unit, unit.reference_volume && unit.reference_T > 270.0 && unit.reference_P > 9e4);
    }
}

static void options_redefine_references(void)
{
    struct gas_references other = gas_references_default;
    struct gas_unit unit, again;
    other.normal_T = 293.15;
    other.scf_P = 14.73 * PSI;
    check_true("Nm3", gas_unit_parse("Nm3", 3, &other, &unit, NULL));
    check_close("Nm3 at 20 degC", unit.scale, 101325.0 / (GAS_R * 293.15), 1e-15, 0.0);
    check_true("Nm3", gas_unit_parse("Nm3", 3, NULL, &again, NULL)); /* not the other one out of the cache */
    check_close("Nm3 at 0 degC", again.scale, 101325.0 / (GAS_R * 273.15), 1e-15, 0.0);
    check_true("SCFM", gas_unit_parse("SCFM", 4, &other, &unit, NULL));
    check_close("SCFM at 14.73 psi", unit.scale, 14.73 * PSI / (R_ * 519.67 / 1.8) * FT3 / 60.0, 1e-14, 0.0);
    other.normal_T = 0.0;
    struct gas_unit_fault fault;
    check_true("0 K", !gas_unit_parse("Nm3", 3, &other, &unit, &fault) && fault.status == GAS_UNIT_REFERENCE);
}

static void every_dimension_has_an_SI_unit(void)
{
    for (enum gas_dimension i = 0; i < GAS_DIMENSIONS; i++) {
        struct gas_unit unit = gas_unit_si(i);
        check_int(gas_dimension_words(i), unit.dimension, i);
        check_close(gas_dimension_words(i), unit.scale, 1.0, 0.0, 0.0);
        check_close(gas_dimension_words(i), unit.offset, 0.0, 0.0, 0.0);
        check_text(gas_dimension_words(i), unit.text, gas_dimension_si(i));
    }
}

static void only_like_units_convert(void)
{
    struct gas_unit a, b, c, d;
    check_true("parse", parse("W/(m K)", &a) && parse("Btu/h-ft-F", &b) && parse("W/(m2 K)", &c) && parse("s/m", &d));
    check_true("conductivities", gas_unit_compatible(&a, &b));
    check_true("conductivity and film coefficient", !gas_unit_compatible(&a, &c));
    check_true("a unit and a reciprocal speed", !gas_unit_compatible(&d, &a));
    check_true("parse", parse("m3/kg", &a) && parse("kg/m3", &b) && parse("ft3/lb", &c));
    check_true("a unit and its reciprocal", !gas_unit_compatible(&a, &b) && gas_unit_compatible(&a, &c));
}

/* Anything at all may stand in a cell. */
static void noise_is_survived(void)
{
    static char text[10001];
    static const char *const pieces[] = {"kg",  "/", "(",    ")",   "^",   "3",  "-",  "*",   ".",
                                         " ",   "°", "C",    "m",   "bar", "g",  "@",  ",",   "20",
                                         "kPa", "²", "\xff", "Nm3", "per", "cu", "e9", "std", "\xe2\x84"};
    struct gas_unit unit;
    struct gas_unit_fault fault;
    const size_t many = COUNT(pieces);
    check_seed(20260101);
    for (int i = 0; i < 4000; i++) {
        size_t length = 0;
        while (length < 40 && check_random(0, 1) < 0.9) {
            if (i % 2) {
                text[length++] = (char)check_random(0, 256);
            } else {
                const char *piece = pieces[(size_t)check_random(0, (double)many)];
                while (*piece)
                    text[length++] = *piece++;
            }
        }
        if (gas_unit_parse(text, length, NULL, &unit, &fault))
            check_true("a unit has a size",
                       unit.scale > 0.0 && isfinite(unit.scale) && unit.dimension < GAS_DIMENSIONS);
        else
            check_true("a fault has a status", fault.status != GAS_UNIT_OK && strlen(fault.hint) < sizeof fault.hint);
    }
    memset(text, '(', 10000);
    check_true("10000 parentheses", !gas_unit_parse(text, 10000, NULL, &unit, &fault));
    check_int("10000 parentheses", fault.status, GAS_UNIT_TOO_LONG);
    check_true("40 parentheses", !gas_unit_parse(text, 40, NULL, &unit, &fault));
    check_int("40 parentheses", fault.status, GAS_UNIT_SYNTAX);
    check_true("NUL", !gas_unit_parse("kg\0/h", 5, NULL, &unit, &fault));
    check_true("powers of powers", !gas_unit_parse("((((((m^12)^12)^12)^12)^12)^12)^12", 34, NULL, &unit, &fault));
    check_true("huge", !gas_unit_parse("1e300 MJ^12", 11, NULL, &unit, &fault));
    memset(text, 'a', 10000);
    check_true("10000 letters", !gas_unit_parse(text, 10000, NULL, &unit, &fault));
}

const struct test_suite suite_unit = {"unit",
                                      (const struct test_case[]){{"GNU units", gnu_units_agree},
                                                                 {"coverage", every_row_is_compared},
                                                                 {"SP 811", printed_factors_agree},
                                                                 {"spellings", spellings_are_understood},
                                                                 {"refusals", what_is_not_a_unit_is_refused},
                                                                 {"readings", readings_become_SI_and_return},
                                                                 {"molar volumes", reference_volumes_hold_their_amount},
                                                                 {"references", options_redefine_references},
                                                                 {"SI", every_dimension_has_an_SI_unit},
                                                                 {"compatible", only_like_units_convert},
                                                                 {"noise", noise_is_survived},
                                                                 {0}}};
