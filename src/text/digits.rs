//! The digit engine: quotient and remainder by ten or by sixty, in three small products.
//!
//! A Cortex-M0 has no division, and neither rustc nor gcc uses a reciprocal there.

#[cfg(target_arch = "avr")]
use crate::math::avr::times_repeated;
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

/// `n` divided by sixty, and what is left.
#[cfg(not(target_arch = "avr"))]
#[inline(always)]
pub(super) fn split_sixty(n: u32) -> (u32, u32) {
    // The same: 65535 / 60 for each 65536, then a quarter times 2^19 / 15.
    let most = ((n >> 16) * 8738) >> 3;
    let quotient = most + ((((n - most * 60) >> 2) * 34_953) >> 19);
    (quotient, n - quotient * 60)
}

/// `n` divided by ten `tens` times and by sixty `sixties` times, to nearest, halves up.
pub(super) fn scale_down(mut n: u32, tens: u8, sixties: u8) -> u32 {
    // Both are even, so what was left last alone tells which side of the half it was.
    let mut up = false;
    for _ in 0..tens {
        let (quotient, digit) = split_ten(n);
        (n, up) = (quotient, digit >= 5);
    }
    for _ in 0..sixties {
        let (quotient, rest) = split_sixty(n);
        (n, up) = (quotient, rest >= 30);
    }
    n + up as u32
}

stored! {
    static POWERS: [u32; 9] =
        [10, 100, 1_000, 10_000, 100_000, 1_000_000, 10_000_000, 100_000_000, 1_000_000_000];
}

/// Digits of `number`, at least one.
#[inline(always)]
pub(super) fn count(number: u32) -> usize {
    POWERS.iter().take_while(|&power| number >= power).count() + 1
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

    #[test]
    fn counts() {
        for power in 0..=9 {
            let ten = 10u32.pow(power);
            assert_eq!((count(ten - 1).max(1), count(ten)), (power.max(1) as usize, power as usize + 1));
        }
        assert_eq!(count(u32::MAX), 10);
    }

    #[test]
    #[ignore = "all 2^32 numbers; a minute in release"]
    fn splits_every_number() {
        (0..=u32::MAX).for_each(check);
    }
}
