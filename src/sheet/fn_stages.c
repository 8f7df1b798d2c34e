/* STAGES: staged compression, one answer per case, or the table of one machine. */
#include <math.h>
#include <stdio.h>
#include <string.h>

#include <gasleaf/heat.h>

#include "sheet/functions.h"
#include "sheet/job_units.h"
#include "sheet/machine.h"
#include "sheet/stages_task.h"

/* Discharge temperatures above which a stage is marked. Common practice for lubricated machines, no figure of a code:
 * hydrogen-rich gases and oxygen are kept cooler. */
#define PRACTICE_T          423.15 /* K, 150 degC */
#define PRACTICE_T_HYDROGEN 408.15 /* K, 135 degC: molar mass below 12 g/mol */
#define PRACTICE_T_OXYGEN   403.15 /* K, 130 degC: more than a quarter oxygen */

enum { STAGE, P_IN, P_OUT, RATIO, T_IN, T_OUT, WORK, DUTY, NOTE, COLUMNS };

/* A call being worked on. */
struct stages_call {
    struct gas_job job;
    struct gas_typed_staging typed;
    struct gas_refusal refusal;
    struct gas_row row;
    struct gas_case figures;
    struct gas_stages_case stages;
    struct gas_unit pressure, temperature, energy;
};

static double practice_limit(const struct gas_job *job)
{
    for (size_t i = 0; i < job->choice->part_count; i++) {
        const struct gas_part *part = &job->choice->part[i];
        if (part->species && strcmp(part->species->formula, "O2") == 0 && part->x > 0.25)
            return PRACTICE_T_OXYGEN;
    }
    return job->gas.molar_mass < 12e-3 ? PRACTICE_T_HYDROGEN : PRACTICE_T;
}

static struct gas_unit unit_of(const char *text)
{
    struct gas_unit unit = {0};
    struct gas_unit_fault fault;
    gas_unit_parse(text, strlen(text), NULL, &unit, &fault);
    return unit;
}

static void choose_units(struct stages_call *call)
{
    const struct gas_job *job = &call->job;
    call->pressure = gas_job_unit(job, GAS_DIM_PRESSURE, "bar");
    call->temperature = gas_job_unit(job, GAS_DIM_TEMPERATURE, "°C");
    call->energy = unit_of(job->extent == GAS_EXTENT_FLOW ? "kW" : job->extent == GAS_EXTENT_TOTAL ? "kJ" : "kJ/kg");
}

static void put_headings(const struct stages_call *stages, struct gas_call *call)
{
    const bool power = stages->job.extent == GAS_EXTENT_FLOW;
    const char *P = stages->pressure.text, *T = stages->temperature.text, *E = stages->energy.text;
    const struct {
        const char *name, *unit;
    } heads[COLUMNS] = {{"stage", ""},
                        {"P in", P},
                        {"P out", P},
                        {"ratio", ""},
                        {"T in", T},
                        {"T out", T},
                        {power ? "shaft power" : "shaft work", E},
                        {"cooler duty", E},
                        {"note", ""}};
    char text[GAS_HEADING_TEXT];
    for (size_t i = 0; i < COLUMNS; i++) {
        snprintf(text, sizeof text, "%s%s%s", heads[i].name, heads[i].unit[0] ? ", " : "", heads[i].unit);
        gas_put_text(call, 0, i, text);
    }
}

static void put_pressure(const struct stages_call *stages, struct gas_call *call, size_t row, size_t column, double P)
{
    gas_put_number(call, row, column, gas_unit_from_si(&stages->pressure, P, stages->figures.barometer));
}

static void put_temperature(const struct stages_call *stages, struct gas_call *call, size_t row, size_t column,
                            double T)
{
    gas_put_number(call, row, column, gas_unit_from_si(&stages->temperature, T, stages->figures.barometer));
}

/* Energies per mole; without an amount they stay blank when they are asked as totals. */
static void put_energy(const struct stages_call *stages, struct gas_call *call, size_t row, size_t column, double molar)
{
    double si =
        gas_job_from_molar(&stages->job, GAS_DIM_MOLAR_ENERGY, molar, stages->stages.n, stages->energy.dimension);
    gas_put_number(call, row, column, gas_unit_from_si(&stages->energy, si, stages->figures.barometer));
}

/* What a reader of the row should know of a discharge temperature. */
static void put_note(const struct stages_call *stages, struct gas_call *call, size_t row, double T_out,
                     const char *otherwise)
{
    double limit = practice_limit(&stages->job);
    char text[120], shown[GAS_SHOWN];
    gas_figure(shown, sizeof shown, gas_unit_from_si(&stages->temperature, limit, stages->figures.barometer),
               &stages->temperature);
    snprintf(text, sizeof text, "%s%sabove common practice (%s)", otherwise, otherwise[0] ? "; " : "", shown);
    gas_put_text(call, row, NOTE, T_out > limit ? text : otherwise);
}

static void put_ends(const struct stages_call *stages, struct gas_call *call, size_t row, const char *label)
{
    gas_put_text(call, row, STAGE, label);
    put_pressure(stages, call, row, P_IN, stages->stages.P1);
    put_pressure(stages, call, row, P_OUT, stages->stages.P2);
    gas_put_number(call, row, RATIO, stages->stages.P2 / stages->stages.P1);
    put_temperature(stages, call, row, T_IN, stages->stages.T1);
}

static void put_stage(const struct stages_call *stages, struct gas_call *call, int index)
{
    const struct gas_stage *stage = &stages->stages.staged.stage[index];
    size_t row = (size_t)index + 1;
    gas_put_number(call, row, STAGE, index + 1);
    put_pressure(stages, call, row, P_IN, stage->P_in);
    put_pressure(stages, call, row, P_OUT, stage->P_out);
    gas_put_number(call, row, RATIO, stage->ratio);
    put_temperature(stages, call, row, T_IN, stage->T_in);
    put_temperature(stages, call, row, T_OUT, stage->T_out);
    put_energy(stages, call, row, WORK, stage->work);
    put_energy(stages, call, row, DUTY, stage->cooling);
    put_note(stages, call, row, stage->T_out, "");
}

/* The whole machine: T out is that of the gas it delivers. */
static void put_total(const struct stages_call *stages, struct gas_call *call, size_t row)
{
    const struct gas_staged *staged = &stages->stages.staged;
    const struct gas_stage *last = &staged->stage[staged->count - 1];
    double saving = 1 - staged->work / staged->single_work;
    char text[80] = "";
    put_ends(stages, call, row, "total");
    put_temperature(stages, call, row, T_OUT,
                    stages->stages.staging.aftercooler ? fmin(last->T_out, stages->stages.staging.T_cool)
                                                       : last->T_out);
    put_energy(stages, call, row, WORK, staged->work);
    put_energy(stages, call, row, DUTY, staged->cooling);
    if (staged->count > 1 && !isnan(saving))
        snprintf(text, sizeof text, "%s %% %s than one stage", gas_shown_to(100 * fabs(saving), 3).text,
                 saving >= 0 ? "less" : "more");
    gas_put_text(call, row, NOTE, text);
}

static void put_input(const struct stages_call *stages, struct gas_call *call, size_t row)
{
    char text[60];
    gas_put_text(call, row, STAGE, stages->job.extent == GAS_EXTENT_FLOW ? "input power" : "input");
    put_energy(stages, call, row, WORK, stages->stages.staged.input);
    snprintf(text, sizeof text, "drive %s %%", gas_shown(100 * stages->stages.staging.drive).text);
    gas_put_text(call, row, NOTE, stages->typed.said[GAS_SAYS_DRIVE] ? text : "no drive losses given");
}

/* The same in one stage, for comparison. */
static void put_single(const struct stages_call *stages, struct gas_call *call, size_t row)
{
    const struct gas_stages_case *solved = &stages->stages;
    put_ends(stages, call, row, "in one stage");
    struct gas_result T = gas_T_after_dh(&stages->job.gas, solved->T1, solved->staged.single_work);
    if (isnan(solved->staged.single_work) || T.status != GAS_OK) {
        gas_put_text(call, row, NOTE, "its discharge would leave the data of the gas");
        return;
    }
    put_temperature(stages, call, row, T_OUT, T.value);
    put_energy(stages, call, row, WORK, solved->staged.single_work);
    put_note(stages, call, row, T.value, "for comparison");
}

static bool answer_table(struct stages_call *stages, struct gas_call *call)
{
    if (!gas_job_one_case(&stages->job, call->arena, &stages->row, &stages->figures, &stages->refusal) ||
        !gas_stages_solve(&stages->job, &stages->figures, &stages->stages, &stages->refusal))
        return false;
    const int count = stages->stages.staged.count;
    choose_units(stages);
    if (isnan(stages->stages.n))
        stages->energy = unit_of("kJ/kg");
    if (!gas_answer_block(call, (size_t)count + (count > 1 ? 4 : 3), COLUMNS))
        return true;
    put_headings(stages, call);
    for (int i = 0; i < count; i++)
        put_stage(stages, call, i);
    put_total(stages, call, (size_t)count + 1);
    put_input(stages, call, (size_t)count + 2);
    if (count > 1)
        put_single(stages, call, (size_t)count + 3);
    return true;
}

/* (gas; given; stages; [wanted]; [headings]; [options]) */
void gas_fn_stages(struct gas_call *call)
{
    const struct gas_job_arguments arguments = {.gas = gas_argument(call, 0),
                                                .given = gas_argument(call, 1),
                                                .wanted = gas_argument(call, 3),
                                                .headings = gas_argument(call, 4),
                                                .options = gas_argument(call, 5)};
    struct stages_call stages;
    memset(&stages, 0, sizeof stages);
    struct gas_job *job = &stages.job;
    job->task = &gas_stages_task;
    job->legs = &stages.typed;
    job->options = gas_options_default;
    bool good = gas_job_read(job, &arguments, &stages.refusal) &&
                gas_staging_read(gas_argument(call, 2), &job->options, &stages.typed, &stages.refusal);
    if (good && job->wanted.columns == 0)
        good = answer_table(&stages, call);
    else if (good && (good = gas_job_prepare(job, call->arena, &stages.refusal)))
        gas_job_answer(job, call);
    if (!good)
        gas_job_refused(call, &job->options, &stages.refusal);
    gas_job_close(job);
}
