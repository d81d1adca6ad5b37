/* Sends the four lines that a telescope and an eyepiece show. */
#include "fieldstop.h"
#include "part.h"

static const fieldstop_telescope telescope = {178000, 1130000, 47000, 65536, 54395};
static const fieldstop_eyepiece eyepiece = {28000, 33500, 0, 0, {0, 0, 0}};
static const fieldstop_observer observer = {5400, 6500, 120000, 2200000, 550};

int main(void)
{
    fieldstop_visual_readout readout;
    fieldstop_status status = fieldstop_visual_readout_compute(&telescope, &eyepiece, &observer, 0xffffffffu, &readout);
    float magnification = 0.0f;
#ifndef __AVR__
    double in_double = 0.0;
#endif
    uint8_t row;

    for (row = 0; row < 4 && status == 0; row++) {
        char line[20];
        uint16_t length, i;

        status = fieldstop_text_visual_line(&readout, fieldstop_text_visual_labels(), fieldstop_text_style_ascii(), sizeof line,
                                            row, line, sizeof line, &length);
        for (i = 0; i < length && status == 0; i++) {
            part_put(line[i]);
        }
        part_put('\n');
    }
    /* A float across the door: the ABI is right where it comes back. */
    if (status == 0) {
        status = fieldstop_magnification_f32(1130.0f, 28.25f, &magnification);
    }
    if (status != 0 || magnification != 40.0f) {
        part_put('!');
    }
#ifndef __AVR__
    status = fieldstop_magnification_f64(1130.0, 28.25, &in_double);
    if (status != 0 || in_double != 40.0) {
        part_put('?');
    }
#endif
    return part_end();
}
