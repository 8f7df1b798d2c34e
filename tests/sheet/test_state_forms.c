/*
 * Ways to say what is known beside a figure with a unit: constants, plus-minus, barometers, headings in two lines,
 * lines that are passed over, vessels that gas leaves. Expected figures are worked out in the row.
 */
#include <math.h>

#include "sheet/answers.h"

#define COUNT(table) (sizeof(table) / sizeof *(table))
#define R            8.31446261815324  /* J/(mol K), exact: BIPM SI Brochure, 9th ed. */
#define ATM          101325.0          /* Pa: NIST SP 811 (2008) */
#define PSI          6894.757293168361 /* Pa: NIST SP 811, 0.45359237 x 9.80665 / 0.0254^2 */
#define C(t)         ((t) + 273.15)
#define N2           (2 * 14.007e-3) /* kg/mol: IUPAC 2021 */
#define RHO(P, t)    ((P)*N2 / (R * C(t)))
/* US Standard Atmosphere 1976, eq. (33a) and (18): 101325 (1 - 0.0065 H/288.15)^(g M/(R* 0.0065)), R* = 8.31432 J/(mol
 * K), H = r z/(r + z), r = 6356766 m; by bc */
#define P_2400M  75634.26
#define P_8000FT 75271.21

/* clang-format off */
static const struct figure_row figures[] = {
    /* the same in every state */
    {"T constant", "GAS.SOLVE(\"N2\";\"T constant; P1 = 1 bar; V1 = 2 m3; P2 = 4 bar\";\"V2, m3\")", 0, 0, 0.5, 1e-12, 0},
    {"constant T", "GAS.SOLVE(\"N2\";\"constant T; P1 = 1 bar; V1 = 2 m3; P2 = 4 bar\";\"V2, m3\")", 0, 0, 0.5, 1e-12, 0},
    {"constant temperature", "GAS.SOLVE(\"N2\";\"Constant temperature; P1 = 1 bar; V1 = 2 m3; P2 = 4 bar\";\"V2, m3\")", 0, 0, 0.5, 1e-12, 0},
    {"T: const.", "GAS.SOLVE(\"N2\";\"T: const.; P1 = 1 bar; V1 = 2 m3; P2 = 4 bar\";\"V2, m3\")", 0, 0, 0.5, 1e-12, 0},
    {"isothermal", "GAS.SOLVE(\"N2\";\"Isothermal; P1 = 1 bar; V1 = 2 m3; P2 = 4 bar\";\"V2, m3\")", 0, 0, 0.5, 1e-12, 0},
    {"isobaric", "GAS.SOLVE(\"N2\";\"isobaric; T1 = 300 K; V1 = 2 m3; T2 = 450 K\";\"V2, m3\")", 0, 0, 3, 1e-12, 0},
    {"rigid", "GAS.SOLVE(\"N2\";\"rigid; P1 = 1 bar; T1 = 300 K; T2 = 450 K\";\"P2, bar\")", 0, 0, 1.5, 1e-12, 0},
    {"isochoric", "GAS.SOLVE(\"N2\";\"isochoric; P1 = 1 bar; T1 = 300 K; T2 = 450 K\";\"P2, bar\")", 0, 0, 1.5, 1e-12, 0},
    {"isentropic", "GAS.SOLVE(\"air | k = 1.4\";\"isentropic; P1 = 1 bar; T1 = 300 K; P2 = 32 bar\";\"T2, K\")", 0, 0, 807.540115579, 1e-9, 0}, /* 300 x 32^(2/7), bc */
    {"constant in a block", "GAS.SOLVE(\"N2\";{\"V\";\"constant\"|\"P1, bar\";1|\"T1, K\";300|\"T2, K\";450};\"P2, bar\")", 0, 0, 1.5, 1e-12, 0},
    {"constant in a block of three", "GAS.SOLVE(\"N2\";{\"V\";\"constant\";\"m3\"|\"P1\";1;\"bar\"|\"T1\";300;\"K\"|\"T2\";450;\"K\"};\"P2, bar\")", 0, 0, 1.5, 1e-12, 0},
    {"constant in a flow", "GAS.SOLVE(\"N2\";\"T constant; V1 = 100 m3/h; P1 = 20 bar; P2 = 1 bar\";\"V2, m3/h\")", 0, 0, 2000, 1e-12, 0},
    {"constant, its figure in one state", "GAS.SOLVE(\"N2\";\"T constant; T2 = 25 °C; P1 = 1 bar; P2 = 4 bar\";\"rho1, kg/m3\")", 0, 0, RHO(1e5, 25), 1e-12, 0},
    {"constant, its figure in every state", "GAS.SOLVE(\"N2\";\"T constant; T = 25 °C; P1 = 1 bar; P2 = 4 bar\";\"rho2, kg/m3\")", 0, 0, RHO(4e5, 25), 1e-12, 0},
    {"constant of three states", "GAS.SOLVE(\"N2\";\"rigid; P1 = 1 bar; T1 = 300 K; T2 = 450 K; P3 = 4 bar\";\"T3, K\")", 0, 0, 1200, 1e-12, 0},
    /* amounts of each state */
    {"asked by number", "GAS.SOLVE(\"N2\";\"V = 2 m3; T = 290 K; P1 = 3 bar; P2 = 2 bar\";\"m1, kg; m2, kg\")", 0, 1, 2e5 * 2 / (R * 290) * N2, 1e-12, 0},
    {"asked by number, one amount", "GAS.SOLVE(\"N2\";\"V1 = 2 m3; T = 290 K; P1 = 3 bar; P2 = 2 bar\";\"V2, m3; n2, mol\")", 0, 1, 3e5 * 2 / (R * 290), 1e-12, 0},
    {"open", "GAS.SOLVE(\"N2\";\"V = 2 m3; T = 290 K; P1 = 3 bar; P2 = 2 bar\";\"rho2, kg/m3\";;\"open\")", 0, 0, 2e5 / (R * 290) * N2, 1e-12, 0},
    {"open, then closed", "GAS.SOLVE(\"N2\";\"V1 = 2 m3; T = 290 K; P1 = 3 bar; P2 = 2 bar\";\"V2, m3\";;\"open; closed\")", 0, 0, 3, 1e-12, 0},
    {"open, in a table", "GAS.SOLVE(\"N2\";{2;300;3;2|2;300;3;1};\"m2, kg\";{\"V, m3\";\"T, K\";\"P1, bar\";\"P2, bar\"})", 1, 0, 1e5 * 2 / (R * 300) * N2, 1e-12, 0},
    /* barometers */
    {"altitude", "GAS.SOLVE(\"N2\";\"0 bar(g); 35 °C\";\"P, Pa\";;\"altitude 2400 m\")", 0, 0, P_2400M, 1e-6, 0},
    {"altitude in feet", "GAS.SOLVE(\"N2\";\"0 bar(g); 35 °C\";\"P, Pa\";;\"barometer at 8000 ft\")", 0, 0, P_8000FT, 1e-6, 0},
    {"altitude given", "GAS.SOLVE(\"N2\";\"0 bar(g); 35 °C; altitude = 2400 m\";\"P, Pa\")", 0, 0, P_2400M, 1e-6, 0},
    {"barometer at, given", "GAS.SOLVE(\"N2\";\"0 bar(g); 35 °C; barometer at 2400 m\";\"P, Pa\")", 0, 0, P_2400M, 1e-6, 0},
    {"altitude column", "GAS.SOLVE(\"N2\";{1;20;0|1;20;2400};\"P, Pa\";{\"P, bar(g)\";\"T, °C\";\"Altitude, m\"})", 1, 0, 1e5 + P_2400M, 1e-6, 0},
    {"altitude column, at sea", "GAS.SOLVE(\"N2\";{1;20;0|1;20;2400};\"P, Pa\";{\"P, bar(g)\";\"T, °C\";\"Altitude, m\"})", 0, 0, 1e5 + ATM, 1e-12, 0},
    {"altitude column, blank", "GAS.SOLVE(\"N2\";{1;20;\"\"|1;20;2400};\"P, Pa\";{\"P, bar(g)\";\"T, °C\";\"Altitude, m\"})", 0, 0, 1e5 + ATM, 1e-12, 0},
    {"option in cells", "GAS.SOLVE(\"N2\";\"0 bar(g); 35 °C\";\"P, mbar\";;{\"barometer\";980;\"mbar\"})", 0, 0, 980, 1e-12, 0},
    {"option under a heading", "GAS.SOLVE(\"N2\";\"0 bar(g); 35 °C\";\"P, mbar\";;{\"barometer, mbar\";980})", 0, 0, 980, 1e-12, 0},
    {"barometer wanted", "GAS.SOLVE(\"N2\";\"1 bar(g); 35 °C\";\"barometer, mbar\";;\"barometer 0.98 bar\")", 0, 0, 980, 1e-12, 0},
    {"a gauge reading in a cell, the row's barometer", "GAS.SOLVE(\"N2\";{\"90 psig\";20;980};\"P, bar\";{\"P, bar(a)\";\"T, °C\";\"barometer, mbar\"})", 0, 0, (90 * PSI + 98000) / 1e5, 1e-12, 0},
    {"a gauge reading in a block, its barometer", "GAS.SOLVE(\"N2\";{\"P, bar(a)\";\"90 psig\"|\"T\";\"20 °C\"|\"barometer, mbar\";980};\"P, bar\")", 0, 0, (90 * PSI + 98000) / 1e5, 1e-12, 0},
    /* headings */
    {"a row of units", "GAS.SOLVE(\"N2\";{7;35|6;30};\"rho, kg/m3\";{\"P\";\"T\"|\"bar\";\"°C\"})", 1, 0, RHO(6e5, 30), 1e-12, 0},
    {"a row of units, one blank", "GAS.SOLVE(\"N2\";{7;308|6;303};\"rho, kg/m3\";{\"P\";\"T, K\"|\"bar\";\"\"})", 0, 0, RHO(7e5, 34.85), 1e-12, 0},
    {"a column of units", "GAS.SOLVE(\"N2\";{7;6;5|35;30;25};\"rho, kg/m3\";{\"P\";\"bar\"|\"T\";\"°C\"})", 0, 2, RHO(5e5, 25), 1e-12, 0},
    {"a row of units inside", "GAS.SOLVE(\"N2\";{\"P\";\"T\"|\"bar\";\"°C\"|7;35|6;30};\"rho, kg/m3\")", 1, 0, RHO(6e5, 30), 1e-12, 0},
    {"a column of units inside", "GAS.SOLVE(\"N2\";{\"P\";\"bar\";7;6|\"T\";\"°C\";35;30};\"rho, kg/m3\")", 0, 1, RHO(6e5, 30), 1e-12, 0},
    {"a column of units, one case", "GAS.SOLVE(\"N2\";{\"P\";\"bar\";7|\"T\";\"°C\";35};\"rho, kg/m3\")", 0, 0, RHO(7e5, 35), 1e-12, 0},
    {"names of cases", "GAS.SOLVE(\"N2\";{\"case\";\"P, bar\";\"T, °C\"|\"summer\";7;35|\"winter\";6;-5};\"rho, kg/m3\")", 1, 0, RHO(6e5, -5), 1e-12, 0},
    {"names of cases under a blank", "GAS.SOLVE(\"N2\";{\"\";\"P, bar\";\"T, °C\"|\"summer\";7;35|\"winter\";6;-5};\"rho, kg/m3\")", 1, 0, RHO(6e5, -5), 1e-12, 0},
    {"names of cases across", "GAS.SOLVE(\"N2\";{\"\";\"summer\";\"winter\"|\"P, bar\";7;6|\"T, °C\";35;-5};\"rho, kg/m3\")", 0, 1, RHO(6e5, -5), 1e-12, 0},
    {"names and units", "GAS.SOLVE(\"N2\";{\"tag\";\"P\";\"T\"|\"\";\"bar\";\"°C\"|\"V-1\";7;35|\"V-2\";6;-5};\"rho, kg/m3\")", 1, 0, RHO(6e5, -5), 1e-12, 0},
    {"dates and remarks", "GAS.SOLVE(\"N2\";{45000;7;35;\"dry\"|45001;6;-5;\"\"};\"rho, kg/m3\";{\"Date\";\"P, bar\";\"T, °C\";\"Remarks\"})", 1, 0, RHO(6e5, -5), 1e-12, 0},
    {"a line struck out", "GAS.SOLVE(\"N2\";{7;35;12;3};\"rho, kg/m3\";\"P, bar; T, °C; -; -\")", 0, 0, RHO(7e5, 35), 1e-12, 0},
    {"time of the reading", "GAS.SOLVE(\"N2\";{0;7;35|48;6;-5};\"rho, kg/m3\";{\"time, h\";\"P, bar\";\"T, °C\"})", 1, 0, RHO(6e5, -5), 1e-12, 0},
    {"wanted from a range", "GAS.SOLVE(\"N2\";{7;35|6;30};{\"rho, kg/m3\";\"v, m3/kg\";\"rho, mol/L\"};{\"P, bar\";\"T, °C\"})", 1, 2, 6e5 / (R * C(30)) / 1000, 1e-12, 0},
    {"rows that know different things", "GAS.SOLVE(\"N2\";{7;35;\"\";\"\"|\"\";35;\"\";5|7;\"\";\"\";5|\"\";\"\";2;5};\"P, bar; T, °C; v, m3/kg; rho, kg/m3\";{\"P, bar\";\"T, °C\";\"v, m3/kg\";\"rho, kg/m3\"})", 1, 0, 5 / N2 * R * C(35) / 1e5, 1e-12, 0},
    /* plus-minus by hand, JCGM 100:2008: shares of a product add in squares (5.1.6) */
    {"± of a mass", "GAS.SOLVE(\"N2\";{7;35;12;0.05;0.5;0.1};\"±m, kg\";{\"P, bar\";\"T, °C\";\"V, m3\";\"±P, bar\";\"±T, K\";\"±V, m3\"})", 0, 0,
        7e5 * 12 / (R * C(35)) * N2 * 0.01109493755, 1e-5, 0}, /* sqrt((0.05/7)^2 + (0.5/308.15)^2 + (0.1/12)^2), bc */
    {"± in %", "GAS.SOLVE(\"N2\";{7;35;12;1;0.5;1};\"±m, %\";{\"P, bar(g)\";\"T, °C\";\"V, m3\";\"±P, %\";\"±T, K\";\"±V, %\"})", 0, 0,
        1.3376932, 1e-5, 0}, /* 100 sqrt((0.07/8.01325)^2 + (0.5/308.15)^2 + 0.01^2), bc */
    {"± in the text", "GAS.SOLVE(\"N2\";\"P = 7 ± 0.05 bar; T = 35 °C ± 0.5; V = 12 m3 ± 1 %\";\"±m, %\")", 0, 0,
        1.2395693, 1e-5, 0}, /* 100 sqrt((0.05/7)^2 + (0.5/308.15)^2 + 0.01^2), bc */
    {"± in the text, no symbol", "GAS.SOLVE(\"N2\";\"7,5bar±0,05; 35 °C\";\"±rho, %\")", 0, 0, 0.05 / 7.5 * 100, 1e-9, 0},
    {"+/-", "GAS.SOLVE(\"N2\";\"P = 7 +/- 0.05 bar; T = 35 °C\";\"±rho, %\")", 0, 0, 0.05 / 7 * 100, 1e-9, 0},
    {"± of a normal volume", "GAS.SOLVE(\"N2\";\"V = 3 Nm3 ± 2 %\";\"±m, %\")", 0, 0, 2, 1e-9, 0},
    {"± once for both readings", "GAS.SOLVE(\"N2\";\"P1 = 7 bar; P2 = 3 bar; ±P = 0.1 bar; T = 300 K\";\"±rho2, kg/m3\")", 0, 0, 1e4 * N2 / (R * 300), 1e-9, 0},
    {"± of a rigid vessel", "GAS.SOLVE(\"N2\";\"rigid; P1 = 4 ± 0.04 bar; T1 = 300 K ± 3; T2 = 450 K ± 9\";\"±P2, bar\")", 0, 0,
        6 * 0.02449489743, 1e-3, 0}, /* sqrt(0.01^2 + 0.01^2 + 0.02^2) */
    {"± of the barometer", "GAS.SOLVE(\"N2\";{7;35;12;0.05;980;2};\"±m, %\";{\"P, bar(g)\";\"T, °C\";\"V, m3\";\"±P, bar\";\"barometer, mbar\";\"±barometer, mbar\"})", 0, 0,
        0.6270675, 1e-5, 0}, /* 100 sqrt(0.05^2 + 0.002^2)/7.98, bc */
    {"± of the barometer, absolute readings", "GAS.SOLVE(\"N2\";\"P = 7 bar ± 1 %; T = 35 °C; barometer = 980 mbar; ±barometer = 2 mbar\";\"±rho, %\")", 0, 0, 1, 1e-9, 0},
    /* P2 = r (P1 + b) - b with r = 278.15/308.15: dP2/db = r absolute, r - 1 gauge */
    {"± of the barometer in two readings", "GAS.SOLVE(\"N2\";\"rigid; P1 = 7 bar(g); T1 = 35 °C; T2 = 5 °C; ±barometer = 2 mbar\";\"±P2, mbar(g)\")", 0, 0, 2 * (1 - 278.15 / 308.15), 1e-9, 0},
    {"± of the barometer, absolute", "GAS.SOLVE(\"N2\";\"rigid; P1 = 7 bar(g); T1 = 35 °C; T2 = 5 °C; ±barometer = 2 mbar\";\"±P2, mbar\")", 0, 0, 2 * 278.15 / 308.15, 1e-9, 0},
    {"± of the barometer, vacuum", "GAS.SOLVE(\"N2\";\"P = 300 mbar vac; T = 300 K; V = 1 m3; ±barometer = 2 mbar\";\"±n, mol\")", 0, 0, 200 / (R * 300), 1e-9, 0},
    {"card with a ±", "GAS.SOLVE(\"N2\";\"P = 7 ± 0.07 bar; T = 35 °C; V = 12 m3\")", 5, 3, 7e5 * 12 / (R * C(35)) * N2 * 0.01, 1e-9, 0},
};

static const struct sentence_row sentences[] = {
    {"one state is no constant", "GAS.SOLVE(\"N2\";\"T1 constant; P1 = 1 bar\";\"rho1, kg/m3\")", 0, 0,
     "Check given: \"T1 constant\" names one state; what is constant is so in all, write \"T constant\"."},
    {"an equation", "GAS.SOLVE(\"N2\";\"s2 = s1; P1 = 1 bar\";\"rho1, kg/m3\")", 0, 0,
     "Check given: \"s2 = s1\" is an equation; where it is the same in every state write \"s constant\"."},
    {"constant, given twice", "GAS.SOLVE(\"N2\";\"T constant; T1 = 25 °C; T2 = 26 °C; P1 = 1 bar\";\"rho1, kg/m3\")", 0, 0,
     "Check given: T is said to be constant, but given for more than one state; leave the others out."},
    {"constant said twice", "GAS.SOLVE(\"N2\";\"T constant; isothermal; P1 = 1 bar\";\"rho1, kg/m3\")", 0, 0, "...T is given twice"},
    {"a constant alone", "GAS.SOLVE(\"N2\";\"T constant; P1 = 1 bar; P2 = 4 bar\";\"V2, m3\")", 0, 0,
     "Check given: V2 cannot be found from a constant T, P1 and P2; give V1 or a leg."},
    {"what cannot be constant", "GAS.SOLVE(\"N2\";\"cp constant; P1 = 1 bar\";\"rho1, kg/m3\")", 0, 0, "...\"cp constant\" is not a quantity of a state"},
    {"nothing constant", "GAS.SOLVE(\"N2\";\"xyz constant; P1 = 1 bar\";\"rho1, kg/m3\")", 0, 0, "...\"xyz\" names no known quantity"},
    {"a constant in a table", "GAS.SOLVE(\"N2\";{1;\"constant\"};\"rho, kg/m3\";{\"P, bar\";\"T, °C\"})", 0, 0, "...\"constant\" is not a number"},
    {"gas left the vessel", "GAS.SOLVE(\"N2\";\"V = 2 m3; T = 290 K; P1 = 3 bar; P2 = 2 bar\";\"m, kg\")", 0, 0,
     "...or add the option \"open\" where gas came in or went out between them."},
    {"no hint where the amount is given", "GAS.SOLVE(\"N2\";\"V = 2 m3; T1 = 290 K; P1 = 3 bar; m = 5 kg\";\"rho, kg/m3\")", 0, 0, "...correct one or leave one out."},
    {"one amount, open", "GAS.SOLVE(\"N2\";\"V = 2 m3; T = 290 K; P1 = 3 bar; P2 = 2 bar\";\"m, kg\";;\"open\")", 0, 0,
     "Check wanted: m is not the same in every state; write m1 or m2."},
    {"a total change, open", "GAS.SOLVE(\"N2\";\"V = 2 m3; T = 290 K; P1 = 3 bar; P2 = 2 bar\";\"dH, kJ\";;\"open\")", 0, 0, "...dH is for one amount of gas"},
    {"high up", "GAS.SOLVE(\"N2\";{1;20;60};\"P, bar\";{\"P, bar(g)\";\"T, °C\";\"altitude, km\"})", 0, 0,
     "Check altitude: 60 km is outside the standard atmosphere (-500 to 20000 m); give the barometer itself."},
    {"a barometer twice", "GAS.SOLVE(\"N2\";{1;20;600;980};\"P, bar\";{\"P, bar(g)\";\"T, °C\";\"altitude, m\";\"barometer, mbar\"})", 0, 0,
     "Check given: the barometer is given twice, itself and by the altitude; leave one out."},
    {"a barometer in gauge", "GAS.SOLVE(\"N2\";\"0 bar(g); 35 °C\";\"P, mbar\";;\"barometer 0 bar(g)\")", 0, 0, "...is no air pressure"},
    {"a figure without a heading", "GAS.SOLVE(\"N2\";{3;7;35};\"rho, kg/m3\";{\"\";\"P, bar\";\"T, °C\"})", 0, 0, "...a heading is blank"},
    {"a heading that is misspelt", "GAS.SOLVE(\"N2\";{980;7;35};\"rho, kg/m3\";{\"baromter, mbar\";\"P, bar(g)\";\"T, °C\"})", 0, 0, "...\"baromter, mbar\""},
    {"two lines, no units", "GAS.SOLVE(\"N2\";{7;35|6;30};\"rho, kg/m3\";{\"P\";\"T\"|\"first\";\"second\"})", 0, 0, "...or a second one with the units."},
    {"a contradictory unit below", "GAS.SOLVE(\"N2\";{7;35|6;30};\"rho, kg/m3\";{\"P\";\"T\"|\"kg\";\"°C\"})", 0, 0, "...\"P, kg\" names a quantity and a unit that do not belong together"},
    {"too few, with one passed over", "GAS.SOLVE(\"N2\";{7;35;2|6;30;2};\"rho, kg/m3\";{\"case\";\"P, bar\"})", 0, 0,
     "Check headings: there are 2 headings for 3 columns of figures; give one for each column."},
    {"the sentence in every answer", "GAS.SOLVE(\"N2\";{7;35;12|7;\"\";12};{\"m, kg\";\"n, mol\";\"rho, kg/m3\"};{\"P, bar\";\"T, °C\";\"V, m3\"})", 1, 2,
     "Check given: m cannot be found from P and V; give T."},
    {"time in a text", "GAS.SOLVE(\"N2\";\"time = 185 s; V = 0.75 m3; P = 105 kPa; T = 21 °C\";\"kg\")", 0, 0, "...is not a quantity of a state"},
    {"a flow from a total and a time", "GAS.SOLVE(\"N2\";\"V = 0.75 m3; P = 105 kPa; T = 21 °C\";\"kg/s\")", 0, 0, "...no flow is given"},
    {"an amount flow and an amount", "GAS.SOLVE(\"N2\";\"n = 3 mol; n1 = 4 kmol/h; T = 300 K\";\"P, bar\")", 0, 0, "...is an amount flow but"},
    {"% of a temperature", "GAS.SOLVE(\"N2\";\"P = 7 bar; T = 35 °C ± 1 %\";\"±rho, %\")", 0, 0,
     "Check given: \"±T, %\" has no sense in %, its zero is arbitrary; write it with a unit, such as \"±T, K\"."},
    {"% of an enthalpy", "GAS.SOLVE(\"N2\";\"P = 7 ± 0.1 bar; T = 35 °C\";\"±h, %\")", 0, 0, "...such as \"±h, kJ/kg\"."},
    {"± without a figure", "GAS.SOLVE(\"N2\";\"7 ± bar; 35 °C\";\"±rho, kg/m3\")", 0, 0, "...a plus-minus sign needs a figure behind it"},
    {"± of another kind", "GAS.SOLVE(\"N2\";\"P = 7 bar ± 1 kg; 35 °C\";\"±rho, kg/m3\")", 0, 0, "...\"±P = 1 kg\" names a quantity and a unit that do not belong together"},
    {"± in two units", "GAS.SOLVE(\"N2\";{7;0.1;1};\"±rho, %\";{\"P, bar\";\"±P, bar\";\"±P, %\"})", 0, 0, "...P is given twice"},
    {"± below zero", "GAS.SOLVE(\"N2\";{7;300;-0.1};\"±rho, %\";{\"P, bar\";\"T, K\";\"±P, bar\"})", 0, 0, "...not below zero"},
    {"± of nothing", "GAS.SOLVE(\"N2\";{7;300;0.1};\"±rho, %\";{\"P, bar\";\"T, K\";\"±V, m3\"})", 0, 0, "...is the plus-minus of a figure that is not given"},
    {"± of an altitude", "GAS.SOLVE(\"N2\";{7;300;100;5};\"±rho, %\";{\"P, bar(g)\";\"T, K\";\"altitude, m\";\"±altitude, m\"})", 0, 0, "...is not used"},
};
/* clang-format on */

static void figures_by_arithmetic(void)
{
    check_figures(figures, COUNT(figures));
}

static void sentences_say_what_to_do(void)
{
    check_sentences(sentences, COUNT(sentences));
}

const struct test_suite suite_state_forms = {
    "state_forms",
    (const struct test_case[]){{"figures", figures_by_arithmetic}, {"sentences", sentences_say_what_to_do}, {0}}};
