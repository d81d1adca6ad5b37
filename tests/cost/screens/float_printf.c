/* The screen by hand: float, and snprintf with %f. */
#include "by_hand.h"
#include <stdio.h>

enum { ROOM = sizeof lines_of_strings[0] };

static struct by_hand shown;

uint32_t float_printf_compute(const struct screen_input *in)
{
    shown = by_hand(in);
    return 0;
}

uint32_t float_printf_text(void)
{
    int seconds = (int)(shown.field * 3600.0f + 0.5f), minutes = (int)(shown.field * 60.0f + 0.5f);

    snprintf(lines_of_strings[0], ROOM, "Magnification%6.1fx", (double)shown.magnification);
    if (seconds < 3600) {
        snprintf(lines_of_strings[1], ROOM, "True field   %3d'%02d\"", seconds / 60, seconds % 60);
    } else {
        snprintf(lines_of_strings[1], ROOM, "True field   %3dd%02d'", minutes / 60, minutes % 60);
    }
    snprintf(lines_of_strings[2], ROOM, "Exit pupil   %4.1f mm", (double)shown.pupil);
    snprintf(lines_of_strings[3], ROOM, "Resolution   %6.2f\"", (double)shown.resolution);
    return 0;
}
