//! Motion and the Sun at their hard places: the poles, the zenith, a field that a star just leaves or never, a drift of
//! nearly a day, a mount hardly fast enough, midnights and year ends.

use super::cases::Random;
use super::degenerate::{aside, check, check_fixed, check_floats, length, row};
use super::oracle::{fixed_error, float_error};
use fieldstop::{Cause, Error};

const QUARTER: i64 = 1 << 30;
const TURN: i64 = 1 << 32;

/// At a pole or a few steps or any power of two from it, or on the equator; either sign.
fn polar(r: &mut Random) -> i64 {
    let angle = match r.below(4) {
        0 => QUARTER - r.below(4) as i64,
        1 => aside(r).abs() >> 1,
        _ => QUARTER - length(r, 30),
    };
    if r.below(2) == 0 { angle } else { -angle }
}

/// At a quarter of the turn or beside it.
fn crossing(r: &mut Random) -> i64 {
    (QUARTER * r.below(5) as i64 + aside(r)).rem_euclid(TURN)
}

/// The same in degrees, beside the last digits of a float.
fn polar_degrees(r: &mut Random) -> f64 {
    let close = 2f64.powf(-60.0 * r.unit());
    let angle = if r.below(3) == 0 { 90.0 * close } else { 90.0 * (1.0 - close) };
    if r.below(2) == 0 { angle } else { -angle }
}

fn crossing_degrees(r: &mut Random) -> f64 {
    let close = 1.0 + 2f64.powf(-60.0 * r.unit()) * (r.below(3) as f64 - 1.0);
    (90.0 * r.below(5) as f64 * close).min(360.0)
}

#[test]
fn fields_that_a_star_just_leaves_or_never() {
    check("drift_rate", |r| vec![polar(r)]);
    check_floats("drift_rate", |r, cut| vec![cut(polar_degrees(r))]);
    check("drift_time", |r| {
        let declination = polar(r);
        // F/4 = 90 degrees - d.
        let border = ((QUARTER - declination.abs()) * 1_265_625) >> 20;
        let field = match r.below(4) {
            0 => border - length(r, 31),
            1 => border / (1 + r.below(60) as i64),
            2 => 1 + r.below(3) as i64,
            _ => border + 1 - r.below(3) as i64,
        };
        vec![field.max(1), declination]
    });
    check_floats("drift_time", |r, cut| {
        let declination = cut(polar_degrees(r));
        let close = 1.0 - 2f64.powf(-56.0 * r.unit()) * (r.below(4) as f64 - 1.0);
        vec![cut((90.0 - declination.abs()) * 14_400.0 * close).max(1e-9), declination]
    });
    // Where the short way and the long one meet: at half a degree from the pole, and at 2^21 ms.
    check_fixed("drift_time", |r| {
        let declination = if r.below(2) == 0 {
            QUARTER - 5_340_354 + aside(r) % 1000
        } else {
            r.below(QUARTER as u64 * 127 / 128) as i64
        };
        let cosine = (declination as f64 / TURN as f64 * std::f64::consts::TAU).cos();
        vec![(2_097_152.0 * 15.041_068_6 * cosine) as i64 + aside(r) % 100, declination]
    });
}

#[test]
fn the_border_of_a_field_is_exact() {
    let time = row("drift_time").fixed;
    let never = Err(Error::new(Cause::NeverLeft, 0));
    // 90 - d in binary angle is a multiple of 2^20, so F has a whole number of milliarcseconds on the border itself.
    for k in 1..1024 {
        let border = k * 1_265_625;
        for sign in [1, -1] {
            let declination = sign * (QUARTER - (k << 20));
            assert_eq!(time(&[border, declination]), never);
            assert_eq!(time(&[border + 1, declination]), never);
            let just = time(&[border - 1, declination]).unwrap();
            assert!((86_000_000..86_164_091).contains(&just), "{k}: {just}");
        }
    }
    // One step of the declination decides as well.
    assert_eq!(time(&[1_265_625 * 7, QUARTER - (7 << 20) + 1]), never);
    assert!(time(&[1_265_625 * 7, QUARTER - (7 << 20) - 1]).is_ok());
    assert_eq!(time(&[1, QUARTER]), never);
    assert_eq!(time(&[1, -QUARTER]), never);
}

#[test]
fn drifts_of_nearly_a_day() {
    check("true_field_from_drift", |r| {
        let drift = match r.below(4) {
            0 => 86_164_090 - r.below(4) as i64,
            1 => 86_164_090 - length(r, 26),
            2 => 1 + r.below(3) as i64,
            _ => length(r, 26),
        };
        vec![drift, polar(r)]
    });
    check_floats("true_field_from_drift", |r, cut| {
        let close = 2f64.powf(-50.0 * r.unit());
        let drift = if r.below(3) == 0 { 86_164.090_5 * close } else { 86_164.090_5 * (1.0 - close) };
        vec![cut(drift.max(1e-9)), cut(polar_degrees(r))]
    });
    // Where the short way and the long one meet: at 1714 s, and by a sine of 1/16.
    check_fixed("true_field_from_drift", |r| {
        let drift = 1_714_000 + aside(r) % 100_000;
        let sine = (drift.max(1_714_000) as f64 / 86_164_090.5 * std::f64::consts::FRAC_PI_2).sin();
        let declination = (0.0625 / sine).min(1.0).acos() / std::f64::consts::TAU * TURN as f64;
        vec![drift, if r.below(2) == 0 { polar(r) } else { declination as i64 + aside(r) % 1000 }]
    });
    // All of the equator but the last half millisecond.
    let field = row("true_field_from_drift").fixed;
    let last = field(&[86_164_090, 0]).unwrap();
    assert!((1_295_999_980..1_296_000_000).contains(&last), "{last}");
    assert_eq!(field(&[86_164_091, 0]), Err(Error::new(Cause::OutOfRange, 1)));
    assert_eq!(field(&[86_164_090, QUARTER]), Ok(0));
}

#[test]
fn exposures_at_the_ends_of_their_types() {
    check("trail_free_exposure", |r| {
        let (pixel, length_um, declination) = (length(r, 32), length(r, 32), polar(r));
        let cosine = (declination as f64 / TURN as f64 * std::f64::consts::TAU).cos();
        let most = u32::MAX as f64 * length_um as f64 * cosine / 209.25 / pixel as f64;
        let tolerance = if r.below(2) == 0 { most as i64 + aside(r) % 4 } else { length(r, 32) };
        vec![pixel, tolerance.max(1), length_um, declination]
    });
    check_floats("trail_free_exposure", |r, cut| {
        let mut any = || cut(2f64.powf(60.0 * r.unit() - 30.0));
        vec![any(), any(), any(), cut(polar_degrees(r))]
    });
    check("rotation_free_exposure", |r| {
        let (radius, rate) = (length(r, 32), length(r, 32));
        let most = u32::MAX as f64 * radius as f64 * rate as f64 / 3_147_351_169.5;
        let tolerance = if r.below(2) == 0 { most as i64 + aside(r) % 4 } else { length(r, 32) };
        vec![tolerance.max(1), radius, rate]
    });
}

#[test]
fn mounts_near_the_zenith() {
    let horizon = |r: &mut Random| {
        let azimuth = crossing(r);
        if r.below(3) > 0 {
            return vec![polar(r), azimuth, polar(r)];
        }
        // Where the rate is the largest that fits.
        let latitude = r.below(QUARTER as u64) as i64;
        let cosine = (latitude as f64 / TURN as f64 * std::f64::consts::TAU).cos();
        let from_zenith = cosine * 15_041_068.65 / 2f64.powi(31) / std::f64::consts::TAU * TURN as f64;
        vec![latitude, [0, 2 * QUARTER][r.below(2) as usize], QUARTER - from_zenith as i64 + aside(r) % 4]
    };
    let degrees = |r: &mut Random, cut: &dyn Fn(f64) -> f64| {
        vec![cut(polar_degrees(r)), cut(crossing_degrees(r)), cut(polar_degrees(r))]
    };
    for stem in ["field_rotation_rate", "azimuth_rate", "altitude_rate"] {
        check(stem, horizon);
        check_floats(stem, degrees);
    }
    for stem in ["field_rotation_rate", "azimuth_rate"] {
        // Where the short way and the long one meet, at a cosine of 1/4.
        check_fixed(stem, |r| {
            let altitude = 900_995_968 + aside(r) % 1_000_000;
            vec![polar(r), crossing(r), if r.below(2) == 0 { altitude } else { -altitude }]
        });
        for altitude in [QUARTER, -QUARTER] {
            assert_eq!((row(stem).fixed)(&[5, 7, altitude]), Err(Error::new(Cause::Undefined, 3)));
        }
    }
}

#[test]
fn mounts_hardly_fast_enough() {
    let w = 15_041_068.645_644_208;
    let worst = check_fixed("zenith_blind_radius", |r| {
        loop {
            let rate = match r.below(3) {
                0 => 15_041 - r.below(3) as i64,
                1 => r.below(15_042) as i64,
                _ => length(r, 32),
            };
            let border = (rate as f64 * 1000.0 / w).min(1.0).asin() / std::f64::consts::TAU * TURN as f64;
            let latitude = match r.below(3) {
                0 => polar(r).abs(),
                _ => (border as i64 + aside(r) % 4).clamp(0, QUARTER),
            };
            // The sine is good to 2^-41: what is nearer than that may fall on either side.
            let steady = w * (latitude as f64 / TURN as f64 * std::f64::consts::TAU).sin();
            if (rate as f64 * 1000.0 - steady).abs() > 2e-5 {
                return vec![if r.below(2) == 0 { latitude } else { -latitude }, rate];
            }
        }
    });
    println!("zenith_blind_radius        at its borders: fx {worst:.4} of what is owed");
    check_floats("zenith_blind_radius", |r, cut| {
        let latitude = cut(polar_degrees(r));
        let close = 1.0 + 2f64.powf(-18.0 * r.unit());
        vec![latitude, cut(w / 1e6 * latitude.abs().to_radians().sin() * close + 1e-12)]
    });
    let refused = Err(Error::new(Cause::OutOfRange, 2));
    let radius = row("zenith_blind_radius").fixed;
    assert_eq!(radius(&[0, 0]), refused);
    assert_eq!(radius(&[QUARTER, 15_041]), refused);
    assert_eq!(radius(&[QUARTER, 15_042]), Ok(0));
    check("misalignment_drift", |r| vec![18_000_000 - aside(r).abs() % 18_000_001, crossing(r)]);
    check_floats("misalignment_drift", |r, cut| vec![cut(18_000.0 * r.unit()), cut(crossing_degrees(r))]);
}

#[test]
fn midnights_year_ends_and_the_last_second() {
    let mut moments = vec![0, 1, 4_102_444_799, 1 << 31, (1 << 31) - 1];
    let mut day = 0;
    for year in 1970..2100 {
        moments.extend([day * 86_400 - 1, day * 86_400, day * 86_400 + 1, day * 86_400 + 43_200]);
        day += if year % 4 == 0 { 366 } else { 365 }; // 2000 is a leap year
    }
    assert_eq!(day * 86_400, 4_102_444_800);
    for stem in ["sun_right_ascension", "sun_declination"] {
        let row = row(stem);
        for &moment in moments.iter().filter(|moment| **moment >= 0) {
            fixed_error(&row, &[moment]);
            float_error(&row, &[moment as f64], false);
        }
        assert_eq!((row.fixed)(&[4_102_444_800]), Err(Error::new(Cause::OutOfRange, 1)));
        assert_eq!((row.fixed)(&[u32::MAX as i64]), Err(Error::new(Cause::OutOfRange, 1)));
        // Through the seasons, where a coordinate crosses 0 or turns.
        check(stem, |r| {
            let quarter = r.below(4 * 130) as i64 * 7_889_231 + 6_600_000;
            vec![(quarter + aside(r) % 1_000_000).clamp(0, 4_102_444_799)]
        });
    }
    // Next to the Sun, opposite to it, and at the poles.
    let (east, north) = (row("sun_right_ascension").fixed, row("sun_declination").fixed);
    check("sun_clearance", |r| {
        let unix = r.below(4_102_444_800) as i64;
        let (east, north) = (east(&[unix]).unwrap(), north(&[unix]).unwrap());
        let beside = |r: &mut Random| aside(r) >> r.below(3);
        match r.below(4) {
            0 => {
                vec![(east + beside(r)).rem_euclid(TURN), (north + beside(r)).clamp(-QUARTER, QUARTER), unix]
            }
            1 => vec![
                (east + TURN / 2 + beside(r)).rem_euclid(TURN),
                (beside(r) - north).clamp(-QUARTER, QUARTER),
                unix,
            ],
            2 => vec![crossing(r), polar(r), unix],
            _ => vec![east, north, unix],
        }
    });
    check("collected_sunlight", |r| {
        // The largest that fits is 73.949 m of aperture.
        vec![if r.below(2) == 0 { 73_949_375 + aside(r) % 100 } else { length(r, 32) }]
    });
}
