/* Counts one way of making the screen, WAY, over the usual telescopes of CASES. */
#include <avr/pgmspace.h>
#define static static PROGMEM
#include CASES
#undef static
#include "measure.h"
#include "../screens/screen.h"

#define JOIN(a, b) a##b
#define HALF(way, half) JOIN(way, half)
#ifndef FIRST_LINE
#define FIRST_LINE 20 /* characters of it that must be right */
#endif
enum { APERTURE, FOCAL_LENGTH, EYEPIECE, FIELD_STOP, N = sizeof usual / sizeof usual[0] };

static struct screen_input in;

static void total(void)
{
    GPIOR0 = 1;
    HALF(WAY, _compute)(&in);
    HALF(WAY, _text)();
    GPIOR0 = 2;
}

static void set(uint8_t k)
{
    in.aperture = pgm_read_dword(&usual[k][APERTURE]);
    in.focal_length = pgm_read_dword(&usual[k][FOCAL_LENGTH]);
    in.eyepiece = pgm_read_dword(&usual[k][EYEPIECE]);
    in.field_stop = pgm_read_dword(&usual[k][FIELD_STOP]);
    set_millimetres(&in);
}

static struct call half(uint8_t is_text)
{
    struct call call = call_of((void (*)(void))(is_text ? (uintptr_t)HALF(WAY, _text) : (uintptr_t)HALF(WAY, _compute)));
    put_argument(&call, (uint16_t)&in, 2);
    return call;
}

/*
 * Lines that are not those of direct calls; a few are owed to the rounding of float. The library's pages write the
 * magnification, the first line, with decimals of their own.
 */
static uint8_t other_lines(void)
{
    static char shown[sizeof screen_lines];
    uint8_t other = 0, i;

    HALF(WAY, _compute)(&in);
    HALF(WAY, _text)();
    memcpy(shown, screen_lines, sizeof shown);
    memset(screen_lines, 0, sizeof screen_lines);
    if (direct_compute(&in) != 0 || direct_text() != 0) {
        return 4;
    }
    for (i = 0; i < 4; i++) {
        other += memcmp(shown + 20 * i, screen_lines[i], i == 0 ? FIRST_LINE : 20) != 0;
    }
    return other;
}

int main(void)
{
    uint16_t stack = 0, wrong = 0;
    uint8_t k, is_text;

    verify();
    for (is_text = 0; is_text < 2; is_text++) {
        for (k = 0; k < N; k++) {
            struct call call;
            set(k);
            HALF(WAY, _compute)(&in);
            call = half(is_text);
            measure(&call);
            if (call.status != 0) {
                print_stored(PSTR("a call was refused"));
                end(WRONG);
            }
        }
        GPIOR0 = 4;
        for (k = 0; k < N; k += 4) {
            struct call call;
            uint16_t used;
            set(k);
            HALF(WAY, _compute)(&in);
            call = half(is_text);
            used = stack_of(&call);
            stack = used > stack ? used : stack;
        }
    }
    for (k = 0; k < N; k++) {
        set(k);
        total();
    }
    GPIOR0 = 4;
    for (k = 0; k < N; k++) {
        set(k);
        wrong += other_lines();
    }
    if (wrong > N / 16) {
        print_number(wrong);
        print_stored(PSTR(" lines are wrong"));
        end(WRONG);
    }
    print(' ');
    print_number(stack);
    print('\n');
#ifdef SHOW
    for (k = 0; k < 80; k++) {
        print(screen_lines[k / 20][k % 20]);
        if (k % 20 == 19) {
            print('\n');
        }
    }
#endif
    end(RIGHT);
    return 0;
}
