#include "addin/types.h"

#include <limits.h>
#include <pthread.h>
#include <string.h>

struct addin_types addin_type;
static pthread_once_t once = PTHREAD_ONCE_INIT;

static uno_Type *basic(typelib_TypeClass kind)
{
    return *typelib_static_type_getByTypeClass(kind);
}

static uno_Type *sequence_of(uno_Type *element)
{
    uno_Type *made = NULL;
    typelib_static_sequence_type_init(&made, element);
    return made;
}

static uno_Type *named(typelib_TypeClass kind, const char *name)
{
    uno_Type *made = NULL;
    typelib_static_type_init(&made, kind, name);
    return made;
}

static void make_types(void)
{
    addin_type.real = basic(typelib_TypeClass_DOUBLE);
    addin_type.string = basic(typelib_TypeClass_STRING);
    addin_type.any = basic(typelib_TypeClass_ANY);
    addin_type.type = basic(typelib_TypeClass_TYPE);
    addin_type.byte = basic(typelib_TypeClass_BYTE);
    addin_type.interface = basic(typelib_TypeClass_INTERFACE);
    addin_type.strings = sequence_of(addin_type.string);
    addin_type.types = sequence_of(addin_type.type);
    addin_type.bytes = sequence_of(addin_type.byte);
    addin_type.anys = sequence_of(addin_type.any);
    addin_type.any_rows = sequence_of(addin_type.anys);
    addin_type.reals = sequence_of(addin_type.real);
    addin_type.real_rows = sequence_of(addin_type.reals);
    addin_type.type_provider = named(typelib_TypeClass_INTERFACE, "com.sun.star.lang.XTypeProvider");
    addin_type.service_info = named(typelib_TypeClass_INTERFACE, "com.sun.star.lang.XServiceInfo");
    addin_type.factory = named(typelib_TypeClass_INTERFACE, "com.sun.star.lang.XSingleComponentFactory");
    addin_type.functions = named(typelib_TypeClass_INTERFACE, "gasleaf.XFunctions");
    addin_type.cell_range_data = named(typelib_TypeClass_INTERFACE, "com.sun.star.sheet.XCellRangeData");
    addin_type.runtime_exception = named(typelib_TypeClass_EXCEPTION, "com.sun.star.uno.RuntimeException");
}

void addin_make_types(void)
{
    pthread_once(&once, make_types);
}

rtl_uString *addin_string(const char *text, size_t length)
{
    rtl_uString *made = NULL;
    if (length > INT_MAX)
        length = INT_MAX;
    rtl_string2UString(&made, text, (sal_Int32)length, RTL_TEXTENCODING_UTF8, OSTRING_TO_OUSTRING_CVTFLAGS);
    if (!made)
        rtl_uString_new(&made);
    return made;
}
