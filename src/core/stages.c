#include <gasleaf/stages.h>

#include <math.h>
#include <stdbool.h>

#include <gasleaf/heat.h>

#include "figures.h"
#include "root.h"

enum argument { AT_P1 = 1, AT_T1, AT_P2, AT_COUNT, AT_RATIO, AT_EFFICIENCY, AT_T_COOL, AT_DROP, AT_DRIVE };

/* How pressure runs through the machine when every ratio is multiplied by one factor. */
struct ladder {
    double P1, P2, drop, keep; /* keep: 1 - fraction lost between stages */
    int count;
    const double *ratio; /* NULL: all 1 */
};

static double ratio_of(const struct ladder *ladder, int stage)
{
    return ladder->ratio ? ladder->ratio[stage] : 1;
}

/* Pressure behind the last stage less P2. */
static double overshoot(const void *given, double factor)
{
    const struct ladder *ladder = given;
    double P = ladder->P1;
    for (int i = 0; i < ladder->count; i++) {
        P *= factor * ratio_of(ladder, i);
        if (i + 1 < ladder->count)
            P = P * ladder->keep - ladder->drop;
    }
    return P - ladder->P2;
}

/* The factor on the ratios that meets P2. Lost fractions only multiply; for lost pressures the polynomial in the
 * factor changes the sign of its coefficients once, so that it has one positive root, at or above the factor without
 * drops and below the one that makes up for each drop within its own stage. */
static struct gas_result factor_for(const struct ladder *ladder)
{
    double product = 1;
    for (int i = 0; i < ladder->count; i++)
        product *= ratio_of(ladder, i) * (i > 0 ? ladder->keep : 1);
    double factor = pow(ladder->P2 / ladder->P1 / product, 1.0 / ladder->count);
    if (ladder->drop == 0 || ladder->count == 1)
        return gas_good(factor);
    double P = ladder->P1, least = ratio_of(ladder, 0) * P;
    for (int i = 0; i < ladder->count; i++) {
        least = fmin(least, ratio_of(ladder, i) * P);
        P *= factor * ratio_of(ladder, i);
    }
    /* a hair's breadth to either side, so that rounding does not hide the change of sign */
    return root_between(overshoot, ladder, factor * (1 - 1e-9), (factor + ladder->drop / least) * (1 + 1e-9));
}

static struct gas_result check_temperature(const struct gas *gas, int argument, double T)
{
    struct gas_result checked = check_positive(argument, T);
    if (checked.status)
        return checked;
    struct gas_result known = gas_cp(gas, T);
    if (known.status == GAS_NO_HEAT_CAPACITY)
        return gas_bad(known.status, 0, NAN);
    return known.status ? gas_bad(known.status, argument, T) : checked;
}

static struct gas_result check_drop(const struct gas_staging *staging)
{
    double drop = staging->P_drop, fraction = staging->P_drop_fraction;
    if (!isfinite(drop) || !isfinite(fraction))
        return gas_bad(GAS_NOT_FINITE, AT_DROP, isfinite(drop) ? fraction : drop);
    if (drop < 0 || fraction < 0)
        return gas_bad(GAS_NEGATIVE, AT_DROP, drop < 0 ? drop : fraction);
    if (drop > 0 && fraction > 0)
        return gas_bad(GAS_CONTRADICTION, AT_DROP, drop);
    return fraction < 1 ? gas_good(drop) : gas_bad(GAS_NOT_A_FRACTION, AT_DROP, fraction);
}

static struct gas_result check_numbers(const struct gas_staging *staging)
{
    int count = staging->count, ratios = staging->ratio_count;
    if (count < 0)
        return gas_bad(GAS_NEGATIVE, AT_COUNT, count);
    if (count > GAS_STAGES_MAX)
        return gas_bad(GAS_TOO_MANY, AT_COUNT, count);
    if (ratios < 0)
        return gas_bad(GAS_NEGATIVE, AT_RATIO, ratios);
    if (ratios > GAS_STAGES_MAX)
        return gas_bad(GAS_TOO_MANY, AT_RATIO, ratios);
    if (ratios && count && ratios != count)
        return gas_bad(GAS_CONTRADICTION, AT_RATIO, ratios);
    for (int i = 0; i < ratios; i++) {
        struct gas_result checked = check_positive(AT_RATIO, staging->ratio[i]);
        if (checked.status)
            return checked;
    }
    if (ratios || count)
        return gas_good(count);
    struct gas_result checked = check_positive(AT_RATIO, staging->ratio_limit);
    if (!checked.status && staging->ratio_limit <= 1)
        return gas_bad(GAS_UNREACHABLE, AT_RATIO, staging->ratio_limit);
    return checked;
}

static struct gas_result check_all(const struct gas *gas, double P1, double T1, double P2,
                                   const struct gas_staging *staging)
{
    const struct gas_result checks[] = {
        check_positive(AT_P1, P1),
        check_temperature(gas, AT_T1, T1),
        check_positive(AT_P2, P2),
        P2 > P1 ? gas_good(P2) : gas_bad(GAS_UNREACHABLE, AT_P2, P2),
        check_numbers(staging),
        check_fraction(AT_EFFICIENCY, staging->efficiency),
        isnan(staging->T_cool) && !staging->aftercooler ? gas_good(NAN)
                                                        : check_temperature(gas, AT_T_COOL, staging->T_cool),
        check_drop(staging),
        check_fraction(AT_DRIVE, staging->drive),
    };
    for (size_t i = 0; i < sizeof checks / sizeof *checks; i++)
        if (checks[i].status)
            return checks[i];
    return gas_good(1);
}

/* Set the number of stages and return the factor on the ratios. */
static struct gas_result settle_ladder(const struct gas_staging *staging, struct ladder *ladder)
{
    ladder->count = staging->ratio_count ? staging->ratio_count : staging->count;
    if (ladder->count)
        return factor_for(ladder);
    for (ladder->count = 1; ladder->count <= GAS_STAGES_MAX; ladder->count++) {
        struct gas_result factor = factor_for(ladder);
        /* a ratio that meets the limit exactly must not fail it by rounding */
        if (factor.status || factor.value <= staging->ratio_limit * (1 + 1e-12))
            return factor;
    }
    ladder->count = 0;
    return gas_bad(GAS_TOO_MANY, AT_RATIO, staging->ratio_limit);
}

/* The end of one adiabatic stage: T_out and work. */
static struct gas_result compress(const struct gas *gas, const struct gas_staging *staging, struct gas_stage *stage)
{
    double rise = gas->R * log(stage->P_out / stage->P_in); /* of entropy at constant pressure, without losses */
    struct gas_result T, work;
    switch (staging->kind) {
    case GAS_ISENTROPIC_EFFICIENCY:
        T = gas_T_after_ds_isobaric(gas, stage->T_in, rise);
        work = T.status ? T : gas_dh(gas, stage->T_in, T.value);
        work.value /= staging->efficiency;
        if (!work.status && staging->efficiency < 1)
            T = gas_T_after_dh(gas, stage->T_in, work.value);
        break;
    case GAS_POLYTROPIC_EFFICIENCY:
        T = gas_T_after_ds_isobaric(gas, stage->T_in, rise / staging->efficiency);
        work = T.status ? T : gas_dh(gas, stage->T_in, T.value);
        break;
    case GAS_ISOTHERMAL_EFFICIENCY:
        work = gas_good(stage->T_in * rise / staging->efficiency);
        T = gas_T_after_dh(gas, stage->T_in, work.value);
        break;
    default:
        return gas_bad(GAS_NOT_APPLICABLE, AT_EFFICIENCY, staging->efficiency);
    }
    stage->T_out = T.value;
    stage->work = work.value;
    if (T.status || work.status)
        return gas_bad(T.status ? T.status : work.status, 0, T.status ? T.figure : work.figure);
    return gas_good(work.value);
}

static struct gas_result cool(const struct gas *gas, double T_cool, struct gas_stage *stage, double *T_next)
{
    stage->cooling = 0;
    *T_next = stage->T_out;
    if (!(T_cool < stage->T_out)) /* no cooler, or nothing for it to do */
        return gas_good(0);
    struct gas_result dh = gas_dh(gas, stage->T_out, T_cool);
    stage->cooling = -dh.value;
    *T_next = T_cool;
    return dh;
}

/* The pressures, before anything gets hot: so that a drop that is too large is named as such. */
static struct gas_result set_pressures(const struct ladder *ladder, double factor, struct gas_staged *staged)
{
    double P = ladder->P1;
    for (int i = 0; i < ladder->count; i++) {
        bool last = i + 1 == ladder->count;
        double ratio = factor * ratio_of(ladder, i);
        staged->stage[i] = (struct gas_stage){.P_in = P, .P_out = last ? ladder->P2 : P * ratio, .ratio = ratio};
        if (!(ratio > 1))
            return gas_bad(GAS_UNREACHABLE, AT_RATIO, ratio);
        double P_next = P * ratio * ladder->keep - ladder->drop;
        if (!last && !(P_next > P))
            return gas_bad(GAS_UNREACHABLE, AT_DROP, ladder->drop > 0 ? ladder->drop : 1 - ladder->keep);
        P = P_next;
    }
    staged->count = ladder->count;
    return gas_good(P);
}

static struct gas_result run_stages(const struct gas *gas, double T1, const struct gas_staging *staging,
                                    struct gas_staged *staged)
{
    double T = T1;
    for (int i = 0; i < staged->count; i++) {
        struct gas_stage *stage = &staged->stage[i];
        bool uncooled = i + 1 == staged->count && !staging->aftercooler;
        stage->T_in = T;
        struct gas_result done = compress(gas, staging, stage);
        if (!done.status)
            done = cool(gas, uncooled ? NAN : staging->T_cool, stage, &T);
        if (done.status)
            return done;
        staged->work += stage->work;
        staged->cooling += stage->cooling;
    }
    return gas_good(staged->work);
}

struct gas_result gas_stages_run(const struct gas *gas, double P1, double T1, double P2,
                                 const struct gas_staging *staging, struct gas_staged *staged)
{
    *staged = (struct gas_staged){0};
    struct ladder ladder = {
        P1, P2, staging->P_drop, 1 - staging->P_drop_fraction, 0, staging->ratio_count ? staging->ratio : NULL};
    struct gas_result done = check_all(gas, P1, T1, P2, staging);
    if (!done.status)
        done = settle_ladder(staging, &ladder);
    if (!done.status)
        done = set_pressures(&ladder, done.value, staged);
    if (!done.status)
        done = run_stages(gas, T1, staging, staged);
    if (done.status) {
        *staged = (struct gas_staged){.work = NAN, .cooling = NAN, .input = NAN, .single_work = NAN};
        return done;
    }
    struct gas_stage single = {.P_in = P1, .P_out = P2, .T_in = T1};
    staged->input = staged->work / staging->drive;
    staged->single_work = compress(gas, staging, &single).value;
    return done;
}
