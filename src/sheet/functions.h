/*
 * functions.h - the entries that the catalogue's rows name, one line per worksheet function.
 */
#ifndef SHEET_FUNCTIONS_H
#define SHEET_FUNCTIONS_H

#include "sheet/catalogue.h"

gas_entry gas_fn_faults;  /* fn_desk.c */
gas_entry gas_fn_given;   /* fn_desk.c */
gas_entry gas_fn_solve;   /* fn_solve.c */
gas_entry gas_fn_version; /* fn_desk.c */

#endif
