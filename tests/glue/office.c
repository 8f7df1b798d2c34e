#include "office.h"

#include <dlfcn.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "sheet/catalogue.h"

struct office_types office_type;

__attribute__((constructor)) static void make_types(void)
{
    office_type.real = *typelib_static_type_getByTypeClass(typelib_TypeClass_DOUBLE);
    office_type.string = *typelib_static_type_getByTypeClass(typelib_TypeClass_STRING);
    office_type.any = *typelib_static_type_getByTypeClass(typelib_TypeClass_ANY);
    office_type.interface = *typelib_static_type_getByTypeClass(typelib_TypeClass_INTERFACE);
    typelib_static_sequence_type_init(&office_type.anys, office_type.any);
    typelib_static_sequence_type_init(&office_type.any_rows, office_type.anys);
}

bool office_member(uno_Interface *object, sal_Int32 position, void *result, void **arguments)
{
    typelib_InterfaceMemberTypeDescription member = {.nPosition = position};
    uno_Any exception, *raised = &exception;
    object->pDispatcher(object, &member.aBase, result, arguments, &raised);
    if (raised)
        uno_any_destruct(raised, NULL);
    return !raised;
}

uno_Interface *office_query(uno_Interface *object, const char *name)
{
    uno_Type *type = NULL;
    uno_Any answer;
    typelib_static_type_init(&type, typelib_TypeClass_INTERFACE, name);
    if (!office_member(object, 0, &answer, (void *[]){&type}))
        return NULL;
    uno_Interface *found =
        answer.pType->eTypeClass == typelib_TypeClass_INTERFACE ? *(uno_Interface **)answer.pData : NULL;
    uno_any_destruct(&answer, NULL);
    return found;
}

uno_Interface *office_open(void)
{
    static uno_Interface *functions;
    if (functions)
        return functions;
    const char *path = getenv("GASLEAF_ADDIN");
    void *library = dlopen(path ? path : "build/oxt/gasleaf.so", RTLD_NOW | RTLD_LOCAL);
    void *(*get_factory)(const char *, void *, void *) = NULL;
    if (library)
        *(void **)&get_factory = dlsym(library, "component_getFactory");
    if (!get_factory) {
        fprintf(stderr, "%s\n", dlerror());
        return NULL;
    }
    if (get_factory("some.other.Implementation", NULL, NULL))
        return NULL;
    uno_Interface *factory = get_factory("gasleaf.comp.Functions", NULL, NULL);
    uno_Interface *single = factory ? office_query(factory, "com.sun.star.lang.XSingleComponentFactory") : NULL;
    uno_Interface *context = NULL, *instance = NULL;
    if (single && office_member(single, 3, &instance, (void *[]){&context}))
        functions = office_query(instance, "gasleaf.XFunctions");
    return functions;
}

sal_Int32 office_position(const char *method)
{
    size_t count;
    const struct gas_function *function = gas_catalogue(&count);
    for (size_t i = 0; i < count; i++)
        if (strcmp(function[i].method, method) == 0)
            return (sal_Int32)i + 3;
    return -1;
}

void office_void(uno_Any *to)
{
    uno_type_any_construct(to, NULL, NULL, NULL);
}

static rtl_uString *string_of(const char *text)
{
    rtl_uString *string = NULL;
    rtl_string2UString(&string, text, (sal_Int32)strlen(text), RTL_TEXTENCODING_UTF8, OSTRING_TO_OUSTRING_CVTFLAGS);
    return string;
}

void office_real(uno_Any *to, double number)
{
    uno_type_any_construct(to, &number, office_type.real, NULL);
}

void office_text(uno_Any *to, const char *text)
{
    rtl_uString *string = string_of(text);
    uno_type_any_construct(to, &string, office_type.string, NULL);
    rtl_uString_release(string);
}

void office_clear(uno_Any *any)
{
    uno_any_destruct(any, NULL);
}

void office_rows(uno_Any *to, sal_Int32 rows, sal_Int32 columns)
{
    uno_Sequence *outer = NULL;
    uno_type_sequence_construct(&outer, office_type.any_rows, NULL, rows, NULL);
    for (sal_Int32 i = 0; i < rows; i++) {
        uno_Sequence **row = (uno_Sequence **)(void *)outer->elements + i;
        uno_type_destructData(row, office_type.anys, NULL);
        uno_type_sequence_construct(row, office_type.anys, NULL, columns, NULL);
    }
    uno_type_any_construct(to, &outer, office_type.any_rows, NULL);
    uno_type_destructData(&outer, office_type.any_rows, NULL);
}

uno_Any *office_at(const uno_Any *rows, sal_Int32 row, sal_Int32 column)
{
    const uno_Sequence *outer = *(uno_Sequence **)rows->pData;
    uno_Sequence *inner = ((uno_Sequence *const *)(const void *)outer->elements)[row];
    return (uno_Any *)(void *)inner->elements + column;
}

void office_put_real(uno_Any *at, double number)
{
    uno_type_any_assign(at, &number, office_type.real, NULL, NULL);
}

void office_put_text(uno_Any *at, const char *text)
{
    rtl_uString *string = string_of(text);
    uno_type_any_assign(at, &string, office_type.string, NULL, NULL);
    rtl_uString_release(string);
}

bool office_is_text(const uno_Any *any, const char *text)
{
    if (any->pType->eTypeClass != typelib_TypeClass_STRING)
        return false;
    rtl_uString *wanted = string_of(text);
    const rtl_uString *got = *(rtl_uString **)any->pData;
    bool same = got->length == wanted->length &&
                memcmp(got->buffer, wanted->buffer, sizeof(sal_Unicode) * (size_t)got->length) == 0;
    rtl_uString_release(wanted);
    return same;
}
