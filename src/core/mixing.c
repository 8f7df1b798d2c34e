#include <gasleaf/mixing.h>

#include <math.h>
#include <stdbool.h>

#include <gasleaf/heat.h>

#include "figures.h"
#include "root.h"

struct mixing {
    const struct gas_portion *portion;
    const int *same;
    size_t count;
    bool streams;
};

static struct gas_result give_up(struct gas_blend *blend, struct gas_result bad)
{
    *blend = (struct gas_blend){NAN, NAN, NAN, NAN};
    return bad;
}

static struct gas_result check_portion(const struct gas_portion *portion, int number)
{
    const double figures[] = {portion->P, portion->T};
    struct gas_result n = check_not_negative(number, portion->n);
    if (n.status || portion->n == 0)
        return n;
    for (int i = 0; i < 2; i++) {
        struct gas_result checked = check_positive(number, figures[i]);
        if (checked.status)
            return checked;
    }
    struct gas_result cp = gas_cp(portion->gas, portion->T);
    return cp.status ? gas_bad(cp.status, number, cp.status == GAS_OUTSIDE_DATA ? portion->T : NAN) : cp;
}

static struct gas_result check_all(const struct mixing *mixing)
{
    double n = 0;
    if (mixing->count == 0)
        return gas_bad(GAS_UNDETERMINED, 0, NAN);
    for (size_t i = 0; i < mixing->count; i++) {
        struct gas_result checked = check_portion(&mixing->portion[i], (int)i + 1);
        if (checked.status)
            return checked;
        n += mixing->portion[i].n;
    }
    return n > 0 ? gas_good(n) : gas_bad(GAS_NOT_POSITIVE, 0, n);
}

/* What the portions gain in energy when all come to T. */
static double gain(const void *given, double T)
{
    const struct mixing *mixing = given;
    double sum = 0;
    for (size_t i = 0; i < mixing->count; i++) {
        const struct gas_portion *portion = &mixing->portion[i];
        if (portion->n == 0)
            continue;
        struct gas_result change =
            mixing->streams ? gas_dh(portion->gas, portion->T, T) : gas_du(portion->gas, portion->T, T);
        sum += portion->n * change.value; /* NAN outside the data */
    }
    return sum;
}

/* The mixed temperature lies between the lowest and the highest, and must lie within the data of every gas. */
static struct gas_result mixed_temperature(const struct mixing *mixing, double n)
{
    double coldest = INFINITY, hottest = 0, lowest = 0, highest = INFINITY, guess = 0;
    int lowest_of = 0, highest_of = 0;
    for (size_t i = 0; i < mixing->count; i++) {
        const struct gas_portion *portion = &mixing->portion[i];
        if (portion->n == 0)
            continue;
        struct gas_range data = gas_range_of(portion->gas);
        coldest = fmin(coldest, portion->T);
        hottest = fmax(hottest, portion->T);
        guess += portion->n / n * portion->T;
        if (data.T_from > lowest) {
            lowest = data.T_from;
            lowest_of = (int)i + 1;
        }
        if (data.T_to < highest) {
            highest = data.T_to;
            highest_of = (int)i + 1;
        }
    }
    if (coldest == hottest)
        return gas_good(coldest);
    if (lowest > highest)
        return gas_bad(GAS_OUTSIDE_DATA, lowest_of, lowest);
    /* a hair wider, as a portion may sit on the limit with a rounding of its own */
    struct gas_result T =
        root_rising(gain, mixing, guess, fmax(lowest * (1 - 1e-9), coldest), fmin(highest * (1 + 1e-9), hottest));
    if (T.status == GAS_OUTSIDE_DATA)
        return T.figure <= lowest ? gas_bad(T.status, lowest_of, lowest) : gas_bad(T.status, highest_of, highest);
    return T;
}

static double amount_of_kind(const struct mixing *mixing, size_t which)
{
    double n = 0;
    for (size_t i = 0; i < mixing->count; i++)
        if (i == which || (mixing->same && mixing->same[i] == mixing->same[which]))
            n += mixing->portion[i].n;
    return n;
}

static struct gas_result entropy_made(const struct mixing *mixing, const struct gas_blend *blend)
{
    double sum = 0;
    for (size_t i = 0; i < mixing->count; i++) {
        const struct gas_portion *portion = &mixing->portion[i];
        if (portion->n == 0)
            continue;
        double partial = blend->P * amount_of_kind(mixing, i) / blend->n;
        struct gas_result ds = gas_ds(portion->gas, portion->T, portion->P, blend->T, partial);
        if (ds.status)
            return gas_bad(ds.status, (int)i + 1, ds.figure);
        sum += portion->n * ds.value;
    }
    return gas_good(sum);
}

struct gas_result gas_mix_vessels(const struct gas_portion *portion, const int *same, size_t count,
                                  struct gas_blend *blend)
{
    const struct mixing mixing = {portion, same, count, false};
    struct gas_result n = check_all(&mixing), done = n.status ? n : mixed_temperature(&mixing, n.value);
    double volume = 0, nR = 0;
    for (size_t i = 0; i < count && !done.status; i++) {
        if (portion[i].n > 0) {
            nR += portion[i].n * portion[i].gas->R;
            volume += portion[i].n * portion[i].gas->R * portion[i].T / portion[i].P;
        } else if (!(portion[i].V_empty >= 0) || !isfinite(portion[i].V_empty)) {
            bool negative = portion[i].V_empty < 0;
            done = gas_bad(negative ? GAS_NEGATIVE : GAS_NOT_FINITE, (int)i + 1, portion[i].V_empty);
        } else {
            volume += portion[i].V_empty;
        }
    }
    if (done.status)
        return give_up(blend, done);
    *blend = (struct gas_blend){.n = n.value, .T = done.value, .P = nR * done.value / volume};
    struct gas_result made = entropy_made(&mixing, blend);
    blend->entropy_made = made.value;
    return made.status ? give_up(blend, made) : done;
}

static double lowest_pressure(const struct gas_portion *portion, size_t count)
{
    double lowest = INFINITY;
    for (size_t i = 0; i < count; i++)
        if (portion[i].n > 0)
            lowest = fmin(lowest, portion[i].P);
    return lowest;
}

struct gas_result gas_mix_streams(const struct gas_portion *portion, const int *same, size_t count, double P_out,
                                  struct gas_blend *blend)
{
    const struct mixing mixing = {portion, same, count, true};
    struct gas_result n = check_all(&mixing), done = n.status ? n : mixed_temperature(&mixing, n.value);
    if (done.status)
        return give_up(blend, done);
    struct gas_result P = check_positive((int)count + 1, isnan(P_out) ? lowest_pressure(portion, count) : P_out);
    if (P.status)
        return give_up(blend, P);
    *blend = (struct gas_blend){.n = n.value, .T = done.value, .P = P.value};
    struct gas_result made = entropy_made(&mixing, blend);
    if (!made.status && made.value < -1e-9 * n.value * GAS_R) /* beyond rounding: the second law forbids it */
        made = gas_bad(GAS_UNREACHABLE, (int)count + 1, P.value);
    blend->entropy_made = made.value;
    return made.status ? give_up(blend, made) : done;
}
