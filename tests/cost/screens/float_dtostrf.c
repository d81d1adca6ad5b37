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

uint32_t float_dtostrf_text(void)
{
    unsigned minutes = (unsigned)(shown.field * 60.0f + 0.5f);

    memcpy_P(screen_lines, labels, sizeof screen_lines);
    put(screen_lines[0] + 13, shown.magnification, 6, 1);
    put(screen_lines[1] + 13, (float)(minutes / 60), 3, 0);
    screen_lines[1][17] = (char)('0' + minutes % 60 / 10);
    screen_lines[1][18] = (char)('0' + minutes % 10);
    put(screen_lines[2] + 13, shown.pupil, 4, 1);
    put(screen_lines[3] + 13, shown.resolution, 6, 2);
    return 0;
}
