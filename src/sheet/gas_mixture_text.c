/* "N2 79 + O2 21", "79 % N2; 21 % O2", "1-butene 5 + carbon dioxide rest". */
#include "sheet/ascii.h"
#include "sheet/gas_mixture.h"

#include <string.h>

static struct gas_piece front(struct gas_piece text, size_t length)
{
    return (struct gas_piece){text.at, length};
}

static struct gas_piece behind(struct gas_piece text, size_t used)
{
    return (struct gas_piece){text.at + used, text.length - used};
}

/* The plus of an exponent, "1e+3", separates nothing. */
static bool separates(struct gas_piece text, size_t i)
{
    if (text.at[i] == ';' || text.at[i] == '\n')
        return true;
    if (text.at[i] != '+')
        return false;
    bool exponent = i >= 2 && i + 1 < text.length && (text.at[i - 1] == 'e' || text.at[i - 1] == 'E') &&
                    gas_ascii_digit(text.at[i - 2]) && gas_ascii_digit(text.at[i + 1]);
    return !exponent;
}

static struct gas_piece take_part(struct gas_piece *rest)
{
    size_t end = 0;
    while (end < rest->length && !separates(*rest, end))
        end++;
    struct gas_piece part = gas_piece_trim(front(*rest, end));
    *rest = behind(*rest, end < rest->length ? end + 1 : end);
    return part;
}

/* Could an amount begin here? Behind a space, '=', ':' or '('; so the digits of "CO2" and "1-butene" are no amounts. */
static bool may_begin(struct gas_piece text, size_t i)
{
    return i == 0 || ((unsigned char)text.at[i - 1] < 0x80 && strchr(" \t=:(", text.at[i - 1])) ||
           (unsigned char)text.at[i - 1] == 0xa0;
}

static struct gas_piece name_before(struct gas_piece part, size_t end)
{
    struct gas_piece name = gas_piece_trim(front(part, end));
    while (name.length && strchr("=:(", name.at[name.length - 1]))
        name = gas_piece_trim(front(name, name.length - 1));
    return name;
}

static bool amount_last(struct gas_piece part, struct gas_piece *name, struct gas_component *component,
                        struct gas_marks *marks)
{
    for (size_t i = 1; i < part.length; i++)
        if (may_begin(part, i) && gas_amount_read(behind(part, i), component, marks)) {
            *name = name_before(part, i);
            return name->length > 0;
        }
    return false;
}

static bool amount_first(struct gas_piece part, struct gas_piece *name, struct gas_component *component,
                         struct gas_marks *marks)
{
    size_t used;
    *marks = (struct gas_marks){0};
    *component = (struct gas_component){0};
    struct gas_piece rest = part;
    if (gas_piece_take(&rest, "rest") || gas_piece_take(&rest, "balance")) {
        component->rest = true;
        *name = rest;
        return rest.length > 0;
    }
    size_t token = 0; /* the figure ends at the first space: "5 1-butene" */
    while (token < part.length && !may_begin(part, token + 1))
        token++;
    if (!gas_number_parse(part.at, token, &component->amount, &used))
        return false;
    size_t marked = gas_marks_take(behind(part, used), marks);
    *name = gas_piece_trim(behind(part, used + marked));
    component->ppm = marks->ppm;
    return name->length && (marked || used == token || (unsigned char)part.at[used] == 0xc2);
}

/* A comma with a space behind it is no decimal comma. */
static bool has_comma_between(struct gas_piece text)
{
    for (size_t i = 1; i + 1 < text.length; i++)
        if (text.at[i] == ',' && text.at[i + 1] == ' ')
            return true;
    return false;
}

static bool refuse_part(struct gas_piece part, struct gas_refusal *refusal)
{
    char shown[80];
    double number;
    size_t used;
    gas_quoted(shown, sizeof shown, part.at, part.length);
    if (part.length == 0)
        return gas_refuse(refusal, "gas", "a part of the mixture is blank; write name and fraction, such as N2 79.");
    if (gas_refuse_blend(refusal, part))
        return false;
    if (has_comma_between(part))
        return gas_refuse(refusal, "gas", "%s has a comma between parts; write + there, such as N2 79 + O2 21.", shown);
    if (gas_name_find(part.at, part.length))
        return gas_refuse(refusal, "gas", "%s has no fraction; write one behind the name, or \"rest\".", shown);
    if (gas_number_parse(part.at, part.length, &number, &used) && used == part.length)
        return gas_refuse(refusal, "gas", "%s has no name; write name and fraction, such as N2 79.", shown);
    return gas_refuse(refusal, "gas", "%s cannot be read as name and fraction; write parts such as N2 79.", shown);
}

static bool read_part(struct gas_recipe *recipe, struct gas_piece part, struct gas_refusal *refusal)
{
    struct gas_component component;
    struct gas_marks marks;
    struct gas_piece name;
    bool split = amount_last(part, &name, &component, &marks) && gas_name_find(name.at, name.length);
    if (!split && gas_name_find(part.at, part.length)) /* "R 22" is a name, not 22 parts of R; "H2O 2" is water */
        return refuse_part(part, refusal);
    if (!amount_last(part, &name, &component, &marks) && !amount_first(part, &name, &component, &marks))
        return refuse_part(part, refusal);
    return gas_recipe_add(recipe, name, component, &marks, refusal);
}

/* One part alone, "N2 100 %": read as a mixture so that its figure is checked. */
static bool has_amount(struct gas_piece text)
{
    struct gas_component component;
    struct gas_marks marks;
    struct gas_piece name;
    return (amount_last(text, &name, &component, &marks) || amount_first(text, &name, &component, &marks)) &&
           gas_name_find(name.at, name.length);
}

/* "O2 + N2": gases, and no figure anywhere. */
static bool only_names(struct gas_piece text)
{
    size_t parts = 0;
    while (text.length) {
        struct gas_piece part = take_part(&text);
        if (part.length && (!gas_name_find(part.at, part.length) || has_amount(part)))
            return false;
        parts += part.length > 0;
    }
    return parts > 1;
}

static bool read_mixture(struct gas_draft *draft, struct gas_piece text)
{
    struct gas_recipe recipe = {0};
    struct gas_piece rest = text;
    char shown[80];
    if (only_names(text))
        return gas_refuse(draft->refusal, "gas",
                          "%s names gases without their fractions; write one behind each name, such as N2 79 + O2 21.",
                          gas_quoted(shown, sizeof shown, text.at, text.length));
    while (rest.length) {
        struct gas_piece part = take_part(&rest);
        bool plus_follows = rest.at[-1] == '+';
        if (part.length == 0 && !plus_follows) /* an empty line, a ';' at the end */
            continue;
        if (!read_part(&recipe, part, draft->refusal))
            return false;
        if (plus_follows && rest.length == 0)
            return refuse_part(rest, draft->refusal);
    }
    return gas_recipe_finish(&recipe, draft);
}

bool gas_draft_text(struct gas_draft *draft, struct gas_piece text)
{
    if (gas_name_find(text.at, text.length))
        return gas_draft_name(draft, text);
    if (gas_refuse_blend(draft->refusal, text))
        return false;
    for (size_t i = 0; i < text.length; i++)
        if (separates(text, i))
            return read_mixture(draft, text);
    if (has_amount(text))
        return read_mixture(draft, text);
    return has_comma_between(text) ? refuse_part(text, draft->refusal) : gas_draft_name(draft, text);
}
