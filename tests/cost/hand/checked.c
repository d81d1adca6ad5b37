/*
 * The readouts by hand in float as in readouts.h, but each with a status: no null pointer, and every argument finite and in
 * the library's range, which is told from zero.
 */
#include "readouts.h"
#include <stddef.h>

enum { RIGHT, NULL_POINTER, ZERO, OUT_OF_RANGE, NOT_FINITE };
#define STATUS(cause, argument) ((argument) << 8 | (cause))

static inline int positive(float x, int argument)
{
    if (!isfinite(x)) {
        return STATUS(NOT_FINITE, argument);
    }
    if (x == 0.0f) {
        return STATUS(ZERO, argument);
    }
    return x >= 0x1p-32f && x <= 0x1p32f ? RIGHT : STATUS(OUT_OF_RANGE, argument);
}

#define CHECK(call) \
    do { \
        int status = (call); \
        if (status != RIGHT) { \
            return status; \
        } \
    } while (0)

#define TWO(name, a, b) \
    int name##_checked(float a, float b, float *out) \
    { \
        CHECK(out != NULL ? RIGHT : STATUS(NULL_POINTER, 3)); \
        CHECK(positive(a, 1)); \
        CHECK(positive(b, 2)); \
        *out = name##_float(a, b); \
        return RIGHT; \
    }
#define THREE(name, a, b, c) \
    int name##_checked(float a, float b, float c, float *out) \
    { \
        CHECK(out != NULL ? RIGHT : STATUS(NULL_POINTER, 4)); \
        CHECK(positive(a, 1)); \
        CHECK(positive(b, 2)); \
        CHECK(positive(c, 3)); \
        *out = name##_float(a, b, c); \
        return RIGHT; \
    }

TWO(magnification, focal_length, eyepiece)
THREE(exit_pupil, aperture, focal_length, eyepiece)
TWO(true_field_from_stop, field_stop, focal_length)
THREE(true_field_rectilinear, apparent_field, focal_length, eyepiece)
TWO(pixel_scale, pixel, focal_length)
TWO(rayleigh_limit, aperture, wavelength)
TWO(depth_of_focus, focal_ratio, wavelength)
THREE(limiting_magnitude, naked_eye, effective_aperture, eye_pupil)
