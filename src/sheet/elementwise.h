/*
 * elementwise.h - functions of a few figures that answer cell by cell: a number, a range or an inline array where a
 * number is asked. Single values pair with arrays; arrays pair with arrays of the same shape.
 */
#ifndef SHEET_ELEMENTWISE_H
#define SHEET_ELEMENTWISE_H

#include <gasleaf/unit.h>

#include "sheet/cell.h"
#include "sheet/sentence.h"

struct gas_input {
    const char *name; /* as the catalogue calls it: for sentences */
    const struct gas_block *block;
    enum gas_dimension dimension, other; /* what it may be: J/mol or J/kg; the same twice when there is one */
    struct gas_unit unit;                /* of bare numbers */
};

/* One figure as it was read: in SI, and the unit it came in. */
struct gas_reading {
    double si;
    struct gas_unit unit;
};

/* gas_input_open - name, dimension and other are set; unit: the argument that names the unit of bare numbers, omitted
 * for SI. */
bool gas_input_open(struct gas_input *input, const struct gas_block *block, const struct gas_block *unit,
                    struct gas_refusal *refusal);

/* gas_inputs_shape - the shape of the answer. */
bool gas_inputs_shape(const struct gas_input *inputs, size_t count, size_t *rows, size_t *columns,
                      struct gas_refusal *refusal);

/* gas_input_read - the figure for one cell of the answer; a text may carry its own unit ("25 degC"). */
bool gas_input_read(const struct gas_input *input, size_t row, size_t column, struct gas_reading *reading,
                    struct gas_refusal *refusal);

#endif
