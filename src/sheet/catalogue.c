#include "sheet/catalogue.h"

#include "sheet/functions.h"

/* clang-format off */
#define THE_GAS           {"gas", "Name, formula or CAS number; a mixture such as N2 79 + O2 21; a card or mixture range; a rule after |", false, GAS_PARAMETER_ANY}
#define TEMPERATURE       {"temperature", "Temperature in K, or in the temperature unit; a text may carry its own unit", false, GAS_PARAMETER_ANY}
#define TEMPERATURE_FROM  {"from", "Temperature at the start, in K or in the temperature unit", false, GAS_PARAMETER_ANY}
#define TEMPERATURE_TO    {"to", "Temperature at the end, in K or in the temperature unit", false, GAS_PARAMETER_ANY}
#define TEMPERATURE_UNIT  {"temperature unit", "Unit of temperatures that are bare numbers, such as °C; left out: K", true, GAS_PARAMETER_ANY}
#define WANTED_CAPACITY   {"wanted", "Unit of the answer, such as kJ/kg-K; left out: J/(mol K)", true, GAS_PARAMETER_ANY}
#define WANTED_ENERGY     {"wanted", "Unit of the answer, such as kJ/kg; left out: J/mol", true, GAS_PARAMETER_ANY}

static const struct gas_function rows[] = {
    {"GAS.SOLVE", "solve", gas_fn_solve,
     "States of an ideal gas, changes of a closed amount and flows: whatever follows from the figures given",
     {{"gas", "Name, formula or CAS number, a mixture, a card; a heat-capacity rule may follow after |", false, GAS_PARAMETER_ANY},
      {"given", "A text such as 7 bar(g); 35 °C; 12 m3, a block of headings and values, or a table of cases", false, GAS_PARAMETER_ANY},
      {"wanted", "A text such as m, kg or a range of headings; left out: a card of everything that follows", true, GAS_PARAMETER_ANY},
      {"headings", "Headings of the table's columns or rows, quantity and unit such as P1, bar(g)", true, GAS_PARAMETER_ANY},
      {"options", "A text such as barometer 0.98 bar; datum 0 °C; agree 0.5 %; hard errors", true, GAS_PARAMETER_ANY}},
     "GAS.SOLVE(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"kg\")", "105.14"},

    {"GAS.CP", "cp", gas_fn_cp,
     "Heat capacity at constant pressure of the ideal gas at a temperature",
     {THE_GAS, TEMPERATURE, WANTED_CAPACITY, TEMPERATURE_UNIT},
     "GAS.CP(\"N2\";500)", "29.58"},

    {"GAS.CV", "cv", gas_fn_cv,
     "Heat capacity at constant volume of the ideal gas at a temperature, cp less R",
     {THE_GAS, TEMPERATURE, WANTED_CAPACITY, TEMPERATURE_UNIT},
     "GAS.CV(\"Ar\";25;\"J/mol-K\";\"°C\")", "12.47"},

    {"GAS.GAMMA", "gamma", gas_fn_gamma,
     "Heat-capacity ratio cp/cv of the ideal gas at a temperature",
     {THE_GAS, TEMPERATURE, {"wanted", "Nothing, or the heading gamma: the ratio has no unit", true, GAS_PARAMETER_ANY}, TEMPERATURE_UNIT},
     "GAS.GAMMA(\"Ar\";300)", "1.6667"},

    {"GAS.CPMEAN", "cpmean", gas_fn_cp_mean,
     "Mean heat capacity at constant pressure between two temperatures: the enthalpy change over the rise",
     {THE_GAS, TEMPERATURE_FROM, TEMPERATURE_TO, WANTED_CAPACITY, TEMPERATURE_UNIT},
     "GAS.CPMEAN(\"He\";20;300;\"J/mol-K\";\"°C\")", "20.786"},

    {"GAS.DH", "dh", gas_fn_dh,
     "Enthalpy change between two temperatures: the integral of cp",
     {THE_GAS, TEMPERATURE_FROM, TEMPERATURE_TO, WANTED_ENERGY, TEMPERATURE_UNIT},
     "GAS.DH(\"N2\";298.15;1500;\"kJ/mol\")", "38.405"},

    {"GAS.DU", "du", gas_fn_du,
     "Internal-energy change between two temperatures: the integral of cv",
     {THE_GAS, TEMPERATURE_FROM, TEMPERATURE_TO, WANTED_ENERGY, TEMPERATURE_UNIT},
     "GAS.DU(\"Ar\";300;400;\"J/mol\")", "1247.2"},

    {"GAS.DS", "ds", gas_fn_ds,
     "Entropy change between two temperatures and two pressures, or at constant pressure",
     {THE_GAS, TEMPERATURE_FROM, TEMPERATURE_TO,
      {"pressure from", "Pressure at the start, in Pa absolute or in the pressure unit; left out: constant pressure", true, GAS_PARAMETER_ANY},
      {"pressure to", "Pressure at the end, in Pa absolute or in the pressure unit", true, GAS_PARAMETER_ANY},
      WANTED_CAPACITY, TEMPERATURE_UNIT,
      {"pressure unit", "Unit of pressures that are bare numbers, such as bar(g); left out: Pa", true, GAS_PARAMETER_ANY}},
     "GAS.DS(\"Ar\";298.15;1500)", "33.583"},

    {"GAS.TEMP", "temp", gas_fn_temp,
     "Temperature at the end of a given change of enthalpy, internal energy or entropy",
     {THE_GAS, TEMPERATURE_FROM,
      {"change", "Change from the start, in J/mol or J/(mol K), or in the change unit", false, GAS_PARAMETER_ANY},
      {"kind", "What changes: dh (left out), du, or ds at constant pressure", true, GAS_PARAMETER_ANY},
      {"change unit", "Unit of changes that are bare numbers, such as kJ/kg", true, GAS_PARAMETER_ANY},
      TEMPERATURE_UNIT},
     "GAS.TEMP(\"Ar\";300;2078.6;\"dh\")", "400.0"},

    {"GAS.UNIT", "unit", gas_fn_unit,
     "Unit conversion that knows gauge pressures, temperature differences (Δ°C) and reference volumes",
     {{"value", "Figure or figures to convert", false, GAS_PARAMETER_ANY},
      {"from", "Unit they are in, such as psig or Nm3/h; a difference is marked, such as Δ°C", false, GAS_PARAMETER_ANY},
      {"to", "Unit they shall be in", false, GAS_PARAMETER_ANY},
      {"barometer", "Outside pressure for gauge and vacuum units, in Pa or with its unit; left out: 101325 Pa", true, GAS_PARAMETER_ANY}},
     "GAS.UNIT(100;\"psig\";\"bar\")", "7.9080"},

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
