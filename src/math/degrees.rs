//! Sine and cosine of degrees, to the last places also beside their zeros.

use super::float::Real;

const DEGREE: f64 = core::f64::consts::PI / 180.0;

/// Of 0 to 45 degrees.
fn low_sine<F: Real>(x: F) -> F {
    (x * F::of(DEGREE)).sin()
}

fn low_cosine<F: Real>(x: F) -> F {
    (x * F::of(DEGREE)).cos()
}

/// The cosine of -360 to 360 degrees, within 2 ulp. What is taken from a right angle is exact where it is small.
pub(crate) fn cosine<F: Real>(x: F) -> F {
    let [zero, right, turn] = [0.0, 90.0, 360.0].map(F::of);
    let x = if x < zero { -x } else { x };
    let x = if x > right + right { turn - x } else { x };
    if x <= F::of(45.0) {
        low_cosine(x)
    } else if x <= F::of(135.0) {
        low_sine(right - x)
    } else {
        -low_cosine(right + right - x)
    }
}

/// The sine of -360 to 360 degrees, likewise.
pub(crate) fn sine<F: Real>(x: F) -> F {
    let [zero, right, turn] = [0.0, 90.0, 360.0].map(F::of);
    if x < zero {
        return -sine(-x);
    }
    if x > right + right {
        return -sine(turn - x);
    }
    let x = if x > right { right + right - x } else { x };
    if x <= F::of(45.0) { low_sine(x) } else { low_cosine(right - x) }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn right_angles_are_exact() {
        for k in -4i32..=4 {
            let (angle, exact) = (90.0 * k as f64, [0.0, 1.0, 0.0, -1.0]);
            assert_eq!(sine(angle), exact[k.rem_euclid(4) as usize]);
            assert_eq!(cosine(angle), exact[(k + 1).rem_euclid(4) as usize]);
            assert_eq!(sine(angle as f32) as f64, sine(angle));
            assert_eq!(cosine(angle as f32) as f64, cosine(angle));
        }
    }

    #[test]
    fn both_are_near() {
        for k in -36_000..=36_000 {
            let x = k as f64 / 100.0;
            assert!((sine(x) - x.to_radians().sin()).abs() < 2e-15, "{x}");
            assert!((cosine(x) - x.to_radians().cos()).abs() < 2e-15, "{x}");
            let single = x as f32;
            assert!((sine(single) as f64 - sine(single as f64)).abs() < 1.5e-7, "{x}");
            assert!((cosine(single) as f64 - cosine(single as f64)).abs() < 1.5e-7, "{x}");
        }
    }

    #[test]
    fn small_ones_keep_their_digits() {
        for bits in 0..45 {
            let x = 2f64.powi(-bits);
            let expected = x.to_radians().sin();
            for got in [sine(x), cosine(90.0 - x), -cosine(270.0 - x), sine(180.0 - x), -sine(360.0 - x)] {
                assert!((got / expected - 1.0).abs() < 1e-15, "{bits}: {got} {expected}");
            }
        }
    }
}
