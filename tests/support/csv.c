#include "csv.h"

#include <string.h>

struct position {
    size_t column, length;
};

static void keep(struct csv_record *record, struct position *at, int letter)
{
    if (at->column < CSV_COLUMNS && at->length + 1 < CSV_LENGTH)
        record->field[at->column][at->length++] = (char)letter;
}

/* A quote ends or begins quoting; two of them inside quotes are one that is meant. */
static bool toggles(FILE *in, bool quoted)
{
    int next = quoted ? getc(in) : EOF;
    if (next == '"')
        return false;
    if (next != EOF)
        ungetc(next, in);
    return true;
}

bool csv_read(FILE *in, struct csv_record *record)
{
    struct position at = {0};
    bool quoted = false, any = false;
    memset(record, 0, sizeof *record);
    for (int letter; (letter = getc(in)) != EOF; any = true) {
        if (letter == '"' && toggles(in, quoted)) {
            quoted = !quoted;
        } else if (letter == ',' && !quoted) {
            at = (struct position){at.column + 1, 0};
        } else if (letter == '\n' && !quoted) {
            any = true;
            break;
        } else {
            keep(record, &at, letter);
        }
    }
    record->columns = at.column < CSV_COLUMNS ? at.column + 1 : CSV_COLUMNS;
    return any;
}
