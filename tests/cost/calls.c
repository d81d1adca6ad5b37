/*
 * Counts the functions of text and setup: with what usual telescopes of CASES give them, and with numbers drawn from
 * the whole of their types. A row is a name and the arguments; cortex_m0 sees that no function of the header is missing.
 */
#include "measure.h"
#include "fieldstop.h"
#include CASES
#include <string.h>

enum { APERTURE, FOCAL_LENGTH, EYEPIECE, FIELD_STOP, N = sizeof usual / sizeof usual[0], ROOM = 40 };

static char text[ROOM], shown[ROOM];
static uint16_t length;
static fieldstop_span span;
static fieldstop_telescope telescope = {0, 0, 0, 65536, 0};
static fieldstop_eyepiece eyepiece;
static fieldstop_camera camera = {3760, 6248, 4176, 1, {0, 0, 0}};
static fieldstop_observer observer = {5300, 6500, 120000, 2000000, 550};
static fieldstop_visual_readout visual;
static fieldstop_camera_readout frame;
static int is_whole;
static uint32_t number, drawn, seed = 1;

static uint32_t next(void)
{
    seed ^= seed << 13;
    seed ^= seed >> 17;
    return seed ^= seed << 5;
}

static void prepare(uint32_t k)
{
    const uint32_t *words = usual[k % N];
    uint32_t i;

    number = k;
    drawn = next() >> (next() & 31);
    telescope.aperture_um = words[APERTURE];
    telescope.focal_length_um = words[FOCAL_LENGTH];
    telescope.obstruction_um = k % 2 ? words[APERTURE] / 4 : 0;
    eyepiece.focal_length_um = words[EYEPIECE];
    eyepiece.field_stop_um = words[FIELD_STOP];
    if (fieldstop_visual_readout_compute(&telescope, &eyepiece, &observer, 0xfff, &visual) != 0
        || fieldstop_camera_readout_compute(&telescope, &camera, &observer, 0x1ff, &frame) != 0) {
        puts("a set-up was refused");
        exit(1);
    }
    if (is_whole) {
        uint32_t *members[] = {(uint32_t *)&visual, (uint32_t *)&frame};
        uint32_t counts[] = {sizeof visual / 4, sizeof frame / 4}, m;
        for (m = 0; m < 2; m++) {
            for (i = 0; i < counts[m]; i++) {
                members[m][i] = next() >> (next() & 31);
            }
        }
        visual.available = frame.available = 0xfff;
    }
    memcpy(shown, "Magnification  62.5x", 20);
    memcpy(text, "Magnification 162.5x", 20);
}

/* What a usual telescope gives, or a number from the whole type. */
#define VALUE(usually) (is_whole ? drawn : (usually))
#define AT(pointer) ((uint32_t)(uintptr_t)(pointer))
#define STYLE AT(fieldstop_text_style_ascii())
#define WIDE (is_whole ? 20u : 8u)
#define PUT STYLE, WIDE, AT(text), ROOM, AT(&length)
#define PUT_ALL STYLE, AT(text), ROOM, AT(&length)
#define VISUAL_ROW (number % FIELDSTOP_VISUAL_ROWS)
#define CAMERA_ROW (number % FIELDSTOP_CAMERA_ROWS)

#define ROWS \
    ROW(telescope_check, AT(&telescope)) \
    ROW(eyepiece_check, AT(&eyepiece)) \
    ROW(camera_check, AT(&camera)) \
    ROW(observer_check, AT(&observer)) \
    ROW(visual_readout_compute, AT(&telescope), AT(&eyepiece), AT(&observer), 0xfff, AT(&visual)) \
    ROW(camera_readout_compute, AT(&telescope), AT(&camera), AT(&observer), 0x1ff, AT(&frame)) \
    ROW(text_count, VALUE(camera.columns), FIELDSTOP_UNIT_PIXEL, PUT) \
    ROW(text_length_mm, VALUE(visual.exit_pupil_um), 1, PUT) \
    ROW(text_length_um, VALUE(camera.pixel_nm), 2, PUT) \
    ROW(text_ratio, VALUE(visual.focal_ratio_q16), 1, PUT) \
    ROW(text_magnification, VALUE(visual.magnification_q16), 1, PUT) \
    ROW(text_focal_ratio, VALUE(visual.focal_ratio_q16), 1, PUT) \
    ROW(text_percent, VALUE(visual.surface_brightness_q16), 1, PUT) \
    ROW(text_arcseconds, VALUE(visual.resolution_uas), 2, PUT) \
    ROW(text_magnitude, VALUE((uint32_t)visual.limiting_magnitude_mmag), 1, PUT) \
    ROW(text_angle, VALUE(visual.true_field_mas), FIELDSTOP_ANGLE_BY_SIZE, 0, PUT) \
    ROW(text_unit, number % 22, PUT_ALL) \
    ROW(text_visual_line, AT(&visual), AT(fieldstop_text_visual_labels()), STYLE, 20, VISUAL_ROW, AT(text), ROOM, AT(&length)) \
    ROW(text_visual_value, AT(&visual), VISUAL_ROW, PUT) \
    ROW(text_visual_number, AT(&visual), VISUAL_ROW, PUT) \
    ROW(text_visual_unit, AT(&visual), VISUAL_ROW, PUT_ALL) \
    ROW(text_camera_line, AT(&frame), AT(fieldstop_text_camera_labels()), STYLE, 20, CAMERA_ROW, AT(text), ROOM, AT(&length)) \
    ROW(text_camera_value, AT(&frame), CAMERA_ROW, PUT) \
    ROW(text_camera_number, AT(&frame), CAMERA_ROW, PUT) \
    ROW(text_camera_unit, AT(&frame), CAMERA_ROW, PUT_ALL) \
    ROW(text_changed, AT(shown), 20, AT(text), 20, STYLE, AT(&span)) \
    GIVER(text_style_ascii) \
    GIVER(text_style_utf8) \
    GIVER(text_style_hd44780_a00) \
    GIVER(text_style_hd44780_a02) \
    GIVER(text_visual_labels) \
    GIVER(text_visual_labels_short) \
    GIVER(text_camera_labels) \
    GIVER(text_camera_labels_short)

#define ROW(name, ...) \
    static void arguments_of_##name(uint32_t *words) \
    { \
        const uint32_t given[] = {__VA_ARGS__}; \
        memcpy(words, given, sizeof given); \
    }
/* Gives a pointer, and has no argument. */
#define GIVER(name) \
    static void arguments_of_##name(uint32_t *words) \
    { \
        (void)words; \
    }
ROWS
#undef ROW
#undef GIVER

static const struct row {
    const char *name;
    uintptr_t function;
    void (*arguments)(uint32_t *words);
    int gives_pointer;
} rows[] = {
#define ROW(name, ...) {#name, (uintptr_t)fieldstop_##name, arguments_of_##name, 0},
#define GIVER(name) {#name, (uintptr_t)fieldstop_##name, arguments_of_##name, 1},
    ROWS
};


static uint32_t count(const struct row *row, int whole)
{
    static uint32_t counts[MOST];
    uint32_t n = whole ? 4 * N : N, stack = 0, k;

    is_whole = whole;
    for (k = 0; k < n; k++) {
        struct call call = {row->function, {0}, 0};
        uint32_t used, status;

        prepare(k);
        row->arguments(call.words);
        status = measure(&call);
        if (!row->gives_pointer && (uint16_t)status != 0) {
            printf("%s: status %u\n", row->name, (unsigned)status);
            exit(1);
        }
        counts[k] = counted(&call);
        prepare(k);
        row->arguments(call.words);
        used = stack_of(call);
        stack = used > stack ? used : stack;
    }
    print_counts(counts, n);
    return stack;
}

int main(void)
{
    uint32_t i;

    verify();
    for (i = 0; i < sizeof rows / sizeof rows[0]; i++) {
        uint32_t stack, more;
        printf("%s", rows[i].name);
        stack = count(&rows[i], 0);
        more = count(&rows[i], 1);
        printf(" %u\n", (unsigned)(more > stack ? more : stack));
    }
    return 0;
}
