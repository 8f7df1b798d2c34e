/* The interface of the add-in in the office's description language. Methods stand in the catalogue's order. */
#include "generate/generate.h"

void gas_idl_name(FILE *out, const char *name)
{
    for (; *name; name++)
        if (*name != ' ')
            putc(*name, out);
}

static const char *type_of(const struct gas_parameter *parameter)
{
    switch (parameter->kind) {
    case GAS_PARAMETER_LIVE:
        return "com::sun::star::table::XCellRange";
    case GAS_PARAMETER_REST:
        return "sequence<any>";
    default:
        return "any";
    }
}

static void write_method(FILE *out, const struct gas_function *function)
{
    fprintf(out, "\n        /** %s: %s. */\n        any %s(", function->sheet_name, function->help, function->method);
    for (size_t i = 0; i < gas_parameter_count(function); i++) {
        fprintf(out, "%s[in] %s ", i ? ", " : "", type_of(&function->parameter[i]));
        gas_idl_name(out, function->parameter[i].name);
    }
    fputs(");\n", out);
}

void gas_write_interface(FILE *out, const struct gas_function *functions, size_t count)
{
    fputs("// Generated from src/audit/catalogue.c by `make generate`.\n"
          "module gasleaf\n{\n"
          "    /** The worksheet functions. A member's place is its row in the catalogue. */\n"
          "    interface XFunctions\n    {",
          out);
    for (size_t i = 0; i < count; i++)
        write_method(out, &functions[i]);
    fputs("    };\n};\n", out);
}

void gas_write_service(FILE *out, const struct gas_function *functions, size_t count)
{
    (void)functions;
    (void)count;
    fputs("// Generated from src/audit/catalogue.c by `make generate`.\n"
          "module gasleaf\n{\n"
          "    service Functions : XFunctions;\n"
          "};\n",
          out);
}
