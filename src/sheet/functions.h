/*
 * functions.h - the entries that the catalogue's rows name, one line per worksheet function.
 */
#ifndef SHEET_FUNCTIONS_H
#define SHEET_FUNCTIONS_H

#include "sheet/catalogue.h"

gas_entry gas_fn_cp;      /* fn_heat.c */
gas_entry gas_fn_cv;      /* fn_heat.c */
gas_entry gas_fn_gamma;   /* fn_heat.c */
gas_entry gas_fn_cp_mean; /* fn_heat.c */
gas_entry gas_fn_dh;      /* fn_heat.c */
gas_entry gas_fn_du;      /* fn_heat.c */
gas_entry gas_fn_ds;      /* fn_heat.c */
gas_entry gas_fn_temp;    /* fn_heat.c */
gas_entry gas_fn_unit;    /* fn_unit.c */
gas_entry gas_fn_work;    /* fn_path.c */
gas_entry gas_fn_heat;    /* fn_path.c */
gas_entry gas_fn_end;     /* fn_path.c */
gas_entry gas_fn_path;    /* fn_path.c */
gas_entry gas_fn_trace;   /* fn_trace.c */
gas_entry gas_fn_cycle;   /* fn_cycle.c */
gas_entry gas_fn_card;    /* fn_gases.c */
gas_entry gas_fn_list;    /* fn_gases.c */
gas_entry gas_fn_stages;  /* fn_stages.c */
gas_entry gas_fn_fill;    /* fn_vessel.c */
gas_entry gas_fn_vent;    /* fn_vessel.c */
gas_entry gas_fn_z;       /* fn_real.c */
gas_entry gas_fn_valid;   /* fn_real.c */
gas_entry gas_fn_mix;     /* fn_mix.c */
gas_entry gas_fn_faults;  /* fn_desk.c */
gas_entry gas_fn_given;   /* fn_desk.c */
gas_entry gas_fn_solve;   /* fn_solve.c */
gas_entry gas_fn_version; /* fn_desk.c */

#endif
