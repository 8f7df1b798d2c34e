/*
 * Every relation in every direction, the formulas as they are printed, each variable hidden in turn, and random sets of
 * knowns, against states made by arithmetic (state_truth.h).
 */
#include <ctype.h>
#include <string.h>

#include <gasleaf/state.h>

#include "core/relations.h"

#include "check.h"
#include "state_truth.h"

static double solved(const struct question *q, int variable, int state)
{
    struct gas_plan plan;
    struct gas_values values;
    const struct gas_known wanted = {(enum gas_variable)variable, state};
    gas_plan_make(&plan, q->known, q->count, 0);
    gas_plan_trim(&plan, &wanted, 1);
    if (run(&plan, q, &values).status != GAS_OK)
        return NAN;
    return gas_plan_value(&plan, &values, wanted.variable, state);
}

/* Arithmetic on the text of a formula: "P V / (n R)", "h - R T"; symbols stand for figures of the relation. */
struct reader {
    const char *at;
    const struct relation *row;
    const double (*truth)[GAS_VARIABLES]; /* by state */
};

static double read_sum(struct reader *reader);

static double symbol_value(const struct reader *reader, const char *word, size_t length)
{
    int state = isdigit((unsigned char)word[length - 1]) ? word[--length] - '0' : 1;
    if (length == 0)
        return state;
    if (length == 1 && (*word == 'R' || *word == 'M'))
        return *word == 'R' ? TRUTH_R : TRUTH_M;
    const char *unit = word[length] == ' ' && word[length + 1] == '[' ? word + length + 2 : "";
    for (int i = 0; i < reader->row->count; i++) {
        enum gas_variable variable = (enum gas_variable)reader->row->factor[i].variable;
        const char *symbol = gas_variable_symbol(variable), *own = gas_variable_unit(variable);
        if (strlen(symbol) == length && strncmp(symbol, word, length) == 0 &&
            (!*unit || strncmp(unit, own, strlen(own)) == 0))
            return reader->truth[state][variable];
    }
    return NAN;
}

static double read_factor(struct reader *reader)
{
    if (*reader->at == '(') {
        reader->at++;
        double sum = read_sum(reader);
        reader->at += *reader->at == ')';
        return sum;
    }
    size_t length = 0;
    while (isalnum((unsigned char)reader->at[length]))
        length++;
    double value = length > 0 ? symbol_value(reader, reader->at, length) : NAN;
    reader->at += length;
    if (strncmp(reader->at, " [", 2) == 0)
        reader->at += strcspn(reader->at, "]") + 1;
    return value;
}

static double read_product(struct reader *reader)
{
    double product = read_factor(reader);
    while (*reader->at == ' ' && reader->at[1] != '+' && reader->at[1] != '-' && reader->at[1] != '=') {
        bool below = reader->at[1] == '/';
        reader->at += below ? 3 : 1;
        double factor = read_factor(reader);
        product = below ? product / factor : product * factor;
    }
    return product;
}

static double read_sum(struct reader *reader)
{
    double sum = read_product(reader);
    while (*reader->at == ' ' && (reader->at[1] == '+' || reader->at[1] == '-')) {
        int sign = reader->at[1] == '+' ? 1 : -1;
        reader->at += 3;
        sum += sign * read_product(reader);
    }
    return sum;
}

static void two_states(double truth[3][GAS_VARIABLES])
{
    memset(truth[0], 0, sizeof truth[0]);
    truth_state(3.171e5, 413.7, 17.3, truth[1]);
    truth_state(1.413e5, 351.9, 29.1, truth[2]);
}

/* Knowns: every variable of the relation but the target, which is of state 1, or of state 2 in a pair. */
static void one_direction(int relation, int target, const double truth[3][GAS_VARIABLES])
{
    const struct relation *row = &gas_relations[relation];
    struct question q = {.count = 0};
    int target_state = row->pair ? 2 : 1;
    for (int state = 1; state <= target_state; state++)
        for (int i = 0; i < row->count; i++)
            if (row->factor[i].variable != target || state != target_state)
                ask(&q, row->factor[i].variable, state, truth[state][row->factor[i].variable]);
    check_close(row->formula[target], solved(&q, target, target_state), truth[target_state][target], 1e-10, 0);
}

static void every_relation_in_every_direction(void)
{
    double truth[3][GAS_VARIABLES];
    two_states(truth);
    for (int relation = 0; relation < RELATIONS; relation++)
        for (int i = 0; i < gas_relations[relation].count; i++) {
            int target = gas_relations[relation].factor[i].variable;
            bool gives = (gas_relations[relation].firm | gas_relations[relation].fragile) & 1u << target;
            check_int(gas_relations[relation].balance, gives, gas_relations[relation].formula[target] != NULL);
            if (gives)
                one_direction(relation, target, (const double(*)[GAS_VARIABLES])truth);
        }
}

static double value_of_text(const char *text, const struct relation *row, const double (*truth)[GAS_VARIABLES])
{
    struct reader reader = {text, row, truth};
    return read_sum(&reader);
}

/* The formulas as printed, computed with true figures. */
static void formulas_say_what_is_computed(void)
{
    double truth[3][GAS_VARIABLES];
    two_states(truth);
    for (int relation = 0; relation < RELATIONS; relation++) {
        const struct relation *row = &gas_relations[relation];
        const double(*states)[GAS_VARIABLES] = (const double(*)[GAS_VARIABLES])truth;
        for (int variable = 0; variable < GAS_VARIABLES && row->kind != RELATION_FUNCTION; variable++) {
            const char *text = row->formula[variable];
            if (text)
                check_close(text, value_of_text(strstr(text, " = ") + 3, row, states),
                            truth[row->pair ? 2 : 1][variable], 1e-12, 0);
        }
        if (row->kind != RELATION_FUNCTION)
            check_close(row->balance, value_of_text(row->balance, row, states),
                        value_of_text(strstr(row->balance, " = ") + 3, row, states), 1e-12, 0);
    }
}

static void each_variable_hidden_in_turn(void)
{
    double truth[3][GAS_VARIABLES];
    two_states(truth);
    for (int hidden = 0; hidden < GAS_VARIABLES; hidden++)
        for (int state = 1; state <= 2; state++) {
            struct question q = {.count = 0};
            for (int i = 0; i < 2 * GAS_VARIABLES; i++)
                if (i % GAS_VARIABLES != hidden || i / GAS_VARIABLES + 1 != state)
                    ask(&q, i % GAS_VARIABLES, i / GAS_VARIABLES + 1, truth[i / GAS_VARIABLES + 1][i % GAS_VARIABLES]);
            check_close(gas_variable_symbol((enum gas_variable)hidden), solved(&q, hidden, state), truth[state][hidden],
                        1e-9, 0);
        }
}

/* Random truth: three states, one quantity the same in all. */
struct scene {
    double truth[4][GAS_VARIABLES];
    int same; /* GAS_VAR_P, T, V, S_MOLAR or -1 */
    bool open;
};

static void draw_scene(struct scene *scene)
{
    const int choices[] = {GAS_VAR_P, GAS_VAR_T, GAS_VAR_V, -1};
    scene->same = choices[(int)check_random(0, 4)];
    scene->open = check_random(0, 1) < 0.3;
    double n = check_random(0.3, 30), P = check_random(1e4, 1e6), T = check_random(320, 900);
    for (int state = 1; state <= 3; state++) {
        if (scene->open)
            n = check_random(0.3, 30);
        if (scene->same != GAS_VAR_T)
            T = check_random(320, 900);
        if (scene->same == GAS_VAR_V && state > 1)
            P = n * TRUTH_R * T / scene->truth[1][GAS_VAR_V];
        else if (scene->same != GAS_VAR_P)
            P = check_random(1e4, 1e6);
        truth_state(P, T, n, scene->truth[state]);
    }
}

static void draw_question(const struct scene *scene, struct question *q)
{
    q->count = 0;
    double density = check_random(0.03, 0.4);
    if (scene->same >= 0)
        ask(q, scene->same, check_random(0, 1) < 0.5 ? 0 : GAS_CONSTANT, scene->truth[1][scene->same]);
    for (int state = 1; state <= 3; state++)
        for (int variable = 0; variable < GAS_VARIABLES; variable++)
            if (variable != scene->same && (check_random(0, 1) < density || (scene->open && variable == GAS_VAR_N)))
                ask(q, variable, state, scene->truth[state][variable]);
}

static bool agrees_with_truth(const struct scene *scene, const struct gas_plan *plan, const struct gas_values *values,
                              int *found)
{
    for (int state = 1; state <= 3 && state <= plan->states; state++)
        for (int variable = 0; variable < GAS_VARIABLES; variable++) {
            double truth = scene->truth[state][variable];
            if (!gas_plan_finds(plan, (enum gas_variable)variable, state))
                continue;
            double value = gas_plan_value(plan, values, (enum gas_variable)variable, state);
            if (!(fabs(value - truth) <= 1e-6 * (fabs(truth) + 1e-3)))
                return false;
            ++*found;
        }
    return true;
}

static void random_knowns_agree_with_truth(void)
{
    int found = 0;
    check_seed(20240611);
    for (int i = 0; i < 3000; i++) {
        struct scene scene;
        struct question q;
        struct gas_plan plan;
        struct gas_values values;
        draw_scene(&scene);
        draw_question(&scene, &q);
        if (!check_int("made", gas_plan_make(&plan, q.known, q.count, 0).status, GAS_OK))
            return;
        struct gas_result result = run(&plan, &q, &values);
        if (!check_int("no contradiction", result.status, GAS_OK) ||
            !check_true("truth", agrees_with_truth(&scene, &plan, &values, &found)))
            return;
    }
    check_true("much was found", found > 30000);
}

const struct test_suite suite_state_relations = {
    "state_relations",
    (const struct test_case[]){{"every relation in every direction", every_relation_in_every_direction},
                               {"formulas", formulas_say_what_is_computed},
                               {"hidden in turn", each_variable_hidden_in_turn},
                               {"random truth", random_knowns_agree_with_truth},
                               {0}}};
