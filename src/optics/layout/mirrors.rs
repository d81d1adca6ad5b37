//! The two mirrors of a Cassegrain: where the second one stands, how wide and how curved it is.

use super::{allowed, present};
use crate::math::divide;
#[cfg(feature = "float")]
use crate::math::double::Double;
#[cfg(feature = "float")]
use crate::math::float::{Real, not_negative, positive};
use crate::math::multiply::{wide, wide_by};
use crate::status::Error;
use crate::units::{Micrometres, Q16};

/// The primary's and the system's focal length and the back focus, arguments `first` to `first` + 2.
#[inline(always)]
fn checked(first: u8, primary: u32, system: u32, back_focus: u32) -> Result<(), Error> {
    present(primary, first)?;
    present(system, first + 1)?;
    allowed(system > primary, first + 1)?;
    allowed(back_focus <= system, first + 2)
}

/// The same of the float forms.
#[cfg(feature = "float")]
fn checked_floats<F: Real>(first: u8, primary: F, system: F, back_focus: F) -> Result<(), Error> {
    positive(primary, first)?;
    positive(system, first + 1)?;
    allowed(system > primary, first + 1)?;
    not_negative(back_focus, first + 2)?;
    allowed(back_focus <= system, first + 2)
}

/// How much the second mirror lengthens the primary's focal length.
///
/// m = F / f1. Source: Schroeder, *Astronomical Optics*, two-mirror telescopes.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the primary f1 | um | mm | not 0 |
/// | focal length of the system F | um | mm | over the primary's |
///
/// Result: Q16.16; float a plain number. Overflow: 65536 or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn secondary_magnification_fx(
    primary_focal: Micrometres,
    system_focal: Micrometres,
) -> Result<Q16, Error> {
    checked(1, primary_focal.0, system_focal.0, 0)?;
    divide::rounded((system_focal.0 as u64) << 16, primary_focal.0).map(Q16)
}

/// Float form of [`secondary_magnification_fx`].
#[cfg(feature = "float")]
pub fn secondary_magnification<F: Real>(primary_focal_mm: F, system_focal_mm: F) -> Result<F, Error> {
    checked_floats(1, primary_focal_mm, system_focal_mm, F::of(0.0))?;
    Ok(system_focal_mm / primary_focal_mm)
}

/// How far the second mirror stands before the primary, from vertex to vertex.
///
/// f1 - p, where p = (f1 + b) / (m + 1) is how far it stands before the primary's focus and m = F / f1. Source:
/// Schroeder, *Astronomical Optics*, two-mirror telescopes.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the primary f1 | um | mm | not 0 |
/// | focal length of the system F | um | mm | over the primary's |
/// | back focus, from the primary's vertex to the focus behind it b | um | mm | at most the system's focal length |
///
/// Result: um; float mm; under the primary's focal length.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn secondary_separation_fx(
    primary_focal: Micrometres,
    system_focal: Micrometres,
    back_focus: Micrometres,
) -> Result<Micrometres, Error> {
    checked(1, primary_focal.0, system_focal.0, back_focus.0)?;
    // f1 (F - b) / (F + f1)
    let product = wide(primary_focal.0, system_focal.0 - back_focus.0);
    divide::by_64(0, product, primary_focal.0 as u64 + system_focal.0 as u64).map(Micrometres)
}

/// Float form of [`secondary_separation_fx`].
#[cfg(feature = "float")]
pub fn secondary_separation<F: Real>(
    primary_focal_mm: F,
    system_focal_mm: F,
    back_focus_mm: F,
) -> Result<F, Error> {
    checked_floats(1, primary_focal_mm, system_focal_mm, back_focus_mm)?;
    let left = Double::sum(system_focal_mm, -back_focus_mm);
    Ok((left * primary_focal_mm / Double::sum(system_focal_mm, primary_focal_mm)).upper)
}

/// The diameter of the second mirror for the image point on the axis.
///
/// D p / f1 with the p of [`secondary_separation_fx`]. Source: as there.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | aperture D | um | mm | not 0 |
/// | focal length of the primary f1 | um | mm | not 0 |
/// | focal length of the system F | um | mm | over the primary's |
/// | back focus, from the primary's vertex to the focus behind it b | um | mm | at most the system's focal length |
///
/// Result: um; float mm; at most the aperture.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn secondary_diameter_fx(
    aperture: Micrometres,
    primary_focal: Micrometres,
    system_focal: Micrometres,
    back_focus: Micrometres,
) -> Result<Micrometres, Error> {
    present(aperture.0, 1)?;
    checked(2, primary_focal.0, system_focal.0, back_focus.0)?;
    // D (f1 + b) / (F + f1)
    let (upper, lower) = wide_by(primary_focal.0 as u64 + back_focus.0 as u64, aperture.0);
    divide::by_64(upper, lower, primary_focal.0 as u64 + system_focal.0 as u64).map(Micrometres)
}

/// Float form of [`secondary_diameter_fx`].
#[cfg(feature = "float")]
pub fn secondary_diameter<F: Real>(
    aperture_mm: F,
    primary_focal_mm: F,
    system_focal_mm: F,
    back_focus_mm: F,
) -> Result<F, Error> {
    positive(aperture_mm, 1)?;
    checked_floats(2, primary_focal_mm, system_focal_mm, back_focus_mm)?;
    let reach = Double::sum(primary_focal_mm, back_focus_mm);
    Ok((reach * aperture_mm / Double::sum(system_focal_mm, primary_focal_mm)).upper)
}

/// What a lit field adds to the second mirror's diameter.
///
/// i (f1 - p) / F with the p of [`secondary_separation_fx`]; add it to [`secondary_diameter_fx`]. Source: Schroeder,
/// *Astronomical Optics*, two-mirror telescopes: the chief ray's height at the second mirror.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the primary f1 | um | mm | not 0 |
/// | focal length of the system F | um | mm | over the primary's |
/// | back focus, from the primary's vertex to the focus behind it b | um | mm | at most the system's focal length |
/// | diameter of the field that the whole aperture lights i | um | mm | |
///
/// Result: um; float mm; under i.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn secondary_field_margin_fx(
    primary_focal: Micrometres,
    system_focal: Micrometres,
    back_focus: Micrometres,
    lit_field: Micrometres,
) -> Result<Micrometres, Error> {
    checked(1, primary_focal.0, system_focal.0, back_focus.0)?;
    // i f1 (F - b) / (F F + F f1)
    let left = wide(primary_focal.0, system_focal.0 - back_focus.0);
    let (upper, lower) = wide_by(left, lit_field.0);
    let (below, carry) =
        wide(system_focal.0, system_focal.0).overflowing_add(wide(system_focal.0, primary_focal.0));
    divide::by_wide((0, upper, lower), (carry as u32, below)).map(Micrometres)
}

/// Float form of [`secondary_field_margin_fx`].
#[cfg(feature = "float")]
pub fn secondary_field_margin<F: Real>(
    primary_focal_mm: F,
    system_focal_mm: F,
    back_focus_mm: F,
    lit_field_mm: F,
) -> Result<F, Error> {
    checked_floats(1, primary_focal_mm, system_focal_mm, back_focus_mm)?;
    not_negative(lit_field_mm, 4)?;
    let separation = Double::sum(system_focal_mm, -back_focus_mm) * primary_focal_mm
        / Double::sum(system_focal_mm, primary_focal_mm);
    Ok((separation * lit_field_mm).upper / system_focal_mm)
}

/// The radius of curvature of the second mirror, which is convex.
///
/// 2 p m / (m - 1) with the p and m of [`secondary_separation_fx`]. Source: as there.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the primary f1 | um | mm | not 0 |
/// | focal length of the system F | um | mm | over the primary's |
/// | back focus, from the primary's vertex to the focus behind it b | um | mm | at most the system's focal length |
///
/// Result: um; float mm. Overflow: 4294967296 um or more, where the system is hardly longer than the primary.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn secondary_radius_fx(
    primary_focal: Micrometres,
    system_focal: Micrometres,
    back_focus: Micrometres,
) -> Result<Micrometres, Error> {
    checked(1, primary_focal.0, system_focal.0, back_focus.0)?;
    // 2 f1 F (f1 + b) / (F F - f1 f1)
    let focals = wide(primary_focal.0, system_focal.0);
    let below = wide(system_focal.0, system_focal.0) - wide(primary_focal.0, primary_focal.0);
    let (reach, beyond) = primary_focal.0.overflowing_add(back_focus.0);
    let (upper, lower) = wide_by(focals, reach);
    let (mut top, mut middle) = (0, (upper as u64) << 32 | lower >> 32);
    if beyond {
        let (sum, carry) = middle.overflowing_add(focals);
        (top, middle) = (carry as u32, sum);
    }
    let (n3, n2) = (top << 1 | (middle >> 63) as u32, (middle >> 31) as u32);
    divide::by_wide((n3, n2, middle << 33 | (lower as u32 as u64) << 1), (0, below)).map(Micrometres)
}

/// Float form of [`secondary_radius_fx`].
#[cfg(feature = "float")]
pub fn secondary_radius<F: Real>(
    primary_focal_mm: F,
    system_focal_mm: F,
    back_focus_mm: F,
) -> Result<F, Error> {
    checked_floats(1, primary_focal_mm, system_focal_mm, back_focus_mm)?;
    let distance = Double::sum(primary_focal_mm, back_focus_mm) * primary_focal_mm
        / Double::sum(system_focal_mm, primary_focal_mm);
    let lengthening =
        Double::from(F::of(2.0) * system_focal_mm) / Double::sum(system_focal_mm, -primary_focal_mm);
    Ok((distance * lengthening).upper)
}
