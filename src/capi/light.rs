//! C exports of `optics::light`.

use super::{fieldstop_status, give};
use crate::optics::light;
use crate::units::{Micrometres, Millimagnitudes, MillimagnitudesPerAirmass, Q16};

/// Gives the share of the light that mirrors and glass surfaces let through, in Q16.16.
///
/// R^m T^s, where 0 to the power 0 is 1 (Smith, Modern Optical Engineering).
/// Ranges: reflectance_q16, transmittance_q16 at most 1; mirrors, surfaces any.
/// Error: at most 1 LSB.
/// Statuses: null pointer, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_throughput_fx(
    mirrors: u8,
    reflectance_q16: u32,
    surfaces: u8,
    transmittance_q16: u32,
    throughput_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(throughput_q16, 5, || {
            light::throughput_fx(mirrors, Q16(reflectance_q16), surfaces, Q16(transmittance_q16))
        })
    }
}

/// Gives the share of the light that mirrors and glass surfaces let through, a plain number.
///
/// R^m T^s, where 0 to the power 0 is 1 (Smith, Modern Optical Engineering).
/// Ranges: reflectance, transmittance 0 to 1; mirrors, surfaces any.
/// Error: at most 3 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_throughput_f32(
    mirrors: u8,
    reflectance: f32,
    surfaces: u8,
    transmittance: f32,
    throughput: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(throughput, 5, || light::throughput(mirrors, reflectance, surfaces, transmittance)) }
}

/// Gives the share of the light that mirrors and glass surfaces let through, a plain number, in double.
///
/// R^m T^s, where 0 to the power 0 is 1 (Smith, Modern Optical Engineering).
/// Ranges: reflectance, transmittance 0 to 1; mirrors, surfaces any.
/// Error: at most 3 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_throughput_f64(
    mirrors: u8,
    reflectance: f64,
    surfaces: u8,
    transmittance: f64,
    throughput: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(throughput, 5, || light::throughput(mirrors, reflectance, surfaces, transmittance)) }
}

/// Gives the share of the aperture's area that the central obstruction leaves, in Q16.16.
///
/// 1 - (d / D)^2 (Schroeder, Astronomical Optics).
/// Ranges: aperture_um not 0; obstruction_um under the aperture.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_clear_fraction_fx(
    aperture_um: u32,
    obstruction_um: u32,
    fraction_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(fraction_q16, 3, || {
            light::clear_fraction_fx(Micrometres(aperture_um), Micrometres(obstruction_um))
        })
    }
}

/// Gives the share of the aperture's area that the central obstruction leaves, a plain number.
///
/// 1 - (d / D)^2 (Schroeder, Astronomical Optics).
/// Ranges: aperture_mm 2^-32 to 2^32; obstruction_mm from 0 to under the aperture.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_clear_fraction_f32(
    aperture_mm: f32,
    obstruction_mm: f32,
    fraction: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(fraction, 3, || light::clear_fraction(aperture_mm, obstruction_mm)) }
}

/// Gives the share of the aperture's area that the central obstruction leaves, a plain number, in double.
///
/// 1 - (d / D)^2 (Schroeder, Astronomical Optics).
/// Ranges: aperture_mm 2^-32 to 2^32; obstruction_mm from 0 to under the aperture.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_clear_fraction_f64(
    aperture_mm: f64,
    obstruction_mm: f64,
    fraction: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(fraction, 3, || light::clear_fraction(aperture_mm, obstruction_mm)) }
}

/// Gives the clear, lossless aperture that would gather as much light, in micrometres.
///
/// D sqrt((1 - (d / D)^2) T) (Schroeder, Astronomical Optics).
/// Ranges: aperture_um not 0; obstruction_um under the aperture; throughput_q16 at most 1.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, zero, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_effective_aperture_fx(
    aperture_um: u32,
    obstruction_um: u32,
    throughput_q16: u32,
    effective_aperture_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(effective_aperture_um, 4, || {
            light::effective_aperture_fx(
                Micrometres(aperture_um),
                Micrometres(obstruction_um),
                Q16(throughput_q16),
            )
        })
    }
}

/// Gives the clear, lossless aperture that would gather as much light, in millimetres.
///
/// D sqrt((1 - (d / D)^2) T) (Schroeder, Astronomical Optics).
/// Ranges: aperture_mm 2^-32 to 2^32; obstruction_mm from 0 to under the aperture; throughput 0 to 1.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_effective_aperture_f32(
    aperture_mm: f32,
    obstruction_mm: f32,
    throughput: f32,
    effective_aperture_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(effective_aperture_mm, 4, || light::effective_aperture(aperture_mm, obstruction_mm, throughput))
    }
}

/// Gives the clear, lossless aperture that would gather as much light, in millimetres, in double.
///
/// D sqrt((1 - (d / D)^2) T) (Schroeder, Astronomical Optics).
/// Ranges: aperture_mm 2^-32 to 2^32; obstruction_mm from 0 to under the aperture; throughput 0 to 1.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_effective_aperture_f64(
    aperture_mm: f64,
    obstruction_mm: f64,
    throughput: f64,
    effective_aperture_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(effective_aperture_mm, 4, || light::effective_aperture(aperture_mm, obstruction_mm, throughput))
    }
}

/// Gives how many magnitudes fainter a telescope shows a star than the bare eye, in millimagnitudes.
///
/// 5 log10(D / p); negative where the pupil is the wider (Pogson 1856; Schroeder, Astronomical Optics).
/// Ranges: effective_aperture_um, eye_pupil_um not 0.
/// Error: at most 1 LSB.
/// Statuses: null pointer, zero.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_magnitude_gain_fx(
    effective_aperture_um: u32,
    eye_pupil_um: u32,
    gain_mmag: *mut i32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(gain_mmag, 3, || {
            light::magnitude_gain_fx(Micrometres(effective_aperture_um), Micrometres(eye_pupil_um))
        })
    }
}

/// Gives how many magnitudes fainter a telescope shows a star than the bare eye, in magnitudes.
///
/// 5 log10(D / p); negative where the pupil is the wider (Pogson 1856; Schroeder, Astronomical Optics).
/// Ranges: effective_aperture_mm, eye_pupil_mm 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_magnitude_gain_f32(
    effective_aperture_mm: f32,
    eye_pupil_mm: f32,
    gain_mag: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(gain_mag, 3, || light::magnitude_gain(effective_aperture_mm, eye_pupil_mm)) }
}

/// Gives how many magnitudes fainter a telescope shows a star than the bare eye, in magnitudes, in double.
///
/// 5 log10(D / p); negative where the pupil is the wider (Pogson 1856; Schroeder, Astronomical Optics).
/// Ranges: effective_aperture_mm, eye_pupil_mm 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_magnitude_gain_f64(
    effective_aperture_mm: f64,
    eye_pupil_mm: f64,
    gain_mag: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(gain_mag, 3, || light::magnitude_gain(effective_aperture_mm, eye_pupil_mm)) }
}

/// Gives the faintest star that a telescope shows to an eye whose own limit is known, in millimagnitudes.
///
/// m0 + 5 log10(D / p) (Pogson 1856; Schroeder, Astronomical Optics).
/// Ranges: effective_aperture_um, eye_pupil_um not 0; naked_eye_mmag any.
/// Error: at most 1 LSB.
/// Statuses: null pointer, zero, overflow (beyond 32 bits).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_limiting_magnitude_fx(
    naked_eye_mmag: i32,
    effective_aperture_um: u32,
    eye_pupil_um: u32,
    limit_mmag: *mut i32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(limit_mmag, 4, || {
            light::limiting_magnitude_fx(
                Millimagnitudes(naked_eye_mmag),
                Micrometres(effective_aperture_um),
                Micrometres(eye_pupil_um),
            )
        })
    }
}

/// Gives the faintest star that a telescope shows to an eye whose own limit is known, in magnitudes.
///
/// m0 + 5 log10(D / p) (Pogson 1856; Schroeder, Astronomical Optics).
/// Ranges: naked_eye_mag -2^32 to 2^32; effective_aperture_mm, eye_pupil_mm 2^-32 to 2^32.
/// Error: at most 3 ulp of the larger term.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_limiting_magnitude_f32(
    naked_eye_mag: f32,
    effective_aperture_mm: f32,
    eye_pupil_mm: f32,
    limit_mag: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(limit_mag, 4, || light::limiting_magnitude(naked_eye_mag, effective_aperture_mm, eye_pupil_mm))
    }
}

/// Gives the faintest star that a telescope shows to an eye whose own limit is known, in magnitudes, in
/// double.
///
/// m0 + 5 log10(D / p) (Pogson 1856; Schroeder, Astronomical Optics).
/// Ranges: naked_eye_mag -2^32 to 2^32; effective_aperture_mm, eye_pupil_mm 2^-32 to 2^32.
/// Error: at most 3 ulp of the larger term.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_limiting_magnitude_f64(
    naked_eye_mag: f64,
    effective_aperture_mm: f64,
    eye_pupil_mm: f64,
    limit_mag: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(limit_mag, 4, || light::limiting_magnitude(naked_eye_mag, effective_aperture_mm, eye_pupil_mm))
    }
}

/// Gives how bright an extended object looks in the eyepiece, against the bare eye, in Q16.16.
///
/// T min(1, (x / p)^2) (Born and Wolf, Principles of Optics).
/// Ranges: exit_pupil_um, eye_pupil_um not 0; throughput_q16 at most 1.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_surface_brightness_fx(
    exit_pupil_um: u32,
    eye_pupil_um: u32,
    throughput_q16: u32,
    brightness_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(brightness_q16, 4, || {
            light::surface_brightness_fx(
                Micrometres(exit_pupil_um),
                Micrometres(eye_pupil_um),
                Q16(throughput_q16),
            )
        })
    }
}

/// Gives how bright an extended object looks in the eyepiece, against the bare eye, a plain number.
///
/// T min(1, (x / p)^2) (Born and Wolf, Principles of Optics).
/// Ranges: exit_pupil_mm, eye_pupil_mm 2^-32 to 2^32; throughput 0 to 1.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_surface_brightness_f32(
    exit_pupil_mm: f32,
    eye_pupil_mm: f32,
    throughput: f32,
    brightness: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(brightness, 4, || light::surface_brightness(exit_pupil_mm, eye_pupil_mm, throughput)) }
}

/// Gives how bright an extended object looks in the eyepiece, against the bare eye, a plain number, in
/// double.
///
/// T min(1, (x / p)^2) (Born and Wolf, Principles of Optics).
/// Ranges: exit_pupil_mm, eye_pupil_mm 2^-32 to 2^32; throughput 0 to 1.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_surface_brightness_f64(
    exit_pupil_mm: f64,
    eye_pupil_mm: f64,
    throughput: f64,
    brightness: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(brightness, 4, || light::surface_brightness(exit_pupil_mm, eye_pupil_mm, throughput)) }
}

/// Gives how many magnitudes fainter the first of two lights is than the second, in millimagnitudes.
///
/// -2.5 log10(a / b); both fluxes in any one unit (Pogson 1856).
/// Ranges: flux_a, flux_b not 0.
/// Error: at most 1 LSB.
/// Statuses: null pointer, zero.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_magnitude_difference_fx(
    flux_a: u32,
    flux_b: u32,
    difference_mmag: *mut i32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(difference_mmag, 3, || light::magnitude_difference_fx(flux_a, flux_b)) }
}

/// Gives how many magnitudes fainter the first of two lights is than the second, in magnitudes.
///
/// -2.5 log10(a / b); both fluxes in any one unit (Pogson 1856).
/// Ranges: flux_a, flux_b 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_magnitude_difference_f32(
    flux_a: f32,
    flux_b: f32,
    difference_mag: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(difference_mag, 3, || light::magnitude_difference(flux_a, flux_b)) }
}

/// Gives how many magnitudes fainter the first of two lights is than the second, in magnitudes, in double.
///
/// -2.5 log10(a / b); both fluxes in any one unit (Pogson 1856).
/// Ranges: flux_a, flux_b 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_magnitude_difference_f64(
    flux_a: f64,
    flux_b: f64,
    difference_mag: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(difference_mag, 3, || light::magnitude_difference(flux_a, flux_b)) }
}

/// Gives how many magnitudes a light loses from a near to a distant place, in millimagnitudes.
///
/// 5 log10(distant / near); both distances in any one unit (the inverse-square law).
/// Ranges: near_distance, distant_distance not 0.
/// Error: at most 1 LSB.
/// Statuses: null pointer, zero.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_distance_dimming_fx(
    near_distance: u32,
    distant_distance: u32,
    dimming_mmag: *mut i32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(dimming_mmag, 3, || light::distance_dimming_fx(near_distance, distant_distance)) }
}

/// Gives how many magnitudes a light loses from a near to a distant place, in magnitudes.
///
/// 5 log10(distant / near); both distances in any one unit (the inverse-square law).
/// Ranges: near_distance, distant_distance 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_distance_dimming_f32(
    near_distance: f32,
    distant_distance: f32,
    dimming_mag: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(dimming_mag, 3, || light::distance_dimming(near_distance, distant_distance)) }
}

/// Gives how many magnitudes a light loses from a near to a distant place, in magnitudes, in double.
///
/// 5 log10(distant / near); both distances in any one unit (the inverse-square law).
/// Ranges: near_distance, distant_distance 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_distance_dimming_f64(
    near_distance: f64,
    distant_distance: f64,
    dimming_mag: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(dimming_mag, 3, || light::distance_dimming(near_distance, distant_distance)) }
}

/// Gives how many magnitudes the air takes from a star, in millimagnitudes.
///
/// k X, of the loss in one airmass (Bouguer 1729).
/// Ranges: coefficient_mmag, airmass_q16 any.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, overflow (2147483648 mmag or more).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_extinction_fx(
    coefficient_mmag: u32,
    airmass_q16: u32,
    extinction_mmag: *mut i32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(extinction_mmag, 3, || {
            light::extinction_fx(MillimagnitudesPerAirmass(coefficient_mmag), Q16(airmass_q16))
        })
    }
}

/// Gives how many magnitudes the air takes from a star, in magnitudes.
///
/// k X, of the loss in one airmass (Bouguer 1729).
/// Ranges: coefficient_mag, airmass 0 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_extinction_f32(
    coefficient_mag: f32,
    airmass: f32,
    extinction_mag: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(extinction_mag, 3, || light::extinction(coefficient_mag, airmass)) }
}

/// Gives how many magnitudes the air takes from a star, in magnitudes, in double.
///
/// k X, of the loss in one airmass (Bouguer 1729).
/// Ranges: coefficient_mag, airmass 0 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_extinction_f64(
    coefficient_mag: f64,
    airmass: f64,
    extinction_mag: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(extinction_mag, 3, || light::extinction(coefficient_mag, airmass)) }
}

/// Gives the focal ratio of the lossless telescope that would expose a sensor as fast, in Q16.16.
///
/// N / sqrt(T) (Smith, Modern Optical Engineering).
/// Ranges: focal_ratio_q16 not 0; throughput_q16 not 0, at most 1.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, zero, out of range, overflow (65536 or more).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_t_number_fx(
    focal_ratio_q16: u32,
    throughput_q16: u32,
    t_number_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(t_number_q16, 3, || light::t_number_fx(Q16(focal_ratio_q16), Q16(throughput_q16))) }
}

/// Gives the focal ratio of the lossless telescope that would expose a sensor as fast, a plain number.
///
/// N / sqrt(T) (Smith, Modern Optical Engineering).
/// Ranges: focal_ratio 2^-32 to 2^32; throughput 2^-32 to 1.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_t_number_f32(
    focal_ratio: f32,
    throughput: f32,
    t_number: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(t_number, 3, || light::t_number(focal_ratio, throughput)) }
}

/// Gives the focal ratio of the lossless telescope that would expose a sensor as fast, a plain number, in
/// double.
///
/// N / sqrt(T) (Smith, Modern Optical Engineering).
/// Ranges: focal_ratio 2^-32 to 2^32; throughput 2^-32 to 1.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_t_number_f64(
    focal_ratio: f64,
    throughput: f64,
    t_number: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(t_number, 3, || light::t_number(focal_ratio, throughput)) }
}
