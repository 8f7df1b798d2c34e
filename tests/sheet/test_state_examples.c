/* Printed examples of states, to the digits that are printed. The source stands in each row. */
#include "sheet/answers.h"

/* Half a unit of the last printed digit. */
#define PRINTED(figure, digit) figure, 0, 0.5 * (digit)

/* clang-format off */
static const struct figure_row examples[] = {
    /* Cengel & Boles, Thermodynamics: An Engineering Approach, 5th-7th ed., Ex. 3-10; answer from memory */
    {"air in a room", "GAS.SOLVE(\"air | R = 0.287 kJ/kg-K\";\"V = 120 m3; P = 100 kPa; T = 298 K\";\"m, kg\")", 0, 0, PRINTED(140.3, 0.1)},
    /* Borgnakke & Sonntag, Fundamentals of Thermodynamics, 7th ed. (2009), Ex. 3.8; answer from memory */
    {"air in a larger room", "GAS.SOLVE(\"air | R = 0.287 kJ/kg-K\";\"V = 240 m3; P = 100 kPa; T = 25 °C\";\"m, kg\")", 0, 0, PRINTED(280.5, 0.1)},
    /* the same, Ex. 3.10: 0.75 m3 in 185 s; answer from memory */
    {"volume flow of CO2", "GAS.SOLVE(\"CO2 | R = 0.1889 kJ/kg-K\";{105;21;0.004054};\"V, m3/s\";{\"P, kPa\";\"T, °C\";\"V, m3/s\"})", 0, 0, PRINTED(0.00405, 0.00001)},
    {"mass flow of CO2", "GAS.SOLVE(\"CO2 | R = 0.1889 kJ/kg-K\";{105;21;0.004054};\"m, kg/s\";{\"P, kPa\";\"T, °C\";\"V, m3/s\"})", 0, 0, PRINTED(0.0077, 0.0001)},
    /* Felder & Rousseau, Elementary Principles of Chemical Processes, 3rd ed. (2000), Ex. 5.2-2, from memory; the book
     * rounds the amount flow to 19.0 kmol/h first */
    {"butane vapour", "GAS.SOLVE(\"butane\";\"n = 19.0 kmol/h; T = 360 °C; P = 3.00 atm\";\"V, m3/h\")", 0, 0, PRINTED(329, 1)},
    /* the same, Ex. 5.2-3, from memory */
    {"air heated and compressed", "GAS.SOLVE(\"air\";\"V1 = 10.0 ft3; T1 = 70 °F; P1 = 1.00 atm; T2 = 610 °F; P2 = 2.50 atm\";\"V2, ft3\")", 0, 0, PRINTED(8.08, 0.01)},
    /* Atkins & de Paula, Physical Chemistry, 8th-10th ed., Ex. 1.2 / 1A.1, from memory */
    {"heated at constant volume", "GAS.SOLVE(\"N2\";\"V constant; P1 = 100 atm; T1 = 300 K; T2 = 500 K\";\"P2, atm\")", 0, 0, PRINTED(167, 1)},
    /* Himmelblau & Riggs, Basic Principles and Calculations in Chemical Engineering, 6th-7th ed., from memory */
    {"carbon dioxide at standard conditions", "GAS.SOLVE(\"CO2\";\"m = 40 kg; T = 0 °C; P = 101.325 kPa\";\"V, m3\")", 0, 0, PRINTED(20.4, 0.1)},
    {"the same as a reference volume", "GAS.SOLVE(\"CO2\";\"m = 40 kg\";\"Nm3\")", 0, 0, PRINTED(20.4, 0.1)},
    /* US Standard Atmosphere 1976 (NOAA-S/T 76-1562), sea level */
    {"air at sea level", "GAS.SOLVE(\"air\";\"P = 101.325 kPa; T = 288.15 K\";\"rho, kg/m3\")", 0, 0, PRINTED(1.2250, 0.0001)},
    /* the same, table I, geometric altitudes with their temperatures, and with the R of that publication;
     * from memory */
    {"air at 1000 m", "GAS.SOLVE(\"air | R = 8.31432 J/mol-K\";\"0 Pa(g); 281.651 K\";\"rho, kg/m3\";;\"altitude 1000 m\")", 0, 0, PRINTED(1.1117, 0.0001)},
    {"air at 2000 m", "GAS.SOLVE(\"air | R = 8.31432 J/mol-K\";\"0 Pa(g); 275.154 K\";\"rho, kg/m3\";;\"barometer at 2000 m\")", 0, 0, PRINTED(1.0066, 0.0001)},
    {"air at 5000 m", "GAS.SOLVE(\"air | R = 8.31432 J/mol-K\";\"0 Pa(g); 255.676 K; altitude = 5000 m\";\"rho, kg/m3\")", 0, 0, PRINTED(0.73643, 0.00002)},
    {"air at 10000 m", "GAS.SOLVE(\"air | R = 8.31432 J/mol-K\";\"0 Pa(g); 223.252 K; altitude = 10 km\";\"rho, kg/m3\")", 0, 0, PRINTED(0.41351, 0.00002)},
    {"pressure at 5000 m", "GAS.SOLVE(\"air | R = 8.31432 J/mol-K\";\"0 Pa(g); 255.676 K; altitude = 5000 m\";\"P, mbar\")", 0, 0, PRINTED(540.48, 0.01)},
    /* CODATA 2018: molar volume of an ideal gas at 273.15 K, 101.325 kPa, 22.413 969 54... L/mol; from memory */
    {"molar volume", "GAS.SOLVE(\"N2\";\"T = 273.15 K; P = 101.325 kPa\";\"v, L/mol\")", 0, 0, 22.41396954, 0, 1e-8},
    /* GPSA Engineering Data Book: 379.48 to 379.5 ft3/lbmol at 60 °F and 14.696 psia; from memory */
    {"standard cubic foot", "GAS.SOLVE(\"N2\";\"T = 60 °F; P = 14.696 psia\";\"v, ft3/lbmol\")", 0, 0, PRINTED(379.48, 0.01)},
    {"lbmol in scf", "GAS.SOLVE(\"N2\";\"n = 1 lbmol\";\"scf\")", 0, 0, PRINTED(379.48, 0.01)},
    /* Esposito, Fluid Power with Applications, Ex. 13-12: bore 1.75 in, stroke 6 in, 30 a minute, pi/4 1.75^2 6 30/1728 =
     * 0.25055 ft3/min at 100 psig, 80 °F; free air 14.7 psia, 68 °F; answer from memory */
    {"free air of a cylinder", "GAS.SOLVE(\"air\";\"V = 0.25055 ft3/min; P = 100 psig; T = 80 °F\";\"ft3/min@68°F,14.7psi\";;\"barometer 14.7 psi\")", 0, 0, PRINTED(1.91, 0.01)},
    /* Cengel & Boles, Ex. 7-9, constant cp and table; answers from memory */
    {"entropy of air, constant cp", "GAS.SOLVE(\"air | R = 0.287 kJ/kg-K | cp = 1.006 kJ/kg-K\";\"P1 = 100 kPa; T1 = 290 K; P2 = 600 kPa; T2 = 330 K\";\"dS, kJ/kg-K\")", 0, 0, PRINTED(-0.3842, 0.0001)},
    {"entropy of air, table", "GAS.SOLVE(\"air\";\"P1 = 100 kPa; T1 = 290 K; P2 = 600 kPa; T2 = 330 K\";\"dS, kJ/kg-K\")", 0, 0, -0.3844, 0, 3e-4},
    /* Borgnakke & Sonntag, Ex. 8.5; answers from memory */
    {"entropy of hot air, constant cp", "GAS.SOLVE(\"air | R = 0.287 kJ/kg-K | cp = 1.004 kJ/kg-K\";\"P1 = 400 kPa; T1 = 300 K; P2 = 300 kPa; T2 = 600 K\";\"dS, kJ/kg-K\")", 0, 0, PRINTED(0.7785, 0.0001)},
    {"entropy of hot air, table", "GAS.SOLVE(\"air\";\"P1 = 400 kPa; T1 = 300 K; P2 = 300 kPa; T2 = 600 K\";\"dS, kJ/kg-K\")", 0, 0, 0.7897, 1e-3, 0},
    /* the same, Ex. 5.8, constant cp at 300 K, 0.922 kJ/(kg K), and table; answers from memory */
    {"enthalpy of oxygen, constant cp", "GAS.SOLVE(\"O2 | cp = 0.922 kJ/kg-K\";\"T1 = 300 K; T2 = 1500 K\";\"dH, kJ/kg\")", 0, 0, PRINTED(1106.4, 0.1)},
    {"enthalpy of oxygen, table", "GAS.SOLVE(\"O2\";\"T1 = 300 K; T2 = 1500 K\";\"dH, kJ/kg\")", 0, 0, 1267.0, 1e-3, 0},
    /* Cengel & Boles, Ex. 7-11: isentropic, k = 1.667; answer from memory */
    {"helium compressed", "GAS.SOLVE(\"He | k = 1.667\";\"isentropic; P1 = 14 psia; T1 = 50 °F; T2 = 320 °F\";\"P2, psia\")", 0, 0, PRINTED(40.5, 0.1)},
    /* Borgnakke & Sonntag, Ex. 8.6: isentropic with the air table, 600 K, 400 kPa to 150 kPa; answer from memory */
    {"air expanded", "GAS.SOLVE(\"air\";\"s constant; P1 = 400 kPa; T1 = 600 K; P2 = 150 kPa\";\"T2, K\")", 0, 0, PRINTED(457, 1)},
    /* Felder & Rousseau, Ex. 8.3-2: nitrogen, 20 to 100 °C, cubic cp of their table B.2, 2.332 kJ/mol; from memory */
    {"nitrogen heated", "GAS.SOLVE(\"N2\";\"T1 = 20 °C; T2 = 100 °C\";\"dH, kJ/mol\")", 0, 0, 2.332, 2e-3, 0},
};
/* clang-format on */

static void printed_digits(void)
{
    check_figures(examples, sizeof examples / sizeof *examples);
}

const struct test_suite suite_state_examples = {"state_examples",
                                                (const struct test_case[]){{"printed digits", printed_digits}, {0}}};
