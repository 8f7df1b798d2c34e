/* Cells for the parameters of worksheet functions: texts that are right, texts with one mistake, rubbish. */
#include <math.h>
#include <string.h>

#include "fuzz.h"

enum { LONG_TEXT = 10000, MUTATED_MOST = 600 };

/* clang-format off */
static const char *const gases[] = {
    "N2", "air", "nitrogen", "7727-37-9", "steam", "CO2", "He", "CH4", "N2 79 + O2 21", "CH4 0.92 + C2H6 0.08", "CO2 40 + N2 60 wt%",
    "N2 | cp = 1.04 kJ/kg-K", "air | k = 1.4", "CO2 | cp at 25 °C", "CO2 | cp mean", "CO2 | cp at mean T",
    "N2 | cp = 28.58 + 3.77e-3 T - 0.50e5/T^2 J/mol-K, 298 to 2000 K", "N2 79 + O2 21 | k = 1.4", "nitrogn", "e-", "Check gas: it is no gas.", NULL};
static const char *const givens[] = {
    "7 bar(g); 35 °C; 12 m3", "2 kg; 25 °C; 1 bar", "300 K; 1 bar", "P1 = 1 bar; T1 = 300 K; P2 = 8 bar", "T = 25 °C; V = 2 m3; P1 = 1 bar; P2 = 2 bar(g)",
    "1 bar; 300 K; 1000 Nm3/h", "P1 = 1 bar; T1 = 20 °C; P2 = 9 bar; 500 kg/h", "V = 50 L; P1 = 0; T1 = 20 °C; P2 = 200 bar(g); T line = 20 °C; P line = 250 bar",
    "V = 2 m3; P1 = 10 bar; T1 = 300 K; P2 = 1 bar", "h = 20 kJ/kg; 3 bar", "P = 1 bar; rho = 1.2 kg/m3", "T1 = -300 °C; 1 bar; 2 kg", "P1 = -2 bar(g); 20 °C; 1 m3", "1 m3; 5 bar; T2 = 25", NULL};
static const char *const legs[] = {
    "isothermal to 8 bar", "adiabatic 78 % to 3 bar", "polytropic n=1.3 to V x 0.125", "isobaric with Q = 50 kJ", "against 1 bar to 0.5 m3", "straight to 3 bar and 0.5 m3",
    "isochoric to 600 K; isobaric to start", "free expansion to 2 m3", "polytropic n to P2", "adiabatic to V x 0.125; isochoric to 1800 K; adiabatic to V x 8; isochoric to start",
    "polytropic 82 % to P x 3", "isothermal against 1 bar to 0.5 m3", "adiabatic with W = -20 kJ", "fill", "vent", NULL};
static const char *const stages[] = {
    "3 stages; isentropic 78 %; cool to 40 °C; drop 0.2 bar; drive 95 %", "ratio at most 3.5; polytropic 80 %", "2 stages", "polytropic 80 %; 4 stages; cool to T1", NULL};
static const char *const wanted[] = {
    "kg", "m, kg", "P2, bar(g); V2, m3", "kJ", "kJ/kg-K", "J/mol", "°C", "T, °C; P, bar", "W by gas, kJ", "efficiency, %", "m added, kg", "T2, °F", "s, kJ/kg-K; h, kJ/kg",
    "W net; Q in; efficiency; mep, bar", "COP heating", "Nm3", "z", "gamma", "kW", "P settled, bar", NULL};
static const char *const headings[] = {
    "P1, bar(g)", "T1, °C", "V, m3", "m, kg", "n", "T/K", "Volume m3", "Mass flow, kg/h", "Inlet pressure (psig)", "P2 [bar]", "rho, kg/m3", "P, bar; T, °C; V, m3", "v, m3/kg", "P line, bar", "label", "gas", "P", "T", NULL};
static const char *const options[] = {
    "flow", "closed", "work by gas", "barometer 0.98 bar", "barometer at 2400 m", "datum 0 °C, 1 atm", "agree 0.5 %", "hard errors", "flow; work by gas; normal 0 °C, 1 bar", "barometer 12 bar", "scf 60 °F, 14.73 psi", NULL};
static const char *const units[] = {
    "K", "°C", "°F", "°R", "bar(g)", "psig", "inHg vac", "kPa", "Nm3/h", "SCFM", "kg", "kg/h", "kJ/kg-K", "J/mol/K", "Btu/lb-°F", "Δ°C", "Δ°F", "m3@20°C,101.325kPa", "m3/h", "MMSCFD", "ft3/lb", "standard m3", "P", "psi", "in2", NULL};
static const char *const figures[] = {
    "300", "25 °C", "7,5", "7.5 bar", "1e5 Pa", "-40 °F", "1/2", "0.98 bar", "  12  ", "1 000", "105.14 kg", "1e999", "nan", "inf", "0x10", NULL};
static const char *const words[] = {
    "dh", "du", "ds", "molar mass", "M", "cp unit", "source", "nitro", "fill", "vent", "isothermal", "mol", "wt", "Check P1: -2 bar(g) is below a perfect vacuum.", "pressure too high", NULL};
static const char *const cards[] = {
    "name", "M", "form", "polynomial", "constant", "NASA9", "Shomate", "cp unit", "J/mol-K", "R", "A", "B", "C", "a1", "b2", "from", "to", "T unit", "K", "g/mol", "N2", "O2", "mol %", "10^3 B", NULL};

static const struct pool {
    const char *parameter; /* "" is what any other name gets */
    const char *const *text;
    bool numbers; /* figures are the usual thing */
} pools[] = {
    {"gas", gases, false}, {"given", givens, false}, {"legs", legs, false}, {"stages", stages, false}, {"wanted", wanted, false}, {"headings", headings, false},
    {"heading", headings, false}, {"options", options, false}, {"temperature unit", units, false}, {"pressure unit", units, false}, {"change unit", units, false},
    {"temperature", figures, true}, {"from", figures, true}, {"to", figures, true}, {"value", figures, true}, {"change", figures, true}, {"barometer", figures, true},
    {"pressure", figures, true}, {"pressure from", figures, true}, {"pressure to", figures, true}, {"legacy", figures, true}, {"points", figures, true}, {"unit", units, false},
    {"kind", words, false}, {"item", words, false}, {"search", words, false}, {"streams", headings, true}, {"card", cards, true}, {"", words, true}};
/* clang-format on */

uint64_t fuzz_bits(struct fuzz *fuzz)
{
    uint64_t z = fuzz->state += 0x9E3779B97F4A7C15U; /* splitmix64 */
    z = (z ^ z >> 30) * 0xBF58476D1CE4E5B9U;
    z = (z ^ z >> 27) * 0x94D049BB133111EBU;
    return z ^ z >> 31;
}

size_t fuzz_below(struct fuzz *fuzz, size_t limit)
{
    return limit ? (size_t)(fuzz_bits(fuzz) % limit) : 0;
}

static const struct pool *pool_of(const char *parameter)
{
    const struct pool *pool = pools;
    while (pool->parameter[0] && strcmp(pool->parameter, parameter) != 0)
        pool++;
    return pool;
}

static const char *pick(struct fuzz *fuzz, const char *const *text)
{
    size_t count = 0;
    while (text[count])
        count++;
    return text[fuzz_below(fuzz, count)];
}

static double number(struct fuzz *fuzz)
{
    static const double odd[] = {0,         -0.0,  1,    -1,    1e308,  -1e308, 5e-324, 1e-308,  INFINITY,
                                 -INFINITY, 1e15,  1e5,  1e300, 101325, 12,     2.5,    -273.15, 4,
                                 1e-5,      65536, 1e18, 0.1,   25,     300,    20,     1e9,     2147483648.0};
    double unit = (double)(fuzz_bits(fuzz) >> 11) / 9007199254740992.0;
    switch (fuzz_below(fuzz, 6)) {
    case 0:
        return odd[fuzz_below(fuzz, sizeof odd / sizeof *odd)];
    case 1:
        return pow(10, 40 * unit - 20);
    case 2:
        return fuzz_below(fuzz, 8) ? -100 * unit : (double)NAN;
    case 3:
        return (double)fuzz_below(fuzz, 12);
    default:
        return 200 + 600 * unit;
    }
}

/* What one slip of the keyboard or of a file puts into a text. */
static const char *const pieces[] = {"(",
                                     ")",
                                     ";",
                                     ",",
                                     "|",
                                     "=",
                                     "%",
                                     "%s%n",
                                     "^",
                                     "/",
                                     "*",
                                     "+",
                                     "-",
                                     ".",
                                     "e",
                                     "E9",
                                     "[",
                                     "]",
                                     "\"",
                                     "\\",
                                     "\t",
                                     "\n",
                                     "\x01",
                                     "\x7f",
                                     "°",
                                     "²",
                                     "…",
                                     "Δ",
                                     "\xff",
                                     "\xc3",
                                     "\xe2\x82",
                                     "\xf0\x9f",
                                     "\xc2\x85",
                                     "1e308",
                                     "-1",
                                     "1e-320",
                                     "999999999999999999999",
                                     "0",
                                     " to ",
                                     " at ",
                                     " x ",
                                     "T",
                                     "P1",
                                     "P12",
                                     "bar(g)",
                                     "°C",
                                     " nan",
                                     " inf",
                                     "@",
                                     "\xc2\xa0",
                                     "and",
                                     "\x1b",
                                     "\r",
                                     NULL};

static char *mutate(struct fuzz *fuzz, const char *text, size_t *length)
{
    size_t from = *length, at = fuzz_below(fuzz, from + 1), used = 0;
    const char *piece = pick(fuzz, pieces);
    char *made = gas_arena_take(fuzz->arena, 2 * from + strlen(piece) + 1, 1);
    if (!made)
        return NULL;
    size_t dropped = fuzz_below(fuzz, 3) == 0 && at < from ? 1 : 0;
    bool put = !dropped || fuzz_below(fuzz, 2) == 0;
    memcpy(made, text, at);
    used = at;
    if (put) {
        memcpy(made + used, piece, strlen(piece));
        used += strlen(piece);
    }
    memcpy(made + used, text + at + dropped, from - at - dropped);
    used += from - at - dropped;
    if (fuzz_below(fuzz, 12) == 0 && from < MUTATED_MOST) {
        memcpy(made + used, text, from);
        used += from;
    }
    made[used] = '\0';
    *length = used;
    return made;
}

static char *capitals(struct fuzz *fuzz, const char *text, size_t length)
{
    char *made = gas_arena_copy(fuzz->arena, text, length);
    for (size_t i = 0; made && i < length; i++)
        if (made[i] >= 'a' && made[i] <= 'z')
            made[i] = (char)(made[i] - 'a' + 'A');
    return made;
}

static char *repeat(struct fuzz *fuzz, const char *piece, size_t *length)
{
    size_t one = strlen(piece), times = LONG_TEXT / one;
    char *made = gas_arena_take(fuzz->arena, times * one + 1, 1);
    if (!made)
        return NULL;
    for (size_t i = 0; i < times; i++)
        memcpy(made + i * one, piece, one);
    made[times * one] = '\0';
    *length = times * one;
    return made;
}

static const char *rubbish(struct fuzz *fuzz, size_t *length)
{
    static const char *const repeated[] = {"A",   "(",          ")",     "9",      "N2 + ",  "; ",  "°",    "1e9",
                                           "T^",  "kg/",        "|",     "P1 = 1", "-",      " ",   "\n",   "\xff",
                                           "((1", "P, bar(g);", "cp = ", "m3@",    "2 kg; ", "to ", "x 2 ", "%"};
    static const char *const whole[] = {"",    " ",   "\t\n", "(",   "%s%s%n",           "\xff\xfe",     "=",      "|",
                                        ";;;", "...", "null", "NaN", "The quick fox; 3", "\xe2\x82\xac", "Check ", "-"};
    if (fuzz_below(fuzz, 6) == 0)
        return repeat(fuzz, repeated[fuzz_below(fuzz, sizeof repeated / sizeof *repeated)], length);
    const char *text = whole[fuzz_below(fuzz, sizeof whole / sizeof *whole)];
    *length = strlen(text);
    return text;
}

static struct gas_cell text_cell(struct fuzz *fuzz, const char *const *texts)
{
    const char *text = pick(fuzz, texts);
    size_t length = strlen(text);
    if (strncmp(text, "Check ", 6) == 0) /* passed on as it is */
        return (struct gas_cell){GAS_CELL_TEXT, 0, text, length};
    for (size_t turns = fuzz_below(fuzz, 3) == 0 ? 1 + fuzz_below(fuzz, 3) : 0; turns && text; turns--)
        text = mutate(fuzz, text, &length);
    if (text && fuzz_below(fuzz, 16) == 0)
        text = capitals(fuzz, text, length);
    return text ? (struct gas_cell){GAS_CELL_TEXT, 0, text, length} : (struct gas_cell){0};
}

struct gas_cell fuzz_cell(struct fuzz *fuzz, const char *parameter)
{
    const struct pool *pool = pool_of(parameter);
    size_t luck = fuzz_below(fuzz, 20);
    if (luck == 0) {
        size_t length = 0;
        const char *text = rubbish(fuzz, &length);
        return text ? (struct gas_cell){GAS_CELL_TEXT, 0, text, length} : (struct gas_cell){0};
    }
    if (luck == 1)
        return (struct gas_cell){0};
    if (luck == 2) /* what belongs to another parameter */
        pool = &pools[fuzz_below(fuzz, sizeof pools / sizeof *pools)];
    if (luck == 3 || (pool->numbers && luck < 14))
        return gas_cell_number(number(fuzz));
    return text_cell(fuzz, pool->text);
}
