/* Mixtures as text and as range. */
#include <math.h>
#include <stdio.h>

#include "gas_cases.h"

struct text_row {
    const char *text;
    const char *first; /* formula of the part whose fraction is known */
    double x;
    double tolerance;
    const char *how;
};

/* Fractions worked out by hand; molar masses: IUPAC 2021 abridged, CO2 44.009, N2 28.014, CH4 16.043, C2H6 30.070. */
static const struct text_row texts[] = {
    {"N2 79 + O2 21", "N2", 0.79, 1e-15, "as written"},
    {"N2 0.79 + O2 0.21", "N2", 0.79, 1e-15, "as written"},
    {"N2 0,79 + O2 0,21", "N2", 0.79, 1e-15, "decimal comma"},
    {"79 % N2 + 21 % O2", "O2", 0.21, 1e-15, "figure first"},
    {"79% N2; 21% O2", "O2", 0.21, 1e-15, "semicolon"},
    {"79%N2+21%O2", "O2", 0.21, 1e-15, "no spaces"},
    {"nitrogen: 79 % + oxygen = 21 %", "O2", 0.21, 1e-15, "colon, equals"},
    {"N2 (79 %) + O2 (21 %)", "O2", 0.21, 1e-15, "parentheses"},
    {"N2 79 vol% + O2 21 vol%", "O2", 0.21, 1e-15, "volume"},
    {"N2 79 + O2 rest", "O2", 0.21, 1e-15, "rest"},
    {"balance N2 + O2 21 %", "N2", 0.79, 1e-15, "balance first"},
    {"H2 5 % + N2 balance", "N2", 0.95, 1e-15, "balance"},
    {"H2 0.05 + N2 rest", "N2", 0.95, 1e-15, "rest of 1"},
    {"CO2 400 ppm + air rest", "CO2", 4e-4, 1e-13, "ppm"},
    {"CH4 0.92 + C2H6 0.08", "CH4", 0.92, 1e-15, "as written"},
    {"CO2 40 + N2 60 wt%", "CO2", (40 / 44.009) / (40 / 44.009 + 60 / 28.014), 2e-5, "mass / M"},
    {"CO2 40 wt.-% + N2 60 wt.-%", "CO2", (40 / 44.009) / (40 / 44.009 + 60 / 28.014), 2e-5, "mass / M"},
    {"40 % by weight CO2 + 60 % by weight N2", "CO2", (40 / 44.009) / (40 / 44.009 + 60 / 28.014), 2e-5, "mass / M"},
    {"carbon dioxide 40 + nitrogen 60", "CO2", 0.4, 1e-15, "names with spaces"},
    {"1-butene 5 + nitrogen 95", "C4H8", 0.05, 1e-14, "names with digits"},
    {"5 1-butene + 95 nitrogen", "C4H8", 0.05, 1e-14, "names with digits"},
    {"air 98 + H2O 2", "H2O", 0.02, 1e-15, "2 parts of water, no hydrogen peroxide"},
    {"air 90 + CH4 10", "CH4", 0.1, 1e-15, "air as one part"},
    {"N2 78.9 + O2 21.5", "N2", 78.9 / 100.4, 1e-14, "within 0.5 %: scaled"},
    {"N2 99.5", "N2", 1, 0, "one part"},
    {"N2 7.9e+1 + O2 21", "N2", 0.79, 1e-15, "exponent"},
    {"79\u00a0N2 + 21\u00a0O2", "N2", 0.79, 1e-15, "no-break spaces"},
    {"N2\u00a079\u00a0%\n O2 21 %\n", "N2", 0.79, 1e-15, "lines, no-break spaces"},
};

static double fraction_of(const struct gas_choice *choice, const char *formula)
{
    double sum = 0, x = NAN;
    for (size_t i = 0; i < choice->part_count; i++) {
        sum += choice->part[i].x;
        if (strcmp(choice->part[i].species->formula, formula) == 0)
            x = choice->part[i].x;
    }
    check_close("fractions add to 1", sum, 1, 1e-14, 0);
    return x;
}

static void texts_are_read(void)
{
    for (size_t i = 0; i < sizeof texts / sizeof *texts; i++) {
        const struct gas_choice *choice = case_text(texts[i].text);
        if (choice)
            check_close(texts[i].text, fraction_of(choice, texts[i].first), texts[i].x, texts[i].tolerance, 0);
        gas_choice_release(choice);
    }
}

struct refused_row {
    const char *text, *part;
};

static const struct refused_row refused[] = {
    {"N2 76 + O2 21", "97"},
    {"N2 82 + O2 21", "103"},
    {"N2 0.76 + O2 0.21", "0.97"},
    {"N2 0.82 + O2 0.21", "1.03"},
    {"N2 79 % + O2 0.21 %", "79.21 %"},
    {"N2 97", "97"},
    {"N2 -5 + O2 105", "below zero"},
    {"N2 0 + O2 100", "fraction 0"},
    {"N2 79 + O2", "\"O2\" has no fraction"},
    {"N2 79 + nitrogen 21", "twice"},
    {"N2 rest + O2 rest", "only one part"},
    {"N2 100 + O2 rest", "leaves nothing"},
    {"N2 40 wt% + O2 60 mol%", "one basis"},
    {"N2 79 + O2x 21", "\"O2x\" is not known"},
    {"N2 79 + 21", "no name"},
    {"N2 79 +", "blank"},
    {"N2 79 + + O2 21", "blank"},
    {"+ N2 79", "blank"},
    {"N2 + O2", "without their fractions"},
    {"N2 79, O2 21", "write +"},
    {"natural gas 90 + N2 10", "CH4 92"},
    {"N2 1e999 + O2 21", "Check gas"},
    {"N2 seventy + O2 30", "cannot be read"},
    {";", "no parts"},
};

static void wrong_texts_are_refused(void)
{
    for (size_t i = 0; i < sizeof refused / sizeof *refused; i++)
        case_text_refused(refused[i].text, refused[i].part);
}

static void ranges_are_read(void)
{
    static const struct {
        const char *typed;
        double x_N2;
    } rows[] = {
        {"N2;79~O2;21", 0.79},
        {"component;mol %~N2;79~;~O2;21", 0.79},
        {"Component;mole fraction~N2;0.79~O2;0.21", 0.79},
        {"gas;wt %~N2;60~CO2;40", (60 / 28.014) / (60 / 28.014 + 40 / 44.009)},
        {"gas;Mass fraction~N2;0.6~CO2;0.4", (60 / 28.014) / (60 / 28.014 + 40 / 44.009)},
        {"N2;60 wt%~CO2;40 wt%", (60 / 28.014) / (60 / 28.014 + 40 / 44.009)},
        {"N2;0,79~O2;rest", 0.79},
        {"N2;79~O2;21~He;0", 0.79},
        {"N2;79~O2;21~total;100", 0.79},
        {"mol %;~N2;79~O2;21", 0.79},
    };
    for (size_t i = 0; i < sizeof rows / sizeof *rows; i++) {
        const struct gas_choice *choice = case_block(2, rows[i].typed);
        if (choice)
            check_close(rows[i].typed, fraction_of(choice, "N2"), rows[i].x_N2, 2e-5, 0);
        gas_choice_release(choice);
    }
}

/* The same mixtures turned on their side, and with a column of units. */
static void ranges_across_are_read(void)
{
    static const struct {
        size_t columns;
        const char *typed;
        double x_N2;
    } rows[] = {
        {2, "N2;O2~79;21", 0.79},
        {3, "N2;O2;Ar~78;21;1", 0.78},
        {3, "gas;N2;O2~mol %;79;21", 0.79},
        {4, "gas;N2;O2;total~mol %;79;21;100", 0.79},
        {3, "gas;N2;CO2~wt %;60;40", (60 / 28.014) / (60 / 28.014 + 40 / 44.009)},
        {2, "N2;O2~0.79;rest", 0.79},
        {3, "N2;79;mol %~O2;21;mol %", 0.79},
        {3, "component;fraction;unit~N2;60;wt %~CO2;40;wt %", (60 / 28.014) / (60 / 28.014 + 40 / 44.009)},
        {2, "N2;O2~79;21~mol %;mol %", 0.79},
    };
    for (size_t i = 0; i < sizeof rows / sizeof *rows; i++) {
        const struct gas_choice *choice = case_block(rows[i].columns, rows[i].typed);
        if (choice)
            check_close(rows[i].typed, fraction_of(choice, "N2"), rows[i].x_N2, 2e-5, 0);
        gas_choice_release(choice);
    }
}

static void wrong_ranges_are_refused(void)
{
    case_block_refused(2, "N2;79~O2;18", "97");
    case_block_refused(2, "N2;79~O2;24", "103");
    case_block_refused(2, "N2;79~O2;", "row 2");
    case_block_refused(2, "N2;79~5;21", "row 2");
    case_block_refused(2, "N2;79~nitrogn;21", "nitrogen (N2)");
    case_block_refused(2, "mass;mol %~N2;79~O2;21", "both a mass and a mole");
    case_block_refused(2, "N2;79~O2;-1", "below zero");
    case_block_refused(2, "N2;79~O2;21~total;98", "total of the mixture says 98");
    case_block_refused(2, "N2;79~;21", "row 2 of the mixture has no component");
    case_block_refused(3, "N2;79;bar~O2;21;", "\"bar\" beside a fraction");
    case_block_refused(3, "N2;79;5~O2;21;", "second number");
    case_block_refused(3, "N2;79;mol %~O2;21;wt %", "one basis");
    case_block_refused(3, "N2;O2;CO~78;21;x", "column 3");
    case_block_refused(1, "N2~O2", "2 rows and 1 column;");
    case_block_refused(2, "~;", "no parts");
    case_block_refused(4, "N2;79;;~O2;21;;", "4 columns");
    case_block_refused(2, "N2;79~Check T1: 12 K is too cold.;21", "Check T1: 12 K");
}

/* The definition itself: the mole-fraction sum of the parts at temperatures on both sides of their joins. */
static void heat_is_the_sum_of_the_parts(void)
{
    const struct gas_choice *mix = case_text("CH4 30 + H2O 20 + He 50"),
                            *part[3] = {case_text("CH4"), case_text("H2O"), case_text("He")};
    static const double x[] = {0.3, 0.2, 0.5}, T[] = {200, 333.3, 999, 1000, 1001, 2345.6, 5999};
    for (size_t i = 0; mix && i < sizeof T / sizeof *T; i++) {
        double cp = 0, dh = 0, ds = 0;
        for (int k = 0; k < 3; k++) {
            cp += x[k] * gas_cp(&part[k]->gas, T[i]).value;
            dh += x[k] * gas_dh(&part[k]->gas, 298.15, T[i]).value;
            ds += x[k] * gas_ds_isobaric(&part[k]->gas, 298.15, T[i]).value;
        }
        check_close("cp", gas_cp(&mix->gas, T[i]).value, cp, 1e-13, 0);
        check_close("dh", gas_dh(&mix->gas, 298.15, T[i]).value, dh, 1e-12, 0);
        check_close("ds", gas_ds_isobaric(&mix->gas, 298.15, T[i]).value, ds, 1e-12, 0);
    }
    for (int k = 0; k < 3; k++)
        gas_choice_release(part[k]);
    gas_choice_release(mix);
}

static void the_range_is_the_shared_one(void)
{
    const struct gas_choice *mix = case_text("N2 50 + CH4 50"), *N2 = case_text("N2"), *CH4 = case_text("CH4");
    struct gas_range shared = gas_range_of(&mix->gas), a = gas_range_of(&N2->gas), b = gas_range_of(&CH4->gas);
    check_close("from", shared.T_from, fmax(a.T_from, b.T_from), 0, 0);
    check_close("to", shared.T_to, fmin(a.T_to, b.T_to), 0, 0);
    check_true("one ends before the other", a.T_to != b.T_to);
    gas_choice_release(mix);
    gas_choice_release(N2);
    gas_choice_release(CH4);
}

/* The same gas by mass and by mole, each figure from the other by the molar masses of the gases themselves. */
static void mass_and_mole_agree(void)
{
    char text[120];
    const struct gas_choice *CO2 = case_text("CO2"), *N2 = case_text("N2");
    double a = 0.4 / CO2->gas.molar_mass, b = 0.6 / N2->gas.molar_mass;
    snprintf(text, sizeof text, "CO2 %.17g + N2 %.17g", a / (a + b), b / (a + b));
    const struct gas_choice *mass = case_text("CO2 40 + N2 60 wt%"), *mole = case_text(text);
    check_close("M", mass->gas.molar_mass, mole->gas.molar_mass, 1e-14, 0);
    check_close("M", mass->gas.molar_mass, 1 / (a + b), 1e-14, 0);
    for (double T = 250; T < 5000; T *= 1.7)
        check_close("cp", gas_cp(&mass->gas, T).value, gas_cp(&mole->gas, T).value, 1e-12, 0);
    check_contains("label by mole", mass->label, "% carbon dioxide");
    gas_choice_release(CO2);
    gas_choice_release(N2);
    gas_choice_release(mass);
    gas_choice_release(mole);
}

const struct test_suite suite_mixture = {"mixture",
                                         (const struct test_case[]){{"texts", texts_are_read},
                                                                    {"wrong texts", wrong_texts_are_refused},
                                                                    {"ranges", ranges_are_read},
                                                                    {"ranges across", ranges_across_are_read},
                                                                    {"wrong ranges", wrong_ranges_are_refused},
                                                                    {"heat", heat_is_the_sum_of_the_parts},
                                                                    {"range", the_range_is_the_shared_one},
                                                                    {"bases", mass_and_mole_agree},
                                                                    {0}}};
