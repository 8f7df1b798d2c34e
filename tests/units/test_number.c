/* Numbers as texts, in the C locale and in one with a decimal comma. */
#include <locale.h>
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include <gasleaf/unit.h>

#include "check.h"

#define COUNT(table) (sizeof(table) / sizeof *(table))

static const struct {
    const char *text;
    double number;
    const char *unit; /* what is left */
} good[] = {
    {"7 bar(g)", 7, "bar(g)"},
    {"7.5", 7.5, ""},
    {"7,5 m3", 7.5, "m3"},
    {"-2.5e3kPa", -2500, "kPa"},
    {"12", 12, ""},
    {" 12 ", 12, ""},
    {"+3 K", 3, "K"},
    {"\xe2\x88\x92"
     "20 °C",
     -20, "°C"}, /* typographic minus */
    {"- 5 kg", -5, "kg"},
    {".5 L", 0.5, "L"},
    {",5 L", 0.5, "L"},
    {"5. L", 5, "L"},
    {"1e5 Pa", 1e5, "Pa"},
    {"1E+5Pa", 1e5, "Pa"},
    {"1,5e-3 m3", 1.5e-3, "m3"},
    {"3 ev", 3, "ev"},
    {"3e", 3, "e"},
    {"78%", 78, "%"},
    {"101,325 kPa", 101.325, "kPa"},
    {"20\xc2\xa0°C", 20, "°C"}, /* no-break space */
    {"0", 0, ""},
    {"9007199254740993", 9007199254740992, ""}, /* IEEE 754, round to even */
    {"0.1", 0.1, ""},
    {"2.2250738585072014e-308", 2.2250738585072014e-308, ""},
};

static const char *const bad[] = {"",      " ",    "-",     "+",   ".",        ",",       "bar",
                                  "e5",    "nan",  "inf",   "x10", "1 234",    "1,234.5", "1.234,5",
                                  "1.2.3", "7, 8", "1e999", "--5", "1 000 kg", "\xff",    "\xe2\x88"};

static void read_all(void)
{
    for (size_t i = 0; i < COUNT(good); i++) {
        double number = NAN;
        size_t used = 0;
        check_true(good[i].text, gas_number_parse(good[i].text, strlen(good[i].text), &number, &used));
        check_close(good[i].text, number, good[i].number, 0.0, 0.0);
        check_text(good[i].text, good[i].text + used, good[i].unit);
    }
}

static void numbers_are_read(void)
{
    read_all();
    for (size_t i = 0; i < COUNT(bad); i++) {
        double number;
        size_t used;
        check_true(bad[i], !gas_number_parse(bad[i], strlen(bad[i]), &number, &used));
    }
    char digits[5000];
    double number;
    size_t used;
    memset(digits, '9', sizeof digits);
    check_true("5000 digits", !gas_number_parse(digits, sizeof digits, &number, &used));
    check_true("a number that is cut", gas_number_parse("123456", 3, &number, &used));
    check_close("a number that is cut", number, 123, 0, 0);
}

static const struct {
    double x;
    int digits;
    const char *text;
} shown[] = {
    {105.1398, 5, "105.14"},
    {7, 6, "7"},
    {7.5, 6, "7.5"},
    {0.1, 15, "0.1"},
    {-300, 6, "-300"},
    {123456, 4, "123500"},
    {0, 5, "0"},
    {-0.0, 5, "0"},
    {0.00012345, 3, "0.000123"},
    {1.5e-7, 6, "1.5e-7"},
    {6.02214076e23, 9, "6.02214076e23"},
    {99.9996, 5, "100"},
    {0.99999, 3, "1"},
    {1e5, 6, "100000"},
    {101325, 6, "101325"},
    {-1.26e-9, 2, "-1.3e-9"},
    {NAN, 5, "nan"},
    {INFINITY, 5, "inf"},
    {-INFINITY, 5, "-inf"},
    {1.0 / 3.0, 17, "0.33333333333333331"},
    {2.5, 0, "2"},
    {1e300, 3, "1e300"},
};

static void show_all(void)
{
    for (size_t i = 0; i < COUNT(shown); i++) {
        char text[40];
        gas_number_format(text, sizeof text, shown[i].x, shown[i].digits);
        check_text(shown[i].text, text, shown[i].text);
    }
}

static void numbers_are_shown(void)
{
    show_all();
    char small[4];
    gas_number_format(small, sizeof small, 123456, 6);
    check_text("a buffer that is too small", small, "123");
    gas_number_format(small, 0, 1, 6);
}

/* Seventeen digits name a double: IEEE 754-2008, 5.12.2. */
static void shown_numbers_are_read_back(void)
{
    check_seed(7);
    for (int i = 0; i < 2000; i++) {
        char text[40];
        size_t used;
        double back, x = check_random(-1, 1) * pow(10, check_random(-30, 30));
        gas_number_format(text, sizeof text, x, 17);
        check_true(text, gas_number_parse(text, strlen(text), &back, &used));
        check_close(text, back, x, 0.0, 0.0);
    }
}

/* A locale with a decimal comma: an installed one, or one made for the purpose. */
static bool use_decimal_comma(char folder[])
{
    static const char *const installed[] = {"de_DE.UTF-8", "fr_FR.UTF-8", "nl_NL.UTF-8", "it_IT.UTF-8"};
    for (size_t i = 0; i < COUNT(installed); i++)
        if (setlocale(LC_ALL, installed[i]))
            return true;
    char command[200];
    if (!mkdtemp(folder))
        return false;
    snprintf(command, sizeof command, "localedef -i de_DE -f UTF-8 %s/de_DE.UTF-8", folder);
    return system(command) == 0 && setenv("LOCPATH", folder, 1) == 0 && setlocale(LC_ALL, "de_DE.UTF-8");
}

static void the_locale_changes_nothing(void)
{
    char before[100], folder[] = "/tmp/gasleafXXXXXX", shown_here[20];
    snprintf(before, sizeof before, "%s", setlocale(LC_ALL, NULL));
    check_true("a locale with a decimal comma", use_decimal_comma(folder));
    snprintf(shown_here, sizeof shown_here, "%.1f", 0.5);
    check_text("the locale writes a comma", shown_here, "0,5");
    read_all();
    show_all();
    struct gas_unit unit; /* texts that no other test has put into the cache */
    check_true("unit", gas_unit_parse("Btu(th)/lb-R^1", 14, NULL, &unit, NULL));
    check_close("unit", unit.scale, 4184.0, 1e-15, 0.0);
    check_true("unit", gas_unit_parse("1.5 m3@20.5 degC,1.5 bar", 24, NULL, &unit, NULL));
    check_close("unit", unit.scale, 1.5 * 1.5e5 / (8.31446261815324 * 293.65), 1e-15, 0.0);
    setlocale(LC_ALL, before);
    if (!strstr(folder, "XXXXXX")) {
        char command[200];
        snprintf(command, sizeof command, "rm -r %s", folder);
        check_int("the locale is removed", system(command), 0);
    }
}

const struct test_suite suite_number = {"number", (const struct test_case[]){{"read", numbers_are_read},
                                                                             {"shown", numbers_are_shown},
                                                                             {"back", shown_numbers_are_read_back},
                                                                             {"locale", the_locale_changes_nothing},
                                                                             {0}}};
