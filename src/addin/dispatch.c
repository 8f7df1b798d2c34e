/* One dispatcher for every worksheet function: the member's number is the row of the catalogue. */
#include <pthread.h>
#include <stdlib.h>

#include "addin/marshal.h"
#include "addin/object.h"
#include "addin/text.h"
#include "sheet/catalogue.h"

/* The memory of a thread's calls, reused from call to call. A call inside a call gets memory of its own. */
struct desk {
    struct gas_arena arena;
    bool busy;
};

static pthread_key_t desk_key;
static pthread_once_t desk_once = PTHREAD_ONCE_INIT;
static bool desk_key_made;

static void clear_desk(void *desk)
{
    if (desk)
        gas_arena_free(&((struct desk *)desk)->arena);
    free(desk);
}

static void make_desk_key(void)
{
    desk_key_made = pthread_key_create(&desk_key, clear_desk) == 0;
}

/* Threads clear their desks when they end; the last one ends with the process, which this takes care of. */
__attribute__((destructor)) static void leave(void)
{
    if (!desk_key_made)
        return;
    clear_desk(pthread_getspecific(desk_key));
    pthread_key_delete(desk_key);
    desk_key_made = false;
}

static struct desk *desk_of_thread(void)
{
    pthread_once(&desk_once, make_desk_key);
    if (!desk_key_made)
        return NULL;
    struct desk *desk = pthread_getspecific(desk_key);
    if (desk)
        return desk;
    desk = calloc(1, sizeof *desk);
    if (desk && pthread_setspecific(desk_key, desk) != 0) {
        free(desk);
        return NULL;
    }
    return desk;
}

static void read_rest(const uno_Sequence *rest, struct gas_arena *arena, struct gas_block *to)
{
    const uno_Any *any = (const uno_Any *)(const void *)rest->elements;
    for (sal_Int32 i = 0; i < rest->nElements; i++)
        addin_read(&any[i], arena, &to[i]);
}

/* How many blocks the arguments make: a last one that repeats makes as many as it holds. */
static size_t count_arguments(const struct gas_function *function, void **arguments)
{
    size_t count = gas_parameter_count(function);
    if (count && function->parameter[count - 1].kind == GAS_PARAMETER_REST)
        count += (size_t)(*(uno_Sequence **)arguments[count - 1])->nElements - 1;
    return count;
}

/* The argument that cannot be read, as a sentence; NULL when all were read. */
static const struct gas_block *read_arguments(const struct gas_function *function, void **arguments,
                                              struct gas_arena *arena, struct gas_block *to)
{
    for (size_t i = 0; i < gas_parameter_count(function); i++)
        switch (function->parameter[i].kind) {
        case GAS_PARAMETER_LIVE:
            if (!addin_read_live(*(uno_Interface **)arguments[i], arena, &to[i]))
                return &to[i];
            break;
        case GAS_PARAMETER_REST:
            read_rest(*(uno_Sequence **)arguments[i], arena, &to[i]);
            break;
        default:
            addin_read(arguments[i], arena, &to[i]);
        }
    return NULL;
}

static void call(const struct gas_function *function, struct gas_arena *arena, uno_Any *result, void **arguments)
{
    struct gas_cell sorry = addin_message("Check the arguments: they are too many for the memory at hand; give fewer.");
    struct gas_call call = {
        .count = count_arguments(function, arguments), .arena = arena, .answer = {1, 1, &sorry, false}};
    struct gas_block *blocks = gas_arena_take(arena, call.count + 1, sizeof *blocks);
    const struct gas_block *unread = blocks ? read_arguments(function, arguments, arena, blocks) : NULL;
    if (unread) {
        call.answer = *unread;
    } else if (blocks) {
        call.argument = blocks;
        gas_function_call(function, &call);
    }
    addin_write(&call.answer, result);
}

bool addin_call_function(const struct addin_object *object, sal_Int32 member, void *result, void **arguments)
{
    (void)object;
    size_t functions;
    const struct gas_function *catalogue = gas_catalogue(&functions);
    if (member < 0 || (size_t)member >= functions)
        return false;
    struct desk own = {{NULL}, false}, *desk = desk_of_thread();
    if (!desk || desk->busy)
        desk = &own;
    desk->busy = true;
    call(&catalogue[member], &desk->arena, result, arguments);
    desk->busy = false;
    if (desk == &own)
        gas_arena_free(&own.arena);
    else
        gas_arena_reset(&desk->arena);
    return true;
}
