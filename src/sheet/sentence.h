/*
 * sentence.h - readable errors: "Check " + what + ": " + what is wrong, with the user's own figure, + what to do.
 *
 * Sentences are made here and nowhere else. Whoever finds a mistake calls gas_refuse; the first one stays.
 */
#ifndef SHEET_SENTENCE_H
#define SHEET_SENTENCE_H

#include <stdbool.h>
#include <stddef.h>

#include <gasleaf/heading.h>
#include <gasleaf/status.h>

struct gas_refusal {
    bool made;
    char text[480];
};

/*
 * gas_refuse - "Check <what>: <the rest>". Returns false, so that a reader can `return gas_refuse(...)`. A refusal
 * that was already made is kept. The rest is cut at a character boundary when it is too long.
 */
bool gas_refuse(struct gas_refusal *refusal, const char *what, const char *format, ...)
    __attribute__((format(printf, 3, 4)));

/* gas_refuse_sentence - pass an earlier sentence on unchanged. */
bool gas_refuse_sentence(struct gas_refusal *refusal, const char *sentence);

/* A user's text as it may appear inside a sentence: in quotes, shortened, control characters replaced. */
const char *gas_quoted(char *buffer, size_t size, const char *text, size_t length);

/* A bare figure as a user would write it: 100000, 0.05, -2.5e-7; six digits. Use: gas_shown(x).text */
struct gas_shown {
    char text[40];
};
struct gas_shown gas_shown(double figure);
struct gas_shown gas_shown_to(double figure, int digits);

/* A figure with its unit as the user sees it: "-2 bar(g)", "25 K". */
const char *gas_figure(char *buffer, size_t size, double figure, const struct gas_unit *unit);

/* From the faults of the units layer; what: the argument's name. */
bool gas_refuse_unit(struct gas_refusal *refusal, const char *what, const struct gas_unit_fault *fault);
bool gas_refuse_heading(struct gas_refusal *refusal, const char *what, const char *text, size_t length,
                        const struct gas_heading_fault *fault);

/*
 * gas_refuse_temperature - a temperature (K) outside the data of a gas, shown in the user's unit, with the likely slip
 * named ("If 25 degC was meant, give the unit.").
 */
bool gas_refuse_temperature(struct gas_refusal *refusal, const char *what, double T, const struct gas_unit *unit,
                            const char *gas_label, double T_from, double T_to);

/* gas_accept_level - true when a pressure or temperature can be; else refuses: below absolute zero, below a perfect
 * vacuum at this barometer (Pa). figure is in `unit`. Other dimensions only need to be finite. */
bool gas_accept_level(struct gas_refusal *refusal, const char *what, double figure, const struct gas_unit *unit,
                      double barometer);

#endif
