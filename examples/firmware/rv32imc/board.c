/*
 * A RISC-V board: a serial port of the 16550 kind, as QEMU's machine `virt` has it, and what such a part does from reset to
 * main. There is no C library, so the four functions that compilers ask for are here as well.
 */
#include "../board.h"
#include <stddef.h>
#include <stdint.h>

#define UART(offset) (*(volatile uint8_t *)(0x10000000u + (offset)))
enum { DATA = 0, LINE_STATUS = 5, RECEIVED = 0x01, MAY_SEND = 0x20 };

void board_start(void)
{
}

void board_send(char c)
{
    while ((UART(LINE_STATUS) & MAY_SEND) == 0) {
    }
    UART(DATA) = (uint8_t)c;
}

char board_button(void)
{
    return (UART(LINE_STATUS) & RECEIVED) != 0 ? (char)UART(DATA) : 0;
}

void board_off(void)
{
    /* The machine's own way to end. */
    *(volatile uint32_t *)0x100000u = 0x5555;
    for (;;) {
    }
}

extern uint32_t bss_start[], bss_end[];
extern int main(void);
void begin(void);

void begin(void)
{
    volatile uint32_t *to;

    /* All of the image is in RAM already, so nothing is copied. */
    for (to = bss_start; to < bss_end; to++) {
        *to = 0;
    }
    main();
    board_off();
}

__asm__(".section .start, \"ax\"\n.globl start\nstart:\n"
        ".option push\n.option norelax\nla gp, __global_pointer$\n.option pop\n"
        "la sp, stack_top\nj begin\n.text\n");

void *memcpy(void *restrict to, const void *restrict from, size_t count)
{
    volatile uint8_t *at = to;
    const uint8_t *source = from;

    while (count-- > 0) {
        *at++ = *source++;
    }
    return to;
}

void *memmove(void *to, const void *from, size_t count)
{
    volatile uint8_t *at = to;
    const uint8_t *source = from;

    if (at <= source) {
        return memcpy(to, from, count);
    }
    while (count-- > 0) {
        at[count] = source[count];
    }
    return to;
}

void *memset(void *to, int value, size_t count)
{
    volatile uint8_t *at = to;

    while (count-- > 0) {
        *at++ = (uint8_t)value;
    }
    return to;
}

int memcmp(const void *left, const void *right, size_t count)
{
    const uint8_t *a = left, *b = right;

    for (; count > 0; count--, a++, b++) {
        if (*a != *b) {
            return *a < *b ? -1 : 1;
        }
    }
    return 0;
}
