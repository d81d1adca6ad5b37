/* The screen by hand on AVR: float, and avr-libc's dtostrf. */
#include "by_hand.h"
#include <stdlib.h>

static const char labels[4][20] PROGMEM = {
    "Magnification      x", "True field      d  '", "Exit pupil        mm", "Resolution         \""};

static struct by_hand shown;

uint32_t float_dtostrf_compute(const struct screen_input *in)
{
    shown = by_hand(in);
    return 0;
}

/* Writes so many characters, and not the zero that dtostrf puts behind them. */
static void put(char *at, float value, signed char width, unsigned char decimals)
{
    char text[12];

    dtostrf((double)value, width, decimals, text);
    memcpy(at, text, (size_t)width);
}

static void put_two(char *at, uint8_t number)
{
    at[0] = (char)('0' + number / 10);
    at[1] = (char)('0' + number % 10);
}

uint32_t float_dtostrf_text(void)
{
    uint8_t is_small = shown.field < 3599.5f / 3600.0f;
    uint16_t field = (uint16_t)(shown.field * (is_small ? 3600.0f : 60.0f) + 0.5f), whole = field / 60;

    memcpy_P(screen_lines, labels, sizeof screen_lines);
    put(screen_lines[0] + 13, shown.magnification, 6, 1);
    if (whole < 100) {
        put_two(screen_lines[1] + 14, (uint8_t)whole);
        if (whole < 10) {
            screen_lines[1][14] = ' ';
        }
    } else {
        utoa(whole, screen_lines[1] + 13, 10);
    }
    screen_lines[1][16] = is_small ? '\'' : 'd';
    put_two(screen_lines[1] + 17, (uint8_t)(field - whole * 60));
    screen_lines[1][19] = is_small ? '"' : '\'';
    put(screen_lines[2] + 13, shown.pupil, 4, 1);
    put(screen_lines[3] + 13, shown.resolution, 6, 2);
    return 0;
}
