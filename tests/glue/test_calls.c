/* Values go through a call unchanged in both directions; whatever comes in, an answer comes out and nothing is lost. */
#include <math.h>
#include <stdio.h>
#include <string.h>

#include "check.h"
#include "office.h"

/* GAS.GIVEN gives back what it gets, two cells a row: the call to look at values with. */
static void given(uno_Any *answer, uno_Any *first, uno_Any *second, uno_Any *more, sal_Int32 count)
{
    uno_Interface *functions = office_open();
    uno_Sequence *rest = NULL;
    uno_type_sequence_construct(&rest, office_type.anys, more, count, NULL);
    if (!functions || !office_member(functions, office_position("given"), answer, (void *[]){first, second, &rest}))
        office_text(answer, "raised");
    uno_type_destructData(&rest, office_type.anys, NULL);
}

static double real_at(const uno_Any *rows, sal_Int32 row, sal_Int32 column)
{
    const uno_Any *at = office_at(rows, row, column);
    return at->pType->eTypeClass == typelib_TypeClass_DOUBLE ? *(double *)at->pData : (double)NAN;
}

static void check_single_text(const char *id, uno_Any *any, const char *text)
{
    check_true(id, office_is_text(any, text));
    office_clear(any);
}

static void pairs(void)
{
    static const char *const texts[] = {"", "T1, °C", "𝛾 beyond the first plane 🜁", "Ω\"<&>\t", "\xEF\xBF\xBD"};
    for (size_t i = 0; i < sizeof texts / sizeof *texts; i++) {
        uno_Any text, number;
        office_text(&text, texts[i]);
        office_real(&number, -2.385e-7);
        uno_Any answer;
        given(&answer, &text, &number, NULL, 0);
        check_true("rows of anys", typelib_typedescriptionreference_equals(answer.pType, office_type.any_rows));
        check_true(texts[i], office_is_text(office_at(&answer, 0, 0), texts[i]));
        check_close("number", real_at(&answer, 0, 1), -2.385e-7, 0, 0);
        office_clear(&answer);
        office_clear(&text);
        office_clear(&number);
    }
}

static void bad_utf16(void)
{
    /* a lone high half, a lone low half, a NUL: each becomes U+FFFD */
    const sal_Unicode units[] = {'a', 0xD83D, 'b', 0xDE00, 0, 'c', 0xD83D};
    rtl_uString *string = NULL;
    uno_Any text, number;
    rtl_uString_newFromStr_WithLength(&string, units, 7);
    uno_type_any_construct(&text, &string, office_type.string, NULL);
    rtl_uString_release(string);
    office_real(&number, 1);
    uno_Any answer;
    given(&answer, &text, &number, NULL, 0);
    check_true("replaced", office_is_text(office_at(&answer, 0, 0), "a\xEF\xBF\xBD"
                                                                    "b\xEF\xBF\xBD\xEF\xBF\xBD"
                                                                    "c\xEF\xBF\xBD"));
    office_clear(&answer);
    office_clear(&text);
    office_clear(&number);
}

static void plain_numbers(void)
{
    uno_Any one, two;
    office_real(&one, 1.5);
    office_real(&two, -0.0);
    uno_Any answer;
    given(&answer, &one, &two, NULL, 0);
    const uno_Sequence *rows = *(uno_Sequence **)answer.pData;
    const double *row = (const double *)(const void *)(*(uno_Sequence **)(void *)rows->elements)->elements;
    check_int("one row", rows->nElements, 1);
    check_true("rows of numbers when all are numbers", answer.pType->eTypeClass == typelib_TypeClass_SEQUENCE &&
                                                           row[0] == 1.5 && row[1] == 0 && signbit(row[1]));
    office_clear(&answer);
    office_clear(&one);
    office_clear(&two);
}

static void numbers_that_are_none(void)
{
    const double none[] = {NAN, INFINITY, -INFINITY};
    for (size_t i = 0; i < 3; i++) {
        uno_Any text, number;
        office_text(&text, "P");
        office_real(&number, none[i]);
        uno_Any answer;
        given(&answer, &text, &number, NULL, 0);
        uno_Any *at = office_at(&answer, 0, 1);
        check_true("leaves as a sentence", at->pType->eTypeClass == typelib_TypeClass_STRING &&
                                               office_is_text(at, "Check the result: it is not a finite number; look "
                                                                  "for a figure out of all proportion."));
        office_clear(&answer);
        office_clear(&text);
        office_clear(&number);
    }
}

static void other_kinds(void)
{
    const sal_Int32 whole = -7;
    const sal_Bool yes = 1;
    const sal_Int16 small = 12;
    const float coarse = 0.25F;
    uno_Any any[4];
    uno_type_any_construct(&any[0], (void *)&whole, *typelib_static_type_getByTypeClass(typelib_TypeClass_LONG), NULL);
    uno_type_any_construct(&any[1], (void *)&yes, *typelib_static_type_getByTypeClass(typelib_TypeClass_BOOLEAN), NULL);
    uno_type_any_construct(&any[2], (void *)&small, *typelib_static_type_getByTypeClass(typelib_TypeClass_SHORT), NULL);
    uno_type_any_construct(&any[3], (void *)&coarse, *typelib_static_type_getByTypeClass(typelib_TypeClass_FLOAT),
                           NULL);
    uno_Any answer;
    given(&answer, &any[0], &any[1], &any[2], 2);
    const uno_Sequence *rows = *(uno_Sequence **)answer.pData;
    uno_Sequence *const *row = (uno_Sequence *const *)(const void *)rows->elements;
    const double *first = (const double *)(const void *)row[0]->elements;
    const double *second = (const double *)(const void *)row[1]->elements;
    check_true("long, boolean, short, float", first[0] == -7 && first[1] == 1 && second[0] == 12 && second[1] == 0.25);
    office_clear(&answer);
    for (size_t i = 0; i < 4; i++)
        office_clear(&any[i]);
}

static void values_of_no_use(void)
{
    uno_Any number, type, nothing, object;
    uno_Interface *none = NULL;
    uno_Type *real = office_type.real;
    office_void(&nothing);
    office_real(&number, 1);
    uno_type_any_construct(&type, &real, *typelib_static_type_getByTypeClass(typelib_TypeClass_TYPE), NULL);
    uno_type_any_construct(&object, &none, office_type.interface, NULL);
    uno_Any answer;
    given(&answer, &type, &number, NULL, 0);
    check_single_text(
        "a type", &answer,
        "Check the argument: a value of this kind cannot be used; give a number, a text or a range of cells.");
    given(&answer, &object, &number, NULL, 0);
    check_single_text("no object", &answer, "Check range: its cells cannot be read; give a range of cells.");
    given(&answer, &nothing, &number, NULL, 0);
    check_true("omitted: a sentence", answer.pType->eTypeClass == typelib_TypeClass_STRING);
    office_clear(&answer);
    office_clear(&number);
    office_clear(&type);
    office_clear(&object);
    office_clear(&nothing);
}

static void ranges(void)
{
    uno_Any range, number;
    office_rows(&range, 1, 1);
    office_put_text(office_at(&range, 0, 0), "P1, bar(g)");
    office_real(&number, 7);
    uno_Any answer;
    given(&answer, &range, &number, NULL, 0);
    check_true("a range of one cell is a cell", office_is_text(office_at(&answer, 0, 0), "P1, bar(g)"));
    office_clear(&answer);
    office_put_text(office_at(&range, 0, 0), "Check P1: it is not good.");
    given(&answer, &range, &number, NULL, 0);
    check_single_text("a sentence is passed on", &answer, "Check P1: it is not good.");
    office_clear(&range);
    office_rows(&range, 3, 2);
    given(&answer, &range, &number, NULL, 0);
    check_true("a larger one is refused by this function", answer.pType->eTypeClass == typelib_TypeClass_STRING);
    office_clear(&answer);
    office_clear(&range);
    office_rows(&range, 0, 0);
    given(&answer, &range, &number, NULL, 0);
    check_true("an empty one too", answer.pType->eTypeClass == typelib_TypeClass_STRING);
    office_clear(&answer);
    office_clear(&range);
    office_clear(&number);
}

static void many_arguments(void)
{
    enum { MANY = 20001 };
    static uno_Any more[MANY];
    uno_Any text, number;
    office_text(&text, "label");
    office_real(&number, 0.5);
    for (sal_Int32 i = 0; i < MANY; i++)
        if (i % 2)
            office_real(&more[i], i);
        else
            office_text(&more[i], "label");
    uno_Any answer;
    given(&answer, &text, &number, more, MANY - 1);
    check_close("the last of 10001 rows", real_at(&answer, MANY / 2, 1), MANY - 2, 0, 0);
    check_true("the last text", office_is_text(office_at(&answer, MANY / 2, 0), "label"));
    office_clear(&answer);
    given(&answer, &text, &number, more, MANY);
    check_true("an odd one is refused", answer.pType->eTypeClass == typelib_TypeClass_STRING);
    office_clear(&answer);
    for (sal_Int32 i = 0; i < MANY; i++)
        office_clear(&more[i]);
    office_clear(&text);
    office_clear(&number);
}

static void borrowed(void)
{
    uno_Any text, number;
    office_text(&text, "borrowed");
    office_real(&number, 3);
    rtl_uString *string = *(rtl_uString **)text.pData;
    sal_Int32 before = string->refCount;
    for (int i = 0; i < 100; i++) {
        uno_Any answer;
        given(&answer, &text, &number, NULL, 0);
        office_clear(&answer);
    }
    check_int("arguments keep their references", string->refCount, before);
    check_int("one reference", before, 1);
    office_clear(&text);
    office_clear(&number);
}

/* Sequences as other clients send them: of rows of numbers, of anys that hold rows, of plain values. */
static void other_sequences(void)
{
    uno_Type *reals = NULL, *real_rows = NULL;
    typelib_static_sequence_type_init(&reals, office_type.real);
    typelib_static_sequence_type_init(&real_rows, reals);
    const double figures[] = {4.25, 8};
    uno_Sequence *row = NULL, *rows = NULL, *outer = NULL;
    uno_Any any[3], text, answer;
    office_text(&text, "label");
    uno_type_sequence_construct(&row, reals, (void *)figures, 1, NULL);
    uno_type_sequence_construct(&rows, real_rows, &row, 1, NULL);
    uno_type_any_construct(&any[0], &rows, real_rows, NULL);
    uno_type_any_construct(&any[1], &row, reals, NULL);
    uno_type_sequence_construct(&outer, office_type.anys, &any[1], 1, NULL);
    uno_type_any_construct(&any[2], &outer, office_type.anys, NULL);
    for (int i = 0; i < 3; i++) {
        given(&answer, &text, &any[i], NULL, 0);
        check_close("one figure in rows, in a row, in an any in a row", real_at(&answer, 0, 1), 4.25, 0, 0);
        office_clear(&answer);
        office_clear(&any[i]);
    }
    uno_type_destructData(&row, reals, NULL);
    uno_type_destructData(&rows, real_rows, NULL);
    uno_type_destructData(&outer, office_type.anys, NULL);
    office_clear(&text);
}

static void no_arguments(void)
{
    uno_Interface *functions = office_open();
    uno_Any answer;
    bool answered = functions && office_member(functions, office_position("version"), &answer, NULL);
    check_true("GAS.VERSION answers a text", answered && answer.pType->eTypeClass == typelib_TypeClass_STRING &&
                                                 (*(rtl_uString **)answer.pData)->length > 8);
    if (answered)
        office_clear(&answer);
}

const struct test_suite suite_calls = {"calls", (const struct test_case[]){{"pairs", pairs},
                                                                           {"bad UTF-16", bad_utf16},
                                                                           {"plain numbers", plain_numbers},
                                                                           {"not finite", numbers_that_are_none},
                                                                           {"other kinds", other_kinds},
                                                                           {"values of no use", values_of_no_use},
                                                                           {"ranges", ranges},
                                                                           {"many arguments", many_arguments},
                                                                           {"borrowed", borrowed},
                                                                           {"other sequences", other_sequences},
                                                                           {"no arguments", no_arguments},
                                                                           {0}}};
