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

int main(void)
{
    static uint32_t counts[MOST];
    uint32_t n = sizeof usual / sizeof usual[0], stack = 0, k;

    verify();
    for (k = 0; k < n; k++) {
        struct call call = prepared(usual[k]);
        uint32_t used;
        measure(&call);
        counts[k] = counted(&call);
        used = stack_of(prepared(usual[k]));
        stack = used > stack ? used : stack;
    }
    print_counts(counts, n);
    printf(" %u\n", (unsigned)stack);
    return 0;
}
