/*
 * Counts the instructions of every fixed function of the registry on an emulated Cortex-M0: the median over usual
 * telescopes, and the worst over these and the whole types. One instruction of the emulator (icount shift 6, 64 ns) is
 * 1.024 ticks of SysTick (62.5 ns).
 */
#include <stdint.h>
#include <stdio.h>

#define FIELDSTOP_NO_FLOAT
#include "fieldstop.h"
#include "draw.h"

#define HAS_ROW(i) 1
enum { CASES = 1024, USUAL = CASES / 2 };

static volatile uint32_t *const systick = (volatile uint32_t *)0xE000E010;
static uint16_t usual[USUAL];
static uint16_t count;
static uint32_t worst, empty;

static uint32_t ticks(void)
{
    return systick[2];
}

static uint32_t instructions(uint32_t before, uint32_t after)
{
    return (((before - after) & 0xFFFFFFu) * 1000u + 512u) / 1024u;
}

static void begin(void)
{
    state = 2463534242u;
    count = 0;
    worst = 0;
}

static void add(uint16_t i, uint32_t spent)
{
    uint16_t place;

    spent = spent > empty ? spent - empty : 0u;
    if (spent > worst) {
        worst = spent;
    }
    if ((i & 1u) == 0u) {
        for (place = count++; place > 0u && usual[place - 1u] > spent; place--) {
            usual[place] = usual[place - 1u];
        }
        usual[place] = (uint16_t)spent;
    }
}

static void end(const char *name)
{
    printf("%-28s %5u %5u\n", name, count > 0u ? (unsigned)usual[count / 2u] : 0u, (unsigned)worst);
}

#define ROW(name, draws, call)                            \
    static void run_##name(void)                          \
    {                                                     \
        uint32_t a[8];                                    \
        uint16_t i;                                       \
                                                          \
        begin();                                          \
        for (i = 0; i < CASES; i++) {                     \
            uint32_t result = 77u, before, after;         \
            uint8_t n = 0;                                \
            fieldstop_status status;                      \
                                                          \
            draws before = ticks();                       \
            status = call;                                \
            after = ticks();                              \
            if (status == 0) {                            \
                add(i, instructions(before, after));      \
            }                                             \
        }                                                 \
        end(#name);                                       \
    }
#include "rows.h"
#undef ROW

int main(void)
{
    uint32_t before, after;

    systick[1] = 0xFFFFFFu;
    systick[2] = 0u;
    systick[0] = 5u;
    while (ticks() == 0u) {
    }
    before = ticks();
    after = ticks();
    empty = instructions(before, after);
#define ROW(name, draws, call) run_##name();
#include "rows.h"
    return 0;
}
