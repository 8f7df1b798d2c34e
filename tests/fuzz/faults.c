/* What no answer may be, whatever was asked. */
#include <ctype.h>
#include <math.h>
#include <string.h>

#include "fuzz.h"

enum { SENTENCE_MOST = 480 };

static bool continues(unsigned char byte)
{
    return (byte & 0xC0) == 0x80;
}

/* UTF-8 without overlong forms, surrogates and control characters. */
static const char *bad_text(const char *text, size_t length)
{
    const unsigned char *at = (const unsigned char *)text, *end = at + length;
    while (at < end) {
        size_t bytes = *at < 0x80 ? 1 : *at < 0xC2 ? 0 : *at < 0xE0 ? 2 : *at < 0xF0 ? 3 : *at < 0xF5 ? 4 : 0;
        if (bytes == 0 || (size_t)(end - at) < bytes)
            return "text is not UTF-8";
        for (size_t i = 1; i < bytes; i++)
            if (!continues(at[i]))
                return "text is not UTF-8";
        if ((*at == 0xE0 && at[1] < 0xA0) || (*at == 0xED && at[1] > 0x9F) || (*at == 0xF0 && at[1] < 0x90) ||
            (*at == 0xF4 && at[1] > 0x8F))
            return "text is not UTF-8";
        if ((*at < ' ' && *at != '\n' && *at != '\t') || *at == 0x7F || (*at == 0xC2 && at[1] < 0xA0))
            return "text holds a control character";
        at += bytes;
    }
    return NULL;
}

static bool is_word(const char *text, const char *at, size_t length)
{
    bool before = at > text && (isalnum((unsigned char)at[-1]) || (at[-1] & 0x80));
    bool after = isalnum((unsigned char)at[length]) || (at[length] & 0x80);
    return !before && !after;
}

/* Marks of a sentence that was not composed with care. Quoted parts are the user's own words. */
static const char *bad_words(const char *text)
{
    static const char *const words[] = {"nan", "-nan", "inf", "-inf", "NAN", "INF"};
    static const char *const marks[] = {"(null)", "%s", "%g", "%d", "%z", "%%", ": :", "e+0", "e-0"};
    char plain[2000];
    size_t used = 0;
    bool quoted = false;
    for (const char *at = text; *at && used + 1 < sizeof plain; at++) {
        quoted = *at == '"' ? !quoted : quoted;
        if (!quoted)
            plain[used++] = *at;
    }
    plain[used] = '\0';
    for (size_t i = 0; i < sizeof marks / sizeof *marks; i++)
        if (strstr(plain, marks[i]))
            return "sentence holds a mark of careless composition";
    for (size_t i = 0; i < sizeof words / sizeof *words; i++)
        for (const char *at = plain; (at = strstr(at, words[i])); at++)
            if (is_word(plain, at, strlen(words[i])))
                return "sentence holds nan or inf";
    return NULL;
}

/* Quotes in the user's own words: what is quoted cannot be told. */
static bool has_quotes(const struct gas_call *call)
{
    for (size_t a = 0; a < call->count; a++)
        for (size_t i = 0; i < call->argument[a].rows * call->argument[a].columns; i++)
            if (call->argument[a].cell[i].kind == GAS_CELL_TEXT && strchr(call->argument[a].cell[i].text, '"'))
                return true;
    return false;
}

static const char *bad_sentence(const struct gas_call *call, const struct gas_cell *cell)
{
    if (cell->length >= SENTENCE_MOST)
        return "sentence is too long";
    if (cell->length < 20 || !strstr(cell->text, ": "))
        return "sentence is too short";
    if (cell->text[cell->length - 1] != '.')
        return "sentence does not end with a full stop";
    return has_quotes(call) ? NULL : bad_words(cell->text);
}

/* A text that came in may go out as it is. */
static bool passed_on(const struct gas_call *call, const struct gas_cell *cell)
{
    for (size_t a = 0; a < call->count; a++)
        for (size_t i = 0; i < call->argument[a].rows * call->argument[a].columns; i++) {
            const struct gas_cell *given = &call->argument[a].cell[i];
            if (given->kind == GAS_CELL_TEXT && given->length == cell->length &&
                memcmp(given->text, cell->text, cell->length) == 0)
                return true;
        }
    return false;
}

static const char *bad_cell(const struct gas_call *call, const struct gas_cell *cell)
{
    switch (cell->kind) {
    case GAS_CELL_NUMBER:
        return isfinite(cell->number) ? NULL : "a number is not finite";
    case GAS_CELL_TEXT:
        if (!cell->text || strlen(cell->text) != cell->length)
            return "the length of a text is wrong";
        if (passed_on(call, cell))
            return NULL;
        if (bad_text(cell->text, cell->length))
            return bad_text(cell->text, cell->length);
        return gas_cell_is_sentence(cell) ? bad_sentence(call, cell) : strncmp(cell->text, "check", 5) ? NULL : "check";
    case GAS_CELL_EMPTY:
    case GAS_CELL_NOT_AVAILABLE:
        return NULL;
    case GAS_CELL_HOST_ERROR:
    default:
        return "a cell of a kind that is no answer";
    }
}

const char *fuzz_fault(const struct gas_call *call, size_t *cell)
{
    const struct gas_block *answer = &call->answer;
    const char *fault = NULL;
    if (answer->rows == 0 || answer->columns == 0 || !answer->cell)
        return "no answer";
    for (size_t i = 0; i < answer->rows * answer->columns && !fault; i++) {
        *cell = i;
        fault = bad_cell(call, &answer->cell[i]);
    }
    return fault;
}

static uint64_t add(uint64_t hash, const void *bytes, size_t length)
{
    const unsigned char *byte = bytes;
    for (size_t i = 0; i < length; i++)
        hash = (hash ^ byte[i]) * 1099511628211U;
    return hash;
}

uint64_t fuzz_hash(const struct gas_block *answer)
{
    uint64_t hash =
        add(add(14695981039346656037U, &answer->rows, sizeof answer->rows), &answer->columns, sizeof answer->columns);
    for (size_t i = 0; i < answer->rows * answer->columns; i++) {
        const struct gas_cell *cell = &answer->cell[i];
        hash = add(hash, &cell->kind, sizeof cell->kind);
        if (cell->kind == GAS_CELL_NUMBER)
            hash = add(hash, &cell->number, sizeof cell->number);
        if (cell->kind == GAS_CELL_TEXT)
            hash = add(hash, cell->text, cell->length);
    }
    return hash;
}
