/*
 * Gas cards: every form's cp is evaluated here by its printed formula, in double and with the printed units, and the
 * card's dh and ds are compared with GSL quadrature of that cp. Constants are of the size that the publications print;
 * they are inputs, not expected answers.
 */
#include <math.h>
#include <stdio.h>

#include <gsl/gsl_integration.h>

#include "gas_cases.h"

#define RU 8.31446261815324 /* J/(mol K), SI 2019, exact */

struct form_row {
    const char *id;
    size_t columns;
    const char *card;
    double (*cp)(double T); /* J/(mol K) at T in K */
    double from, to;        /* K, where to compare */
};

static double square(double x)
{
    return x * x;
}
static double constant(double T)
{
    (void)T;
    return 1.04 * 28.014;
}
/* cubic, Reid, Prausnitz & Poling's shape */
static double cubic(double T)
{
    return 31.15 - 1.357e-2 * T + 2.68e-5 * T * T - 1.168e-8 * T * T * T;
}
static double sextic(double T)
{
    return RU * (3.539 - 0.261e-3 * T + 0.007e-5 * T * T + 0.157e-8 * pow(T, 3) - 0.099e-11 * pow(T, 4) +
                 1e-16 * pow(T, 5) + 1e-20 * pow(T, 6));
}
/* the same in degC and kJ: Felder & Rousseau, Table B.2, nitrogen */
static double in_celsius(double T)
{
    double t = T - 273.15;
    return 29.00 + 0.2199e-2 * t + 0.5723e-5 * t * t - 2.871e-9 * t * t * t;
}
static double in_fahrenheit(double T)
{
    double t = T * 1.8 - 459.67;
    return 4.1868 * (6.9 + 3e-4 * t + 2e-7 * t * t);
}
static double in_rankine(double T)
{
    double t = T * 1.8;
    return 4.1868 * (6.3 + 8e-4 * t + 2e4 / (t * t));
}
static double maier_kelley(double T)
{
    return 28.58 + 3.77e-3 * T - 0.50e5 / (T * T);
}
static double four(double T)
{
    return RU * (5.457 + 1.045e-3 * T - 1.157e5 / (T * T));
}
static double four_with_C(double T)
{
    return RU * (1.702 + 9.081e-3 * T - 2.164e-6 * T * T);
}
static double shomate(double T)
{
    double t = T / 1000;
    return 24.99735 + 55.18696 * t - 33.69137 * t * t + 7.948387 * t * t * t - 0.136638 / (t * t);
}
static double haas_fisher(double T)
{
    return 87.82 - 2.644e-3 * T + 7.064e5 / (T * T) + 1e-7 * T * T - 998.86 / sqrt(T);
}
static double nasa7(double T)
{
    return T < 1000 ? RU * (3.298677 + 1.4082404e-3 * T - 3.963222e-6 * T * T + 5.641515e-9 * pow(T, 3) -
                            2.444854e-12 * pow(T, 4))
                    : RU * (2.92664 + 1.4879768e-3 * T - 5.68476e-7 * T * T + 1.0097038e-10 * pow(T, 3) -
                            6.753351e-15 * pow(T, 4));
}
static double aly_lee(double T)
{
    return 29.37 + 34.54 * square((1428 / T) / sinh(1428 / T)) + 26.4 * square((588 / T) / cosh(588 / T));
}
static double jaeschke_schley(double T)
{
    return RU *
           (4.00088 + 0.76315 * square((820.659 / T) / sinh(820.659 / T)) +
            0.0046 * square((178.41 / T) / cosh(178.41 / T)) + 8.74432 * square((1062.82 / T) / sinh(1062.82 / T)) -
            4.46921 * square((1090.53 / T) / cosh(1090.53 / T)));
}
static double wilhoit_shape(double T, double low, double high, double scale, const double *a)
{
    double y = T / (T + scale);
    return low + (high - low) * y * y * (1 + (y - 1) * (a[0] + a[1] * y + a[2] * y * y + a[3] * y * y * y));
}
static double wilhoit(double T)
{
    return wilhoit_shape(T, 33.258, 108.088, 500, (const double[]){0.3, -1.2, 2.5, -1.1});
}
static double vdi(double T)
{
    return RU * wilhoit_shape(T, 3.5385, 2.1, 432.2027, (const double[]){-8.1, 33.0, -50.0, 27.0});
}
static double einstein(double T, double u, double theta)
{
    double x = theta / T;
    return u * x * x * exp(x) / square(exp(x) - 1);
}
static double planck_einstein(double T)
{
    return RU * (3.5 + einstein(T, 1.012941, 3364.011) + einstein(T, 0.5, 1200.5));
}
/* Btu(IT)/lb and degR, M = 28.014 */
static double passut_danner(double T)
{
    double t = T * 1.8;
    return 4.1868 * 28.014 * (0.2548 - 2 * 1.664e-5 * t + 3 * 0.0153e-6 * t * t - 4 * 0.00031e-10 * t * t * t);
}
static double written(double T)
{
    return 25.5 + 13.6e-3 * T - 42.6e-7 * T * T;
}

static const struct form_row forms[] = {
    {"constant", 3, "name;mine~M;28.014;g/mol~form;constant;~A;1.04;kJ/kg-K", constant, 250, 1500},
    {"row cp", 3, "M;28.014;g/mol~cp;1.04;kJ/kg-K", constant, 250, 1500},
    {"cubic", 3,
     "label;value;unit~name;N2 of an old sheet~MW;28.014;~heat capacity form;polynomial;J/mol-K~A;31.15;~B;-1.357e-2;~"
     "C;2.68e-5;~D;-1.168e-8;~Tmin;273;K~Tmax;1500;K",
     cubic, 273, 1500},
    {"printed powers", 3,
     "M;28.014;~form;cubic;~cp unit;J/mol-K;~A;31.15;~10^2 B;-1.357;~C x "
     "10^5;2.68;~D·10⁸;-1.168;~T;K;~from;0;°C~to;1000;°C",
     cubic, 273.15, 1273.15},
    {"further powers", 3,
     "M;28.014~form;polynomial~cp unit;J/mol-K~a0;31.15~1000 a1;-13.57~1e5 a2;2.68~a3/10^-8;-1.168", cubic, 273, 1500},
    {"own units", 3,
     "M;28.014;g/mol~form;polynomial;~A;31.15;J/(mol K)~B;-13.57;kJ/(kmol K2) 0.001~from;273;K~to;1500;K", NULL, 0, 0},
    {"coefficient units", 3,
     "M;28.014;g/mol~form;polynomial;~A;31.15;J/(mol K)~B;-1.357e-2;kJ/(kmol K2)~C;2.68e-5;J/(mol "
     "K3)~D;-1.168e-8;J/(mol "
     "K4)~from;273;K~to;1500;K",
     cubic, 273, 1500},
    {"over R", 3,
     "M;28.014;~form;polynomial;R~A;3.539;~10^3 B;-0.261;~10^5 C;0.007;~10^8 D;0.157;~10^11 "
     "E;-0.099;~F;1e-16;~G;1e-20;~"
     "from;50;~to;1000;",
     sextic, 50, 1000},
    {"thousands", 3, "M;28.014;~form;polynomial;~cp unit;J/mol-K;~T unit;T/1000;~A;31.15;~B;-13.57;~C;26.8;~D;-11.68;",
     cubic, 273, 1500},
    {"°C", 3,
     "M;28.014;~form;polynomial;~cp unit;kJ/mol-°C;~T in;°C;~10^3 A;29.00;~10^5 B;0.2199;~10^8 C;0.5723;~10^12 "
     "D;-2.871;~from;0;~to;1500;",
     in_celsius, 273.15, 1773.15},
    {"°F", 3, "M;28.014;~form;polynomial;~cp unit;Btu/lbmol-°F;~T in;°F;~A;6.9;~B;3e-4;~C;2e-7;~from;0;°F~to;2000;°F",
     in_fahrenheit, 255.4, 1366},
    {"°R", 3,
     "M;28.014;~form;A+BT+CT²+D/T²;~cp unit;Btu/lbmol-R;~T in;°R;~A;6.3;~B;8e-4;~D;2e4;~from;500;°R~to;3000;°R",
     in_rankine, 280, 1660},
    {"Maier-Kelley", 2, "M;28.014~form;Maier-Kelley~A;28.58~10^3 B;3.77~10^-5 D;-0.50~from;298~to;2000", maier_kelley,
     298, 2000},
    {"Maier-Kelley, C", 2, "M;28.014~form;A + B T + C/T^2~a;28.58~b;3.77e-3~c;-50000~range;298 to 2000 K", maier_kelley,
     298, 2000},
    {"four, D", 2,
     "name;CO2~form;A+BT+CT^2+D/T^2~cp unit;R~A;5.457~10^3 B;1.045~10^6 C;0~10^-5 D;-1.157~from;298~to;2000", four, 298,
     2000},
    {"four, C", 2, "name;CH4~form;four constants~cp unit;R~A;1.702~10^3 B;9.081~10^6 C;-2.164~from;298~to;1500",
     four_with_C, 298, 1500},
    {"Shomate", 2,
     "formula;CO2~form;Shomate~A;24.99735~B;55.18696~C;-33.69137~D;7.948387~E;-0.136638~F;-403.6075~G;228.2431~H;-393."
     "5224~"
     "from;298~to;1200",
     shomate, 298, 1200},
    {"Shomate, T/1000", 2,
     "formula;CO2~form;Shomate~T unit;T/1000~cp "
     "unit;J/mol-K~A;24.99735~B;55.18696~C;-33.69137~D;7.948387~E;-0.136638~from;298~to;1200",
     shomate, 298, 1200},
    {"Haas-Fisher", 2, "M;44.01~form;Haas-Fisher~A;87.82~B;-2.644e-3~D;7.064e5~C;1e-7~G;-998.86~from;298~to;1800",
     haas_fisher, 298, 1800},
    {"NASA 7", 4,
     "name;nitrogen;;~form;NASA 7;;~a1;2.92664;3.298677;~a2;1.4879768e-3;1.4082404e-3;~a3;-5.68476e-7;-3.963222e-6;~"
     "a4;1.0097038e-10;5.641515e-9;~a5;-6.753351e-15;-2.444854e-12;~a6;-922.7977;-1020.9;~a7;5.980528;3.950372;~"
     "from;1000;300;K~to;5000;1000;K",
     nasa7, 300, 5000},
    {"Aly-Lee", 3,
     "M;44.01;kg/kmol~form;Aly-Lee;~cp "
     "unit;J/kmol-K;~C1;0.2937e5;~C2;0.3454e5;~C3;1428;K~C4;0.264e5;~C5;588;~from;50;~to;5000;",
     aly_lee, 50, 5000},
    {"Jaeschke-Schley", 2,
     "name;CH4~form;Jaeschke-Schley~B;4.00088~C;0.76315~D;820.659~E;0.0046~F;178.41~G;8.74432~H;1062.82~I;-4.46921~J;"
     "1090.53~"
     "from;100~to;1000",
     jaeschke_schley, 100, 1000},
    {"Wilhoit", 3,
     "M;30;~form;Wilhoit;J/"
     "mol-K~Cp0;33.258;~Cpinf;108.088;~B;500;K~a0;0.3;~a1;-1.2;~a2;2.5;~a3;-1.1;~from;100;~to;3000;",
     wilhoit, 100, 3000},
    {"VDI", 2, "name;N2~form;VDI~A;432.2027~B;3.5385~C;2.1~D;-8.1~E;33~F;-50~G;27~from;200~to;1500", vdi, 200, 1500},
    {"Planck-Einstein", 2,
     "name;N2~form;Planck-Einstein~c0;3.5~u1;1.012941~θ1;3364.011~u2;0.5~theta 2;1200.5~from;60~to;2000",
     planck_einstein, 60, 2000},
    {"Passut-Danner", 3,
     "M;28.014;~form;Passut-Danner;~cp unit;Btu/lb;~T unit;°R;~A;-0.656;~B;0.2548;~10^5 C;-1.664;~10^6 D;0.0153;~10^10 "
     "E;-0.00031;~F;0;~from;300;~to;2700;",
     passut_danner, 170, 1500},
    {"written", 2, "M;30~form;A + B T + C T^2~cp unit;J/mol-K~A;25.5~10^3 B;13.6~10^7 C;-42.6~from;298~to;1000",
     written, 298, 1000},
    {"written in row cp", 2, "M;30~cp;25.5 + 13.6e-3 T - 42.6e-7 T^2 J/mol-K~from;298~to;1000", written, 298, 1000},
};

static double integrand_h(double T, void *row)
{
    return ((const struct form_row *)row)->cp(T);
}

static double integrand_s(double T, void *row)
{
    return ((const struct form_row *)row)->cp(T) / T;
}

/* Split where the intervals of the NASA 7 card meet, as a quadrature does not like corners. */
static double quadrature(double (*of)(double, void *), const struct form_row *row, double from, double to)
{
    struct form_row own = *row; /* the quadrature hands it on as not const */
    gsl_function f = {of, &own};
    double sum = 0, error, ends[] = {from, to > 1000 && from < 1000 ? 1000 : to, to};
    gsl_integration_workspace *space = gsl_integration_workspace_alloc(200);
    for (int i = 0; i < 2; i++)
        if (ends[i] < ends[i + 1]) {
            double part = 0;
            gsl_integration_qag(&f, ends[i], ends[i + 1], 0, 1e-12, 200, GSL_INTEG_GAUSS31, space, &part, &error);
            sum += part;
        }
    gsl_integration_workspace_free(space);
    return sum;
}

static void check_form(const struct form_row *row)
{
    const struct gas_choice *choice = case_block(row->columns, row->card);
    double warm = row->from + 0.37 * (row->to - row->from);
    if (!choice)
        return;
    for (int i = 0; i <= 10; i++) {
        double T = row->from + i * (row->to - row->from) / 10;
        if (T != 1000)
            check_close(row->id, gas_cp(&choice->gas, T).value, row->cp(T), 1e-11, 0);
    }
    check_close(row->id, gas_dh(&choice->gas, row->from, row->to).value,
                quadrature(integrand_h, row, row->from, row->to), 1e-10, 0);
    check_close(row->id, gas_ds_isobaric(&choice->gas, row->from, row->to).value,
                quadrature(integrand_s, row, row->from, row->to), 1e-10, 0);
    check_close(row->id, gas_dh(&choice->gas, row->from, warm).value, quadrature(integrand_h, row, row->from, warm),
                1e-10, 0);
    gas_choice_release(choice);
}

static void every_form_against_quadrature(void)
{
    for (size_t i = 0; i < sizeof forms / sizeof *forms; i++)
        if (forms[i].cp)
            check_form(&forms[i]);
        else
            case_block_refused(forms[i].columns, forms[i].card, "Check");
}

/* McBride, Zehe & Gordon, NASA/TP-2002-211556: nitrogen, typed in from the publication, against the gas by name. */
static void name_card_and_formula_agree(void)
{
    const struct gas_choice *name = case_text("N2");
    const struct gas_choice *card = case_block(
        5,
        "gas;N2;;;~form;NASA 9;;;R~a1;2.210371497e4;5.87712406e5;8.310139160e8;~a2;-3.818461820e2;-2.239249073e3;"
        "-6.420733540e5;~a3;6.08273836;6.06694922;2.020264635e2;~a4;-8.530914410e-3;-6.139685500e-4;-3.065092046e-2;~"
        "a5;1.384646189e-5;1.491806679e-7;2.486903333e-6;~a6;-9.625793620e-9;-1.923105485e-11;-9.705954110e-11;~"
        "a7;2.519705809e-12;1.061954386e-15;1.437538881e-15;~b1;7.10846086e2;1.283210415e4;4.938707040e6;~"
        "b2;-1.076003744e1;-1.586640027e1;-1.672099740e3;~from;200;1000;6000;K~to;1000;6000;20000;K");
    const struct gas_choice *formula =
        case_text("N2 | cp = 8.314510 (2.210371497e4/T^2 - 3.818461820e2/T + 6.08273836 - 8.530914410e-3 T "
                  "+ 1.384646189e-5 T^2 - 9.625793620e-9 T^3 + 2.519705809e-12 T^4) J/mol-K, 200 to 1000 K");
    for (double T = 210; T < 20000; T *= 1.3) {
        check_close("card", gas_cp(&card->gas, T).value, gas_cp(&name->gas, T).value, 1e-12, 0);
        check_close("card", gas_ds_isobaric(&card->gas, 298.15, T).value, gas_ds_isobaric(&name->gas, 298.15, T).value,
                    1e-12, 0);
        if (T <= 1000)
            check_close("formula", gas_dh(&formula->gas, 298.15, T).value, gas_dh(&name->gas, 298.15, T).value, 1e-12,
                        0);
    }
    check_close("M", card->gas.molar_mass, name->gas.molar_mass, 0, 0);
    check_true("a part from a card", card->part_count == 1 && !card->part->species);
    gas_choice_release(name);
    gas_choice_release(card);
    gas_choice_release(formula);
}

static void constants_of_the_card(void)
{
    const struct gas_choice *choice = case_block(3, "name;old air;~R;0.287;kJ/kg-K~k;1.4;~source;sheet of 1987;");
    check_text("label", choice->label, "old air");
    check_text("source", choice->source, "sheet of 1987");
    check_close("M", choice->gas.molar_mass, RU / 287, 1e-15, 0);
    check_close("cp", gas_cp(&choice->gas, 700).value, 3.5 * RU, 1e-14, 0);
    gas_choice_release(choice);
    choice = case_block(3, "name;N2;~M;28;~rule;k = 1.4, R = 8.314 J/mol-K;");
    check_close("rules on a card", gas_cp(&choice->gas, 700).value, 3.5 * 8.314, 1e-14, 0);
    gas_choice_release(choice);
    choice = case_block(2, "name;N2~T in;°C~cp;29 + 1e-3 T J/mol-K~range;0 to 100");
    check_close("range in the unit of T", gas_range_of(&choice->gas).T_from, 273.15, 1e-15, 0);
    check_close("T in the unit of T", gas_cp(&choice->gas, 373.15).value, 29.1, 1e-14, 0);
    gas_choice_release(choice);
    choice = case_block(3, "formula;CO2;~rule;cp at 25 °C;");
    const struct gas_choice *CO2 = case_text("CO2 | cp at 25 °C");
    check_close("rule on a card", gas_cp(&choice->gas, 700).value, gas_cp(&CO2->gas, 900).value, 1e-15, 0);
    gas_choice_release(choice);
    gas_choice_release(CO2);
    choice = case_block(2, "name;no heat~M;28");
    check_int("no heat capacity", gas_cp(&choice->gas, 300).status, GAS_NO_HEAT_CAPACITY);
    gas_choice_release(choice);
}

static const struct {
    size_t columns;
    const char *card, *part;
} refused[] = {
    {2, "M;28~form;cubicle~A;29", "is not a form known"},
    {2, "M;28~form;cubicle~A;29", "Aly-Lee"},
    {2, "M;28~A;29", "no form"},
    {2, "M;28~form;Shomate~A;29~B;1~C;1~D;1", "constant E is missing"},
    {2, "M;28~form;polynomial~A;29~C;1e-6", "constant B is missing"},
    {2, "M;28~form;polynomial~B;1e-3", "constant A is missing"},
    {2, "M;28~form;polynomial~A;29~B;", ""},
    {2, "M;28~form;Aly-Lee~A;29~B;1~C;1~D;1", "constant E is missing"},
    {2, "M;28~form;polynomial~A;29~K2;1", "does not belong"},
    {2, "M;28~form;Maier-Kelley~A;29~B;1e-3~C;1~D;1", "does not belong"},
    {2, "M;28~form;polynomial~A;29~A;30", "twice"},
    {2, "M;28~form;polynomial~A;29~from;500~to;300", "reversed"},
    {2, "M;28~form;polynomial~A;29~from;500", "no \"to\""},
    {2, "M;28~form;polynomial~A;29~from;-5~to;300", "absolute zero"},
    {2, "M;28~form;polynomial~A;29~B;-0.02~from;300~to;2000", "must be above R"},
    {2, "M;28~form;polynomial~A;-29", "must be above R"},
    {2, "M;28~form;polynomial~A;abc", "needs a number"},
    {2, "M;28~form;polynomial~A;1e308~B;1e308~from;300~to;1000", "finite"},
    {2, "form;polynomial~A;29", "molar mass is missing"},
    {3, "form;polynomial;~A;1.04;kJ/kg-K", "molar mass is needed"},
    {3, "M;28;~form;polynomial;~A;29;kg", "where"},
    {3, "M;28;~form;polynomial;~A;29;foo", "is not a unit known"},
    {3, "M;28;~form;polynomial;~A;29;J/mol-K~B;3;J/mol-K3", "has the unit"},
    {3, "M;28;kg/s~form;polynomial;~A;29;", "not a molar mass"},
    {3, "M;-28;~form;polynomial;~A;29;", "no molar mass of a gas"},
    {2, "M;28~form;polynomial~cp unit;kJ~A;29", "not a unit of a heat capacity"},
    {2, "M;28~form;polynomial~cp unit;kJ/kg~A;29", "that of an energy"},
    {2, "M;28~form;polynomial~T unit;kg~A;29", "not a unit of temperature"},
    {2, "M;28~form;Aly-Lee~T in;°C~A;29~B;30~C;1000~D;20~E;600", "needs T in K"},
    {2, "M;28~form;Maier-Kelley~T in;°C~A;29~B;1e-3~D;1e5", "only a polynomial"},
    {2, "M;28~form;Wilhoit~Cp0;30~Cpinf;60~B;-5~a0;1~a1;1~a2;1~a3;1", "above zero"},
    {2, "M;28~form;polynomial~A;29~colour;blue", "not a label known"},
    {2, "M;28~form;polynomial~A;29~;5", "no label"},
    {2, "M;28~cp;29~form;polynomial~A;29", "two ways"},
    {2, "M;28~cp;29~k;1.4", "both cp and k"},
    {2, "M;28~k;1.4~molar mass;29", "twice"},
    {2, "M;28~k;1.4~gamma;1.3", "twice"},
    {2, "M;28~form;polynomial~A;29~from;300", "column 1 of its values has no \"to\""},
    {3, "M;28;~form;cubic;~A;29;J/mol-°C~B;1e-3;", "not certain what T is"},
    {2, "M;28~form;cubic~cp unit;Btu/lbmol-F~A;6.9~B;1e-3", "not certain what T is"},
    {2, "M;28~cp;1.04", "without a unit"},
    {2, "M;28~k;0.4", "above 1"},
    {4, "M;28;;~form;NASA 7;;~a1;3.5;;", "constant a2 is missing"},
    {4, "M;28;;~form;constant;;~A;29;29;~from;300;900;~to;800;1500;", "must meet"},
    {4, "M;28;;~form;constant;;~A;29;39;~from;300;800;~to;800;1500;", "jumps by"},
    {4, "M;28;;~form;constant;;~A;29;;~from;300;800;~to;800;1500;", "interval 2"},
    {4, "M;28;;~form;constant;;~A;29;29;", "no \"from\""},
    {4, "M;28;g/mol;~form;constant;;~A;29;;5", "behind the unit column"},
    {3, "M;28;~rule;cp = 29;kJ/kg-K", "write the unit there"},
    {2, "M;28~form;A + B/(1 + T)~A;29~B;1", "divides by a sum"},
    {2, "M;28~form;A + Q T~A;29", "stands where"},
};

static void wrong_cards_are_refused(void)
{
    for (size_t i = 0; i < sizeof refused / sizeof *refused; i++)
        if (refused[i].part[0])
            case_block_refused(refused[i].columns, refused[i].card, refused[i].part);
        else
            gas_choice_release(case_block(refused[i].columns, refused[i].card));
}

/* Random cells under the labels of cards: an answer or a sentence, never a crash. */
static void random_cards(void)
{
    static const char *const label[] = {"name",   "M",    "form", "cp unit", "T unit", "A",      "B",
                                        "10^3 C", "D",    "from", "to",      "a1",     "a2",     "cp",
                                        "k",      "rule", "B/5",  "θ1",      "R, ",    "E x 10^"};
    static const char *const value[] = {"N2", "28",      "polynomial", "R",     "T/1000", "-3",      "1e300",
                                        "",   "abc",     "0",          "300 K", "NASA 9", "Aly-Lee", "Wilhoit",
                                        "K",  "kJ/kg-K", "1e-5",       "VDI",   "A+T",    "Check 1"};
    check_seed(11);
    for (int i = 0; i < 3000; i++) {
        char card[1000] = "";
        for (int row = 0; row < 8; row++) {
            size_t used = strlen(card);
            snprintf(card + used, sizeof card - used, "%s%s;%s;%s", row ? "~" : "", label[(size_t)check_random(0, 20)],
                     value[(size_t)check_random(0, 20)],
                     check_random(0, 1) < 0.5 ? "" : value[(size_t)check_random(0, 20)]);
        }
        struct gas_refusal refusal = {0};
        static struct case_range range;
        const struct gas_choice *choice = gas_choose(case_range(&range, 3, card), &refusal);
        if ((choice != NULL) == refusal.made)
            check_true(card, false);
        gas_choice_release(choice);
    }
    check_true("random cards", true);
}

const struct test_suite suite_card = {"card", (const struct test_case[]){{"forms", every_form_against_quadrature},
                                                                         {"agreement", name_card_and_formula_agree},
                                                                         {"constants", constants_of_the_card},
                                                                         {"wrong cards", wrong_cards_are_refused},
                                                                         {"random", random_cards},
                                                                         {0}}};
