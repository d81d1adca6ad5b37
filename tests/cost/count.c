/*
 * Counts one readout: the fixed function of the file of arguments and results CASES, which tests/functions/cost_cases.rs
 * wrote, or what is written by hand in its place: BY_HAND names the function, REAL is float or double.
 */
#include <string.h>

#include "measure.h"
#include CASES

#ifdef BY_HAND
#undef FUNCTION
#define FUNCTION BY_HAND
#endif

extern uint32_t FUNCTION();
static uint32_t counts[MOST_COUNTS];

static void fail(uint32_t k, double result, double expected)
{
    printf("case %u gives %g, not %g\n", (unsigned)k, result, expected);
    exit(1);
}

#ifdef BY_HAND
static double value(const uint32_t *words, int i)
{
    return (is_signed[i] ? (double)(int32_t)words[i] : (double)words[i]) / steps[i];
}

static void prepare(struct call *call, const uint32_t *words)
{
    int i;

    call->function = (uintptr_t)FUNCTION;
    for (i = 0; i < ARGUMENTS; i++) {
        REAL x = (REAL)value(words, i);
        memcpy(call->words + i * (sizeof x / 4), &x, sizeof x);
    }
}

/* By hand is right too, to a step of the fixed result and a part in ten thousand. */
static void run(uint32_t k, const uint32_t *words, struct call *call)
{
    REAL result;
    double expected = value(words, ARGUMENTS), error, most;
    uint64_t given;

    prepare(call, words);
    given = measure(call);
    memcpy(&result, &given, sizeof result);
    error = (double)result - expected;
    most = 1.0 / steps[ARGUMENTS] + 1e-4 * expected;
    if (!(error < most && -error < most)) {
        fail(k, (double)result, expected);
    }
}
#else
static uint32_t out;

static void prepare(struct call *call, const uint32_t *words)
{
    call->function = (uintptr_t)FUNCTION;
    memcpy(call->words, words, ARGUMENTS * sizeof words[0]);
    call->words[ARGUMENTS] = (uint32_t)(uintptr_t)&out;
}

static void run(uint32_t k, const uint32_t *words, struct call *call)
{
    prepare(call, words);
    out = 0;
    if ((uint16_t)measure(call) != 0 || out != words[ARGUMENTS]) {
        fail(k, out, words[ARGUMENTS]);
    }
}
#endif

/* Prints the median and the worst and gives the most stack. */
static uint32_t count(const uint32_t (*cases)[WORDS], uint32_t n)
{
    uint32_t most = 0, k;

    for (k = 0; k < n; k++) {
        struct call call = {0};
        uint32_t used;
        run(k, cases[k], &call);
        counts[k] = counted(&call);
        used = stack_of(&call);
        most = used > most ? used : most;
    }
    print_counts(counts, n);
    return most;
}

int main(void)
{
    uint32_t stack;

    begin();
    stack = count(usual, sizeof usual / sizeof usual[0]);
#ifndef BY_HAND
    {
        uint32_t used = count(whole, sizeof whole / sizeof whole[0]);
        stack = used > stack ? used : stack;
    }
#endif
    printf(" %u\n", (unsigned)stack);
    return 0;
}
