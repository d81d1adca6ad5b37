//! Motion: how the sky turns past a telescope, how long a star stays in the field or on a pixel, and what an altazimuth
//! mount has to do.
//!
//! The rate of the sky is w = 360 degrees in a sidereal day of 86164.0905 s (the mean one of UT1): 15.0410686 arcsec per
//! second of time.

use crate::math::sine;
use crate::status::{Error, allowed};
use crate::units::SignedBam;

#[cfg(feature = "float")]
use crate::math::float::{Real, from_zero_to};

mod drift;
mod exposure;
mod mount;

pub use drift::*;
pub use exposure::*;
pub use mount::*;

/// 90 degrees.
const QUARTER_TURN: u32 = 1 << 30;

/// The rate of the sky w in steps of 2^-8 of a microarcsecond per second.
const RATE: u32 = 3_850_513_573;

/// Seconds in a sidereal day.
#[cfg(feature = "float")]
const SIDEREAL_DAY_S: f64 = 86_164.090_5;

/// w in arcseconds per second.
#[cfg(feature = "float")]
const RATE_ARCSEC: f64 = 1_296_000.0 / SIDEREAL_DAY_S;

/// w in radians per second.
#[cfg(feature = "float")]
const RATE_RADIANS: f64 = 2.0 * core::f64::consts::PI / SIDEREAL_DAY_S;

/// Refuses what is more than a quarter turn from 0.
#[inline(always)]
fn quarter(angle: SignedBam, argument: u8) -> Result<(), Error> {
    allowed(angle.0.unsigned_abs() <= QUARTER_TURN, argument)
}

/// The cosine of at most a quarter turn, in steps of 2^-62.
#[inline(always)]
fn cosine(angle: SignedBam) -> u64 {
    sine::sine((angle.0 as u32).wrapping_add(QUARTER_TURN)) as u64
}

/// The same in steps of 2^-31, within one of them.
#[inline(always)]
fn short_cosine(angle: SignedBam) -> u32 {
    sine::size_of_sine((angle.0 as u32).wrapping_add(QUARTER_TURN))
}

/// Refuses what is not in -90 to 90 degrees.
#[cfg(feature = "float")]
fn quarter_of_degrees<F: Real>(angle: F, argument: u8) -> Result<(), Error> {
    from_zero_to(90.0, if angle < F::of(0.0) { -angle } else { angle }, argument)
}
