/* The screen by hand: float formulas, and snprintf with %f, or the numbers scaled and newlib's snprintf for integers. */
#include <math.h>
#include <stdio.h>

#include "screens.h"

#define ALONE __attribute__((noinline))

char by_hand_lines[LINES][COLUMNS + 1];

struct float_values {
    float magnification, true_field_deg, exit_pupil_mm, resolution_arcsec;
};

static ALONE uint16_t float_compute(const void *equipment, void *values)
{
    const struct float_equipment *e = equipment;
    struct float_values *v = values;

    v->magnification = e->focal_length_mm / e->eyepiece_mm;
    v->true_field_deg = 114.591559f * atanf(0.5f * e->field_stop_mm / e->focal_length_mm);
    v->exit_pupil_mm = e->aperture_mm * e->eyepiece_mm / e->focal_length_mm;
    v->resolution_arcsec = 0.251575f * e->wavelength_nm / e->aperture_mm;
    return 0;
}

uint16_t percent_f_compute(const void *equipment, void *values)
{
    return float_compute(equipment, values);
}

uint16_t scaled_compute(const void *equipment, void *values)
{
    return float_compute(equipment, values);
}

ALONE uint16_t percent_f_text(const void *values)
{
    const struct float_values *v = values;
    int seconds = (int)(v->true_field_deg * 3600.0f + 0.5f);

    snprintf(by_hand_lines[0], COLUMNS + 1, "Magnification%6.1fx", (double)v->magnification);
    if (seconds < 3600) {
        snprintf(by_hand_lines[1], COLUMNS + 1, "True field   %3d'%02d\"", seconds / 60, seconds % 60);
    } else {
        int minutes = (int)(v->true_field_deg * 60.0f + 0.5f);
        snprintf(by_hand_lines[1], COLUMNS + 1, "True field   %3dd%02d'", minutes / 60, minutes % 60);
    }
    snprintf(by_hand_lines[2], COLUMNS + 1, "Exit pupil   %4.1f mm", (double)v->exit_pupil_mm);
    snprintf(by_hand_lines[3], COLUMNS + 1, "Resolution   %6.2f\"", (double)v->resolution_arcsec);
    return 0;
}

ALONE uint16_t scaled_text(const void *values)
{
    const struct float_values *v = values;
    int tenths = (int)(v->magnification * 10.0f + 0.5f);
    int seconds = (int)(v->true_field_deg * 3600.0f + 0.5f);
    int hundredths;

    sniprintf(by_hand_lines[0], COLUMNS + 1, "Magnification%4d.%dx", tenths / 10, tenths % 10);
    if (seconds < 3600) {
        sniprintf(by_hand_lines[1], COLUMNS + 1, "True field   %3d'%02d\"", seconds / 60, seconds % 60);
    } else {
        int minutes = (int)(v->true_field_deg * 60.0f + 0.5f);
        sniprintf(by_hand_lines[1], COLUMNS + 1, "True field   %3dd%02d'", minutes / 60, minutes % 60);
    }
    tenths = (int)(v->exit_pupil_mm * 10.0f + 0.5f);
    sniprintf(by_hand_lines[2], COLUMNS + 1, "Exit pupil   %2d.%d mm", tenths / 10, tenths % 10);
    hundredths = (int)(v->resolution_arcsec * 100.0f + 0.5f);
    sniprintf(by_hand_lines[3], COLUMNS + 1, "Resolution   %3d.%02d\"", hundredths / 100, hundredths % 100);
    return 0;
}

uint16_t percent_f_screen(const void *equipment)
{
    struct float_values values;

    float_compute(equipment, &values);
    return percent_f_text(&values);
}

uint16_t scaled_screen(const void *equipment)
{
    struct float_values values;

    float_compute(equipment, &values);
    return scaled_text(&values);
}
