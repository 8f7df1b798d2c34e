/*
 * check_page: writes docs/checks.md from the tables in tests/check.
 */
#include <stdlib.h>

#include "published_page.h"

int main(void)
{
    char *page = NULL, wrong[PUBLISHED_WORDS] = "no memory";
    size_t size = 0;
    FILE *text = open_memstream(&page, &size);
    bool good = text && published_page(text, wrong);
    if (text)
        fclose(text);
    FILE *out = good ? fopen(PUBLISHED_PAGE, "w") : NULL;
    good = out && fwrite(page, 1, size, out) == size;
    if (out)
        good &= fclose(out) == 0;
    free(page);
    if (!good)
        fprintf(stderr, "check_page: %s\n", out ? PUBLISHED_PAGE " cannot be written" : wrong);
    return good ? 0 : 1;
}
