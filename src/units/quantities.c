/* What headings name. A word or a symbol is added here; tests/units/test_heading.c has a row for every line. */
#include "headings.h"

/* clang-format off */
#define R(dimension, symbol)    {GAS_DIM_##dimension, GAS_SYM_##symbol, false}
#define VOLUME_AS_AMOUNT        {GAS_DIM_AMOUNT, GAS_SYM_N, true}, {GAS_DIM_AMOUNT_FLOW, GAS_SYM_N, true}
#define LIST(...)               (const struct reading[]){__VA_ARGS__, {GAS_DIM_NUMBER, GAS_SYM_NONE, false}}

#define TOTALS(symbol)          R(ENERGY, symbol), R(POWER, symbol)
#define SPECIFICS(symbol)       R(MOLAR_ENERGY, symbol), R(SPECIFIC_ENERGY, symbol)
#define ENERGIES(symbol)        LIST(TOTALS(symbol), SPECIFICS(symbol))
#define HEATS(symbol)           LIST(R(MOLAR_ENTROPY, symbol), R(SPECIFIC_ENTROPY, symbol))
#define ENTROPIES(total, per)   LIST(R(ENTROPY, total), R(ENTROPY_FLOW, total), R(MOLAR_ENTROPY, per), R(SPECIFIC_ENTROPY, per))

#define PRESSURES(symbol)       LIST(R(PRESSURE, symbol))
#define TEMPERATURES(symbol)    LIST(R(TEMPERATURE, symbol))
#define NUMBERS(symbol)         LIST(R(NUMBER, symbol))
#define VOLUMES                 LIST(R(VOLUME, V), R(VOLUME_FLOW, V), VOLUME_AS_AMOUNT, R(MOLAR_VOLUME, V_SPECIFIC), R(SPECIFIC_VOLUME, V_SPECIFIC))
#define MASSES                  LIST(R(MASS, M), R(MASS_FLOW, M), R(MOLAR_MASS, M_MOLAR))
#define AMOUNTS                 LIST(R(AMOUNT, N), R(AMOUNT_FLOW, N))
#define MOVED_                  LIST(R(AMOUNT, MOVED), R(MASS, MOVED))

/* symbols | words | symbol, dimension when bare | readings by unit */
#define Q(symbols, words, symbol, bare, readings) {symbols, words, GAS_SYM_##symbol, GAS_DIM_##bare, readings},

const struct quantity gas_quantities[] = {
    Q("P,p",       "pressure,press,static pressure",                        P, PRESSURE,              PRESSURES(P))
    Q("T",         "temperature,temp",                                      T, TEMPERATURE,           TEMPERATURES(T))
    Q("t",         "",                                                      T, TEMPERATURE,           LIST(R(TEMPERATURE, T), R(TIME, TIME)))
    Q("V",         "volume,vol",                                            V, VOLUME,                VOLUMES)
    Q("v",         "",                                                      V_SPECIFIC, MOLAR_VOLUME, VOLUMES)
    Q("",          "specific volume,molar volume",                          V_SPECIFIC, MOLAR_VOLUME, LIST(R(MOLAR_VOLUME, V_SPECIFIC), R(SPECIFIC_VOLUME, V_SPECIFIC)))
    Q("",          "volume flow,volume flow rate,volumetric flow,volumetric flow rate", V, VOLUME_FLOW, LIST(R(VOLUME_FLOW, V), {GAS_DIM_AMOUNT_FLOW, GAS_SYM_N, true}))
    Q("n",         "",                                                      N, AMOUNT,                LIST(R(AMOUNT, N), R(AMOUNT_FLOW, N), R(NUMBER, EXPONENT)))
    Q("N",         "amount,moles,number of moles,amount of substance",      N, AMOUNT,                AMOUNTS)
    Q("",          "amount flow,mole flow,molar flow,mole flow rate,molar flow rate", N, AMOUNT_FLOW, LIST(R(AMOUNT_FLOW, N)))
    Q("m",         "mass,weight",                                           M, MASS,                  MASSES)
    Q("M",         "",                                                      M_MOLAR, MOLAR_MASS,      MASSES)
    Q("",          "mass flow,mass flow rate,mass rate",                    M, MASS_FLOW,             LIST(R(MASS_FLOW, M)))
    Q("MW,Mw",     "molar mass,molecular weight,molecular mass,mol weight", M_MOLAR, MOLAR_MASS,      LIST(R(MOLAR_MASS, M_MOLAR)))
    Q("",          "flow,flow rate,flowrate,rate",                          M, OTHER,                 LIST(R(MASS_FLOW, M), R(AMOUNT_FLOW, N), R(VOLUME_FLOW, V)))
    Q("ρ,rho",     "density,rho,mass density",                              RHO, DENSITY,             LIST(R(DENSITY, RHO), R(CONCENTRATION, RHO)))
    Q("",          "molar density,concentration",                           RHO, CONCENTRATION,       LIST(R(CONCENTRATION, RHO)))
    Q("h",         "",                                                      H_SPECIFIC, MOLAR_ENERGY, LIST(TOTALS(H_TOTAL), SPECIFICS(H_SPECIFIC)))
    Q("H",         "enthalpy",                                              H_TOTAL, ENERGY,          LIST(TOTALS(H_TOTAL), SPECIFICS(H_SPECIFIC)))
    Q("",          "specific enthalpy,molar enthalpy",                      H_SPECIFIC, MOLAR_ENERGY, LIST(SPECIFICS(H_SPECIFIC)))
    Q("",          "total enthalpy",                                        H_TOTAL, ENERGY,          LIST(TOTALS(H_TOTAL)))
    Q("u",         "",                                                      U_SPECIFIC, MOLAR_ENERGY, LIST(TOTALS(U_TOTAL), SPECIFICS(U_SPECIFIC)))
    Q("U",         "internal energy",                                       U_TOTAL, ENERGY,          LIST(TOTALS(U_TOTAL), SPECIFICS(U_SPECIFIC)))
    Q("",          "specific internal energy,molar internal energy",        U_SPECIFIC, MOLAR_ENERGY, LIST(SPECIFICS(U_SPECIFIC)))
    Q("s",         "",                                                      S_SPECIFIC, MOLAR_ENTROPY, ENTROPIES(S_TOTAL, S_SPECIFIC))
    Q("S",         "entropy",                                               S_TOTAL, ENTROPY,         ENTROPIES(S_TOTAL, S_SPECIFIC))
    Q("",          "specific entropy,molar entropy",                        S_SPECIFIC, MOLAR_ENTROPY, LIST(R(MOLAR_ENTROPY, S_SPECIFIC), R(SPECIFIC_ENTROPY, S_SPECIFIC)))
    Q("W,w",       "work",                                                  W, ENERGY,                ENERGIES(W))
    Q("",          "power",                                                 W, POWER,                 LIST(R(POWER, W)))
    Q("Q,q",       "heat,heat transfer",                                    Q, ENERGY,                ENERGIES(Q))
    Q("",          "heat flow,heat rate,heat flow rate",                    Q, POWER,                 LIST(R(POWER, Q)))
    Q("",          "cp,c p,heat capacity,specific heat,specific heat capacity,heat capacity cp,molar heat capacity,heat capacity at constant pressure", CP, MOLAR_ENTROPY, HEATS(CP))
    Q("",          "cv,c v,heat capacity cv,heat capacity at constant volume", CV, MOLAR_ENTROPY,     HEATS(CV))
    Q("k,γ,κ",     "gamma,kappa,heat capacity ratio,specific heat ratio,ratio of specific heats,ratio of heat capacities,isentropic exponent,adiabatic exponent", GAMMA, NUMBER, NUMBERS(GAMMA))
    Q("",          "exponent,polytropic exponent,polytropic index,exponent n,n exponent,polytropic n", EXPONENT, NUMBER, NUMBERS(EXPONENT))
    Q("η",         "efficiency,eta,isentropic efficiency,adiabatic efficiency,polytropic efficiency,thermal efficiency", EFFICIENCY, NUMBER, NUMBERS(EFFICIENCY))
    Q("",          "ratio,pressure ratio,stage ratio",                      RATIO, NUMBER,            NUMBERS(RATIO))

    Q("",          "p line,line pressure,supply pressure",                  P_LINE, PRESSURE,         PRESSURES(P_LINE))
    Q("",          "t line,line temperature,supply temperature",            T_LINE, TEMPERATURE,      TEMPERATURES(T_LINE))
    Q("",          "t settled,settled temperature,settling temperature",    T_SETTLED, TEMPERATURE,   TEMPERATURES(T_SETTLED))
    Q("",          "p settled,settled pressure,settling pressure",          P_SETTLED, PRESSURE,      PRESSURES(P_SETTLED))
    Q("",          "m added,mass added,added mass,m out,mass out,m vented,mass vented,vented mass,m moved,mass moved", MOVED, MASS, MOVED_)
    Q("",          "added,moved,vented,n added,amount added,moles added,n out,amount out,moles out,n vented,amount vented,n moved,amount moved,v added,volume added,v out,volume out", MOVED, AMOUNT, MOVED_)

    Q("",          "du,d u,delta u,internal energy change,change in internal energy,change of internal energy", DU, ENERGY, ENERGIES(DU))
    Q("",          "dh,d h,delta h,enthalpy change,change in enthalpy,change of enthalpy", DH, ENERGY, ENERGIES(DH))
    Q("",          "ds,d s,delta s,entropy change,change in entropy,change of entropy", DS, ENTROPY,  ENTROPIES(DS, DS))
    Q("",          "s made,entropy made,s gen,entropy generated,entropy generation,entropy produced,entropy production", S_MADE, ENTROPY, ENTROPIES(S_MADE, S_MADE))
    Q("",          "w net,wnet,net work",                                   W_NET, ENERGY,            ENERGIES(W_NET))
    Q("",          "net power",                                             W_NET, POWER,             LIST(R(POWER, W_NET)))
    Q("",          "q in,qin,heat in,heat input,heat supplied,heat added",  Q_IN, ENERGY,             ENERGIES(Q_IN))
    Q("",          "q out,qout,heat out,heat rejected,heat removed",        Q_OUT, ENERGY,            ENERGIES(Q_OUT))
    Q("",          "cop heating,heating cop,cop heat pump",                 COP_HEATING, NUMBER,      NUMBERS(COP_HEATING))
    Q("",          "cop cooling,cooling cop,cop refrigeration",             COP_COOLING, NUMBER,      NUMBERS(COP_COOLING))
    Q("",          "mep,mean effective pressure",                           MEP, PRESSURE,            PRESSURES(MEP))
    Q("",          "shaft power",                                           POWER_SHAFT, POWER,       ENERGIES(POWER_SHAFT))
    Q("",          "input power,power input,motor power,drive power",       POWER_INPUT, POWER,       ENERGIES(POWER_INPUT))
    Q("",          "cooler duty,duty,cooling duty,intercooler duty",        DUTY, POWER,              ENERGIES(DUTY))
    Q("",          "ua,u a,wall conductance,conductance,conductance of the wall", UA, ENTROPY_FLOW,   LIST(R(ENTROPY_FLOW, UA)))
    Q("",          "t wall,wall temperature",                               T_WALL, TEMPERATURE,      TEMPERATURES(T_WALL))
    Q("",          "time,duration",                                         TIME, TIME,               LIST(R(TIME, TIME)))
    Q("",          "area,orifice area,hole area",                           AREA, AREA,               LIST(R(AREA, AREA)))
    Q("",          "cd,c d,coefficient of discharge,discharge coefficient", DISCHARGE, NUMBER,        NUMBERS(DISCHARGE))
    Q("",          "p outside,outside pressure",                            P_OUTSIDE, PRESSURE,      PRESSURES(P_OUTSIDE))
    Q("",          "stages,number of stages,stage count",                   STAGE_COUNT, NUMBER,      NUMBERS(STAGE_COUNT))
    Q("Z,z",       "compressibility factor,compressibility,z factor",       Z, NUMBER,                NUMBERS(Z))
    Q("",          "barometer,barometric pressure,atmospheric pressure,barometer pressure", BAROMETER, PRESSURE, PRESSURES(BAROMETER))
    Q("",          "altitude,elevation,site altitude,site elevation,altitude of site,barometer at", ALTITUDE, LENGTH, LIST(R(LENGTH, ALTITUDE)))
};
/* clang-format on */

const size_t gas_quantity_count = sizeof gas_quantities / sizeof *gas_quantities;

const char *gas_symbol_text(enum gas_symbol symbol)
{
    static const char *const texts[] = {
#define SYMBOL_TEXT(name, symbol_, words, dimension) symbol_,
        GAS_SYMBOL_LIST(SYMBOL_TEXT)
#undef SYMBOL_TEXT
    };
    return symbol < GAS_SYMBOLS ? texts[symbol] : "";
}

const char *gas_symbol_words(enum gas_symbol symbol)
{
    static const char *const sentence[] = {
#define SYMBOL_WORDS(name, symbol_, words, dimension) words,
        GAS_SYMBOL_LIST(SYMBOL_WORDS)
#undef SYMBOL_WORDS
    };
    return symbol < GAS_SYMBOLS ? sentence[symbol] : "";
}

enum gas_dimension gas_symbol_dimension(enum gas_symbol symbol)
{
    static const enum gas_dimension dimensions[] = {
#define SYMBOL_DIMENSION(name, symbol_, words, dimension) GAS_DIM_##dimension,
        GAS_SYMBOL_LIST(SYMBOL_DIMENSION)
#undef SYMBOL_DIMENSION
    };
    return symbol < GAS_SYMBOLS ? dimensions[symbol] : GAS_DIM_OTHER;
}
