#include "audit/verdict.h"

#include <math.h>
#include <stdarg.h>
#include <stdio.h>
#include <string.h>

/* A text being written; what does not fit is left out. */
struct writer {
    char *at;
    size_t room;
};

__attribute__((format(printf, 2, 3))) static void write_words(struct writer *writer, const char *format, ...)
{
    va_list arguments;
    va_start(arguments, format);
    int length = vsnprintf(writer->at, writer->room, format, arguments);
    va_end(arguments);
    size_t used = length < 0 ? 0 : (size_t)length < writer->room ? (size_t)length : writer->room - 1;
    writer->at += used;
    writer->room -= used;
}

const char *verdict_word(enum audit_status status)
{
    static const char *const words[] = {"refused", "no figure", "agrees", "rounding", "explained", "differs"};
    return words[status];
}

double verdict_deviation(const struct audited *row)
{
    return row->truth == 0 ? NAN : 100 * (row->legacy.figure - row->truth) / fabs(row->truth);
}

void verdict_slips(struct audit *audit, size_t index, const struct explanation *explanation, char *buffer, size_t size)
{
    struct desk_case truth;
    struct gas_refusal refusal = {.made = true};
    struct writer writer = {buffer, size};
    buffer[0] = '\0';
    if (!desk_read(audit->desk, index, &truth, &refusal))
        return;
    for (size_t i = 0; i < TOGETHER && explanation->part[i] >= 0; i++) {
        char words[200];
        slip_words(audit->desk, &truth, &audit->instance[explanation->part[i]], explanation->everywhere, words,
                   sizeof words);
        write_words(&writer, "%s%s", i ? " and " : "", words);
    }
}

static int shown_digits(const struct audited *row)
{
    return row->legacy.digits < 5 || row->legacy.figure == 0 ? 5 : row->legacy.digits;
}

static void write_figure(struct writer *writer, const struct audited *row, double figure)
{
    char text[40];
    gas_number_format(text, sizeof text, figure, shown_digits(row));
    write_words(writer, "%s", text);
}

static void write_unit(struct writer *writer, const struct audit *audit)
{
    const struct gas_heading *heading = &audit->desk->job->wanted.heading[0];
    if (heading->unit.text[0] && heading->unit.dimension != GAS_DIM_NUMBER)
        write_words(writer, " %s", heading->unit.text);
}

static void write_explanations(struct writer *writer, struct audit *audit, size_t index)
{
    const struct audited *row = &audit->row[index];
    for (size_t i = 0; i < row->count; i++) {
        char words[320];
        verdict_slips(audit, index, &row->explanation[i], words, sizeof words);
        write_words(writer, "%s%s%s (gives ",
                    i == 0   ? ""
                    : i == 1 ? ". Or: "
                             : "; ",
                    words, row->explanation[i].everywhere ? ", in every row that differs" : "");
        write_figure(writer, row, row->explanation[i].figure);
        write_words(writer, ")");
    }
    write_words(writer, ".");
}

static void write_pair(struct writer *writer, const struct audit *audit, const struct audited *row)
{
    write_figure(writer, row, row->legacy.figure);
    write_words(writer, " against ");
    write_figure(writer, row, row->truth);
    write_unit(writer, audit);
}

static void write_difference(struct writer *writer, const struct audit *audit, const struct audited *row)
{
    char percent[40];
    double deviation = verdict_deviation(row);
    gas_number_format(percent, sizeof percent, deviation, 3);
    if (isnan(deviation) || fabs(deviation) > 1e5)
        write_words(writer, "differs: ");
    else
        write_words(writer, "differs by %s%s %%: ", deviation > 0 ? "+" : "", percent);
    write_pair(writer, audit, row);
    write_words(writer, ". ");
}

static void write_agreement(struct writer *writer, const struct audit *audit, const struct audited *row)
{
    write_words(writer, "agrees: ");
    write_figure(writer, row, row->truth);
    write_unit(writer, audit);
    if (row->legacy.digits == 1)
        write_words(writer, " (within its own digit)");
    else
        write_words(writer, " (within its own %d digits)", row->legacy.digits);
}

void verdict_text(struct audit *audit, size_t index, char *buffer, size_t size)
{
    const struct audited *row = &audit->row[index];
    struct writer writer = {buffer, size};
    buffer[0] = '\0';
    switch (row->status) {
    case AUDIT_REFUSED:
        write_words(&writer, "%s", row->refusal ? row->refusal : "Check given: there is not enough memory for it.");
        break;
    case AUDIT_BLANK:
        write_words(&writer, "no figure to check");
        break;
    case AUDIT_AGREES:
        write_agreement(&writer, audit, row);
        break;
    case AUDIT_ROUNDING:
        write_words(&writer, "rounded constant, not an error: ");
        write_pair(&writer, audit, row);
        write_words(&writer, ": ");
        write_explanations(&writer, audit, index);
        break;
    case AUDIT_EXPLAINED:
        write_difference(&writer, audit, row);
        write_words(&writer, row->explanation[0].part[1] < 0 ? "Likely: " : "Possibly, together: ");
        write_explanations(&writer, audit, index);
        break;
    case AUDIT_DIFFERS:
        write_difference(&writer, audit, row);
        write_words(&writer, "No known slip gives this figure.");
        break;
    }
}
