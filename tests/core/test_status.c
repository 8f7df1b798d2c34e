#include <string.h>

#include <gasleaf/status.h>

#include "check.h"

static void every_status_has_words(void)
{
    for (int status = GAS_OK + 1; status < GAS_STATUS_COUNT; status++)
        check_true(gas_status_words(status), strlen(gas_status_words(status)) > 5);
    check_text("ok is silent", gas_status_words(GAS_OK), "");
}

const struct test_suite suite_status = {"status", (const struct test_case[]){{"words", every_status_has_words}, {0}}};
