/*
 * uno_headers.h - the office's binary interface for C: the one place that includes the SDK's headers.
 *
 * They are C headers by intent but are compiled as C++ everywhere else. Three repairs make them C: the platform
 * macros that the SDK's own make files would set, bool, and the tag of an enum that is used as a type name. Their
 * inline functions have no external definition in C and are not called.
 */
#ifndef ADDIN_UNO_HEADERS_H
#define ADDIN_UNO_HEADERS_H

#ifndef UNX
#define UNX
#endif
#ifndef LINUX
#define LINUX
#endif

#include <stdbool.h>

#include <typelib/typeclass.h>
typedef enum _typelib_TypeClass _typelib_TypeClass;

#include <rtl/ustring.h>
#include <typelib/typedescription.h>
#include <uno/any2.h>
#include <uno/data.h>
#include <uno/dispatcher.h>
#include <uno/sequence2.h>

typedef typelib_TypeDescriptionReference uno_Type;

#endif
