/*
 * The functions of text and setup that are counted, with their arguments: what usual telescopes of CASES give, and numbers
 * drawn from the whole of their types. `usual` and the part's `struct call` come before it.
 *
 * L_ is an argument of 32 bits, W_ of 16, B_ of 8, A_ an address.
 */
#include <stdlib.h>
#include <string.h>

/* On AVR an image has what its function needs, since all of it is more than the flash holds. */
#ifndef __AVR__
#define VISUAL
#define CAMERA
#define FOCUS
#define NEWTONIAN
#define TWO_MIRROR
#define RECORDS
#endif

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
#if defined(__AVR__) && defined(RECORDS)
enum { EYEPIECES = 1, KEPT = 1, RECORD = 200 }; /* RAM for the storage */
#else
enum { EYEPIECES = 16, KEPT = 3, RECORD = 320 };
#endif
static fieldstop_eyepiece eyepieces[EYEPIECES];
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
static fieldstop_focuser focuser = {2200, 150000, 1090000, 12000};
static fieldstop_focus_readout focus;
static fieldstop_newtonian_layout newtonian = {205000, 10000, 16700, 47000, 850000, 980000, 0x18000000, 0x08000000, 0x40000000, 1700000};
static fieldstop_newtonian_readout newtonian_values;
static fieldstop_two_mirror_layout mirrors = {0, 150000, 10000};
static fieldstop_two_mirror_readout mirror_values;

/* A storage of two slots in RAM, and a record of one of everything but some eyepieces. */
static uint8_t record[RECORD];
static fieldstop_slot_pair places = {0, RECORD, RECORD, 1, {0, 0, 0}};
static fieldstop_site site = {0x20000000, 0x10000000};
static fieldstop_equipment_name name = {{'R', 'o', 'o', 'f', 0, 0, 0, 0, 0, 0, 0, 0}};
static fieldstop_in_use in_use = {0, 0, 0, 0, 0, 0};
static fieldstop_entry_state entry;
static uint32_t quantity;
static uint8_t small;
static const char typed[] = "1187.5mm";

static uint8_t is_whole;
static uint16_t number;
static uint32_t drawn, seed = 1;

static uint32_t next(void)
{
    seed ^= seed << 13;
    seed ^= seed >> 17;
    return seed ^= seed << 5;
}

#ifdef RECORDS
static uint8_t template[RECORD], storage[2 * RECORD], made;

static fieldstop_status read_storage(void *context, uint32_t offset, uint8_t *bytes, uint16_t count)
{
    memcpy(bytes, (const uint8_t *)context + offset, count);
    return 0;
}

static fieldstop_status write_storage(void *context, uint32_t offset, const uint8_t *bytes, uint16_t count)
{
    memcpy((uint8_t *)context + offset, bytes, count);
    return 0;
}

static void make_record(void)
{
    fieldstop_eyepiece some = {13000, 16200, 0, 0, {0, 0, 0}};
    uint8_t i;
    fieldstop_status wrong = fieldstop_record_begin(template, RECORD);

    wrong |= fieldstop_record_put_telescope(template, RECORD, 0, &telescope, &name);
    for (i = 0; i < KEPT; i++) {
        wrong |= fieldstop_record_put_eyepiece(template, RECORD, i, &some, &name);
    }
    wrong |= fieldstop_record_put_amplifier(template, RECORD, 0, 131072, &name);
    wrong |= fieldstop_record_put_camera(template, RECORD, 0, &camera, &name);
    wrong |= fieldstop_record_put_observer(template, RECORD, 0, &observer, &name);
    wrong |= fieldstop_record_put_site(template, RECORD, 0, &site, &name);
    wrong |= fieldstop_store_save(&places, read_storage, write_storage, NULL, storage, template, RECORD, FIELDSTOP_KEEP_NEWER);
    if (wrong != 0) {
        abort();
    }
    made = 1;
}
#endif

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
#ifdef VISUAL
    if (fieldstop_visual_readout_compute(&telescope, &eyepiece, &observer, 0xfff, &visual) != 0) {
        abort();
    }
#endif
#ifdef CAMERA
    if (fieldstop_camera_readout_compute(&telescope, &camera, &observer, 0x1ff, &frame) != 0) {
        abort();
    }
#endif
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
    mirrors.primary_focal_um = of[FOCAL_LENGTH] / 3u;
    newtonian.focus_distance_um = of[FOCAL_LENGTH] / 5u;
#ifdef FOCUS
    if (fieldstop_focus_readout_compute(&telescope, &focuser, &observer, 0x7f, &focus) != 0) {
        abort();
    }
#endif
#ifdef NEWTONIAN
    if (fieldstop_newtonian_readout_compute(&telescope, &newtonian, 0xff, &newtonian_values) != 0) {
        abort();
    }
#endif
#ifdef TWO_MIRROR
    if (fieldstop_two_mirror_readout_compute(&telescope, &mirrors, 0x7f, &mirror_values) != 0) {
        abort();
    }
#endif
#ifdef RECORDS
    if (made == 0) {
        make_record();
    }
    memcpy(record, template, sizeof record);
#endif
    for (i = 0; i < EYEPIECES; i++) {
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

#ifdef RECORDS
#define STORE_ROWS \
    ROW(store_load, A_(&places) A_(read_storage) A_(storage) A_(record) W_(RECORD) A_(&length)) \
    ROW(store_save, A_(&places) A_(read_storage) A_(write_storage) A_(NULL) A_(storage) A_(record) W_(RECORD) B_(FIELDSTOP_KEEP_NEWER))
#else
#define STORE_ROWS
#endif

/* GIVER: gives an address, and has no argument. OTHER: gives something else than a status. */
#define ROWS \
    ROW(telescope_check, A_(&telescope)) \
    ROW(eyepiece_check, A_(&eyepiece)) \
    ROW(camera_check, A_(&camera)) \
    ROW(observer_check, A_(&observer)) \
    ROW(visual_readout_compute, A_(&telescope) A_(&eyepiece) A_(&observer) L_(0xfff) A_(&visual)) \
    ROW(camera_readout_compute, A_(&telescope) A_(&camera) A_(&observer) L_(0x1ff) A_(&frame)) \
    ROW(visual_choose, A_(&telescope) A_(eyepieces) B_(16) A_(amplifiers) B_(8) A_(&observer) A_(&target) A_(choices) A_(count_of(CHOICES))) \
    ROW(camera_choose, A_(&telescope) A_(&camera) B_(1) A_(amplifiers) B_(8) A_(&observer) A_(&field) A_(camera_choices) A_(count_of(CAMERA_CHOICES))) \
    ROW(focus_readout_compute, A_(&telescope) A_(&focuser) A_(&observer) L_(0x7f) A_(&focus)) \
    ROW(newtonian_layout_check, A_(&newtonian)) \
    ROW(newtonian_readout_compute, A_(&telescope) A_(&newtonian) L_(0xff) A_(&newtonian_values)) \
    ROW(two_mirror_layout_check, A_(&mirrors)) \
    ROW(two_mirror_readout_compute, A_(&telescope) A_(&mirrors) L_(0x7f) A_(&mirror_values)) \
    ROW(site_check, A_(&site)) \
    ROW(slot_pair_check, A_(&places)) \
    ROW(record_begin, A_(record) W_(RECORD)) \
    ROW(record_check, A_(record) W_(RECORD)) \
    ROW(record_get_length, A_(record) W_(RECORD) A_(&length)) \
    ROW(record_get_count, A_(record) W_(RECORD) B_(FIELDSTOP_KIND_EYEPIECE) A_(&small)) \
    ROW(record_get_name, A_(record) W_(RECORD) B_(FIELDSTOP_KIND_EYEPIECE) B_(number % KEPT) A_(&name)) \
    ROW(record_get_in_use, A_(record) W_(RECORD) A_(&in_use)) \
    ROW(record_get_telescope, A_(record) W_(RECORD) B_(0) A_(&telescope)) \
    ROW(record_get_eyepiece, A_(record) W_(RECORD) B_(number % KEPT) A_(&eyepiece)) \
    ROW(record_get_amplifier, A_(record) W_(RECORD) B_(0) A_(&quantity)) \
    ROW(record_get_camera, A_(record) W_(RECORD) B_(0) A_(&camera)) \
    ROW(record_get_observer, A_(record) W_(RECORD) B_(0) A_(&observer)) \
    ROW(record_get_site, A_(record) W_(RECORD) B_(0) A_(&site)) \
    ROW(record_put_telescope, A_(record) W_(RECORD) B_(0) A_(&telescope) A_(&name)) \
    ROW(record_put_eyepiece, A_(record) W_(RECORD) B_(number % KEPT) A_(&eyepiece) A_(&name)) \
    ROW(record_put_amplifier, A_(record) W_(RECORD) B_(0) L_(131072) A_(&name)) \
    ROW(record_put_camera, A_(record) W_(RECORD) B_(0) A_(&camera) A_(&name)) \
    ROW(record_put_observer, A_(record) W_(RECORD) B_(0) A_(&observer) A_(&name)) \
    ROW(record_put_site, A_(record) W_(RECORD) B_(0) A_(&site) A_(&name)) \
    ROW(record_put_in_use, A_(record) W_(RECORD) A_(&in_use)) \
    ROW(record_remove, A_(record) W_(RECORD) B_(FIELDSTOP_KIND_EYEPIECE) B_(number % KEPT)) \
    STORE_ROWS \
    ROW(entry_read, A_(typed) W_(sizeof typed - 1) B_(FIELDSTOP_ENTRY_LENGTH) L_(0) STYLE A_(&quantity)) \
    ROW(entry_check, A_(typed) W_(1 + number % (sizeof typed - 1)) B_(FIELDSTOP_ENTRY_LENGTH) L_(0) STYLE A_(&entry)) \
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
    ROW(text_focus_line, A_(&focus) A_(fieldstop_text_focus_labels()) STYLE B_(20) B_(number % FIELDSTOP_FOCUS_ROWS) A_(text) W_(ROOM) A_(&length)) \
    ROW(text_focus_value, A_(&focus) B_(number % FIELDSTOP_FOCUS_ROWS) STYLE B_(20) A_(text) W_(ROOM) A_(&length)) \
    ROW(text_focus_number, A_(&focus) B_(number % FIELDSTOP_FOCUS_ROWS) STYLE B_(20) A_(text) W_(ROOM) A_(&length)) \
    ROW(text_focus_unit, A_(&focus) B_(number % FIELDSTOP_FOCUS_ROWS) PUT_ALL) \
    ROW(text_newtonian_line, A_(&newtonian_values) A_(fieldstop_text_newtonian_labels()) STYLE B_(20) B_(number % FIELDSTOP_NEWTONIAN_ROWS) A_(text) W_(ROOM) A_(&length)) \
    ROW(text_newtonian_value, A_(&newtonian_values) B_(number % FIELDSTOP_NEWTONIAN_ROWS) STYLE B_(20) A_(text) W_(ROOM) A_(&length)) \
    ROW(text_newtonian_number, A_(&newtonian_values) B_(number % FIELDSTOP_NEWTONIAN_ROWS) STYLE B_(20) A_(text) W_(ROOM) A_(&length)) \
    ROW(text_newtonian_unit, A_(&newtonian_values) B_(number % FIELDSTOP_NEWTONIAN_ROWS) PUT_ALL) \
    ROW(text_two_mirror_line, A_(&mirror_values) A_(fieldstop_text_two_mirror_labels()) STYLE B_(20) B_(number % FIELDSTOP_TWO_MIRROR_ROWS) A_(text) W_(ROOM) A_(&length)) \
    ROW(text_two_mirror_value, A_(&mirror_values) B_(number % FIELDSTOP_TWO_MIRROR_ROWS) STYLE B_(20) A_(text) W_(ROOM) A_(&length)) \
    ROW(text_two_mirror_number, A_(&mirror_values) B_(number % FIELDSTOP_TWO_MIRROR_ROWS) STYLE B_(20) A_(text) W_(ROOM) A_(&length)) \
    ROW(text_two_mirror_unit, A_(&mirror_values) B_(number % FIELDSTOP_TWO_MIRROR_ROWS) PUT_ALL) \
    ROW(text_caution_line, A_(fieldstop_text_caution(0)) B_(20) B_(number % 9) A_(text) W_(ROOM) A_(&length)) \
    OTHER(text_caution, B_(number % 2)) \
    OTHER(text_caution_lines, A_(fieldstop_text_caution(0)) B_(20)) \
    ROW(text_changed, A_(shown) W_(20) A_(text) W_(20) STYLE A_(&span)) \
    GIVER(text_style_ascii) \
    GIVER(text_style_utf8) \
    GIVER(text_style_hd44780_a00) \
    GIVER(text_style_hd44780_a02) \
    GIVER(text_visual_labels) \
    GIVER(text_visual_labels_short) \
    GIVER(text_camera_labels) \
    GIVER(text_camera_labels_short) \
    GIVER(text_focus_labels) \
    GIVER(text_focus_labels_short) \
    GIVER(text_newtonian_labels) \
    GIVER(text_newtonian_labels_short) \
    GIVER(text_two_mirror_labels) \
    GIVER(text_two_mirror_labels_short)

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
#define OTHER ROW
ROWS
#undef OTHER
#undef ROW
#undef GIVER
