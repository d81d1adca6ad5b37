/* The screen by direct calls of the library. */
#include "fieldstop.h"
#include "screen.h"

static const char labels[4][20] PROGMEM __attribute__((aligned(4))) = {
    "Magnification", "True field   ", "Exit pupil   ", "Resolution   "};
enum { AT = 13, WIDTH = 7 };

static uint32_t magnification, field, pupil, resolution;

uint32_t direct_compute(const struct screen_input *in)
{
    uint32_t refused = fieldstop_magnification_fx(in->focal_length, in->eyepiece, &magnification);
    refused |= fieldstop_true_field_from_stop_fx(in->field_stop, in->focal_length, &field);
    refused |= fieldstop_exit_pupil_fx(in->aperture, in->focal_length, in->eyepiece, &pupil);
    return refused | fieldstop_rayleigh_limit_fx(in->aperture, 550, &resolution);
}

uint32_t direct_text(void)
{
    const fieldstop_text_style *style = fieldstop_text_style_ascii();
    uint32_t refused;
    uint16_t n;

    memcpy_P(screen_lines, labels, sizeof screen_lines);
    refused = fieldstop_text_magnification(magnification, 1, style, WIDTH, screen_lines[0] + AT, WIDTH, &n);
    refused |= fieldstop_text_angle(field, FIELDSTOP_ANGLE_BY_SIZE, 0, style, WIDTH, screen_lines[1] + AT, WIDTH, &n);
    refused |= fieldstop_text_length_mm(pupil, 1, style, WIDTH, screen_lines[2] + AT, WIDTH, &n);
    return refused | fieldstop_text_arcseconds(resolution, 2, style, WIDTH, screen_lines[3] + AT, WIDTH, &n);
}
