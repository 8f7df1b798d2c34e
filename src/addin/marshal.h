/*
 * marshal.h - the office's values to blocks of cells and back.
 *
 * What comes in is borrowed and is copied to the arena where it has to be; what goes out is constructed in raw memory
 * and belongs to the caller. Nothing here can fail in another way than by a sentence in a cell.
 */
#ifndef ADDIN_MARSHAL_H
#define ADDIN_MARSHAL_H

#include "addin/types.h"
#include "sheet/cell.h"

/* addin_read - a value of any type; void is an omitted argument. */
void addin_read(const uno_Any *value, struct gas_arena *arena, struct gas_block *block);

/* addin_read_live - the cells of a live range: an error of the office is GAS_CELL_HOST_ERROR, an empty cell "". False
 * and a block of one sentence when the cells cannot be had. */
bool addin_read_live(uno_Interface *range, struct gas_arena *arena, struct gas_block *block);

/* addin_read_rows - a sequence of a type: of sequences, of anys that hold sequences, or of plain values (one row). */
void addin_read_rows(uno_Type *type, const uno_Sequence *sequence, struct gas_arena *arena, struct gas_block *block);

/* addin_read_message - a block of one constant text. */
void addin_read_message(const char *text, struct gas_arena *arena, struct gas_block *block);

/* addin_write - an answer: one cell as a single value, more as rows. A number that is none leaves as a sentence. */
void addin_write(const struct gas_block *answer, uno_Any *result);

#endif
