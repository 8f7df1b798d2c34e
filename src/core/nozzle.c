#include <math.h>
#include <stdbool.h>

#include <gasleaf/heat.h>
#include <gasleaf/vessel.h>

#include "figures.h"

/* Molar flow of a perfect gas through an isentropic nozzle is  C A P/sqrt(M R T) phi(P_down/P)  with
 *   choked    phi = sqrt(k) (2/(k + 1))^((k + 1)/(2 (k - 1)))
 *   unchoked  phi = sqrt(2 k/(k - 1)) r^(1/k) s,   s = sqrt(1 - r^((k - 1)/k))
 * (Shapiro, vol. 1, ch. 4). It chokes at s^2 = (k - 1)/(k + 1). */
static double choked_flow(double k)
{
    return sqrt(k) * pow(2 / (k + 1), (k + 1) / (2 * (k - 1)));
}

/* s for r = P_down/P, without losing digits where r is near 1. */
static double speed_measure(double k, double r)
{
    return r > 0 ? sqrt(-expm1((k - 1) / k * log(r))) : 1;
}

static double flow_function(double k, double r)
{
    double s = speed_measure(k, r);
    return s * s >= (k - 1) / (k + 1) ? choked_flow(k) : sqrt(2 * k / (k - 1)) * pow(r, 1 / k) * s;
}

/* ---- what is given ------------------------------------------------------------------------------------------- */

struct figure {
    double value;
    int argument;
};

static struct gas_result check_all_positive(const struct figure *figure, size_t count)
{
    for (size_t i = 0; i < count; i++) {
        struct gas_result checked = check_positive(figure[i].argument, figure[i].value);
        if (checked.status)
            return checked;
    }
    return gas_good(1);
}

static struct gas_result check_orifice(double P_down, double area, double coefficient, int first)
{
    const struct figure figures[] = {{area, first + 1}, {coefficient, first + 2}};
    struct gas_result checked = check_not_negative(first, P_down);
    if (!checked.status)
        checked = check_all_positive(figures, 2);
    if (!checked.status && coefficient > 1)
        return gas_bad(GAS_NOT_A_FRACTION, first + 2, coefficient);
    return checked;
}

/* gamma of a gas whose molar mass is known; the argument numbers of temperature and gas are handed in. */
static struct gas_result gamma_of(const struct gas *gas, double T, int argument, int gas_argument)
{
    struct gas_result checked = check_positive(gas_argument, gas->molar_mass);
    if (checked.status)
        return checked;
    struct gas_result k = gas_gamma(gas, T);
    if (k.status == GAS_NO_HEAT_CAPACITY)
        return gas_bad(k.status, gas_argument, NAN);
    if (k.status || !(k.value > 1 && isfinite(k.value)))
        return gas_bad(k.status ? k.status : GAS_OUTSIDE_DATA, argument, T);
    return k;
}

struct gas_result gas_nozzle_flow(const struct gas *gas, double P, double T, double P_down, double area,
                                  double coefficient)
{
    const struct figure upstream[] = {{P, 2}, {T, 3}};
    struct gas_result checked = check_all_positive(upstream, 2);
    if (!checked.status)
        checked = check_orifice(P_down, area, coefficient, 4);
    if (!checked.status && P_down > P)
        return gas_bad(GAS_WRONG_SIDE, 4, P_down);
    struct gas_result k = checked.status ? checked : gamma_of(gas, T, 3, 1);
    if (k.status)
        return k;
    return if_finite(coefficient * area * P / sqrt(gas->molar_mass * gas->R * T) * flow_function(k.value, P_down / P));
}

/* ---- the time a vessel takes --------------------------------------------------------------------------------- */

/* Positive nodes and weights of 16-point Gauss-Legendre quadrature, Abramowitz & Stegun, table 25.4. */
/* clang-format off */
static const double gauss[8][2] = {
    {0.09501250983763744019, 0.18945061045506849629}, {0.28160355077925891323, 0.18260341504492358887},
    {0.45801677765722738634, 0.16915651939500253819}, {0.61787624440264374845, 0.14959598881657673208},
    {0.75540440835500303390, 0.12462897125553387205}, {0.86563120238783174388, 0.09515851168249278481},
    {0.94457502307323257608, 0.06225352393864789286}, {0.98940093499164993260, 0.02715245941175409485},
};
/* clang-format on */

/* Integral of (1 - s^2)^exponent from s1 to s2. */
static double tail_integral(double exponent, double s1, double s2)
{
    double middle = 0.5 * (s1 + s2), half = 0.5 * (s2 - s1), sum = 0;
    for (int i = 0; i < 8; i++) {
        double low = middle - half * gauss[i][0], high = middle + half * gauss[i][0];
        sum += gauss[i][1] * (exp(exponent * log1p(-low * low)) + exp(exponent * log1p(-high * high)));
    }
    return half * sum;
}

/* Times below are in units of V/(C A sqrt(R T1/M)). Isothermal: dt = -dP/(P phi). Adiabatic, n ~ P^(1/k) and
 * T ~ P^((k-1)/k): dt = -dP/(k P phi) (P/P1)^-m with m = (k - 1)/(2 k). In s, dP/P = 2 k/(k - 1) s ds/(1 - s^2) and
 * the s of phi cancels. */
static double choked_time(double k, bool adiabatic, double P1, double from, double to)
{
    double m = (k - 1) / (2 * k);
    if (!adiabatic)
        return log(from / to) / choked_flow(k);
    return pow(from / P1, -m) * expm1(m * log(from / to)) / (m * k * choked_flow(k));
}

static double tail_time(double k, bool adiabatic, double P1, double P_down, double from, double to)
{
    double s_to = speed_measure(k, P_down / to), s_from = speed_measure(k, P_down / from);
    double exponent = -k / (k - 1), factor = sqrt(2 * k / (k - 1));
    if (adiabatic) {
        factor *= pow(P_down / P1, -(k - 1) / (2 * k)) / k;
        exponent += 0.5;
    }
    return factor * tail_integral(exponent, s_to, s_from);
}

static struct gas_result check_vent_time(const struct gas_vessel *vessel, double P_down, double area,
                                         double coefficient)
{
    const struct figure start[] = {{vessel->V, 1}, {vessel->P1, 2}, {vessel->T1, 3}, {vessel->P2, 4}};
    struct gas_result checked = check_all_positive(start, 4);
    if (!checked.status && vessel->wall != GAS_WALL_ADIABATIC && vessel->wall != GAS_WALL_ISOTHERMAL)
        return gas_bad(GAS_NOT_APPLICABLE, 6, NAN);
    if (!checked.status)
        checked = check_orifice(P_down, area, coefficient, 8);
    if (!checked.status && (vessel->P2 > vessel->P1 || vessel->P2 < P_down))
        return gas_bad(GAS_WRONG_SIDE, 4, vessel->P2);
    return checked;
}

struct gas_result gas_vent_time(const struct gas *gas, const struct gas_vessel *vessel, double P_down, double area,
                                double coefficient)
{
    struct gas_result checked = check_vent_time(vessel, P_down, area, coefficient);
    struct gas_result gamma = checked.status ? checked : gamma_of(gas, vessel->T1, 3, 0);
    if (gamma.status)
        return gamma;
    double k = gamma.value, P1 = vessel->P1, P2 = vessel->P2;
    bool adiabatic = vessel->wall == GAS_WALL_ADIABATIC;
    double choked_to = P_down * pow((k + 1) / 2, k / (k - 1)); /* the pressure down to which the flow is choked */
    double turn = fmin(fmax(choked_to, P2), P1);
    double time = choked_time(k, adiabatic, P1, P1, turn);
    if (turn > P2)
        time += tail_time(k, adiabatic, P1, P_down, turn, P2);
    return if_finite(time * vessel->V / (coefficient * area * sqrt(gas->R * vessel->T1 / gas->molar_mass)));
}
