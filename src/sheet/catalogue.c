#include "sheet/catalogue.h"

#include "sheet/functions.h"

/* clang-format off */
static const struct gas_function rows[] = {
    {"GAS.SOLVE", "solve", gas_fn_solve,
     "States of an ideal gas, changes of a closed amount and flows: whatever follows from the figures given",
     {{"gas", "Name, formula or CAS number, a mixture, a card; a heat-capacity rule may follow after |", false, GAS_PARAMETER_ANY},
      {"given", "A text such as 7 bar(g); 35 °C; 12 m3, a block of headings and values, or a table of cases", false, GAS_PARAMETER_ANY},
      {"wanted", "A text such as m, kg or a range of headings; left out: a card of everything that follows", true, GAS_PARAMETER_ANY},
      {"headings", "Headings of the table's columns or rows, quantity and unit such as P1, bar(g)", true, GAS_PARAMETER_ANY},
      {"options", "A text such as barometer 0.98 bar; datum 0 °C; agree 0.5 %; hard errors", true, GAS_PARAMETER_ANY}},
     "GAS.SOLVE(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"kg\")", "105.14"},

    {"GAS.GIVEN", "given", gas_fn_given,
     "A block of givens from scattered cells: heading, value, heading, value and so on",
     {{"heading", "Quantity and unit of the value that follows, such as P1, bar(g)", false, GAS_PARAMETER_ANY},
      {"value", "Figure in the unit of the heading before it", false, GAS_PARAMETER_ANY},
      {"more", "Further pairs of heading and value", true, GAS_PARAMETER_REST}},
     "GAS.GIVEN(\"P, bar(g)\";7;\"T, °C\";35)", "P, bar(g)"},

    {"GAS.FAULTS", "faults", gas_fn_faults,
     "How many cells of a range hold a readable error, an error of the office or a blank",
     {{"range", "A live cell range where every cell should hold a figure or a plain text", false, GAS_PARAMETER_LIVE}},
     NULL, NULL},

    {"GAS.VERSION", "version", gas_fn_version,
     "Version of Gasleaf and the sources of its data, for the header of a calculation sheet",
     {{0}},
     "GAS.VERSION()", "Gasleaf " GASLEAF_VERSION},
};
/* clang-format on */

const struct gas_function *gas_catalogue(size_t *count)
{
    *count = sizeof rows / sizeof *rows;
    return rows;
}

size_t gas_parameter_count(const struct gas_function *function)
{
    size_t count = 0;
    while (count < GAS_PARAMETERS && function->parameter[count].name)
        count++;
    return count;
}

static const struct gas_cell *earlier_sentence(const struct gas_call *call)
{
    for (size_t i = 0; i < call->count; i++)
        if (gas_single(&call->argument[i]) && gas_cell_is_sentence(call->argument[i].cell))
            return call->argument[i].cell;
    return NULL;
}

void gas_function_call(const struct gas_function *function, struct gas_call *call)
{
    /* A live range is looked at, not computed with: a sentence in it is what FAULTS counts. */
    const struct gas_cell *sentence = function->parameter[0].kind == GAS_PARAMETER_LIVE ? NULL : earlier_sentence(call);
    if (sentence)
        gas_answer_text(call, sentence->text);
    else
        function->entry(call);
}
