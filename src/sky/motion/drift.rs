//! How fast and how long a star drifts when the drive stands still.

use super::{QUARTER_TURN, RATE, cosine, quarter, short_cosine};
#[cfg(feature = "float")]
use super::{RATE_ARCSEC, SIDEREAL_DAY_S, quarter_of_degrees};
#[cfg(feature = "float")]
use crate::math::degrees;
#[cfg(feature = "float")]
use crate::math::double::Double;
#[cfg(feature = "float")]
use crate::math::float::{Real, positive};
use crate::math::multiply::{high, high_64, wide, wide_by};
use crate::math::sine::sine_fine;
use crate::math::{arc, divide, root, segment};
use crate::status::{Cause, Error, allowed, present};
use crate::units::{MicroarcsecondsPerSecond, Milliarcseconds, Milliseconds, SignedBam};

/// 360 degrees.
const TURN_MAS: u32 = 1_296_000_000;

/// How fast a star drifts through the field when the drive stands still.
///
/// w cos d. Source: Smart, *Textbook on Spherical Astronomy*, diurnal motion along a parallel of declination.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | declination d | signed bam | degrees | -90 to 90 degrees |
///
/// Result: uas per second; float arcsec per second. It always fits.
/// Error: at most 0.51 LSB; float 3 ulp.
pub fn drift_rate_fx(declination: SignedBam) -> Result<MicroarcsecondsPerSecond, Error> {
    quarter(declination, 1)?;
    let rate = wide(short_cosine(declination), RATE); // 2^-39
    Ok(MicroarcsecondsPerSecond(((rate + (1 << 38)) >> 39) as u32))
}

/// Float form of [`drift_rate_fx`].
#[cfg(feature = "float")]
pub fn drift_rate<F: Real>(declination_deg: F) -> Result<F, Error> {
    quarter_of_degrees(declination_deg, 1)?;
    Ok(F::of(RATE_ARCSEC) * degrees::cosine(declination_deg))
}

/// How long a star takes through the field, from edge to edge through its centre, when the drive stands still.
///
/// 4 asin(sin(F/4) / cos d) / w, along the star's parallel of declination; F / (w cos d) for a small field away from the
/// pole. Source: Smart, *Textbook on Spherical Astronomy*, the chord of a parallel: sin(F/4) is the half of the half field's
/// chord, which the half of the half hour angle spans on a circle of radius cos d.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | true field F | mas | arcsec | not 0, under 1296000000 (360 degrees) |
/// | declination d | signed bam | degrees | -90 to 90 degrees |
///
/// Result: ms; float s. It always fits. [`NeverLeft`](Cause::NeverLeft) where F/4 is 90 degrees - d or more, for d in size:
/// the star stays in the field all day.
/// Error: at most 1 LSB; float 8 ulp.
pub fn drift_time_fx(field: Milliarcseconds, declination: SignedBam) -> Result<Milliseconds, Error> {
    present(field.0, 1)?;
    allowed(field.0 < TURN_MAS, 1)?;
    quarter(declination, 2)?;
    // In a unit of which a bam has 1265625 and a quarter of a milliarcsecond 2^20, so that the border is exact.
    let from_pole = QUARTER_TURN - declination.0.unsigned_abs();
    let before_pole = wide(from_pole, 1_265_625) as i64 - ((field.0 as i64) << 20);
    if before_pole <= 0 {
        return Err(Error::new(Cause::NeverLeft, 0));
    }
    let cosine = short_cosine(declination);
    let path = wide(field.0, 2_284_394_758) + (cosine >> 1) as u64; // 2^35 / w
    if path >> 25 < cosine as u64 && cosine >> 24 != 0 {
        // Under 2^21 ms, and half a degree from the pole, the arc sine's next term does: y / 6 of the time, y = (w time / 4)^2 sin^2 d.
        let sixteenths = divide::divide(path, cosine).0;
        let part = sixth((wide(sixteenths, sixteenths) >> 18) as u32, cosine);
        let more = high(sixteenths, part) >> 11;
        return Ok(Milliseconds((sixteenths + more + 8) >> 4));
    }
    Ok(wide_drift(from_pole, before_pole as u64))
}

/// (w t / 4)^2 sin^2 d / 6 in steps of 2^-43, from the square of milliseconds in steps of 2^10 and cos d in steps of 2^-31.
#[inline(always)]
fn sixth(square_of_time: u32, cosine: u32) -> u32 {
    let square_of_sine = ((1 << 62) - wide(cosine, cosine)) >> 30; // 2^-32
    high(high(square_of_time, square_of_sine as u32), 2_142_819_149)
}

/// The same for any field, from the star's distance from the pole and what that has over F/4.
///
/// Half the hour angle is 90 degrees - 2 atan sqrt(tan((c - F/4) / 2) / tan((c + F/4) / 2)), c = 90 degrees - d.
#[inline(never)]
fn wide_drift(from_pole: u32, before_pole: u64) -> Milliseconds {
    // To steps of 2^-64 of a turn by 2^32 / 1265625; that of a small difference does not matter, as the sum is then large.
    let (upper, lower) = wide_by(before_pole, 3_558_399_706);
    let half_difference = (upper as u64) << 43 | lower >> 21;
    let half_sum = ((from_pole as u64) << 32) - half_difference;
    let cosine_fine = |angle: u64| sine_fine((1 << 62) - angle);
    let product = |a: u64, b: u64| {
        let ((a, a_below), (b, b_below)) = (arc::leading(a), arc::leading(b));
        (wide(a, b), a_below + b_below)
    };
    let (n, n_below) = product(sine_fine(half_difference), cosine_fine(half_sum));
    let (d, d_below) = product(sine_fine(half_sum), cosine_fine(half_difference));
    let square = segment::ratio(n, d, (n_below - d_below) as i8).min((1 << 62) - 1);
    let ratio = root::rounded(square << 2).unwrap_or(u32::MAX);
    let missing = wide(arc::twice_arctangent(ratio), 2_284_394_758) >> 28; // 4 / w, to 2^-5 ms
    Milliseconds((2_757_250_896 - missing as u32 + 16) >> 5)
}

/// Float form of [`drift_time_fx`].
#[cfg(feature = "float")]
pub fn drift_time<F: Real>(field_arcsec: F, declination_deg: F) -> Result<F, Error> {
    // F/4 and the angles with it in units of a quarter of an arcsecond, so that the field is one of them as it stands.
    const QUARTERS: f64 = 14_400.0;
    const RIGHT_ANGLE: f64 = 1_296_000.0;
    positive(field_arcsec, 1)?;
    allowed(field_arcsec < F::of(RIGHT_ANGLE), 1)?;
    quarter_of_degrees(declination_deg, 2)?;
    let size = if declination_deg < F::of(0.0) { -declination_deg } else { declination_deg };
    let from_pole = Double::sum(F::of(90.0), -size) * F::of(QUARTERS);
    let before_pole = (from_pole - Double::from(field_arcsec)).upper;
    if before_pole <= F::of(0.0) {
        return Err(Error::new(Cause::NeverLeft, 0));
    }
    let sum = (from_pole + Double::from(field_arcsec)).upper;
    let beyond = if sum <= F::of(RIGHT_ANGLE) {
        sum
    } else {
        // From half a turn, where the sine is the same.
        (Double::sum(F::of(RIGHT_ANGLE), -field_arcsec) + Double::product(size, F::of(QUARTERS))).upper
    };
    let sine = |angle: F| (angle * F::of(core::f64::consts::FRAC_PI_2 / RIGHT_ANGLE)).sin();
    // cos^2 d - sin^2(F/4), without a difference.
    let adjacent = (sine(before_pole) * sine(beyond)).sqrt();
    Ok(sine(field_arcsec).atan2(adjacent) * F::of(SIDEREAL_DAY_S / core::f64::consts::FRAC_PI_2))
}

/// The true field of an eyepiece, found by timing a star through it when the drive stands still.
///
/// 4 asin(cos d sin(w t/4)): the inverse of [`drift_time_fx`], with the same source.
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | time from edge to edge through the centre t | ms | s | not 0, under 86164090.5 (a sidereal day) |
/// | declination of the star d | signed bam | degrees | -90 to 90 degrees |
///
/// Result: mas; float arcsec. It always fits; 0 at the pole.
/// Error: at most 1 LSB or 1 part in 10^6, the larger; float 8 ulp.
pub fn true_field_from_drift_fx(
    drift: Milliseconds,
    declination: SignedBam,
) -> Result<Milliarcseconds, Error> {
    present(drift.0, 1)?;
    allowed(drift.0 <= 86_164_090, 1)?;
    quarter(declination, 2)?;
    if drift.0 < 1_714_000 {
        // w t / 4 is under 1/32, so the first two terms do.
        let cosine = short_cosine(declination);
        let straight = high((wide(drift.0, cosine) >> 20) as u32, 4_037_556_121); // w, 2^-7
        let less = high(straight, sixth((wide(drift.0, drift.0) >> 10) as u32, cosine)) >> 11;
        return Ok(Milliarcseconds((straight - less + 64) >> 7));
    }
    let (_, quarter_path) = wide_by(53_522_134_240, drift.0); // w t/4, 2^-64 of a turn
    let sine = high_64(cosine(declination) << 1, sine_fine(quarter_path) << 1); // 2^-62
    if sine >> 58 == 0 {
        // Under 1/16 the arc sine's first three terms do.
        let sine = ((sine + (1 << 25)) >> 26) as u32; // 2^-36
        let square = high(sine, sine); // 2^-40
        let series = high(square, 715_827_883) + (high(high(square, square), 1_258_291)); // 1/6, 3/40
        let first = high(sine, 3_300_236_900); // four radians, 2^-6
        return Ok(Milliarcseconds((first + (high(first, series) >> 8) + 32) >> 6));
    }
    Ok(wide_field(((1 << 62) - quarter_path) as i64, (declination.0.unsigned_abs() as i64) << 32))
}

/// The same for a wide field, from 90 degrees - w t/4 and d in steps of 2^-64 of a turn.
///
/// A quarter of the field is 90 degrees - 2 atan sqrt((1 - m) / (1 + m)) for m = cos d sin(w t/4), and 1 - m is a sum of two
/// squares.
#[inline(never)]
fn wide_field(rest: i64, declination: i64) -> Milliarcseconds {
    let half_sine = |angle: i64| sine_fine(angle.unsigned_abs() >> 1) << 1;
    let (less, more) = (half_sine(rest - declination), half_sine(rest + declination));
    let missing = high_64(less, less) + high_64(more, more); // 2^-62
    // At least 10^-17, since the day is not whole, and under 15/16.
    let square = segment::ratio(missing, (2 << 62) - missing, 0);
    let ratio = root::rounded(square << 2).unwrap_or(u32::MAX);
    Milliarcseconds(TURN_MAS - 4 * arc::twice_arctangent(ratio))
}

/// Float form of [`true_field_from_drift_fx`].
#[cfg(feature = "float")]
pub fn true_field_from_drift<F: Real>(drift_s: F, declination_deg: F) -> Result<F, Error> {
    positive(drift_s, 1)?;
    allowed(drift_s < F::of(SIDEREAL_DAY_S), 1)?;
    quarter_of_degrees(declination_deg, 2)?;
    const DEGREES_TO_SECOND: f64 = 90.0 / SIDEREAL_DAY_S;
    let rest = (Double::of(SIDEREAL_DAY_S) - Double::from(drift_s)).upper * F::of(DEGREES_TO_SECOND);
    let quarter_path = drift_s * F::of(DEGREES_TO_SECOND);
    let turned =
        if quarter_path <= F::of(45.0) { degrees::sine(quarter_path) } else { degrees::cosine(rest) };
    let sine = degrees::cosine(declination_deg) * turned;
    // 1 - sine without a difference.
    let half_sine = |angle: F| degrees::sine(F::of(0.5) * angle);
    let (less, more) = (half_sine(rest - declination_deg), half_sine(rest + declination_deg));
    let missing = less * less + more * more;
    let adjacent = (missing * (F::of(2.0) - missing)).sqrt();
    Ok(sine.atan2(adjacent) * F::of(4.0 * 648_000.0 / core::f64::consts::PI))
}
