/*
 * options.h - the options text: "barometer 0.98 bar; work by gas; flow; open; datum 0 degC; agree 0.5 %; hard errors;
 * digits 4".
 */
#ifndef SHEET_OPTIONS_H
#define SHEET_OPTIONS_H

#include <gasleaf/path.h>
#include <gasleaf/state.h>
#include <gasleaf/unit.h>
#include <gasleaf/vessel.h>

#include "sheet/cell.h"
#include "sheet/sentence.h"

#define GAS_BAROMETER_LEAST 1e3 /* Pa: what is outside these two is no air pressure */
#define GAS_BAROMETER_MOST  1e6

struct gas_options {
    double barometer;                 /* Pa */
    enum gas_system system;           /* GAS_CLOSED, or GAS_FLOW after `flow` */
    bool system_said;                 /* flow or closed was written */
    bool open;                        /* the amount of gas differs from state to state: gas came in or went out */
    bool work_by_gas;                 /* W is shown positive out of the gas */
    bool hard_errors;                 /* #N/A in place of a sentence */
    struct gas_datum datum;           /* h = s = 0 */
    double agree;                     /* relative disagreement allowed among over-determined givens */
    int digits;                       /* of the figures that are checked; 0: their own */
    struct gas_references references; /* what Nm3, Sm3, scf mean */
    bool wall_said;                   /* vessels: an option says what passes the wall */
    enum gas_wall wall;               /* adiabatic, isothermal or a fraction */
    double wall_fraction;             /* of the heat that would keep the gas at its first temperature */
    bool outlet_said;                 /* mixing of streams: an option gives the outlet pressure */
    double P_outlet;                  /* Pa */
};

extern const struct gas_options gas_options_default;

/* gas_options_read - omitted gives the defaults; a word that is not known is refused with the known ones. */
bool gas_options_read(const struct gas_block *argument, struct gas_options *options, struct gas_refusal *refusal);

#endif
