/*
 * object.h - objects of the office in C: a set of interfaces that answer for one another.
 *
 * Both objects of the add-in are constants without state: they live as long as the library, which is never unloaded,
 * so acquire and release have nothing to count and making an instance cannot fail.
 */
#ifndef ADDIN_OBJECT_H
#define ADDIN_OBJECT_H

#include "addin/types.h"

/* Own members of an interface begin here: 0 is queryInterface, 1 acquire, 2 release. */
enum { ADDIN_OWN_MEMBERS = 3, ADDIN_FACES = 4 };

struct addin_object;

/* One member call: construct the result in raw memory and return true; false when there is no such member. */
typedef bool addin_members(const struct addin_object *object, sal_Int32 member, void *result, void **arguments);

struct addin_face {
    uno_Interface uno; /* first: the office's pointer is a pointer to the face */
    const struct addin_object *object;
    addin_members *members;
    uno_Type *const *type; /* in the table of types */
};

struct addin_object {
    struct addin_face face[ADDIN_FACES]; /* the first one is the object's identity */
    size_t faces;
};

/* addin_functions, addin_factory - the two objects: the worksheet functions, and what hands them out. */
uno_Interface *addin_functions(void);
uno_Interface *addin_factory(void);

/* The members of gasleaf.XFunctions: dispatch.c. */
addin_members addin_call_function;

#endif
