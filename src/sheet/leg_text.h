/*
 * leg_text.h - one leg as it is typed: the grammar of legs.h.
 */
#ifndef SHEET_LEG_TEXT_H
#define SHEET_LEG_TEXT_H

#include "sheet/legs.h"
#include "sheet/piece.h"

/* gas_leg_read - a leg's text, trimmed and not empty; number counts from 1 and names it in sentences. */
bool gas_leg_read(struct gas_typed_leg *leg, size_t number, struct gas_piece text, const struct gas_options *options,
                  struct gas_refusal *refusal);

#endif
