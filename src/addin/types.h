/*
 * types.h - references to the office's types, made once and kept for the life of the process.
 */
#ifndef ADDIN_TYPES_H
#define ADDIN_TYPES_H

#include "addin/uno_headers.h"

#define ADDIN_SERVICE        "gasleaf.Functions"
#define ADDIN_IMPLEMENTATION "gasleaf.comp.Functions"

struct addin_types {
    uno_Type *real, *string, *any, *type, *byte;
    uno_Type *strings, *types, *bytes;
    uno_Type *anys, *any_rows, *reals, *real_rows;
    uno_Type *interface, *type_provider, *service_info, *factory, *functions;
    uno_Type *cell_range_data, *runtime_exception;
};

extern struct addin_types addin_type;

/* addin_make_types - fill the table, once; before anything else. */
void addin_make_types(void);

/* addin_string - a new string of the office from UTF-8; the caller releases it. Bad bytes become U+FFFD. */
rtl_uString *addin_string(const char *text, size_t length);

#endif
