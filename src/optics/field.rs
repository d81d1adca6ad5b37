//! Field of view: what the focal lengths, the eyepiece and the sensor show of the sky.

use crate::math::divide;
#[cfg(feature = "float")]
use crate::math::float::{Real, positive};
use crate::status::Error;
use crate::units::{Micrometres, Q16};

use super::present;

/// Angular magnification of a telescope with an eyepiece.
///
/// M = f / fe, focal length over the eyepiece's focal length. Source: Smith, *Modern Optical Engineering*, telescopes.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | focal length of the telescope | um | mm | not 0 |
/// | focal length of the eyepiece | um | mm | not 0 |
///
/// Result: Q16.16, float plain; below 65536.
/// Error: at most 0.5 LSB; float 2 ulp.
pub fn magnification_fx(focal_length: Micrometres, eyepiece: Micrometres) -> Result<Q16, Error> {
    present(focal_length.0, 1)?;
    present(eyepiece.0, 2)?;
    divide::rounded((focal_length.0 as u64) << 16, eyepiece.0).map(Q16)
}

/// Float form of [`magnification_fx`].
#[cfg(feature = "float")]
pub fn magnification<F: Real>(focal_length_mm: F, eyepiece_mm: F) -> Result<F, Error> {
    positive(focal_length_mm, 1)?;
    positive(eyepiece_mm, 2)?;
    Ok(focal_length_mm / eyepiece_mm)
}
