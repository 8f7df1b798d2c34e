/*
 * curve.h - one reversible stretch in the P-v plane: straight, or a power law P v^n. (layer: core, internal)
 *
 * The place along it is x, from 0 to 1. A power law is held by its logarithms, which serve every exponent alike: n = 0
 * (isobaric), n = 1 (isothermal) and the isochoric are the cases ln P = 0, ln T = 0 and ln v = 0, without a pole.
 */
#ifndef CORE_CURVE_H
#define CORE_CURVE_H

#include <math.h>

#include <gasleaf/path.h>

#include "figures.h"

enum curve_kind { CURVE_STRAIGHT, CURVE_POWER };

struct curve {
    enum curve_kind kind;
    struct gas_point from;
    double dP, dv;           /* straight: P2 - P1, v2 - v1 */
    double ln_v, ln_P, ln_T; /* power: ln(v2/v1) and so on; ln_T = ln_v + ln_P, exactly 0 when isothermal */
};

/* (e^x - 1)/x, 1 at 0. */
static inline double exp_relative(double x)
{
    return x == 0 ? 1 : expm1(x) / x;
}

struct curve curve_straight(const struct gas_point *from, const struct gas_point *to);
struct curve curve_power(const struct gas_point *from, const struct gas_point *to);

struct gas_point curve_at(const struct gas *gas, const struct curve *curve, double x);

/* Work into the gas from 0 to x, J/mol: -integral of P dv in a closed system, integral of v dP in flow. */
double curve_work(const struct curve *curve, enum gas_system system, double x);

/*
 * curve_heats - adds the heat taken in and given off along the curve to *in and *out (J/mol, >= 0).
 *
 *   Given      heat     J/mol, the whole heat of the curve: in - out equals it
 *              pieces   how finely a change of sign is looked for
 *   Notes      A reversible stretch takes the same heat in a closed system and in flow. Where the temperature passes
 *              outside the data on the way, both become NAN: how the heat divides is then not known.
 */
void curve_heats(const struct gas *gas, const struct curve *curve, double heat, int pieces, double *in, double *out);

#endif
