use super::near;
use fieldstop::optics::light::*;
use fieldstop::units::{Micrometres, Millimagnitudes, MillimagnitudesPerAirmass, Q16};

/// The fixed form within a step and the tolerance of the published value, the float form within the tolerance.
#[track_caller]
fn check(fixed: i64, steps: f64, float: f64, published: f64, tolerance: f64) {
    near(float, published, tolerance);
    near(fixed as f64 / steps, published, tolerance + 1.0 / steps);
}

fn q16(x: f64) -> Q16 {
    Q16((x * 65536.0).round() as u32)
}

fn um(mm: f64) -> Micrometres {
    Micrometres((mm * 1000.0).round() as u32)
}

fn check_difference(a: u32, b: u32, published: f64, tolerance: f64) {
    let fixed = magnitude_difference_fx(a, b).unwrap().0;
    check(fixed as i64, 1e3, magnitude_difference(a as f64, b as f64).unwrap(), published, tolerance);
}

#[test]
fn magnitudes_and_brightness_ratios() {
    // Pogson, Monthly Notices of the Royal Astronomical Society 17 (1856): 2.512 to the magnitude, 100 to five.
    check_difference(1_000_000, 2_511_886, 1.0, 2e-7);
    check_difference(1, 100, 5.0, 0.0);
    assert_eq!(magnitude_difference_fx(1, 100), Ok(Millimagnitudes(5000)));
    // The table of ratios in every handbook, such as Allen's Astrophysical Quantities (from memory).
    for (ratio, magnitudes) in
        [(6_310, 2.0), (15_850, 3.0), (39_810, 4.0), (251_200, 6.0), (10_000_000, 10.0)]
    {
        check_difference(1_000, ratio, magnitudes, 2e-4);
    }
    // The Sun at -26.74 and the full Moon at -12.74: 400,000 to one (Carroll and Ostlie; from memory).
    check_difference(400_000, 1, -14.0, 0.01);
}

#[test]
fn distance_moduli() {
    let dimming = |near: u32, distant: u32, published, tolerance| {
        let fixed = distance_dimming_fx(near, distant).unwrap().0;
        let float = distance_dimming(near as f64, distant as f64).unwrap();
        check(fixed as i64, 1e3, float, published, tolerance);
    };
    // Ten times as far is five magnitudes, by the definition of the distance modulus (IAU).
    dimming(10, 100, 5.0, 0.0);
    // The Sun, apparent -26.74 at 1 au and absolute 4.83 at 10 parsecs, 2062648 au (Carroll and Ostlie; from memory).
    dimming(1, 2_062_648, 4.83 + 26.74, 0.005);
    // The Large Magellanic Cloud: 49.97 kpc, modulus 18.493 (Pietrzynski et al. 2013; from memory).
    dimming(10, 49_970, 18.493, 0.001);
    // Twice as far is a quarter of the light, 1.505 magnitudes (any textbook).
    dimming(1, 2, 1.505, 0.0002);
}

#[test]
fn gain_over_the_eye() {
    // Ten times the pupil's width is a hundred times the light: five magnitudes (common practice, eye 7 mm).
    let fixed = magnitude_gain_fx(um(70.0), um(7.0)).unwrap().0;
    check(fixed as i64, 1e3, magnitude_gain(70.0, 7.0).unwrap(), 5.0, 0.0);
    // Limit of 9.1 + 5 log10(aperture in inches) (Sidgwick, Amateur Astronomer's Handbook; from memory), with the
    // usual spread of eyes.
    for inches in [2.0f64, 3.0, 6.0, 10.0, 16.0] {
        let fixed = limiting_magnitude_fx(Millimagnitudes(6500), um(25.4 * inches), um(7.0)).unwrap().0;
        let float = limiting_magnitude(6.5, 25.4 * inches, 7.0).unwrap();
        check(fixed as i64, 1e3, float, 9.1 + 5.0 * inches.log10(), 0.25);
    }
}

#[test]
fn central_obstruction() {
    // An obstruction of a third of the aperture hides a ninth of it, one of a quarter a sixteenth (geometry).
    for (obstruction, published) in [(100.0, 8.0 / 9.0), (75.0, 15.0 / 16.0), (150.0, 0.75)] {
        let fixed = clear_fraction_fx(um(300.0), um(obstruction)).unwrap().0;
        check(fixed as i64, 65536.0, clear_fraction(300.0, obstruction).unwrap(), published, 1e-15);
    }
    // 3-4-5: an obstruction of 4/5 leaves what an aperture of 3/5 gathers; a throughput of a quarter halves it again.
    let fixed = effective_aperture_fx(um(250.0), um(200.0), q16(0.25)).unwrap();
    assert_eq!(fixed, um(75.0));
    check(fixed.0 as i64, 1e3, effective_aperture(250.0, 200.0, 0.25).unwrap(), 75.0, 1e-13);
}

#[test]
fn losses_in_glass_and_at_mirrors() {
    let through = |mirrors, reflectance, surfaces, transmittance, published, tolerance| {
        let fixed = throughput_fx(mirrors, q16(reflectance), surfaces, q16(transmittance)).unwrap().0;
        let float = throughput(mirrors, reflectance, surfaces, transmittance).unwrap();
        check(fixed as i64, 65536.0, float, published, tolerance);
    };
    // Fresnel: 4 percent at each surface of glass of index 1.5 (Hecht, Optics): a lens passes 92 percent.
    through(0, 0.0, 2, 1.0 - (0.5f64 / 2.5).powi(2), 0.9216, 2e-5);
    // Ten uncoated surfaces pass two thirds (Smith, Modern Optical Engineering; from memory).
    through(0, 0.0, 10, 0.96, 0.665, 2e-4);
    // Two aluminium mirrors at 0.88 leave 77 percent (common practice).
    through(2, 0.88, 0, 0.0, 0.7744, 2e-5);
}

#[test]
fn image_never_brighter_than_the_object() {
    // Photometry (Born and Wolf): a pupil filled by half gives a quarter, one overfilled no more than the eye.
    for (exit_pupil, published) in [(3.5, 0.25), (0.7, 0.01), (7.0, 1.0), (14.0, 1.0)] {
        let fixed = surface_brightness_fx(um(exit_pupil), um(7.0), Q16::ONE).unwrap().0;
        check(fixed as i64, 65536.0, surface_brightness(exit_pupil, 7.0, 1.0).unwrap(), published, 1e-16);
    }
}

#[test]
fn air_dims() {
    // 0.28 magnitudes an airmass at sea level, 5.60 airmasses at an altitude of 10 degrees: 1.57 (Green 1992; from
    // memory).
    let fixed = extinction_fx(MillimagnitudesPerAirmass(280), q16(5.60)).unwrap().0;
    check(fixed as i64, 1e3, extinction(0.28, 5.60).unwrap(), 1.57, 0.005);
}

#[test]
fn half_the_light_is_one_stop() {
    // ISO 517: the stops go by the root of two, f/4 to f/5.6.
    let fixed = t_number_fx(q16(4.0), q16(0.5)).unwrap().0;
    check(fixed as i64, 65536.0, t_number(4.0, 0.5).unwrap(), 5.657, 2e-4);
}
