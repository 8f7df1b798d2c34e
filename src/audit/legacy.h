/*
 * legacy.h - the figures of the sheet being checked, and how many digits they claim.
 *
 * A number has the digits of the shortest decimal that gives it: 105.1 is known to half a unit of its last digit.
 * Zeros at the end of a whole number may or may not be digits: 3500 is read with three, unless it was typed as a text
 * ("3500." has four) or the option `digits` says otherwise. Above nine digits are not looked at.
 */
#ifndef AUDIT_LEGACY_H
#define AUDIT_LEGACY_H

#include "sheet/job.h"

struct legacy {
    bool blank;
    double figure; /* in the unit of the wanted heading */
    int digits;
    double half; /* half a unit of its last digit; 0 for a figure of zero */
};

/* legacy_read - a cell under a wanted heading; digits 0: its own. A text that is no figure refuses. */
bool legacy_read(const struct gas_cell *cell, const struct gas_job *job, const struct gas_heading *heading, int digits,
                 struct legacy *legacy, struct gas_refusal *refusal);

/* legacy_digits - significant digits of a number, as above. */
int legacy_digits(double figure);

#endif
