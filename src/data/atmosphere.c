#include <math.h>

#include <gasleaf/species.h>

/* US Standard Atmosphere 1976, with its own constants; z and H in m. */
struct gas_result gas_standard_atmosphere_pressure(double altitude)
{
    static const double lowest = -500, highest = 20000;
    static const double earth = 6356766, g = 9.80665, M = 0.0289644, R = 8.31432;
    static const double P0 = 101325, T0 = 288.15, lapse = -0.0065, tropopause = 11000;
    if (!isfinite(altitude))
        return gas_bad(GAS_NOT_FINITE, 1, altitude);
    if (altitude < lowest || altitude > highest)
        return gas_bad(GAS_OUTSIDE_DATA, 1, altitude);
    double H = earth * altitude / (earth + altitude), below = fmin(H, tropopause);
    double T = T0 + lapse * below;
    double P = P0 * pow(T0 / T, g * M / (R * lapse));
    return gas_good(H > tropopause ? P * exp(-g * M * (H - tropopause) / (R * T)) : P);
}
