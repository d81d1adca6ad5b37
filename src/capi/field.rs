//! C exports of `optics::field`.

use super::{fieldstop_status, give};
use crate::optics::field;
use crate::units::{Micrometres, Milliarcseconds, Nanometres, Q16, SignedMicrometres};

/// Gives the focal ratio (the N of f/N), in Q16.16.
///
/// N = f / D.
/// Ranges: focal_length_um not 0; aperture_um not 0.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow (65536 or more).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_focal_ratio_fx(
    focal_length_um: u32,
    aperture_um: u32,
    focal_ratio_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(focal_ratio_q16, 3, || {
            field::focal_ratio_fx(Micrometres(focal_length_um), Micrometres(aperture_um))
        })
    }
}

/// Gives the focal ratio (the N of f/N), a plain number.
///
/// N = f / D.
/// Ranges: focal_length_mm 2^-32 to 2^32; aperture_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_focal_ratio_f32(
    focal_length_mm: f32,
    aperture_mm: f32,
    focal_ratio: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(focal_ratio, 3, || field::focal_ratio(focal_length_mm, aperture_mm)) }
}

/// Gives the focal ratio (the N of f/N), a plain number.
///
/// N = f / D.
/// Ranges: focal_length_mm 2^-32 to 2^32; aperture_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_focal_ratio_f64(
    focal_length_mm: f64,
    aperture_mm: f64,
    focal_ratio: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(focal_ratio, 3, || field::focal_ratio(focal_length_mm, aperture_mm)) }
}

/// Gives the focal length of a telescope with an amplifier or a reducer in its beam, in micrometres.
///
/// f k, where k is over 1 for a Barlow lens and under 1 for a reducer.
/// Ranges: focal_length_um not 0; amplification_q16 not 0.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow (4294967296 um or more).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_amplified_focal_length_fx(
    focal_length_um: u32,
    amplification_q16: u32,
    amplified_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(amplified_um, 3, || {
            field::amplified_focal_length_fx(Micrometres(focal_length_um), Q16(amplification_q16))
        })
    }
}

/// Gives the focal length of a telescope with an amplifier or a reducer in its beam, in millimetres.
///
/// f k, where k is over 1 for a Barlow lens and under 1 for a reducer.
/// Ranges: focal_length_mm 2^-32 to 2^32; amplification 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_amplified_focal_length_f32(
    focal_length_mm: f32,
    amplification: f32,
    amplified_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(amplified_mm, 3, || field::amplified_focal_length(focal_length_mm, amplification)) }
}

/// Gives the focal length of a telescope with an amplifier or a reducer in its beam, in millimetres.
///
/// f k, where k is over 1 for a Barlow lens and under 1 for a reducer.
/// Ranges: focal_length_mm 2^-32 to 2^32; amplification 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_amplified_focal_length_f64(
    focal_length_mm: f64,
    amplification: f64,
    amplified_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(amplified_mm, 3, || field::amplified_focal_length(focal_length_mm, amplification)) }
}

/// Gives how much a lens before the focus lengthens the focal length, in Q16.16.
///
/// k = 1 - s' / f, a thin lens of focal length f with the image s' behind it.
/// Ranges: element_focal_length_um not 0; image_distance_um under f where f is positive.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range, overflow (65536 or more).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_amplification_fx(
    element_focal_length_um: i32,
    image_distance_um: u32,
    amplification_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(amplification_q16, 3, || {
            field::amplification_fx(
                SignedMicrometres(element_focal_length_um),
                Micrometres(image_distance_um),
            )
        })
    }
}

/// Gives how much a lens before the focus lengthens the focal length, a plain number.
///
/// k = 1 - s' / f, a thin lens of focal length f with the image s' behind it.
/// Ranges: element_focal_length_mm 2^-32 to 2^32, or -2^32 to -2^-32; image_distance_mm 0 to 2^32, and under
/// f where f is positive.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_amplification_f32(
    element_focal_length_mm: f32,
    image_distance_mm: f32,
    amplification: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(amplification, 3, || field::amplification(element_focal_length_mm, image_distance_mm)) }
}

/// Gives how much a lens before the focus lengthens the focal length, a plain number.
///
/// k = 1 - s' / f, a thin lens of focal length f with the image s' behind it.
/// Ranges: element_focal_length_mm 2^-32 to 2^32, or -2^32 to -2^-32; image_distance_mm 0 to 2^32, and under
/// f where f is positive.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_amplification_f64(
    element_focal_length_mm: f64,
    image_distance_mm: f64,
    amplification: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(amplification, 3, || field::amplification(element_focal_length_mm, image_distance_mm)) }
}

/// Gives the magnification of a telescope with an eyepiece, in Q16.16.
///
/// M = f / fe.
/// Ranges: focal_length_um not 0; eyepiece_um not 0.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow (65536 or more).
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

/// Gives the magnification of a telescope with an eyepiece, a plain number.
///
/// M = f / fe.
/// Ranges: focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to 2^32.
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

/// Gives the magnification of a telescope with an eyepiece, a plain number.
///
/// M = f / fe.
/// Ranges: focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
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

/// Gives the diameter of the beam that leaves the eyepiece, in micrometres.
///
/// D fe / f.
/// Ranges: aperture_um not 0; focal_length_um not 0; eyepiece_um not 0.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow (4294967296 um or more).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_exit_pupil_fx(
    aperture_um: u32,
    focal_length_um: u32,
    eyepiece_um: u32,
    exit_pupil_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(exit_pupil_um, 4, || {
            field::exit_pupil_fx(
                Micrometres(aperture_um),
                Micrometres(focal_length_um),
                Micrometres(eyepiece_um),
            )
        })
    }
}

/// Gives the diameter of the beam that leaves the eyepiece, in millimetres.
///
/// D fe / f.
/// Ranges: aperture_mm 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_exit_pupil_f32(
    aperture_mm: f32,
    focal_length_mm: f32,
    eyepiece_mm: f32,
    exit_pupil_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(exit_pupil_mm, 4, || field::exit_pupil(aperture_mm, focal_length_mm, eyepiece_mm)) }
}

/// Gives the diameter of the beam that leaves the eyepiece, in millimetres.
///
/// D fe / f.
/// Ranges: aperture_mm 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_exit_pupil_f64(
    aperture_mm: f64,
    focal_length_mm: f64,
    eyepiece_mm: f64,
    exit_pupil_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(exit_pupil_mm, 4, || field::exit_pupil(aperture_mm, focal_length_mm, eyepiece_mm)) }
}

/// Gives the eyepiece focal length that gives an exit pupil, in micrometres.
///
/// p f / D.
/// Ranges: exit_pupil_um not 0; focal_length_um not 0; aperture_um not 0.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow (4294967296 um or more).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_eyepiece_for_exit_pupil_fx(
    exit_pupil_um: u32,
    focal_length_um: u32,
    aperture_um: u32,
    eyepiece_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(eyepiece_um, 4, || {
            field::eyepiece_for_exit_pupil_fx(
                Micrometres(exit_pupil_um),
                Micrometres(focal_length_um),
                Micrometres(aperture_um),
            )
        })
    }
}

/// Gives the eyepiece focal length that gives an exit pupil, in millimetres.
///
/// p f / D.
/// Ranges: exit_pupil_mm 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32; aperture_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_eyepiece_for_exit_pupil_f32(
    exit_pupil_mm: f32,
    focal_length_mm: f32,
    aperture_mm: f32,
    eyepiece_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(eyepiece_mm, 4, || field::eyepiece_for_exit_pupil(exit_pupil_mm, focal_length_mm, aperture_mm))
    }
}

/// Gives the eyepiece focal length that gives an exit pupil, in millimetres.
///
/// p f / D.
/// Ranges: exit_pupil_mm 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32; aperture_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_eyepiece_for_exit_pupil_f64(
    exit_pupil_mm: f64,
    focal_length_mm: f64,
    aperture_mm: f64,
    eyepiece_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(eyepiece_mm, 4, || field::eyepiece_for_exit_pupil(exit_pupil_mm, focal_length_mm, aperture_mm))
    }
}

/// Gives the eyepiece focal length that gives a magnification, in micrometres.
///
/// f / M.
/// Ranges: focal_length_um not 0; magnification_q16 not 0.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow (4294967296 um or more).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_eyepiece_for_magnification_fx(
    focal_length_um: u32,
    magnification_q16: u32,
    eyepiece_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(eyepiece_um, 3, || {
            field::eyepiece_for_magnification_fx(Micrometres(focal_length_um), Q16(magnification_q16))
        })
    }
}

/// Gives the eyepiece focal length that gives a magnification, in millimetres.
///
/// f / M.
/// Ranges: focal_length_mm 2^-32 to 2^32; magnification 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_eyepiece_for_magnification_f32(
    focal_length_mm: f32,
    magnification: f32,
    eyepiece_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(eyepiece_mm, 3, || field::eyepiece_for_magnification(focal_length_mm, magnification)) }
}

/// Gives the eyepiece focal length that gives a magnification, in millimetres.
///
/// f / M.
/// Ranges: focal_length_mm 2^-32 to 2^32; magnification 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_eyepiece_for_magnification_f64(
    focal_length_mm: f64,
    magnification: f64,
    eyepiece_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(eyepiece_mm, 3, || field::eyepiece_for_magnification(focal_length_mm, magnification)) }
}

/// Gives the angle of sky inside the eyepiece's field stop, in milliarcseconds.
///
/// 2 atan(s / 2f).
/// Ranges: field_stop_um not 0; focal_length_um not 0.
/// Error: at most 1 LSB.
/// Statuses: null pointer, zero.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_true_field_from_stop_fx(
    field_stop_um: u32,
    focal_length_um: u32,
    true_field_mas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(true_field_mas, 3, || {
            field::true_field_from_stop_fx(Micrometres(field_stop_um), Micrometres(focal_length_um))
        })
    }
}

/// Gives the angle of sky inside the eyepiece's field stop, in arcseconds.
///
/// 2 atan(s / 2f).
/// Ranges: field_stop_mm 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_true_field_from_stop_f32(
    field_stop_mm: f32,
    focal_length_mm: f32,
    true_field_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(true_field_arcsec, 3, || field::true_field_from_stop(field_stop_mm, focal_length_mm)) }
}

/// Gives the angle of sky inside the eyepiece's field stop, in arcseconds.
///
/// 2 atan(s / 2f).
/// Ranges: field_stop_mm 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_true_field_from_stop_f64(
    field_stop_mm: f64,
    focal_length_mm: f64,
    true_field_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(true_field_arcsec, 3, || field::true_field_from_stop(field_stop_mm, focal_length_mm)) }
}

/// Gives the angle of sky in an eyepiece that keeps straight lines straight, in milliarcseconds.
///
/// 2 atan(tan(A/2) fe / f).
/// Ranges: apparent_field_mas not 0, under 648000000 (180 degrees); focal_length_um not 0; eyepiece_um not
/// 0.
/// Error: at most 1 LSB.
/// Statuses: null pointer, zero, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_true_field_rectilinear_fx(
    apparent_field_mas: u32,
    focal_length_um: u32,
    eyepiece_um: u32,
    true_field_mas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(true_field_mas, 4, || {
            field::true_field_rectilinear_fx(
                Milliarcseconds(apparent_field_mas),
                Micrometres(focal_length_um),
                Micrometres(eyepiece_um),
            )
        })
    }
}

/// Gives the angle of sky in an eyepiece that keeps straight lines straight, in arcseconds.
///
/// 2 atan(tan(A/2) fe / f).
/// Ranges: apparent_field_arcsec 2^-32 to under 648000; focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to
/// 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_true_field_rectilinear_f32(
    apparent_field_arcsec: f32,
    focal_length_mm: f32,
    eyepiece_mm: f32,
    true_field_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(true_field_arcsec, 4, || {
            field::true_field_rectilinear(apparent_field_arcsec, focal_length_mm, eyepiece_mm)
        })
    }
}

/// Gives the angle of sky in an eyepiece that keeps straight lines straight, in arcseconds.
///
/// 2 atan(tan(A/2) fe / f).
/// Ranges: apparent_field_arcsec 2^-32 to under 648000; focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to
/// 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_true_field_rectilinear_f64(
    apparent_field_arcsec: f64,
    focal_length_mm: f64,
    eyepiece_mm: f64,
    true_field_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(true_field_arcsec, 4, || {
            field::true_field_rectilinear(apparent_field_arcsec, focal_length_mm, eyepiece_mm)
        })
    }
}

/// Gives the angle of sky in an eyepiece that keeps equal angles equal, in milliarcseconds.
///
/// A fe / f.
/// Ranges: apparent_field_mas not 0; focal_length_um not 0; eyepiece_um not 0.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow (4294967296 mas or more).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_true_field_equidistant_fx(
    apparent_field_mas: u32,
    focal_length_um: u32,
    eyepiece_um: u32,
    true_field_mas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(true_field_mas, 4, || {
            field::true_field_equidistant_fx(
                Milliarcseconds(apparent_field_mas),
                Micrometres(focal_length_um),
                Micrometres(eyepiece_um),
            )
        })
    }
}

/// Gives the angle of sky in an eyepiece that keeps equal angles equal, in arcseconds.
///
/// A fe / f.
/// Ranges: apparent_field_arcsec 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_true_field_equidistant_f32(
    apparent_field_arcsec: f32,
    focal_length_mm: f32,
    eyepiece_mm: f32,
    true_field_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(true_field_arcsec, 4, || {
            field::true_field_equidistant(apparent_field_arcsec, focal_length_mm, eyepiece_mm)
        })
    }
}

/// Gives the angle of sky in an eyepiece that keeps equal angles equal, in arcseconds.
///
/// A fe / f.
/// Ranges: apparent_field_arcsec 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32; eyepiece_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_true_field_equidistant_f64(
    apparent_field_arcsec: f64,
    focal_length_mm: f64,
    eyepiece_mm: f64,
    true_field_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(true_field_arcsec, 4, || {
            field::true_field_equidistant(apparent_field_arcsec, focal_length_mm, eyepiece_mm)
        })
    }
}

/// Gives the angle of sky along one side of a sensor, in milliarcseconds.
///
/// 2 atan(p n / 2f).
/// Ranges: pixel_nm not 0; pixel_count not 0; focal_length_um not 0.
/// Error: at most 1 LSB.
/// Statuses: null pointer, zero.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_frame_field_fx(
    pixel_nm: u32,
    pixel_count: u32,
    focal_length_um: u32,
    frame_mas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(frame_mas, 4, || {
            field::frame_field_fx(Nanometres(pixel_nm), pixel_count, Micrometres(focal_length_um))
        })
    }
}

/// Gives the angle of sky along one side of a sensor, in arcseconds.
///
/// 2 atan(p n / 2f).
/// Ranges: pixel_um 2^-32 to 2^32; pixel_count not 0, an integer; focal_length_mm 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_frame_field_f32(
    pixel_um: f32,
    pixel_count: u32,
    focal_length_mm: f32,
    frame_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(frame_arcsec, 4, || field::frame_field(pixel_um, pixel_count, focal_length_mm)) }
}

/// Gives the angle of sky along one side of a sensor, in arcseconds.
///
/// 2 atan(p n / 2f).
/// Ranges: pixel_um 2^-32 to 2^32; pixel_count not 0, an integer; focal_length_mm 2^-32 to 2^32.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_frame_field_f64(
    pixel_um: f64,
    pixel_count: u32,
    focal_length_mm: f64,
    frame_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(frame_arcsec, 4, || field::frame_field(pixel_um, pixel_count, focal_length_mm)) }
}

/// Gives the angle of sky to a millimetre at the focus, in milliarcseconds per millimetre.
///
/// (1 rad) / f.
/// Ranges: focal_length_um not 0.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, zero, overflow (4294967296 mas per mm or more, f under 49 um).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_plate_scale_fx(
    focal_length_um: u32,
    plate_scale_mas_per_mm: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(plate_scale_mas_per_mm, 2, || field::plate_scale_fx(Micrometres(focal_length_um))) }
}

/// Gives the angle of sky to a millimetre at the focus, in arcseconds per millimetre.
///
/// (1 rad) / f.
/// Ranges: focal_length_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_plate_scale_f32(
    focal_length_mm: f32,
    plate_scale_arcsec_per_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(plate_scale_arcsec_per_mm, 2, || field::plate_scale(focal_length_mm)) }
}

/// Gives the angle of sky to a millimetre at the focus, in arcseconds per millimetre.
///
/// (1 rad) / f.
/// Ranges: focal_length_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_plate_scale_f64(
    focal_length_mm: f64,
    plate_scale_arcsec_per_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(plate_scale_arcsec_per_mm, 2, || field::plate_scale(focal_length_mm)) }
}

/// Gives the angle of sky to a pixel, in microarcseconds.
///
/// (1 rad) p / f.
/// Ranges: pixel_nm not 0; focal_length_um not 0.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, zero, overflow (4294967296 uas or more).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_pixel_scale_fx(
    pixel_nm: u32,
    focal_length_um: u32,
    pixel_scale_uas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(pixel_scale_uas, 3, || field::pixel_scale_fx(Nanometres(pixel_nm), Micrometres(focal_length_um)))
    }
}

/// Gives the angle of sky to a pixel, in arcseconds.
///
/// (1 rad) p / f.
/// Ranges: pixel_um 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_pixel_scale_f32(
    pixel_um: f32,
    focal_length_mm: f32,
    pixel_scale_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(pixel_scale_arcsec, 3, || field::pixel_scale(pixel_um, focal_length_mm)) }
}

/// Gives the angle of sky to a pixel, in arcseconds.
///
/// (1 rad) p / f.
/// Ranges: pixel_um 2^-32 to 2^32; focal_length_mm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_pixel_scale_f64(
    pixel_um: f64,
    focal_length_mm: f64,
    pixel_scale_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(pixel_scale_arcsec, 3, || field::pixel_scale(pixel_um, focal_length_mm)) }
}

/// Gives the focal length that spreads a field over a width at the focus, in micrometres.
///
/// x / (2 tan(t/2)).
/// Ranges: extent_um not 0; field_mas not 0, under 648000000 (180 degrees).
/// Error: at most 1 LSB.
/// Statuses: null pointer, zero, out of range, overflow (4294967296 um or more).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_focal_length_for_field_fx(
    extent_um: u32,
    field_mas: u32,
    focal_length_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(focal_length_um, 3, || {
            field::focal_length_for_field_fx(Micrometres(extent_um), Milliarcseconds(field_mas))
        })
    }
}

/// Gives the focal length that spreads a field over a width at the focus, in millimetres.
///
/// x / (2 tan(t/2)).
/// Ranges: extent_mm 2^-32 to 2^32; field_arcsec 2^-32 to under 648000.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_focal_length_for_field_f32(
    extent_mm: f32,
    field_arcsec: f32,
    focal_length_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(focal_length_mm, 3, || field::focal_length_for_field(extent_mm, field_arcsec)) }
}

/// Gives the focal length that spreads a field over a width at the focus, in millimetres.
///
/// x / (2 tan(t/2)).
/// Ranges: extent_mm 2^-32 to 2^32; field_arcsec 2^-32 to under 648000.
/// Error: at most 3 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_focal_length_for_field_f64(
    extent_mm: f64,
    field_arcsec: f64,
    focal_length_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(focal_length_mm, 3, || field::focal_length_for_field(extent_mm, field_arcsec)) }
}

/// Gives how many frames in a row cover a target.
///
/// the smallest n with n frame - (n - 1) overlap >= target, at least 1.
/// Ranges: target_mas not 0; frame_mas not 0; overlap_mas under the frame.
/// Error: at most 0, it is exact.
/// Statuses: null pointer, zero, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_tiles_fx(
    target_mas: u32,
    frame_mas: u32,
    overlap_mas: u32,
    count: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(count, 4, || {
            field::tiles_fx(
                Milliarcseconds(target_mas),
                Milliarcseconds(frame_mas),
                Milliarcseconds(overlap_mas),
            )
        })
    }
}

/// Gives how many frames in a row cover a target.
///
/// the smallest n with n frame - (n - 1) overlap >= target, at least 1.
/// Ranges: target_arcsec 2^-32 to 2^32; frame_arcsec 2^-32 to 2^32; overlap_arcsec 0 to under the frame.
/// Error: at most 0, it is exact.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_tiles_f32(
    target_arcsec: f32,
    frame_arcsec: f32,
    overlap_arcsec: f32,
    count: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(count, 4, || field::tiles::<f32>(target_arcsec, frame_arcsec, overlap_arcsec)) }
}

/// Gives how many frames in a row cover a target.
///
/// the smallest n with n frame - (n - 1) overlap >= target, at least 1.
/// Ranges: target_arcsec 2^-32 to 2^32; frame_arcsec 2^-32 to 2^32; overlap_arcsec 0 to under the frame.
/// Error: at most 0, it is exact.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_tiles_f64(
    target_arcsec: f64,
    frame_arcsec: f64,
    overlap_arcsec: f64,
    count: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(count, 4, || field::tiles::<f64>(target_arcsec, frame_arcsec, overlap_arcsec)) }
}
