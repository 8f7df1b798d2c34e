/* What is committed is what the catalogue gives: `make generate` mends a difference. */
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "check.h"
#include "generate/generate.h"

static char *contents(const char *path)
{
    FILE *in = fopen(path, "r");
    char *text = NULL;
    size_t size = 0;
    if (in && getdelim(&text, &size, EOF, in) < 0) {
        free(text);
        text = NULL;
    }
    if (in)
        fclose(in);
    return text;
}

static void files_are_fresh(void)
{
    size_t count;
    const struct gas_function *functions = gas_catalogue(&count);
    for (const struct gas_generated *file = gas_generated(); file->path; file++) {
        char *fresh = NULL, *kept = contents(file->path);
        size_t size = 0;
        FILE *out = open_memstream(&fresh, &size);
        file->write(out, functions, count);
        fclose(out);
        check_true(file->path, kept && strcmp(fresh, kept) == 0);
        free(fresh);
        free(kept);
    }
}

const struct test_suite suite_generate = {"generate",
                                          (const struct test_case[]){{"files are fresh", files_are_fresh}, {0}}};
