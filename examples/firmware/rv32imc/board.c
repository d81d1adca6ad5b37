/*
 * A RISC-V board: the serial port of an NS16550 (its data sheet), as QEMU's machine `virt` has it. No C library, so what
 * the compiler asks for is here too.
 */
#include "../board.h"
#include <stddef.h>
#include <stdint.h>

#define UART(offset) (*(volatile uint8_t *)(0x10000000u + (offset)))
enum { DATA = 0, LINE_CONTROL = 3, LINE_STATUS = 5, EIGHT_BITS = 0x03, RECEIVED = 0x01, MAY_SEND = 0x20 };

void board_start(void)
{
    UART(LINE_CONTROL) = EIGHT_BITS;
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
    /* A word that ends the emulator. */
    *(volatile uint32_t *)0x100000 = 0x5555;
    for (;;) {
    }
}

void *memcpy(void *to, const void *from, size_t count);
void *memset(void *to, int value, size_t count);

/* Volatile, or the compiler makes of the loop a call of what it is in. */
void *memcpy(void *to, const void *from, size_t count)
{
    size_t i;

    for (i = 0; i < count; i++) {
        ((volatile uint8_t *)to)[i] = ((const uint8_t *)from)[i];
    }
    return to;
}

void *memset(void *to, int value, size_t count)
{
    size_t i;

    for (i = 0; i < count; i++) {
        ((volatile uint8_t *)to)[i] = (uint8_t)value;
    }
    return to;
}
