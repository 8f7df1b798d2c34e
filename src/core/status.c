#include <gasleaf/status.h>

static const char *const words[] = {
#define WORDS(name, class, text) [GAS_##name] = (text),
    GAS_STATUS_LIST(WORDS)
#undef WORDS
};

const char *gas_status_words(enum gas_status status)
{
    return (unsigned)status < GAS_STATUS_COUNT ? words[status] : "";
}
