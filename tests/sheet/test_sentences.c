/* Readable errors: what is said to each mistake, and that every sentence has the shape that users rely on. */
#include <string.h>

#include "check.h"
#include "formula.h"
#include "sentence_rows.h"
#include "sheet/sentence.h"

enum { ROWS = sizeof sentence_rows / sizeof *sentence_rows };

static void mistakes_are_answered(void)
{
    struct gas_arena arena = {0};
    for (size_t i = 0; i < ROWS; i++) {
        const struct sentence_row *row = &sentence_rows[i];
        struct gas_block answer = {0};
        bool read = formula_evaluate(row->formula, &arena, &answer) && answer.rows > 0;
        if (!check_true(row->formula, read))
            continue;
        const char *said = answer.cell->kind == GAS_CELL_TEXT ? answer.cell->text : "(a figure)";
        if (row->sentence[0] == '~')
            check_contains(row->formula, said, row->sentence + 1);
        else
            check_text(row->formula, said, row->sentence);
        check_true(row->formula, strncmp(said, "Check ", 6) == 0 && said[strlen(said) - 1] == '.');
        gas_arena_reset(&arena);
    }
    gas_arena_free(&arena);
}

/* An error in an argument is passed on as it is, so that the first cause shows in the last cell. */
static void the_first_cause_shows(void)
{
    static const char *const formulas[] = {
        "GAS.DH(\"N2\";GAS.UNIT(-300;\"°C\";\"K\");400)",
        "GAS.SOLVE(\"N2\";GAS.GIVEN(\"T, K\";GAS.UNIT(-300;\"°C\";\"K\");\"P, bar\";1);\"rho, kg/m3\")",
        "GAS.UNIT(GAS.DH(\"N2\";GAS.UNIT(-300;\"°C\";\"K\");400);\"J/mol\";\"kJ/mol\")",
        "GAS.CP(GAS.UNIT(-300;\"°C\";\"K\");GAS.CP(\"nitrogn\";300))",
    };
    struct gas_arena arena = {0};
    for (size_t i = 0; i < sizeof formulas / sizeof *formulas; i++) {
        struct gas_block answer = {0};
        if (check_true(formulas[i], formula_evaluate(formulas[i], &arena, &answer)))
            check_text(formulas[i], answer.cell->text, "Check value: -300 °C is below absolute zero (-273.15 °C).");
        gas_arena_reset(&arena);
    }
    gas_arena_free(&arena);
}

static void said(const char *id, const char *what, const char *words, const char *expected)
{
    struct gas_refusal refusal = {0};
    gas_refuse(&refusal, what, "%s.", words);
    check_text(id, refusal.text, expected);
}

static void sentences_are_whole(void)
{
    char long_words[700], *text;
    struct gas_refusal refusal = {0};
    said("control characters", "P1",
         "a\x01"
         "b\tc\x7f",
         "Check P1: a?b c?.");
    said("bytes that are no text", "P1", "a\xff\xc3 \xe2\x82 \xed\xa0\x80", "Check P1: a?? ?? ???.");
    said("signs that are shown", "T1", "25 °C … Δ𝛾", "Check T1: 25 °C … Δ𝛾.");
    memset(long_words, 'x', sizeof long_words - 1);
    long_words[sizeof long_words - 1] = '\0';
    gas_refuse(&refusal, "P1", "%s.", long_words);
    text = refusal.text;
    check_true("cut short", strlen(text) < sizeof refusal.text && strcmp(text + strlen(text) - 4, "….") == 0);
    for (size_t i = 0; i + 1 < sizeof long_words; i++)
        long_words[i] = "é"[i % 2];
    refusal.made = false;
    gas_refuse(&refusal, "P1", "%s.", long_words);
    check_true("cut after a whole character", strchr(text, '?') == NULL && strcmp(text + strlen(text) - 6, "é….") == 0);
}

static void figures_read_well(void)
{
    /* common practice: no powers of ten where digits are read at a glance */
    static const struct {
        double figure;
        const char *text;
    } rows[] = {{1e5, "100000"},  {101325, "101325"},        {-0.5, "-0.5"},  {1.0 / 3, "0.333333"}, {1e-5, "1e-5"},
                {1e15, "1e15"},   {273.15, "273.15"},        {0, "0"},        {20000, "20000"},      {2.5e-7, "2.5e-7"},
                {-1e20, "-1e20"}, {1e14, "100000000000000"}, {0.001, "0.001"}};
    for (size_t i = 0; i < sizeof rows / sizeof *rows; i++)
        check_text(rows[i].text, gas_shown(rows[i].figure).text, rows[i].text);
}

const struct test_suite suite_sentences = {"sentences",
                                           (const struct test_case[]){{"mistakes are answered", mistakes_are_answered},
                                                                      {"the first cause shows", the_first_cause_shows},
                                                                      {"sentences are whole", sentences_are_whole},
                                                                      {"figures read well", figures_read_well},
                                                                      {0}}};
