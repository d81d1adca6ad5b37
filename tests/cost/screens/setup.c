/* The screen through the library's equipment structs and pages. */
#include "fieldstop.h"
#include "screen.h"

static fieldstop_telescope telescope = {0, 0, 0, 65536, 0};
static fieldstop_eyepiece eyepiece;
static fieldstop_observer observer = {0, 0, 0, 0, 550};
static fieldstop_visual_readout readout;

uint32_t setup_compute(const struct screen_input *in)
{
    telescope.aperture_um = in->aperture;
    telescope.focal_length_um = in->focal_length;
    eyepiece.focal_length_um = in->eyepiece;
    eyepiece.field_stop_um = in->field_stop;
    return fieldstop_visual_readout_compute(&telescope, &eyepiece, &observer,
                                            FIELDSTOP_VISUAL_MAGNIFICATION | FIELDSTOP_VISUAL_TRUE_FIELD
                                                | FIELDSTOP_VISUAL_EXIT_PUPIL | FIELDSTOP_VISUAL_RESOLUTION,
                                            &readout);
}

uint32_t setup_text(void)
{
    uint32_t refused = 0;
    uint16_t n;
    uint8_t i;

    for (i = 0; i < 4; i++) {
        refused |= fieldstop_text_visual_line(&readout, fieldstop_text_visual_labels(), fieldstop_text_style_ascii(),
                                              20, i, screen_lines[i], 20, &n);
    }
    return refused;
}
