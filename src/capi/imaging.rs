//! C exports of `optics::imaging`.

use super::{fieldstop_status, give};
use crate::optics::imaging;
use crate::units::{Microarcseconds, Micrometres, Milliarcseconds, Nanometres, Q16};

/// Gives how many pixels lie across the width of a star's image, Q16.16.
///
/// FWHM / scale (Howell, Handbook of CCD Astronomy).
/// Ranges: fwhm_uas, pixel_scale_uas not 0.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_pixels_per_fwhm_fx(
    fwhm_uas: u32,
    pixel_scale_uas: u32,
    pixels_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(pixels_q16, 3, || {
            imaging::pixels_per_fwhm_fx(Microarcseconds(fwhm_uas), Microarcseconds(pixel_scale_uas))
        })
    }
}

/// Gives how many pixels lie across the width of a star's image.
///
/// FWHM / scale (Howell, Handbook of CCD Astronomy).
/// Ranges: fwhm_arcsec, pixel_scale_arcsec 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_pixels_per_fwhm_f32(
    fwhm_arcsec: f32,
    pixel_scale_arcsec: f32,
    pixels: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(pixels, 3, || imaging::pixels_per_fwhm(fwhm_arcsec, pixel_scale_arcsec)) }
}

/// Gives how many pixels lie across the width of a star's image, in double.
///
/// FWHM / scale (Howell, Handbook of CCD Astronomy).
/// Ranges: fwhm_arcsec, pixel_scale_arcsec 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_pixels_per_fwhm_f64(
    fwhm_arcsec: f64,
    pixel_scale_arcsec: f64,
    pixels: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(pixels, 3, || imaging::pixels_per_fwhm(fwhm_arcsec, pixel_scale_arcsec)) }
}

/// Gives the coarsest pixel that loses nothing of what the telescope shows in still air, in nanometres.
///
/// lambda f / (2 D): two pixels to the period of the cutoff frequency (Shannon 1949; Goodman, Introduction to Fourier
/// Optics).
/// Ranges: focal_length_um, aperture_um, wavelength_nm not 0.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_nyquist_pixel_fx(
    focal_length_um: u32,
    aperture_um: u32,
    wavelength_nm: u32,
    pixel_nm: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(pixel_nm, 4, || {
            imaging::nyquist_pixel_fx(
                Micrometres(focal_length_um),
                Micrometres(aperture_um),
                Nanometres(wavelength_nm),
            )
        })
    }
}

/// Gives the coarsest pixel that loses nothing of what the telescope shows in still air, in micrometres.
///
/// lambda f / (2 D): two pixels to the period of the cutoff frequency (Shannon 1949; Goodman, Introduction to Fourier
/// Optics).
/// Ranges: focal_length_mm, aperture_mm, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_nyquist_pixel_f32(
    focal_length_mm: f32,
    aperture_mm: f32,
    wavelength_nm: f32,
    pixel_um: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(pixel_um, 4, || imaging::nyquist_pixel(focal_length_mm, aperture_mm, wavelength_nm)) }
}

/// Gives the coarsest pixel that loses nothing of what the telescope shows in still air, in micrometres, in double.
///
/// lambda f / (2 D): two pixels to the period of the cutoff frequency (Shannon 1949; Goodman, Introduction to Fourier
/// Optics).
/// Ranges: focal_length_mm, aperture_mm, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_nyquist_pixel_f64(
    focal_length_mm: f64,
    aperture_mm: f64,
    wavelength_nm: f64,
    pixel_um: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(pixel_um, 4, || imaging::nyquist_pixel(focal_length_mm, aperture_mm, wavelength_nm)) }
}

/// Gives the focal length that gives a pixel so much of the sky, in micrometres.
///
/// (1 rad) p / scale (Schroeder, Astronomical Optics).
/// Ranges: pixel_nm, pixel_scale_uas not 0.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, zero, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_focal_length_for_pixel_scale_fx(
    pixel_nm: u32,
    pixel_scale_uas: u32,
    focal_length_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(focal_length_um, 3, || {
            imaging::focal_length_for_pixel_scale_fx(Nanometres(pixel_nm), Microarcseconds(pixel_scale_uas))
        })
    }
}

/// Gives the focal length that gives a pixel so much of the sky, in millimetres.
///
/// (1 rad) p / scale (Schroeder, Astronomical Optics).
/// Ranges: pixel_um, pixel_scale_arcsec 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_focal_length_for_pixel_scale_f32(
    pixel_um: f32,
    pixel_scale_arcsec: f32,
    focal_length_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(focal_length_mm, 3, || imaging::focal_length_for_pixel_scale(pixel_um, pixel_scale_arcsec))
    }
}

/// Gives the focal length that gives a pixel so much of the sky, in millimetres, in double.
///
/// (1 rad) p / scale (Schroeder, Astronomical Optics).
/// Ranges: pixel_um, pixel_scale_arcsec 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_focal_length_for_pixel_scale_f64(
    pixel_um: f64,
    pixel_scale_arcsec: f64,
    focal_length_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(focal_length_mm, 3, || imaging::focal_length_for_pixel_scale(pixel_um, pixel_scale_arcsec))
    }
}

/// Gives the angle of sky from corner to corner of a sensor, in milliarcseconds.
///
/// 2 atan(p sqrt(c^2 + r^2) / 2f) (Schroeder, Astronomical Optics).
/// Ranges: pixel_nm, columns, rows, focal_length_um not 0.
/// Error: at most 1 LSB.
/// Statuses: null pointer, zero.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_diagonal_field_fx(
    pixel_nm: u32,
    columns: u16,
    rows: u16,
    focal_length_um: u32,
    field_mas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(field_mas, 5, || {
            imaging::diagonal_field_fx(Nanometres(pixel_nm), columns, rows, Micrometres(focal_length_um))
        })
    }
}

/// Gives the angle of sky from corner to corner of a sensor, in arcseconds.
///
/// 2 atan(p sqrt(c^2 + r^2) / 2f) (Schroeder, Astronomical Optics).
/// Ranges: pixel_um, focal_length_mm 2^-32 to 2^32; columns, rows not 0.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_diagonal_field_f32(
    pixel_um: f32,
    columns: u16,
    rows: u16,
    focal_length_mm: f32,
    field_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(field_arcsec, 5, || imaging::diagonal_field(pixel_um, columns, rows, focal_length_mm)) }
}

/// Gives the angle of sky from corner to corner of a sensor, in arcseconds, in double.
///
/// 2 atan(p sqrt(c^2 + r^2) / 2f) (Schroeder, Astronomical Optics).
/// Ranges: pixel_um, focal_length_mm 2^-32 to 2^32; columns, rows not 0.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_diagonal_field_f64(
    pixel_um: f64,
    columns: u16,
    rows: u16,
    focal_length_mm: f64,
    field_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(field_arcsec, 5, || imaging::diagonal_field(pixel_um, columns, rows, focal_length_mm)) }
}

/// Gives how large a target is at the focus, in nanometres.
///
/// 2 f tan(t/2) (Schroeder, Astronomical Optics).
/// Ranges: field_mas not 0, under 648000000 (180 degrees); focal_length_um not 0.
/// Error: at most 1 LSB.
/// Statuses: null pointer, zero, out of range, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_image_size_fx(
    field_mas: u32,
    focal_length_um: u32,
    size_nm: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(size_nm, 3, || imaging::image_size_fx(Milliarcseconds(field_mas), Micrometres(focal_length_um)))
    }
}

/// Gives how large a target is at the focus, in micrometres.
///
/// 2 f tan(t/2) (Schroeder, Astronomical Optics).
/// Ranges: field_arcsec 2^-32 to under 648000 (180 degrees); focal_length_mm 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_image_size_f32(
    field_arcsec: f32,
    focal_length_mm: f32,
    size_um: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(size_um, 3, || imaging::image_size(field_arcsec, focal_length_mm)) }
}

/// Gives how large a target is at the focus, in micrometres, in double.
///
/// 2 f tan(t/2) (Schroeder, Astronomical Optics).
/// Ranges: field_arcsec 2^-32 to under 648000 (180 degrees); focal_length_mm 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_image_size_f64(
    field_arcsec: f64,
    focal_length_mm: f64,
    size_um: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(size_um, 3, || imaging::image_size(field_arcsec, focal_length_mm)) }
}

/// Gives how many stops more exposure a focal ratio needs than another, negative where it needs less, signed Q16.16.
///
/// 2 log2(Nto / Nfrom) (ISO 517: a stop is twice the time, the root of two in the focal ratio).
/// Ranges: from_focal_ratio_q16, to_focal_ratio_q16 not 0.
/// Error: at most 1 LSB.
/// Statuses: null pointer, zero.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_exposure_stops_fx(
    from_focal_ratio_q16: u32,
    to_focal_ratio_q16: u32,
    stops_q16: *mut i32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(stops_q16, 3, || imaging::exposure_stops_fx(Q16(from_focal_ratio_q16), Q16(to_focal_ratio_q16)))
    }
}

/// Gives how many stops more exposure a focal ratio needs than another, negative where it needs less.
///
/// 2 log2(Nto / Nfrom) (ISO 517: a stop is twice the time, the root of two in the focal ratio).
/// Ranges: from_focal_ratio, to_focal_ratio 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_exposure_stops_f32(
    from_focal_ratio: f32,
    to_focal_ratio: f32,
    stops: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(stops, 3, || imaging::exposure_stops(from_focal_ratio, to_focal_ratio)) }
}

/// Gives how many stops more exposure a focal ratio needs than another, negative where it needs less, in double.
///
/// 2 log2(Nto / Nfrom) (ISO 517: a stop is twice the time, the root of two in the focal ratio).
/// Ranges: from_focal_ratio, to_focal_ratio 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_exposure_stops_f64(
    from_focal_ratio: f64,
    to_focal_ratio: f64,
    stops: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(stops, 3, || imaging::exposure_stops(from_focal_ratio, to_focal_ratio)) }
}
