/*
 * Counts one fixed function. CASES names the file of arguments and results that tests/functions/cost_cases.rs wrote.
 */
#include "measure.h"
#include CASES

extern uint32_t FUNCTION();
static uint32_t counts[MOST];

static struct call prepared(const uint32_t *words, uint32_t *out)
{
    struct call call = {(uintptr_t)FUNCTION, {0}, 0};
    int i;

    for (i = 0; i < ARGUMENTS; i++) {
        call.words[i] = words[i];
    }
    call.words[ARGUMENTS] = (uint32_t)(uintptr_t)out;
    return call;
}

static void count(const uint32_t (*cases)[WORDS], uint32_t n)
{
    uint32_t k;

    for (k = 0; k < n; k++) {
        uint32_t out = 0;
        struct call call = prepared(cases[k], &out);
        if ((uint16_t)measure(&call) != 0 || out != cases[k][ARGUMENTS]) {
            printf("case %u gives %u, on the desktop %u\n", (unsigned)k, (unsigned)out, (unsigned)cases[k][ARGUMENTS]);
            exit(1);
        }
        counts[k] = counted(&call);
    }
    print_counts(counts, n);
}

int main(void)
{
    uint32_t stack = 0, k;

    verify();
    count(usual, sizeof usual / sizeof usual[0]);
    count(whole, sizeof whole / sizeof whole[0]);
    for (k = 0; k < sizeof whole / sizeof whole[0]; k++) {
        uint32_t out = 0;
        uint32_t used = stack_of(prepared(whole[k], &out));
        stack = used > stack ? used : stack;
    }
    printf(" %u\n", (unsigned)stack);
    return 0;
}
