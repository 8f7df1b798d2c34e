#include "published_page.h"

#include <glob.h>
#include <math.h>
#include <stdlib.h>
#include <string.h>

#include "formula.h"

#define TABLES "tests/check/*.csv"

const char *published_compute(const char *formula, struct gas_arena *arena, double *number)
{
    struct gas_block value = {0};
    *number = NAN;
    if (!formula_evaluate(formula, arena, &value) || value.rows == 0)
        return "the formula cannot be read";
    *number = value.cell[0].number;
    if (value.cell[0].kind == GAS_CELL_NUMBER)
        return NULL;
    return value.cell[0].text ? value.cell[0].text : "no number";
}

char **published_files(size_t *count)
{
    glob_t found = {0};
    *count = 0;
    if (glob(TABLES, 0, NULL, &found) != 0)
        return NULL;
    char **files = calloc(found.gl_pathc, sizeof *files);
    for (; files && *count < found.gl_pathc; ++*count)
        files[*count] = strdup(found.gl_pathv[*count]);
    globfree(&found);
    return files;
}

void published_forget(char **files, size_t count)
{
    for (size_t i = 0; files && i < count; i++)
        free(files[i]);
    free(files);
}

/* ---- figures --------------------------------------------------------------------------------------------- */

struct figures {
    struct published table;
    const char *file;
    double *deviation; /* of each row, in units of the last printed digit */
    size_t close;      /* rows that agree with the print */
    double largest, largest_percent, largest_close;
};

static bool is_close(double deviation)
{
    return fabs(deviation) <= PUBLISHED_CLOSE * (1 + 1e-9);
}

static double percent_of(const struct published_row *row, double deviation)
{
    return fabs(100 * deviation * row->precision / row->printed);
}

static bool compute_rows(struct figures *figures, char *wrong)
{
    struct gas_arena arena = {0};
    const char *words = NULL;
    const struct published *table = &figures->table;
    figures->deviation = calloc(table->count, sizeof *figures->deviation);
    for (size_t i = 0; figures->deviation && i < table->count && !words; i++) {
        double ours, *deviation = &figures->deviation[i];
        words = published_compute(table->row[i].formula, &arena, &ours);
        if (words)
            snprintf(wrong, PUBLISHED_WORDS, "%.100s: row '%.100s': %.150s", figures->file, table->row[i].id, words);
        *deviation = published_deviation(&table->row[i], ours);
        figures->close += is_close(*deviation);
        figures->largest = fmax(figures->largest, fabs(*deviation));
        if (!is_close(*deviation))
            figures->largest_percent = fmax(figures->largest_percent, percent_of(&table->row[i], *deviation));
        else
            figures->largest_close = fmax(figures->largest_close, fabs(*deviation));
        gas_arena_reset(&arena);
    }
    gas_arena_free(&arena);
    return figures->deviation && !words;
}

static bool compute_file(const char *file, struct figures *figures, char *wrong)
{
    char words[PUBLISHED_WORDS] = "";
    *figures = (struct figures){.file = strrchr(file, '/') + 1};
    FILE *in = fopen(file, "r");
    bool good = in && published_read(in, &figures->table, words);
    if (in)
        fclose(in);
    if (!good)
        snprintf(wrong, PUBLISHED_WORDS, "%.100s: %.290s", figures->file, words);
    return good && compute_rows(figures, wrong);
}

/* ---- the page -------------------------------------------------------------------------------------------- */

/* Two figures are enough to see what a deviation is, and few enough to be the same on every machine. */
static void put_units(FILE *out, double deviation)
{
    if (fabs(deviation) < 99.5)
        fprintf(out, "%.2g", deviation);
    else
        fprintf(out, "%.0f", round(deviation / 10) * 10);
}

static void put_head(FILE *out)
{
    fputs(
        "# Checks against published values\n\n"
        "<!-- Written by `make checks` from tests/check/*.csv. -->\n\n"
        "Every row is a formula typed as in Calc and the value that a publication prints. `make test` computes all of "
        "them twice, in\nthe C library and in headless Calc. *Deviation* is ours less the printed value, in units of "
        "its last printed digit; *agree* counts\nthe rows within one unit. The others are misses: each names its "
        "reason and is held to a bound of at most three times the\ndifference. What the files hold and the rules for "
        "them: [tests/check/README.md](../tests/check/README.md).\n\n",
        out);
}

static void put_summary(FILE *out, const struct figures *figures, size_t count)
{
    size_t rows = 0, close = 0;
    fputs("| publication | rows | agree | off by at most | misses | off by at most | in percent |\n"
          "| --- | ---: | ---: | ---: | ---: | ---: | ---: |\n",
          out);
    for (size_t i = 0; i < count; i++) {
        const struct figures *f = &figures[i];
        size_t misses = f->table.count - f->close;
        fprintf(out, "| [%s](#%.*s) | %zu | %zu | ", f->table.title, (int)strlen(f->file) - 4, f->file, f->table.count,
                f->close);
        put_units(out, f->largest_close);
        fprintf(out, " | %zu | ", misses);
        if (misses)
            put_units(out, f->largest);
        if (misses)
            fprintf(out, " | %.2g %% |\n", f->largest_percent);
        else
            fputs("| |\n", out);
        rows += f->table.count;
        close += f->close;
    }
    fprintf(out, "| **%zu publications** | **%zu** | **%zu** | | **%zu** | | |\n\n", count, rows, close, rows - close);
}

static void put_provenance(FILE *out, const struct published *table)
{
    static const char *const kinds[] = {"published", "derived", "from memory", "common practice"};
    const char *gap = "";
    for (size_t k = 0; k < sizeof kinds / sizeof *kinds; k++) {
        size_t count = 0;
        for (size_t i = 0; i < table->count; i++)
            count += strcmp(table->row[i].provenance, kinds[k]) == 0;
        if (count)
            fprintf(out, "%s%zu %s", gap, count, kinds[k]);
        if (count)
            gap = ", ";
    }
    fputs(".\n\n", out);
}

/* The rows of one reason: how far off they are at most, and which they are. */
static void put_reason(FILE *out, const struct figures *figures, size_t first)
{
    const struct published_row *row = figures->table.row;
    double most = 0, percent = 0;
    size_t count = 0;
    for (size_t i = first; i < figures->table.count; i++)
        if (!is_close(figures->deviation[i]) && strcmp(row[i].note, row[first].note) == 0) {
            if (fabs(figures->deviation[i]) > fabs(most))
                most = figures->deviation[i];
            percent = fmax(percent, percent_of(&row[i], figures->deviation[i]));
            count++;
        }
    fprintf(out, "| %s | %zu | ", row[first].note, count);
    put_units(out, most);
    fprintf(out, " | %.2g %% | ", percent);
    const char *gap = "";
    for (size_t i = first; i < figures->table.count; i++)
        if (!is_close(figures->deviation[i]) && strcmp(row[i].note, row[first].note) == 0) {
            fprintf(out, "%s%s", gap, row[i].id);
            gap = ", ";
        }
    fputs(" |\n", out);
}

static bool reason_is_new(const struct figures *figures, size_t index)
{
    for (size_t i = 0; i < index; i++)
        if (!is_close(figures->deviation[i]) && strcmp(figures->table.row[i].note, figures->table.row[index].note) == 0)
            return false;
    return true;
}

static void put_table(FILE *out, const struct figures *figures)
{
    const struct published *table = &figures->table;
    int name = (int)strlen(figures->file) - 4;
    fprintf(out, "## %.*s\n\n%s: [%s](../tests/check/%s), %zu rows, %zu agree. Provenance: ", name, figures->file,
            table->title, figures->file, figures->file, table->count, figures->close);
    put_provenance(out, table);
    if (figures->close == table->count)
        return;
    fputs("| why it misses | rows | largest deviation | at most | which |\n| --- | ---: | ---: | ---: | --- |\n", out);
    for (size_t i = 0; i < table->count; i++)
        if (!is_close(figures->deviation[i]) && reason_is_new(figures, i))
            put_reason(out, figures, i);
    fputs("\n", out);
}

bool published_page(FILE *out, char wrong[PUBLISHED_WORDS])
{
    size_t count, done = 0;
    char **files = published_files(&count);
    struct figures *figures = calloc(count + 1, sizeof *figures);
    bool good = files && figures;
    if (!good)
        snprintf(wrong, PUBLISHED_WORDS, "there are no tables " TABLES);
    while (good && done < count) {
        good = compute_file(files[done], &figures[done], wrong);
        done++;
    }
    if (good) {
        put_head(out);
        put_summary(out, figures, count);
        for (size_t i = 0; i < count; i++)
            put_table(out, &figures[i]);
    }
    for (size_t i = 0; i < done; i++) {
        published_free(&figures[i].table);
        free(figures[i].deviation);
    }
    free(figures);
    published_forget(files, count);
    return good;
}
