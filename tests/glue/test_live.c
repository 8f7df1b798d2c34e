/* A live range: the add-in asks the office's object for its data and gives back every reference it took. */
#include <stdio.h>
#include <string.h>

#include "check.h"
#include "office.h"

/* The office's cell range: answers queryInterface with itself and getDataArray with rows, or raises. */
struct range {
    uno_Interface uno;
    int references;
    bool raises, known;
    uno_Any rows;
};

static uno_Type *data_type;

static void acquire(uno_Interface *uno)
{
    ((struct range *)uno)->references++;
}

static void release(uno_Interface *uno)
{
    ((struct range *)uno)->references--;
}

static void dispatch(uno_Interface *uno, const typelib_TypeDescription *member, void *result, void **arguments,
                     uno_Any **raised)
{
    struct range *range = (struct range *)uno;
    if (((const typelib_InterfaceMemberTypeDescription *)member)->nPosition == 0) {
        bool same = range->known && typelib_typedescriptionreference_equals(*(uno_Type **)arguments[0], data_type);
        uno_type_any_construct(result, same ? &uno : NULL, same ? data_type : NULL, NULL);
        *raised = NULL;
    } else if (range->raises) {
        office_text(*raised, "disposed");
    } else {
        uno_type_copyData(result, range->rows.pData, office_type.any_rows, NULL);
        *raised = NULL;
    }
}

static rtl_uString *ascii(const char *text)
{
    rtl_uString *string = NULL;
    rtl_uString_newFromAscii(&string, text);
    return string;
}

/* Inside the office the type library tells about XCellRangeData; here its one member is told by hand. */
static void tell_type(void)
{
    typelib_InterfaceTypeDescription *interface = NULL;
    typelib_InterfaceMethodTypeDescription *method = NULL;
    typelib_TypeDescription *registered;
    typelib_TypeDescriptionReference *member = NULL;
    rtl_uString *name = ascii("com.sun.star.sheet.XCellRangeData");
    rtl_uString *member_name = ascii("com.sun.star.sheet.XCellRangeData::getDataArray");
    rtl_uString *rows_name = ascii("[][]any");
    typelib_static_type_init(&data_type, typelib_TypeClass_INTERFACE, "com.sun.star.sheet.XCellRangeData");
    typelib_typedescriptionreference_new(&member, typelib_TypeClass_INTERFACE_METHOD, member_name);
    typelib_typedescription_newInterface(&interface, name, 0, 0, 0, 0, 0, office_type.interface, 1, &member);
    registered = &interface->aBase;
    typelib_typedescription_register(&registered);
    typelib_typedescription_newInterfaceMethod(&method, 3, 0, member_name, typelib_TypeClass_SEQUENCE, rows_name, 0,
                                               NULL, 0, NULL);
    typelib_TypeDescription *registered_method = &method->aBase.aBase;
    typelib_typedescription_register(&registered_method);
    rtl_uString_release(name);
    rtl_uString_release(member_name);
    rtl_uString_release(rows_name);
}

static void check_faults(const char *id, struct range *range, double expected)
{
    uno_Interface *functions = office_open(), *cells = &range->uno;
    uno_Any answer;
    if (!functions || !office_member(functions, office_position("faults"), &answer, (void *[]){&cells})) {
        check_true(id, false);
        return;
    }
    if (expected >= 0)
        check_true(id, answer.pType->eTypeClass == typelib_TypeClass_DOUBLE && *(double *)answer.pData == expected);
    else
        check_true(id, office_is_text(&answer, "Check range: its cells cannot be read; give a range of cells."));
    office_clear(&answer);
    check_int("references are given back", range->references, 1);
}

static void live_ranges(void)
{
    struct range range = {{acquire, release, dispatch}, 1, false, true, {0}};
    tell_type();
    office_rows(&range.rows, 2, 2); /* four void anys: errors of the office */
    check_faults("four errors", &range, 4);
    office_put_text(office_at(&range.rows, 0, 0), "Check P: no.");
    office_put_text(office_at(&range.rows, 0, 1), "");
    office_put_text(office_at(&range.rows, 1, 0), "a label");
    office_put_real(office_at(&range.rows, 1, 1), 3);
    check_faults("a sentence and a blank", &range, 2);
    office_clear(&range.rows);
    office_rows(&range.rows, 2000, 20);
    check_faults("40000 cells", &range, 40000);
    range.raises = true;
    check_faults("the office raises", &range, -1);
    range.known = false;
    check_faults("no such interface", &range, -1);
    office_clear(&range.rows);
}

static void no_range(void)
{
    uno_Interface *functions = office_open(), *none = NULL;
    uno_Any answer;
    bool answered = functions && office_member(functions, office_position("faults"), &answer, (void *[]){&none});
    check_true("no object",
               answered && office_is_text(&answer, "Check range: its cells cannot be read; give a range of "
                                                   "cells."));
    if (answered)
        office_clear(&answer);
}

const struct test_suite suite_live = {
    "live", (const struct test_case[]){{"live ranges", live_ranges}, {"no range", no_range}, {0}}};
