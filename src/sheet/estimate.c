#include "sheet/estimate.h"

#include <math.h>

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
