#include "addin/marshal.h"

#include <limits.h>
#include <math.h>
#include <stdint.h>
#include <string.h>

#include "addin/text.h"

#define NOT_FINITE "Check the result: it is not a finite number; look for a figure out of all proportion."
#define NOTHING    "Check the arguments: there is nothing to answer; give at least one figure."
#define TOO_LARGE  "Check the range: the answer is too large for the memory at hand; give fewer rows."

/* How the office keeps #N/A in a number: a quiet NaN that carries the error's code. */
static double not_available(void)
{
    const uint64_t bits = UINT64_C(0x7FF8000000000000) | 32767U;
    double number;
    memcpy(&number, &bits, sizeof number);
    return number;
}

/* A cell goes out as a number, or as a text (then the number means nothing). */
static const char *number_or_text(const struct gas_cell *cell, double *number)
{
    switch (cell->kind) {
    case GAS_CELL_NUMBER:
        *number = cell->number;
        return isfinite(cell->number) ? NULL : NOT_FINITE;
    case GAS_CELL_TEXT:
        return cell->text;
    case GAS_CELL_EMPTY:
        return "";
    default:
        *number = not_available();
        return NULL;
    }
}

static void write_text(uno_Any *to, const char *text, size_t length)
{
    rtl_uString *string = addin_string(text, length);
    uno_type_any_assign(to, &string, addin_type.string, NULL, NULL);
    rtl_uString_release(string);
}

static void write_cell(const struct gas_cell *cell, uno_Any *to) /* to: a live any */
{
    double number = 0;
    const char *text = number_or_text(cell, &number);
    if (text)
        write_text(to, text, cell->kind == GAS_CELL_TEXT ? cell->length : strlen(text));
    else
        uno_type_any_assign(to, &number, addin_type.real, NULL, NULL);
}

static bool all_numbers(const struct gas_block *answer)
{
    double number;
    for (size_t i = 0; i < answer->rows * answer->columns; i++)
        if (number_or_text(&answer->cell[i], &number))
            return false;
    return true;
}

/* Rows of plain numbers: one allocation a row. */
static void fill_reals(const struct gas_block *answer, size_t row, const uno_Sequence *to)
{
    double *number = (double *)(void *)to->elements;
    for (size_t column = 0; column < answer->columns; column++)
        number_or_text(gas_cell_at(answer, row, column), &number[column]);
}

static void fill_anys(const struct gas_block *answer, size_t row, const uno_Sequence *to)
{
    uno_Any *any = (uno_Any *)(void *)to->elements;
    for (size_t column = 0; column < answer->columns; column++)
        write_cell(gas_cell_at(answer, row, column), &any[column]);
}

static bool write_rows(const struct gas_block *answer, uno_Any *result)
{
    bool plain = all_numbers(answer);
    uno_Type *row_type = plain ? addin_type.reals : addin_type.anys;
    uno_Type *rows_type = plain ? addin_type.real_rows : addin_type.any_rows;
    uno_Sequence *rows = NULL;
    if (!uno_type_sequence_construct(&rows, rows_type, NULL, (sal_Int32)answer->rows, NULL))
        return false;
    bool complete = true;
    uno_Sequence **row = (uno_Sequence **)(void *)rows->elements;
    for (size_t i = 0; complete && i < answer->rows; i++) {
        uno_Sequence *made = NULL;
        complete = uno_type_sequence_construct(&made, row_type, NULL, (sal_Int32)answer->columns, NULL);
        if (!complete)
            break;
        (plain ? fill_reals : fill_anys)(answer, i, made);
        uno_type_destructData(&row[i], row_type, NULL);
        row[i] = made;
    }
    if (complete)
        uno_type_any_construct(result, &rows, rows_type, NULL);
    uno_type_destructData(&rows, rows_type, NULL);
    return complete;
}

static void write_single(const struct gas_cell *cell, uno_Any *result)
{
    uno_type_any_construct(result, NULL, NULL, NULL);
    write_cell(cell, result);
}

void addin_write(const struct gas_block *answer, uno_Any *result)
{
    if (answer->rows == 0 || answer->columns == 0)
        write_single(&(struct gas_cell){GAS_CELL_TEXT, 0, NOTHING, sizeof NOTHING - 1}, result);
    else if (gas_single(answer))
        write_single(answer->cell, result);
    else if (answer->rows > INT_MAX || answer->columns > INT_MAX || !write_rows(answer, result))
        write_single(&(struct gas_cell){GAS_CELL_TEXT, 0, TOO_LARGE, sizeof TOO_LARGE - 1}, result);
}
