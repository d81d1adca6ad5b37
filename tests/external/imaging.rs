use super::near;
use fieldstop::optics::imaging::*;
use fieldstop::units::*;

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

fn uas(arcsec: f64) -> Microarcseconds {
    Microarcseconds((arcsec * 1e6).round() as u32)
}

fn mas(arcsec: f64) -> Milliarcseconds {
    Milliarcseconds((arcsec * 1e3).round() as u32)
}

/// A Gaussian of standard deviation s is 2.3548 s wide at half maximum (any text on statistics): with s of 1.5 pixels
/// the star is 3.53 pixels wide.
#[test]
fn width_of_a_gaussian_in_pixels() {
    let fwhm = 0.8 * 1.5 * (8.0 * 2.0f64.ln()).sqrt();
    let fixed = pixels_per_fwhm_fx(uas(fwhm), uas(0.8)).unwrap().0;
    check(fixed as i64, 65536.0, pixels_per_fwhm(fwhm, 0.8).unwrap(), 3.5322, 1e-4);
}

#[test]
fn pixel_at_the_cutoff() {
    let pixel = |f: f64, d: f64, wavelength: u32, published: f64, tolerance: f64| {
        let fixed = nyquist_pixel_fx(um(f), um(d), Nanometres(wavelength)).unwrap().0;
        check(fixed as i64, 1e3, nyquist_pixel(f, d, wavelength as f64).unwrap(), published, tolerance);
    };
    // Critical sampling has lambda N / p = 2 (Fiete, Optical Engineering 38, 1174 (1999); from memory): 2.5 um at f/10
    // and 500 nm.
    pixel(1000.0, 100.0, 500, 2.5, 1e-12);
    // N / 4 micrometres in the middle of the visible, within a seventh (common practice).
    pixel(1600.0, 200.0, 550, 2.0, 0.3);
}

/// The transfer function is the pupil against itself (Goodman, Introduction to Fourier Optics): for a detail of period P
/// the pupils lie lambda f / P apart, and the circles no longer overlap just where two of our pixels are shorter than P.
#[test]
fn nothing_is_finer_than_two_pixels() {
    let (f, d, wavelength) = (1130.0f64, 187.5f64, 550.0f64);
    let pixel = nyquist_pixel(f, d, wavelength).unwrap();
    let overlap = |period_um: f64| {
        let apart = wavelength * 1e-6 * f / (period_um * 1e-3);
        let steps = 2000;
        (0..steps)
            .map(|i| (i as f64 + 0.5) / steps as f64 * d - d / 2.0)
            .filter(|x| (x - apart).abs() < d / 2.0)
            .count()
    };
    assert_eq!(overlap(2.0 * pixel * 0.999), 0);
    assert!(overlap(2.0 * pixel * 1.001) > 0);
}

#[test]
fn focal_length_by_the_rule_of_206265() {
    // 206.265 p / scale, the rule printed with every camera (common practice): 9 um and an arcsecond, 1856 mm.
    for (pixel, scale, published) in [(9.0, 1.0, 1856.385), (3.76, 0.5, 1551.113), (5.4, 2.0, 556.916)] {
        let fixed = focal_length_for_pixel_scale_fx(Nanometres((pixel * 1e3) as u32), uas(scale)).unwrap().0;
        let float = focal_length_for_pixel_scale(pixel, scale).unwrap();
        check(fixed as i64, 1e3, float, published, 0.01);
    }
}

#[test]
fn diagonal_angle_of_view() {
    // Diagonal angles of view of a 36 by 24 mm frame: tables in photographic handbooks (from memory), to a tenth of a
    // degree.
    for (focal_length, degrees) in [(20.0, 94.5), (24.0, 84.1), (35.0, 63.4), (50.0, 46.8), (200.0, 12.3)] {
        let fixed = diagonal_field_fx(Nanometres(4_000), 9_000, 6_000, um(focal_length)).unwrap().0;
        let float = diagonal_field(4.0, 9_000, 6_000, focal_length).unwrap() / 3600.0;
        check(fixed as i64, 3.6e6, float, degrees, 0.051);
    }
    // Geometry: 3-4-5, and a diagonal of twice the focal length is a right angle.
    let fixed = diagonal_field_fx(Nanometres(10_000), 3_000, 4_000, um(25.0)).unwrap().0;
    check(fixed as i64, 1e3, diagonal_field(10.0, 3_000, 4_000, 25.0).unwrap(), 324_000.0, 1e-9);
}

#[test]
fn images_of_the_sun_and_the_moon() {
    let size = |arcsec: f64, f: f64, published: f64, tolerance: f64| {
        let fixed = image_size_fx(mas(arcsec), um(f)).unwrap().0;
        check(fixed as i64, 1e3, image_size(arcsec, f).unwrap(), published, tolerance);
    };
    // The Moon's image is some 9 mm to the metre of focal length (common practice): 31' are 9.02 mm.
    size(31.0 * 60.0, 1000.0, 9_018.0, 1.0);
    // The Sun's radius at one astronomical unit is 959.63 arcsec (Auwers 1891; Astronomical Almanac; from memory), that
    // is 695,990 km over 149,597,871 km, seen from the centre: the tangent of it is the image's radius.
    size(2.0 * 959.63, 1000.0, 2.0 * 695_990.0 / 149_597_871.0 * 1e6, 0.5);
    // Tangents of 22.5, 45, 60 and 80 degrees (any table).
    size(45.0 * 3600.0, 50.0, 41_421.356, 0.001);
    size(90.0 * 3600.0, 50.0, 100_000.0, 1e-9);
    size(120.0 * 3600.0, 50.0, 173_205.081, 0.001);
    size(160.0 * 3600.0, 50.0, 567_128.182, 0.001);
}

#[test]
fn stops_of_the_standard_series() {
    let stops = |from: f64, to: f64, published: f64, tolerance: f64| {
        let fixed = exposure_stops_fx(q16(from), q16(to)).unwrap().0;
        // The argument's own last place counts too.
        check(fixed as i64, 65536.0, exposure_stops(from, to).unwrap(), published, tolerance + 5e-5);
    };
    // ISO 517 (from memory): the marked series and the exact one, powers of the root of two.
    let marked = [1.0, 1.4, 2.0, 2.8, 4.0, 5.6, 8.0, 11.0, 16.0, 22.0, 32.0];
    for (i, pair) in marked.windows(2).enumerate() {
        stops(pair[0], pair[1], 1.0, 0.09);
        stops(pair[1], pair[0], -1.0, 0.09);
        stops(1.0, marked[i + 1], (i + 1) as f64, 0.09);
        stops(2.0, 2.0 * 2.0f64.sqrt().powi(i as i32), i as f64, 1e-12);
    }
    // Thirds of a stop: f/4, 4.5, 5.0, 5.6.
    for (third, ratio) in [(1.0, 4.5), (2.0, 5.0), (3.0, 5.6)] {
        stops(4.0, ratio, third / 3.0, 0.04);
    }
    // The light on a pixel goes by the inverse square of the focal ratio: f/10 needs four times what f/5 does.
    stops(5.0, 10.0, 2.0, 0.0);
}
