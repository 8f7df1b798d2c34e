/*
 * SOLVE, cells in and cells out. Expected figures are worked out in the row, from the ideal-gas equation with factors
 * written out; sentences are those of the contract with the user.
 */
#include <string.h>

#include "check.h"
#include "formula.h"

#define R    8.31446261815324       /* J/(mol K), exact: BIPM SI Brochure, 9th ed. */
#define ATM  101325.0               /* Pa: NIST SP 811 (2008), App. B */
#define BAR  1e5                    /* Pa: NIST SP 811 */
#define PSI  6894.757293168361      /* Pa: 0.45359237 kg x 9.80665 m/s2 / (0.0254 m)^2, NIST SP 811 */
#define FT3  0.028316846592         /* m3: 0.3048^3, NIST SP 811 */
#define LB   0.45359237             /* kg: NIST SP 811 */
#define KGF  98066.5                /* Pa, kgf/cm2: NIST SP 811 */
#define MMHG 133.322387415          /* Pa, conventional: 13595.1 x 9.80665 / 1000 */
#define F(t) (((t) + 459.67) / 1.8) /* K */
#define C(t) ((t) + 273.15)         /* K */
#define N2   (2 * 14.007e-3)        /* kg/mol: IUPAC 2021 abridged atomic weights */
#define CO2  (12.011e-3 + 2 * 15.999e-3)
#define HE   4.002602e-3
#define NM3  (ATM / (R * C(0)))                 /* mol in 1 Nm3 */
#define SM3  (ATM / (R * C(15)))                /* mol in 1 Sm3 */
#define SCF  (14.696 * PSI * FT3 / (R * F(60))) /* mol in 1 scf */

struct figure_row {
    const char *id, *formula;
    size_t row, column; /* of the answer, from 0 */
    double expected, relative;
};

/* clang-format off */
static const struct figure_row figures[] = {
    /* one state, a typed text */
    {"anchor", "GAS.SOLVE(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"kg\")", 0, 0, 105.14, 5e-5}, /* contract with the user */
    {"m", "GAS.SOLVE(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m, kg\")", 0, 0, (7 * BAR + ATM) * 12 / (R * C(35)) * N2, 1e-12},
    {"n", "GAS.SOLVE(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"n, kmol\")", 0, 0, (7 * BAR + ATM) * 12 / (R * C(35)) / 1000, 1e-12},
    {"decimal comma", "GAS.SOLVE(\"N2\";\"7,5 bar; 35,5 °C; 1,2 m3\";\"mol\")", 0, 0, 7.5 * BAR * 1.2 / (R * C(35.5)), 1e-12},
    {"line breaks", "GAS.SOLVE(\"N2\";\"7.5 bar\n35.5 °C\n1.2 m3\";\"mol\")", 0, 0, 7.5 * BAR * 1.2 / (R * C(35.5)), 1e-12},
    {"trailing separators", "GAS.SOLVE(\"N2\";\" ; 7.5 bar;; 35.5 °C; 1.2 m3 ; \";\"mol\")", 0, 0, 7.5 * BAR * 1.2 / (R * C(35.5)), 1e-12},
    {"symbols", "GAS.SOLVE(\"N2\";\"P = 7.5 bar; T = 35.5 °C; V = 1.2 m3\";\"n, mol\")", 0, 0, 7.5 * BAR * 1.2 / (R * C(35.5)), 1e-12},
    {"bare is SI", "GAS.SOLVE(\"N2\";\"P = 250000; T = 310; V = 3\";\"mol\")", 0, 0, 250000.0 * 3 / (R * 310), 1e-12},
    {"pressure", "GAS.SOLVE(\"CO2\";\"31 kg; 40 °C; 2.5 m3\";\"P, bar(g)\")", 0, 0, (31 / CO2 * R * C(40) / 2.5 - ATM) / BAR, 1e-12},
    {"psig", "GAS.SOLVE(\"CO2\";\"31 kg; 40 °C; 2.5 m3\";\"psig\")", 0, 0, (31 / CO2 * R * C(40) / 2.5 - ATM) / PSI, 1e-11},
    {"temperature in °F", "GAS.SOLVE(\"He\";\"90 psig; 3 ft3; 0.25 lb\";\"T, °F\")", 0, 0, (90 * PSI + ATM) * 3 * FT3 / (0.25 * LB / HE * R) * 1.8 - 459.67, 1e-11},
    {"volume", "GAS.SOLVE(\"N2\";\"3 kg; 4 kgf/cm2(g); 18 °C\";\"L\")", 0, 0, 3 / N2 * R * C(18) / (4 * KGF + ATM) * 1000, 1e-12},
    {"density", "GAS.SOLVE(\"N2\";\"6.3 bar; 50 °C\";\"kg/m3\")", 0, 0, 6.3 * BAR * N2 / (R * C(50)), 1e-12},
    {"density without volume or amount", "GAS.SOLVE(\"N2\";\"6.3 bar; 50 °C\";\"rho, lb/ft3\")", 0, 0, 6.3 * BAR * N2 / (R * C(50)) / (LB / FT3), 1e-12},
    {"specific volume", "GAS.SOLVE(\"N2\";\"6.3 bar; 50 °C\";\"v, m3/kg\")", 0, 0, R * C(50) / (6.3 * BAR * N2), 1e-12},
    {"molar volume", "GAS.SOLVE(\"N2\";\"6.3 bar; 50 °C\";\"v, L/mol\")", 0, 0, R * C(50) / (6.3 * BAR) * 1000, 1e-12},
    {"pressure from density", "GAS.SOLVE(\"N2\";\"8.4 kg/m3; 60 °C\";\"P, kPa\")", 0, 0, 8.4 / N2 * R * C(60) / 1000, 1e-12},
    {"temperature from density", "GAS.SOLVE(\"N2\";\"8.4 kg/m3; 9 bar\";\"T, °C\")", 0, 0, 9 * BAR * N2 / (R * 8.4) - 273.15, 1e-11},
    {"molar mass", "GAS.SOLVE(\"N2\";\"6.3 bar; 50 °C\";\"M, g/mol\")", 0, 0, 28.014, 1e-12},
    {"vacuum", "GAS.SOLVE(\"N2\";\"700 mbar vac; 20 °C; 2 m3\";\"mol\")", 0, 0, (ATM - 70000.0) * 2 / (R * C(20)), 1e-12},
    {"mmHg", "GAS.SOLVE(\"N2\";\"745 mmHg; 20 °C; 2 m3\";\"mol\")", 0, 0, 745 * MMHG * 2 / (R * C(20)), 1e-9},
    /* reference volumes are amounts */
    {"Nm3", "GAS.SOLVE(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"Nm3\")", 0, 0, (7 * BAR + ATM) * 12 / (R * C(35)) / NM3, 1e-12},
    {"Sm3", "GAS.SOLVE(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"Sm3\")", 0, 0, (7 * BAR + ATM) * 12 / (R * C(35)) / SM3, 1e-12},
    {"scf", "GAS.SOLVE(\"N2\";\"90 psig; 70 °F; 400 ft3\";\"scf\")", 0, 0, (90 * PSI + ATM) * 400 * FT3 / (R * F(70)) / SCF, 1e-12},
    {"spelled out", "GAS.SOLVE(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"m3@20°C,101.325kPa\")", 0, 0, (7 * BAR + ATM) * 12 / (R * C(35)) * R * C(20) / ATM, 1e-12},
    {"Nm3 given", "GAS.SOLVE(\"N2\";\"350 Nm3\";\"kg\")", 0, 0, 350 * NM3 * N2, 1e-12},
    {"another normal", "GAS.SOLVE(\"N2\";\"350 Nm3\";\"mol\";;\"normal 0 °C, 1 bar\")", 0, 0, 350 * BAR / (R * C(0)), 1e-12},
    {"another standard", "GAS.SOLVE(\"N2\";\"350 Sm3\";\"mol\";;\"standard 20 °C, 1 atm\")", 0, 0, 350 * ATM / (R * C(20)), 1e-12},
    {"another scf", "GAS.SOLVE(\"N2\";\"350 scf\";\"mol\";;\"scf 60 °F, 14.73 psi\")", 0, 0, 350 * 14.73 * PSI * FT3 / (R * F(60)), 1e-12},
    /* flows */
    {"mass flow", "GAS.SOLVE(\"N2\";\"6 bar(g); 25 °C; 120 m3/h\";\"kg/h\")", 0, 0, (6 * BAR + ATM) * 120 / (R * C(25)) * N2, 1e-12},
    {"volume flow", "GAS.SOLVE(\"N2\";\"6 bar(g); 25 °C; 450 Nm3/h\";\"V, m3/min\")", 0, 0, 450 * NM3 / 60 * R * C(25) / (6 * BAR + ATM), 1e-12},
    {"SCFM", "GAS.SOLVE(\"N2\";\"100 lb/h\";\"SCFM\")", 0, 0, 100 * LB / N2 / SCF / 60, 1e-12},
    {"inlet volume of a flow", "GAS.SOLVE(\"N2\";\"0.5 kg/s; 2 bar; 300 K\";\"V, m3/s\")", 0, 0, 0.5 / N2 * R * 300 / (2 * BAR), 1e-12},
    /* barometers */
    {"barometer", "GAS.SOLVE(\"N2\";\"7 bar(g); 35 °C; 12 m3\";\"mol\";;\"barometer 0.98 bar\")", 0, 0, 7.98 * BAR * 12 / (R * C(35)), 1e-12},
    {"barometer, gauge out", "GAS.SOLVE(\"N2\";\"8 bar; 35 °C\";\"P, bar(g)\";;\"barometer 980 mbar\")", 0, 0, 8 - 0.98, 1e-12},
    /* US Standard Atmosphere 1976, eq. (33a): 101325 (1 - 0.0065 h/288.15)^(g M/(R* 0.0065)), R* = 8.31432 J/(mol K),
     * h = r z/(r + z), r = 6356766 m, z = 2400 m; by bc */
    {"barometer at a height", "GAS.SOLVE(\"N2\";\"0 bar(g); 35 °C\";\"P, Pa\";;\"barometer at 2400 m\")", 0, 0, 75634.26, 1e-5},
    {"a barometer for each row", "GAS.SOLVE(\"N2\";{7;35;12;980|6;30;11;1020};\"mol\";{\"P, bar(g)\";\"T, °C\";\"V, m3\";\"barometer, mbar\"})", 1, 0, 7.02 * BAR * 11 / (R * C(30)), 1e-12},
    {"a barometer in some rows", "GAS.SOLVE(\"N2\";{7;35;12;980|6;30;11;\"\"};\"mol\";{\"P, bar(g)\";\"T, °C\";\"V, m3\";\"barometer, mbar\"})", 1, 0, (6 * BAR + ATM) * 11 / (R * C(30)), 1e-12},
    {"a barometer, gauge wanted", "GAS.SOLVE(\"N2\";{8;980};\"P, bar(g)\";{\"P, bar\";\"barometer, mbar\"})", 0, 0, 8 - 0.98, 1e-12},
    /* two states */
    {"rigid vessel", "GAS.SOLVE(\"N2\";\"V = 2 m3; P1 = 7 bar(g); T1 = 80 °C; T2 = 15 °C\";\"P2, bar(g)\")", 0, 0, ((7 * BAR + ATM) * C(15) / C(80) - ATM) / BAR, 1e-12},
    {"rigid without its size", "GAS.SOLVE(\"N2\";\"P1 = 7 bar; T1 = 80 °C; T2 = 15 °C; V1 = 3 m3; V2 = 3 m3\";\"P2, bar\")", 0, 0, 7 * C(15) / C(80), 1e-12},
    {"isothermal", "GAS.SOLVE(\"N2\";\"T = 25 °C; P1 = 1 bar; V1 = 12 L; P2 = 8 bar\";\"V2, L\")", 0, 0, 12.0 / 8, 1e-12},
    {"combined gas law", "GAS.SOLVE(\"N2\";\"P1 = 1.2 bar; V1 = 6 m3; T1 = 20 °C; P2 = 4 bar; T2 = 90 °C\";\"V2, m3\")", 0, 0, 1.2 * 6 / C(20) * C(90) / 4, 1e-12},
    {"amount is shared", "GAS.SOLVE(\"N2\";\"P1 = 1.2 bar; V1 = 6 m3; T1 = 20 °C; P2 = 4 bar; T2 = 90 °C\";\"n\")", 0, 0, 1.2 * BAR * 6 / (R * C(20)), 1e-12},
    {"inlet and outlet", "GAS.SOLVE(\"N2\";\"Inlet pressure = 1.2 bar; Inlet volume = 6 m3; Inlet temperature = 20 °C; Outlet pressure = 4 bar; Outlet temperature = 90 °C\";\"V2, m3\")", 0, 0, 1.2 * 6 / C(20) * C(90) / 4, 1e-12},
    {"numbered masses differ", "GAS.SOLVE(\"N2\";\"V = 2 m3; T = 290 K; m1 = 3 kg; m2 = 5 kg\";\"P2, bar\")", 0, 0, 5 / N2 * R * 290 / 2 / BAR, 1e-12},
    {"actual flow at the other end", "GAS.SOLVE(\"N2\";\"P1 = 1 bar; T1 = 20 °C; V1 = 600 m3/h; P2 = 8 bar; T2 = 40 °C\";\"V2, m3/h\")", 0, 0, 600.0 / 8 * C(40) / C(20), 1e-12},
    {"wanted in a state, all unnumbered", "GAS.SOLVE(\"N2\";\"6.3 bar; 50 °C\";\"rho2, kg/m3\")", 0, 0, 6.3 * BAR * N2 / (R * C(50)), 1e-12},
    {"wanted without a number, one state", "GAS.SOLVE(\"N2\";\"P1 = 6.3 bar; T1 = 50 °C\";\"rho, kg/m3\")", 0, 0, 6.3 * BAR * N2 / (R * C(50)), 1e-12},
    /* heat: constant cp makes it arithmetic */
    {"h, datum 25 °C", "GAS.SOLVE(\"N2 | cp = 1.04 kJ/kg-K\";\"3 bar; 95 °C\";\"h, kJ/kg\")", 0, 0, 1.04 * 70, 1e-12},
    {"h, another datum", "GAS.SOLVE(\"N2 | cp = 1.04 kJ/kg-K\";\"3 bar; 95 °C\";\"h, kJ/kg\";;\"datum 0 °C\")", 0, 0, 1.04 * 95, 1e-12},
    {"u = h - P v", "GAS.SOLVE(\"N2 | cp = 1.04 kJ/kg-K\";\"3 bar; 95 °C\";\"u, kJ/kg\")", 0, 0, 1.04 * 70 - R * C(95) / N2 / 1000, 1e-12},
    {"s at the datum pressure", "GAS.SOLVE(\"N2 | cp = 1.04 kJ/kg-K\";\"1 bar; 95 °C\";\"s, kJ/kg-K\")", 0, 0, 0.21932949817543538, 1e-12}, /* 1.04 ln(368.15/298.15), bc */
    {"T from h", "GAS.SOLVE(\"N2 | cp = 1.04 kJ/kg-K\";\"3 bar; h = 72.8 kJ/kg\";\"T, °C\")", 0, 0, 95, 1e-11},
    {"cp", "GAS.SOLVE(\"N2 | cp = 1.04 kJ/kg-K\";\"3 bar; 95 °C\";\"cp, J/mol-K\")", 0, 0, 1040 * N2, 1e-12},
    {"cv", "GAS.SOLVE(\"N2 | cp = 1.04 kJ/kg-K\";\"3 bar; 95 °C\";\"cv, J/kg-K\")", 0, 0, 1040 - R / N2, 1e-12},
    {"gamma", "GAS.SOLVE(\"air | k = 1.4\";\"3 bar; 95 °C\";\"gamma\")", 0, 0, 1.4, 1e-12},
    {"cp of the data", "GAS.SOLVE(\"N2\";\"T = 500 K\";\"cp, J/mol-K\")", 0, 0, 29.580, 1e-3}, /* NIST-JANAF, 4th ed., N2 */
    {"dH in kJ", "GAS.SOLVE(\"N2 | cp = 1.04 kJ/kg-K\";\"m = 3 kg; P1 = 2 bar; T1 = 20 °C; T2 = 90 °C\";\"dH, kJ\")", 0, 0, 3 * 1.04 * 70, 1e-12},
    {"dU per mass", "GAS.SOLVE(\"N2 | cp = 1.04 kJ/kg-K\";\"T1 = 20 °C; T2 = 90 °C\";\"dU, kJ/kg\")", 0, 0, (1.04 - R / N2 / 1000) * 70, 1e-12},
    {"dH as a duty", "GAS.SOLVE(\"N2 | cp = 1.04 kJ/kg-K\";\"900 kg/h; T1 = 20 °C; T2 = 90 °C\";\"dH, kW\")", 0, 0, 900 / 3600.0 * 1.04 * 70, 1e-12},
    {"dS between pressures", "GAS.SOLVE(\"N2 | cp = 1.04 kJ/kg-K\";\"T = 350 K; P1 = 1 bar; P2 = 8 bar\";\"dS, J/mol-K\")", 0, 0, -17.289438964931938, 1e-12}, /* -R ln 8, bc */
    /* several wanted, several units */
    {"second of two", "GAS.SOLVE(\"N2\";\"7.5 bar; 35.5 °C; 1.2 m3\";\"n, mol; rho, mol/m3\")", 0, 1, 7.5 * BAR / (R * C(35.5)), 1e-12},
    {"wanted in a row of cells", "GAS.SOLVE(\"N2\";\"7.5 bar; 35.5 °C; 1.2 m3\";{\"n, mol\";\"rho, mol/m3\"})", 0, 1, 7.5 * BAR / (R * C(35.5)), 1e-12},
    {"wanted in a column of cells", "GAS.SOLVE(\"N2\";\"7.5 bar; 35.5 °C; 1.2 m3\";{\"n, mol\"|\"rho, mol/m3\"})", 1, 0, 7.5 * BAR / (R * C(35.5)), 1e-12},
    /* blocks */
    {"pairs", "GAS.SOLVE(\"N2\";{\"P, bar(g)\";7|\"T, °C\";35|\"V, m3\";12};\"mol\")", 0, 0, (7 * BAR + ATM) * 12 / (R * C(35)), 1e-12},
    {"pairs from GIVEN", "GAS.SOLVE(\"N2\";GAS.GIVEN(\"P, bar(g)\";7;\"T, °C\";35;\"V, m3\";12);\"mol\")", 0, 0, (7 * BAR + ATM) * 12 / (R * C(35)), 1e-12},
    {"pairs, a number as text", "GAS.SOLVE(\"N2\";{\"P, bar(g)\";\"7,5\"|\"T, °C\";35|\"V, m3\";12};\"mol\")", 0, 0, (7.5 * BAR + ATM) * 12 / (R * C(35)), 1e-12},
    {"pairs, the unit with the value", "GAS.SOLVE(\"N2\";{\"P\";\"7 bar(g)\"|\"T\";\"35 °C\"|\"V\";\"12 m3\"};\"mol\")", 0, 0, (7 * BAR + ATM) * 12 / (R * C(35)), 1e-12},
    {"pairs, a blank value", "GAS.SOLVE(\"N2\";{\"P, bar(g)\";7|\"T, °C\";35|\"V, m3\";12|\"m, kg\";\"\"};\"mol\")", 0, 0, (7 * BAR + ATM) * 12 / (R * C(35)), 1e-12},
    {"label, value, unit", "GAS.SOLVE(\"N2\";{\"Pressure\";7;\"bar(g)\"|\"Temperature\";35;\"°C\"|\"Volume\";12;\"m3\"};\"mol\")", 0, 0, (7 * BAR + ATM) * 12 / (R * C(35)), 1e-12},
    {"with a title row", "GAS.SOLVE(\"N2\";{\"quantity\";\"value\";\"unit\"|\"P\";7;\"bar(g)\"|\"T\";35;\"°C\"|\"V\";12;\"m3\"};\"mol\")", 0, 0, (7 * BAR + ATM) * 12 / (R * C(35)), 1e-12},
    {"a column of texts", "GAS.SOLVE(\"N2\";{\"7 bar(g)\"|\"35 °C\"|\"12 m3\"};\"mol\")", 0, 0, (7 * BAR + ATM) * 12 / (R * C(35)), 1e-12},
    {"a row of texts", "GAS.SOLVE(\"N2\";{\"P = 7 bar(g)\";\"T = 35 °C\";\"V = 12 m3\"};\"mol\")", 0, 0, (7 * BAR + ATM) * 12 / (R * C(35)), 1e-12},
    /* tables */
    {"table, last row", "GAS.SOLVE(\"N2\";{7;35;12|6;30;11|5;25;10};\"mol\";{\"P, bar(g)\";\"T, °C\";\"V, m3\"})", 2, 0, (5 * BAR + ATM) * 10 / (R * C(25)), 1e-12},
    {"table, second answer", "GAS.SOLVE(\"N2\";{7;35;12|6;30;11};\"mol; kg\";{\"P, bar(g)\";\"T, °C\";\"V, m3\"})", 1, 1, (6 * BAR + ATM) * 11 / (R * C(30)) * N2, 1e-12},
    {"headings in one text", "GAS.SOLVE(\"N2\";{7;35;12|6;30;11};\"mol\";\"P, bar(g); T, °C; V, m3\")", 1, 0, (6 * BAR + ATM) * 11 / (R * C(30)), 1e-12},
    {"cases across", "GAS.SOLVE(\"N2\";{7;6|35;30|12;11};\"mol; kg\";{\"P, bar(g)\"|\"T, °C\"|\"V, m3\"})", 1, 1, (6 * BAR + ATM) * 11 / (R * C(30)) * N2, 1e-12},
    {"headings on top of the table", "GAS.SOLVE(\"N2\";{\"P, bar(g)\";\"T, °C\";\"V, m3\"|7;35;12|6;30;11};\"mol\")", 1, 0, (6 * BAR + ATM) * 11 / (R * C(30)), 1e-12},
    {"headings beside the table", "GAS.SOLVE(\"N2\";{\"P, bar(g)\";7;6|\"T, °C\";35;30|\"V, m3\";12;11};\"mol\")", 0, 1, (6 * BAR + ATM) * 11 / (R * C(30)), 1e-12},
    {"one column", "GAS.SOLVE(\"N2\";{100|250};\"mol\";\"m, kg\")", 1, 0, 250 / N2, 1e-12},
    {"one row of one heading", "GAS.SOLVE(\"N2\";{100;250};\"mol\";\"m, kg\")", 0, 1, 250 / N2, 1e-12},
    {"one cell", "GAS.SOLVE(\"N2\";{100};\"mol\";\"m, kg\")", 0, 0, 100 / N2, 1e-12},
    {"one column, heading on top", "GAS.SOLVE(\"N2\";{\"m, kg\"|100|250};\"mol\")", 1, 0, 250 / N2, 1e-12},
    {"blank: this row knows the mass", "GAS.SOLVE(\"N2\";{7;35;12;\"\"|7;35;\"\";90};\"V, m3; m, kg\";{\"P, bar(g)\";\"T, °C\";\"V, m3\";\"m, kg\"})", 1, 0, 90 / N2 * R * C(35) / (7 * BAR + ATM), 1e-12},
    {"blank: the first row knows the volume", "GAS.SOLVE(\"N2\";{7;35;12;\"\"|7;35;\"\";90};\"V, m3; m, kg\";{\"P, bar(g)\";\"T, °C\";\"V, m3\";\"m, kg\"})", 0, 1, (7 * BAR + ATM) * 12 / (R * C(35)) * N2, 1e-12},
    {"cell with its own unit", "GAS.SOLVE(\"N2\";{7;35;12|\"90 psig\";30;11};\"mol\";{\"P, bar(a)\";\"T, °C\";\"V, m3\"})", 1, 0, (90 * PSI + ATM) * 11 / (R * C(30)), 1e-12},
    {"cell with a number as text", "GAS.SOLVE(\"N2\";{7;35;12|\"6,5\";30;11};\"mol\";{\"P, bar(a)\";\"T, °C\";\"V, m3\"})", 1, 0, 6.5 * BAR * 11 / (R * C(30)), 1e-12},
    {"a bad row leaves the others", "GAS.SOLVE(\"N2\";{7;35;12|7;-300;12|6;30;11};\"mol\";{\"P, bar(g)\";\"T, °C\";\"V, m3\"})", 2, 0, (6 * BAR + ATM) * 11 / (R * C(30)), 1e-12},
    {"headings in brackets", "GAS.SOLVE(\"N2\";{90;70;4};\"m, lb\";{\"Inlet pressure (psig)\";\"T1 [°F]\";\"Volume ft3\"})", 0, 0, (90 * PSI + ATM) * 4 * FT3 / (R * F(70)) * N2 / LB, 1e-12},
    /* plus-minus: relative spreads of a product add in squares (JCGM 100:2008, 5.1.6) */
    {"uncertainty", "GAS.SOLVE(\"N2\";{4;300;2;0.04;1.5};\"±n, mol\";{\"P, bar\";\"T, K\";\"V, m3\";\"±P, bar\";\"±T, K\"})", 0, 0, 4 * BAR * 2 / (R * 300) * 0.011180339887, 2e-4},
    /* consistent redundancy within 0.1 % */
    {"redundant", "GAS.SOLVE(\"N2\";\"4 bar; 300 K; 2 m3; 320.9 mol\";\"rho, mol/m3\")", 0, 0, 160.4, 2e-3},
    {"redundant, wider", "GAS.SOLVE(\"N2\";\"4 bar; 300 K; 2 m3; 323 mol\";\"V, m3\";;\"agree 2 %\")", 0, 0, 2, 1e-12},
};

struct sentence_row {
    const char *id, *formula;
    size_t row, column;
    const char *sentence; /* starting with "...": only a part of it */
};

static const struct sentence_row sentences[] = {
    {"below absolute zero", "GAS.SOLVE(\"N2\";\"T1 = -300 °C; P1 = 1 bar\";\"rho1, kg/m3\")", 0, 0,
     "Check T1: -300 °C is below absolute zero (-273.15 °C)."},
    {"below a vacuum", "GAS.SOLVE(\"N2\";\"T1 = 20 °C; P1 = -2 bar(g)\";\"rho1, kg/m3\")", 0, 0,
     "Check P1: -2 bar(g) is below a perfect vacuum at a barometer of 1.01325 bar."},
    {"below a vacuum, another barometer", "GAS.SOLVE(\"N2\";\"20 °C; -0.99 bar(g)\";\"kg/m3\";;\"barometer 0.98 bar\")", 0, 0,
     "Check P: -0.99 bar(g) is below a perfect vacuum at a barometer of 0.98 bar."},
    {"undetermined", "GAS.SOLVE(\"N2\";\"P1 = 1 bar; T1 = 300 K; V1 = 2 m3\";\"T2, K\")", 0, 0,
     "Check given: T2 cannot be found from P1, T1 and V1; give P2, V2 or a leg."},
    {"outside the data", "GAS.SOLVE(\"N2\";\"T = 25\";\"cp\")", 0, 0,
     "Check T: 25 K is outside the data for nitrogen (200 to 20000 K). If 25 °C was meant, give the unit."},
    {"missing volume", "GAS.SOLVE(\"N2\";\"7 bar(g); 35 °C\";\"kg\")", 0, 0,
     "Check given: m cannot be found from P and T; give V."},
    {"missing two", "GAS.SOLVE(\"N2\";\"7 bar(g)\";\"kg\")", 0, 0, "Check given: m cannot be found from P; give T and V."},
    {"which state", "GAS.SOLVE(\"N2\";\"P1 = 1 bar; T1 = 300 K; V1 = 2 m3; P2 = 3 bar; T2 = 350 K\";\"V, m3\")", 0, 0,
     "Check wanted: V is not the same in every state; write V1 or V2."},
    {"twice", "GAS.SOLVE(\"N2\";\"P = 1 bar; T = 300 K; P = 2 bar\";\"kg/m3\")", 0, 0, "...P is given twice"},
    {"twice, in a table", "GAS.SOLVE(\"N2\";{1;2;300};\"kg/m3\";{\"P1, bar\";\"P1, psi\";\"T1, K\"})", 0, 0,
     "Check headings: P1 is given twice, as \"P1, bar\" and as \"P1, psi\"; leave one out."},
    {"everywhere and in one state", "GAS.SOLVE(\"N2\";\"V = 1 m3; V2 = 2 m3; P = 1 bar; T = 300 K\";\"kg\")", 0, 0, "...V is given once for every state and again as V2"},
    {"state 0", "GAS.SOLVE(\"N2\";\"P0 = 1 bar; T1 = 300 K\";\"kg/m3\")", 0, 0, "...has a state number that is not 1 to 9"},
    {"state 12", "GAS.SOLVE(\"N2\";{1;300};\"kg/m3\";{\"P12, bar\";\"T12, K\"})", 0, 0, "...has a state number that is not 1 to 9"},
    {"contradictory unit", "GAS.SOLVE(\"N2\";{1;300};\"kg/m3\";{\"P1, kg\";\"T1, K\"})", 0, 0, "...do not belong together"},
    {"unknown unit", "GAS.SOLVE(\"N2\";\"7 bra(g); 35 °C\";\"kg/m3\")", 0, 0, "...bra"},
    {"unknown heading", "GAS.SOLVE(\"N2\";{1;300};\"kg/m3\";{\"Humidity\";\"T1, K\"})", 0, 0, "...names no known quantity"},
    {"zero kelvin", "GAS.SOLVE(\"N2\";\"T = 0 K; P = 1 bar\";\"kg/m3\")", 0, 0, "Check T: 0 K is at absolute zero (0 K). If 0 °C was meant, give the unit."},
    {"zero volume", "GAS.SOLVE(\"N2\";\"T = 300 K; P = 1 bar; V = 0 m3\";\"kg\")", 0, 0, "Check V: 0 m3 must be above zero."},
    {"negative mass", "GAS.SOLVE(\"N2\";\"T = 300 K; P = 1 bar; m = -3 kg\";\"m3\")", 0, 0, "Check m: -3 kg must be above zero."},
    {"zero pressure", "GAS.SOLVE(\"N2\";\"T = 300 K; P = 0 bar; V = 1 m3\";\"kg\")", 0, 0, "...0 bar is a perfect vacuum"},
    {"negative absolute pressure", "GAS.SOLVE(\"N2\";\"T = 300 K; P = -1 bar; V = 1 m3\";\"kg\")", 0, 0,
     "Check P: -1 bar is below a perfect vacuum; if it is a gauge reading, write bar(g) or psig."},
    {"flow mixed with a total", "GAS.SOLVE(\"N2\";\"12 m3/h; 3 kg; 300 K\";\"P, bar\")", 0, 0, "...is a volume flow but"},
    {"total from a flow", "GAS.SOLVE(\"N2\";\"12 m3/h; 3 bar; 300 K\";\"kg\")", 0, 0, "...is a mass, but flows are given"},
    {"flow from a total", "GAS.SOLVE(\"N2\";\"12 m3; 3 bar; 300 K\";\"kg/h\")", 0, 0, "...is a mass flow, but no flow is given"},
    {"count of headings", "GAS.SOLVE(\"N2\";{1;300;2|2;300;2};\"kg\";{\"P1, bar\";\"T1, K\"})", 0, 0,
     "Check headings: there are 2 headings for 3 columns of figures; give one for each column."},
    {"count of headings beside", "GAS.SOLVE(\"N2\";{1;300;2|2;300;2};\"kg\";{\"P1, bar\"|\"T1, K\"|\"V1, m3\"})", 0, 0,
     "Check headings: there are 3 headings for 2 rows of figures; give one for each row."},
    {"headings in a rectangle", "GAS.SOLVE(\"N2\";{1;300|2;300};\"kg\";{\"P1, bar\";\"T1, K\"|\"V1, m3\";\"m, kg\"})", 0, 0, "...one row or one column of headings"},
    {"no headings", "GAS.SOLVE(\"N2\";{1;300|2;300};\"kg\")", 0, 0, "...the table has no headings"},
    {"a bare number", "GAS.SOLVE(\"N2\";7;\"kg\")", 0, 0, "...a bare number"},
    {"nothing given", "GAS.SOLVE(\"N2\";;\"kg\")", 0, 0, "...nothing is given"},
    {"blank given", "GAS.SOLVE(\"N2\";\" \";\"kg\")", 0, 0, "Check given: "},
    {"contradiction", "GAS.SOLVE(\"N2\";\"4 bar; 300 K; 2 m3; n = 350 mol\";\"kg\")", 0, 0, "...% apart where 0.1 % is allowed"},
    /* 4e5 x 2/(8.31446261815324 x 300) = 320.726 mol */
    {"contradiction, both sides", "GAS.SOLVE(\"N2\";\"4 bar; 300 K; 2 m3; n = 350 mol\";\"kg\")", 0, 0, "...n is given as 350 mol, but the other figures make it 320.726 mol"},
    {"a text in a table", "GAS.SOLVE(\"N2\";{7;35;12|\"n/a\";30;11};\"mol\";{\"P, bar(g)\";\"T, °C\";\"V, m3\"})", 1, 0,
     "Check P: \"n/a\" is not a number; write a figure, or leave the cell blank."},
    {"another kind of unit in a cell", "GAS.SOLVE(\"N2\";{7;35;12|\"6 kg\";30;11};\"mol\";{\"P, bar(g)\";\"T, °C\";\"V, m3\"})", 1, 0,
     "Check P: \"kg\" is the unit of a mass, but its heading asks for a pressure."},
    {"an earlier sentence in a table", "GAS.SOLVE(\"N2\";{7;35;12|\"Check T1: it is odd.\";30;11};\"mol; kg\";{\"P, bar(g)\";\"T, °C\";\"V, m3\"})", 1, 1,
     "Check T1: it is odd."},
    {"an earlier sentence in a block", "GAS.SOLVE(\"N2\";{\"P, bar(g)\";7|\"T, °C\";\"Check T1: it is odd.\"|\"V, m3\";12};\"mol\")", 0, 0,
     "Check T1: it is odd."},
    {"a bad row, second answer", "GAS.SOLVE(\"N2\";{7;35;12|7;-300;12};\"mol; kg\";{\"P, bar(g)\";\"T, °C\";\"V, m3\"})", 1, 1,
     "Check T: -300 °C is below absolute zero (-273.15 °C)."},
    {"a row without volume", "GAS.SOLVE(\"N2\";{7;35;12|7;30;\"\"};\"mol\";{\"P, bar(g)\";\"T, °C\";\"V, m3\"})", 1, 0, "...n cannot be found from P and T; give V"},
    {"a blank row stays blank", "GAS.SOLVE(\"N2\";{7;35;12|\"\";\"\";\"\"};\"mol\";{\"P, bar(g)\";\"T, °C\";\"V, m3\"})", 1, 0, ""},
    {"below a vacuum, the row's barometer", "GAS.SOLVE(\"N2\";{-1;300;980};\"kg/m3\";{\"P, bar(g)\";\"T, K\";\"barometer, mbar\"})", 0, 0,
     "Check P: -1 bar(g) is below a perfect vacuum at a barometer of 0.98 bar."},
    {"a barometer that is none", "GAS.SOLVE(\"N2\";{1;300;0.98};\"kg/m3\";{\"P, bar(g)\";\"T, K\";\"barometer, mbar\"})", 0, 0, "...0.98 mbar is no air pressure"},
    {"a total change of unlike amounts", "GAS.SOLVE(\"N2\";\"m1 = 3 kg; m2 = 5 kg; T1 = 20 °C; T2 = 90 °C\";\"dH, kJ\")", 0, 0, "...dH is for one amount of gas"},
    {"explicit kelvin is no slip", "GAS.SOLVE(\"N2\";\"T = 25 K\";\"cp\")", 0, 0, "Check T: 25 K is outside the data for nitrogen (200 to 20000 K)."},
    {"the datum is outside the data", "GAS.SOLVE(\"SF6 | cp = 0.66 kJ/kg-K, 300 to 500 K\";\"40 °C; 3 bar\";\"h, kJ/kg\")", 0, 0, "...move it with an option such as \"datum 100 °C\""},
    {"cp at the datum, outside the data", "GAS.SOLVE(\"SF6 | cp = 0.66 kJ/kg-K, 300 to 500 K\";\"T = 25 °C\";\"cp\")", 0, 0, "Check T: 25 °C is outside the data for sulfur hexafluoride (26.85 to 226.85 °C)."},
    {"h beyond the data", "GAS.SOLVE(\"N2\";\"h = 30 MJ/mol; 3 bar\";\"T, K\")", 0, 0, "...it would be outside the data for nitrogen"},
    {"rigid vessel, contradiction", "GAS.SOLVE(\"N2\";\"V = 2 m3; P1 = 2 bar; T1 = 300 K; P2 = 3 bar; T2 = 500 K\";\"m, kg\")", 0, 0,
     /* 300 K x 3/2 = 450 K; 500/450 = 1.1111 */
     "Check given: T2 is given as 500 K, but the other figures make it 450 K (P1 / T1 = P2 / T2): 11.1 % apart where 0.1 % is allowed; correct one, leave one out, or add the option \"open\" where gas came in or went out between them."},
    {"work is wanted", "GAS.SOLVE(\"N2\";\"P1 = 1 bar; T1 = 300 K; P2 = 8 bar\";\"W, kJ\")", 0, 0, "...depends on the process; use GAS.WORK with legs"},
    {"an energy without a symbol", "GAS.SOLVE(\"N2\";\"3 kg; 1 bar; 300 K\";\"kJ\")", 0, 0, "Check wanted: "},
    {"a change in one state", "GAS.SOLVE(\"N2\";\"3 kg; 1 bar; 300 K\";\"dH, kJ\")", 0, 0, "...is a change from one state to another"},
    {"work is given", "GAS.SOLVE(\"N2\";\"W = 12 kJ; 1 bar; 300 K\";\"kg\")", 0, 0, "...belongs to a process"},
    {"plus-minus without any", "GAS.SOLVE(\"N2\";\"12 m3; 1 bar; 300 K\";\"±m, kg\")", 0, 0, "...an uncertainty needs those of the givens"},
    {"unknown option", "GAS.SOLVE(\"N2\";\"12 m3; 1 bar; 300 K\";\"kg\";;\"barometre 1 bar\")", 0, 0, "Check options: \"barometre 1 bar\" is not an option; the options are: barometer at 2400 m; barometer 0.98 bar; altitude 2400 m; "},
    {"wanted is a number", "GAS.SOLVE(\"N2\";\"12 m3; 1 bar; 300 K\";7)", 0, 0, "...there is a number where a heading"},
    {"several cases, nothing wanted", "GAS.SOLVE(\"N2\";{7;35|6;35};;{\"P, bar\";\"T, °C\"})", 0, 0, "...say what is wanted"},
    {"both ends of the data", "GAS.SOLVE(\"N2\";\"T1 = 300 K; T2 = 100 K\";\"dH, J/mol\")", 0, 0, "Check T2: 100 K is outside the data for nitrogen (200 to 20000 K)."},
};
/* clang-format on */

static const struct gas_cell *answer_of(const char *id, const char *formula, size_t row, size_t column,
                                        struct gas_arena *arena)
{
    struct gas_block value;
    if (!check_true(id, formula_evaluate(formula, arena, &value)))
        return NULL;
    /* a refused call is one cell, whatever was asked */
    if (row >= value.rows || column >= value.columns) {
        check_true(id, row < value.rows && column < value.columns);
        return NULL;
    }
    return gas_cell_at(&value, row, column);
}

static void figures_by_arithmetic(void)
{
    struct gas_arena arena = {0};
    for (size_t i = 0; i < sizeof figures / sizeof *figures; i++) {
        const struct figure_row *row = &figures[i];
        const struct gas_cell *cell = answer_of(row->id, row->formula, row->row, row->column, &arena);
        if (cell && cell->kind == GAS_CELL_TEXT)
            check_text(row->id, cell->text, "a number");
        else if (cell)
            check_close(row->id, cell->number, row->expected, row->relative, 0);
        gas_arena_reset(&arena);
    }
    gas_arena_free(&arena);
}

static void sentences_say_what_to_do(void)
{
    struct gas_arena arena = {0};
    for (size_t i = 0; i < sizeof sentences / sizeof *sentences; i++) {
        const struct sentence_row *row = &sentences[i];
        const struct gas_cell *cell = answer_of(row->id, row->formula, row->row, row->column, &arena);
        if (cell && check_true(row->id, cell->kind == GAS_CELL_TEXT)) {
            size_t length = strlen(row->sentence);
            bool part = strncmp(row->sentence, "...", 3) == 0 || (length && row->sentence[length - 1] == ' ');
            if (part)
                check_contains(row->id, cell->text, row->sentence + (row->sentence[0] == '.' ? 3 : 0));
            else
                check_text(row->id, cell->text, row->sentence);
        }
        gas_arena_reset(&arena);
    }
    gas_arena_free(&arena);
}

static void hard_errors_are_not_available(void)
{
    struct gas_arena arena = {0};
    const char *table =
        "GAS.SOLVE(\"N2\";{7;35;12|7;-300;12};\"mol\";{\"P, bar(g)\";\"T, °C\";\"V, m3\"};\"hard errors\")";
    const struct gas_cell *cell = answer_of("a row", table, 1, 0, &arena);
    check_true("a row", cell && cell->kind == GAS_CELL_NOT_AVAILABLE);
    cell = answer_of("the other row", table, 0, 0, &arena);
    check_true("the other row", cell && cell->kind == GAS_CELL_NUMBER);
    cell = answer_of("a call", "GAS.SOLVE(\"N2\";\"7 bar\";\"furlongs\";;\"hard errors\")", 0, 0, &arena);
    check_true("a call", cell && cell->kind == GAS_CELL_NOT_AVAILABLE);
    gas_arena_free(&arena);
}

/* The row of a card that starts with a label; NULL when there is none. */
static const struct gas_cell *card_row(const struct gas_block *card, const char *label)
{
    for (size_t i = 0; i < card->rows; i++)
        if (card->columns == 3 && strcmp(gas_cell_at(card, i, 0)->text, label) == 0)
            return gas_cell_at(card, i, 0);
    return NULL;
}

static void check_card_row(const struct gas_block *card, const char *label, double expected, const char *unit)
{
    const struct gas_cell *row = card_row(card, label);
    check_true(label, row && row[1].kind == GAS_CELL_NUMBER);
    if (!row)
        return;
    check_close(label, row[1].number, expected, 1e-11, 0);
    check_text(label, row[2].text, unit);
}

static void nothing_wanted_gives_a_card(void)
{
    struct gas_arena arena = {0};
    struct gas_block card;
    check_true("card",
               formula_evaluate("GAS.SOLVE(\"N2 | cp = 1.04 kJ/kg-K\";\"7 bar(g); 35 °C; 12 m3\")", &arena, &card));
    check_text("heading row", card.cell[0].text, "quantity");
    check_card_row(&card, "P", 7, "bar(g)");
    check_card_row(&card, "T", 35, "°C");
    check_card_row(&card, "V", 12, "m3");
    check_card_row(&card, "m", (7 * BAR + ATM) * 12 / (R * C(35)) * N2, "kg");
    check_card_row(&card, "rho", (7 * BAR + ATM) / (R * C(35)) * N2, "kg/m3");
    check_card_row(&card, "h", 1040 * N2 * 10, "J/mol");
    check_card_row(&card, "cp", 1040 * N2, "J/(mol·K)");
    check_card_row(&card, "M", 28.014, "kg/kmol");
    gas_arena_reset(&arena);
    check_true("two states",
               formula_evaluate("GAS.SOLVE(\"N2\";\"V = 2 m3; P1 = 7 psig; T1 = 80 °F; T2 = 15 °C\")", &arena, &card));
    check_card_row(&card, "P2", ((7 * PSI + ATM) * C(15) / F(80) - ATM) / PSI, "psig");
    check_card_row(&card, "T1", 80, "°F");
    check_card_row(&card, "T2", 15, "°C");
    check_card_row(&card, "V", 2, "m3");
    check_card_row(&card, "n", (7 * PSI + ATM) * 2 / (R * F(80)), "mol");
    check_true("no volume of a state", !card_row(&card, "V1"));
    check_true("the change of entropy", card_row(&card, "dS") != NULL);
    gas_arena_reset(&arena);
    check_true("a flow", formula_evaluate("GAS.SOLVE(\"N2\";\"6 bar(g); 25 °C; 120 m3/h\")", &arena, &card));
    check_card_row(&card, "m", (6 * BAR + ATM) * 120 / (R * C(25)) * N2, "kg/h");
    gas_arena_free(&arena);
}

static void a_card_can_be_given_again(void)
{
    struct gas_arena arena = {0};
    const struct gas_cell *cell = answer_of(
        "card", "GAS.SOLVE(\"N2\";{\"quantity\";\"value\";\"unit\"|\"P\";7;\"bar(g)\"|\"T\";35;\"°C\"};\"rho, kg/m3\")",
        0, 0, &arena);
    check_true("card", cell && cell->kind == GAS_CELL_NUMBER);
    if (cell)
        check_close("card", cell->number, (7 * BAR + ATM) / (R * C(35)) * N2, 1e-12, 0);
    gas_arena_free(&arena);
}

/* Answers of cases across run across: three cases and two wanted are two rows of three. */
static void shapes(void)
{
    struct gas_arena arena = {0};
    struct gas_block value;
    formula_evaluate("GAS.SOLVE(\"N2\";{7;6;5|35;30;25|12;11;10};\"mol; kg\";{\"P, bar(g)\"|\"T, °C\"|\"V, m3\"})",
                     &arena, &value);
    check_int("across, rows", (long)value.rows, 2);
    check_int("across, columns", (long)value.columns, 3);
    formula_evaluate("GAS.SOLVE(\"N2\";{7;35;12|6;30;11|5;25;10};\"mol; kg\";{\"P, bar(g)\";\"T, °C\";\"V, m3\"})",
                     &arena, &value);
    check_int("down, rows", (long)value.rows, 3);
    check_int("down, columns", (long)value.columns, 2);
    gas_arena_free(&arena);
}

const struct test_suite suite_solve = {"solve",
                                       (const struct test_case[]){{"figures", figures_by_arithmetic},
                                                                  {"sentences", sentences_say_what_to_do},
                                                                  {"hard errors", hard_errors_are_not_available},
                                                                  {"card", nothing_wanted_gives_a_card},
                                                                  {"card given", a_card_can_be_given_again},
                                                                  {"shapes", shapes},
                                                                  {0}}};
