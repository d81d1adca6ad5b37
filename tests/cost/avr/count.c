/* Counts one fixed function. CASES names the file of arguments and results that tests/functions/cost_cases.rs wrote. */
#include <avr/pgmspace.h>
#define static static PROGMEM
#include CASES
#undef static
#include "measure.h"

extern void FUNCTION(void);

static uint32_t result;

static struct call prepared(const uint32_t *words)
{
    struct call call = call_of(FUNCTION);
    uint8_t i;

    for (i = 0; i < ARGUMENTS; i++) {
        put_argument(&call, pgm_read_dword(words + i), pgm_read_byte(bytes + i));
    }
    put_argument(&call, (uint16_t)&result, 2);
    result = 0;
    return call;
}

static uint16_t stack;

static void count(const uint32_t (*cases)[WORDS], uint16_t n)
{
    uint16_t k;

    for (k = 0; k < n; k++) {
        struct call call = prepared(cases[k]);
        measure(&call);
        if (call.status != 0 || result != pgm_read_dword(&cases[k][ARGUMENTS])) {
            print_stored(PSTR("another result in case "));
            print_number(k);
            end(WRONG);
        }
    }
    GPIOR0 = 4;
    for (k = 0; k < n; k += 4) {
        struct call call = prepared(cases[k]);
        uint16_t used = stack_of(&call);
        stack = used > stack ? used : stack;
    }
}

int main(void)
{
    verify();
    count(usual, sizeof usual / sizeof usual[0]);
    count(whole, sizeof whole / sizeof whole[0]);
    print(' ');
    print_number(stack);
    print('\n');
    end(RIGHT);
    return 0;
}
