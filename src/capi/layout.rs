//! C exports of `optics::layout`.

use super::{fieldstop_status, give};
use crate::optics::layout;
use crate::units::{Micrometres, SignedBam, SignedMicrometres};

/// Gives the minor axis of the smallest 45 degree diagonal that takes in the whole beam of a lit field, in
/// micrometres.
///
/// 2 w / (1 - g^2), g = (D - F) / 2f, w = F/2 + g L; the primary's rim in the plane of its vertex: for a
/// paraboloid's true rim pass f - D^2 / 16f as the focal length (geometry).
/// Ranges: aperture_um, focal_length_um not 0; focus_distance_um at most the focal length; lit_field_um under the
/// aperture and over it less twice the focal length.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_diagonal_minor_axis_fx(
    aperture_um: u32,
    focal_length_um: u32,
    focus_distance_um: u32,
    lit_field_um: u32,
    minor_axis_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(minor_axis_um, 5, || {
            layout::diagonal_minor_axis_fx(
                Micrometres(aperture_um),
                Micrometres(focal_length_um),
                Micrometres(focus_distance_um),
                Micrometres(lit_field_um),
            )
        })
    }
}

/// Gives the minor axis of the smallest 45 degree diagonal that takes in the whole beam of a lit field, in
/// millimetres.
///
/// 2 w / (1 - g^2), g = (D - F) / 2f, w = F/2 + g L; the primary's rim in the plane of its vertex: for a
/// paraboloid's true rim pass f - D^2 / 16f as the focal length (geometry).
/// Ranges: aperture_mm, focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length; lit_field_mm from
/// 0, under the aperture and over it less twice the focal length.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite, overflow.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_diagonal_minor_axis_f32(
    aperture_mm: f32,
    focal_length_mm: f32,
    focus_distance_mm: f32,
    lit_field_mm: f32,
    minor_axis_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(minor_axis_mm, 5, || {
            layout::diagonal_minor_axis(aperture_mm, focal_length_mm, focus_distance_mm, lit_field_mm)
        })
    }
}

/// Gives the minor axis of the smallest 45 degree diagonal that takes in the whole beam of a lit field, in
/// millimetres, in double.
///
/// 2 w / (1 - g^2), g = (D - F) / 2f, w = F/2 + g L; the primary's rim in the plane of its vertex: for a
/// paraboloid's true rim pass f - D^2 / 16f as the focal length (geometry).
/// Ranges: aperture_mm, focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length; lit_field_mm from
/// 0, under the aperture and over it less twice the focal length.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite, overflow.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_diagonal_minor_axis_f64(
    aperture_mm: f64,
    focal_length_mm: f64,
    focus_distance_mm: f64,
    lit_field_mm: f64,
    minor_axis_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(minor_axis_mm, 5, || {
            layout::diagonal_minor_axis(aperture_mm, focal_length_mm, focus_distance_mm, lit_field_mm)
        })
    }
}

/// Gives how far the diagonal's centre is moved off the axis, away from the focuser, and as much toward the
/// primary, in micrometres.
///
/// w g / (1 - g^2), g = (D - F) / 2f, w = F/2 + g L (geometry).
/// Ranges: aperture_um, focal_length_um not 0; focus_distance_um at most the focal length; lit_field_um under the
/// aperture and over it less twice the focal length.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_diagonal_offset_fx(
    aperture_um: u32,
    focal_length_um: u32,
    focus_distance_um: u32,
    lit_field_um: u32,
    offset_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(offset_um, 5, || {
            layout::diagonal_offset_fx(
                Micrometres(aperture_um),
                Micrometres(focal_length_um),
                Micrometres(focus_distance_um),
                Micrometres(lit_field_um),
            )
        })
    }
}

/// Gives how far the diagonal's centre is moved off the axis, away from the focuser, and as much toward the
/// primary, in millimetres.
///
/// w g / (1 - g^2), g = (D - F) / 2f, w = F/2 + g L (geometry).
/// Ranges: aperture_mm, focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length; lit_field_mm from
/// 0, under the aperture and over it less twice the focal length.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite, overflow.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_diagonal_offset_f32(
    aperture_mm: f32,
    focal_length_mm: f32,
    focus_distance_mm: f32,
    lit_field_mm: f32,
    offset_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(offset_mm, 5, || {
            layout::diagonal_offset(aperture_mm, focal_length_mm, focus_distance_mm, lit_field_mm)
        })
    }
}

/// Gives how far the diagonal's centre is moved off the axis, away from the focuser, and as much toward the
/// primary, in millimetres, in double.
///
/// w g / (1 - g^2), g = (D - F) / 2f, w = F/2 + g L (geometry).
/// Ranges: aperture_mm, focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length; lit_field_mm from
/// 0, under the aperture and over it less twice the focal length.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite, overflow.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_diagonal_offset_f64(
    aperture_mm: f64,
    focal_length_mm: f64,
    focus_distance_mm: f64,
    lit_field_mm: f64,
    offset_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(offset_mm, 5, || {
            layout::diagonal_offset(aperture_mm, focal_length_mm, focus_distance_mm, lit_field_mm)
        })
    }
}

/// Gives the diameter of the beam to the middle of the field, at a distance before the focus, in micrometres.
///
/// D L / f (Smith, Modern Optical Engineering).
/// Ranges: aperture_um, focal_length_um not 0; focus_distance_um at most the focal length.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_beam_width_fx(
    aperture_um: u32,
    focal_length_um: u32,
    focus_distance_um: u32,
    width_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(width_um, 4, || {
            layout::beam_width_fx(
                Micrometres(aperture_um),
                Micrometres(focal_length_um),
                Micrometres(focus_distance_um),
            )
        })
    }
}

/// Gives the diameter of the beam to the middle of the field, at a distance before the focus, in millimetres.
///
/// D L / f (Smith, Modern Optical Engineering).
/// Ranges: aperture_mm, focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_beam_width_f32(
    aperture_mm: f32,
    focal_length_mm: f32,
    focus_distance_mm: f32,
    width_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(width_mm, 4, || layout::beam_width(aperture_mm, focal_length_mm, focus_distance_mm)) }
}

/// Gives the diameter of the beam to the middle of the field, at a distance before the focus, in millimetres, in
/// double.
///
/// D L / f (Smith, Modern Optical Engineering).
/// Ranges: aperture_mm, focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_beam_width_f64(
    aperture_mm: f64,
    focal_length_mm: f64,
    focus_distance_mm: f64,
    width_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(width_mm, 4, || layout::beam_width(aperture_mm, focal_length_mm, focus_distance_mm)) }
}

/// Gives how far off the axis the beam to an image point off the axis has its centre, at a distance before the
/// focus, in micrometres.
///
/// y (f - L) / f (geometry).
/// Ranges: focal_length_um not 0; focus_distance_um at most the focal length; image_offset_um any.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_beam_shift_fx(
    image_offset_um: u32,
    focal_length_um: u32,
    focus_distance_um: u32,
    shift_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(shift_um, 4, || {
            layout::beam_shift_fx(
                Micrometres(image_offset_um),
                Micrometres(focal_length_um),
                Micrometres(focus_distance_um),
            )
        })
    }
}

/// Gives how far off the axis the beam to an image point off the axis has its centre, at a distance before the
/// focus, in millimetres.
///
/// y (f - L) / f (geometry).
/// Ranges: image_offset_mm 0 to 2^32; focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_beam_shift_f32(
    image_offset_mm: f32,
    focal_length_mm: f32,
    focus_distance_mm: f32,
    shift_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(shift_mm, 4, || layout::beam_shift(image_offset_mm, focal_length_mm, focus_distance_mm)) }
}

/// Gives how far off the axis the beam to an image point off the axis has its centre, at a distance before the
/// focus, in millimetres, in double.
///
/// y (f - L) / f (geometry).
/// Ranges: image_offset_mm 0 to 2^32; focal_length_mm 2^-32 to 2^32; focus_distance_mm 0 to the focal length.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_beam_shift_f64(
    image_offset_mm: f64,
    focal_length_mm: f64,
    focus_distance_mm: f64,
    shift_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(shift_mm, 4, || layout::beam_shift(image_offset_mm, focal_length_mm, focus_distance_mm)) }
}

/// Gives how much the second mirror lengthens the primary's focal length, in Q16.16.
///
/// F / f1 (Schroeder, Astronomical Optics).
/// Ranges: primary_focal_um not 0; system_focal_um over primary_focal_um.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_magnification_fx(
    primary_focal_um: u32,
    system_focal_um: u32,
    magnification_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(magnification_q16, 3, || {
            layout::secondary_magnification_fx(Micrometres(primary_focal_um), Micrometres(system_focal_um))
        })
    }
}

/// Gives how much the second mirror lengthens the primary's focal length, a plain number.
///
/// F / f1 (Schroeder, Astronomical Optics).
/// Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_magnification_f32(
    primary_focal_mm: f32,
    system_focal_mm: f32,
    magnification: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(magnification, 3, || layout::secondary_magnification(primary_focal_mm, system_focal_mm)) }
}

/// Gives how much the second mirror lengthens the primary's focal length, a plain number, in double.
///
/// F / f1 (Schroeder, Astronomical Optics).
/// Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_magnification_f64(
    primary_focal_mm: f64,
    system_focal_mm: f64,
    magnification: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(magnification, 3, || layout::secondary_magnification(primary_focal_mm, system_focal_mm)) }
}

/// Gives how far the second mirror stands before the primary, from vertex to vertex, in micrometres.
///
/// f1 - p, p = (f1 + b) / (m + 1), m = F / f1, b from the vertex of the primary to the focus behind it (Schroeder,
/// Astronomical Optics).
/// Ranges: primary_focal_um not 0; system_focal_um over primary_focal_um; back_focus_um at most system_focal_um.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_separation_fx(
    primary_focal_um: u32,
    system_focal_um: u32,
    back_focus_um: u32,
    separation_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(separation_um, 4, || {
            layout::secondary_separation_fx(
                Micrometres(primary_focal_um),
                Micrometres(system_focal_um),
                Micrometres(back_focus_um),
            )
        })
    }
}

/// Gives how far the second mirror stands before the primary, from vertex to vertex, in millimetres.
///
/// f1 - p, p = (f1 + b) / (m + 1), m = F / f1, b from the vertex of the primary to the focus behind it (Schroeder,
/// Astronomical Optics).
/// Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
/// system_focal_mm.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_separation_f32(
    primary_focal_mm: f32,
    system_focal_mm: f32,
    back_focus_mm: f32,
    separation_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(separation_mm, 4, || {
            layout::secondary_separation(primary_focal_mm, system_focal_mm, back_focus_mm)
        })
    }
}

/// Gives how far the second mirror stands before the primary, from vertex to vertex, in millimetres, in double.
///
/// f1 - p, p = (f1 + b) / (m + 1), m = F / f1, b from the vertex of the primary to the focus behind it (Schroeder,
/// Astronomical Optics).
/// Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
/// system_focal_mm.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_separation_f64(
    primary_focal_mm: f64,
    system_focal_mm: f64,
    back_focus_mm: f64,
    separation_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(separation_mm, 4, || {
            layout::secondary_separation(primary_focal_mm, system_focal_mm, back_focus_mm)
        })
    }
}

/// Gives the diameter of the second mirror for the image point on the axis, in micrometres.
///
/// D p / f1, p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
/// Ranges: aperture_um, primary_focal_um not 0; system_focal_um over primary_focal_um; back_focus_um at most
/// system_focal_um.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_diameter_fx(
    aperture_um: u32,
    primary_focal_um: u32,
    system_focal_um: u32,
    back_focus_um: u32,
    diameter_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(diameter_um, 5, || {
            layout::secondary_diameter_fx(
                Micrometres(aperture_um),
                Micrometres(primary_focal_um),
                Micrometres(system_focal_um),
                Micrometres(back_focus_um),
            )
        })
    }
}

/// Gives the diameter of the second mirror for the image point on the axis, in millimetres.
///
/// D p / f1, p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
/// Ranges: aperture_mm, primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
/// system_focal_mm.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_diameter_f32(
    aperture_mm: f32,
    primary_focal_mm: f32,
    system_focal_mm: f32,
    back_focus_mm: f32,
    diameter_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(diameter_mm, 5, || {
            layout::secondary_diameter(aperture_mm, primary_focal_mm, system_focal_mm, back_focus_mm)
        })
    }
}

/// Gives the diameter of the second mirror for the image point on the axis, in millimetres, in double.
///
/// D p / f1, p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
/// Ranges: aperture_mm, primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
/// system_focal_mm.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_diameter_f64(
    aperture_mm: f64,
    primary_focal_mm: f64,
    system_focal_mm: f64,
    back_focus_mm: f64,
    diameter_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(diameter_mm, 5, || {
            layout::secondary_diameter(aperture_mm, primary_focal_mm, system_focal_mm, back_focus_mm)
        })
    }
}

/// Gives what a lit field adds to the second mirror's diameter, in micrometres.
///
/// i (f1 - p) / F, p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
/// Ranges: primary_focal_um not 0; system_focal_um over primary_focal_um; back_focus_um at most system_focal_um;
/// lit_field_um any.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_field_margin_fx(
    primary_focal_um: u32,
    system_focal_um: u32,
    back_focus_um: u32,
    lit_field_um: u32,
    margin_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(margin_um, 5, || {
            layout::secondary_field_margin_fx(
                Micrometres(primary_focal_um),
                Micrometres(system_focal_um),
                Micrometres(back_focus_um),
                Micrometres(lit_field_um),
            )
        })
    }
}

/// Gives what a lit field adds to the second mirror's diameter, in millimetres.
///
/// i (f1 - p) / F, p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
/// Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
/// system_focal_mm; lit_field_mm 0 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_field_margin_f32(
    primary_focal_mm: f32,
    system_focal_mm: f32,
    back_focus_mm: f32,
    lit_field_mm: f32,
    margin_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(margin_mm, 5, || {
            layout::secondary_field_margin(primary_focal_mm, system_focal_mm, back_focus_mm, lit_field_mm)
        })
    }
}

/// Gives what a lit field adds to the second mirror's diameter, in millimetres, in double.
///
/// i (f1 - p) / F, p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
/// Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
/// system_focal_mm; lit_field_mm 0 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_field_margin_f64(
    primary_focal_mm: f64,
    system_focal_mm: f64,
    back_focus_mm: f64,
    lit_field_mm: f64,
    margin_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(margin_mm, 5, || {
            layout::secondary_field_margin(primary_focal_mm, system_focal_mm, back_focus_mm, lit_field_mm)
        })
    }
}

/// Gives the radius of curvature of the second mirror, which is convex, in micrometres.
///
/// 2 p m / (m - 1), p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
/// Ranges: primary_focal_um not 0; system_focal_um over primary_focal_um; back_focus_um at most system_focal_um.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, zero, out of range, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_radius_fx(
    primary_focal_um: u32,
    system_focal_um: u32,
    back_focus_um: u32,
    radius_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(radius_um, 4, || {
            layout::secondary_radius_fx(
                Micrometres(primary_focal_um),
                Micrometres(system_focal_um),
                Micrometres(back_focus_um),
            )
        })
    }
}

/// Gives the radius of curvature of the second mirror, which is convex, in millimetres.
///
/// 2 p m / (m - 1), p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
/// Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
/// system_focal_mm.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_radius_f32(
    primary_focal_mm: f32,
    system_focal_mm: f32,
    back_focus_mm: f32,
    radius_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(radius_mm, 4, || layout::secondary_radius(primary_focal_mm, system_focal_mm, back_focus_mm))
    }
}

/// Gives the radius of curvature of the second mirror, which is convex, in millimetres, in double.
///
/// 2 p m / (m - 1), p = (f1 + b) / (m + 1), m = F / f1 (Schroeder, Astronomical Optics).
/// Ranges: primary_focal_mm 2^-32 to 2^32; system_focal_mm over primary_focal_mm; back_focus_mm 0 to
/// system_focal_mm.
/// Error: at most 2 ulp.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_secondary_radius_f64(
    primary_focal_mm: f64,
    system_focal_mm: f64,
    back_focus_mm: f64,
    radius_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(radius_mm, 4, || layout::secondary_radius(primary_focal_mm, system_focal_mm, back_focus_mm))
    }
}

/// Gives the share of a beam's disc that lies inside a stop's or a mirror's, in Q16.16.
///
/// the area that the two discs share over that of the beam (CRC Standard Mathematical Tables, circular segment).
/// Ranges: beam_um not 0; stop_um, offset_um any: the first two are diameters, the third is the distance of their
/// centres.
/// Error: at most 1 LSB.
/// Statuses: null pointer, zero.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_illumination_fx(
    beam_um: u32,
    stop_um: u32,
    offset_um: u32,
    share_q16: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(share_q16, 4, || {
            layout::illumination_fx(Micrometres(beam_um), Micrometres(stop_um), Micrometres(offset_um))
        })
    }
}

/// Gives the share of a beam's disc that lies inside a stop's or a mirror's, a plain number.
///
/// the area that the two discs share over that of the beam (CRC Standard Mathematical Tables, circular segment).
/// Ranges: beam_mm 2^-32 to 2^32; stop_mm, offset_mm 0 to 2^32; the first two are diameters, the third is the
/// distance of their centres.
/// Error: at most 1e-6, absolute.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_illumination_f32(
    beam_mm: f32,
    stop_mm: f32,
    offset_mm: f32,
    share: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(share, 4, || layout::illumination(beam_mm, stop_mm, offset_mm)) }
}

/// Gives the share of a beam's disc that lies inside a stop's or a mirror's, a plain number, in double.
///
/// the area that the two discs share over that of the beam (CRC Standard Mathematical Tables, circular segment).
/// Ranges: beam_mm 2^-32 to 2^32; stop_mm, offset_mm 0 to 2^32; the first two are diameters, the third is the
/// distance of their centres.
/// Error: at most 1e-14, absolute.
/// Statuses: null pointer, zero, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_illumination_f64(
    beam_mm: f64,
    stop_mm: f64,
    offset_mm: f64,
    share: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(share, 4, || layout::illumination(beam_mm, stop_mm, offset_mm)) }
}

/// Gives the radius that the tube's far end sweeps about the pivot, which the room must clear, in micrometres.
///
/// sqrt(L^2 + (D/2)^2) (geometry).
/// Caution: a moving mount can hurt. Stay clear of all that it can reach, dew caps, counterweights and cables too,
/// and follow the maker's instructions and local rules.
/// Ranges: reach_um, tube_diameter_um any.
/// Error: at most 0.5 LSB.
/// Statuses: null pointer, overflow.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_swing_radius_fx(
    reach_um: u32,
    tube_diameter_um: u32,
    radius_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(radius_um, 3, || layout::swing_radius_fx(Micrometres(reach_um), Micrometres(tube_diameter_um)))
    }
}

/// Gives the radius that the tube's far end sweeps about the pivot, which the room must clear, in millimetres.
///
/// sqrt(L^2 + (D/2)^2) (geometry).
/// Caution: a moving mount can hurt. Stay clear of all that it can reach, dew caps, counterweights and cables too,
/// and follow the maker's instructions and local rules.
/// Ranges: reach_mm, tube_diameter_mm 0 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_swing_radius_f32(
    reach_mm: f32,
    tube_diameter_mm: f32,
    radius_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(radius_mm, 3, || layout::swing_radius(reach_mm, tube_diameter_mm)) }
}

/// Gives the radius that the tube's far end sweeps about the pivot, which the room must clear, in millimetres, in
/// double.
///
/// sqrt(L^2 + (D/2)^2) (geometry).
/// Caution: a moving mount can hurt. Stay clear of all that it can reach, dew caps, counterweights and cables too,
/// and follow the maker's instructions and local rules.
/// Ranges: reach_mm, tube_diameter_mm 0 to 2^32.
/// Error: at most 2 ulp.
/// Statuses: null pointer, out of range, not finite.
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_swing_radius_f64(
    reach_mm: f64,
    tube_diameter_mm: f64,
    radius_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(radius_mm, 3, || layout::swing_radius(reach_mm, tube_diameter_mm)) }
}

/// Gives how high the eyepiece stands above the floor, in micrometres.
///
/// h + r sin(altitude), r from the altitude axis to the eyepiece along the tube, negative where it is at the lower
/// end (geometry).
/// Caution: where it is high, stand on a stable platform, never on the top of a ladder, and clear of the moving
/// mount; follow the makers' instructions and local rules.
/// Ranges: altitude_bam 0 to 2^30, 90 degrees; axis_height_um, reach_um any.
/// Error: at most 0.51 LSB.
/// Statuses: null pointer, out of range, overflow (also below the floor).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_eyepiece_height_fx(
    axis_height_um: u32,
    reach_um: i32,
    altitude_bam: i32,
    height_um: *mut u32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe {
        give(height_um, 4, || {
            layout::eyepiece_height_fx(
                Micrometres(axis_height_um),
                SignedMicrometres(reach_um),
                SignedBam(altitude_bam),
            )
        })
    }
}

/// Gives how high the eyepiece stands above the floor, in millimetres.
///
/// h + r sin(altitude), r from the altitude axis to the eyepiece along the tube, negative where it is at the lower
/// end (geometry).
/// Caution: where it is high, stand on a stable platform, never on the top of a ladder, and clear of the moving
/// mount; follow the makers' instructions and local rules.
/// Ranges: axis_height_mm 0 to 2^32; reach_mm -2^32 to 2^32; altitude_deg 0 to 90.
/// Error: at most 2 ulp of the larger term.
/// Statuses: null pointer, out of range, not finite, overflow (also below the floor).
#[cfg(feature = "float")]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_eyepiece_height_f32(
    axis_height_mm: f32,
    reach_mm: f32,
    altitude_deg: f32,
    height_mm: *mut f32,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(height_mm, 4, || layout::eyepiece_height(axis_height_mm, reach_mm, altitude_deg)) }
}

/// Gives how high the eyepiece stands above the floor, in millimetres, in double.
///
/// h + r sin(altitude), r from the altitude axis to the eyepiece along the tube, negative where it is at the lower
/// end (geometry).
/// Caution: where it is high, stand on a stable platform, never on the top of a ladder, and clear of the moving
/// mount; follow the makers' instructions and local rules.
/// Ranges: axis_height_mm 0 to 2^32; reach_mm -2^32 to 2^32; altitude_deg 0 to 90.
/// Error: at most 2 ulp of the larger term.
/// Statuses: null pointer, out of range, not finite, overflow (also below the floor).
#[cfg(all(feature = "float", not(target_arch = "avr")))]
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_eyepiece_height_f64(
    axis_height_mm: f64,
    reach_mm: f64,
    altitude_deg: f64,
    height_mm: *mut f64,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointer.
    unsafe { give(height_mm, 4, || layout::eyepiece_height(axis_height_mm, reach_mm, altitude_deg)) }
}
