/*
 * count_sheet CHECK.csv [ROWS]: what Calc computed on a sheet "check" of tests/sheets. Prints the rows that fail with
 * their texts, then `N passed, N failed`. The sheet's own count must agree, and so must ROWS, the number of checks that
 * went in.
 */
#include <stdbool.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

enum { FIRST_ROW = 4, COLUMNS = 8, LENGTH = 2000 };

typedef char record[COLUMNS][LENGTH];

/* One record of the file: fields in double quotes may hold commas, quotes and line ends. */
static bool read_record(FILE *in, record fields)
{
    memset(fields, 0, sizeof(record));
    bool quoted = false, any = false;
    size_t column = 0, length = 0;
    for (int letter; (letter = getc(in)) != EOF;) {
        any = true;
        if (letter == '"') {
            int next = quoted ? getc(in) : EOF;
            if (next != '"') {
                if (quoted && next != EOF)
                    ungetc(next, in);
                quoted = !quoted;
                continue;
            }
        } else if (letter == ',' && !quoted) {
            column++;
            length = 0;
            continue;
        } else if (letter == '\n' && !quoted) {
            break;
        }
        if (column < COLUMNS && length + 1 < LENGTH)
            fields[column][length++] = (char)letter;
    }
    return any;
}

static void tell(const record fields)
{
    printf("FAILED %s: got '%s', expected '%s' (tolerance %s)\n       =%s\n       source: %s\n", fields[0], fields[1],
           fields[2], *fields[3] ? fields[3] : "none", fields[6], fields[5]);
}

int main(int argc, char **argv)
{
    static record fields;
    long failing = -1, rows = -1, passed = 0, failed = 0;
    FILE *in = argc > 1 ? fopen(argv[1], "r") : NULL;
    if (!in) {
        printf("FAILED: the office computed no %s\n0 passed, 1 failed\n", argc > 1 ? argv[1] : "sheet");
        return 1;
    }
    for (long row = 1; read_record(in, fields); row++) {
        if (row == 1)
            failing = strtol(fields[1], NULL, 10);
        else if (row == 2)
            rows = strtol(fields[1], NULL, 10);
        else if (row < FIRST_ROW || !*fields[0])
            continue;
        else if (strcmp(fields[4], "1") == 0)
            passed++;
        else {
            tell((const char(*)[LENGTH])fields);
            failed++;
        }
    }
    fclose(in);
    long wanted = argc > 2 ? strtol(argv[2], NULL, 10) : rows;
    if (failing != failed || rows != passed + failed || wanted != rows || rows <= 0) {
        printf("FAILED %s: counts %ld rows and %ld failing ones; %ld passed and %ld failed of %ld\n", argv[1], rows,
               failing, passed, failed, wanted);
        failed++;
    }
    printf("%ld passed, %ld failed\n", passed, failed);
    return failed ? 1 : 0;
}
