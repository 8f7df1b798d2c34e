/*
 * expression_sum.h - arithmetic with sums of powers of T; each refuses what is no such sum. (internal)
 */
#ifndef SHEET_EXPRESSION_SUM_H
#define SHEET_EXPRESSION_SUM_H

#include "sheet/expression.h"

struct gas_sum gas_sum_of(double factor, double exponent);
bool gas_sum_add(struct gas_sum *sum, const struct gas_sum *more, double sign, struct gas_refusal *refusal);
bool gas_sum_multiply(struct gas_sum *sum, const struct gas_sum *by, struct gas_refusal *refusal);
bool gas_sum_divide(struct gas_sum *sum, const struct gas_sum *by, struct gas_refusal *refusal);
bool gas_sum_raise(struct gas_sum *sum, const struct gas_sum *exponent, struct gas_refusal *refusal);

#endif
