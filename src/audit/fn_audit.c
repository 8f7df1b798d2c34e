/* AUDIT: a verdict beside every figure of an old sheet. AUDITLIST: the same as a table to filter and count. */
#include <math.h>
#include <stdio.h>
#include <string.h>

#include "audit/call.h"
#include "audit/functions.h"
#include "audit/verdict.h"

/* A call being worked on: one audit for each wanted heading. */
struct sheet_check {
    struct check_call check;
    const struct gas_block *legacy;
    bool across; /* cases side by side in the legacy range */
    struct audit audit[GAS_COLUMNS];
};

/* What one wanted heading needs beside its audit. */
struct one_wanted {
    struct gas_job job;
    struct desk desk;
};

/* -- the old figures ----------------------------------------------------------------------------------------------- */

/* One old figure for each case and each wanted heading, laid out as SOLVE would answer; a single column or row of
 * figures may lie either way. */
static bool fit_legacy(struct sheet_check *sheet)
{
    const struct gas_job *job = &sheet->check.job;
    size_t cases = job->table.rows, wanted = job->wanted.columns;
    const struct gas_block *legacy = sheet->legacy;
    if (gas_omitted(legacy))
        return gas_refuse(&sheet->check.refusal, "legacy", "there is none; give the old sheet's figure.");
    bool down = legacy->rows == cases && legacy->columns == wanted;
    bool beside = legacy->columns == cases && legacy->rows == wanted;
    sheet->across = beside && (!down || job->table.across);
    return down || beside ||
           gas_refuse(&sheet->check.refusal, "legacy",
                      "it has %zu rows and %zu columns, but %zu case%s of %zu wanted figure%s are to be checked.",
                      legacy->rows, legacy->columns, cases, cases == 1 ? "" : "s", wanted, wanted == 1 ? "" : "s");
}

static const struct gas_cell *legacy_cell(const struct sheet_check *sheet, size_t row, size_t wanted)
{
    return sheet->across ? gas_cell_at(sheet->legacy, wanted, row) : gas_cell_at(sheet->legacy, row, wanted);
}

static void read_legacy(struct sheet_check *sheet, size_t wanted)
{
    struct audit *audit = &sheet->audit[wanted];
    const struct gas_job *job = audit->desk->job;
    for (size_t i = 0; i < audit->rows; i++) {
        struct gas_refusal refusal = {0};
        struct audited *row = &audit->row[i];
        const struct gas_cell *cell = legacy_cell(sheet, i, wanted);
        if (legacy_read(cell, job, &job->wanted.heading[0], job->options.digits, &row->legacy, &refusal))
            continue;
        row->status = AUDIT_REFUSED;
        row->refusal = gas_arena_copy(audit->arena, refusal.text, strlen(refusal.text));
    }
}

static bool run_check(struct sheet_check *sheet, struct gas_call *call)
{
    static const struct check_arguments places = {.given = 1, .wanted = 2, .legs = 4, .headings = 5, .options = 6};
    struct gas_refusal *refusal = &sheet->check.refusal;
    sheet->legacy = gas_argument(call, 3);
    if (!check_open(&sheet->check, call, &places) || !fit_legacy(sheet))
        return false;
    for (size_t i = 0; i < sheet->check.job.wanted.columns; i++) {
        struct one_wanted *one = gas_arena_take(call->arena, 1, sizeof *one);
        if (!one)
            return gas_refuse(refusal, "given", "there is not enough memory for it; close other documents.");
        if (!check_one(&sheet->check, i, &one->job, call->arena))
            return false;
        desk_open(&one->desk, &one->job, call->arena);
        if (!audit_open(&sheet->audit[i], &one->desk, call->arena, refusal))
            return false;
        read_legacy(sheet, i);
        audit_run(&sheet->audit[i]);
    }
    return true;
}

static void with_check(struct gas_call *call, void (*answer)(struct sheet_check *, struct gas_call *))
{
    struct sheet_check *sheet = gas_arena_take(call->arena, 1, sizeof *sheet);
    if (!sheet) {
        gas_answer_text(call, "Check given: there is not enough memory for it; close other documents.");
        return;
    }
    memset(sheet, 0, sizeof *sheet);
    if (run_check(sheet, call))
        answer(sheet, call);
    else
        gas_job_refused(call, &sheet->check.job.options, &sheet->check.refusal);
    gas_job_close(&sheet->check.job);
}

/* -- AUDIT --------------------------------------------------------------------------------------------------------- */

static void answer_verdicts(struct sheet_check *sheet, struct gas_call *call)
{
    char text[VERDICT_TEXT];
    size_t wanted = sheet->check.job.wanted.columns, cases = sheet->check.job.table.rows;
    if (!gas_answer_block(call, sheet->legacy->rows, sheet->legacy->columns))
        return;
    for (size_t w = 0; w < wanted; w++)
        for (size_t i = 0; i < cases; i++) {
            if (sheet->audit[w].row[i].status == AUDIT_REFUSED && sheet->check.job.options.hard_errors) {
                gas_put_not_available(call, sheet->across ? w : i, sheet->across ? i : w);
                continue;
            }
            verdict_text(&sheet->audit[w], i, text, sizeof text);
            gas_put_text(call, sheet->across ? w : i, sheet->across ? i : w, text);
        }
}

void gas_fn_audit(struct gas_call *call)
{
    with_check(call, answer_verdicts);
}

/* -- AUDITLIST ----------------------------------------------------------------------------------------------------- */

enum list_column {
    LIST_CASE,
    LIST_WANTED,
    LIST_LEGACY,
    LIST_OURS,
    LIST_OFF,
    LIST_VERDICT,
    LIST_SLIP,
    LIST_GIVES,
    LIST_COLUMNS
};

static void put_line(struct gas_call *call, size_t line, struct audit *audit, size_t index)
{
    char text[VERDICT_TEXT];
    const struct audited *row = &audit->row[index];
    gas_put_number(call, line, LIST_CASE, (double)index + 1);
    gas_put_text(call, line, LIST_WANTED, audit->desk->job->wanted.heading[0].text);
    gas_put_text(call, line, LIST_VERDICT, verdict_word(row->status));
    if (row->status == AUDIT_REFUSED)
        gas_put_text(call, line, LIST_SLIP, row->refusal ? row->refusal : "");
    if (row->status == AUDIT_REFUSED || row->status == AUDIT_BLANK)
        return;
    gas_put_number(call, line, LIST_LEGACY, row->legacy.figure);
    gas_put_number(call, line, LIST_OURS, row->truth);
    if (!isnan(verdict_deviation(row)))
        gas_put_number(call, line, LIST_OFF, verdict_deviation(row));
    if (row->count == 0)
        return;
    verdict_slips(audit, index, &row->explanation[0], text, sizeof text);
    gas_put_text(call, line, LIST_SLIP, text);
    gas_put_number(call, line, LIST_GIVES, row->explanation[0].figure);
}

/* The whole column: how many of each, and the slip that holds for all that differ. */
static void put_summary(struct gas_call *call, size_t line, struct audit *audit)
{
    char text[VERDICT_TEXT];
    size_t count[AUDIT_DIFFERS + 1] = {0}, used = 0;
    for (size_t i = 0; i < audit->rows; i++)
        count[audit->row[i].status]++;
    gas_put_text(call, line, LIST_CASE, "all");
    gas_put_text(call, line, LIST_WANTED, audit->desk->job->wanted.heading[0].text);
    text[0] = '\0';
    for (int status = AUDIT_DIFFERS; status >= AUDIT_REFUSED; status--)
        if (count[status] && used < sizeof text)
            used += (size_t)snprintf(text + used, sizeof text - used, "%s%zu %s", used ? ", " : "", count[status],
                                     verdict_word((enum audit_status)status));
    gas_put_text(call, line, LIST_VERDICT, text);
    for (size_t i = 0; i < audit->rows; i++)
        if (audit->row[i].count && audit->row[i].explanation[0].everywhere) {
            verdict_slips(audit, i, &audit->row[i].explanation[0], text, sizeof text);
            gas_put_text(call, line, LIST_SLIP, text);
            return;
        }
}

static void answer_list(struct sheet_check *sheet, struct gas_call *call)
{
    static const char *const titles[LIST_COLUMNS] = {"case",         "quantity", "old figure", "Gasleaf",
                                                     "deviation, %", "verdict",  "slip",       "would give"};
    size_t wanted = sheet->check.job.wanted.columns, cases = sheet->check.job.table.rows, line = 0;
    if (!gas_answer_block(call, 1 + wanted * (cases + 1), LIST_COLUMNS))
        return;
    for (size_t i = 0; i < call->answer.rows * call->answer.columns; i++)
        call->answer.cell[i] = (struct gas_cell){GAS_CELL_TEXT, 0, "", 0};
    gas_put_texts(call, 0, titles, LIST_COLUMNS);
    for (size_t w = 0; w < wanted; w++)
        for (size_t i = 0; i < cases; i++)
            put_line(call, ++line, &sheet->audit[w], i);
    for (size_t w = 0; w < wanted; w++)
        put_summary(call, ++line, &sheet->audit[w]);
}

void gas_fn_audit_list(struct gas_call *call)
{
    with_check(call, answer_list);
}
