#include "published.h"

#include <math.h>
#include <stdlib.h>
#include <string.h>

#include "csv.h"

enum column { ID, FORMULA, PRINTED, PRECISION, UNIT, SOURCE, PROVENANCE, ALLOWED, NOTE, COLUMNS };

static const char *const headings[COLUMNS] = {"id",     "formula",    "printed", "precision", "unit",
                                              "source", "provenance", "allowed", "note"};

static bool refuse(char *wrong, const char *id, const char *words)
{
    snprintf(wrong, PUBLISHED_WORDS, "row '%.200s': %s", id, words);
    return false;
}

static bool read_number(const char *text, const char *end, double *number)
{
    char *stop;
    *number = strtod(text, &stop);
    return stop != text && strcmp(stop, end) == 0 && isfinite(*number);
}

static bool read_allowed(const char *text, struct published_row *row)
{
    row->percent = strchr(text, '%') != NULL;
    return read_number(text, row->percent ? " %" : "", &row->allowed) && row->allowed > 0;
}

static bool known_provenance(const char *text)
{
    static const char *const known[] = {"published", "from memory", "common practice", "derived"};
    for (size_t i = 0; i < sizeof known / sizeof *known; i++)
        if (strcmp(text, known[i]) == 0)
            return true;
    return false;
}

/* The printed value ends at the place that is said to be its last: 29.124 cannot have been printed to 0.01. */
static bool ends_at_precision(const struct published_row *row)
{
    double units = row->printed / row->precision;
    return fabs(units - round(units)) <= 1e-6 + 1e-14 * fabs(units);
}

static const char *what_is_wrong(const struct csv_record *record, struct published_row *row)
{
    if (record->columns != COLUMNS)
        return "does not have nine columns";
    for (int i = 0; i < NOTE; i++)
        if (!*record->field[i])
            return i == SOURCE ? "has no source" : "has an empty cell";
    if (!read_number(record->field[PRINTED], "", &row->printed))
        return "the printed value is not a number";
    if (!read_number(record->field[PRECISION], "", &row->precision) || row->precision <= 0)
        return "the printed precision is not a number above 0";
    if (!ends_at_precision(row))
        return "the printed value has more digits than its precision";
    if (!read_allowed(record->field[ALLOWED], row))
        return "what is allowed is neither a number of units above 0 nor a percentage";
    if (!known_provenance(record->field[PROVENANCE]))
        return "the provenance is not one of the four";
    if (published_margin(row) > PUBLISHED_CLOSE * row->precision * (1 + 1e-6) && !*record->field[NOTE])
        return "allows more than the print without naming a reason";
    if (!strchr(record->field[SOURCE], ';'))
        return "the source does not say where in the publication, after a semicolon";
    return NULL;
}

static bool same_title(struct published *table, const char *source)
{
    size_t length = strcspn(source, ";");
    if (!table->title)
        table->title = strndup(source, length);
    return table->title && strlen(table->title) == length && strncmp(table->title, source, length) == 0;
}

static bool has_id(const struct published *table, const char *id)
{
    for (size_t i = 0; i < table->count; i++)
        if (strcmp(table->row[i].id, id) == 0)
            return true;
    return false;
}

static bool append(struct published *table, const struct csv_record *record, struct published_row row)
{
    if (table->count == table->room) {
        size_t room = 2 * table->room + 64;
        struct published_row *more = realloc(table->row, room * sizeof *more);
        if (!more)
            return false;
        table->row = more;
        table->room = room;
    }
    char **const text[] = {&row.id, &row.formula, &row.unit, &row.source, &row.provenance, &row.note};
    static const enum column from[] = {ID, FORMULA, UNIT, SOURCE, PROVENANCE, NOTE};
    bool good = true;
    for (size_t i = 0; i < sizeof from / sizeof *from; i++)
        good &= (*text[i] = strdup(record->field[from[i]])) != NULL;
    table->row[table->count++] = row;
    return good;
}

static bool read_row(struct published *table, const struct csv_record *record, char *wrong)
{
    struct published_row row = {0};
    const char *id = record->field[ID];
    const char *words = what_is_wrong(record, &row);
    if (words)
        return refuse(wrong, id, words);
    if (has_id(table, id))
        return refuse(wrong, id, "the id stands twice");
    if (!same_title(table, record->field[SOURCE]))
        return refuse(wrong, id, "is of another publication than the rows before it");
    return append(table, record, row) || refuse(wrong, id, "no memory");
}

static bool read_headings(FILE *in, struct csv_record *record)
{
    if (!csv_read(in, record) || record->columns != COLUMNS)
        return false;
    for (int i = 0; i < COLUMNS; i++)
        if (strcmp(record->field[i], headings[i]) != 0)
            return false;
    return true;
}

bool published_read(FILE *in, struct published *table, char wrong[PUBLISHED_WORDS])
{
    *table = (struct published){0};
    struct csv_record *record = malloc(sizeof *record);
    bool good = record && read_headings(in, record);
    if (!good)
        refuse(wrong, "headings", "are not id,formula,printed,precision,unit,source,provenance,allowed,note");
    while (good && csv_read(in, record))
        good = read_row(table, record, wrong);
    free(record);
    if (good && table->count == 0)
        return refuse(wrong, "headings", "nothing follows them");
    return good;
}

void published_free(struct published *table)
{
    for (size_t i = 0; i < table->count; i++) {
        struct published_row *row = &table->row[i];
        char *const text[] = {row->id, row->formula, row->unit, row->source, row->provenance, row->note};
        for (size_t j = 0; j < sizeof text / sizeof *text; j++)
            free(text[j]);
    }
    free(table->row);
    free(table->title);
    *table = (struct published){0};
}

double published_deviation(const struct published_row *row, double ours)
{
    return (ours - row->printed) / row->precision;
}

double published_margin(const struct published_row *row)
{
    return row->percent ? row->allowed / 100 * fabs(row->printed) : row->allowed * row->precision * (1 + 1e-9);
}
