#include <math.h>
#include <stdio.h>

#include <gasleaf/heat.h>
#include <gasleaf/vessel.h>
#include <gsl/gsl_errno.h>
#include <gsl/gsl_odeiv2.h>

#include "check.h"
#include "some_gases.h"

static const struct gas_vessel filling = {
    .V = 0.37, .P1 = 1.3e5, .T1 = 287, .P2 = 41e5, .T_line = 301, .T_settled = NAN};
static const struct gas_vessel venting = {
    .V = 0.37, .P1 = 41e5, .T1 = 301, .P2 = 6.1e5, .T_line = NAN, .T_settled = NAN};

/* ---- published ----------------------------------------------------------------------------------------------- */

/* Sandler, Chemical, Biochemical, and Engineering Thermodynamics, 4th ed., illustration of a compressed-air tank: line
 * at 20 C, tank from 1 bar and 20 C to 40 bar, adiabatic, Cv = 21 J/(mol K): 405.2 K; back at 20 C 28.94 bar; from
 * memory. The book's R is 8.314. */
static void sandler_tank(void)
{
    struct gas_interval interval;
    const struct gas air = constant_gas(&interval, 21 + 8.314, 8.314, 0.029);
    const struct gas_vessel tank = {.V = 1, .P1 = 1e5, .T1 = 293.15, .P2 = 40e5, .T_line = 293.15, .T_settled = NAN};
    struct gas_vessel_end end;
    gas_fill(&air, &tank, &end);
    check_close("Sandler T2", end.T2, 405.2, 0, 0.1);
    check_close("Sandler P settled", end.P_settled, 28.94e5, 0, 0.01e5);
}

/* Fox & McDonald, Introduction to Fluid Mechanics, Ex. 4.17: V = 0.1 m3, tank 100 kPa gauge, 20 C, line 20 C,
 * atmosphere 101 kPa, cv = 717, R = 287 J/(kg K): while T rises by 0.05 K/s the flow is 0.102 g/s; answer from memory.
 * Here as the ratio of small changes. */
static void fox_tank(void)
{
    struct gas_interval interval;
    const struct gas air = constant_gas(&interval, 717 + 287, 287, 1); /* "per mole" is per kg */
    const struct gas_vessel tank = {.V = 0.1, .P1 = 201e3, .T1 = 293, .P2 = 201.02e3, .T_line = 293, .T_settled = NAN};
    struct gas_vessel_end end;
    gas_fill(&air, &tank, &end);
    check_close("Fox flow", end.moved * 0.05 / (end.T2 - 293), 0.102e-3, 0, 0.0005e-3);
}

/* A vessel filled from empty ends at k times the line's temperature (Cengel & Boles, ch. 5; common knowledge). */
static void from_empty(void)
{
    struct gas_interval interval;
    const double k = 1.37;
    const struct gas gas = constant_gas(&interval, GAS_R * k / (k - 1), GAS_R, 0.029);
    struct gas_vessel tank = filling;
    struct gas_vessel_end end;
    tank.P1 = 0;
    tank.T1 = NAN;
    check_close("k T_line", gas_fill(&gas, &tank, &end).value, k * 301, 1e-12, 0);
    check_close("all came in", end.moved, 41e5 * 0.37 / (GAS_R * k * 301), 1e-12, 0);
    check_true("nothing to settle to", isnan(end.P_settled));
    check_close("was empty", end.n1, 0, 0, 0);
    tank.T_settled = 290;
    gas_fill(&gas, &tank, &end);
    check_close("settles", end.P_settled, 41e5 * 290 / (k * 301), 1e-12, 0);
    /* variable cp: u(T2) = h(T_line) */
    gas_fill(&nitrogen, &tank, &end);
    check_close("u2 is h of the line", gas_du(&nitrogen, 301, end.T2).value, GAS_R * 301, 1e-12, 0);
}

/* ---- against the differential equations ---------------------------------------------------------------------- */

struct course {
    const struct gas *gas;
    const struct gas_vessel *vessel;
    double heat_per_pascal;     /* J/Pa, even */
    double exchange_per_pascal; /* UA dt/dP, W/K s/Pa */
};

static double heat_rate(const struct course *at, double T)
{
    return at->heat_per_pascal + at->exchange_per_pascal * (at->vessel->T_wall - T);
}

/* d(n u) = h dn + dQ with n = P V/(R T), by pressure; y: T, Q. */
static int fill_slope(double P, const double y[], double slope[], void *given)
{
    const struct course *at = given;
    double T = y[0], n = P * at->vessel->V / (GAS_R * T), Q = heat_rate(at, T);
    double gap = GAS_R * at->vessel->T_line - gas_du(at->gas, at->vessel->T_line, T).value; /* h(T_line) - u(T) */
    slope[0] = (gap / P + Q / n) / (gas_cv(at->gas, T).value + gap / T);
    slope[1] = Q;
    return GSL_SUCCESS;
}

/* n (cp dT - R T dP/P) = dQ; y: T, Q, enthalpy gone above h(T1). */
static int vent_slope(double P, const double y[], double slope[], void *given)
{
    const struct course *at = given;
    double T = y[0], n = P * at->vessel->V / (GAS_R * T), Q = heat_rate(at, T);
    slope[0] = (GAS_R * T / P + Q / n) / gas_cp(at->gas, T).value;
    slope[1] = Q;
    slope[2] = -n * (1 / P - slope[0] / T) * gas_dh(at->gas, at->vessel->T1, T).value;
    return GSL_SUCCESS;
}

static void follow(int (*slope)(double, const double[], double[], void *), struct course at, double y[3])
{
    gsl_odeiv2_system system = {slope, NULL, 3, &at};
    double P = at.vessel->P1, step = (at.vessel->P2 - P) * 1e-6;
    gsl_odeiv2_driver *driver = gsl_odeiv2_driver_alloc_y_new(&system, gsl_odeiv2_step_rk8pd, step, 1e-11, 1e-12);
    y[0] = at.vessel->T1, y[1] = 0, y[2] = 0;
    check_int("GSL follows", gsl_odeiv2_driver_apply(driver, &P, at.vessel->P2, y), GSL_SUCCESS);
    gsl_odeiv2_driver_free(driver);
}

static int fill_slope_3(double P, const double y[], double slope[], void *given)
{
    slope[2] = 0;
    return fill_slope(P, y, slope, given);
}

static const struct gas *const real_ones[] = {&nitrogen, &steep};

static void fill_course(void)
{
    for (int i = 0; i < 2; i++) {
        struct gas_vessel vessel = filling;
        struct gas_vessel_end end;
        double y[3];
        follow(fill_slope_3, (struct course){real_ones[i], &vessel, 0, 0}, y);
        gas_fill(real_ones[i], &vessel, &end);
        check_close("adiabatic filling", end.T2, y[0], 1e-9, 0);
        vessel.wall = GAS_WALL_HEAT;
        vessel.heat = -2.3e5;
        follow(fill_slope_3, (struct course){real_ones[i], &vessel, vessel.heat / (vessel.P2 - vessel.P1), 0}, y);
        gas_fill(real_ones[i], &vessel, &end);
        check_close("filling with heat", end.T2, y[0], 1e-9, 0);
        vessel.wall = GAS_WALL_UA;
        vessel.T_wall = 290;
        vessel.time = 240;
        for (vessel.UA = 0.3; vessel.UA < 1000; vessel.UA *= 6) {
            double exchange = vessel.UA * vessel.time / (vessel.P2 - vessel.P1);
            follow(fill_slope_3, (struct course){real_ones[i], &vessel, 0, exchange}, y);
            gas_fill(real_ones[i], &vessel, &end);
            check_close("filling along a wall, T2", end.T2, y[0], 2e-6, 0);
            check_close("filling along a wall, heat", end.heat, y[1], 2e-5, 0);
        }
    }
}

static void vent_course(void)
{
    for (int i = 0; i < 2; i++) {
        struct gas_vessel vessel = venting;
        struct gas_vessel_end end;
        double y[3];
        vessel.T1 = 390;
        follow(vent_slope, (struct course){real_ones[i], &vessel, 0, 0}, y);
        gas_vent(real_ones[i], &vessel, &end);
        check_close("adiabatic venting", end.T2, y[0], 1e-9, 0);
        check_close("mean of what left", gas_dh(real_ones[i], 390, end.T_out_mean).value * end.moved, y[2], 1e-8, 0);
        vessel.wall = GAS_WALL_HEAT;
        vessel.heat = 3.1e5;
        follow(vent_slope, (struct course){real_ones[i], &vessel, vessel.heat / (vessel.P2 - vessel.P1), 0}, y);
        gas_vent(real_ones[i], &vessel, &end);
        check_close("venting with heat", end.T2, y[0], 1e-9, 0);
        check_close("mean with heat", gas_dh(real_ones[i], 390, end.T_out_mean).value * end.moved, y[2], 1e-8, 0);
        vessel.wall = GAS_WALL_UA;
        vessel.T_wall = 400;
        vessel.time = 240;
        for (vessel.UA = 0.3; vessel.UA < 1000; vessel.UA *= 6) {
            double exchange = vessel.UA * vessel.time / (vessel.P2 - vessel.P1);
            follow(vent_slope, (struct course){real_ones[i], &vessel, 0, exchange}, y);
            gas_vent(real_ones[i], &vessel, &end);
            check_close("venting along a wall, T2", end.T2, y[0], 2e-6, 0);
            check_close("venting along a wall, heat", end.heat, y[1], 2e-5, 0);
            check_close("venting along a wall, mean", gas_dh(real_ones[i], 390, end.T_out_mean).value * end.moved, y[2],
                        1e-4, 20);
        }
    }
}

/* ---- what must hold ------------------------------------------------------------------------------------------ */

static void filling_balance(void)
{
    check_seed(21);
    for (int i = 0; i < 300; i++) {
        struct gas_vessel vessel = {.V = check_random(0.01, 30),
                                    .P1 = i % 7 ? check_random(0.1e5, 5e5) : 0,
                                    .T1 = check_random(250, 350),
                                    .P2 = check_random(5e5, 200e5),
                                    .T_line = check_random(250, 350),
                                    .wall = (enum gas_wall)(i % 5),
                                    .fraction = check_random(0, 1),
                                    .UA = check_random(0, 100),
                                    .time = 100,
                                    .T_wall = 300,
                                    .T_settled = 295};
        vessel.heat = -0.2 * vessel.V * vessel.P2;
        struct gas_vessel_end end;
        if (!check_int("fills", (long)gas_fill(&nitrogen, &vessel, &end).status, GAS_OK))
            continue;
        double gained =
            end.n2 * gas_du(&nitrogen, 298.15, end.T2).value - end.n1 * gas_du(&nitrogen, 298.15, vessel.T1).value;
        double brought = end.moved * (gas_du(&nitrogen, 298.15, vessel.T_line).value + GAS_R * vessel.T_line);
        check_close("first law", gained, brought + end.heat, 1e-9, 1e-9 * vessel.P2 * vessel.V);
        check_close("amounts", end.n2, end.n1 + end.moved, 1e-13, 0);
        check_close("settled", end.P_settled, end.n2 * GAS_R * 295 / vessel.V, 1e-13, 0);
        check_true("no mean temperature of leaving gas", isnan(end.T_out_mean));
    }
}

static void venting_balance(void)
{
    check_seed(22);
    for (int i = 0; i < 300; i++) {
        struct gas_vessel vessel = {.V = check_random(0.01, 30),
                                    .P1 = check_random(5e5, 20e5),
                                    .T1 = check_random(400, 450),
                                    .P2 = check_random(2e5, 5e5),
                                    .T_line = NAN,
                                    .wall = (enum gas_wall)(i % 5),
                                    .fraction = check_random(0, 1),
                                    .UA = check_random(0, 100),
                                    .time = 100,
                                    .T_wall = 320,
                                    .T_settled = NAN};
        vessel.heat = 0.3 * vessel.V * (vessel.P1 - vessel.P2);
        struct gas_vessel_end end;
        if (!check_int("vents", (long)gas_vent(&nitrogen, &vessel, &end).status, GAS_OK))
            continue;
        double left = end.n2 * gas_du(&nitrogen, vessel.T1, end.T2).value;
        double gone = end.moved * (gas_dh(&nitrogen, vessel.T1, end.T_out_mean).value + GAS_R * vessel.T1);
        check_close("first law", left + gone, end.heat, 1e-9, 1e-9 * vessel.P1 * vessel.V);
        check_close("amounts", end.n1, end.n2 + end.moved, 1e-13, 0);
        check_close("settles to T1", end.P_settled, end.n2 * GAS_R * vessel.T1 / vessel.V, 1e-13, 0);
        check_true("what left was between",
                   end.T_out_mean < fmax(vessel.T1, 320) + 1e-9 && end.T_out_mean > fmin(end.T2, vessel.T1) - 1e-9);
    }
}

static void wall_limits(void)
{
    struct gas_vessel vessel = filling;
    struct gas_vessel_end adiabatic, isothermal, end;
    for (int vent = 0; vent < 2; vent++) {
        struct gas_result (*run)(const struct gas *, const struct gas_vessel *, struct gas_vessel_end *) =
            vent ? gas_vent : gas_fill;
        vessel = vent ? venting : filling;
        run(&steep, &vessel, &adiabatic);
        vessel.wall = GAS_WALL_ISOTHERMAL;
        run(&steep, &vessel, &isothermal);
        check_close("stays", isothermal.T2, vessel.T1, 0, 0);
        vessel.wall = GAS_WALL_FRACTION;
        vessel.fraction = 0;
        run(&steep, &vessel, &end);
        check_close("fraction 0", end.T2, adiabatic.T2, 1e-13, 0);
        vessel.fraction = 1;
        run(&steep, &vessel, &end);
        check_close("fraction 1", end.T2, vessel.T1, 1e-12, 0);
        check_close("fraction 1, heat", end.heat, isothermal.heat, 1e-14, 0);
        vessel.fraction = 0.4;
        run(&steep, &vessel, &end);
        check_close("fraction of the heat", end.heat, 0.4 * isothermal.heat, 1e-14, 0);
        check_true("in between", (end.T2 - vessel.T1) * (end.T2 - adiabatic.T2) < 0);
        vessel.wall = GAS_WALL_UA;
        vessel.T_wall = vessel.T1;
        vessel.time = 60;
        vessel.UA = 0;
        run(&steep, &vessel, &end);
        check_close("no wall", end.T2, adiabatic.T2, 1e-13, 0);
        vessel.UA = 1e9;
        run(&steep, &vessel, &end);
        check_close("perfect wall", end.T2, vessel.T1, 1e-6, 0);
        check_close("perfect wall, heat", end.heat, isothermal.heat, 1e-4, 0);
    }
    /* V (P1 - P2): the heat of isothermal venting, whatever the gas, even one without a heat capacity. */
    vessel = venting;
    vessel.wall = GAS_WALL_ISOTHERMAL;
    gas_vent(&bare, &vessel, &end);
    check_close("isothermal venting", end.heat, 0.37 * (41e5 - 6.1e5), 1e-14, 0);
    check_close("isothermal venting, leaves", end.T_out_mean, 301, 0, 0);
    vessel = filling;
    vessel.wall = GAS_WALL_ISOTHERMAL;
    vessel.T_line = NAN;
    check_int("isothermal, line unknown", (long)gas_fill(&bare, &vessel, &end).status, GAS_OK);
    check_close("moved all the same", end.moved, (41e5 - 1.3e5) * 0.37 / (GAS_R * 287), 1e-13, 0);
    check_true("but no heat", isnan(end.heat));
}

static void nothing_moves(void)
{
    struct gas_vessel vessel = filling;
    struct gas_vessel_end end;
    vessel.P2 = vessel.P1;
    gas_fill(&steep, &vessel, &end);
    check_close("T stays", end.T2, 287, 1e-13, 0);
    check_close("nothing came", end.moved, 0, 0, 1e-9);
    gas_vent(&steep, &vessel, &end);
    check_close("T stays", end.T2, 287, 0, 0);
    check_close("nothing left", end.moved, 0, 0, 0);
    check_close("mean", end.T_out_mean, 287, 0, 0);
}

/* ---- bad inputs ---------------------------------------------------------------------------------------------- */

static void bad_fill(const char *id, const struct gas *gas, struct gas_vessel vessel, enum gas_status status,
                     int argument)
{
    struct gas_vessel_end end;
    struct gas_result got = gas_fill(gas, &vessel, &end);
    check_int(id, (long)got.status, (long)status);
    check_int(id, got.argument, argument);
    check_true(id, isnan(got.value) && isnan(end.T2) && isnan(end.moved) && isnan(end.heat));
}

static void bad_vent(const char *id, const struct gas *gas, struct gas_vessel vessel, enum gas_status status,
                     int argument)
{
    struct gas_vessel_end end;
    struct gas_result got = gas_vent(gas, &vessel, &end);
    check_int(id, (long)got.status, (long)status);
    check_int(id, got.argument, argument);
    check_true(id, isnan(got.value) && isnan(end.T2) && isnan(end.moved) && isnan(end.T_out_mean));
}

#define FILL(member, figure) ((vessel = filling, vessel.member = (figure)), vessel)
#define VENT(member, figure) ((vessel = venting, vessel.member = (figure)), vessel)

static void bad_fillings(void)
{
    struct gas_vessel vessel;
    bad_fill("V zero", &nitrogen, FILL(V, 0), GAS_NOT_POSITIVE, 1);
    bad_fill("V infinite", &nitrogen, FILL(V, INFINITY), GAS_NOT_FINITE, 1);
    bad_fill("P1 negative", &nitrogen, FILL(P1, -1), GAS_NEGATIVE, 2);
    bad_fill("P1 NaN", &nitrogen, FILL(P1, NAN), GAS_NOT_FINITE, 2);
    bad_fill("T1 NaN", &nitrogen, FILL(T1, NAN), GAS_NOT_FINITE, 3);
    bad_fill("T1 cold", &nitrogen, FILL(T1, 20), GAS_OUTSIDE_DATA, 3);
    bad_fill("P2 zero", &nitrogen, FILL(P2, 0), GAS_NOT_POSITIVE, 4);
    bad_fill("P2 below", &nitrogen, FILL(P2, 1e5), GAS_WRONG_SIDE, 4);
    bad_fill("T_line negative", &nitrogen, FILL(T_line, -20), GAS_NOT_POSITIVE, 5);
    bad_fill("T_line cold", &nitrogen, FILL(T_line, 20), GAS_OUTSIDE_DATA, 5);
    bad_fill("T_line NaN", &nitrogen, FILL(T_line, NAN), GAS_NOT_FINITE, 5);
    bad_fill("T_settled", &nitrogen, FILL(T_settled, -1), GAS_NOT_POSITIVE, 7);
    bad_fill("no such wall", &nitrogen, FILL(wall, (enum gas_wall)77), GAS_NOT_APPLICABLE, 6);
    vessel.wall = GAS_WALL_ADIABATIC;
    bad_fill("no heat capacity", &bare, FILL(V, 1), GAS_NO_HEAT_CAPACITY, 0);
    vessel = filling;
    vessel.P1 = 0;
    vessel.T1 = -5;
    bad_fill("T1 negative though empty", &nitrogen, vessel, GAS_NOT_POSITIVE, 3);
    vessel.T1 = NAN;
    vessel.wall = GAS_WALL_ISOTHERMAL;
    bad_fill("isothermal at no temperature", &nitrogen, vessel, GAS_NOT_FINITE, 3);
    vessel = FILL(wall, GAS_WALL_HEAT);
    vessel.heat = NAN;
    bad_fill("heat NaN", &nitrogen, vessel, GAS_NOT_FINITE, 6);
    vessel.heat = 1e12;
    bad_fill("far too much heat", &nitrogen, vessel, GAS_OUTSIDE_DATA, 0);
    vessel.heat = -1e12;
    bad_fill("far too little heat", &nitrogen, vessel, GAS_OUTSIDE_DATA, 0);
    vessel.P2 = 1.4e5;
    vessel.heat = 3e4;
    bad_fill("heat alone passes P2", &nitrogen, vessel, GAS_UNREACHABLE, 6);
    vessel = FILL(wall, GAS_WALL_FRACTION);
    vessel.fraction = 1.1;
    bad_fill("fraction", &nitrogen, vessel, GAS_NOT_A_FRACTION, 6);
    vessel.fraction = -0.1;
    bad_fill("fraction negative", &nitrogen, vessel, GAS_NEGATIVE, 6);
    vessel = FILL(wall, GAS_WALL_UA);
    vessel.UA = 5, vessel.time = 60, vessel.T_wall = 0;
    bad_fill("wall at 0 K", &nitrogen, vessel, GAS_NOT_POSITIVE, 6);
    vessel.T_wall = 290, vessel.time = -1;
    bad_fill("time negative", &nitrogen, vessel, GAS_NEGATIVE, 6);
    vessel.time = 60, vessel.UA = NAN;
    bad_fill("UA NaN", &nitrogen, vessel, GAS_NOT_FINITE, 6);
    vessel.UA = 5, vessel.P2 = vessel.P1;
    bad_fill("time without change", &nitrogen, vessel, GAS_NOT_APPLICABLE, 6);
}

static void bad_ventings(void)
{
    struct gas_vessel vessel;
    bad_vent("V", &nitrogen, VENT(V, -1), GAS_NOT_POSITIVE, 1);
    bad_vent("P1", &nitrogen, VENT(P1, 0), GAS_NOT_POSITIVE, 2);
    bad_vent("T1", &nitrogen, VENT(T1, 7000), GAS_OUTSIDE_DATA, 3);
    bad_vent("P2 zero", &nitrogen, VENT(P2, 0), GAS_NOT_POSITIVE, 4);
    bad_vent("P2 above", &nitrogen, VENT(P2, 42e5), GAS_WRONG_SIDE, 4);
    bad_vent("chilled out of the data", &nitrogen, VENT(P2, 1e5), GAS_OUTSIDE_DATA, 0);
    bad_vent("T_settled", &nitrogen, VENT(T_settled, INFINITY), GAS_NOT_FINITE, 7);
    bad_vent("no heat capacity", &bare, VENT(V, 1), GAS_NO_HEAT_CAPACITY, 0);
    vessel = VENT(wall, GAS_WALL_HEAT);
    vessel.P2 = 39e5;
    vessel.heat = -4e5;
    bad_vent("cooled below P2 with nothing leaving", &nitrogen, vessel, GAS_UNREACHABLE, 6);
    vessel.P2 = vessel.P1;
    bad_vent("heat without a fall", &nitrogen, vessel, GAS_UNREACHABLE, 6);
    vessel = VENT(wall, GAS_WALL_UA);
    vessel.UA = 5, vessel.time = 60, vessel.T_wall = 290, vessel.P2 = vessel.P1;
    bad_vent("time without a fall", &nitrogen, vessel, GAS_NOT_APPLICABLE, 6);
}

const struct test_suite suite_vessel = {"vessel", (const struct test_case[]){{"Sandler tank", sandler_tank},
                                                                             {"Fox tank", fox_tank},
                                                                             {"from empty", from_empty},
                                                                             {"filling, course", fill_course},
                                                                             {"venting, course", vent_course},
                                                                             {"filling, balance", filling_balance},
                                                                             {"venting, balance", venting_balance},
                                                                             {"wall limits", wall_limits},
                                                                             {"nothing moves", nothing_moves},
                                                                             {"bad fillings", bad_fillings},
                                                                             {"bad ventings", bad_ventings},
                                                                             {0}}};
