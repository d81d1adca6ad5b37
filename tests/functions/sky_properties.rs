//! Properties of motion and the Sun on arbitrary arguments: inverse pairs come back, hemispheres mirror, rates agree.

use fieldstop::sky::motion::*;
use fieldstop::sky::sun::*;
use fieldstop::units::*;
use proptest::prelude::*;

const QUARTER: i32 = 1 << 30;

/// Either uniform or close to a pole.
fn declination() -> impl Strategy<Value = i32> {
    prop_oneof![-QUARTER..=QUARTER, (0u32..30).prop_map(|bits| QUARTER - (1 << bits))]
}

fn number() -> impl Strategy<Value = u32> {
    // Log-uniform.
    (0u32..31, any::<u32>()).prop_map(|(bits, x)| (x >> bits).max(1))
}

fn cosine(bam: i32) -> f64 {
    (bam as f64 / 4294967296.0 * std::f64::consts::TAU).cos()
}

proptest! {
    #![proptest_config(ProptestConfig { cases: 2000, failure_persistence: None, ..ProptestConfig::default() })]

    /// A field comes back from the time that a star takes through it, as far as its last place tells.
    #[test]
    fn field_comes_back_from_its_drift(field in number(), d in declination()) {
        let field = field % 1_296_000_000;
        let Ok(time) = drift_time_fx(Milliarcseconds(field), SignedBam(d)) else { return Ok(()) };
        let Ok(back) = true_field_from_drift_fx(time, SignedBam(d)) else { return Ok(()) };
        // dF/dt is at most w cos d; the two bounds, of a millisecond and of a milliarcsecond or 1 part in 10^6.
        let told = 15.05 * cosine(d) + f64::max(1.0, 1e-6 * field as f64);
        prop_assert!((back.0 as f64 - field as f64).abs() <= told, "{} for {field}", back.0);
    }

    /// A time comes back from the field that it gives.
    #[test]
    fn drift_comes_back_from_its_field(time in 1u32..86_164_091, d in declination()) {
        let field = true_field_from_drift_fx(Milliseconds(time), SignedBam(d)).unwrap();
        // What a step of the field, or 1 part in 10^6, is worth in time, from the field on either side.
        let step = field.0 / 1_000_000 + 1;
        let at = |field| drift_time_fx(Milliarcseconds(field), SignedBam(d)).map(|t| t.0);
        let before = if field.0 > step { at(field.0 - step).unwrap() } else { 0 };
        let Ok(after) = at(field.0 + step) else { return Ok(()) };
        prop_assert!(before <= time + 1 && time <= after + 1, "{time} is not in {before} to {after}");
    }

    /// Both hemispheres are alike, to the bit.
    #[test]
    fn hemispheres_mirror(x in number(), y in number(), z in number(), d in declination()) {
        let (north, south) = (SignedBam(d), SignedBam(-d));
        prop_assert_eq!(drift_rate_fx(north), drift_rate_fx(south));
        prop_assert_eq!(drift_time_fx(Milliarcseconds(x), north), drift_time_fx(Milliarcseconds(x), south));
        prop_assert_eq!(true_field_from_drift_fx(Milliseconds(x), north), true_field_from_drift_fx(Milliseconds(x), south));
        let exposure = |d| trail_free_exposure_fx(Nanometres(x), Q16(y), Micrometres(z), d);
        prop_assert_eq!(exposure(north), exposure(south));
        let radius = |d| zenith_blind_radius_fx(d, MilliarcsecondsPerSecond(x));
        prop_assert_eq!(radius(north), radius(south));
    }

    /// A small field is the rate times the time.
    #[test]
    fn small_fields_go_by_the_rate(field in 1_000u32..3_600_000, d in -900_000_000i32..=900_000_000) {
        let rate = drift_rate_fx(SignedBam(d)).unwrap().0 as f64 / 1e3; // mas per second
        let time = drift_time_fx(Milliarcseconds(field), SignedBam(d)).unwrap().0 as f64 / 1e3;
        // The next term is (F tan d / 4)^2 / 6.
        let next = (field as f64 / 4.0 / 206_264_806.0 * (1.0 / cosine(d).powi(2) - 1.0).sqrt()).powi(2) / 6.0;
        let moved = rate * time / (1.0 + next);
        prop_assert!((moved - field as f64).abs() <= 1.1e-3 * rate + 1e-6 * field as f64, "{moved} for {field}");
    }

    /// The mount turns as the sky does about the zenith, and as the field does about the star.
    #[test]
    fn rates_of_an_altazimuth_mount_agree(lat in declination(), azimuth in any::<u32>(), alt in -1_060_000_000..=1_060_000_000) {
        let (latitude, azimuth, altitude) = (SignedBam(lat), Bam(azimuth), SignedBam(alt));
        let turned = azimuth_rate_fx(latitude, azimuth, altitude).unwrap().0 as f64;
        let field = field_rotation_rate_fx(latitude, azimuth, altitude).unwrap().0 as f64;
        let sine = |bam: i32| (bam as f64 / 4294967296.0 * std::f64::consts::TAU).sin();
        let expected = 15_041_068.645_644 * sine(lat) + field * sine(alt);
        prop_assert!((turned - expected).abs() <= 2.0 + 4e-6 * field.abs().max(expected.abs()));
        // What the sky does is w: the three together, as a vector.
        let rise = altitude_rate_fx(latitude, azimuth, altitude).unwrap().0 as f64;
        let along = field * cosine(alt);
        let across = 15_041_068.645_644 * cosine(lat);
        prop_assert!((rise.hypot(along) - across).abs() <= 3.0 + 4e-6 * field.abs());
    }

    /// Half a turn farther a star drifts as much the other way.
    #[test]
    fn misalignment_changes_sides(error in 0u32..=18_000_000, hour_angle in any::<u32>()) {
        let drift = |hour_angle: u32| misalignment_drift_fx(Milliarcseconds(error), Bam(hour_angle)).unwrap().0;
        prop_assert_eq!(drift(hour_angle), -drift(hour_angle.wrapping_add(1 << 31)));
        prop_assert_eq!(drift(hour_angle), -drift(hour_angle.wrapping_neg()));
    }

    /// A faster mount has a smaller hole, and on its edge the sky asks for the top rate.
    #[test]
    fn the_hole_is_where_the_sky_is_too_fast(lat in -1_000_000_000..=1_000_000_000, rate in 100_000u32..4_000_000) {
        let z = zenith_blind_radius_fx(SignedBam(lat), MilliarcsecondsPerSecond(rate)).unwrap().0 as f64;
        let altitude = SignedBam((QUARTER as f64 - z / 1_296e6 * 4294967296.0) as i32);
        // The meridian on the pole's side or away from it, whichever is faster.
        let asked = |azimuth| azimuth_rate_fx(SignedBam(lat), Bam(azimuth), altitude).map(|rate| rate.0.unsigned_abs());
        let Ok(asked) = asked(0).and_then(|a| asked(1 << 31).map(|b| a.max(b))) else { return Ok(()) };
        let off = asked as f64 / (rate as f64 * 1e3) - 1.0;
        prop_assert!(off.abs() <= 4e-6 + 2.0 / z, "{asked} for {rate}");
    }

    /// The Sun goes by a degree a day, more or less, and northward or southward by 0.4 degrees at most.
    #[test]
    fn the_sun_moves_evenly(unix in 0u32..4_102_444_800 - 86_400) {
        let degrees = |bam: i32| bam as f64 / 4294967296.0 * 360.0;
        let place = |unix| (sun_right_ascension_fx(unix).unwrap().0, sun_declination_fx(unix).unwrap().0);
        let (before, after) = (place(unix), place(unix + 86_400));
        let along = degrees(after.0.wrapping_sub(before.0) as i32);
        prop_assert!((0.89..1.12).contains(&along), "{along}");
        prop_assert!(degrees(after.1 - before.1).abs() < 0.41);
        prop_assert!(degrees(after.1).abs() < 23.45);
    }

    /// No one is nearer to the Sun than its declination tells, and from the Sun's own place there is nothing to go.
    #[test]
    fn the_sun_is_where_it_is(unix in 0u32..4_102_444_800, east in any::<u32>(), north in -QUARTER..=QUARTER) {
        let (sun_east, sun_north) = (sun_right_ascension_fx(unix).unwrap(), sun_declination_fx(unix).unwrap());
        prop_assert!(sun_clearance_fx(sun_east, sun_north, unix).unwrap().0 <= 1);
        let clearance = sun_clearance_fx(Bam(east), SignedBam(north), unix).unwrap().0 as f64;
        let least = (north.abs_diff(sun_north.0)) as f64 / 4294967296.0 * 1_296e6;
        prop_assert!(clearance >= least - 2.0 && clearance <= 648e6);
        let opposite = sun_clearance_fx(Bam(east.wrapping_add(1 << 31)), SignedBam(-north), unix).unwrap().0 as f64;
        prop_assert!((clearance + opposite - 648e6).abs() <= 2.0);
    }

    /// Twice the aperture takes in four times the light.
    #[test]
    fn sunlight_goes_by_the_square(aperture in 1u32..36_000_000) {
        let power = |um| collected_sunlight_fx(Micrometres(um)).unwrap().0 as f64;
        prop_assert!((power(2 * aperture) - 4.0 * power(aperture)).abs() <= 2.6);
    }
}
