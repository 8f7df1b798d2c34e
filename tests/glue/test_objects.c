/* The objects answer the questions that the office asks before it calls a function. */
#include <stdio.h>
#include <string.h>

#include "check.h"
#include "office.h"

static void interfaces(void)
{
    uno_Interface *functions = office_open();
    check_true("factory and functions are found", functions != NULL);
    if (!functions)
        return;
    uno_Interface *identity = office_query(functions, "com.sun.star.uno.XInterface");
    uno_Interface *provider = office_query(functions, "com.sun.star.lang.XTypeProvider");
    uno_Interface *information = office_query(functions, "com.sun.star.lang.XServiceInfo");
    check_true("XInterface", identity != NULL);
    check_true("XTypeProvider", provider != NULL);
    check_true("XServiceInfo", information != NULL);
    check_true("one identity from every face",
               office_query(provider, "com.sun.star.uno.XInterface") == identity &&
                   office_query(information, "com.sun.star.uno.XInterface") == identity);
    check_true("no other interface", office_query(functions, "com.sun.star.frame.XModel") == NULL);
    functions->acquire(functions);
    functions->release(functions);
    functions->release(functions);
    check_true("lives as long as the library", office_query(functions, "gasleaf.XFunctions") == functions);
}

static void type_provider(void)
{
    uno_Interface *functions = office_open();
    uno_Interface *provider = functions ? office_query(functions, "com.sun.star.lang.XTypeProvider") : NULL;
    uno_Sequence *types = NULL, *id = NULL;
    uno_Type *type = *typelib_static_type_getByTypeClass(typelib_TypeClass_TYPE), *of_types = NULL, *of_bytes = NULL;
    typelib_static_sequence_type_init(&of_types, type);
    typelib_static_sequence_type_init(&of_bytes, *typelib_static_type_getByTypeClass(typelib_TypeClass_BYTE));
    bool answered = provider && office_member(provider, 3, &types, NULL) && office_member(provider, 4, &id, NULL);
    check_true("types and id", answered);
    if (!answered)
        return;
    check_int("three interfaces", types->nElements, 3);
    check_int("no id", id->nElements, 0);
    uno_type_destructData(&types, of_types, NULL);
    uno_type_destructData(&id, of_bytes, NULL);
    check_true("no further member", !office_member(provider, 5, &id, NULL));
}

static void service_information(void)
{
    uno_Interface *functions = office_open();
    uno_Interface *information = functions ? office_query(functions, "com.sun.star.lang.XServiceInfo") : NULL;
    uno_Any service, other;
    uno_Sequence *names = NULL;
    uno_Type *strings = NULL;
    sal_Bool yes = 0, no = 1;
    rtl_uString *name = NULL;
    check_true("found", information != NULL);
    if (!information)
        return;
    typelib_static_sequence_type_init(&strings, office_type.string);
    office_text(&service, "gasleaf.Functions");
    office_text(&other, "gasleaf.Function");
    check_true("supports", office_member(information, 4, &yes, (void *[]){service.pData}) && yes);
    check_true("does not support", office_member(information, 4, &no, (void *[]){other.pData}) && !no);
    check_true("names", office_member(information, 5, &names, NULL) && names->nElements == 1);
    check_true("implementation", office_member(information, 3, &name, NULL) && name->length == 22);
    uno_type_destructData(&names, strings, NULL);
    rtl_uString_release(name);
    office_clear(&service);
    office_clear(&other);
}

static void missing_members(void)
{
    uno_Interface *functions = office_open();
    uno_Any result;
    check_true("a member beyond the last raises", functions && !office_member(functions, 1000, &result, NULL));
}

const struct test_suite suite_objects = {"objects", (const struct test_case[]){{"interfaces", interfaces},
                                                                               {"types", type_provider},
                                                                               {"services", service_information},
                                                                               {"missing members", missing_members},
                                                                               {0}}};
