/* Where the label of a heading ends and its unit begins; what both together mean. */
#include <stdio.h>
#include <string.h>

#include "headings.h"
#include "units.h"

struct piece {
    const char *text;
    size_t length;
};

struct attempt { /* the best answer so far */
    const struct gas_references *references;
    struct gas_heading heading;
    struct gas_heading_fault fault;
    bool tolerance; /* a plus-minus stood in front of the heading */
    int rank;       /* of the fault: the more of the heading was understood, the higher */
};

static struct piece piece_of(const char *text, size_t length)
{
    gas_trim(&text, &length);
    return (struct piece){text, length};
}

bool gas_heading_refuse(struct gas_heading_fault *fault, enum gas_heading_status status, const char *hint)
{
    *fault = (struct gas_heading_fault){.status = status};
    gas_copy_text(fault->hint, sizeof fault->hint, hint, strlen(hint));
    return false;
}

/* What a unit tells without a symbol. An energy may be work, heat or more: the caller knows. */
static enum gas_symbol symbol_of_dimension(enum gas_dimension dimension)
{
    static const struct reading told[] = {
        {GAS_DIM_PRESSURE, GAS_SYM_P, false},
        {GAS_DIM_TEMPERATURE, GAS_SYM_T, false},
        {GAS_DIM_VOLUME, GAS_SYM_V, false},
        {GAS_DIM_VOLUME_FLOW, GAS_SYM_V, false},
        {GAS_DIM_AMOUNT, GAS_SYM_N, false},
        {GAS_DIM_AMOUNT_FLOW, GAS_SYM_N, false},
        {GAS_DIM_MASS, GAS_SYM_M, false},
        {GAS_DIM_MASS_FLOW, GAS_SYM_M, false},
        {GAS_DIM_MOLAR_VOLUME, GAS_SYM_V_SPECIFIC, false},
        {GAS_DIM_SPECIFIC_VOLUME, GAS_SYM_V_SPECIFIC, false},
        {GAS_DIM_DENSITY, GAS_SYM_RHO, false},
        {GAS_DIM_CONCENTRATION, GAS_SYM_RHO, false},
        {GAS_DIM_MOLAR_MASS, GAS_SYM_M_MOLAR, false},
        {GAS_DIM_TIME, GAS_SYM_TIME, false},
        {GAS_DIM_AREA, GAS_SYM_AREA, false},
    };
    for (size_t i = 0; i < sizeof told / sizeof *told; i++)
        if (told[i].dimension == dimension)
            return told[i].symbol;
    return GAS_SYM_NONE;
}

static bool is_quantity_of_gases(enum gas_dimension dimension)
{
    return dimension != GAS_DIM_OTHER && dimension != GAS_DIM_LENGTH && dimension != GAS_DIM_SPEED;
}

/* The basis that the label says must be that of the unit, or becomes it: "Gauge pressure, bar". */
static bool settle_basis(const struct label *label, const struct gas_references *references, struct gas_unit *unit)
{
    static const char *const marks[] = {[GAS_ABSOLUTE] = "(a)", [GAS_GAUGE] = "(g)", [GAS_VACUUM] = " vac"};
    char text[GAS_UNIT_TEXT + 8];
    struct gas_unit marked;
    if (!label->has_basis)
        return true;
    if (unit->dimension != GAS_DIM_PRESSURE)
        return label->basis == GAS_ABSOLUTE && unit->dimension == GAS_DIM_TEMPERATURE && unit->offset == 0.0;
    if (label->basis == GAS_ABSOLUTE || unit->basis == label->basis)
        return unit->basis == label->basis;
    snprintf(text, sizeof text, "%s%s", unit->text, marks[label->basis]);
    if (!gas_unit_parse(text, strlen(text), references, &marked, NULL) || marked.basis != label->basis)
        return false; /* "bara" takes no second mark */
    *unit = marked;
    return true;
}

static bool refuse_contradiction(const struct label *label, struct piece text, const struct gas_unit *unit,
                                 struct gas_heading_fault *fault)
{
    char hint[300], name[GAS_HEADING_TEXT];
    if (!label->quantity && !label->has_basis) {
        snprintf(hint, sizeof hint, "%.40s is %s; name a quantity of the gas", unit->text,
                 gas_dimension_words(unit->dimension));
        return gas_heading_refuse(fault, GAS_HEADING_UNKNOWN, hint);
    }
    gas_copy_text(name, sizeof name, text.text, text.length);
    enum gas_dimension dimension = label->quantity ? label->quantity->bare : GAS_DIM_PRESSURE;
    if (label->quantity && dimension == unit->dimension)
        snprintf(hint, sizeof hint, "%.40s and %.40s name different pressures", name, unit->text);
    else if (dimension == GAS_DIM_DENSITY && unit->dimension == GAS_DIM_MOLAR_MASS)
        snprintf(hint, sizeof hint, "%.20s is a mass per amount: a molar mass, not a density", unit->text);
    else
        snprintf(hint, sizeof hint, "%.30s is %s, %.30s is %s", name,
                 dimension == GAS_DIM_OTHER ? "a flow" : gas_dimension_words(dimension), unit->text,
                 gas_dimension_words(unit->dimension));
    return gas_heading_refuse(fault, GAS_HEADING_CONTRADICTION, hint);
}

static bool read_symbol(const struct label *label, const struct gas_unit *unit, struct gas_heading *heading)
{
    if (!label->quantity) {
        heading->symbol = symbol_of_dimension(unit->dimension);
        return is_quantity_of_gases(unit->dimension);
    }
    if (label->tolerance && unit->dimension == GAS_DIM_NUMBER && unit->scale != 1) {
        heading->symbol = label->quantity->symbol; /* "±m, %": a share of the figure itself */
        return true;
    }
    for (const struct reading *reading = label->quantity->readings; reading->symbol != GAS_SYM_NONE; reading++)
        if (reading->dimension == unit->dimension && (!reading->reference_only || unit->reference_volume)) {
            heading->symbol = reading->symbol;
            return true;
        }
    return false;
}

bool gas_heading_join(const struct label *label, const char *label_text, size_t label_length,
                      const struct gas_unit *unit, const struct gas_references *references, struct gas_heading *heading,
                      struct gas_heading_fault *fault)
{
    struct piece text = piece_of(label_text, label_length);
    bool bare = label->quantity && label->quantity->bare != GAS_DIM_OTHER;
    *heading = (struct gas_heading){.state = label->has_state ? label->state : 0,
                                    .has_unit = unit != NULL,
                                    .tolerance = label->tolerance,
                                    .by_gas = label->by_gas,
                                    .on_gas = label->on_gas};
    if (label->has_state && (label->state < 1 || label->state > 9))
        return gas_heading_refuse(fault, GAS_HEADING_STATE, "states are numbered 1 to 9");
    if (label->by_gas && label->on_gas)
        return gas_heading_refuse(fault, GAS_HEADING_UNKNOWN, "work is counted on the gas or by the gas, not both");
    if (!unit && !bare)
        return gas_heading_refuse(fault, GAS_HEADING_UNKNOWN, "the unit must say what it is, such as kg/h or bar(g)");
    heading->unit = unit ? *unit : gas_unit_si(label->quantity->bare);
    if (unit && !read_symbol(label, unit, heading))
        return refuse_contradiction(label, text, unit, fault);
    if (!unit)
        heading->symbol = label->quantity->symbol;
    if (!settle_basis(label, references, &heading->unit))
        return refuse_contradiction(label, text, &heading->unit, fault);
    bool work = heading->symbol == GAS_SYM_W || heading->symbol == GAS_SYM_W_NET || heading->symbol == GAS_SYM_NONE;
    if ((label->by_gas || label->on_gas) && !work)
        return gas_heading_refuse(fault, GAS_HEADING_UNKNOWN, "only work is counted by the gas or on the gas");
    return true;
}

static bool keep_fault(struct attempt *attempt, int rank, const struct gas_heading_fault *fault)
{
    if (rank > attempt->rank) {
        attempt->rank = rank;
        attempt->fault = *fault;
    }
    return false;
}

/* "(kg/m3)" -> "kg/m3"; "(J)/(kg)" stays. */
static struct piece without_parentheses(struct piece text)
{
    int depth = 0;
    bool around = text.length > 2 && text.text[0] == '(' && text.text[text.length - 1] == ')';
    for (size_t i = 0; around && i + 1 < text.length; i++) {
        depth += (text.text[i] == '(') - (text.text[i] == ')');
        around = depth > 0;
    }
    return around ? piece_of(text.text + 1, text.length - 2) : text;
}

/* A label and a unit where a separator says so. */
static bool try_split(struct attempt *attempt, struct piece label_text, struct piece unit_text)
{
    struct label label;
    struct gas_unit unit;
    struct gas_heading_fault fault = {.status = GAS_HEADING_UNKNOWN};
    bool labelled = gas_label_parse(label_text.text, label_text.length, &label);
    label.tolerance |= attempt->tolerance;
    unit_text = without_parentheses(unit_text);
    if (!labelled) {
        gas_label_nearest(label_text.text, label_text.length, fault.hint, sizeof fault.hint);
        return keep_fault(attempt, 1, &fault);
    }
    if (!gas_unit_parse(unit_text.text, unit_text.length, attempt->references, &unit, &fault.unit)) {
        fault.status = GAS_HEADING_UNIT;
        gas_copy_text(fault.hint, sizeof fault.hint, fault.unit.hint, strlen(fault.unit.hint));
        return keep_fault(attempt, 2, &fault);
    }
    if (gas_heading_join(&label, label_text.text, label_text.length, &unit, attempt->references, &attempt->heading,
                         &fault))
        return true;
    return keep_fault(attempt, 3, &fault);
}

/* "Inlet pressure (psig)", "P1 [bar(g)]". */
static bool try_brackets(struct attempt *attempt, struct piece text)
{
    char close = text.length > 0 ? text.text[text.length - 1] : '\0';
    char open = close == ')' ? '(' : close == ']' ? '[' : '\0';
    int depth = 0;
    for (size_t i = text.length; open && i-- > 0;) {
        depth += (text.text[i] == close) - (text.text[i] == open);
        if (depth > 0)
            continue;
        struct piece unit = piece_of(text.text + i + 1, text.length - i - 2);
        struct piece label = piece_of(text.text, i);
        return label.length > 0 && try_split(attempt, label, unit);
    }
    return false;
}

static bool try_separators(struct attempt *attempt, struct piece text, const char *separators)
{
    for (size_t i = 1; i < text.length; i++)
        if (strchr(separators, text.text[i]) && text.text[i] &&
            try_split(attempt, piece_of(text.text, i), piece_of(text.text + i + 1, text.length - i - 1)))
            return true;
    return false;
}

static bool try_slash(struct attempt *attempt, struct piece text)
{
    const char *slash = memchr(text.text, '/', text.length);
    if (!slash)
        return false;
    size_t before = (size_t)(slash - text.text);
    return try_split(attempt, piece_of(text.text, before), piece_of(slash + 1, text.length - before - 1));
}

/* "T in K": the word "in" before a unit is no inlet. */
static struct piece without_in(struct piece label)
{
    size_t n = label.length;
    bool in = n > 3 && gas_is_space(label.text[n - 3]) && gas_lower(label.text[n - 2]) == 'i' &&
              gas_lower(label.text[n - 1]) == 'n';
    return in ? piece_of(label.text, n - 3) : label;
}

/* "Volume m3", "Inlet pressure bar (g)": the longest label that leaves a unit. */
static bool try_spaces(struct attempt *attempt, struct piece text)
{
    for (size_t i = text.length; i-- > 1;) {
        if (!gas_is_space(text.text[i]))
            continue;
        struct piece label = without_in(piece_of(text.text, i));
        struct piece unit = piece_of(text.text + i + 1, text.length - i - 1);
        struct attempt trial = *attempt;
        if (label.length > 0 && try_split(&trial, label, unit)) {
            *attempt = trial;
            return true;
        }
        bool one_word = !memchr(unit.text, ' ', unit.length) && !memchr(unit.text, ',', unit.length);
        if (trial.rank > attempt->rank && one_word) /* a space is no sure sign that a unit begins */
            *attempt = trial;
    }
    return false;
}

static bool whole_unit(struct attempt *attempt, struct piece text, struct gas_unit *unit,
                       struct gas_heading_fault *fault)
{
    const struct label none = {.quantity = NULL};
    return gas_unit_parse(text.text, text.length, attempt->references, unit, &fault->unit) &&
           is_quantity_of_gases(unit->dimension) &&
           gas_heading_join(&none, text.text, text.length, unit, attempt->references, &attempt->heading, fault);
}

/* A symbol with its state, or words, and no unit. "m3" and "MW" are units all the same. */
static bool try_label(struct attempt *attempt, struct piece text)
{
    struct label label;
    struct gas_unit unit;
    struct gas_heading_fault fault = {.status = GAS_HEADING_UNKNOWN};
    if (!gas_label_parse(text.text, text.length, &label))
        return false;
    if (text.length == 2 && whole_unit(attempt, text, &unit, &fault) &&
        (unit.dimension == GAS_DIM_VOLUME || unit.dimension == GAS_DIM_POWER))
        return true;
    if (gas_heading_join(&label, text.text, text.length, NULL, attempt->references, &attempt->heading, &fault))
        return true;
    return keep_fault(attempt, 2, &fault);
}

/* A unit with a slash that is a quantity of its own comes before "symbol / unit": m3/kg, kg/h; T/K and m/kg are not. */
static bool try_unit(struct attempt *attempt, struct piece text, bool any)
{
    struct gas_unit unit;
    struct gas_heading_fault fault = {.status = GAS_HEADING_UNKNOWN};
    return whole_unit(attempt, text, &unit, &fault) && (any || unit.dimension != GAS_DIM_NUMBER);
}

/* "kPaf" alone: what looks like a unit gets the fault of a unit. */
static void blame(struct attempt *attempt, struct piece text)
{
    struct gas_unit unit;
    struct gas_heading_fault fault = {.status = GAS_HEADING_UNIT};
    bool good = gas_unit_parse(text.text, text.length, attempt->references, &unit, &fault.unit);
    bool near = strstr(fault.unit.hint, " is meant") || fault.unit.status == GAS_UNIT_AMBIGUOUS ||
                fault.unit.status == GAS_UNIT_REFERENCE;
    if (good) {
        gas_heading_refuse(&fault, GAS_HEADING_UNKNOWN, "");
        snprintf(fault.hint, sizeof fault.hint, "%.40s is %s; name a quantity of the gas", unit.text,
                 gas_dimension_words(unit.dimension));
        keep_fault(attempt, 2, &fault);
    } else if (near) {
        gas_copy_text(fault.hint, sizeof fault.hint, fault.unit.hint, strlen(fault.unit.hint));
        keep_fault(attempt, attempt->rank == 1 ? 1 : 2, &fault);
    }
    if (attempt->rank == 0) {
        gas_heading_refuse(&fault, GAS_HEADING_UNKNOWN, "");
        gas_label_nearest(text.text, text.length, fault.hint, sizeof fault.hint);
        keep_fault(attempt, 1, &fault);
    }
}

static bool read_heading(struct attempt *attempt, struct piece text)
{
    bool good = try_brackets(attempt, text) || try_separators(attempt, text, ",;:") || try_label(attempt, text) ||
                try_unit(attempt, text, false) || try_slash(attempt, text) || try_spaces(attempt, text) ||
                try_unit(attempt, text, true);
    if (!good)
        blame(attempt, text);
    return good;
}

/* A plus-minus typed with a slash would look like a division. */
static struct piece without_sign(struct piece text, bool *tolerance)
{
    static const char *const signs[] = {"+/-", "+-", "\xc2\xb1"};
    *tolerance = false;
    for (size_t i = 0; i < sizeof signs / sizeof *signs; i++) {
        size_t length = strlen(signs[i]);
        if (text.length > length && memcmp(text.text, signs[i], length) == 0) {
            *tolerance = true;
            text = piece_of(text.text + length, text.length - length);
        }
    }
    while (*tolerance && text.length > 1 && text.text[0] == ',')
        text = piece_of(text.text + 1, text.length - 1);
    return text;
}

struct outcome {
    bool good;
    struct gas_heading heading;
    struct gas_heading_fault fault;
};
_Static_assert(sizeof(struct outcome) <= CACHE_VALUE, "a heading must fit into the cache");

static void parse_afresh(struct piece text, const struct gas_references *references, struct outcome *out)
{
    struct attempt attempt = {.references = references};
    struct piece rest = without_sign(text, &attempt.tolerance);
    /* a unit alone may stand in brackets of its own: "[bar(g)]" */
    if (rest.length > 2 && rest.text[0] == '[' && rest.text[rest.length - 1] == ']')
        rest = piece_of(rest.text + 1, rest.length - 2);
    rest = without_parentheses(rest);
    *out = (struct outcome){.good = rest.length > 0 && read_heading(&attempt, rest)};
    out->heading = attempt.heading;
    out->fault = attempt.fault;
    out->heading.tolerance |= attempt.tolerance;
    gas_copy_text(out->heading.text, sizeof out->heading.text, text.text, text.length);
    if (!out->good && out->fault.status == GAS_HEADING_OK)
        out->fault.status = GAS_HEADING_UNKNOWN;
}

bool gas_heading_parse(const char *text, size_t length, const struct gas_references *references,
                       struct gas_heading *heading, struct gas_heading_fault *fault)
{
    struct outcome out;
    struct gas_heading_fault ignored = {.status = GAS_HEADING_OK};
    const struct gas_references *used = references ? references : &gas_references_default;
    struct piece piece = piece_of(text, length);
    fault = fault ? fault : &ignored;
    if (piece.length == 0)
        return gas_heading_refuse(fault, GAS_HEADING_EMPTY, "name a quantity and its unit, such as P1, bar(g)");
    if (piece.length >= GAS_HEADING_TEXT)
        return gas_heading_refuse(fault, GAS_HEADING_TOO_LONG, "a heading has fewer than 80 characters");
    if (!gas_cache_get(&gas_heading_cache, piece.text, piece.length, used, &out, sizeof out)) {
        parse_afresh(piece, used, &out);
        gas_cache_put(&gas_heading_cache, piece.text, piece.length, used, &out, sizeof out);
    }
    if (out.good && heading)
        *heading = out.heading;
    if (!out.good)
        *fault = out.fault;
    return out.good;
}
