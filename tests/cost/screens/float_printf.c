/* The screen by hand: float, and snprintf with %f. */
#include "by_hand.h"
#include <stdio.h>
#include <string.h>

static struct by_hand shown;

uint32_t float_printf_compute(const struct screen_input *in)
{
    shown = by_hand(in);
    return 0;
}

uint32_t float_printf_text(void)
{
    int minutes = (int)(shown.field * 60.0f + 0.5f);
    char text[4][24];
    int i;

    snprintf(text[0], sizeof text[0], "Magnification%6.1fx", (double)shown.magnification);
    snprintf(text[1], sizeof text[1], "True field   %3dd%02d'", minutes / 60, minutes % 60);
    snprintf(text[2], sizeof text[2], "Exit pupil   %4.1f mm", (double)shown.pupil);
    snprintf(text[3], sizeof text[3], "Resolution   %6.2f\"", (double)shown.resolution);
    for (i = 0; i < 4; i++) {
        memcpy(screen_lines[i], text[i], 20);
    }
    return 0;
}
