#include "audit/replay.h"

#include <math.h>
#include <string.h>

#include <gasleaf/heat.h>

#include "audit/models.h"
#include "audit/path_replay.h"

static struct gas_leg_figure *leg_figure(struct gas_typed_leg *leg, enum leg_place place)
{
    return place == LEG_VALUE ? &leg->value : place == LEG_SECOND ? &leg->second : &leg->outside;
}

double replay_figure(const struct desk *desk, const struct desk_case *truth, size_t site)
{
    const struct site *at = &desk->site[site];
    if (at->kind == SITE_WANTED)
        return truth->truth;
    if (at->kind == SITE_GIVEN)
        return truth->row.given >> at->index & 1 ? truth->row.figure[at->index] : NAN;
    if (at->kind == SITE_STAGING)
        return desk->staging->figure[at->index].figure;
    struct gas_typed_leg leg = desk->legs->leg[at->index];
    return leg_figure(&leg, at->place)->figure;
}

/* -- the desk ------------------------------------------------------------------------------------------------------ */

static void add_site(struct desk *desk, struct site site)
{
    if (desk->sites < SITES)
        desk->site[desk->sites++] = site;
}

static enum gas_symbol symbol_of_end(enum gas_ending ending)
{
    switch (ending) {
    case GAS_TO_P:
    case GAS_TO_P_AND_V:
        return GAS_SYM_P;
    case GAS_TO_T:
        return GAS_SYM_T;
    case GAS_TO_V:
        return GAS_SYM_V;
    case GAS_WITH_Q:
        return GAS_SYM_Q;
    case GAS_WITH_W:
        return GAS_SYM_W;
    default:
        return GAS_SYM_NONE;
    }
}

static void add_leg_sites(struct desk *desk, int index)
{
    const struct gas_typed_leg *leg = &desk->legs->leg[index];
    struct site site = {.kind = SITE_LEG, .index = index, .state = index + 2};
    site.symbol = symbol_of_end(leg->ending);
    site.place = LEG_VALUE;
    site.unit = &leg->value.unit;
    if (leg->value.kind == GAS_FIGURE_FIXED && site.symbol != GAS_SYM_NONE)
        add_site(desk, site);
    site.symbol = GAS_SYM_V;
    site.place = LEG_SECOND;
    site.unit = &leg->second.unit;
    if (leg->second.kind == GAS_FIGURE_FIXED)
        add_site(desk, site);
    site.symbol = GAS_SYM_P_OUTSIDE;
    site.place = LEG_OUTSIDE;
    site.unit = &leg->outside.unit;
    if (leg->outside.kind == GAS_FIGURE_FIXED)
        add_site(desk, site);
}

/* The temperature behind the coolers; a drop is a difference, the rest are plain numbers. */
static void add_staging_sites(struct desk *desk)
{
    const struct gas_leg_figure *cool = desk->staging ? &desk->staging->figure[GAS_SAYS_COOLING] : NULL;
    if (cool && cool->kind == GAS_FIGURE_FIXED)
        add_site(desk, (struct site){
                           .kind = SITE_STAGING, .index = GAS_SAYS_COOLING, .symbol = GAS_SYM_T, .unit = &cool->unit});
}

static void find_sites(struct desk *desk)
{
    const struct gas_job *job = desk->job;
    desk->sites = 0;
    for (size_t i = 0; i < job->table.columns; i++) {
        const struct gas_heading *heading = &job->table.heading[i];
        bool figure = heading->state != GAS_CONSTANT && heading->symbol != GAS_SYM_BAROMETER &&
                      heading->symbol != GAS_SYM_ALTITUDE;
        if (!heading->tolerance && figure)
            add_site(desk,
                     (struct site){SITE_GIVEN, (int)i, LEG_VALUE, heading->symbol, heading->state, &heading->unit});
    }
    for (size_t i = 0; desk->legs && i < desk->legs->count && desk->sites + 4 < SITES; i++)
        add_leg_sites(desk, (int)i);
    add_staging_sites(desk);
    const struct gas_heading *wanted = &job->wanted.heading[0];
    add_site(desk, (struct site){SITE_WANTED, 0, LEG_VALUE, wanted->symbol, wanted->state, &wanted->unit});
}

/* The same job with another wanted heading; NULL when it cannot be prepared. */
static struct gas_job *variant(const struct desk *desk, const struct gas_heading *heading, struct gas_arena *arena)
{
    struct gas_refusal refusal = {0};
    struct gas_job *job = gas_arena_take(arena, 1, sizeof *job);
    if (!job)
        return NULL;
    *job = *desk->job;
    job->wanted.heading[0] = *heading;
    return gas_job_prepare(job, arena, &refusal) ? job : NULL;
}

static struct gas_job *temperature_of(const struct desk *desk, int state, struct gas_arena *arena)
{
    struct gas_heading heading = {.symbol = GAS_SYM_T, .state = state, .has_unit = true};
    heading.unit = gas_unit_si(GAS_DIM_TEMPERATURE);
    memcpy(heading.text, "T", sizeof "T");
    return variant(desk, &heading, arena);
}

static struct gas_job *other_energy(const struct desk *desk, struct gas_arena *arena)
{
    static const enum gas_symbol pairs[][2] = {{GAS_SYM_DH, GAS_SYM_DU},
                                               {GAS_SYM_H_SPECIFIC, GAS_SYM_U_SPECIFIC},
                                               {GAS_SYM_H_TOTAL, GAS_SYM_U_TOTAL},
                                               {GAS_SYM_CP, GAS_SYM_CV}};
    struct gas_heading heading = desk->job->wanted.heading[0];
    for (size_t i = 0; i < sizeof pairs / sizeof *pairs; i++)
        for (int k = 0; k < 2; k++)
            if (heading.symbol == pairs[i][k]) {
                heading.symbol = pairs[i][1 - k];
                return variant(desk, &heading, arena);
            }
    return NULL;
}

void desk_open(struct desk *desk, struct gas_job *job, struct gas_arena *arena)
{
    memset(desk, 0, sizeof *desk);
    desk->job = job;
    desk->legs = job->task == &gas_path_task ? job->legs : NULL;
    desk->staging = job->task == &gas_stages_task ? job->legs : NULL;
    find_sites(desk);
    desk->other = other_energy(desk, arena);
    if (!desk->legs && job->gas.interval_count > 0) {
        int wanted = job->wanted.heading[0].state, given = gas_job_last_state(job);
        int last = wanted > given ? wanted : given;
        desk->start = temperature_of(desk, last > 0 ? 1 : 0, arena);
        desk->end = last > 1 ? temperature_of(desk, last, arena) : NULL;
    }
}

static double probe(const struct gas_job *job, const struct gas_row *row)
{
    struct gas_refusal refusal = {.made = true};
    double T;
    return job && gas_job_run(job, row, &T, &refusal) ? T : NAN;
}

bool desk_read(const struct desk *desk, size_t row, struct desk_case *truth, struct gas_refusal *refusal)
{
    const struct gas_job *job = desk->job;
    if (!gas_table_row(&job->table, row, &truth->row, refusal) ||
        !gas_job_case(job, &truth->row, &truth->figures, refusal))
        return false;
    if (truth->row.given == 0)
        return gas_refuse(refusal, "given", "this row is blank; give its figures.");
    if (!job->task->run(job, &truth->figures, &truth->truth, refusal))
        return false;
    truth->truth = gas_job_shown(job, &truth->figures, &job->wanted.heading[0], truth->truth);
    if (desk->legs) {
        if (!gas_path_solve(job, &truth->figures, &truth->path, refusal))
            return false;
        truth->T_start = truth->path.start.T;
        truth->T_end = truth->path.total.end.T;
    } else {
        truth->T_start = probe(desk->start, &truth->row);
        truth->T_end = probe(desk->end, &truth->row);
    }
    return true;
}

/* -- a replay ------------------------------------------------------------------------------------------------------ */

void replay_open(struct replay *replay, const struct desk *desk)
{
    memset(replay, 0, sizeof *replay);
    replay->desk = desk;
    replay->job = *desk->job;
}

void replay_reset(struct replay *replay, const struct desk_case *truth)
{
    const struct gas_job *job = replay->desk->job;
    replay->truth = truth;
    replay->job.gas = job->gas;
    replay->job.options = job->options;
    /* a slip in one of several givens that determine a figure is no contradiction */
    replay->job.options.agree = INFINITY;
    replay->job.own = job->own;
    replay->job.legs = job->legs;
    replay->job.wanted.heading[0].symbol = job->wanted.heading[0].symbol;
    replay->figures = truth->figures;
    replay->factor = 1;
    replay->legs_changed = replay->log10 = replay->heat_swapped = replay->efficiency_turned = false;
    replay->exponent = EXPONENT_RIGHT;
    replay->filling = FILL_RIGHT;
    replay->staging_changed = false;
    for (size_t i = 0; i < replay->desk->sites; i++)
        replay->reading[i].changed = false;
}

struct reading *replay_reading(struct replay *replay, size_t site)
{
    struct reading *reading = &replay->reading[site];
    if (!reading->changed)
        *reading = (struct reading){true, *replay->desk->site[site].unit, replay->truth->figures.barometer, 0};
    return reading;
}

struct gas_typed_legs *replay_legs(struct replay *replay)
{
    if (!replay->desk->legs)
        return NULL;
    if (!replay->legs_changed) {
        const struct gas_typed_legs *legs = replay->desk->legs;
        replay->legs.count = legs->count;
        memcpy(replay->legs.leg, legs->leg, legs->count * sizeof *legs->leg);
        replay->legs.points = legs->points;
        replay->legs.point_P = legs->point_P;
        replay->legs.point_V = legs->point_V;
        replay->job.legs = &replay->legs;
        replay->legs_changed = true;
    }
    return &replay->legs;
}

struct gas_typed_staging *replay_staging(struct replay *replay)
{
    if (!replay->desk->staging)
        return NULL;
    if (!replay->staging_changed)
        replay->staging = *replay->desk->staging;
    replay->job.legs = &replay->staging;
    replay->staging_changed = true;
    return &replay->staging;
}

struct gas_leg_figure replay_fixed(double si, enum gas_dimension dimension)
{
    return (struct gas_leg_figure){.kind = GAS_FIGURE_FIXED, .figure = si, .unit = gas_unit_si(dimension)};
}

void replay_hold_cp(struct replay *replay, double cp)
{
    replay->interval = (struct gas_interval){.T_from = 1e-3, .T_to = INFINITY};
    replay->interval.power[-GAS_POWER_LOWEST] = cp;
    replay->job.gas.interval = &replay->interval;
    replay->job.gas.interval_count = 1;
    replay->job.gas.rule = GAS_CP_INTEGRATED;
}

/* A reference volume is an amount by way of R: with another R it is another amount. */
static void follow_R(struct replay *replay)
{
    double ratio = replay->desk->job->gas.R / replay->job.gas.R;
    for (size_t i = 0; ratio != 1 && i < replay->desk->sites; i++)
        if (replay->desk->site[i].unit->reference_volume)
            replay_reading(replay, i)->unit.scale *= ratio;
}

/* Readings of givens and legs into SI; the sign of a work stays what the heading and the options make it. */
static void read_sites(struct replay *replay)
{
    const struct desk *desk = replay->desk;
    for (size_t i = 0; i < desk->sites; i++) {
        const struct reading *reading = &replay->reading[i];
        const struct site *site = &desk->site[i];
        if (!reading->changed || site->kind == SITE_WANTED)
            continue;
        double figure = replay_figure(desk, replay->truth, i);
        double si = gas_unit_to_si(&reading->unit, figure, reading->barometer);
        if (site->kind == SITE_GIVEN) {
            bool turned = site->symbol == GAS_SYM_W &&
                          replay->truth->figures.si[site->index] * gas_unit_to_si(site->unit, figure, 0) < 0;
            replay->figures.si[site->index] = (turned ? -si : si) + reading->shift;
        } else {
            struct gas_leg_figure *fixed = site->kind == SITE_STAGING
                                               ? &replay_staging(replay)->figure[site->index]
                                               : leg_figure(&replay_legs(replay)->leg[site->index], site->place);
            *fixed = replay_fixed(si + reading->shift, site->unit->dimension);
        }
    }
}

static double show(const struct replay *replay, double si)
{
    const struct gas_heading *heading = &replay->desk->job->wanted.heading[0];
    const struct reading *reading = &replay->reading[replay->desk->sites - 1];
    double shown = gas_job_shown(replay->desk->job, &replay->truth->figures, heading, si);
    if (reading->changed && !heading->tolerance) {
        bool turned = heading->unit.basis == GAS_ABSOLUTE && shown * gas_unit_from_si(&heading->unit, si, 0) < 0 &&
                      heading->unit.dimension != GAS_DIM_TEMPERATURE;
        shown = gas_unit_from_si(&reading->unit, (turned ? -si : si) - reading->shift, reading->barometer);
    }
    return shown * replay->factor;
}

static bool run_task(struct replay *replay, double *si)
{
    struct gas_refusal refusal = {.made = true};
    if (replay->filling)
        return vessel_replay(replay, si);
    return replay->desk->legs ? path_replay(replay, si)
                              : replay->job.task->run(&replay->job, &replay->figures, si, &refusal);
}

double replay_run(struct replay *replay)
{
    double si;
    follow_R(replay);
    read_sites(replay);
    if (run_task(replay, &si))
        return show(replay, si);
    /* A sheet that mistakes a temperature has left the data, but not noticed: its cp is a constant. */
    struct gas_result cp = gas_cp(&replay->desk->job->gas, replay->truth->T_start);
    if (cp.status != GAS_OK || replay->job.gas.interval == &replay->interval)
        return NAN;
    replay_hold_cp(replay, cp.value);
    return run_task(replay, &si) ? show(replay, si) : NAN;
}
