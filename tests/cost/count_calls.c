/* Counts the functions of calls.h over usual equipment. */
#include <string.h>

#include "fieldstop.h"
#include "measure.h"
#include CASES

enum { COUNT = sizeof usual / sizeof usual[0] };

static fieldstop_telescope telescope;
static fieldstop_eyepiece eyepiece;
static fieldstop_camera camera;
static fieldstop_observer observer;
static fieldstop_visual_readout visual;
static fieldstop_camera_readout frame;
static char shown[20], line[20], text[40];
static uint16_t length;
static union {
    fieldstop_visual_readout visual;
    fieldstop_camera_readout frame;
    fieldstop_span span;
} out;
static uint32_t counts[COUNT];

/* The k-th telescope, with its readouts and two lines. */
static void prepare(uint32_t k)
{
    const struct equipment *e = &equipment[k];
    uint16_t n;
    fieldstop_status status;

    telescope.aperture_um = usual[k][0];
    telescope.focal_length_um = usual[k][1];
    telescope.obstruction_um = (uint32_t)(((uint64_t)usual[k][0] * e->obstruction_q16) >> 16);
    telescope.amplification_q16 = e->amplification_q16;
    telescope.throughput_q16 = e->throughput_q16;
    eyepiece.focal_length_um = usual[k][2];
    eyepiece.field_stop_um = k % 2 == 0 ? usual[k][3] : 0;
    eyepiece.apparent_field_mas = e->apparent_field_mas;
    eyepiece.mapping = k % 4 == 1 ? FIELDSTOP_RECTILINEAR : FIELDSTOP_EQUIDISTANT;
    camera.pixel_nm = e->pixel_nm;
    camera.columns = (uint16_t)e->pixel_count;
    camera.rows = (uint16_t)(e->pixel_count * 2 / 3);
    camera.binning = (uint8_t)(1 + k % 2);
    observer.naked_eye_mmag = (int32_t)e->naked_eye_mmag;
    observer.eye_pupil_um = e->eye_pupil_um;
    observer.eye_resolution_mas = 150000;
    observer.seeing_uas = e->seeing_uas;
    observer.wavelength_nm = usual[k][4];
    memcpy(shown, line, sizeof line);
    status = fieldstop_visual_readout_compute(&telescope, &eyepiece, &observer, FIELDSTOP_VISUAL_ALL, &visual);
    status |= fieldstop_camera_readout_compute(&telescope, &camera, &observer, FIELDSTOP_CAMERA_ALL, &frame);
    status |= fieldstop_text_visual_line(&visual, fieldstop_text_visual_labels(), fieldstop_text_style_ascii(), 20, 0,
                                         line, sizeof line, &n);
    if (status != 0) {
        printf("telescope %u is refused: %x\n", (unsigned)k, status);
        exit(1);
    }
}

#define P(pointer) (uint32_t)(uintptr_t)(pointer)
#define STYLE P(fieldstop_text_style_ascii())
#define TEXT P(text), sizeof text, P(&length)

static void count(const char *name, uintptr_t function, void (*arguments)(uint32_t *, uint32_t), int gives_status)
{
    uint32_t stack = 0, k;

    memset(line, ' ', sizeof line);
    for (k = 0; k < COUNT; k++) {
        struct call call = {0};
        uint32_t status, used;
        prepare(k);
        arguments(call.words, k);
        call.function = function;
        status = (uint16_t)measure(&call);
        if (gives_status && status != 0) {
            printf("%s: telescope %u gives status %x\n", name, (unsigned)k, (unsigned)status);
            exit(1);
        }
        counts[k] = counted(&call);
        used = stack_of(&call);
        stack = used > stack ? used : stack;
    }
    printf("%s", name);
    print_counts(counts, COUNT);
    printf(" %u\n", (unsigned)stack);
}

#define CALL(name, ...)                                                                                        \
    static void arguments_of_##name(uint32_t *words, uint32_t k)                                               \
    {                                                                                                          \
        const uint32_t given[] = {__VA_ARGS__};                                                                \
        (void)k;                                                                                               \
        memcpy(words, given, sizeof given);                                                                    \
    }
#define READ(name, argument) CALL(name, argument)
#include "calls.h"

int main(void)
{
    begin();
#undef CALL
#define CALL(name, ...) count(#name, (uintptr_t)fieldstop_##name, arguments_of_##name, 1);
#undef READ
#define READ(name, argument) count(#name, (uintptr_t)fieldstop_##name, arguments_of_##name, 0);
#include "calls.h"
    return 0;
}
