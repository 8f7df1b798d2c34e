#include <math.h>

#include <gasleaf/heat.h>
#include <gasleaf/vessel.h>
#include <gsl/gsl_errno.h>
#include <gsl/gsl_odeiv2.h>

#include "check.h"
#include "some_gases.h"

static const struct gas_vessel venting = {.V = 0.37, .P1 = 41e5, .T1 = 301, .P2 = 6.1e5, .T_settled = NAN};

static struct gas perfect(struct gas_interval *interval, double k)
{
    return constant_gas(interval, GAS_R * k / (k - 1), GAS_R, 0.0289);
}

static void choked_constants(void)
{
    /* flow sqrt(R T/M)/(P A): 0.6847 for k = 1.4, 0.6673 for 1.3, 0.7262 for 5/3 (Shapiro, vol. 1, ch. 4; White, Fluid
     * Mechanics, ch. 9); from memory */
    static const double row[][2] = {{1.4, 0.6847}, {1.3, 0.6673}, {5.0 / 3, 0.7262}};
    for (int i = 0; i < 3; i++) {
        struct gas_interval interval;
        const struct gas gas = perfect(&interval, row[i][0]);
        double flow = gas_nozzle_flow(&gas, 7e5, 310, 1e5, 3e-4, 1).value;
        check_close("choked", flow * 0.0289 * sqrt(GAS_R / 0.0289 * 310) / (7e5 * 3e-4), row[i][1], 0, 0.5e-4);
    }
    /* NACA Report 1135, table I, M = 0.50: p/pt = 0.8430, A/A* = 1.3398; from memory */
    struct gas_interval interval;
    const struct gas air = perfect(&interval, 1.4);
    double choked = gas_nozzle_flow(&air, 7e5, 310, 0, 3e-4, 0.8).value;
    check_close("M = 0.5", choked / gas_nozzle_flow(&air, 7e5, 310, 0.8430 * 7e5, 3e-4, 0.8).value, 1.3398, 2e-4, 0);
    /* critical ratio 0.5283 for k = 1.4 (the same table) */
    check_close("just choked", gas_nozzle_flow(&air, 7e5, 310, 0.5283 * 7e5, 3e-4, 0.8).value, choked, 1e-7, 0);
    check_true("not choked", gas_nozzle_flow(&air, 7e5, 310, 0.55 * 7e5, 3e-4, 0.8).value < choked * (1 - 5e-4));
    check_close("no difference, no flow", gas_nozzle_flow(&air, 7e5, 310, 7e5, 3e-4, 0.8).value, 0, 0, 0);
}

/* The flow again, as density times velocity at the Mach number of the pressure ratio. */
static double flow_by_mach(double k, double P, double T, double P_down, double area)
{
    double M2 = 2 / (k - 1) * (pow(fmax(P_down / P, 1e-9), -(k - 1) / k) - 1);
    M2 = fmin(M2, 1);
    double T_throat = T / (1 + (k - 1) / 2 * M2), P_throat = P * pow(T_throat / T, k / (k - 1));
    return P_throat / (GAS_R * T_throat) * area * sqrt(M2 * k * GAS_R / 0.0289 * T_throat);
}

static void any_ratio(void)
{
    check_seed(31);
    for (int i = 0; i < 300; i++) {
        struct gas_interval interval;
        double k = check_random(1.05, 1.66), P = check_random(1e5, 50e5), T = check_random(200, 600);
        double P_down = P * (i % 3 ? check_random(0, 1) : 1 - pow(10, check_random(-6, -2)));
        const struct gas gas = perfect(&interval, k);
        check_close("flow", gas_nozzle_flow(&gas, P, T, P_down, 2e-4, 0.71).value,
                    0.71 * flow_by_mach(k, P, T, P_down, 2e-4), 1e-9, 0);
    }
}

struct emptying {
    double k, P_down, CA, V, n1, P1, T1;
    bool adiabatic;
};

static int empty_slope(double t, const double y[], double slope[], void *given)
{
    const struct emptying *at = given;
    double P = at->adiabatic ? at->P1 * pow(y[0] / at->n1, at->k) : at->P1 * y[0] / at->n1;
    double T = P * at->V / (y[0] * GAS_R);
    (void)t;
    slope[0] = P > at->P_down ? -flow_by_mach(at->k, P, T, at->P_down, at->CA) : 0;
    return GSL_SUCCESS;
}

/* Let GSL empty the vessel for the time found: it must come out at P2. */
static void emptying_time(void)
{
    static const double target[] = {20e5, 4e5, 1.95e5, 1.4e5, 1.06e5};
    for (int i = 0; i < 10; i++) {
        struct gas_interval interval;
        struct gas_vessel vessel = venting;
        bool adiabatic = i < 5;
        vessel.P2 = target[i % 5];
        vessel.wall = adiabatic ? GAS_WALL_ADIABATIC : GAS_WALL_ISOTHERMAL;
        const struct gas gas = perfect(&interval, 1.31);
        double time = gas_vent_time(&gas, &vessel, 1.02e5, 3e-5, 0.8).value;
        double n1 = vessel.P1 * vessel.V / (GAS_R * vessel.T1), t = 0, n = n1;
        struct emptying at = {1.31, 1.02e5, 0.8 * 3e-5, vessel.V, n1, vessel.P1, vessel.T1, adiabatic};
        gsl_odeiv2_system system = {empty_slope, NULL, 1, &at};
        gsl_odeiv2_driver *driver = gsl_odeiv2_driver_alloc_y_new(&system, gsl_odeiv2_step_rkf45, 1e-3, 1e-11, 1e-11);
        check_int("GSL empties", gsl_odeiv2_driver_apply(driver, &t, time, &n), GSL_SUCCESS);
        gsl_odeiv2_driver_free(driver);
        double P = vessel.P1 * (adiabatic ? pow(n / n1, 1.31) : n / n1);
        check_close(adiabatic ? "adiabatic time" : "isothermal time", P, vessel.P2, 1e-7, 0);
    }
}

static void emptying_limits(void)
{
    struct gas_interval interval;
    const struct gas gas = perfect(&interval, 1.4);
    struct gas_vessel vessel = venting;
    vessel.P2 = 1e5;
    double whole = gas_vent_time(&gas, &vessel, 1e5, 3e-5, 0.8).value;
    vessel.P2 = 1e5 * (1 + 1e-9);
    check_close("to the very end", gas_vent_time(&gas, &vessel, 1e5, 3e-5, 0.8).value, whole, 1e-4, 0);
    check_true("finite", whole > 0 && whole < 1000);
    vessel.P1 = vessel.P2 = 5e5;
    check_close("no time", gas_vent_time(&gas, &vessel, 1e5, 3e-5, 0.8).value, 0, 0, 0);
    /* Isothermal into vacuum: t = V ln(P1/P2)/(0.6847 C A sqrt(R T/M)) by hand, k = 1.4 */
    vessel = venting;
    vessel.wall = GAS_WALL_ISOTHERMAL;
    double by_hand = 0.37 * log(41 / 6.1) / (0.68473 * 0.8 * 3e-5 * sqrt(8.314462618 / 0.0289 * 301));
    check_close("into vacuum", gas_vent_time(&gas, &vessel, 0, 3e-5, 0.8).value, by_hand, 2e-5, 0);
}

static void bad(const char *id, struct gas_result got, enum gas_status status, int argument)
{
    check_int(id, (long)got.status, (long)status);
    check_int(id, got.argument, argument);
    check_true(id, isnan(got.value));
}

static void bad_orifices(void)
{
    struct gas massless = nitrogen;
    struct gas_vessel vessel = venting;
    massless.molar_mass = NAN;
    bad("P", gas_nozzle_flow(&nitrogen, 0, 300, 0, 1e-4, 1), GAS_NOT_POSITIVE, 2);
    bad("T", gas_nozzle_flow(&nitrogen, 1e5, 100, 0, 1e-4, 1), GAS_OUTSIDE_DATA, 3);
    bad("T NaN", gas_nozzle_flow(&nitrogen, 1e5, NAN, 0, 1e-4, 1), GAS_NOT_FINITE, 3);
    bad("P_down negative", gas_nozzle_flow(&nitrogen, 1e5, 300, -1, 1e-4, 1), GAS_NEGATIVE, 4);
    bad("P_down above", gas_nozzle_flow(&nitrogen, 1e5, 300, 2e5, 1e-4, 1), GAS_WRONG_SIDE, 4);
    bad("area", gas_nozzle_flow(&nitrogen, 1e5, 300, 0, 0, 1), GAS_NOT_POSITIVE, 5);
    bad("coefficient", gas_nozzle_flow(&nitrogen, 1e5, 300, 0, 1e-4, 1.2), GAS_NOT_A_FRACTION, 6);
    bad("coefficient 0", gas_nozzle_flow(&nitrogen, 1e5, 300, 0, 1e-4, 0), GAS_NOT_POSITIVE, 6);
    bad("molar mass", gas_nozzle_flow(&massless, 1e5, 300, 0, 1e-4, 1), GAS_NOT_FINITE, 1);
    bad("heat capacity", gas_nozzle_flow(&bare, 1e5, 300, 0, 1e-4, 1), GAS_NO_HEAT_CAPACITY, 1);
    bad("time, V", gas_vent_time(&nitrogen, &(struct gas_vessel){.V = NAN}, 1e5, 1e-4, 1), GAS_NOT_FINITE, 1);
    bad("time, P2 below", gas_vent_time(&nitrogen, &vessel, 7e5, 1e-4, 1), GAS_WRONG_SIDE, 4);
    bad("time, P_down", gas_vent_time(&nitrogen, &vessel, NAN, 1e-4, 1), GAS_NOT_FINITE, 8);
    bad("time, area", gas_vent_time(&nitrogen, &vessel, 1e5, -1, 1), GAS_NOT_POSITIVE, 9);
    bad("time, coefficient", gas_vent_time(&nitrogen, &vessel, 1e5, 1e-4, 2), GAS_NOT_A_FRACTION, 10);
    bad("time, gas", gas_vent_time(&massless, &vessel, 1e5, 1e-4, 1), GAS_NOT_FINITE, 0);
    vessel.T1 = 9000;
    bad("time, T1", gas_vent_time(&nitrogen, &vessel, 1e5, 1e-4, 1), GAS_OUTSIDE_DATA, 3);
    vessel = venting;
    vessel.wall = GAS_WALL_HEAT;
    bad("time, wall", gas_vent_time(&nitrogen, &vessel, 1e5, 1e-4, 1), GAS_NOT_APPLICABLE, 6);
}

const struct test_suite suite_nozzle = {"nozzle", (const struct test_case[]){{"choked flow", choked_constants},
                                                                             {"any ratio", any_ratio},
                                                                             {"emptying time", emptying_time},
                                                                             {"emptying limits", emptying_limits},
                                                                             {"bad inputs", bad_orifices},
                                                                             {0}}};
