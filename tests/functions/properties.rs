//! Properties of the fixed forms on arbitrary arguments: monotonic, inverse pairs come back, units agree.

use super::registry::{Row, rows};
use fieldstop::optics::field::*;
use fieldstop::units::*;
use fieldstop::{Error, convert};
use proptest::prelude::*;

/// How a result goes with each argument: '+' never falls, '-' never rises, '.' neither.
const DIRECTIONS: &[(&str, &str)] = &[
    ("mas_from_bam", "."),
    ("bam_from_mas", "."),
    ("signed_mas_from_bam", "+"),
    ("bam_from_day_ms", "+"),
    ("day_ms_from_bam", "."),
    ("milli_from_q16", "+"),
    ("q16_from_milli", "+"),
    ("focal_ratio", "+-"),
    ("amplified_focal_length", "++"),
    ("amplification", "."),
    ("magnification", "+-"),
    ("exit_pupil", "+-+"),
    ("eyepiece_for_exit_pupil", "++-"),
    ("eyepiece_for_magnification", "+-"),
    ("true_field_from_stop", "+-"),
    ("true_field_rectilinear", "+-+"),
    ("true_field_equidistant", "+-+"),
    ("frame_field", "++-"),
    ("plate_scale", "-"),
    ("pixel_scale", "+-"),
    ("focal_length_for_field", "+-"),
    ("tiles", "+-+"),
    ("rayleigh_limit", "-+"),
    ("rayleigh_limit_obstructed", "--+"),
    ("dawes_limit", "-"),
    ("sparrow_limit", "-+"),
    ("airy_fwhm", "-+"),
    ("airy_radius", "+-+"),
    ("cutoff_frequency", "-+-"),
    // A thin ring's contrast rises again on the way.
    ("contrast", "."),
    ("strehl_ratio", "-+"),
    ("fried_parameter", "-+"),
    ("seeing_at_airmass", "++"),
    ("combined_fwhm", "+++"),
    ("throughput", "-+-+"),
    ("clear_fraction", "+-"),
    ("effective_aperture", "+-+"),
    ("magnitude_gain", "+-"),
    ("limiting_magnitude", "++-"),
    ("surface_brightness", "+-+"),
    ("magnitude_difference", "-+"),
    ("distance_dimming", "-+"),
    ("extinction", "++"),
    ("t_number", "+-"),
    ("pixels_per_fwhm", "+-"),
    ("nyquist_pixel", "+-+"),
    ("focal_length_for_pixel_scale", "+-"),
    ("diagonal_field", "+++-"),
    ("image_size", "++"),
    ("exposure_stops", "-+"),
    ("depth_of_focus", "++"),
    ("defocus_blur", "+-"),
    ("defocus_wavefront", "+-"),
    ("motor_steps", "+-"),
    ("thermal_shift", "."),
    ("refocus_temperature", "--+"),
    ("near_focus_travel", "+-"),
    ("coma_length", "+-"),
    // A wider lit field makes the beam wider but less steep.
    ("diagonal_minor_axis", "+-+."),
    ("diagonal_offset", "+-+."),
    ("beam_width", "+-+"),
    ("beam_shift", "++-"),
    ("secondary_magnification", "-+"),
    ("secondary_separation", "++-"),
    ("secondary_diameter", "++-+"),
    ("secondary_field_margin", "+.-+"),
    ("secondary_radius", "+-+"),
    ("illumination", ".+-"),
    ("swing_radius", "++"),
    ("eyepiece_height", "++."),
    ("abbe_number", "+-+"),
    ("singlet_colour_shift", "+-"),
    ("singlet_colour_blur", "--"),
    ("achromat_crown", "++-"),
    ("achromat_flint", "++-"),
    ("secondary_spectrum", "++-"),
    // Declinations and latitudes go either way from 0.
    ("drift_rate", "."),
    ("drift_time", "+."),
    ("true_field_from_drift", "+."),
    ("trail_free_exposure", "++-."),
    ("rotation_free_exposure", "+--"),
    ("field_rotation_rate", "."),
    ("azimuth_rate", "."),
    ("altitude_rate", "."),
    ("zenith_blind_radius", ".-"),
    ("misalignment_drift", "."),
    ("sun_right_ascension", "."),
    ("sun_declination", "."),
    ("sun_clearance", "."),
    ("collected_sunlight", "+"),
];

fn directions(row: &Row) -> Vec<char> {
    let found = DIRECTIONS.iter().find(|(stem, _)| *stem == row.stem);
    let (_, directions) = found.unwrap_or_else(|| panic!("{} has no directions", row.stem));
    if *directions == "." { vec!['.'; row.arguments.len()] } else { directions.chars().collect() }
}

/// The results of a call and of one with argument `i` raised by `step`, if both are there.
fn raised(row: &Row, case: &[i64], i: usize, step: i64) -> Option<(i64, i64)> {
    let mut up = case.to_vec();
    up[i] = up[i].checked_add(step).filter(|&x| x <= row.arguments[i].range.1)?;
    Some(((row.fixed)(case).ok()?, (row.fixed)(&up).ok()?))
}

/// The greatest fall against the right direction that two errors of the kernel can make.
fn slack(row: &Row, value: i64) -> f64 {
    let beyond_rounding = (row.owed.lsb - 0.5).max(0.0) + row.owed.part * value.abs() as f64;
    (2.0 * beyond_rounding).ceil()
}

fn argument() -> impl Strategy<Value = i64> {
    // Log-uniform, and a step beside.
    (0u32..32, any::<u32>()).prop_map(|(bits, x)| (x >> bits) as i64)
}

proptest! {
    #![proptest_config(ProptestConfig { cases: 2000, failure_persistence: None, ..ProptestConfig::default() })]

    #[test]
    fn monotonic_in_each_argument(
        values in prop::array::uniform5(argument()), steps in prop::array::uniform5(argument()), one in any::<bool>()
    ) {
        for row in rows() {
            let case: Vec<i64> = (row.arguments.iter().zip(values))
                .map(|(a, x)| x.clamp(a.range.0.max(a.zero_refused as i64), a.range.1))
                .collect();
            for (i, direction) in directions(&row).into_iter().enumerate() {
                let step = if one { 1 } else { steps[i] };
                let Some((before, after)) = raised(&row, &case, i, step) else { continue };
                let slack = slack(&row, before.max(after)) as i64;
                let right = match direction {
                    '+' => after >= before - slack,
                    '-' => after <= before + slack,
                    _ => true,
                };
                prop_assert!(right, "{}_fx{case:?}: {before}, with argument {i} {step} more {after}", row.stem);
            }
        }
    }

    #[test]
    fn bam_and_mas_come_back(mas in 0u32..1_296_000_000) {
        let bam = convert::bam_from_mas_fx(SignedMilliarcseconds((mas as i64 - if mas >= 648_000_000 { 1_296_000_000 } else { 0 }) as i32)).unwrap();
        prop_assert_eq!(convert::mas_from_bam_fx(bam), Ok(Milliarcseconds(mas)));
        let signed = convert::signed_mas_from_bam_fx(SignedBam(bam.0 as i32)).unwrap();
        // A milliarcsecond is 3.3 binary steps.
        let back = convert::bam_from_mas_fx(signed).unwrap();
        prop_assert!((back.0.wrapping_sub(bam.0) as i32).abs() <= 2);
    }

    #[test]
    fn circles_stay_on_the_circle(bam in prop_oneof![any::<u32>(), Just(u32::MAX), Just(u32::MAX - 1)]) {
        prop_assert!(convert::mas_from_bam_fx(Bam(bam)).unwrap().0 < 1_296_000_000);
        prop_assert!(convert::day_ms_from_bam_fx(Bam(bam)).unwrap().0 < 86_400_000);
    }

    #[test]
    fn day_ms_come_back(ms in 0u32..86_400_000) {
        let bam = convert::bam_from_day_ms_fx(DayMilliseconds(ms)).unwrap();
        prop_assert_eq!(convert::day_ms_from_bam_fx(bam), Ok(DayMilliseconds(ms)));
    }

    #[test]
    fn thousandths_come_back(milli in 0u32..65_536_000) {
        let q16 = convert::q16_from_milli_fx(Milli(milli)).unwrap();
        prop_assert_eq!(convert::milli_from_q16_fx(q16), Ok(Milli(milli)));
    }

    /// The eyepiece for the magnification that an eyepiece gives is that eyepiece, as far as the magnification's last
    /// place tells.
    #[test]
    fn eyepiece_comes_back_from_its_magnification(f in 1u32..=20_000_000, fe in 1u32..=100_000) {
        let magnification = magnification_fx(Micrometres(f), Micrometres(fe)).unwrap_or(Q16(0));
        prop_assume!(magnification.0 != 0);
        let back = eyepiece_for_magnification_fx(Micrometres(f), magnification).unwrap().0 as f64;
        let told = fe as f64 / magnification.0 as f64 * 0.5 * (1.0 + 1.0 / magnification.0 as f64) + 0.51;
        prop_assert!((back - fe as f64).abs() <= told, "{back} for {fe}, told to {told}");
    }

    #[test]
    fn eyepiece_comes_back_from_its_exit_pupil(d in 10_000u32..=1_000_000, f in 100_000u32..=10_000_000, fe in 1u32..=100_000) {
        let pupil = exit_pupil_fx(Micrometres(d), Micrometres(f), Micrometres(fe)).unwrap();
        prop_assume!(pupil.0 != 0);
        let back = eyepiece_for_exit_pupil_fx(pupil, Micrometres(f), Micrometres(d)).unwrap().0 as f64;
        prop_assert!((back - fe as f64).abs() <= 0.5 * f as f64 / d as f64 + 0.51);
    }

    /// A stop seen from f, and the focal length that spreads this field over the stop.
    #[test]
    fn focal_length_comes_back_from_its_field(stop in 1_000u32..=50_000, f in 100_000u32..=5_000_000) {
        let field = true_field_from_stop_fx(Micrometres(stop), Micrometres(f)).unwrap();
        let back = focal_length_for_field_fx(Micrometres(stop), field).unwrap().0 as f64;
        prop_assert!((back - f as f64).abs() <= 1.5 + 1.01 * f as f64 / field.0 as f64);
    }

    /// A frame of n pixels is a stop as wide, and a small frame is n pixel scales.
    #[test]
    fn frame_agrees_with_stop_and_pixel_scale(pixel_um in 1u32..=20, n in 1u32..=10_000, f in 200_000u32..=5_000_000) {
        let frame = frame_field_fx(Nanometres(pixel_um * 1000), n, Micrometres(f)).unwrap();
        let stop = true_field_from_stop_fx(Micrometres(pixel_um * n), Micrometres(f)).unwrap();
        prop_assert!(frame.0.abs_diff(stop.0) <= 1);
        let scale = pixel_scale_fx(Nanometres(pixel_um * 1000), Micrometres(f)).unwrap();
        let flat = scale.0 as f64 * n as f64 / 1000.0;
        prop_assert!(frame.0 as f64 <= flat + 1.0 + n as f64 / 2000.0);
    }

    /// The two mappings agree at the centre of the field and part as the tangent does.
    #[test]
    fn rectilinear_field_is_the_wider(field in 1u32..648_000_000, f in 1_000u32.., fe in 1u32..1_000) {
        let (f, fe, field) = (Micrometres(f), Micrometres(fe), Milliarcseconds(field));
        let (Ok(equal), Ok(straight)) = (true_field_equidistant_fx(field, f, fe), true_field_rectilinear_fx(field, f, fe)) else { return Ok(()) };
        prop_assert!(straight.0 + 2 >= equal.0);
    }

    #[test]
    fn tiles_cover_and_one_less_does_not(target in 1u32.., frame in 1u32.., overlap in argument()) {
        let n = tiles_fx(Milliarcseconds(target), Milliarcseconds(frame), Milliarcseconds(overlap as u32));
        prop_assume!(n.is_ok());
        let covered = |n: i128| n * frame as i128 - (n - 1) * overlap as i128;
        let n = n.unwrap() as i128;
        prop_assert!(covered(n) >= target as i128);
        prop_assert!(n == 1 || covered(n - 1) < target as i128);
    }

    /// Amplifying the telescope and asking without the amplifier is the same.
    #[test]
    fn amplifier_belongs_to_the_telescope(f in 100_000u32..=5_000_000, k in 20_000u32..=400_000, fe in 3_000u32..=50_000) {
        let amplified = amplified_focal_length_fx(Micrometres(f), Q16(k)).unwrap();
        let magnification = magnification_fx(amplified, Micrometres(fe)).unwrap().0 as f64;
        let plain = magnification_fx(Micrometres(f), Micrometres(fe)).unwrap().0 as f64;
        let expected = plain * k as f64 / 65536.0;
        prop_assert!((magnification / expected - 1.0).abs() < 2.0 / amplified.0 as f64 + 2.0 / plain);
    }
}

#[test]
fn a_refused_call_says_so_whatever_else_is_wrong() {
    // Left to right: the first argument is blamed first.
    assert_eq!(magnification_fx(Micrometres(0), Micrometres(0)).map_err(Error::argument), Err(1));
    assert_eq!(magnification_fx(Micrometres(1), Micrometres(0)).map_err(Error::argument), Err(2));
}
