/*
 * check_rows TABLE.csv: a table of published values (tests/check/README.md) as the lines that make_sheet takes, with
 * the deviation in units of the last printed digit and whether the row agrees with the print.
 */
#include <stdio.h>

#include "published.h"

enum { FIRST_ROW = 4 };

static void put_row(size_t line, const struct published_row *row)
{
    printf("%s\t=%s\t%.17g\t%.17g\t%s%s%s\t=(B%zu-C%zu)/%.17g\t=IF(ABS(H%zu)<=%.10g;\"yes\";\"no\")\t%s\n", row->id,
           row->formula, row->printed, published_margin(row), row->source, *row->note ? ". Miss: " : "", row->note,
           line, line, row->precision, line, PUBLISHED_CLOSE * (1 + 1e-9), row->unit);
}

int main(int argc, char **argv)
{
    struct published table = {0};
    char wrong[PUBLISHED_WORDS] = "cannot be opened";
    FILE *in = argc == 2 ? fopen(argv[1], "r") : NULL;
    bool good = in && published_read(in, &table, wrong);
    if (!good)
        fprintf(stderr, "check_rows: %s: %s\n", argc == 2 ? argv[1] : "usage: check_rows TABLE.csv", wrong);
    if (good) {
        puts("! deviation in units of the last printed digit\twithin print?\tunit");
        for (size_t i = 0; i < table.count; i++)
            put_row(FIRST_ROW + i, &table.row[i]);
    }
    published_free(&table);
    if (in)
        fclose(in);
    return good ? 0 : 1;
}
