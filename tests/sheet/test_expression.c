/* Written formulas: each is compared with the same formula written in C, at several temperatures. */
#include <math.h>
#include <string.h>

#include "check.h"
#include "sheet/expression.h"

static double value(const struct gas_sum *sum, double T)
{
    double y = 0;
    for (size_t i = 0; i < sum->count; i++)
        y += sum->term[i].factor * pow(sum->term[i].exponent ? T : 1, sum->term[i].exponent);
    return y;
}

static double f1(double T)
{
    return 28.58 + 3.77e-3 * T - 0.50e5 / (T * T);
}
static double f2(double T)
{
    return 2.5 * pow(1 + T / 1000, 3);
}
static double f3(double T)
{
    return -T * T + 4 / T / T;
}
static double f4(double T)
{
    return (3 + 2 * T) * (5 - T) / (2 * T);
}
static double f5(double T)
{
    return 7 * sqrt(T) + 3 / sqrt(T);
}
static double f6(double T)
{
    return 1 - 1 / pow(T, 9);
}
static double f7(double T)
{
    return T * T * T * T * T * T * T * T; /* 2^3 = 8: '^' binds to the right */
}
static double f8(double T)
{
    return 25.5 + 0.0136 * T - 42.6e-7 * T * T;
}

static const struct {
    const char *text;
    double (*by_hand)(double T);
} formulas[] = {
    {"28.58 + 3.77e-3 T - 0.50e5/T^2", f1},
    {"28,58+3,77E-3*T-0,50e5/T^2", f1},
    {"28.58 + 3.77·10^-3 T − 0.50×10⁵ T⁻²", f1},
    {"(28.58) + ((3.77e-3)) (T) - 0.5e5 (1/T)^2", f1},
    {"28.58 + 3.77e-3 T - 50000 / T / T", f1},
    {"28.58 + 3.77 (T/1000) - 0.05 (T/1000)**-2", f1},
    {"2.5 (1 + T/1000)^3", f2},
    {"2,5 (T/1000 + 1)²(1 + 1e-3 T)", f2},
    {"-T^2 + 4/T^2", f3},
    {"+-T^2+4T^-2", NULL},
    {"(3 + 2 T)(5 - T)/(2 T)", f4},
    {"7 T^0.5 + 3 T^(-1/2)", f5},
    {"7 T^0,5 + 3/T^0,5", f5},
    {"1 - T^-9 + 0 (T + 1)", f6},
    {"T^2^3", f7},
    {"25.5 + 13.6e-3 T - 42.6e-7 T^2 + T - T", f8},
};

static void formulas_are_read(void)
{
    for (size_t i = 0; i < sizeof formulas / sizeof *formulas; i++) {
        struct gas_refusal refusal = {0};
        struct gas_sum sum;
        size_t used = 0;
        const char *text = formulas[i].text;
        bool read = gas_expression_read((struct gas_piece){text, strlen(text)}, NULL, 0, &sum, &used, &refusal);
        if (!formulas[i].by_hand) {
            check_true(text, !read);
            continue;
        }
        check_text(text, read ? "" : refusal.text, "");
        check_int(text, (long)used, (long)strlen(text));
        for (double T = 1.7; read && T < 4000; T *= 2.9)
            check_close(text, value(&sum, T), formulas[i].by_hand(T), 1e-12, 1e-12);
    }
}

static void letters_of_constants(void)
{
    const struct gas_letter letter[] = {{"A", 25.5}, {"B", 0.0136}, {"C", -42.6e-7}, {"C2", 1e9}};
    struct gas_refusal refusal = {0};
    struct gas_sum sum;
    size_t used;
    const char *const texts[] = {"A + B T + C T^2", "A+BT+CT²", "A + T (B + C T)", "A+B*T+C*T^2+0 C2"};
    for (size_t i = 0; i < sizeof texts / sizeof *texts; i++) {
        bool read =
            gas_expression_read((struct gas_piece){texts[i], strlen(texts[i])}, letter, 4, &sum, &used, &refusal);
        check_text(texts[i], read ? "" : refusal.text, "");
        check_close(texts[i], read ? value(&sum, 555.5) : NAN, f8(555.5), 1e-13, 0);
    }
}

/* Where the formula ends and something else begins. */
static void the_rest_is_left(void)
{
    static const struct {
        const char *text, *rest;
    } rows[] = {
        {"28.58 + 3.77e-3 T J/mol-K", "J/mol-K"},
        {"29.1 kJ/kg-K", "kJ/kg-K"},
        {"3 T (J/mol-K)", "(J/mol-K)"},
        {"3 T^2 cal/mol-K", "cal/mol-K"},
        {"5/T^2 J/mol-K", "J/mol-K"},
        {"29.1 [J/mol-K]", "[J/mol-K]"},
        {"3.5 R", "R"},
        {"2 T Torr", "Torr"},
    };
    for (size_t i = 0; i < sizeof rows / sizeof *rows; i++) {
        struct gas_refusal refusal = {0};
        struct gas_sum sum;
        size_t used = 0;
        struct gas_piece text = {rows[i].text, strlen(rows[i].text)};
        check_true(rows[i].text, gas_expression_read(text, NULL, 0, &sum, &used, &refusal));
        check_text(rows[i].text, rows[i].text + used, rows[i].rest);
    }
}

static const struct {
    const char *text, *part;
} refused[] = {
    {"", "ends where"},
    {"28 +", "ends where"},
    {"28 + * T", "stands where"},
    {"(28 + T", "')'"},
    {"28 / 0", "divides by zero"},
    {"28 / (T - T)", "divides by zero"},
    {"0^-1", "divides by zero"},
    {"1/(1 + T)", "divides by a sum"},
    {"(1 + T)^-1", "whole powers from 0"},
    {"(1 + T)^0.5", "whole powers from 0"},
    {"(1 + T)^9", "whole powers from 0"},
    {"2^T", "exponent contains T"},
    {"(-2)^0.5", "negative term"},
    {"T^40", "beyond what is read"},
    {"1e300*1e300", "too large"},
    {"10^400", "too large"},
    {"28 + exp(-3/T)", "no functions"},
    {"28 ln(T)", "no functions"},
    {"28 + x", "stands where"},
    {"28 + T2", "write T^2"},
    {"28 + 3 t", ""},
    {"28 + t", "t is not known"},
    {"1/2 T", "two ways"},
    {"1 234 + T", "without spaces"},
    {"28 + 3 (T + )", "stands where"},
};

static void wrong_formulas_are_refused(void)
{
    for (size_t i = 0; i < sizeof refused / sizeof *refused; i++) {
        struct gas_refusal refusal = {0};
        struct gas_sum sum;
        size_t used;
        const char *text = refused[i].text;
        bool read = gas_expression_read((struct gas_piece){text, strlen(text)}, NULL, 0, &sum, &used, &refusal);
        if (!refused[i].part[0]) { /* what follows is for the unit's reader to refuse */
            check_text(text, read ? text + used : "", "t");
            continue;
        }
        check_true(text, !read);
        check_contains(text, refusal.text, refused[i].part);
    }
}

/* Random bytes of the alphabet of formulas: never a crash, and never both or neither of an answer and a sentence. */
static void random_formulas(void)
{
    static const char alphabet[] = "0123456789.,eE+-*/^()T TTab \xc2\xb2\xe2\x81\xbb\xb7";
    check_seed(7);
    for (int i = 0; i < 20000; i++) {
        char text[40];
        size_t length = (size_t)check_random(0, sizeof text - 1), used = 0;
        for (size_t k = 0; k < length; k++)
            text[k] = alphabet[(size_t)check_random(0, sizeof alphabet - 1)];
        struct gas_refusal refusal = {0};
        struct gas_sum sum = {0};
        bool read = gas_expression_read((struct gas_piece){text, length}, NULL, 0, &sum, &used, &refusal);
        if (read == refusal.made || used > length || sum.count > GAS_SUM_TERMS)
            check_true("random formula", false);
    }
    check_true("random formulas", true);
}

const struct test_suite suite_expression = {"expression",
                                            (const struct test_case[]){{"formulas", formulas_are_read},
                                                                       {"letters", letters_of_constants},
                                                                       {"rest", the_rest_is_left},
                                                                       {"wrong formulas", wrong_formulas_are_refused},
                                                                       {"random", random_formulas},
                                                                       {0}}};
