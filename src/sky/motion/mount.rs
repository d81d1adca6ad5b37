//! What the sky asks of a mount that stands on the ground.

use super::{QUARTER_TURN, RATE, cosine, quarter, short_cosine};
#[cfg(feature = "float")]
use super::{RATE_ARCSEC, RATE_RADIANS, quarter_of_degrees};
#[cfg(feature = "float")]
use crate::math::degrees;
#[cfg(feature = "float")]
use crate::math::double::Double;
#[cfg(feature = "float")]
use crate::math::float::{Real, from_zero_to, not_negative};
use crate::math::multiply::{high, high_64, wide, wide_by};
use crate::math::{arc, divide, sine};
use crate::status::{Cause, Error, allowed};
use crate::units::{
    Bam, Milliarcseconds, MilliarcsecondsPerSecond, SignedBam, SignedMicroarcsecondsPerSecond,
};

/// w x / cosine with a sign, both in steps of 2^-62.
// Not a call on AVR, where the compiler would give it more arguments than arrive (see `divide::by_64`).
#[cfg_attr(target_arch = "avr", inline(always))]
#[cfg_attr(not(target_arch = "avr"), inline(never))]
fn rate_over(x: u64, cosine: u64, negative: bool) -> Result<SignedMicroarcsecondsPerSecond, Error> {
    let (upper, lower) = wide_by(x, RATE); // 2^-70
    let size = divide::by_64(upper >> 8, (upper as u64) << 56 | lower >> 8, cosine)? as i64;
    let signed = if negative { -size } else { size };
    i32::try_from(signed).map(SignedMicroarcsecondsPerSecond).map_err(|_| Error::OVERFLOW)
}

/// w x / cosine with a sign, both in steps of 2^-31, the cosine 1/4 or more.
#[inline(always)]
fn short_rate_over(x: u32, cosine: u32, negative: bool) -> SignedMicroarcsecondsPerSecond {
    let eighths = divide::divide(wide(x, RATE) >> 5, cosine).0; // at most eight times 4 w
    let size = ((eighths + 4) >> 3) as i32;
    SignedMicroarcsecondsPerSecond(if negative { -size } else { size })
}

/// a b in steps of 2^-31, as they are.
#[inline(always)]
fn short_product(a: u32, b: u32) -> u32 {
    (wide(a, b) >> 31) as u32
}

/// Whether an azimuth is on the north side; on the border it does not matter.
#[inline(always)]
fn northern(azimuth: Bam) -> bool {
    azimuth.0.wrapping_add(QUARTER_TURN) >> 31 == 0
}

/// a b in steps of 2^-62, as they are.
#[inline(always)]
fn product(a: u64, b: u64) -> u64 {
    high_64(a << 1, b << 1)
}

/// Refuses an angle that is out of its range, and the exact zenith and nadir, where no azimuth is defined.
#[inline(always)]
fn off_the_zenith(latitude: SignedBam, altitude: SignedBam) -> Result<(), Error> {
    quarter(latitude, 1)?;
    quarter(altitude, 3)?;
    if altitude.0.unsigned_abs() == QUARTER_TURN {
        return Err(Error::new(Cause::Undefined, 3));
    }
    Ok(())
}

#[cfg(feature = "float")]
fn off_the_zenith_in_degrees<F: Real>(latitude: F, azimuth: F, altitude: F) -> Result<(), Error> {
    quarter_of_degrees(latitude, 1)?;
    from_zero_to(360.0, azimuth, 2)?;
    quarter_of_degrees(altitude, 3)?;
    if altitude == F::of(90.0) || altitude == F::of(-90.0) {
        return Err(Error::new(Cause::Undefined, 3));
    }
    Ok(())
}

/// How fast the field turns in an altazimuth telescope.
///
/// -w cos lat cos A / cos h: the rate of the parallactic angle, positive where that grows. Source: Smart, *Textbook on
/// Spherical Astronomy*, the differentials of the astronomical triangle.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | latitude of the observer lat | signed bam | degrees | -90 to 90 degrees |
/// | azimuth A | bam | degrees | 0 to 360 degrees |
/// | altitude h | signed bam | degrees | -90 to 90 degrees |
///
/// Result: signed uas per second; float arcsec per second. Overflow, close to the zenith: 0.597 degrees per second or more;
/// a float always fits. [`Undefined`](Cause::Undefined) at the exact zenith and nadir.
/// Error: at most 1 LSB or 2 parts in 10^6, the larger; float 6 ulp.
pub fn field_rotation_rate_fx(
    latitude: SignedBam,
    azimuth: Bam,
    altitude: SignedBam,
) -> Result<SignedMicroarcsecondsPerSecond, Error> {
    off_the_zenith(latitude, altitude)?;
    let (north, from_east) = (northern(azimuth), azimuth.0.wrapping_add(QUARTER_TURN));
    let below = short_cosine(altitude);
    if below >> 29 != 0 {
        let share = short_product(short_cosine(latitude), sine::size_of_sine(from_east));
        return Ok(short_rate_over(share, below, north));
    }
    let share = product(cosine(latitude), sine::sine(from_east).unsigned_abs());
    rate_over(share, cosine(altitude), north)
}

/// Float form of [`field_rotation_rate_fx`].
#[cfg(feature = "float")]
pub fn field_rotation_rate<F: Real>(latitude_deg: F, azimuth_deg: F, altitude_deg: F) -> Result<F, Error> {
    off_the_zenith_in_degrees(latitude_deg, azimuth_deg, altitude_deg)?;
    let share = degrees::cosine(latitude_deg) * degrees::cosine(azimuth_deg);
    Ok(-(F::of(RATE_ARCSEC) * share / degrees::cosine(altitude_deg)))
}

/// How fast an altazimuth mount turns in azimuth to follow the sky.
///
/// w (sin lat - cos lat cos A tan h). Source: Smart, *Textbook on Spherical Astronomy*, the differentials of the
/// astronomical triangle.
///
/// Caution: a moving mount can hurt. Stay clear of all that it can reach, and follow the maker's instructions.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | latitude of the observer lat | signed bam | degrees | -90 to 90 degrees |
/// | azimuth A | bam | degrees | 0 to 360 degrees |
/// | altitude h | signed bam | degrees | -90 to 90 degrees |
///
/// Result: signed uas per second, positive from north to east; float arcsec per second. Overflow, close to the zenith:
/// 0.597 degrees per second or more; a float always fits. [`Undefined`](Cause::Undefined) at the exact zenith and nadir.
/// Error: at most 1 LSB or 2 parts in 10^6 of the larger term, the larger; float 6 ulp of the larger term.
pub fn azimuth_rate_fx(
    latitude: SignedBam,
    azimuth: Bam,
    altitude: SignedBam,
) -> Result<SignedMicroarcsecondsPerSecond, Error> {
    off_the_zenith(latitude, altitude)?;
    let (lat, alt, from_east) = (latitude.0 as u32, altitude.0 as u32, azimuth.0.wrapping_add(QUARTER_TURN));
    let below = short_cosine(altitude);
    // The sizes of sin lat cos h and of cos lat cos A sin h.
    let short = below >> 29 != 0;
    let (steady, swing) = if short {
        let share = short_product(short_cosine(latitude), sine::size_of_sine(from_east));
        (
            short_product(sine::size_of_sine(lat), below) as i64,
            short_product(share, sine::size_of_sine(alt)) as i64,
        )
    } else {
        let size = |angle: u32| sine::sine(angle).unsigned_abs();
        let share = product(cosine(latitude), size(from_east));
        (product(size(lat), cosine(altitude)) as i64, product(share, size(alt)) as i64)
    };
    let steady = if latitude.0 < 0 { -steady } else { steady };
    let rest = if northern(azimuth) == (altitude.0 >= 0) { steady - swing } else { steady + swing };
    if short {
        Ok(short_rate_over(rest.unsigned_abs() as u32, below, rest < 0))
    } else {
        rate_over(rest.unsigned_abs(), cosine(altitude), rest < 0)
    }
}

/// Float form of [`azimuth_rate_fx`].
#[cfg(feature = "float")]
pub fn azimuth_rate<F: Real>(latitude_deg: F, azimuth_deg: F, altitude_deg: F) -> Result<F, Error> {
    off_the_zenith_in_degrees(latitude_deg, azimuth_deg, altitude_deg)?;
    let share = degrees::cosine(latitude_deg) * degrees::cosine(azimuth_deg);
    let swing = share * degrees::sine(altitude_deg) / degrees::cosine(altitude_deg);
    Ok(F::of(RATE_ARCSEC) * (degrees::sine(latitude_deg) - swing))
}

/// How fast an altazimuth mount turns in altitude to follow the sky.
///
/// w cos lat sin A. Source: Smart, *Textbook on Spherical Astronomy*, the differentials of the astronomical triangle.
///
/// Caution: a moving mount can hurt. Stay clear of all that it can reach, and follow the maker's instructions.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | latitude of the observer lat | signed bam | degrees | -90 to 90 degrees |
/// | azimuth A | bam | degrees | 0 to 360 degrees |
/// | altitude, which does not matter | signed bam | degrees | -90 to 90 degrees |
///
/// Result: signed uas per second, positive upward; float arcsec per second. It always fits.
/// Error: at most 0.53 LSB; float 6 ulp.
pub fn altitude_rate_fx(
    latitude: SignedBam,
    azimuth: Bam,
    altitude: SignedBam,
) -> Result<SignedMicroarcsecondsPerSecond, Error> {
    quarter(latitude, 1)?;
    quarter(altitude, 3)?;
    let share = short_product(short_cosine(latitude), sine::size_of_sine(azimuth.0));
    let rate = ((wide(share, RATE) + (1 << 38)) >> 39) as i32;
    Ok(SignedMicroarcsecondsPerSecond(if azimuth.0 >> 31 == 0 { rate } else { -rate }))
}

/// Float form of [`altitude_rate_fx`].
#[cfg(feature = "float")]
pub fn altitude_rate<F: Real>(latitude_deg: F, azimuth_deg: F, altitude_deg: F) -> Result<F, Error> {
    quarter_of_degrees(latitude_deg, 1)?;
    from_zero_to(360.0, azimuth_deg, 2)?;
    quarter_of_degrees(altitude_deg, 3)?;
    Ok(F::of(RATE_ARCSEC) * degrees::cosine(latitude_deg) * degrees::sine(azimuth_deg))
}

/// The radius of the circle about the zenith in which an altazimuth mount cannot follow the sky.
///
/// z with w (|sin lat| + cos lat cot z) = the fastest that the mount turns in azimuth: outside that circle no star asks for
/// more, so it is on the safe side. Source: Smart, *Textbook on Spherical Astronomy*, as [`azimuth_rate_fx`] on the meridian.
///
/// Caution: a mount at its top speed can hurt. Stay clear of all that it can reach, and follow the maker's instructions.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | latitude of the observer lat | signed bam | degrees | -90 to 90 degrees |
/// | fastest rate in azimuth | mas per second | arcsec per second | over w abs(sin lat) |
///
/// Result: mas, 0 at the poles; float arcsec. It always fits.
/// Error: at most 1 LSB or 2 parts in 10^6, the larger; float 6 ulp.
pub fn zenith_blind_radius_fx(
    latitude: SignedBam,
    top_rate: MilliarcsecondsPerSecond,
) -> Result<Milliarcseconds, Error> {
    /// w in steps of 2^-40 of a microarcsecond per second.
    const RATE_FINE: u64 = 16_537_829_870_062_819_267;
    quarter(latitude, 1)?;
    let steady = high_64(sine::sine(latitude.0.unsigned_abs()) as u64, RATE_FINE); // 2^-38
    let swing = high_64(cosine(latitude), RATE_FINE);
    let top_rate = wide(top_rate.0, 1000);
    let (swing, left) = if top_rate >> 24 == 0 {
        let top_rate = top_rate << 38;
        allowed(top_rate > steady, 2)?;
        (swing, top_rate - steady)
    } else {
        // Above w by far.
        (swing >> 18, (top_rate << 20) - (steady >> 18))
    };
    if swing == 0 {
        return Ok(Milliarcseconds(0));
    }
    Ok(Milliarcseconds((arc::angle_of_ratio(swing, left) + 1) >> 1))
}

/// Float form of [`zenith_blind_radius_fx`].
#[cfg(feature = "float")]
pub fn zenith_blind_radius<F: Real>(latitude_deg: F, top_rate_arcsec_per_s: F) -> Result<F, Error> {
    quarter_of_degrees(latitude_deg, 1)?;
    not_negative(top_rate_arcsec_per_s, 2)?;
    let size = if latitude_deg < F::of(0.0) { -latitude_deg } else { latitude_deg };
    let rate = F::of(RATE_ARCSEC);
    let left = if top_rate_arcsec_per_s < F::of(0.5) * rate {
        top_rate_arcsec_per_s / rate - degrees::sine(size)
    } else {
        // What each of the two lacks to 1, since both may be close to it; 10^4 times the day is whole.
        let half_sine = degrees::sine(F::of(0.5) * (F::of(90.0) - size));
        let turned = Double::of(861_640_905.0) * top_rate_arcsec_per_s;
        let over = (turned - Double::from(F::of(12.96e9))).upper / F::of(12.96e9);
        over + F::of(2.0) * half_sine * half_sine
    };
    allowed(left > F::of(0.0), 2)?;
    Ok(degrees::cosine(latitude_deg).atan2(left) * F::of(648_000.0 / core::f64::consts::PI))
}

/// How fast a star leaves its declination on a mount whose polar axis is not on the pole.
///
/// -w e sin H, to first order in e, H the star's hour angle less that of the displaced pole: what drift alignment measures.
/// Source: Smart, *Textbook on Spherical Astronomy*, small rotations of the celestial sphere.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | distance of the mount's pole from the true one e | mas | arcsec | at most 18000000 (5 degrees) |
/// | hour angle H of the star, less the displaced pole's | bam | degrees | 0 to 360 degrees |
///
/// Result: signed uas per second of declination, positive northward; float arcsec per second. It always fits.
/// Error: at most 0.51 LSB; float 4 ulp.
pub fn misalignment_drift_fx(
    polar_error: Milliarcseconds,
    hour_angle: Bam,
) -> Result<SignedMicroarcsecondsPerSecond, Error> {
    allowed(polar_error.0 <= 18_000_000, 1)?;
    let most = (wide(polar_error.0, 2_505_551_930) >> 25) as u32; // w, to 2^-10 uas
    let size = ((high(most, sine::size_of_sine(hour_angle.0)) + (1 << 8)) >> 9) as i32;
    Ok(SignedMicroarcsecondsPerSecond(if hour_angle.0 >> 31 == 0 { -size } else { size }))
}

/// Float form of [`misalignment_drift_fx`].
#[cfg(feature = "float")]
pub fn misalignment_drift<F: Real>(polar_error_arcsec: F, hour_angle_deg: F) -> Result<F, Error> {
    from_zero_to(18_000.0, polar_error_arcsec, 1)?;
    from_zero_to(360.0, hour_angle_deg, 2)?;
    Ok(-(F::of(RATE_RADIANS) * polar_error_arcsec * degrees::sine(hour_angle_deg)))
}
