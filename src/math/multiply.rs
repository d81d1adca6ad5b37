//! 32 by 32 to 64 bits.

#[cfg(target_arch = "avr")]
pub(crate) use super::avr::wide;

/// The whole product.
///
/// On Cortex-M0 the three-step sum below is 18 instructions; `a as u64 * b as u64` calls a routine of 50.
#[cfg(not(target_arch = "avr"))]
#[inline(always)]
pub(crate) fn wide(a: u32, b: u32) -> u64 {
    if cfg!(all(target_arch = "arm", not(target_has_atomic = "32"))) {
        let (a1, a0) = (a >> 16, a & 0xffff);
        let (b1, b0) = (b >> 16, b & 0xffff);
        let ends = ((a1 * b1) as u64) << 32 | (a0 * b0) as u64;
        ends + (((a1 * b0) as u64) << 16) + (((a0 * b1) as u64) << 16)
    } else {
        a as u64 * b as u64
    }
}

#[cfg(target_arch = "avr")]
pub(crate) use super::avr::of_lower_halves;

/// The product of two numbers below 2^16.
#[cfg(not(target_arch = "avr"))]
#[inline(always)]
pub(crate) fn of_lower_halves(a: u32, b: u32) -> u32 {
    a * b
}

/// The product of 64 and 32 bits: the upper 32 and the lower 64.
#[inline(always)]
pub(crate) fn wide_by(a: u64, b: u32) -> (u32, u64) {
    let lower = wide(a as u32, b);
    let upper = wide((a >> 32) as u32, b) + (lower >> 32);
    ((upper >> 32) as u32, upper << 32 | lower & 0xffff_ffff)
}

/// The upper 32 bits of the product.
#[inline(always)]
pub(crate) fn high(a: u32, b: u32) -> u32 {
    (wide(a, b) >> 32) as u32
}

/// The upper half of a signed by unsigned product.
#[inline(always)]
pub(crate) fn high_signed(a: i32, b: u32) -> i32 {
    high(a as u32, b).wrapping_sub((a >> 31) as u32 & b) as i32
}

/// The upper 64 bits of the product, at most 2 too low.
#[inline(never)]
pub(crate) fn high_64(a: u64, b: u64) -> u64 {
    let (a1, a0) = ((a >> 32) as u32, a as u32);
    let (b1, b0) = ((b >> 32) as u32, b as u32);
    wide(a1, b1) + (wide(a1, b0) >> 32) + (wide(a0, b1) >> 32)
}
