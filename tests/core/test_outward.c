/* Roots, bracketed and looked for outwards, against GSL's, and where it must refuse. */
#include <math.h>

#include <gsl/gsl_errno.h>
#include <gsl/gsl_roots.h>

#include "check.h"
#include "core/outward.h"

struct curve_of_test {
    double a, b;
};

static double value(double x, void *context)
{
    const struct curve_of_test *c = context;
    return c->a * x * x * x + expm1(c->b * x) - 2.385;
}

static double value_of(const void *context, double x)
{
    struct curve_of_test c = *(const struct curve_of_test *)context;
    return value(x, &c);
}

static double root_by_gsl(struct curve_of_test *c, double low, double high)
{
    gsl_function f = {value, c};
    gsl_root_fsolver *solver = gsl_root_fsolver_alloc(gsl_root_fsolver_bisection);
    gsl_root_fsolver_set(solver, &f, low, high);
    for (int i = 0; i < 200; i++)
        gsl_root_fsolver_iterate(solver);
    const double root = gsl_root_fsolver_root(solver);
    gsl_root_fsolver_free(solver);
    return root;
}

static void agrees_with_bisection(void)
{
    check_seed(11);
    for (int i = 0; i < 100; i++) {
        struct curve_of_test c = {check_random(0.01, 40), check_random(0.1, 3)};
        const double expected = root_by_gsl(&c, -1, 5);
        check_close("between", root_between(value_of, &c, -1, 5).value, expected, 1e-14, 0);
        check_close("turned round", root_between(value_of, &c, 5, -1).value, expected, 1e-14, 0);
        check_close("outward", root_outward(value_of, &c, 0, 5, 0.01, 0.3).value, expected, 1e-14, 0);
    }
}

/* a triple root is as flat as they get; sign(x) has no slope at all */
static double flat(const void *context, double x)
{
    (void)context;
    return (x - 0.3) * (x - 0.3) * (x - 0.3);
}

static double jump(const void *context, double x)
{
    return x < *(const double *)context ? -1 : 1;
}

static double broken(const void *context, double x)
{
    (void)context;
    return x > 1 ? NAN : -1;
}

static void hard_and_hopeless(void)
{
    const double place = 0.123456789;
    check_close("flat", root_between(flat, NULL, -1, 1.7).value, 0.3, 0, 1e-9);
    check_close("jump", root_between(jump, &place, -1, 2).value, place, 1e-14, 0);
    check_int("one sign", root_between(flat, NULL, 1, 2).status, GAS_UNREACHABLE);
    check_int("none outward", root_outward(flat, NULL, 1, 2, 0.1, 0.1).status, GAS_UNREACHABLE);
    check_int("failure between", root_between(broken, NULL, 0, 2).status, GAS_NO_CONVERGENCE);
    check_int("failure outward", root_outward(broken, NULL, 0, 2, 0.1, 0.1).status, GAS_NO_CONVERGENCE);
    check_close("root at the end", root_between(flat, NULL, 0.3, 2).value, 0.3, 0, 0);
}

const struct test_suite suite_outward = {
    "outward",
    (const struct test_case[]){{"GSL", agrees_with_bisection}, {"hard and hopeless", hard_and_hopeless}, {0}}};
