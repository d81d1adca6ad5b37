//! Binary logarithm and its inverse, with 27 bits of fraction.

use super::divide::normalise;
use super::multiply::high;
use crate::stored::stored;

stored! {
    /// 256 over the middle of each of 32 intervals of M, from 1 to 2.
    static RECIPROCAL: [u8; 32] = [
        252, 245, 237, 231, 224, 218, 213, 207, 202, 197, 193, 188, 184, 180, 176, 172, 169, 165, 162, 159, 156,
        153, 150, 148, 145, 142, 140, 138, 135, 133, 131, 129,
    ];
}

stored! {
    /// -log2 of that reciprocal, in steps of 2^-30.
    static LOGARITHM: [i32; 32] = [
        24395496, 68034495, 119461027, 159183255, 206851077, 248910186, 284853376, 329115873, 366992626,
        405818769, 437595924, 478256579, 511571454, 545618583, 580430880, 616043529, 643300807, 680406342,
        708830662, 737786309, 767293525, 797373732, 828049626, 848842985, 880565910, 912952079, 934925242,
        957214576, 991261705, 1014382761, 1037854149, 1061686650,
    ];
}

/// log2(1 + r) / r for r within 1/56, by Chebyshev interpolation; the first less 369/256, and in steps of 2^-22, the
/// others in steps of 2^-16.
const LOGARITHM_SERIES: [i32; 4] = [5406, -47274, 31522, -23642];

/// One in the results of [`log2`].
pub(crate) const ONE: u32 = 1 << 27;

#[inline(always)]
fn reciprocal(interval: usize) -> u32 {
    RECIPROCAL.at(interval & 31).into()
}

#[inline(always)]
fn logarithm(interval: usize) -> i32 {
    LOGARITHM.at(interval & 31)
}

/// log2(x) in steps of 2^-27. `x` is not 0; of its bits only the upper 27 count, as more could not keep the result
/// from falling where x rises. Error: at most 2.5 steps, 1.5 for x up to 2^16; 5.4 with what is cut from x over 2^27.
#[inline(never)]
pub(crate) fn log2(x: u32) -> u32 {
    let (m, shift) = normalise(x);
    let interval = (m >> 26) as usize;
    // M times its reciprocal is 1 + r, and the 1 falls out at the top.
    let r = (m >> 5).wrapping_mul(reciprocal(interval)) as i32; // 2^-34, within 1/59
    let s = (r + (1 << 12)) >> 13; // 2^-21
    let [c0, c1, c2, c3] = LOGARITHM_SERIES;
    let series = c2 + ((s * c3) >> 21);
    let series = c1 + ((s * series) >> 21);
    let series = c0 + ((s * series + (1 << 14)) >> 15);
    let fraction = logarithm(interval) + ((((r + (1 << 5)) >> 6) * 369) >> 6) + ((s * series) >> 13); // 2^-30
    ((31 - shift) << 27) + ((fraction + 4) >> 3) as u32
}

stored! {
    /// 2^(-i / 16) in steps of 2^-31.
    static SIXTEENTHS: [u32; 16] = [
        2147483648, 2056437387, 1969251188, 1885761398, 1805811301, 1729250827, 1655936265, 1585730000,
        1518500250, 1454120821, 1392470869, 1333434672, 1276901417, 1222764986, 1170923762, 1121280436,
    ];
}

/// (1 - 2^-g) / g for g up to 1/16, by Chebyshev interpolation: 355/512 less the first, in steps of 2^-22; then minus
/// the second and the third, in steps of 2^-18.
const POWER_SERIES: [u32; 3] = [890, 62968, 14316];

#[inline(always)]
fn sixteenth(index: usize) -> u32 {
    SIXTEENTHS.at(index & 15)
}

/// 2^-y in steps of 2^-31, for y in steps of 2^-27; exact at each sixteenth.
/// Error: at most 1 step and 4e-8 of the result.
#[inline(never)]
pub(crate) fn exp2_negative(y: u32) -> u32 {
    let g = y & ((1 << 23) - 1); // 2^-27, under 1/16
    let s = (g + (1 << 6)) >> 7; // 2^-20
    let [c0, c1, c2] = POWER_SERIES;
    let series = c1 - ((s * c2) >> 20);
    let series = c0 + ((s * series + (1 << 15)) >> 16);
    let loss = ((g * 355) >> 4) - ((s * series) >> 10); // 1 - 2^-g, 2^-32
    let whole = sixteenth((y >> 23) as usize);
    (whole - high(whole, loss)) >> (y >> 27)
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::math::chebyshev::interpolate;
    extern crate std;
    use std::f64::consts::LN_2;

    fn steps(value: f64, bits: i32) -> i64 {
        (value * 2f64.powi(bits)).round() as i64
    }

    #[test]
    fn tables_follow_their_rule() {
        for i in 0..32 {
            let middle = 1.0 + (i as f64 + 0.5) / 32.0;
            assert_eq!(RECIPROCAL.at(i) as i64, steps(1.0 / middle, 8));
            assert_eq!(LOGARITHM.at(i) as i64, steps((256.0 / RECIPROCAL.at(i) as f64).log2(), 30));
        }
        for (i, entry) in SIXTEENTHS.iter().enumerate() {
            assert_eq!(entry as i64, steps((-(i as f64) / 16.0).exp2(), 31));
        }
    }

    #[test]
    fn series_follow_their_rule() {
        let c = interpolate(|r| r.ln_1p() / LN_2 / r, -1.0 / 56.0, 1.0 / 56.0, 4);
        let expected = [steps(c[0] - 369.0 / 256.0, 22), steps(c[1], 16), steps(c[2], 16), steps(c[3], 16)];
        assert_eq!(LOGARITHM_SERIES.map(i64::from), expected);
        let c = interpolate(|g| -(-g * LN_2).exp_m1() / g, 0.0, 1.0 / 16.0, 3);
        let expected = [steps(355.0 / 512.0 - c[0], 22), steps(-c[1], 18), steps(c[2], 18)];
        assert_eq!(POWER_SERIES.map(i64::from), expected);
    }

    fn log2_error(x: u32) -> f64 {
        (log2(x) as f64 - (x as f64).log2() * ONE as f64).abs()
    }

    /// Checks error and order of 27-bit numbers, the only ones that matter to the fraction.
    fn check_log2(numbers: impl Iterator<Item = u32>) {
        let mut last = 0;
        for x in numbers {
            let value = log2(x);
            assert!(value >= last, "{x}: falls");
            assert!(log2_error(x) <= 2.5, "{x}: {}", log2_error(x));
            last = value;
        }
    }

    #[test]
    fn log2_is_near_and_never_falls() {
        check_log2((1 << 26..1 << 27).step_by(101));
        check_log2(1..70_000);
        for k in 0..32 {
            let x = 1u32 << k;
            assert!(log2(x) == k << 27, "{x}: {}", log2(x));
            assert!(log2(x.wrapping_mul(2).wrapping_sub(1)) <= (k + 1) << 27 || k == 31);
        }
        assert!((1..=1 << 16).all(|x| log2_error(x) <= 1.5));
        assert!((0..1 << 20).all(|x| log2_error(u32::MAX - 4093 * x) <= 5.4));
        assert_eq!(log2(u32::MAX), log2(u32::MAX - 31));
    }

    #[test]
    #[ignore = "every number: seconds in release"]
    fn every_log2() {
        check_log2(1 << 26..1 << 27);
    }

    fn check_exp2(y: u32) {
        let exact = (-(y as f64) / ONE as f64).exp2() * 2f64.powi(31);
        let error = (exp2_negative(y) as f64 - exact).abs();
        assert!(error <= 1.0 + 4e-8 * exact, "{y}: {error} of {exact}");
    }

    #[test]
    fn exp2_is_near() {
        (0..ONE).step_by(101).for_each(check_exp2);
        (0..u32::MAX).step_by(4999).for_each(check_exp2);
        check_exp2(u32::MAX);
        for i in 0..16 {
            assert_eq!(exp2_negative(ONE / 16 * i), SIXTEENTHS.at(i as usize));
        }
        assert_eq!(exp2_negative(31 * ONE), 1);
    }

    #[test]
    #[ignore = "every fraction: seconds in release"]
    fn every_exp2() {
        (0..ONE).for_each(check_exp2);
    }
}
