/* The screen with the library. */
#include <string.h>

#include "fieldstop.h"
#include "screens.h"

#define ALONE __attribute__((noinline))

char screen_lines[LINES][COLUMNS];

struct direct_values {
    uint32_t magnification_q16, true_field_mas, exit_pupil_um, resolution_uas;
};

ALONE uint16_t direct_compute(const void *equipment, void *values)
{
    const struct direct_equipment *e = equipment;
    struct direct_values *v = values;
    fieldstop_status status;

    status = fieldstop_magnification_fx(e->focal_length_um, e->eyepiece_um, &v->magnification_q16);
    status |= fieldstop_true_field_from_stop_fx(e->field_stop_um, e->focal_length_um, &v->true_field_mas);
    status |= fieldstop_exit_pupil_fx(e->aperture_um, e->focal_length_um, e->eyepiece_um, &v->exit_pupil_um);
    status |= fieldstop_rayleigh_limit_fx(e->aperture_um, e->wavelength_nm, &v->resolution_uas);
    return status;
}

ALONE uint16_t direct_text(const void *values)
{
    const struct direct_values *v = values;
    const fieldstop_text_style *style = fieldstop_text_style_ascii();
    fieldstop_status status;
    uint16_t n;

    memcpy(screen_lines[0], "Magnification", 13);
    status = fieldstop_text_magnification(v->magnification_q16, 1, style, 7, screen_lines[0] + 13, 7, &n);
    memcpy(screen_lines[1], "True field   ", 13);
    status |= fieldstop_text_angle(v->true_field_mas, FIELDSTOP_ANGLE_BY_SIZE, 0, style, 7, screen_lines[1] + 13, 7, &n);
    memcpy(screen_lines[2], "Exit pupil   ", 13);
    status |= fieldstop_text_length_mm(v->exit_pupil_um, 1, style, 7, screen_lines[2] + 13, 7, &n);
    memcpy(screen_lines[3], "Resolution   ", 13);
    status |= fieldstop_text_arcseconds(v->resolution_uas, 2, style, 7, screen_lines[3] + 13, 7, &n);
    return status;
}

uint16_t direct_screen(const void *equipment)
{
    struct direct_values values;
    fieldstop_status status = direct_compute(equipment, &values);

    return status != 0 ? status : direct_text(&values);
}

struct setup_equipment {
    fieldstop_telescope telescope;
    fieldstop_eyepiece eyepiece;
    fieldstop_observer observer;
};

ALONE uint16_t setup_compute(const void *equipment, void *values)
{
    const struct setup_equipment *e = equipment;

    return fieldstop_visual_readout_compute(&e->telescope, &e->eyepiece, &e->observer,
                                            FIELDSTOP_VISUAL_MAGNIFICATION | FIELDSTOP_VISUAL_TRUE_FIELD
                                                | FIELDSTOP_VISUAL_EXIT_PUPIL | FIELDSTOP_VISUAL_RESOLUTION,
                                            values);
}

ALONE uint16_t setup_text(const void *values)
{
    const char *const *labels = fieldstop_text_visual_labels();
    const fieldstop_text_style *style = fieldstop_text_style_ascii();
    fieldstop_status status = 0;
    uint16_t n;
    uint8_t i;

    for (i = 0; i < LINES; i++) {
        status |= fieldstop_text_visual_line(values, labels, style, COLUMNS, i, screen_lines[i], COLUMNS, &n);
    }
    return status;
}

uint16_t setup_screen(const void *equipment)
{
    fieldstop_visual_readout readout;
    fieldstop_status status = setup_compute(equipment, &readout);

    return status != 0 ? status : setup_text(&readout);
}
