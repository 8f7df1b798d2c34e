/* Gases by name; the cache of gases. */
#include <pthread.h>
#include <stdio.h>

#include "gas_cases.h"

struct name_row {
    const char *text, *label;
    double M; /* kg/kmol, IUPAC standard atomic weights 2021, abridged values added up by hand */
};

static const struct name_row names[] = {
    {"N2", "nitrogen", 28.014},         {"nitrogen", "nitrogen", 28.014},  {"7727-37-9", "nitrogen", 28.014},
    {" Nitrogen ", "nitrogen", 28.014}, {"CO", "carbon monoxide", 28.010}, {"steam", "water", 18.015},
    {"co2", "carbon dioxide", 44.009},  {"CO₂", "carbon dioxide", 44.009}, {"1-butene", "1-butene", 56.108},
};

static void species_by_every_name(void)
{
    for (size_t i = 0; i < sizeof names / sizeof *names; i++) {
        const struct gas_choice *choice = case_text(names[i].text);
        if (!choice)
            continue;
        check_text(names[i].text, choice->label, names[i].label);
        check_close(names[i].text, choice->gas.molar_mass * 1e3, names[i].M, 5e-5, 0);
        check_int(names[i].text, (long)choice->part_count, 1);
        check_close(names[i].text, choice->part->x, 1, 0, 0);
        check_contains(names[i].text, choice->source, "NASA/TP-2002-211556");
        check_text(names[i].text, choice->rule, "");
        gas_choice_release(choice);
    }
}

static void near_misses(void)
{
    case_text_refused("nitrogn", "\"nitrogn\" is not known; nearest");
    case_text_refused("nitrogn", "nitrogen (N2)");
    case_text_refused("metane", "methane (CH4)");
    case_text_refused("qqqqqqqqqqqq", "GAS.LIST");
    case_text_refused("N2\xff\xfe", "is not known");
    case_text_refused("", "blank");
    case_text_refused("  \t ", "blank");
    case_text_refused("| k = 1.4", "no gas stands before");
    case_text_refused("Check T1: 12 K is too cold.", "Check T1: 12 K is too cold.");
}

static void other_arguments(void)
{
    struct gas_refusal refusal = {0};
    struct gas_cell number = gas_cell_number(28), empty = {0}, fault = {.kind = GAS_CELL_HOST_ERROR};
    case_refused("number", gas_choose(&(struct gas_block){1, 1, &number, false}, &refusal), &refusal, "28 is a number");
    refusal = (struct gas_refusal){0};
    case_refused("empty", gas_choose(&(struct gas_block){1, 1, &empty, true}, &refusal), &refusal, "blank");
    refusal = (struct gas_refusal){0};
    case_refused("omitted", gas_choose(&(struct gas_block){0}, &refusal), &refusal, "blank");
    refusal = (struct gas_refusal){0};
    case_refused("error", gas_choose(&(struct gas_block){1, 1, &fault, true}, &refusal), &refusal, "error");
    refusal = (struct gas_refusal){0};
    case_refused("large", gas_choose(&(struct gas_block){5000, 3, NULL, true}, &refusal), &refusal, "2000 cells");
}

static void long_text(void)
{
    char *text = malloc(10002);
    memset(text, '(', 10001);
    text[10001] = '\0';
    case_text_refused(text, "10001 characters");
    memcpy(text, "N2 | cp = ", 10);
    text[9999] = '\0';
    case_text_refused(text, "40 deep");
    memset(text, '+', 9999);
    case_text_refused(text, "blank");
    for (size_t i = 0; i + 2 < 9999; i += 2)
        memcpy(text + i, "5 ", 2);
    case_text_refused(text, "is not known");
    free(text);
}

static void one_cell_is_the_text(void)
{
    const struct gas_choice *text = case_text("CH4 92 + C2H6 8"), *cell = case_block(1, "CH4 92 + C2H6 8");
    check_true("one cell is the text", text && text == cell);
    gas_choice_release(text);
    gas_choice_release(cell);
}

/* More gases than the cache holds, all in use: each stays what it was. */
static void eviction_is_safe(void)
{
    enum { MANY = 700 };
    static const struct gas_choice *held[MANY];
    char text[60];
    for (int i = 0; i < MANY; i++) {
        snprintf(text, sizeof text, "N2 | cp = %d J/mol-K", 30 + i);
        held[i] = case_text(text);
    }
    for (int i = 0; i < MANY; i++) {
        check_close("still there", held[i] ? gas_cp(&held[i]->gas, 300).value : 0, 30 + i, 1e-15, 0);
        gas_choice_release(held[i]);
    }
    const struct gas_choice *first = case_text("He"), *second = case_text("He");
    check_true("the same pointer for the same text", first && first == second);
    gas_choice_release(first);
    gas_choice_release(second);
}

static void *many_looks(void *wrong)
{
    char text[60];
    for (int i = 0; i < 3000; i++) {
        struct gas_refusal refusal = {0};
        snprintf(text, sizeof text, "Ar | cp = %d J/mol-K", 30 + i % 400);
        const struct gas_choice *choice = gas_choose_text(text, strlen(text), &refusal);
        *(int *)wrong += !choice || gas_cp(&choice->gas, 300).value != 30 + i % 400;
        gas_choice_release(choice);
    }
    return NULL;
}

static void threads_share_the_cache(void)
{
    pthread_t thread[4];
    int wrong[4] = {0}, started = 0;
    while (started < 4 && pthread_create(&thread[started], NULL, many_looks, &wrong[started]) == 0)
        started++;
    check_int("threads", started, 4);
    for (int i = 0; i < started; i++) {
        pthread_join(thread[i], NULL);
        check_int("right in every thread", wrong[i], 0);
    }
}

const struct test_suite suite_gas_name = {"gas_name", (const struct test_case[]){{"names", species_by_every_name},
                                                                                 {"near misses", near_misses},
                                                                                 {"arguments", other_arguments},
                                                                                 {"long text", long_text},
                                                                                 {"one cell", one_cell_is_the_text},
                                                                                 {"eviction", eviction_is_safe},
                                                                                 {"threads", threads_share_the_cache},
                                                                                 {0}}};
