#include "audit/search.h"

#include <math.h>
#include <string.h>

/* Two slips together that are less likely than this are chance rather than explanation (common practice). */
static const double WORTH = 0.004;

/* Two slips together are not named behind one that explains the figure when they score below this share of it. */
static const double ACCIDENT = 0.2;

enum { KEPT = 40, ROW_TRIES = 2500, CALL_TRIES = 60000 };

/* One case being searched. */
struct hunt {
    struct audit *audit;
    struct audited *row;
    struct desk_case truth;
    double figure[INSTANCES]; /* what each slip alone gives; NAN where it does not apply or changes nothing */
    size_t kept;
    struct explanation best[KEPT];
};

/* -- the parts ----------------------------------------------------------------------------------------------------- */

double audit_figure(struct audit *audit, const struct desk_case *truth, const short part[TOGETHER])
{
    replay_reset(audit->replay, truth);
    for (size_t i = 0; i < TOGETHER && part[i] >= 0; i++)
        if (!slip_apply(audit->replay, &audit->instance[part[i]]))
            return NAN;
    return replay_run(audit->replay);
}

/* Within the last digit, its half, or not at all. */
static double fit(const struct audited *row, double figure)
{
    double off = fabs(figure - row->legacy.figure), slack = 1e-9 * fabs(row->legacy.figure);
    if (off <= row->legacy.half + slack)
        return 1;
    return off <= 2 * row->legacy.half + slack ? 0.2 : 0;
}

static bool is_rounding(const struct audit *audit, int part)
{
    return audit->instance[part].slip->rounding;
}

/* A second slip is a rare thing, a rounding beside a slip or beside another rounding less so (common practice). */
static double likelihood(const struct audit *audit, const short part[TOGETHER])
{
    const double second_slip = 0.05, rounding_too = 0.1, further_rounding = 0.3;
    double product = 1;
    int count = 0, roundings = 0;
    for (size_t i = 0; i < TOGETHER && part[i] >= 0; i++, count++) {
        product *= audit->instance[part[i]].likelihood;
        roundings += is_rounding(audit, part[i]);
    }
    int slips = count - roundings;
    return product * (slips > 1 ? second_slip : 1) *
           (slips ? pow(rounding_too, roundings) : pow(further_rounding, roundings - 1));
}

/* Into a list of at most so many, the best score first, behind its equals; what has no room is dropped. */
static void insert(struct explanation *list, size_t *count, size_t most, const struct explanation *new)
{
    size_t place = *count;
    while (place > 0 && list[place - 1].score < new->score)
        place--;
    if (place == most)
        return;
    if (*count < most)
        ++*count;
    memmove(list + place + 1, list + place, (*count - place - 1) * sizeof *list);
    list[place] = *new;
}

static void keep(struct hunt *hunt, const short part[TOGETHER], double figure)
{
    double good = fit(hunt->row, figure);
    if (!(good > 0))
        return;
    if (part[1] >= 0 && part[2] < 0 && likelihood(hunt->audit, part) < WORTH)
        return;
    struct explanation new = {.figure = figure, .score = good * likelihood(hunt->audit, part)};
    memcpy(new.part, part, sizeof new.part);
    insert(hunt->best, &hunt->kept, KEPT, &new);
}

/* -- one case ------------------------------------------------------------------------------------------------------ */

static void try_singles(struct hunt *hunt)
{
    for (size_t i = 0; i < hunt->audit->instances; i++) {
        short part[TOGETHER] = {(short)i, -1, -1};
        double figure = audit_figure(hunt->audit, &hunt->truth, part);
        bool idle = fabs(figure - hunt->row->truth) <= 1e-11 * fabs(hunt->row->truth);
        hunt->figure[i] = idle ? NAN : figure;
        if (!idle)
            keep(hunt, part, figure);
    }
}

static bool may_try(struct hunt *hunt, long limit)
{
    return hunt->audit->tried < limit && hunt->audit->tried < CALL_TRIES;
}

static bool near(const struct hunt *hunt, double predicted, double window)
{
    return fabs(predicted - hunt->row->legacy.figure) <= window;
}

/* Two slips that go together: of different kinds, or the same basis mistaken at two places. */
static bool go_together(const struct instance *a, const struct instance *b)
{
    if (a->slip == b->slip)
        return false;
    return a->slip->kind != b->slip->kind || (a->site >= 0 && b->site >= 0 && a->site != b->site);
}

/* Two gross slips that happen to undo each other are an accident, not an explanation. */
static bool undo_each_other(const struct hunt *hunt, size_t i, size_t j)
{
    const double gross = 20, truth = hunt->row->truth;
    double a = fabs(hunt->figure[i] / truth), b = fabs(hunt->figure[j] / truth);
    return (a > gross && b < 1 / gross) || (b > gross && a < 1 / gross);
}

static void try_pair(struct hunt *hunt, size_t i, size_t j)
{
    short part[TOGETHER] = {(short)i, (short)j, -1};
    hunt->audit->tried++;
    double figure = audit_figure(hunt->audit, &hunt->truth, part);
    double alone = fmin(fabs(figure - hunt->figure[i]), fabs(figure - hunt->figure[j]));
    if (alone > 1e-11 * fabs(figure) && fabs(figure - hunt->row->truth) > 1e-11 * fabs(figure))
        keep(hunt, part, figure);
}

static void try_pairs(struct hunt *hunt)
{
    const struct audit *audit = hunt->audit;
    double truth = hunt->row->truth, legacy = hunt->row->legacy.figure;
    long limit = audit->tried + ROW_TRIES;
    for (size_t i = 0; i < audit->instances; i++) {
        if (isnan(hunt->figure[i]))
            continue;
        for (size_t j = i + 1; j < audit->instances && may_try(hunt, limit); j++) {
            if (isnan(hunt->figure[j]) || !go_together(&audit->instance[i], &audit->instance[j]) ||
                undo_each_other(hunt, i, j))
                continue;
            bool small = is_rounding(audit, (int)i) || is_rounding(audit, (int)j);
            double window = fmax(4 * hunt->row->legacy.half, (small ? 0.003 : 0.05) * fabs(legacy));
            if (near(hunt, hunt->figure[i] * hunt->figure[j] / truth, window) ||
                near(hunt, hunt->figure[i] + hunt->figure[j] - truth, window))
                try_pair(hunt, i, j);
        }
    }
}

/* A slip or a rounding with two further roundings: only a figure of many digits can tell. */
static void try_triples(struct hunt *hunt)
{
    const struct audit *audit = hunt->audit;
    double truth = hunt->row->truth, window = fmax(2 * hunt->row->legacy.half, 1e-4 * fabs(hunt->row->legacy.figure));
    long limit = audit->tried + ROW_TRIES;
    for (size_t j = 0; j < audit->instances; j++)
        for (size_t k = j + 1; k < audit->instances; k++) {
            if (!is_rounding(audit, (int)j) || !is_rounding(audit, (int)k) || isnan(hunt->figure[j]) ||
                isnan(hunt->figure[k]) || !go_together(&audit->instance[j], &audit->instance[k]))
                continue;
            double ratio = hunt->figure[j] / truth * (hunt->figure[k] / truth);
            for (size_t i = 0; i < audit->instances && may_try(hunt, limit); i++) {
                bool turn = !is_rounding(audit, (int)i) || i < j; /* three roundings in one order only */
                if (!turn || isnan(hunt->figure[i]) || !near(hunt, hunt->figure[i] * ratio, window) ||
                    !go_together(&audit->instance[i], &audit->instance[j]) ||
                    !go_together(&audit->instance[i], &audit->instance[k]))
                    continue;
                short part[TOGETHER] = {(short)i, (short)j, (short)k};
                hunt->audit->tried++;
                keep(hunt, part, audit_figure(hunt->audit, &hunt->truth, part));
            }
        }
}

static bool few(const struct hunt *hunt)
{
    return hunt->kept < NAMED || hunt->best[0].score < 0.05;
}

static void explain(struct hunt *hunt)
{
    hunt->kept = 0;
    try_singles(hunt);
    bool finite = isfinite(hunt->row->truth) && hunt->row->truth != 0 && hunt->row->legacy.figure != 0;
    if (few(hunt) && finite)
        try_pairs(hunt);
    if (hunt->kept == 0 && finite && hunt->row->legacy.digits >= 5)
        try_triples(hunt);
}

/* Does it say all that another says, and perhaps more? */
static bool contains(const struct explanation *more, const struct explanation *less)
{
    for (size_t i = 0; i < TOGETHER && less->part[i] >= 0; i++) {
        bool found = false;
        for (size_t k = 0; k < TOGETHER; k++)
            found = found || more->part[k] == less->part[i];
        if (!found)
            return false;
    }
    return true;
}

static bool contains_any(const struct explanation *more, const struct explanation *list, size_t count)
{
    for (size_t i = 0; i < count; i++)
        if (contains(more, &list[i]))
            return true;
    return false;
}

static bool is_single(const struct explanation *explanation)
{
    return explanation->part[1] < 0;
}

/* Is there nothing new in naming one of several parts? */
static bool is_noise(const struct hunt *hunt, const struct explanation *more)
{
    const struct explanation *first = hunt->row->explanation;
    if (is_single(more))
        return false;
    /* one rounded constant is enough: two that do the same say nothing more */
    if (hunt->row->count && is_single(first) && is_rounding(hunt->audit, first->part[0]))
        return true;
    /* behind one slip that explains the figure, an accident of two unlikely ones is noise */
    return is_single(hunt->best) && more->score < ACCIDENT * hunt->best->score;
}

/* The best ones into the row, behind those that are there. */
static void name_best(struct hunt *hunt)
{
    struct audited *row = hunt->row;
    for (size_t i = 0; i < hunt->kept && row->count < NAMED; i++)
        if (!is_noise(hunt, &hunt->best[i]) && !contains_any(&hunt->best[i], row->explanation, row->count))
            row->explanation[row->count++] = hunt->best[i];
}

static void set_status(const struct audit *audit, struct audited *row)
{
    row->status = row->count ? AUDIT_ROUNDING : AUDIT_DIFFERS;
    for (size_t i = 0; row->count && i < TOGETHER && row->explanation[0].part[i] >= 0; i++)
        if (!is_rounding(audit, row->explanation[0].part[i]))
            row->status = AUDIT_EXPLAINED;
}

/* -- a whole column ------------------------------------------------------------------------------------------------ */

static bool differs(const struct audited *row)
{
    return row->status == AUDIT_DIFFERS;
}

static bool read_case(const struct audit *audit, size_t index, struct desk_case *truth)
{
    struct gas_refusal refusal = {.made = true};
    return desk_read(audit->desk, index, truth, &refusal);
}

/* How well an explanation fits every case that differs: the product of its fits, 0 when there is one that it does not
 * fit. A slip that was really made fits each within half a unit; one that comes near does not for long. */
static double holds(struct hunt *hunt, const struct explanation *explanation)
{
    struct audit *audit = hunt->audit;
    struct desk_case *truth = &hunt->truth;
    double product = 1;
    for (size_t i = 0; i < audit->rows && product > 0; i++)
        if (differs(&audit->row[i]))
            product *=
                read_case(audit, i, truth) ? fit(&audit->row[i], audit_figure(audit, truth, explanation->part)) : 0;
    return product;
}

/* Without those that only add something to one before them. */
static size_t leave_out_longer(struct explanation *list, size_t count)
{
    size_t kept = 0;
    for (size_t i = 0; i < count; i++)
        if (!contains_any(&list[i], list, kept))
            list[kept++] = list[i];
    return kept;
}

/* Explanations of the first case that differs, those that hold for all of them, likeliest first. */
static size_t find_common(struct hunt *hunt, struct explanation common[NAMED])
{
    size_t count = 0;
    for (size_t i = 0; i < hunt->kept; i++) {
        struct explanation new = hunt->best[i];
        new.score = holds(hunt, &new) * likelihood(hunt->audit, new.part);
        new.everywhere = true;
        if (new.score > 0)
            insert(common, &count, NAMED, &new);
    }
    return leave_out_longer(common, count);
}

/* No slip holds for all: those that fit many cases are likelier than those that fit one. */
static void weigh_by_share(struct hunt *hunt)
{
    enum { SAMPLE = 30 };
    struct audit *audit = hunt->audit;
    size_t fits[INSTANCES] = {0}, sampled = 0;
    for (size_t i = 0; i < audit->rows && sampled < SAMPLE; i++) {
        if (!differs(&audit->row[i]) || !read_case(audit, i, &hunt->truth))
            continue;
        hunt->row = &audit->row[i];
        hunt->kept = 0;
        try_singles(hunt);
        for (size_t k = 0; k < audit->instances; k++)
            fits[k] += fit(hunt->row, hunt->figure[k]) > 0;
        sampled++;
    }
    for (size_t k = 0; k < audit->instances && sampled > 1; k++)
        audit->instance[k].likelihood *= 0.2 + (double)fits[k] / (double)sampled;
}

static size_t first_that_differs(const struct audit *audit, size_t *total)
{
    size_t first = audit->rows;
    *total = 0;
    for (size_t i = audit->rows; i-- > 0;)
        if (differs(&audit->row[i])) {
            first = i;
            ++*total;
        }
    return first;
}

static void compare(struct audit *audit, size_t index, struct desk_case *truth)
{
    struct audited *row = &audit->row[index];
    struct gas_refusal refusal = {0};
    if (row->status == AUDIT_REFUSED || row->legacy.blank)
        return;
    if (!desk_read(audit->desk, index, truth, &refusal)) {
        row->status = AUDIT_REFUSED;
        row->refusal = gas_arena_copy(audit->arena, refusal.text, strlen(refusal.text));
        return;
    }
    row->truth = truth->truth;
    row->status = fit(row, row->truth) == 1 ? AUDIT_AGREES : AUDIT_DIFFERS;
    if (audit->instances == 0)
        audit->instances = slips_for(audit->desk, audit->replay, truth, audit->instance);
}

/* A case of a table: what holds for all first, then what fits this one. */
static void explain_row(struct hunt *hunt, size_t index, const struct explanation *common, size_t count)
{
    struct audit *audit = hunt->audit;
    struct audited *row = hunt->row = &audit->row[index];
    if (!read_case(audit, index, &hunt->truth))
        return;
    for (size_t i = 0; i < count; i++) {
        row->explanation[i] = common[i];
        row->explanation[i].figure = audit_figure(audit, &hunt->truth, common[i].part);
    }
    row->count = count;
    if (count == 0) {
        explain(hunt);
        name_best(hunt);
    }
    set_status(audit, row);
}

bool audit_open(struct audit *audit, const struct desk *desk, struct gas_arena *arena, struct gas_refusal *refusal)
{
    *audit = (struct audit){.desk = desk, .arena = arena, .rows = desk->job->table.rows};
    audit->row = gas_arena_take(arena, audit->rows, sizeof *audit->row);
    audit->replay = gas_arena_take(arena, 1, sizeof *audit->replay);
    audit->instance = gas_arena_take(arena, INSTANCES, sizeof *audit->instance);
    if (!audit->row || !audit->replay || !audit->instance)
        return gas_refuse(refusal, "given", "there is not enough memory for it; give fewer rows.");
    for (size_t i = 0; i < audit->rows; i++)
        audit->row[i] = (struct audited){.status = AUDIT_BLANK};
    replay_open(audit->replay, desk);
    return true;
}

void audit_run(struct audit *audit)
{
    size_t total, count = 0;
    struct explanation common[NAMED];
    struct hunt *hunt = gas_arena_take(audit->arena, 1, sizeof *hunt);
    if (!hunt)
        return;
    hunt->audit = audit;
    for (size_t i = 0; i < audit->rows; i++)
        compare(audit, i, &hunt->truth);
    size_t first = first_that_differs(audit, &total);
    if (total > 1 && read_case(audit, first, &hunt->truth)) {
        hunt->row = &audit->row[first];
        explain(hunt);
        count = find_common(hunt, common);
        if (count == 0)
            weigh_by_share(hunt);
    }
    for (size_t i = 0; i < audit->rows; i++)
        if (differs(&audit->row[i]))
            explain_row(hunt, i, common, count);
}
