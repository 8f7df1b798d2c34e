/*
 * The adapter of UDUNITS-2: algebra, dimension and scale of a product of trade units.
 *
 * The system of units is built from our own table through the C API, so nothing is read from disk and no name is known
 * that the table does not list. UDUNITS-2 keeps a static scanner and a last status: every call is made under one lock,
 * held for a few microseconds and only for a text that is not in the cache. All texts handed to its parser are written
 * here, with whole numbers alone, because it reads decimals by the locale.
 */
#include <math.h>
#include <pthread.h>
#include <stdio.h>
#include <string.h>

#include <udunits2.h>

#include <gasleaf/gas.h>

#include "units.h"

enum { ENGINE_TEXT = 512, BASE_UNITS = 5 };

static const char *const base_symbols[BASE_UNITS] = {"kg", "m", "s", "K", "mol"};

static struct {
    pthread_mutex_t lock;
    ut_system *system; /* NULL until first used, and when memory ran out */
    ut_unit *dimension[GAS_DIMENSIONS];
} engine = {.lock = PTHREAD_MUTEX_INITIALIZER};

static void base_text(const signed char power[BASE_UNITS], char *text, size_t size)
{
    int used = snprintf(text, size, "1");
    for (int i = 0; i < BASE_UNITS; i++)
        if (power[i] != 0)
            used += snprintf(text + used, size - (size_t)used, " %s^%d", base_symbols[i], power[i]);
}

static ut_unit *known(const char *symbol)
{
    return ut_get_unit_by_symbol(engine.system, symbol);
}

static bool define(const char *symbol, ut_unit *unit)
{
    bool good = unit && ut_map_symbol_to_unit(symbol, UT_ASCII, unit) == UT_SUCCESS;
    ut_free(unit);
    return good;
}

static bool define_row(const struct trade_unit *row)
{
    char text[ENGINE_TEXT];
    ut_unit *there = row->symbol[0] ? known(row->symbol) : NULL;
    if (there || !row->symbol[0]) {
        ut_free(there);
        return true;
    }
    base_text(row->power, text, sizeof text);
    ut_unit *base = ut_parse(engine.system, text, UT_ASCII);
    ut_unit *unit = base ? ut_scale(row->factor, base) : NULL;
    ut_free(base);
    return define(row->symbol, unit);
}

static bool define_all(void)
{
    for (int i = 0; i < BASE_UNITS; i++)
        if (!define(base_symbols[i], ut_new_base_unit(engine.system)))
            return false;
    for (size_t i = 0; i < gas_unit_prefix_count; i++)
        if (ut_add_symbol_prefix(engine.system, gas_unit_prefixes[i].symbol, gas_unit_prefixes[i].factor) != UT_SUCCESS)
            return false;
    for (size_t i = 0; i < gas_trade_unit_count; i++)
        if (!define_row(&gas_trade_units[i]))
            return false;
    for (enum gas_dimension i = 0; i < GAS_DIM_OTHER; i++)
        if (!(engine.dimension[i] = ut_parse(engine.system, gas_dimension_si(i), UT_ASCII)))
            return false;
    return true;
}

static bool start_engine(void)
{
    if (engine.system)
        return true;
    ut_set_error_message_handler(ut_ignore);
    engine.system = ut_new_system();
    if (!engine.system)
        return false;
    if (define_all())
        return true;
    for (int i = 0; i < GAS_DIMENSIONS; i++) {
        ut_free(engine.dimension[i]);
        engine.dimension[i] = NULL;
    }
    ut_free_system(engine.system);
    engine.system = NULL;
    return false;
}

/* Division and not ut_are_convertible, which also takes a unit for its own reciprocal (kg/m3 and m3/kg). */
static enum gas_dimension dimension_of(const ut_unit *unit)
{
    for (enum gas_dimension i = 0; i < GAS_DIM_OTHER; i++) {
        ut_unit *quotient = ut_divide(unit, engine.dimension[i]);
        bool same = quotient && ut_is_dimensionless(quotient);
        ut_free(quotient);
        if (same)
            return i;
    }
    return GAS_DIM_OTHER;
}

static double scale_to(ut_unit *unit, ut_unit *target)
{
    cv_converter *converter = ut_get_converter(unit, target);
    double scale = converter ? cv_convert_double(converter, 1.0) : NAN;
    cv_free(converter);
    return scale;
}

static bool is_reference(enum unit_kind kind)
{
    return kind == UNIT_NORMAL || kind == UNIT_STANDARD || kind == UNIT_SCF;
}

/* mol/m3 of the ideal gas at the reference conditions. */
static double reference_density(enum unit_kind kind, const struct gas_references *references, struct gas_unit *unit)
{
    const struct gas_references *r = references;
    unit->reference_T = kind == UNIT_NORMAL ? r->normal_T : kind == UNIT_STANDARD ? r->standard_T : r->scf_T;
    unit->reference_P = kind == UNIT_NORMAL ? r->normal_P : kind == UNIT_STANDARD ? r->standard_P : r->scf_P;
    return unit->reference_P / (GAS_R * unit->reference_T);
}

/* The product in the engine's words; powers of the base units and what the engine does not know on the side. */
static bool write_product(const struct unit_product *product, const struct gas_references *references,
                          char text[ENGINE_TEXT], struct gas_unit *unit)
{
    int powers[BASE_UNITS] = {0}, used = snprintf(text, ENGINE_TEXT, "1");
    unit->scale = product->number;
    for (int i = 0; i < product->count && used < ENGINE_TEXT - 80; i++) {
        const struct unit_factor *factor = &product->factor[i];
        const struct unit_prefix *prefix = factor->name.prefix;
        used += snprintf(text + used, ENGINE_TEXT - (size_t)used, " %s%s^%d", prefix ? prefix->symbol : "",
                         factor->name.unit->symbol, factor->power);
        for (int k = 0; k < BASE_UNITS; k++)
            powers[k] += factor->power * factor->name.unit->power[k];
        if (!is_reference(factor->kind))
            continue;
        int volumes = factor->power * factor->name.unit->power[1] / 3;
        used += snprintf(text + used, ENGINE_TEXT - (size_t)used, " mol^%d m^%d", volumes, -3 * volumes);
        unit->scale *= pow(reference_density(factor->kind, references, unit), volumes);
        unit->reference_volume = true;
        powers[4] += volumes;
        powers[1] -= 3 * volumes;
    }
    for (int k = 0; k < BASE_UNITS; k++)
        unit->power[k] = (signed char)powers[k];
    return powers[0] == unit->power[0] && powers[1] == unit->power[1] && powers[2] == unit->power[2] &&
           powers[3] == unit->power[3] && powers[4] == unit->power[4];
}

static bool ask_engine(const char *text, struct gas_unit *unit)
{
    char base[ENGINE_TEXT];
    base_text(unit->power, base, sizeof base);
    pthread_mutex_lock(&engine.lock);
    bool started = start_engine();
    ut_unit *whole = started ? ut_parse(engine.system, text, UT_ASCII) : NULL;
    ut_unit *target = started ? ut_parse(engine.system, base, UT_ASCII) : NULL;
    bool good = whole && target;
    if (good) {
        unit->dimension = dimension_of(target);
        unit->scale *= scale_to(whole, target);
    }
    ut_free(whole);
    ut_free(target);
    pthread_mutex_unlock(&engine.lock);
    return good && isfinite(unit->scale) && unit->scale > 0.0;
}

/* A temperature alone is a level; with anything beside it, a difference. */
static double level_offset(const struct unit_product *product)
{
    const struct unit_factor *only = &product->factor[0];
    bool level = product->count == 1 && only->power == 1 && product->number == 1.0;
    return level ? only->name.unit->offset : 0.0;
}

bool gas_engine_resolve(const struct unit_product *product, const struct gas_references *references,
                        struct gas_unit *unit, struct gas_unit_fault *fault)
{
    char text[ENGINE_TEXT];
    *unit = (struct gas_unit){.dimension = GAS_DIM_OTHER};
    if (!write_product(product, references, text, unit) || !ask_engine(text, unit))
        return gas_unit_refuse(fault, GAS_UNIT_SYNTAX, "", 0, "this product of units has no sensible size");
    unit->offset = level_offset(product);
    if (unit->dimension != GAS_DIM_AMOUNT && unit->dimension != GAS_DIM_AMOUNT_FLOW) {
        unit->reference_volume = false;
        unit->reference_T = unit->reference_P = 0.0;
    }
    return true;
}
