/* Options texts and ranges, against factors of NIST SP 811 and the US Standard Atmosphere 1976 written out. */
#include <math.h>
#include <stddef.h>
#include <string.h>

#include "check.h"
#include "sheet/options.h"

#define PSI 6894.757293168361 /* Pa: 0.45359237 x 9.80665 / 0.0254^2, NIST SP 811 */

static bool read(const char *text, struct gas_options *options, struct gas_refusal *refusal)
{
    struct gas_cell cell = {GAS_CELL_TEXT, 0, text, strlen(text)};
    struct gas_block block = {1, 1, &cell, false};
    *refusal = (struct gas_refusal){0};
    return gas_options_read(&block, options, refusal);
}

#define AT(member) offsetof(struct gas_options, member)

/* clang-format off */
static const struct {
    const char *text;
    size_t member;
    double expected, relative;
} figures[] = {
    {"", AT(barometer), 101325, 0},
    {"barometer 0.98 bar", AT(barometer), 98000, 1e-14},
    {"Barometer = 980 mbar", AT(barometer), 98000, 1e-14},
    {"barometer: 98 kPa", AT(barometer), 98000, 1e-14},
    {"barometer 0,98 bar", AT(barometer), 98000, 1e-14},
    {"barometer 98000", AT(barometer), 98000, 0},
    {"BAROMETER 14.2 psi", AT(barometer), 14.2 * PSI, 1e-13},
    {"flow\nbarometer 0.98 bar", AT(barometer), 98000, 1e-14},
    {"barometer at 0 m", AT(barometer), 101325, 1e-12},
    /* US Standard Atmosphere 1976, eq. (18) and (33a), written out with bc */
    {"barometer at 1000 m", AT(barometer), 89876.28, 1e-7},
    {"barometer at 2500 m", AT(barometer), 74691.76, 1e-7},
    {"altitude 2500 m", AT(barometer), 74691.76, 1e-7},
    {"barometer at 8202.1 ft", AT(barometer), 74691.76, 1e-5},
    {"agree 0.5 %", AT(agree), 0.005, 1e-14},
    {"agree 0,5%", AT(agree), 0.005, 1e-14},
    {"", AT(agree), 0.001, 0},
    {"datum 0 °C", AT(datum.T), 273.15, 1e-14},
    {"datum 0 °C", AT(datum.P), 1e5, 0},
    {"datum 0 °C, 1 atm", AT(datum.P), 101325, 1e-14},
    {"datum 32 °F, 14.7 psi", AT(datum.T), 273.15, 1e-14},
    {"datum 32 °F, 14.7 psi", AT(datum.P), 14.7 * PSI, 1e-13},
    {"", AT(datum.T), 298.15, 0},
    {"normal 0 °C, 1 bar", AT(references.normal_P), 1e5, 1e-14},
    {"normal 20 °C", AT(references.normal_T), 293.15, 1e-14},
    {"standard 20 °C, 1 atm", AT(references.standard_T), 293.15, 1e-14},
    {"standard 15,5 °C,1,01325 bar", AT(references.standard_T), 288.65, 1e-14},
    {"standard 15,5 °C,1,01325 bar", AT(references.standard_P), 101325, 1e-14},
    {"scf 60 °F, 14.73 psi", AT(references.scf_P), 14.73 * PSI, 1e-13},
    {"scf 68 °F", AT(references.scf_T), 293.15, 1e-13},
    {"", AT(references.scf_T), 519.67 / 1.8, 1e-14},
    {"", AT(references.scf_P), 14.696 * PSI, 1e-14},
};
/* clang-format on */

static void figures_come_in_si(void)
{
    for (size_t i = 0; i < sizeof figures / sizeof *figures; i++) {
        struct gas_options options;
        struct gas_refusal refusal;
        double got;
        check_text(figures[i].text, read(figures[i].text, &options, &refusal) ? "" : refusal.text, "");
        memcpy(&got, (const char *)&options + figures[i].member, sizeof got);
        check_close(figures[i].text, got, figures[i].expected, figures[i].relative, 0);
    }
}

static void words(void)
{
    struct gas_options options;
    struct gas_refusal refusal;
    check_true("none", read("", &options, &refusal) && !options.work_by_gas && options.system == GAS_CLOSED);
    check_true("by gas", read("work by gas", &options, &refusal) && options.work_by_gas);
    check_true("spaces, case", read("  Work   BY gas ", &options, &refusal) && options.work_by_gas);
    check_true("last wins", read("work by gas; work on gas", &options, &refusal) && !options.work_by_gas);
    check_true("flow", read("flow; hard errors", &options, &refusal) && options.system == GAS_FLOW);
    check_true("hard", options.hard_errors);
    check_true("closed", read("flow;closed", &options, &refusal) && options.system == GAS_CLOSED);
    check_true("open", read("open", &options, &refusal) && options.open);
    check_true("open, then closed", read("open; closed", &options, &refusal) && !options.open);
    check_true("omitted", gas_options_read(&(struct gas_block){0}, &options, &refusal) && !options.hard_errors);
}

static void same_references_as_units(void)
{
    const struct gas_references *a = &gas_options_default.references, *b = &gas_references_default;
    check_close("normal T", a->normal_T, b->normal_T, 1e-15, 0);
    check_close("normal P", a->normal_P, b->normal_P, 1e-15, 0);
    check_close("standard T", a->standard_T, b->standard_T, 1e-15, 0);
    check_close("standard P", a->standard_P, b->standard_P, 1e-15, 0);
    check_close("scf T", a->scf_T, b->scf_T, 1e-15, 0);
    check_close("scf P", a->scf_P, b->scf_P, 1e-15, 0);
}

/* clang-format off */
static const struct {
    const char *text, *part;
} refused[] = {
    {"barometre 1 bar", "Check options: \"barometre 1 bar\" is not an option; the options are: barometer at 2400 m; barometer 0.98 bar; altitude 2400 m; work by gas"},
    {"7", "is not an option"},
    {"barometer", "write it like \"barometer 0.98 bar\""},
    {"barometer high", "write it like \"barometer 0.98 bar\""},
    {"barometer 20 °C", "write it like \"barometer 0.98 bar\""},
    {"barometer 0.98 brr", "brr"},
    {"barometer 0.98", "is no air pressure"},
    {"barometer -1 bar", "below a perfect vacuum"},
    {"barometer at 99 km", "Check options: "},
    {"barometer at 30000 m", "outside the standard atmosphere"},
    {"agree 0.5", "write it like \"agree 0.5 %\""},
    {"agree -1 %", "write it like \"agree 0.5 %\""},
    {"datum -300 °C", "below absolute zero"},
    {"datum 0 °C, 20 °C", "write it like \"datum 0 °C, 1 atm\""},
    {"datum 0 °C, 0 bar", "write it like \"datum 0 °C, 1 atm\""},
    {"flow 3", "write it like \"flow\""},
    {"hard errors; work for gas", "\"work for gas\" is not an option"},
    {"flowing", "is not an option"},
};
/* clang-format on */

static void refusals(void)
{
    for (size_t i = 0; i < sizeof refused / sizeof *refused; i++) {
        struct gas_options options;
        struct gas_refusal refusal;
        check_true(refused[i].text, !read(refused[i].text, &options, &refusal));
        check_contains(refused[i].text, refusal.text, refused[i].part);
    }
}

#define TEXT(words)                                                                                                    \
    {                                                                                                                  \
        GAS_CELL_TEXT, 0, (words), sizeof(words) - 1                                                                   \
    }
#define NUMBER(value)                                                                                                  \
    {                                                                                                                  \
        GAS_CELL_NUMBER, value, NULL, 0                                                                                \
    }

static void ranges(void)
{
    struct gas_cell rows[] = {TEXT("barometer"), NUMBER(0.98), TEXT("bar"),   TEXT("agree"),
                              NUMBER(0.5),       TEXT("%"),    TEXT("datum"), TEXT("0 °C"),
                              TEXT(""),          TEXT("flow"), TEXT(""),      TEXT("hard errors")};
    struct gas_block block = {4, 3, rows, true};
    struct gas_options options;
    struct gas_refusal refusal = {0};
    check_text("label | value | unit", gas_options_read(&block, &options, &refusal) ? "" : refusal.text, "");
    check_close("barometer", options.barometer, 98000, 1e-14, 0);
    check_close("agree", options.agree, 0.005, 1e-14, 0);
    check_close("datum", options.datum.T, 273.15, 1e-14, 0);
    check_true("words", options.system == GAS_FLOW && options.hard_errors);
    struct gas_cell column[] = {TEXT("barometer 0.98 bar; flow"), TEXT(" "), TEXT("work by gas")};
    check_true("a column", gas_options_read(&(struct gas_block){3, 1, column, true}, &options, &refusal));
    check_true("all of them", options.work_by_gas && options.system == GAS_FLOW && options.barometer < 1e5);
    struct gas_cell number[] = {NUMBER(3)};
    check_true("a number", !gas_options_read(&(struct gas_block){1, 1, number, false}, &options, &refusal));
    check_contains("a number", refusal.text, "a bare number is not an option");
    struct gas_cell sentence[] = {TEXT("flow"), TEXT("Check T: it is odd.")};
    refusal.made = false;
    check_true("a sentence", !gas_options_read(&(struct gas_block){2, 1, sentence, true}, &options, &refusal));
    check_text("a sentence", refusal.text, "Check T: it is odd.");
}

const struct test_suite suite_options = {"options", (const struct test_case[]){{"figures", figures_come_in_si},
                                                                               {"words", words},
                                                                               {"references", same_references_as_units},
                                                                               {"refusals", refusals},
                                                                               {"ranges", ranges},
                                                                               {0}}};
