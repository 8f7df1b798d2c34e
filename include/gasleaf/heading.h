/*
 * heading.h - headings of calculation sheets: a quantity, a state, a unit. (layer: units)
 */
#ifndef GASLEAF_HEADING_H
#define GASLEAF_HEADING_H

#include <stdbool.h>
#include <stddef.h>

#include <gasleaf/unit.h>

/* What a heading can name. */
/* clang-format off */
/*     name          symbol          words in the sentence     SI dimension when bare */
#define GAS_SYMBOL_LIST(X)                                                                 \
    X(NONE,          "",             "nothing",                NUMBER)                     \
    X(P,             "P",            "pressure",               PRESSURE)                   \
    X(T,             "T",            "temperature",            TEMPERATURE)                \
    X(V,             "V",            "volume",                 VOLUME)                     \
    X(N,             "n",            "amount",                 AMOUNT)                     \
    X(M,             "m",            "mass",                   MASS)                       \
    X(V_SPECIFIC,    "v",            "specific volume",        MOLAR_VOLUME)               \
    X(RHO,           "rho",          "density",                DENSITY)                    \
    X(H_SPECIFIC,    "h",            "specific enthalpy",      MOLAR_ENERGY)               \
    X(U_SPECIFIC,    "u",            "specific internal energy", MOLAR_ENERGY)             \
    X(S_SPECIFIC,    "s",            "specific entropy",       MOLAR_ENTROPY)              \
    X(H_TOTAL,       "H",            "enthalpy",               ENERGY)                     \
    X(U_TOTAL,       "U",            "internal energy",        ENERGY)                     \
    X(S_TOTAL,       "S",            "entropy",                ENTROPY)                    \
    X(W,             "W",            "work",                   ENERGY)                     \
    X(Q,             "Q",            "heat",                   ENERGY)                     \
    X(CP,            "cp",           "heat capacity cp",       MOLAR_ENTROPY)              \
    X(CV,            "cv",           "heat capacity cv",       MOLAR_ENTROPY)              \
    X(GAMMA,         "gamma",        "heat-capacity ratio",    NUMBER)                     \
    X(M_MOLAR,       "M",            "molar mass",             MOLAR_MASS)                 \
    X(EXPONENT,      "exponent",     "polytropic exponent",    NUMBER)                     \
    X(EFFICIENCY,    "efficiency",   "efficiency",             NUMBER)                     \
    X(RATIO,         "ratio",        "ratio",                  NUMBER)                     \
    X(P_LINE,        "P line",       "line pressure",          PRESSURE)                   \
    X(T_LINE,        "T line",       "line temperature",       TEMPERATURE)                \
    X(T_SETTLED,     "T settled",    "settling temperature",   TEMPERATURE)                \
    X(P_SETTLED,     "P settled",    "settled pressure",       PRESSURE)                   \
    X(MOVED,         "added",        "quantity moved",         AMOUNT)                     \
    X(DU,            "dU",           "internal-energy change", ENERGY)                     \
    X(DH,            "dH",           "enthalpy change",        ENERGY)                     \
    X(DS,            "dS",           "entropy change",         ENTROPY)                    \
    X(S_MADE,        "S made",       "entropy made",           ENTROPY)                    \
    X(W_NET,         "W net",        "net work",               ENERGY)                     \
    X(Q_IN,          "Q in",         "heat in",                ENERGY)                     \
    X(Q_OUT,         "Q out",        "heat out",               ENERGY)                     \
    X(COP_HEATING,   "COP heating",  "COP heating",            NUMBER)                     \
    X(COP_COOLING,   "COP cooling",  "COP cooling",            NUMBER)                     \
    X(MEP,           "mep",          "mean effective pressure", PRESSURE)                  \
    X(POWER_SHAFT,   "shaft power",  "shaft power",            POWER)                      \
    X(POWER_INPUT,   "input power",  "input power",            POWER)                      \
    X(DUTY,          "cooler duty",  "cooler duty",            POWER)                      \
    X(UA,            "UA",           "conductance of the wall", ENTROPY_FLOW)              \
    X(T_WALL,        "T wall",       "wall temperature",       TEMPERATURE)                \
    X(TIME,          "time",         "time",                   TIME)                       \
    X(AREA,          "area",         "orifice area",           AREA)                       \
    X(DISCHARGE,     "Cd",           "coefficient of discharge", NUMBER)                   \
    X(P_OUTSIDE,     "P outside",    "outside pressure",       PRESSURE)                   \
    X(STAGE_COUNT,   "stages",       "number of stages",       NUMBER)                     \
    X(Z,             "Z",            "compressibility factor", NUMBER)                     \
    X(BAROMETER,     "barometer",    "barometer",              PRESSURE)                   \
    X(ALTITUDE,      "altitude",     "altitude of the site",   LENGTH)
/* clang-format on */

enum gas_symbol {
#define GAS_SYMBOL_NAME(name, symbol, words, dimension) GAS_SYM_##name,
    GAS_SYMBOL_LIST(GAS_SYMBOL_NAME)
#undef GAS_SYMBOL_NAME
        GAS_SYMBOLS
};
const char *gas_symbol_text(enum gas_symbol symbol);
const char *gas_symbol_words(enum gas_symbol symbol);
enum gas_dimension gas_symbol_dimension(enum gas_symbol symbol);

enum { GAS_HEADING_TEXT = 80 };

struct gas_heading {
    enum gas_symbol symbol; /* told from the unit when no symbol stands there */
    int state;              /* 1 to 9; 0: none written; may be outside 0..9 on GAS_HEADING_STATE */
    struct gas_unit unit;   /* SI of the symbol when none is written */
    bool has_unit;
    bool tolerance;              /* a plus-minus column */
    bool by_gas;                 /* "W by gas": work counted positive out of the gas */
    bool on_gas;                 /* "W on gas" was written */
    char text[GAS_HEADING_TEXT]; /* as written, trimmed, for sentences and output headings */
};

enum gas_heading_status {
    GAS_HEADING_OK,
    GAS_HEADING_EMPTY,
    GAS_HEADING_UNKNOWN,       /* no quantity could be told from it */
    GAS_HEADING_UNIT,          /* the unit is faulty: see fault.unit */
    GAS_HEADING_CONTRADICTION, /* the unit is not one of the quantity: "P1, kg" */
    GAS_HEADING_STATE,         /* state 0 or above 9 */
    GAS_HEADING_TOO_LONG
};

struct gas_heading_fault {
    enum gas_heading_status status;
    struct gas_unit_fault unit;
    char hint[120];
};

/*
 * gas_heading_parse - "P1, bar(g)", "T/K", "Inlet pressure (psig)", "Volume m3", "kg", "m added, kg".
 *
 *   Returned   true and *heading, or false and *fault
 *   Notes      V and v, n and N, m and M are told apart by unit first, by case second. Cached, bounded.
 *              An energy or a power alone ("kJ", "kW") has symbol NONE: it may be work, heat or more; so has "%".
 *              "V, Nm3" is an amount: symbol N. "n [-]" is the exponent, a bare "n" the amount. "m3" and "MW" are
 *              units; "m2" is the mass at state 2. "T in K" names the unit, "T in, K" the inlet. A basis in words
 *              ("Gauge pressure, bar") becomes the basis of the unit, whose text then shows it: "bar(g)".
 *              "±m, %" keeps the symbol of its label; its unit is a plain number.
 *   Check      tests/units/test_heading.c
 */
bool gas_heading_parse(const char *text, size_t length, const struct gas_references *references,
                       struct gas_heading *heading, struct gas_heading_fault *fault);

/*
 * gas_given_parse - one item of a typed text: "P1 = 1 bar", "7 bar(g)", "V = 2 m3", "T1: 25 degC".
 *   Returned   true, *heading and *figure (in heading->unit)
 *   Notes      Also accepts a heading with its unit on the left: "P1, bar = 3". A bare figure with a symbol is SI.
 *              heading->text is that of a column for the figure: "P1, bar" for "P1 = 1 bar", "bar(g)" for "7 bar(g)".
 *   Check      tests/units/test_given.c
 */
bool gas_given_parse(const char *text, size_t length, const struct gas_references *references,
                     struct gas_heading *heading, double *figure, struct gas_heading_fault *fault);

#endif
