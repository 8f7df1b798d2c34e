/*
 * count_sheet CHECK.csv [ROWS]: what Calc computed on a sheet "check" of tests/sheets. Prints the rows that fail with
 * their texts, then `N passed, N failed`. The sheet's own count must agree, and so must ROWS, the number of checks that
 * went in.
 */
#include <stdlib.h>
#include <string.h>

#include "csv.h"

enum { FIRST_ROW = 4 };

enum column { ID, RESULT, EXPECTED, TOLERANCE, OK, SOURCE, FORMULA };

struct count {
    long failing, rows; /* as the sheet says */
    long passed, failed;
};

static void tell(const struct csv_record *row)
{
    printf("FAILED %s: got '%s', expected '%s' (tolerance %s)\n       =%s\n       source: %s\n", row->field[ID],
           row->field[RESULT], row->field[EXPECTED], *row->field[TOLERANCE] ? row->field[TOLERANCE] : "none",
           row->field[FORMULA], row->field[SOURCE]);
}

static void count_row(struct count *count, long number, const struct csv_record *row)
{
    if (number == 1) {
        count->failing = strtol(row->field[1], NULL, 10);
    } else if (number == 2) {
        count->rows = strtol(row->field[1], NULL, 10);
    } else if (number >= FIRST_ROW && *row->field[ID]) {
        bool good = strcmp(row->field[OK], "1") == 0;
        count->passed += good;
        count->failed += !good;
        if (!good)
            tell(row);
    }
}

int main(int argc, char **argv)
{
    static struct csv_record row;
    struct count count = {-1, -1, 0, 0};
    FILE *in = argc > 1 ? fopen(argv[1], "r") : NULL;
    for (long number = 1; in && csv_read(in, &row); number++)
        count_row(&count, number, &row);
    if (in)
        fclose(in);
    long wanted = argc > 2 ? strtol(argv[2], NULL, 10) : count.rows;
    if (count.failing != count.failed || count.rows != count.passed + count.failed || wanted != count.rows ||
        wanted <= 0) {
        printf("FAILED: %s: the sheet counts %ld rows, %ld failing; read were %ld good, %ld bad of %ld\n",
               argc > 1 ? argv[1] : "no sheet", count.rows, count.failing, count.passed, count.failed, wanted);
        count.failed++;
    }
    printf("%ld passed, %ld failed\n", count.passed, count.failed);
    return count.failed ? 1 : 0;
}
