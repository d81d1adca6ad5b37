//! The sine of a binary angle, over the full turn.

use super::multiply::{high, high_64, high_signed, wide, wide_by};
use crate::stored::{Stored, stored};

/// A quarter of a turn, 90 degrees.
const QUARTER: u32 = 1 << 30;

/// pi / 2 in steps of 2^-63.
const HALF_PI: u64 = 14_488_038_916_154_245_685;

stored! {
    /// For q = x / 90 degrees up to 1/2 and z = q^2, by Chebyshev interpolation in z from 0 to 1/4:
    /// (pi / 2 - sin(x) / q) / z and (1 - cos x) / z, as c1 - z (c2 - z (c3 - z (c4 - z c5))). In both c1 and c2 are in
    /// steps of 2^-63, upper and lower half, the others in steps of 2^-37.
    static SERIES: [[u32; 7]; 2] = [
        [1_387_197_336, 2_531_926_008, 171_138_611, 2_935_728_328, 643_455_294, 22_049_806, 489_755],
        [2_649_351_757, 4_054_945_561, 544_751_119, 3_569_216_083, 2_867_454_178, 126_333_382, 3_423_498],
    ];
}

/// z times the series, in steps of 2^-64, from z in steps of 2^-65, at most 1/4.
#[inline(never)]
fn missing(row: &Stored<[u32; 7]>, square: u64) -> u64 {
    let pair = |i: usize| (row.at(i) as u64) << 32 | row.at(i + 1) as u64;
    let upper = (square >> 32) as u32; // 2^-33
    let inner = row.at(5) - (high(upper, row.at(6)) >> 1);
    let inner = row.at(4) - (high(upper, inner) >> 1);
    let inner = pair(2) - (wide(upper, inner) >> 7);
    let inner = pair(0) - (high_64(square, inner) >> 1);
    high_64(square, inner)
}

/// The sine in steps of 2^-62, within 2^-41; exact where it is 0 or 1. That of a quarter turn more is the cosine.
#[inline(never)]
pub(crate) fn sine(angle_bam: u32) -> i64 {
    let along = angle_bam & (QUARTER - 1);
    let rising = angle_bam & QUARTER == 0;
    // From the nearer of a zero and a crest: at most 45 degrees.
    let near_start = along <= QUARTER / 2;
    let x = if near_start { along } else { QUARTER - along };
    let square = wide(x, x) << 5;
    let sine = if near_start == rising {
        let over_q = HALF_PI - (missing(SERIES.entry(0), square) >> 1);
        let (upper, lower) = wide_by(over_q, x << 1);
        (upper as u64) << 32 | lower >> 32
    } else {
        (1 << 62) - (missing(SERIES.entry(1), square) >> 2)
    } as i64;
    if angle_bam >> 31 == 0 { sine } else { -sine }
}

/// The size of the sine in steps of 2^-31, within one of them; exact where it is 0 or 1. Of a quarter turn more, that of
/// the cosine. Half of what [`sine`] costs.
#[inline(never)]
pub(crate) fn size_of_sine(angle_bam: u32) -> u32 {
    let along = angle_bam & (QUARTER - 1);
    let from_zero = if angle_bam & QUARTER == 0 { along } else { QUARTER - along };
    let near_zero = from_zero <= QUARTER / 2;
    let x = if near_zero { from_zero } else { QUARTER - from_zero };
    let row = SERIES.entry(!near_zero as usize);
    // As `missing`, with the upper halves of the two that have halves.
    let square = (wide(x, x) >> 27) as u32; // 2^-33
    let inner = row.at(5) - (high(square, row.at(6)) >> 1);
    let inner = row.at(4) - (high(square, inner) >> 1);
    let inner = row.at(2) - (high(square, inner) >> 7);
    let inner = row.at(0) - (high(square, inner) >> 1);
    let missing = (high(square, inner) + 1) >> 1; // 2^-31
    if near_zero {
        ((wide(((HALF_PI >> 32) as u32) - missing, x << 2) + (1 << 31)) >> 32) as u32
    } else {
        (1 << 31) - missing
    }
}

/// The sine of an angle from 0 to a quarter turn in steps of 2^-64 of a turn, within 2^-41 and 2^-30 times what the
/// cosine lacks to 1; near 0 within 2^-32 of itself or 2 steps.
#[inline(never)]
pub(crate) fn sine_fine(angle: u64) -> u64 {
    /// pi / 2 in steps of 2^-31.
    const HALF_PI_31: u32 = 3_373_259_426;
    let near = (angle >> 32) as u32 + (angle as u32 >> 31);
    // What the steps of `sine` leave out, at most half of one, goes by the slope at 0.
    let rest = ((high_signed(angle as u32 as i32, HALF_PI_31)) as i64) << 1;
    (sine(near) + rest) as u64
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::math::chebyshev::interpolate;
    use std::f64::consts::{FRAC_PI_2, PI};

    #[test]
    fn series_are_the_interpolation() {
        // The series of sine and cosine, since the differences cancel: Abramowitz and Stegun 4.3.65 and 66.
        let series = |z: f64, first: u32| {
            let square = z * FRAC_PI_2 * FRAC_PI_2;
            let mut term = (1..=first).fold(1.0, |product, k| product * FRAC_PI_2 / k as f64);
            let mut sum = 0.0;
            for k in 0..12 {
                sum += term;
                let k = (first + 2 * k) as f64;
                term *= -square / ((k + 1.0) * (k + 2.0));
            }
            sum
        };
        assert_eq!(HALF_PI as f64 / 2f64.powi(63), FRAC_PI_2);
        for (row, first) in SERIES.iter().zip([3, 2]) {
            let c = interpolate(|z| series(z, first), 0.0, 0.25, 5);
            let pair = |i: usize| ((row[i] as u64) << 32 | row[i + 1] as u64) as f64 / 2f64.powi(63);
            let tail = |i: usize| row[i] as f64 / 2f64.powi(37);
            let got = [pair(0), -pair(2), tail(4), -tail(5), tail(6)];
            // Interpolation in f64 loses more in the higher powers.
            for (k, owed) in [1e-15, 1e-13, 5e-12, 2e-11, 6e-11].into_iter().enumerate() {
                assert!((got[k] - c[k]).abs() < owed, "{first}, power {k}: {:e} {:e}", got[k], c[k]);
            }
        }
    }

    fn worst(angles: impl Iterator<Item = u32>) -> f64 {
        let exact = |angle: u32| (angle as f64 / 2f64.powi(31) * PI).sin();
        angles.map(|angle| (sine(angle) as f64 / 2f64.powi(62) - exact(angle)).abs()).fold(0.0, f64::max)
    }

    #[test]
    fn sine_is_near() {
        let borders =
            (0..8u32).flat_map(|k| (0..2000).map(move |i| (k << 29).wrapping_add(i).wrapping_sub(1000)));
        let worst = worst((0..u32::MAX).step_by(1009).chain(borders));
        std::println!("sine: 2^{:.2}", worst.log2());
        assert!(worst < 2f64.powi(-41));
    }

    #[test]
    #[ignore = "every angle of a quarter turn: a minute in release"]
    fn every_sine_of_a_quarter() {
        let worst = worst(0..=QUARTER);
        std::println!("sine: 2^{:.2}", worst.log2());
        assert!(worst < 2f64.powi(-41));
    }

    #[test]
    fn size_of_sine_is_near() {
        let borders =
            (0..8u32).flat_map(|k| (0..2000).map(move |i| (k << 29).wrapping_add(i).wrapping_sub(1000)));
        let error =
            |angle: u32| size_of_sine(angle) as f64 - sine(angle).unsigned_abs() as f64 / 2f64.powi(31);
        let (mut least, mut most) = (0.0f64, 0.0f64);
        for angle in (0..u32::MAX).step_by(1009).chain(borders) {
            (least, most) = (least.min(error(angle)), most.max(error(angle)));
        }
        std::println!("size_of_sine: {least:.3} to {most:.3} steps");
        assert!(least > -1.0 && most < 1.0);
        assert_eq!([0, 1 << 30, 1 << 31, 3 << 30].map(size_of_sine), [0, 1 << 31, 0, 1 << 31]);
    }

    #[test]
    fn sine_is_symmetrical() {
        assert_eq!([0, 1 << 30, 1 << 31, 3 << 30].map(sine), [0, 1 << 62, 0, -(1 << 62)]);
        for angle in (0..u32::MAX).step_by(10_007) {
            assert_eq!(sine(angle), -sine(angle.wrapping_neg()));
            assert_eq!(sine(angle), sine((1u32 << 31).wrapping_sub(angle)));
        }
    }
}
