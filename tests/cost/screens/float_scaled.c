/* The screen by hand: float, scaled to integers, and an snprintf of integers only. */
#include "by_hand.h"
#include <stdio.h>
#include <string.h>

#ifndef INTEGER_SNPRINTF
#define INTEGER_SNPRINTF sniprintf /* newlib's */
#endif

static struct by_hand shown;

uint32_t float_scaled_compute(const struct screen_input *in)
{
    shown = by_hand(in);
    return 0;
}

uint32_t float_scaled_text(void)
{
    int magnification = (int)(shown.magnification * 10.0f + 0.5f), minutes = (int)(shown.field * 60.0f + 0.5f);
    int pupil = (int)(shown.pupil * 10.0f + 0.5f), resolution = (int)(shown.resolution * 100.0f + 0.5f);
    char text[4][24];
    int i;

    INTEGER_SNPRINTF(text[0], sizeof text[0], "Magnification%4d.%dx", magnification / 10, magnification % 10);
    INTEGER_SNPRINTF(text[1], sizeof text[1], "True field   %3dd%02d'", minutes / 60, minutes % 60);
    INTEGER_SNPRINTF(text[2], sizeof text[2], "Exit pupil   %2d.%d mm", pupil / 10, pupil % 10);
    INTEGER_SNPRINTF(text[3], sizeof text[3], "Resolution   %3d.%02d\"", resolution / 100, resolution % 100);
    for (i = 0; i < 4; i++) {
        memcpy(screen_lines[i], text[i], 20);
    }
    return 0;
}
