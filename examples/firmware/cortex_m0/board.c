/*
 * A Cortex-M0 board: the serial port of the nRF51 (its reference manual, UART), as QEMU's machine `microbit` has it, and
 * what such a part does from reset to main.
 */
#include "../board.h"
#include <stdint.h>

#define UART(offset) (*(volatile uint32_t *)(0x40002000u + (offset)))
enum { START_RX = 0x000, START_TX = 0x008, RX_READY = 0x108, TX_READY = 0x11C, ENABLE = 0x500, RX = 0x518, TX = 0x51C };

void board_start(void)
{
    UART(ENABLE) = 4;
    UART(START_RX) = 1;
    UART(START_TX) = 1;
}

void board_send(char c)
{
    UART(TX_READY) = 0;
    UART(TX) = (uint8_t)c;
    while (UART(TX_READY) == 0) {
    }
}

char board_button(void)
{
    if (UART(RX_READY) == 0) {
        return 0;
    }
    UART(RX_READY) = 0;
    return (char)UART(RX);
}

void board_off(void)
{
    /* Tells a debugger or the emulator that all is well (Arm's semihosting, SYS_EXIT). */
    register uint32_t operation __asm__("r0") = 0x18, reason __asm__("r1") = 0x20026;
    __asm__ volatile("bkpt #0xab" : : "r"(operation), "r"(reason) : "memory");
    for (;;) {
    }
}

extern uint32_t stack_top[], data_start[], data_end[], data_stored[], bss_start[], bss_end[];
extern int main(void);
void reset(void);

void reset(void)
{
    volatile uint32_t *to;
    const uint32_t *from = data_stored;

    for (to = data_start; to < data_end; to++) {
        *to = *from++;
    }
    for (to = bss_start; to < bss_end; to++) {
        *to = 0;
    }
    main();
    board_off();
}

static void fault(void)
{
    for (;;) {
    }
}

__attribute__((section(".vectors"), used)) static void *const vectors[16] = {
    stack_top, (void *)(uintptr_t)reset, (void *)(uintptr_t)fault, (void *)(uintptr_t)fault,
};
