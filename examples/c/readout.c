/*
 * Prints what an invented telescope shows, through the C interface, integers only: what a hand controller would put
 * on its display.
 *
 *     cargo rustc --release --lib --crate-type staticlib --features capi
 *     cc -std=c99 -Iinclude examples/c/readout.c target/release/libfieldstop.a -lpthread -ldl -lm -o readout
 *     ./readout
 */
#include <inttypes.h>
#include <stdio.h>

#include "fieldstop.h"

/* The reflector of a night school in an invented valley. */
static const uint32_t aperture_um = 180000;
static const uint32_t obstruction_um = 46000;
static const uint32_t focal_length_um = 1130000;
static const uint32_t pixel_nm = 3300;
static const uint32_t columns = 4100;
static const uint32_t rows = 2700;

/* Two mirrors of 0.91 each, the eye under a suburban sky, green light. */
static const uint32_t reflectance_q16 = 59638;
static const uint32_t eye_pupil_um = 6500;
static const int32_t naked_eye_mmag = 5400;
static const uint32_t wavelength_nm = 550;

struct eyepiece {
    const char *name;
    uint32_t focal_length_um;
    uint32_t field_stop_um; /* 0: unknown */
    uint32_t apparent_field_mas;
};

static const struct eyepiece eyepieces[] = {
    {"wide", 28000, 33500, 68u * 3600000u},
    {"middle", 13000, 0, 72u * 3600000u},
    {"close", 4500, 6300, 82u * 3600000u},
};

enum { SCREEN_COLUMNS = 20 };

static int refused = 0;

/* Whether there is a value; tells why where there is none. */
static int is_there(const char *label, fieldstop_status status)
{
    if (status == 0) {
        return 1;
    }
    printf("  %-14s  argument %u: %s\n", label, (unsigned)FIELDSTOP_ARGUMENT(status), fieldstop_cause_text(status));
    refused = 1;
    return 0;
}

/* value / scale with two decimals; scale is at most 1000000. */
static void print_value(const char *label, uint32_t value, uint32_t scale, const char *unit)
{
    uint32_t whole = value / scale;
    uint32_t hundredths = (value % scale * 100 + scale / 2) / scale;

    if (hundredths == 100) {
        whole++;
        hundredths = 0;
    }
    printf("  %-14s %7" PRIu32 ".%02" PRIu32 "%s\n", label, whole, hundredths, unit);
}

/* The readouts that need no eyepiece. */
static void print_telescope(void)
{
    uint32_t value = 0;
    uint32_t throughput_q16 = 0;
    uint32_t effective_um = 0;
    int32_t faintest_mmag = 0;

    printf("Reflector, %" PRIu32 " mm\n", aperture_um / 1000);
    if (is_there("focal ratio", fieldstop_focal_ratio_fx(focal_length_um, aperture_um, &value))) {
        print_value("focal ratio", value, 65536, "");
    }
    if (is_there("plate scale", fieldstop_plate_scale_fx(focal_length_um, &value))) {
        print_value("plate scale", value, 1000, " arcsec/mm");
    }
    if (is_there("resolution", fieldstop_rayleigh_limit_fx(aperture_um, wavelength_nm, &value))) {
        print_value("resolution", value, 1000000, " arcsec");
    }
    if (is_there("throughput", fieldstop_throughput_fx(2, reflectance_q16, 0, 65536, &throughput_q16))
        && is_there("light gathered", fieldstop_effective_aperture_fx(aperture_um, obstruction_um, throughput_q16,
                                                                      &effective_um))) {
        print_value("light gathered", effective_um, 1000, " mm of clear aperture");
        if (is_there("faintest star",
                     fieldstop_limiting_magnitude_fx(naked_eye_mmag, effective_um, eye_pupil_um, &faintest_mmag))
            && faintest_mmag >= 0) {
            print_value("faintest star", (uint32_t)faintest_mmag, 1000, " mag");
        }
    }
}

static void print_eyepiece(const struct eyepiece *eyepiece)
{
    const uint32_t eyepiece_um = eyepiece->focal_length_um;
    uint32_t value = 0;
    fieldstop_status status;

    printf("Eyepiece \"%s\"\n", eyepiece->name);
    if (is_there("magnification", fieldstop_magnification_fx(focal_length_um, eyepiece_um, &value))) {
        print_value("magnification", value, 65536, " x");
    }
    if (is_there("exit pupil", fieldstop_exit_pupil_fx(aperture_um, focal_length_um, eyepiece_um, &value))) {
        print_value("exit pupil", value, 1000, " mm");
    }
    /* The field stop tells the field best; without it the apparent field has to do. */
    if (eyepiece->field_stop_um != 0) {
        status = fieldstop_true_field_from_stop_fx(eyepiece->field_stop_um, focal_length_um, &value);
    } else {
        status = fieldstop_true_field_equidistant_fx(eyepiece->apparent_field_mas, focal_length_um, eyepiece_um,
                                                     &value);
    }
    if (is_there("true field", status)) {
        print_value("true field", value, 60000, " arcmin");
    }
}

static void print_camera(void)
{
    uint32_t value = 0;

    printf("Camera\n");
    if (is_there("pixel scale", fieldstop_pixel_scale_fx(pixel_nm, focal_length_um, &value))) {
        print_value("pixel scale", value, 1000000, " arcsec");
    }
    if (is_there("frame width", fieldstop_frame_field_fx(pixel_nm, columns, focal_length_um, &value))) {
        print_value("frame width", value, 60000, " arcmin");
    }
    if (is_there("frame height", fieldstop_frame_field_fx(pixel_nm, rows, focal_length_um, &value))) {
        print_value("frame height", value, 60000, " arcmin");
    }
}

/* The same telescope as structs: one call computes a whole page, one call writes each line of a 20x4 display. */
static void print_screens(void)
{
    fieldstop_telescope telescope = {0, 0, 0, 65536, 0};
    fieldstop_eyepiece eyepiece = {0, 0, 0, FIELDSTOP_EQUIDISTANT, {0, 0, 0}};
    fieldstop_observer observer = {0, 0, 180000, 2600000, 0};
    fieldstop_visual_readout readout;
    char line[SCREEN_COLUMNS + 1];
    uint16_t length = 0;
    uint8_t row;

    telescope.aperture_um = aperture_um;
    telescope.focal_length_um = focal_length_um;
    telescope.obstruction_um = obstruction_um;
    eyepiece.focal_length_um = eyepieces[0].focal_length_um;
    eyepiece.field_stop_um = eyepieces[0].field_stop_um;
    observer.naked_eye_mmag = naked_eye_mmag;
    observer.eye_pupil_um = eye_pupil_um;
    observer.wavelength_nm = wavelength_nm;

    if (!is_there("throughput",
                  fieldstop_throughput_fx(2, reflectance_q16, 0, 65536, &telescope.throughput_q16))
        || !is_there("readout", fieldstop_visual_readout_compute(&telescope, &eyepiece, &observer,
                                                                 FIELDSTOP_VISUAL_ALL, &readout))) {
        return;
    }
    for (row = 0; row < FIELDSTOP_VISUAL_ROWS; row++) {
        if (is_there("line", fieldstop_text_visual_line(&readout, fieldstop_text_visual_labels(),
                                                        fieldstop_text_style_ascii(), SCREEN_COLUMNS, row,
                                                        line, sizeof line - 1, &length))) {
            line[length] = '\0';
            printf("%s|%s|\n", row % 4 == 0 ? "\n" : "", line);
        }
    }
}

int main(void)
{
    size_t i;

    print_telescope();
    for (i = 0; i < sizeof eyepieces / sizeof eyepieces[0]; i++) {
        print_eyepiece(&eyepieces[i]);
    }
    print_camera();
    print_screens();
    return refused;
}
