/*
 * card_forms.c - THE table of heat-capacity forms that a gas card can have: one row per form.
 *
 * Sources: Kelley, US Bureau of Mines Bull. 584 (1960); Maier & Kelley, J. Am. Chem. Soc. 54 (1932) 3243; Spencer, Ind.
 * Eng. Chem. 40 (1948) 2152; Shomate, J. Phys. Chem. 58 (1954) 368; Haas & Fisher, Am. J. Sci. 276 (1976) 525; Gordon &
 * McBride, NASA SP-273 (1971); McBride, Zehe & Gordon, NASA/TP-2002-211556 (2002); Aly & Lee, Fluid Phase Equilib. 6
 * (1981) 169; Jaeschke & Schley, Int. J. Thermophys. 16 (1995) 1381; Wilhoit, TRC Current Data News 3(2) (1975) 2; VDI
 * Heat Atlas, 2nd ed. (2010) D3.1; Span et al., J. Phys. Chem. Ref. Data 29 (2000) 1361 (Planck-Einstein terms); Passut
 * & Danner, Ind. Eng. Chem. Process Des. Dev. 11 (1972) 543.
 */
#include "sheet/gas_card.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#include "sheet/ascii.h"
#include "sheet/expression.h"

#define WHAT "gas card"

/* A hyperbolic pair: [x/sinh x]^2 tends to 1 and [x/cosh x]^2 to 0 where the scale is 0. */
static bool add_hyperbolic(struct gas_form_case *form_case, enum gas_term_kind kind, double factor, double scale)
{
    if (scale != 0)
        return gas_cp_add_term(&form_case->build, kind, factor, fabs(scale), 0);
    return kind == GAS_TERM_COSH || gas_cp_add_power(&form_case->build, factor, 0, &gas_T_kelvin);
}

static bool add_pair(struct gas_form_case *form_case, enum gas_term_kind kind, const char *factor_letter,
                     const char *scale_letter, size_t index, bool needed)
{
    double factor, scale;
    if (!gas_constant_cp(form_case, factor_letter, index, needed, &factor))
        return false;
    return gas_constant_K(form_case, scale_letter, index + 1, needed || factor != 0, &scale) &&
           add_hyperbolic(form_case, kind, factor, scale);
}

static bool add_constant(struct gas_form_case *form_case, const char *letter)
{
    double cp;
    return gas_constant_cp(form_case, letter, 0, true, &cp) &&
           gas_cp_add_power(&form_case->build, cp, 0, &gas_T_kelvin);
}

static bool build_aly_lee(struct gas_form_case *form_case)
{
    return add_constant(form_case, "a") && add_pair(form_case, GAS_TERM_SINH, "b", "c", 1, true) &&
           add_pair(form_case, GAS_TERM_COSH, "d", "e", 3, true);
}

static bool build_jaeschke_schley(struct gas_form_case *form_case)
{
    return add_constant(form_case, "b") && add_pair(form_case, GAS_TERM_SINH, "c", "d", 90, false) &&
           add_pair(form_case, GAS_TERM_COSH, "e", "f", 90, false) &&
           add_pair(form_case, GAS_TERM_SINH, "g", "h", 90, false) &&
           add_pair(form_case, GAS_TERM_COSH, "i", "j", 90, false);
}

/* u (theta/T)^2 e^(theta/T)/(e^(theta/T) - 1)^2 = u [x/sinh x]^2 with x = theta/(2 T) */
static bool build_planck_einstein(struct gas_form_case *form_case)
{
    enum { MOST = 12 };
    char u[20], theta[20], th[20];
    if (!add_constant(form_case, "c0"))
        return false;
    for (int k = 1; k <= MOST; k++) {
        double factor, scale;
        snprintf(u, sizeof u, "u%d", k);
        snprintf(theta, sizeof theta, "theta%d", k);
        snprintf(th, sizeof th, "th%d", k);
        const char *scale_name = gas_constant_find(form_case, th, 0) ? th : theta;
        if (!gas_constant_cp(form_case, u, 0, k == 1, &factor) ||
            !gas_constant_K(form_case, scale_name, 0, k == 1 || factor != 0, &scale) ||
            !add_hyperbolic(form_case, GAS_TERM_SINH, factor, scale / 2))
            return false;
    }
    return true;
}

/* low + (high - low) y^2 [1 + (y - 1)(a0 + a1 y + a2 y^2 + a3 y^3)], y = T/(T + scale), sorted by powers of y */
static bool add_wilhoit(struct gas_form_case *form_case, double low, double high, double scale, const double a[4])
{
    const double rise = high - low;
    const double factor[] = {1 - a[0], a[0] - a[1], a[1] - a[2], a[2] - a[3], a[3]};
    if (!(scale > 0))
        return gas_refuse(form_case->card->refusal, WHAT, "the temperature constant of %s must be above zero.",
                          form_case->form->shown);
    for (int i = 0; i < 5; i++)
        if (!gas_cp_add_term(&form_case->build, GAS_TERM_RATIO, rise * factor[i], scale, i + 2))
            return false;
    return gas_cp_add_power(&form_case->build, low, 0, &gas_T_kelvin);
}

static bool build_wilhoit(struct gas_form_case *form_case)
{
    static const char *const letter[] = {"a0", "a1", "a2", "a3"};
    double low, high, scale, a[4];
    const char *limit = gas_constant_find(form_case, "cinf", 0) ? "cinf" : "cpinf";
    if (!gas_constant_cp(form_case, "cp0", 0, true, &low) || !gas_constant_cp(form_case, limit, 0, true, &high) ||
        !gas_constant_K(form_case, "b", 90, true, &scale))
        return false;
    for (size_t i = 0; i < 4; i++)
        if (!gas_constant_number(form_case, letter[i], 0, true, &a[i]))
            return false;
    return add_wilhoit(form_case, low, high, scale, a);
}

static bool build_vdi(struct gas_form_case *form_case)
{
    static const char *const letter[] = {"d", "e", "f", "g"};
    double low, high, scale, a[4];
    if (!gas_constant_K(form_case, "a", 0, true, &scale) || !gas_constant_cp(form_case, "b", 1, true, &low) ||
        !gas_constant_cp(form_case, "c", 2, true, &high))
        return false;
    for (size_t i = 0; i < 4; i++)
        if (!gas_constant_number(form_case, letter[i], 3 + i, true, &a[i]))
            return false;
    return add_wilhoit(form_case, low, high, scale, a);
}

/* cp = dH/dT of H = A + B x + C x^2 + ...; H in an energy, or the constants in a cp unit times powers of x */
static bool build_passut_danner(struct gas_form_case *form_case)
{
    static const char *const letter[] = {"b", "c", "d", "e", "f"};
    struct gas_cp_unit unit = form_case->card->cp_unit;
    double factor, value;
    if (!gas_cp_unit_factor(&unit, form_case->R, form_case->molar_mass, &factor, form_case->card->refusal))
        return false;
    if (unit.enthalpy)
        factor /= form_case->T_unit.scale;
    for (size_t i = 0; i < 5; i++)
        if (!gas_constant_number(form_case, letter[i], i + 1, i == 0, &value) ||
            !gas_cp_add_power(&form_case->build, factor * (double)(i + 1) * value, (double)i, &form_case->T_unit))
            return false;
    return true;
}

/* The third constant is printed as C in some books and as D in others. */
static bool build_maier_kelley(struct gas_form_case *form_case)
{
    const bool printed_as_D = gas_constant_find(form_case, "d", 3) != NULL;
    const struct gas_power_letter power[] = {{"a", 0, true}, {"b", 1, true}, {printed_as_D ? "d" : "c", -2, true}};
    for (size_t i = 0; i < 3; i++)
        if (!gas_constant_power(form_case, &power[i], i))
            return false;
    return true;
}

/* The constants of a written form by their letters, in either case. */
static bool take_letters(struct gas_form_case *form_case, struct gas_letter letter[], char upper[][GAS_CARD_LABEL])
{
    struct gas_card *card = form_case->card;
    for (size_t i = 0; i < card->constants; i++) {
        struct gas_constant *one = &card->constant[i];
        if (isnan(one->value[form_case->interval]))
            return gas_refuse_constant(form_case, one->label.constant);
        snprintf(upper[i], sizeof upper[i], "%s", one->label.constant);
        upper[i][0] = gas_ascii_upper(upper[i][0]);
        letter[2 * i] = (struct gas_letter){one->label.constant, one->value[form_case->interval]};
        letter[2 * i + 1] = (struct gas_letter){upper[i], one->value[form_case->interval]};
        one->used = true;
    }
    return true;
}

/* A form written out on the card: the constants are called by their labels. */
static bool build_written(struct gas_form_case *form_case)
{
    struct gas_letter letter[2 * GAS_CARD_CONSTANTS];
    char upper[GAS_CARD_CONSTANTS][GAS_CARD_LABEL];
    struct gas_card *card = form_case->card;
    struct gas_piece text = card->form;
    struct gas_sum sum;
    double factor;
    size_t used;
    if (!take_letters(form_case, letter, upper))
        return false;
    if (!gas_piece_take(&text, "cp/r") && !gas_piece_take(&text, "cp(t)"))
        gas_piece_take(&text, "cp");
    if (!gas_expression_read(text, letter, 2 * card->constants, &sum, &used, card->refusal))
        return false;
    if (used < text.length)
        return gas_refuse(card->refusal, WHAT, "the form cannot be read from \"%.30s\" on.", text.at + used);
    if (!gas_cp_unit_factor(&card->cp_unit, form_case->R, form_case->molar_mass, &factor, card->refusal))
        return false;
    for (size_t i = 0; i < sum.count; i++)
        if (!gas_cp_add_power(&form_case->build, factor * sum.term[i].factor, sum.term[i].exponent, &form_case->T_unit))
            return false;
    return true;
}

/* clang-format off */
static const struct gas_power_letter constant[] = {{"a", 0, true}, {0}};
static const struct gas_power_letter polynomial[] = {
    {"a", 0, true}, {"b", 1, false}, {"c", 2, false}, {"d", 3, false}, {"e", 4, false}, {"f", 5, false}, {"g", 6, false}, {0}};
static const struct gas_power_letter four[] = {{"a", 0, true}, {"b", 1, true}, {"c", 2, false}, {"d", -2, false}, {0}};
static const struct gas_power_letter shomate[] = {
    {"a", 0, true}, {"b", 1, true}, {"c", 2, true}, {"d", 3, true}, {"e", -2, true}, {0}};
static const struct gas_power_letter haas_fisher[] = {
    {"a", 0, true}, {"b", 1, false}, {"c", 2, false}, {"d", -2, false}, {"g", -0.5, false}, {0}};
static const struct gas_power_letter nasa7[] = {
    {"a1", 0, true}, {"a2", 1, true}, {"a3", 2, true}, {"a4", 3, true}, {"a5", 4, true}, {0}};
static const struct gas_power_letter nasa9[] = {
    {"a1", -2, true}, {"a2", -1, true}, {"a3", 0, true}, {"a4", 1, true}, {"a5", 2, true}, {"a6", 3, true},
    {"a7", 4, true}, {0}};

static const struct gas_form forms[] = {
    {"constant", "constant|constantcp|const|fixed", "cp = A", "", constant, NULL, false, false, 0},
    {"polynomial", "polynomial|poly|polynomialint|linear|quadratic|cubic|quartic|quintic|powerseries|cubicpolynomial|quarticpolynomial",
     "cp = A + B T + C T^2 + D T^3 + ... to G T^6", "", polynomial, NULL, false, false, 0},
    {"Maier-Kelley", "maierkelley|maierkelly|a+bt+d/t2|a+bt+c/t2|a+bt+d/t^2|a+bt+c/t^2|a+bt+dt^-2|a+bt+ct^-2",
     "cp = A + B T + D/T^2", "", NULL, build_maier_kelley, false, false, 0},
    {"A+BT+CT²+D/T²", "a+bt+ct2+d/t2|a+bt+ct^2+d/t^2|a+bt+ct^2+dt^-2|fourconstant|fourconstants|kelley|4constant",
     "cp = A + B T + C T^2 + D/T^2", "", four, NULL, false, false, 0},
    {"Shomate", "shomate|nistshomate|shomateequation", "cp = A + B t + C t^2 + D t^3 + E/t^2, t = T/1000", "f|g|h", shomate,
     NULL, false, true, 0},
    {"Haas-Fisher", "haasfisher|haasfischer|haas", "cp = A + B T + D/T^2 + C T^2 + G/T^0.5", "", haas_fisher, NULL, false, false, 0},
    {"NASA 7", "nasa7|nasa7constant|nasa7constants|nasa7coefficient|nasa7coefficients|nasa7term|sevenconstant",
     "cp/R = a1 + a2 T + ... + a5 T^4", "a6|a7|b1|b2", nasa7, NULL, true, false, 0},
    {"NASA 9", "nasa9|nasa9constant|nasa9constants|nasa9coefficient|nasa9coefficients|nasa9term|nasaglenn|nasaglenn9|nineconstant",
     "cp/R = a1/T^2 + a2/T + a3 + a4 T + ... + a7 T^4", "a8|a9|b1|b2", nasa9, NULL, true, false, 8.314510 /* NASA/TP-2002-211556 */},
    {"Aly-Lee", "alylee|alylee(hyperbolic)|hyperbolic", "cp = A + B [(C/T)/sinh(C/T)]^2 + D [(E/T)/cosh(E/T)]^2", "", NULL,
     build_aly_lee, false, false, 0},
    {"Jaeschke-Schley", "jaeschkeschley|jaeschke|jaeschkeandschley", "cp/R = B + C [(D/T)/sinh(D/T)]^2 + E [(F/T)/cosh(F/T)]^2 + G, H + I, J",
     "a", NULL, build_jaeschke_schley, true, false, 0},
    {"Wilhoit", "wilhoit|wilhoitequation", "cp = Cp0 + (Cpinf - Cp0) y^2 [1 + (y - 1)(a0 + ... + a3 y^3)], y = T/(T + B)", "", NULL,
     build_wilhoit, false, false, 0},
    {"VDI", "vdi|vdiheatatlas|vdiatlas|vdiwilhoit", "cp/R = B + (C - B) y^2 [1 + (y - 1)(D + E y + F y^2 + G y^3)], y = T/(A + T)", "",
     NULL, build_vdi, true, false, 0},
    {"Planck-Einstein", "planckeinstein|einstein|planckeinsteinsum|einsteinfunctions", "cp/R = c0 + sum of u (theta/T)^2 exp(theta/T)/[exp(theta/T) - 1]^2",
     "", NULL, build_planck_einstein, true, false, 0},
    {"Passut-Danner", "passutdanner|passutanddanner|enthalpypolynomial", "cp = B + 2 C T + 3 D T^2 + 4 E T^3 + 5 F T^4", "a|g", NULL,
     build_passut_danner, false, false, 0},
};
/* clang-format on */

static const struct gas_form written = {
    .shown = "on the card", .names = "", .equation = "as written there", .spare = "", .build = build_written};
static const struct gas_form written_over_R = {.shown = "on the card",
                                               .names = "",
                                               .equation = "as written there",
                                               .spare = "",
                                               .build = build_written,
                                               .over_R = true};

const struct gas_form *gas_forms(size_t *count)
{
    *count = sizeof forms / sizeof *forms;
    return forms;
}

const struct gas_form *gas_form_find(struct gas_piece text)
{
    char folded[80];
    gas_fold(folded, sizeof folded, text);
    for (size_t i = 0; i < sizeof forms / sizeof *forms; i++)
        if (gas_listed(folded, forms[i].names))
            return &forms[i];
    if (strncmp(folded, "cp/r=", 5) == 0)
        return &written_over_R;
    return strpbrk(folded, "+*=/^") ? &written : NULL;
}
