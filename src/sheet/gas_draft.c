/* What the readers of gases share, and the check of a typed heat capacity. */
#include "sheet/gas_draft.h"

#include <math.h>
#include <string.h>

#include <gasleaf/heat.h>

#include "sheet/ascii.h"

#define ROOM_TEMPERATURE 298.15 /* K */

/* No vapour comes near it: a cp this large has a wrong unit. */
#define MOST_CP_OVER_R 1000.0

bool gas_refuse_memory(struct gas_refusal *refusal)
{
    return gas_refuse(refusal, "gas", "there is no memory left to read it; close other documents and try again.");
}

const char *gas_draft_copy(struct gas_draft *draft, const char *text)
{
    const char *copy = gas_arena_copy(draft->arena, text, strlen(text));
    if (!copy)
        gas_refuse_memory(draft->refusal);
    return copy ? copy : "";
}

/* Characters of typesetters and what they stand for. */
static const struct {
    const char *printed, *plain;
} spelling[] = {
    {"\u00a0", ""},      {"\u2009", ""},      {"\u202f", ""},   {"\u2212", "-"},  {"\u2013", "-"},  {"\u00b7", "*"},
    {"\u22c5", "*"},     {"\u00d7", "*"},     {"\u00b9", "^1"}, {"\u00b2", "^2"}, {"\u00b3", "^3"}, {"\u2070", "^0"},
    {"\u2074", "^4"},    {"\u2075", "^5"},    {"\u2076", "^6"}, {"\u2077", "^7"}, {"\u2078", "^8"}, {"\u2079", "^9"},
    {"\u2080", "0"},     {"\u2081", "1"},     {"\u2082", "2"},  {"\u2083", "3"},  {"\u2084", "4"},  {"\u2085", "5"},
    {"\u2086", "6"},     {"\u2087", "7"},     {"\u2088", "8"},  {"\u2089", "9"},  {"\u207b", "^-"}, {"\u221e", "inf"},
    {"\u03b8", "theta"}, {"\u0398", "theta"},
};

/* Bytes read at the front of a text; *plain is what they stand for. */
static size_t fold_one(struct gas_piece text, char one[2], const char **plain)
{
    const bool plain_ascii = (unsigned char)text.at[0] < 0x80;
    for (size_t i = 0; !plain_ascii && i < sizeof spelling / sizeof *spelling; i++) {
        size_t bytes = strlen(spelling[i].printed);
        if (text.length >= bytes && memcmp(text.at, spelling[i].printed, bytes) == 0)
            return *plain = spelling[i].plain, bytes;
    }
    one[0] = strchr(" \t\r\n-_.", text.at[0]) ? '\0' : gas_ascii_lower(text.at[0]);
    one[1] = '\0';
    return *plain = one, 1;
}

/* A minus that is part of a number: "10^-3", "1e-5". */
static bool keeps_minus(const char *buffer, size_t used)
{
    if (used && buffer[used - 1] == '^')
        return true;
    return used > 1 && buffer[used - 1] == 'e' && gas_ascii_digit(buffer[used - 2]);
}

const char *gas_fold(char *buffer, size_t size, struct gas_piece text)
{
    size_t used = 0;
    bool raised = false; /* behind a '^': a further superscript belongs to the same number */
    while (text.length && used + 8 < size) {
        char one[2];
        const char *plain;
        size_t bytes = fold_one(text, one, &plain);
        if (text.at[0] == '-' || strcmp(plain, "-") == 0)
            plain = keeps_minus(buffer, used) ? "-" : "";
        if (plain[0] == '^' && plain[1] && raised)
            plain++;
        raised = plain[0] == '^' || (raised && plain[0] && strchr("-0123456789", plain[0]));
        while (*plain)
            buffer[used++] = *plain++;
        text = (struct gas_piece){text.at + bytes, text.length - bytes};
    }
    buffer[used] = '\0';
    return buffer;
}

bool gas_listed(const char *folded, const char *list)
{
    size_t length = strlen(folded);
    while (length && *list) {
        size_t item = strcspn(list, "|");
        if (item == length && memcmp(list, folded, length) == 0)
            return true;
        list += item + (list[item] == '|');
    }
    return false;
}

/* cp of one interval in multiples of the least that leaves a positive cv. */
static double cp_over_R(const struct gas_draft *draft, const struct gas_interval *interval, double T)
{
    struct gas alone = draft->gas;
    alone.interval_count = 1;
    alone.interval = interval;
    struct gas_result cp = gas_cp(&alone, T);
    return cp.status ? NAN : cp.value / draft->gas.R;
}

static bool refuse_cp(const struct gas_draft *draft, double ratio, double T)
{
    char cp[40], at[40], least[40];
    gas_number_format(cp, sizeof cp, ratio * draft->gas.R, 4);
    gas_number_format(at, sizeof at, T, 6);
    gas_number_format(least, sizeof least, draft->gas.R, 4);
    if (!isfinite(ratio))
        return gas_refuse(draft->refusal, "cp", "it has no finite value at %s K; check the constants and units.", at);
    if (ratio > 1)
        return gas_refuse(draft->refusal, "cp",
                          "it comes to %s J/(mol K) at %s K, far more than any gas has; check the figures, their unit "
                          "and the unit of T.",
                          cp, at);
    return gas_refuse(draft->refusal, "cp",
                      "it comes to %s J/(mol K) at %s K, but must be above R = %s J/(mol K) to leave a positive cv; "
                      "check the figures, their unit and the unit of T.",
                      cp, at, least);
}

static bool possible(double ratio)
{
    return ratio > 1 && ratio < MOST_CP_OVER_R;
}

static bool check_inside(const struct gas_draft *draft, const struct gas_interval *interval)
{
    enum { STEPS = 40 };
    double from = fmax(interval->T_from, 1), to = fmin(interval->T_to, 1e5);
    for (int i = 0; i <= STEPS && from <= to; i++) {
        double T = i == STEPS ? to : from * pow(to / from, (double)i / STEPS);
        double ratio = cp_over_R(draft, interval, T);
        if (!possible(ratio))
            return refuse_cp(draft, ratio, T);
    }
    return true;
}

/* The temperature on the way from `good` by steps of a factor where cp is no longer above R; `end` if it always is. */
static double where_cp_fails(const struct gas_draft *draft, const struct gas_interval *interval, double factor,
                             double end)
{
    double good = ROOM_TEMPERATURE, bad = good;
    do {
        good = bad;
        bad *= factor;
        if (factor > 1 ? bad > 1e5 : bad < 1)
            return end;
    } while (possible(cp_over_R(draft, interval, bad)));
    while (fabs(good - bad) > 1e-9 * good) {
        double middle = (good + bad) / 2;
        if (possible(cp_over_R(draft, interval, middle)))
            good = middle;
        else
            bad = middle;
    }
    return good;
}

/* A formula without a range: kept to where it means something. */
static bool bound(struct gas_draft *draft)
{
    struct gas_interval kept = draft->gas.interval[0];
    double ratio = cp_over_R(draft, &kept, ROOM_TEMPERATURE);
    if (!possible(ratio))
        return refuse_cp(draft, ratio, ROOM_TEMPERATURE);
    kept.T_from = where_cp_fails(draft, &kept, 1 / 1.02, kept.T_from);
    kept.T_to = where_cp_fails(draft, &kept, 1.02, kept.T_to);
    struct gas_interval *made = gas_arena_take(draft->arena, 1, sizeof *made);
    if (!made)
        return gas_refuse_memory(draft->refusal);
    *made = kept;
    draft->gas.interval = made;
    return true;
}

static bool check_join(const struct gas_draft *draft, const struct gas_interval *lower)
{
    double T = lower->T_to, below = cp_over_R(draft, lower, T), above = cp_over_R(draft, lower + 1, T);
    if (fabs(above - below) <= 0.1 * below)
        return true;
    char at[40];
    gas_number_format(at, sizeof at, T, 6);
    return gas_refuse(draft->refusal, "gas card",
                      "cp jumps by %s %% at %s K, where two intervals meet; check their constants.",
                      gas_shown_to(100 * fabs(above - below) / below, 2).text, at);
}

bool gas_draft_check(struct gas_draft *draft)
{
    const struct gas *gas = &draft->gas;
    if (!draft->to_be_checked || gas->interval_count == 0)
        return true;
    if (gas->interval_count == 1 && gas->interval[0].T_from == 0 && isinf(gas->interval[0].T_to))
        return bound(draft);
    for (size_t i = 0; i < gas->interval_count; i++)
        if (!check_inside(draft, &gas->interval[i]))
            return false;
    for (size_t i = 0; i + 1 < gas->interval_count; i++)
        if (!check_join(draft, &gas->interval[i]))
            return false;
    return true;
}
