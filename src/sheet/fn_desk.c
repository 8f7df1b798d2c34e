/* Functions for the desk around a calculation: GIVEN, FAULTS, VERSION. */
#include "sheet/functions.h"

#include "sheet/sentence.h"

void gas_fn_given(struct gas_call *call)
{
    struct gas_refusal refusal = {0};
    for (size_t i = 0; i < call->count && !refusal.made; i++)
        if (!gas_single(gas_argument(call, i)))
            gas_refuse(&refusal, "given",
                       "heading and value number %zu is a range or is left out; give single cells "
                       "in pairs, or pass a two-column range to the function itself.",
                       i / 2 + 1);
    if (call->count == 0)
        gas_refuse(&refusal, "given", "nothing is given; give headings and values in pairs.");
    else if (call->count % 2)
        gas_refuse(&refusal, "given", "the last heading has no value; give headings and values in pairs.");
    if (refusal.made) {
        gas_answer_text(call, refusal.text);
        return;
    }
    if (!gas_answer_block(call, call->count / 2, 2))
        return;
    for (size_t i = 0; i < call->count; i++) {
        const struct gas_cell *cell = call->argument[i].cell;
        if (cell->kind == GAS_CELL_NUMBER)
            gas_put_number(call, i / 2, i % 2, cell->number);
        else
            call->answer.cell[i] = *cell;
    }
}

static bool is_fault(const struct gas_cell *cell)
{
    return cell->kind == GAS_CELL_HOST_ERROR || gas_cell_blank(cell) || gas_cell_is_sentence(cell);
}

void gas_fn_faults(struct gas_call *call)
{
    double faults = 0;
    const struct gas_block *range = gas_argument(call, 0);
    for (size_t i = 0; i < range->rows * range->columns; i++)
        faults += is_fault(&range->cell[i]);
    gas_answer_number(call, faults);
}

void gas_fn_version(struct gas_call *call)
{
    gas_answer_text(call,
                    "Gasleaf " GASLEAF_VERSION "; heat capacities: NASA/TP-2002-211556; atomic weights: IUPAC 2021; "
                    "R = 8.31446261815324 J/(mol K): SI 2019");
}
