/* Live ranges: the only arguments that show the errors of the office and blank cells. */
#include "addin/marshal.h"

/* One call out. True when it answered without an exception; result is constructed then. */
static bool call_out(uno_Interface *object, const char *member, void *result, void **arguments)
{
    rtl_uString *name = NULL;
    typelib_TypeDescription *description = NULL;
    uno_Any exception, *raised = &exception;
    rtl_uString_newFromAscii(&name, member);
    typelib_typedescription_getByName(&description, name);
    rtl_uString_release(name);
    if (!description)
        return false;
    object->pDispatcher(object, description, result, arguments, &raised);
    if (raised)
        uno_any_destruct(raised, NULL);
    typelib_typedescription_release(description);
    return !raised;
}

static bool live_cells(uno_Interface *range, uno_Sequence **cells)
{
    uno_Any answer;
    uno_Type *wanted = addin_type.cell_range_data;
    if (!range || !call_out(range, "com.sun.star.uno.XInterface::queryInterface", &answer, (void *[]){&wanted}))
        return false;
    bool known =
        answer.pType->eTypeClass == typelib_TypeClass_INTERFACE &&
        call_out(*(uno_Interface **)answer.pData, "com.sun.star.sheet.XCellRangeData::getDataArray", cells, NULL);
    uno_any_destruct(&answer, NULL);
    return known;
}

static void mark_host_errors(struct gas_block *block)
{
    for (size_t i = 0; i < block->rows * block->columns; i++)
        if (block->cell[i].kind == GAS_CELL_EMPTY)
            block->cell[i].kind = GAS_CELL_HOST_ERROR;
}

bool addin_read_live(uno_Interface *range, struct gas_arena *arena, struct gas_block *block)
{
    uno_Sequence *cells = NULL;
    if (!live_cells(range, &cells)) {
        addin_read_message("Check range: its cells cannot be read; give a range of cells.", arena, block);
        return false;
    }
    addin_read_rows(addin_type.any_rows, cells, arena, block);
    mark_host_errors(block);
    uno_type_destructData(&cells, addin_type.any_rows, NULL);
    return true;
}
