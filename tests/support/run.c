/* Runs every suite, or those whose name starts with an argument; fails when no assertion was made. The last line is
 * `N passed, N failed`. */
#include <stdio.h>
#include <string.h>

#include <CUnit/Basic.h>

#include "check.h"

extern const struct test_suite *const all_suites[]; /* written by the Makefile from the file names */

static bool wanted(const char *name, int count, char **starts)
{
    for (int i = 1; i < count; i++)
        if (strncmp(name, starts[i], strlen(starts[i])) == 0)
            return true;
    return count < 2;
}

static bool add(const struct test_suite *suite)
{
    CU_pSuite made = CU_add_suite(suite->name, NULL, NULL);
    for (const struct test_case *test = suite->cases; made && test->name; test++)
        if (!CU_add_test(made, test->name, test->run))
            return false;
    return made && suite->cases->name;
}

int main(int argc, char **argv)
{
    if (CU_initialize_registry() != CUE_SUCCESS)
        return 2;
    for (const struct test_suite *const *suite = all_suites; *suite; suite++)
        if (wanted((*suite)->name, argc, argv) && !add(*suite)) {
            fprintf(stderr, "suite %s is empty or was named twice\n", (*suite)->name);
            return 2;
        }
    CU_basic_set_mode(CU_BRM_NORMAL);
    CU_basic_run_tests();
    unsigned failed = CU_get_number_of_failures();
    unsigned made = CU_get_number_of_asserts();
    CU_cleanup_registry();
    printf("%u passed, %u failed\n", made - failed, failed);
    return failed == 0 && made > 0 ? 0 : 1;
}
