/*
 * print.h - the check print of a calculation: line by line a quantity, its formula, the figures put in, the result, its
 * unit and where the formula or the constant comes from.
 *
 * The lines are written from the very run that gives the answer, and the answer is the last of them.
 */
#ifndef AUDIT_PRINT_H
#define AUDIT_PRINT_H

#include "audit/call.h"
#include "sheet/solver.h"

enum { PRINT_LINES = 240, PRINT_WORDS = 200 };

struct line {
    char step[12]; /* "basis", "given", "1", "2", ..., "answer" */
    char quantity[GAS_HEADING_TEXT];
    char formula[160];
    char figures[PRINT_WORDS];
    bool has_result;
    double result;
    char unit[GAS_UNIT_TEXT];
    char source[2 * PRINT_WORDS];
};

struct print {
    const struct gas_job *job; /* prepared, every wanted heading */
    struct gas_row row;
    struct gas_case figures;
    double si[GAS_COLUMNS]; /* the answers of the task's own run */
    int steps;
    size_t lines;
    struct line line[PRINT_LINES];
};

/* print_line - a new line, to be filled; the last one again when there is no room. */
struct line *print_line(struct print *print, const char *step);
/* print_step - a numbered one: quantity, formula, result in a unit, source. */
struct line *print_step(struct print *print, const char *quantity, const char *formula, double result, const char *unit,
                        const char *source);
/* print_figure - "name = 3.2 unit" onto the end of a line's figures. */
void print_figure(struct line *line, const char *name, double figure, const char *unit);

/* Where a figure from the gas's heat capacity comes from: the basis names it once. */
extern const char print_cp_source[];

/* print_plan - the solver's steps to the wanted variables; the plan and its values, NULL after a refusal. */
const struct gas_plan *print_plan(struct print *print, struct gas_solver *solver, const struct gas_known *wanted,
                                  size_t count, struct gas_values *values, struct gas_refusal *refusal);

/* The steps of each task; false after a refusal. */
bool print_states(struct print *print, struct gas_refusal *refusal);
bool print_path(struct print *print, struct gas_refusal *refusal);
bool print_stages(struct print *print, struct gas_refusal *refusal);
bool print_vessel(struct print *print, struct gas_refusal *refusal);

#endif
