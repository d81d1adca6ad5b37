//! How much of a beam a stop lets through.

use super::present;
use crate::math::divide::divide;
#[cfg(feature = "float")]
use crate::math::double::Double;
#[cfg(feature = "float")]
use crate::math::float::{Real, not_negative, positive};
use crate::math::multiply::high;
use crate::math::segment;
use crate::status::Error;
use crate::units::{Micrometres, Q16};

/// The share of a beam that passes a round stop or meets a round mirror: the light that an image point off the axis
/// still gets.
///
/// The area that two discs share over that of the beam's: with the radii b and s and the distance c,
/// (b^2 (A - sin A cos A) + s^2 (S - sin S cos S)) / (pi b^2), cos A = (c^2 + b^2 - s^2) / (2 c b),
/// cos S = (c^2 + s^2 - b^2) / (2 c s). Source: the circular segment, *CRC Standard Mathematical
/// Tables*.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | diameter of the beam at the stop | um | mm | not 0 |
/// | diameter of the stop | um | mm | |
/// | distance between the two centres | um | mm | |
///
/// Result: Q16.16; float a plain number; at most 1.
/// Error: at most 1 LSB; float 1e-6, double 1e-14, absolute.
pub fn illumination_fx(beam: Micrometres, stop: Micrometres, offset: Micrometres) -> Result<Q16, Error> {
    present(beam.0, 1)?;
    let (beam, stop, apart) = (beam.0, stop.0, (offset.0 as u64) << 1);
    if apart >= beam as u64 + stop as u64 {
        return Ok(Q16(0));
    }
    if beam <= stop {
        if apart <= (stop - beam) as u64 {
            return Ok(Q16::ONE);
        }
        let share = segment::share_inside(beam, stop, apart);
        return Ok(Q16((share + (1 << 11)) >> 12));
    }
    // The share of the stop's disc, and that disc's of the beam's.
    let inside = apart <= (beam - stop) as u64;
    let share = if inside { segment::WHOLE } else { segment::share_inside(stop, beam, apart) };
    let ratio = divide((stop as u64) << 32, beam).0;
    Ok(Q16((high(share, high(ratio, ratio)) + (1 << 11)) >> 12))
}

/// Float form of [`illumination_fx`].
#[cfg(feature = "float")]
pub fn illumination<F: Real>(beam_mm: F, stop_mm: F, offset_mm: F) -> Result<F, Error> {
    positive(beam_mm, 1)?;
    not_negative(stop_mm, 2)?;
    not_negative(offset_mm, 3)?;
    let (zero, one) = (F::of(0.0), F::of(1.0));
    // Twice the distance against the sum and the differences of the diameters, to the last place.
    let apart = Double::from(offset_mm + offset_mm);
    let before = (Double::sum(beam_mm, stop_mm) - apart).upper;
    let beyond_beam = (apart + Double::sum(beam_mm, -stop_mm)).upper;
    let beyond_stop = (apart + Double::sum(stop_mm, -beam_mm)).upper;
    let ratio = stop_mm / beam_mm;
    if before <= zero {
        return Ok(zero);
    }
    if beyond_beam <= zero {
        return Ok(one);
    }
    if beyond_stop <= zero {
        return Ok(ratio * ratio);
    }
    // Root by root, since the products may be below what an f32 holds.
    let [before, beyond_beam, beyond_stop, sum] =
        [before, beyond_beam, beyond_stop, apart.upper + beam_mm + stop_mm].map(F::sqrt);
    let half_angle = |above: F, below: F| (before * above).atan2(below * sum);
    let of_beam = segment::segment_area(F::of(2.0) * half_angle(beyond_stop, beyond_beam));
    let of_stop = segment::segment_area(F::of(2.0) * half_angle(beyond_beam, beyond_stop));
    let share = F::of(core::f64::consts::FRAC_1_PI) * (of_beam + ratio * (ratio * of_stop));
    Ok(if share > one { one } else { share })
}
