/*
 * ascii.h - letters and digits whatever the locale of the process: in a Turkish one the C library does not hold "I" and
 * "i" for the same letter, in others bytes above 127 are letters.
 */
#ifndef SHEET_ASCII_H
#define SHEET_ASCII_H

#include <stdbool.h>
#include <stddef.h>
#include <string.h>

static inline char gas_ascii_lower(char c)
{
    return c >= 'A' && c <= 'Z' ? (char)(c - 'A' + 'a') : c;
}

static inline char gas_ascii_upper(char c)
{
    return c >= 'a' && c <= 'z' ? (char)(c - 'a' + 'A') : c;
}

static inline bool gas_ascii_digit(char c)
{
    return c >= '0' && c <= '9';
}

static inline bool gas_ascii_letter(char c)
{
    return gas_ascii_lower(c) >= 'a' && gas_ascii_lower(c) <= 'z';
}

/* gas_ascii_starts - the text begins with a word, whatever the case; it may end before. */
static inline bool gas_ascii_starts(const char *text, const char *word)
{
    while (*word && gas_ascii_lower(*text) == gas_ascii_lower(*word))
        text++, word++;
    return !*word;
}

/* gas_ascii_same - two texts are the same but for case. */
static inline bool gas_ascii_same(const char *a, const char *b)
{
    return strlen(a) == strlen(b) && gas_ascii_starts(a, b);
}

#endif
