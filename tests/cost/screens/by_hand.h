/* What both ways of making the screen by hand compute, in float. */
#include "screen.h"
#include <math.h>

struct by_hand {
    float magnification, field, pupil, resolution; /* degrees, millimetres, seconds of arc */
};

static inline struct by_hand by_hand(const struct screen_input *in)
{
    struct by_hand out;

    out.magnification = in->focal_length_mm / in->eyepiece_mm;
    out.field = 114.591559f * atanf(0.5f * in->field_stop_mm / in->focal_length_mm);
    out.pupil = in->aperture_mm * in->eyepiece_mm / in->focal_length_mm;
    out.resolution = 138.367f / in->aperture_mm;
    return out;
}
