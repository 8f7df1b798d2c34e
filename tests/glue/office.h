/*
 * office.h - the office's side of a call, for tests: loads the library as the office does and calls through the binary
 * interface.
 */
#ifndef TESTS_OFFICE_H
#define TESTS_OFFICE_H

#include "addin/uno_headers.h"

struct office_types {
    uno_Type *real, *string, *any, *anys, *any_rows, *interface;
};

extern struct office_types office_type;

/* office_open - the add-in's functions, queried through factory and instance; NULL and a message when that fails. */
uno_Interface *office_open(void);

/* office_member - calls the member at a position. True when it answered, false when it raised (and destroys that). */
bool office_member(uno_Interface *object, sal_Int32 position, void *result, void **arguments);

/* office_query - asks an object for an interface by name; NULL when it has none. */
uno_Interface *office_query(uno_Interface *object, const char *name);

/* office_position - of a worksheet function's method in the interface. */
sal_Int32 office_position(const char *method);

/* Anys to pass; office_clear ends them. office_text takes UTF-8. An any must not be copied: it can point into itself.
 */
void office_void(uno_Any *to);
void office_real(uno_Any *to, double number);
void office_text(uno_Any *to, const char *text);
void office_clear(uno_Any *any);

/* office_rows - a [][]any of rows x columns void anys in `to`; office_at - one of them, to be assigned. */
void office_rows(uno_Any *to, sal_Int32 rows, sal_Int32 columns);
uno_Any *office_at(const uno_Any *rows, sal_Int32 row, sal_Int32 column);
void office_put_real(uno_Any *at, double number);
void office_put_text(uno_Any *at, const char *text);

/* office_is_text - the any holds this text (UTF-8). */
bool office_is_text(const uno_Any *any, const char *text);

#endif
