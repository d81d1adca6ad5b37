/* Counts a readout written by hand in float, over the usual telescopes of CASES. NAME is its stem. */
#include <avr/pgmspace.h>
#define static static PROGMEM
#include CASES
#undef static
#include "measure.h"
#include <math.h>

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

/* By hand is right too, to a step of the fixed result and a part in ten thousand. */
static void check(uint8_t k, const struct call *call)
{
    uint32_t word = pgm_read_dword(&usual[k][ARGUMENTS]), bits = (uint32_t)call->status << 16 | call->below;
    float step, expected = pgm_read_byte(is_signed + ARGUMENTS) ? (float)(int32_t)word : (float)word, given;

    memcpy_P(&step, steps + ARGUMENTS, sizeof step);
    step = 1 / step;
    expected *= step;
    memcpy(&given, &bits, sizeof given);
    if (!(fabs(given - expected) < step + 1e-4f * fabs(expected))) {
        print_stored(PSTR("by hand another result in case "));
        print_number(k);
        end(WRONG);
    }
}

int main(void)
{
    uint16_t stack = 0;
    uint8_t k;

    verify();
    for (k = 0; k < N; k++) {
        struct call call = prepared(k);
        measure(&call);
        check(k, &call);
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
