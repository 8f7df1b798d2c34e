/* docs/functions.md: one section a function. */
#include <ctype.h>
#include <string.h>

#include "generate/generate.h"

/* Bars would end a cell of the table. */
static void write_cell(FILE *out, const char *text)
{
    for (; *text; text++)
        fprintf(out, *text == '|' ? "\\%c" : "%c", *text);
}

static void write_call(FILE *out, const struct gas_function *function)
{
    fprintf(out, "`%s(", function->sheet_name);
    for (size_t i = 0; i < gas_parameter_count(function); i++) {
        const struct gas_parameter *parameter = &function->parameter[i];
        bool brackets = parameter->optional && parameter->kind != GAS_PARAMETER_REST;
        fprintf(out, "%s%s%s%s%s", i ? "; " : "", brackets ? "[" : "", parameter->name, brackets ? "]" : "",
                parameter->kind == GAS_PARAMETER_REST ? "..." : "");
    }
    fputs(")`\n", out);
}

static const char *need_of(const struct gas_parameter *parameter)
{
    if (parameter->kind == GAS_PARAMETER_REST)
        return "repeats";
    return parameter->optional ? "optional" : "required";
}

static void write_function(FILE *out, const struct gas_function *function)
{
    fprintf(out, "\n## %s\n\n%s.\n\n", function->sheet_name, function->help);
    write_call(out, function);
    if (gas_parameter_count(function))
        fputs("\n| argument | | what it is |\n| --- | --- | --- |\n", out);
    for (size_t i = 0; i < gas_parameter_count(function); i++) {
        fprintf(out, "| %s | %s | ", function->parameter[i].name, need_of(&function->parameter[i]));
        write_cell(out, function->parameter[i].help);
        fputs(" |\n", out);
    }
    if (function->example)
        fprintf(out, "\nExample: `=%s` answers `%s`\n", function->example, function->answer);
    fputs("\nStored in files as `GASLEAF.FUNCTIONS.", out);
    for (const char *letter = function->method; *letter; letter++)
        putc(toupper((unsigned char)*letter), out);
    fputs("`.\n", out);
}

static void write_contents(FILE *out, const struct gas_function *functions, size_t count)
{
    fputs("| function | answers |\n| --- | --- |\n", out);
    for (size_t i = 0; i < count; i++) {
        fprintf(out, "| [%s](#", functions[i].sheet_name);
        for (const char *letter = functions[i].sheet_name; *letter; letter++)
            if (*letter != '.')
                putc(tolower((unsigned char)*letter), out);
        fputs(") | ", out);
        write_cell(out, functions[i].help);
        fputs(" |\n", out);
    }
}

void gas_write_reference(FILE *out, const struct gas_function *functions, size_t count)
{
    fputs(
        "# Worksheet functions\n\n"
        "<!-- Generated from src/audit/catalogue.c by `make generate`. -->\n\n"
        "Arguments are separated by `;` here, columns of an inline array by `;`, its rows by `|`; Calc shows and takes "
        "the separators of\nits own settings. Square brackets mark what can be left out. Of an answer that is a table "
        "the example shows the first cell.\n\n",
        out);
    write_contents(out, functions, count);
    for (size_t i = 0; i < count; i++)
        write_function(out, &functions[i]);
}
