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
    double n;       /* mol or mol/s; 0: not looked at, except for V_empty */
    double P, T;    /* Pa, K before mixing */
    double V_empty; /* m3, vessels: the volume of an evacuated vessel (n = 0); unused otherwise */
};

struct gas_blend {
    double n;            /* mol or mol/s */
    double T, P;         /* after mixing; P of streams is the given outlet pressure */
    double entropy_made; /* J/K or W/K; counts the mixing of unlike gases */
};

/*
 * gas_mix_vessels - contents of rigid vessels let together, no heat, no work: U and the total volume stay.
 * gas_mix_streams - steady streams, no heat, no work: H stays; P_out is given (the lowest inlet pressure if NAN).
 *
 *   Given      same[count]  portions with the same index in `same` are the same gas and make no mixing entropy; NULL:
 *                           all different. Unlike gases are taken as fully distinct.
 *   Returned   value: T after mixing; *blend complete (all NAN unless GAS_OK)
 *   Status     GAS_NOT_FINITE, GAS_NEGATIVE (n), GAS_NOT_POSITIVE (P, T, P_out; every n being 0), GAS_NO_HEAT_CAPACITY,
 *              GAS_OUTSIDE_DATA  a portion's T, or the mixed temperature for that portion's gas (figure: the limit)
 *              GAS_UNREACHABLE   streams: a P_out so high that entropy would have to vanish
 *              GAS_UNDETERMINED  no portion at all
 *   Argument   the portion, from 1; count + 1 for P_out; 0 for all of them
 *   Method     sum of n du (vessels) or n dh (streams) = 0: one bracketed root between the lowest and the highest
 *              temperature. Entropy: each portion from its P, T to the mixed T at its gas's partial pressure.
 *   Source     Cengel & Boles, Thermodynamics: An Engineering Approach, ch. 13 (gas mixtures)
 *   Check      tests/core/test_mixing.c
 */
struct gas_result gas_mix_vessels(const struct gas_portion *portion, const int *same, size_t count,
                                  struct gas_blend *blend);
struct gas_result gas_mix_streams(const struct gas_portion *portion, const int *same, size_t count, double P_out,
                                  struct gas_blend *blend);

#endif
