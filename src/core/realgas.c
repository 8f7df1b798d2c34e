#include <gasleaf/realgas.h>

#include <math.h>
#include <stdbool.h>

#include <gasleaf/gas.h>

#include "figures.h"
#include "root.h"

/* Constants of the two fluids, Lee & Kesler (1975), table 3. */
struct fluid {
    double b1, b2, b3, b4, c1, c2, c3, c4, d1, d2, beta, gamma;
};

/* clang-format off */
static const struct fluid simple_fluid = {
    0.1181193, 0.265728, 0.154790, 0.030323,
    0.0236744, 0.0186984, 0.0,     0.042724,
    0.155488e-4, 0.623689e-4, 0.65392, 0.060167,
};
static const struct fluid reference_fluid = {
    0.2026579, 0.331511, 0.027655, 0.203488,
    0.0313385, 0.0503618, 0.016901, 0.041577,
    0.48736e-4, 0.0740336e-4, 1.226, 0.03754,
};
/* clang-format on */

#define REFERENCE_OMEGA 0.3978 /* n-octane */

enum { NEWTON_STEPS = 100 };
#define DENSITY_MAX 14.0 /* denser than either fluid at Tr = 0.3, Pr = 10 */

/* One isotherm of one fluid in the reduced density y = 1/Vr. */
struct isotherm {
    double Tr, B, C, D, E; /* E: c4/Tr^3 */
    double beta, gamma;
};

struct slope_point {
    double P, slope; /* reduced pressure and its derivative by y */
    double Z;
};

static struct isotherm isotherm_of(const struct fluid *fluid, double Tr)
{
    double t = 1 / Tr;
    return (struct isotherm){
        .Tr = Tr,
        .B = fluid->b1 - t * (fluid->b2 + t * (fluid->b3 + t * fluid->b4)),
        .C = fluid->c1 - t * (fluid->c2 - t * t * fluid->c3),
        .D = fluid->d1 + t * fluid->d2,
        .E = fluid->c4 * t * t * t,
        .beta = fluid->beta,
        .gamma = fluid->gamma,
    };
}

static struct slope_point isotherm_at(const struct isotherm *at, double y)
{
    double y2 = y * y, y5 = y2 * y2 * y, g = at->gamma * y2;
    double bend = at->E * y2 * exp(-g);
    double Z = 1 + at->B * y + at->C * y2 + at->D * y5 + bend * (at->beta + g);
    double y_dZ = at->B * y + 2 * at->C * y2 + 5 * at->D * y5 + 2 * bend * ((at->beta + g) * (1 - g) + g);
    return (struct slope_point){at->Tr * y * Z, at->Tr * (Z + y_dZ), Z};
}

/* Z at density y: from the series where it is near 1, from P where the series would lose digits. */
static double z_at(const struct isotherm *at, double Pr, double y)
{
    return y < 0.5 ? isotherm_at(at, y).Z : Pr / (at->Tr * y);
}

/* Above this density there is no vapour below Tr = 1: between the two turning points of both fluids' isotherms. */
static double vapour_density_max(double Tr)
{
    return Tr < 0.8 ? 1.35 : 3.44;
}

/* The vapour root below Tr = 1; NAN when the isotherm turns before Pr. Left of its turning point the isotherm is
 * concave, so that Newton from the left never passes the root. */
static double vapour_density(const struct isotherm *at, double Pr)
{
    double y = Pr / at->Tr, most = vapour_density_max(at->Tr);
    for (int step = 0; step < NEWTON_STEPS && y < most; step++) {
        struct slope_point now = isotherm_at(at, y);
        if (!(now.slope > 0))
            break;
        double move = (Pr - now.P) / now.slope;
        y += move;
        if (fabs(move) <= 1e-9 * y)
            return y < most ? y : NAN;
    }
    return NAN;
}

/* The density where the vapour side of the isotherm turns: the slope falls steadily up to it. */
static double turning_density(const struct isotherm *at)
{
    double low = 0, high = vapour_density_max(at->Tr);
    for (int step = 0; step < 60; step++) {
        double middle = 0.5 * (low + high);
        if (isotherm_at(at, middle).slope > 0)
            low = middle;
        else
            high = middle;
    }
    return low;
}

/* The largest root, from the dense side; above Tr = 1, where P rises steadily, the only one. */
static double dense_density(const struct isotherm *at, double Pr)
{
    double low = 0, high = DENSITY_MAX;
    double y = at->Tr < 1 ? DENSITY_MAX : fmin(Pr / at->Tr, DENSITY_MAX);
    for (int step = 0; step < NEWTON_STEPS; step++) {
        struct slope_point now = isotherm_at(at, y);
        if (now.P < Pr)
            low = y;
        else
            high = y;
        double next = y + (Pr - now.P) / now.slope;
        if (!(next >= low && next <= high))
            next = 0.5 * (low + high);
        if (fabs(next - y) <= 1e-9 * y)
            return next;
        y = next;
    }
    return y;
}

static double reduced_vapour_pressure(double Tr, double omega)
{
    double t2 = Tr * Tr, t6 = t2 * t2 * t2, l = log(Tr);
    double f0 = 5.92714 - 6.09648 / Tr - 1.28862 * l + 0.169347 * t6;
    double f1 = 15.2518 - 15.6875 / Tr - 13.4721 * l + 0.43577 * t6;
    return exp(f0 + omega * f1);
}

struct pair {
    double simple, reference; /* Z of the two fluids */
};

static double vapour_side(const struct isotherm *at, double Pr, double y)
{
    return isnan(y) ? isotherm_at(at, turning_density(at)).Z : z_at(at, Pr, y);
}

static struct pair pair_at(double Tr, double Pr, double omega)
{
    struct isotherm simple = isotherm_of(&simple_fluid, Tr), reference = isotherm_of(&reference_fluid, Tr);
    if (Tr < 1) {
        double ys = vapour_density(&simple, Pr), yr = vapour_density(&reference, Pr);
        if ((!isnan(ys) && !isnan(yr)) || Pr <= reduced_vapour_pressure(Tr, omega))
            return (struct pair){vapour_side(&simple, Pr, ys), vapour_side(&reference, Pr, yr)};
    }
    return (struct pair){z_at(&simple, Pr, dense_density(&simple, Pr)),
                         z_at(&reference, Pr, dense_density(&reference, Pr))};
}

static struct gas_result check_reduced(double Tr, double Pr, double omega)
{
    if (!isfinite(Tr))
        return gas_bad(GAS_NOT_FINITE, 1, Tr);
    if (!(Tr >= 0.3 && Tr <= 4))
        return gas_bad(GAS_OUTSIDE_DATA, 1, Tr);
    struct gas_result pressure = check_not_negative(2, Pr);
    if (pressure.status)
        return pressure;
    if (Pr > 10)
        return gas_bad(GAS_OUTSIDE_DATA, 2, Pr);
    if (!isfinite(omega))
        return gas_bad(GAS_NOT_FINITE, 3, omega);
    if (!(omega >= -1 && omega <= 2))
        return gas_bad(GAS_OUTSIDE_DATA, 3, omega);
    return gas_good(1);
}

struct gas_result gas_z_reduced(double Tr, double Pr, double omega)
{
    struct gas_result checked = check_reduced(Tr, Pr, omega);
    if (checked.status || Pr == 0)
        return checked;
    struct pair Z = pair_at(Tr, Pr, omega);
    return gas_good(Z.simple + omega / REFERENCE_OMEGA * (Z.reference - Z.simple));
}

struct gas_result gas_z0(double Tr, double Pr)
{
    return gas_z_reduced(Tr, Pr, 0);
}

struct gas_result gas_z1(double Tr, double Pr)
{
    struct gas_result checked = check_reduced(Tr, Pr, 0);
    if (checked.status)
        return checked;
    struct pair Z = Pr == 0 ? (struct pair){1, 1} : pair_at(Tr, Pr, 0);
    return gas_good((Z.reference - Z.simple) / REFERENCE_OMEGA);
}

struct gas_result gas_reduced_vapour_pressure(double Tr, double omega)
{
    struct gas_result checked = check_reduced(Tr, 0, omega);
    if (!checked.status && Tr > 1)
        checked = gas_bad(GAS_OUTSIDE_DATA, 1, Tr);
    if (checked.status) {
        checked.argument = checked.argument == 3 ? 2 : checked.argument;
        return checked;
    }
    return gas_good(reduced_vapour_pressure(Tr, omega));
}

/* The sum of x, or NAN when the parts cannot be mixed. */
static double sum_of(const struct gas_critical *part, const double *x, size_t count)
{
    double sum = 0;
    for (size_t i = 0; i < count; i++) {
        if (!(x[i] >= 0))
            return NAN;
        if (x[i] > 0 && !(part[i].T > 0 && part[i].P > 0 && isfinite(part[i].T + part[i].P + part[i].omega)))
            return NAN;
        sum += x[i];
    }
    return sum > 0 && isfinite(sum) ? sum : NAN;
}

struct gas_critical gas_critical_kay(const struct gas_critical *part, const double *x, size_t count)
{
    double sum = sum_of(part, x, count);
    struct gas_critical mean = {0, 0, 0};
    for (size_t i = 0; i < count && !isnan(sum); i++)
        if (x[i] > 0) {
            mean.T += x[i] / sum * part[i].T;
            mean.P += x[i] / sum * part[i].P;
            mean.omega += x[i] / sum * part[i].omega;
        }
    return isnan(sum) ? (struct gas_critical){NAN, NAN, NAN} : mean;
}

/* Their double sums over (Vj^1/3 + Vk^1/3)^3 fall apart into products of single sums of the powers of V^1/3, here with
 * the weight 1 for Vc and sqrt(Tc) for Vc Tc. */
struct gas_critical gas_critical_lee_kesler(const struct gas_critical *part, const double *x, size_t count)
{
    double sum = sum_of(part, x, count);
    double plain[4] = {0}, weighted[4] = {0}, omega = 0;
    if (isnan(sum))
        return (struct gas_critical){NAN, NAN, NAN};
    for (size_t i = 0; i < count; i++) {
        if (x[i] == 0)
            continue;
        double root = cbrt((0.2905 - 0.085 * part[i].omega) * GAS_R * part[i].T / part[i].P);
        double term = x[i] / sum, T_root = sqrt(part[i].T);
        omega += term * part[i].omega;
        for (int power = 0; power < 4; power++, term *= root) {
            plain[power] += term;
            weighted[power] += term * T_root;
        }
    }
    double V = (plain[0] * plain[3] + 3 * plain[1] * plain[2]) / 4;
    double T = (weighted[0] * weighted[3] + 3 * weighted[1] * weighted[2]) / (4 * V);
    return (struct gas_critical){T, (0.2905 - 0.085 * omega) * GAS_R * T / V, omega};
}

struct deviation {
    double Tr, omega, tolerance;
};

static double beyond_tolerance(const void *given, double Pr)
{
    const struct deviation *at = given;
    struct gas_result Z = gas_z_reduced(at->Tr, Pr, at->omega);
    return Z.status ? NAN : fabs(Z.value - 1) - at->tolerance;
}

static struct gas_result check_ideal(const struct gas_critical *critical, double T, double tolerance)
{
    const double figure[] = {critical->T, critical->P, T, tolerance};
    const int argument[] = {1, 1, 2, 3};
    for (int i = 0; i < 4; i++) {
        struct gas_result positive = check_positive(argument[i], figure[i]);
        if (positive.status)
            return positive;
    }
    struct gas_result checked = check_reduced(T / critical->T, 0, critical->omega);
    if (checked.status)
        return gas_bad(checked.status, checked.argument == 1 ? 2 : 1, checked.argument == 1 ? T : checked.figure);
    return checked;
}

struct gas_result gas_ideal_up_to(const struct gas_critical *critical, double T, double tolerance)
{
    struct gas_result checked = check_ideal(critical, T, tolerance);
    if (checked.status)
        return checked;
    const struct deviation at = {T / critical->T, critical->omega, tolerance};
    bool condenses = at.Tr < 1;
    double most = condenses ? fmin(reduced_vapour_pressure(at.Tr, at.omega), 10) : 10;
    double before = 0;
    for (int step = 1; step <= 100; step++) {
        double Pr = most * step / 100;
        if (beyond_tolerance(&at, Pr) > 0) {
            struct gas_result limit = root_between(beyond_tolerance, &at, before, Pr);
            limit.value *= critical->P;
            return limit;
        }
        before = Pr;
    }
    return gas_good(condenses && most < 10 ? most * critical->P : NAN);
}
