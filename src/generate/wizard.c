/* CalcAddIns.xcu: names and texts of the functions and their arguments as the function wizard shows them. */
#include "generate/generate.h"

static void write_escaped(FILE *out, const char *text)
{
    for (; *text; text++)
        switch (*text) {
        case '<':
            fputs("&lt;", out);
            break;
        case '>':
            fputs("&gt;", out);
            break;
        case '&':
            fputs("&amp;", out);
            break;
        default:
            putc(*text, out);
        }
}

static void write_property(FILE *out, int indent, const char *name, const char *start, const char *text)
{
    fprintf(out, "%*s<prop oor:name=\"%s\"><value xml:lang=\"en\">", indent, "", name);
    fputs(start, out);
    write_escaped(out, text);
    fputs("</value></prop>\n", out);
}

static void write_parameter(FILE *out, const struct gas_parameter *parameter)
{
    fputs("      <node oor:name=\"", out);
    gas_idl_name(out, parameter->name);
    fputs("\" oor:op=\"replace\">\n", out);
    write_property(out, 7, "DisplayName", "", parameter->name);
    /* The office calls every argument of any type optional: the text says which ones are not. */
    bool any = parameter->kind == GAS_PARAMETER_ANY || parameter->kind == GAS_PARAMETER_TEXT;
    if (any && !parameter->optional)
        write_property(out, 7, "Description", "Required. ", parameter->help);
    else
        write_property(out, 7, "Description", "", parameter->help);
    fputs("      </node>\n", out);
}

static void write_function(FILE *out, const struct gas_function *function)
{
    fprintf(out, "    <node oor:name=\"%s\" oor:op=\"replace\">\n", function->method);
    write_property(out, 5, "DisplayName", "", function->sheet_name);
    write_property(out, 5, "CompatibilityName", "", function->sheet_name);
    write_property(out, 5, "Description", "", function->help);
    fputs("     <prop oor:name=\"Category\"><value>Add-In</value></prop>\n     <node oor:name=\"Parameters\">\n", out);
    for (size_t i = 0; i < gas_parameter_count(function); i++)
        write_parameter(out, &function->parameter[i]);
    fputs("     </node>\n    </node>\n", out);
}

void gas_write_wizard(FILE *out, const struct gas_function *functions, size_t count)
{
    fputs("<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n"
          "<!-- Generated from src/audit/catalogue.c by `make generate`. -->\n"
          "<oor:component-data xmlns:oor=\"http://openoffice.org/2001/registry\"\n"
          "    xmlns:xs=\"http://www.w3.org/2001/XMLSchema\" oor:name=\"CalcAddIns\" "
          "oor:package=\"org.openoffice.Office\">\n"
          " <node oor:name=\"AddInInfo\">\n  <node oor:name=\"gasleaf.Functions\" oor:op=\"replace\">\n"
          "   <node oor:name=\"AddInFunctions\">\n",
          out);
    for (size_t i = 0; i < count; i++)
        write_function(out, &functions[i]);
    fputs("   </node>\n  </node>\n </node>\n</oor:component-data>\n", out);
}
