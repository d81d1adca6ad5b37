//! C exports of `optics::field`.

use super::{fieldstop_status, give};
use crate::optics::field;
use crate::units::Micrometres;

/// Gives the magnification of a telescope with an eyepiece, Q16.16.
///
/// M = f / fe.
/// Ranges: focal_length_um, eyepiece_um not 0.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow (M is 65536 or more).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_magnification_fx(
    focal_length_um: u32,
    eyepiece_um: u32,
    magnification_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(magnification_q16, 3, || {
            field::magnification_fx(Micrometres(focal_length_um), Micrometres(eyepiece_um))
        })
    }
}

/// Gives the magnification of a telescope with an eyepiece.
///
/// M = f / fe.
/// Ranges: focal_length_mm, eyepiece_mm 2^-40 to 2^40.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_magnification_f32(
    focal_length_mm: f32,
    eyepiece_mm: f32,
    magnification: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(magnification, 3, || field::magnification(focal_length_mm, eyepiece_mm)) }
}

/// Gives the magnification of a telescope with an eyepiece, in double.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_magnification_f64(
    focal_length_mm: f64,
    eyepiece_mm: f64,
    magnification: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(magnification, 3, || field::magnification(focal_length_mm, eyepiece_mm)) }
}
