/* What both ways of making the screen by hand compute, in float. */
#include "screen.h"
#include <math.h>

struct by_hand {
    float magnification, field, pupil, resolution; /* degrees, millimetres, seconds of arc */
};

static inline struct by_hand by_hand(const struct screen_input *in)
{
    float aperture = (float)in->aperture * 1e-3f, focal_length = (float)in->focal_length * 1e-3f;
    float eyepiece = (float)in->eyepiece * 1e-3f, field_stop = (float)in->field_stop * 1e-3f;
    struct by_hand out;

    out.magnification = focal_length / eyepiece;
    out.field = 114.591559f * atanf(field_stop / (2.0f * focal_length));
    out.pupil = aperture * eyepiece / focal_length;
    out.resolution = 138.367f / aperture;
    return out;
}
