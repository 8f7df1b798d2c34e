/*
 * functions.h - the entries of the checker's desk that the catalogue's rows name.
 */
#ifndef AUDIT_FUNCTIONS_H
#define AUDIT_FUNCTIONS_H

#include "sheet/catalogue.h"

gas_entry gas_fn_audit;      /* fn_audit.c */
gas_entry gas_fn_audit_list; /* fn_audit.c */
gas_entry gas_fn_working;    /* fn_working.c */

#endif
