/*
 * unit.h - units as engineers write them. (layer: units)
 *
 * UDUNITS-2 does the algebra over a table of trade units of our own (src/units/trade_units.c); nothing is read from
 * disk. This header adds what a unit engine does not know: gauge and vacuum, temperature levels against differences,
 * reference volumes as amounts of substance, and the spellings of calculation sheets.
 */
#ifndef GASLEAF_UNIT_H
#define GASLEAF_UNIT_H

#include <stdbool.h>
#include <stddef.h>

#define GAS_ATMOSPHERE 101325.0 /* Pa, the barometer unless told otherwise */

/* clang-format off */
/*     name                 SI unit        what the sentence calls it */
#define GAS_DIMENSION_LIST(X)                                                  \
    X(NUMBER,               "1",           "a plain number")                   \
    X(PRESSURE,             "Pa",          "a pressure")                       \
    X(TEMPERATURE,          "K",           "a temperature")                    \
    X(VOLUME,               "m3",          "a volume")                         \
    X(AMOUNT,               "mol",         "an amount of substance")           \
    X(MASS,                 "kg",          "a mass")                           \
    X(MOLAR_VOLUME,         "m3/mol",      "a molar volume")                   \
    X(SPECIFIC_VOLUME,      "m3/kg",       "a specific volume")                \
    X(DENSITY,              "kg/m3",       "a density")                        \
    X(CONCENTRATION,        "mol/m3",      "a molar density")                  \
    X(MOLAR_MASS,           "kg/mol",      "a molar mass")                     \
    X(ENERGY,               "J",           "an energy")                        \
    X(MOLAR_ENERGY,         "J/mol",       "an energy per mole")               \
    X(SPECIFIC_ENERGY,      "J/kg",        "an energy per mass")               \
    X(ENTROPY,              "J/K",         "an entropy")                       \
    X(MOLAR_ENTROPY,        "J/(mol K)",   "an entropy or heat capacity per mole") \
    X(SPECIFIC_ENTROPY,     "J/(kg K)",    "an entropy or heat capacity per mass") \
    X(POWER,                "W",           "a power")                          \
    X(ENTROPY_FLOW,         "W/K",         "an entropy flow or conductance")   \
    X(VOLUME_FLOW,          "m3/s",        "a volume flow")                    \
    X(AMOUNT_FLOW,          "mol/s",       "an amount flow")                   \
    X(MASS_FLOW,            "kg/s",        "a mass flow")                      \
    X(TIME,                 "s",           "a time")                           \
    X(LENGTH,               "m",           "a length")                         \
    X(AREA,                 "m2",          "an area")                          \
    X(SPEED,                "m/s",         "a speed")                          \
    X(OTHER,                "",            "another kind of quantity")
/* clang-format on */

enum gas_dimension {
#define GAS_DIMENSION_NAME(name, si, words) GAS_DIM_##name,
    GAS_DIMENSION_LIST(GAS_DIMENSION_NAME)
#undef GAS_DIMENSION_NAME
        GAS_DIMENSIONS
};
const char *gas_dimension_si(enum gas_dimension dimension);
const char *gas_dimension_words(enum gas_dimension dimension);

enum gas_pressure_basis { GAS_ABSOLUTE, GAS_GAUGE, GAS_VACUUM };

enum { GAS_UNIT_TEXT = 48 };

struct gas_unit {
    enum gas_dimension dimension;
    double scale;                    /* SI = scale * (x + offset) for a level, scale * x for a difference */
    double offset;                   /* in this unit; 273.15 for degC, 459.67 for degF, 0 otherwise */
    enum gas_pressure_basis basis;   /* of a pressure */
    bool reference_volume;           /* Nm3, scf, ...: AMOUNT or AMOUNT_FLOW, to be shown as written */
    double reference_T, reference_P; /* K, Pa of a reference volume, else 0 */
    char text[GAS_UNIT_TEXT];        /* as the user wrote it, trimmed */
    signed char power[5];            /* of kg, m, s, K, mol: tells whether two units of GAS_DIM_OTHER agree */
};

/* What `Nm3`, `Sm3` and `scf` mean; options may redefine them. */
struct gas_references {
    double normal_T, normal_P;     /* 273.15 K, 101325 Pa */
    double standard_T, standard_P; /* 288.15 K, 101325 Pa */
    double scf_T, scf_P;           /* 60 degF, 14.696 psi */
};
extern const struct gas_references gas_references_default;

enum gas_unit_status {
    GAS_UNIT_OK,
    GAS_UNIT_EMPTY,     /* no text */
    GAS_UNIT_UNKNOWN,   /* a name that is not in the table: `at`, `length` point at it, nearest may be filled */
    GAS_UNIT_SYNTAX,    /* known names, but not a unit: "kg//h", unbalanced parentheses */
    GAS_UNIT_AMBIGUOUS, /* `hint` says between what: "standard" alone, "KPA" against kPa..., "ton" */
    GAS_UNIT_REFERENCE, /* a spelled-out reference that makes no sense */
    GAS_UNIT_TOO_LONG
};

struct gas_unit_fault {
    enum gas_unit_status status;
    char at[GAS_UNIT_TEXT]; /* the piece that was not understood */
    char hint[120];         /* what to do: nearest units, the choices; may be "" */
};

/*
 * gas_unit_parse - read a unit text such as "bar(g)", "kJ/kg-K", "m3@20 degC,101.325kPa", "SCFM", "" (empty fails).
 *
 *   Given      text, length   UTF-8, need not end in NUL
 *              references     meaning of Nm3, Sm3, scf; NULL: the defaults
 *   Returned   true and *unit, or false and *fault
 *   Notes      Everything after the first slash is below the line; cal is thermochemical, Btu is IT. Thread-safe;
 *              results are cached, bounded. A temperature alone is a level, in a compound a difference. "kg/cm2" and
 *              "lb/in2" are forces on areas. An energy per Nm3 is an energy per mole, kg/Nm3 a molar mass.
 *   Source     factors: NIST Special Publication 811, 2008 edition, Appendix B; see src/units/trade_units.c
 *   Check      tests/units/test_unit.c: every row against GNU units
 */
bool gas_unit_parse(const char *text, size_t length, const struct gas_references *references, struct gas_unit *unit,
                    struct gas_unit_fault *fault);

/* Whether figures in the two units can be converted into one another. */
bool gas_unit_compatible(const struct gas_unit *a, const struct gas_unit *b);

/* The SI unit of a dimension, for bare numbers. */
struct gas_unit gas_unit_si(enum gas_dimension dimension);

/* To SI and back (tests/units/test_unit.c, against GNU units). Gauge and vacuum use the barometer (Pa); a temperature
 * is a level. */
double gas_unit_to_si(const struct gas_unit *unit, double x, double barometer);
double gas_unit_from_si(const struct gas_unit *unit, double si, double barometer);
/* The same for differences (temperature rises, pressure drops, tolerances): scale alone. */
double gas_unit_difference_to_si(const struct gas_unit *unit, double x);
double gas_unit_difference_from_si(const struct gas_unit *unit, double si);

/* The number at the start of a text: "7 bar(g)", "7,5 m3", "-2.5e3kPa", "12". Decimal point or comma, no grouping;
 * independent of the locale. *used is where the unit begins (length when bare), behind any spaces. False when no number
 * stands there, or digits follow it that would make it another number: "1 234", "1,234.5". */
bool gas_number_parse(const char *text, size_t length, double *number, size_t *used);

/* Shortest text that shows a figure to `digits` significant digits, locale-independent, no trailing zeros. */
void gas_number_format(char *buffer, size_t size, double x, int digits);

#endif
