/*
 * wall.h - a vessel whose wall gives off heat in proportion to the difference of temperature. (layer: core, internal)
 */
#ifndef CORE_WALL_H
#define CORE_WALL_H

#include <gasleaf/gas.h>
#include <gasleaf/status.h>

/*
 * Filling and venting both come down to  d level(s, T)/ds = steady + pull (T_wall - T),  with level rising in T and
 * s the pressure or its logarithm; pull must have the sign of s2 - s1.
 */
struct wall_course {
    const struct gas *gas;
    struct gas_result (*level)(const struct wall_course *course, double s, double T);
    double (*weight)(double s); /* of (T_wall - T) ds in the heat */
    double s1, s2;              /* from, to */
    double level1;              /* level at the start */
    double steady, pull;
    double T_wall, T_reference; /* T_reference: for `level` */
    double T_guess;             /* near the start */
};

struct wall_end {
    double T;        /* at s2 */
    double exchange; /* integral of weight(s) (T_wall - T) ds */
};

struct gas_result wall_follow(const struct wall_course *course, struct wall_end *end);

#endif
