/* The equipment structs and readouts from C: their layout, their checks, and that a readout holds what the calls give. */
#include <inttypes.h>
#include <stddef.h>
#include <stdio.h>

#include "fieldstop.h"

static int wrong = 0;

static void expect(int right, const char *what)
{
    if (!right) {
        printf("wrong: %s\n", what);
        wrong = 1;
    }
}

static void layout(void)
{
    printf("telescope %u, eyepiece %u, camera %u, observer %u, visual readout %u, camera readout %u bytes\n",
           (unsigned)sizeof(fieldstop_telescope), (unsigned)sizeof(fieldstop_eyepiece),
           (unsigned)sizeof(fieldstop_camera), (unsigned)sizeof(fieldstop_observer),
           (unsigned)sizeof(fieldstop_visual_readout), (unsigned)sizeof(fieldstop_camera_readout));
    expect(offsetof(fieldstop_telescope, throughput_q16) == 16, "telescope");
    expect(offsetof(fieldstop_eyepiece, mapping) == 12, "eyepiece");
    expect(offsetof(fieldstop_camera, rows) == 6 && offsetof(fieldstop_camera, binning) == 8, "camera");
    expect(offsetof(fieldstop_observer, wavelength_nm) == 16, "observer");
    expect(offsetof(fieldstop_visual_readout, surface_brightness_q16) == 52, "visual readout");
    expect(offsetof(fieldstop_camera_readout, pixels_per_fwhm_q16) == 40, "camera readout");
}

int main(void)
{
    const fieldstop_telescope telescope = {187500, 1130000, 47000, 117965, 53740};
    fieldstop_eyepiece eyepiece = {19000, 0, 66u * 3600000u, FIELDSTOP_EQUIDISTANT, {0, 0, 0}};
    const fieldstop_camera camera = {4100, 4128, 2772, 2, {0, 0, 0}};
    const fieldstop_observer observer = {5300, 6200, 180000, 2400000, 550};
    fieldstop_visual_readout seen;
    fieldstop_camera_readout taken;
    fieldstop_status status;
    uint32_t focal_length_um, value;

    layout();

    expect(fieldstop_telescope_check(&telescope) == 0, "telescope check");
    expect(fieldstop_camera_check(&camera) == 0, "camera check");
    expect(fieldstop_observer_check(&observer) == 0, "observer check");
    expect(fieldstop_eyepiece_check(&eyepiece) == 0, "eyepiece check");

    status = fieldstop_visual_readout_compute(&telescope, &eyepiece, &observer, FIELDSTOP_VISUAL_ALL, &seen);
    expect(status == 0 && seen.available == FIELDSTOP_VISUAL_ALL, "visual readout");
    status = fieldstop_amplified_focal_length_fx(telescope.focal_length_um, telescope.amplification_q16,
                                                 &focal_length_um);
    expect(status == 0 && seen.focal_length_um == focal_length_um, "focal length");
    status = fieldstop_true_field_equidistant_fx(eyepiece.apparent_field_mas, focal_length_um,
                                                 eyepiece.focal_length_um, &value);
    expect(status == 0 && seen.true_field_mas == value, "true field");
    printf("visual, facts 0x%04" PRIx32 ": %" PRIu32 " %" PRIu32 " %" PRIu32 " %" PRIu32 " %" PRIu32 " %" PRIu32 "\n",
           seen.facts, seen.focal_length_um, seen.focal_ratio_q16, seen.magnification_q16, seen.exit_pupil_um,
           seen.true_field_mas, seen.resolution_uas);
    printf("    %" PRIu32 " %" PRIu32 " %" PRIu32 " %" PRIu32 " %" PRId32 " %" PRIu32 "\n", seen.dawes_limit_uas,
           seen.lowest_magnification_q16, seen.resolving_magnification_q16, seen.effective_aperture_um,
           seen.limiting_magnitude_mmag, seen.surface_brightness_q16);

    status = fieldstop_camera_readout_compute(&telescope, &camera, &observer, FIELDSTOP_CAMERA_ALL, &taken);
    expect(status == 0 && taken.available == FIELDSTOP_CAMERA_ALL, "camera readout");
    status = fieldstop_frame_field_fx(camera.pixel_nm, camera.columns, focal_length_um, &value);
    expect(status == 0 && taken.frame_width_mas == value, "frame width");
    printf("camera, facts 0x%04" PRIx32 ": %" PRIu32 " %" PRIu32 " %" PRIu32 " %" PRIu32 " %" PRIu32 "\n",
           taken.facts, taken.focal_length_um, taken.focal_ratio_q16, taken.t_number_q16, taken.frame_width_mas,
           taken.frame_height_mas);
    printf("    %" PRIu32 " %" PRIu32 " %" PRIu32 " %" PRIu32 "\n", taken.pixel_scale_uas,
           taken.plate_scale_mas_per_mm, taken.star_fwhm_uas, taken.pixels_per_fwhm_q16);

    eyepiece.mapping = 2;
    status = fieldstop_eyepiece_check(&eyepiece);
    printf("eyepiece, member %u: %s\n", (unsigned)FIELDSTOP_ARGUMENT(status), fieldstop_cause_text(status));
    status = fieldstop_visual_readout_compute(&telescope, &eyepiece, &observer, 0, &seen);
    printf("readout, argument %u: %s\n", (unsigned)FIELDSTOP_ARGUMENT(status), fieldstop_cause_text(status));
    return wrong;
}
