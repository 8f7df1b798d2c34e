#include "sheet/catalogue.h"

#include <string.h>

#include "audit/functions.h"
#include "sheet/functions.h"

/* clang-format off */
#define START             {"given", "Start of the path: a text such as 2 kg; 25 °C; 1 bar, a block of headings and values, or a table with headings", false, GAS_PARAMETER_TEXT}
#define LEGS              {"legs", "Processes and where they end, such as isothermal to 8 bar; adiabatic to 2 bar, or a range of them", false, GAS_PARAMETER_TEXT}
#define HEADINGS          {"headings", "Headings of the columns of given, such as P1, bar(g), when they do not stand in it", true, GAS_PARAMETER_TEXT}
#define OPTIONS           {"options", "Text of options, such as flow; work by gas; barometer 0.98 bar", true, GAS_PARAMETER_TEXT}
#define CHECKED_GAS       {"gas", "Name, formula or CAS number; a mixture; a card; a rule after | holds what the old sheet assumes of cp", false, GAS_PARAMETER_TEXT}
#define CHECKED           {"given", "What is given, as for SOLVE or PATH: a text, a block, or a table with headings", false, GAS_PARAMETER_TEXT}
#define LEGACY            {"legacy", "Old figure or figures, one for each case and wanted heading; a text keeps its digits, such as 0.720", false, GAS_PARAMETER_ANY}
#define CHECKED_LEGS      {"legs", "Where the figure comes from: legs of a path, such as isothermal to 8 bar; a stages text; fill or vent", true, GAS_PARAMETER_TEXT}
#define AUDIT_OPTIONS     {"options", "Text of options, such as digits 4; flow; work by gas; barometer 0.98 bar", true, GAS_PARAMETER_TEXT}
#define THE_GAS           {"gas", "Name, formula or CAS number; a mixture such as N2 79 + O2 21; a card or mixture range; a rule after |", false, GAS_PARAMETER_TEXT}
#define TEMPERATURE       {"temperature", "Temperature in K, or in the temperature unit; a text may carry its own unit", false, GAS_PARAMETER_ANY}
#define TEMPERATURE_FROM  {"from", "Temperature at the start, in K or in the temperature unit", false, GAS_PARAMETER_ANY}
#define TEMPERATURE_TO    {"to", "Temperature at the end, in K or in the temperature unit", false, GAS_PARAMETER_ANY}
#define TEMPERATURE_UNIT  {"temperature unit", "Unit of temperatures that are bare numbers, such as °C; left out: K", true, GAS_PARAMETER_TEXT}
#define WANTED_CAPACITY   {"wanted", "Unit of the answer, such as kJ/kg-K; left out: J/(mol K)", true, GAS_PARAMETER_TEXT}
#define WANTED_ENERGY     {"wanted", "Unit of the answer, such as kJ/kg; left out: J/mol", true, GAS_PARAMETER_TEXT}

static const struct gas_function rows[] = {
    {"GAS.SOLVE", "solve", gas_fn_solve,
     "States of an ideal gas, changes of a closed amount and flows: whatever follows from the figures given",
     {{"gas", "Name, formula or CAS number, a mixture, a card; a heat-capacity rule may follow after |", false, GAS_PARAMETER_TEXT},
      {"given", "A text such as 7 bar(g); 35 °C; 12 m3, a block of headings and values, or a table of cases", false, GAS_PARAMETER_TEXT},
      {"wanted", "A text such as m, kg or a range of headings; left out: a card of everything that follows", true, GAS_PARAMETER_TEXT},
      {"headings", "Headings of the table's columns or rows, quantity and unit such as P1, bar(g)", true, GAS_PARAMETER_TEXT},
      {"options", "A text such as barometer 0.98 bar; datum 0 °C; agree 0.5 %; hard errors", true, GAS_PARAMETER_TEXT}},
     "GAS.SOLVE(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"kg\")", "105.14"},

    {"GAS.GIVEN", "given", gas_fn_given,
     "A block of givens from scattered cells: heading, value, heading, value and so on",
     {{"heading", "Quantity and unit of the value that follows, such as P1, bar(g)", false, GAS_PARAMETER_ANY},
      {"value", "Figure in the unit of the heading before it", false, GAS_PARAMETER_ANY},
      {"more", "Further pairs of heading and value", true, GAS_PARAMETER_REST}},
     "GAS.GIVEN(\"P, bar(g)\";7;\"T, °C\";35)", "P, bar(g)"},

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
     {THE_GAS, TEMPERATURE, {"wanted", "Nothing, or the heading gamma: the ratio has no unit", true, GAS_PARAMETER_TEXT}, TEMPERATURE_UNIT},
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
      {"pressure unit", "Unit of pressures that are bare numbers, such as bar(g); left out: Pa", true, GAS_PARAMETER_TEXT}},
     "GAS.DS(\"Ar\";298.15;1500)", "33.583"},

    {"GAS.TEMP", "temp", gas_fn_temp,
     "Temperature at the end of a given change of enthalpy, internal energy or entropy",
     {THE_GAS, TEMPERATURE_FROM,
      {"change", "Change from the start, in J/mol or J/(mol K), or in the change unit", false, GAS_PARAMETER_ANY},
      {"kind", "What changes: dh (left out), du, or ds at constant pressure", true, GAS_PARAMETER_TEXT},
      {"change unit", "Unit of changes that are bare numbers, such as kJ/kg", true, GAS_PARAMETER_TEXT},
      TEMPERATURE_UNIT},
     "GAS.TEMP(\"Ar\";300;2078.6;\"dh\")", "400.0"},

    {"GAS.WORK", "work", gas_fn_work,
     "Total work along a path, positive into the gas unless an option or heading says otherwise; one value per row",
     {THE_GAS, START, LEGS,
      {"wanted", "Unit of the answer, such as kJ or kJ/kg, or a heading such as W by gas, kJ; left out: J, in flow W", true, GAS_PARAMETER_TEXT},
      HEADINGS, OPTIONS},
     "GAS.WORK(\"N2\";\"2 kg; 25 °C; 1 bar\";\"isothermal to 8 bar\";\"kJ\")", "368.02"},

    {"GAS.HEAT", "heat", gas_fn_heat,
     "Total heat along a path, positive into the gas; one value per row",
     {THE_GAS, START, LEGS,
      {"wanted", "Unit of the answer, such as kJ or kJ/kg; left out: J, in flow W", true, GAS_PARAMETER_TEXT},
      HEADINGS, OPTIONS},
     "GAS.HEAT(\"N2\";\"2 kg; 25 °C; 1 bar\";\"isothermal to 8 bar\";\"kJ\")", "-368.02"},

    {"GAS.END", "end", gas_fn_end,
     "Quantities at the end of a path, or after a leg by state number; one column per wanted heading",
     {THE_GAS, START, LEGS,
      {"wanted", "Headings of what is asked, such as T, °C; P, bar(g); the end of the first leg is state 2", false, GAS_PARAMETER_TEXT},
      HEADINGS, OPTIONS},
     "GAS.END(\"Ar\";\"300 K; 1 bar\";\"isochoric to 600 K\";\"P, bar\")", "2.0000"},

    {"GAS.PATH", "path", gas_fn_path,
     "One labelled row per leg of a path and a total: end state, work, heat, changes of U, H and S",
     {THE_GAS, START, LEGS,
      {"wanted", "Headings of the columns; left out: P, T, V, W, Q, dU, dH, dS", true, GAS_PARAMETER_TEXT},
      HEADINGS, OPTIONS},
     "GAS.PATH(\"N2\";\"2 kg; 25 °C; 1 bar\";\"isothermal to 8 bar; isobaric to 200 °C\")", "leg"},

    {"GAS.TRACE", "trace", gas_fn_trace,
     "Points along a path for charts under a heading row: corners hit exactly, equal volume ratios on curved legs",
     {THE_GAS, START, LEGS,
      {"wanted", "Headings of the columns, such as V, m3; P, bar; left out: P, T, V, s", true, GAS_PARAMETER_TEXT},
      {"points", "Number of steps along each leg; left out: 20", true, GAS_PARAMETER_ANY},
      OPTIONS},
     "GAS.TRACE(\"N2\";\"2 kg; 25 °C; 1 bar\";\"isothermal to 8 bar\";\"V, m3; P, bar\")", "V, m3"},

    {"GAS.CYCLE", "cycle", gas_fn_cycle,
     "Figures of a path that closes: net work, heat in and out, efficiency or COP, mean effective pressure",
     {THE_GAS, START, LEGS,
      {"wanted", "Headings of what is asked: W net, Q in, Q out, efficiency, COP heating, COP cooling, mep; left out: a card", true, GAS_PARAMETER_TEXT},
      OPTIONS},
     "GAS.CYCLE(\"air | k = 1.4\";\"300 K; 1 bar\";\"adiabatic to V x 0.125; isochoric to 1800 K; adiabatic to V x 8; isochoric to start\";\"efficiency, %\")", "56.47"},

    {"GAS.STAGES", "stages", gas_fn_stages,
     "Staged compression with intercooling: ratio, temperatures, shaft power and cooler duty per stage and in total",
     {THE_GAS,
      {"given", "Suction P1 and T1, discharge P2 and a flow or an amount: a text, a block, or a table with headings", false, GAS_PARAMETER_TEXT},
      {"stages", "Text such as 3 stages; isentropic 78 %; cool to 40 °C; drop 0.2 bar; drive 95 %, or ratio at most 3.5; polytropic 80 %", false, GAS_PARAMETER_TEXT},
      {"wanted", "Headings of what is asked of each case: shaft power, input power, cooler duty, T2, ratio, stages; left out: a table of the stages", true, GAS_PARAMETER_TEXT},
      HEADINGS, OPTIONS},
     "GAS.STAGES(\"air | k = 1.4\";\"P1 = 1 bar; T1 = 300 K; P2 = 9 bar; 1 kg/s\";\"2 stages; isentropic; cool to T1\";\"shaft power, kW\")", "222.28"},

    {"GAS.FILL", "fill", gas_fn_fill,
     "A rigid vessel filled from a line: temperature of the gas, mass added, pressure after it has settled",
     {THE_GAS,
      {"given", "V, P1, T1 and P2 of the vessel, T line, and if you like P line, T settled, Q, or UA, T wall and time; P1 = 0 is evacuated", false, GAS_PARAMETER_TEXT},
      {"wanted", "Headings of what is asked of each case: T2, m2, m added, P settled, Q, Z2; left out: a card", true, GAS_PARAMETER_TEXT},
      HEADINGS,
      {"options", "Text of options: adiabatic (left out), isothermal or heat lost 30 %; barometer 0.98 bar", true, GAS_PARAMETER_TEXT}},
     "GAS.FILL(\"air | k = 1.4\";\"V = 50 L; P1 = 0 bar; P2 = 10 bar; T line = 300 K\";\"T2, K\")", "420.0"},

    {"GAS.VENT", "vent", gas_fn_vent,
     "A rigid vessel emptied: temperature of the gas that stays, mass out, time through an orifice; not for relief sizing",
     {THE_GAS,
      {"given", "V, P1, T1 and P2 of the vessel, and if you like T settled, Q, or UA, T wall and time; area, Cd and P outside of an orifice", false, GAS_PARAMETER_TEXT},
      {"wanted", "Headings of what is asked of each case: T2, m2, m out, P settled, Q, time, m1, kg/s; left out: a card", true, GAS_PARAMETER_TEXT},
      HEADINGS,
      {"options", "Text of options: adiabatic (left out), isothermal or heat gained 30 %; barometer 0.98 bar", true, GAS_PARAMETER_TEXT}},
     "GAS.VENT(\"Ar\";\"V = 1 m3; P1 = 32 bar; T1 = 1000 K; P2 = 1 bar\";\"T2, K\")", "250.0"},

    {"GAS.MIX", "mix", gas_fn_mix,
     "Streams or vessel contents mixed without heat: temperature, pressure, amounts, composition, entropy made",
     {{"streams", "Range with the heading row gas, P, T and one of m, n, V (vessels) or a flow (streams), then a row each", false, GAS_PARAMETER_TEXT},
      {"wanted", "Headings of what is asked: T, P, n, m, V, v, rho, M, S made; left out: a card with the composition", true, GAS_PARAMETER_TEXT},
      {"options", "Text of options: outlet 2 bar for streams (left out: the lowest inlet pressure); barometer 0.98 bar", true, GAS_PARAMETER_TEXT}},
     "GAS.MIX({\"gas\";\"P, bar\";\"T, K\";\"n, mol\"|\"Ar\";1;300;1|\"He\";1;400;3};\"T, K\")", "375.0"},

    {"GAS.Z", "z", gas_fn_z,
     "Compressibility factor, estimated by Lee and Kesler's correlation, for mixtures with their own mixing rule",
     {THE_GAS, TEMPERATURE,
      {"pressure", "Pressure in Pa absolute, or in the pressure unit; a text may carry its own unit", false, GAS_PARAMETER_ANY},
      TEMPERATURE_UNIT,
      {"pressure unit", "Unit of pressures that are bare numbers, such as bar(g); left out: Pa", true, GAS_PARAMETER_TEXT}},
     "GAS.Z(\"n-butane\";510;25;\"K\";\"bar\")", "0.87"},

    {"GAS.VALID", "valid", gas_fn_valid,
     "A sentence: is the ideal gas good here, by how much is it off, is the gas near its dew point, is the estimate rough",
     {THE_GAS, TEMPERATURE,
      {"pressure", "Pressure in Pa absolute, or in the pressure unit; a text may carry its own unit", false, GAS_PARAMETER_ANY},
      TEMPERATURE_UNIT,
      {"pressure unit", "Unit of pressures that are bare numbers, such as bar(g); left out: Pa", true, GAS_PARAMETER_TEXT}},
     "GAS.VALID(\"N2\";\"20 °C\";\"8 bar\")", "Good within 1 %"},

    {"GAS.AUDIT", "audit", gas_fn_audit,
     "Verdict on the figures of an old sheet: agrees, rounded constant, or differs, with the slips that would explain it",
     {CHECKED_GAS, CHECKED, {"wanted", "Heading of the old figure, such as m, kg, or a range of headings", false, GAS_PARAMETER_TEXT},
      LEGACY, CHECKED_LEGS, HEADINGS, AUDIT_OPTIONS},
     "GAS.AUDIT(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";91.85)", "differs by -12.6 %: 91.85 against 105.14 kg. Likely: 7 bar(g) taken as absolute (gives 91.846)"},

    {"GAS.AUDITLIST", "auditlist", gas_fn_audit_list,
     "The audit as a table: case, quantity, old figure, true figure, deviation, verdict, likeliest slip and what it would give; a last line for all",
     {CHECKED_GAS, CHECKED, {"wanted", "Heading of the old figure, such as m, kg, or a range of headings", false, GAS_PARAMETER_TEXT},
      LEGACY, CHECKED_LEGS, HEADINGS, AUDIT_OPTIONS},
     "GAS.AUDITLIST(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\";91.85)", "case"},

    {"GAS.WORKING", "working", gas_fn_working,
     "A calculation step by step as a check print: formula, figures put in, result, unit and source; the answer last",
     {CHECKED_GAS, CHECKED, {"wanted", "Heading of what is to be shown, such as m, kg, or a range of headings", false, GAS_PARAMETER_TEXT},
      CHECKED_LEGS, HEADINGS, OPTIONS},
     "GAS.WORKING(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\")", "step"},

    {"GAS.FAULTS", "faults", gas_fn_faults,
     "How many cells of a range hold a readable error, an error of the office or a blank",
     {{"range", "A live cell range where every cell should hold a figure or a plain text", false, GAS_PARAMETER_LIVE}},
     NULL, NULL},

    {"GAS.CARD", "card", gas_fn_card,
     "What is known of a gas, with sources: molar mass, heat capacity, range, critical constants, composition",
     {THE_GAS,
      {"item", "One line of the card, with its unit if you like, such as M, kg/kmol or cp, kJ/kg-K or Tc or x N2; left out: the whole card", true, GAS_PARAMETER_TEXT}},
     "GAS.CARD(\"Ar\";\"M, kg/kmol\")", "39.95"},

    {"GAS.LIST", "list", gas_fn_list,
     "The gases known by name, with formula, CAS number, molar mass in kg/kmol and the range of their heat capacity",
     {{"search", "Part of a name, formula or CAS number, or element F; left out: all gases", true, GAS_PARAMETER_TEXT}},
     "GAS.LIST(\"neon\")", "name"},

    {"GAS.UNIT", "unit", gas_fn_unit,
     "Unit conversion that knows gauge pressures, temperature differences (Δ°C) and reference volumes",
     {{"value", "Figure or figures to convert", false, GAS_PARAMETER_ANY},
      {"from", "Unit they are in, such as psig or Nm3/h; a difference is marked, such as Δ°C", false, GAS_PARAMETER_TEXT},
      {"to", "Unit they shall be in", false, GAS_PARAMETER_TEXT},
      {"barometer", "Outside pressure for gauge and vacuum units, in Pa or with its unit; left out: 101325 Pa", true, GAS_PARAMETER_ANY}},
     "GAS.UNIT(100;\"psig\";\"bar\")", "7.9080"},

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

/* Calc hands an empty cell over as the number 0. Where texts are asked for it counts as left out. */
static bool is_empty_for_text(const struct gas_parameter *parameter, const struct gas_block *block)
{
    const struct gas_cell *cell = gas_single(block) ? block->cell : NULL;
    return parameter->kind == GAS_PARAMETER_TEXT && cell && cell->kind == GAS_CELL_NUMBER && cell->number == 0;
}

/* The arguments as the entry shall see them; those of the call itself where nothing changes. */
static const struct gas_block *leave_out_empty(const struct gas_function *function, const struct gas_call *call)
{
    struct gas_block *changed = NULL;
    for (size_t i = 0; i < call->count && i < GAS_PARAMETERS && function->parameter[i].name; i++) {
        if (!is_empty_for_text(&function->parameter[i], &call->argument[i]))
            continue;
        if (!changed && (changed = gas_arena_take(call->arena, call->count, sizeof *changed)))
            memcpy(changed, call->argument, call->count * sizeof *changed);
        if (changed)
            changed[i] = (struct gas_block){0};
    }
    return changed ? changed : call->argument;
}

void gas_function_call(const struct gas_function *function, struct gas_call *call)
{
    /* A live range is looked at, not computed with: a sentence in it is what FAULTS counts. */
    const struct gas_cell *sentence = function->parameter[0].kind == GAS_PARAMETER_LIVE ? NULL : earlier_sentence(call);
    if (sentence) {
        gas_answer_text(call, sentence->text);
        return;
    }
    call->argument = leave_out_empty(function, call);
    function->entry(call);
}
