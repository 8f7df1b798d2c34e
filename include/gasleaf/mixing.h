/*
 * mixing.h - adiabatic mixing of streams or of vessel contents of different gases. (layer: core)
 */
#ifndef GASLEAF_MIXING_H
#define GASLEAF_MIXING_H

#include <stddef.h>

#include <gasleaf/gas.h>
#include <gasleaf/status.h>

struct gas_portion {
    const struct gas *gas;
    double n;    /* mol or mol/s */
    double P, T; /* Pa, K before mixing */
};

struct gas_blend {
    double n;            /* mol or mol/s */
    double T, P;         /* after mixing; P of streams is the given outlet pressure */
    double entropy_made; /* J/K or W/K; counts the mixing of unlike gases */
};

/*
 * gas_mix_vessels - contents of rigid vessels let together, no heat, no work: U and the total volume stay.
 * gas_mix_streams - steady streams, no heat, no work: H stays; P_out is given (the lowest inlet pressure if NAN).
 *   Given  same[count]  portions with the same index in `same` are the same gas and make no mixing entropy.
 *          Unlike gases are taken as fully distinct.
 */
struct gas_result gas_mix_vessels(const struct gas_portion *portion, const int *same, size_t count,
                                  struct gas_blend *blend);
struct gas_result gas_mix_streams(const struct gas_portion *portion, const int *same, size_t count, double P_out,
                                  struct gas_blend *blend);

#endif
