//! The flat diagonal mirror that turns the beam to the side, and the beam where it stands.

use super::{allowed, present};
use crate::math::divide;
#[cfg(feature = "float")]
use crate::math::double::Double;
#[cfg(feature = "float")]
use crate::math::float::{Real, not_negative, positive};
use crate::math::multiply::{wide, wide_by};
use crate::status::Error;
use crate::units::Micrometres;

/// What the diagonal's size and offset are made of, all exact.
struct Cone {
    /// D - F
    narrowing: u32,
    /// 2 f w, at most f D
    width: u64,
    /// (2 f)^2 (1 - g^2): the upper 32 and the lower 64 bits
    slope: (u32, u64),
}

/// The four arguments of the diagonal, checked.
#[inline(always)]
fn cone(
    aperture: Micrometres,
    focal_length: Micrometres,
    focus_distance: Micrometres,
    lit_field: Micrometres,
) -> Result<Cone, Error> {
    present(aperture.0, 1)?;
    present(focal_length.0, 2)?;
    allowed(focus_distance.0 <= focal_length.0, 3)?;
    allowed(lit_field.0 < aperture.0, 4)?;
    let narrowing = aperture.0 - lit_field.0;
    allowed(narrowing >> 1 < focal_length.0, 4)?;
    let square = wide(focal_length.0, focal_length.0);
    let (lower, borrow) = (square << 2).overflowing_sub(wide(narrowing, narrowing));
    Ok(Cone {
        narrowing,
        width: wide(lit_field.0, focal_length.0) + wide(narrowing, focus_distance.0),
        slope: ((square >> 62) as u32 - borrow as u32, lower),
    })
}

/// The minor axis of the smallest 45 degree diagonal that takes in the whole beam of a lit field.
///
/// 2 w / (1 - g^2), where g = (D - F) / 2f is how fast the cone's radius narrows and w = F/2 + g L its radius where the
/// diagonal crosses the axis. The major axis is sqrt 2 times as long. Source: geometry, the ellipse in which a plane
/// cuts a cone. The primary's rim is taken in the plane of its vertex; for the true rim of a paraboloid pass
/// f - D^2 / 16f as the focal length.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | aperture D | um | mm | not 0 |
/// | focal length f | um | mm | not 0 |
/// | distance from the diagonal to the focal plane, along the axis L | um | mm | at most the focal length |
/// | diameter of the field that the whole aperture lights F | um | mm | under the aperture, over D - 2f |
///
/// Result: um; float mm. Overflow: 4294967296 um or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn diagonal_minor_axis_fx(
    aperture: Micrometres,
    focal_length: Micrometres,
    focus_distance: Micrometres,
    lit_field: Micrometres,
) -> Result<Micrometres, Error> {
    let Cone { width, slope, .. } = cone(aperture, focal_length, focus_distance, lit_field)?;
    // 4 f (2 f w) over it
    let (upper, lower) = wide_by(width, focal_length.0);
    divide::by_wide((upper >> 30, upper << 2 | (lower >> 62) as u32, lower << 2), slope).map(Micrometres)
}

/// The cone of [`cone`]: D - F, 2 f - (D - F), 2 f + (D - F) and 2 f w, in twice the digits.
#[cfg(feature = "float")]
fn cone_of<F: Real>(
    aperture_mm: F,
    focal_length_mm: F,
    focus_distance_mm: F,
    lit_field_mm: F,
) -> Result<[Double<F>; 4], Error> {
    positive(aperture_mm, 1)?;
    positive(focal_length_mm, 2)?;
    not_negative(focus_distance_mm, 3)?;
    allowed(focus_distance_mm <= focal_length_mm, 3)?;
    not_negative(lit_field_mm, 4)?;
    allowed(lit_field_mm < aperture_mm, 4)?;
    let narrowing = Double::sum(aperture_mm, -lit_field_mm);
    let twice = focal_length_mm + focal_length_mm;
    // In this order it is exact where it is small.
    let below = Double::sum(twice, -aperture_mm) + Double::from(lit_field_mm);
    allowed(below.upper > F::of(0.0), 4)?;
    let width = Double::product(lit_field_mm, focal_length_mm) + narrowing * focus_distance_mm;
    Ok([narrowing, below, narrowing + Double::from(twice), width])
}

/// A float result that the type holds; only a cone as steep as a plane goes beyond.
#[cfg(feature = "float")]
fn finite<F: Real>(result: F) -> Result<F, Error> {
    if result.is_finite() { Ok(result) } else { Err(Error::OVERFLOW) }
}

/// Float form of [`diagonal_minor_axis_fx`].
#[cfg(feature = "float")]
pub fn diagonal_minor_axis<F: Real>(
    aperture_mm: F,
    focal_length_mm: F,
    focus_distance_mm: F,
    lit_field_mm: F,
) -> Result<F, Error> {
    let [_, below, above, width] = cone_of(aperture_mm, focal_length_mm, focus_distance_mm, lit_field_mm)?;
    finite((width / below * (F::of(4.0) * focal_length_mm) / above).upper)
}

/// How far the diagonal's centre is moved off the axis, so that the beam of the lit field just fills its ellipse.
///
/// w g / (1 - g^2) with the g and w of [`diagonal_minor_axis_fx`]: away from the focuser, and as much toward the primary.
/// Source: as there.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | aperture D | um | mm | not 0 |
/// | focal length f | um | mm | not 0 |
/// | distance from the diagonal to the focal plane, along the axis L | um | mm | at most the focal length |
/// | diameter of the field that the whole aperture lights F | um | mm | under the aperture, over D - 2f |
///
/// Result: um; float mm. Overflow: 4294967296 um or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn diagonal_offset_fx(
    aperture: Micrometres,
    focal_length: Micrometres,
    focus_distance: Micrometres,
    lit_field: Micrometres,
) -> Result<Micrometres, Error> {
    let Cone { narrowing, width, slope } = cone(aperture, focal_length, focus_distance, lit_field)?;
    // (2 f w) (D - F) over it
    let (upper, lower) = wide_by(width, narrowing);
    divide::by_wide((0, upper, lower), slope).map(Micrometres)
}

/// Float form of [`diagonal_offset_fx`].
#[cfg(feature = "float")]
pub fn diagonal_offset<F: Real>(
    aperture_mm: F,
    focal_length_mm: F,
    focus_distance_mm: F,
    lit_field_mm: F,
) -> Result<F, Error> {
    let [narrowing, below, above, width] =
        cone_of(aperture_mm, focal_length_mm, focus_distance_mm, lit_field_mm)?;
    finite((width / below * (narrowing / above)).upper)
}

/// The diameter of the beam to the middle of the field, at a distance before the focus.
///
/// D L / f. Source: Smith, *Modern Optical Engineering*, the cone of light.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | aperture D | um | mm | not 0 |
/// | focal length f | um | mm | not 0 |
/// | distance before the focus L | um | mm | at most the focal length |
///
/// Result: um; float mm; at most the aperture.
/// Error: at most 0.5 LSB; float 2 ulp.
#[inline(always)]
pub fn beam_width_fx(
    aperture: Micrometres,
    focal_length: Micrometres,
    focus_distance: Micrometres,
) -> Result<Micrometres, Error> {
    present(aperture.0, 1)?;
    present(focal_length.0, 2)?;
    allowed(focus_distance.0 <= focal_length.0, 3)?;
    divide::scaled(aperture.0, focus_distance.0, focal_length.0).map(Micrometres)
}

/// Float form of [`beam_width_fx`].
#[cfg(feature = "float")]
pub fn beam_width<F: Real>(aperture_mm: F, focal_length_mm: F, focus_distance_mm: F) -> Result<F, Error> {
    positive(aperture_mm, 1)?;
    positive(focal_length_mm, 2)?;
    not_negative(focus_distance_mm, 3)?;
    allowed(focus_distance_mm <= focal_length_mm, 3)?;
    Ok(aperture_mm * focus_distance_mm / focal_length_mm)
}

/// How far off the axis the beam to an image point off the axis has its centre, at a distance before the focus.
///
/// y (f - L) / f. Source: geometry, the chief ray through the middle of the primary.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | distance of the image point from the axis y | um | mm | |
/// | focal length f | um | mm | not 0 |
/// | distance before the focus L | um | mm | at most the focal length |
///
/// Result: um; float mm; at most y.
/// Error: at most 0.5 LSB; float 2 ulp.
#[inline(always)]
pub fn beam_shift_fx(
    image_offset: Micrometres,
    focal_length: Micrometres,
    focus_distance: Micrometres,
) -> Result<Micrometres, Error> {
    present(focal_length.0, 2)?;
    allowed(focus_distance.0 <= focal_length.0, 3)?;
    divide::scaled(image_offset.0, focal_length.0 - focus_distance.0, focal_length.0).map(Micrometres)
}

/// Float form of [`beam_shift_fx`].
#[cfg(feature = "float")]
pub fn beam_shift<F: Real>(image_offset_mm: F, focal_length_mm: F, focus_distance_mm: F) -> Result<F, Error> {
    not_negative(image_offset_mm, 1)?;
    positive(focal_length_mm, 2)?;
    not_negative(focus_distance_mm, 3)?;
    allowed(focus_distance_mm <= focal_length_mm, 3)?;
    Ok((Double::sum(focal_length_mm, -focus_distance_mm) * image_offset_mm).upper / focal_length_mm)
}
