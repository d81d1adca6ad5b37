/* What screen.c sends, by the C++ header. */
#include "fieldstop.hpp"

#include <stdint.h>

extern "C" {
#include "part.h"
}

using namespace fieldstop::literals;

static constexpr fieldstop::telescope telescope = fieldstop::telescope()
                                                      .with_aperture(178000_um)
                                                      .with_focal_length(1130000_um)
                                                      .with_obstruction(47000_um)
                                                      .with_amplification(1.0_q16)
                                                      .with_throughput(fieldstop::q16(54395));
static constexpr fieldstop::eyepiece eyepiece =
    fieldstop::eyepiece().with_focal_length(28000_um).with_field_stop(33500_um);
static constexpr fieldstop::observer observer = fieldstop::observer()
                                                    .with_naked_eye(5400_mmag)
                                                    .with_eye_pupil(6500_um)
                                                    .with_eye_resolution(fieldstop::milliarcseconds(120000))
                                                    .with_seeing(fieldstop::microarcseconds(2200000))
                                                    .with_wavelength(550_nm);

int main()
{
    const auto readout = fieldstop::visual_readout_compute(telescope, eyepiece, observer, fieldstop::visual_all);
    for (uint8_t row = 0; row < 4 && readout; row++) {
        char line[20];
        const auto length = fieldstop::text_visual_line(readout.value(), fieldstop::text_visual_labels(),
                                                        fieldstop::text_style_ascii(), sizeof line, row, line);
        for (uint16_t i = 0; length && i < length.value(); i++) {
            part_put(line[i]);
        }
        part_put('\n');
    }
    const auto magnification = fieldstop::magnification_f32(fieldstop::millimetres_f32(1130.0f), fieldstop::millimetres_f32(28.25f));
    if (!magnification || magnification.value() != 40.0f) {
        part_put('!');
    }
    return part_end();
}
