/*
 * The readouts as one would write them by hand: in REAL, millimetres, seconds of arc and magnitudes; for the usual
 * telescope, with no checks. The C library's functions are those of REAL.
 */
#include <math.h>

#ifdef IN_DOUBLE
typedef double real;
#define NAMED(name) name##_double
#define ATAN atan
#define TAN tan
#define LOG10 log10
#else
typedef float real;
#define NAMED(name) name##_float
#define ATAN atanf
#define TAN tanf
#define LOG10 log10f
#endif
#define ARCSEC ((real)206264.806)

real NAMED(magnification)(real focal_length, real eyepiece)
{
    return focal_length / eyepiece;
}

real NAMED(exit_pupil)(real aperture, real focal_length, real eyepiece)
{
    return aperture * eyepiece / focal_length;
}

real NAMED(true_field_from_stop)(real field_stop, real focal_length)
{
    return 2 * ARCSEC * ATAN(field_stop / (2 * focal_length));
}

real NAMED(true_field_rectilinear)(real apparent_field, real focal_length, real eyepiece)
{
    return 2 * ARCSEC * ATAN(TAN(apparent_field / (2 * ARCSEC)) * eyepiece / focal_length);
}

/* Micrometres and millimetres. */
real NAMED(pixel_scale)(real pixel, real focal_length)
{
    return ARCSEC / 1000 * pixel / focal_length;
}

/* Millimetres and nanometres. */
real NAMED(rayleigh_limit)(real aperture, real wavelength)
{
    return (real)(1.21966989 * 206264.806e-6) * wavelength / aperture;
}

/* Nanometres in, micrometres out. */
real NAMED(depth_of_focus)(real focal_ratio, real wavelength)
{
    return (real)0.002 * wavelength * focal_ratio * focal_ratio;
}

real NAMED(limiting_magnitude)(real naked_eye, real effective_aperture, real eye_pupil)
{
    return naked_eye + 5 * LOG10(effective_aperture / eye_pupil);
}
