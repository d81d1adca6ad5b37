/*
 * Counts a screen of four lines of twenty characters (magnification, true field, exit pupil, resolution) on an emulated
 * Cortex-M0: by direct calls, through the equipment structs, and as written by hand with float and printf. Medians over
 * usual telescopes; a few instructions of the caller are counted with them.
 */
#include <math.h>
#include <stdint.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "fieldstop.h"
#include CASES

#define SYSTICK ((volatile uint32_t *)0xE000E010)
#define ALONE __attribute__((noinline))
enum { APERTURE, FOCAL_LENGTH, EYEPIECE, FIELD_STOP, KINDS = 6, CASES_COUNT = sizeof usual / sizeof usual[0] };

static char lines[4][20];
static struct { uint32_t magnification, field, pupil, resolution; } shown;
static fieldstop_telescope telescope = {0, 0, 0, 65536, 0};
static fieldstop_eyepiece eyepiece;
static fieldstop_observer observer = {0, 0, 0, 0, 550};
static fieldstop_visual_readout readout;
static const uint32_t *words;
static float in[4], out[4];
static uint32_t refused;

static ALONE void direct_compute(void)
{
    refused |= fieldstop_magnification_fx(words[FOCAL_LENGTH], words[EYEPIECE], &shown.magnification);
    refused |= fieldstop_true_field_from_stop_fx(words[FIELD_STOP], words[FOCAL_LENGTH], &shown.field);
    refused |= fieldstop_exit_pupil_fx(words[APERTURE], words[FOCAL_LENGTH], words[EYEPIECE], &shown.pupil);
    refused |= fieldstop_rayleigh_limit_fx(words[APERTURE], 550, &shown.resolution);
}

static ALONE void direct_text(void)
{
    const fieldstop_text_style *style = fieldstop_text_style_ascii();
    uint16_t n;

    memcpy(lines[0], "Magnification", 13);
    refused |= fieldstop_text_magnification(shown.magnification, 1, style, 7, lines[0] + 13, 7, &n);
    memcpy(lines[1], "True field   ", 13);
    refused |= fieldstop_text_angle(shown.field, FIELDSTOP_ANGLE_BY_SIZE, 0, style, 7, lines[1] + 13, 7, &n);
    memcpy(lines[2], "Exit pupil   ", 13);
    refused |= fieldstop_text_length_mm(shown.pupil, 1, style, 7, lines[2] + 13, 7, &n);
    memcpy(lines[3], "Resolution   ", 13);
    refused |= fieldstop_text_arcseconds(shown.resolution, 2, style, 7, lines[3] + 13, 7, &n);
}

static ALONE void setup_compute(void)
{
    refused |= fieldstop_visual_readout_compute(&telescope, &eyepiece, &observer,
                                                FIELDSTOP_VISUAL_MAGNIFICATION | FIELDSTOP_VISUAL_TRUE_FIELD
                                                    | FIELDSTOP_VISUAL_EXIT_PUPIL | FIELDSTOP_VISUAL_RESOLUTION,
                                                &readout);
}

static ALONE void setup_text(void)
{
    uint16_t n;
    uint8_t i;

    for (i = 0; i < 4; i++) {
        refused |= fieldstop_text_visual_line(&readout, fieldstop_text_visual_labels(), fieldstop_text_style_ascii(),
                                              20, i, lines[i], 20, &n);
    }
}

static ALONE __attribute__((optimize("O2"))) void float_compute(void)
{
    out[0] = in[FOCAL_LENGTH] / in[EYEPIECE];
    out[1] = 114.591559f * atanf(in[FIELD_STOP] / (2.0f * in[FOCAL_LENGTH]));
    out[2] = in[APERTURE] * in[EYEPIECE] / in[FOCAL_LENGTH];
    out[3] = 138.367f / in[APERTURE];
}

static ALONE __attribute__((optimize("O2"))) void float_printf(void)
{
    int minutes = (int)(out[1] * 60.0f + 0.5f);
    char line[32];

    snprintf(line, sizeof line, "Magnification%6.1fx", (double)out[0]);
    memcpy(lines[0], line, 20);
    snprintf(line, sizeof line, "True field   %3dd%02d'", minutes / 60, minutes % 60);
    memcpy(lines[1], line, 20);
    snprintf(line, sizeof line, "Exit pupil   %4.1f mm", (double)out[2]);
    memcpy(lines[2], line, 20);
    snprintf(line, sizeof line, "Resolution   %6.2f\"", (double)out[3]);
    memcpy(lines[3], line, 20);
}

static int ascending(const void *a, const void *b)
{
    uint32_t x = *(const uint32_t *)a, y = *(const uint32_t *)b;
    return (x > y) - (x < y);
}

int main(void)
{
    static void (*const parts[KINDS])(void) = {direct_compute, direct_text, setup_compute,
                                               setup_text, float_compute, float_printf};
    static const char *const names[KINDS] = {"screen_direct_compute", "screen_direct_text", "screen_setup_compute",
                                             "screen_setup_text", "screen_float_compute", "screen_float_printf"};
    static uint32_t counts[KINDS][CASES_COUNT];
    uint32_t i, k;

    SYSTICK[1] = 0xFFFFFF;
    SYSTICK[0] = 5;
    for (k = 0; k < CASES_COUNT; k++) {
        words = usual[k];
        for (i = 0; i < 4; i++) {
            in[i] = (float)words[i] / 1000.0f;
        }
        telescope.aperture_um = words[APERTURE];
        telescope.focal_length_um = words[FOCAL_LENGTH];
        eyepiece.focal_length_um = words[EYEPIECE];
        eyepiece.field_stop_um = words[FIELD_STOP];
        for (i = 0; i < KINDS; i++) {
            SYSTICK[2] = 0;
            parts[i]();
            counts[i][k] = (0xFFFFFF - SYSTICK[2]) * 1000u / 1024u;
        }
    }
    if (refused) {
        puts("a call was refused");
        return 1;
    }
    for (i = 0; i < KINDS; i++) {
        qsort(counts[i], CASES_COUNT, sizeof counts[i][0], ascending);
        printf("%-28s %6u %6u\n", names[i], (unsigned)counts[i][CASES_COUNT / 2],
               (unsigned)counts[i][CASES_COUNT - 1]);
    }
    return 0;
}
