/* The C++ header at work; gives 0 where all is right. */
#include "fieldstop.hpp"

using namespace fieldstop::literals;
using fieldstop::micrometres;

constexpr micrometres aperture = 187500_um;
constexpr micrometres focal_length = fieldstop::convert<micrometres>(1130_mm).value();
constexpr micrometres eyepiece(12500);

static_assert(focal_length.count() == 1130000, "millimetres are a thousand micrometres");
static_assert(fieldstop::q16(1.5_q16).count() == 98304, "a Q16.16 with a point");
static_assert(fieldstop::convert<fieldstop::milliarcseconds>(fieldstop::microarcseconds(1500)).value().count() == 2,
              "to nearest");
static_assert(fieldstop::convert<fieldstop::nanometres>(focal_length).value().count() == 1130000000, "fits");
static_assert(!fieldstop::convert<fieldstop::nanometres>(fieldstop::micrometres(5000000)), "does not fit");
static_assert(fieldstop::convert<micrometres>(fieldstop::millimetres_f64(1.2345678)).value().count() == 1235, "to nearest");
static_assert(fieldstop::convert<micrometres>(fieldstop::millimetres_f64(-1.0)).status().cause() ==
                  fieldstop::cause_number::overflow,
              "no negative aperture");
static_assert(fieldstop::millimagnitudes(-1460_mmag).count() == -1460, "magnitudes have a sign");
static_assert(eyepiece < focal_length && eyepiece != focal_length && eyepiece >= 12500_um, "compared");

constexpr fieldstop::telescope telescope = fieldstop::telescope()
                                               .with_aperture(aperture)
                                               .with_focal_length(focal_length)
                                               .with_obstruction(47000_um)
                                               .with_amplification(1.0_q16)
                                               .with_throughput(0.82_q16);
static_assert(telescope.focal_length() == focal_length && telescope.c().obstruction_um == 47000, "member by member");

int main()
{
    int wrong = 0;

    const auto magnification = fieldstop::magnification_fx(focal_length, eyepiece);
    wrong += !magnification || magnification.value() != 90.4_q16;

    /* No eyepiece: told by cause and position, and the other value serves. */
    const auto none = fieldstop::magnification_fx(focal_length, 0_um);
    wrong += none.ok() || none.status().cause() != fieldstop::cause_number::zero || none.status().argument() != 2;
    wrong += none.value_or(1.0_q16) != 1.0_q16 || none.status().text()[0] == '\0';

    wrong += fieldstop::amplification_fx(-120000_um, 60000_um).value_or(0.0_q16) != 1.5_q16;

    wrong += !fieldstop::telescope_check(telescope).ok();
    const fieldstop::status bad = fieldstop::telescope_check(telescope.with_aperture(0_um));
    wrong += bad.ok() || bad.argument() != 1;

    const auto seen = fieldstop::visual_readout_compute(
        telescope, fieldstop::eyepiece().with_focal_length(37000_um).with_field_stop(43200_um),
        fieldstop::observer().with_wavelength(550_nm), fieldstop::visual_all);
    wrong += !seen || seen.value().magnification().value_or(0.0_q16).count() != 2001505;
    if (seen) {
        /* Nothing is known of the eye. */
        wrong += seen.value().lowest_magnification().status().cause() != fieldstop::cause_number::undefined;
        char line[20];
        const auto length =
            fieldstop::text_visual_line(seen.value(), fieldstop::text_visual_labels(), fieldstop::text_style_ascii(), 20, 1, line);
        const char expected[] = "True field     2d11'";
        wrong += length.value_or(0) != 20;
        for (int i = 0; i < 20; ++i) {
            wrong += line[i] != expected[i];
        }
        char few[3];
        wrong += fieldstop::text_magnification(magnification.value_or(0.0_q16), 1, fieldstop::text_style_ascii(), 0, few)
                     .status()
                     .cause() != fieldstop::cause_number::no_room;
    }
#ifndef FIELDSTOP_NO_FLOAT
    const auto single = fieldstop::magnification_f32(1130.0_mm, 12.5_mm);
    wrong += !single || single.value() < 90.39F || single.value() > 90.41F;
    const auto pupil = fieldstop::exit_pupil_f32(187.5_mm, 1130.0_mm, 12.5_mm);
    wrong += !pupil || pupil.value() < fieldstop::millimetres_f32(2.07F) || pupil.value() > 2.08_mm;
#endif
    wrong += fieldstop::version() != static_cast<uint32_t>(FIELDSTOP_VERSION);
    return wrong;
}
