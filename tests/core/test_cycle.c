/* Cycles with known efficiencies, and heats that turn round within a leg. */
#include <math.h>

#include <gsl/gsl_integration.h>

#include "check.h"
#include "path_gases.h"

enum { LEGS_MOST = 4 };

static struct gas_cycle cycle_of(const char *id, const struct gas *gas, enum gas_system system,
                                 const struct gas_point *start, const struct gas_leg *legs, size_t count,
                                 struct gas_change *changes)
{
    struct gas_change total;
    struct gas_cycle cycle = {0};
    struct gas_result fault;
    check_int(id, gas_path_run(gas, system, start, legs, count, changes, &total, &fault).status, GAS_OK);
    check_int(id, gas_cycle_of(start, changes, count, 1e-6, &cycle).status, GAS_OK);
    return cycle;
}

/* Air-standard efficiencies with constant cp, k = 1.4 (any text): Otto 1 - r^(1-k); Diesel
 * 1 - (c^k - 1)/(k (c - 1) r^(k-1)); Brayton 1 - p^((1-k)/k); Carnot 1 - T_cold/T_hot. */
static void air_standard(void)
{
    const double k = 1.4, r = 8.3, cut_off = 2.1, p = 9.7;
    const struct gas_point start = point_PT(0.97e5, 303);
    struct gas_change c[LEGS_MOST];
    const struct gas_leg otto[] = {leg_of(GAS_ADIABATIC, GAS_BY_V_RATIO, 1 / r),
                                   leg_of(GAS_ISOCHORIC, GAS_WITH_Q, 21e3), leg_of(GAS_ADIABATIC, GAS_BY_V_RATIO, r),
                                   leg_of(GAS_ISOCHORIC, GAS_TO_START, 0)};
    struct gas_cycle cycle = cycle_of("otto", &diatomic, GAS_CLOSED, &start, otto, 4, c);
    check_close("otto", cycle.efficiency, 1 - pow(r, 1 - k), 1e-11, 0);
    check_close("otto Q", cycle.Q_in, 21e3, 1e-11, 0);
    check_close("otto mep", cycle.mep, cycle.efficiency * 21e3 / (start.v * (1 - 1 / r)), 1e-11, 0);
    check_true("an engine has no COP", isnan(cycle.cop_heating) && isnan(cycle.cop_cooling));

    const struct gas_leg diesel[] = {leg_of(GAS_ADIABATIC, GAS_BY_V_RATIO, 1 / r),
                                     leg_of(GAS_ISOBARIC, GAS_BY_V_RATIO, cut_off),
                                     leg_of(GAS_ADIABATIC, GAS_TO_V, start.v), leg_of(GAS_ISOCHORIC, GAS_TO_START, 0)};
    cycle = cycle_of("diesel", &diatomic, GAS_CLOSED, &start, diesel, 4, c);
    check_close("diesel", cycle.efficiency, 1 - (pow(cut_off, k) - 1) / (k * (cut_off - 1) * pow(r, k - 1)), 1e-11, 0);

    const struct gas_leg brayton[] = {leg_of(GAS_ADIABATIC, GAS_BY_P_RATIO, p), leg_of(GAS_ISOBARIC, GAS_TO_T, 1290),
                                      leg_of(GAS_ADIABATIC, GAS_BY_P_RATIO, 1 / p),
                                      leg_of(GAS_ISOBARIC, GAS_TO_START, 0)};
    for (int system = GAS_CLOSED; system <= GAS_FLOW; system++) { /* the net work is the same */
        cycle = cycle_of("brayton", &diatomic, (enum gas_system)system, &start, brayton, 4, c);
        check_close("brayton", cycle.efficiency, 1 - pow(p, (1 - k) / k), 1e-11, 0);
    }

    const struct gas_leg carnot[] = {leg_of(GAS_ISOTHERMAL, GAS_BY_V_RATIO, 0.6), leg_of(GAS_ADIABATIC, GAS_TO_T, 700),
                                     leg_of(GAS_ISOTHERMAL, GAS_BY_V_RATIO, 1 / 0.6),
                                     leg_of(GAS_ADIABATIC, GAS_TO_START, 0)};
    cycle = cycle_of("carnot", &nitrogen, GAS_CLOSED, &start, carnot, 4, c); /* whatever the gas */
    check_close("carnot", cycle.efficiency, 1 - 303.0 / 700, 1e-10, 0);
}

/* Carnot's cycle the other way round: COP = T_cold/(T_hot - T_cold) and T_hot/(T_hot - T_cold). */
static void refrigerator(void)
{
    const struct gas_point start = point_PT(4.4e5, 262);
    struct gas_change c[LEGS_MOST];
    const struct gas_leg legs[] = {leg_of(GAS_ISOTHERMAL, GAS_BY_V_RATIO, 1.7), leg_of(GAS_ADIABATIC, GAS_TO_T, 311),
                                   leg_of(GAS_ISOTHERMAL, GAS_BY_V_RATIO, 1 / 1.7),
                                   leg_of(GAS_ADIABATIC, GAS_TO_START, 0)};
    const struct gas_cycle cycle = cycle_of("refrigerator", &cubic, GAS_CLOSED, &start, legs, 4, c);
    check_close("cooling", cycle.cop_cooling, 262.0 / 49, 1e-9, 0);
    check_close("heating", cycle.cop_heating, 311.0 / 49, 1e-9, 0);
    check_true("no efficiency", isnan(cycle.efficiency) && cycle.W_net > 0);
}

/* Cengel & Boles, Thermodynamics: An Engineering Approach, Ex. 9-3: Diesel, 14.7 psia, 80 F (540 R), r = 18,
 * cut-off 2, k = 1.4: 1716 R, 841 psia; 3432 R; 1425 R, 38.8 psia; 63.2 %, mep 110 psia.
 * From memory; the printed heats come from cp 0.240 and cv 0.171 Btu/(lb R), whose ratio is 1.4035. */
static void printed_diesel(void)
{
    const struct gas_point start = point_PT(14.7 * 6894.757, 540 / 1.8);
    struct gas_change c[LEGS_MOST];
    const struct gas_leg legs[] = {leg_of(GAS_ADIABATIC, GAS_BY_V_RATIO, 1.0 / 18),
                                   leg_of(GAS_ISOBARIC, GAS_BY_V_RATIO, 2), leg_of(GAS_ADIABATIC, GAS_TO_V, start.v),
                                   leg_of(GAS_ISOCHORIC, GAS_TO_START, 0)};
    const struct gas_cycle cycle = cycle_of("9-3", &diatomic, GAS_CLOSED, &start, legs, 4, c);
    check_close("9-3 T2", c[0].end.T * 1.8, 1716, 5e-4, 0);
    check_close("9-3 P2", c[0].end.P / 6894.757, 841, 1e-3, 0);
    check_close("9-3 T3", c[1].end.T * 1.8, 3432, 5e-4, 0);
    check_close("9-3 T4", c[2].end.T * 1.8, 1425, 5e-4, 0);
    check_close("9-3 efficiency", cycle.efficiency, 0.632, 0, 5e-4);
    check_close("9-3 mep", cycle.mep / 6894.757, 110, 1e-2, 0);
}

/* Along P = a - b v with constant k the heat turns round at v = k a/((k + 1) b) (dQ = k/(k-1) P dv + v dP/(k-1) = 0).
 */
static void line_turns(double v2)
{
    const double k = 1.4, P1 = 5e5, v1 = 0.006, P2 = 1e5;
    const double b = (P1 - P2) / (v2 - v1), a = P1 + b * v1, v = k * a / ((k + 1) * b);
    const double P = a - b * v, Q_in = (P * v - P1 * v1) / (k - 1) + (P + P1) / 2 * (v - v1);
    const double Q = (P2 * v2 - P1 * v1) / (k - 1) + (P2 + P1) / 2 * (v2 - v1);
    const struct gas_point start = {P1, NAN, v1};
    struct gas_leg leg = leg_of(GAS_STRAIGHT, GAS_TO_P_AND_V, P2);
    struct gas_change c;
    leg.second = v2;
    check_true("turns inside", v > v1 && v < v2);
    for (int system = GAS_CLOSED; system <= GAS_FLOW; system++) {
        check_int("line", gas_leg_run(&diatomic, (enum gas_system)system, &start, NULL, &leg, &c).status, GAS_OK);
        check_close("line in", c.Q_in, Q_in, 1e-12, 0);
        check_close("line out", c.Q_out, Q_in - Q, 1e-12, 0);
    }
    /* drawn as a table the line is the same */
    const struct gas_point table[] = {{P1, 0, v1}, {a - b * 0.011, 0, 0.011}, {a - b * 0.024, 0, 0.024}, {P2, 0, v2}};
    struct gas_leg drawn = leg_of(GAS_THROUGH_POINTS, GAS_TO_LAST_POINT, NAN);
    drawn.point = table;
    drawn.point_count = 4;
    check_int("table", gas_leg_run(&diatomic, GAS_CLOSED, &start, NULL, &drawn, &c).status, GAS_OK);
    check_close("table in", c.Q_in, Q_in, 1e-12, 0);
    check_close("table out", c.Q_out, Q_in - Q, 1e-12, 0);
}

static void straight_line_turns(void)
{
    line_turns(0.0313);
    line_turns(0.030); /* turns at 5/8 of the way, where a search in sixteenths looks */
}

/* A polytropic compression of n = 1.32 crosses the place where cv = R/(n - 1): nitrogen gives heat off where cv lies
 * below it and takes heat in above (dQ = (cv - R/(n-1)) dT, any text). */
static double heat_rate(double T, void *part)
{
    const double rate = cp_by_hand(&nitrogen, T) - GAS_R - GAS_R / 0.32;
    return *(const int *)part > 0 ? fmax(rate, 0) : fmax(-rate, 0);
}

static void polytrope_turns(void)
{
    const struct gas_point start = point_PT(2e5, 1100);
    struct gas_leg leg = leg_of(GAS_POLYTROPIC, GAS_TO_T, 2700);
    struct gas_change c;
    leg.n = 1.32;
    check_int("n", gas_leg_run(&nitrogen, GAS_CLOSED, &start, NULL, &leg, &c).status, GAS_OK);
    gsl_integration_workspace *space = gsl_integration_workspace_alloc(200);
    for (int part = 1; part >= -1; part -= 2) {
        double expected, error;
        gsl_function f = {heat_rate, &part};
        gsl_integration_qags(&f, 1100, 2700, 1e-7, 1e-10, 200, space, &expected, &error);
        check_true("both ways", expected > 50);
        check_close("n", part > 0 ? c.Q_in : c.Q_out, expected, 1e-8, 1e-6);
    }
    gsl_integration_workspace_free(space);
}

/* More heat than nitrogen can take by cooling along n = 1.32 is met beyond the turn, on the hot side. */
static void heat_beyond_the_turn(void)
{
    const struct gas_point start = point_PT(2e5, 1100);
    struct gas_leg leg = leg_of(GAS_POLYTROPIC, GAS_TO_T, 5900);
    struct gas_change hot, cold, again;
    leg.n = 1.32;
    check_int("hot", gas_leg_run(&nitrogen, GAS_CLOSED, &start, NULL, &leg, &hot).status, GAS_OK);
    leg.value = 200;
    check_int("cold", gas_leg_run(&nitrogen, GAS_CLOSED, &start, NULL, &leg, &cold).status, GAS_OK);
    check_true("hot side takes more", hot.Q > cold.Q && cold.Q > 0);
    leg.ending = GAS_WITH_Q;
    leg.value = hot.Q;
    check_int("again", gas_leg_run(&nitrogen, GAS_CLOSED, &start, NULL, &leg, &again).status, GAS_OK);
    check_close("again", again.end.T, 5900, 1e-9, 0);
    leg.value = 0.5 * cold.Q; /* both sides offer this: the near one counts */
    check_int("near", gas_leg_run(&nitrogen, GAS_CLOSED, &start, NULL, &leg, &again).status, GAS_OK);
    check_true("near", again.end.T < 1100 && again.end.T > 200);
}

/* A line that leaves the data on the way: the ends and Q stand, how the heat divides is not known. */
static void line_above_the_data(void)
{
    const struct gas_point start = point_PT(40e5, 1500);
    struct gas_leg leg = leg_of(GAS_STRAIGHT, GAS_TO_P_AND_V, 4e5);
    struct gas_change c;
    leg.second = 10 * start.v;
    check_int("line", gas_leg_run(&cubic, GAS_CLOSED, &start, NULL, &leg, &c).status, GAS_OK);
    check_close("line Q", c.Q, 22e5 * 9 * start.v, 1e-12, 0);
    check_true("line", isnan(c.Q_in) && isnan(c.Q_out));
}

static void does_not_close(void)
{
    const struct gas_point start = point_PT(1e5, 300);
    const struct gas_leg legs[] = {leg_of(GAS_ADIABATIC, GAS_BY_P_RATIO, 3), leg_of(GAS_ISOBARIC, GAS_TO_T, 300)};
    struct gas_change c[2], total;
    struct gas_cycle cycle;
    gas_path_run(&diatomic, GAS_CLOSED, &start, legs, 2, c, &total, NULL);
    check_int("open", gas_cycle_of(&start, c, 2, 1e-6, &cycle).status, GAS_CONTRADICTION);
    check_close("gap P", cycle.gap_P, 2, 1e-12, 0);
    check_close("gap T", cycle.gap_T, 0, 0, 1e-12);
    check_close("gap v", cycle.gap_v, -2.0 / 3, 1e-12, 0);
    check_close("filled", cycle.W_net, total.W, 1e-14, 0);
    check_int("no legs", gas_cycle_of(&start, c, 0, 1e-6, &cycle).status, GAS_UNDETERMINED);
}

static void fault_names_the_leg(void)
{
    const struct gas_point start = point_PT(1e5, 300);
    const struct gas_leg legs[] = {leg_of(GAS_ADIABATIC, GAS_BY_P_RATIO, 3), leg_of(GAS_ISOBARIC, GAS_TO_P, 2e5),
                                   leg_of(GAS_ISOTHERMAL, GAS_TO_START, 0)};
    struct gas_change c[3], total;
    struct gas_result fault;
    const struct gas_result r = gas_path_run(&diatomic, GAS_CLOSED, &start, legs, 3, c, &total, &fault);
    check_int("leg 2", r.argument, 2);
    check_int("leg 2", r.status, GAS_UNREACHABLE);
    check_int("its ending", fault.argument, 2);
    check_close("its figure", fault.figure, 2e5, 0, 0);
    check_int("no legs", gas_path_run(&diatomic, GAS_CLOSED, &start, legs, 0, c, &total, &fault).status,
              GAS_UNDETERMINED);
}

/* clang-format off */
const struct test_suite suite_cycle = {"cycle", (const struct test_case[]){
    {"air standard", air_standard},
    {"refrigerator", refrigerator},
    {"printed Diesel", printed_diesel},
    {"straight line turns", straight_line_turns},
    {"polytrope turns", polytrope_turns},
    {"heat beyond the turn", heat_beyond_the_turn},
    {"line above the data", line_above_the_data},
    {"does not close", does_not_close},
    {"fault names the leg", fault_names_the_leg},
    {0}}};
/* clang-format on */
