/* What stands beside the fraction of a component: percent signs, basis, the rest. */
#include "sheet/ascii.h"
#include "sheet/gas_mixture.h"

#include <math.h>
#include <string.h>

static const struct mark {
    const char *text; /* lower case; longer ones before their beginnings */
    struct gas_marks says;
} known[] = {
    {"%", {.percent = true}},
    {"per cent", {.percent = true}},
    {"percent", {.percent = true}},
    {"pct", {.percent = true}},
    {"ppmv", {.ppm = true, .basis = GAS_BASIS_MOLE}},
    {"ppmw", {.ppm = true, .basis = GAS_BASIS_MASS}},
    {"ppm", {.ppm = true}},
    {"weight", {.basis = GAS_BASIS_MASS}},
    {"wt", {.basis = GAS_BASIS_MASS}},
    {"w/w", {.basis = GAS_BASIS_MASS}},
    {"m/m", {.basis = GAS_BASIS_MASS}},
    {"kg/kg", {.basis = GAS_BASIS_MASS}},
    {"g/g", {.basis = GAS_BASIS_MASS}},
    {"mass", {.basis = GAS_BASIS_MASS}},
    {"mol/mol", {.basis = GAS_BASIS_MOLE}},
    {"moles", {.basis = GAS_BASIS_MOLE}},
    {"mole", {.basis = GAS_BASIS_MOLE}},
    {"molar", {.basis = GAS_BASIS_MOLE}},
    {"mol", {.basis = GAS_BASIS_MOLE}},
    {"volume", {.basis = GAS_BASIS_MOLE}},
    {"vol", {.basis = GAS_BASIS_MOLE}},
    {"v/v", {.basis = GAS_BASIS_MOLE}},
    {"by", {0}},
    {"of", {0}},
    {"fractions", {0}},
    {"fraction", {0}},
};

/* Between marks: "wt.-%", "(wt %)". */
static size_t filler(struct gas_piece text)
{
    if (text.length >= 2 && memcmp(text.at, "\u00a0", 2) == 0)
        return 2;
    return text.length && text.at[0] && strchr(" \t()[].", text.at[0]) ? 1 : 0;
}

static bool starts(struct gas_piece text, const char *mark)
{
    size_t length = strlen(mark);
    if (text.length < length)
        return false;
    for (size_t i = 0; i < length; i++)
        if (gas_ascii_lower(text.at[i]) != mark[i])
            return false;
    bool word = gas_ascii_letter(mark[length - 1]);
    return !word || text.length == length || !(gas_ascii_letter(text.at[length]) || gas_ascii_digit(text.at[length]));
}

static size_t one_mark(struct gas_piece text, struct gas_marks *marks)
{
    for (size_t i = 0; i < sizeof known / sizeof *known; i++) {
        const struct gas_marks *says = &known[i].says;
        if (!starts(text, known[i].text))
            continue;
        marks->contradiction |= says->basis && marks->basis && says->basis != marks->basis;
        marks->basis = says->basis ? says->basis : marks->basis;
        marks->percent |= says->percent;
        marks->ppm |= says->ppm;
        return strlen(known[i].text);
    }
    return 0;
}

size_t gas_marks_take(struct gas_piece text, struct gas_marks *marks)
{
    size_t used = 0, taken = 0;
    while (used < text.length) {
        struct gas_piece rest = {text.at + used, text.length - used};
        size_t bytes = one_mark(rest, marks);
        if (bytes)
            taken = used + bytes;
        else if (taken && rest.at[0] == '-') /* "wt-%" */
            bytes = 1;
        else
            bytes = filler(rest);
        if (bytes == 0)
            break;
        used += bytes;
    }
    return used == text.length ? used : taken;
}

bool gas_marks_read(struct gas_piece text, struct gas_marks *marks)
{
    return gas_marks_take(text, marks) == text.length;
}

static bool means_rest(struct gas_piece text)
{
    static const char *const words[] = {"rest", "the rest", "balance", "bal", "bal.", "remainder"};
    for (size_t i = 0; i < sizeof words / sizeof *words; i++)
        if (strlen(words[i]) == text.length && starts(text, words[i]))
            return true;
    return false;
}

bool gas_amount_read(struct gas_piece text, struct gas_component *component, struct gas_marks *marks)
{
    size_t used;
    *marks = (struct gas_marks){0};
    *component = (struct gas_component){.rest = means_rest(text)};
    if (component->rest)
        return true;
    if (!gas_number_parse(text.at, text.length, &component->amount, &used))
        return false;
    bool good = gas_marks_read((struct gas_piece){text.at + used, text.length - used}, marks);
    component->ppm = marks->ppm;
    return good;
}
