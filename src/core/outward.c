#include "outward.h"

#include <math.h>

enum { STEPS_MAX = 400 };

struct gas_result root_outward(root_function *f, const void *given, double from, double limit, double step,
                               double step_most)
{
    const double way = limit > from ? 1 : -1;
    double x = from, fx = f(given, x);
    for (int i = 0; i < STEPS_MAX && fx != 0 && x != limit; i++) {
        double next = x + way * step;
        if (!(way * (limit - next) > 0))
            next = limit;
        const double f_next = f(given, next);
        if (isnan(fx) || isnan(f_next))
            return gas_bad(GAS_NO_CONVERGENCE, 0, next);
        if (f_next == 0 || (fx > 0) != (f_next > 0))
            return root_between(f, given, x, next);
        x = next;
        fx = f_next;
        step = fmin(1.5 * step, step_most);
    }
    return fx == 0 ? gas_good(x) : gas_bad(GAS_UNREACHABLE, 0, NAN);
}
