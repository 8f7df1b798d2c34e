/*
 * make_sheet TOPIC.tsv TOPIC.fods: rows of checks in a readable form to a sheet for Calc. Prints the number of checks.
 *
 *   # remark
 *   id <tab> =formula <tab> expected <tab> tolerance <tab> source        a check
 *   ! heading <tab> heading ...                                           of further cells that checks carry after
 *                                                                         the source: shown, not judged
 *   @ A10 = value <tab> value ...                                         cells of the sheet "data", across from A10
 *   @ A10:C14 = =formula                                                  an array formula on that sheet
 *
 * Formulas are typed as in Calc, `;` between arguments and columns of inline arrays, `|` between their rows, references
 * to the other sheet as data.A10 or data.A10:B12. Expected is a number, a text, ~part of a text, #N/A, or #error for
 * any error of the office; the tolerance is absolute, or relative when it ends in `rel` or `%`. tests/sheets/README.md.
 */
#include <ctype.h>
#include <stdbool.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

enum { FIRST_ROW = 4, FIELDS = 64 };

struct cell {
    long row, column, rows, columns; /* rows > 0: an array formula */
    char *text;
};

struct cells {
    struct cell *cell;
    size_t count, room;
};

static void die(const char *words, const char *about)
{
    fprintf(stderr, "make_sheet: %s: %s\n", words, about);
    exit(1);
}

static void put_escaped(FILE *out, int letter)
{
    switch (letter) {
    case '<':
        fputs("&lt;", out);
        break;
    case '>':
        fputs("&gt;", out);
        break;
    case '&':
        fputs("&amp;", out);
        break;
    case '"':
        fputs("&quot;", out);
        break;
    default:
        putc(letter, out);
    }
}

/* The length of a reference such as B12 at a place, 0 when there is none. */
static size_t reference(const char *at)
{
    size_t letters = strspn(at, "ABCDEFGHIJKLMNOPQRSTUVWXYZ");
    size_t digits = strspn(at + letters, "0123456789");
    return letters >= 1 && letters <= 3 && digits ? letters + digits : 0;
}

static bool in_word(int letter)
{
    return isalnum((unsigned char)letter) || letter == '_' || letter == '.';
}

/* "data.A10:B12" as the file format writes it, [data.A10:.B12]; answers the length taken, 0 when it is something else.
 */
static size_t put_reference(FILE *out, const char *at)
{
    size_t sheet = strncmp(at, "data.", 5) == 0 ? 4 : strncmp(at, "check.", 6) == 0 ? 5 : 0;
    size_t first = reference(at + sheet + (sheet > 0));
    size_t taken = sheet + (sheet > 0) + first;
    if (!first || at[taken] == '(' || in_word(at[taken]))
        return 0;
    fprintf(out, "[%.*s.%.*s", (int)sheet, at, (int)first, at + taken - first);
    size_t second = at[taken] == ':' ? reference(at + taken + 1) : 0;
    if (second) {
        fprintf(out, ":.%.*s", (int)second, at + taken + 1);
        taken += 1 + second;
    }
    putc(']', out);
    return taken;
}

static size_t put_word(FILE *out, const char *at)
{
    size_t length = put_reference(out, at);
    if (length)
        return length;
    while (in_word(at[length]))
        length++;
    if (strncmp(at, "GAS.", 4) == 0)
        fprintf(out, "GASLEAF.FUNCTIONS%.*s", (int)length - 3, at + 3);
    else
        fprintf(out, "%.*s", (int)length, at);
    return length;
}

/* A typed formula, from its equals sign, as the file format writes it. */
static void put_formula(FILE *out, const char *typed)
{
    fputs("of:", out);
    bool quoted = false;
    while (*typed) {
        quoted ^= *typed == '"';
        if (!quoted && in_word(*typed)) {
            typed += put_word(out, typed);
        } else {
            put_escaped(out, *typed);
            typed++;
        }
    }
}

static bool is_number(const char *text)
{
    char *end;
    strtod(text, &end);
    return end != text && *end == '\0' && (isdigit((unsigned char)*text) || strchr("+-.", *text));
}

static void put_paragraphs(FILE *out, const char *text)
{
    fputs("<text:p>", out);
    for (; *text; text++)
        if (text[0] == '\\' && text[1] == 'n') {
            fputs("</text:p><text:p>", out);
            text++;
        } else {
            put_escaped(out, *text);
        }
    fputs("</text:p>", out);
}

static void put_cell(FILE *out, const char *text, long rows, long columns)
{
    bool braces = strncmp(text, "{=", 2) == 0;
    if (*text == '=' || braces) {
        size_t length = strlen(text);
        char *formula = strndup(text + braces, braces ? length - 2 : length);
        fputs("<table:table-cell", out);
        if (rows || braces)
            fprintf(out, " table:number-matrix-rows-spanned=\"%ld\" table:number-matrix-columns-spanned=\"%ld\"",
                    rows ? rows : 1, columns ? columns : 1);
        fputs(" table:formula=\"", out);
        put_formula(out, formula);
        fputs("\"/>\n", out);
        free(formula);
    } else if (is_number(text)) {
        fprintf(out, "<table:table-cell office:value-type=\"float\" office:value=\"%s\"/>\n", text);
    } else if (!*text) {
        fputs("<table:table-cell/>\n", out);
    } else {
        fputs("<table:table-cell office:value-type=\"string\">", out);
        put_paragraphs(out, text);
        fputs("</table:table-cell>\n", out);
    }
}

/* The formula that is 1 when the result in B holds, 0 when it does not, whatever B is. */
static void put_verdict(FILE *out, long row, const char *expected, const char *tolerance)
{
    char margin[120];
    char *end;
    double width = strtod(tolerance, &end);
    if (strcmp(end, "%") == 0 || strcmp(end, " %") == 0)
        snprintf(margin, sizeof margin, "ABS([.C%ld])*%.17g", row, width / 100);
    else if (strcmp(end, "rel") == 0 || strcmp(end, " rel") == 0)
        snprintf(margin, sizeof margin, "ABS([.C%ld])*%.17g", row, width);
    else
        snprintf(margin, sizeof margin, "%.17g", width);
    if (is_number(expected) && (end == tolerance || width < 0))
        die("a number needs a tolerance", expected);
    fputs("<table:table-cell table:formula=\"of:=IFERROR(", out);
    if (strcmp(expected, "#N/A") == 0)
        fprintf(out, "IF(ISNA([.B%ld]);1;0)", row);
    else if (strcmp(expected, "#error") == 0)
        fprintf(out, "IF(ISERROR([.B%ld]);1;0)", row);
    else if (is_number(expected))
        fprintf(out, "IF(ISNUMBER([.B%ld]);IF(ABS([.B%ld]-[.C%ld])&lt;=%s;1;0);0)", row, row, row, margin);
    else if (*expected == '~')
        fprintf(out, "IF(ISTEXT([.B%ld]);IF(ISNUMBER(FIND(MID([.C%ld];2;9999);[.B%ld]));1;0);0)", row, row, row);
    else
        fprintf(out, "IF(ISTEXT([.B%ld]);IF(EXACT([.B%ld]&amp;&quot;&quot;;[.C%ld]);1;0);0)", row, row, row);
    fputs(";0)\"/>\n", out);
}

static char *trimmed(char *text)
{
    while (*text == ' ')
        text++;
    size_t length = strlen(text);
    while (length && strchr(" \r\n", text[length - 1]))
        text[--length] = '\0';
    return text;
}

static size_t split(char *line, char **field)
{
    size_t count = 0;
    for (char *rest = line, *next; rest && count < FIELDS; rest = next) {
        next = strchr(rest, '\t');
        if (next)
            *next++ = '\0';
        field[count++] = trimmed(rest);
    }
    return count;
}

static void put_check(FILE *out, long row, char *line)
{
    char *field[FIELDS] = {0};
    size_t count = split(line, field);
    if (count < 5 || !*field[0] || !*field[1] || !*field[2] || !*field[4])
        die("a check needs id, formula, expected, tolerance, source", field[0]);
    fputs("<table:table-row>\n<table:table-cell office:value-type=\"string\">", out);
    put_paragraphs(out, field[0]);
    fputs("</table:table-cell>\n", out);
    put_cell(out, field[1], 0, 0);
    if (is_number(field[2])) {
        put_cell(out, field[2], 0, 0);
    } else {
        fputs("<table:table-cell office:value-type=\"string\">", out);
        put_paragraphs(out, field[2]);
        fputs("</table:table-cell>\n", out);
    }
    put_cell(out, field[3], 0, 0);
    put_verdict(out, row, field[2], field[3]);
    fputs("<table:table-cell office:value-type=\"string\">", out);
    put_paragraphs(out, field[4]);
    fputs("</table:table-cell>\n<table:table-cell office:value-type=\"string\">", out);
    put_paragraphs(out, field[1][0] == '=' ? field[1] + 1 : field[1]);
    fputs("</table:table-cell>\n", out);
    for (size_t i = 5; i < count; i++)
        put_cell(out, field[i], 0, 0);
    fputs("</table:table-row>\n", out);
}

static const char *place(const char *text, long *row, long *column)
{
    size_t length = reference(text);
    if (!length)
        die("not a cell", text);
    for (*column = 0; isupper((unsigned char)*text); text++)
        *column = 26 * *column + (*text - 'A' + 1);
    char *end;
    *row = strtol(text, &end, 10);
    return end;
}

static void add_cell(struct cells *cells, struct cell cell)
{
    if (cells->count == cells->room) {
        cells->room = 2 * cells->room + 64;
        cells->cell = realloc(cells->cell, cells->room * sizeof *cells->cell);
        if (!cells->cell)
            die("no memory", "data");
    }
    cells->cell[cells->count++] = cell;
}

static void read_data(struct cells *cells, char *line)
{
    struct cell cell = {0};
    char *equals = strchr(line, '=');
    if (!equals)
        die("data without an equals sign", line);
    const char *rest = place(trimmed(line + 1), &cell.row, &cell.column);
    if (*rest == ':') {
        place(rest + 1, &cell.rows, &cell.columns);
        cell.rows -= cell.row - 1;
        cell.columns -= cell.column - 1;
    }
    char *field[FIELDS] = {0};
    size_t count = split(equals + 1, field);
    for (size_t i = 0; i < count; i++, cell.column++) {
        cell.text = strdup(field[i]);
        add_cell(cells, cell);
    }
}

static int by_place(const void *one, const void *other)
{
    const struct cell *a = one, *b = other;
    if (a->row != b->row)
        return a->row < b->row ? -1 : 1;
    return a->column < b->column ? -1 : a->column > b->column;
}

static void put_data(FILE *out, struct cells *cells)
{
    if (cells->count)
        qsort(cells->cell, cells->count, sizeof *cells->cell, by_place);
    long row = 0, column = 0;
    for (size_t i = 0; i < cells->count; i++) {
        const struct cell *cell = &cells->cell[i];
        if (cell->row == row && cell->column < column)
            die("a cell of data is given twice", cell->text);
        if (cell->row != row) {
            fputs(row ? "</table:table-row>\n" : "", out);
            if (cell->row > row + 1)
                fprintf(out,
                        "<table:table-row table:number-rows-repeated=\"%ld\"><table:table-cell/></table:table-row>\n",
                        cell->row - row - 1);
            fputs("<table:table-row>\n", out);
            row = cell->row;
            column = 1;
        }
        if (cell->column > column)
            fprintf(out, "<table:table-cell table:number-columns-repeated=\"%ld\"/>\n", cell->column - column);
        put_cell(out, cell->text, cell->rows, cell->columns);
        column = cell->column + 1;
    }
    fputs(row ? "</table:table-row>\n" : "<table:table-row><table:table-cell/></table:table-row>\n", out);
}

static long put_checks(FILE *out, FILE *in, struct cells *cells, char **further)
{
    char *line = NULL;
    size_t room = 0;
    long row = FIRST_ROW;
    while (getline(&line, &room, in) >= 0)
        if (*line == '@')
            read_data(cells, line);
        else if (*line == '!' && !*further)
            *further = strdup(line + 1);
        else if (*line == '!')
            die("further headings are given twice", line);
        else if (*line != '#' && *trimmed(line))
            put_check(out, row++, line);
    free(line);
    return row - FIRST_ROW;
}

static void put_head(FILE *out, long last, char *further)
{
    static const char *const heading[] = {"id", "result", "expected", "tolerance", "ok", "source", "formula"};
    fputs("<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n"
          "<office:document xmlns:office=\"urn:oasis:names:tc:opendocument:xmlns:office:1.0\" "
          "xmlns:table=\"urn:oasis:names:tc:opendocument:xmlns:table:1.0\" "
          "xmlns:text=\"urn:oasis:names:tc:opendocument:xmlns:text:1.0\" "
          "xmlns:of=\"urn:oasis:names:tc:opendocument:xmlns:of:1.2\" office:version=\"1.2\" "
          "office:mimetype=\"application/vnd.oasis.opendocument.spreadsheet\">\n"
          "<office:body>\n<office:spreadsheet>\n<table:table table:name=\"check\">\n",
          out);
    fprintf(
        out,
        "<table:table-row>\n<table:table-cell office:value-type=\"string\"><text:p>failing</text:p>"
        "</table:table-cell>\n<table:table-cell table:formula=\"of:=[.B2]-SUM([.E%d:.E%ld])\"/>\n</table:table-row>\n"
        "<table:table-row>\n<table:table-cell office:value-type=\"string\"><text:p>rows</text:p>"
        "</table:table-cell>\n<table:table-cell table:formula=\"of:=COUNTA([.A%d:.A%ld])\"/>\n</table:table-row>\n"
        "<table:table-row>\n",
        FIRST_ROW, last, FIRST_ROW, last);
    for (size_t i = 0; i < sizeof heading / sizeof *heading; i++)
        put_cell(out, heading[i], 0, 0);
    char *field[FIELDS] = {0};
    size_t count = further ? split(further, field) : 0;
    for (size_t i = 0; i < count; i++)
        put_cell(out, field[i], 0, 0);
    fputs("</table:table-row>\n", out);
}

int main(int argc, char **argv)
{
    if (argc != 3)
        die("usage", "make_sheet TOPIC.tsv TOPIC.fods");
    FILE *in = fopen(argv[1], "r"), *out = fopen(argv[2], "w");
    if (!in || !out)
        die("cannot open", in ? argv[2] : argv[1]);
    struct cells cells = {0};
    char *rows = NULL, *further = NULL;
    size_t size = 0;
    FILE *body = open_memstream(&rows, &size);
    if (!body)
        die("no memory", argv[1]);
    long count = put_checks(body, in, &cells, &further);
    fclose(body);
    put_head(out, count + FIRST_ROW, further);
    free(further);
    fputs(rows, out);
    fputs("</table:table>\n<table:table table:name=\"data\">\n", out);
    put_data(out, &cells);
    fputs("</table:table>\n</office:spreadsheet>\n</office:body>\n</office:document>\n", out);
    free(rows);
    for (size_t i = 0; i < cells.count; i++)
        free(cells.cell[i].text);
    free(cells.cell);
    fclose(in);
    if (fclose(out) != 0)
        die("cannot write", argv[2]);
    printf("%ld\n", count);
    return 0;
}
