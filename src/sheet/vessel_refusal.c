#include "sheet/vessel_refusal.h"

#include <math.h>

#include <gasleaf/heat.h>

#include "sheet/job_units.h"
#include "sheet/machine.h"

static bool refuse_outside(struct gas_refusal *refusal, const struct gas_job *job, const char *what, double T)
{
    struct gas_range range = gas_range_of(&job->gas);
    struct gas_unit unit = gas_job_unit(job, GAS_DIM_TEMPERATURE, "°C");
    return gas_refuse_temperature(refusal, what, T, &unit, job->choice->label, range.T_from, range.T_to);
}

/* A given figure that is no more than wrong in itself: not above zero, not finite, outside the data. */
static bool refuse_given(struct gas_refusal *refusal, const struct gas_job *job, const struct gas_case *figures,
                         enum gas_symbol symbol, int state, const struct gas_result *fault)
{
    char name[GAS_NAME_TEXT], shown[GAS_SHOWN];
    int column = gas_job_column(job, symbol, state);
    gas_quantity_name(name, symbol, state);
    if (column < 0 || isnan(figures->si[column]))
        return gas_refuse(refusal, name, "it is missing; give it.");
    const struct gas_unit *unit = &job->table.heading[column].unit;
    if (fault->status == GAS_OUTSIDE_DATA) {
        struct gas_range range = gas_range_of(&job->gas);
        return gas_refuse_temperature(refusal, name, figures->si[column], unit, job->choice->label, range.T_from,
                                      range.T_to);
    }
    return gas_refuse(refusal, name, "%s %s.", gas_figure(shown, sizeof shown, figures->row->figure[column], unit),
                      gas_status_words(fault->status));
}

/* P2 on the wrong side of P1, or of the pressure outside. */
static bool refuse_P2(struct gas_refusal *refusal, const struct gas_job *job, const struct gas_case *figures,
                      const struct gas_vessel_case *solved, const struct gas_result *fault)
{
    char end[GAS_SHOWN], other[GAS_SHOWN];
    const struct gas_vessel *vessel = &solved->vessel;
    gas_shown_pressure(job, figures, end, vessel->P2);
    gas_shown_pressure(job, figures, other, vessel->P1);
    if (fault->status != GAS_WRONG_SIDE)
        return refuse_given(refusal, job, figures, GAS_SYM_P, 2, fault);
    if (job->task == &gas_fill_task)
        return gas_refuse(refusal, "P2", "%s is below P1, %s; a filling raises the pressure, GAS.VENT lowers it.", end,
                          other);
    if (vessel->P2 > vessel->P1)
        return gas_refuse(refusal, "P2", "%s is above P1, %s; a venting lowers the pressure, GAS.FILL raises it.", end,
                          other);
    return gas_refuse(refusal, "P2", "%s is below the pressure outside, %s; it cannot be reached by venting.", end,
                      gas_shown_pressure(job, figures, other, solved->P_outside));
}

static bool refuse_wall(struct gas_refusal *refusal, const struct gas_job *job, const struct gas_case *figures,
                        const struct gas_vessel_case *solved, const struct gas_result *fault)
{
    switch (fault->status) {
    case GAS_UNREACHABLE:
        return gas_refuse(refusal, "Q",
                          "that much heat passes P2 without any gas %s; check figure, sign (positive into the gas) and "
                          "unit.",
                          job->task == &gas_fill_task ? "coming in" : "leaving");
    case GAS_NOT_APPLICABLE:
        return solved->vessel.wall == GAS_WALL_UA
                   ? gas_refuse(refusal, "UA",
                                "the pressure does not change, or the time is found from an orifice; UA "
                                "needs a change of pressure over a given time.")
                   : gas_refuse(refusal, "time",
                                "the time through an orifice is found for an adiabatic or an isothermal "
                                "vessel; take one of these options.");
    case GAS_OUTSIDE_DATA:
        return refuse_given(refusal, job, figures, GAS_SYM_T_WALL, 0, fault);
    default:
        return gas_refuse(refusal, solved->vessel.wall == GAS_WALL_HEAT ? "Q" : "UA",
                          "%s %s; check UA, time and T wall.", gas_shown(fault->figure).text,
                          gas_status_words(fault->status));
    }
}

/* T2 leaves the data by a limit: a constant heat capacity has none. */
static bool refuse_end(struct gas_refusal *refusal, const struct gas_job *job, const struct gas_case *figures,
                       double limit)
{
    char T[GAS_SHOWN];
    bool cold = limit <= gas_range_of(&job->gas).T_from;
    gas_shown_temperature(job, figures, T, limit);
    return gas_refuse(refusal, "T2",
                      "the gas gets %s than %s, where the data for %s ends; let heat pass the wall, as with the option "
                      "heat %s 30 %%, or take a constant heat capacity, such as | cp at 25 °C behind the gas.",
                      cold ? "colder" : "hotter", T, job->choice->label, cold ? "gained" : "lost");
}

bool gas_refuse_vessel(struct gas_refusal *refusal, const struct gas_job *job, const struct gas_case *figures,
                       const struct gas_vessel_case *solved, const struct gas_result *fault)
{
    if (fault->status == GAS_NO_HEAT_CAPACITY)
        return gas_refuse(refusal, "gas", "%s has no heat capacity; give one after '|', such as | k = 1.4.",
                          job->choice->label);
    switch (fault->argument) {
    case 0:
        return refuse_end(refusal, job, figures, fault->figure);
    case AT_VESSEL_V:
        return refuse_given(refusal, job, figures, GAS_SYM_V, gas_job_column(job, GAS_SYM_V, 0) >= 0 ? 0 : 1, fault);
    case AT_VESSEL_P1:
        return refuse_given(refusal, job, figures, GAS_SYM_P, 1, fault);
    case AT_VESSEL_T1:
        return fault->status == GAS_OUTSIDE_DATA && gas_job_column(job, GAS_SYM_T, 1) < 0
                   ? refuse_outside(refusal, job, "T1", solved->vessel.T1)
                   : refuse_given(refusal, job, figures, GAS_SYM_T, 1, fault);
    case AT_VESSEL_P2:
        return refuse_P2(refusal, job, figures, solved, fault);
    case AT_VESSEL_LINE:
        return refuse_given(refusal, job, figures, GAS_SYM_T_LINE, 0, fault);
    case AT_VESSEL_SETTLED:
        return refuse_given(refusal, job, figures, GAS_SYM_T_SETTLED, 0, fault);
    case AT_ORIFICE_P:
        return refuse_P2(refusal, job, figures, solved, fault);
    case AT_ORIFICE_AREA:
        return refuse_given(refusal, job, figures, GAS_SYM_AREA, 0, fault);
    case AT_ORIFICE_CD:
        return refuse_given(refusal, job, figures, GAS_SYM_DISCHARGE, 0, fault);
    default:
        return refuse_wall(refusal, job, figures, solved, fault);
    }
}

bool gas_refuse_no_level(struct gas_refusal *refusal, const struct gas_heading *heading)
{
    if (heading->symbol == GAS_SYM_P_SETTLED || heading->symbol == GAS_SYM_T_SETTLED)
        return gas_refuse(refusal, "T settled", "%s needs T settled or T1; give one of them.", heading->text);
    if (heading->symbol == GAS_SYM_Q)
        return gas_refuse(refusal, "T line", "the heat of an isothermal filling needs T line; give it.");
    return gas_refuse(refusal, heading->text, "it was not given and nothing tells it.");
}
