/*
 * text.h - UTF-16 as the office keeps it to UTF-8 as the cells keep it.
 */
#ifndef ADDIN_TEXT_H
#define ADDIN_TEXT_H

#include "addin/uno_headers.h"
#include "sheet/arena.h"
#include "sheet/cell.h"

/* addin_text - a cell with the text. Half pairs and NULs become U+FFFD, so that the text ends where its length says. */
struct gas_cell addin_text(const rtl_uString *string, struct gas_arena *arena);

/* addin_message - a cell with a constant text. */
struct gas_cell addin_message(const char *text);

#endif
