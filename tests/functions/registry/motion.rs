use super::super::big::{Big, big, decimal, pi, radian};
use super::*;

const UAS_PER_S: Unit = UAS;
const SIGNED_UAS_PER_S: Unit = Unit { least: i32::MIN as i64, most: i32::MAX as i64, ..UAS };
const MS: Unit = unit(1000.0, 0, U32);
const US: Unit = unit(1e6, 0, U32);

const QUARTER: i64 = 1 << 30;
const fn quarter(name: &'static str, usual: (i64, i64)) -> Argument {
    ordinary(name, SIGNED_BAM, usual).within(-QUARTER, QUARTER)
}
const DECLINATION: Argument = quarter("declination_bam", (1 << 20, 700_000_000));
const LATITUDE: Argument = quarter("latitude_bam", (100_000_000, 700_000_000));
const ALTITUDE: Argument = quarter("altitude_bam", (100_000_000, 1_050_000_000));
const AZIMUTH: Argument = ordinary("azimuth_bam", BAM, (1 << 20, U32));
const TOLERANCE: Argument = positive("tolerance_q16", Q16, (1 << 15, 3 << 16));

fn day() -> Big {
    decimal("86164.0905")
}

/// The rate of the sky in arcseconds per second.
fn rate() -> Big {
    big(1_296_000.0) / day()
}

/// Of 0 to 90 degrees.
fn low_sine(x: &Big) -> Big {
    if x.is_zero() { big(0.0) } else { (x * pi() / big(180.0)).sin() }
}

/// Of -360 to 360 degrees; exact where it is 0.
pub fn sine(x: &Big) -> Big {
    if *x < big(0.0) {
        -sine(&-x.clone())
    } else if *x > big(180.0) {
        -sine(&(big(360.0) - x))
    } else if *x > big(90.0) {
        low_sine(&(big(180.0) - x))
    } else {
        low_sine(x)
    }
}

/// Of -360 to 270 degrees, likewise.
pub fn cosine(x: &Big) -> Big {
    let x = x.abs();
    let x = if x > big(180.0) { big(360.0) - x } else { x };
    sine(&(big(90.0) - x))
}

fn arcsine(x: &Big) -> Big {
    (x / (big(1.0) - x * x).sqrt()).atan()
}

/// F/4 in degrees.
fn quarter_field(field: &Big) -> Big {
    field / big(14_400.0)
}

/// 4 asin(cos d sin(w t/4)) in arcseconds.
fn field_from_drift(a: &[Big]) -> Big {
    let product = cosine(&a[1]) * sine(&(big(90.0) * &a[0] / day()));
    big(4.0) * radian() * arcsine(&product)
}

fn at_the_zenith(a: &[Big]) -> Option<Error> {
    (a[2].abs() == big(90.0)).then(|| Error::new(Cause::Undefined, 3))
}

fn steady(a: &[Big]) -> Big {
    rate() * sine(&a[0])
}

fn swing(a: &[Big]) -> Big {
    rate() * cosine(&a[0]) * cosine(&a[1]) * sine(&a[2]) / cosine(&a[2])
}

pub fn rows() -> Vec<Row> {
    vec![
        row!(motion::drift_rate [0 DECLINATION] -> UAS_PER_S, IRRATIONAL, 3.0,
            |a| rate() * cosine(&a[0]),
            drift_rate_fx fieldstop_drift_rate_fx fieldstop_drift_rate_f32 fieldstop_drift_rate_f64),
        Row {
            unanswered: |a| {
                let stays = at_least(a[0].clone(), (big(90.0) - a[1].abs()) * big(14_400.0));
                stays.then(|| Error::new(Cause::NeverLeft, 0))
            },
            ..row!(motion::drift_time [0 positive("field_mas", MAS, (300_000, 7_200_000)).under(1_296_000_000), 1 DECLINATION] -> MS, TRANSCENDENTAL, 8.0,
                |a| arcsine(&(sine(&quarter_field(&a[0])) / cosine(&a[1]))) * big(2.0) * day() / pi(),
                drift_time_fx fieldstop_drift_time_fx fieldstop_drift_time_f32 fieldstop_drift_time_f64)
        },
        Row {
            owed: Owed { lsb: 1.0, part: 1e-6 },
            // The day is no whole number of milliseconds.
            refuses: |i, a| i == 0 && a[0] >= day(),
            ..row!(motion::true_field_from_drift [0 positive("drift_ms", MS, (20_000, 600_000)).under(86_164_091), 1 DECLINATION] -> MAS, RATIONAL, 8.0,
                field_from_drift,
                true_field_from_drift_fx fieldstop_true_field_from_drift_fx fieldstop_true_field_from_drift_f32 fieldstop_true_field_from_drift_f64)
        },
        Row {
            owed: Owed { lsb: 1.0, part: 1e-6 },
            unanswered: |a| (a[3].abs() == big(90.0)).then_some(Error::OVERFLOW),
            ..row!(motion::trail_free_exposure [0 positive("pixel_nm", NM, (1_000, 15_000)), 1 TOLERANCE, 2 FOCAL_LENGTH, 3 DECLINATION] -> US, RATIONAL, 6.0,
                |a| &a[0] * &a[1] * radian() / (big(1000.0) * &a[2] * rate() * cosine(&a[3])),
                trail_free_exposure_fx fieldstop_trail_free_exposure_fx fieldstop_trail_free_exposure_f32 fieldstop_trail_free_exposure_f64)
        },
        row!(motion::rotation_free_exposure [0 TOLERANCE, 1 positive("radius_px", COUNT, (100, 5_000)), 2 positive("rate_uas_per_s", UAS_PER_S, (1_000_000, 30_000_000))] -> MS, IRRATIONAL, 2.0,
            |a| radian() * &a[0] / (&a[1] * &a[2]),
            rotation_free_exposure_fx fieldstop_rotation_free_exposure_fx fieldstop_rotation_free_exposure_f32 fieldstop_rotation_free_exposure_f64),
        Row {
            owed: Owed { lsb: 1.0, part: 2e-6 },
            unanswered: at_the_zenith,
            ..row!(motion::field_rotation_rate [0 LATITUDE, 1 AZIMUTH, 2 ALTITUDE] -> SIGNED_UAS_PER_S, RATIONAL, 6.0,
                |a| -(rate() * cosine(&a[0]) * cosine(&a[1]) / cosine(&a[2])),
                field_rotation_rate_fx fieldstop_field_rotation_rate_fx fieldstop_field_rotation_rate_f32 fieldstop_field_rotation_rate_f64)
        },
        Row {
            owed: Owed { lsb: 1.0, part: 2e-6 },
            unanswered: at_the_zenith,
            largest: Some(|a| steady(a).abs().max(swing(a).abs())),
            ..row!(motion::azimuth_rate [0 LATITUDE, 1 AZIMUTH, 2 ALTITUDE] -> SIGNED_UAS_PER_S, RATIONAL, 6.0,
                |a| steady(a) - swing(a),
                azimuth_rate_fx fieldstop_azimuth_rate_fx fieldstop_azimuth_rate_f32 fieldstop_azimuth_rate_f64)
        },
        Row {
            owed: Owed { lsb: 0.53, part: 0.0 },
            ..row!(motion::altitude_rate [0 LATITUDE, 1 AZIMUTH, 2 ALTITUDE] -> SIGNED_UAS_PER_S, RATIONAL, 6.0,
                |a| rate() * cosine(&a[0]) * sine(&a[1]),
                altitude_rate_fx fieldstop_altitude_rate_fx fieldstop_altitude_rate_f32 fieldstop_altitude_rate_f64)
        },
        Row {
            owed: Owed { lsb: 1.0, part: 2e-6 },
            refuses: |i, a| i == 1 && a[1] <= steady(a).abs(),
            ..row!(motion::zenith_blind_radius [0 LATITUDE, 1 ordinary("top_rate_mas_per_s", MAS, (500_000, 20_000_000))] -> MAS, RATIONAL, 6.0,
                |a| {
                    let left = &a[1] / rate() - sine(&a[0]).abs();
                    radian() * (cosine(&a[0]) / left).atan()
                },
                zenith_blind_radius_fx fieldstop_zenith_blind_radius_fx fieldstop_zenith_blind_radius_f32 fieldstop_zenith_blind_radius_f64)
        },
        row!(motion::misalignment_drift [0 ordinary("polar_error_mas", MAS, (10_000, 7_200_000)).within(0, 18_000_000), 1 ordinary("hour_angle_bam", BAM, (1 << 20, U32))] -> SIGNED_UAS_PER_S, IRRATIONAL, 4.0,
            |a| -(rate() / radian() * &a[0] * sine(&a[1])),
            misalignment_drift_fx fieldstop_misalignment_drift_fx fieldstop_misalignment_drift_f32 fieldstop_misalignment_drift_f64),
    ]
}
