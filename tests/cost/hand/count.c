/*
 * Counts a readout written by hand, in float or in double, over the usual telescopes of CASES. NAME is its stem.
 */
#include <string.h>

#include "../measure.h"
#include CASES

#ifdef IN_DOUBLE
typedef double real;
#else
typedef float real;
#endif
#define JOIN(a, b) a##b
#define TYPED(name, type) JOIN(name, type)
#ifdef IN_DOUBLE
#define BY_HAND TYPED(NAME, _double)
#else
#define BY_HAND TYPED(NAME, _float)
#endif
extern real BY_HAND();
uint64_t measure_wide(struct call *call) __asm__("measure"); /* with all of a double that is given */

static struct call prepared(const uint32_t *words)
{
    struct call call = {(uintptr_t)BY_HAND, {0}, 0};
    int i;

    for (i = 0; i < ARGUMENTS; i++) {
        double value = is_signed[i] ? (double)(int32_t)words[i] : (double)words[i];
        real argument = (real)(value / steps[i]);
        memcpy((char *)call.words + (unsigned)i * sizeof argument, &argument, sizeof argument);
    }
    return call;
}

/* By hand is right too, to a step of the fixed result and a part in ten thousand. */
static void check(const uint32_t *words, uint64_t given)
{
    double step = 1.0 / steps[ARGUMENTS], expected = words[ARGUMENTS] * step, error;
    real result;

    memcpy(&result, &given, sizeof result);
    if (is_signed[ARGUMENTS]) {
        expected = (int32_t)words[ARGUMENTS] * step;
    }
    error = (double)result - expected;
    if (!(error < step + 1e-4 * expected && -error < step + 1e-4 * expected)) {
        printf("by hand gives %d steps, not %d\n", (int)((double)result / step), (int)words[ARGUMENTS]);
        exit(1);
    }
}

int main(void)
{
    static uint32_t counts[MOST];
    uint32_t n = sizeof usual / sizeof usual[0], stack = 0, k;

    verify();
    for (k = 0; k < n; k++) {
        struct call call = prepared(usual[k]);
        uint32_t used;
        check(usual[k], measure_wide(&call));
        counts[k] = counted(&call);
        used = stack_of(prepared(usual[k]));
        stack = used > stack ? used : stack;
    }
    print_counts(counts, n);
    printf(" %u\n", (unsigned)stack);
    return 0;
}
