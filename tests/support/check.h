/*
 * check.h - rows of tests on top of CUnit. A failing row prints its id, so a table of 150 rows stays readable.
 *
 * A test file tests/<layer>/test_<topic>.c defines `const struct test_suite suite_<topic>`; the Makefile finds it by
 * its file name, so adding a suite is adding a file.
 */
#ifndef TESTS_CHECK_H
#define TESTS_CHECK_H

#include <stdbool.h>

typedef void test_function(void);

struct test_case {
    const char *name;
    test_function *run;
};

struct test_suite {
    const char *name;
    const struct test_case *cases; /* ends with {0} */
};

/* |got - expected| <= relative * |expected| + absolute; a NAN on either side fails unless both are NAN. */
bool check_close(const char *id, double got, double expected, double relative, double absolute);
bool check_true(const char *id, bool condition);
bool check_int(const char *id, long got, long expected);
bool check_text(const char *id, const char *got, const char *expected);
bool check_contains(const char *id, const char *got, const char *part);

/* A reproducible random number in [low, high): property tests seed it at their start. */
void check_seed(unsigned long long seed);
double check_random(double low, double high);

#endif
