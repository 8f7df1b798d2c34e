#include "check.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#include <CUnit/CUnit.h>

static bool note(bool good, const char *id, const char *words)
{
    CU_assertImplementation(good, 0, words, id, "", CU_FALSE);
    return good;
}

bool check_close(const char *id, double got, double expected, double relative, double absolute)
{
    char words[200];
    snprintf(words, sizeof words, "got %.15g, expected %.15g", got, expected);
    bool good = isnan(expected) ? isnan(got) : fabs(got - expected) <= relative * fabs(expected) + absolute;
    return note(good, id, words);
}

bool check_true(const char *id, bool condition)
{
    return note(condition, id, "is not so");
}

bool check_int(const char *id, long got, long expected)
{
    char words[100];
    snprintf(words, sizeof words, "got %ld, expected %ld", got, expected);
    return note(got == expected, id, words);
}

bool check_text(const char *id, const char *got, const char *expected)
{
    char words[700];
    snprintf(words, sizeof words, "got '%.300s', expected '%.300s'", got ? got : "(null)", expected);
    return note(got && strcmp(got, expected) == 0, id, words);
}

bool check_contains(const char *id, const char *got, const char *part)
{
    char words[700];
    snprintf(words, sizeof words, "got '%.300s', without '%.300s'", got ? got : "(null)", part);
    return note(got && strstr(got, part), id, words);
}

static unsigned long long random_state = 1;

void check_seed(unsigned long long seed)
{
    random_state = seed * 2862933555777941757ULL + 3037000493ULL;
}

double check_random(double low, double high)
{
    random_state = random_state * 6364136223846793005ULL + 1442695040888963407ULL;
    return low + (high - low) * (double)(random_state >> 11) / 9007199254740992.0;
}
