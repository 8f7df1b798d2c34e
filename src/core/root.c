#include "root.h"

#include <float.h>
#include <math.h>
#include <stdbool.h>

enum { STEPS_MAX = 200 };

struct bracket {
    double a, fa; /* newest point, always one side of the root */
    double b, fb; /* the other side */
    double c, fc; /* the point before */
};

/* Where to look next, as a fraction of the way from a to b. */
static double next_fraction(const struct bracket *at)
{
    double xi = (at->a - at->b) / (at->c - at->b);
    double phi = (at->fa - at->fb) / (at->fc - at->fb);
    if (!(phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi))
        return 0.5; /* the parabola through the three points would not be monotone in between */
    double alpha = (at->c - at->a) / (at->b - at->a);
    return at->fa / (at->fb - at->fa) * at->fc / (at->fb - at->fc) +
           alpha * at->fa / (at->fc - at->fa) * at->fb / (at->fc - at->fb);
}

/* Take f(x) into the bracket; the newest point becomes a. */
static void tighten(struct bracket *at, double x, double fx)
{
    if ((fx < 0) == (at->fa < 0)) {
        at->c = at->a;
        at->fc = at->fa;
    } else {
        at->c = at->b;
        at->fc = at->fb;
        at->b = at->a;
        at->fb = at->fa;
    }
    at->a = x;
    at->fa = fx;
}

static struct gas_result close_in(root_function *f, const void *given, struct bracket at)
{
    double fraction = at.fa / (at.fa - at.fb); /* the secant first */
    for (int step = 0; step < STEPS_MAX; step++) {
        double best = fabs(at.fa) < fabs(at.fb) ? at.a : at.b;
        double width = fabs(at.b - at.a);
        double least = DBL_EPSILON * fabs(best) / width;
        if (at.fa == 0 || at.fb == 0 || !(least < 0.5))
            return gas_good(best);
        fraction = fmin(fmax(fraction, least), 1 - least);
        double x = at.a + fraction * (at.b - at.a);
        double fx = f(given, x);
        if (isnan(fx))
            return gas_bad(GAS_NO_CONVERGENCE, 0, x);
        tighten(&at, x, fx);
        fraction = next_fraction(&at);
    }
    return gas_bad(GAS_NO_CONVERGENCE, 0, at.a);
}

struct gas_result root_between(root_function *f, const void *given, double a, double b)
{
    struct bracket at = {a, f(given, a), b, f(given, b), a, 0};
    if (at.fa == 0)
        return gas_good(a);
    if (at.fb == 0)
        return gas_good(b);
    if (!(at.fa < 0 && at.fb > 0) && !(at.fa > 0 && at.fb < 0))
        return gas_bad(isnan(at.fa + at.fb) ? GAS_NO_CONVERGENCE : GAS_UNREACHABLE, 0, a);
    return close_in(f, given, at);
}

struct gas_result root_rising(root_function *f, const void *given, double guess, double lowest, double highest)
{
    double x = isfinite(guess) && guess > 0 ? guess : 300;
    x = fmax(fmin(x, highest), lowest);
    double fx = f(given, x), factor = 1.02;
    bool up = fx < 0;
    for (int step = 0; step < STEPS_MAX && fx != 0; step++) {
        double limit = up ? highest : lowest;
        if (isnan(fx))
            return gas_bad(GAS_NO_CONVERGENCE, 0, x);
        if (x == limit || x > 1e12 || x < 1e-9)
            return gas_bad(GAS_OUTSIDE_DATA, 0, limit);
        double further = up ? fmin(x * factor, highest) : fmax(x / factor, lowest);
        double f_further = f(given, further);
        if (f_further == 0 || (f_further < 0) != up)
            return isnan(f_further) ? gas_bad(GAS_NO_CONVERGENCE, 0, further)
                                    : close_in(f, given, (struct bracket){x, fx, further, f_further, x, fx});
        x = further;
        fx = f_further;
        factor *= factor;
    }
    return fx == 0 ? gas_good(x) : gas_bad(GAS_NO_CONVERGENCE, 0, x);
}
