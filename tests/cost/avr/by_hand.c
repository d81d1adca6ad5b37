/* Counts a readout written by hand in float, over the usual telescopes of CASES. NAME is its stem. */
#include <avr/pgmspace.h>
#define static static PROGMEM
#include CASES
#undef static
#include "measure.h"

#define JOIN(a, b) a##b
#define TYPED(name, type) JOIN(name, type)
extern void TYPED(NAME, _float)(void);
enum { N = sizeof usual / sizeof usual[0] };

static struct call prepared(uint8_t k)
{
    struct call call = call_of(TYPED(NAME, _float));
    uint8_t i;

    for (i = 0; i < ARGUMENTS; i++) {
        uint32_t word = pgm_read_dword(&usual[k][i]), bits;
        float step, value = pgm_read_byte(is_signed + i) ? (float)(int32_t)word : (float)word;
        memcpy_P(&step, steps + i, sizeof step);
        value /= step;
        memcpy(&bits, &value, sizeof bits);
        put_argument(&call, bits, 4);
    }
    return call;
}

int main(void)
{
    uint16_t stack = 0;
    uint8_t k;

    verify();
    for (k = 0; k < N; k++) {
        struct call call = prepared(k);
        measure(&call);
    }
    GPIOR0 = 4;
    for (k = 0; k < N; k += 4) {
        struct call call = prepared(k);
        uint16_t used = stack_of(&call);
        stack = used > stack ? used : stack;
    }
    print(' ');
    print_number(stack);
    print('\n');
    end(RIGHT);
    return 0;
}
