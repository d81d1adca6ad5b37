//! How long an exposure may last before the motion of the sky shows.

#[cfg(feature = "float")]
use super::{RATE_RADIANS, quarter_of_degrees};
use super::{cosine, quarter, short_cosine};
#[cfg(feature = "float")]
use crate::math::degrees;
use crate::math::divide::{self, Constant, divide, normalise};
#[cfg(feature = "float")]
use crate::math::double::{Double, quotient};
#[cfg(feature = "float")]
use crate::math::float::{Real, positive};
use crate::math::multiply::{high, wide};
use crate::math::{arc, multiply};
use crate::status::{Error, present};
use crate::units::{
    MicroarcsecondsPerSecond, Micrometres, Microseconds, Milliseconds, Nanometres, Q16, SignedBam,
};

/// The longest exposure from a tripod, without a drive, on which a star is not drawn out by more than so many pixels.
///
/// (t p / f) / (w cos d). Source: Smart, *Textbook on Spherical Astronomy*, diurnal motion; Schroeder, *Astronomical
/// Optics*, plate scale. Two or three pixels do not show (common practice).
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | pixel pitch p | nm | um | not 0 |
/// | tolerance t, in pixels | Q16.16 | plain | not 0 |
/// | focal length f | um | mm | not 0 |
/// | declination d | signed bam | degrees | -90 to 90 degrees |
///
/// Result: us; float s. Overflow: 4294967296 us or more, and at the pole.
/// Error: at most 1 LSB or 1 part in 10^6, the larger; float 6 ulp.
pub fn trail_free_exposure_fx(
    pixel: Nanometres,
    tolerance: Q16,
    focal_length: Micrometres,
    declination: SignedBam,
) -> Result<Microseconds, Error> {
    present(pixel.0, 1)?;
    present(tolerance.0, 2)?;
    present(focal_length.0, 3)?;
    quarter(declination, 4)?;
    // 24 bits do, so the leading words of each.
    let (path, path_below) = arc::leading(wide(tolerance.0, pixel.0));
    let short = short_cosine(declination);
    let (cosine, cosine_below) = if short >> 24 != 0 {
        let (cosine, shift) = normalise(short);
        (cosine, 31 - shift as i32)
    } else {
        match cosine(declination) {
            0 => return Err(Error::OVERFLOW),
            cosine => arc::leading(cosine),
        }
    };
    let (length, length_shift) = normalise(focal_length.0);
    let n = high(path, 3_510_640_876); // 1000 / (65536 w), 2^-24
    let d = high(length, cosine);
    let quotient = divide((n as u64) << 30, d).0; // from 2^28 on
    let up = path_below - cosine_below + length_shift as i32 + 8;
    let exposure = match up {
        4.. => return Err(Error::OVERFLOW),
        0.. => (quotient as u64) << up,
        -32..0 => ((quotient as u64) + (1 << (-up - 1))) >> -up,
        _ => 0,
    };
    u32::try_from(exposure).map(Microseconds).map_err(|_| Error::OVERFLOW)
}

/// Float form of [`trail_free_exposure_fx`].
#[cfg(feature = "float")]
pub fn trail_free_exposure<F: Real>(
    pixel_um: F,
    tolerance: F,
    focal_length_mm: F,
    declination_deg: F,
) -> Result<F, Error> {
    positive(pixel_um, 1)?;
    positive(tolerance, 2)?;
    positive(focal_length_mm, 3)?;
    quarter_of_degrees(declination_deg, 4)?;
    let cosine = degrees::cosine(declination_deg);
    if cosine == F::of(0.0) {
        return Err(Error::OVERFLOW);
    }
    Ok(pixel_um * tolerance / (focal_length_mm * cosine) * F::of(0.001 / RATE_RADIANS))
}

/// The longest exposure on an altazimuth mount on which the turning field does not draw out a star by more than so many
/// pixels.
///
/// (1 rad) t / (r rate). Source: geometry, an arc about the guide star; the rate from [`field_rotation_rate_fx`].
///
/// [`field_rotation_rate_fx`]: super::field_rotation_rate_fx
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | tolerance t, in pixels | Q16.16 | plain | not 0 |
/// | distance from the centre of the turn r, in pixels | count | count | not 0 |
/// | rate of the field's turn, its size | uas per second | arcsec per second | not 0 |
///
/// Result: ms; float s. Overflow: 4294967296 ms or more.
/// Error: at most 0.51 LSB; float 2 ulp.
pub fn rotation_free_exposure_fx(
    tolerance: Q16,
    radius_px: u32,
    rate: MicroarcsecondsPerSecond,
) -> Result<Milliseconds, Error> {
    /// A radian in microarcseconds, over 65.536.
    const RADIAN: Constant = Constant { whole: 3_147_351_169, fraction: 2_327_337_708 };
    present(tolerance.0, 1)?;
    present(radius_px, 2)?;
    present(rate.0, 3)?;
    let d = wide(radius_px, rate.0);
    if d >> 32 == 0 {
        return divide::constant(tolerance.0, RADIAN, d as u32).map(Milliseconds);
    }
    let n = wide(tolerance.0, RADIAN.whole) + multiply::high(tolerance.0, RADIAN.fraction) as u64;
    divide::by_64(0, n, d).map(Milliseconds)
}

/// Float form of [`rotation_free_exposure_fx`].
#[cfg(feature = "float")]
pub fn rotation_free_exposure<F: Real>(
    tolerance: F,
    radius_px: u32,
    rate_arcsec_per_s: F,
) -> Result<F, Error> {
    positive(tolerance, 1)?;
    present(radius_px, 2)?;
    positive(rate_arcsec_per_s, 3)?;
    // In two parts that f32 holds.
    let radius = Double::sum(F::of_count(radius_px & !0xffff), F::of_count(radius_px & 0xffff));
    let radian = Double::of(648_000.0 / core::f64::consts::PI);
    Ok(quotient(radian * tolerance, radius * rate_arcsec_per_s))
}
