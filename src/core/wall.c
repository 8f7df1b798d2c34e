#include "wall.h"

#include <math.h>

#include <gasleaf/heat.h>

#include "root.h"

enum { STEPS = 64, STAGES = 3 };

/* Alexander's L-stable method of order 3, SIAM J. Numer. Anal. 14 (1977) 1006: g is the root of
 * g^3 - 3 g^2 + 3/2 g - 1/6 = 0 near 0.44. The last stage is the end of the step. */
#define G  0.43586652150845899942
#define B1 (-(6 * G * G - 16 * G + 1) / 4)
#define B2 ((6 * G * G - 20 * G + 5) / 4)
static const double node[STAGES] = {G, (1 + G) / 2, 1};
static const double matrix[STAGES][STAGES] = {{G, 0, 0}, {(1 - G) / 2, G, 0}, {B1, B2, G}};

/* level(s, T) - own (T_wall - T) - known = 0 */
struct stage_equation {
    const struct wall_course *course;
    double s, own, known;
};

static double stage_residual(const void *given, double T)
{
    const struct stage_equation *at = given;
    struct gas_result level = at->course->level(at->course, at->s, T);
    return level.status ? NAN : level.value - at->own * (at->course->T_wall - T) - at->known;
}

struct gas_result wall_follow(const struct wall_course *course, struct wall_end *end)
{
    struct gas_range data = gas_range_of(course->gas);
    double level = course->level1, T = course->T_guess, span = course->s2 - course->s1, from = course->s1;
    end->exchange = 0;
    for (int step = 1; step <= STEPS; step++) {
        /* short steps first: the gas leaves its start quickly */
        double to = step == STEPS ? course->s2 : course->s1 + span * step * step / (STEPS * STEPS);
        double h = to - from, rate[STAGES] = {0}, at_end = level;
        for (int i = 0; i < STAGES; i++) {
            struct stage_equation at = {course, from + node[i] * h, h * G * course->pull, level};
            for (int j = 0; j < i; j++)
                at.known += h * matrix[i][j] * rate[j];
            at.known += h * G * course->steady;
            struct gas_result found = root_rising(stage_residual, &at, T, data.T_from, data.T_to);
            if (found.status)
                return found;
            T = found.value;
            rate[i] = course->steady + course->pull * (course->T_wall - T);
            at_end += h * matrix[STAGES - 1][i] * rate[i];
            end->exchange += h * matrix[STAGES - 1][i] * course->weight(at.s) * (course->T_wall - T);
        }
        level = at_end;
        from = to;
    }
    end->T = T;
    return gas_good(T);
}
