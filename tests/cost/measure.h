/*
 * Counts the instructions of whole calls on an emulated Cortex-M0, from the call to the return with both, and paints
 * the stack.
 */
#ifndef MEASURE_H
#define MEASURE_H

#include <stdint.h>
#include <stdio.h>
#include <stdlib.h>

#define SYSTICK ((volatile uint32_t *)0xE000E010)
enum { STACK_WORDS = 5, BEFORE = 2, PAINTED = 2048, MOST = 256 };

struct call {
    uintptr_t function;
    uint32_t words[4 + STACK_WORDS];
    uint32_t ticks;
};

uint32_t measure(struct call *call);
uint32_t sled(void);

/* Restarts the timer just before the call, so that a number of ticks means one number of instructions only. */
__asm__(".thumb_func\n.global measure\nmeasure:\n"
        "push {r4-r7, lr}\nmov r4, r0\nsub sp, #20\n"
        "ldr r1, [r4, #20]\nstr r1, [sp]\nldr r1, [r4, #24]\nstr r1, [sp, #4]\n"
        "ldr r1, [r4, #28]\nstr r1, [sp, #8]\nldr r1, [r4, #32]\nstr r1, [sp, #12]\n"
        "ldr r1, [r4, #36]\nstr r1, [sp, #16]\n"
        "ldr r5, =0xE000E010\nldr r6, [r4]\n"
        "ldr r0, [r4, #4]\nldr r1, [r4, #8]\nldr r2, [r4, #12]\nldr r3, [r4, #16]\n"
        "ldr r7, =0xFFFFFF\nstr r3, [r5, #8]\n"
        "blx r6\n"
        "ldr r3, [r5, #8]\nsub r7, r7, r3\nstr r7, [r4, #40]\n"
        "add sp, #20\npop {r4-r7, pc}\n.ltorg\n"
        /* 1,000 instructions and the return. */
        ".thumb_func\n.global sled\nsled:\n.rept 1000\nnop\n.endr\nbx lr\n");
enum { FRAME_OF_MEASURE = 40 }; /* what it pushes and sets aside */

static uint32_t counted(const struct call *call)
{
    /* 1.024 ticks an instruction from a tick after the restart to the reading. */
    return ((call->ticks + 2u) * 1000u + 1023u) / 1024u - BEFORE;
}

/* Starts the timer, and counts from each place in a run of known instructions to its end. */
static void verify(void)
{
    uint32_t n;

    SYSTICK[1] = 0xFFFFFF;
    SYSTICK[0] = 5;
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

/* Bytes below the stack pointer of the call that it wrote to. */
static __attribute__((noinline)) uint32_t stack_of(struct call call)
{
    volatile uint32_t *top, *p;

    __asm__ volatile("mov %0, sp" : "=r"(top));
    for (p = top - PAINTED / 4; p < top; p++) {
        *p = 0xA5C35A3Cu;
    }
    measure(&call);
    for (p = top - PAINTED / 4; p < top && *p == 0xA5C35A3Cu; p++) {
    }
    if (p == top - PAINTED / 4) {
        puts("more stack than was painted");
        exit(1);
    }
    return (uint32_t)(top - p) * 4u - FRAME_OF_MEASURE;
}

static int ascending(const void *a, const void *b)
{
    uint32_t x = *(const uint32_t *)a, y = *(const uint32_t *)b;
    return (x > y) - (x < y);
}

/* Prints the median and the worst. */
static void print_counts(uint32_t *counts, uint32_t n)
{
    qsort(counts, n, sizeof counts[0], ascending);
    printf(" %6u %6u", (unsigned)counts[n / 2], (unsigned)counts[n - 1]);
}

#endif
