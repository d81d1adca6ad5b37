//! Segments of a circle: what a chord cuts off.

use super::arc::leading;
use super::divide::{divide, shift_up};
#[cfg(feature = "float")]
use super::float::Real;
use super::multiply::{high, high_signed, wide};
use super::root;
use crate::stored::{Stored, stored};

/// 1 in the steps of a height.
const ONE: u64 = 1 << 62;

stored! {
    /// P = (2 / pi) (t - sin t cos t) / h^(3/2) for the height h = 1 - cos t from 0 to 1, by Chebyshev interpolation in
    /// h - 1/2: c0, -c1, -c2 … in steps of 2^-30. Within 2^-25.
    static FROM_HEIGHT: [u32; 7] =
        [1_187_473_934, 213_649_830, 24_004_997, 5_993_803, 1_992_461, 846_339, 365_872];
}

stored! {
    /// P / (2 - h), likewise, with c1, c2 … not negated. Within 2^-24.
    static FROM_CHORD: [u32; 10] = [
        791_649_312, 385_333_181, 240_881_036, 156_585_382, 103_203_403, 68_285_717, 43_685_516, 29_023_732,
        26_695_083, 17_767_833,
    ];
}

/// A table's c1 + u (c2 + u (…)) times u = h - 1/2, from h in steps of 2^-32.
#[inline(always)]
fn rest<const N: usize>(table: &Stored<[u32; N]>, height: u32) -> i32 {
    let u = (height ^ (1 << 31)) as i32;
    let sum = table.iter().skip(1).rev().fold(0u32, |sum, c| c.wrapping_add(high_signed(u, sum) as u32));
    high_signed(u, sum)
}

/// The upper bits of a number below 2^34, and how many were cut.
#[inline(always)]
fn cut(x: u64) -> (u32, i8) {
    if x >> 32 == 0 { (x as u32, 0) } else { ((x >> 2) as u32, 2) }
}

/// a b / (2 c d), at most 2, in steps of 2^-62 and within 2^-28 of itself. All are below 2^34 and none is 0.
#[inline(always)]
fn height(a: u64, b: u64, c: u64, d: u32) -> u64 {
    let ((a, a_cut), (b, b_cut), (c, c_cut)) = (cut(a), cut(b), cut(c));
    ratio(wide(a, b), wide(c, d), a_cut + b_cut - c_cut - 1)
}

/// 2^shift n / d, at most 2, in steps of 2^-62 and within 2^-29 of itself. Neither is 0. (C's convention leaves all 18
/// bytes of an AVR's argument registers to the arguments.)
#[inline(never)]
pub(crate) extern "C" fn ratio(n: u64, d: u64, shift: i8) -> u64 {
    let ((n, n_below), (d, d_below)) = (leading(n), leading(d));
    let ratio = divide((n as u64) << 31, d).0; // from 2^30 on
    let shift = 31 + shift as i32 + n_below - d_below;
    let steps = match shift {
        2.. => shift_up((ratio as u64) << 2, (shift as u32 - 2) & 31),
        0.. => shift_up(ratio as u64, shift as u32 & 1),
        -31..0 => (ratio >> (-shift & 31)) as u64,
        _ => 0,
    };
    steps.min(2 * ONE)
}

/// (2 / pi) (t - sin t cos t) from the height 1 - cos t, 0 to 1, in steps of 2^-29: twice a segment's area in quarters
/// of the unit circle.
#[inline(never)]
fn flat(height: u64) -> u32 {
    let h = (height.min(ONE - 1) >> 30) as u32;
    let series = FROM_HEIGHT.at(0).wrapping_sub(rest(&FROM_HEIGHT, h) as u32);
    high(high(h, half_root(height)), series)
}

/// The square root in steps of 2^-31; of at most 1.
#[inline(always)]
fn half_root(height: u64) -> u32 {
    root::rounded(height).unwrap_or(1 << 31)
}

/// A whole disc in the steps of [`share_inside`], 2^-28.
pub(crate) const WHOLE: u32 = 1 << 28;

/// The share of the smaller of two discs that lies inside the other, in steps of 2^-28, within 2^-24. Their edges cross:
/// the diameters are `small` and `large`, and `apart`, twice the distance of the centres, is between their difference
/// and their sum.
#[inline(never)]
pub(crate) fn share_inside(small: u32, large: u32, apart: u64) -> u32 {
    // Two segments side by side, one of each disc. Their heights from the law of cosines, as products of lengths that
    // are exact, so that nothing cancels.
    let beyond = small as u64 + large as u64 - apart;
    let of_small = height(beyond, apart + large as u64 - small as u64, apart, small);
    let of_large = height(beyond, apart + small as u64 - large as u64, apart, large).min(ONE);
    let rest_of_small = 2 * ONE - of_small;
    let small_part = if of_small <= ONE { flat(of_small) } else { (2 << 29) - flat(rest_of_small) };
    // The larger disc's segment in terms of the smaller one: half the chord, squared, is h (2 - h) in either's radius.
    let h = (of_large.min(ONE - 1) >> 30) as u32;
    let series = FROM_CHORD.at(0).wrapping_add(rest(&FROM_CHORD, h) as u32);
    let sine = high(half_root(of_large), series); // 2^-29
    let chord =
        high((of_small >> 31).min(u32::MAX as u64) as u32, (rest_of_small >> 31).min(u32::MAX as u64) as u32);
    let large_part = high(chord, sine); // 2^-27
    ((small_part >> 2) + large_part).min(WHOLE)
}

/// t - sin t cos t, to the last places also for a small angle.
#[cfg(feature = "float")]
pub(crate) fn segment_area<F: Real>(t: F) -> F {
    if t > F::of(0.5) {
        return t - F::of(0.5) * (t + t).sin();
    }
    let (one, square) = (F::of(1.0), F::of(4.0) * t * t);
    let tail = one - square * F::of(1.0 / 210.0) * (one - square * F::of(1.0 / 272.0));
    let tail = one - square * F::of(1.0 / 110.0) * (one - square * F::of(1.0 / 156.0) * tail);
    let tail = one - square * F::of(1.0 / 42.0) * (one - square * F::of(1.0 / 72.0) * tail);
    F::of(2.0 / 3.0) * t * t * t * (one - square * F::of(1.0 / 20.0) * tail)
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::math::chebyshev::interpolate;
    use std::f64::consts::{FRAC_2_PI, PI};
    use std::vec::Vec;

    /// t - sin t cos t, by its series where t is small.
    fn area(t: f64) -> f64 {
        if t > 0.5 {
            return t - t.sin() * t.cos();
        }
        let mut term = 2.0 / 3.0 * t * t * t;
        let mut sum = 0.0;
        for k in 0..9 {
            sum += term;
            let k = 2.0 * k as f64;
            term *= -4.0 * t * t / ((k + 4.0) * (k + 5.0));
        }
        sum
    }

    fn from_height(h: f64) -> f64 {
        FRAC_2_PI * area(2.0 * (h / 2.0).sqrt().asin()) / (h * h.sqrt())
    }

    #[test]
    fn series_are_the_interpolation() {
        let compare = |got: &[f64], expected: &[f64]| {
            for (k, (got, expected)) in got.iter().zip(expected).enumerate() {
                // Interpolation in f64 loses more in the higher powers.
                let lost = 1e-14 * 8f64.powi(k as i32);
                let step = 0.5 / (1u64 << 30) as f64;
                assert!((got - expected).abs() <= step + lost, "power {k}: {got:e}, {expected:e}");
            }
        };
        let steps = |c: u32| c as f64 / (1u64 << 30) as f64;
        let got: Vec<f64> =
            FROM_HEIGHT.iter().enumerate().map(|(k, c)| if k == 0 { steps(c) } else { -steps(c) }).collect();
        compare(&got, &interpolate(|u| from_height(u + 0.5), -0.5, 0.5, 7));
        let got: Vec<f64> = FROM_CHORD.iter().map(steps).collect();
        compare(&got, &interpolate(|u| from_height(u + 0.5) / (1.5 - u), -0.5, 0.5, 10));
    }

    #[test]
    fn flat_is_near() {
        let mut worst = 0.0f64;
        for k in 0..=200_000u64 {
            let height = ONE / 200_000 * k;
            let h = height as f64 / ONE as f64;
            let exact = FRAC_2_PI * area(2.0 * (h / 2.0).sqrt().asin());
            worst = worst.max((flat(height) as f64 / (1u64 << 29) as f64 - exact).abs());
        }
        std::println!("flat: 2^{:.2}", worst.log2());
        assert!(worst < 2f64.powi(-25));
    }

    #[test]
    fn heights_are_near() {
        let mut x = 1u64;
        for k in 0..100_000 {
            let mut drawn = || {
                x = x.wrapping_mul(0x5851f42d4c957f2d).wrapping_add(0x14057b7ef767814f);
                (x >> 30 >> (x % 34)).max(1)
            };
            let (a, b, c) = (drawn(), drawn(), drawn());
            let d = (drawn() >> 2).max(1) as u32;
            let exact = a as f64 * b as f64 / (2.0 * c as f64 * d as f64);
            if exact <= 2.0 {
                let error = (height(a, b, c, d) as f64 / ONE as f64 - exact).abs();
                assert!(error <= exact * 2f64.powi(-28) + 2f64.powi(-62), "{k}: {a} {b} {c} {d}");
            }
        }
    }

    #[test]
    fn shares_are_near() {
        let mut x = 1u64;
        let mut worst = 0.0f64;
        for _ in 0..300_000 {
            let mut drawn = || {
                x = x.wrapping_mul(0x5851f42d4c957f2d).wrapping_add(0x14057b7ef767814f);
                x >> 32
            };
            let large = (drawn() >> (drawn() & 31)).max(2) as u32;
            // Log-uniform, and often nearly alike.
            let small = (large >> (drawn() % 24)).saturating_sub((drawn() >> (drawn() & 31)) as u32).max(1);
            let (least, most) = ((large - small) as u64, large as u64 + small as u64);
            let across = (drawn() >> (drawn() & 31)) % (most - least - 1).max(1);
            let apart = if drawn() & 1 == 0 { least + 1 + across } else { most - 1 - across };
            if apart & 1 != 0 || apart <= least || apart >= most {
                continue;
            }
            let (r, l, s) = (small as f64, large as f64, apart as f64);
            let (before, of_r, of_l) = ((most - apart) as f64, s + (l - r), s - (l - r));
            let angle = |n: f64, d: f64| 2.0 * n.sqrt().atan2(d.sqrt());
            let alpha = angle(before * of_r, of_l * (s + l + r));
            let beta = angle(before * of_l, of_r * (s + l + r));
            let exact = (area(alpha) + l / r * (l / r * area(beta))) / PI;
            worst = worst.max((share_inside(small, large, apart) as f64 / (1u64 << 28) as f64 - exact).abs());
        }
        std::println!("share_inside: 2^{:.2}", worst.log2());
        assert!(worst < 2f64.powi(-24));
    }
}
