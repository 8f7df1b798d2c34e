/* Time per audited cell: figures that agree, one slip in a cell, two slips, none known, and a column. Prints figures.
 */
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <time.h>

#include "sheet/catalogue.h"

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

static void measure(const char *what, const char *gas, const char *given, const char *wanted, const char *legs,
                    double legacy)
{
    enum { TURNS = 50 };
    struct gas_cell cell[] = {text(gas), text(given), text(wanted), gas_cell_number(legacy), text(legs)};
    struct gas_block argument[5];
    struct gas_arena arena = {0};
    struct gas_call call = {.argument = argument, .count = 5, .arena = &arena};
    for (size_t i = 0; i < 5; i++)
        argument[i] = (struct gas_block){i == 4 && !*legs ? 0 : 1, 1, &cell[i], false};
    double begin = now();
    for (int turn = 0; turn < TURNS; turn++) {
        gas_arena_reset(&arena);
        gas_function_call(find("GAS.AUDIT"), &call);
    }
    printf("%-22s %8.3f ms  %.100s\n", what, (now() - begin) / TURNS * 1e3, call.answer.cell->text);
    gas_arena_free(&arena);
}

/* A column of receivers with the gauge pressure taken as absolute in every row, or an own slip-free error in each. */
static void measure_column(const char *what, size_t rows, double factor)
{
    const double R = 8.31446261815324, M = 28.014e-3;
    struct gas_cell gas = text("N2"), wanted = text("m, kg"), headings = text("P, bar(g); T, °C; V, m3");
    struct gas_cell *given = calloc(3 * rows, sizeof *given), *legacy = calloc(rows, sizeof *legacy);
    for (size_t i = 0; given && legacy && i < rows; i++) {
        double P = 5 + (double)i * 0.013, T = 15 + (double)(i % 40), V = 2 + (double)(i % 17);
        char digits[30];
        given[3 * i] = gas_cell_number(P);
        given[3 * i + 1] = gas_cell_number(T);
        given[3 * i + 2] = gas_cell_number(V);
        snprintf(digits, sizeof digits, "%.4g",
                 factor * (factor == 1 ? P * 1e5 : P * 1e5 + 101325) * V * M / (R * (T + 273.15)));
        legacy[i] = gas_cell_number(strtod(digits, NULL));
    }
    struct gas_block argument[] = {
        {1, 1, &gas, false},     {rows, 3, given, true}, {1, 1, &wanted, false}, {rows, 1, legacy, true}, {0},
        {1, 1, &headings, false}};
    struct gas_arena arena = {0};
    struct gas_call call = {.argument = argument, .count = 6, .arena = &arena};
    double begin = now();
    gas_function_call(find("GAS.AUDIT"), &call);
    printf("%-22s %8.3f ms  per row of %zu; %.80s\n", what, (now() - begin) / (double)rows * 1e3, rows,
           call.answer.cell->text);
    gas_arena_free(&arena);
    free(given);
    free(legacy);
}

int main(void)
{
    measure("agrees", "N2", "7 bar(g); 35 °C; 12 m3", "m, kg", "", 105.14);
    measure("one slip", "N2", "7 bar(g); 35 °C; 12 m3", "m, kg", "", 91.846);
    measure("two slips", "N2", "7 bar(g); 35 °C; 12 m3", "m, kg", "", 808.63);
    measure("none known", "N2", "7 bar(g); 35 °C; 12 m3", "m, kg", "", 77.7777);
    measure("path, one slip", "air", "2 kg; 25 °C; 1 bar", "W, kJ", "adiabatic to 8 bar", 485.13);
    measure("path, none known", "air", "2 kg; 25 °C; 1 bar", "W, kJ", "adiabatic to 8 bar; isobaric to 40 °C", 401.77);
    measure_column("column, one slip", 1000, 1);
    measure_column("column, none known", 1000, 0.7777);
    measure_column("column, none known", 20000, 0.7777);
    return 0;
}
