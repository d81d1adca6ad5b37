//! Square root of 64 bits to the nearest 32.

use super::divide::{normalise_evenly, shift_up};
use super::multiply::wide;
use crate::status::Error;
use crate::stored::stored;

const INTERVALS: usize = 96;

stored! {
    /// 2^8 / sqrt(A) - 2^8 for the middle of each of 96 intervals of A = n / 2^64, from 1/4 to 1.
    static RECIPROCAL_ROOT: [u8; INTERVALS] = [
        252, 244, 237, 230, 223, 217, 211, 205, 199, 194, 188, 183, 178, 173, 169, 164, 160, 156, 152, 148, 144,
        140, 136, 133, 129, 126, 123, 119, 116, 113, 110, 107, 105, 102, 99, 97, 94, 91, 89, 87, 84, 82, 80, 77,
        75, 73, 71, 69, 67, 65, 63, 61, 59, 57, 55, 54, 52, 50, 48, 47, 45, 44, 42, 40, 39, 37, 36, 34, 33, 31,
        30, 29, 27, 26, 25, 23, 22, 21, 20, 18, 17, 16, 15, 13, 12, 11, 10, 9, 8, 7, 6, 5, 4, 3, 2, 1,
    ];
}

#[inline(always)]
fn reciprocal_root(index: usize) -> i32 {
    if index < INTERVALS { 256 + i32::from(RECIPROCAL_ROOT.at(index)) } else { 256 }
}

/// The root of `n`, whose upper two bits are not both 0: less than 2 too low and less than 0.5 too high. That holds for
/// each of the 34 upper bits that it looks at.
#[inline(always)]
fn near(n: u64) -> u32 {
    let a = (n >> 32) as u32;
    if a == u32::MAX {
        return u32::MAX; // the steps below would wrap to 0
    }
    // The root to 18 bits is g (1 + f), where g y = 1 - e and f = e / 2 + 3 e^2 / 8.
    let y = reciprocal_root(((a >> 25) as usize).wrapping_sub(32)); // 2^-8
    let g = (a >> 9).wrapping_mul(y as u32); // 2^-31
    let e = (g >> 4).wrapping_mul(y as u32).wrapping_neg() as i32 >> 15; // 2^-20
    let f = e + ((3 * ((e * e) as u32 >> 2)) >> 20) as i32; // 2^-21
    let root = g.wrapping_add((((g >> 16) as i32 * f) >> 5) as u32) >> 11; // 2^-20
    let y = (y << 5) + ((y * f) >> 16); // 2^-13
    // One step of Newton: the rest, whose upper bits are 0, over twice the root.
    let rest = ((n >> 24) as u32).wrapping_sub(root.wrapping_mul(root)) as i32; // 2^-40
    (root << 12).wrapping_add((((rest >> 6) * y + (5 << 12)) >> 16) as u32)
}

/// The square root of `n` to the nearest integer.
#[inline(never)]
pub(crate) fn rounded(n: u64) -> Result<u32, Error> {
    // (2^32 - 1/2)^2
    if n > (u32::MAX as u64) << 32 {
        return Err(Error::OVERFLOW);
    }
    let (top, half) = if n >> 32 == 0 { (n << 32, 16) } else { (n, 0) };
    let (_, shift) = normalise_evenly((top >> 32) as u32);
    let mut root = near(shift_up(top, shift)) >> (half + shift / 2);
    let mut rest = n.wrapping_sub(wide(root, root)) as i64;
    // At most twice.
    while rest > root as i64 {
        rest -= 2 * root as i64 + 1;
        root += 1;
    }
    Ok(root)
}

/// The square root of n + fraction / 2^32, within 0.50001.
pub(crate) fn with_fraction(n: u64, fraction: u32) -> Result<u32, Error> {
    if n >> 32 != 0 {
        return rounded(n); // the fraction moves the root by less than 2^-17
    }
    match rounded(n << 32 | fraction as u64) {
        Ok(root) => Ok((root >> 16) + (root >> 15 & 1)),
        Err(_) => Ok(1 << 16),
    }
}

#[cfg(test)]
mod tests {
    use super::*;
    extern crate std;
    use std::vec::Vec;

    #[test]
    fn table_is_the_middle_of_each_interval() {
        let expected: Vec<u8> =
            (32..128).map(|i| (256.0 / ((i as f64 + 0.5) / 128.0).sqrt() - 256.0).round() as u8).collect();
        assert!(RECIPROCAL_ROOT.iter().eq(expected));
    }

    /// `upper` is the part of n that `near` looks at.
    fn check_near(upper: u64) {
        let (least, most) = (upper << 30, upper << 30 | ((1 << 30) - 1));
        let root = near(least) as u128;
        assert!(root * root - root < least as u128, "{least}: {root} is too high");
        assert!((root + 2) * (root + 3) >= most as u128, "{most}: {root} is too low");
    }

    #[test]
    fn near_is_near() {
        let step = 9973; // each with `every_near_is_near`
        let (from, to) = (1 << 32, 1 << 34);
        (from..to).step_by(step).chain(from..from + 10_000).chain(to - 10_000..to).for_each(check_near);
    }

    #[test]
    #[ignore = "every upper part: two minutes in release"]
    fn every_near_is_near() {
        (1 << 32..1 << 34).for_each(check_near);
    }

    fn check_rounded(n: u64) {
        // (root - 1/2)^2 <= n < (root + 1/2)^2, in integers.
        let in_range =
            |root: u128| root * root + root >= n as u128 && (root == 0 || root * root - root < n as u128);
        match rounded(n) {
            Ok(root) => assert!(in_range(root as u128), "{n}: {root}"),
            Err(_) => assert!(in_range(1 << 32), "{n} refused"),
        }
    }

    #[test]
    fn roots_are_to_the_nearest() {
        (0..100_000).for_each(check_rounded);
        let mut x = 1u64;
        for k in 0..500_000u32 {
            x = x.wrapping_mul(0x5851f42d4c957f2d).wrapping_add(0x14057b7ef767814f);
            let root = x >> 32 >> (k & 31);
            // The borders: squares, and where the nearest changes.
            let square = root * root;
            for n in [square, square.saturating_sub(1), square.saturating_add(root), x >> (k & 63)] {
                check_rounded(n);
                check_rounded(n.saturating_add(1));
            }
        }
        for k in 0..64 {
            check_rounded(1 << k);
            check_rounded((1 << k) - 1);
            check_rounded(u64::MAX - (1 << k));
        }
        check_rounded(u64::MAX);
    }

    #[test]
    fn fractions_count_where_they_matter() {
        for (n, fraction) in [
            (0, 0),
            (0, 1 << 30),
            (0, (1 << 30) - 1),
            (0, u32::MAX),
            (2, 1 << 30),
            (2, (1 << 30) - 70_000),
            (6, 0),
        ] {
            let value = n as f64 + fraction as f64 / 4294967296.0;
            let root = with_fraction(n, fraction).unwrap();
            assert!((root as f64 - value.sqrt()).abs() < 0.50001, "{n} + {fraction}: {root}");
        }
        assert_eq!(with_fraction(u32::MAX as u64, u32::MAX), Ok(1 << 16));
        assert_eq!(with_fraction(1 << 32, u32::MAX), Ok(1 << 16));
        assert!(with_fraction(u64::MAX, 0).is_err());
    }
}
