/* One item of a typed text: "P1 = 1 bar", "7 bar(g)", "P1, bar = 3". */
#include <stdio.h>
#include <string.h>

#include "headings.h"
#include "units.h"

struct item {
    const char *label, *figure; /* label_length 0: none written */
    size_t label_length, figure_length;
};

static bool starts_number(const char *text, size_t length)
{
    double number;
    size_t used;
    char first = length ? text[0] : '\0';
    bool sign = first == '-' || first == '+' || first == '.' || (unsigned char)first == 0xe2;
    return (gas_is_digit(first) || sign) && gas_number_parse(text, length, &number, &used);
}

/* At "=" or, behind a label, at ":"; else the figure stands first, or behind the last space that begins one. */
static struct item split_item(const char *text, size_t length)
{
    struct label label;
    const char *sign = memchr(text, '=', length);
    if (!sign && (sign = memchr(text, ':', length)) && !gas_label_parse(text, (size_t)(sign - text), &label))
        sign = NULL;
    if (sign) {
        size_t before = (size_t)(sign - text);
        return (struct item){text, sign + 1, before, length - before - 1};
    }
    if (starts_number(text, length))
        return (struct item){text, text, 0, length};
    for (size_t i = 1; i < length; i++)
        if (gas_is_space(text[i - 1]) && starts_number(text + i, length - i) && gas_label_parse(text, i, &label))
            return (struct item){text, text + i, i, length - i};
    return (struct item){text, text + length, length, 0};
}

static bool refuse_unit(struct gas_heading_fault *fault, const struct gas_unit_fault *unit)
{
    gas_heading_refuse(fault, GAS_HEADING_UNIT, unit->hint);
    fault->unit = *unit;
    return false;
}

static void set_text(struct gas_heading *heading, const char *text, size_t length)
{
    char name[GAS_HEADING_TEXT], whole[GAS_HEADING_TEXT + GAS_UNIT_TEXT + 3];
    while (length > 0 && gas_is_space(text[length - 1]))
        length--;
    gas_copy_text(name, sizeof name, text, length);
    snprintf(whole, sizeof whole, "%s%s%s", name, length > 0 && heading->has_unit ? ", " : "",
             heading->has_unit ? heading->unit.text : "");
    gas_copy_text(heading->text, sizeof heading->text, whole, strlen(whole));
}

/* A figure that begins well and is still none has spaces or commas between its digits. */
static const char *figure_hint(const struct item *item)
{
    size_t i = 0;
    while (i < item->figure_length && !gas_is_digit(item->figure[i]))
        i++;
    bool begins = i < item->figure_length && i < 3;
    return begins ? "write the figure without spaces or commas between groups of digits"
                  : "no figure stands here: write P1 = 1 bar or 7 bar(g)";
}

/* The figure without a unit behind it: its heading is all that stands on the left. */
static bool read_bare(const struct item *item, const struct gas_references *references, struct gas_heading *heading,
                      struct gas_heading_fault *fault)
{
    if (item->label_length == 0)
        return gas_heading_refuse(fault, GAS_HEADING_UNKNOWN,
                                  "a figure needs a unit or a symbol: 7 bar(g), P1 = 1 bar");
    return gas_heading_parse(item->label, item->label_length, references, heading, fault);
}

static bool read_with_unit(const struct item *item, const struct gas_unit *unit,
                           const struct gas_references *references, struct gas_heading *heading,
                           struct gas_heading_fault *fault)
{
    struct label label = {.quantity = NULL};
    bool labelled = item->label_length == 0 || gas_label_parse(item->label, item->label_length, &label);
    struct gas_heading left;
    if (!labelled && gas_heading_parse(item->label, item->label_length, references, &left, fault))
        return gas_heading_refuse(fault, GAS_HEADING_CONTRADICTION,
                                  "two units: give one, before the = or behind the figure");
    if (!labelled) {
        gas_heading_refuse(fault, GAS_HEADING_UNKNOWN, "");
        gas_label_nearest(item->label, item->label_length, fault->hint, sizeof fault->hint);
        return false;
    }
    if (!gas_heading_join(&label, item->label, item->label_length, unit, references, heading, fault))
        return false;
    set_text(heading, item->label, item->label_length);
    return true;
}

bool gas_given_parse(const char *text, size_t length, const struct gas_references *references,
                     struct gas_heading *heading, double *figure, struct gas_heading_fault *fault)
{
    size_t used;
    struct gas_unit unit;
    struct gas_unit_fault unit_fault;
    struct gas_heading_fault ignored = {.status = GAS_HEADING_OK};
    fault = fault ? fault : &ignored;
    gas_trim(&text, &length);
    if (length == 0)
        return gas_heading_refuse(fault, GAS_HEADING_EMPTY, "give a figure and its unit, such as 7 bar(g)");
    if (length >= GAS_HEADING_TEXT + GAS_UNIT_TEXT)
        return gas_heading_refuse(fault, GAS_HEADING_TOO_LONG, "items are separated by ;");
    struct item item = split_item(text, length);
    if (item.figure_length == 0 && gas_is_digit(text[0]))
        item = (struct item){text, text, 0, length};
    if (!gas_number_parse(item.figure, item.figure_length, figure, &used))
        return gas_heading_refuse(fault, GAS_HEADING_UNKNOWN, figure_hint(&item));
    if (used == item.figure_length)
        return read_bare(&item, references, heading, fault);
    if (!gas_unit_parse(item.figure + used, item.figure_length - used, references, &unit, &unit_fault))
        return refuse_unit(fault, &unit_fault);
    return read_with_unit(&item, &unit, references, heading, fault);
}
