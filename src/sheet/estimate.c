#include "sheet/estimate.h"

#include <math.h>
#include <string.h>

#include <gasleaf/unit.h>

enum { PARTS = 64 };

/* The acentric factor, where no source is at hand from the normal boiling point: Lee and Kesler's vapour pressure is
 * linear in it (their eq. 15). */
static double omega_of(const struct gas_species *species)
{
    const struct gas_critical *critical = &species->critical;
    if (!isnan(critical->omega) || isnan(species->boiling_point))
        return critical->omega;
    double Tr = species->boiling_point / critical->T;
    double at_0 = log(gas_reduced_vapour_pressure(Tr, 0).value), at_1 = log(gas_reduced_vapour_pressure(Tr, 1).value);
    return (log(GAS_ATMOSPHERE / critical->P) - at_0) / (at_1 - at_0);
}

const char *gas_critical_of(const struct gas_choice *choice, struct gas_critical *critical)
{
    struct gas_critical part[PARTS];
    double x[PARTS];
    *critical = (struct gas_critical){NAN, NAN, NAN};
    if (choice->part_count == 0 || choice->part_count > PARTS)
        return choice->label;
    for (size_t i = 0; i < choice->part_count; i++) {
        const struct gas_species *species = choice->part[i].species;
        if (!species || isnan(species->critical.T) || isnan(species->critical.P) || isnan(omega_of(species)))
            return choice->part[i].label;
        part[i] = (struct gas_critical){species->critical.T, species->critical.P, omega_of(species)};
        x[i] = choice->part[i].x;
    }
    *critical = gas_critical_lee_kesler(part, x, choice->part_count);
    return isnan(critical->T) ? choice->label : NULL;
}

struct gas_result gas_estimated_Z(const struct gas_critical *critical, double T, double P)
{
    return gas_z_reduced(T / critical->T, P / critical->P, critical->omega);
}

/* Water at low temperature is far off the correlation, and moist gas is the commonest dew point: W. Wagner, A. Pruss,
 * J. Phys. Chem. Ref. Data 22 (1993) 783 (IAPWS SR1-86), 273.16 to 647.096 K; followed below that over supercooled
 * water. */
static double water_vapour_pressure(double temperature)
{
    const double Tc = 647.096, Pc = 22.064e6, x = 1 - temperature / Tc, x2 = x * x, x3 = x2 * x, root = sqrt(x);
    double sum = -7.85951783 * x + 1.84408259 * x * root - 11.7866497 * x3 + 22.6807411 * x3 * root -
                 15.9618719 * x2 * x2 + 1.80122502 * x3 * x3 * x * root;
    return x > 0 ? Pc * exp(Tc / temperature * sum) : Pc;
}

static double vapour_pressure(const struct gas_species *species, double temperature)
{
    const struct gas_critical *critical = &species->critical;
    if (strcmp(species->formula, "H2O") == 0)
        return water_vapour_pressure(temperature);
    double Tr = fmax(temperature / critical->T, 0.3); /* below that it is less: an upper bound */
    return critical->P * gas_reduced_vapour_pressure(Tr, omega_of(species)).value;
}

struct gas_condensing gas_condensing_of(const struct gas_choice *choice, double T, double P)
{
    struct gas_condensing worst = {NULL, 0, INFINITY, 0};
    for (size_t i = 0; i < choice->part_count; i++) {
        const struct gas_part *part = &choice->part[i];
        if (!part->species || !(T < part->species->critical.T))
            continue;
        double partial = part->x * P, vapour = vapour_pressure(part->species, T);
        worst.load += partial / vapour;
        if (worst.part && partial / vapour <= worst.partial / worst.vapour)
            continue;
        worst.part = part;
        worst.partial = partial;
        worst.vapour = vapour;
    }
    return worst;
}

const struct gas_part *gas_rough_part(const struct gas_choice *choice, const char **why)
{
    static const char *const quantum[] = {"H2", "D2", "He", "Ne"};
    const double polar = 1.4; /* debye: ammonia, water, alcohols, halocarbons and above */
    for (size_t i = 0; i < choice->part_count; i++) {
        const struct gas_part *part = &choice->part[i];
        if (!part->species || part->x < 0.1)
            continue;
        *why = "a quantum gas";
        for (size_t k = 0; k < sizeof quantum / sizeof *quantum; k++)
            if (strcmp(part->species->formula, quantum[k]) == 0)
                return part;
        *why = "strongly polar";
        if (part->species->dipole > polar)
            return part;
    }
    return NULL;
}
