/* generate TOP: write the files that follow from the catalogue below the folder TOP, where their folders exist. */
#include <stdio.h>

#include "generate/generate.h"

static bool write_file(const char *top, const struct gas_generated *file)
{
    char path[1000];
    int length = snprintf(path, sizeof path, "%s/%s", top, file->path);
    FILE *out = length > 0 && (size_t)length < sizeof path ? fopen(path, "w") : NULL;
    if (!out) {
        perror(path);
        return false;
    }
    size_t count;
    const struct gas_function *functions = gas_catalogue(&count);
    file->write(out, functions, count);
    bool good = !ferror(out);
    return fclose(out) == 0 && good;
}

int main(int argc, char **argv)
{
    bool good = argc == 2;
    for (const struct gas_generated *file = gas_generated(); good && file->path; file++)
        good = write_file(argv[1], file);
    if (!good)
        fputs("usage: generate TOP, the top of the tree\n", stderr);
    return good ? 0 : 1;
}
