/* A job copied, changed and run again, as an audit does. Figures by the ideal-gas equation written out. */
#include <string.h>

#include "check.h"
#include "sheet/job_solve.h"

#define RU 8.31446261815324 /* J/(mol K), exact: BIPM SI Brochure, 9th ed. */

static struct gas_block text(struct gas_cell *cell, const char *words)
{
    *cell = (struct gas_cell){GAS_CELL_TEXT, 0, words, strlen(words)};
    return (struct gas_block){1, 1, cell, false};
}

static double answer(const char *id, const struct gas_job *job, const struct gas_row *row)
{
    struct gas_refusal refusal = {0};
    double answers[GAS_COLUMNS] = {0};
    bool good = gas_job_run(job, row, answers, &refusal);
    check_text(id, good ? "" : refusal.text, "");
    return answers[0];
}

static void a_copy_is_changed_and_run(void)
{
    struct gas_arena arena = {0};
    struct gas_refusal refusal = {0};
    struct gas_cell cell[3];
    const struct gas_block gas = text(&cell[0], "N2"), given = text(&cell[1], "7 bar(g); 35 °C; 12 m3"),
                           wanted = text(&cell[2], "n, mol");
    struct gas_job job = {.task = &gas_task_solve}, copy;
    struct gas_row row;
    check_true("open", gas_job_open(&job, &(struct gas_job_arguments){.gas = &gas, .given = &given, .wanted = &wanted},
                                    &arena, &refusal));
    check_true("row", gas_table_row(&job.table, 0, &row, &refusal));
    check_close("as given", answer("as given", &job, &row), 801325.0 * 12 / (RU * 308.15), 1e-12, 0);
    copy = job;
    copy.table.heading[0].unit.basis = GAS_ABSOLUTE;
    check_close("gauge as absolute", answer("basis", &copy, &row), 7e5 * 12 / (RU * 308.15), 1e-12, 0);
    copy = job;
    copy.table.heading[1].unit.offset = 273;
    check_close("273", answer("offset", &copy, &row), 801325.0 * 12 / (RU * 308), 1e-12, 0);
    copy = job;
    copy.options.barometer = 98000;
    check_close("barometer", answer("barometer", &copy, &row), 798000.0 * 12 / (RU * 308.15), 1e-12, 0);
    copy = job;
    copy.gas.R = 8.314;
    check_close("R", answer("R", &copy, &row), 801325.0 * 12 / (8.314 * 308.15), 1e-12, 0);
    row.figure[2] = 11;
    check_close("a figure", answer("figure", &job, &row), 801325.0 * 11 / (RU * 308.15), 1e-12, 0);
    gas_job_close(&job);
    gas_arena_free(&arena);
}

/* Per mole to what a heading asks for, by the molar mass of a made-up gas of 2 g/mol and 5 mol of it. */
static void molar_figures_in_other_bases(void)
{
    const struct gas_job job = {.gas = {.molar_mass = 0.002}};
    check_close("J/kg", gas_job_from_molar(&job, GAS_DIM_MOLAR_ENERGY, 3, 5, GAS_DIM_SPECIFIC_ENERGY), 1500, 1e-15, 0);
    check_close("J", gas_job_from_molar(&job, GAS_DIM_MOLAR_ENERGY, 3, 5, GAS_DIM_ENERGY), 15, 1e-15, 0);
    check_close("W", gas_job_from_molar(&job, GAS_DIM_MOLAR_ENERGY, 3, 5, GAS_DIM_POWER), 15, 1e-15, 0);
    check_close("J/K", gas_job_from_molar(&job, GAS_DIM_MOLAR_ENTROPY, 3, 5, GAS_DIM_ENTROPY), 15, 1e-15, 0);
    check_close("m3/kg", gas_job_from_molar(&job, GAS_DIM_MOLAR_VOLUME, 3, 5, GAS_DIM_SPECIFIC_VOLUME), 1500, 1e-15, 0);
    check_close("mol", gas_job_from_molar(&job, GAS_DIM_NUMBER, 1, 5, GAS_DIM_AMOUNT), 5, 1e-15, 0);
    check_close("kg", gas_job_from_molar(&job, GAS_DIM_NUMBER, 1, 5, GAS_DIM_MASS), 0.01, 1e-15, 0);
    double none = gas_job_from_molar(&job, GAS_DIM_MOLAR_ENERGY, 3, 5, GAS_DIM_PRESSURE);
    check_true("an energy is no pressure", none != none);
}

const struct test_suite suite_job = {
    "job",
    (const struct test_case[]){{"copy", a_copy_is_changed_and_run}, {"bases", molar_figures_in_other_bases}, {0}}};
