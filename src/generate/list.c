#include "generate/generate.h"

const struct gas_generated *gas_generated(void)
{
    static const struct gas_generated list[] = {{"idl/gasleaf/XFunctions.idl", gas_write_interface},
                                                {"idl/gasleaf/Functions.idl", gas_write_service},
                                                {"src/package/CalcAddIns.xcu", gas_write_wizard},
                                                {"docs/functions.md", gas_write_reference},
                                                {0}};
    return list;
}
