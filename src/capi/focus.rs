//! C exports of `optics::focus`.

use super::{fieldstop_status, give};
use crate::optics::focus;
use crate::units::{
    Micrometres, Milliarcseconds, Millimetres, Nanometres, PartsPerBillionPerKelvin, Q16, SignedMillikelvin,
    SignedPartsPerBillionPerKelvin,
};

/// Gives how far from the focus, each side, the wavefront is a quarter wave off, in nanometres.
///
/// 2 lambda N^2 (Born and Wolf, Principles of Optics).
/// Ranges: focal_ratio_q16, wavelength_nm not 0.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_depth_of_focus_fx(
    focal_ratio_q16: u32,
    wavelength_nm: u32,
    depth_nm: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(depth_nm, 3, || focus::depth_of_focus_fx(Q16(focal_ratio_q16), Nanometres(wavelength_nm))) }
}

/// Gives how far from the focus, each side, the wavefront is a quarter wave off, in micrometres.
///
/// 2 lambda N^2 (Born and Wolf, Principles of Optics).
/// Ranges: focal_ratio, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_depth_of_focus_f32(
    focal_ratio: f32,
    wavelength_nm: f32,
    depth_um: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(depth_um, 3, || focus::depth_of_focus(focal_ratio, wavelength_nm)) }
}

/// Gives how far from the focus, each side, the wavefront is a quarter wave off, in micrometres, in double.
///
/// 2 lambda N^2 (Born and Wolf, Principles of Optics).
/// Ranges: focal_ratio, wavelength_nm 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_depth_of_focus_f64(
    focal_ratio: f64,
    wavelength_nm: f64,
    depth_um: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(depth_um, 3, || focus::depth_of_focus(focal_ratio, wavelength_nm)) }
}

/// Gives the diameter of a star's image out of focus, by geometry, in nanometres.
///
/// d / N (Smith, Modern Optical Engineering).
/// Ranges: focal_ratio_q16 not 0; defocus_nm any.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_defocus_blur_fx(
    defocus_nm: u32,
    focal_ratio_q16: u32,
    blur_nm: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(blur_nm, 3, || focus::defocus_blur_fx(Nanometres(defocus_nm), Q16(focal_ratio_q16))) }
}

/// Gives the diameter of a star's image out of focus, by geometry, in micrometres.
///
/// d / N (Smith, Modern Optical Engineering).
/// Ranges: defocus_um 0 to 2^32; focal_ratio 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_defocus_blur_f32(
    defocus_um: f32,
    focal_ratio: f32,
    blur_um: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(blur_um, 3, || focus::defocus_blur(defocus_um, focal_ratio)) }
}

/// Gives the diameter of a star's image out of focus, by geometry, in micrometres, in double.
///
/// d / N (Smith, Modern Optical Engineering).
/// Ranges: defocus_um 0 to 2^32; focal_ratio 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_defocus_blur_f64(
    defocus_um: f64,
    focal_ratio: f64,
    blur_um: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(blur_um, 3, || focus::defocus_blur(defocus_um, focal_ratio)) }
}

/// Gives the error of the wavefront out of focus, from its lowest to its highest point, in nanometres.
///
/// d / (8 N^2) (Smith, Modern Optical Engineering).
/// Ranges: focal_ratio_q16 not 0; defocus_nm any.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_defocus_wavefront_fx(
    defocus_nm: u32,
    focal_ratio_q16: u32,
    wavefront_nm: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(wavefront_nm, 3, || focus::defocus_wavefront_fx(Nanometres(defocus_nm), Q16(focal_ratio_q16)))
    }
}

/// Gives the error of the wavefront out of focus, from its lowest to its highest point, in nanometres.
///
/// d / (8 N^2) (Smith, Modern Optical Engineering).
/// Ranges: defocus_um 0 to 2^32; focal_ratio 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_defocus_wavefront_f32(
    defocus_um: f32,
    focal_ratio: f32,
    wavefront_nm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(wavefront_nm, 3, || focus::defocus_wavefront(defocus_um, focal_ratio)) }
}

/// Gives the error of the wavefront out of focus, from its lowest to its highest point, in nanometres, in double.
///
/// d / (8 N^2) (Smith, Modern Optical Engineering).
/// Ranges: defocus_um 0 to 2^32; focal_ratio 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_defocus_wavefront_f64(
    defocus_um: f64,
    focal_ratio: f64,
    wavefront_nm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(wavefront_nm, 3, || focus::defocus_wavefront(defocus_um, focal_ratio)) }
}

/// Gives how many steps of the focus motor a distance takes, to the nearest.
///
/// d / s (counting).
/// Ranges: step_nm not 0; distance_nm any.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_motor_steps_fx(
    distance_nm: u32,
    step_nm: u32,
    steps: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(steps, 3, || focus::motor_steps_fx(Nanometres(distance_nm), Nanometres(step_nm))) }
}

/// Gives how many steps of the focus motor a distance takes, steps and their fraction.
///
/// d / s (counting).
/// Ranges: distance_um 0 to 2^32; step_um 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_motor_steps_f32(
    distance_um: f32,
    step_um: f32,
    steps: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(steps, 3, || focus::motor_steps(distance_um, step_um)) }
}

/// Gives how many steps of the focus motor a distance takes, steps and their fraction, in double.
///
/// d / s (counting).
/// Ranges: distance_um 0 to 2^32; step_um 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_motor_steps_f64(
    distance_um: f64,
    step_um: f64,
    steps: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(steps, 3, || focus::motor_steps(distance_um, step_um)) }
}

/// Gives how much longer a tube or a rod gets by a change of temperature, negative where it gets shorter, in
/// nanometres.
///
/// L a dT (CRC Handbook of Chemistry and Physics, linear expansion).
/// Ranges: length_um, expansion_ppb_per_k, temperature_change_mk any.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_thermal_shift_fx(
    length_um: u32,
    expansion_ppb_per_k: i32,
    temperature_change_mk: i32,
    shift_nm: *mut i32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(shift_nm, 4, || {
            focus::thermal_shift_fx(
                Micrometres(length_um),
                SignedPartsPerBillionPerKelvin(expansion_ppb_per_k),
                SignedMillikelvin(temperature_change_mk),
            )
        })
    }
}

/// Gives how much longer a tube or a rod gets by a change of temperature, negative where it gets shorter, in
/// micrometres.
///
/// L a dT (CRC Handbook of Chemistry and Physics, linear expansion).
/// Ranges: length_mm 0 to 2^32; expansion_ppm_per_k, temperature_change_k -2^32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_thermal_shift_f32(
    length_mm: f32,
    expansion_ppm_per_k: f32,
    temperature_change_k: f32,
    shift_um: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(shift_um, 4, || focus::thermal_shift(length_mm, expansion_ppm_per_k, temperature_change_k))
    }
}

/// Gives how much longer a tube or a rod gets by a change of temperature, negative where it gets shorter, in
/// micrometres, in double.
///
/// L a dT (CRC Handbook of Chemistry and Physics, linear expansion).
/// Ranges: length_mm 0 to 2^32; expansion_ppm_per_k, temperature_change_k -2^32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_thermal_shift_f64(
    length_mm: f64,
    expansion_ppm_per_k: f64,
    temperature_change_k: f64,
    shift_um: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(shift_um, 4, || focus::thermal_shift(length_mm, expansion_ppm_per_k, temperature_change_k))
    }
}

/// Gives the change of temperature that uses up a tolerance of focus, in millikelvin.
///
/// t / (L a), a the size of the coefficient of linear expansion (CRC Handbook of Chemistry and Physics, linear
/// expansion).
/// Ranges: length_um, expansion_ppb_per_k not 0; tolerance_nm any.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_refocus_temperature_fx(
    length_um: u32,
    expansion_ppb_per_k: u32,
    tolerance_nm: u32,
    temperature_change_mk: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(temperature_change_mk, 4, || {
            focus::refocus_temperature_fx(
                Micrometres(length_um),
                PartsPerBillionPerKelvin(expansion_ppb_per_k),
                Nanometres(tolerance_nm),
            )
        })
    }
}

/// Gives the change of temperature that uses up a tolerance of focus, in kelvin.
///
/// t / (L a), a the size of the coefficient of linear expansion (CRC Handbook of Chemistry and Physics, linear
/// expansion).
/// Ranges: length_mm, expansion_ppm_per_k 2^-32 to 2^32; tolerance_um 0 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_refocus_temperature_f32(
    length_mm: f32,
    expansion_ppm_per_k: f32,
    tolerance_um: f32,
    temperature_change_k: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(temperature_change_k, 4, || {
            focus::refocus_temperature(length_mm, expansion_ppm_per_k, tolerance_um)
        })
    }
}

/// Gives the change of temperature that uses up a tolerance of focus, in kelvin, in double.
///
/// t / (L a), a the size of the coefficient of linear expansion (CRC Handbook of Chemistry and Physics, linear
/// expansion).
/// Ranges: length_mm, expansion_ppm_per_k 2^-32 to 2^32; tolerance_um 0 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_refocus_temperature_f64(
    length_mm: f64,
    expansion_ppm_per_k: f64,
    tolerance_um: f64,
    temperature_change_k: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(temperature_change_k, 4, || {
            focus::refocus_temperature(length_mm, expansion_ppm_per_k, tolerance_um)
        })
    }
}

/// Gives how far the focus lies behind its place for a star when the object is near, in micrometres.
///
/// f^2 / (s - f) (Hecht, Optics).
/// Ranges: focal_length_um not 0; object_distance_mm beyond the focal length.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_near_focus_travel_fx(
    focal_length_um: u32,
    object_distance_mm: u32,
    travel_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(travel_um, 3, || {
            focus::near_focus_travel_fx(Micrometres(focal_length_um), Millimetres(object_distance_mm))
        })
    }
}

/// Gives how far the focus lies behind its place for a star when the object is near, in millimetres.
///
/// f^2 / (s - f) (Hecht, Optics).
/// Ranges: focal_length_mm 2^-32 to 2^32; object_distance_m beyond the focal length, to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_near_focus_travel_f32(
    focal_length_mm: f32,
    object_distance_m: f32,
    travel_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(travel_mm, 3, || focus::near_focus_travel(focal_length_mm, object_distance_m)) }
}

/// Gives how far the focus lies behind its place for a star when the object is near, in millimetres, in double.
///
/// f^2 / (s - f) (Hecht, Optics).
/// Ranges: focal_length_mm 2^-32 to 2^32; object_distance_m beyond the focal length, to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_near_focus_travel_f64(
    focal_length_mm: f64,
    object_distance_m: f64,
    travel_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(travel_mm, 3, || focus::near_focus_travel(focal_length_mm, object_distance_m)) }
}

/// Gives how long the coma of a paraboloid draws a star out, off the axis, in microarcseconds.
///
/// 3 t / (16 N^2), the tangential coma (Schroeder, Astronomical Optics).
/// Ranges: focal_ratio_q16 not 0; off_axis_mas any.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_coma_length_fx(
    off_axis_mas: u32,
    focal_ratio_q16: u32,
    coma_uas: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(coma_uas, 3, || focus::coma_length_fx(Milliarcseconds(off_axis_mas), Q16(focal_ratio_q16)))
    }
}

/// Gives how long the coma of a paraboloid draws a star out, off the axis, in arcseconds.
///
/// 3 t / (16 N^2), the tangential coma (Schroeder, Astronomical Optics).
/// Ranges: off_axis_arcsec 0 to 2^32; focal_ratio 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_coma_length_f32(
    off_axis_arcsec: f32,
    focal_ratio: f32,
    coma_arcsec: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(coma_arcsec, 3, || focus::coma_length(off_axis_arcsec, focal_ratio)) }
}

/// Gives how long the coma of a paraboloid draws a star out, off the axis, in arcseconds, in double.
///
/// 3 t / (16 N^2), the tangential coma (Schroeder, Astronomical Optics).
/// Ranges: off_axis_arcsec 0 to 2^32; focal_ratio 2^-32 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_coma_length_f64(
    off_axis_arcsec: f64,
    focal_ratio: f64,
    coma_arcsec: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(coma_arcsec, 3, || focus::coma_length(off_axis_arcsec, focal_ratio)) }
}
