/* The tables of gases walked row by row, and compared with what others print. */
#include <math.h>
#include <stdio.h>
#include <string.h>

#include <gasleaf/heat.h>
#include <gasleaf/species.h>

#include "check.h"
#include "check/printed_masses.h"

static const struct gas_species *find(const char *text)
{
    return gas_species_find(text, strlen(text));
}

static const char *found_name(const char *text)
{
    const struct gas_species *species = find(text);
    return species ? species->name : "(none)";
}

/* ---- the tables ------------------------------------------------------------------------------------------ */

/* The set is continuous to 2e-7 of cp at its joins. */
static void walk_intervals(const struct gas_species *species)
{
    const struct gas gas = gas_of_species(species);
    for (size_t i = 0; i < species->interval_count; i++) {
        const struct gas_interval *here = &species->interval[i];
        check_true(species->name, here->T_from < here->T_to && here->T_from >= 200 && here->T_to <= 20000);
        for (int step = 0; step <= 50; step++)
            check_true(species->name,
                       gas_cp(&gas, here->T_from + (here->T_to - here->T_from) * step / 50).value > 2 * GAS_R);
        if (i == 0)
            continue;
        check_true(species->name, here[-1].T_to == here->T_from);
        struct gas below = gas, above = gas;
        below.interval = here - 1, above.interval = here;
        below.interval_count = above.interval_count = 1;
        check_close(species->name, gas_cp(&above, here->T_from).value, gas_cp(&below, here->T_from).value, 3e-7, 0);
    }
}

static bool cited(const char *key, bool needed)
{
    return needed ? gas_source_find(key) != NULL : key && (*key == 0 || gas_source_find(key));
}

static void walk_sources(const struct gas_species *s)
{
    check_true(s->name, cited(s->heat_source, s->interval_count > 0));
    check_true(s->name, (s->interval_count > 0) == (strlen(s->heat_reference) > 3));
    check_true(s->name, cited(s->critical_T_source, !isnan(s->critical.T)));
    check_true(s->name, cited(s->critical_P_source, !isnan(s->critical.P)));
    check_true(s->name, cited(s->omega_source, !isnan(s->critical.omega)));
    check_true(s->name, cited(s->boiling_point_source, !isnan(s->boiling_point)));
    check_true(s->name, cited(s->dipole_source, !isnan(s->dipole)));
}

/* Bounds of sense, common knowledge: no gas boils above its critical point or has Pc above 250 bar (water: 221), but
 * mercury. */
static void walk_figures(const struct gas_species *s)
{
    if (!isnan(s->critical.T)) {
        check_true(s->name, s->critical.T > s->boiling_point && s->critical.T < 1800);
        check_true(s->name, s->critical.P > 2e5 && (s->critical.P < 250e5 || strcmp(s->name, "mercury") == 0));
    }
    check_true(s->name, isnan(s->critical.omega) || (s->critical.omega > -0.5 && s->critical.omega < 1));
    check_true(s->name, isnan(s->dipole) || (s->dipole >= 0 && s->dipole < 6));
    for (int i = 0; i < GAS_ELEMENTS && s->element[i].count > 0; i++)
        check_true(s->name, gas_atomic_weight(s->element[i].symbol) > 1);
    check_true(s->name, gas_species_molar_mass(s) > 1e-3 && gas_species_molar_mass(s) < 0.4);
}

static void tables_walked(void)
{
    check_int("154 fits and 7 gases without", (long)gas_species_count(), 161);
    check_true("past the end", gas_species_at(gas_species_count()) == NULL);
    for (size_t i = 0; i < gas_species_count(); i++) {
        const struct gas_species *species = gas_species_at(i);
        walk_intervals(species);
        walk_sources(species);
        walk_figures(species);
    }
}

static void sources_well_formed(void)
{
    check_true("many", gas_source_count() > 20);
    for (size_t i = 0; i < gas_source_count(); i++) {
        const struct gas_source *source = gas_source_at(i);
        check_true(source->key, strlen(source->key) > 3 && strlen(source->citation) > 20);
        check_true(source->key, gas_source_find(source->key) == source);
    }
    check_true("unknown", gas_source_find("no such key") == NULL && gas_source_at(1000) == NULL);
}

/* Every name, CAS number and alias finds its own gas, so none stands twice. */
static void names_are_unique(void)
{
    for (size_t i = 0; i < gas_species_count(); i++) {
        const struct gas_species *species = gas_species_at(i);
        check_true(species->name, find(species->name) == species);
        check_true(species->name, find(species->cas) == species);
        for (const char *alias = species->aliases; *alias;) {
            size_t length = strcspn(alias, "|");
            check_true(alias, gas_species_find(alias, length) == species);
            alias += length + (alias[length] == '|');
        }
        const struct gas_species *by_formula = find(species->formula);
        check_true(species->name,
                   !*species->formula || !by_formula || strcmp(by_formula->formula, species->formula) == 0);
    }
}

/* The check digit of a CAS number: the digits from the right times 1, 2, 3 ..., modulo 10 (CAS, registry rules). */
static void cas_numbers_add_up(void)
{
    for (size_t i = 0; i < gas_species_count(); i++) {
        const struct gas_species *species = gas_species_at(i);
        int sum = 0, weight = 0;
        size_t length = strlen(species->cas);
        if (!check_true(species->name, length > 6))
            continue;
        for (size_t at = length - 2; at > 0; at--)
            if (species->cas[at] != '-')
                sum += ++weight * (species->cas[at] - '0');
        sum += (weight + 1) * (species->cas[0] - '0');
        check_int(species->name, sum % 10, species->cas[length - 1] - '0');
    }
}

/* The formula and the counts of elements are two records of one thing. */
static void formulas_agree_with_elements(void)
{
    for (size_t i = 1; i < gas_species_count(); i++) {
        const struct gas_species *species = gas_species_at(i);
        char made[40] = "";
        for (int k = 0; k < GAS_ELEMENTS && species->element[k].count > 0; k++) {
            char part[12];
            snprintf(part, sizeof part, species->element[k].count == 1 ? "%s" : "%s%g", species->element[k].symbol,
                     species->element[k].count);
            strcat(made, part);
        }
        check_text(species->name, made, species->formula);
    }
}

/* ---- against what others print --------------------------------------------------------------------------- */

/* Atomic weights moved since: S 32.065 to 32.06, Cl 35.453 to 35.45, Ge 72.64 to 72.63. Air is another composition. */
static void molar_masses(void)
{
    size_t count = sizeof printed_masses / sizeof printed_masses[0];
    for (size_t i = 0; i < count; i++) {
        const struct gas_species *species = find(printed_masses[i].name);
        check_true(printed_masses[i].name, species != NULL);
        if (species)
            check_close(species->name, 1000 * gas_species_molar_mass(species), printed_masses[i].M, 2e-4, 0);
    }
    /* US Standard Atmosphere 1976, Table 3: M0 = 28.9644; the sum with our atomic weights (argon was 39.948) to 2e-5 */
    check_close("air", gas_species_molar_mass(find("air")), 28.9644e-3, 1e-15, 0);
    const struct gas_air_part *part;
    double M = 0, sum = 0;
    for (size_t i = 0, parts = gas_air_parts(&part); i < parts; i++) {
        M += part[i].fraction * gas_species_molar_mass(find(part[i].formula));
        sum += part[i].fraction;
    }
    check_close("fractions of air", sum, 0.999997147, 1e-12, 0);
    check_close("parts of air", M, 28.9644e-3, 2e-5, 0);
    /* by hand from 2.014101777844, 15.999 */
    check_close("heavy water", gas_species_molar_mass(find("D2O")), 20.027203555688e-3, 1e-12, 0);
}

/* US Standard Atmosphere 1976, Table I, geometric altitude (from memory): printed to 6 digits. */
static void standard_atmosphere(void)
{
    static const struct {
        double z, P; /* m, Pa */
    } rows[] = {{-500, 107478},  {0, 101325},      {1000, 89876.2},  {2000, 79501.4},
                {5000, 54048.2}, {10000, 26499.8}, {15000, 12111.8}, {20000, 5529.30}};
    for (size_t i = 0; i < sizeof rows / sizeof rows[0]; i++)
        check_close("altitude", gas_standard_atmosphere_pressure(rows[i].z).value, rows[i].P, 1e-5, 0);
    check_int("too high", gas_standard_atmosphere_pressure(20001).status, GAS_OUTSIDE_DATA);
    check_int("too low", gas_standard_atmosphere_pressure(-501).status, GAS_OUTSIDE_DATA);
    check_int("nan", gas_standard_atmosphere_pressure(NAN).status, GAS_NOT_FINITE);
}

/* ---- lookups --------------------------------------------------------------------------------------------- */

/* Names of the trade and designations of ANSI/ASHRAE Standard 34: common practice. */
static void lookups(void)
{
    static const struct {
        const char *asked, *name;
    } rows[] = {{"N2", "nitrogen"},
                {"n2", "nitrogen"},
                {" Nitrogen ", "nitrogen"},
                {"N\xE2\x82\x82", "nitrogen"},
                {"7727-37-9", "nitrogen"},
                {"7727\xE2\x80\x91"
                 "37\xE2\x80\x91"
                 "9",
                 "nitrogen"},
                {"R-728", "nitrogen"},
                {"CO", "carbon monoxide"},
                {"co", "carbon monoxide"},
                {"Co", "carbon monoxide"},
                {"CO2", "carbon dioxide"},
                {"NO", "nitric oxide"},
                {"No", "nitric oxide"},
                {"no2", "nitrogen dioxide"},
                {"carbonic acid gas", "carbon dioxide"},
                {"steam", "water"},
                {"Water vapour", "water"},
                {"water-vapor", "water"},
                {"H2O", "water"},
                {"R-718", "water"},
                {"Sulphur Dioxide", "sulfur dioxide"},
                {"sulfur dioxide", "sulfur dioxide"},
                {"hydrogen sulphide", "hydrogen sulfide"},
                {"Air", "air"},
                {"dry air", "air"},
                {"butane", "n-butane"},
                {"n butane", "n-butane"},
                {"C4H10", "n-butane"},
                {"iso-butane", "isobutane"},
                {"R600a", "isobutane"},
                {"R-600", "n-butane"},
                {"r 290", "propane"},
                {"Ethene", "ethylene"},
                {"ethyne", "acetylene"},
                {"propene", "propylene"},
                {"C3H6", "propylene"},
                {"R1270", "propylene"},
                {"NH3", "ammonia"},
                {"R-717", "ammonia"},
                {"R-744", "carbon dioxide"},
                {"R-22", "chlorodifluoromethane"},
                {"CHClF2", "chlorodifluoromethane"},
                {"R14", "carbon tetrafluoride"},
                {"R-134a", "1,1,1,2-tetrafluoroethane"},
                {"R-32", "difluoromethane"},
                {"R-50", "methane"},
                {"R-170", "ethane"},
                {"R-1150", "ethylene"},
                {"R-704", "helium"},
                {"HF", "hydrogen fluoride"},
                {"Hf", "hydrogen fluoride"},
                {"hg", "mercury"},
                {"NOCL", "nitrosyl chloride"},
                {"N", "nitrogen atom"},
                {"Cl", "chlorine atom"},
                {"n", "(none)"},
                {"CL", "(none)"},
                {"C2H6O", "(none)"},
                {"C4H8", "(none)"},
                {"nitrogne", "(none)"},
                {"", "(none)"},
                {"-", "(none)"},
                {"heavy water", "heavy water"},
                {"an extremely long name that no gas on this earth has ever been given by anybody", "(none)"}};
    for (size_t i = 0; i < sizeof rows / sizeof rows[0]; i++)
        check_text(rows[i].asked, found_name(rows[i].asked), rows[i].name);
    check_text("a part of a text", gas_species_find("N2 79 + O2 21", 2)->name, "nitrogen");
}

static void near_misses(void)
{
    static const struct {
        const char *asked, *first;
    } rows[] = {{"nitrogne", "nitrogen"}, {"Nitrgen", "nitrogen"},
                {"amonia", "ammonia"},    {"carbon dioxid", "carbon dioxide"},
                {"metane", "methane"},    {"Propan", "propane"},
                {"hellium", "helium"},    {"sulfur hexafloride", "sulfur hexafluoride"},
                {"oxigen", "oxygen"},     {"acetylen", "acetylene"},
                {"argn", "argon"},        {"hydrogen chlorid", "hydrogen chloride"}};
    const struct gas_species *near[5];
    for (size_t i = 0; i < sizeof rows / sizeof rows[0]; i++) {
        size_t count = gas_species_nearest(rows[i].asked, strlen(rows[i].asked), near, 5);
        if (check_true(rows[i].asked, count > 0 && count <= 5))
            check_text(rows[i].asked, near[0]->name, rows[i].first);
    }
    size_t isomers = gas_species_nearest("C2H6O", 5, near, 2);
    check_int("isomers", (long)isomers, 2);
    check_text("first isomer", near[0]->formula, "C2H6O");
    check_text("second isomer", near[1]->formula, "C2H6O");
    check_int("nothing like it", (long)gas_species_nearest("flogiston", 9, near, 5), 0);
    check_int("nothing", (long)gas_species_nearest("", 0, near, 5), 0);
}

const struct test_suite suite_species = {"species",
                                         (const struct test_case[]){{"tables", tables_walked},
                                                                    {"sources", sources_well_formed},
                                                                    {"unique names", names_are_unique},
                                                                    {"CAS numbers", cas_numbers_add_up},
                                                                    {"formulas", formulas_agree_with_elements},
                                                                    {"molar masses", molar_masses},
                                                                    {"standard atmosphere", standard_atmosphere},
                                                                    {"lookups", lookups},
                                                                    {"near misses", near_misses},
                                                                    {0}}};
