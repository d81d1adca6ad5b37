/*
 * The functions of text and setup that are counted, with their arguments: what usual telescopes of CASES give, and numbers
 * drawn from the whole of their types. `usual` and the part's `struct call` come before it.
 *
 * L_ is an argument of 32 bits, W_ of 16, B_ of 8, A_ an address.
 */
#include <stdlib.h>
#include <string.h>

#ifdef __AVR__
#define A_(pointer) put_argument(call, (uint16_t)(pointer), 2);
#define L_(value) put_argument(call, (value), 4);
#define W_(value) put_argument(call, (value), 2);
#define B_(value) put_argument(call, (value), 1);
#define WORD_OF(k, i) pgm_read_dword(&usual[k][i])
#else
#define A_(pointer) *words++ = (uint32_t)(uintptr_t)(pointer);
#define L_(value) *words++ = (value);
#define W_ L_
#define B_ L_
#define WORD_OF(k, i) usual[k][i]
#endif

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
static fieldstop_eyepiece eyepieces[16];
static const uint32_t amplifiers[8] = {98304, 131072, 163840, 196608, 327680, 41288, 52429, 58982};
static fieldstop_visual_target target = {1800000, 81920, 2000000, 2000, FIELDSTOP_PURPOSE_FRAME, {0, 0, 0}};
static fieldstop_camera_target field = {10800000, 3600000, 9830};
#ifdef __AVR__
enum { CHOICES = 4, CAMERA_CHOICES = 4 };
#else
enum { CHOICES = 144, CAMERA_CHOICES = 9 };
#endif
static fieldstop_visual_choice choices[CHOICES];
static fieldstop_camera_choice camera_choices[CAMERA_CHOICES];
static uint8_t choice_count;
static uint8_t is_whole;
static uint16_t number;
static uint32_t drawn, seed = 1;

static uint32_t next(void)
{
    seed ^= seed << 13;
    seed ^= seed >> 17;
    return seed ^= seed << 5;
}

static void prepare(uint16_t k)
{
    uint32_t of[4];
    uint8_t i;

    for (i = 0; i < 4; i++) {
        of[i] = WORD_OF(k % N, i);
    }

    number = k;
    drawn = next() >> (next() & 31);
    telescope.aperture_um = of[APERTURE];
    telescope.focal_length_um = of[FOCAL_LENGTH];
    telescope.obstruction_um = k % 2 ? of[APERTURE] / 4 : 0;
    eyepiece.focal_length_um = of[EYEPIECE];
    eyepiece.field_stop_um = of[FIELD_STOP];
    if (fieldstop_visual_readout_compute(&telescope, &eyepiece, &observer, 0xfff, &visual) != 0
        || fieldstop_camera_readout_compute(&telescope, &camera, &observer, 0x1ff, &frame) != 0) {
        abort();
    }
    if (is_whole) {
        uint32_t *member;
        for (member = (uint32_t *)&visual; member < (uint32_t *)(&visual + 1); member++) {
            *member = next() >> (next() & 31);
        }
        for (member = (uint32_t *)&frame; member < (uint32_t *)(&frame + 1); member++) {
            *member = next() >> (next() & 31);
        }
        visual.available = frame.available = 0xfff;
    }
    for (i = 0; i < 16; i++) {
        eyepieces[i].focal_length_um = 3000u + (i * 5u + k) % 16u * 2500u;
        eyepieces[i].field_stop_um = i % 2 ? 0 : eyepieces[i].focal_length_um / 5u * 4u;
        eyepieces[i].apparent_field_mas = 216000000u;
        eyepieces[i].mapping = i % 4 == 1 ? FIELDSTOP_RECTILINEAR : FIELDSTOP_EQUIDISTANT;
    }
    target.purpose = (uint8_t)(k % 3u);
    memcpy(shown, "Magnification  62.5x", 20);
    memcpy(text, "Magnification 162.5x", 20);
}

static uint8_t *count_of(uint8_t room)
{
    choice_count = room;
    return &choice_count;
}

/* What a usual telescope gives, or a number from the whole type. */
#define VALUE(usually) (is_whole ? drawn : (usually))
#define STYLE A_(fieldstop_text_style_ascii())
#define WIDE (is_whole ? 20u : 8u)
#define PUT STYLE B_(WIDE) A_(text) W_(ROOM) A_(&length)
#define PUT_ALL STYLE A_(text) W_(ROOM) A_(&length)
#define VISUAL_ROW (number % FIELDSTOP_VISUAL_ROWS)
#define CAMERA_ROW (number % FIELDSTOP_CAMERA_ROWS)

/* GIVER: gives an address, and has no argument. */
#define ROWS \
    ROW(telescope_check, A_(&telescope)) \
    ROW(eyepiece_check, A_(&eyepiece)) \
    ROW(camera_check, A_(&camera)) \
    ROW(observer_check, A_(&observer)) \
    ROW(visual_readout_compute, A_(&telescope) A_(&eyepiece) A_(&observer) L_(0xfff) A_(&visual)) \
    ROW(camera_readout_compute, A_(&telescope) A_(&camera) A_(&observer) L_(0x1ff) A_(&frame)) \
    ROW(visual_choose, A_(&telescope) A_(eyepieces) B_(16) A_(amplifiers) B_(8) A_(&observer) A_(&target) A_(choices) A_(count_of(CHOICES))) \
    ROW(camera_choose, A_(&telescope) A_(&camera) B_(1) A_(amplifiers) B_(8) A_(&observer) A_(&field) A_(camera_choices) A_(count_of(CAMERA_CHOICES))) \
    ROW(text_count, L_(VALUE(camera.columns)) B_(FIELDSTOP_UNIT_PIXEL) PUT) \
    ROW(text_length_mm, L_(VALUE(visual.exit_pupil_um)) B_(1) PUT) \
    ROW(text_length_um, L_(VALUE(camera.pixel_nm)) B_(2) PUT) \
    ROW(text_ratio, L_(VALUE(visual.focal_ratio_q16)) B_(1) PUT) \
    ROW(text_magnification, L_(VALUE(visual.magnification_q16)) B_(1) PUT) \
    ROW(text_focal_ratio, L_(VALUE(visual.focal_ratio_q16)) B_(1) PUT) \
    ROW(text_percent, L_(VALUE(visual.surface_brightness_q16)) B_(1) PUT) \
    ROW(text_arcseconds, L_(VALUE(visual.resolution_uas)) B_(2) PUT) \
    ROW(text_magnitude, L_(VALUE((uint32_t)visual.limiting_magnitude_mmag)) B_(1) PUT) \
    ROW(text_angle, L_(VALUE(visual.true_field_mas)) B_(FIELDSTOP_ANGLE_BY_SIZE) B_(0) PUT) \
    ROW(text_unit, B_(number % 22) PUT_ALL) \
    ROW(text_visual_line, A_(&visual) A_(fieldstop_text_visual_labels()) STYLE B_(20) B_(VISUAL_ROW) A_(text) W_(ROOM) A_(&length)) \
    ROW(text_visual_value, A_(&visual) B_(VISUAL_ROW) PUT) \
    ROW(text_visual_number, A_(&visual) B_(VISUAL_ROW) PUT) \
    ROW(text_visual_unit, A_(&visual) B_(VISUAL_ROW) PUT_ALL) \
    ROW(text_camera_line, A_(&frame) A_(fieldstop_text_camera_labels()) STYLE B_(20) B_(CAMERA_ROW) A_(text) W_(ROOM) A_(&length)) \
    ROW(text_camera_value, A_(&frame) B_(CAMERA_ROW) PUT) \
    ROW(text_camera_number, A_(&frame) B_(CAMERA_ROW) PUT) \
    ROW(text_camera_unit, A_(&frame) B_(CAMERA_ROW) PUT_ALL) \
    ROW(text_changed, A_(shown) W_(20) A_(text) W_(20) STYLE A_(&span)) \
    GIVER(text_style_ascii) \
    GIVER(text_style_utf8) \
    GIVER(text_style_hd44780_a00) \
    GIVER(text_style_hd44780_a02) \
    GIVER(text_visual_labels) \
    GIVER(text_visual_labels_short) \
    GIVER(text_camera_labels) \
    GIVER(text_camera_labels_short)

#ifdef __AVR__
#define ROW(name, ...) \
    static inline void arguments_of_##name(struct call *call) \
    { \
        __VA_ARGS__ \
    }
#define GIVER(name) \
    static inline void arguments_of_##name(struct call *call) \
    { \
        (void)call; \
    }
#else
#define ROW(name, ...) \
    static void arguments_of_##name(uint32_t *words) \
    { \
        __VA_ARGS__ \
    }
#define GIVER(name) \
    static void arguments_of_##name(uint32_t *words) \
    { \
        (void)words; \
    }
#endif
ROWS
#undef ROW
#undef GIVER
