//! C exports of `optics::resolution`.

use super::{fieldstop_status, give};
use crate::optics::resolution;
use crate::units::{Microarcseconds, Micrometres, Nanometres, Q16};

/// Gives Rayleigh's limit: the separation of two stars, one at the other's first dark ring, in microarcseconds.
///
/// (j11 / pi) lambda / D = 1.2196699 lambda / D, j11 the first positive zero of J1 (Born and Wolf).
/// Ranges: aperture_um, wavelength_nm not 0.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, zero, overflow (the limit is over 4294 arcseconds).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_rayleigh_limit_fx(
    aperture_um: u32,
    wavelength_nm: u32,
    limit_uas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(limit_uas, 3, || {
            resolution::rayleigh_limit_fx(Micrometres(aperture_um), Nanometres(wavelength_nm))
        })
    }
}

/// Gives Rayleigh's limit: the separation of two stars, one at the other's first dark ring, in arcseconds.
///
/// (j11 / pi) lambda / D = 1.2196699 lambda / D, j11 the first positive zero of J1 (Born and Wolf).
/// Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_rayleigh_limit_f32(
    aperture_mm: f32,
    wavelength_nm: f32,
    limit_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(limit_arcsec, 3, || resolution::rayleigh_limit(aperture_mm, wavelength_nm)) }
}

/// Gives Rayleigh's limit: the separation of two stars, one at the other's first dark ring, in arcseconds, in
/// double.
///
/// (j11 / pi) lambda / D = 1.2196699 lambda / D, j11 the first positive zero of J1 (Born and Wolf).
/// Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_rayleigh_limit_f64(
    aperture_mm: f64,
    wavelength_nm: f64,
    limit_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(limit_arcsec, 3, || resolution::rayleigh_limit(aperture_mm, wavelength_nm)) }
}

/// Gives Rayleigh's limit with a central obstruction, in microarcseconds.
///
/// (x / pi) lambda / D, x the first positive root of J1(x) = e J1(e x), e = d / D (Born and Wolf).
/// Ranges: aperture_um, wavelength_nm not 0; obstruction_um under aperture_um.
/// Error: at most 1 LSB or 2 parts in 10^6, the larger.
/// Statuses: null pointer, zero, out of range, overflow (the limit is over 4294 arcseconds).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_rayleigh_limit_obstructed_fx(
    aperture_um: u32,
    obstruction_um: u32,
    wavelength_nm: u32,
    limit_uas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(limit_uas, 4, || {
            resolution::rayleigh_limit_obstructed_fx(
                Micrometres(aperture_um),
                Micrometres(obstruction_um),
                Nanometres(wavelength_nm),
            )
        })
    }
}

/// Gives Rayleigh's limit with a central obstruction, in arcseconds.
///
/// (x / pi) lambda / D, x the first positive root of J1(x) = e J1(e x), e = d / D (Born and Wolf).
/// Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32; obstruction_mm 0 to under aperture_mm.
/// Error: at most 2 parts in 10^6.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_rayleigh_limit_obstructed_f32(
    aperture_mm: f32,
    obstruction_mm: f32,
    wavelength_nm: f32,
    limit_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(limit_arcsec, 4, || {
            resolution::rayleigh_limit_obstructed(aperture_mm, obstruction_mm, wavelength_nm)
        })
    }
}

/// Gives Rayleigh's limit with a central obstruction, in arcseconds, in double.
///
/// (x / pi) lambda / D, x the first positive root of J1(x) = e J1(e x), e = d / D (Born and Wolf).
/// Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32; obstruction_mm 0 to under aperture_mm.
/// Error: at most 2 parts in 10^6.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_rayleigh_limit_obstructed_f64(
    aperture_mm: f64,
    obstruction_mm: f64,
    wavelength_nm: f64,
    limit_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(limit_arcsec, 4, || {
            resolution::rayleigh_limit_obstructed(aperture_mm, obstruction_mm, wavelength_nm)
        })
    }
}

/// Gives Dawes's limit: the separation at which two equal stars are just seen apart, in microarcseconds.
///
/// 116 arcsec mm / D (common practice after Dawes, 1867).
/// Ranges: aperture_um not 0.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow (the limit is over 4294 arcseconds).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_dawes_limit_fx(aperture_um: u32, limit_uas: *mut u32) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(limit_uas, 2, || resolution::dawes_limit_fx(Micrometres(aperture_um))) }
}

/// Gives Dawes's limit: the separation at which two equal stars are just seen apart, in arcseconds.
///
/// 116 arcsec mm / D (common practice after Dawes, 1867).
/// Ranges: aperture_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_dawes_limit_f32(
    aperture_mm: f32,
    limit_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(limit_arcsec, 2, || resolution::dawes_limit(aperture_mm)) }
}

/// Gives Dawes's limit: the separation at which two equal stars are just seen apart, in arcseconds, in double.
///
/// 116 arcsec mm / D (common practice after Dawes, 1867).
/// Ranges: aperture_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_dawes_limit_f64(
    aperture_mm: f64,
    limit_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(limit_arcsec, 2, || resolution::dawes_limit(aperture_mm)) }
}

/// Gives Sparrow's limit: the separation of two stars at which the dip between them is gone, in microarcseconds.
///
/// 0.9471553 lambda / D (Sparrow 1916).
/// Ranges: aperture_um, wavelength_nm not 0.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, zero, overflow (the limit is over 4294 arcseconds).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_sparrow_limit_fx(
    aperture_um: u32,
    wavelength_nm: u32,
    limit_uas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(limit_uas, 3, || {
            resolution::sparrow_limit_fx(Micrometres(aperture_um), Nanometres(wavelength_nm))
        })
    }
}

/// Gives Sparrow's limit: the separation of two stars at which the dip between them is gone, in arcseconds.
///
/// 0.9471553 lambda / D (Sparrow 1916).
/// Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_sparrow_limit_f32(
    aperture_mm: f32,
    wavelength_nm: f32,
    limit_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(limit_arcsec, 3, || resolution::sparrow_limit(aperture_mm, wavelength_nm)) }
}

/// Gives Sparrow's limit: the separation of two stars at which the dip between them is gone, in arcseconds, in
/// double.
///
/// 0.9471553 lambda / D (Sparrow 1916).
/// Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_sparrow_limit_f64(
    aperture_mm: f64,
    wavelength_nm: f64,
    limit_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(limit_arcsec, 3, || resolution::sparrow_limit(aperture_mm, wavelength_nm)) }
}

/// Gives the full width at half maximum of a star's image in perfect optics and still air, in microarcseconds.
///
/// 1.0289940 lambda / D (Airy 1835).
/// Ranges: aperture_um, wavelength_nm not 0.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, zero, overflow (the width is over 4294 arcseconds).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_airy_fwhm_fx(
    aperture_um: u32,
    wavelength_nm: u32,
    fwhm_uas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(fwhm_uas, 3, || resolution::airy_fwhm_fx(Micrometres(aperture_um), Nanometres(wavelength_nm)))
    }
}

/// Gives the full width at half maximum of a star's image in perfect optics and still air, in arcseconds.
///
/// 1.0289940 lambda / D (Airy 1835).
/// Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_airy_fwhm_f32(
    aperture_mm: f32,
    wavelength_nm: f32,
    fwhm_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(fwhm_arcsec, 3, || resolution::airy_fwhm(aperture_mm, wavelength_nm)) }
}

/// Gives the full width at half maximum of a star's image in perfect optics and still air, in arcseconds, in
/// double.
///
/// 1.0289940 lambda / D (Airy 1835).
/// Ranges: aperture_mm, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_airy_fwhm_f64(
    aperture_mm: f64,
    wavelength_nm: f64,
    fwhm_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(fwhm_arcsec, 3, || resolution::airy_fwhm(aperture_mm, wavelength_nm)) }
}

/// Gives the radius of the Airy disc at the focus, centre to first dark ring, in nanometres.
///
/// (j11 / pi) lambda f / D = 1.2196699 lambda f / D (Born and Wolf).
/// Ranges: focal_length_um, aperture_um, wavelength_nm not 0.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, zero, overflow (the radius is over 4.29 m).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_airy_radius_fx(
    focal_length_um: u32,
    aperture_um: u32,
    wavelength_nm: u32,
    radius_nm: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(radius_nm, 4, || {
            resolution::airy_radius_fx(
                Micrometres(focal_length_um),
                Micrometres(aperture_um),
                Nanometres(wavelength_nm),
            )
        })
    }
}

/// Gives the radius of the Airy disc at the focus, centre to first dark ring, in micrometres.
///
/// (j11 / pi) lambda f / D = 1.2196699 lambda f / D (Born and Wolf).
/// Ranges: focal_length_mm, aperture_mm, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_airy_radius_f32(
    focal_length_mm: f32,
    aperture_mm: f32,
    wavelength_nm: f32,
    radius_um: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(radius_um, 4, || resolution::airy_radius(focal_length_mm, aperture_mm, wavelength_nm)) }
}

/// Gives the radius of the Airy disc at the focus, centre to first dark ring, in micrometres, in double.
///
/// (j11 / pi) lambda f / D = 1.2196699 lambda f / D (Born and Wolf).
/// Ranges: focal_length_mm, aperture_mm, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_airy_radius_f64(
    focal_length_mm: f64,
    aperture_mm: f64,
    wavelength_nm: f64,
    radius_um: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(radius_um, 4, || resolution::airy_radius(focal_length_mm, aperture_mm, wavelength_nm)) }
}

/// Gives the cutoff frequency at the focus, beyond which detail has no contrast, in cycles per millimetre,
/// Q16.16.
///
/// D / (lambda f) (Goodman).
/// Ranges: focal_length_um, aperture_um, wavelength_nm not 0.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow (the frequency is 65536 or more).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_cutoff_frequency_fx(
    focal_length_um: u32,
    aperture_um: u32,
    wavelength_nm: u32,
    frequency_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(frequency_q16, 4, || {
            resolution::cutoff_frequency_fx(
                Micrometres(focal_length_um),
                Micrometres(aperture_um),
                Nanometres(wavelength_nm),
            )
        })
    }
}

/// Gives the cutoff frequency at the focus, beyond which detail has no contrast, in cycles per millimetre.
///
/// D / (lambda f) (Goodman).
/// Ranges: focal_length_mm, aperture_mm, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_cutoff_frequency_f32(
    focal_length_mm: f32,
    aperture_mm: f32,
    wavelength_nm: f32,
    frequency: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(frequency, 4, || resolution::cutoff_frequency(focal_length_mm, aperture_mm, wavelength_nm))
    }
}

/// Gives the cutoff frequency at the focus, beyond which detail has no contrast, in cycles per millimetre, in
/// double.
///
/// D / (lambda f) (Goodman).
/// Ranges: focal_length_mm, aperture_mm, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_cutoff_frequency_f64(
    focal_length_mm: f64,
    aperture_mm: f64,
    wavelength_nm: f64,
    frequency: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(frequency, 4, || resolution::cutoff_frequency(focal_length_mm, aperture_mm, wavelength_nm))
    }
}

/// Gives the contrast that the optics keep at a frequency, with a central obstruction, in Q16.16.
///
/// The area that two annuli share, their centres apart by the frequency times the outer diameter, over the area of one
/// (O'Neill 1956); without an obstruction (2 / pi) (acos v - v sqrt(1 - v^2)).
/// Ranges: frequency_q16 (of the cutoff frequency) at most 1; obstruction_q16 (of the aperture's diameter) under 1.
/// Error: at most 1 LSB.
/// Statuses: null pointer, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_contrast_fx(
    frequency_q16: u32,
    obstruction_q16: u32,
    contrast_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(contrast_q16, 3, || resolution::contrast_fx(Q16(frequency_q16), Q16(obstruction_q16))) }
}

/// Gives the contrast that the optics keep at a frequency, with a central obstruction, a plain number.
///
/// The area that two annuli share, their centres apart by the frequency times the outer diameter, over the area of one
/// (O'Neill 1956); without an obstruction (2 / pi) (acos v - v sqrt(1 - v^2)).
/// Ranges: frequency (of the cutoff frequency) 0 to 1; obstruction (of the aperture's diameter) 0 to under 1.
/// Error: at most 4e-6.
/// Statuses: null pointer, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_contrast_f32(
    frequency: f32,
    obstruction: f32,
    contrast: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(contrast, 3, || resolution::contrast(frequency, obstruction)) }
}

/// Gives the contrast that the optics keep at a frequency, with a central obstruction, a plain number, in double.
///
/// The area that two annuli share, their centres apart by the frequency times the outer diameter, over the area of one
/// (O'Neill 1956); without an obstruction (2 / pi) (acos v - v sqrt(1 - v^2)).
/// Ranges: frequency (of the cutoff frequency) 0 to 1; obstruction (of the aperture's diameter) 0 to under 1.
/// Error: at most 1e-14 / (1 - obstruction).
/// Statuses: null pointer, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_contrast_f64(
    frequency: f64,
    obstruction: f64,
    contrast: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(contrast, 3, || resolution::contrast(frequency, obstruction)) }
}

/// Gives the Strehl ratio of a wavefront: the brightness of the star image's centre against the perfect one, in
/// Q16.16.
///
/// exp(-(2 pi s / lambda)^2) (Mahajan 1983, after Marechal).
/// Ranges: wavelength_nm not 0; rms_nm any.
/// Error: at most 1 LSB.
/// Statuses: null pointer, zero.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_strehl_ratio_fx(
    rms_nm: u32,
    wavelength_nm: u32,
    ratio_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(ratio_q16, 3, || resolution::strehl_ratio_fx(Nanometres(rms_nm), Nanometres(wavelength_nm)))
    }
}

/// Gives the Strehl ratio of a wavefront: the brightness of the star image's centre against the perfect one, in a
/// plain number.
///
/// exp(-(2 pi s / lambda)^2) (Mahajan 1983, after Marechal).
/// Ranges: rms_nm 0 to 2^32; wavelength_nm 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_strehl_ratio_f32(
    rms_nm: f32,
    wavelength_nm: f32,
    ratio: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(ratio, 3, || resolution::strehl_ratio(rms_nm, wavelength_nm)) }
}

/// Gives the Strehl ratio of a wavefront: the brightness of the star image's centre against the perfect one, in a
/// plain number, in double.
///
/// exp(-(2 pi s / lambda)^2) (Mahajan 1983, after Marechal).
/// Ranges: rms_nm 0 to 2^32; wavelength_nm 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_strehl_ratio_f64(
    rms_nm: f64,
    wavelength_nm: f64,
    ratio: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(ratio, 3, || resolution::strehl_ratio(rms_nm, wavelength_nm)) }
}

/// Gives Fried's parameter, the aperture that the air leaves, in micrometres.
///
/// 0.98 lambda / FWHM, at the same wavelength (Fried 1966).
/// Ranges: seeing_uas, wavelength_nm not 0.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, zero, overflow (the parameter is over 4.29 km).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_fried_parameter_fx(
    seeing_uas: u32,
    wavelength_nm: u32,
    parameter_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(parameter_um, 3, || {
            resolution::fried_parameter_fx(Microarcseconds(seeing_uas), Nanometres(wavelength_nm))
        })
    }
}

/// Gives Fried's parameter, the aperture that the air leaves, in millimetres.
///
/// 0.98 lambda / FWHM, at the same wavelength (Fried 1966).
/// Ranges: seeing_arcsec, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_fried_parameter_f32(
    seeing_arcsec: f32,
    wavelength_nm: f32,
    parameter_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(parameter_mm, 3, || resolution::fried_parameter(seeing_arcsec, wavelength_nm)) }
}

/// Gives Fried's parameter, the aperture that the air leaves, in millimetres, in double.
///
/// 0.98 lambda / FWHM, at the same wavelength (Fried 1966).
/// Ranges: seeing_arcsec, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_fried_parameter_f64(
    seeing_arcsec: f64,
    wavelength_nm: f64,
    parameter_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(parameter_mm, 3, || resolution::fried_parameter(seeing_arcsec, wavelength_nm)) }
}

/// Gives the seeing at an airmass, from that at the zenith, in microarcseconds.
///
/// FWHM X^0.6 (Fried 1966).
/// Ranges: seeing_uas not 0; airmass_q16 1 to 40.
/// Error: at most 1 LSB or 1 part in 10^6, the larger.
/// Statuses: null pointer, zero, out of range, overflow (the width is over 4294 arcseconds).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_seeing_at_airmass_fx(
    seeing_uas: u32,
    airmass_q16: u32,
    fwhm_uas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(fwhm_uas, 3, || resolution::seeing_at_airmass_fx(Microarcseconds(seeing_uas), Q16(airmass_q16)))
    }
}

/// Gives the seeing at an airmass, from that at the zenith, in arcseconds.
///
/// FWHM X^0.6 (Fried 1966).
/// Ranges: seeing_arcsec 2^-32 to 2^32; airmass 1 to 40.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_seeing_at_airmass_f32(
    seeing_arcsec: f32,
    airmass: f32,
    fwhm_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(fwhm_arcsec, 3, || resolution::seeing_at_airmass(seeing_arcsec, airmass)) }
}

/// Gives the seeing at an airmass, from that at the zenith, in arcseconds, in double.
///
/// FWHM X^0.6 (Fried 1966).
/// Ranges: seeing_arcsec 2^-32 to 2^32; airmass 1 to 40.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_seeing_at_airmass_f64(
    seeing_arcsec: f64,
    airmass: f64,
    fwhm_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(fwhm_arcsec, 3, || resolution::seeing_at_airmass(seeing_arcsec, airmass)) }
}

/// Gives the width of a star image that three causes blur, in microarcseconds.
///
/// sqrt(a^2 + b^2 + c^2), full widths at half maximum (exact for Gaussian images).
/// Ranges: a_uas, b_uas, c_uas may be anything.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, overflow (the width is over 4294 arcseconds).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_combined_fwhm_fx(
    a_uas: u32,
    b_uas: u32,
    c_uas: u32,
    fwhm_uas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(fwhm_uas, 4, || {
            resolution::combined_fwhm_fx(
                Microarcseconds(a_uas),
                Microarcseconds(b_uas),
                Microarcseconds(c_uas),
            )
        })
    }
}

/// Gives the width of a star image that three causes blur, in arcseconds.
///
/// sqrt(a^2 + b^2 + c^2), full widths at half maximum (exact for Gaussian images).
/// Ranges: a_arcsec, b_arcsec, c_arcsec 0 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_combined_fwhm_f32(
    a_arcsec: f32,
    b_arcsec: f32,
    c_arcsec: f32,
    fwhm_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(fwhm_arcsec, 4, || resolution::combined_fwhm(a_arcsec, b_arcsec, c_arcsec)) }
}

/// Gives the width of a star image that three causes blur, in arcseconds, in double.
///
/// sqrt(a^2 + b^2 + c^2), full widths at half maximum (exact for Gaussian images).
/// Ranges: a_arcsec, b_arcsec, c_arcsec 0 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_combined_fwhm_f64(
    a_arcsec: f64,
    b_arcsec: f64,
    c_arcsec: f64,
    fwhm_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(fwhm_arcsec, 4, || resolution::combined_fwhm(a_arcsec, b_arcsec, c_arcsec)) }
}
