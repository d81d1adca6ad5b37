use super::near;
use fieldstop::sky::motion::*;
use fieldstop::units::*;

/// The fixed form within a step and the tolerance of the published value, the float form within the tolerance.
#[track_caller]
fn check(fixed: i64, steps: f64, float: f64, published: f64, tolerance: f64) {
    near(float, published, tolerance);
    near(fixed as f64 / steps, published, tolerance + 1.0 / steps);
}

fn bam(degrees: f64) -> Bam {
    Bam((degrees / 360.0 * 4294967296.0).round() as i64 as u32)
}

fn signed_bam(degrees: f64) -> SignedBam {
    SignedBam((degrees / 360.0 * 4294967296.0).round() as i32)
}

#[track_caller]
fn check_rate(declination: f64, published: f64, tolerance: f64) {
    let fixed = drift_rate_fx(signed_bam(declination)).unwrap().0;
    check(fixed as i64, 1e6, drift_rate(declination).unwrap(), published, tolerance);
}

#[test]
fn the_sky_turns() {
    // IERS Conventions (2010), table 1.1: 7.292115e-5 rad/s against the stars at rest, 15.0410672 arcsec/s. The equinox, by
    // which declinations and hour angles go, moves by 46.12 arcsec a year of 31557600 s in right ascension.
    let at_rest = 7.292115e-5 * 648_000.0 / std::f64::consts::PI;
    check_rate(0.0, at_rest + 46.12 / 31_557_600.0, 5e-7);
    // Explanatory Supplement to the Astronomical Almanac: the mean sidereal day is 23 h 56 min 4.0905 s.
    check_rate(0.0, 1_296_000.0 / (23.0 * 3600.0 + 56.0 * 60.0 + 4.0905), 1e-12);
    // By the cosine, from any table.
    check_rate(60.0, 15.0410686 / 2.0, 1e-7);
    check_rate(-45.0, 15.0410686 * std::f64::consts::FRAC_1_SQRT_2, 1e-7);
    check_rate(90.0, 0.0, 0.0);
}

#[track_caller]
fn check_drift(field_arcsec: f64, declination: f64, seconds: f64, tolerance: f64) {
    let field = Milliarcseconds((field_arcsec * 1e3).round() as u32);
    let fixed = drift_time_fx(field, signed_bam(declination)).unwrap().0;
    check(fixed as i64, 1e3, drift_time(field_arcsec, declination).unwrap(), seconds, tolerance);
    let drift = Milliseconds((seconds * 1e3).round() as u32);
    let fixed = true_field_from_drift_fx(drift, signed_bam(declination)).unwrap().0;
    let float = true_field_from_drift(seconds, declination).unwrap();
    let slope = 15.05 * declination.to_radians().cos();
    check(fixed as i64, 1e3, float, field_arcsec, tolerance * slope + 0.016);
}

#[test]
fn drift_by_the_handbooks() {
    // A star on the equator takes four minutes to the degree, less the 1 part in 366 that the sidereal clock is fast; at
    // declination d by 1 / cos d longer (common practice, "field in arcminutes = a quarter of the seconds times cos d").
    let sidereal = 1.0 / 1.002_737_91;
    for (field_arcmin, declination, seconds) in [
        (60.0, 0.0, 240.0),
        (30.0, 0.0, 120.0),
        (30.0, 60.0, 240.0),
        (15.0, -45.0, 84.853),
        (12.0, 80.0, 276.42),
    ] {
        check_drift(field_arcmin * 60.0, declination, seconds * sidereal, seconds * 1e-4);
    }
}

#[test]
fn a_wide_field_is_a_chord_of_the_parallel() {
    // Along the equator every field is an arc: half the sky takes half a sidereal day.
    check_drift(180.0 * 3600.0, 0.0, 43_082.045_25, 1e-9);
    // The star that passes the centre at declination 60 and its edges six hours before and after it moves on a circle of
    // radius cos 60: sin(F/4) = 0.5 sin 45 (geometry). A field of 120 degrees holds it all day.
    check_drift(82.819_244_8 * 3600.0, 60.0, 43_082.045_25, 0.01);
    let stays = drift_time_fx(Milliarcseconds(432_000_000), signed_bam(60.0));
    assert_eq!(stays.map_err(fieldstop::Error::cause), Err(fieldstop::Cause::NeverLeft));
}

#[test]
fn trails_by_rule_of_thumb() {
    // 600 s over the focal length in millimetres (common practice): on film that draws a star on the equator out by
    // 15.04 arcsec/s x 600 s / 206265 = 43.75 um at any focal length.
    for focal_length in [20.0f64, 50.0, 135.0] {
        let float = trail_free_exposure(43.752_7, 1.0, focal_length, 0.0).unwrap();
        let length = Micrometres((focal_length * 1e3) as u32);
        let fixed = trail_free_exposure_fx(Nanometres(43_753), Q16::ONE, length, SignedBam(0)).unwrap().0;
        check(fixed as i64, 1e6, float, 600.0 / focal_length, 600.0 / focal_length * 1e-5);
    }
    // Five micrometres on a metre are 1.03 arcsec (plate scale 206.265 arcsec/mm): a second of time draws out 14.6 pixels,
    // and twice as long does at 60 degrees.
    near(trail_free_exposure(5.0, 1.0, 1000.0, 0.0).unwrap(), 1.0 / 14.584, 1e-5);
    near(trail_free_exposure(5.0, 14.584, 1000.0, 60.0).unwrap(), 2.0, 2e-4);
}

/// Altitude, azimuth from north through east, parallactic angle, all in degrees, by vectors and atan2 (Smart, Textbook on
/// Spherical Astronomy; the signs by an hour angle that grows westward).
fn horizon(hour_angle: f64, declination: f64, latitude: f64) -> [f64; 3] {
    let [(sh, ch), (sd, cd), (sl, cl)] =
        [hour_angle, declination, latitude].map(|x: f64| x.to_radians().sin_cos());
    let altitude = (sl * sd + cl * cd * ch).asin();
    let azimuth = (-cd * sh).atan2(cl * sd - sl * cd * ch);
    let parallactic = (cl * sh).atan2(sl * cd - cl * sd * ch);
    [altitude, azimuth, parallactic].map(f64::to_degrees)
}

#[test]
fn rates_are_the_derivatives_of_the_places() {
    for latitude in [-70.0, -33.5, 0.0, 19.0, 48.0, 60.0, 85.0] {
        for declination in [-60.0, -20.0, 0.0, 10.0, 47.0, 80.0] {
            for hour_angle in [-100.0, -40.0, -3.0, 1.0, 25.0, 77.0, 120.0] {
                // Six seconds either side, over which the sky turns by 90 arcsec each.
                let step: f64 = 0.025;
                let seconds = 2.0 * step * 3600.0 / 15.041_068_645_644_21;
                let (before, after) = (
                    horizon(hour_angle - step, declination, latitude),
                    horizon(hour_angle + step, declination, latitude),
                );
                let [altitude, azimuth, _] = horizon(hour_angle, declination, latitude);
                let slope = |i: usize| {
                    let moved = (after[i] - before[i] + 540.0).rem_euclid(360.0) - 180.0;
                    moved * 3600.0 / seconds
                };
                let (lat, az, alt) =
                    (signed_bam(latitude), bam(azimuth.rem_euclid(360.0)), signed_bam(altitude));
                let azimuth = azimuth.rem_euclid(360.0);
                // The third derivative, and what the last places of the angles move.
                let tolerance = 2e-5 / altitude.to_radians().cos().powi(3) + 1e-6;
                let fixed = altitude_rate_fx(lat, az, alt).unwrap().0;
                check(
                    fixed as i64,
                    1e6,
                    altitude_rate(latitude, azimuth, altitude).unwrap(),
                    slope(0),
                    tolerance,
                );
                let fixed = azimuth_rate_fx(lat, az, alt).unwrap().0;
                check(
                    fixed as i64,
                    1e6,
                    azimuth_rate(latitude, azimuth, altitude).unwrap(),
                    slope(1),
                    tolerance,
                );
                let fixed = field_rotation_rate_fx(lat, az, alt).unwrap().0;
                let float = field_rotation_rate(latitude, azimuth, altitude).unwrap();
                check(fixed as i64, 1e6, float, slope(2), tolerance);
            }
        }
    }
}

#[test]
fn field_rotation_by_the_handbooks() {
    // 15.04 arcsec/s cos lat cos A / cos h (common practice): on the meridian at 40 degrees of latitude, 45 high in the
    // south, 16.29 arcsec/s, 0.272 degrees a minute; in the east and in the west none.
    let rate = field_rotation_rate(40.0, 180.0, 45.0).unwrap();
    near(rate, 16.294, 0.001);
    near(rate * 60.0 / 3600.0, 0.2716, 0.0001);
    near(field_rotation_rate(40.0, 90.0, 45.0).unwrap(), 0.0, 1e-14);
    // At the poles an altazimuth mount is an equatorial one.
    near(field_rotation_rate(90.0, 30.0, 45.0).unwrap(), 0.0, 1e-14);
    near(azimuth_rate(90.0, 30.0, 45.0).unwrap(), 15.041_068_6, 1e-6);
    // At that rate a star a thousand pixels from the centre moves by one pixel in 206265 / 16294 s.
    let rate_uas = MicroarcsecondsPerSecond(
        field_rotation_rate_fx(signed_bam(40.0), bam(180.0), signed_bam(45.0)).unwrap().0 as u32,
    );
    let fixed = rotation_free_exposure_fx(Q16::ONE, 1000, rate_uas).unwrap().0;
    check(fixed as i64, 1e3, rotation_free_exposure(1.0, 1000, rate).unwrap(), 206_264.806 / 16_294.4, 5e-4);
}

#[test]
fn the_hole_about_the_zenith() {
    let check_hole = |latitude: f64, top: f64, published: f64, tolerance: f64| {
        let fixed =
            zenith_blind_radius_fx(signed_bam(latitude), MilliarcsecondsPerSecond((top * 1e3) as u32));
        let float = zenith_blind_radius(latitude, top).unwrap();
        check(fixed.unwrap().0 as i64, 1e3, float, published, tolerance);
    };
    // Watson, Monthly Notices 183, 277 (1978), the zenithal blind spot: for a fast mount w cos lat over the top rate, 14.4
    // arcmin at the equator with a degree per second (from memory).
    check_hole(0.0, 3600.0, 14.36 * 60.0, 1.0);
    check_hole(52.0, 2.0 * 3600.0, 15.041 / 7200.0 * 206_265.0 * 0.615_66, 1.0);
    // Where the sky asks for just that much on the meridian.
    for (latitude, top) in [(35.0, 30.0), (-52.0, 900.0), (5.0, 2.0), (78.0, 14_800.0)] {
        let z: f64 = zenith_blind_radius(latitude, top).unwrap() / 3600.0;
        let south: f64 = azimuth_rate(latitude, 180.0, 90.0 - z).unwrap();
        let north: f64 = azimuth_rate(latitude, 0.0, 90.0 - z).unwrap();
        near(south.abs().max(north.abs()), top, top * 1e-9);
        check_hole(latitude, top, z * 3600.0, z * 1e-2);
    }
}

#[test]
fn drift_alignment_by_the_handbooks() {
    // The error in arcminutes is 3.81 times the drift in arcseconds over the minutes (common practice, after Hook, Journal
    // of the British Astronomical Association 99, 19 (1989); from memory).
    for (error_arcmin, hour_angle, drift) in
        [(1.0, 270.0, 1.0), (10.0, 270.0, 10.0), (1.0, 90.0, -1.0), (5.0, 210.0, 2.5), (5.0, 0.0, 0.0)]
    {
        let published = drift / 3.81 / 60.0;
        let error = Milliarcseconds((error_arcmin * 60_000.0) as u32);
        let fixed = misalignment_drift_fx(error, bam(hour_angle)).unwrap().0;
        let float = misalignment_drift(error_arcmin * 60.0, hour_angle).unwrap();
        check(fixed as i64, 1e6, float, published, published.abs() * 2e-3 + 1e-12);
    }
}
