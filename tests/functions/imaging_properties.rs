//! Properties of imaging and colour on arbitrary arguments: inverse pairs come back, parts make up the whole.

use fieldstop::optics::colour::*;
use fieldstop::optics::field::*;
use fieldstop::optics::imaging::*;
use fieldstop::optics::resolution::cutoff_frequency_fx;
use fieldstop::units::*;
use proptest::prelude::*;

fn um(length: u32) -> Micrometres {
    Micrometres(length)
}

fn number() -> impl Strategy<Value = u32> {
    // Log-uniform.
    (0u32..31, any::<u32>()).prop_map(|(bits, x)| (x >> bits).max(1))
}

proptest! {
    #![proptest_config(ProptestConfig { cases: 2000, failure_persistence: None, ..ProptestConfig::default() })]

    /// The focal length for a pixel scale gives that scale, as far as its last place tells.
    #[test]
    fn focal_length_comes_back_from_its_pixel_scale(pixel in 1_000u32..=20_000, f in 50_000u32..=10_000_000) {
        let scale = pixel_scale_fx(Nanometres(pixel), um(f)).unwrap();
        let back = focal_length_for_pixel_scale_fx(Nanometres(pixel), scale).unwrap().0 as f64;
        prop_assert!((back - f as f64).abs() <= 0.51 + 0.52 * f as f64 / scale.0 as f64);
    }

    /// A target's image, taken as a width, spans that target.
    #[test]
    fn target_comes_back_from_its_image(field in 1_000u32..648_000_000, f in 1_000u32..=20_000_000) {
        let Ok(size) = image_size_fx(Milliarcseconds(field), um(f)) else { return Ok(()) };
        prop_assume!(size.0 != 0);
        let back = frame_field_fx(size, 1, um(f)).unwrap().0 as f64;
        // 2 f tan(t/2) goes by at least f t.
        let told = 2.0 + 206_264_806.0 / (f as f64 * 1000.0);
        prop_assert!((back - field as f64).abs() <= told, "{back} for {field}, told to {told}");
    }

    /// The diagonal is longer than either side and no longer than both; equal sides and a row of one pixel are known.
    #[test]
    fn diagonal_is_between_its_sides(pixel in number(), c in 1u16.., r in 1u16.., f in number()) {
        let pixel = Nanometres(pixel);
        let side = |n: u32| frame_field_fx(pixel, n, um(f)).unwrap().0;
        let diagonal = diagonal_field_fx(pixel, c, r, um(f)).unwrap().0;
        prop_assert!(diagonal + 2 >= side(c.max(r) as u32));
        prop_assert!(diagonal <= side(c as u32 + r as u32) + 2);
        prop_assert_eq!(diagonal, diagonal_field_fx(pixel, r, c, um(f)).unwrap().0);
    }

    /// Sides of 3 and 4 have a diagonal of 5.
    #[test]
    fn diagonal_of_three_and_four(pixel in number(), n in 1u16..=13_107, f in number()) {
        let diagonal = diagonal_field_fx(Nanometres(pixel), 3 * n, 4 * n, um(f)).unwrap().0;
        prop_assert!(diagonal.abs_diff(frame_field_fx(Nanometres(pixel), 5 * n as u32, um(f)).unwrap().0) <= 1);
    }

    /// There and back is nothing, and a stop on the way changes nothing.
    #[test]
    fn stops_add_up(a in number(), b in number(), c in number()) {
        let stops = |a, b| exposure_stops_fx(Q16(a), Q16(b)).unwrap().0;
        prop_assert_eq!(stops(a, a), 0);
        prop_assert!((stops(a, b) + stops(b, a)).abs() <= 1);
        prop_assert!((stops(a, b) + stops(b, c) - stops(a, c)).abs() <= 2);
        // Twice the focal ratio is two stops to the last place.
        if a < 1 << 31 {
            prop_assert_eq!(stops(a, 2 * a), 2 << 16);
        }
    }

    /// Two such pixels are a period of the cutoff frequency.
    #[test]
    fn two_pixels_to_the_cutoff(f in 100_000u32..=10_000_000, d in 50_000u32..=1_000_000, wavelength in 300u32..=2_000) {
        let pixel = nyquist_pixel_fx(um(f), um(d), Nanometres(wavelength)).unwrap().0 as f64;
        let cutoff = cutoff_frequency_fx(um(f), um(d), Nanometres(wavelength)).unwrap().0 as f64 / 65536.0;
        let told = 0.51 / pixel + 1e-5 / cutoff;
        prop_assert!((2.0 * pixel * cutoff / 1e6 - 1.0).abs() <= told);
    }

    /// The powers of an achromat's two lenses make up that of the pair, and its colours cancel.
    #[test]
    fn powers_of_an_achromat_add_up(f in 100_000u32..=5_000_000, v1 in 51u32 << 16..90 << 16, v2 in 20u32 << 16..50 << 16) {
        let crown = achromat_crown_fx(um(f), Q16(v1), Q16(v2)).unwrap().0 as f64;
        let flint = achromat_flint_fx(um(f), Q16(v1), Q16(v2)).unwrap().0 as f64;
        let told = 0.51 * (f as f64 / crown / crown + f as f64 / flint / flint);
        prop_assert!((f as f64 / crown - f as f64 / flint - 1.0).abs() <= told);
        prop_assert!((crown * v1 as f64 / (flint * v2 as f64) - 1.0).abs() <= 0.51 / crown + 0.51 / flint);
    }

    /// The blur of a single lens is what its shift, half of it to each side, makes of the cone.
    #[test]
    fn blur_is_half_the_shift_over_the_focal_ratio(f in 300_000u32..=5_000_000, n in 3u32 << 16..30 << 16, v in 20u32 << 16..90 << 16) {
        let shift = singlet_colour_shift_fx(um(f), Q16(v)).unwrap().0 as f64;
        let blur = singlet_colour_blur_fx(Q16(n), Q16(v)).unwrap().0 as f64;
        let expected = shift / 2.0 / (n as f64 / 65536.0) / f as f64 * 206_264_806_247.0;
        prop_assert!((blur / expected - 1.0).abs() <= 0.51 / shift + 0.51 / blur + 1e-9);
    }
}
