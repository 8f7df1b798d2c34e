/* Headings. What a heading means is common practice on calculation sheets; no row comes from the code under test. */
#include <stdio.h>
#include <string.h>

#include <gasleaf/heading.h>

#include "check.h"
#include "units/headings.h"

#define COUNT(table) (sizeof(table) / sizeof *(table))

/* clang-format off */
static const struct row {
    const char *text;
    enum gas_symbol symbol;
    int state;
    enum gas_dimension dimension;
    const char *unit;  /* NULL: none written */
    const char *flags; /* g gauge, v vacuum, t tolerance, b by gas, o on gas, r reference volume */
} rows[] = {
    {"P1, bar(g)", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bar(g)", "g"},
    {"P1 [bar(g)]", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bar(g)", "g"},
    {"P1 (bar(g))", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bar(g)", "g"},
    {"P1, bar (g)", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bar (g)", "g"},
    {"P1 bar (g)", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bar (g)", "g"},
    {"P1(g), bar", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bar(g)", "g"},
    {"P / bar(g)", GAS_SYM_P, 0, GAS_DIM_PRESSURE, "bar(g)", "g"},
    {"P1/kPa", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "kPa", ""},
    {"p1; bar", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bar", ""},
    {"p, psia", GAS_SYM_P, 0, GAS_DIM_PRESSURE, "psia", ""},
    {"P_1, bar", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bar", ""},
    {"P 2, bar", GAS_SYM_P, 2, GAS_DIM_PRESSURE, "bar", ""},
    {"P₂, bar", GAS_SYM_P, 2, GAS_DIM_PRESSURE, "bar", ""},
    {"Inlet pressure (psig)", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "psig", "g"},
    {"Pressure at inlet, bar", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bar", ""},
    {"suction pressure, bara", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bara", ""},
    {"Discharge pressure barg", GAS_SYM_P, 2, GAS_DIM_PRESSURE, "barg", "g"},
    {"OUTLET PRESSURE (KPA)", GAS_SYM_P, 2, GAS_DIM_PRESSURE, "KPA", ""},
    {"Pressure, start, bar", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bar", ""},
    {"Pressure 1 (bar)", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bar", ""},
    {"Gauge pressure, bar", GAS_SYM_P, 0, GAS_DIM_PRESSURE, "bar(g)", "g"},
    {"Inlet pressure, gauge (kPa)", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "kPa(g)", "g"},
    {"Absolute pressure, bar", GAS_SYM_P, 0, GAS_DIM_PRESSURE, "bar", ""},
    {"Pabs, bar", GAS_SYM_P, 0, GAS_DIM_PRESSURE, "bar", ""},
    {"Vacuum, inHg", GAS_SYM_P, 0, GAS_DIM_PRESSURE, "inHg vac", "v"},
    {"P1, inHg vac", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "inHg vac", "v"},
    {"Pin, bar", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bar", ""},
    {"P in, bar", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bar", ""},
    {"Suction, barg", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "barg", "g"},
    {"bar(g)", GAS_SYM_P, 0, GAS_DIM_PRESSURE, "bar(g)", "g"},
    {"[bar(g)]", GAS_SYM_P, 0, GAS_DIM_PRESSURE, "bar(g)", "g"},
    {"(bar)", GAS_SYM_P, 0, GAS_DIM_PRESSURE, "bar", ""},
    {"at", GAS_SYM_P, 0, GAS_DIM_PRESSURE, "at", ""},
    {"P1", GAS_SYM_P, 1, GAS_DIM_PRESSURE, NULL, ""},
    {"pressure", GAS_SYM_P, 0, GAS_DIM_PRESSURE, NULL, ""},

    {"T/K", GAS_SYM_T, 0, GAS_DIM_TEMPERATURE, "K", ""},
    {"T2 / °C", GAS_SYM_T, 2, GAS_DIM_TEMPERATURE, "°C", ""},
    {"T, C", GAS_SYM_T, 0, GAS_DIM_TEMPERATURE, "C", ""},
    {"T1 (Deg F)", GAS_SYM_T, 1, GAS_DIM_TEMPERATURE, "Deg F", ""},
    {"t1, °C", GAS_SYM_T, 1, GAS_DIM_TEMPERATURE, "°C", ""},
    {"T in K", GAS_SYM_T, 0, GAS_DIM_TEMPERATURE, "K", ""},
    {"T in, K", GAS_SYM_T, 1, GAS_DIM_TEMPERATURE, "K", ""},
    {"Temp. out, °F", GAS_SYM_T, 2, GAS_DIM_TEMPERATURE, "°F", ""},
    {"Final temperature [K]", GAS_SYM_T, 2, GAS_DIM_TEMPERATURE, "K", ""},
    {"Gas temperature, °C", GAS_SYM_T, 0, GAS_DIM_TEMPERATURE, "°C", ""},
    {"°C", GAS_SYM_T, 0, GAS_DIM_TEMPERATURE, "°C", ""},
    {"T_2", GAS_SYM_T, 2, GAS_DIM_TEMPERATURE, NULL, ""},
    {"t", GAS_SYM_T, 0, GAS_DIM_TEMPERATURE, NULL, ""},
    {"t, min", GAS_SYM_TIME, 0, GAS_DIM_TIME, "min", ""},

    {"Volume m3", GAS_SYM_V, 0, GAS_DIM_VOLUME, "m3", ""},
    {"V1, L", GAS_SYM_V, 1, GAS_DIM_VOLUME, "L", ""},
    {"V2 (cu ft)", GAS_SYM_V, 2, GAS_DIM_VOLUME, "cu ft", ""},
    {"v, m3", GAS_SYM_V, 0, GAS_DIM_VOLUME, "m3", ""},
    {"V, m3/kg", GAS_SYM_V_SPECIFIC, 0, GAS_DIM_SPECIFIC_VOLUME, "m3/kg", ""},
    {"v1, ft3/lb", GAS_SYM_V_SPECIFIC, 1, GAS_DIM_SPECIFIC_VOLUME, "ft3/lb", ""},
    {"m3/kg", GAS_SYM_V_SPECIFIC, 0, GAS_DIM_SPECIFIC_VOLUME, "m3/kg", ""},
    {"L/mol", GAS_SYM_V_SPECIFIC, 0, GAS_DIM_MOLAR_VOLUME, "L/mol", ""},
    {"v", GAS_SYM_V_SPECIFIC, 0, GAS_DIM_MOLAR_VOLUME, NULL, ""},
    {"V", GAS_SYM_V, 0, GAS_DIM_VOLUME, NULL, ""},
    {"Volume flow, m3/h", GAS_SYM_V, 0, GAS_DIM_VOLUME_FLOW, "m3/h", ""},
    {"Volume flow", GAS_SYM_V, 0, GAS_DIM_VOLUME_FLOW, NULL, ""},
    {"m3", GAS_SYM_V, 0, GAS_DIM_VOLUME, "m3", ""},
    {"m3/h", GAS_SYM_V, 0, GAS_DIM_VOLUME_FLOW, "m3/h", ""},
    {"V, Nm3", GAS_SYM_N, 0, GAS_DIM_AMOUNT, "Nm3", "r"},
    {"V, Nm3/h", GAS_SYM_N, 0, GAS_DIM_AMOUNT_FLOW, "Nm3/h", "r"},
    {"Volume flow, SCFM", GAS_SYM_N, 0, GAS_DIM_AMOUNT_FLOW, "SCFM", "r"},
    {"V, m3@20°C,101.325kPa", GAS_SYM_N, 0, GAS_DIM_AMOUNT, "m3@20°C,101.325kPa", "r"},
    {"m3@20°C,101.325kPa", GAS_SYM_N, 0, GAS_DIM_AMOUNT, "m3@20°C,101.325kPa", "r"},
    {"Nm3", GAS_SYM_N, 0, GAS_DIM_AMOUNT, "Nm3", "r"},
    {"MMSCFD", GAS_SYM_N, 0, GAS_DIM_AMOUNT_FLOW, "MMSCFD", "r"},

    {"n, kmol", GAS_SYM_N, 0, GAS_DIM_AMOUNT, "kmol", ""},
    {"N, mol", GAS_SYM_N, 0, GAS_DIM_AMOUNT, "mol", ""},
    {"n", GAS_SYM_N, 0, GAS_DIM_AMOUNT, NULL, ""},
    {"n [-]", GAS_SYM_EXPONENT, 0, GAS_DIM_NUMBER, "-", ""},
    {"Moles", GAS_SYM_N, 0, GAS_DIM_AMOUNT, NULL, ""},
    {"Molar flow, kmol/h", GAS_SYM_N, 0, GAS_DIM_AMOUNT_FLOW, "kmol/h", ""},
    {"Mass flow, kg/h", GAS_SYM_M, 0, GAS_DIM_MASS_FLOW, "kg/h", ""},
    {"Mass flow rate (lb/min)", GAS_SYM_M, 0, GAS_DIM_MASS_FLOW, "lb/min", ""},
    {"Flow, kg/s", GAS_SYM_M, 0, GAS_DIM_MASS_FLOW, "kg/s", ""},
    {"Flow, Nm3/h", GAS_SYM_N, 0, GAS_DIM_AMOUNT_FLOW, "Nm3/h", "r"},
    {"Flow, m3/h", GAS_SYM_V, 0, GAS_DIM_VOLUME_FLOW, "m3/h", ""},
    {"kg", GAS_SYM_M, 0, GAS_DIM_MASS, "kg", ""},
    {"m/kg", GAS_SYM_M, 0, GAS_DIM_MASS, "kg", ""},
    {"m, kg", GAS_SYM_M, 0, GAS_DIM_MASS, "kg", ""},
    {"m2", GAS_SYM_M, 2, GAS_DIM_MASS, NULL, ""},
    {"m3, kg", GAS_SYM_M, 3, GAS_DIM_MASS, "kg", ""},
    {"M, kg", GAS_SYM_M, 0, GAS_DIM_MASS, "kg", ""},
    {"M, g/mol", GAS_SYM_M_MOLAR, 0, GAS_DIM_MOLAR_MASS, "g/mol", ""},
    {"m, g/mol", GAS_SYM_M_MOLAR, 0, GAS_DIM_MOLAR_MASS, "g/mol", ""},
    {"MW, kg/kmol", GAS_SYM_M_MOLAR, 0, GAS_DIM_MOLAR_MASS, "kg/kmol", ""},
    {"MW", GAS_SYM_NONE, 0, GAS_DIM_POWER, "MW", ""},
    {"kg/m3", GAS_SYM_RHO, 0, GAS_DIM_DENSITY, "kg/m3", ""},
    {"ρ / (kg/m³)", GAS_SYM_RHO, 0, GAS_DIM_DENSITY, "kg/m³", ""},
    {"rho, mol/L", GAS_SYM_RHO, 0, GAS_DIM_CONCENTRATION, "mol/L", ""},
    {"Density, lb/ft3", GAS_SYM_RHO, 0, GAS_DIM_DENSITY, "lb/ft3", ""},

    {"h, kJ/kg", GAS_SYM_H_SPECIFIC, 0, GAS_DIM_SPECIFIC_ENERGY, "kJ/kg", ""},
    {"h2 (J/mol)", GAS_SYM_H_SPECIFIC, 2, GAS_DIM_MOLAR_ENERGY, "J/mol", ""},
    {"h, kJ", GAS_SYM_H_TOTAL, 0, GAS_DIM_ENERGY, "kJ", ""},
    {"H, kJ/kg", GAS_SYM_H_SPECIFIC, 0, GAS_DIM_SPECIFIC_ENERGY, "kJ/kg", ""},
    {"H, kW", GAS_SYM_H_TOTAL, 0, GAS_DIM_POWER, "kW", ""},
    {"h", GAS_SYM_H_SPECIFIC, 0, GAS_DIM_MOLAR_ENERGY, NULL, ""},
    {"H", GAS_SYM_H_TOTAL, 0, GAS_DIM_ENERGY, NULL, ""},
    {"u1, Btu/lb", GAS_SYM_U_SPECIFIC, 1, GAS_DIM_SPECIFIC_ENERGY, "Btu/lb", ""},
    {"Internal energy, MJ", GAS_SYM_U_TOTAL, 0, GAS_DIM_ENERGY, "MJ", ""},
    {"s, kJ/kg-K", GAS_SYM_S_SPECIFIC, 0, GAS_DIM_SPECIFIC_ENTROPY, "kJ/kg-K", ""},
    {"S, kJ/K", GAS_SYM_S_TOTAL, 0, GAS_DIM_ENTROPY, "kJ/K", ""},
    {"s", GAS_SYM_S_SPECIFIC, 0, GAS_DIM_MOLAR_ENTROPY, NULL, ""},
    {"cp, kJ/(kg K)", GAS_SYM_CP, 0, GAS_DIM_SPECIFIC_ENTROPY, "kJ/(kg K)", ""},
    {"Cp/(J/(mol K))", GAS_SYM_CP, 0, GAS_DIM_MOLAR_ENTROPY, "J/(mol K)", ""},
    {"c_v, J/mol-K", GAS_SYM_CV, 0, GAS_DIM_MOLAR_ENTROPY, "J/mol-K", ""},
    {"k", GAS_SYM_GAMMA, 0, GAS_DIM_NUMBER, NULL, ""},
    {"γ", GAS_SYM_GAMMA, 0, GAS_DIM_NUMBER, NULL, ""},

    {"W, kJ", GAS_SYM_W, 0, GAS_DIM_ENERGY, "kJ", ""},
    {"w, kJ/kg", GAS_SYM_W, 0, GAS_DIM_SPECIFIC_ENERGY, "kJ/kg", ""},
    {"W/kW", GAS_SYM_W, 0, GAS_DIM_POWER, "kW", ""},
    {"W by gas, kJ", GAS_SYM_W, 0, GAS_DIM_ENERGY, "kJ", "b"},
    {"W (by gas), kJ", GAS_SYM_W, 0, GAS_DIM_ENERGY, "kJ", "b"},
    {"Work done by the gas (kJ)", GAS_SYM_W, 0, GAS_DIM_ENERGY, "kJ", "b"},
    {"W on gas, kJ", GAS_SYM_W, 0, GAS_DIM_ENERGY, "kJ", "o"},
    {"W net by gas, kJ", GAS_SYM_W_NET, 0, GAS_DIM_ENERGY, "kJ", "b"},
    {"kJ", GAS_SYM_NONE, 0, GAS_DIM_ENERGY, "kJ", ""},
    {"kW", GAS_SYM_NONE, 0, GAS_DIM_POWER, "kW", ""},
    {"kJ/kg-K", GAS_SYM_NONE, 0, GAS_DIM_SPECIFIC_ENTROPY, "kJ/kg-K", ""},
    {"%", GAS_SYM_NONE, 0, GAS_DIM_NUMBER, "%", ""},
    {"Power, kW", GAS_SYM_W, 0, GAS_DIM_POWER, "kW", ""},
    {"Q, kJ", GAS_SYM_Q, 0, GAS_DIM_ENERGY, "kJ", ""},
    {"Heat, MMBtu/h", GAS_SYM_Q, 0, GAS_DIM_POWER, "MMBtu/h", ""},
    {"Q in", GAS_SYM_Q_IN, 0, GAS_DIM_ENERGY, NULL, ""},
    {"Q in, kJ", GAS_SYM_Q_IN, 0, GAS_DIM_ENERGY, "kJ", ""},
    {"Q out, kJ", GAS_SYM_Q_OUT, 0, GAS_DIM_ENERGY, "kJ", ""},
    {"W net, kJ", GAS_SYM_W_NET, 0, GAS_DIM_ENERGY, "kJ", ""},
    {"COP heating", GAS_SYM_COP_HEATING, 0, GAS_DIM_NUMBER, NULL, ""},
    {"COP cooling", GAS_SYM_COP_COOLING, 0, GAS_DIM_NUMBER, NULL, ""},
    {"mep, kPa", GAS_SYM_MEP, 0, GAS_DIM_PRESSURE, "kPa", ""},
    {"efficiency, %", GAS_SYM_EFFICIENCY, 0, GAS_DIM_NUMBER, "%", ""},
    {"η", GAS_SYM_EFFICIENCY, 0, GAS_DIM_NUMBER, NULL, ""},
    {"exponent", GAS_SYM_EXPONENT, 0, GAS_DIM_NUMBER, NULL, ""},
    {"pressure ratio", GAS_SYM_RATIO, 0, GAS_DIM_NUMBER, NULL, ""},
    {"dU, kJ", GAS_SYM_DU, 0, GAS_DIM_ENERGY, "kJ", ""},
    {"ΔU, kJ", GAS_SYM_DU, 0, GAS_DIM_ENERGY, "kJ", ""},
    {"Δ H, kJ/kg", GAS_SYM_DH, 0, GAS_DIM_SPECIFIC_ENERGY, "kJ/kg", ""},
    {"delta S, J/K", GAS_SYM_DS, 0, GAS_DIM_ENTROPY, "J/K", ""},
    {"S made, J/K", GAS_SYM_S_MADE, 0, GAS_DIM_ENTROPY, "J/K", ""},
    {"P line, bar(g)", GAS_SYM_P_LINE, 0, GAS_DIM_PRESSURE, "bar(g)", "g"},
    {"T line, °C", GAS_SYM_T_LINE, 0, GAS_DIM_TEMPERATURE, "°C", ""},
    {"P settled, bar(g)", GAS_SYM_P_SETTLED, 0, GAS_DIM_PRESSURE, "bar(g)", "g"},
    {"T settled, °C", GAS_SYM_T_SETTLED, 0, GAS_DIM_TEMPERATURE, "°C", ""},
    {"m added, kg", GAS_SYM_MOVED, 0, GAS_DIM_MASS, "kg", ""},
    {"m added", GAS_SYM_MOVED, 0, GAS_DIM_MASS, NULL, ""},
    {"m out, lb", GAS_SYM_MOVED, 0, GAS_DIM_MASS, "lb", ""},
    {"V added, Nm3", GAS_SYM_MOVED, 0, GAS_DIM_AMOUNT, "Nm3", "r"},
    {"n added, mol", GAS_SYM_MOVED, 0, GAS_DIM_AMOUNT, "mol", ""},
    {"shaft power, kW", GAS_SYM_POWER_SHAFT, 0, GAS_DIM_POWER, "kW", ""},
    {"input power, hp", GAS_SYM_POWER_INPUT, 0, GAS_DIM_POWER, "hp", ""},
    {"cooler duty, kW", GAS_SYM_DUTY, 0, GAS_DIM_POWER, "kW", ""},
    {"UA, W/K", GAS_SYM_UA, 0, GAS_DIM_ENTROPY_FLOW, "W/K", ""},
    {"T wall, °C", GAS_SYM_T_WALL, 0, GAS_DIM_TEMPERATURE, "°C", ""},
    {"time, s", GAS_SYM_TIME, 0, GAS_DIM_TIME, "s", ""},
    {"orifice area, mm2", GAS_SYM_AREA, 0, GAS_DIM_AREA, "mm2", ""},
    {"Cd", GAS_SYM_DISCHARGE, 0, GAS_DIM_NUMBER, NULL, ""},
    {"discharge coefficient", GAS_SYM_DISCHARGE, 0, GAS_DIM_NUMBER, NULL, ""},
    {"P outside, bar", GAS_SYM_P_OUTSIDE, 0, GAS_DIM_PRESSURE, "bar", ""},
    {"stages", GAS_SYM_STAGE_COUNT, 0, GAS_DIM_NUMBER, NULL, ""},
    {"Z", GAS_SYM_Z, 0, GAS_DIM_NUMBER, NULL, ""},
    {"barometer, mbar", GAS_SYM_BAROMETER, 0, GAS_DIM_PRESSURE, "mbar", ""},
    {"altitude, m", GAS_SYM_ALTITUDE, 0, GAS_DIM_LENGTH, "m", ""},
    {"Site elevation (ft)", GAS_SYM_ALTITUDE, 0, GAS_DIM_LENGTH, "ft", ""},

    {"±P, bar", GAS_SYM_P, 0, GAS_DIM_PRESSURE, "bar", "t"},
    {"± T1 (K)", GAS_SYM_T, 1, GAS_DIM_TEMPERATURE, "K", "t"},
    {"+/- T1, K", GAS_SYM_T, 1, GAS_DIM_TEMPERATURE, "K", "t"},
    {"P1 ±, bar", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bar", "t"},
    {"P1 tolerance, bar", GAS_SYM_P, 1, GAS_DIM_PRESSURE, "bar", "t"},
    {"±, bar", GAS_SYM_P, 0, GAS_DIM_PRESSURE, "bar", "t"},
    {"±P1, %", GAS_SYM_P, 1, GAS_DIM_NUMBER, "%", "t"},
    {"+/- V (%)", GAS_SYM_V, 0, GAS_DIM_NUMBER, "%", "t"},
    {"mass tolerance, %", GAS_SYM_M, 0, GAS_DIM_NUMBER, "%", "t"},
    {"±n, %", GAS_SYM_N, 0, GAS_DIM_NUMBER, "%", "t"},
    {"±n, -", GAS_SYM_EXPONENT, 0, GAS_DIM_NUMBER, "-", "t"},
    {"  T1,  K ", GAS_SYM_T, 1, GAS_DIM_TEMPERATURE, "K", ""},
};
/* clang-format on */

static bool has(const struct row *row, char flag)
{
    return strchr(row->flags, flag) != NULL;
}

static void headings_are_understood(void)
{
    check_true("eighty headings", COUNT(rows) >= 80);
    for (size_t i = 0; i < COUNT(rows); i++) {
        const struct row *row = &rows[i];
        struct gas_heading heading;
        struct gas_heading_fault fault = {.status = GAS_HEADING_OK};
        if (!gas_heading_parse(row->text, strlen(row->text), NULL, &heading, &fault)) {
            check_text(row->text, fault.hint, "(a heading)");
            continue;
        }
        check_text(row->text, gas_symbol_text(heading.symbol), gas_symbol_text(row->symbol));
        check_int(row->text, heading.state, row->state);
        check_text(row->text, gas_dimension_words(heading.unit.dimension), gas_dimension_words(row->dimension));
        check_text(row->text, heading.unit.text, row->unit ? row->unit : gas_dimension_si(row->dimension));
        check_int(row->text, heading.has_unit, row->unit != NULL);
        check_int(row->text, heading.unit.basis, has(row, 'g') ? GAS_GAUGE : has(row, 'v') ? GAS_VACUUM : GAS_ABSOLUTE);
        check_int(row->text, heading.tolerance, has(row, 't'));
        check_int(row->text, heading.by_gas, has(row, 'b'));
        check_int(row->text, heading.on_gas, has(row, 'o'));
        check_int(row->text, heading.unit.reference_volume, has(row, 'r'));
        check_contains(row->text, row->text, heading.text);
    }
}

static void what_is_not_a_heading_is_refused(void)
{
    static const struct {
        const char *text;
        enum gas_heading_status status;
        const char *hint;
    } bad[] = {
        {"", GAS_HEADING_EMPTY, "quantity"},
        {"   ", GAS_HEADING_EMPTY, ""},
        {"xyzzy", GAS_HEADING_UNKNOWN, "name a quantity"},
        {"Presure, bar", GAS_HEADING_UNKNOWN, "perhaps pressure is meant"},
        {"Tempreature, K", GAS_HEADING_UNKNOWN, "temperature"},
        {"Remarks", GAS_HEADING_UNKNOWN, ""},
        {"Tag no.", GAS_HEADING_UNKNOWN, ""},
        {"mm", GAS_HEADING_UNKNOWN, "length"},
        {"flow", GAS_HEADING_UNKNOWN, "unit"},
        {"inlet", GAS_HEADING_UNKNOWN, "unit"},
        {"Inlet outlet pressure, bar", GAS_HEADING_UNKNOWN, ""},
        {"Gauge absolute pressure, bar", GAS_HEADING_UNKNOWN, ""},
        {"Q by gas, kJ", GAS_HEADING_UNKNOWN, "only work"},
        {"W by gas on gas, kJ", GAS_HEADING_UNKNOWN, "not both"},
        {"P1, barr", GAS_HEADING_UNIT, "bar"},
        {"P1 kPaf", GAS_HEADING_UNIT, "kPa"},
        {"V, standard", GAS_HEADING_UNIT, "Nm3"},
        {"standard", GAS_HEADING_UNIT, "Nm3"},
        {"m, ton", GAS_HEADING_UNIT, "short ton"},
        {"V, m3@20°C", GAS_HEADING_UNIT, "101.325kPa"},
        {"P1, kg", GAS_HEADING_CONTRADICTION, "P1 is a pressure, kg is a mass"},
        {"T2 (bar)", GAS_HEADING_CONTRADICTION, "temperature"},
        {"V, mol", GAS_HEADING_CONTRADICTION, "volume"},
        {"n, Pa", GAS_HEADING_CONTRADICTION, "amount"},
        {"efficiency, kW", GAS_HEADING_CONTRADICTION, "number"},
        {"density, kg/Nm3", GAS_HEADING_CONTRADICTION, "not a density"},
        {"specific volume, m3", GAS_HEADING_CONTRADICTION, "volume"},
        {"Gauge pressure, bara", GAS_HEADING_CONTRADICTION, "different"},
        {"Absolute pressure, bar(g)", GAS_HEADING_CONTRADICTION, "different"},
        {"Gauge temperature, K", GAS_HEADING_CONTRADICTION, ""},
        {"flow, kg", GAS_HEADING_CONTRADICTION, "a flow"},
        {"P0, bar", GAS_HEADING_STATE, "1 to 9"},
        {"T10, K", GAS_HEADING_STATE, "1 to 9"},
        {"P01", GAS_HEADING_STATE, ""},
        {"Pressure in the receiver that was built in the year of the great flood, bar absolute", GAS_HEADING_TOO_LONG,
         ""},
    };
    for (size_t i = 0; i < COUNT(bad); i++) {
        struct gas_heading heading;
        struct gas_heading_fault fault = {.status = GAS_HEADING_OK};
        check_true(bad[i].text, !gas_heading_parse(bad[i].text, strlen(bad[i].text), NULL, &heading, &fault));
        check_int(bad[i].text, fault.status, bad[i].status);
        check_contains(bad[i].text, fault.hint, bad[i].hint);
        check_int(bad[i].text, fault.unit.status != GAS_UNIT_OK, bad[i].status == GAS_HEADING_UNIT);
    }
}

/* Every word of the table, bare: it is found, belongs to its own line, and its dimension is among its readings. */
static void every_word_is_found(void)
{
    for (size_t i = 0; i < gas_quantity_count; i++) {
        const struct quantity *quantity = &gas_quantities[i];
        const char *lists[] = {quantity->symbols, quantity->words};
        for (size_t k = 0; k < COUNT(lists); k++)
            for (const char *p = lists[k]; *p;) {
                struct label label;
                size_t length = strcspn(p, ",");
                char word[80];
                snprintf(word, sizeof word, "%.*s", (int)length, p);
                check_true(word, gas_label_parse(p, length, &label) && label.quantity == quantity);
                p += length + (p[length] == ',');
            }
        bool found = quantity->bare == GAS_DIM_OTHER;
        for (const struct reading *reading = quantity->readings; reading->symbol != GAS_SYM_NONE; reading++)
            found |= reading->dimension == quantity->bare && reading->symbol == quantity->symbol;
        check_true(quantity->words, found);
    }
}

/* A text that names a quantity in an answer is understood when it comes back as a heading. */
static void every_symbol_is_understood(void)
{
    for (enum gas_symbol i = GAS_SYM_NONE + 1; i < GAS_SYMBOLS; i++) {
        struct gas_heading heading;
        struct gas_heading_fault fault;
        const char *text = gas_symbol_text(i);
        check_true(text, gas_heading_parse(text, strlen(text), NULL, &heading, &fault));
        check_text(text, gas_symbol_text(heading.symbol), text);
        check_true(gas_symbol_words(i), gas_symbol_words(i)[0] != '\0');
        if (i != GAS_SYM_MOVED)
            check_int(text, heading.unit.dimension, gas_symbol_dimension(i));
    }
}

static void references_reach_the_unit(void)
{
    struct gas_references other = gas_references_default;
    struct gas_heading heading;
    struct gas_heading_fault fault;
    other.normal_T = 293.15;
    check_true("V, Nm3", gas_heading_parse("V, Nm3", 6, &other, &heading, &fault));
    check_close("V, Nm3", heading.unit.scale, 101325.0 / (8.31446261815324 * 293.15), 1e-14, 0.0);
    check_true("V, Nm3", gas_heading_parse("V, Nm3", 6, NULL, &heading, &fault));
    check_close("V, Nm3", heading.unit.scale, 101325.0 / (8.31446261815324 * 273.15), 1e-14, 0.0);
}

static void noise_is_survived(void)
{
    static const char *const pieces[] = {"P", "T1",  "V",    "pressure", ",",   " ",  "(", ")", "[",     "]",
                                         "/", "bar", "g",    "in",       "°C",  "m3", "±", "Δ", "inlet", "by gas",
                                         "=", "7",   "\xff", "kJ/kg",    "@20", "n",  ":", "_", "0",     "gauge"};
    static char text[10001];
    struct gas_heading heading;
    struct gas_heading_fault fault;
    double figure;
    const size_t many = COUNT(pieces);
    check_seed(20260102);
    for (int i = 0; i < 3000; i++) {
        size_t length = 0;
        while (length < 60 && check_random(0, 1) < 0.9) {
            const char *piece = pieces[(size_t)check_random(0, (double)many)];
            if (i % 3 == 0)
                text[length++] = (char)check_random(0, 256);
            else
                length += (size_t)snprintf(text + length, 20, "%s", piece);
        }
        if (gas_heading_parse(text, length, NULL, &heading, &fault))
            check_true("a heading has a unit and a state",
                       heading.unit.scale > 0.0 && heading.state >= 0 && heading.state <= 9);
        else
            check_true("a fault has a status", fault.status != GAS_HEADING_OK);
        if (!gas_given_parse(text, length, NULL, &heading, &figure, &fault))
            check_true("a fault has a status", fault.status != GAS_HEADING_OK);
    }
    memset(text, 'P', 10000);
    check_true("10000 letters", !gas_heading_parse(text, 10000, NULL, &heading, &fault));
    check_true("70 letters", !gas_heading_parse(text, 70, NULL, &heading, &fault));
    memset(text, '(', 10000);
    check_true("70 parentheses", !gas_heading_parse(text, 70, NULL, &heading, &fault));
    check_true("NUL", !gas_heading_parse("P1\0, bar", 8, NULL, &heading, &fault));
}

const struct test_suite suite_heading = {"heading",
                                         (const struct test_case[]){{"understood", headings_are_understood},
                                                                    {"refused", what_is_not_a_heading_is_refused},
                                                                    {"words", every_word_is_found},
                                                                    {"symbols", every_symbol_is_understood},
                                                                    {"references", references_reach_the_unit},
                                                                    {"noise", noise_is_survived},
                                                                    {0}}};
