/*
 * What a telescope and an eyepiece show, on the serial port; send what loop() would send to your display. Equipment and place
 * are invented: put your own in.
 *
 * Never look at or near the Sun through a telescope without a full-aperture filter made for it.
 */
#include <fieldstop.h>

/* Micrometres, and Q16.16 for numbers: 65536 is 1. Zero is "not known". */
static const fieldstop_telescope telescope = {178000, 1130000, 47000, 65536, 54395};
static const fieldstop_eyepiece eyepiece = {28000, 33500, 0, 0, {0, 0, 0}};
static const fieldstop_observer observer = {5400, 6500, 120000, 2200000, 550};

void setup()
{
    Serial.begin(9600);

    fieldstop_visual_readout readout;
    fieldstop_status status = fieldstop_visual_readout_compute(&telescope, &eyepiece, &observer, 0xffffffffu, &readout);
    for (uint8_t row = 0; row < 4 && status == 0; row++) {
        char line[20];
        uint16_t length;
        status = fieldstop_text_visual_line(&readout, fieldstop_text_visual_labels(), fieldstop_text_style_ascii(), sizeof line,
                                            row, line, sizeof line, &length);
        if (status == 0) {
            Serial.write((const uint8_t *)line, length);
            Serial.println();
        }
    }
    if (status != 0) {
        Serial.println(FIELDSTOP_CAUSE(status));
    }
}

void loop()
{
}
