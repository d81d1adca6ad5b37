//! The digit engine: quotient and remainder by ten or by sixty, in three small products.
//!
//! A Cortex-M0 has no division, and neither rustc nor gcc uses a reciprocal there.

#[cfg(target_arch = "avr")]
use crate::math::avr::times_repeated;
use crate::math::multiply::high;
#[cfg(any(test, feature = "capi"))]
use crate::math::multiply::of_lower_halves;
use crate::stored::stored;

#[cfg(target_arch = "avr")]
pub(super) fn split_ten(n: u32) -> (u32, u8) {
    let quotient = times_repeated(n, 0xcc);
    let rest = (n as u8).wrapping_sub((quotient as u8).wrapping_mul(10));
    if rest < 10 { (quotient, rest) } else { (quotient + 1, rest - 10) }
}

#[cfg(target_arch = "avr")]
pub(super) fn split_sixty(n: u32) -> (u32, u32) {
    let quotient = times_repeated(n >> 2, 0x88);
    let rest = (n as u8).wrapping_sub((quotient as u8).wrapping_mul(60));
    if rest < 60 { (quotient, rest.into()) } else { (quotient + 1, (rest - 60).into()) }
}

/// `n` divided by ten, and the digit that is left.
#[cfg(not(target_arch = "avr"))]
#[inline(always)]
pub(super) fn split_ten(n: u32) -> (u32, u8) {
    if n < 1 << 16 {
        let quotient = (n * 52_429) >> 19;
        return (quotient, (n - quotient * 10) as u8);
    }
    // The high half gives most of the quotient, never too much: 65535 / 10 for each 65536.
    let most = ((n >> 16) * 52_428) >> 3;
    // What is left is under 2^17 + 6. Its half times 2^18 / 5, rounded up, is exact.
    let quotient = most + ((((n - most * 10) >> 1) * 52_429) >> 18);
    (quotient, (n - quotient * 10) as u8)
}

/// The same for a number under 2^16.
#[cfg(any(test, feature = "capi"))]
#[inline(always)]
pub(crate) fn split_small_ten(n: u32) -> (u32, u32) {
    let quotient = of_lower_halves(n, 52_429) >> 19;
    (quotient, (n as u8).wrapping_sub((quotient as u8).wrapping_mul(10)).into())
}

/// A number under 2^16 divided by a hundred, and what is left.
#[cfg(any(test, feature = "capi"))]
#[inline(always)]
pub(crate) fn split_small_hundred(n: u32) -> (u32, u32) {
    let quotient = of_lower_halves(n >> 2, 5_243) >> 17;
    (quotient, (n as u8).wrapping_sub((quotient as u8).wrapping_mul(100)).into())
}

/// `n` divided by sixty, and what is left.
#[cfg(not(target_arch = "avr"))]
#[inline(always)]
pub(super) fn split_sixty(n: u32) -> (u32, u32) {
    // The same: 65535 / 60 for each 65536, then a quarter times 2^19 / 15.
    let most = ((n >> 16) * 8738) >> 3;
    let quotient = most + ((((n - most * 60) >> 2) * 34_953) >> 19);
    (quotient, n - quotient * 60)
}

stored! {
    static POWERS: [u32; 10] =
        [1, 10, 100, 1_000, 10_000, 100_000, 1_000_000, 10_000_000, 100_000_000, 1_000_000_000];
    /// 5^n / 2, cut.
    static HALF_FIVES: [u32; 10] = [0, 2, 12, 62, 312, 1562, 7812, 39062, 195312, 976562];
    /// 2^(32 + 2 n) / 5^n, rounded up: so 10^n is divided by as a shift by n, this product, and a shift by 2 n.
    static FIFTHS: [u32; 10] = [
        0, 3_435_973_837, 2_748_779_070, 2_199_023_256, 1_759_218_605, 1_407_374_884, 1_125_899_907, 900_719_926,
        720_575_941, 576_460_753,
    ];
}

/// 10^n, n at most 9.
#[inline(always)]
pub(super) fn ten_to_the(n: u8) -> u32 {
    POWERS.checked(n.into()).unwrap_or(0)
}

/// Whether `number` has no more than so many digits.
#[cfg(any(test, feature = "capi"))]
#[inline(always)]
pub(crate) fn has_at_most(number: u32, digits: usize) -> bool {
    POWERS.checked(digits).is_none_or(|power| number < power)
}

/// `n` divided by ten so many times, to nearest, halves up.
#[inline(never)]
pub(super) fn without_tens(n: u32, tens: u32) -> u32 {
    let Some(fifths) = FIFTHS.checked(tens as usize) else { return 0 };
    if tens == 0 {
        return n;
    }
    // The half of the divisor is an odd number of the bits that are shifted out last: no sum overflows.
    let halves = n >> (tens - 1);
    let most = (halves >> 1) + (halves & 1) + HALF_FIVES.at(tens as usize);
    high(most, fifths) >> (2 * tens)
}

/// `n` divided by sixty to nearest, halves up.
#[inline(always)]
pub(super) fn without_sixty(n: u32) -> u32 {
    let (quotient, rest) = split_sixty(n);
    quotient + u32::from(rest >= 30)
}

#[cfg(test)]
mod tests {
    use super::*;

    fn check(n: u32) {
        assert_eq!(split_ten(n), (n / 10, (n % 10) as u8), "{n}");
        assert_eq!(split_sixty(n), (n / 60, n % 60), "{n}");
    }

    #[test]
    fn splits_exactly() {
        (0..=200_000).for_each(check);
        for high in 0..1 << 16 {
            // Each high half, with the low halves where a quotient could go wrong.
            [0, 1, 5, 29, 59, 0x7fff, 0xffc4, 0xfff0, 0xfffa, 0xffff]
                .into_iter()
                .for_each(|low| check(high << 16 | low));
        }
    }

    fn check_tens(n: u32) {
        for tens in 0..=12 {
            let power = 10u64.pow(tens);
            assert_eq!(u64::from(without_tens(n, tens)), (u64::from(n) + power / 2) / power, "{n} {tens}");
        }
    }

    #[test]
    fn splits_every_small_number() {
        for n in 0..1 << 16 {
            assert_eq!(split_small_ten(n), (n / 10, n % 10), "{n}");
            assert_eq!(split_small_hundred(n), (n / 100, n % 100), "{n}");
            for digits in 1..=12 {
                let length = n.checked_ilog10().unwrap_or(0) as usize + 1;
                assert_eq!(has_at_most(n, digits), length <= digits, "{n} {digits}");
            }
        }
        assert!(has_at_most(u32::MAX, 10) && !has_at_most(1_000_000_000, 9));
    }

    #[test]
    fn removes_tens() {
        for tens in 1..=9 {
            let power = 10u32.pow(tens);
            for half in 0..=u32::MAX / (power / 2) {
                // Where a quotient or its rounding changes; as far as a step lets it be seen in a second.
                if half < 50_000 || half % 4_099 == 0 {
                    let edge = half * (power / 2);
                    [edge.saturating_sub(1), edge, edge.saturating_add(1)].into_iter().for_each(check_tens);
                }
            }
        }
        [u32::MAX, u32::MAX - 1].into_iter().for_each(check_tens);
    }

    #[test]
    fn fifths_are_rounded_up() {
        for n in 1..=9 {
            assert_eq!(u64::from(FIFTHS.at(n)), (1u64 << (32 + 2 * n)).div_ceil(5u64.pow(n as u32)));
            assert_eq!(POWERS.at(n), 10u32.pow(n as u32));
            assert_eq!(HALF_FIVES.at(n), 5u32.pow(n as u32) / 2);
        }
    }

    #[test]
    #[ignore = "all 2^32 numbers; minutes in release"]
    fn removes_tens_from_every_number() {
        (0..=u32::MAX).for_each(check_tens);
    }

    #[test]
    #[ignore = "all 2^32 numbers; a minute in release"]
    fn splits_every_number() {
        (0..=u32::MAX).for_each(check);
    }
}
