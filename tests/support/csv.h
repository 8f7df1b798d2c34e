/*
 * csv.h - records of a table as the office exports it: commas, double quotes, line ends inside quotes.
 */
#ifndef TESTS_CSV_H
#define TESTS_CSV_H

#include <stdbool.h>
#include <stdio.h>

enum { CSV_COLUMNS = 40, CSV_LENGTH = 1000 };

struct csv_record {
    size_t columns; /* up to CSV_COLUMNS; longer records and texts are cut */
    char field[CSV_COLUMNS][CSV_LENGTH];
};

/* csv_read - the next record; false at the end. */
bool csv_read(FILE *in, struct csv_record *record);

#endif
