//! The oracle's arithmetic: 192 bits, with operators.

use astro_float::{BigFloat, Consts, RoundingMode};
use std::cell::RefCell;
use std::cmp::Ordering;
use std::ops::{Add, Div, Mul, Neg, Sub};

const P: usize = 192;
const RM: RoundingMode = RoundingMode::None;

thread_local!(static CONSTS: RefCell<Consts> = RefCell::new(Consts::new().unwrap()));

fn with<T>(f: impl FnOnce(&mut Consts) -> T) -> T {
    CONSTS.with(|c| f(&mut c.borrow_mut()))
}

#[derive(Clone, Debug)]
pub struct Big(BigFloat);

pub fn big(x: f64) -> Big {
    if x.is_subnormal() {
        // astro-float 0.9 reads these as half of what they are.
        return big(x * 2f64.powi(100)) / big(2f64.powi(100));
    }
    Big(BigFloat::from_f64(x, P))
}

/// The decimal number in the text.
pub fn decimal(text: &str) -> Big {
    Big(with(|c| BigFloat::parse(text, astro_float::Radix::Dec, P, RM, c)))
}

pub fn pi() -> Big {
    Big(with(|c| c.pi(P, RM)))
}

/// Arcseconds in a radian.
pub fn radian() -> Big {
    big(648_000.0) / pi()
}

/// The first positive zero of J1.
pub fn j11() -> Big {
    decimal("3.83170597020751231561443588630816076656454527428780")
}

impl Big {
    pub fn sqrt(&self) -> Big {
        Big(self.0.sqrt(P, RM))
    }
    pub fn atan(&self) -> Big {
        Big(with(|c| self.0.atan(P, RM, c)))
    }
    pub fn tan(&self) -> Big {
        Big(with(|c| self.0.tan(P, RM, c)))
    }
    pub fn sin(&self) -> Big {
        Big(with(|c| self.0.sin(P, RM, c)))
    }
    pub fn cos(&self) -> Big {
        Big(with(|c| self.0.cos(P, RM, c)))
    }
    pub fn acos(&self) -> Big {
        Big(with(|c| self.0.acos(P, RM, c)))
    }
    pub fn exp(&self) -> Big {
        Big(with(|c| self.0.exp(P, RM, c)))
    }
    pub fn ln(&self) -> Big {
        Big(with(|c| self.0.ln(P, RM, c)))
    }
    pub fn log10(&self) -> Big {
        self.ln() / big(10.0).ln()
    }
    pub fn pow(&self, exponent: &Big) -> Big {
        Big(with(|c| self.0.pow(&exponent.0, P, RM, c)))
    }
    pub fn powi(&self, exponent: u32) -> Big {
        Big(self.0.powi(exponent as usize, P, RM))
    }
    pub fn abs(&self) -> Big {
        Big(self.0.abs())
    }
    pub fn is_zero(&self) -> bool {
        self.0.is_zero()
    }
    pub fn max(self, other: Big) -> Big {
        if self < other { other } else { self }
    }
    pub fn min(self, other: Big) -> Big {
        if self < other { self } else { other }
    }
    pub fn floor(&self) -> Big {
        Big(self.0.floor())
    }
    pub fn ceil(&self) -> Big {
        Big(self.0.ceil())
    }

    /// Cut to 64 bits of mantissa, then to the nearest f64.
    pub fn to_f64(&self) -> f64 {
        if self.0.is_zero() {
            return 0.0;
        }
        let (words, _, sign, exponent, _) = self.0.as_raw_parts().expect("a number");
        let top = *words.last().unwrap() as f64 / 18446744073709551616.0;
        let magnitude = if exponent > -1000 {
            top * 2f64.powi(exponent)
        } else {
            top * 2f64.powi(exponent + 500) * 2f64.powi(-500)
        };
        if sign.is_negative() { -magnitude } else { magnitude }
    }
}

macro_rules! operator {
    ($trait:ident $name:ident) => {
        impl $trait<&Big> for &Big {
            type Output = Big;
            fn $name(self, other: &Big) -> Big {
                Big(self.0.$name(&other.0, P, RM))
            }
        }
        impl $trait<Big> for &Big {
            type Output = Big;
            fn $name(self, other: Big) -> Big {
                Big(self.0.$name(&other.0, P, RM))
            }
        }
        impl $trait<&Big> for Big {
            type Output = Big;
            fn $name(self, other: &Big) -> Big {
                Big(self.0.$name(&other.0, P, RM))
            }
        }
        impl $trait<Big> for Big {
            type Output = Big;
            fn $name(self, other: Big) -> Big {
                Big(self.0.$name(&other.0, P, RM))
            }
        }
    };
}
operator!(Add add);
operator!(Sub sub);
operator!(Mul mul);
operator!(Div div);

impl Neg for Big {
    type Output = Big;
    fn neg(self) -> Big {
        Big(self.0.neg())
    }
}
impl PartialEq for Big {
    fn eq(&self, other: &Big) -> bool {
        self.0 == other.0
    }
}
impl PartialOrd for Big {
    fn partial_cmp(&self, other: &Big) -> Option<Ordering> {
        self.0.partial_cmp(&other.0)
    }
}
