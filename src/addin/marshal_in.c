#include "addin/marshal.h"

#include <stdint.h>

#include "addin/text.h"

#define NO_MEMORY "Check the range: it is too large for the memory at hand; give fewer rows."
#define BAD_VALUE "Check the argument: a value of this kind cannot be used; give a number, a text or a range of cells."

/* Texts repeat down a column and the office keeps equal ones once: the last one converted is remembered. */
struct reader {
    struct gas_arena *arena;
    const rtl_uString *string;
    struct gas_cell text;
};

static struct gas_cell read_text(struct reader *reader, const rtl_uString *string)
{
    if (string != reader->string) {
        reader->text = addin_text(string, reader->arena);
        reader->string = string;
    }
    return reader->text;
}

static size_t element_size(typelib_TypeClass kind)
{
    switch (kind) {
    case typelib_TypeClass_BOOLEAN:
    case typelib_TypeClass_BYTE:
        return 1;
    case typelib_TypeClass_SHORT:
    case typelib_TypeClass_UNSIGNED_SHORT:
        return sizeof(sal_Int16);
    case typelib_TypeClass_LONG:
    case typelib_TypeClass_UNSIGNED_LONG:
    case typelib_TypeClass_FLOAT:
        return sizeof(sal_Int32);
    case typelib_TypeClass_HYPER:
    case typelib_TypeClass_UNSIGNED_HYPER:
    case typelib_TypeClass_DOUBLE:
        return sizeof(sal_Int64);
    case typelib_TypeClass_STRING:
    case typelib_TypeClass_SEQUENCE:
        return sizeof(void *);
    case typelib_TypeClass_ANY:
        return sizeof(uno_Any);
    default:
        return 0;
    }
}

static struct gas_cell read_value(struct reader *reader, typelib_TypeClass kind, const void *data)
{
    switch (kind) {
    case typelib_TypeClass_VOID:
        return (struct gas_cell){0};
    case typelib_TypeClass_DOUBLE:
        return gas_cell_number(*(const double *)data);
    case typelib_TypeClass_STRING:
        return read_text(reader, *(rtl_uString *const *)data);
    case typelib_TypeClass_BOOLEAN:
        return gas_cell_number(*(const sal_Bool *)data != 0);
    case typelib_TypeClass_BYTE:
        return gas_cell_number(*(const sal_Int8 *)data);
    case typelib_TypeClass_SHORT:
        return gas_cell_number(*(const sal_Int16 *)data);
    case typelib_TypeClass_UNSIGNED_SHORT:
        return gas_cell_number(*(const sal_uInt16 *)data);
    case typelib_TypeClass_LONG:
        return gas_cell_number(*(const sal_Int32 *)data);
    case typelib_TypeClass_UNSIGNED_LONG:
        return gas_cell_number(*(const sal_uInt32 *)data);
    case typelib_TypeClass_HYPER:
        return gas_cell_number((double)*(const sal_Int64 *)data);
    case typelib_TypeClass_UNSIGNED_HYPER:
        return gas_cell_number((double)*(const sal_uInt64 *)data);
    case typelib_TypeClass_FLOAT:
        return gas_cell_number((double)*(const float *)data);
    default:
        return addin_message(BAD_VALUE);
    }
}

static typelib_TypeClass element_kind(uno_Type *sequence)
{
    if (typelib_typedescriptionreference_equals(sequence, addin_type.any_rows))
        return typelib_TypeClass_SEQUENCE;
    if (typelib_typedescriptionreference_equals(sequence, addin_type.anys))
        return typelib_TypeClass_ANY;
    typelib_TypeDescription *description = NULL;
    typelib_typedescriptionreference_getDescription(&description, sequence);
    if (!description)
        return typelib_TypeClass_UNKNOWN;
    typelib_TypeClass kind = ((const typelib_IndirectTypeDescription *)description)->pType->eTypeClass;
    typelib_typedescription_release(description);
    return kind;
}

static uno_Type *row_type(uno_Type *rows)
{
    typelib_TypeDescription *description = NULL;
    typelib_typedescriptionreference_getDescription(&description, rows);
    uno_Type *row = description ? ((const typelib_IndirectTypeDescription *)description)->pType : NULL;
    if (description)
        typelib_typedescription_release(description); /* the sequence's own type keeps the row's */
    return row;
}

static struct gas_block single(struct gas_arena *arena, struct gas_cell cell)
{
    struct gas_cell *copy = gas_arena_take(arena, 1, sizeof *copy);
    if (!copy)
        return (struct gas_block){0};
    *copy = cell;
    return (struct gas_block){1, 1, copy, false};
}

void addin_read_message(const char *text, struct gas_arena *arena, struct gas_block *block)
{
    *block = single(arena, addin_message(text));
}

static void read_row(struct reader *reader, const uno_Sequence *row, typelib_TypeClass kind, struct gas_cell *cell)
{
    const char *element = row->elements;
    size_t size = element_size(kind);
    for (sal_Int32 i = 0; i < row->nElements; i++, element += size) {
        if (kind != typelib_TypeClass_ANY) {
            cell[i] = read_value(reader, kind, element);
            continue;
        }
        const uno_Any *any = (const uno_Any *)(const void *)element;
        cell[i] = read_value(reader, any->pType->eTypeClass, any->pData);
    }
}

/* The rows of a sequence: sequences of their own, or anys that hold sequences, or (one row) plain values. */
struct rows {
    size_t count, columns;
    const uno_Sequence *sequence;
    bool plain;
    typelib_TypeClass kind;     /* of the outer elements */
    typelib_TypeClass row_kind; /* of a row's elements when the outer ones are sequences */
};

static const uno_Sequence *row_at(const struct rows *rows, size_t i, typelib_TypeClass *kind)
{
    *kind = rows->row_kind;
    if (rows->kind == typelib_TypeClass_SEQUENCE)
        return ((uno_Sequence *const *)(const void *)rows->sequence->elements)[i];
    const uno_Any *any = (const uno_Any *)(const void *)rows->sequence->elements + i;
    if (rows->kind != typelib_TypeClass_ANY || any->pType->eTypeClass != typelib_TypeClass_SEQUENCE)
        return NULL;
    *kind = element_kind(any->pType);
    return *(uno_Sequence *const *)any->pData;
}

/* One row that is none, and all are plain values of a single row. */
static void measure(struct rows *rows)
{
    typelib_TypeClass kind;
    rows->count = (size_t)rows->sequence->nElements;
    for (size_t i = 0; i < rows->count; i++) {
        const uno_Sequence *row = row_at(rows, i, &kind);
        if (!row) {
            rows->plain = true;
            rows->columns = rows->count;
            rows->count = 1;
        } else if ((size_t)row->nElements > rows->columns) {
            rows->columns = (size_t)row->nElements;
        }
    }
}

static bool usable(typelib_TypeClass kind)
{
    return element_size(kind) > 0 && kind != typelib_TypeClass_SEQUENCE;
}

static struct gas_cell *take_cells(const struct rows *rows, struct gas_arena *arena)
{
    if (rows->columns && rows->count > SIZE_MAX / sizeof(struct gas_cell) / rows->columns)
        return NULL;
    return gas_arena_take(arena, rows->count * rows->columns, sizeof(struct gas_cell));
}

static void fill_row(struct reader *reader, const struct rows *rows, size_t i, struct gas_cell *cell)
{
    typelib_TypeClass kind;
    const uno_Sequence *row = rows->plain ? rows->sequence : row_at(rows, i, &kind);
    if (rows->plain)
        kind = rows->kind;
    bool good = usable(kind);
    size_t length = good ? (size_t)row->nElements : 0;
    if (length)
        read_row(reader, row, kind, cell);
    const struct gas_cell blank = {0}, filler = good ? blank : addin_message(BAD_VALUE);
    for (; length < rows->columns; length++)
        cell[length] = filler;
}

void addin_read_rows(uno_Type *type, const uno_Sequence *sequence, struct gas_arena *arena, struct gas_block *block)
{
    struct reader reader = {.arena = arena};
    struct rows rows = {.sequence = sequence, .kind = element_kind(type)};
    if (rows.kind == typelib_TypeClass_SEQUENCE) {
        uno_Type *row = row_type(type);
        rows.row_kind = row ? element_kind(row) : typelib_TypeClass_UNKNOWN;
    }
    measure(&rows);
    struct gas_cell *cells = take_cells(&rows, arena);
    if (!cells) {
        *block = single(arena, addin_message(NO_MEMORY));
        return;
    }
    *block = (struct gas_block){rows.columns ? rows.count : 0, rows.columns, cells, true};
    for (size_t i = 0; i < rows.count && rows.columns; i++)
        fill_row(&reader, &rows, i, cells + i * rows.columns);
}

void addin_read(const uno_Any *value, struct gas_arena *arena, struct gas_block *block)
{
    struct reader reader = {.arena = arena};
    typelib_TypeClass kind = value->pType->eTypeClass;
    if (kind == typelib_TypeClass_VOID)
        *block = (struct gas_block){0};
    else if (kind == typelib_TypeClass_SEQUENCE)
        addin_read_rows(value->pType, *(uno_Sequence *const *)value->pData, arena, block);
    else if (kind == typelib_TypeClass_INTERFACE)
        addin_read_live(*(uno_Interface *const *)value->pData, arena, block);
    else
        *block = single(arena, read_value(&reader, kind, value->pData));
}
