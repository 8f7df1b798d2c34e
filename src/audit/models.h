/*
 * models.h - the ways a sum is set up wrongly: constants, heat capacities, formulas. Each changes a replay and returns
 * false where it does not apply.
 */
#ifndef AUDIT_MODELS_H
#define AUDIT_MODELS_H

#include "audit/replay.h"

typedef bool mismodel(struct replay *replay, double parameter);

/* constants */
mismodel model_R, model_molar_mass, model_molar_mass_digits, model_specific_R_digits, model_R_for_specific;
/* heat capacities; parameter: K, or what the name says */
mismodel model_cp_at_start, model_cp_at_end, model_cp_at, model_cp_of_k, model_cp_mean, model_cp_at_mean,
    model_cp_celsius, model_cp_for_cv;
/* the sum itself */
mismodel model_factor, model_energy_by_molar_mass, model_log10, model_flow_for_closed, model_exchanged,
    model_ratio_inverted, model_reversible, model_efficiency_turned, model_isothermal, model_adiabatic, model_exponent,
    model_exponent_k;
/* machines and vessels */
mismodel model_ratio_divided, model_single_stage, model_no_cooling, model_stages_reversible,
    model_stages_efficiency_turned, model_drive, model_fill_at_line, model_fill_at_k_line, model_wall_isothermal,
    model_wall_adiabatic;

/* vessel_replay - the wanted figure in SI where the end temperature of a filling is mistaken. */
bool vessel_replay(struct replay *replay, double *si);

#endif
