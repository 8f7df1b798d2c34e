/*
 * What publications print, beside what our worksheet functions give: the tables in tests/check, each with its source
 * in every row. Headless Calc computes the same rows (tests/run_all.sh).
 */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "check.h"
#include "published_page.h"

enum { SOURCES_AT_LEAST = 28, ROWS_AT_LEAST = 1800 };

/* A bound wider than the print has a difference to explain, and lies close to it. */
static void bound_is_not_loose(const struct published_row *row, double ours)
{
    double off = fabs(ours - row->printed), margin = published_margin(row);
    if (margin <= PUBLISHED_CLOSE * row->precision * (1 + 1e-6))
        return;
    char id[200];
    snprintf(id, sizeof id, "%s: the bound is loose, or no longer needed (off by %g, allowed %g)", row->id, off,
             margin);
    check_true(id, off > PUBLISHED_CLOSE * row->precision && 3 * off >= margin);
}

static void check_rows(const struct published *table)
{
    struct gas_arena arena = {0};
    for (size_t i = 0; i < table->count; i++) {
        const struct published_row *row = &table->row[i];
        double ours;
        const char *words = published_compute(row->formula, &arena, &ours);
        if (words) {
            check_text(row->id, words, "a number");
        } else {
            check_close(row->id, ours, row->printed, 0, published_margin(row));
            bound_is_not_loose(row, ours);
        }
        gas_arena_reset(&arena);
    }
    gas_arena_free(&arena);
}

static void published_values(void)
{
    size_t count, rows = 0;
    char **files = published_files(&count);
    for (size_t i = 0; i < count; i++) {
        struct published table = {0};
        char wrong[PUBLISHED_WORDS] = "cannot be opened";
        FILE *in = fopen(files[i], "r");
        if (check_true(files[i], in && published_read(in, &table, wrong)))
            check_rows(&table);
        else
            check_text(files[i], wrong, "");
        if (!in)
            continue;
        rows += table.count;
        published_free(&table);
        fclose(in);
    }
    published_forget(files, count);
    check_true("sources enough", count >= SOURCES_AT_LEAST);
    check_true("rows enough", rows >= ROWS_AT_LEAST);
}

/* docs/checks.md is what the run gives; `make checks` writes it. */
static void page(void)
{
    char *fresh = NULL, *kept = NULL, wrong[PUBLISHED_WORDS] = "";
    size_t size = 0, room = 0;
    FILE *out = open_memstream(&fresh, &size);
    if (!check_true("memory", out != NULL))
        return;
    bool good = published_page(out, wrong);
    fclose(out);
    check_text("the page can be written", wrong, "");
    FILE *in = fopen(PUBLISHED_PAGE, "r");
    bool read = in && getdelim(&kept, &room, '\0', in) > 0;
    if (in)
        fclose(in);
    check_true("docs/checks.md is what the run gives ('make checks' writes it)",
               good && read && strcmp(fresh, kept) == 0);
    free(fresh);
    free(kept);
}

/* ---- files that break a rule ----------------------------------------------------------------------------- */

#define HEAD "id,formula,printed,precision,unit,source,provenance,allowed,note\n"

static void refused(const char *text, const char *words)
{
    char copy[1000], wrong[PUBLISHED_WORDS] = "";
    struct published table;
    snprintf(copy, sizeof copy, "%s", text);
    FILE *in = fmemopen(copy, strlen(copy), "r");
    if (!check_true("memory", in != NULL))
        return;
    bool good = published_read(in, &table, wrong);
    fclose(in);
    published_free(&table);
    check_true(words, !good);
    check_contains(text, wrong, words);
}

static void broken_files(void)
{
    refused("\n", "headings");
    refused("id,formula\na,1,2\n", "headings");
    refused(HEAD, "nothing follows");
    refused(HEAD "a,1,1.0,0.1,1,,published,1,\n", "has no source");
    refused(HEAD "a,1,1.0,0.1,1,A book,published,1,\n", "where in the publication");
    refused(HEAD "a,,1.0,0.1,1,A book; p. 1,published,1,\n", "empty");
    refused(HEAD "a,1,1.0x,0.1,1,A book; p. 1,published,1,\n", "printed value is not");
    refused(HEAD "a,1,nan,0.1,1,A book; p. 1,published,1,\n", "printed value is not");
    refused(HEAD "a,1,\"1,0\",0.1,1,A book; p. 1,published,1,\n", "printed value is not");
    refused(HEAD "a,1,1.0,zero,1,A book; p. 1,published,1,\n", "precision is not");
    refused(HEAD "a,1,1.0,-0.1,1,A book; p. 1,published,1,\n", "precision is not");
    refused(HEAD "a,1,1.05,0.1,1,A book; p. 1,published,1,\n", "more digits");
    refused(HEAD "a,1,1.0,0.1,1,A book; p. 1,hearsay,1,\n", "provenance");
    refused(HEAD "a,1,1.0,0.1,1,A book; p. 1,published,0,\n", "allowed");
    refused(HEAD "a,1,1.0,0.1,1,A book; p. 1,published,much,\n", "allowed");
    refused(HEAD "a,1,1.0,0.1,1,A book; p. 1,published,inf,\n", "allowed");
    refused(HEAD "a,1,1.0,0.1,1,A book; p. 1,published,2,\n", "naming a reason");
    refused(HEAD "a,1,1.0,0.1,1,A book; p. 1,published,20 %,\n", "naming a reason");
    refused(HEAD "a,1,1.0,0.1,1,A book; p. 1,published,1\n", "nine columns");
    refused(HEAD "a,1,1.0,0.1,1,A book; p. 1,published,1,\na,1,2.0,0.1,1,A book; p. 1,published,1,\n", "twice");
    refused(HEAD "a,1,1.0,0.1,1,A book; p. 1,published,1,\nb,1,2.0,0.1,1,Other; p. 1,published,1,\n", "another");
}

/* A row is computed, not believed: a value that differs, a text, a call of nothing. */
static void wrong_values(void)
{
    struct gas_arena arena = {0};
    double ours;
    check_true("a number", !published_compute("GAS.GAMMA(\"Ar\";300)", &arena, &ours));
    const struct published_row row = {.printed = 1.67, .precision = 0.01, .allowed = 1};
    check_true("near", fabs(ours - row.printed) <= published_margin(&row));
    check_close("deviation", published_deviation(&row, 1.70), 3, 1e-9, 0); /* arithmetic */
    check_true("far", fabs(1.70 - row.printed) > published_margin(&row));
    check_text("a text", published_compute("\"so\"", &arena, &ours), "so");
    check_text("no such function", published_compute("GAS.NOTHING(1)", &arena, &ours), "the formula cannot be read");
    check_contains("a sentence", published_compute("GAS.CP(\"nitrogenium\";300)", &arena, &ours), "Check");
    gas_arena_free(&arena);
}

const struct test_suite suite_published = {"published",
                                           (const struct test_case[]){{"published values", published_values},
                                                                      {"the page", page},
                                                                      {"broken files", broken_files},
                                                                      {"wrong values", wrong_values},
                                                                      {0}}};
