/*
 * gas_blend.c - names of the trade that stand for no one gas, and what to write in their place.
 *
 * The compositions are examples of the size that is usual (common practice); nothing is computed from them.
 */
#include "sheet/gas_draft.h"

#include <string.h>

/* clang-format off */
static const struct {
    const char *names; /* folded */
    const char *example;
} blends[] = {
    {"naturalgas|salesgas|pipelinegas|ng|lng|lngvapour|lngvapor|cng|feedgas", "CH4 92 + C2H6 5 + C3H8 1 + N2 2"},
    {"fluegas|fluegases|combustiongas|combustiongases|combustionproducts|exhaust|exhaustgas|exhaustgases|stackgas|offgas",
     "N2 72 + CO2 9 + H2O 17 + O2 2"},
    {"biogas|landfillgas|digestergas|sewagegas|sewergas", "CH4 60 + CO2 40"},
    {"syngas|synthesisgas|reformergas|reformedgas", "H2 50 + CO 40 + CO2 10"},
    {"watergas", "H2 50 + CO 45 + CO2 5"},
    {"producergas|generatorgas|woodgas", "N2 50 + CO 28 + H2 14 + CO2 5 + CH4 3"},
    {"towngas|citygas|coalgas|cokeovengas|cog|cokegas", "H2 55 + CH4 25 + CO 8 + N2 8 + CO2 4"},
    {"blastfurnacegas|bfg|topgas", "N2 49 + CO2 24 + CO 23 + H2 4"},
    {"lpg|liquefiedpetroleumgas|petroleumgas|autogas", "C3H8 60 + nC4 40"},
    {"fuelgas|refinerygas|refineryfuelgas|oilgas", "CH4 60 + H2 25 + C2H6 10 + C3H8 5"},
    {"moistair|humidair|wetair|ambientair", "air 98.5 + H2O 1.5"},
    {"forminggas", "N2 95 + H2 5"},
    {"crackedammonia|dissociatedammonia", "H2 75 + N2 25"},
    {"acidgas|sourgas", "H2S 60 + CO2 40"},
    {"weldinggas|shieldinggas|shieldgas", "Ar 82 + CO2 18"},
    {"nitrox", "O2 32 + N2 68"},
    {"heliox", "O2 21 + He 79"},
};

static const struct {
    const char *names; /* folded */
    const char *advice;
} groups[] = {
    {"c4|c4s|butanes", "is n-butane (nC4) or isobutane (iC4); write which one"},
    {"c5|c5s|pentanes", "is n-pentane (nC5), isopentane (iC5) or neopentane; write which one"},
    {"c6|c6+|c6plus|hexanes|hexanes+|c7|c7+|c7plus|heavies",
     "stands for several gases; write one that represents them, such as nC6"},
    {"sulfur|sulphur|sulfurvapour|sulphurvapour|sulfurvapor|sulphurvapor",
     "is S2 or S8 as a vapour; write which one"},
    {"inert|inerts|inertgas|noblegas", "is no one gas; write which one, such as N2 or Ar"},
    {"mixture|mix|gasmixture", "names no gas; write which one, such as N2, or a mixture such as N2 79 + O2 21"},
};
/* clang-format on */

bool gas_refuse_blend(struct gas_refusal *refusal, struct gas_piece name)
{
    char folded[60], shown[60];
    gas_fold(folded, sizeof folded, name);
    gas_quoted(shown, sizeof shown, name.at, name.length);
    for (size_t i = 0; i < sizeof blends / sizeof *blends; i++)
        if (gas_listed(folded, blends[i].names))
            return gas_refuse(refusal, "gas", "%s differs from place to place; write its composition, such as %s.",
                              shown, blends[i].example),
                   true;
    for (size_t i = 0; i < sizeof groups / sizeof *groups; i++)
        if (gas_listed(folded, groups[i].names))
            return gas_refuse(refusal, "gas", "%s %s.", shown, groups[i].advice), true;
    return false;
}
