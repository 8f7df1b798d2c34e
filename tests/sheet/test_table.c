/* The forms of `given` and `wanted`: which headings, how many cases, which figures. Figures here are those typed. */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "check.h"
#include "sheet/table.h"

/* A block from one text: cells separated by '|', rows by '/', numbers where the cell begins with '#'. */
static struct gas_block block_of(const char *text, struct gas_arena *arena)
{
    char *copy = gas_arena_copy(arena, text, strlen(text));
    struct gas_cell *cell = gas_arena_take(arena, strlen(text) + 1, sizeof *cell);
    struct gas_block block = {.rows = 1, .columns = 0, .cell = cell, .range = true};
    size_t count = 0;
    for (char *at = copy;;) {
        size_t length = strcspn(at, "|\\");
        char end = at[length];
        at[length] = '\0';
        cell[count++] =
            at[0] == '#' ? gas_cell_number(strtod(at + 1, NULL)) : (struct gas_cell){GAS_CELL_TEXT, 0, at, length};
        if (end != '|' && block.columns == 0)
            block.columns = count;
        block.rows += end == '\\';
        if (end == '\0')
            return block;
        at += length + 1;
    }
}

/* What was read, as one text: "P1 T1 | rows 2 down | 7 35 | 6 -" */
static void describe(const struct gas_table *table, char *text, size_t size)
{
    char name[GAS_NAME_TEXT], number[40];
    size_t used = 0;
    for (size_t i = 0; i < table->columns; i++)
        used +=
            (size_t)snprintf(text + used, size - used, "%s%s%s", i ? " " : "", table->heading[i].tolerance ? "±" : "",
                             gas_quantity_name(name, table->heading[i].symbol, table->heading[i].state));
    used += (size_t)snprintf(text + used, size - used, " (%zu %s)", table->rows,
                             table->one_case ? "case"
                             : table->across ? "across"
                                             : "down");
    for (size_t row = 0; row < table->rows; row++) {
        struct gas_row figures;
        struct gas_refusal refusal = {0};
        bool good = gas_table_row(table, row, &figures, &refusal);
        used += (size_t)snprintf(text + used, size - used, "%s", row ? " |" : "");
        for (size_t i = 0; good && i < table->columns; i++) {
            gas_number_format(number, sizeof number, figures.figure[i], 7);
            used += (size_t)snprintf(text + used, size - used, " %s", figures.given >> i & 1 ? number : "-");
        }
        used += (size_t)snprintf(text + used, size - used, "%s", good ? "" : " refused");
    }
}

/* clang-format off */
static const struct {
    const char *id, *given, *headings, *read;
} forms[] = {
    {"text", "7 bar(g); 35 °C; 12 m3", "", "P T V (1 case) 7 35 12"},
    {"text, states", "P1 = 1 bar; T1 = 300 K; P2 = 8 bar", "", "P1 T1 P2 (1 case) 1 300 8"},
    {"text, decimal comma", "7,5 bar; T = 35,25 °C", "", "P T (1 case) 7.5 35.25"},
    {"text, bare figures", "P = 250000; T = 310", "", "P T (1 case) 250000 310"},
    {"pairs", "P1, bar(g)|#7\\T1, °C|#35", "", "P1 T1 (1 case) 7 35"},
    {"pairs, one row", "P1, bar(g)|#7", "", "P1 (1 case) 7"},
    {"pairs, text figure", "P1, bar(g)|7,5\\T1, °C|#35", "", "P1 T1 (1 case) 7.5 35"},
    {"pairs, one text figure", "P1, bar(g)|7,5", "", "P1 (1 case) 7.5"},
    {"pairs, a section title", "Inlet|\\P1, bar(g)|#7\\|\\T1, °C|#35", "", "P1 T1 (1 case) 7 35"},
    {"pairs, another unit", "P1, bar|200 kPa", "", "P1 (1 case) 2"},
    {"pairs, unit with the figure", "P1|7 bar(g)\\T1|35 °C", "", "P1 T1 (1 case) 7 35"},
    {"pairs, title", "Quantity|Value\\P1, bar(g)|#7", "", "P1 (1 case) 7"},
    {"triples", "P1|#7|bar(g)\\T1|#35|°C", "", "P1 T1 (1 case) 7 35"},
    {"triples, one row", "P1|#7|bar(g)", "", "P1 (1 case) 7"},
    {"triples, words", "Inlet pressure|#7|bar(g)\\Inlet temperature|#35|°C", "", "P1 T1 (1 case) 7 35"},
    {"triples, a blank unit", "P1, bar(g)|#7|\\T1|#35|°C", "", "P1 T1 (1 case) 7 35"},
    {"triples, title", "quantity|value|unit\\P1|#7|bar(g)", "", "P1 (1 case) 7"},
    {"column of texts", "7 bar(g)\\35 °C\\12 m3", "", "P T V (1 case) 7 35 12"},
    {"column of texts, blank between", "P1 = 7 bar(g)\\\\T1 = 35 °C", "", "P1 T1 (1 case) 7 35"},
    {"row of texts", "P1 = 7 bar(g)|T1 = 35 °C", "", "P1 T1 (1 case) 7 35"},
    {"row of texts, no symbols", "7 bar(g)|35 °C", "", "P T (1 case) 7 35"},
    {"table", "#7|#35\\#6|#30", "P1, bar(g)|T1, °C", "P1 T1 (2 down) 7 35 | 6 30"},
    {"table, one row", "#7|#35", "P1, bar(g)|T1, °C", "P1 T1 (1 down) 7 35"},
    {"table, one column", "#7\\#6\\#5", "P1, bar(g)", "P1 (3 down) 7 | 6 | 5"},
    {"table, one cell", "#7", "P1, bar(g)", "P1 (1 down) 7"},
    {"row under one heading", "#7|#6|#5", "P1, bar(g)", "P1 (3 across) 7 | 6 | 5"},
    {"square table, headings on top", "#7|#35\\#6|#30", "P1, bar(g)|T1, °C", "P1 T1 (2 down) 7 35 | 6 30"},
    {"square table, headings beside", "#7|#6\\#35|#30", "P1, bar(g)\\T1, °C", "P1 T1 (2 across) 7 35 | 6 30"},
    {"one case across", "#7\\#35", "P1, bar(g)\\T1, °C", "P1 T1 (1 across) 7 35"},
    {"headings in a text", "#7|#35\\#6|#30", "P1, bar(g); T1, °C", "P1 T1 (2 down) 7 35 | 6 30"},
    {"headings in a text, across", "#7|#6|#5\\#35|#30|#25", "P1, bar(g); T1, °C", "P1 T1 (3 across) 7 35 | 6 30 | 5 25"},
    {"blanks", "#7|\\|#30\\#5|#25", "P1, bar(g)|T1, °C", "P1 T1 (3 down) 7 - | - 30 | 5 25"},
    {"white space is blank", "#7| \\#5|#25", "P1, bar(g)|T1, °C", "P1 T1 (2 down) 7 - | 5 25"},
    {"numbers as text", "7,5|35\\6.5e0|-3", "P1, bar(g)|T1, °C", "P1 T1 (2 down) 7.5 35 | 6.5 -3"},
    {"units in cells", "2 bar|#35\\#250|77 °F", "P1, kPa|T1, °C", "P1 T1 (2 down) 200 35 | 250 25"},
    {"gauge in a cell", "0 bar(g)|#35", "P1, kPa|T1, °C", "P1 T1 (1 down) 101.325 35"},
    {"a bad cell", "#7|#35\\#6|warm\\#5|#25", "P1, bar(g)|T1, °C", "P1 T1 (3 down) 7 35 | refused | 5 25"},
    {"headings on top inside", "P1, bar(g)|T1, °C\\#7|#35\\#6|#30", "", "P1 T1 (2 down) 7 35 | 6 30"},
    {"headings on top inside, a blank first cell", "P1, bar(g)|T1, °C\\|#35\\#6|#30", "", "P1 T1 (2 down) - 35 | 6 30"},
    {"one column, heading inside", "P1, bar(g)\\#7\\#6", "", "P1 (2 down) 7 | 6"},
    {"headings beside inside", "P1, bar(g)|#7|#6\\T1, °C|#35|#30", "", "P1 T1 (2 across) 7 35 | 6 30"},
    {"one row, heading inside", "P1, bar(g)|#7|#6", "", "P1 (2 across) 7 | 6"},
    {"plus-minus", "#7|#0.1|#35", "P1, bar(g)|±P1, bar|T1, °C", "P1 ±P1 T1 (1 down) 7 0.1 35"},
    {"plus-minus with its own unit", "#7|10 kPa", "P1, bar(g)|±P1, bar", "P1 ±P1 (1 down) 7 0.1"},
    {"a row of units", "#7|#35\\#6|#30", "P1|T1\\bar(g)|°C", "P1 T1 (2 down) 7 35 | 6 30"},
    {"a column of units", "#7|#6\\#35|#30", "P1|bar(g)\\T1|°C", "P1 T1 (2 across) 7 35 | 6 30"},
    {"a row of units inside", "P1|T1\\bar(g)|°C\\#7|#35", "", "P1 T1 (1 down) 7 35"},
    {"a column of units inside", "P1|bar(g)|#7\\T1|°C|#35", "", "P1 T1 (1 across) 7 35"},
    {"a line passed over", "x|#7|#35\\y|#6|#30", "Case|P1, bar(g)|T1, °C", "P1 T1 (2 down) 7 35 | 6 30"},
    {"a line passed over, across", "#1|#2\\#7|#6\\#35|#30", "No.\\P1, bar(g)\\T1, °C", "P1 T1 (2 across) 7 35 | 6 30"},
    {"names across that look like symbols", "case|V-1|V-2\\P1, bar|#7|#6\\T1, K|#300|#310", "", "P1 T1 (2 across) 7 300 | 6 310"},
    {"a plus-minus in the text", "P1 = 7 ± 0.05 bar(g); 35 °C ± 1", "", "P1 ±P1 T ±T (1 case) 7 0.05 35 1"},
    {"a share beside a reference volume", "V = 3 Nm3 ± 2 %", "", "n ±n (1 case) 3 2"},
    {"a constant", "T constant; P1 = 1 bar", "", "T P1 (1 case) nan 1"},
    {"amounts of several bases", "#7|#2|#3", "m, kg|V1, Nm3|rho, kg/m3", "m n1 rho (1 down) 7 2 3"},
};
/* clang-format on */

static void every_form_is_read(void)
{
    struct gas_arena arena = {0};
    for (size_t i = 0; i < sizeof forms / sizeof *forms; i++) {
        struct gas_block given = block_of(forms[i].given, &arena), headings = {0};
        struct gas_table table;
        struct gas_refusal refusal = {0};
        char text[600];
        if (forms[i].headings[0])
            headings = block_of(forms[i].headings, &arena);
        bool good = gas_table_read(&given, &headings, &gas_options_default, &table, &refusal);
        snprintf(text, sizeof text, "%s", refusal.text);
        if (good)
            describe(&table, text, sizeof text);
        check_text(forms[i].id, text, forms[i].read);
        gas_arena_reset(&arena);
    }
    gas_arena_free(&arena);
}

/* clang-format off */
static const struct {
    const char *given, *headings, *part;
} refused[] = {
    {"#7|#35|#2", "P1, bar(g)|T1, °C", "Check headings: there are 2 headings for 3 columns of figures; give one for each column."},
    {"#7|#35|#2", "P1, bar(g)\\T1, °C", "Check headings: there are 2 headings for 1 row of figures; give one for each row."},
    {"#7|#35|#2\\#7|#35|#2", "P1, bar(g)", "Check headings: there is 1 heading for 3 columns of figures; give one for each column."},
    {"#7|#35", "P1, bar(g)|#2", "a heading is a number"},
    {"#7|#35", "P1, bar(g)|", "a heading is blank"},
    {"#7|#35", "P1, bar(g)|Check T1: it is odd.", "Check T1: it is odd."},
    {"#7|#35", "P1, bar|P1, psi", "P1 is given twice"},
    {"#7|#35", "P, bar|pressure (psi)", "P is given twice"},
    {"#7|#0.1|#0.2", "P1, bar|±P1, bar|±P1, psi", "P1 is given twice"},
    {"P1, bar|#7\\P1, bar|#8", "", "P1 is given twice"},
    {"#7|#35\\#7|#35", "", "the table has no headings"},
    {"|#7\\T1, °C|#35", "", "a value has no heading beside it"},
    {"P1|#7|#8\\|#9|#10", "", "a heading is blank"},
    {"#7", "", "a bare number"},
    {" ", "", "it is blank"},
    {"P0 = 7 bar", "", "state number"},
    {"P10, bar|#7", "", "state number"},
    {"P1, kg|#7", "", "do not belong together"},
    {"7 bar(g); 35 C°°", "", "Check "},
    {"P1|Check P1: it is odd.", "", "Check P1: it is odd."},
    {"P1, bar|7 kg", "", "Check P1: \"kg\" is the unit of a mass, but its heading asks for a pressure."},
    {"P1, bar|7 bra", "", "bra"},
};
/* clang-format on */

static void every_mistake_is_named(void)
{
    struct gas_arena arena = {0};
    for (size_t i = 0; i < sizeof refused / sizeof *refused; i++) {
        struct gas_block given = block_of(refused[i].given, &arena), headings = {0};
        struct gas_table table;
        struct gas_refusal refusal = {0};
        if (refused[i].headings[0])
            headings = block_of(refused[i].headings, &arena);
        bool good = gas_table_read(&given, &headings, &gas_options_default, &table, &refusal);
        check_true(refused[i].part, !good && refusal.made);
        check_contains(refused[i].given, refusal.text, refused[i].part);
        gas_arena_reset(&arena);
    }
    gas_arena_free(&arena);
}

static void too_many_columns(void)
{
    struct gas_arena arena = {0};
    char text[1200] = "";
    for (int i = 0; i < 33; i++)
        snprintf(text + strlen(text), sizeof text - strlen(text), "%s%c%d, %s", i ? "|" : "", "PTVnm"[i / 9], i % 9 + 1,
                 (const char *[]){"bar", "K", "m3", "mol", "kg"}[i / 9]);
    struct gas_block headings = block_of(text, &arena), given = headings;
    struct gas_table table;
    struct gas_refusal refusal = {0};
    check_true("33 columns", !gas_table_read(&given, &headings, &gas_options_default, &table, &refusal));
    check_contains("33 columns", refusal.text, "more than 32 quantities");
    gas_arena_free(&arena);
}

/* clang-format off */
static const struct {
    const char *wanted, *read;
} wanted_forms[] = {
    {"m, kg", "m"}, {"kg", "m"}, {"P2, bar(g); V2, m3", "P2 V2"}, {"P2, bar(g)\nV2, m3", "P2 V2"},
    {"P2, bar(g)|V2, m3", "P2 V2"}, {"P2, bar(g)\\V2, m3", "P2 V2 down"}, {"±m, kg", "±m"}, {"Nm3/h", "n"},
    {"m, kg; m, lb", "m m"},
    {"7 kg", "Check wanted: "}, {"#7", "Check wanted: there is a number where a heading such as \"m, kg\" is due."},
    {"m, kg|", "Check wanted: there is a blank where a heading such as \"m, kg\" is due."},
    {"m, kg|P, bar\\T, K|V, m3", "Check wanted: it fills 2 rows and 2 columns; give one row or one column of headings."},
    {"Check T: it is odd.", "Check T: it is odd."},
};
/* clang-format on */

static void wanted_is_read(void)
{
    struct gas_arena arena = {0};
    for (size_t i = 0; i < sizeof wanted_forms / sizeof *wanted_forms; i++) {
        struct gas_block argument = block_of(wanted_forms[i].wanted, &arena);
        struct gas_wanted wanted;
        struct gas_refusal refusal = {0};
        char text[600] = "", name[GAS_NAME_TEXT];
        bool good = gas_wanted_read(&argument, &gas_options_default, &wanted, &refusal);
        for (size_t k = 0; good && k < wanted.columns; k++)
            snprintf(text + strlen(text), sizeof text - strlen(text), "%s%s%s", k ? " " : "",
                     wanted.heading[k].tolerance ? "±" : "",
                     gas_quantity_name(name, wanted.heading[k].symbol, wanted.heading[k].state));
        if (good && wanted.down)
            snprintf(text + strlen(text), sizeof text - strlen(text), " down");
        if (good)
            check_text(wanted_forms[i].wanted, text, wanted_forms[i].read);
        else
            check_contains(wanted_forms[i].wanted, refusal.text, wanted_forms[i].read);
        gas_arena_reset(&arena);
    }
    gas_arena_free(&arena);
}

const struct test_suite suite_table = {"table", (const struct test_case[]){{"forms", every_form_is_read},
                                                                           {"mistakes", every_mistake_is_named},
                                                                           {"columns", too_many_columns},
                                                                           {"wanted", wanted_is_read},
                                                                           {0}}};
