/*
 * Every function of the catalogue with arguments made from seeds: it answers, the answer is fit to be seen, and it is
 * the same after other calls, in another locale and in several threads at once.
 *
 * GASLEAF_FUZZ=200000 makes that many calls, GASLEAF_FUZZ_FROM=1234 begins at a seed; with GASLEAF_FUZZ=1 the call and
 * its answer are shown.
 */
#include <locale.h>
#include <malloc.h>
#include <pthread.h>
#include <stdlib.h>
#include <string.h>
#include <time.h>

#include "check.h"
#include "fuzz.h"

#ifndef TEST_LOCALES
#define TEST_LOCALES "build/locale" /* the Makefile says where they are */
#endif

enum { CALLS = 6000, REPEATED = 2000, THREADS = 4, WORDS = 240 };

static size_t setting(const char *name, size_t usual)
{
    const char *text = getenv(name);
    return text ? (size_t)strtoull(text, NULL, 10) : usual;
}

static const struct gas_function *run(uint64_t seed, struct gas_arena *arena, struct gas_call *call)
{
    gas_arena_reset(arena);
    const struct gas_function *function = fuzz_call(seed, arena, call);
    if (function)
        gas_function_call(function, call);
    return function;
}

static uint64_t hash_of(uint64_t seed, struct gas_arena *arena)
{
    struct gas_call call;
    return run(seed, arena, &call) ? fuzz_hash(&call.answer) : 0;
}

static void show(const struct gas_function *function, const struct gas_call *call, size_t first)
{
    fuzz_show(stdout, function, call);
    for (size_t i = first; i < call->answer.rows * call->answer.columns && i < first + 20; i++) {
        const struct gas_cell *cell = &call->answer.cell[i];
        printf("  %s%.17g\n", cell->kind == GAS_CELL_TEXT ? cell->text : "", cell->number);
    }
}

static double seconds(void)
{
    struct timespec at;
    clock_gettime(CLOCK_THREAD_CPUTIME_ID, &at);
    return (double)at.tv_sec + 1e-9 * (double)at.tv_nsec;
}

/* Answers fit to be seen; the share that are figures tells that the grammar is not all rubbish. */
static void answers_are_fit(void)
{
    size_t calls = setting("GASLEAF_FUZZ", CALLS), from = setting("GASLEAF_FUZZ_FROM", 1), figures = 0, faults = 0;
    double slowest = 0;
    size_t slow_seed = 0;
    struct gas_arena arena = {0};
    for (size_t seed = from; seed < from + calls; seed++) {
        char id[WORDS];
        struct gas_call call;
        double begin = seconds();
        const struct gas_function *function = run(seed, &arena, &call);
        double took = seconds() - begin;
        size_t where = 0;
        const char *fault = function ? fuzz_fault(&call, &where) : "out of memory";
        if (took > slowest) {
            slowest = took;
            slow_seed = seed;
        }
        if (function && ((fault && faults++ < 20) || calls == 1))
            show(function, &call, where);
        figures += function && !fault && call.answer.cell[0].kind == GAS_CELL_NUMBER;
        snprintf(id, sizeof id, "seed %zu, %s: %s", seed, function ? function->sheet_name : "", fault ? fault : "fit");
        check_true(id, !fault);
    }
    if (calls > CALLS)
        printf("slowest: seed %zu, %.3f s; %zu of %zu answers begin with a figure\n", slow_seed, slowest, figures,
               calls);
    check_true("some answers are figures", calls < CALLS || figures > calls / 20);
    gas_arena_free(&arena);
}

/* First in one order, then backwards with strides between: nothing that was asked before can be seen in an answer. */
static void answers_do_not_depend_on_the_past(void)
{
    static uint64_t first[REPEATED];
    struct gas_arena arena = {0};
    for (size_t i = 0; i < REPEATED; i++)
        first[i] = hash_of(i + 1, &arena);
    for (size_t i = 0; i < REPEATED; i++) {
        char id[WORDS];
        size_t seed = (REPEATED - i) * 7919 % REPEATED;
        snprintf(id, sizeof id, "seed %zu again", seed + 1);
        check_true(id, hash_of(seed + 1, &arena) == first[seed]);
    }
    gas_arena_free(&arena);
}

/* With a decimal comma, and where the capital of i is not I. The Makefile compiles the locales. */
static void locales_change_nothing(void)
{
    static const char *const locales[] = {"de_DE.UTF-8", "tr_TR"};
    static uint64_t first[REPEATED];
    struct gas_arena arena = {0};
    for (size_t i = 0; i < REPEATED; i++)
        first[i] = hash_of(i + 1, &arena);
    setenv("LOCPATH", TEST_LOCALES, 1);
    for (size_t l = 0; l < sizeof locales / sizeof *locales; l++) {
        bool set = setlocale(LC_ALL, locales[l]) != NULL;
        check_true("the locale is at hand (package locales)", set && *localeconv()->decimal_point == ',');
        for (size_t i = 0; i < REPEATED; i++) {
            char id[WORDS];
            snprintf(id, sizeof id, "seed %zu in %s", i + 1, locales[l]);
            check_true(id, hash_of(i + 1, &arena) == first[i]);
        }
    }
    setlocale(LC_ALL, "C");
    gas_arena_free(&arena);
}

struct worker {
    pthread_t thread;
    size_t stride;
    uint64_t hash[REPEATED];
};

static void *work(void *data)
{
    struct worker *worker = data;
    struct gas_arena arena = {0};
    for (size_t i = 0; i < REPEATED; i++) {
        size_t seed = i * worker->stride % REPEATED;
        worker->hash[seed] = hash_of(seed + 1, &arena);
    }
    gas_arena_free(&arena);
    return NULL;
}

/* Several documents calculate at once: the same calls in different orders, the same answers. */
static void threads_do_not_meet(void)
{
    static const size_t strides[THREADS] = {1, 3, 7, 1999};
    static struct worker worker[THREADS];
    for (size_t t = 0; t < THREADS; t++) {
        worker[t].stride = strides[t];
        check_int("thread", pthread_create(&worker[t].thread, NULL, work, &worker[t]), 0);
    }
    for (size_t t = 0; t < THREADS; t++)
        pthread_join(worker[t].thread, NULL);
    for (size_t i = 0; i < REPEATED; i++)
        for (size_t t = 1; t < THREADS; t++) {
            char id[WORDS];
            snprintf(id, sizeof id, "seed %zu in thread %zu", i + 1, t);
            check_true(id, worker[t].hash[i] == worker[0].hash[i]);
        }
}

static void many_texts(size_t from, size_t count)
{
    struct gas_arena arena = {0};
    for (size_t i = from; i < from + count; i++)
        hash_of(i, &arena);
    gas_arena_free(&arena);
}

/* Every call brings new texts; what is kept of them is bounded. */
static void caches_do_not_grow(void)
{
    enum { FULL = 4000, MORE = 8000, SPREAD = 1000000 };
    many_texts(1000000, FULL);
    size_t before = mallinfo2().uordblks;
    many_texts(2000000, MORE);
    size_t after = mallinfo2().uordblks;
    check_true("kept memory stays", after < before + SPREAD);
}

const struct test_suite suite_fuzz = {
    "fuzz", (const struct test_case[]){{"answers are fit to be seen", answers_are_fit},
                                       {"answers do not depend on the past", answers_do_not_depend_on_the_past},
                                       {"locales change nothing", locales_change_nothing},
                                       {"threads do not meet", threads_do_not_meet},
                                       {"caches do not grow", caches_do_not_grow},
                                       {0}}};
