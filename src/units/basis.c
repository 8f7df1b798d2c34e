/* Gauge, absolute and vacuum: the marks behind a pressure unit. */
#include <string.h>

#include "units.h"

enum mark_kind { MARK_ABSOLUTE = GAS_ABSOLUTE, MARK_GAUGE = GAS_GAUGE, MARK_VACUUM = GAS_VACUUM, MARK_DIFFERENCE };

struct mark {
    const char *word;
    enum mark_kind kind;
    bool glued; /* may stand at the end of the name itself: barg, psia */
};

/* clang-format off */
static const struct mark marks[] = { /* longest first */
    {"differential", MARK_DIFFERENCE, false}, {"absolute", MARK_ABSOLUTE, false}, {"vacuum", MARK_VACUUM, false},
    {"gauge", MARK_GAUGE, false}, {"gage", MARK_GAUGE, false}, {"diff", MARK_DIFFERENCE, false},
    {"abs", MARK_ABSOLUTE, true}, {"vac", MARK_VACUUM, true}, {"ga", MARK_GAUGE, true},
    {"g", MARK_GAUGE, true}, {"a", MARK_ABSOLUTE, true}, {"v", MARK_VACUUM, false}, {"d", MARK_DIFFERENCE, true},
};
/* clang-format on */

/* Where the stem ends when the text ends with this mark, else 0. `sure`: brackets or a whole word of several letters,
 * which can mean nothing else. */
static size_t stem_length(const char *plain, size_t length, const struct mark *mark, bool *sure)
{
    size_t word = strlen(mark->word);
    bool bracket = length > 0 && plain[length - 1] == ')';
    size_t end = bracket ? length - 1 : length;
    while (bracket && end > 0 && gas_is_space(plain[end - 1]))
        end--;
    if (end <= word || !gas_same_folded(plain + end - word, mark->word, word))
        return 0;
    size_t stem = end - word;
    while (bracket && stem > 0 && gas_is_space(plain[stem - 1]))
        stem--;
    bool opened = bracket && stem > 0 && plain[stem - 1] == '(';
    bool apart = !bracket && (!gas_is_letter(plain[stem - 1]) || plain[stem - 1] == '_');
    if (bracket ? !opened : !(apart || mark->glued))
        return 0;
    stem -= opened;
    while (stem > 0 && (gas_is_space(plain[stem - 1]) || plain[stem - 1] == '_' || plain[stem - 1] == '-'))
        stem--;
    *sure = bracket || (apart && word > 2);
    return stem > 0 && !strchr("/*^(", plain[stem - 1]) ? stem : 0;
}

static bool parse_plain(const char *plain, const struct gas_references *references, struct gas_unit *unit,
                        struct gas_unit_fault *fault)
{
    struct unit_product product = {.number = 1.0};
    return gas_product_parse(plain, &product, fault) && gas_engine_resolve(&product, references, unit, fault);
}

static bool marked(const struct mark *mark, const char *plain, struct gas_unit *unit, struct gas_unit_fault *fault)
{
    if (mark->kind == MARK_DIFFERENCE)
        return gas_unit_refuse(
            fault, GAS_UNIT_AMBIGUOUS, plain, strlen(plain),
            "a pressure difference has no barometer in it: write the unit alone where a drop is asked");
    unit->basis = (enum gas_pressure_basis)mark->kind;
    return true;
}

bool gas_basis_parse(const char *plain, const struct gas_references *references, struct gas_unit *unit,
                     struct gas_unit_fault *fault)
{
    size_t length = strlen(plain);
    char stem[PLAIN_TEXT];
    for (size_t i = 0; i < sizeof marks / sizeof *marks; i++) {
        bool sure = false;
        size_t cut = stem_length(plain, length, &marks[i], &sure);
        if (cut == 0)
            continue;
        memcpy(stem, plain, cut);
        stem[cut] = '\0';
        bool good = parse_plain(stem, references, unit, sure ? fault : NULL);
        if (good && unit->dimension == GAS_DIM_PRESSURE)
            return marked(&marks[i], plain, unit, fault);
        if (good && sure)
            return gas_unit_refuse(fault, GAS_UNIT_SYNTAX, plain + cut, length - cut,
                                   "gauge, absolute and vacuum belong to a pressure");
        if (sure)
            return false;
    }
    return parse_plain(plain, references, unit, fault);
}
