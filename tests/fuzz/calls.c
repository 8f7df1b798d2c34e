/* Whole calls: the example of a function with some arguments replaced, arguments by the names of the parameters, chaos.
 */
#include <string.h>

#include <gasleaf/unit.h>

#include "fuzz.h"

enum { ARGUMENTS = 24, ROWS = 7, COLUMNS = 5, MANY_ROWS = 300, SHOWN = 60 };

static struct gas_block one(struct fuzz *fuzz, struct gas_cell cell)
{
    struct gas_cell *copy = gas_arena_take(fuzz->arena, 1, sizeof *copy);
    if (!copy)
        return (struct gas_block){0};
    *copy = cell;
    return (struct gas_block){1, 1, copy, fuzz_below(fuzz, 8) == 0};
}

/* What stands in a cell of a range: the first column or row can be headings or labels, the rest figures. */
static const char *place(size_t style, const char *parameter, size_t row, size_t column)
{
    switch (style) {
    case 0:
        return parameter;
    case 1:
        return column == 0 ? "headings" : column == 1 ? "value" : "unit";
    case 2:
        return row == 0 ? "headings" : "value";
    case 3:
        return column == 0 ? "card" : column == 1 ? "value" : "unit";
    case 4:
        return row == 0 ? "headings" : column == 0 ? "gas" : "value";
    default:
        return "value";
    }
}

static struct gas_block range(struct fuzz *fuzz, const char *parameter)
{
    size_t style = fuzz_below(fuzz, 6), rows = 1 + fuzz_below(fuzz, ROWS), columns = 1 + fuzz_below(fuzz, COLUMNS);
    if (fuzz_below(fuzz, 40) == 0)
        rows = MANY_ROWS;
    struct gas_cell *cell = gas_arena_take(fuzz->arena, rows * columns, sizeof *cell);
    for (size_t i = 0; cell && i < rows * columns; i++)
        cell[i] = fuzz_cell(fuzz, place(style, parameter, i / columns, i % columns));
    return cell ? (struct gas_block){rows, columns, cell, true} : (struct gas_block){0};
}

struct gas_block fuzz_block(struct fuzz *fuzz, const char *parameter)
{
    size_t luck = fuzz_below(fuzz, 10);
    if (luck == 0)
        return (struct gas_block){0};
    return luck < 4 ? range(fuzz, parameter) : one(fuzz, fuzz_cell(fuzz, parameter));
}

/* The next argument of an example as a block; false at its end, or at what is more than a number or a text. */
static bool example_argument(struct fuzz *fuzz, const char **at, struct gas_block *block)
{
    struct gas_cell cell;
    if (!*at || (**at != '(' && **at != ';'))
        return false;
    const char *start = *at + 1 + strspn(*at + 1, " ");
    if (*start == '"') {
        size_t length = strcspn(start + 1, "\"");
        char *copy = gas_arena_copy(fuzz->arena, start + 1, length);
        cell = (struct gas_cell){copy ? GAS_CELL_TEXT : GAS_CELL_EMPTY, 0, copy, copy ? length : 0};
        *at = start + length + 2;
    } else {
        double figure;
        size_t used;
        if (!gas_number_parse(start, strcspn(start, ";)"), &figure, &used))
            return false;
        cell = gas_cell_number(figure);
        *at = start + used;
    }
    *block = one(fuzz, cell);
    return true;
}

static const char *parameter_of(const struct gas_function *function, size_t i)
{
    const char *name = function->parameter[i].name;
    bool unit = strcmp(function->method, "unit") == 0 && (strcmp(name, "from") == 0 || strcmp(name, "to") == 0);
    return unit ? "unit" : name;
}

static size_t fill(struct fuzz *fuzz, const struct gas_function *function, struct gas_block *argument)
{
    size_t count = gas_parameter_count(function), used = count;
    const char *example = function->example ? strchr(function->example, '(') : NULL;
    size_t keep = fuzz_below(fuzz, 4); /* of 4: how often an argument of the example stays */
    for (size_t i = 0; i < count; i++) {
        const struct gas_parameter *parameter = &function->parameter[i];
        struct gas_block usual;
        bool has = example_argument(fuzz, &example, &usual);
        argument[i] = fuzz_block(fuzz, parameter_of(function, i));
        if (has && fuzz_below(fuzz, 4) < keep)
            argument[i] = usual;
        else if (parameter->optional && fuzz_below(fuzz, 2))
            argument[i] = (struct gas_block){0};
    }
    if (count && function->parameter[count - 1].kind == GAS_PARAMETER_REST)
        for (size_t more = fuzz_below(fuzz, 9); more; more--, used++)
            argument[used] = fuzz_block(fuzz, used % 2 ? "value" : "heading");
    return used;
}

/* In the wrong order, too few or too many. */
static size_t disturb(struct fuzz *fuzz, struct gas_block *argument, size_t count)
{
    static const char *const any[] = {"gas", "given", "legs", "wanted", "options", "headings", "value"};
    for (size_t i = 1; i < count; i++) {
        size_t other = fuzz_below(fuzz, i + 1);
        struct gas_block kept = argument[i];
        argument[i] = argument[other];
        argument[other] = kept;
    }
    for (size_t more = fuzz_below(fuzz, 4); more; more--)
        argument[count++] = fuzz_block(fuzz, any[fuzz_below(fuzz, sizeof any / sizeof *any)]);
    return fuzz_below(fuzz, count + 1);
}

static void host_errors(struct fuzz *fuzz, struct gas_block *block)
{
    for (size_t i = 0; i < block->rows * block->columns; i++)
        if (fuzz_below(fuzz, 4) == 0)
            block->cell[i] = (struct gas_cell){.kind = GAS_CELL_HOST_ERROR};
}

const struct gas_function *fuzz_call(uint64_t seed, struct gas_arena *arena, struct gas_call *call)
{
    struct fuzz fuzz = {seed, arena};
    size_t functions;
    const struct gas_function *catalogue = gas_catalogue(&functions);
    const struct gas_function *function = &catalogue[fuzz_below(&fuzz, functions)];
    struct gas_block *argument = gas_arena_take(arena, ARGUMENTS, sizeof *argument);
    if (!argument)
        return NULL;
    size_t count = fill(&fuzz, function, argument);
    if (fuzz_below(&fuzz, 12) == 0)
        count = disturb(&fuzz, argument, count);
    if (count && function->parameter[0].name && function->parameter[0].kind == GAS_PARAMETER_LIVE)
        host_errors(&fuzz, &argument[0]);
    *call = (struct gas_call){.argument = argument, .count = count, .arena = arena};
    return function;
}

static void show_cell(FILE *to, const struct gas_cell *cell)
{
    if (cell->kind == GAS_CELL_NUMBER)
        fprintf(to, "%.17g", cell->number);
    if (cell->kind != GAS_CELL_TEXT)
        return;
    fputc('"', to);
    for (size_t i = 0; i < cell->length && i < SHOWN; i++)
        if ((unsigned char)cell->text[i] < ' ' || cell->text[i] == 0x7f)
            fprintf(to, "\\x%02x", (unsigned char)cell->text[i]);
        else
            fputc(cell->text[i], to);
    if (cell->length > SHOWN)
        fprintf(to, "... %zu bytes", cell->length);
    fputc('"', to);
}

void fuzz_show(FILE *to, const struct gas_function *function, const struct gas_call *call)
{
    fprintf(to, "%s(", function->sheet_name);
    for (size_t a = 0; a < call->count; a++) {
        const struct gas_block *block = &call->argument[a];
        fprintf(to, "%s%s", a ? ";" : "", block->range ? "{" : "");
        for (size_t i = 0; i < block->rows * block->columns && i < SHOWN; i++) {
            if (i)
                fputc(i % block->columns ? ';' : '|', to);
            show_cell(to, &block->cell[i]);
        }
        if (block->range)
            fputc('}', to);
    }
    fprintf(to, ")\n");
}
