//! C exports of `optics::colour`.

use super::{fieldstop_status, give};
use crate::optics::colour;
use crate::units::{Micrometres, PartsPerMillion, Q16, RefractiveIndex};

/// Gives the Abbe number of a glass, Q16.16.
///
/// (nd - 1) / (nF - nC), the indices at 587.6, 486.1 and 656.3 nm (ISO 10110-18).
/// Ranges: index_d_n7 over 10000000 (1); index_f_n7 not 0; index_c_n7 not 0, under index_f_n7.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_abbe_number_fx(
    index_d_n7: u32,
    index_f_n7: u32,
    index_c_n7: u32,
    abbe_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(abbe_q16, 4, || {
            colour::abbe_number_fx(
                RefractiveIndex(index_d_n7),
                RefractiveIndex(index_f_n7),
                RefractiveIndex(index_c_n7),
            )
        })
    }
}

/// Gives the Abbe number of a glass.
///
/// (nd - 1) / (nF - nC), the indices at 587.6, 486.1 and 656.3 nm (ISO 10110-18).
/// Ranges: index_d over 1 to 2^32; index_f 2^-32 to 2^32; index_c 2^-32 to under index_f.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_abbe_number_f32(
    index_d: f32,
    index_f: f32,
    index_c: f32,
    abbe: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(abbe, 4, || colour::abbe_number(index_d, index_f, index_c)) }
}

/// Gives the Abbe number of a glass, in double.
///
/// (nd - 1) / (nF - nC), the indices at 587.6, 486.1 and 656.3 nm (ISO 10110-18).
/// Ranges: index_d over 1 to 2^32; index_f 2^-32 to 2^32; index_c 2^-32 to under index_f.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_abbe_number_f64(
    index_d: f64,
    index_f: f64,
    index_c: f64,
    abbe: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(abbe, 4, || colour::abbe_number(index_d, index_f, index_c)) }
}

/// Gives how far apart along the axis a single lens focuses blue and red, F and C, in micrometres.
///
/// f / V, a thin lens (Kingslake, Lens Design Fundamentals).
/// Ranges: focal_length_um, abbe_q16 not 0.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_singlet_colour_shift_fx(
    focal_length_um: u32,
    abbe_q16: u32,
    shift_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(shift_um, 3, || colour::singlet_colour_shift_fx(Micrometres(focal_length_um), Q16(abbe_q16)))
    }
}

/// Gives how far apart along the axis a single lens focuses blue and red, F and C, in millimetres.
///
/// f / V, a thin lens (Kingslake, Lens Design Fundamentals).
/// Ranges: focal_length_mm, abbe 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_singlet_colour_shift_f32(
    focal_length_mm: f32,
    abbe: f32,
    shift_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(shift_mm, 3, || colour::singlet_colour_shift(focal_length_mm, abbe)) }
}

/// Gives how far apart along the axis a single lens focuses blue and red, F and C, in millimetres, in double.
///
/// f / V, a thin lens (Kingslake, Lens Design Fundamentals).
/// Ranges: focal_length_mm, abbe 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_singlet_colour_shift_f64(
    focal_length_mm: f64,
    abbe: f64,
    shift_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(shift_mm, 3, || colour::singlet_colour_shift(focal_length_mm, abbe)) }
}

/// Gives the diameter on the sky to which a single lens draws a star in blue and red, F and C, at the best focus, in
/// microarcseconds.
///
/// (1 rad) / (2 V N) (Kingslake, Lens Design Fundamentals).
/// Ranges: focal_ratio_q16, abbe_q16 not 0.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, zero, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_singlet_colour_blur_fx(
    focal_ratio_q16: u32,
    abbe_q16: u32,
    blur_angle_uas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(blur_angle_uas, 3, || colour::singlet_colour_blur_fx(Q16(focal_ratio_q16), Q16(abbe_q16))) }
}

/// Gives the diameter on the sky to which a single lens draws a star in blue and red, F and C, at the best focus, in
/// arcseconds.
///
/// (1 rad) / (2 V N) (Kingslake, Lens Design Fundamentals).
/// Ranges: focal_ratio, abbe 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_singlet_colour_blur_f32(
    focal_ratio: f32,
    abbe: f32,
    blur_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(blur_arcsec, 3, || colour::singlet_colour_blur(focal_ratio, abbe)) }
}

/// Gives the diameter on the sky to which a single lens draws a star in blue and red, F and C, at the best focus, in
/// arcseconds, in double.
///
/// (1 rad) / (2 V N) (Kingslake, Lens Design Fundamentals).
/// Ranges: focal_ratio, abbe 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_singlet_colour_blur_f64(
    focal_ratio: f64,
    abbe: f64,
    blur_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(blur_arcsec, 3, || colour::singlet_colour_blur(focal_ratio, abbe)) }
}

/// Gives the focal length of the crown lens of an achromat, in micrometres.
///
/// f (V1 - V2) / V1, thin lenses in contact (Kingslake, Lens Design Fundamentals).
/// Ranges: focal_length_um, crown_abbe_q16, flint_abbe_q16 not 0; flint_abbe_q16 under crown_abbe_q16.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_achromat_crown_fx(
    focal_length_um: u32,
    crown_abbe_q16: u32,
    flint_abbe_q16: u32,
    crown_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(crown_um, 4, || {
            colour::achromat_crown_fx(Micrometres(focal_length_um), Q16(crown_abbe_q16), Q16(flint_abbe_q16))
        })
    }
}

/// Gives the focal length of the crown lens of an achromat, in millimetres.
///
/// f (V1 - V2) / V1, thin lenses in contact (Kingslake, Lens Design Fundamentals).
/// Ranges: focal_length_mm, crown_abbe 2^-32 to 2^32; flint_abbe 2^-32 to under crown_abbe.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_achromat_crown_f32(
    focal_length_mm: f32,
    crown_abbe: f32,
    flint_abbe: f32,
    crown_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(crown_mm, 4, || colour::achromat_crown(focal_length_mm, crown_abbe, flint_abbe)) }
}

/// Gives the focal length of the crown lens of an achromat, in millimetres, in double.
///
/// f (V1 - V2) / V1, thin lenses in contact (Kingslake, Lens Design Fundamentals).
/// Ranges: focal_length_mm, crown_abbe 2^-32 to 2^32; flint_abbe 2^-32 to under crown_abbe.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_achromat_crown_f64(
    focal_length_mm: f64,
    crown_abbe: f64,
    flint_abbe: f64,
    crown_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(crown_mm, 4, || colour::achromat_crown(focal_length_mm, crown_abbe, flint_abbe)) }
}

/// Gives the focal length of the flint lens of an achromat, in size: the lens is negative, in micrometres.
///
/// f (V1 - V2) / V2, thin lenses in contact (Kingslake, Lens Design Fundamentals).
/// Ranges: focal_length_um, crown_abbe_q16, flint_abbe_q16 not 0; flint_abbe_q16 under crown_abbe_q16.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_achromat_flint_fx(
    focal_length_um: u32,
    crown_abbe_q16: u32,
    flint_abbe_q16: u32,
    flint_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(flint_um, 4, || {
            colour::achromat_flint_fx(Micrometres(focal_length_um), Q16(crown_abbe_q16), Q16(flint_abbe_q16))
        })
    }
}

/// Gives the focal length of the flint lens of an achromat, in size: the lens is negative, in millimetres.
///
/// f (V1 - V2) / V2, thin lenses in contact (Kingslake, Lens Design Fundamentals).
/// Ranges: focal_length_mm, crown_abbe 2^-32 to 2^32; flint_abbe 2^-32 to under crown_abbe.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_achromat_flint_f32(
    focal_length_mm: f32,
    crown_abbe: f32,
    flint_abbe: f32,
    flint_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(flint_mm, 4, || colour::achromat_flint(focal_length_mm, crown_abbe, flint_abbe)) }
}

/// Gives the focal length of the flint lens of an achromat, in size: the lens is negative, in millimetres, in double.
///
/// f (V1 - V2) / V2, thin lenses in contact (Kingslake, Lens Design Fundamentals).
/// Ranges: focal_length_mm, crown_abbe 2^-32 to 2^32; flint_abbe 2^-32 to under crown_abbe.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_achromat_flint_f64(
    focal_length_mm: f64,
    crown_abbe: f64,
    flint_abbe: f64,
    flint_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(flint_mm, 4, || colour::achromat_flint(focal_length_mm, crown_abbe, flint_abbe)) }
}

/// Gives how far from the common focus of blue and red, F and C, an achromat brings the colour between, in micrometres.
///
/// f dP / dV, dP and dV the differences of the two glasses in partial dispersion and Abbe number (Kingslake, Lens
/// Design Fundamentals).
/// Ranges: focal_length_um, abbe_difference_q16 not 0; partial_difference_ppm any.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_spectrum_fx(
    focal_length_um: u32,
    partial_difference_ppm: u32,
    abbe_difference_q16: u32,
    spectrum_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(spectrum_um, 4, || {
            colour::secondary_spectrum_fx(
                Micrometres(focal_length_um),
                PartsPerMillion(partial_difference_ppm),
                Q16(abbe_difference_q16),
            )
        })
    }
}

/// Gives how far from the common focus of blue and red, F and C, an achromat brings the colour between, in millimetres.
///
/// f dP / dV, dP and dV the differences of the two glasses in partial dispersion and Abbe number (Kingslake, Lens
/// Design Fundamentals).
/// Ranges: focal_length_mm, abbe_difference 2^-32 to 2^32; partial_difference 0 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_spectrum_f32(
    focal_length_mm: f32,
    partial_difference: f32,
    abbe_difference: f32,
    spectrum_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(spectrum_mm, 4, || {
            colour::secondary_spectrum(focal_length_mm, partial_difference, abbe_difference)
        })
    }
}

/// Gives how far from the common focus of blue and red, F and C, an achromat brings the colour between, in millimetres,
/// in double.
///
/// f dP / dV, dP and dV the differences of the two glasses in partial dispersion and Abbe number (Kingslake, Lens
/// Design Fundamentals).
/// Ranges: focal_length_mm, abbe_difference 2^-32 to 2^32; partial_difference 0 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_spectrum_f64(
    focal_length_mm: f64,
    partial_difference: f64,
    abbe_difference: f64,
    spectrum_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(spectrum_mm, 4, || {
            colour::secondary_spectrum(focal_length_mm, partial_difference, abbe_difference)
        })
    }
}
