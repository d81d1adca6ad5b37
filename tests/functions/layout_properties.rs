//! Properties of focus and layout on arbitrary arguments: inverse pairs come back, parts make up the whole.

use fieldstop::Error;
use fieldstop::optics::focus::*;
use fieldstop::optics::layout::*;
use fieldstop::units::*;
use proptest::prelude::*;

fn um(length: u32) -> Micrometres {
    Micrometres(length)
}

fn length() -> impl Strategy<Value = u32> {
    // Log-uniform.
    (0u32..31, any::<u32>()).prop_map(|(bits, x)| (x >> bits).max(1))
}

proptest! {
    #![proptest_config(ProptestConfig { cases: 2000, failure_persistence: None, ..ProptestConfig::default() })]

    /// At the end of the depth of focus the wavefront is a quarter wave off.
    #[test]
    fn depth_is_a_quarter_wave(ratio in 65_536u32..65_536 * 40, wavelength in 300u32..2_000) {
        let depth = depth_of_focus_fx(Q16(ratio), Nanometres(wavelength)).unwrap();
        let wavefront = defocus_wavefront_fx(depth, Q16(ratio)).unwrap().0 as f64;
        prop_assert!((wavefront - wavelength as f64 / 4.0).abs() <= 0.5 + 0.5 / 8.0);
    }

    /// The change of temperature that uses up a tolerance moves the focus by it.
    #[test]
    fn temperature_uses_up_the_tolerance(length in 100_000u32..=5_000_000, ppb in 500u32..=30_000, tolerance in 1u32..=1_000_000) {
        let change = refocus_temperature_fx(um(length), PartsPerBillionPerKelvin(ppb), Nanometres(tolerance)).unwrap().0;
        let shift = |sign: i32| thermal_shift_fx(um(length), SignedPartsPerBillionPerKelvin(ppb as i32), SignedMillikelvin(sign * change as i32)).unwrap().0;
        let told = 0.51 + 0.5 * length as f64 * ppb as f64 / 1e9;
        prop_assert!((shift(1) as f64 - tolerance as f64).abs() <= told);
        prop_assert!((shift(-1) + shift(1)).abs() <= 1);
    }

    /// Steps cover the distance to half a step.
    #[test]
    fn steps_cover_the_distance(distance in length(), step in length()) {
        let steps = motor_steps_fx(Nanometres(distance), Nanometres(step)).unwrap() as i64;
        prop_assert!(2 * (steps * step as i64 - distance as i64).abs() <= step as i64);
    }

    /// Without a slope to speak of the diagonal is as wide as the beam, and never narrower than it or than the field.
    #[test]
    fn diagonal_takes_in_the_beam(d in length(), f in length(), distance in length(), field in length()) {
        let Ok(minor) = diagonal_minor_axis_fx(um(d), um(f), um(distance), um(field)) else { return Ok(()) };
        prop_assert!(minor >= beam_width_fx(um(d), um(f), um(distance)).unwrap());
        prop_assert!(minor.0 >= field);
        let offset = diagonal_offset_fx(um(d), um(f), um(distance), um(field)).unwrap();
        prop_assert!(offset.0 <= minor.0 / 2 + 1);
    }

    /// The beam of an image point off the axis reaches as far as its share of the cone: at the focus it is the point.
    #[test]
    fn beams_end_at_their_point(d in length(), f in length(), y in length()) {
        prop_assert_eq!(beam_shift_fx(um(y), um(f), um(0)), Ok(um(y)));
        prop_assert_eq!(beam_shift_fx(um(y), um(f), um(f)), Ok(um(0)));
        prop_assert_eq!(beam_width_fx(um(d), um(f), um(f)), Ok(um(d)));
        prop_assert_eq!(beam_width_fx(um(d), um(f), um(0)), Ok(um(0)));
    }

    /// The marginal ray falls straight from the primary's rim to its focus, through the second mirror's rim.
    #[test]
    fn second_mirror_lies_on_the_marginal_ray(f1 in 100_000u32..=3_000_000, more in 1u32..=20_000_000, b in 0u32..=500_000, d in 50_000u32..=1_000_000) {
        let system = f1 + more;
        prop_assume!(b <= system);
        let separation = secondary_separation_fx(um(f1), um(system), um(b)).unwrap().0 as f64;
        let diameter = secondary_diameter_fx(um(d), um(f1), um(system), um(b)).unwrap().0 as f64;
        let expected = d as f64 * (f1 as f64 - separation) / f1 as f64;
        prop_assert!((diameter - expected).abs() <= 0.51 + 0.51 * d as f64 / f1 as f64);
    }

    /// The area that two discs share is the same from either.
    #[test]
    fn discs_share_one_area(a in 1_000u32..=100_000, b in 1_000u32..=100_000, offset in 0u32..=100_000) {
        let [of_a, of_b] = [(a, b), (b, a)].map(|(a, b)| illumination_fx(um(a), um(b), um(offset)).unwrap().0 as f64);
        let (square_a, square_b) = (a as f64 * a as f64, b as f64 * b as f64);
        prop_assert!((of_a * square_a - of_b * square_b).abs() <= 0.52 * (square_a + square_b));
    }

    #[test]
    fn swing_is_between_reach_and_reach_and_tube(reach in 0u32..=1 << 30, tube in 0u32..=1 << 30) {
        let radius = swing_radius_fx(um(reach), um(tube)).unwrap().0;
        prop_assert!(radius >= reach.max(tube / 2) && radius <= reach + tube.div_ceil(2));
    }

    /// Level it is at the axis, upright at the reach's end, and the two ends of a tube are as far from the axis.
    #[test]
    fn eyepiece_goes_about_the_axis(axis in 1u32 << 31.., reach in 0i32..=i32::MAX, altitude in 0i32..=1 << 30) {
        let at = |reach: i32, altitude| eyepiece_height_fx(um(axis), SignedMicrometres(reach), SignedBam(altitude)).map(|h| h.0);
        prop_assert_eq!(at(reach, 0), Ok(axis));
        prop_assert_eq!(at(-reach, 1 << 30), Ok(axis - reach as u32));
        prop_assert_eq!(at(reach, 1 << 30), axis.checked_add(reach as u32).ok_or(Error::OVERFLOW));
        let (Ok(upper), Ok(lower)) = (at(reach, altitude), at(-reach, altitude)) else { return Ok(()) };
        prop_assert_eq!(upper - axis, axis - lower);
    }
}
