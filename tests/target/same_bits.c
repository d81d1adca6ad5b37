/*
 * Feeds every fixed function of the registry argument sets from a tiny generator that runs alike everywhere, and prints
 * a checksum of all statuses and results of each; every part must print what the desktop prints.
 *
 * CASES  argument sets a function
 * FIRST, LAST  the rows of this image, for parts with little flash; the row after the last one is the text
 */
#include <stdint.h>

#define FIELDSTOP_NO_FLOAT
#include "fieldstop.h"
#include "draw.h"
#include "part.h"

#ifndef FIRST
#define FIRST 0
#define LAST 9999
#endif
#define HAS_ROW(i) ((i) >= FIRST && (i) < LAST)

static uint32_t sum;

static void fold(uint32_t x)
{
    sum = (sum ^ x) * 16777619u;
    sum ^= sum >> 15;
}

static void begin(const char *name)
{
    char c;

    while ((c = READ_CHAR(name)) != '\0') {
        part_put(c);
        name++;
    }
    part_put(' ');
    state = 2463534242u;
    sum = 1u;
}

static void end(void)
{
    uint8_t i;

    for (i = 0; i < 8u; i++) {
        part_put((char)((sum >> 28) + ((sum >> 28) > 9u ? 87u : 48u)));
        sum <<= 4;
    }
    part_put('\n');
}

#define ROW(name, draws, call)              \
    static void run_##name(void)            \
    {                                       \
        uint32_t a[8];                      \
        uint16_t i;                         \
                                            \
        begin(STORED(#name));               \
        for (i = 0; i < CASES; i++) {       \
            uint32_t result = 77u;          \
            uint8_t n = 0;                  \
                                            \
            draws fold(call);               \
            fold(result);                   \
        }                                   \
        end();                              \
    }
#include "rows.h"
#undef ROW

#if HAS_ROW(ROWS)
/* All lines of both readouts of equipment drawn at random. */
static void run_text(void)
{
    char line[40];
    uint16_t length;
    uint16_t i;

    begin(STORED("text"));
    for (i = 0; i < CASES / 10; i++) {
        fieldstop_telescope telescope;
        fieldstop_eyepiece eyepiece = {0, 0, 0, 0, {0, 0, 0}};
        fieldstop_observer observer;
        fieldstop_visual_readout readout;
        uint8_t row;

        telescope.aperture_um = draw(i, 50000u, 500000u, 1u, 4294967295u);
        telescope.focal_length_um = draw(i, 200000u, 5000000u, 1u, 4294967295u);
        telescope.obstruction_um = draw(i, 0u, 60000u, 0u, 4294967295u);
        telescope.amplification_q16 = draw(i, 65536u, 200000u, 1u, 4294967295u);
        telescope.throughput_q16 = draw(i, 40000u, 65536u, 0u, 65536u);
        eyepiece.focal_length_um = draw(i, 3000u, 55000u, 1u, 4294967295u);
        eyepiece.apparent_field_mas = draw(i, 100000000u, 360000000u, 0u, 647999999u);
        observer.naked_eye_mmag = (int32_t)draw(i, 3000u, 7000u, 0u, 4294967295u);
        observer.eye_pupil_um = draw(i, 4000u, 8000u, 0u, 4294967295u);
        observer.eye_resolution_mas = draw(i, 60000u, 300000u, 0u, 4294967295u);
        observer.seeing_uas = draw(i, 500000u, 5000000u, 0u, 4294967295u);
        observer.wavelength_nm = draw(i, 400u, 900u, 1u, 4294967295u);
        fold(fieldstop_visual_readout_compute(&telescope, &eyepiece, &observer, FIELDSTOP_VISUAL_ALL, &readout));
        if (fieldstop_visual_readout_compute(&telescope, &eyepiece, &observer, FIELDSTOP_VISUAL_ALL, &readout) != 0) {
            continue;
        }
        for (row = 0; row < FIELDSTOP_VISUAL_ROWS; row++) {
            uint16_t k;

            length = 0;
            fold(fieldstop_text_visual_line(&readout, fieldstop_text_visual_labels(), fieldstop_text_style_ascii(), 20,
                                            row, line, sizeof line, &length));
            for (k = 0; k < length; k++) {
                fold((uint8_t)line[k]);
            }
        }
    }
    end();
}
#endif

int main(void)
{
#define ROW(name, draws, call) run_##name();
#include "rows.h"
#if HAS_ROW(ROWS)
    run_text();
#endif
    return part_end();
}
