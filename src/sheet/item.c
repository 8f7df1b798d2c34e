#include "sheet/item.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#include <gasleaf/state.h>

#include "sheet/piece.h"

static bool is_words(struct gas_piece piece, const char *words)
{
    piece = gas_piece_trim(piece);
    return gas_piece_take(&piece, words) && piece.length == 0;
}

bool gas_word_constant(const char *text, size_t length)
{
    struct gas_piece piece = gas_piece_trim((struct gas_piece){text, length});
    if (piece.length > 1 && piece.at[piece.length - 1] == '.')
        piece.length--;
    return is_words(piece, "constant") || is_words(piece, "const");
}

/* -- the same in every state --------------------------------------------------------------------------------------- */

/* The quantity that a process keeps; NULL: no such word. An adiabatic change keeps s only when it is reversible too. */
static const char *kept_by(struct gas_piece piece)
{
    static const char *const processes[][2] = {{"isothermal", "T"}, {"isobaric", "P"},     {"isochoric", "V"},
                                               {"rigid", "V"},      {"rigid vessel", "V"}, {"isentropic", "s"}};
    for (size_t i = 0; i < sizeof processes / sizeof *processes; i++)
        if (is_words(piece, processes[i][0]))
            return processes[i][1];
    return NULL;
}

/* What stands before or after the word: "T = constant", "V const.", "constant T". */
static bool name_of_constant(struct gas_piece piece, struct gas_piece *name)
{
    const char *kept = kept_by(piece);
    if (kept) {
        *name = (struct gas_piece){kept, strlen(kept)};
        return true;
    }
    *name = piece;
    if (gas_piece_take(name, "constant"))
        return name->length > 0;
    for (size_t i = piece.length; i-- > 1;) {
        if (!strchr(" =:", piece.at[i - 1]) || !gas_word_constant(piece.at + i, piece.length - i))
            continue;
        *name = gas_piece_front(piece, i);
        if (name->length && strchr("=:", name->at[name->length - 1]))
            *name = gas_piece_front(*name, name->length - 1);
        return name->length > 0;
    }
    return false;
}

static bool read_constant(struct gas_piece piece, struct gas_piece name, const struct gas_references *references,
                          const char *what, struct gas_item *item, struct gas_refusal *refusal)
{
    struct gas_heading_fault fault;
    struct gas_heading *heading = &item->heading[0];
    char shown[80];
    if (!gas_heading_parse(name.at, name.length, references, heading, &fault))
        return gas_refuse_heading(refusal, what, name.at, name.length, &fault);
    if (heading->state != 0)
        return gas_refuse(refusal, what, "%s names one state; what is constant is so in all, write \"%s constant\".",
                          gas_quoted(shown, sizeof shown, piece.at, piece.length), gas_symbol_text(heading->symbol));
    heading->state = GAS_CONSTANT;
    snprintf(heading->text, sizeof heading->text, "%s constant", gas_symbol_text(heading->symbol));
    item->count = 1;
    item->figure[0] = NAN;
    return true;
}

/* "T2 = T1" says what "T constant" says, for two states. */
static bool refuse_equation(struct gas_piece piece, const struct gas_references *references, const char *what,
                            struct gas_refusal *refusal)
{
    struct gas_heading left, right;
    const char *sign = memchr(piece.at, '=', piece.length);
    size_t before = sign ? (size_t)(sign - piece.at) : 0;
    char shown[80];
    if (!sign || !gas_heading_parse(piece.at, before, references, &left, NULL) ||
        !gas_heading_parse(sign + 1, piece.length - before - 1, references, &right, NULL) || left.has_unit ||
        right.has_unit || left.symbol != right.symbol)
        return true;
    return gas_refuse(refusal, what, "%s is an equation; where it is the same in every state write \"%s constant\".",
                      gas_quoted(shown, sizeof shown, piece.at, piece.length), gas_symbol_text(left.symbol));
}

/* -- figures ------------------------------------------------------------------------------------------------------- */

static bool read_figure(struct gas_piece piece, const struct gas_references *references, const char *what,
                        struct gas_item *item, struct gas_refusal *refusal)
{
    struct gas_heading_fault fault;
    if (gas_given_parse(piece.at, piece.length, references, &item->heading[item->count], &item->figure[item->count],
                        &fault)) {
        item->count++;
        return true;
    }
    return refuse_equation(piece, references, what, refusal) &&
           gas_refuse_heading(refusal, what, piece.at, piece.length, &fault);
}

/* Bytes of a plus-minus sign. */
static size_t sign_bytes(const char *at, size_t length)
{
    static const char *const signs[] = {"\u00b1", "+/-", "+-"};
    for (size_t i = 0; i < sizeof signs / sizeof *signs; i++)
        if (length >= strlen(signs[i]) && memcmp(at, signs[i], strlen(signs[i])) == 0)
            return strlen(signs[i]);
    return 0;
}

/* Where a plus-minus stands behind a figure; 0: nowhere. In front of the figure it belongs to the name: "P1 ± = 1". */
static size_t find_sign(struct gas_piece piece)
{
    bool figure = false;
    for (size_t i = 0; i < piece.length; i++) {
        figure = figure || piece.at[i] == '=' || piece.at[i] == ':' || (i == 0 && strchr("+-.0123456789", piece.at[0]));
        if (i > 0 && figure && sign_bytes(piece.at + i, piece.length - i))
            return i;
    }
    return 0;
}

/* The name in front of "=", empty when the figure stands alone. */
static struct gas_piece name_before(struct gas_piece piece)
{
    for (size_t i = 0; i < piece.length; i++)
        if (piece.at[i] == '=' || piece.at[i] == ':')
            return gas_piece_front(piece, i);
    return (struct gas_piece){piece.at, 0};
}

static struct gas_piece after_name(struct gas_piece piece)
{
    size_t i = strcspn(piece.at, "=:") + 1;
    return i < piece.length ? (struct gas_piece){piece.at + i, piece.length - i} : (struct gas_piece){piece.at, 0};
}

/* "P1 = 7" and "0.05 bar(g)": the unit at the end belongs to both. "P1 = 7 bar(g)" and "1 %": each has its own. */
static bool read_plus_minus(struct gas_piece first, struct gas_piece second, const struct gas_references *references,
                            const char *what, struct gas_item *item, struct gas_refusal *refusal)
{
    char text[2 * GAS_HEADING_TEXT];
    double spread, ignored;
    size_t used, taken;
    struct gas_piece name = name_before(first);
    if (!gas_number_parse(second.at, second.length, &spread, &used))
        return gas_refuse(refusal, what, "a plus-minus sign needs a figure behind it, such as \"P1 = 7 ± 0.05 bar\".");
    struct gas_piece unit = gas_piece_behind(second, used);
    struct gas_piece figure = gas_piece_trim(name.length ? after_name(first) : first);
    bool bare = gas_number_parse(figure.at, figure.length, &ignored, &taken) && taken == figure.length;
    snprintf(text, sizeof text, "%.*s%s%.*s", (int)first.length, first.at, bare && unit.length ? " " : "",
             bare ? (int)unit.length : 0, unit.at);
    if (!read_figure((struct gas_piece){text, strlen(text)}, references, what, item, refusal))
        return false;
    if (unit.length == 0) /* "P1 = 7 bar ± 0.05": in the unit of the figure */
        unit = (struct gas_piece){item->heading[0].unit.text, strlen(item->heading[0].unit.text)};
    const struct gas_heading *heading = &item->heading[0];
    char symbol[GAS_HEADING_TEXT];
    snprintf(symbol, sizeof symbol, "%.*s", (int)name.length, name.at);
    if (name.length == 0)
        snprintf(symbol, sizeof symbol, "%s", gas_symbol_text(heading->symbol));
    snprintf(text, sizeof text, "±%.60s = %.*s %.*s", symbol, (int)gas_piece_front(second, used).length, second.at,
             (int)unit.length, unit.at);
    if (!read_figure((struct gas_piece){text, strlen(text)}, references, what, item, refusal))
        return false;
    item->heading[1].tolerance = true;
    return true;
}

bool gas_item_read(const char *text, size_t length, const struct gas_references *references, const char *what,
                   struct gas_item *item, struct gas_refusal *refusal)
{
    struct gas_piece piece = gas_piece_trim((struct gas_piece){text, length}), name;
    item->count = 0;
    if (name_of_constant(piece, &name))
        return read_constant(piece, name, references, what, item, refusal);
    size_t sign = piece.length < 2 * GAS_HEADING_TEXT - 10 ? find_sign(piece) : 0;
    if (sign == 0)
        return read_figure(piece, references, what, item, refusal);
    size_t bytes = sign_bytes(piece.at + sign, piece.length - sign);
    return read_plus_minus(gas_piece_front(piece, sign), gas_piece_behind(piece, sign + bytes), references, what, item,
                           refusal);
}
