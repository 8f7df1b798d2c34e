/* What can be asked of a path: changes along it, quantities at its points. */
#include "sheet/path_task.h"

#include <math.h>
#include <string.h>

#include <gasleaf/heat.h>

#include "sheet/job_units.h"

/* The wanted symbols that are a change along the path. */
static const struct change_row {
    enum gas_symbol symbol;
    enum gas_dimension molar;
    size_t offset; /* of the figure in struct gas_change */
} change_rows[] = {
    {GAS_SYM_W, GAS_DIM_MOLAR_ENERGY, offsetof(struct gas_change, W)},
    {GAS_SYM_Q, GAS_DIM_MOLAR_ENERGY, offsetof(struct gas_change, Q)},
    {GAS_SYM_DU, GAS_DIM_MOLAR_ENERGY, offsetof(struct gas_change, dU)},
    {GAS_SYM_DH, GAS_DIM_MOLAR_ENERGY, offsetof(struct gas_change, dH)},
    {GAS_SYM_DS, GAS_DIM_MOLAR_ENTROPY, offsetof(struct gas_change, dS)},
    {GAS_SYM_S_MADE, GAS_DIM_MOLAR_ENTROPY, offsetof(struct gas_change, S_made)},
    {GAS_SYM_Q_IN, GAS_DIM_MOLAR_ENERGY, offsetof(struct gas_change, Q_in)},
    {GAS_SYM_Q_OUT, GAS_DIM_MOLAR_ENERGY, offsetof(struct gas_change, Q_out)},
};

/* The wanted symbols that are a property of a point, by the molar figure they come from. */
enum point_figure { POINT_P, POINT_T, POINT_V, POINT_N, POINT_RHO, POINT_H, POINT_U, POINT_S };
static const struct point_row {
    enum gas_symbol symbol;
    enum point_figure figure;
    enum gas_dimension molar;
} point_rows[] = {
    {GAS_SYM_P, POINT_P, GAS_DIM_PRESSURE},
    {GAS_SYM_T, POINT_T, GAS_DIM_TEMPERATURE},
    {GAS_SYM_V, POINT_V, GAS_DIM_MOLAR_VOLUME},
    {GAS_SYM_V_SPECIFIC, POINT_V, GAS_DIM_MOLAR_VOLUME},
    {GAS_SYM_N, POINT_N, GAS_DIM_NUMBER},
    {GAS_SYM_M, POINT_N, GAS_DIM_NUMBER},
    {GAS_SYM_RHO, POINT_RHO, GAS_DIM_DENSITY},
    {GAS_SYM_H_SPECIFIC, POINT_H, GAS_DIM_MOLAR_ENERGY},
    {GAS_SYM_U_SPECIFIC, POINT_U, GAS_DIM_MOLAR_ENERGY},
    {GAS_SYM_S_SPECIFIC, POINT_S, GAS_DIM_MOLAR_ENTROPY},
    {GAS_SYM_H_TOTAL, POINT_H, GAS_DIM_MOLAR_ENERGY},
    {GAS_SYM_U_TOTAL, POINT_U, GAS_DIM_MOLAR_ENERGY},
    {GAS_SYM_S_TOTAL, POINT_S, GAS_DIM_MOLAR_ENTROPY},
};

static double point_figure(const struct gas_job *job, const struct gas_point *point, const struct gas_heading *heading,
                           enum point_figure figure)
{
    const struct gas_datum *datum = &job->options.datum;
    switch (figure) {
    case POINT_P:
        return point->P;
    case POINT_T:
        return point->T;
    case POINT_V:
        return point->v;
    case POINT_N:
        return 1;
    case POINT_RHO:
        return heading->unit.dimension == GAS_DIM_CONCENTRATION ? 1 / point->v : job->gas.molar_mass / point->v;
    case POINT_H:
        return gas_dh(&job->gas, datum->T, point->T).value;
    case POINT_U:
        return gas_dh(&job->gas, datum->T, point->T).value - point->P * point->v;
    case POINT_S:
        return gas_ds(&job->gas, datum->T, datum->P, point->T, point->P).value;
    }
    return NAN;
}

/* A figure per mole in what the heading asks for, or the reason it does not follow. */
static bool in_basis(const struct gas_job *job, enum gas_dimension molar, double figure, double n,
                     const struct gas_heading *heading, double *si, struct gas_refusal *refusal)
{
    *si = gas_job_from_molar(job, molar, figure, n, heading->unit.dimension);
    if (!isnan(*si))
        return true;
    if (isnan(figure) && job->gas.interval_count == 0)
        return gas_refuse(refusal, "gas", "%s has no heat capacity, which %s needs; give one after '|'.",
                          job->choice->label, heading->text);
    return gas_refuse_no_basis(heading, n, refusal);
}

bool gas_point_quantity(const struct gas_job *job, const struct gas_point *point, double n,
                        const struct gas_heading *heading, double *si, struct gas_refusal *refusal)
{
    for (size_t i = 0; i < sizeof point_rows / sizeof *point_rows; i++) {
        const struct point_row *row = &point_rows[i];
        if (row->symbol != heading->symbol)
            continue;
        double figure = point_figure(job, point, heading, row->figure);
        if (row->figure == POINT_P || row->figure == POINT_T || row->figure == POINT_RHO) {
            *si = figure;
            return true;
        }
        return in_basis(job, row->molar, figure, n, heading, si, refusal);
    }
    return gas_refuse(refusal, heading->text,
                      "a path does not give this quantity; ask for W, Q, dU, dH, dS, S made or "
                      "P, T, V, v, rho, m, n, h, u, s at the end.");
}

bool gas_path_quantity(const struct gas_job *job, const struct gas_path_case *path, const struct gas_change *change,
                       const struct gas_heading *heading, double *si, struct gas_refusal *refusal)
{
    for (size_t i = 0; i < sizeof change_rows / sizeof *change_rows; i++)
        if (change_rows[i].symbol == heading->symbol) {
            double figure;
            memcpy(&figure, (const char *)change + change_rows[i].offset, sizeof figure);
            return in_basis(job, change_rows[i].molar, figure, path->n, heading, si, refusal);
        }
    const struct gas_point *point = &change->end;
    if (heading->state > (int)path->count + 1)
        return gas_refuse(refusal, heading->text,
                          "the path ends at state %zu, one after each leg; ask for that or an "
                          "earlier one.",
                          path->count + 1);
    if (heading->state > 0)
        point = heading->state == 1 ? &path->start : &path->change[heading->state - 2].end;
    return gas_point_quantity(job, point, path->n, heading, si, refusal);
}
