/*
 * price_sheet KIND ROWS: the content of a sheet to standard output, whose formulas are of one kind, with their results
 * in it, so that the office can load it with and without computing. Columns A to D hold figures, column E the formulas.
 *
 * Kinds: a name of the table below; one ending in "-array" is a single array formula over all rows.
 */
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

/* clang-format off */
static const struct kind {
    const char *name, *formula; /* # stands for the row */
    int columns;                /* of the answer of an array; 0: a formula in each row */
} kinds[] = {
    {"none",         "", 0}, /* figures where the others have formulas */
    {"native",       "[.A#]*2", 0},
    {"analysis",     "COM.SUN.STAR.SHEET.ADDIN.ANALYSIS.GETDELTA([.A#];300)", 0},
    {"version",      "GASLEAF.FUNCTIONS.VERSION()", 0},
    {"cp",           "GASLEAF.FUNCTIONS.CP(&quot;N2&quot;;[.A#])", 0},
    {"unit",         "GASLEAF.FUNCTIONS.UNIT([.A#];&quot;psig&quot;;&quot;bar&quot;)", 0},
    {"solve",        "GASLEAF.FUNCTIONS.SOLVE(&quot;N2&quot;;&quot;7 bar(g); 35 °C; 12 m3&quot;;&quot;kg&quot;)", 0},
    {"native-array", "[.A1:.A@]*2", 1},
    {"cp-array",     "GASLEAF.FUNCTIONS.CP(&quot;N2&quot;;[.A1:.A@])", 1},
    {"solve-array",  "GASLEAF.FUNCTIONS.SOLVE(&quot;N2&quot;;[.B1:.D@];&quot;m, kg&quot;;&quot;P, bar(g); T, °C; V, m3&quot;)", 1},
};
/* clang-format on */

static const char head[] = "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n"
                           "<office:document xmlns:office=\"urn:oasis:names:tc:opendocument:xmlns:office:1.0\" "
                           "xmlns:table=\"urn:oasis:names:tc:opendocument:xmlns:table:1.0\" "
                           "xmlns:text=\"urn:oasis:names:tc:opendocument:xmlns:text:1.0\" "
                           "xmlns:of=\"urn:oasis:names:tc:opendocument:xmlns:of:1.2\" office:version=\"1.2\" "
                           "office:mimetype=\"application/vnd.oasis.opendocument.spreadsheet\">\n"
                           "<office:body><office:spreadsheet><table:table table:name=\"price\">\n";
static const char tail[] = "</table:table></office:spreadsheet></office:body></office:document>\n";

static void print_formula(const char *formula, long row, long rows)
{
    for (; *formula; formula++)
        if (*formula == '#')
            printf("%ld", row);
        else if (*formula == '@')
            printf("%ld", rows);
        else
            putchar(*formula);
}

static void print_number(double figure)
{
    printf("<table:table-cell office:value-type=\"float\" office:value=\"%.15g\"/>", figure);
}

static void print_row(const struct kind *kind, long row, long rows)
{
    printf("<table:table-row>");
    print_number(300 + 0.001 * (double)row);
    print_number(7 + 1e-6 * (double)row);
    print_number(35);
    print_number(12);
    if (kind->formula[0] && (kind->columns == 0 || row == 1)) {
        printf("<table:table-cell ");
        if (kind->columns)
            printf("table:number-matrix-columns-spanned=\"%d\" table:number-matrix-rows-spanned=\"%ld\" ",
                   kind->columns, rows);
        printf("table:formula=\"of:=");
        print_formula(kind->formula, row, rows);
        printf("\" office:value-type=\"float\" office:value=\"1\"/>");
    } else {
        print_number(1);
    }
    printf("</table:table-row>\n");
}

int main(int count, char **argument)
{
    long rows = count == 3 ? strtol(argument[2], NULL, 10) : 0;
    for (size_t i = 0; rows > 0 && i < sizeof kinds / sizeof *kinds; i++)
        if (strcmp(kinds[i].name, argument[1]) == 0) {
            fputs(head, stdout);
            for (long row = 1; row <= rows; row++)
                print_row(&kinds[i], row, rows);
            fputs(tail, stdout);
            return 0;
        }
    fprintf(stderr, "price_sheet KIND ROWS, kinds:");
    for (size_t i = 0; i < sizeof kinds / sizeof *kinds; i++)
        fprintf(stderr, " %s", kinds[i].name);
    fprintf(stderr, "\n");
    return 1;
}
