/* TRACE: points along the path of one case, for charts. */
#include <math.h>

#include "sheet/functions.h"
#include "sheet/path_call.h"

enum { POINTS_PER_LEG = 20, POINTS_MOST = 5000 };

static bool read_points(struct gas_path_call *path, const struct gas_block *argument, size_t *points)
{
    *points = POINTS_PER_LEG;
    if (gas_omitted(argument))
        return true;
    double count = argument->cell->number;
    if (!gas_single(argument) || argument->cell->kind != GAS_CELL_NUMBER || !(count >= 1 && count <= POINTS_MOST))
        return gas_refuse(&path->refusal, "points", "give the number of steps along each leg, a figure from 1 to %d.",
                          POINTS_MOST);
    *points = (size_t)count;
    return true;
}

static bool put_point(struct gas_path_call *path, struct gas_call *call, size_t row, const struct gas_path_case *solved,
                      const struct gas_point *point)
{
    const struct gas_job *job = &path->job;
    for (size_t i = 0; i < job->wanted.columns; i++) {
        double si;
        if (!gas_point_quantity(job, point, solved->n, &job->wanted.heading[i], &si, &path->refusal))
            return false;
        gas_put_number(call, row, i, gas_job_shown(job, &path->figures, &job->wanted.heading[i], si));
    }
    return true;
}

/* How far along a leg its k-th point lies: equal steps where the leg is straight in P-V, equal volume ratios where it
 * is curved, so that a chart is smooth at small volumes too. */
static double fraction_at(const struct gas_path_case *solved, size_t leg, double part)
{
    const struct gas_point *start = leg ? &solved->change[leg - 1].end : &solved->start;
    double ratio = solved->change[leg].end.v / start->v;
    enum gas_process process = solved->leg[leg].process;
    bool curved = process == GAS_ISOTHERMAL || process == GAS_ADIABATIC || process == GAS_POLYTROPIC;
    return curved && fabs(ratio - 1) > 1e-6 && part < 1 ? (pow(ratio, part) - 1) / (ratio - 1) : part;
}

/* The points of one leg behind its start; the last is exactly its end. */
static bool put_leg_points(struct gas_path_call *path, struct gas_call *call, const struct gas_path_case *solved,
                           size_t leg, size_t points)
{
    const struct gas_point *start = leg ? &solved->change[leg - 1].end : &solved->start;
    for (size_t k = 1; k <= points; k++) {
        struct gas_point at;
        struct gas_result result =
            gas_leg_at(&path->job.gas, path->job.options.system, start, &solved->leg[leg], &solved->change[leg],
                       fraction_at(solved, leg, (double)k / (double)points), &at);
        if (result.status != GAS_OK)
            return gas_refuse_leg(&path->refusal, &path->job, solved, leg + 1, &result);
        if (!put_point(path, call, 1 + leg * points + k, solved, &at))
            return false;
    }
    return true;
}

static bool answer_trace(struct gas_path_call *path, struct gas_call *call, size_t points)
{
    struct gas_path_case solved;
    if (path->job.wanted.columns == 0)
        gas_path_columns(&path->job, false);
    if (!gas_path_solve_one(path, call, &solved) ||
        !gas_answer_block(call, 2 + solved.count * points, path->job.wanted.columns))
        return !path->refusal.made;
    gas_path_put_headings(&path->job, call, 0);
    if (!put_point(path, call, 1, &solved, &solved.start))
        return false;
    for (size_t leg = 0; leg < solved.count; leg++)
        if (!put_leg_points(path, call, &solved, leg, points))
            return false;
    return true;
}

/* (gas; given; legs; [wanted]; [points]; [options]) */
void gas_fn_trace(struct gas_call *call)
{
    static const struct gas_path_arguments places = {.given = 1, .legs = 2, .wanted = 3, .options = 5};
    struct gas_path_call path;
    size_t points;
    if (!gas_path_start(&path, call, &places) || !read_points(&path, gas_argument(call, 4), &points) ||
        !answer_trace(&path, call, points))
        gas_job_refused(call, &path.job.options, &path.refusal);
    gas_job_close(&path.job);
}
