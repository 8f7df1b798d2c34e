/* The only symbol that leaves the library: the office's loader asks it for a factory by the implementation's name. */
#include <string.h>

#include "addin/object.h"

void *component_getFactory(const char *implementation, void *service_manager, void *registry_key);

SAL_DLLPUBLIC_EXPORT void *component_getFactory(const char *implementation, void *service_manager, void *registry_key)
{
    (void)service_manager;
    (void)registry_key;
    if (!implementation || strcmp(implementation, ADDIN_IMPLEMENTATION) != 0)
        return NULL;
    addin_make_types();
    return addin_factory();
}
