/*
 * gas_cases.h - gas arguments for tests: texts, ranges written row by row, and what is expected of their sentences.
 */
#ifndef TESTS_GAS_CASES_H
#define TESTS_GAS_CASES_H

#include <stdlib.h>
#include <string.h>

#include <gasleaf/heat.h>

#include "check.h"
#include "sheet/gas_choice.h"

enum { CASE_CELLS = 400 };

/* A range typed as "label;value;unit/label;value;unit": '~' parts the rows, ';' the cells; what strtod takes whole is a
 * number, nothing is an empty cell. */
struct case_range {
    struct gas_block block;
    struct gas_cell cell[CASE_CELLS];
    char text[6000];
};

static inline struct gas_cell case_cell(char *text)
{
    char *end;
    double number = strtod(text, &end);
    if (*text == '\0')
        return (struct gas_cell){.kind = GAS_CELL_EMPTY};
    if (*end == '\0')
        return gas_cell_number(number);
    return (struct gas_cell){GAS_CELL_TEXT, 0, text, strlen(text)};
}

static inline const struct gas_block *case_range(struct case_range *range, size_t columns, const char *typed)
{
    size_t count = 0, column = 0;
    char *at = range->text;
    strncpy(range->text, typed, sizeof range->text - 1);
    range->text[sizeof range->text - 1] = '\0';
    for (bool more = true; more && count + columns < CASE_CELLS;) {
        char *end = at + strcspn(at, ";~");
        char mark = *end;
        *end = '\0';
        range->cell[count++] = case_cell(at);
        column++;
        at = end + 1;
        for (; mark != ';' && column < columns; column++)
            range->cell[count++] = (struct gas_cell){.kind = GAS_CELL_EMPTY};
        column = mark == ';' ? column : 0;
        more = mark != '\0';
    }
    range->block = (struct gas_block){count / columns, columns, range->cell, true};
    return &range->block;
}

static inline const struct gas_choice *case_text(const char *text)
{
    struct gas_refusal refusal = {0};
    const struct gas_choice *choice = gas_choose_text(text, strlen(text), &refusal);
    if (!check_true(text, choice != NULL))
        check_text(text, refusal.text, "(no refusal)");
    return choice;
}

static inline const struct gas_choice *case_block(size_t columns, const char *typed)
{
    struct gas_refusal refusal = {0};
    struct case_range *range = malloc(sizeof *range);
    const struct gas_choice *choice = range ? gas_choose(case_range(range, columns, typed), &refusal) : NULL;
    if (!check_true(typed, choice != NULL))
        check_text(typed, refusal.text, "(no refusal)");
    free(range);
    return choice;
}

/* Refused, with a sentence of the right shape that contains a part. */
static inline void case_refused(const char *id, const struct gas_choice *choice, const struct gas_refusal *refusal,
                                const char *part)
{
    check_true(id, choice == NULL && refusal->made);
    check_true(id, strncmp(refusal->text, "Check ", 6) == 0 && strlen(refusal->text) > 20);
    check_contains(id, refusal->text, part);
    gas_choice_release(choice);
}

static inline void case_text_refused(const char *text, const char *part)
{
    struct gas_refusal refusal = {0};
    case_refused(text, gas_choose_text(text, strlen(text), &refusal), &refusal, part);
}

static inline void case_block_refused(size_t columns, const char *typed, const char *part)
{
    struct gas_refusal refusal = {0};
    struct case_range *range = malloc(sizeof *range);
    if (range)
        case_refused(typed, gas_choose(case_range(range, columns, typed), &refusal), &refusal, part);
    free(range);
}

#endif
