//! Contrast of an annular aperture: the area that two equal rings share, over the area of one.

use crate::math::divide::{self, divide};
#[cfg(feature = "float")]
use crate::math::float::{Real, from_zero_to};
use crate::math::multiply::{high_64, wide};
use crate::math::root;
#[cfg(feature = "float")]
use crate::math::segment::segment_area;
use crate::optics::allowed;
use crate::status::Error;
use crate::stored::stored;
use crate::units::Q16;

/// Contrast that the optics keep at a frequency: the modulation transfer of an aperture with a central obstruction, in
/// incoherent light and without aberrations.
///
/// The area that two annuli of diameter ratio e share, their centres v apart in units of the outer diameter, over the
/// area of one. Without an obstruction (2 / pi) (acos v - v sqrt(1 - v^2)). Source: O'Neill, *Journal of the Optical
/// Society of America* 46, 285 (1956).
///
/// | argument | fixed | float | range |
/// |---|---|---|---|
/// | frequency, of the cutoff frequency (v) | Q16.16 | plain | at most 1 |
/// | obstruction, of the aperture's diameter (e) | Q16.16 | plain | under 1 |
///
/// Result: Q16.16, float plain; at most 1.
/// Error: at most 1 LSB; float 4e-6, double 1e-14 / (1 - e), absolute.
pub fn contrast_fx(frequency: Q16, obstruction: Q16) -> Result<Q16, Error> {
    allowed(frequency.0 <= ONE, 1)?;
    allowed(obstruction.0 < ONE, 2)?;
    let (v, e) = (frequency.0, obstruction.0);
    if v == 0 {
        return Ok(Q16::ONE);
    }
    // Between the centres in units of the outer radius, and the width of the ring.
    let (s, width) = (2 * v, ONE - e);
    // Twice the area that the outer discs share, and twice what the inner ones do less what one shares with the other
    // ring's outer disc: segments of the circles, in quarters of the unit circle. Versed sines from the law of cosines,
    // as products so that nothing cancels.
    let mut outer = segment(((ONE - v) as u64) << 32);
    let mut inner = if v < e { segment(ratio(((e - v) as u64) << 16, e)) } else { 0 };
    let mut both = 0;
    if s <= width {
        both = WHOLE_DISC;
    } else if s < ONE + e {
        let (beyond, before) = (s - width, ONE + e - s);
        outer = outer.saturating_sub(segment(ratio(wide(beyond, before), 2 * s)));
        let supplement = over(ratio(wide(beyond, s + e + ONE), 2 * s), e);
        both = if supplement <= 1 << 48 {
            WHOLE_DISC - segment(supplement)
        } else {
            segment((2 << 48) - supplement)
        };
    }
    inner = both.saturating_sub(inner);
    let shared = outer.saturating_sub(high_64(inner, wide(e, e) << 32));
    // 1 - e^2 in steps of 2^-32; without an obstruction one of them is missing, which is nothing.
    let ring = wide(width, ONE + e).min(u32::MAX as u64) as u32;
    divide::rounded(shared >> 12, ring).map(Q16)
}

const ONE: u32 = Q16::ONE.0;

/// n / d in steps of 2^-32, cut. `d` is above the upper half of `n`.
#[inline(never)]
fn ratio(n: u64, d: u32) -> u64 {
    let (whole, rest) = divide(n, d);
    (whole as u64) << 32 | divide((rest as u64) << 32, d).0 as u64
}

/// n 2^16 / d, cut; below 2^64. `d` is below 2^16.
fn over(n: u64, d: u32) -> u64 {
    let (whole, rest) = divide(n >> 16, d);
    (whole as u64) << 32 | divide((rest as u64) << 32 | (n & 0xffff) << 16, d).0 as u64
}

/// The square root of `x`, 0 to 1 in steps of 2^-48, in steps of 2^-63.
fn square_root(x: u64) -> u64 {
    // Newton's step from the nearest of 2^-31: what its square leaves of x is at most as large as itself.
    let x = x << 14;
    match root::rounded(x) {
        Ok(near) if near != 0 => {
            let left = x.wrapping_sub(wide(near, near)) as i64;
            let step = divide(left.unsigned_abs() << 31, near).0 as u64;
            let near = (near as u64) << 32;
            if left < 0 { near - step } else { near + step }
        }
        _ => 0,
    }
}

/// A whole disc in the units of [`segment`].
const WHOLE_DISC: u64 = 2 << 60;

stored! {
    /// (2 / pi) (t - sin t cos t) / h^(3/2), h = 1 - cos t from 0 to 1, by Chebyshev interpolation: the coefficients of
    /// T0, -T1, -T2 … in 2 h - 1, in steps of 2^-62. Within 2^-42.
    static SEGMENT: [u64; 13] = [
        5087065888185110905,
        461293935854986349,
        13166517523058583,
        839972618312605,
        71459824060877,
        7101049272933,
        778564298153,
        91380658479,
        11276053083,
        1445856921,
        191106547,
        25879310,
        3507659,
    ];
}

/// (2 / pi) (t - sin t cos t), twice a segment's area in quarters of the unit circle, from its height h = 1 - cos t, 0
/// to 1 in steps of 2^-48; in steps of 2^-60, within 2^-40.
#[inline(never)]
fn segment(height: u64) -> u64 {
    let h = height << 15;
    // Clenshaw's sum from the last term; each is several times the next, so nothing falls below 0.
    let (mut sum, mut after) = (0u64, 0u64);
    for term in SEGMENT.iter().skip(1).rev() {
        let next = term + (high_64(h, sum) << 3) - 2 * sum - after;
        (after, sum) = (sum, next);
    }
    let series = SEGMENT.at(0) + sum + after - (high_64(h, sum) << 2);
    high_64(high_64(h, square_root(height)), series)
}

/// Float form of [`contrast_fx`].
#[cfg(feature = "float")]
pub fn contrast<F: Real>(frequency: F, obstruction: F) -> Result<F, Error> {
    let (zero, half, one, two) = (F::of(0.0), F::of(0.5), F::of(1.0), F::of(2.0));
    from_zero_to(1.0, frequency, 1)?;
    from_zero_to(1.0, obstruction, 2)?;
    allowed(obstruction < one, 2)?;
    let (v, e) = (frequency, obstruction);
    if v == zero {
        return Ok(one);
    }
    // As in the fixed form; `beyond` and `before` to the last place, also where they are small.
    let (s, width) = (v + v, one - e);
    let beyond = (s - width) - ((one - width) - e);
    let before = (one - s) + e;
    let ring = width * (one + e);
    // Half the distance, half the chord: the outer circles meet at (v, outer), the inner ones at (v, inner).
    let outer = ((one - v) * (one + v)).sqrt();
    let inner = if v < e { ((e - v) * (e + v)).sqrt() } else { zero };
    let shared = if beyond <= zero && v < e {
        let lost = v.atan2(outer) + v * outer + e * e * v.atan2(inner) + v * inner;
        F::of(FRAC_PI_2) * ring - lost
    } else if beyond <= zero {
        segment_area(outer.atan2(v)) - F::of(PI) * e * e
    } else if before <= zero {
        segment_area(outer.atan2(v))
    } else if v >= e {
        let (less, more) = (s + width, one + s + e);
        let a = two * (beyond * before).sqrt().atan2((less * more).sqrt());
        let b = two * (before * less).sqrt().atan2((beyond * more).sqrt());
        segment_area(outer.atan2(v)) - segment_area(a) - e * e * segment_area(b)
    } else {
        // The rings cross in two patches. Each is a kite between its four corners, plus two segments of the outer
        // circle (angle `mean` + `difference` / 2), less two of the inner one (`mean` - `difference` / 2). All is of
        // the second order in a thin ring, so that nothing cancels.
        let p = (before * (one + s + e)).sqrt();
        let q = (beyond * (s + width)).sqrt();
        let (outer_turn, inner_turn) = (v.atan2(outer), v.atan2(inner));
        let difference = two * q.atan2(p) - outer_turn - inner_turn;
        let mean = (width * p).atan2((one + e) * q) + half * (inner_turn - outer_turn);
        let half_sine = (half * mean).sin();
        let kite = half * ring * ring / (s * (outer + inner));
        let segments = two * difference * half_sine * half_sine
            + F::of(4.0) * segment_area(F::of(0.25) * difference) * mean.cos();
        kite + segments + two * ring * segment_area(half * mean - F::of(0.25) * difference)
    };
    let contrast = shared / (F::of(FRAC_PI_2) * ring);
    Ok(if contrast < zero {
        zero
    } else if contrast > one {
        one
    } else {
        contrast
    })
}

#[cfg(feature = "float")]
use core::f64::consts::{FRAC_PI_2, PI};

#[cfg(test)]
mod tests {
    use super::*;
    use std::f64::consts::{FRAC_2_PI, PI};
    use std::vec::Vec;

    const STEP_48: f64 = 1.0 / (1u64 << 48) as f64;

    /// (2 / pi) (t - sin t cos t), by its series where t is small.
    fn exact(height: f64) -> f64 {
        let t = 2.0 * (height / 2.0).sqrt().asin();
        if t > 0.5 {
            return FRAC_2_PI * (t - t.sin() * t.cos());
        }
        let mut term = 2.0 / 3.0 * t * t * t;
        let mut sum = 0.0;
        for k in 0..9 {
            sum += term;
            let k = 2.0 * k as f64;
            term *= -4.0 * t * t / ((k + 4.0) * (k + 5.0));
        }
        FRAC_2_PI * sum
    }

    #[test]
    fn segment_series_is_the_interpolation() {
        let n = SEGMENT.iter().count();
        let angle = |k: usize| PI * (k as f64 + 0.5) / n as f64;
        let at_node: Vec<f64> = (0..n)
            .map(|k| {
                let h = (1.0 + angle(k).cos()) / 2.0;
                exact(h) / (h * h.sqrt())
            })
            .collect();
        for (j, got) in SEGMENT.iter().enumerate() {
            let sum: f64 = (0..n).map(|k| at_node[k] * (j as f64 * angle(k)).cos()).sum();
            let c = sum * if j == 0 { 1.0 } else { -2.0 } / n as f64;
            let got = got as f64 / (1u64 << 62) as f64;
            assert!((got - c).abs() < 1e-15, "{j}: {got:e}, {c:e}");
        }
    }

    #[test]
    fn segment_is_near() {
        let one = 1u64 << 48;
        let mut worst = 0.0f64;
        let wide = (0..=100_000).map(|k| one / 100_000 * k).chain((0..1000).map(|k| one - k));
        for height in wide.chain((0..48 * 64).map(|k| (one >> (k / 64)) / 64 * (64 - k % 64))) {
            let got = segment(height) as f64 / (1u64 << 60) as f64;
            worst = worst.max((got - exact(height as f64 * STEP_48)).abs());
        }
        assert!(worst < 2f64.powi(-40), "{:e}", worst);
        std::println!("segment: 2^{:.2}", worst.log2());
    }

    #[test]
    fn square_root_is_near() {
        let mut x = 1u64;
        for k in 0..100_000 {
            x = x.wrapping_mul(0x5851f42d4c957f2d).wrapping_add(0x14057b7ef767814f);
            let n = (x >> 16 >> (k % 48)).max(1);
            let root = square_root(n) as f64 / (1u64 << 63) as f64;
            let exact = (n as f64 * STEP_48).sqrt();
            // At the bottom the nearest 2^-31 is a poor start, where the segment is nothing.
            let owed = 3e-16 + 2f64.powi(-64) / exact;
            assert!((root - exact).abs() <= owed, "{n}: {root}, {exact}");
        }
        assert_eq!(square_root(0), 0);
        assert_eq!(square_root(1 << 48), 1 << 63);
    }

    #[test]
    fn quotients_are_cut() {
        let mut x = 1u64;
        for _ in 0..100_000 {
            x = x.wrapping_mul(0x5851f42d4c957f2d).wrapping_add(0x14057b7ef767814f);
            let (d, n) = ((x >> 46) as u32 | 1, (x & 0xffff_ffff) << 14);
            if n >> 32 < d as u64 {
                assert_eq!(ratio(n, d) as u128, ((n as u128) << 32) / d as u128);
            }
            let d = (d & 0xffff) | 1;
            if n >> 48 < d as u64 {
                assert_eq!(over(n, d) as u128, ((n as u128) << 16) / d as u128);
            }
        }
    }
}
