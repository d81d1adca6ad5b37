//! Formulas where they nearly break down: systems hardly longer than their primary, cones as steep as a plane, discs that
//! just touch, objects at the focal length, half the sky, glasses hardly apart. In all three forms.

use super::cases::{self, Random};
use super::oracle::{fixed_error, float_error};
use super::registry::{Row, all_rows};

pub fn row(stem: &str) -> Row {
    all_rows().into_iter().find(|row| row.stem == stem).unwrap()
}

/// `make` draws a case near the border; an argument out of its type is put at its end.
pub fn check(stem: &str, make: impl Fn(&mut Random) -> Vec<i64>) {
    let (row, worst) = (row(stem), check_fixed(stem, &make));
    let mut float_worst = [0.0f64; 2];
    let mut r = Random::new(stem);
    for _ in 0..cases::count() {
        let case = drawn(&row, make(&mut r));
        let forms = [true, false].into_iter().enumerate();
        for (k, single) in forms.filter(|(_, single)| row.float_form(*single).is_some()) {
            // The same border in float units, where the arguments' last digits are others.
            let cut = |x: f64| if single { x as f32 as f64 } else { x };
            let case: Vec<f64> =
                row.arguments.iter().zip(&case).map(|(a, &x)| cut(a.unit.value(x as f64))).collect();
            float_worst[k] = float_worst[k].max(float_error(&row, &case, single));
        }
    }
    let [single, double] = float_worst;
    println!("{stem:26} at its borders: fx {worst:.4}, f32 {single:.3}, f64 {double:.3}");
}

fn drawn(row: &Row, case: Vec<i64>) -> Vec<i64> {
    row.arguments.iter().zip(case).map(|(a, x)| x.clamp(a.unit.least, a.unit.most)).collect()
}

/// The fixed form only; gives its worst error.
pub fn check_fixed(stem: &str, make: impl Fn(&mut Random) -> Vec<i64>) -> f64 {
    let (row, mut r) = (row(stem), Random::new(stem));
    (0..cases::count()).map(|_| fixed_error(&row, &drawn(&row, make(&mut r)))).fold(0.0, f64::max)
}

/// Float cases at a border that only a float tells.
pub fn check_floats(stem: &str, make: impl Fn(&mut Random, &dyn Fn(f64) -> f64) -> Vec<f64>) {
    let row = row(stem);
    for single in [true, false] {
        let cut = move |x: f64| if single { x as f32 as f64 } else { x };
        let mut r = Random::new(stem);
        for _ in 0..cases::count() {
            let case = make(&mut r, &cut);
            float_error(&row, &case, single);
        }
    }
}

/// Log-uniform from 1 to below 2^bits.
pub fn length(r: &mut Random, bits: u32) -> i64 {
    let bits = r.below(bits as u64) as u32;
    (1 << bits) + r.below(1 << bits) as i64
}

/// 0 or a few, or more by any power of two; either sign.
pub fn aside(r: &mut Random) -> i64 {
    let more = if r.below(2) == 0 { r.below(4) as i64 } else { length(r, 31) };
    if r.below(2) == 0 { more } else { -more }
}

#[test]
fn systems_hardly_longer_than_the_primary() {
    let mirrors = |r: &mut Random| {
        let primary = length(r, 32);
        let system = primary + 1 + r.below(4) as i64 * aside(r).abs();
        let back = [0, 1, system, system - 1, system / 2, system + 1][r.below(6) as usize];
        vec![primary, system, back]
    };
    check("secondary_magnification", |r| mirrors(r)[..2].to_vec());
    check("secondary_separation", mirrors);
    check("secondary_radius", mirrors);
    check("secondary_diameter", |r| [vec![length(r, 32)], mirrors(r)].concat());
    check("secondary_field_margin", |r| [mirrors(r), vec![length(r, 32)]].concat());
    // The same in the last digits of a float.
    let beside = |r: &mut Random, cut: &dyn Fn(f64) -> f64| {
        let primary = cut(length(r, 32) as f64 * (1.0 + r.unit()));
        let system = cut(primary * (1.0 + 2f64.powf(-54.0 * r.unit())));
        vec![primary.min(4e9), system.min(4e9), cut(system.min(4e9) * r.unit())]
    };
    check_floats("secondary_radius", beside);
    check_floats("secondary_separation", beside);
}

#[test]
fn cones_as_steep_as_a_plane() {
    let cone = |r: &mut Random| {
        let focal_length = length(r, 32);
        let distance =
            [0, 1, focal_length, focal_length - 1, focal_length / 2, focal_length + 1][r.below(6) as usize];
        let field = length(r, 32) - 1;
        let aperture = match r.below(3) {
            0 => field + 1 + r.below(3) as i64,       // g just over 0
            1 => field + 2 * focal_length - aside(r), // g just under 1
            _ => field + length(r, 32),
        };
        vec![aperture, focal_length, distance, field]
    };
    check("diagonal_minor_axis", cone);
    check("diagonal_offset", cone);
    check("beam_width", |r| cone(r)[..3].to_vec());
    check("beam_shift", |r| [vec![length(r, 32)], cone(r)[1..3].to_vec()].concat());
    // The same in the last digits of a float.
    let beside = |r: &mut Random, cut: &dyn Fn(f64) -> f64| {
        let focal_length = cut(length(r, 30) as f64 * (1.0 + r.unit()));
        let field = cut(focal_length * 2f64.powf(-30.0 * r.unit()));
        let close = 2f64.powf(-54.0 * r.unit());
        let aperture = cut((field + 2.0 * focal_length) * (1.0 - close));
        vec![aperture, focal_length, cut(focal_length * r.unit()), field]
    };
    check_floats("diagonal_minor_axis", beside);
    check_floats("diagonal_offset", beside);
}

#[test]
fn discs_just_touching_and_just_inside() {
    check("illumination", |r| {
        let beam = length(r, 32);
        let stop = match r.below(4) {
            0 => 0,
            1 => beam + aside(r),
            _ => length(r, 32),
        };
        // The offset is a radius, the others diameters.
        let offset = match r.below(3) {
            0 => (beam + stop) / 2 + aside(r),
            1 => (beam - stop).abs() / 2 + aside(r),
            _ => r.below((beam + stop) as u64 / 2 + 1) as i64,
        };
        vec![beam, stop, offset]
    });
    check_floats("illumination", |r, cut| {
        let beam = cut(2f64.powf(60.0 * r.unit() - 30.0));
        let stop = if r.below(2) == 0 {
            cut(beam * (1.0 + 2f64.powf(-60.0 * r.unit())))
        } else {
            cut(2f64.powf(60.0 * r.unit() - 30.0))
        };
        let close = 1.0 + 2f64.powf(-60.0 * r.unit()) * (r.below(3) as f64 - 1.0);
        let border = if r.below(2) == 0 { beam + stop } else { (beam - stop).abs() };
        vec![beam, stop, cut((border / 2.0 * close).min(4e9))]
    });
}

#[test]
fn objects_at_the_focal_length() {
    check("near_focus_travel", |r| {
        let distance = length(r, 23);
        vec![1000 * distance - aside(r), distance]
    });
    check_floats("near_focus_travel", |r, cut| {
        let distance = cut(length(r, 22) as f64 * (1.0 + r.unit()));
        vec![cut(distance * 1000.0 * (1.0 - 2f64.powf(-54.0 * r.unit()))), distance]
    });
}

#[test]
fn fields_up_to_half_the_sky() {
    const HALF_TURN: i64 = 648_000_000;
    check("image_size", |r| {
        let field = match r.below(5) {
            0 => HALF_TURN - length(r, 30),
            1 => HALF_TURN / 2 + aside(r), // the two ways meet
            2 => length(r, 30),
            _ => HALF_TURN - r.below(4) as i64,
        };
        let size = |f: i64| 2000.0 * f as f64 * (field as f64 / 412_529_612.494).tan();
        let focal_length = match r.below(4) {
            // At the end of the type, and where the short way ends.
            0 => (u32::MAX as f64 / size(1)) as i64 + aside(r) % 3,
            1 => ((1i64 << 28) as f64 / size(1)) as i64 + aside(r) % 3,
            _ => length(r, 32),
        };
        vec![field, focal_length]
    });
    check_floats("image_size", |r, cut| {
        let field = cut(648_000.0 * (1.0 - 2f64.powf(-54.0 * r.unit())));
        vec![field, cut(2f64.powf(60.0 * r.unit() - 30.0))]
    });
    check_floats("image_size", |r, cut| {
        // Where the two ways meet.
        let aside = 2f64.powf(-54.0 * r.unit()) * (r.below(3) as f64 - 1.0);
        vec![cut(324_000.0 * (1.0 + aside)), cut(2f64.powf(60.0 * r.unit() - 30.0))]
    });
}

#[test]
fn sensors_from_one_pixel_to_the_largest() {
    let side = |r: &mut Random| match r.below(4) {
        0 => 1 + r.below(3) as i64,
        1 => 65_535 - r.below(3) as i64,
        2 => 46_341 - r.below(3) as i64, // whose squares make 2^32
        _ => length(r, 16),
    };
    let sensor = |r: &mut Random| {
        let (columns, rows) = (side(r), side(r));
        let pixel = length(r, 32);
        let diagonal = ((columns * columns + rows * rows) as f64).sqrt();
        let focal_length = match r.below(3) {
            0 => (pixel as f64 * diagonal / 2000.0) as i64 + aside(r), // a right angle
            1 => (pixel as f64 * diagonal / 2000.0 * (1.0 + r.unit())) as i64,
            _ => length(r, 32),
        };
        vec![pixel, columns, rows, focal_length.max(1)]
    };
    check("diagonal_field", sensor);
    check_floats("diagonal_field", |r, cut| {
        let sensor = sensor(r);
        let pixel = cut(sensor[0] as f64 * (1.0 + r.unit()) / 1000.0);
        vec![pixel, sensor[1] as f64, sensor[2] as f64, cut(sensor[3] as f64 / 1000.0)]
    });
}

#[test]
fn focal_ratios_hardly_apart() {
    let ratio =
        |r: &mut Random| if r.below(2) == 0 { u32::MAX as i64 - length(r, 30) } else { length(r, 32) };
    check("exposure_stops", |r| {
        let from = ratio(r);
        vec![from, [from + aside(r), 2 * from + aside(r) % 3, ratio(r), 1][r.below(4) as usize]]
    });
    check_floats("exposure_stops", |r, cut| {
        let from = cut(2f64.powf(60.0 * r.unit() - 30.0));
        let close = 1.0 + 2f64.powf(-54.0 * r.unit()) * (r.below(3) as f64 - 1.0) / 2.0;
        vec![from, cut(from * close * [0.5, 1.0, 1.0, 2.0][r.below(4) as usize])]
    });
}

#[test]
fn glasses_hardly_apart() {
    check("abbe_number", |r| {
        let index_f = length(r, 32);
        let index_d = [10_000_001 + r.below(4) as i64, length(r, 32), u32::MAX as i64][r.below(3) as usize];
        vec![index_d, index_f, index_f - 1 - r.below(4) as i64 * aside(r).abs()]
    });
    check_floats("abbe_number", |r, cut| {
        let index_d = cut(1.0 + 2f64.powf(86.0 * r.unit() - 54.0)).min(4e9);
        let index_f = cut(2f64.powf(60.0 * r.unit() - 30.0));
        vec![index_d, index_f, cut(index_f * (1.0 - 2f64.powf(-54.0 * r.unit())))]
    });
    for stem in ["achromat_crown", "achromat_flint"] {
        check(stem, |r| {
            let crown = length(r, 32);
            let flint = [crown - r.below(4) as i64, crown - aside(r).abs(), 1 + r.below(3) as i64];
            vec![length(r, 32), crown, flint[r.below(3) as usize]]
        });
        check_floats(stem, |r, cut| {
            let crown = cut(2f64.powf(60.0 * r.unit() - 30.0));
            let flint = cut(crown * (1.0 - 2f64.powf(-54.0 * r.unit())));
            vec![cut(2f64.powf(60.0 * r.unit() - 30.0)), crown, flint]
        });
    }
}

#[test]
fn results_at_the_ends_of_their_types() {
    let end = u32::MAX as u128;
    check("nyquist_pixel", |r| {
        let (focal_length, aperture) = (length(r, 32), length(r, 32));
        let wavelength = (2 * end * aperture as u128 / focal_length as u128).min(end) as i64;
        vec![focal_length, aperture, wavelength + aside(r) % 4]
    });
    check("singlet_colour_blur", |r| {
        let ratio = length(r, 32);
        vec![ratio, ((1u128 << 67) * 3 / (ratio as u128 * end)).min(end) as i64 + aside(r) % 1000]
    });
    check("secondary_spectrum", |r| {
        let (focal_length, spread) = (length(r, 32), length(r, 32));
        let product = focal_length as u128 * spread as u128 * 1024 / 15_625;
        vec![focal_length, spread, (product / end).min(end) as i64 + aside(r) % 3]
    });
    check("focal_length_for_pixel_scale", |r| {
        let pixel = length(r, 32);
        vec![pixel, (206_264_806.247 * pixel as f64 / end as f64) as i64 + aside(r) % 3]
    });
    // Both ends of the signed result, with its sign from either argument.
    check("thermal_shift", |r| {
        let product = (1i64 << 31) * 1_000_000_000;
        let (length, expansion) = (length(r, 32), length(r, 31));
        let change = (product / length / expansion).clamp(0, i32::MAX as i64) + aside(r) % 3;
        let sign = |r: &mut Random| if r.below(2) == 0 { 1 } else { -1 };
        vec![length, sign(r) * expansion, sign(r) * change]
    });
    check("depth_of_focus", |r| {
        let ratio = length(r, 32);
        let wavelength = ((1u128 << 63) / (ratio as u128 * ratio as u128)).min(u32::MAX as u128) as i64;
        vec![ratio, wavelength + aside(r) % 3]
    });
    check("swing_radius", |r| {
        let reach = if r.below(2) == 0 { u32::MAX as i64 - length(r, 20) } else { length(r, 32) };
        vec![reach, aside(r).abs()]
    });
    // The eyepiece near the floor.
    check("eyepiece_height", |r| {
        let (reach, altitude) = (-length(r, 31), r.below((1 << 30) + 1) as i64);
        let rise = reach as f64 * (altitude as f64 / (1u64 << 31) as f64 * std::f64::consts::PI).sin();
        vec![-rise as i64 + aside(r) % 3, reach, altitude]
    });
}

/// A lit field of nearly nothing under a cone of 45 degrees: beyond what the type holds.
#[test]
fn a_cone_beyond_a_float() {
    use fieldstop::{Error, optics::layout::*};
    let least = f32::from_bits(1);
    assert_eq!(diagonal_minor_axis(200.0, 100.0, 50.0, least), Err(Error::OVERFLOW));
    assert_eq!(diagonal_offset(200.0, 100.0, 50.0, f64::from_bits(1)), Err(Error::OVERFLOW));
}
