/* Slips at their places. */
#include <math.h>
#include <stdio.h>
#include <string.h>

#include "audit/slips.h"

static bool is_wanted(const struct desk *desk, size_t site)
{
    return desk->site[site].kind == SITE_WANTED;
}

/* At every site it can be; false when there is none. */
static bool read_all(struct replay *replay, const struct slip *slip, bool wanted_too)
{
    bool any = false;
    const struct desk *desk = replay->desk;
    for (size_t i = 0; i < desk->sites; i++) {
        struct reading kept = replay->reading[i];
        if ((is_wanted(desk, i) && !wanted_too) || isnan(replay_figure(desk, replay->truth, i)))
            continue;
        if (slip->read(replay, &desk->site[i], replay_reading(replay, i), slip->parameter))
            any = true;
        else
            replay->reading[i] = kept;
    }
    return any;
}

bool slip_apply(struct replay *replay, const struct instance *instance)
{
    const struct slip *slip = instance->slip;
    if (instance->site == NOWHERE)
        return slip->model(replay, slip->parameter);
    if (instance->site < 0)
        return read_all(replay, slip, instance->site == EVERYWHERE);
    size_t site = (size_t)instance->site;
    return !isnan(replay_figure(replay->desk, replay->truth, site)) &&
           slip->read(replay, &replay->desk->site[site], replay_reading(replay, site), slip->parameter);
}

/* -- finding the places -------------------------------------------------------------------------------------------- */

struct finding {
    const struct desk *desk;
    struct replay *replay;
    struct instance *instance;
    size_t count;
};

static void add(struct finding *finding, const struct slip *slip, int site, double likelihood)
{
    if (finding->count < INSTANCES)
        finding->instance[finding->count++] = (struct instance){slip, site, likelihood};
}

static bool fits_site(struct finding *finding, const struct slip *slip, size_t site)
{
    struct reading reading = {true, *finding->desk->site[site].unit, finding->desk->job->options.barometer, 0};
    return slip->read(finding->replay, &finding->desk->site[site], &reading, slip->parameter);
}

static void find_sites(struct finding *finding, const struct slip *slip)
{
    size_t givens = 0, wanted = 0;
    for (size_t i = 0; i < finding->desk->sites; i++)
        if (fits_site(finding, slip, i))
            *(is_wanted(finding->desk, i) ? &wanted : &givens) += 1;
    if (slip->spread == SPREAD_EVERYWHERE) {
        if (givens + wanted > 0)
            add(finding, slip, EVERYWHERE, slip->likelihood);
        return;
    }
    bool all = slip->spread == SPREAD_SITES;
    double share = all && givens + wanted > 1 ? 0.6 : 1; /* one of several is likelier to be all of them */
    if (all && wanted > 0 && givens > 0)
        add(finding, slip, EVERYWHERE, slip->likelihood);
    if (all && givens > 1)
        add(finding, slip, EVERY_GIVEN, slip->likelihood * (wanted ? 0.9 : 1));
    for (size_t i = 0; i < finding->desk->sites; i++) {
        bool asked = is_wanted(finding->desk, i) ? slip->spread != SPREAD_GIVENS : slip->spread != SPREAD_WANTED;
        if (asked && fits_site(finding, slip, i))
            add(finding, slip, (int)i, slip->likelihood * share);
    }
}

size_t slips_for(const struct desk *desk, struct replay *replay, const struct desk_case *truth,
                 struct instance *instance)
{
    size_t count;
    const struct slip *slip = slip_table(&count);
    struct finding finding = {desk, replay, instance, 0};
    replay_reset(replay, truth);
    for (size_t i = 0; i < count; i++) {
        if (slip[i].model)
            add(&finding, &slip[i], NOWHERE, slip[i].likelihood);
        else
            find_sites(&finding, &slip[i]);
    }
    return finding.count;
}

/* -- words --------------------------------------------------------------------------------------------------------- */

void slip_words(const struct desk *desk, const struct desk_case *truth, const struct instance *instance, bool table,
                char *buffer, size_t size)
{
    const struct slip *slip = instance->slip;
    char figure[80], name[GAS_NAME_TEXT];
    if (instance->site < 0 || slip->spread == SPREAD_EVERYWHERE) {
        snprintf(buffer, size, "%s", slip->words);
        return;
    }
    const struct site *site = &desk->site[instance->site];
    if (site->kind == SITE_WANTED) {
        snprintf(buffer, size, "%s", slip->wanted);
        return;
    }
    gas_figure(figure, sizeof figure, replay_figure(desk, truth, (size_t)instance->site), site->unit);
    gas_quantity_name(name, site->symbol, site->state);
    if (table && site->kind == SITE_GIVEN)
        snprintf(buffer, size, "%s %s", desk->job->table.heading[site->index].text, slip->given);
    else if (site->kind == SITE_STAGING)
        snprintf(buffer, size, "%s behind the coolers %s", figure, slip->given);
    else if (site->kind == SITE_LEG)
        snprintf(buffer, size, "%s in leg %d %s", figure, site->index + 1, slip->given);
    else
        snprintf(buffer, size, "%s%s%s %s", site->state ? name : "", site->state ? " = " : "", figure, slip->given);
}
