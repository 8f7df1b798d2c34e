#include "formula.h"

#include <ctype.h>
#include <stdlib.h>
#include <string.h>

enum { ARGUMENTS = 40, ARRAY_CELLS = 400 };

struct source {
    const char *at;
    struct gas_arena *arena;
};

static bool read_operand(struct source *source, struct gas_block *value);

static void skip_blanks(struct source *source)
{
    source->at += strspn(source->at, " ");
}

static bool take(struct source *source, char letter)
{
    skip_blanks(source);
    if (*source->at != letter)
        return false;
    source->at++;
    return true;
}

static bool read_number(struct source *source, struct gas_cell *cell)
{
    char *end;
    *cell = gas_cell_number(strtod(source->at, &end));
    bool good = end != source->at;
    source->at = end;
    return good;
}

static bool read_text(struct source *source, struct gas_cell *cell)
{
    char *text = gas_arena_take(source->arena, strlen(source->at) + 1, 1);
    size_t length = 0;
    if (!text)
        return false;
    for (source->at++; *source->at; source->at++) {
        if (*source->at == '"' && *++source->at != '"') {
            text[length] = '\0';
            *cell = (struct gas_cell){GAS_CELL_TEXT, 0, text, length};
            return true;
        }
        text[length++] = *source->at;
    }
    return false;
}

static bool read_literal(struct source *source, struct gas_cell *cell)
{
    skip_blanks(source);
    return *source->at == '"' ? read_text(source, cell) : read_number(source, cell);
}

static bool read_array(struct source *source, struct gas_block *value)
{
    struct gas_cell *cell = gas_arena_take(source->arena, ARRAY_CELLS, sizeof *cell);
    size_t count = 0;
    *value = (struct gas_block){1, 0, cell, true};
    for (source->at++; cell && count < ARRAY_CELLS; count++) {
        if (!read_literal(source, &cell[count]))
            return false;
        if (take(source, ';'))
            continue;
        bool end = take(source, '}');
        if (value->columns == 0)
            value->columns = count + 1;
        if (end)
            return count + 1 == value->rows * value->columns;
        if (!take(source, '|') || count + 1 != value->rows * value->columns)
            return false;
        value->rows++;
    }
    return false;
}

static const struct gas_function *read_name(struct source *source)
{
    size_t count, length = strcspn(source->at, "(");
    const struct gas_function *function = gas_catalogue(&count);
    for (size_t i = 0; i < count; i++)
        if (strlen(function[i].sheet_name) == length && strncmp(function[i].sheet_name, source->at, length) == 0) {
            source->at += length;
            return &function[i];
        }
    return NULL;
}

static bool read_call(struct source *source, struct gas_block *value)
{
    const struct gas_function *function = read_name(source);
    struct gas_block *argument = gas_arena_take(source->arena, ARGUMENTS, sizeof *argument);
    struct gas_call call = {.argument = argument, .arena = source->arena};
    if (!function || !argument || !take(source, '('))
        return false;
    memset(argument, 0, ARGUMENTS * sizeof *argument);
    while (!take(source, ')')) {
        if (call.count == ARGUMENTS || (call.count && !take(source, ';')))
            return false;
        skip_blanks(source);
        if (!strchr(";)", *source->at) && !read_operand(source, &argument[call.count]))
            return false;
        call.count++;
    }
    if (call.count < gas_parameter_count(function) &&
        (call.count == 0 || function->parameter[gas_parameter_count(function) - 1].kind != GAS_PARAMETER_REST))
        call.count = gas_parameter_count(function);
    gas_function_call(function, &call);
    *value = call.answer;
    return true;
}

static bool read_operand(struct source *source, struct gas_block *value)
{
    skip_blanks(source);
    if (*source->at == '{')
        return read_array(source, value);
    if (isupper((unsigned char)*source->at))
        return read_call(source, value);
    struct gas_cell *cell = gas_arena_take(source->arena, 1, sizeof *cell);
    *value = (struct gas_block){1, 1, cell, false};
    return cell && read_literal(source, cell);
}

bool formula_evaluate(const char *formula, struct gas_arena *arena, struct gas_block *value)
{
    struct source source = {formula, arena};
    if (!read_operand(&source, value))
        return false;
    skip_blanks(&source);
    return *source.at == '\0';
}
