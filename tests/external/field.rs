use super::near;
use fieldstop::optics::field;
use fieldstop::units::*;

/// Degrees from milliarcseconds.
fn degrees(angle: Milliarcseconds) -> f64 {
    angle.0 as f64 / 3.6e6
}

/// Arcseconds in a radian, 206264.806: Allen's Astrophysical Quantities, 4th edition, table of constants (from memory).
#[test]
fn plate_scale_of_a_metre_is_a_thousandth_of_a_radian() {
    near(field::plate_scale_fx(Micrometres(1_000_000)).unwrap().0 as f64 / 1e3, 206.264806, 5e-4);
    near(field::plate_scale(1000.0f64).unwrap(), 206.264806, 5e-7);
}

/// A system of 57.6 m has 3.58 arcsec per mm: Schroeder, Astronomical Optics (from memory).
#[test]
fn plate_scale_of_a_large_two_mirror_system() {
    near(field::plate_scale_fx(Micrometres(57_600_000)).unwrap().0 as f64 / 1e3, 3.58, 5e-3);
}

/// A pixel of 9 um behind 2000 mm: 206.265 * 9 / 2000 = 0.928 arcsec, the rule printed with every camera (common practice).
#[test]
fn pixel_scale_by_the_rule_of_206265() {
    near(
        field::pixel_scale_fx(Nanometres(9_000), Micrometres(2_000_000)).unwrap().0 as f64 / 1e6,
        0.928,
        5e-4,
    );
}

/// Angles of view of a 36 by 24 mm frame: tables in photographic handbooks (from memory), to a tenth of a degree.
#[test]
fn angle_of_view_of_a_36_by_24_frame() {
    let frame = [(20, 84.0, 61.9), (24, 73.7, 53.1), (50, 39.6, 27.0), (85, 23.9, 16.1), (200, 10.3, 6.9)];
    for (focal_length_mm, wide, high) in frame {
        let f = Micrometres(focal_length_mm * 1000);
        near(degrees(field::frame_field_fx(Nanometres(4_000), 9_000, f).unwrap()), wide, 0.051);
        near(degrees(field::frame_field_fx(Nanometres(4_000), 6_000, f).unwrap()), high, 0.051);
    }
}

/// Exit pupils of binoculars, aperture over magnification: ISO 14132-1, terms (from memory); 7x50 has 7.1 mm, 8x30 3.75 mm,
/// 10x50 5.0 mm.
#[test]
fn exit_pupils_of_binoculars() {
    for (magnification, aperture_mm, pupil_mm) in [(7, 50, 7.14), (8, 30, 3.75), (10, 50, 5.0)] {
        let (f, fe) = (Micrometres(magnification * 20_000), Micrometres(20_000));
        near(field::magnification_fx(f, fe).unwrap().0 as f64 / 65536.0, magnification as f64, 1e-5);
        let pupil = field::exit_pupil_fx(Micrometres(aperture_mm * 1000), f, fe).unwrap();
        near(pupil.0 as f64 / 1e3, pupil_mm, 5e-3);
    }
}

/// True field as a width at 1000 m, how binoculars are marked: 131 m is 7.5 degrees, 105 m is 6.0 (from memory).
#[test]
fn field_as_a_width_at_a_kilometre() {
    for (width, angle) in [(131, 7.5), (105, 6.0), (114, 6.5)] {
        near(
            degrees(field::true_field_from_stop_fx(Micrometres(width), Micrometres(1000)).unwrap()),
            angle,
            0.03,
        );
    }
}

/// ISO 14132-1 (from memory): the tangent of half the apparent field is the magnification times that of half the true one;
/// 8x with 7.5 degrees has 55.3 degrees, and 60 by the older rule of equal angles.
#[test]
fn apparent_field_by_the_standard_and_by_the_older_rule() {
    let (f, fe) = (Micrometres(160_000), Micrometres(20_000));
    let standard = field::true_field_rectilinear_fx(Milliarcseconds(199_080_000), f, fe).unwrap();
    near(degrees(standard), 7.5, 0.01);
    let older = field::true_field_equidistant_fx(Milliarcseconds(216_000_000), f, fe).unwrap();
    near(degrees(older), 7.5, 1e-6);
}

/// The Moon's image is some 9 mm to the metre of focal length (common practice): 31' over 9.02 mm.
#[test]
fn focal_length_that_shows_the_moon() {
    let f = field::focal_length_for_field_fx(Micrometres(9_018), Milliarcseconds(31 * 60_000)).unwrap();
    near(f.0 as f64 / 1e6, 1.0, 1e-3);
}

/// The thin-lens equation 1/s + 1/s' = 1/f with the lateral magnification -s'/s (Hecht, Optics, 5.2): for a lens of
/// -100 mm and an image 80 mm behind it the object is virtual, 44.4 mm behind it, and the image is 1.8 times as large.
#[test]
fn amplification_by_the_thin_lens_equation() {
    for (f, image) in [(-100.0, 80.0), (-50.0, 50.0), (200.0, 80.0)] {
        let object = 1.0 / (1.0 / f - 1.0 / image);
        let lateral: f64 = -image / object;
        let k = field::amplification_fx(
            SignedMicrometres((f * 1000.0) as i32),
            Micrometres((image * 1000.0) as u32),
        );
        near(k.unwrap().0 as f64 / 65536.0, lateral, 1e-5);
    }
}
