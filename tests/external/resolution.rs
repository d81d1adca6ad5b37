use super::near;
use fieldstop::optics::resolution::*;
use fieldstop::units::*;
use std::f64::consts::PI;

/// Radians of 1 arcsecond.
const ARCSEC: f64 = PI / 648_000.0;

/// An angle in microarcseconds, in wavelengths over the diameter.
fn wavelengths(angle: Microarcseconds, aperture_um: u32, wavelength_nm: u32) -> f64 {
    angle.0 as f64 * 1e-6 * ARCSEC * (aperture_um as f64 * 1e3) / wavelength_nm as f64
}

/// j1,1 = 3.83170 59702: Abramowitz and Stegun, Handbook of Mathematical Functions, table 9.5.
#[test]
fn rayleigh_limit_is_the_first_zero_of_j1() {
    let limit = rayleigh_limit_fx(Micrometres(1_000), Nanometres(1_000)).unwrap();
    near(PI * wavelengths(limit, 1_000, 1_000), 3.8317059702, 1e-8);
    near(PI * rayleigh_limit(1.0f64, 1000.0).unwrap() * ARCSEC * 1e3, 3.8317059702, 1e-10);
}

/// 138.4 arcsec over the aperture in millimetres at 550 nm: common practice, and in Schroeder, Astronomical Optics, as
/// 1.22 lambda / D.
#[test]
fn rayleigh_limit_in_green_light() {
    for aperture_mm in [60, 100, 150, 250] {
        let limit = rayleigh_limit_fx(Micrometres(aperture_mm * 1000), Nanometres(550)).unwrap();
        near(limit.0 as f64 * 1e-6 * aperture_mm as f64, 138.4, 0.05);
    }
}

/// Radius of the first dark ring of an annular aperture in wavelengths over the diameter: Schroeder, Astronomical Optics,
/// table of annular apertures (from memory).
#[test]
fn first_dark_ring_with_an_obstruction() {
    for (percent, published) in [(10, 1.205), (20, 1.167), (33, 1.098), (40, 1.058), (50, 1.001), (60, 0.947)]
    {
        let (d, o) = (200_000, 2_000 * percent);
        let limit = rayleigh_limit_obstructed_fx(Micrometres(d), Micrometres(o), Nanometres(550)).unwrap();
        near(wavelengths(limit, d, 550), published, 6e-4);
        let limit = rayleigh_limit_obstructed(d as f64 / 1e3, o as f64 / 1e3, 550.0).unwrap();
        near(limit * ARCSEC * d as f64 * 1e3 / 550.0, published, 6e-4);
    }
}

/// A vanishing ring has its first dark ring at j0,1 = 2.40482 55577: Abramowitz and Stegun, table 9.5.
#[test]
fn first_dark_ring_of_a_thin_ring() {
    let limit =
        rayleigh_limit_obstructed_fx(Micrometres(1_000_000), Micrometres(999_999), Nanometres(1_000_000));
    // x = j0,1 (1 + (1 - e) / 2).
    near(PI * wavelengths(limit.unwrap(), 1_000_000, 1_000_000), 2.4048255577, 2e-6);
}

/// 4.56 inches over the aperture: Dawes, Memoirs of the Royal Astronomical Society 35, 137 (1867); 115.8 mm arcsec, 116
/// in common practice.
#[test]
fn dawes_limit_in_inches() {
    let limit = dawes_limit_fx(Micrometres(25_400)).unwrap();
    near(limit.0 as f64 * 1e-6, 4.56, 0.01);
    near(dawes_limit(116.0f64).unwrap(), 1.0, 1e-15);
}

/// 0.947 lambda / D: Sparrow, Astrophysical Journal 44, 76 (1916), quoted in handbooks (from memory).
#[test]
fn sparrow_limit_in_wavelengths() {
    let limit = sparrow_limit_fx(Micrometres(100_000), Nanometres(500)).unwrap();
    near(wavelengths(limit, 100_000, 500), 0.947, 5e-4);
}

/// 1.029 lambda / D at half maximum: Born and Wolf's Airy pattern, as tabulated in handbooks (from memory).
#[test]
fn airy_pattern_at_half_maximum() {
    let width = airy_fwhm_fx(Micrometres(100_000), Nanometres(500)).unwrap();
    near(wavelengths(width, 100_000, 500), 1.029, 5e-4);
}

/// The Airy disc is 2.44 lambda N wide, 1.22 lambda N to its edge: Smith, Modern Optical Engineering, diffraction.
#[test]
fn airy_disc_at_the_focus() {
    for (ratio, radius_um) in [(4, 2.684), (8, 5.368), (10, 6.71), (15, 10.065)] {
        let f = Micrometres(100_000 * ratio);
        let radius = airy_radius_fx(f, Micrometres(100_000), Nanometres(550)).unwrap();
        near(radius.0 as f64 / 1e3, radius_um, 4e-3);
    }
}

/// The cutoff is 1 / (lambda N): Smith, Modern Optical Engineering; 228.9 cycles per mm at f/8 and 546 nm.
#[test]
fn cutoff_at_f_8() {
    let cutoff = cutoff_frequency_fx(Micrometres(800_000), Micrometres(100_000), Nanometres(546)).unwrap();
    near(cutoff.0 as f64 / 65536.0, 228.9, 0.05);
}

/// Transfer function of a clear aperture: tables in optics handbooks, such as Smith, Modern Optical Engineering (from
/// memory).
#[test]
fn contrast_of_a_clear_aperture() {
    for (v, published) in [(0.1, 0.8729), (0.25, 0.6850), (0.5, 0.3910), (0.7, 0.1881), (0.9, 0.0374)] {
        near(contrast(v, 0.0f64).unwrap(), published, 5e-5);
        near(contrast(v as f32, 0.0f32).unwrap() as f64, published, 6e-5);
        let fixed = contrast_fx(Q16((v * 65536.0f64).round() as u32), Q16(0)).unwrap();
        near(fixed.0 as f64 / 65536.0, published, 8e-5);
    }
}

/// Numerical integration of the shared area, without the closed form: annular_mtf.py, with mpmath.
#[test]
fn contrast_of_annular_apertures() {
    let mut count = 0;
    for line in include_str!("annular_mtf.csv").lines().skip(1) {
        let [v, e, published] = line.split(',').map(|x| x.parse().unwrap()).collect::<Vec<f64>>()[..] else {
            panic!("{line}");
        };
        near(contrast(v, e).unwrap(), published, 2e-13);
        near(contrast(v as f32, e as f32).unwrap() as f64, published, 4e-6);
        let fixed = contrast_fx(Q16((v * 65536.0) as u32), Q16((e * 65536.0) as u32)).unwrap();
        near(fixed.0 as f64, published * 65536.0, 0.51);
        count += 1;
    }
    assert_eq!(count, 63);
}

/// Marechal's criterion, a fourteenth of a wave rms: Born and Wolf, Principles of Optics, 9.3; 0.8176 by the exponential.
#[test]
fn strehl_ratio_of_a_fourteenth_of_a_wave() {
    near(strehl_ratio(1.0f64, 14.0).unwrap(), 0.8176, 5e-5);
    near(strehl_ratio_fx(Nanometres(40), Nanometres(560)).unwrap().0 as f64 / 65536.0, 0.8176, 6e-5);
}

/// Seeing of 1.01 arcsec for r0 of 10 cm at 500 nm: Dierickx, Journal of Modern Optics 39, 569 (1992), and in every
/// introduction to adaptive optics (from memory).
#[test]
fn fried_parameter_of_a_second_of_arc() {
    let parameter = fried_parameter_fx(Microarcseconds(1_010_700), Nanometres(500)).unwrap();
    near(parameter.0 as f64 / 1e3, 100.0, 0.05);
    near(fried_parameter(1.01f64, 500.0).unwrap(), 100.0, 0.1);
}

/// Kolmogorov turbulence widens images by the 3/5 power of the airmass: 1.28 at 1.5, 1.52 at 2 (Roddier, Progress in
/// Optics 19, 281 (1981); the values by hand).
#[test]
fn seeing_at_two_airmasses() {
    for (airmass_q16, ratio) in [(65_536, 1.0), (98_304, 1.275), (131_072, 1.516)] {
        let width = seeing_at_airmass_fx(Microarcseconds(1_000_000), Q16(airmass_q16)).unwrap();
        near(width.0 as f64 * 1e-6, ratio, 5e-4);
    }
}

/// The diagonal of a box of 3, 4 and 12 is 13 (Euclid I.47 twice).
#[test]
fn combined_fwhm_of_whole_numbers() {
    let [a, b, c] = [3_000_000, 4_000_000, 12_000_000].map(Microarcseconds);
    assert_eq!(combined_fwhm_fx(a, b, c), Ok(Microarcseconds(13_000_000)));
    near(combined_fwhm(3.0f64, 4.0, 12.0).unwrap(), 13.0, 0.0);
}
