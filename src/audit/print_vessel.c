/* Steps of filling or venting a rigid vessel. */
#include <math.h>
#include <stdio.h>

#include "audit/print.h"
#include "sheet/vessel_task.h"

static const char source[] = "Cengel & Boles, ch. 5; Moran & Shapiro, ch. 4";

static const char *end_words(const struct gas_vessel *vessel, bool fill)
{
    switch (vessel->wall) {
    case GAS_WALL_ISOTHERMAL:
        return "T2 = T1: the wall keeps the gas at its temperature";
    case GAS_WALL_UA:
        return "d(n u) = h dn + UA (T wall - T) dt, the pressure moving evenly in time";
    case GAS_WALL_HEAT:
    case GAS_WALL_FRACTION:
        return fill ? "n2 u(T2) - n1 u(T1) = (n2 - n1) h(T line) + Q"
                    : "what remains expands reversibly, the heat spread evenly over the fall of pressure";
    default:
        return fill ? "n2 u(T2) - n1 u(T1) = (n2 - n1) h(T line)" : "integral of cp dT/T from T1 to T2 = R ln(P2/P1)";
    }
}

static void put_vessel(struct line *line, const struct gas_vessel *vessel, bool fill)
{
    print_figure(line, "V", vessel->V, "m3");
    print_figure(line, "P1", vessel->P1, "Pa");
    print_figure(line, "T1", vessel->T1, "K");
    print_figure(line, "P2", vessel->P2, "Pa");
    if (fill)
        print_figure(line, "T line", vessel->T_line, "K");
}

static void put_state(struct line *line, const char *P, double pressure, const char *T, double temperature,
                      const struct gas_vessel *vessel)
{
    print_figure(line, P, pressure, "Pa");
    print_figure(line, "V", vessel->V, "m3");
    print_figure(line, T, temperature, "K");
}

bool print_vessel(struct print *print, struct gas_refusal *refusal)
{
    struct gas_vessel_case solved;
    bool fill = print->job->task == &gas_fill_task;
    if (!gas_vessel_solve(print->job, &print->figures, &solved, refusal))
        return false;
    const struct gas_vessel *vessel = &solved.vessel;
    const struct gas_vessel_end *end = &solved.end;
    put_state(print_step(print, "n1", "n1 = P1 V/(R T1)", end->n1, "mol", "P V = n R T"), "P1", vessel->P1, "T1",
              vessel->T1, vessel);
    put_vessel(print_step(print, "T2", end_words(vessel, fill), end->T2, "K", source), vessel, fill);
    put_state(print_step(print, "n2", "n2 = P2 V/(R T2)", end->n2, "mol", "P V = n R T"), "P2", vessel->P2, "T2",
              end->T2, vessel);
    struct line *line =
        print_step(print, fill ? "added" : "out", fill ? "n2 - n1" : "n1 - n2", end->moved, "mol", "balance of amount");
    print_figure(line, "n1", end->n1, "mol");
    print_figure(line, "n2", end->n2, "mol");
    if (isfinite(end->P_settled))
        print_figure(print_step(print, "P settled", "n2 R T settled/V; T settled = T1 unless given", end->P_settled,
                                "Pa", "P V = n R T"),
                     "n2", end->n2, "mol");
    if (isfinite(end->heat))
        print_step(print, "Q", "heat into the gas through the wall", end->heat, "J", source);
    return true;
}
