/*
 * readings.h - the ways a figure is misread. Each changes a reading and returns false where it does not apply.
 */
#ifndef AUDIT_READINGS_H
#define AUDIT_READINGS_H

#include "audit/replay.h"

typedef bool misreading(struct replay *replay, const struct site *site, struct reading *reading, double parameter);

misreading read_gauge_as_absolute, read_absolute_as_gauge, read_barometer_twice, read_other_barometer,
    read_barometer_digits;
misreading read_degrees_as_absolute, read_kelvin_as_degrees, read_lost_sign, read_other_zero_c, read_other_zero_f,
    read_other_degree_size, read_difference_as_level;
misreading read_pressure_unit, read_factor, read_flow_factor, read_rounded_factor, read_rounded_inverse;
misreading read_mass_as_moles, read_moles_as_mass, read_reference, read_rounded_molar_volume;
misreading read_calorie, read_sign;

/* A figure rounded to a number of significant digits. */
double rounded_to(double x, int digits);

#endif
