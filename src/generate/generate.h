/*
 * generate.h - the files that follow from the catalogue: the interface for the office, the texts of its function
 * wizard and the reference page. `make generate` writes them, a test compares them with what is committed.
 */
#ifndef GENERATE_GENERATE_H
#define GENERATE_GENERATE_H

#include <stdio.h>

#include "sheet/catalogue.h"

typedef void gas_generator(FILE *out, const struct gas_function *functions, size_t count);

struct gas_generated {
    const char *path; /* below the top of the tree */
    gas_generator *write;
};

/* gas_generated - the list of files, ends where the path is NULL. */
const struct gas_generated *gas_generated(void);

gas_generator gas_write_interface; /* idl.c */
gas_generator gas_write_service;   /* idl.c */
gas_generator gas_write_wizard;    /* wizard.c */
gas_generator gas_write_reference; /* reference.c */

/* gas_idl_name - a parameter's name without its spaces: what the office knows it by. */
void gas_idl_name(FILE *out, const char *name);

#endif
