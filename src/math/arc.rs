//! Angles from ratios and back: twice the arc tangent, and the cotangent of half an angle.

use super::divide::{by_64, divide, normalise, shift_up};
use super::multiply::{high, high_64, high_signed, wide};
use crate::stored::{Stored, stored};

/// 180 degrees.
const HALF_TURN_MAS: u32 = 648_000_000;

stored! {
    /// For each of 16 intervals of the ratio, twice the arc tangent in eighths of a milliarcsecond as a polynomial in the
    /// distance from the middle, counted in intervals: c0, 2^4 c1, -2^8 c2, and c3 / 8 (18 bits) with c4 / 8 (14 bits).
    static ARC: [[u32; 4]; 16] = [
        [103098851, 3297016963, 102931237, 3748544708],
        [308495522, 3271483454, 304029371, 3773661748],
        [511525967, 3221584792, 491376034, 3821077350],
        [710731427, 3149527024, 657496668, 3885696062],
        [904817539, 3058319050, 797100228, 3961177265],
        [1092695490, 2951478253, 907353902, 4040967364],
        [1273504225, 2832726439, 987773754, 4119250054],
        [1446614489, 2705718713, 1039827777, 4191519760],
        [1611617725, 2573832971, 1066386193, 4254794616],
        [1768304019, 2440030830, 1071147077, 12632787],
        [1916633548, 2306786826, 1058130186, 54690354],
        [2056705425, 2176073853, 1031288053, 86557086],
        [2188726989, 2049389134, 994245790, 109347101],
        [2312985578, 1927805288, 950156176, 124420274],
        [2429823935, 1812033596, 901644606, 133202013],
        [2539619686, 1702489996, 850816167, 137019419],
    ];
}

/// The value of a table's row at `u` / 2^32 from its middle.
#[inline(never)]
fn quartic(row: &Stored<[u32; 4]>, u: i32) -> u32 {
    let [c0, c1, c2, c34] = [row.at(0), row.at(1), row.at(2), row.at(3)];
    // Sixteen bits of u do for the two small terms; the half of the last one is kept by t / 2.
    let w = u >> 16;
    let (c3, c4) = ((c34 as i32) >> 14, ((c34 << 18) as i32) >> 18);
    let t = c3 + ((c4 * w) >> 16);
    let t = c2.wrapping_sub(((t * w + (t >> 1)) >> 5) as u32);
    let t = c1.wrapping_sub((high_signed(u, t) >> 4) as u32);
    c0.wrapping_add(((high_signed(u, t) + 8) >> 4) as u32)
}

/// Twice the arc tangent of `ratio` / 2^32 in milliarcseconds, at most 0.9 from the exact value.
#[inline(always)]
pub(crate) fn twice_arctangent(ratio: u32) -> u32 {
    let eighths = quartic(ARC.entry((ratio >> 28) as usize), ((ratio << 4) ^ (1 << 31)) as i32);
    (eighths + 4) >> 3
}

/// 2 atan(n / 2 d) in milliarcseconds, at most 1 from the exact value. Neither is 0.
#[inline(never)]
pub(crate) fn angle_across(n: u32, d: u32) -> u32 {
    if n >> 1 < d {
        twice_arctangent(divide((n as u64) << 31, d).0)
    } else if n as u64 == (d as u64) << 1 {
        HALF_TURN_MAS / 2
    } else {
        HALF_TURN_MAS - twice_arctangent(divide((d as u64) << 33, n).0)
    }
}

/// The upper 32 bits of `x` from its first one on, cut, and how many bits stand below them (negative: zeros added).
#[inline(always)]
pub(crate) fn leading(x: u64) -> (u32, i32) {
    if x >> 32 == 0 {
        let (x, shift) = normalise(x as u32);
        (x, -(shift as i32))
    } else {
        let (_, shift) = normalise((x >> 32) as u32);
        ((shift_up(x, shift) >> 32) as u32, 32 - shift as i32)
    }
}

/// 2 atan(a b / (c d)) in milliarcseconds, at most 1 from the exact value. None is 0.
#[inline(never)]
pub(crate) fn angle_of_products(a: u32, b: u32, c: u32, d: u32) -> u32 {
    let (above, (c1, c_shift), (d1, d_shift)) = (wide(a, b), normalise(c), normalise(d));
    let below = high(c1, d1);
    // The usual telescope: a ratio under 1, and nothing lost above when it is shifted up.
    let (upper, lower, shift) = match c_shift + d_shift {
        shift if shift < 32 => ((above >> 32) as u32, above as u32, shift),
        shift if above >> 32 == 0 => (above as u32, 0, shift - 32),
        _ => (u32::MAX, 0, 31),
    };
    if (upper >> 1) >> (31 - shift) == 0 {
        let shifted = shift_up((upper as u64) << 32 | lower as u64, shift);
        if ((shifted >> 32) as u32) < below {
            return twice_arctangent(divide(shifted, below).0);
        }
    }
    angle_of_ratio(above, wide(c, d))
}

/// 2 atan(n / d) in milliarcseconds, at most 1 from the exact value. Neither is 0.
#[inline(never)]
pub(crate) fn angle_of_ratio(n: u64, d: u64) -> u32 {
    let ((n, n_below), (d, d_below)) = (leading(n), leading(d));
    let down = d_below - n_below;
    // n / d as they stand here is from 1/2 to 2, to be shifted down by `down`.
    let (small, large, down, inverted) = if down > 0 || (down == 0 && n < d) {
        (n, d, down as u32, false)
    } else {
        (d, n, -down as u32, true)
    };
    let angle = if down == 0 && small == large {
        HALF_TURN_MAS / 2
    } else if down >= 32 {
        0 // under 2 atan(2^-31) = 0.2 mas
    } else {
        twice_arctangent(divide(((small as u64) << 32) >> down, large).0)
    };
    if inverted { HALF_TURN_MAS - angle } else { angle }
}

/// 2 atan(n / (d 2^down)) in milliarcseconds, at most 1 from the exact value, with all bits of both. Neither is 0; n is
/// at most (2^32 - 1)^2, and `down` from 1 to 31.
// Not a call on AVR, where the compiler would give it more arguments than arrive (see `divide::by_64`).
#[cfg_attr(target_arch = "avr", inline(always))]
#[cfg_attr(not(target_arch = "avr"), inline(never))]
pub(crate) fn angle_of_wide(n: u64, d: u64, down: u32) -> u32 {
    if let Ok(ratio) = by_64((n >> 32) as u32 >> down, shift_up(n, 32 - down), d) {
        return twice_arctangent(ratio);
    }
    // Not above n but in the last places, so it fits.
    let d = shift_up(d, down);
    match by_64((d >> 32) as u32, d << 32, n) {
        Ok(ratio) => HALF_TURN_MAS - twice_arctangent(ratio),
        Err(_) => HALF_TURN_MAS / 2,
    }
}

/// (1 - a cot a) / a^2 - 1/3 in steps of 2^-37 as a polynomial in a^2, which is at most (pi / 4)^2; low power first.
const COTANGENT: [u32; 5] = [3054198972, 290875593, 29094043, 2909358, 349094];

/// The same from a^2 in steps of 2^-32; within 3 steps.
#[inline(always)]
fn cotangent_tail(square: u32) -> u32 {
    let [c0, c1, c2, c3, c4] = COTANGENT;
    let mut sum = c3 + high(square, c4);
    sum = c2 + high(square, sum);
    sum = c1 + high(square, sum);
    c0 + high(square, sum)
}

/// 2^128 / (26 R)^2, R milliarcseconds to the radian.
const SQUARE: u64 = 11831572865344701501;

/// Thirteen times the angle, so that the square of 90 degrees fills 64 bits.
#[inline(always)]
fn squared(t_mas: u32) -> u64 {
    wide(13 * t_mas, 13 * t_mas)
}

stored! {
    /// For each of 8 intervals of 90 degrees - t, the side that goes with 8 t in tan(t / 2) = 8 t / adjacent, which is
    /// 16 R (a cot a) for a = t / 2; stored as `ARC` is.
    static ADJACENT: [[u32; 4]; 8] = [
        [2681091841, 2743990495, 3387379563, 545503570],
        [2839612282, 2332506141, 3202821257, 442153553],
        [2973087384, 1941793214, 3054120601, 353483540],
        [3082681997, 1567684210, 2936462453, 275970984],
        [3169317684, 1206536943, 2846212237, 206797844],
        [3233701265, 855101992, 2780688600, 143670369],
        [3276345869, 510414151, 2738003478, 84638865],
        [3297585755, 169700519, 2716953677, 27966633],
    ];
}

/// The side that goes with 8 t: from 2^31 to 2^32, at most 3 from the exact value. `t_mas` is at most 90 degrees.
#[inline(always)]
pub(crate) fn adjacent(t_mas: u32) -> u32 {
    // 2^63 / (13 times 90 degrees), cut, so that the place is below 2^31.
    let place = high(13 * (HALF_TURN_MAS / 2 - t_mas), 2189784434);
    quartic(ADJACENT.entry((place >> 28 & 7) as usize), ((place << 4) ^ (1 << 31)) as i32)
}

/// R (a cot a) for a = t / 2 in steps of 2^-32 of a milliarcsecond, so that tan(t / 2) = t / 2 adjacent; within
/// 4 parts in 10^11. `t_mas` is at most 90 degrees.
#[inline(never)]
pub(crate) fn adjacent_fine(t_mas: u32) -> u64 {
    const AT_ZERO: u64 = 885_900_597_147_055_340; // R
    const THIRD: u64 = 6_148_914_691_236_517_205; // 2^64 / 3
    let square = high_64(squared(t_mas), SQUARE);
    let upper = (square >> 32) as u32;
    let missing = high_64(square, THIRD + (wide(upper, cotangent_tail(upper)) >> 5));
    AT_ZERO - high_64(AT_ZERO, missing)
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::math::chebyshev::interpolate;
    use std::f64::consts::PI;
    use std::println;

    /// Milliarcseconds to the radian.
    const R: f64 = 648e6 / PI;

    #[test]
    fn arc_table_is_the_interpolation() {
        compare_table(&ARC, |place| 16.0 * R * place.atan());
    }

    #[test]
    fn adjacent_table_is_the_interpolation() {
        compare_table(&ADJACENT, |place| {
            let a = PI / 4.0 * (1.0 - place);
            16.0 * R * a / a.tan()
        });
    }

    fn compare_table<const N: usize>(table: &Stored<[[u32; 4]; N]>, f: impl Fn(f64) -> f64) {
        for (i, row) in table.iter().enumerate() {
            let c = interpolate(|u| f((i as f64 + 0.5 + u) / N as f64), -0.5, 0.5, 5);
            let [c0, c1, c2, c34] = row;
            let got = [
                c0 as f64,
                c1 as f64 / 16.0,
                -(c2 as f64) / 256.0,
                ((c34 as i32) >> 14) as f64 * 8.0,
                (((c34 << 18) as i32) >> 18) as f64 * 8.0,
            ];
            let half_step = [0.5, 0.5 / 16.0, 0.5 / 256.0, 4.0, 4.0];
            for k in 0..5 {
                // f64 loses a little in the interpolation itself.
                assert!(
                    (got[k] - c[k]).abs() <= half_step[k] + 1e-3,
                    "segment {i}, power {k}: {} {}",
                    got[k],
                    c[k]
                );
            }
        }
    }

    #[test]
    fn cotangent_is_the_interpolation() {
        let w_most = (PI / 4.0).powi(2);
        // The series, since 1 - a cot a cancels: Abramowitz and Stegun 4.3.70.
        let tail = |w: f64| {
            let terms = [
                1.0 / 45.0,
                2.0 / 945.0,
                1.0 / 4725.0,
                2.0 / 93555.0,
                1382.0 / 638512875.0,
                4.0 / 18243225.0,
            ];
            let more = [3617.0 / 162820783125.0, 87734.0 / 38979295480125.0, 349222.0 / 1531329465290625.0];
            terms.iter().chain(&more).rev().fold(0.0, |sum, t| sum * w + t)
        };
        let c = interpolate(|u| tail((u + 0.5) * w_most), -0.5, 0.5, 5);
        for k in 0..=4096 {
            let w = k as f64 / 4096.0 * w_most;
            let x = w / w_most - 0.5;
            let ours = cotangent_tail((w * 2f64.powi(32)) as u32) as f64 / 2f64.powi(37);
            let interpolated = c.iter().rev().fold(0.0, |sum, c| sum * x + c);
            assert!((ours - interpolated).abs() < 4.0 / 2f64.powi(37), "{w}");
            assert!((ours - tail(w)).abs() * w * w < 2f64.powi(-35), "{w}");
        }
    }

    fn worst_arctangent(ratios: impl Iterator<Item = u32>) -> f64 {
        ratios
            .map(|r| (twice_arctangent(r) as f64 - 2.0 * R * (r as f64 / 2f64.powi(32)).atan()).abs())
            .fold(0.0, f64::max)
    }

    #[test]
    fn arctangent_error() {
        let edges =
            (0..16u32).flat_map(|i| (0..4096).flat_map(move |k| [(i << 28) + k, (i << 28) + 0xfff_ffff - k]));
        let worst = worst_arctangent((0..u32::MAX).step_by(4001).chain(edges));
        println!("twice_arctangent: {worst:.3} mas");
        assert!(worst < 0.9);
    }

    #[test]
    #[ignore = "every ratio: a minute in release"]
    fn arctangent_error_everywhere() {
        let worst = worst_arctangent(0..=u32::MAX);
        println!("twice_arctangent: {worst:.4} mas");
        assert!(worst < 0.9);
    }

    #[test]
    fn adjacent_error() {
        for t in (1..=324_000_000u32).step_by(1009).chain([1, 2, 3, 323_999_999, 324_000_000]) {
            let a = t as f64 / (2.0 * R);
            let exact = t as f64 / (2.0 * a.tan());
            let fine = adjacent_fine(t) as f64 / 2f64.powi(32);
            assert!((adjacent(t) as f64 - 16.0 * exact).abs() < 3.0, "{t}");
            assert!((fine / exact - 1.0).abs() < 4e-11, "{t}: {}", fine / exact - 1.0);
        }
    }
}
