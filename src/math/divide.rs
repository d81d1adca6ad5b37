//! The one division that a readout cannot avoid: 64 by 32 bits to a 32-bit quotient with its exact remainder, and the
//! wider ones built on it.

#[cfg(not(target_arch = "avr"))]
use super::multiply::high;
use super::multiply::wide;
use crate::status::Error;
use crate::stored::stored;

stored! {
    /// 2^8 / D - 2^8 for the middle of each of 64 intervals of D = d / 2^32, from 1/2 to 1.
    pub(super) static RECIPROCAL: [u8; 64] = [
        252, 244, 237, 229, 222, 215, 209, 202, 196, 190, 184, 178, 172, 167, 161, 156, 151, 146, 141, 136, 132,
        127, 123, 118, 114, 110, 106, 102, 98, 94, 91, 87, 84, 80, 77, 73, 70, 67, 64, 61, 58, 55, 52, 49, 46,
        43, 41, 38, 35, 33, 30, 28, 25, 23, 21, 18, 16, 14, 11, 9, 7, 5, 3, 1,
    ];
}

/// Shifts `x` up until its top bit is set; gives the shift too. `x` is not 0.
#[inline(always)]
pub(crate) fn normalise(x: u32) -> (u32, u32) {
    let (x, shift) = normalise_evenly(x);
    if x < 1 << 31 { (x << 1, shift + 1) } else { (x, shift) }
}

/// Shifts `x` up by an even number of places until one of its top two bits is set; gives the shift too. `x` is not 0.
#[inline(always)]
pub(crate) fn normalise_evenly(x: u32) -> (u32, u32) {
    if cfg!(any(target_arch = "avr", all(target_arch = "arm", not(target_has_atomic = "32")))) {
        let (mut x, mut shift) = (x, 0);
        if x < 1 << 16 {
            x <<= 16;
            shift = 16;
        }
        if x < 1 << 24 {
            x <<= 8;
            shift += 8;
        }
        if x < 1 << 28 {
            x <<= 4;
            shift += 4;
        }
        if x < 1 << 30 {
            x <<= 2;
            shift += 2;
        }
        (x, shift)
    } else {
        let shift = x.leading_zeros() & 30;
        (x << shift, shift)
    }
}

#[cfg(target_arch = "avr")]
pub(crate) use super::avr::{divide, shift_up};

/// `n` shifted up by 0 to 31 places.
#[cfg(not(target_arch = "avr"))]
#[inline(always)]
pub(crate) fn shift_up(n: u64, shift: u32) -> u64 {
    let (upper, lower) = ((n >> 32) as u32, n as u32);
    let upper = upper << shift | (lower >> 1) >> (31 - shift);
    (upper as u64) << 32 | (lower << shift) as u64
}

#[cfg(not(target_arch = "avr"))]
/// 2^64 / d - 2^32, at most 11 too low and never too high: checked for every normalised `d`.
#[inline(always)]
fn reciprocal(d: u32) -> u32 {
    // Three steps from 6 to 17 to 30 bits: a table, x (1 + e + e^2), x (1 + e).
    let x = 256 + i32::from(RECIPROCAL.at((d >> 25 & 63) as usize));
    let e = (1i32 << 31).wrapping_sub(x.wrapping_mul((d >> 9) as i32)) >> 9;
    let y = e + ((e * e) >> 22);
    let x = (x << 7) + ((x * y + (1 << 14)) >> 15);
    let e = (x as u32).wrapping_mul((d >> 1) + 1).wrapping_neg() as i32;
    let correction = (x * ((e + (1 << 14)) >> 15)) >> 14;
    ((x as u32) << 17).wrapping_add(correction as u32)
}

/// Quotient and remainder by a normalised divisor. The upper half of `n` is below `d`.
#[cfg(not(target_arch = "avr"))]
#[inline(always)]
fn divide_normalised(n: u64, d: u32) -> (u32, u32) {
    let upper = (n >> 32) as u32;
    let mut quotient = upper + high(upper, reciprocal(d));
    let mut rest = n - wide(quotient, d);
    // The quotient is at most 14 too low, by the error of the reciprocal and the two parts left out.
    while rest >= d as u64 {
        rest -= d as u64;
        quotient += 1;
    }
    (quotient, rest as u32)
}

#[cfg(target_arch = "avr")]
use divide as divide_normalised;

/// Quotient and remainder. `d` is not 0 and above the upper half of `n`.
#[cfg(not(target_arch = "avr"))]
#[inline(never)]
pub(crate) fn divide(n: u64, d: u32) -> (u32, u32) {
    let (d, shift) = normalise(d);
    let (quotient, rest) = divide_normalised(shift_up(n, shift), d);
    (quotient, rest >> shift)
}

/// n / d to the nearest integer, halves up. `d` is not 0; n + d / 2 is below 2^64.
#[inline(always)]
pub(crate) fn rounded(n: u64, d: u32) -> Result<u32, Error> {
    rounded_up(n, d >> 1, d)
}

#[inline(always)]
fn rounded_up(n: u64, more: u32, d: u32) -> Result<u32, Error> {
    let n = n + more as u64;
    if (n >> 32) as u32 >= d {
        return Err(Error::OVERFLOW);
    }
    Ok(divide(n, d).0)
}

/// a b / d to the nearest integer, halves up. `d` is not 0.
#[inline(always)]
pub(crate) fn scaled(a: u32, b: u32, d: u32) -> Result<u32, Error> {
    rounded(wide(a, b), d)
}

/// (n + fraction / 2^32) / d to the nearest integer. `d` is not 0; n + d is below 2^64.
#[inline(always)]
pub(crate) fn with_fraction(n: u64, fraction: u32, d: u32) -> Result<u32, Error> {
    // Without a rest: the first bit below the point decides where `d` is odd.
    let half = (fraction & !d) >> 31;
    rounded_up(n, (d + half) >> 1, d)
}

/// A positive constant in steps of 2^-32.
pub(crate) struct Constant {
    pub whole: u32,
    pub fraction: u32,
}

/// a k / d to the nearest integer, k within 2^-33. `d` is not 0.
#[inline(always)]
pub(crate) fn constant(a: u32, k: Constant, d: u32) -> Result<u32, Error> {
    #[cfg(target_arch = "avr")]
    if a >> 16 == 0 {
        use super::multiply::of_lower_halves as by;
        let low = by(a, k.fraction & 0xffff);
        let low1 = by(a, k.fraction >> 16) + (low >> 16);
        let up = by(a, k.whole & 0xffff) + (low1 >> 16);
        let up1 = by(a, k.whole >> 16) + (up >> 16);
        let n = (up1 as u64) << 16 | (up & 0xffff) as u64;
        return with_fraction(n, low1 << 16 | low & 0xffff, d);
    }
    let low = wide(a, k.fraction);
    // Below 2^64: a (whole + 1) at most.
    with_fraction(wide(a, k.whole) + (low >> 32), low as u32, d)
}

#[inline(always)]
fn up_if(quotient: u32, up: bool) -> Result<u32, Error> {
    match quotient.checked_add(up as u32) {
        Some(rounded) => Ok(rounded),
        None => Err(Error::OVERFLOW),
    }
}

#[cfg(not(target_arch = "avr"))]
pub(crate) use by_64_of as by_64;

/// As below, from memory: arguments of more than 18 bytes arrive wrong on a part with more than 128 KB of flash, in
/// rustc 1.96; five are too many for the compiler to bring them back into registers.
#[cfg(target_arch = "avr")]
#[inline(always)]
pub(crate) fn by_64(upper: u32, n: u64, d: u64) -> Result<u32, Error> {
    #[inline(never)]
    fn of_words([upper, n1, n0, d1, d0]: &[u32; 5]) -> Result<u32, Error> {
        by_64_of(*upper, (*n1 as u64) << 32 | *n0 as u64, (*d1 as u64) << 32 | *d0 as u64)
    }
    of_words(&[upper, (n >> 32) as u32, n as u32, (d >> 32) as u32, d as u32])
}

/// (upper 2^64 + n) / d to the nearest integer, halves up. `d` is not 0. (Knuth, The Art of Computer Programming 2,
/// 4.3.1, algorithm D with one digit of quotient.)
#[cfg_attr(target_arch = "avr", inline(always))]
pub(crate) fn by_64_of(upper: u32, n: u64, d: u64) -> Result<u32, Error> {
    let top = (upper as u64) << 32 | n >> 32;
    if top >= d {
        return Err(Error::OVERFLOW);
    }
    if d >> 32 == 0 {
        return with_fraction(n, 0, d as u32); // top < d, so upper is 0
    }
    let (_, shift) = normalise((d >> 32) as u32);
    let d = shift_up(d, shift);
    let (d1, d0) = ((d >> 32) as u32, d as u32);
    let n0 = (n as u32) << shift;
    let top = shift_up(top, shift) | ((n as u32 >> 1) >> (31 - shift)) as u64;
    let (mut quotient, mut rest) = if (top >> 32) as u32 >= d1 {
        (u32::MAX, (top as u32) as u64 + d1 as u64)
    } else {
        let (quotient, rest) = divide_normalised(top, d1);
        (quotient, rest as u64)
    };
    let mut excess = wide(quotient, d0);
    // At most twice; once the rest has 33 bits the quotient is right.
    while rest >> 32 == 0 && excess > (rest << 32 | n0 as u64) {
        quotient -= 1;
        rest += d1 as u64;
        excess -= d0 as u64;
    }
    let rest = (rest << 32 | n0 as u64).wrapping_sub(excess);
    up_if(quotient, rest >= d - rest)
}

/// n / d to the nearest integer, halves up: `n` of 128 bits in its two upper words and the rest, `d` of 96 in its upper
/// one and the rest. `d` is not 0.
#[inline(always)]
pub(crate) fn by_wide(n: (u32, u32, u64), d: (u32, u64)) -> Result<u32, Error> {
    let ((n3, n2, n_lower), (d2, d_lower)) = (n, d);
    if n3 == 0 && d2 == 0 {
        return by_64(n2, n_lower, d_lower);
    }
    let words = |x: u64| (x as u32, (x >> 32) as u32);
    let ((n0, n1), (d0, d1)) = (words(n_lower), words(d_lower));
    by_96(&[n0, n1, n2, n3], &[d0, d1, d2])
}

/// n / d to the nearest integer, halves up, for words from the lowest on: from memory, as above. `d` is not 0.
#[inline(never)]
fn by_96(n: &[u32; 4], d: &[u32; 3]) -> Result<u32, Error> {
    let pair = |upper: u32, lower: u32| (upper as u64) << 32 | lower as u64;
    let ([n0, n1, n2, n3], [d0, d1, d2]) = (*n, *d);
    if d2 == 0 {
        return if n3 == 0 { by_64(n2, pair(n1, n0), pair(d1, d0)) } else { Err(Error::OVERFLOW) };
    }
    if pair(n3, n2) > pair(d2, d1) || (pair(n3, n2) == pair(d2, d1) && n1 >= d0) {
        return Err(Error::OVERFLOW);
    }
    let (_, shift) = normalise(d2);
    let up = |upper: u32, lower: u32| upper << shift | (lower >> 1) >> (31 - shift);
    let (d2, d1, d0) = (up(d2, d1), up(d1, d0), d0 << shift);
    let (n3, n2, n1, n0) = (up(n3, n2), up(n2, n1), up(n1, n0), n0 << shift);
    let (mut quotient, mut rest) = if n3 >= d2 {
        (u32::MAX, n2 as u64 + d2 as u64)
    } else {
        let (quotient, rest) = divide_normalised(pair(n3, n2), d2);
        (quotient, rest as u64)
    };
    let mut excess = wide(quotient, d1);
    // As in `by_64`: then the quotient is right or one too high.
    while rest >> 32 == 0 && excess > (rest << 32 | n1 as u64) {
        quotient -= 1;
        rest += d2 as u64;
        excess -= d1 as u64;
    }
    let mut upper = (rest << 32 | n1 as u64).wrapping_sub(excess);
    let taken = wide(quotient, d0);
    let (mut lower, borrow) = n0.overflowing_sub(taken as u32);
    let taken = (taken >> 32) + borrow as u64;
    let negative = upper < taken;
    upper = upper.wrapping_sub(taken);
    let d_upper = pair(d2, d1);
    if negative {
        quotient -= 1;
        let (sum, carry) = lower.overflowing_add(d0);
        lower = sum;
        upper = upper.wrapping_add(d_upper).wrapping_add(carry as u64);
    }
    // The rest against what it lacks to d.
    let (lacking, borrow) = d0.overflowing_sub(lower);
    let lacking_upper = d_upper - upper - borrow as u64;
    up_if(quotient, upper > lacking_upper || (upper == lacking_upper && lower >= lacking))
}

#[cfg(test)]
mod tests {
    use super::*;

    fn random(state: &mut u64) -> u64 {
        *state ^= *state << 13;
        *state ^= *state >> 7;
        *state ^= *state << 17;
        // Log-uniform, with runs of ones and zeros.
        let x = state.wrapping_mul(0x2545f4914f6cdd1d);
        let shifted = x >> (*state & 63);
        if x & 7 == 0 { !shifted } else { shifted }
    }

    fn rounded_128(n: u128, d: u128) -> Option<u32> {
        ((n + d / 2) / d).try_into().ok()
    }

    /// All 2^31 divisors with `--ignored`; here each 997th and both ends.
    fn check_reciprocals(divisors: impl Iterator<Item = u32>) {
        for d in divisors {
            let exact = u64::MAX / d as u64 - (1 << 32);
            let low_by = exact.wrapping_sub(reciprocal(d) as u64);
            assert!(low_by <= 11, "{d}: {low_by} too low");
        }
    }

    #[test]
    fn reciprocal_is_at_most_11_too_low() {
        let half = 1u32 << 31;
        check_reciprocals(
            (half..=u32::MAX).step_by(997).chain(half..half + 10_000).chain(u32::MAX - 10_000..=u32::MAX),
        );
    }

    #[test]
    #[ignore = "every divisor: 10 seconds in release"]
    fn reciprocal_of_every_divisor() {
        check_reciprocals(1 << 31..=u32::MAX);
    }

    #[test]
    fn quotients_are_exact() {
        let mut s = 1;
        for _ in 0..200_000 {
            let (n, d) = (random(&mut s), random(&mut s) as u32);
            let (upper, fraction) = (random(&mut s) as u32, random(&mut s) as u32);
            let wide_d = random(&mut s);
            if d != 0 {
                if ((n >> 32) as u32) < d {
                    assert_eq!(divide(n, d), ((n / d as u64) as u32, (n % d as u64) as u32));
                }
                if n < u64::MAX - d as u64 {
                    assert_eq!(rounded(n, d).ok(), rounded_128(n as u128, d as u128), "{n} / {d}");
                    let exact = rounded_128((n as u128) << 32 | fraction as u128, (d as u128) << 32);
                    let got = with_fraction(n, fraction, d).ok();
                    assert!(
                        got == exact || got.map(|q| q + 1) == exact && fraction != 0,
                        "{n}.{fraction} / {d}"
                    );
                }
            }
            // As drawn, beside a multiple of d and of d without its lowest word, and half way to the next.
            let words = |n: u128| [0, 32, 64, 96].map(|shift| (n >> shift) as u32);
            let d128 = ((wide_d as u128) << 32 | d as u128) >> (n & 31);
            if d128 != 0 {
                let drawn = (fraction as u128) << 96 >> (n & 63) | (n as u128) << 32 | upper as u128;
                let multiple = upper as u128 * d128;
                let less = upper as u128 * (d128 >> 32 << 32) + fraction as u128;
                let near = (n >> (n & 63)) as u128;
                for n in [drawn, multiple + near, multiple.saturating_sub(near), less, multiple + d128 / 2] {
                    let [d0, d1, d2, _] = words(d128);
                    let exact = u32::try_from(n / d128 + (n % d128 >= d128 - n % d128) as u128).ok();
                    assert_eq!(by_96(&words(n), &[d0, d1, d2]).ok(), exact, "{n} / {d128}");
                }
            }
            if wide_d != 0 {
                let n128 = (upper as u128) << 64 | n as u128;
                assert_eq!(
                    by_64(upper, n, wide_d).ok(),
                    rounded_128(n128, wide_d as u128),
                    "{n128} / {wide_d}"
                );
            }
        }
    }
}
