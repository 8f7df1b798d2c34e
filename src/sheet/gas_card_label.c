/* What the label of a card's row means, read forgivingly. */
#include "sheet/gas_card.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

/* clang-format off */
static const struct {
    enum gas_card_item item;
    const char *labels; /* folded */
} known[] = {
    {GAS_CARD_NAME,     "name|gas|gasname|substance|species|compound|fluid"},
    {GAS_CARD_FORMULA,  "formula|chemicalformula"},
    {GAS_CARD_CAS,      "cas|casnumber|casno|casrn"},
    {GAS_CARD_M,        "m|mw|mm|mr|molarmass|molmass|molecularmass|molecularweight|molweight|molwt|relativemolarmass|"
                        "relativemolecularmass|molarweight"},
    {GAS_CARD_FORM,     "form|cpform|formofcp|heatcapacityform|formofheatcapacity|heatcapacity|equation|cpequation|"
                        "heatcapacityequation|equationform|cpmodel"},
    {GAS_CARD_CP_UNIT,  "cpunit|cpunits|unitofcp|unitsofcp|unit|units|cpin|heatcapacityunit|heatcapacityin|constantsunit|"
                        "enthalpyunit|hunit|unitofh|hin"},
    {GAS_CARD_T_UNIT,   "tunit|tunits|unitoft|tin|t|temperature|temperatureunit|unitoftemperature|temperaturein|temp|tempunit"},
    {GAS_CARD_FROM,     "from|tfrom|tmin|tlow|tlower|lowert|lowertemperature|mint|minimumt|minimumtemperature|"
                        "temperaturefrom|validfrom|rangefrom|fromt|lowerlimit|lowest"},
    {GAS_CARD_TO,       "to|tto|tmax|thigh|tupper|uppert|uppertemperature|maxt|maximumt|maximumtemperature|"
                        "temperatureto|validto|rangeto|tot|upperlimit|highest"},
    {GAS_CARD_RANGE,    "range|trange|temperaturerange|validity|validrange"},
    {GAS_CARD_R,        "r|gasconstant|rspecific|specificgasconstant|universalgasconstant|ru"},
    {GAS_CARD_R_OF_FIT, "roffit|rfit|rofthefit|rofform|fitr"},
    {GAS_CARD_CP,       "cp|cpconstant|constantcp|cp(t)"},
    {GAS_CARD_K,        "k|gamma|kappa|cp/cv|ratioofheatcapacities|heatcapacityratio|isentropicexponent|\u03b3|\u03ba"},
    {GAS_CARD_RULE,     "rule|rules"},
    {GAS_CARD_SOURCE,   "source|sources|reference|references|ref|fromsource|datasource"},
    {GAS_CARD_CP_AT_25, "cpat25°c"},
    {GAS_CARD_REMARK,   "label|item|quantity|property|constant|constants|note|notes|remark|remarks|comment|comments|date|"
                        "checked|checkedby|by|madeby|revision|interval|intervals|"
                        "cpat25°c,permass|cvat25°c|gammaat25°c|datafrom|datato|noteoncp|tc|criticaltemperature|pc|"
                        "criticalpressure|omega|acentricfactor|boilingpoint|dipolemoment"},
};
/* clang-format on */

static enum gas_card_item item_of(const char *folded)
{
    for (size_t i = 0; i < sizeof known / sizeof *known; i++)
        if (gas_listed(folded, known[i].labels))
            return known[i].item;
    return GAS_CARD_UNKNOWN;
}

/* "10^3", "1000", "1e-5" at the front of a folded text; the bytes used, 0 when there is no number. */
static size_t read_multiplier(const char *text, double *number)
{
    size_t used = strspn(text, "0123456789");
    char *end;
    if (used == 0 || used > 6)
        return 0;
    double base = (double)strtol(text, NULL, 10);
    if (text[used] != '^' && text[used] != 'e') {
        *number = base;
        return used;
    }
    long power = strtol(text + used + 1, &end, 10);
    if (end == text + used + 1 || labs(power) > 30)
        return 0;
    *number = text[used] == '^' ? pow(base, (double)power) : base * pow(10, (double)power);
    return (size_t)(end - text);
}

/* Letters and figures such as a, b1, theta2, cp0, cpinf. */
static bool is_constant_name(const char *name)
{
    static const char *const words[] = {"theta", "th", "cp", NULL};
    size_t letters = strspn(name, "abcdefghijklmnopqrstuvwxyz"), digits = strspn(name + letters, "0123456789");
    if (name[letters + digits] || letters == 0 || digits > 2)
        return false;
    if (letters == 1 || gas_listed(name, "cpinf|cinf"))
        return true;
    for (const char *const *word = words; *word; word++)
        if (strlen(*word) == letters && memcmp(name, *word, letters) == 0)
            return digits > 0;
    return false;
}

/* "10^3 B" and "B x 10^3" print 1000 times the constant; "B/10^-3" prints it divided by 10^-3. */
static bool read_constant(char *folded, struct gas_card_label *label)
{
    double number = 1;
    char *name = folded, *mark;
    size_t used = read_multiplier(folded, &number);
    label->factor = 1;
    if (used) {
        name = folded + used;
        name += *name == '*' || (*name == 'x' && name[1]);
        label->factor = 1 / number;
    } else if ((mark = strpbrk(folded, "*x/")) && mark > folded && strpbrk(mark + 1, "0123456789") == mark + 1) {
        bool divided = *mark == '/';
        used = read_multiplier(mark + 1, &number);
        if (used == 0 || mark[1 + used] || (divided && number < 1e-30))
            return false;
        label->factor = divided ? number : 1 / number;
        *mark = '\0';
    }
    if (!(number > 0) || !is_constant_name(name) || strlen(name) >= sizeof label->constant)
        return false;
    snprintf(label->constant, sizeof label->constant, "%s", name);
    return true;
}

/* "M, g/mol", "from (K)": the label in front of a unit. */
static struct gas_piece without_unit(struct gas_piece text, struct gas_piece *unit)
{
    size_t cut = 0;
    while (cut < text.length && !(text.at[cut] && strchr("([,", text.at[cut])))
        cut++;
    if (cut == 0 || cut == text.length)
        return text;
    *unit = gas_piece_behind(text, cut + 1);
    if (text.at[cut] != ',' && unit->length && strchr(")]", unit->at[unit->length - 1]))
        unit->length--;
    return gas_piece_front(text, cut);
}

/* "x methane" and "w methane": the mole and the mass fraction of a component. */
static bool read_part(struct gas_piece text, struct gas_card_label *label)
{
    bool mole = gas_piece_take(&text, "x");
    if ((!mole && !gas_piece_take(&text, "w")) || !gas_name_find(text.at, text.length))
        return false;
    label->item = mole ? GAS_CARD_MOLE_PART : GAS_CARD_MASS_PART;
    label->part = text;
    return true;
}

struct gas_card_label gas_card_label_read(struct gas_piece text)
{
    struct gas_card_label label = {.factor = 1};
    char folded[GAS_CARD_LABEL];
    text = gas_piece_trim(text);
    for (int part = 0; part < 2; part++) {
        snprintf(label.letter, sizeof label.letter, "%.*s", (int)text.length, text.at);
        label.item = item_of(gas_fold(folded, sizeof folded, text));
        if (label.item == GAS_CARD_UNKNOWN && gas_listed(folded, "cp(inf)|cp(0)"))
            snprintf(folded, sizeof folded, "%s", folded[3] == '0' ? "cp0" : "cpinf");
        if (label.item == GAS_CARD_UNKNOWN && read_constant(folded, &label))
            label.item = GAS_CARD_CONSTANT;
        else if (label.item == GAS_CARD_UNKNOWN)
            read_part(text, &label);
        if (label.item != GAS_CARD_UNKNOWN)
            return label;
        text = without_unit(text, &label.unit);
    }
    return label;
}
