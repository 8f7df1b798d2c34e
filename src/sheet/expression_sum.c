#include "sheet/expression_sum.h"

#include <math.h>

#define WHAT "cp formula"

enum { EXPONENT_MOST = 12, POWER_OF_SUM_MOST = 8 };

struct gas_sum gas_sum_of(double factor, double exponent)
{
    return (struct gas_sum){factor != 0, {{factor, exponent}}};
}

static void drop_term(struct gas_sum *sum, size_t i)
{
    sum->term[i] = sum->term[--sum->count];
}

static bool add_term(struct gas_sum *sum, struct gas_sum_term term, struct gas_refusal *refusal)
{
    size_t i = 0;
    if (!isfinite(term.factor))
        return gas_refuse(refusal, WHAT, "a factor is too large to compute with; check its figures.");
    if (fabs(term.exponent) > EXPONENT_MOST)
        return gas_refuse(refusal, WHAT, "T to the power %s is beyond what is read (-%d to %d).",
                          gas_shown(term.exponent).text, EXPONENT_MOST, EXPONENT_MOST);
    if (term.factor == 0)
        return true;
    while (i < sum->count && sum->term[i].exponent != term.exponent)
        i++;
    if (i == GAS_SUM_TERMS)
        return gas_refuse(refusal, WHAT, "it has more than %d different powers of T; shorten it.", GAS_SUM_TERMS);
    if (i == sum->count)
        sum->term[sum->count++] = (struct gas_sum_term){0, term.exponent};
    sum->term[i].factor += term.factor;
    if (!isfinite(sum->term[i].factor))
        return gas_refuse(refusal, WHAT, "a factor is too large to compute with; check its figures.");
    if (sum->term[i].factor == 0)
        drop_term(sum, i);
    return true;
}

bool gas_sum_add(struct gas_sum *sum, const struct gas_sum *more, double sign, struct gas_refusal *refusal)
{
    for (size_t i = 0; i < more->count; i++)
        if (!add_term(sum, (struct gas_sum_term){sign * more->term[i].factor, more->term[i].exponent}, refusal))
            return false;
    return true;
}

bool gas_sum_multiply(struct gas_sum *sum, const struct gas_sum *by, struct gas_refusal *refusal)
{
    struct gas_sum product = {0};
    for (size_t i = 0; i < sum->count; i++)
        for (size_t j = 0; j < by->count; j++)
            if (!add_term(&product,
                          (struct gas_sum_term){sum->term[i].factor * by->term[j].factor,
                                                sum->term[i].exponent + by->term[j].exponent},
                          refusal))
                return false;
    *sum = product;
    return true;
}

bool gas_sum_divide(struct gas_sum *sum, const struct gas_sum *by, struct gas_refusal *refusal)
{
    if (by->count == 0)
        return gas_refuse(refusal, WHAT, "it divides by zero; check its figures.");
    if (by->count > 1)
        return gas_refuse(refusal, WHAT,
                          "it divides by a sum; a division can be by a single term only, such as 0.5e5/T^2.");
    struct gas_sum quotient = {0};
    for (size_t i = 0; i < sum->count; i++)
        if (!add_term(&quotient,
                      (struct gas_sum_term){sum->term[i].factor / by->term[0].factor,
                                            sum->term[i].exponent - by->term[0].exponent},
                      refusal))
            return false;
    *sum = quotient;
    return true;
}

static bool raise_zero(struct gas_sum *sum, double power, struct gas_refusal *refusal)
{
    if (power < 0)
        return gas_refuse(refusal, WHAT, "it divides by zero; check its figures.");
    *sum = gas_sum_of(power == 0, 0);
    return true;
}

static bool raise_term(struct gas_sum *sum, double power, struct gas_refusal *refusal)
{
    struct gas_sum_term term = sum->term[0];
    if (term.factor < 0 && power != floor(power))
        return gas_refuse(refusal, WHAT, "a negative term cannot be raised to the power %s.", gas_shown(power).text);
    *sum = (struct gas_sum){0};
    return add_term(sum, (struct gas_sum_term){pow(term.factor, power), term.exponent * power}, refusal);
}

bool gas_sum_raise(struct gas_sum *sum, const struct gas_sum *exponent, struct gas_refusal *refusal)
{
    if (exponent->count > 1 || (exponent->count == 1 && exponent->term[0].exponent != 0))
        return gas_refuse(refusal, WHAT, "an exponent contains T; it must be a plain number, such as T^2.");
    double power = exponent->count ? exponent->term[0].factor : 0;
    if (sum->count == 0)
        return raise_zero(sum, power, refusal);
    if (sum->count == 1)
        return raise_term(sum, power, refusal);
    if (power != floor(power) || power < 0 || power > POWER_OF_SUM_MOST)
        return gas_refuse(refusal, WHAT, "a sum is raised to the power %s; whole powers from 0 to %d can be expanded.",
                          gas_shown(power).text, POWER_OF_SUM_MOST);
    struct gas_sum base = *sum;
    *sum = gas_sum_of(1, 0);
    for (int i = 0; i < (int)power; i++)
        if (!gas_sum_multiply(sum, &base, refusal))
            return false;
    return true;
}
