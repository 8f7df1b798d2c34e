/* Formulas of the working: the texts of the table with the state numbers of a plan set in. */
#include <stdio.h>
#include <string.h>

#include "relations.h"

struct text {
    char *buffer;
    size_t size, used;
};

static void put(struct text *text, const char *piece, size_t length)
{
    for (size_t i = 0; i < length && text->used + 1 < text->size; i++)
        text->buffer[text->used++] = piece[i];
    if (text->size > 0)
        text->buffer[text->used] = '\0';
}

static void put_number(struct text *text, int state)
{
    char digit = (char)('0' + state);
    put(text, &digit, 1);
}

/* The variable of a row that a word of its text stands for; -1: a constant, a unit, a word. */
static int variable_of(const struct relation *row, const char *word, size_t length)
{
    for (int i = 0; i < row->count; i++) {
        const char *symbol = gas_variable_symbol((enum gas_variable)row->factor[i].variable);
        if (strlen(symbol) == length && strncmp(symbol, word, length) == 0)
            return row->factor[i].variable;
    }
    return -1;
}

static bool numbered(const struct gas_plan *plan, int variable)
{
    return variable >= 0 && !plan->unnumbered && !plan->shared[variable];
}

static bool in_word(char c) /* whatever the locale */
{
    return (c >= '0' && c <= '9') || (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z');
}

static size_t word_length(const char *text)
{
    size_t length = 0;
    while (in_word(text[length]))
        length++;
    return length;
}

static void put_one_state(struct text *out, const struct gas_plan *plan, const struct gas_step *step, const char *from)
{
    const struct relation *row = &gas_relations[step->relation];
    while (*from) {
        size_t length = *from == '[' ? strcspn(from, "]") : word_length(from);
        put(out, from, length > 0 ? length : 1);
        if (length > 0 && *from != '[' && numbered(plan, variable_of(row, from, length)))
            put_number(out, step->state_a);
        from += length > 0 ? length : 1;
    }
}

/* One side of a text between two states, such as "P1 V1 n2 T2 / (V2 n1 T1)", without what the states share. */
static void put_factors(struct text *out, const struct gas_plan *plan, const struct relation *row, const char *from,
                        size_t length, const int state[3])
{
    char line[2][GAS_STEP_TEXT];
    struct text part[2] = {{line[0], sizeof line[0], 0}, {line[1], sizeof line[1], 0}};
    int count[2] = {0, 0}, below = 0;
    for (const char *end = from + length; from < end; from++) {
        below |= *from == '/';
        size_t word = word_length(from);
        if (word < 2)
            continue;
        int variable = variable_of(row, from, word - 1);
        if (variable >= 0 && !plan->shared[variable]) {
            put(&part[below], " ", count[below]++ > 0);
            put(&part[below], from, word - 1);
            put_number(&part[below], state[from[word - 1] - '0']);
        }
        from += word - 1;
    }
    put(out, count[0] ? line[0] : "1", count[0] ? part[0].used : 1);
    if (count[1] > 0) {
        put(out, " / (", count[1] > 1 ? 4 : 3);
        put(out, line[1], part[1].used);
        put(out, ")", count[1] > 1);
    }
}

static void put_two_states(struct text *out, const struct gas_plan *plan, const struct gas_step *step, const char *from,
                           const int state[3])
{
    const struct relation *row = &gas_relations[step->relation];
    const char *equals = strstr(from, " = ");
    put_factors(out, plan, row, from, (size_t)(equals - from), state);
    put(out, " = ", 3);
    put_factors(out, plan, row, equals + 3, strlen(equals + 3), state);
}

const char *gas_step_formula(const struct gas_step *step)
{
    bool real = step->relation < RELATIONS && step->target < GAS_VARIABLES;
    const char *formula = real ? gas_relations[step->relation].formula[step->target] : NULL;
    return formula ? formula : "";
}

const char *gas_step_balance(const struct gas_step *step)
{
    return step->relation < RELATIONS ? gas_relations[step->relation].balance : "";
}

void gas_step_formula_text(const struct gas_plan *plan, const struct gas_step *step, char *buffer, size_t size)
{
    struct text out = {buffer, size, 0};
    const char *formula = gas_step_formula(step);
    int a = step->state_a, b = step->state_b, t = step->target_state;
    put(&out, "", 0);
    if (*formula && gas_relations[step->relation].pair)
        put_two_states(&out, plan, step, formula, (const int[3]){0, t == b ? a : b, t});
    else if (*formula)
        put_one_state(&out, plan, step, formula);
}

void gas_step_balance_text(const struct gas_plan *plan, const struct gas_step *step, char *buffer, size_t size)
{
    struct text out = {buffer, size, 0};
    const char *balance = gas_step_balance(step);
    put(&out, "", 0);
    if (*balance && gas_relations[step->relation].pair)
        put_two_states(&out, plan, step, balance, (const int[3]){0, step->state_a, step->state_b});
    else if (*balance)
        put_one_state(&out, plan, step, balance);
}
