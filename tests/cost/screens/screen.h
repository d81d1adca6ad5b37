/*
 * The screen that is counted: four lines of twenty characters, magnification, true field, exit pupil and resolution of
 * a telescope. Each way of making it has a source of its own, with the two halves apart.
 */
#ifndef SCREEN_H
#define SCREEN_H

#include <stdint.h>
#include <string.h>

/* On AVR constants stay in program memory by these. */
#ifdef __AVR__
#include <avr/pgmspace.h>
#else
#define PROGMEM
#define memcpy_P memcpy
#endif

extern char screen_lines[4][20];
extern char lines_of_strings[4][21]; /* with room for the zero that snprintf puts behind each */

/* Micrometres, and the same in millimetres, as a firmware that computes in float keeps them. */
struct screen_input {
    uint32_t aperture, focal_length, eyepiece, field_stop;
    float aperture_mm, focal_length_mm, eyepiece_mm, field_stop_mm;
};

static inline void set_millimetres(struct screen_input *in)
{
    in->aperture_mm = (float)in->aperture * 1e-3f;
    in->focal_length_mm = (float)in->focal_length * 1e-3f;
    in->eyepiece_mm = (float)in->eyepiece * 1e-3f;
    in->field_stop_mm = (float)in->field_stop * 1e-3f;
}

/* What a way of making the screen gives: 0, or not for a status. */
uint32_t direct_compute(const struct screen_input *in);
uint32_t direct_text(void);
uint32_t setup_compute(const struct screen_input *in);
uint32_t setup_text(void);
uint32_t float_printf_compute(const struct screen_input *in);
uint32_t float_printf_text(void);
uint32_t float_scaled_compute(const struct screen_input *in);
uint32_t float_scaled_text(void);
uint32_t float_dtostrf_compute(const struct screen_input *in);
uint32_t float_dtostrf_text(void);

#endif
