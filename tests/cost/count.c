/*
 * Counts the instructions of whole calls on an emulated Cortex-M0, from the call to the return with both, and paints
 * the stack. CASES names the file of arguments and results that tests/functions/cost_cases.rs wrote.
 */
#include <stdint.h>
#include <stdio.h>
#include <stdlib.h>

#include CASES

#define SYSTICK ((volatile uint32_t *)0xE000E010)
enum { STACK_WORDS = 4, PAINTED = 1024, BEFORE = 2 };

struct call {
    uintptr_t function;
    uint32_t words[4 + STACK_WORDS];
    uint32_t ticks;
};

extern uint32_t FUNCTION();
uint32_t measure(struct call *call);
uint32_t sled(void);

/* Restarts the timer just before the call, so that a number of ticks means one number of instructions only. */
__asm__(".thumb_func\n.global measure\nmeasure:\n"
        "push {r4-r7, lr}\nmov r4, r0\nsub sp, #20\n"
        "ldr r1, [r4, #20]\nstr r1, [sp]\nldr r1, [r4, #24]\nstr r1, [sp, #4]\n"
        "ldr r1, [r4, #28]\nstr r1, [sp, #8]\nldr r1, [r4, #32]\nstr r1, [sp, #12]\n"
        "ldr r5, =0xE000E010\nldr r6, [r4]\n"
        "ldr r0, [r4, #4]\nldr r1, [r4, #8]\nldr r2, [r4, #12]\nldr r3, [r4, #16]\n"
        "ldr r7, =0xFFFFFF\nstr r3, [r5, #8]\n"
        "blx r6\n"
        "ldr r3, [r5, #8]\nsub r7, r7, r3\nstr r7, [r4, #36]\n"
        "add sp, #20\npop {r4-r7, pc}\n.ltorg\n"
        /* 1,000 instructions and the return. */
        ".thumb_func\n.global sled\nsled:\n.rept 1000\nnop\n.endr\nbx lr\n");

static uint32_t counted(struct call *call)
{
    /* 1.024 ticks an instruction from a tick after the restart to the reading. */
    return ((call->ticks + 2u) * 1000u + 1023u) / 1024u - BEFORE;
}

/* Counts from each place in a run of known instructions to its end. */
static void verify(void)
{
    uint32_t n;

    for (n = 0; n <= 1000; n++) {
        struct call call = {0, {0}, 0};
        call.function = (uintptr_t)sled + 2u * (1000u - n);
        measure(&call);
        if (counted(&call) != n + 2u) {
            printf("%u instructions counted as %u\n", (unsigned)n + 2u, (unsigned)counted(&call));
            exit(1);
        }
    }
}

static int ascending(const void *a, const void *b)
{
    uint32_t x = *(const uint32_t *)a, y = *(const uint32_t *)b;
    return (x > y) - (x < y);
}

static uint32_t counts[1024];

static void prepare(struct call *call, const uint32_t *words, uint32_t *out)
{
    int i;

    call->function = (uintptr_t)FUNCTION;
    for (i = 0; i < ARGUMENTS; i++) {
        call->words[i] = words[i];
    }
    call->words[ARGUMENTS] = (uint32_t)(uintptr_t)out;
}

static void count(const uint32_t (*cases)[WORDS], uint32_t n)
{
    uint32_t k;

    for (k = 0; k < n; k++) {
        struct call call = {0, {0}, 0};
        uint32_t out = 0;
        prepare(&call, cases[k], &out);
        if ((uint16_t)measure(&call) != 0 || out != cases[k][ARGUMENTS]) {
            printf("case %u gives %u, on the desktop %u\n", (unsigned)k, (unsigned)out, (unsigned)cases[k][ARGUMENTS]);
            exit(1);
        }
        counts[k] = counted(&call);
    }
    qsort(counts, n, sizeof counts[0], ascending);
    printf("%u %u ", (unsigned)counts[n / 2], (unsigned)counts[n - 1]);
}

static uint32_t frame_of_measure(void)
{
    return 40; /* what `measure` itself pushes and sets aside */
}

/* Bytes below the stack pointer of the call that it wrote to. */
static __attribute__((noinline)) uint32_t stack_of(const uint32_t *words)
{
    struct call call = {0, {0}, 0};
    uint32_t out = 0;
    volatile uint32_t *top, *p;

    prepare(&call, words, &out);
    __asm__ volatile("mov %0, sp" : "=r"(top));
    for (p = top - PAINTED / 4; p < top; p++) {
        *p = 0xA5C35A3Cu;
    }
    measure(&call);
    for (p = top - PAINTED / 4; p < top && *p == 0xA5C35A3Cu; p++) {
    }
    return (uint32_t)(top - p) * 4u - frame_of_measure();
}

int main(void)
{
    uint32_t stack = 0, k;

    SYSTICK[1] = 0xFFFFFF;
    SYSTICK[0] = 5;
    verify();
    count(usual, sizeof usual / sizeof usual[0]);
    count(whole, sizeof whole / sizeof whole[0]);
    for (k = 0; k < sizeof whole / sizeof whole[0]; k++) {
        uint32_t used = stack_of(whole[k]);
        stack = used > stack ? used : stack;
    }
    printf("%u\n", (unsigned)stack);
    return 0;
}
