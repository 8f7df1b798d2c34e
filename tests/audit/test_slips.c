/*
 * The audit on old sheets with known slips. Each sheet is right or wrong by plain arithmetic of its own (old_sheet.h),
 * rounded to 3, 4 or 5 digits as sheets are; the audit sees the givens and the figure. Reported: how often the slip is
 * named first, or among three; how often a right figure is called wrong.
 *
 * A slip counts as named when its row of the table is named, or a row that gives the very same figure in that case (to
 * 1e-9): two such slips cannot be told apart by anybody. Slips that change the figure by less than a unit of its last
 * digit leave nothing to find and are left out. GASLEAF_CONFUSION=file writes the table that docs/audit-confusion.md
 * holds.
 */
#include <stdlib.h>

#include "audit/call.h"
#include "audit/search.h"
#include "check.h"
#include "old_sheet.h"

enum { CASES = 40, PAIRS = 1000, RIGHT = 1000 };

/* One figure audited. */
struct desk_call {
    struct gas_arena arena;
    struct check_call check;
    struct gas_job job;
    struct desk desk;
    struct audit audit;
    struct gas_cell cell[7];
    struct gas_block argument[7];
};

static void put(struct desk_call *call, size_t index, const char *text)
{
    call->cell[index] = (struct gas_cell){GAS_CELL_TEXT, 0, text, strlen(text)};
    call->argument[index] = (struct gas_block){*text ? 1 : 0, *text ? 1 : 0, &call->cell[index], false};
}

static bool open_audit(struct desk_call *call, const struct gas_call *cells, const struct check_arguments *places)
{
    if (!check_open(&call->check, cells, places) || !check_one(&call->check, 0, &call->job, &call->arena))
        return false;
    desk_open(&call->desk, &call->job, &call->arena);
    return audit_open(&call->audit, &call->desk, &call->arena, &call->check.refusal);
}

static const struct audited *audit_sheet(struct desk_call *call, const struct sheet *sheet, double legacy)
{
    static const struct check_arguments places = {.given = 1, .wanted = 2, .legs = 4, .headings = 5, .options = 6};
    struct gas_call cells = {.argument = call->argument, .count = 7, .arena = &call->arena};
    const char *texts[7] = {sheet->gas_text, sheet->given, sheet->wanted, "", sheet->legs, "", sheet->options};
    for (size_t i = 0; i < 7; i++)
        put(call, i, texts[i]);
    bool open = open_audit(call, &cells, &places);
    if (!check_true(sheet->given, open)) {
        fprintf(stderr, "%s\n", call->check.refusal.text);
        return NULL;
    }
    struct gas_cell cell = gas_cell_number(legacy);
    legacy_read(&cell, &call->job, &call->job.wanted.heading[0], 0, &call->audit.row[0].legacy, &call->check.refusal);
    audit_run(&call->audit);
    return call->audit.row;
}

static void audit_done(struct desk_call *call)
{
    gas_job_close(&call->check.job);
    gas_arena_reset(&call->arena);
}

static double rounded(double x, int digits)
{
    char text[40];
    snprintf(text, sizeof text, "%.*e", digits - 1, x);
    return strtod(text, NULL);
}

/* By more than a unit of the last digit that the rounded figure shows (one that ends in zeros shows fewer). */
static bool beyond_rounding(double right, double wrong, int digits)
{
    double unit = pow(10, floor(log10(fabs(wrong))) + 1 - legacy_digits(rounded(wrong, digits)));
    return isfinite(wrong) && fabs(wrong - right) > unit;
}

/* -- counting ------------------------------------------------------------------------------------------------------ */

struct score {
    int tried, first, three, strict; /* strict: the very row named first */
    char first_else[40];             /* what was named first in its place, most lately */
};

/* Slips that gave the very same figure in a case. */
static struct twin {
    const char *id;
    char other[60];
} twins[200];
static size_t twin_count;

static const char *part_id(const struct desk_call *call, const struct explanation *explanation, size_t part)
{
    return explanation->part[part] < 0 ? "" : call->audit.instance[explanation->part[part]].slip->id;
}

static bool is_named(const struct desk_call *call, const struct explanation *explanation, const char *id, double wrong,
                     bool strict)
{
    bool same = strcmp(part_id(call, explanation, 0), id) == 0 && explanation->part[1] < 0;
    return same || (!strict && fabs(explanation->figure - wrong) <= 1e-9 * fabs(wrong));
}

static void note_twin(const struct desk_call *call, const struct audited *row, const char *id, double wrong)
{
    char other[60];
    const struct explanation *first = &row->explanation[0];
    if (is_named(call, first, id, wrong, true) || !is_named(call, first, id, wrong, false))
        return;
    snprintf(other, sizeof other, "%s%s%s", part_id(call, first, 0), first->part[1] < 0 ? "" : " and ",
             part_id(call, first, 1));
    for (size_t i = 0; i < twin_count; i++)
        if (strcmp(twins[i].id, id) == 0 && strcmp(twins[i].other, other) == 0)
            return;
    if (twin_count < sizeof twins / sizeof *twins) {
        twins[twin_count].id = id;
        memcpy(twins[twin_count++].other, other, sizeof other);
    }
}

static void count(struct score *score, const struct desk_call *call, const struct audited *row, const char *id,
                  double wrong)
{
    bool three = false;
    score->tried++;
    for (size_t i = 0; i < row->count; i++)
        three = three || is_named(call, &row->explanation[i], id, wrong, false);
    bool first = row->count && is_named(call, &row->explanation[0], id, wrong, false);
    score->first += first;
    score->three += three;
    score->strict += row->count && is_named(call, &row->explanation[0], id, wrong, true);
    if (row->count)
        note_twin(call, row, id, wrong);
    if (!first)
        snprintf(score->first_else, sizeof score->first_else, "%s",
                 row->count ? part_id(call, row->explanation, 0) : "nothing");
}

/* -- single slips -------------------------------------------------------------------------------------------------- */

static struct score single[INJECTIONS][3];

static void try_single(struct desk_call *call, size_t injection, int digits)
{
    struct sheet right, wrong;
    for (int i = 0, found = 0; found < CASES && i < 40 * CASES; i++) {
        sheet_random(&right, (enum sheet_sum)sheet_choose(SUMS));
        wrong = right;
        if (!injections[injection].inject(&wrong))
            continue;
        found++;
        double figure = sheet_value(&wrong);
        if (!beyond_rounding(sheet_value(&right), figure, digits))
            continue;
        const struct audited *row = audit_sheet(call, &right, rounded(figure, digits));
        if (row)
            count(&single[injection][digits - 3], call, row, injections[injection].id, figure);
        audit_done(call);
    }
}

static struct score sum_up(bool rounding, int digits)
{
    struct score sum = {0};
    for (size_t i = 0; i < INJECTIONS; i++)
        for (int k = 0; k < 3; k++)
            if (injections[i].rounding == rounding && (digits == 0 || digits == k + 3)) {
                sum.tried += single[i][k].tried;
                sum.first += single[i][k].first;
                sum.three += single[i][k].three;
                sum.strict += single[i][k].strict;
            }
    return sum;
}

static void print_score(FILE *file, const char *name, const struct score *score)
{
    fprintf(file, "| %s | %d | %.1f | %.1f | %.1f |\n", name, score->tried, 100. * score->first / score->tried,
            100. * score->three / score->tried, 100. * score->strict / score->tried);
}

static void write_table(FILE *file)
{
    fprintf(file,
            "| slip | tried | first, %% | in three, %% | its own row first, %% |\n| --- | --- | --- | --- | --- |\n");
    for (size_t i = 0; i < INJECTIONS; i++) {
        struct score sum = {0};
        for (int k = 0; k < 3; k++) {
            sum.tried += single[i][k].tried;
            sum.first += single[i][k].first;
            sum.three += single[i][k].three;
            sum.strict += single[i][k].strict;
            if (single[i][k].first_else[0])
                snprintf(sum.first_else, sizeof sum.first_else, "%s", single[i][k].first_else);
        }
        char name[100];
        snprintf(name, sizeof name, "%s%s%s%s%s", injections[i].id, injections[i].where ? ", " : "",
                 injections[i].where ? injections[i].where : "", sum.first_else[0] ? ", else " : "", sum.first_else);
        if (sum.tried)
            print_score(file, name, &sum);
    }
    for (int digits = 3; digits <= 5; digits++) {
        char name[40];
        struct score sum = sum_up(false, digits);
        snprintf(name, sizeof name, "**slips, %d digits**", digits);
        print_score(file, name, &sum);
    }
}

/* -- every row of the table ---------------------------------------------------------------------------------------- */

/* Slips that old_sheet.h has no sum for: put in by the audit's own replay, so this only checks the search. */
static struct score own_rows;
static bool tried_row[400];

static void try_instance(struct desk_call *call, size_t instance)
{
    struct audit *audit = &call->audit;
    struct desk_case truth;
    struct gas_refusal refusal = {0};
    short part[TOGETHER] = {(short)instance, -1, -1};
    size_t rows;
    if (!desk_read(&call->desk, 0, &truth, &refusal))
        return;
    double figure = audit_figure(audit, &truth, part);
    if (!isfinite(figure) || figure == 0 || !beyond_rounding(truth.truth, figure, 5))
        return;
    struct gas_cell cell = gas_cell_number(rounded(figure, 5));
    audit->row[0] = (struct audited){.status = AUDIT_BLANK};
    legacy_read(&cell, &call->job, &call->job.wanted.heading[0], 0, &audit->row[0].legacy, &refusal);
    audit_run(audit);
    count(&own_rows, call, &audit->row[0], audit->instance[instance].slip->id, figure);
    tried_row[audit->instance[instance].slip - slip_table(&rows)] = true;
}

static void every_row_is_found(void)
{
    static struct desk_call call;
    struct sheet right;
    size_t rows, tried = 0, kept = twin_count;
    slip_table(&rows);
    own_rows = (struct score){0};
    memset(tried_row, 0, sizeof tried_row);
    check_seed(24);
    for (int i = 0; i < 3 * SUMS; i++) {
        sheet_random(&right, (enum sheet_sum)(i % SUMS));
        audit_sheet(&call, &right, 1.2345);
        for (size_t k = 0; k < call.audit.instances; k++)
            try_instance(&call, k);
        audit_done(&call);
    }
    twin_count = kept; /* those of the independent sums are listed */
    gas_arena_free(&call.arena);
    for (size_t i = 0; i < rows; i++)
        tried += tried_row[i];
    check_true("three quarters of the table's rows were tried", 4 * tried >= 3 * rows);
    check_true("rows named among three: 98 %", own_rows.three >= 0.98 * own_rows.tried);
}

/* -- two slips, and none ------------------------------------------------------------------------------------------- */

static bool has_part(const struct desk_call *call, const struct explanation *explanation, const char *id)
{
    for (size_t i = 0; i < TOGETHER; i++)
        if (strcmp(part_id(call, explanation, i), id) == 0)
            return true;
    return false;
}

static struct score pairs;

/* Two common slips in one sheet; each must change the figure beyond its rounding, with and without the other. */
static void try_pair(struct desk_call *call)
{
    struct sheet right, first, second, both;
    const struct injection *a = &injections[sheet_choose(INJECTIONS)], *b = &injections[sheet_choose(INJECTIONS)];
    int digits = 3 + (int)sheet_choose(3);
    sheet_random(&right, (enum sheet_sum)sheet_choose(SUMS));
    first = second = both = right;
    if (!a->often || !b->often || a == b || strcmp(a->id, b->id) == 0 || !a->inject(&first) || !b->inject(&second))
        return;
    a->inject(&both);
    b->inject(&both);
    double figure = sheet_value(&both);
    if (!beyond_rounding(sheet_value(&right), figure, digits) ||
        !beyond_rounding(sheet_value(&first), figure, digits) || !beyond_rounding(sheet_value(&second), figure, digits))
        return;
    const struct audited *row = audit_sheet(call, &right, rounded(figure, digits));
    bool three = false, top = false;
    for (size_t i = 0; row && i < row->count; i++) {
        const struct explanation *named = &row->explanation[i];
        bool same = (has_part(call, named, a->id) && has_part(call, named, b->id)) ||
                    fabs(named->figure - figure) <= 1e-9 * fabs(figure);
        three = three || same;
        top = top || (same && i == 0);
    }
    pairs.tried++;
    pairs.first += top;
    pairs.three += three;
    pairs.strict += top;
    audit_done(call);
}

static void pairs_are_found(void)
{
    static struct desk_call call;
    pairs = (struct score){0};
    check_seed(21);
    for (int i = 0; i < 300 * PAIRS && pairs.tried < PAIRS; i++)
        try_pair(&call);
    gas_arena_free(&call.arena);
    check_true("pairs were tried", pairs.tried == PAIRS);
    check_true("pairs named among three: 65 %", pairs.three >= 0.65 * pairs.tried);
}

static int alarms;

static void right_figures_agree(void)
{
    static struct desk_call call;
    struct sheet right;
    alarms = 0;
    check_seed(22);
    for (int i = 0; i < RIGHT; i++) {
        sheet_random(&right, (enum sheet_sum)sheet_choose(SUMS));
        const struct audited *row = audit_sheet(&call, &right, rounded(sheet_value(&right), 3 + i % 3));
        alarms += !row || row->status != AUDIT_AGREES;
        audit_done(&call);
    }
    gas_arena_free(&call.arena);
    check_int("false alarms", alarms, 0);
}

/* Figures that no slip made: how often does something fit by chance? */
static struct chance {
    int tried, one, several; /* explained by one slip; by several together */
} chance[3];

static void chance_is_told(void)
{
    static struct desk_call call;
    struct sheet right;
    memset(chance, 0, sizeof chance);
    check_seed(23);
    for (int i = 0; i < RIGHT; i++) {
        sheet_random(&right, (enum sheet_sum)sheet_choose(SUMS));
        double figure = sheet_value(&right) * check_random(0.5, 2);
        const struct audited *row = audit_sheet(&call, &right, rounded(figure, 3 + i % 3));
        struct chance *sum = &chance[i % 3];
        sum->tried++;
        sum->one += row && row->count && row->explanation[0].part[1] < 0;
        sum->several += row && row->count && row->explanation[0].part[1] >= 0;
        audit_done(&call);
    }
    gas_arena_free(&call.arena);
    check_true("one slip by chance, 5 digits: below 2 %", chance[2].one < 0.02 * chance[2].tried);
}

/* -- columns ------------------------------------------------------------------------------------------------------- */

enum { COLUMN_ROWS = 5, COLUMNS_TRIED = 300 };
static struct score columns, cells; /* a slip in every row: named first by the column, by its first row alone */

/* Receivers in bar(g), degC, m3 with the same slip in each row, to three digits. */
static bool fill_column(size_t injection, struct gas_cell *given, struct gas_cell *legacy, double *figure)
{
    struct sheet sheet, wrong;
    do
        sheet_random(&sheet, SUM_MASS);
    while (strcmp(sheet.P_unit.text, "bar(g)") != 0 || strcmp(sheet.T_unit.text, "°C") != 0 ||
           strcmp(sheet.answer_unit.text, "m, kg") != 0);
    sheet.V_unit = (struct sheet_unit){"m3", 1, false};
    sheet.gas = "N2";
    sheet.M = sheet.molar_mass = 28.014;
    for (size_t i = 0; i < COLUMN_ROWS; i++) {
        sheet_figures(&sheet);
        wrong = sheet;
        if (!injections[injection].inject(&wrong) || !beyond_rounding(sheet_value(&sheet), sheet_value(&wrong), 3))
            return false;
        given[3 * i] = gas_cell_number(sheet.P1);
        given[3 * i + 1] = gas_cell_number(sheet.T1);
        given[3 * i + 2] = gas_cell_number(sheet.V);
        legacy[i] = gas_cell_number(rounded(sheet_value(&wrong), 3));
        figure[i] = sheet_value(&wrong);
    }
    return true;
}

static void try_column(struct desk_call *call, size_t injection, size_t rows, struct score *score)
{
    static const struct check_arguments places = {.given = 1, .wanted = 2, .legs = 4, .headings = 5, .options = 6};
    struct gas_cell given[3 * COLUMN_ROWS], legacy[COLUMN_ROWS];
    struct gas_call cells_call = {.argument = call->argument, .count = 7, .arena = &call->arena};
    const char *texts[7] = {"N2", "", "m, kg", "", "", "P, bar(g); T, °C; V, m3", ""};
    double figure[COLUMN_ROWS];
    if (!fill_column(injection, given, legacy, figure))
        return;
    for (size_t i = 0; i < 7; i++)
        put(call, i, texts[i]);
    call->argument[1] = (struct gas_block){rows, 3, given, true};
    bool open = open_audit(call, &cells_call, &places);
    check_true("column", open);
    for (size_t i = 0; i < rows; i++)
        legacy_read(&legacy[i], &call->job, &call->job.wanted.heading[0], 0, &call->audit.row[i].legacy,
                    &call->check.refusal);
    audit_run(&call->audit);
    count(score, call, call->audit.row, injections[injection].id, figure[0]);
    audit_done(call);
}

static void columns_tell_more(void)
{
    static struct desk_call call;
    size_t kept = twin_count;
    columns = cells = (struct score){0};
    check_seed(25);
    for (int i = 0; i < 40 * COLUMNS_TRIED && columns.tried < COLUMNS_TRIED; i++) {
        size_t injection = sheet_choose(INJECTIONS);
        try_column(&call, injection, COLUMN_ROWS, &columns);
        try_column(&call, injection, 1, &cells);
    }
    twin_count = kept;
    gas_arena_free(&call.arena);
    check_true("columns were tried", columns.tried == COLUMNS_TRIED);
    check_true("named first by the column: 97 %", columns.first >= 0.97 * columns.tried);
    check_true("a column tells no less than a cell", columns.first * cells.tried >= cells.first * columns.tried);
}

/* -- the report ---------------------------------------------------------------------------------------------------- */

static void slips_are_found(void)
{
    static struct desk_call call;
    memset(single, 0, sizeof single);
    check_seed(20);
    for (size_t i = 0; i < INJECTIONS; i++)
        for (int digits = 3; digits <= 5; digits++)
            try_single(&call, i, digits);
    gas_arena_free(&call.arena);
    struct score slips = sum_up(false, 0), roundings = sum_up(true, 0);
    check_true("slips were tried", slips.tried > 1000);
    check_true("named first: 90 %", slips.first >= 0.90 * slips.tried);
    check_true("named among three: 98 %", slips.three >= 0.98 * slips.tried);
    check_true("rounded constants among three: 98 %", roundings.three >= 0.98 * roundings.tried);
}

static const char intro[] = "# How well the audit finds slips\n\n"
                            "<!-- Written by `make audit-report`. -->\n\n"
                            "Old sheets are simulated: receivers, rigid vessels, normal flows, isothermal and "
                            "polytropic work, compressors with an\n"
                            "efficiency, heat duties with a cp formula; random gases, units and readings. Each sheet "
                            "computes its figure by plain\n"
                            "arithmetic of its own (`tests/audit/old_sheet.h`), with a slip in it, and rounds it to 3, "
                            "4 or 5 digits. The audit sees the\n"
                            "givens and that figure. A slip counts as named when its own row of the table is named, or "
                            "one that gives the very same\n"
                            "figure in that case: nobody could tell those apart. Slips that move the figure by less "
                            "than a unit of its last digit are\n"
                            "left out. The last column counts the slip's own row alone. Behind a slip stands what was "
                            "named in its place, once.\n\n"
                            "These are figures of a simulation with one slip, or two, of the table, and no other "
                            "difference. Slips that are not in\n"
                            "the table are not found, and a figure that no slip of the table made is sometimes "
                            "explained by chance; see below.\n\n";

static void write_chance(FILE *file)
{
    fprintf(file, "\n## Figures that no slip made\n\nRight figures times a random factor between 0.5 and 2.\n\n"
                  "| digits | explained by one slip, %% | by two together, %% |\n| --- | --- | --- |\n");
    for (int k = 0; k < 3; k++)
        fprintf(file, "| %d | %.1f | %.1f |\n", k + 3, 100. * chance[k].one / chance[k].tried,
                100. * chance[k].several / chance[k].tried);
    fprintf(file, "\nAmong %d right figures, rounded, %d did not get `agrees`.\n", RIGHT, alarms);
}

static void report(void)
{
    const char *path = getenv("GASLEAF_CONFUSION");
    FILE *file = path ? fopen(path, "w") : NULL;
    check_true("the tests before this one ran", pairs.tried > 0);
    if (!file)
        return;
    struct score slips = sum_up(false, 0), roundings = sum_up(true, 0);
    fputs(intro, file);
    write_table(file);
    print_score(file, "**all slips**", &slips);
    print_score(file, "**rounded constants**", &roundings);
    print_score(file, "**two common slips at once**", &pairs);
    print_score(file, "**receivers, 3 digits, one cell, rounded constants too**", &cells);
    print_score(file, "**receivers, 3 digits, a column of five**", &columns);
    print_score(file, "**every row at every place, put in by the audit itself, 5 digits**", &own_rows);
    fprintf(file,
            "\n## Slips that cannot be told apart\n\nIn some case at least, these gave the same figure. The one on the "
            "right was named first.\n\n| made | named |\n| --- | --- |\n");
    for (size_t i = 0; i < twin_count; i++)
        fprintf(file, "| %s | %s |\n", twins[i].id, twins[i].other);
    write_chance(file);
    fclose(file);
}

/* The page names every slip that is tried here. */
static void page_is_of_this_table(void)
{
    static char page[60000];
    FILE *file = fopen("docs/audit-confusion.md", "r");
    check_true("docs/audit-confusion.md is there (make audit-report)", file != NULL);
    if (!file)
        return;
    size_t length = fread(page, 1, sizeof page - 1, file);
    fclose(file);
    page[length] = '\0';
    for (size_t i = 0; i < INJECTIONS; i++)
        check_contains("docs/audit-confusion.md (make audit-report)", page, injections[i].id);
}

const struct test_suite suite_slips = {"slips",
                                       (const struct test_case[]){{"single slips are found", slips_are_found},
                                                                  {"every row is found", every_row_is_found},
                                                                  {"pairs are found", pairs_are_found},
                                                                  {"right figures agree", right_figures_agree},
                                                                  {"chance is told", chance_is_told},
                                                                  {"columns tell more", columns_tell_more},
                                                                  {"report", report},
                                                                  {"the page is of this table", page_is_of_this_table},
                                                                  {0}}};
