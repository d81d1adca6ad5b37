/*
 * Counts one function of text or setup, NAME: with what usual telescopes of CASES give it, and with numbers drawn from the
 * whole of their types.
 */
#include <avr/pgmspace.h>
#define static static PROGMEM
#include CASES
#undef static
#include "measure.h"
#include "fieldstop.h"
#include "../calls.h"

#define JOIN(a, b) a##b
#define JOINED(a, b) JOIN(a, b)

static uint16_t stack;

static void count(uint8_t whole)
{
    uint16_t n = whole ? 2 * N : N, k;

    is_whole = whole;
    for (k = 0; k < n; k++) {
        struct call call = call_of((void (*)(void))(uintptr_t)JOINED(fieldstop_, NAME));
        uint16_t used;

        prepare(k);
        JOINED(arguments_of_, NAME)(&call);
        if (k % 4 == 0) {
            struct call again = call;
            used = stack_of(&again);
            stack = used > stack ? used : stack;
            prepare(k);
        }
        measure(&call);
        if (!GIVES_POINTER && call.status != 0) {
            print_stored(PSTR("status "));
            print_number(call.status);
            end(WRONG);
        }
    }
    GPIOR0 = 4;
}

int main(void)
{
    verify();
    count(0);
    count(1);
    print(' ');
    print_number(stack);
    print('\n');
    end(RIGHT);
    return 0;
}
