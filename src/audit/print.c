#include "audit/print.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

const char print_cp_source[] = "heat capacity of the gas, see basis";

struct line *print_line(struct print *print, const char *step)
{
    if (print->lines < PRINT_LINES)
        print->lines++;
    struct line *line = &print->line[print->lines - 1];
    memset(line, 0, sizeof *line);
    snprintf(line->step, sizeof line->step, "%s", step);
    return line;
}

struct line *print_step(struct print *print, const char *quantity, const char *formula, double result, const char *unit,
                        const char *source)
{
    char step[12];
    snprintf(step, sizeof step, "%d", ++print->steps);
    struct line *line = print_line(print, step);
    snprintf(line->quantity, sizeof line->quantity, "%s", quantity);
    snprintf(line->formula, sizeof line->formula, "%s", formula);
    snprintf(line->unit, sizeof line->unit, "%s", unit);
    snprintf(line->source, sizeof line->source, "%s", source);
    line->result = result;
    line->has_result = isfinite(result);
    return line;
}

void print_figure(struct line *line, const char *name, double figure, const char *unit)
{
    char number[40];
    size_t used = strlen(line->figures), room = sizeof line->figures - used;
    if (!isfinite(figure))
        return;
    gas_number_format(number, sizeof number, figure, 8);
    snprintf(line->figures + used, room, "%s%s = %s%s%s", used ? "; " : "", name, number, *unit ? " " : "", unit);
}
