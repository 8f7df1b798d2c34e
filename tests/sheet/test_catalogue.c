/* Every row of the catalogue is fit for the office, and every example gives what it says. */
#include <ctype.h>
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <strings.h>

#include "check.h"
#include "formula.h"
#include "sheet/catalogue.h"

/* Words that the office's description language keeps for itself. Source: LibreOffice SDK, UNOIDL syntax. */
static const char *const kept_words[] = {
    "any",       "attribute",     "boolean",     "bound",          "byte",         "case",      "char",
    "const",     "constants",     "constrained", "default",        "double",       "enum",      "exception",
    "FALSE",     "False",         "false",       "float",          "get",          "hyper",     "in",
    "inout",     "interface",     "long",        "maybeambiguous", "maybedefault", "maybevoid", "module",
    "needs",     "observes",      "oneway",      "optional",       "out",          "property",  "published",
    "raises",    "readonly",      "removable",   "sequence",       "service",      "set",       "short",
    "singleton", "string",        "struct",      "switch",         "transient",    "TRUE",      "True",
    "true",      "type",          "typedef",     "union",          "unsigned",     "void",      "acquire",
    "release",   "queryInterface"};

static bool is_identifier(const char *name, bool spaces)
{
    char word[60];
    size_t length = 0;
    for (const char *letter = name; *letter && length + 1 < sizeof word; letter++)
        if (!spaces || *letter != ' ')
            word[length++] = *letter;
    word[length] = '\0';
    bool good = length > 0 && isalpha((unsigned char)*word);
    for (size_t i = 0; i < length; i++)
        good = good && isalnum((unsigned char)word[i]) && (unsigned char)word[i] < 128;
    for (size_t i = 0; i < sizeof kept_words / sizeof *kept_words; i++)
        good = good && strcmp(word, kept_words[i]) != 0;
    return good;
}

static bool is_sentence_without_stop(const char *help)
{
    size_t length = help ? strlen(help) : 0;
    return length > 5 && isupper((unsigned char)*help) && help[length - 1] != '.' && help[length - 1] != ' ' &&
           !strchr(help, '\n');
}

static void check_row(const struct gas_function *row)
{
    char id[120], upper[60] = {0};
    for (size_t i = 0; row->method[i] && i + 1 < sizeof upper; i++)
        upper[i] = (char)toupper((unsigned char)row->method[i]);
    snprintf(id, sizeof id, "%s: the sheet name is GAS. and the method", row->sheet_name);
    check_true(id, strncmp(row->sheet_name, "GAS.", 4) == 0 && strcmp(row->sheet_name + 4, upper) == 0);
    snprintf(id, sizeof id, "%s: the method can be a name in the office", row->sheet_name);
    check_true(id, is_identifier(row->method, false) && islower((unsigned char)*row->method));
    snprintf(id, sizeof id, "%s: help is a sentence without a full stop", row->sheet_name);
    check_true(id, is_sentence_without_stop(row->help));
    snprintf(id, sizeof id, "%s: example and answer come together", row->sheet_name);
    check_true(id, !row->example == !row->answer && row->entry);
}

static void check_parameters(const struct gas_function *row)
{
    char id[160];
    size_t count = gas_parameter_count(row);
    for (size_t i = 0; i < count; i++) {
        const struct gas_parameter *parameter = &row->parameter[i];
        snprintf(id, sizeof id, "%s, %s: ", row->sheet_name, parameter->name);
        size_t start = strlen(id);
        snprintf(id + start, sizeof id - start, "name");
        check_true(id, is_identifier(parameter->name, true));
        snprintf(id + start, sizeof id - start, "help is a sentence without a full stop");
        check_true(id, is_sentence_without_stop(parameter->help));
        snprintf(id + start, sizeof id - start, "optional ones come last");
        check_true(id, i == 0 || parameter->optional || !row->parameter[i - 1].optional);
        snprintf(id + start, sizeof id - start, "only the last one repeats, a live range is required");
        check_true(id, (parameter->kind != GAS_PARAMETER_REST || i + 1 == count) &&
                           !(parameter->kind == GAS_PARAMETER_LIVE && parameter->optional));
        snprintf(id + start, sizeof id - start, "named once");
        for (size_t j = 0; j < i; j++)
            check_true(id, strcasecmp(parameter->name, row->parameter[j].name) != 0);
    }
}

static void rows_are_fit(void)
{
    size_t count;
    const struct gas_function *row = gas_catalogue(&count);
    check_true("the catalogue has rows", count > 0);
    for (size_t i = 0; i < count; i++) {
        check_row(&row[i]);
        check_parameters(&row[i]);
        for (size_t j = 0; j < i; j++)
            check_true(row[i].sheet_name, strcasecmp(row[i].method, row[j].method) != 0);
    }
}

/* Half a unit of the last digit that is printed. */
static double half_digit(const char *printed)
{
    const char *exponent = strpbrk(printed, "eE");
    const char *point = strchr(printed, '.');
    size_t end = exponent ? (size_t)(exponent - printed) : strlen(printed);
    double decimals = point ? (double)(end - (size_t)(point - printed) - 1) : 0;
    return 0.5 * pow(10, (exponent ? strtod(exponent + 1, NULL) : 0) - decimals);
}

static void check_example(const struct gas_function *row, const struct gas_block *answer)
{
    const struct gas_cell *first = answer->cell;
    char *end;
    double figure = strtod(row->answer, &end);
    if (*end == '\0' && first->kind == GAS_CELL_NUMBER)
        check_close(row->example, first->number, figure, 1e-12, half_digit(row->answer));
    else if (*end == '\0' || first->kind != GAS_CELL_TEXT)
        check_text(row->example, first->kind == GAS_CELL_TEXT ? first->text : "(no text)", row->answer);
    else
        check_true(row->example, strncmp(first->text, row->answer, strlen(row->answer)) == 0);
}

static void examples_hold(void)
{
    size_t count;
    const struct gas_function *row = gas_catalogue(&count);
    struct gas_arena arena = {0};
    for (size_t i = 0; i < count; i++) {
        struct gas_block answer = {0};
        if (!row[i].example)
            continue;
        bool read = formula_evaluate(row[i].example, &arena, &answer) && answer.rows > 0;
        check_true(row[i].example, read);
        if (read)
            check_example(&row[i], &answer);
        gas_arena_reset(&arena);
    }
    gas_arena_free(&arena);
}

static void formulas_are_read(void)
{
    struct gas_arena arena = {0};
    struct gas_block value;
    check_true("array", formula_evaluate("{1;2.5|\"a\"\"b\";-4e1}", &arena, &value));
    check_int("rows", (long)value.rows, 2);
    check_int("columns", (long)value.columns, 2);
    check_text("quotes", value.cell[2].text, "a\"b");
    check_close("exponent", value.cell[3].number, -40, 0, 0);
    check_true("nested", formula_evaluate("GAS.GIVEN(\"P\"; 7;\"T\" ;GAS.VERSION())", &arena, &value));
    check_int("pairs", (long)value.rows, 2);
    check_true("ragged array", !formula_evaluate("{1;2|3}", &arena, &value));
    check_true("unknown function", !formula_evaluate("GAS.NOTHING(1)", &arena, &value));
    check_true("rest", !formula_evaluate("GAS.VERSION() 3", &arena, &value));
    check_true("open text", !formula_evaluate("\"a", &arena, &value));
    gas_arena_free(&arena);
}

const struct test_suite suite_catalogue = {
    "catalogue", (const struct test_case[]){{"rows are fit", rows_are_fit},
                                            {"formulas of examples are read", formulas_are_read},
                                            {"examples hold", examples_hold},
                                            {0}}};
