/*
 * Every process with every ending: what must answer, and why the rest must not. The letters are reasoned out by hand:
 *   .  answers        n  GAS_NOT_APPLICABLE   u  GAS_UNREACHABLE
 *   w  GAS_WRONG_SIDE d  GAS_UNDETERMINED
 */
#include <ctype.h>
#include <math.h>
#include <stdio.h>
#include <string.h>

#include "check.h"
#include "path_gases.h"

enum { ENDINGS = GAS_TO_LAST_POINT + 1 };

static const char *const process_name[] = {"isothermal", "isobaric", "isochoric", "adiabatic",
                                           "polytropic", "free",     "against",   "against isothermal",
                                           "straight",   "points",   "polytropes"};

/* What is asked: figures of an expansion from 1 bar, 300 K, of a compression, and of standing still. The start of the
 * path (for "to start") lies on the isotherm of 300 K. */
struct asking {
    double P, T, v, Q, W; /* as ratios to the start; J/mol */
    double P_outside;     /* Pa */
};

static const struct asking expansion = {0.8, 0.9, 1.2, 500, -300, 0.5e5};
static const struct asking compression = {1.25, 1.1, 0.8, -500, 300, 2e5};
static const struct asking compression_against_too_little = {1.25, 1.1, 0.8, -500, 300, 0.5e5};
static const struct asking expansion_against_too_much = {0.8, 0.9, 1.2, 500, -300, 2e5};
static const struct asking past_the_balance = {0.4, 0.6, 3.0, 5000, -1500, 0.5e5};
static const struct asking standing_still = {1, 1, 1, 0, 0, 0.5e5};

/* clang-format off */
static const struct row {
    const struct asking *asking;
    enum gas_system system;
    enum gas_process process;
    const char *expected; /* P T V, P V T ratios, Q W, start, P and v, balance, last point */
} rows[] = {
    {&expansion, GAS_CLOSED, GAS_ISOTHERMAL,           ".u. ..u .. . nnn"},
    {&expansion, GAS_CLOSED, GAS_ISOBARIC,             "u.. u.. .. u nnn"},
    {&expansion, GAS_CLOSED, GAS_ISOCHORIC,            "..u .u. .u u nnn"},
    {&expansion, GAS_CLOSED, GAS_ADIABATIC,            "... ... n. u nnn"},
    {&expansion, GAS_CLOSED, GAS_POLYTROPIC,           "... ... .. u nnn"},
    {&expansion, GAS_CLOSED, GAS_FREE_EXPANSION,       ".u. ..u nn . nnn"},
    {&expansion, GAS_CLOSED, GAS_AGAINST,              "... ... n. u n.n"},
    {&expansion, GAS_CLOSED, GAS_AGAINST_ISOTHERMAL,   ".u. ..u .. . n.n"},
    {&expansion, GAS_CLOSED, GAS_STRAIGHT,             "nnn nnn nn . .nn"},
    {&expansion, GAS_CLOSED, GAS_THROUGH_POINTS,       "nnn nnn nn . nn."},
    {&expansion, GAS_CLOSED, GAS_THROUGH_POLYTROPES,   "nnn nnn nn . nn."},
    {&expansion, GAS_FLOW,   GAS_ISOTHERMAL,           ".u. ..u .. . nnn"},
    {&expansion, GAS_FLOW,   GAS_ISOBARIC,             "u.. u.. .u u nnn"},
    {&expansion, GAS_FLOW,   GAS_ISOCHORIC,            "..u .u. .. u nnn"},
    {&expansion, GAS_FLOW,   GAS_ADIABATIC,            "... ... n. u nnn"},
    {&expansion, GAS_FLOW,   GAS_POLYTROPIC,           "... ... .. u nnn"},
    {&expansion, GAS_FLOW,   GAS_FREE_EXPANSION,       ".u. ..u nn . nnn"},
    {&expansion, GAS_FLOW,   GAS_AGAINST,              "nnn nnn nn n nnn"},
    {&expansion, GAS_FLOW,   GAS_AGAINST_ISOTHERMAL,   "nnn nnn nn n nnn"},
    {&expansion, GAS_FLOW,   GAS_STRAIGHT,             "nnn nnn nn . .nn"},
    {&expansion, GAS_FLOW,   GAS_THROUGH_POINTS,       "nnn nnn nn . nn."},
    {&expansion, GAS_FLOW,   GAS_THROUGH_POLYTROPES,   "nnn nnn nn . nn."},
    {&compression, GAS_CLOSED, GAS_ISOTHERMAL,         ".u. ..u .. . nnn"},
    {&compression, GAS_CLOSED, GAS_ISOBARIC,           "u.. u.. .. u nnn"},
    {&compression, GAS_CLOSED, GAS_ISOCHORIC,          "..u .u. .u u nnn"},
    {&compression, GAS_CLOSED, GAS_ADIABATIC,          "... ... n. u nnn"},
    {&compression, GAS_CLOSED, GAS_POLYTROPIC,         "... ... .. u nnn"},
    {&compression, GAS_CLOSED, GAS_FREE_EXPANSION,     "uuu uuu nn u nnn"},
    {&compression, GAS_CLOSED, GAS_AGAINST,            "... ... n. u n.n"},
    {&compression, GAS_CLOSED, GAS_AGAINST_ISOTHERMAL, ".u. ..u .. . n.n"},
    {&compression, GAS_CLOSED, GAS_STRAIGHT,           "nnn nnn nn . .nn"},
    {&compression, GAS_CLOSED, GAS_THROUGH_POINTS,     "nnn nnn nn . nn."},
    {&compression, GAS_CLOSED, GAS_THROUGH_POLYTROPES, "nnn nnn nn . nn."},
    {&compression, GAS_FLOW, GAS_ISOTHERMAL,           ".u. ..u .. . nnn"},
    {&compression, GAS_FLOW, GAS_ISOBARIC,             "u.. u.. .u u nnn"},
    {&compression, GAS_FLOW, GAS_ISOCHORIC,            "..u .u. .. u nnn"},
    {&compression, GAS_FLOW, GAS_ADIABATIC,            "... ... n. u nnn"},
    {&compression, GAS_FLOW, GAS_POLYTROPIC,           "... ... .. u nnn"},
    {&compression, GAS_FLOW, GAS_FREE_EXPANSION,       "uuu uuu nn u nnn"},
    /* a piston moves to the side of the lower pressure, whatever is asked of it */
    {&compression_against_too_little, GAS_CLOSED, GAS_AGAINST,            "www www nw w n.n"},
    {&compression_against_too_little, GAS_CLOSED, GAS_AGAINST_ISOTHERMAL, "wuw wwu ww w n.n"},
    {&expansion_against_too_much,     GAS_CLOSED, GAS_AGAINST,            "www www nw w n.n"},
    {&expansion_against_too_much,     GAS_CLOSED, GAS_AGAINST_ISOTHERMAL, "wuw wwu ww w n.n"},
    /* and stops at the balance: 0.5 bar, adiabatically 257 K (T2/T1 = (cv + R/2)/cp = 6/7) */
    {&past_the_balance,               GAS_CLOSED, GAS_AGAINST,            "www www nw w n.n"},
    {&past_the_balance,               GAS_CLOSED, GAS_AGAINST_ISOTHERMAL, "wuw wwu ww w n.n"},
    /* what a process holds fixed does not say where it ends */
    {&standing_still, GAS_CLOSED, GAS_ISOTHERMAL,         ".d. ..d .. . nnn"},
    {&standing_still, GAS_CLOSED, GAS_ISOBARIC,           "d.. d.. .. . nnn"},
    {&standing_still, GAS_CLOSED, GAS_ISOCHORIC,          "..d .d. .d . nnn"},
    {&standing_still, GAS_FLOW,   GAS_ISOBARIC,           "d.. d.. .d . nnn"},
    {&standing_still, GAS_FLOW,   GAS_ISOCHORIC,          "..d .d. .. . nnn"},
    {&standing_still, GAS_CLOSED, GAS_FREE_EXPANSION,     ".d. ..d nn . nnn"},
    {&standing_still, GAS_CLOSED, GAS_AGAINST,            "... ... n. . n.n"},
    {&standing_still, GAS_CLOSED, GAS_AGAINST_ISOTHERMAL, ".d. ..d .. . n.n"},
};
/* clang-format on */

static enum gas_status status_of(char letter)
{
    switch (letter) {
    case '.':
        return GAS_OK;
    case 'n':
        return GAS_NOT_APPLICABLE;
    case 'u':
        return GAS_UNREACHABLE;
    case 'w':
        return GAS_WRONG_SIDE;
    default:
        return GAS_UNDETERMINED;
    }
}

static double asked(const struct asking *a, const struct gas_point *start, enum gas_ending ending)
{
    switch (ending) {
    case GAS_TO_P:
    case GAS_TO_P_AND_V:
        return a->P * start->P;
    case GAS_TO_T:
        return a->T * start->T;
    case GAS_TO_V:
        return a->v * start->v;
    case GAS_BY_P_RATIO:
        return a->P;
    case GAS_BY_V_RATIO:
        return a->v;
    case GAS_BY_T_RATIO:
        return a->T;
    case GAS_WITH_Q:
        return a->Q;
    default:
        return ending == GAS_WITH_W ? a->W : NAN;
    }
}

static void check_ending(const struct row *row, int ending, char letter)
{
    const struct gas_point start = point_PT(1e5, 300), home = point_PT(row->asking->P * 1e5, 300);
    const struct gas_point table[] = {start, {.P = home.P, .v = home.v}};
    struct gas_leg leg =
        leg_of(row->process, (enum gas_ending)ending, asked(row->asking, &start, (enum gas_ending)ending));
    struct gas_change change;
    char id[120];
    leg.second = row->asking->v * start.v;
    leg.n = row->process == GAS_POLYTROPIC ? 1.3 : NAN;
    leg.P_outside = row->asking->P_outside;
    leg.point = table;
    leg.point_count = 2;
    snprintf(id, sizeof id, "row %d, %s, ending %d", (int)(row - rows), process_name[row->process], ending);
    const struct gas_result r = gas_leg_run(&diatomic, row->system, &start, &home, &leg, &change);
    check_int(id, r.status, status_of(letter));
    if (r.status == GAS_WRONG_SIDE)
        check_close(id, r.figure, leg.P_outside, 0, 0);
    if (r.status == GAS_UNREACHABLE && ending != GAS_TO_START)
        check_close(id, r.figure, leg.value, 0, 0);
    if (r.status == GAS_OK)
        check_true(id, isfinite(change.W) && isfinite(change.Q) && isfinite(change.dS) && change.S_made >= 0);
    else
        check_true(id, isnan(r.value));
}

static void every_process_with_every_ending(void)
{
    for (size_t i = 0; i < sizeof rows / sizeof rows[0]; i++) {
        int ending = 0;
        for (const char *letter = rows[i].expected; *letter; letter++)
            if (!isspace((unsigned char)*letter))
                check_ending(&rows[i], ending++, *letter);
        check_int("letters", ending, ENDINGS);
    }
}

/* clang-format off */
/* One bad figure each; defaults: adiabatic to 2 bar of nitrogen from 1 bar, 300 K, closed. */
static const struct figure_row {
    const char *id;
    enum gas_process process;
    enum gas_ending ending;
    enum gas_system system;
    double value, n, efficiency, P_outside;
    enum gas_status status;
    int argument;
} figures[] = {
    {"P zero",            GAS_ADIABATIC, GAS_TO_P, GAS_CLOSED, 0, NAN, 1, 0, GAS_NOT_POSITIVE, 2},
    {"P negative",        GAS_ISOTHERMAL, GAS_TO_P, GAS_CLOSED, -2e5, NAN, 1, 0, GAS_NOT_POSITIVE, 2},
    {"T zero",            GAS_ISOBARIC, GAS_TO_T, GAS_CLOSED, 0, NAN, 1, 0, GAS_NOT_POSITIVE, 2},
    {"v infinite",        GAS_ISOBARIC, GAS_TO_V, GAS_CLOSED, INFINITY, NAN, 1, 0, GAS_NOT_FINITE, 2},
    {"P nan",             GAS_ADIABATIC, GAS_TO_P, GAS_CLOSED, NAN, NAN, 1, 0, GAS_NOT_FINITE, 2},
    {"ratio zero",        GAS_ISOTHERMAL, GAS_BY_V_RATIO, GAS_CLOSED, 0, NAN, 1, 0, GAS_NOT_POSITIVE, 2},
    {"Q infinite",        GAS_ISOBARIC, GAS_WITH_Q, GAS_CLOSED, INFINITY, NAN, 1, 0, GAS_NOT_FINITE, 2},
    {"W nan",             GAS_ISOTHERMAL, GAS_WITH_W, GAS_CLOSED, NAN, NAN, 1, 0, GAS_NOT_FINITE, 2},
    {"no n",              GAS_POLYTROPIC, GAS_TO_P, GAS_CLOSED, 2e5, NAN, 1, 0, GAS_NOT_FINITE, 3},
    {"no n in flow",      GAS_POLYTROPIC, GAS_TO_P, GAS_FLOW, 2e5, NAN, NAN, 0, GAS_NOT_FINITE, 3},
    {"n infinite",        GAS_POLYTROPIC, GAS_TO_P, GAS_CLOSED, 2e5, INFINITY, 1, 0, GAS_NOT_FINITE, 3},
    {"machine, closed",   GAS_POLYTROPIC, GAS_TO_P, GAS_CLOSED, 2e5, NAN, 0.8, 0, GAS_NOT_APPLICABLE, 4},
    {"machine with Q",    GAS_POLYTROPIC, GAS_WITH_Q, GAS_FLOW, 500, NAN, 0.8, 0, GAS_NOT_APPLICABLE, 2},
    {"n and efficiency",  GAS_POLYTROPIC, GAS_TO_P, GAS_FLOW, 2e5, 1.3, 0.8, 0, GAS_NOT_APPLICABLE, 4},
    {"efficiency 0",      GAS_ADIABATIC, GAS_TO_P, GAS_FLOW, 2e5, NAN, 0, 0, GAS_NOT_A_FRACTION, 4},
    {"efficiency 78",     GAS_ADIABATIC, GAS_TO_P, GAS_FLOW, 2e5, NAN, 78, 0, GAS_NOT_A_FRACTION, 4},
    {"efficiency -0.8",   GAS_ADIABATIC, GAS_TO_P, GAS_FLOW, 2e5, NAN, -0.8, 0, GAS_NOT_A_FRACTION, 4},
    {"efficiency nan",    GAS_ADIABATIC, GAS_TO_P, GAS_FLOW, 2e5, NAN, NAN, 0, GAS_NOT_FINITE, 4},
    {"machine 120 %",     GAS_POLYTROPIC, GAS_TO_P, GAS_FLOW, 2e5, NAN, 1.2, 0, GAS_NOT_A_FRACTION, 4},
    {"isothermal 80 %",   GAS_ISOTHERMAL, GAS_TO_P, GAS_FLOW, 2e5, NAN, 0.8, 0, GAS_NOT_APPLICABLE, 4},
    {"outside negative",  GAS_AGAINST, GAS_TO_BALANCE, GAS_CLOSED, 0, NAN, 1, -1e5, GAS_NEGATIVE, 5},
    {"outside nan",       GAS_AGAINST, GAS_TO_BALANCE, GAS_CLOSED, 0, NAN, 1, NAN, GAS_NOT_FINITE, 5},
    {"balance in vacuum", GAS_AGAINST, GAS_TO_BALANCE, GAS_CLOSED, 0, NAN, 1, 0, GAS_UNREACHABLE, 5},
    {"work in vacuum",    GAS_AGAINST, GAS_WITH_W, GAS_CLOSED, -10, NAN, 1, 0, GAS_UNREACHABLE, 2},
    {"too hot",           GAS_ISOBARIC, GAS_TO_T, GAS_CLOSED, 6500, NAN, 1, 0, GAS_OUTSIDE_DATA, 2},
    {"too cold",          GAS_ADIABATIC, GAS_TO_T, GAS_CLOSED, 150, NAN, 1, 0, GAS_OUTSIDE_DATA, 2},
    {"too much Q",        GAS_ISOBARIC, GAS_WITH_Q, GAS_CLOSED, 1e6, NAN, 1, 0, GAS_OUTSIDE_DATA, 2},
    {"too much Q out",    GAS_ISOCHORIC, GAS_WITH_Q, GAS_CLOSED, -1e4, NAN, 1, 0, GAS_OUTSIDE_DATA, 2},
    {"too much for n",    GAS_POLYTROPIC, GAS_WITH_Q, GAS_CLOSED, 1e6, 0.5, 1, 0, GAS_OUTSIDE_DATA, 2},
    {"too much W",        GAS_ADIABATIC, GAS_WITH_W, GAS_FLOW, 1e6, NAN, 1, 0, GAS_OUTSIDE_DATA, 2},
    {"too high a ratio",  GAS_ADIABATIC, GAS_BY_P_RATIO, GAS_FLOW, 1e9, NAN, 1, 0, GAS_OUTSIDE_DATA, 2},
    {"too hot, eta",      GAS_ADIABATIC, GAS_TO_V, GAS_FLOW, 1e-9, NAN, 0.8, 0, GAS_OUTSIDE_DATA, 2},
    {"too hot, machine",  GAS_POLYTROPIC, GAS_TO_V, GAS_FLOW, 1e-9, NAN, 0.8, 0, GAS_OUTSIDE_DATA, 2},
    {"too much drawn",    GAS_POLYTROPIC, GAS_WITH_W, GAS_CLOSED, -1e5, 1.4, 1, 0, GAS_UNREACHABLE, 2},
    {"no such volume",    GAS_ISOTHERMAL, GAS_TO_P, GAS_CLOSED, 1e-307, NAN, 1, 0, GAS_UNREACHABLE, 2},
    {"beyond numbers",    GAS_POLYTROPIC, GAS_TO_P, GAS_CLOSED, 2e5, 1e-9, 1, 0, GAS_UNREACHABLE, 2},
    {"unknown ending",    GAS_ISOTHERMAL, (enum gas_ending)99, GAS_CLOSED, 1, NAN, 1, 0, GAS_NOT_APPLICABLE, 2},
    {"unknown process",   (enum gas_process)99, GAS_TO_P, GAS_CLOSED, 1e5, NAN, 1, 0, GAS_NOT_APPLICABLE, 0},
};
/* clang-format on */

static void bad_figures(void)
{
    const struct gas_point start = point_PT(1e5, 300);
    for (size_t i = 0; i < sizeof figures / sizeof figures[0]; i++) {
        const struct figure_row *f = &figures[i];
        struct gas_leg leg = leg_of(f->process, f->ending, f->value);
        struct gas_change change;
        leg.n = f->n;
        leg.efficiency = f->efficiency;
        leg.P_outside = f->P_outside;
        const struct gas_result r = gas_leg_run(&nitrogen, f->system, &start, &start, &leg, &change);
        check_int(f->id, r.status, f->status);
        check_int(f->id, r.argument, f->argument);
    }
}

static void bad_starts(void)
{
    const struct gas_leg leg = leg_of(GAS_ISOBARIC, GAS_TO_T, 400);
    const struct {
        const char *id;
        struct gas_point start;
        enum gas_status status;
    } starts[] = {
        {"P zero", {0, 300, 0.025}, GAS_NOT_POSITIVE},
        {"T negative", {1e5, -3, 0.025}, GAS_NOT_POSITIVE},
        {"v infinite", {NAN, 300, INFINITY}, GAS_NOT_FINITE},
        {"one known", {1e5, NAN, NAN}, GAS_UNDETERMINED},
        {"at odds", {1e5, 300, 0.03}, GAS_CONTRADICTION},
        {"too cold", {1e5, 100, NAN}, GAS_OUTSIDE_DATA},
        {"two known", {1e5, 300, NAN}, GAS_OK},
    };
    for (size_t i = 0; i < sizeof starts / sizeof starts[0]; i++) {
        struct gas_change change, total;
        struct gas_result fault;
        const struct gas_result r = gas_leg_run(&nitrogen, GAS_CLOSED, &starts[i].start, NULL, &leg, &change);
        check_int(starts[i].id, r.status, starts[i].status);
        check_int(starts[i].id, r.argument, r.status ? 1 : 0);
        gas_path_run(&nitrogen, GAS_CLOSED, &starts[i].start, &leg, 1, &change, &total, &fault);
        check_int(starts[i].id, fault.status, starts[i].status);
        check_int(starts[i].id, fault.argument, r.status ? 1 : 0);
    }
}

static void bad_tables(void)
{
    const struct gas_point start = point_PT(1e5, 300);
    const struct {
        const char *id;
        size_t count;
        struct gas_point point[3];
        enum gas_status status;
    } tables[] = {
        {"one point", 1, {{1e5, 0, 1}}, GAS_UNDETERMINED},
        {"v zero", 2, {{1e5, 0, 1}, {2e5, 0, 0}}, GAS_NOT_POSITIVE},
        {"first v zero", 2, {{1e5, 0, 0}, {2e5, 0, 1}}, GAS_NOT_POSITIVE},
        {"P negative", 3, {{1e5, 0, 1}, {-1, 0, 2}, {1e5, 0, 3}}, GAS_NOT_POSITIVE},
        {"P nan", 2, {{1e5, 0, 1}, {NAN, 0, 2}}, GAS_NOT_FINITE},
        {"v infinite", 2, {{1e5, 0, 1}, {1e5, 0, INFINITY}}, GAS_NOT_FINITE},
        {"v does not move", 2, {{1e5, 0, 1}, {2e5, 0, 1}}, GAS_UNREACHABLE},
        {"starts elsewhere", 2, {{2e5, 0, 1}, {3e5, 0, 0.8}}, GAS_CONTRADICTION},
        {"good, with a stretch at constant v", 3, {{1e5, 0, 1}, {1.4e5, 0, 1}, {1.4e5, 0, 1.2}}, GAS_OK},
    };
    for (size_t i = 0; i < sizeof tables / sizeof tables[0]; i++)
        for (int process = GAS_THROUGH_POINTS; process <= GAS_THROUGH_POLYTROPES; process++) {
            struct gas_leg leg = leg_of((enum gas_process)process, GAS_TO_LAST_POINT, NAN);
            struct gas_change change;
            leg.point = tables[i].point;
            leg.point_count = tables[i].count;
            const struct gas_result r = gas_leg_run(&nitrogen, GAS_CLOSED, &start, NULL, &leg, &change);
            check_int(tables[i].id, r.status, tables[i].status);
            check_int(tables[i].id, r.argument, tables[i].status ? 6 : 0);
            if (tables[i].status == GAS_OK)
                check_close(tables[i].id, change.W, -1.4e5 * 0.2 * start.v, 1e-12, 0);
        }
    const struct gas_leg nothing = leg_of(GAS_THROUGH_POINTS, GAS_TO_LAST_POINT, NAN);
    struct gas_change change;
    check_int("no table", gas_leg_run(&nitrogen, GAS_CLOSED, &start, NULL, &nothing, &change).argument, 6);
}

/* Work needs no heat capacity where the end follows from P, T and v; the rest is then NAN, never a guess. */
static void without_heat_capacity(void)
{
    const struct gas_point start = point_PT(1e5, 300);
    const struct gas_leg isothermal = leg_of(GAS_ISOTHERMAL, GAS_BY_P_RATIO, 3),
                         adiabatic = leg_of(GAS_ADIABATIC, GAS_TO_P, 2e5),
                         heated = leg_of(GAS_ISOBARIC, GAS_WITH_Q, 100), isobaric = leg_of(GAS_ISOBARIC, GAS_TO_T, 400);
    struct gas_change c;
    check_int("isothermal", gas_leg_run(&bare, GAS_CLOSED, &start, NULL, &isothermal, &c).status, GAS_OK);
    check_close("isothermal Q", c.Q, -GAS_R * 300 * log(3), 1e-14, 0);
    check_close("isothermal dS", c.dS, -GAS_R * log(3), 1e-14, 0);
    check_int("isobaric", gas_leg_run(&bare, GAS_CLOSED, &start, NULL, &isobaric, &c).status, GAS_OK);
    check_close("isobaric W", c.W, -GAS_R * 100, 1e-13, 0);
    check_true("isobaric rest",
               isnan(c.Q) && isnan(c.dU) && isnan(c.dH) && isnan(c.dS) && isnan(c.Q_in) && isnan(c.Q_out));
    check_int("adiabatic", gas_leg_run(&bare, GAS_CLOSED, &start, NULL, &adiabatic, &c).status, GAS_NO_HEAT_CAPACITY);
    check_int("with Q", gas_leg_run(&bare, GAS_CLOSED, &start, NULL, &heated, &c).status, GAS_NO_HEAT_CAPACITY);
}

static double any_figure(void)
{
    static const double odd[] = {0, -1, NAN, INFINITY, -INFINITY, 1e-308, 1e308, 1, 300, 1e5, -1e5, 0.025, 1e-9, 1e9};
    const int i = (int)check_random(0, 28);
    return i < 14 ? odd[i] : exp(check_random(-30, 30));
}

/* Whatever comes in, the answer is a lawful state or a refusal; nothing in between. */
static void anything_at_all(void)
{
    check_seed(31);
    for (int i = 0; i < 60000; i++) {
        const struct gas *gas = path_gases[i % PATH_GASES];
        const struct gas_point table[] = {{any_figure(), NAN, any_figure()}, {any_figure(), NAN, any_figure()}};
        const struct gas_point start =
            i % 3 ? point_PT(table[0].P > 0 ? table[0].P : 1e5, check_random(250, 900)) : table[1];
        const struct gas_leg leg = {.process = (enum gas_process)(int)check_random(0, 12),
                                    .ending = (enum gas_ending)(int)check_random(0, 13),
                                    .value = any_figure(),
                                    .second = any_figure(),
                                    .n = any_figure(),
                                    .efficiency = i % 2 ? 1 : any_figure(),
                                    .P_outside = any_figure(),
                                    .point_count = (size_t)(i % 3),
                                    .point = table};
        const enum gas_system system = i % 7 < 4 ? GAS_CLOSED : GAS_FLOW;
        struct gas_change c;
        struct gas_point at;
        const struct gas_result r = gas_leg_run(gas, system, &start, i % 5 ? &table[1] : NULL, &leg, &c);
        if (r.status) {
            if (!isnan(r.value))
                check_true("a refusal has no value", false);
            continue;
        }
        const bool lawful = c.end.P > 0 && c.end.T > 0 && c.end.v > 0 && isfinite(c.W) && isfinite(c.Q) &&
                            isfinite(c.dS) && c.S_made >= 0 && isfinite(c.end.P + c.end.T + c.end.v);
        check_true("lawful", lawful);
        check_close("Pv = RT", c.end.P * c.end.v, GAS_R * c.end.T, 1e-9, 0);
        const struct gas_result on = gas_leg_at(gas, system, &start, &leg, &c, 0.5, &at);
        check_true("on the way", on.status || (at.P > 0 && at.T > 0 && at.v > 0));
    }
}

/* clang-format off */
const struct test_suite suite_leg_refusals = {"leg_refusals", (const struct test_case[]){
    {"every process with every ending", every_process_with_every_ending},
    {"bad figures", bad_figures},
    {"bad starts", bad_starts},
    {"bad tables", bad_tables},
    {"without heat capacity", without_heat_capacity},
    {"anything at all", anything_at_all},
    {0}}};
/* clang-format on */
