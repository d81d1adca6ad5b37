//! Numbers of twice the digits: an unevaluated sum of two floats (Dekker, Numerische Mathematik 18, 1971).

use super::float::Real;
use core::ops::{Add, Div, Mul, Sub};

#[derive(Clone, Copy)]
pub(crate) struct Double<F> {
    pub upper: F,
    pub lower: F,
}

impl<F: Real> Double<F> {
    /// A constant.
    pub fn of(value: f64) -> Double<F> {
        let upper = F::of(value);
        Double { upper, lower: F::of_difference(value, upper) }
    }

    /// a + b, exactly.
    pub fn sum(a: F, b: F) -> Double<F> {
        let upper = a + b;
        let b_part = upper - a;
        let lower = (a - (upper - b_part)) + (b - b_part);
        Double { upper, lower }
    }

    /// a b, exactly.
    pub fn product(a: F, b: F) -> Double<F> {
        let upper = a * b;
        let ((a1, a0), (b1, b0)) = (halves(a), halves(b));
        let lower = ((a1 * b1 - upper) + a1 * b0 + a0 * b1) + a0 * b0;
        Double { upper, lower }
    }
}

/// a b / (c d) within 1.6 ulp.
pub(crate) fn product_ratio<F: Real>(a: F, b: F, c: F, d: F) -> F {
    quotient(Double::product(a, b), Double::product(c, d))
}

/// n / d within 1.6 ulp.
pub(crate) fn quotient<F: Real>(n: Double<F>, d: Double<F>) -> F {
    (n.upper + (n.lower - n.upper * (d.lower / d.upper))) / d.upper
}

fn halves<F: Real>(x: F) -> (F, F) {
    let scaled = x * F::SPLIT;
    let upper = scaled - (scaled - x);
    (upper, x - upper)
}

impl<F: Real> Mul<F> for Double<F> {
    type Output = Double<F>;
    fn mul(self, x: F) -> Double<F> {
        let Double { upper, lower } = Double::product(self.upper, x);
        Double::sum(upper, lower + self.lower * x)
    }
}

impl<F: Real> Mul for Double<F> {
    type Output = Double<F>;
    fn mul(self, other: Double<F>) -> Double<F> {
        let Double { upper, lower } = Double::product(self.upper, other.upper);
        Double::sum(upper, lower + (self.upper * other.lower + self.lower * other.upper))
    }
}

impl<F: Real> Add for Double<F> {
    type Output = Double<F>;
    fn add(self, other: Double<F>) -> Double<F> {
        let Double { upper, lower } = Double::sum(self.upper, other.upper);
        Double::sum(upper, lower + (self.lower + other.lower))
    }
}

impl<F: Real> Sub for Double<F> {
    type Output = Double<F>;
    fn sub(self, other: Double<F>) -> Double<F> {
        let Double { upper, lower } = Double::sum(self.upper, -other.upper);
        Double::sum(upper, lower + (self.lower - other.lower))
    }
}

impl<F: Real> Div for Double<F> {
    type Output = Double<F>;
    fn div(self, d: Double<F>) -> Double<F> {
        let quotient = self.upper / d.upper;
        let rest = self - d * quotient;
        Double::sum(quotient, rest.upper / d.upper)
    }
}

impl<F: Real> From<F> for Double<F> {
    fn from(x: F) -> Double<F> {
        Double { upper: x, lower: F::of(0.0) }
    }
}
