/*
 * States and flows as they stand in sheets: every row of state_rows.h in seven forms of `given`, against GNU units.
 */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <unistd.h>

#include "check.h"
#include "formula.h"
#include "sheet/state_rows.h"

enum { ROWS = sizeof state_rows / sizeof *state_rows, ITEMS = 10, FORMULA = 2000 };

struct item {
    char name[60], figure[60], unit[60];
};

/* "P1 = 7 bar(g)" in its three parts. */
static size_t split(const char *given, struct item item[ITEMS])
{
    size_t count = 0;
    for (const char *at = given; *at && count < ITEMS; count++) {
        int used = 0;
        item[count].unit[0] = '\0';
        if (sscanf(at, " %59[^= ] = %59[^ ;] %59[^;]%n", item[count].name, item[count].figure, item[count].unit,
                   &used) < 2)
            return 0;
        at += strcspn(at, ";");
        at += *at == ';';
    }
    return count;
}

static bool is_number(const struct item *item)
{
    char *end;
    strtod(item->figure, &end);
    return end != item->figure;
}

enum form { AS_TYPED, REVERSED, COMMAS, PAIRS, TRIPLES, TABLE, ACROSS, FORMS };
static const char *const form_names[] = {"as typed", "reversed", "decimal commas", "pairs",
                                         "triples",  "table",    "across"};

static void put(char *formula, const char *text)
{
    snprintf(formula + strlen(formula), FORMULA - strlen(formula), "%s", text);
}

static void put_item(char *formula, enum form form, const struct item *item, bool last)
{
    char text[300], figure[60];
    snprintf(figure, sizeof figure, is_number(item) ? "%s" : "\"%s\"", item->figure);
    if (form == PAIRS)
        snprintf(text, sizeof text, "\"%s%s%s%s\";%s%s", item->name, item->unit[0] ? " [" : "", item->unit,
                 item->unit[0] ? "]" : "", figure, last ? "" : "|");
    else if (form == TRIPLES)
        snprintf(text, sizeof text, "\"%s\";%s;\"%s\"%s", item->name, figure, item->unit, last ? "" : "|");
    else
        snprintf(text, sizeof text, "%s = %s %s%s", item->name, item->figure, item->unit, last ? "" : "; ");
    if (form == COMMAS)
        for (char *p = strchr(text, '='); p && *p && *p != ' '; p++)
            if (*p == '.')
                *p = ',';
    if (form == COMMAS) {
        char *point = strchr(text + strlen(item->name), '.');
        if (point && point < text + strlen(item->name) + 3 + strlen(item->figure))
            *point = ',';
    }
    put(formula, text);
}

/* {figures} and {headings}; each separated as its line runs. */
static void put_table(char *formula, enum form form, const struct item *item, size_t count, bool headings)
{
    for (size_t i = 0; i < count; i++) {
        char text[200];
        if (headings)
            snprintf(text, sizeof text, "\"%s%s%s\"", item[i].name, item[i].unit[0] ? ", " : "", item[i].unit);
        else
            snprintf(text, sizeof text, "%s", item[i].figure);
        put(formula, text);
        if (i + 1 < count)
            put(formula, form == ACROSS ? "|" : ";");
    }
}

/* False when the row cannot stand in that form: a constant has no figure for a table. */
static bool write_formula(char *formula, const struct state_row *row, enum form form)
{
    struct item item[ITEMS];
    size_t count = split(row->given, item);
    bool table = form == TABLE || form == ACROSS, block = form == PAIRS || form == TRIPLES;
    for (size_t i = 0; table && i < count; i++)
        if (!is_number(&item[i]))
            return false;
    if (count == 0 || (form == REVERSED && count == 1))
        return false;
    formula[0] = '\0';
    put(formula, "GAS.SOLVE(\"");
    put(formula, row->gas);
    put(formula, table || block ? "\";{" : "\";\"");
    if (table)
        put_table(formula, form, item, count, false);
    for (size_t i = 0; i < count && !table; i++)
        put_item(formula, form, &item[form == REVERSED ? count - 1 - i : i], i + 1 == count);
    put(formula, table || block ? "};\"" : "\";\"");
    put(formula, row->wanted);
    put(formula, table ? "\";{" : "\";");
    if (table)
        put_table(formula, form, item, count, true);
    put(formula, table ? "};\"" : ";\"");
    put(formula, row->options);
    put(formula, "\")");
    return true;
}

/* One run of GNU units for all laws. */
static bool read_laws(double law[ROWS])
{
    char name[] = "/tmp/gasleafXXXXXX", command[100], line[300];
    int file = mkstemp(name);
    FILE *pairs = file >= 0 ? fdopen(file, "w") : NULL;
    if (!check_true("a place for the laws", pairs != NULL))
        return false;
    for (size_t i = 0; i < ROWS; i++)
        fprintf(pairs, "%s\n%s\n", state_rows[i].law, state_rows[i].unit);
    fclose(pairs);
    snprintf(command, sizeof command, "LC_ALL=C units -t -o %%.17g < %s 2>&1", name);
    FILE *answers = popen(command, "r");
    for (size_t i = 0; i < ROWS; i++) {
        char *end = line;
        bool there = answers && fgets(line, sizeof line, answers);
        law[i] = there ? strtod(line, &end) : NAN;
        if (!there || end == line || *end != '\n')
            check_text(state_rows[i].law, there ? line : "", "a figure");
    }
    if (answers)
        check_int("GNU units ran", pclose(answers), 0);
    remove(name);
    return answers != NULL;
}

static void check_row(const struct state_row *row, enum form form, double law, struct gas_arena *arena)
{
    char formula[FORMULA], id[400];
    struct gas_block value;
    if (!write_formula(formula, row, form))
        return;
    snprintf(id, sizeof id, "%s: %s -> %s", form_names[form], row->given, row->wanted);
    if (!check_true(id, formula_evaluate(formula, arena, &value) && value.rows == 1 && value.columns == 1))
        return;
    const struct gas_cell *cell = value.cell;
    if (cell->kind == GAS_CELL_NUMBER)
        check_close(id, cell->number, law, 1e-10, 1e-10);
    else
        check_text(id, cell->text, "a number");
    gas_arena_reset(arena);
}

static void gnu_units_agree(void)
{
    struct gas_arena arena = {0};
    double law[ROWS];
    check_true("a hundred and fifty cases", ROWS >= 150);
    if (!read_laws(law))
        return;
    for (size_t i = 0; i < ROWS; i++)
        for (int form = 0; form < FORMS; form++)
            check_row(&state_rows[i], (enum form)form, law[i], &arena);
    gas_arena_free(&arena);
}

const struct test_suite suite_states = {"states", (const struct test_case[]){{"GNU units", gnu_units_agree}, {0}}};
