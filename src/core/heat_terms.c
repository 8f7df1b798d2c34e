#include "heat_terms.h"

#include <math.h>

#include "figures.h"

/* A warming step, with what all the integrals share. */
struct step {
    double T1, T2;
    double rise;      /* T2 - T1 > 0 */
    double log_ratio; /* ln(T2/T1) */
};

/* The two integrals of one term: of cp dT and of cp/T dT. */
struct integrals {
    double dh, ds;
};

/* ---- T^exponent ------------------------------------------------------------------------------------------ */

/* Integral of T^(m - 1): (T2^m - T1^m)/m, which is the logarithm at m = 0. */
static double power_integral(double m, const struct step *step)
{
    if (m == 0)
        return step->log_ratio;
    return pow(step->T1, m) * expm1(m * step->log_ratio) / m;
}

/* ---- (x/sinh x)^2 and (x/cosh x)^2, x = scale/T ---------------------------------------------------------- */

/*
 * With side = +1 for sinh and -1 for cosh, G(x) = 1 - side e^(-2x) is 2 e^(-x) sinh x or 2 e^(-x) cosh x: nothing
 * overflows however cold the gas, and expm1 keeps the digits of sinh at small x.
 */
static double damped(int side, double x)
{
    return side > 0 ? -expm1(-2 * x) : 1 + exp(-2 * x);
}

static double hyperbolic_cp(int side, double scale, double T)
{
    double x = fabs(scale) / T;
    if (x == 0)
        return side > 0 ? 1 : 0;
    if (x > 700)
        return 0;
    double root = 2 * x * exp(-x) / damped(side, x);
    return root * root;
}

/*
 * x1 > x2 belong to the cold and the warm end, delta = x1 - x2, E = 1 - e^(-2 delta), q = e^(-2 x2)/G(x2).
 *   dh/scale = coth x2 - coth x1 (or tanh x1 - tanh x2) = 2 q E/G(x1)
 *   ds       = 2 q (x1 E/G(x1) - delta) + side ln(1 + side q E)
 * The bracket of ds is kept in two forms, each without cancellation on its own side of delta = 1.
 */
static struct integrals hyperbolic_integrals(int side, double scale, const struct step *step)
{
    enum { FAR = 1000000 }; /* an x this large is frozen; the cap keeps infinity out of the products */
    scale = fabs(scale);
    double x1 = fmin(scale / step->T1, FAR), x2 = scale / step->T2;
    if (x2 == 0)
        return side > 0 ? (struct integrals){step->rise, step->log_ratio} : (struct integrals){0, 0};
    if (x2 > 372)
        return (struct integrals){0, 0};
    double delta = fmin(scale / step->T1 * (step->rise / step->T2), FAR);
    double E = -expm1(-2 * delta), G1 = damped(side, x1), G2 = damped(side, x2);
    double q = exp(-2 * x2) / G2;
    double bracket = delta < 1 ? x1 * E / G1 - delta : (x2 * E - delta * exp(-2 * delta) * G2) / G1;
    return (struct integrals){2 * scale * q * E / G1, 2 * q * bracket + side * log1p(side * q * E)};
}

/* ---- y^k, y = T/(T + scale) ------------------------------------------------------------------------------ */

static double ratio_cp(double scale, double k, double T)
{
    double y = T / (T + scale), value = 1;
    if (!(T + scale > 0) || k < 0 || k != floor(k) || k > 100)
        return NAN;
    for (int i = 0; i < (int)k; i++)
        value *= y;
    return value;
}

/*
 * T small beside scale: ds = sum over m >= k of (y2^m - y1^m)/m and dh = scale sum of (m - k + 1)(y2^(m+1) -
 * y1^(m+1))/(m + 1), the series of y^(k-1)/(1 - y) and y^k/(1 - y)^2; the differences of powers with y2 - y1 taken out.
 */
static struct integrals ratio_series(double scale, int k, double y1, double y2, double gap)
{
    enum { TERMS = 60 }; /* 0.4^60 = 1e-24 */
    struct integrals sum = {0, 0};
    double quotient = 1, low = 1; /* (y2^m - y1^m)/(y2 - y1) and y1^(m - 1) at m = 1 */
    for (int m = 1; m < k + TERMS; m++) {
        low *= y1;
        double next = y2 * quotient + low;
        if (m >= k) {
            sum.ds += quotient / m;
            sum.dh += (m - k + 1) * next / (m + 1);
        }
        quotient = next;
    }
    return (struct integrals){scale * gap * sum.dh, gap * sum.ds};
}

/*
 * Since dT = scale dy/(1 - y)^2 and dT/T = dy/(y (1 - y)), with J_k the integral of y^k dT/T and I_k that of y^k dT:
 *   J_0 = ln(T2/T1), J_1 = ln((T2 + scale)/(T1 + scale)), J_k = J_(k-1) - (y2^(k-1) - y1^(k-1))/(k - 1)
 *   I_0 = T2 - T1, I_k = I_(k-1) - scale J_k
 */
static struct integrals ratio_integrals(double scale, double exponent, const struct step *step)
{
    double from = step->T1 + scale, to = step->T2 + scale;
    if (!(from > 0) || exponent < 0 || exponent != floor(exponent) || exponent > 100)
        return (struct integrals){NAN, NAN};
    int k = (int)exponent;
    if (k == 0)
        return (struct integrals){step->rise, step->log_ratio};
    double y1 = step->T1 / from, y2 = step->T2 / to, gap = scale / from * (step->rise / to);
    if (y2 < 0.4)
        return ratio_series(scale, k, y1, y2, gap);
    double J = log1p(step->rise / from), I = step->rise - scale * J;
    double quotient = 1, low = 1;
    for (int m = 1; m < k; m++) {
        J -= gap * quotient / m;
        I -= scale * J;
        low *= y1;
        quotient = y2 * quotient + low;
    }
    return (struct integrals){I, J};
}

/* ---- the sum of the terms -------------------------------------------------------------------------------- */

static double term_cp(const struct gas_term *term, double T)
{
    switch (term->kind) {
    case GAS_TERM_POWER:
        return pow(T, term->exponent);
    case GAS_TERM_SINH:
        return hyperbolic_cp(+1, term->scale, T);
    case GAS_TERM_COSH:
        return hyperbolic_cp(-1, term->scale, T);
    case GAS_TERM_RATIO:
        return ratio_cp(term->scale, term->exponent, T);
    }
    return NAN;
}

static struct integrals term_integrals(const struct gas_term *term, const struct step *step)
{
    switch (term->kind) {
    case GAS_TERM_POWER:
        return (struct integrals){power_integral(term->exponent + 1, step), power_integral(term->exponent, step)};
    case GAS_TERM_SINH:
        return hyperbolic_integrals(+1, term->scale, step);
    case GAS_TERM_COSH:
        return hyperbolic_integrals(-1, term->scale, step);
    case GAS_TERM_RATIO:
        return ratio_integrals(term->scale, term->exponent, step);
    }
    return (struct integrals){NAN, NAN};
}

static struct step step_of(double T1, double T2)
{
    return (struct step){T1, T2, T2 - T1, log_ratio(T2, T1)};
}

double gas_interval_cp(const struct gas_interval *interval, double T)
{
    const double *c = interval->power;
    double cp = (c[0] / T + c[1]) / T + (c[2] + T * (c[3] + T * (c[4] + T * (c[5] + T * c[6]))));
    for (size_t i = 0; i < interval->term_count; i++)
        cp += interval->term[i].factor * term_cp(&interval->term[i], T);
    return cp;
}

/* The dense powers: T2^k - T1^k = (T2 - T1) sum_k, sum_k = T2 sum_(k-1) + T1^(k-1), so the rise stands outside. */
double gas_interval_dh(const struct gas_interval *interval, double T1, double T2)
{
    const double *c = interval->power;
    struct step step = step_of(T1, T2);
    double square = T1 * T1, sum2 = T1 + T2, sum3 = T2 * sum2 + square;
    double sum4 = T2 * sum3 + square * T1, sum5 = T2 * sum4 + square * square;
    double dh = c[0] / T1 / T2 + c[2] + c[3] * sum2 / 2 + c[4] * sum3 / 3 + c[5] * sum4 / 4 + c[6] * sum5 / 5;
    dh = step.rise * dh + c[1] * step.log_ratio;
    for (size_t i = 0; i < interval->term_count; i++)
        dh += interval->term[i].factor * term_integrals(&interval->term[i], &step).dh;
    return dh;
}

double gas_interval_ds(const struct gas_interval *interval, double T1, double T2)
{
    const double *c = interval->power;
    struct step step = step_of(T1, T2);
    double product = T1 * T2, sum2 = T1 + T2, sum3 = T2 * sum2 + T1 * T1, sum4 = T2 * sum3 + T1 * T1 * T1;
    double ds =
        (c[0] * sum2 / (2 * product) + c[1]) / product + c[3] + c[4] * sum2 / 2 + c[5] * sum3 / 3 + c[6] * sum4 / 4;
    ds = step.rise * ds + c[2] * step.log_ratio;
    for (size_t i = 0; i < interval->term_count; i++)
        ds += interval->term[i].factor * term_integrals(&interval->term[i], &step).ds;
    return ds;
}
