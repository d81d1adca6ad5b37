/*
 * The readouts as a firmware writer has them without a library: one line of C in double or in float, constants folded,
 * lengths in millimetres, no check of anything.
 */
#include <math.h>

#define ARCSECONDS 206264.806 /* in a radian */

double double_magnification(double focal_length_mm, double eyepiece_mm)
{
    return focal_length_mm / eyepiece_mm;
}

double double_exit_pupil(double aperture_mm, double focal_length_mm, double eyepiece_mm)
{
    return aperture_mm * eyepiece_mm / focal_length_mm;
}

double double_true_field_from_stop(double field_stop_mm, double focal_length_mm)
{
    return 2 * ARCSECONDS * atan(0.5 * field_stop_mm / focal_length_mm);
}

double double_true_field_rectilinear(double apparent_field_arcsec, double focal_length_mm, double eyepiece_mm)
{
    return 2 * ARCSECONDS * atan(tan(apparent_field_arcsec * (0.5 / ARCSECONDS)) * eyepiece_mm / focal_length_mm);
}

double double_pixel_scale(double pixel_um, double focal_length_mm)
{
    return 1e-3 * ARCSECONDS * pixel_um / focal_length_mm;
}

double double_rayleigh_limit(double aperture_mm, double wavelength_nm)
{
    return 1.21967e-6 * ARCSECONDS * wavelength_nm / aperture_mm;
}

double double_limiting_magnitude(double naked_eye_mag, double aperture_mm, double eye_pupil_mm)
{
    return naked_eye_mag + 5 * log10(aperture_mm / eye_pupil_mm);
}

float float_magnification(float focal_length_mm, float eyepiece_mm)
{
    return focal_length_mm / eyepiece_mm;
}

float float_exit_pupil(float aperture_mm, float focal_length_mm, float eyepiece_mm)
{
    return aperture_mm * eyepiece_mm / focal_length_mm;
}

float float_true_field_from_stop(float field_stop_mm, float focal_length_mm)
{
    return (float)(2 * ARCSECONDS) * atanf(0.5f * field_stop_mm / focal_length_mm);
}

float float_true_field_rectilinear(float apparent_field_arcsec, float focal_length_mm, float eyepiece_mm)
{
    float tangent = tanf(apparent_field_arcsec * (float)(0.5 / ARCSECONDS));
    return (float)(2 * ARCSECONDS) * atanf(tangent * eyepiece_mm / focal_length_mm);
}

float float_pixel_scale(float pixel_um, float focal_length_mm)
{
    return (float)(1e-3 * ARCSECONDS) * pixel_um / focal_length_mm;
}

float float_rayleigh_limit(float aperture_mm, float wavelength_nm)
{
    return (float)(1.21967e-6 * ARCSECONDS) * wavelength_nm / aperture_mm;
}

float float_limiting_magnitude(float naked_eye_mag, float aperture_mm, float eye_pupil_mm)
{
    return naked_eye_mag + 5.0f * log10f(aperture_mm / eye_pupil_mm);
}
