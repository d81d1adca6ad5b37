//! The digit engine: a quotient and a remainder by ten or by six, in three small products.
//!
//! A Cortex-M0 has no division, and neither rustc nor gcc uses a reciprocal there.

/// Sexagesimal numbers are digits that count to ten and to six in turn.
#[derive(Clone, Copy, PartialEq, Eq)]
pub(super) enum Radix {
    Ten,
    /// For numbers under 3 * 2^30.
    Six,
}

/// `n` divided by the radix, and the digit that is left.
#[inline]
pub(super) fn split(n: u32, radix: Radix) -> (u32, u8) {
    // reciprocal = 2^19 / radix, rounded down
    let (size, reciprocal) = match radix {
        Radix::Ten => (10, 52_428),
        Radix::Six => (6, 87_381),
    };
    // The high half gives most of the quotient, never too much; what is left is under 2^17 + 6.
    let most = ((n >> 16) * reciprocal) >> 3;
    let rest = n - most * size;
    // Here the reciprocal, rounded up, is exact, with the factor two of the radix shifted out first.
    let quotient = most + (((rest >> 1) * (reciprocal + 1)) >> 18);
    (quotient, (n - quotient * size) as u8)
}

/// `n` divided by ten `tens` times and by six `sixes` times, to nearest, halves up.
pub(super) fn scale_down(mut n: u32, tens: u8, sixes: u8) -> u32 {
    let mut half = false;
    let mut left = tens.saturating_add(sixes);
    while left > 0 {
        let radix = if left > sixes { Radix::Ten } else { Radix::Six };
        let (quotient, digit) = split(n, radix);
        // Both radices are even, so the last digit alone tells which side of the half this is.
        half = digit >= if left > sixes { 5 } else { 3 };
        n = quotient;
        left -= 1;
    }
    n + half as u32
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn splits_exactly() {
        let edges = [u32::MAX, (1 << 31) - 1, 1 << 31, 429_496_731, 4_294_967_290, 0xffff_0000, 0xfffe_ffff];
        let sweep = (0..=70_000).chain((0..1 << 16).flat_map(|h| {
            // Each value of the high half with the low halves where a quotient could go wrong.
            [0, 1, 5, 0x7fff, 0xfff0, 0xfffa, 0xffff].map(|l| (h << 16) | l)
        }));
        for n in sweep.chain(edges) {
            assert_eq!(split(n, Radix::Ten), (n / 10, (n % 10) as u8), "{n}");
            if n < 3 << 30 {
                assert_eq!(split(n, Radix::Six), (n / 6, (n % 6) as u8), "{n}");
            }
        }
    }

    #[test]
    #[ignore = "all 2^32 numbers; a minute in release"]
    fn splits_every_number() {
        for n in 0..=u32::MAX {
            assert_eq!(split(n, Radix::Ten), (n / 10, (n % 10) as u8), "{n}");
            if n < 3 << 30 {
                assert_eq!(split(n, Radix::Six), (n / 6, (n % 6) as u8), "{n}");
            }
        }
    }
}
