/*
 * show_table SHEET.csv: a computed sheet in the terminal, columns aligned, figures to the right. A long text that has
 * nothing to its right runs on, as it does on the sheet.
 */
#include <stdlib.h>
#include <string.h>

#include "csv.h"

enum { WIDEST = 40 };

static int width_of(const char *text) /* in characters */
{
    int width = 0;
    for (; *text; text++)
        width += (*text & 0xC0) != 0x80;
    return width;
}

static size_t used_columns(const struct csv_record *row)
{
    size_t used = row->columns;
    while (used && !*row->field[used - 1])
        used--;
    return used;
}

static bool is_figure(const char *text)
{
    char *end;
    strtod(text, &end);
    return end != text && strspn(end, " %") == strlen(end);
}

static void measure(FILE *in, int *width)
{
    static struct csv_record row;
    while (csv_read(in, &row))
        for (size_t i = 0; i + 1 < used_columns(&row) || (i < used_columns(&row) && is_figure(row.field[i])); i++)
            if (width_of(row.field[i]) > width[i])
                width[i] = width_of(row.field[i]) < WIDEST ? width_of(row.field[i]) : WIDEST;
}

static void show(const struct csv_record *row, const int *width)
{
    size_t used = used_columns(row);
    for (size_t i = 0; i < used; i++) {
        const char *text = row->field[i];
        int blanks = width[i] - width_of(text);
        if (is_figure(text))
            printf("%*s%s", blanks > 0 ? blanks : 0, "", text);
        else
            printf("%s%*s", text, blanks > 0 && i + 1 < used ? blanks : 0, "");
        fputs(i + 1 < used ? "  " : "", stdout);
    }
    putchar('\n');
}

int main(int argc, char **argv)
{
    static struct csv_record row;
    int width[CSV_COLUMNS] = {0};
    FILE *in = argc == 2 ? fopen(argv[1], "r") : NULL;
    if (!in) {
        fputs("usage: show_table SHEET.csv\n", stderr);
        return 1;
    }
    measure(in, width);
    rewind(in);
    while (csv_read(in, &row))
        show(&row, width);
    fclose(in);
    return 0;
}
