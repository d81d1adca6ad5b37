//! What the float forms need of f32 and f64, over libm, and the checks of their arguments.

use super::double::Double;
use crate::status::{Cause, Error};
use core::ops::{Add, Div, Mul, Neg, Sub};

mod sealed {
    pub trait Sealed {}
    impl Sealed for f32 {}
    impl Sealed for f64 {}
}

/// `f32` or `f64`. An f32 is computed in f32 throughout.
///
/// A float argument is finite and at most 2^32 (4.29e9) in magnitude; one that must not be zero is at least 2^-32
/// (2.3e-10). So no product on the way to a result can overflow, or lose bits at the bottom, in either type.
pub trait Real:
    Copy
    + PartialOrd
    + Add<Output = Self>
    + Sub<Output = Self>
    + Mul<Output = Self>
    + Div<Output = Self>
    + Neg<Output = Self>
    + sealed::Sealed
{
    /// 2^s + 1 where s is half of the digits, rounded up: it cuts a number in two for an exact product.
    #[doc(hidden)]
    const SPLIT: Self;
    /// The nearest value of this type.
    fn of(value: f64) -> Self;
    /// The product with a constant given as its nearest f64 and the rest: in f64 correctly rounded, in f32 the plain
    /// product, whose constants here happen to round well.
    #[doc(hidden)]
    fn times(self, constant: (f64, f64)) -> Self;
    #[doc(hidden)]
    fn of_count(count: u32) -> Self;
    /// What `of` lost of a constant: nothing that an f64 can tell for f64.
    #[doc(hidden)]
    fn of_difference(value: f64, rounded: Self) -> Self;
    #[doc(hidden)]
    fn is_finite(self) -> bool;
    #[doc(hidden)]
    fn to_i64(self) -> i64;
    #[doc(hidden)]
    fn floor(self) -> Self;
    #[doc(hidden)]
    fn sqrt(self) -> Self;
    #[doc(hidden)]
    fn atan(self) -> Self;
    #[doc(hidden)]
    fn atan2(self, x: Self) -> Self;
    /// The tangent of at most pi / 4, as a sum of two.
    #[doc(hidden)]
    fn tangent(self) -> (Self, Self);
    #[doc(hidden)]
    fn asin(self) -> Self;
    #[doc(hidden)]
    fn sin(self) -> Self;
    #[doc(hidden)]
    fn cos(self) -> Self;
    #[doc(hidden)]
    fn ln_1p(self) -> Self;
    #[doc(hidden)]
    fn log2(self) -> Self;
    #[doc(hidden)]
    fn log10(self) -> Self;
    #[doc(hidden)]
    fn exp(self) -> Self;
    #[doc(hidden)]
    fn powf(self, exponent: Self) -> Self;
    #[doc(hidden)]
    fn hypot(self, other: Self) -> Self;
}

macro_rules! real {
    ($t:ty, $split:literal, $times:expr, $floor:ident $sqrt:ident $atan:ident $atan2:ident $tangent:expr, $asin:ident $sin:ident $cos:ident $ln_1p:ident
     $log2:ident $log10:ident $exp:ident $pow:ident $hypot:ident) => {
        impl Real for $t {
            const SPLIT: Self = $split;
            #[inline(always)]
            fn of(value: f64) -> Self {
                value as $t
            }
            #[inline(always)]
            fn times(self, constant: (f64, f64)) -> Self {
                let times: fn($t, (f64, f64)) -> $t = $times;
                times(self, constant)
            }
            #[inline(always)]
            fn of_count(count: u32) -> Self {
                count as $t
            }
            #[inline(always)]
            fn of_difference(value: f64, rounded: Self) -> Self {
                (value - rounded as f64) as $t
            }
            #[inline(always)]
            fn is_finite(self) -> bool {
                <$t>::is_finite(self)
            }
            fn to_i64(self) -> i64 {
                self as i64
            }
            fn floor(self) -> Self {
                libm::$floor(self)
            }
            fn sqrt(self) -> Self {
                libm::$sqrt(self)
            }
            fn atan(self) -> Self {
                libm::$atan(self)
            }
            fn atan2(self, x: Self) -> Self {
                libm::$atan2(self, x)
            }
            fn tangent(self) -> ($t, $t) {
                let tangent: fn($t) -> ($t, $t) = $tangent;
                tangent(self)
            }
            fn asin(self) -> Self {
                libm::$asin(self)
            }
            fn sin(self) -> Self {
                libm::$sin(self)
            }
            fn cos(self) -> Self {
                libm::$cos(self)
            }
            fn ln_1p(self) -> Self {
                libm::$ln_1p(self)
            }
            fn log2(self) -> Self {
                libm::$log2(self)
            }
            fn log10(self) -> Self {
                libm::$log10(self)
            }
            fn exp(self) -> Self {
                libm::$exp(self)
            }
            fn powf(self, exponent: Self) -> Self {
                libm::$pow(self, exponent)
            }
            fn hypot(self, other: Self) -> Self {
                libm::$hypot(self, other)
            }
        }
    };
}

real!(f32, 4097.0, |x, (upper, _)| x * upper as f32, floorf sqrtf atanf atan2f tangent_in_f32, asinf sinf cosf log1pf log2f log10f expf powf hypotf);
real!(f64, 134217729.0, |x, (upper, lower)| (Double { upper, lower } * x).upper, floor sqrt atan atan2 |x| (libm::tan(x), 0.0), asin sin cos log1p log2 log10 exp pow hypot);

/// (tan x / x - 1) / x^2 as a polynomial in x^2 up to (pi / 4)^2, low power first.
const TANGENT: [f32; 7] =
    [0.33333334, 0.13333231, 0.053994465, 0.021621127, 0.009962147, 0.0011853216, 0.0038431398];

/// libm's works in f64, which a part with an FPU for f32 only has no instructions for.
fn tangent_in_f32(x: f32) -> (f32, f32) {
    let square = x * x;
    let [c0, c1, c2, c3, c4, c5, c6] = TANGENT;
    let tail = c3 + square * (c4 + square * (c5 + square * c6));
    let tail = c0 + square * (c1 + square * (c2 + square * tail));
    let Double { upper, lower } = Double::sum(x, x * square * tail);
    (upper, lower)
}

const LEAST: f64 = 1.0 / (1u64 << 32) as f64;
const MOST: f64 = (1u64 << 32) as f64;

/// Refuses what is not in 2^-32 to 2^32.
pub(crate) fn positive<F: Real>(x: F, argument: u8) -> Result<(), Error> {
    let cause = if !x.is_finite() {
        Cause::NotFinite
    } else if x == F::of(0.0) {
        Cause::Zero
    } else if x < F::of(LEAST) || x > F::of(MOST) {
        Cause::OutOfRange
    } else {
        return Ok(());
    };
    Err(Error::new(cause, argument))
}

/// Refuses what is not in 0 to `most`, which is at most 2^32.
pub(crate) fn from_zero_to<F: Real>(most: f64, x: F, argument: u8) -> Result<(), Error> {
    let cause = if !x.is_finite() {
        Cause::NotFinite
    } else if x < F::of(0.0) || x > F::of(most) {
        Cause::OutOfRange
    } else {
        return Ok(());
    };
    Err(Error::new(cause, argument))
}

/// Refuses what is not in 0 to 2^32.
pub(crate) fn not_negative<F: Real>(x: F, argument: u8) -> Result<(), Error> {
    from_zero_to(MOST, x, argument)
}

/// Refuses what is not in -2^32 to 2^32.
pub(crate) fn either_sign<F: Real>(x: F, argument: u8) -> Result<(), Error> {
    not_negative(if x < F::of(0.0) { -x } else { x }, argument)
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::math::chebyshev::interpolate;
    use std::f64::consts::FRAC_PI_4;

    #[test]
    fn tangent_is_interpolated() {
        let tail = |square: f64| {
            let x = square.sqrt();
            if x < 0.02 {
                1.0 / 3.0 + 2.0 / 15.0 * square + 17.0 / 315.0 * square * square
            } else {
                (x.tan() / x - 1.0) / square
            }
        };
        let terms = interpolate(tail, 0.0, FRAC_PI_4 * FRAC_PI_4, TANGENT.len());
        for (term, stored) in terms.iter().zip(TANGENT) {
            assert_eq!(*term as f32, stored);
        }
    }

    #[test]
    fn tangent_is_near() {
        let mut worst: f64 = 0.0;
        let top = (FRAC_PI_4 as f32).to_bits();
        for bits in (0x3000_0000..=top).step_by(101) {
            let x = f32::from_bits(bits);
            let (exact, (upper, lower)) = (f64::from(x).tan(), tangent_in_f32(x));
            let error = (f64::from(upper) + f64::from(lower) - exact).abs();
            worst = worst.max(error / (exact * f64::from(f32::EPSILON)));
        }
        assert!(worst < 0.35, "{worst}");
    }
}
