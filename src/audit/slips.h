/*
 * slips.h - the slips that are known, and where each can have happened.
 *
 * THE table is in slips.c. A slip is either another reading of a figure (a unit, a basis, a barometer), applied at a
 * site, or another model (a constant, a heat capacity, a formula), applied to the whole sum. Likelihoods are judgement
 * from practice (common practice), on a scale where taking gauge for absolute is 1; they rank slips that fit equally.
 */
#ifndef AUDIT_SLIPS_H
#define AUDIT_SLIPS_H

#include "audit/replay.h"

/* Slips of one kind are not combined with each other. */
enum slip_kind {
    SLIP_BASIS,
    SLIP_BAROMETER,
    SLIP_TEMPERATURE,
    SLIP_DIFFERENCE,
    SLIP_R,
    SLIP_MOLAR_MASS,
    SLIP_MOLE,
    SLIP_REFERENCE,
    SLIP_CP,
    SLIP_CALORIE,
    SLIP_SIGN,
    SLIP_FORMULA,
    SLIP_EFFICIENCY,
    SLIP_EXPONENT,
    SLIP_UNIT,
    SLIP_FACTOR
};

enum slip_spread {
    SPREAD_MODEL,      /* the whole sum */
    SPREAD_SITES,      /* one site, or every given, or everywhere */
    SPREAD_EVERYWHERE, /* a constant that stands once in a sheet: all sites it serves */
    SPREAD_GIVENS,     /* one given figure */
    SPREAD_WANTED      /* the answer alone */
};

struct slip {
    const char *id;
    enum slip_kind kind;
    enum slip_spread spread;
    bool rounding; /* a rounded or older constant: not an error */
    double likelihood;
    const char *words;  /* of a model; of every figure read so */
    const char *given;  /* after a given figure: "7 bar(g)" + "taken as absolute" */
    const char *wanted; /* of the answer */
    /* read - change the reading of a site; false where it does not apply */
    bool (*read)(struct replay *replay, const struct site *site, struct reading *reading, double parameter);
    /* model - change the sum; false where it does not apply */
    bool (*model)(struct replay *replay, double parameter);
    double parameter;
};

const struct slip *slip_table(size_t *count);

/* A slip at its place. site: index; EVERY_GIVEN, EVERYWHERE; NOWHERE for a model. */
enum { EVERY_GIVEN = -1, EVERYWHERE = -2, NOWHERE = -3 };
struct instance {
    const struct slip *slip;
    int site;
    double likelihood;
};

enum { INSTANCES = 600 };

/* slips_for - the slips that can be made in a job, at each of their places; returns how many (at most INSTANCES). */
size_t slips_for(const struct desk *desk, struct replay *replay, const struct desk_case *truth,
                 struct instance *instance);

/* slip_apply - into the replay; false where it does not apply to this case. */
bool slip_apply(struct replay *replay, const struct instance *instance);

/* slip_words - what was done: "7 bar(g) taken as absolute"; in a table the heading stands for the figure. */
void slip_words(const struct desk *desk, const struct desk_case *truth, const struct instance *instance, bool table,
                char *buffer, size_t size);

#endif
