/* The screen by hand: float, scaled to integers, and an snprintf of integers only. */
#include "by_hand.h"
#include <stdio.h>

#ifndef INTEGER_SNPRINTF
#define INTEGER_SNPRINTF sniprintf /* newlib's */
#endif

enum { ROOM = sizeof lines_of_strings[0] };

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
    int seconds = (int)(shown.field * 3600.0f + 0.5f);

    INTEGER_SNPRINTF(lines_of_strings[0], ROOM, "Magnification%4d.%dx", magnification / 10, magnification % 10);
    if (seconds < 3600) {
        INTEGER_SNPRINTF(lines_of_strings[1], ROOM, "True field   %3d'%02d\"", seconds / 60, seconds % 60);
    } else {
        INTEGER_SNPRINTF(lines_of_strings[1], ROOM, "True field   %3dd%02d'", minutes / 60, minutes % 60);
    }
    INTEGER_SNPRINTF(lines_of_strings[2], ROOM, "Exit pupil   %2d.%d mm", pupil / 10, pupil % 10);
    INTEGER_SNPRINTF(lines_of_strings[3], ROOM, "Resolution   %3d.%02d\"", resolution / 100, resolution % 100);
    return 0;
}
