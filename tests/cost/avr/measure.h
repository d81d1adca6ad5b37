/*
 * Counts the cycles of whole calls on a simulated ATmega328P, from the call to the return with both, and paints the
 * stack. Counts are kept by the simulator.
 */
#ifndef MEASURE_H
#define MEASURE_H

#include <avr/io.h>
#include <avr/pgmspace.h>
#include <stdint.h>
#include <string.h>

/* Arguments as they lie in the registers r8 to r25. */
struct call {
    void (*function)(void);
    uint8_t registers[18];
    uint16_t status, below; /* r24 and r25, r22 and r23: of a float its upper half and its lower */
    uint8_t free; /* registers not used yet, from r8 on */
};

void measure(struct call *call);
void sled(void);

__asm__(".global measure\nmeasure:\n"
        "push r2\npush r3\npush r8\npush r9\npush r10\npush r11\npush r12\npush r13\npush r14\npush r15\npush r16\npush r17\n"
        "push r28\npush r29\n"
        "movw r28, r24\n"
        "ldd r30, Y+0\nldd r31, Y+1\n"
        "ldd r8, Y+2\nldd r9, Y+3\nldd r10, Y+4\nldd r11, Y+5\nldd r12, Y+6\nldd r13, Y+7\nldd r14, Y+8\nldd r15, Y+9\n"
        "ldd r16, Y+10\nldd r17, Y+11\nldd r18, Y+12\nldd r19, Y+13\nldd r20, Y+14\nldd r21, Y+15\nldd r22, Y+16\n"
        "ldd r23, Y+17\nldd r24, Y+18\nldd r25, Y+19\n"
        "ldi r26, 1\nout 0x1e, r26\n"
        "icall\n"
        "ldi r26, 2\nout 0x1e, r26\n"
        "std Y+20, r24\nstd Y+21, r25\nstd Y+22, r22\nstd Y+23, r23\n"
        "pop r29\npop r28\npop r17\npop r16\npop r15\npop r14\npop r13\npop r12\npop r11\npop r10\npop r9\npop r8\npop r3\npop r2\n"
        "ret\n"
        /* 100 cycles and the return. */
        ".global sled\nsled:\n.rept 100\nnop\n.endr\nret\n");
/* After the start and up to the end: what is not the call. */
enum { BESIDES = 2, ICALL_AND_RET = 7, FRAME_OF_MEASURE = 14 + 2 };

static inline void put_argument(struct call *call, uint32_t value, uint8_t size)
{
    call->free = (uint8_t)(call->free - ((size + 1u) & ~1u));
    memcpy(call->registers + call->free, &value, size);
}

static inline struct call call_of(void (*function)(void))
{
    struct call call = {function, {0}, 0, 0, 18};
    return call;
}

static inline void print(char c)
{
    GPIOR1 = (uint8_t)c;
}

static inline void print_number(uint16_t n)
{
    if (n >= 10) {
        print_number(n / 10);
    }
    print((char)('0' + n % 10));
}

static inline void print_stored(const char *text)
{
    char c;
    while ((c = (char)pgm_read_byte(text++)) != 0) {
        print(c);
    }
}

static inline void end(uint8_t how)
{
    GPIOR0 = how;
}
#define RIGHT 3
#define WRONG 6

/* The simulator gives a call without what stands beside it. Counts a run of known length from each place to its end. */
static inline void verify(void)
{
    uint8_t n;

    for (n = 0; n <= 100; n++) {
        struct call call = call_of((void (*)(void))((uintptr_t)sled + 100u - n));
        uint16_t counted;
        measure(&call);
        GPIOR0 = 5;
        counted = (uint16_t)(GPIOR1 | GPIOR2 << 8);
        if (counted != n + ICALL_AND_RET + BESIDES) {
            print_stored(PSTR("counted "));
            print_number(counted);
            print_stored(PSTR(" cycles for "));
            print_number((uint16_t)(n + ICALL_AND_RET));
            end(WRONG);
        }
    }
}

extern uint8_t __heap_start;

/* Bytes below the stack pointer of the call that it wrote to. */
static __attribute__((noinline)) uint16_t stack_of(struct call *call)
{
    volatile uint8_t *top = (volatile uint8_t *)SP, *p;

    for (p = &__heap_start; p <= top; p++) {
        *p = 0xA5;
    }
    measure(call);
    GPIOR0 = 5;
    for (p = &__heap_start; p <= top && *p == 0xA5; p++) {
    }
    return (uint16_t)(top - p) + 1 - FRAME_OF_MEASURE - 2;
}

#endif
