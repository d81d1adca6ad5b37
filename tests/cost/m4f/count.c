/*
 * Counts one readout in f32 on an emulated Cortex-M4 with FPU: the library's, or with BY_HAND the one written by hand,
 * which with BARE gives its result and no status. FUNCTION_F32 names it; CASES names the file of arguments and results
 * that tests/functions/cost_cases.rs wrote.
 */
#include <math.h>
#include <stdint.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include CASES

#define SYSTICK ((volatile uint32_t *)0xE000E010)
enum { PAINTED = 2048, MOST = 256 };

/* Integers and addresses go in one kind of register, floats in the other. */
struct call {
    uintptr_t function;
    uint32_t words[4];
    float floats[4];
    uint32_t ticks;
    float given;
};

extern void FUNCTION_F32(void);
uint32_t measure(struct call *call);
uint32_t sled(void);

__asm__(".syntax unified\n.fpu fpv4-sp-d16\n.thumb_func\n.global measure\nmeasure:\n"
        "push {r4-r7, lr}\nsub sp, #4\nmov r4, r0\n"
        "vldr s0, [r4, #20]\nvldr s1, [r4, #24]\nvldr s2, [r4, #28]\nvldr s3, [r4, #32]\n"
        "ldr r5, =0xE000E010\nldr r6, [r4]\n"
        "ldr r0, [r4, #4]\nldr r1, [r4, #8]\nldr r2, [r4, #12]\nldr r3, [r4, #16]\n"
        "ldr r7, =0xFFFFFF\nstr r3, [r5, #8]\n"
        "blx r6\n"
        "ldr r3, [r5, #8]\nsub r7, r7, r3\nstr r7, [r4, #36]\nvstr s0, [r4, #40]\n"
        "add sp, #4\npop {r4-r7, pc}\n.ltorg\n"
        ".thumb_func\n.global sled\nsled:\n.rept 1000\nnop\n.endr\nbx lr\n");
enum { FRAME_OF_MEASURE = 24 };

static uint32_t counted(const struct call *call)
{
    /* 1.6 ticks an instruction, from a tick after the restart to the reading. */
    return (call->ticks * 10u + 10u) / 16u;
}

static void verify(void)
{
    uint32_t n;

    SYSTICK[1] = 0xFFFFFF;
    SYSTICK[0] = 5;
    for (n = 0; n <= 1000; n++) {
        struct call call = {(uintptr_t)sled + 2u * (1000u - n), {0}, {0}, 0, 0};
        measure(&call);
        if (counted(&call) != n + 2u) {
            printf("%u instructions counted as %u, %u ticks\n", (unsigned)n + 2u, (unsigned)counted(&call), (unsigned)call.ticks);
            exit(1);
        }
    }
}

static float result;

static struct call prepared(const uint32_t *words)
{
    struct call call = {(uintptr_t)FUNCTION_F32, {0}, {0}, 0, 0};
    int i, integers = 0, floats = 0;

    for (i = 0; i < ARGUMENTS; i++) {
        if (is_count[i]) {
            call.words[integers++] = words[i];
        } else {
            double value = is_signed[i] ? (double)(int32_t)words[i] : (double)words[i];
            call.floats[floats++] = (float)(value / steps[i]);
        }
    }
    call.words[integers] = (uint32_t)(uintptr_t)&result;
    return call;
}

/* To a step of the fixed result and a part in ten thousand. */
static void check(const uint32_t *words, float given)
{
    double step = 1.0 / steps[ARGUMENTS];
    double expected = (is_signed[ARGUMENTS] ? (double)(int32_t)words[ARGUMENTS] : (double)words[ARGUMENTS]) * step;
    uint32_t count;

    memcpy(&count, &given, sizeof count);
    if (!(fabs((is_count[ARGUMENTS] ? (double)count : (double)given) - expected) < step + 1e-4 * fabs(expected))) {
        printf("gives %g, not %g\n", (double)given, expected);
        exit(1);
    }
}

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
    return (uint32_t)(top - p) * 4u <= FRAME_OF_MEASURE ? 0 : (uint32_t)(top - p) * 4u - FRAME_OF_MEASURE;
}

static int ascending(const void *a, const void *b)
{
    uint32_t x = *(const uint32_t *)a, y = *(const uint32_t *)b;
    return (x > y) - (x < y);
}

static uint32_t count(const uint32_t (*cases)[WORDS], uint32_t n, int is_usual)
{
    static uint32_t counts[MOST];
    uint32_t stack = 0, taken = 0, k;

    for (k = 0; k < n; k++) {
        struct call call = prepared(cases[k]);
        uint32_t used, status = measure(&call);
#ifdef BARE
        result = call.given;
        status = 0;
#endif
        if ((uint16_t)status != 0 && !is_usual) {
            continue; /* rounded to f32 it may be out of its range */
        }
        if ((uint16_t)status != 0) {
            printf("case %u has status %u\n", (unsigned)k, (unsigned)(uint16_t)status);
            exit(1);
        }
        if (is_usual) {
            check(cases[k], result);
        }
        counts[taken++] = counted(&call);
        used = stack_of(prepared(cases[k]));
        stack = used > stack ? used : stack;
    }
    if (taken < n / 2) {
        printf("only %u of %u cases are taken", (unsigned)taken, (unsigned)n);
        exit(1);
    }
    qsort(counts, taken, sizeof counts[0], ascending);
    printf(" %u %u", (unsigned)counts[taken / 2], (unsigned)counts[taken - 1]);
    return stack;
}

int main(void)
{
    uint32_t stack, more;

    verify();
    stack = count(usual, sizeof usual / sizeof usual[0], 1);
#ifndef BY_HAND
    more = count(whole, sizeof whole / sizeof whole[0], 0);
    stack = more > stack ? more : stack;
#else
    (void)more;
    (void)whole;
#endif
    printf(" %u\n", (unsigned)stack);
    return 0;
}
