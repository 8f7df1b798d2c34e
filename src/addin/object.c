#include "addin/object.h"

#include <string.h>

static void keep(uno_Interface *uno)
{
    (void)uno;
}

static const struct addin_face *face_of_type(const struct addin_object *object, const uno_Type *wanted)
{
    if (typelib_typedescriptionreference_equals(wanted, addin_type.interface))
        return &object->face[0];
    for (size_t i = 0; i < object->faces; i++)
        if (typelib_typedescriptionreference_equals(wanted, *object->face[i].type))
            return &object->face[i];
    return NULL;
}

static void query(const struct addin_object *object, void *result, void **arguments)
{
    const struct addin_face *face = face_of_type(object, *(uno_Type **)arguments[0]);
    const uno_Interface *uno = face ? &face->uno : NULL;
    uno_type_any_construct(result, face ? &uno : NULL, face ? *face->type : NULL, NULL);
}

static void refuse_member(uno_Any *raised)
{
    struct {
        rtl_uString *message;
        uno_Interface *context;
    } exception = {addin_string("no such member", 14), NULL};
    uno_type_any_construct(raised, &exception, addin_type.runtime_exception, NULL);
    rtl_uString_release(exception.message);
}

static void dispatch(uno_Interface *uno, const typelib_TypeDescription *description, void *result, void **arguments,
                     uno_Any **raised)
{
    const struct addin_face *face = (const struct addin_face *)uno;
    sal_Int32 position = ((const typelib_InterfaceMemberTypeDescription *)description)->nPosition;
    bool done = true;
    if (position == 0)
        query(face->object, result, arguments);
    else if (position >= ADDIN_OWN_MEMBERS)
        done = face->members(face->object, position - ADDIN_OWN_MEMBERS, result, arguments);
    if (done)
        *raised = NULL;
    else
        refuse_member(*raised);
}

/* com.sun.star.lang.XTypeProvider: getTypes, getImplementationId */
static bool provide_types(const struct addin_object *object, sal_Int32 member, void *result, void **arguments)
{
    (void)arguments;
    if (member == 1) {
        uno_type_sequence_construct(result, addin_type.bytes, NULL, 0, NULL);
        return true;
    }
    uno_Type *list[ADDIN_FACES];
    for (size_t i = 0; i < object->faces; i++)
        list[i] = *object->face[i].type;
    if (member == 0)
        uno_type_sequence_construct(result, addin_type.types, list, (sal_Int32)object->faces, NULL);
    return member == 0;
}

/* com.sun.star.lang.XServiceInfo: getImplementationName, supportsService, getSupportedServiceNames */
static bool tell_services(const struct addin_object *object, sal_Int32 member, void *result, void **arguments)
{
    (void)object;
    rtl_uString *service = addin_string(ADDIN_SERVICE, strlen(ADDIN_SERVICE));
    if (member == 0) {
        *(rtl_uString **)result = addin_string(ADDIN_IMPLEMENTATION, strlen(ADDIN_IMPLEMENTATION));
    } else if (member == 1) {
        const rtl_uString *asked = *(rtl_uString **)arguments[0];
        *(sal_Bool *)result =
            rtl_ustr_compare_WithLength(asked->buffer, asked->length, service->buffer, service->length) == 0;
    } else if (member == 2) {
        uno_type_sequence_construct(result, addin_type.strings, &service, 1, NULL);
    }
    rtl_uString_release(service);
    return member <= 2;
}

/* com.sun.star.lang.XSingleComponentFactory: both members make an instance; arguments mean nothing to it. */
static bool make_instance(const struct addin_object *object, sal_Int32 member, void *result, void **arguments)
{
    (void)object;
    (void)arguments;
    if (member <= 1)
        *(uno_Interface **)result = addin_functions();
    return member <= 1;
}

/* clang-format off */
static const struct addin_object functions = {
    {{{keep, keep, dispatch}, &functions, addin_call_function, &addin_type.functions},
     {{keep, keep, dispatch}, &functions, provide_types,       &addin_type.type_provider},
     {{keep, keep, dispatch}, &functions, tell_services,       &addin_type.service_info}},
    3};

static const struct addin_object factory = {
    {{{keep, keep, dispatch}, &factory, make_instance, &addin_type.factory},
     {{keep, keep, dispatch}, &factory, provide_types, &addin_type.type_provider},
     {{keep, keep, dispatch}, &factory, tell_services, &addin_type.service_info}},
    3};
/* clang-format on */

uno_Interface *addin_functions(void)
{
    return (uno_Interface *)&functions.face[0].uno;
}

uno_Interface *addin_factory(void)
{
    return (uno_Interface *)&factory.face[0].uno;
}
