//! What the tube and the eyepiece need around the mount.

use super::allowed;
#[cfg(feature = "float")]
use crate::math::double::Double;
#[cfg(feature = "float")]
use crate::math::float::{Real, either_sign, from_zero_to, not_negative};
use crate::math::multiply::{wide, wide_by};
use crate::math::{root, sine};
use crate::status::Error;
use crate::units::{Micrometres, SignedBam, SignedMicrometres};

/// 90 degrees.
const QUARTER_TURN: i32 = 1 << 30;

/// The radius that the tube's far end sweeps about the pivot, which the room must clear.
///
/// sqrt(L^2 + (D/2)^2). Source: geometry, the far rim of a straight tube.
///
/// Caution: a moving mount can hurt. Stay clear of all that it can reach, dew caps, counterweights and cables too, and
/// follow the maker's instructions and local rules.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | reach, from the pivot to the far end of the tube L | um | mm | |
/// | outer diameter of the tube D | um | mm | |
///
/// Result: um; float mm. Overflow: 4294967296 um or more.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn swing_radius_fx(reach: Micrometres, tube_diameter: Micrometres) -> Result<Micrometres, Error> {
    // The quarter that is cut from D^2 / 4 where D is odd makes no difference but between two that are equally near.
    match wide(reach.0, reach.0).checked_add(wide(tube_diameter.0, tube_diameter.0) >> 2) {
        Some(square) => root::rounded(square).map(Micrometres),
        None => Err(Error::OVERFLOW),
    }
}

/// Float form of [`swing_radius_fx`].
#[cfg(feature = "float")]
pub fn swing_radius<F: Real>(reach_mm: F, tube_diameter_mm: F) -> Result<F, Error> {
    not_negative(reach_mm, 1)?;
    not_negative(tube_diameter_mm, 2)?;
    Ok(reach_mm.hypot(F::of(0.5) * tube_diameter_mm))
}

/// How high the eyepiece stands above the floor.
///
/// h + r sin(altitude). Source: geometry, an eyepiece on the line through the altitude axis along the tube.
///
/// Caution: where it is high, stand on a stable platform, never on the top of a ladder, and clear of the moving mount;
/// follow the makers' instructions and local rules.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | height of the altitude axis above the floor h | um | mm | |
/// | reach, from the axis to the eyepiece along the tube r; negative where the eyepiece is at the lower end | signed um | mm | |
/// | altitude that the telescope points to | signed bam | degrees | 0 to 90 degrees |
///
/// Result: um; float mm. Overflow: below the floor, or 4294967296 um or more.
/// Error: at most 0.51 LSB; float 2 ulp of the larger term.
pub fn eyepiece_height_fx(
    axis_height: Micrometres,
    reach: SignedMicrometres,
    altitude: SignedBam,
) -> Result<Micrometres, Error> {
    allowed((0..=QUARTER_TURN).contains(&altitude.0), 3)?;
    // The sine is in steps of 2^-62; the lower 32 bits of the product are nothing.
    let (upper, lower) = wide_by(sine::sine(altitude.0 as u32) as u64, reach.0.unsigned_abs());
    let rise = (((upper as u64) << 32 | lower >> 32) + (1 << 29)) >> 30;
    let rise = if reach.0 < 0 { -(rise as i64) } else { rise as i64 };
    u32::try_from(axis_height.0 as i64 + rise).map(Micrometres).map_err(|_| Error::OVERFLOW)
}

/// Float form of [`eyepiece_height_fx`].
#[cfg(feature = "float")]
pub fn eyepiece_height<F: Real>(axis_height_mm: F, reach_mm: F, altitude_deg: F) -> Result<F, Error> {
    not_negative(axis_height_mm, 1)?;
    either_sign(reach_mm, 2)?;
    from_zero_to(90.0, altitude_deg, 3)?;
    let angle = Double::of(core::f64::consts::PI / 180.0) * altitude_deg;
    let sine = angle.upper.sin();
    let cosine = ((F::of(1.0) - sine) * (F::of(1.0) + sine)).sqrt(); // near enough for the lower part
    let sine = Double::sum(sine, angle.lower * cosine);
    let height = (sine * reach_mm + Double::from(axis_height_mm)).upper;
    if height < F::of(0.0) { Err(Error::OVERFLOW) } else { Ok(height) }
}
