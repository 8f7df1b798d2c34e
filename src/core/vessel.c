#include <gasleaf/vessel.h>

#include <math.h>
#include <stdbool.h>

#include <gasleaf/heat.h>

#include "figures.h"
#include "root.h"
#include "wall.h"

enum argument { AT_V = 1, AT_P1, AT_T1, AT_P2, AT_T_LINE, AT_WALL, AT_T_SETTLED };

/* ---- what is given ------------------------------------------------------------------------------------------- */

static struct gas_result check_known(const struct gas *gas, int argument, double T)
{
    struct gas_result checked = check_positive(argument, T);
    struct gas_result cp = checked.status ? checked : gas_cp(gas, T);
    if (cp.status == GAS_NO_HEAT_CAPACITY)
        return gas_bad(cp.status, 0, NAN);
    return cp.status ? gas_bad(cp.status, argument, T) : checked;
}

static bool wall_acts(const struct gas_vessel *vessel)
{
    return vessel->wall == GAS_WALL_UA && vessel->UA > 0 && vessel->time > 0;
}

static struct gas_result check_wall(const struct gas_vessel *vessel)
{
    switch (vessel->wall) {
    case GAS_WALL_ADIABATIC:
    case GAS_WALL_ISOTHERMAL:
        return gas_good(0);
    case GAS_WALL_HEAT:
        return isfinite(vessel->heat) ? gas_good(0) : gas_bad(GAS_NOT_FINITE, AT_WALL, vessel->heat);
    case GAS_WALL_FRACTION:
        if (vessel->fraction > 1 && isfinite(vessel->fraction))
            return gas_bad(GAS_NOT_A_FRACTION, AT_WALL, vessel->fraction);
        return check_not_negative(AT_WALL, vessel->fraction);
    case GAS_WALL_UA: {
        struct gas_result checked = check_not_negative(AT_WALL, vessel->UA);
        if (!checked.status)
            checked = check_not_negative(AT_WALL, vessel->time);
        if (!checked.status && wall_acts(vessel))
            checked = check_positive(AT_WALL, vessel->T_wall);
        if (!checked.status && wall_acts(vessel) && vessel->P1 == vessel->P2)
            return gas_bad(GAS_NOT_APPLICABLE, AT_WALL, vessel->time);
        return checked;
    }
    }
    return gas_bad(GAS_NOT_APPLICABLE, AT_WALL, NAN);
}

static struct gas_result check_settled(double T_settled)
{
    return isnan(T_settled) ? gas_good(0) : check_positive(AT_T_SETTLED, T_settled);
}

static struct gas_result first_bad(const struct gas_result *checks, size_t count)
{
    for (size_t i = 0; i < count; i++)
        if (checks[i].status)
            return checks[i];
    return gas_good(0);
}

static struct gas_result check_fill(const struct gas *gas, const struct gas_vessel *vessel)
{
    bool isothermal = vessel->wall == GAS_WALL_ISOTHERMAL, no_heat_asked = isothermal && isnan(vessel->T_line);
    bool T1_counts = vessel->P1 > 0 || isothermal || vessel->wall == GAS_WALL_FRACTION;
    struct gas_result T1 = gas_good(0);
    if (T1_counts)
        T1 = no_heat_asked ? check_positive(AT_T1, vessel->T1) : check_known(gas, AT_T1, vessel->T1);
    else if (!isnan(vessel->T1))
        T1 = check_positive(AT_T1, vessel->T1);
    const struct gas_result checks[] = {
        check_positive(AT_V, vessel->V),
        check_not_negative(AT_P1, vessel->P1),
        T1,
        check_positive(AT_P2, vessel->P2),
        vessel->P2 < vessel->P1 ? gas_bad(GAS_WRONG_SIDE, AT_P2, vessel->P2) : gas_good(0),
        no_heat_asked ? gas_good(0) : check_known(gas, AT_T_LINE, vessel->T_line),
        check_wall(vessel),
        check_settled(vessel->T_settled),
    };
    return first_bad(checks, sizeof checks / sizeof *checks);
}

static struct gas_result check_vent(const struct gas *gas, const struct gas_vessel *vessel)
{
    const struct gas_result checks[] = {
        check_positive(AT_V, vessel->V),
        check_positive(AT_P1, vessel->P1),
        vessel->wall == GAS_WALL_ISOTHERMAL ? check_positive(AT_T1, vessel->T1) : check_known(gas, AT_T1, vessel->T1),
        check_positive(AT_P2, vessel->P2),
        vessel->P2 > vessel->P1 ? gas_bad(GAS_WRONG_SIDE, AT_P2, vessel->P2) : gas_good(0),
        check_wall(vessel),
        check_settled(vessel->T_settled),
    };
    return first_bad(checks, sizeof checks / sizeof *checks);
}

/* ---- what follows -------------------------------------------------------------------------------------------- */

static struct gas_result give_up(struct gas_vessel_end *end, struct gas_result bad)
{
    *end = (struct gas_vessel_end){NAN, NAN, NAN, NAN, NAN, NAN, NAN};
    return bad;
}

/* Everything that follows from T2; sign is +1 for filling, -1 for venting. */
static struct gas_result settle(const struct gas *gas, const struct gas_vessel *vessel, int sign,
                                struct gas_vessel_end *end)
{
    double T_settled = isnan(vessel->T_settled) ? vessel->T1 : vessel->T_settled;
    end->n1 = vessel->P1 > 0 ? vessel->P1 * vessel->V / (gas->R * vessel->T1) : 0;
    end->n2 = vessel->P2 * vessel->V / (gas->R * end->T2);
    end->moved = sign * (end->n2 - end->n1);
    end->P_settled = vessel->P2 * T_settled / end->T2;
    end->T_out_mean = NAN;
    if (end->moved < -1e-12 * end->n1)
        return give_up(end, gas_bad(GAS_UNREACHABLE, AT_WALL, end->heat));
    end->moved = fmax(end->moved, 0);
    return gas_good(end->T2);
}

/* ---- filling ------------------------------------------------------------------------------------------------- */

/* The energy in the vessel above that of as much line gas, over V/R: (P/T) (u(T) - h(T_line)). It grows by R/V times
 * the heat, and by nothing else. */
static struct gas_result excess_energy(const struct gas *gas, double T_line, double P, double T)
{
    struct gas_result du = gas_du(gas, T_line, T);
    du.value = P / T * (du.value - gas->R * T_line);
    return du;
}

struct fill_equation {
    const struct gas *gas;
    double T_line, P, excess;
};

static double fill_residual(const void *given, double T)
{
    const struct fill_equation *at = given;
    struct gas_result excess = excess_energy(at->gas, at->T_line, at->P, T);
    return excess.status ? NAN : excess.value - at->excess;
}

/* T2 from the excess energy at the end; the guess is the exact answer for a constant cp. */
static struct gas_result fill_temperature(const struct gas *gas, const struct gas_vessel *vessel, double excess)
{
    const struct fill_equation at = {gas, vessel->T_line, vessel->P2, excess};
    struct gas_range data = gas_range_of(gas);
    double cp = gas_cp(gas, vessel->T_line).value;
    double guess = cp * vessel->T_line / (cp - gas->R - excess / vessel->P2);
    return root_rising(fill_residual, &at, guess, data.T_from, data.T_to);
}

static struct gas_result fill_level(const struct wall_course *course, double P, double T)
{
    return excess_energy(course->gas, course->T_reference, P, T);
}

static double even(double P)
{
    (void)P;
    return 1;
}

static struct gas_result fill_along_wall(const struct gas *gas, const struct gas_vessel *vessel, double excess1,
                                         struct gas_vessel_end *end)
{
    double per_pascal = vessel->UA * vessel->time / (vessel->P2 - vessel->P1);
    const struct wall_course course = {
        .gas = gas,
        .level = fill_level,
        .weight = even,
        .s1 = vessel->P1,
        .s2 = vessel->P2,
        .level1 = excess1,
        .steady = 0,
        .pull = gas->R / vessel->V * per_pascal,
        .T_wall = vessel->T_wall,
        .T_reference = vessel->T_line,
        .T_guess = vessel->P1 > 0 ? vessel->T1 : vessel->T_line,
    };
    struct wall_end reached;
    struct gas_result followed = wall_follow(&course, &reached);
    if (followed.status)
        return followed;
    end->T2 = reached.T;
    end->heat = per_pascal * reached.exchange;
    return followed;
}

static struct gas_result fill_isothermal(const struct gas *gas, const struct gas_vessel *vessel,
                                         struct gas_vessel_end *end)
{
    double per_mole = vessel->T_line; /* NAN: the heat was not asked for */
    if (!isnan(vessel->T_line))
        per_mole = gas_du(gas, vessel->T_line, vessel->T1).value - gas->R * vessel->T_line;
    end->T2 = vessel->T1;
    end->heat = (vessel->P2 - vessel->P1) * vessel->V / (gas->R * vessel->T1) * per_mole;
    return gas_good(end->T2);
}

struct gas_result gas_fill(const struct gas *gas, const struct gas_vessel *vessel, struct gas_vessel_end *end)
{
    struct gas_result done = check_fill(gas, vessel);
    if (done.status)
        return give_up(end, done);
    double excess1 = vessel->P1 > 0 ? excess_energy(gas, vessel->T_line, vessel->P1, vessel->T1).value : 0;
    *end = (struct gas_vessel_end){.heat = 0};
    if (vessel->wall == GAS_WALL_ISOTHERMAL || vessel->wall == GAS_WALL_FRACTION)
        done = fill_isothermal(gas, vessel, end);
    if (vessel->wall == GAS_WALL_FRACTION)
        end->heat *= vessel->fraction;
    else if (vessel->wall == GAS_WALL_HEAT)
        end->heat = vessel->heat;
    if (wall_acts(vessel)) {
        done = fill_along_wall(gas, vessel, excess1, end);
    } else if (vessel->wall != GAS_WALL_ISOTHERMAL) {
        done = fill_temperature(gas, vessel, excess1 + gas->R * end->heat / vessel->V);
        end->T2 = done.value;
    }
    return done.status ? give_up(end, done) : settle(gas, vessel, +1, end);
}

/* ---- venting ------------------------------------------------------------------------------------------------- */

static struct gas_result vent_level(const struct wall_course *course, double log_P, double T)
{
    (void)log_P;
    return gas_ds_isobaric(course->gas, course->T_reference, T);
}

/* With s = ln P: d(integral of cp/T)/ds = R - R UA time (T_wall - T)/(V (P1 - P2)), and dt = -time P ds/(P1 - P2). */
static struct gas_result vent_along_wall(const struct gas *gas, const struct gas_vessel *vessel,
                                         struct gas_vessel_end *end)
{
    double per_pascal = vessel->UA * vessel->time / (vessel->P1 - vessel->P2);
    const struct wall_course course = {
        .gas = gas,
        .level = vent_level,
        .weight = exp,
        .s1 = log(vessel->P1),
        .s2 = log(vessel->P2),
        .level1 = 0,
        .steady = gas->R,
        .pull = -gas->R * per_pascal / vessel->V,
        .T_wall = vessel->T_wall,
        .T_reference = vessel->T1,
        .T_guess = vessel->T1,
    };
    struct wall_end reached;
    struct gas_result followed = wall_follow(&course, &reached);
    if (followed.status)
        return followed;
    end->T2 = reached.T;
    end->heat = -per_pascal * reached.exchange;
    return followed;
}

/* Heat spread evenly over the fall of pressure. */
static struct gas_result vent_polytropic(const struct gas *gas, const struct gas_vessel *vessel,
                                         struct gas_vessel_end *end)
{
    double whole = vessel->V * (vessel->P1 - vessel->P2), fraction = 0;
    if (vessel->wall == GAS_WALL_FRACTION)
        fraction = vessel->fraction;
    else if (vessel->wall == GAS_WALL_HEAT && vessel->heat != 0)
        fraction = vessel->heat / whole;
    if (!isfinite(fraction))
        return gas_bad(GAS_UNREACHABLE, AT_WALL, vessel->heat);
    double ds = gas->R * (1 - fraction) * log(vessel->P2 / vessel->P1);
    struct gas_result T2 = gas_T_after_ds_isobaric(gas, vessel->T1, ds);
    if (T2.status)
        return gas_bad(T2.status, 0, T2.figure);
    end->T2 = T2.value;
    end->heat = fraction * whole;
    return T2;
}

/* The enthalpy that left, above that of as much gas at T1, from n1 u1 - n2 u2 + Q; then its temperature. */
static struct gas_result mean_of_what_left(const struct gas *gas, const struct gas_vessel *vessel,
                                           struct gas_vessel_end *end)
{
    end->T_out_mean = vessel->T1;
    if (vessel->wall == GAS_WALL_ISOTHERMAL || end->moved <= 1e-9 * end->n1)
        return gas_good(end->T2);
    struct gas_result du = gas_du(gas, vessel->T1, end->T2);
    double left = end->heat - end->n2 * du.value - end->moved * gas->R * vessel->T1;
    struct gas_result mean = du.status ? du : gas_T_after_dh(gas, vessel->T1, left / end->moved);
    if (mean.status)
        return give_up(end, gas_bad(mean.status, 0, mean.figure));
    end->T_out_mean = mean.value;
    return gas_good(end->T2);
}

struct gas_result gas_vent(const struct gas *gas, const struct gas_vessel *vessel, struct gas_vessel_end *end)
{
    struct gas_result done = check_vent(gas, vessel);
    if (done.status)
        return give_up(end, done);
    *end = (struct gas_vessel_end){.T2 = vessel->T1, .heat = vessel->V * (vessel->P1 - vessel->P2)};
    if (wall_acts(vessel))
        done = vent_along_wall(gas, vessel, end);
    else if (vessel->wall != GAS_WALL_ISOTHERMAL)
        done = vent_polytropic(gas, vessel, end);
    if (done.status)
        return give_up(end, done);
    done = settle(gas, vessel, -1, end);
    return done.status ? done : mean_of_what_left(gas, vessel, end);
}
