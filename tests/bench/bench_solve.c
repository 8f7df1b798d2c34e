/* Time per row of SOLVE over a table of 100,000 rows. Prints figures, asserts nothing. */
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <time.h>

#include "sheet/catalogue.h"

enum { ROWS = 100000, TURNS = 5 };

static const struct gas_function *find(const char *name)
{
    size_t count;
    const struct gas_function *row = gas_catalogue(&count);
    for (size_t i = 0; i < count; i++)
        if (strcmp(row[i].sheet_name, name) == 0)
            return &row[i];
    return NULL;
}

static struct gas_cell text(const char *words)
{
    return (struct gas_cell){GAS_CELL_TEXT, 0, words, strlen(words)};
}

static double now(void)
{
    struct timespec at;
    timespec_get(&at, TIME_UTC);
    return (double)at.tv_sec + 1e-9 * (double)at.tv_nsec;
}

static void measure(const char *gas, const char *headings, const char *wanted, const double *start, size_t columns)
{
    struct gas_cell gas_cell = text(gas), wanted_cell = text(wanted), headings_cell = text(headings);
    struct gas_cell *cells = calloc(ROWS * columns, sizeof *cells);
    for (size_t i = 0; cells && i < ROWS * columns; i++)
        cells[i] = gas_cell_number(start[i % columns] * (1 + (double)i * 1e-6 / (double)columns));
    struct gas_block argument[] = {{1, 1, &gas_cell, false},
                                   {ROWS, columns, cells, true},
                                   {1, 1, &wanted_cell, false},
                                   {1, 1, &headings_cell, false}};
    struct gas_arena arena = {0};
    double best = 1e9;
    const struct gas_cell *last = NULL;
    for (int turn = 0; turn < TURNS; turn++) {
        struct gas_call call = {.argument = argument, .count = 4, .arena = &arena};
        gas_arena_reset(&arena);
        double begin = now();
        gas_function_call(find("GAS.SOLVE"), &call);
        double took = now() - begin;
        best = took < best ? took : best;
        last = &call.answer.cell[call.answer.rows * call.answer.columns - 1];
    }
    printf("%-14s %-44s %-22s %7.0f ns/row  (last: %g %s)\n", gas, headings, wanted, best / ROWS * 1e9, last->number,
           last->text ? last->text : "");
    gas_arena_free(&arena);
    free(cells);
}

int main(void)
{
    if (!find("GAS.SOLVE"))
        return 1;
    measure("N2", "P, bar(g); T, °C; V, m3", "m, kg", (const double[]){7, 35, 12}, 3);
    measure("N2", "P, bar(g); T, °C; V, m3", "m, kg; n, mol; rho, kg/m3", (const double[]){7, 35, 12}, 3);
    measure("N2", "P1, bar(g); T1, °C; V, m3; T2, °C", "P2, bar(g)", (const double[]){7, 35, 12, 80}, 4);
    measure("N2", "P, bar; T, °C", "h, kJ/kg", (const double[]){7, 35}, 2);
    measure("N2", "P, bar; h, kJ/kg", "T, °C", (const double[]){7, 35}, 2);
    return 0;
}
