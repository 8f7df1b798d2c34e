/*
 * Time per call of worksheet functions on single cells, the first call of a gas that is new, and tables of 100,000 rows
 * beside the price of moving their cells. Prints medians; asserts nothing.
 */
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <time.h>

#include "sheet/catalogue.h"

enum { ROUNDS = 9, ROWS = 100000, ARGUMENTS = 6, SHORTEST = 2000 };

static double now(void)
{
    struct timespec at;
    clock_gettime(CLOCK_MONOTONIC, &at);
    return (double)at.tv_sec + 1e-9 * (double)at.tv_nsec;
}

static int by_size(const void *a, const void *b)
{
    double one = *(const double *)a, other = *(const double *)b;
    return (one > other) - (one < other);
}

static double median(double *figure, size_t count)
{
    qsort(figure, count, sizeof *figure, by_size);
    return figure[count / 2];
}

static const struct gas_function *find(const char *name)
{
    size_t count;
    const struct gas_function *row = gas_catalogue(&count);
    for (size_t i = 0; i < count; i++)
        if (strcmp(row[i].sheet_name, name) == 0)
            return &row[i];
    fprintf(stderr, "%s is not in the catalogue\n", name);
    exit(1);
}

static struct gas_cell text(const char *words)
{
    return (struct gas_cell){GAS_CELL_TEXT, 0, words, strlen(words)};
}

/* A formula: texts, or NULL for a figure that changes from call to call. */
struct formula {
    const char *function;
    const char *argument[ARGUMENTS];
    size_t count;
};

/* clang-format off */
static const struct formula formulas[] = {
    {"GAS.VERSION", {0}, 0},
    {"GAS.CP",      {"N2", NULL}, 2},
    {"GAS.CP",      {"N2", NULL, "kJ/kg-K", "°C"}, 4},
    {"GAS.CP",      {"N2 79 + O2 21", NULL}, 2},
    {"GAS.CP",      {"N2 | cp = 28.58 + 3.77e-3 T - 0.50e5/T^2 J/mol-K, 298 to 2000 K", NULL}, 2},
    {"GAS.DH",      {"N2", "300", NULL, "kJ/kg"}, 4},
    {"GAS.TEMP",    {"N2", "300", NULL}, 3},
    {"GAS.UNIT",    {NULL, "psig", "bar"}, 3},
    {"GAS.SOLVE",   {"N2", "7 bar(g); 35 °C; 12 m3", "kg"}, 3},
    {"GAS.WORK",    {"N2", "2 kg; 25 °C; 1 bar", "isothermal to 8 bar", "kJ"}, 4},
    {"GAS.WORK",    {"N2", "2 kg; 25 °C; 1 bar", "adiabatic to 8 bar", "kJ"}, 4},
    {"GAS.CP",      {"N2", "no figure"}, 2},
    {"GAS.CP",      {"nitrogn", NULL}, 2},
};
/* clang-format on */

static double per_call(const struct formula *formula, struct gas_arena *arena)
{
    const struct gas_function *function = find(formula->function);
    struct gas_cell cell[ARGUMENTS];
    struct gas_block block[ARGUMENTS];
    double took[ROUNDS];
    for (size_t i = 0; i < formula->count; i++) {
        cell[i] = formula->argument[i] ? text(formula->argument[i]) : gas_cell_number(0);
        block[i] = (struct gas_block){1, 1, &cell[i], false};
    }
    for (size_t round = 0; round < ROUNDS; round++) {
        double begin = now();
        for (size_t turn = 0; turn < SHORTEST; turn++) {
            for (size_t i = 0; i < formula->count; i++)
                if (!formula->argument[i])
                    cell[i].number = 300 + 0.1 * (double)turn;
            struct gas_call call = {.argument = block, .count = formula->count, .arena = arena};
            gas_function_call(function, &call);
            gas_arena_reset(arena);
        }
        took[round] = (now() - begin) / SHORTEST;
    }
    return median(took, ROUNDS);
}

static void single_cells(struct gas_arena *arena)
{
    printf("single cells, each call\n");
    for (size_t f = 0; f < sizeof formulas / sizeof *formulas; f++) {
        double took = per_call(&formulas[f], arena);
        printf("  %8.0f ns  %s", 1e9 * took, formulas[f].function + 4);
        for (size_t i = 0; i < formulas[f].count; i++)
            printf("%s%s", i ? "; " : " ", formulas[f].argument[i] ? formulas[f].argument[i] : "figure");
        printf("\n");
    }
}

/* Gas texts that were never seen before. */
static void first_calls(struct gas_arena *arena)
{
    double took[200];
    char words[60];
    for (size_t i = 0; i < sizeof took / sizeof *took; i++) {
        snprintf(words, sizeof words, "N2 %zu + O2 %zu", 1000 - i, i);
        struct gas_cell gas = text(words), T = gas_cell_number(300);
        struct gas_block block[] = {{1, 1, &gas, false}, {1, 1, &T, false}};
        struct gas_call call = {.argument = block, .count = 2, .arena = arena};
        double begin = now();
        gas_function_call(find("GAS.CP"), &call);
        took[i] = now() - begin;
        gas_arena_reset(arena);
    }
    printf("first call, a mixture never seen before\n  %8.0f ns\n", 1e9 * median(took, 200));
}

struct table {
    const char *function, *gas, *headings, *legs, *wanted;
    double start[4];
    size_t columns;
};

/* clang-format off */
static const struct table tables[] = {
    {"GAS.CP",    "N2", NULL,                                  NULL,                "J/mol-K", {300},        1},
    {"GAS.UNIT",  NULL, NULL,                                  NULL,                NULL,      {100},        1},
    {"GAS.SOLVE", "N2", "P, bar(g); T, °C; V, m3",             NULL,                "m, kg",   {7, 35, 12},  3},
    {"GAS.SOLVE", "N2", "P1, bar(g); T1, °C; V, m3; T2, °C",   NULL,                "P2, bar(g)", {7, 35, 12, 80}, 4},
    {"GAS.WORK",  "N2", "m, kg; T1, °C; P1, bar; P2, bar",     "isothermal to P2",  "kJ",      {2, 25, 1, 8}, 4},
    {"GAS.WORK",  "N2", "m, kg; T1, °C; P1, bar; P2, bar",     "adiabatic to P2",   "kJ",      {2, 25, 1, 8}, 4},
};
/* clang-format on */

static size_t arguments_of(const struct table *table, struct gas_cell *cell, struct gas_cell *figures,
                           struct gas_block *block)
{
    struct gas_block numbers = {ROWS, table->columns, figures, true};
    const char *words[] = {table->gas, NULL, table->legs, table->wanted, table->headings};
    size_t count = 0;
    if (!table->gas) { /* UNIT */
        words[0] = NULL, words[1] = "psig", words[2] = "bar";
        block[count++] = numbers;
    }
    for (size_t i = 0; i < 5; i++) {
        if (i == 1 && table->gas)
            block[count++] = numbers;
        if (!words[i])
            continue;
        cell[i] = text(words[i]);
        block[count++] = (struct gas_block){1, 1, &cell[i], false};
    }
    return count;
}

static size_t fuss(size_t round, size_t count) /* so that the copy is not left out */
{
    return (round * 7919) % count;
}

static double moved(const struct gas_cell *figures, size_t count)
{
    double took[ROUNDS] = {0};
    struct gas_cell *copy = malloc(count * sizeof *copy);
    for (size_t round = 0; copy && round < ROUNDS; round++) {
        double begin = now();
        memcpy(copy, figures, count * sizeof *copy);
        took[round] = now() - begin;
        if (copy[fuss(round, count)].text)
            printf("?");
    }
    free(copy);
    return median(took, ROUNDS);
}

static void measure(const struct table *table)
{
    struct gas_cell cell[5], *figures = calloc(ROWS * table->columns, sizeof *figures);
    struct gas_block block[ARGUMENTS];
    struct gas_arena arena = {0};
    double took[ROUNDS];
    for (size_t row = 0; figures && row < ROWS; row++)
        for (size_t column = 0; column < table->columns; column++)
            figures[row * table->columns + column] = gas_cell_number(table->start[column] * (1 + (double)row * 1e-6));
    size_t count = arguments_of(table, cell, figures, block);
    for (size_t round = 0; round < ROUNDS; round++) {
        struct gas_call call = {.argument = block, .count = count, .arena = &arena};
        gas_arena_reset(&arena);
        double begin = now();
        gas_function_call(find(table->function), &call);
        took[round] = now() - begin;
        const struct gas_cell *last = &call.answer.cell[call.answer.rows * call.answer.columns - 1];
        if (last->kind != GAS_CELL_NUMBER || call.answer.rows != ROWS) {
            fprintf(stderr, "%s: %s\n", table->function, last->text ? last->text : "no table");
            exit(1);
        }
    }
    printf("  %8.0f ns/row, %5.1f ns/row to copy the cells  %s %s %s\n", 1e9 * median(took, ROUNDS) / ROWS,
           1e9 * moved(figures, ROWS * table->columns) / ROWS, table->function + 4, table->legs ? table->legs : "",
           table->headings ? table->headings : "");
    gas_arena_free(&arena);
    free(figures);
}

int main(void)
{
    struct gas_arena arena = {0};
    first_calls(&arena);
    single_cells(&arena);
    printf("tables of %d rows\n", ROWS);
    for (size_t i = 0; i < sizeof tables / sizeof *tables; i++)
        measure(&tables[i]);
    gas_arena_free(&arena);
    return 0;
}
