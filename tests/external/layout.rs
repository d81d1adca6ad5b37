use super::near;
use fieldstop::optics::field::plate_scale;
use fieldstop::optics::layout::*;
use fieldstop::units::{Micrometres, SignedBam, SignedMicrometres};

/// The fixed form within a step and the tolerance of the published value, the float form within the tolerance.
#[track_caller]
fn check(fixed: u32, steps: f64, float: f64, published: f64, tolerance: f64) {
    near(float, published, tolerance);
    near(fixed as f64 / steps, published, tolerance + 1.0 / steps);
}

fn um(mm: f64) -> Micrometres {
    Micrometres((mm * 1000.0).round() as u32)
}

/// The fixed form in micrometres and the float form in millimetres of the same call.
macro_rules! both {
    ($fixed:ident, $float:ident, $($mm:expr),*) => {
        ($fixed($(um($mm)),*).unwrap().0, $float($($mm),*).unwrap())
    };
}

#[test]
fn a_published_two_mirror_design() {
    // Schroeder, Astronomical Optics, an f/24 telescope of 2.4 m (from memory): primary 5.52 m, system 57.6 m, back
    // focus 1.5 m; the mirrors 4.906 m apart, the second one's radius 1.358 m, its marginal ray at 0.1112 of the
    // primary's, 3.58 arcsec to the millimetre.
    let (primary, system, back) = (5520.0, 57_600.0, 1500.0);
    let (fixed, float) = both!(secondary_separation_fx, secondary_separation, primary, system, back);
    check(fixed, 1e3, float, 4906.0, 0.5);
    let (fixed, float) = both!(secondary_radius_fx, secondary_radius, primary, system, back);
    check(fixed, 1e3, float, 1358.0, 0.5);
    let (fixed, float) = both!(secondary_diameter_fx, secondary_diameter, 2400.0, primary, system, back);
    check(fixed, 1e3, float, 2400.0 * 0.1112, 2400.0 * 0.00005);
    let (fixed, float) = both!(secondary_magnification_fx, secondary_magnification, primary, system);
    check(fixed, 65536.0, float, 10.43, 0.005);
    near(plate_scale(system).unwrap(), 3.58, 0.005);
}

#[test]
fn the_second_mirror_obeys_the_mirror_equation() {
    // Hecht, Optics, 1 / s + 1 / s' = -2 / R: the primary's focus is a virtual object for the convex mirror, and its
    // image lies behind the primary.
    for (primary, system, back) in [(600.0, 3000.0, 150.0), (750.0, 2000.0, 0.0), (400.0, 401.0, 60.0)] {
        let separation: f64 = secondary_separation(primary, system, back).unwrap();
        let (before_focus, after) = (primary - separation, separation + back);
        let published = 2.0 / (1.0 / before_focus - 1.0 / after);
        let (fixed, float) = both!(secondary_radius_fx, secondary_radius, primary, system, back);
        check(fixed, 1e3, float, published, published * 1e-9);
        // And it magnifies by the ratio of the two distances.
        let (fixed, float) = both!(secondary_magnification_fx, secondary_magnification, primary, system);
        check(fixed, 65536.0, float, after / before_focus, 1e-11);
    }
}

#[test]
fn the_second_mirror_takes_in_the_field() {
    // The rays of an edge of the field through both rims of the primary, traced to the second mirror's plane: the
    // lowest and the highest, twice the higher is the diameter.
    let (aperture, primary, system, back, field) = (200.0, 600.0, 2400.0, 150.0, 30.0);
    let (separation, separation_mm) =
        both!(secondary_separation_fx, secondary_separation, primary, system, back);
    near(separation as f64 / 1e3, separation_mm, 0.001);
    let slope = field / 2.0 / system; // the edge of the field, seen from the sky
    let height = aperture / 2.0 + separation_mm * (slope - aperture / 2.0 / primary);
    let (on_axis, on_axis_mm) =
        both!(secondary_diameter_fx, secondary_diameter, aperture, primary, system, back);
    let (margin, margin_mm) =
        both!(secondary_field_margin_fx, secondary_field_margin, primary, system, back, field);
    check(on_axis + margin, 1e3, on_axis_mm + margin_mm, 2.0 * height, 1e-9);
}

/// The cone between the primary's rim and the edge of the lit field, ray by ray, on a plane at 45 degrees: every ray is
/// inside the ellipse, and two of them at its ends.
#[test]
fn rays_on_a_diagonal() {
    for (aperture, focal_length, distance, field) in
        [(203.0f64, 1219.0f64, 280.0f64, 12.0f64), (300.0, 1200.0, 250.0, 30.0), (150.0, 160.0, 90.0, 0.0)]
    {
        let (minor, minor_mm) =
            both!(diagonal_minor_axis_fx, diagonal_minor_axis, aperture, focal_length, distance, field);
        let (offset, offset_mm) =
            both!(diagonal_offset_fx, diagonal_offset, aperture, focal_length, distance, field);
        let (mut widest, mut ends) = (0.0f64, [0.0f64; 2]);
        for step in 0..7200 {
            let (sine, cosine) = (step as f64 * std::f64::consts::PI / 3600.0).sin_cos();
            // From (D/2) (cos, sin) at the primary to (F/2) (cos, sin) at the focus; the plane leans toward the focuser,
            // x rises with the distance from the primary.
            let centre = focal_length - distance;
            let radius = |z: f64| aperture / 2.0 + (field - aperture) / 2.0 * z / focal_length;
            // x = radius(z) cosine = z - centre, linear in z.
            let narrowing = (aperture - field) / 2.0 / focal_length;
            let z = (centre + aperture / 2.0 * cosine) / (1.0 + narrowing * cosine);
            let (x, y) = (radius(z) * cosine, radius(z) * sine);
            let along = (x + offset_mm) / (minor_mm / 2.0); // in the minor axis, since the major one leans by 45 degrees
            let across = y / (minor_mm / 2.0);
            widest = widest.max(along.hypot(across));
            ends = [ends[0].min(x), ends[1].max(x)];
        }
        near(widest, 1.0, 1e-9);
        check(minor, 1e3, minor_mm, ends[1] - ends[0], 1e-9);
        // Toward the primary, which is away from the focuser, on this side of the plane.
        check(offset, 1e3, offset_mm, -(ends[0] + ends[1]) / 2.0, 1e-9);
    }
}

#[test]
fn diagonals_by_rule_of_thumb() {
    // Minor axis F + L (D - F) / f and offset a quarter of the minor axis over the focal ratio (common practice, as in
    // Texereau, How to Make a Telescope; from memory): within the square of the cone's slope.
    let (aperture, focal_length, distance, field) = (203.2, 1219.2, 254.0, 12.7);
    let rule = field + distance * (aperture - field) / focal_length;
    let (minor, minor_mm) =
        both!(diagonal_minor_axis_fx, diagonal_minor_axis, aperture, focal_length, distance, field);
    check(minor, 1e3, minor_mm, rule, rule * 0.007);
    let (offset, offset_mm) =
        both!(diagonal_offset_fx, diagonal_offset, aperture, focal_length, distance, field);
    check(offset, 1e3, offset_mm, rule / 4.0 / 6.0, 0.15);
}

#[test]
fn beams_by_similar_triangles() {
    // A quarter of the way before the focus the beam is a quarter as wide, and three quarters as far off the axis as
    // its image point (geometry).
    let (fixed, float) = both!(beam_width_fx, beam_width, 203.2, 1219.2, 304.8);
    check(fixed, 1e3, float, 50.8, 1e-12);
    let (fixed, float) = both!(beam_shift_fx, beam_shift, 10.0, 1219.2, 304.8);
    check(fixed, 1e3, float, 7.5, 1e-12);
}

#[track_caller]
fn check_share(beam: f64, stop: f64, offset: f64, published: f64, tolerance: f64) {
    let (fixed, float) = both!(illumination_fx, illumination, beam, stop, offset);
    // The fixed form's lengths are rounded to micrometres.
    check(fixed, 65536.0, float, published, tolerance);
}

#[test]
fn discs_that_overlap() {
    let pi = std::f64::consts::PI;
    // Equal discs, one through the other's centre: 2/3 - sqrt 3 / 2 pi (CRC Standard Mathematical Tables, the lens).
    check_share(100.0, 100.0, 50.0, 2.0 / 3.0 - 3f64.sqrt() / (2.0 * pi), 1e-14);
    // They share half of their area at 0.8079455 radii (published with the problem's name, "circle and circle
    // intersection"; from memory).
    check_share(1000.0, 1000.0, 403.97275, 0.5, 1e-7);
    // The goat that grazes half a round meadow from its fence has a rope of 1.1587284730 radii (OEIS A133731; from
    // memory).
    check_share(2000.0, 2317.456946, 1000.0, 0.5, 1e-9);
    // A stop far larger is a straight edge: half of a beam on its rim, 0.1955 with the edge half a radius from the
    // centre (CRC Standard Mathematical Tables, circular segments: 0.6142 of the radius squared).
    check_share(1.0, 100_000.0, 50_000.0, 0.5, 3e-6);
    check_share(1.0, 100_000.0, 50_000.25, 0.1955, 5e-5);
}

/// The area in strips across the line of the centres.
#[test]
fn discs_in_strips() {
    for (beam, stop, offset) in [
        (50.0f64, 60.0f64, 17.0f64),
        (60.0, 50.0, 17.0),
        (40.0, 40.0, 3.0),
        (80.0, 20.0, 35.0),
        (20.0, 90.0, 40.0),
    ] {
        let (b, s, strips) = (beam / 2.0, stop / 2.0, 2_000_000);
        let half = |radius: f64, x: f64| (radius * radius - x * x).max(0.0).sqrt();
        let step = beam / strips as f64;
        let area: f64 = (0..strips)
            .map(|k| -b + (k as f64 + 0.5) * step)
            .map(|x| 2.0 * step * half(b, x).min(half(s, x - offset)))
            .sum();
        check_share(beam, stop, offset, area / (std::f64::consts::PI * b * b), 1e-8);
    }
}

#[test]
fn the_tube_swings() {
    // 5-12-13: a reach of 1.2 m and a tube of a metre.
    let (fixed, float) = both!(swing_radius_fx, swing_radius, 1200.0, 1000.0);
    check(fixed, 1e3, float, 1300.0, 1e-12);
}

#[test]
fn the_eyepiece_rises() {
    // Sines to five places from any table, such as CRC Standard Mathematical Tables.
    for (degrees, sine) in [
        (0.0, 0.0),
        (15.0, 0.25882),
        (30.0, 0.5),
        (37.0, 0.60182),
        (44.0, 0.69466),
        (60.0, 0.86603),
        (89.0, 0.99985),
        (90.0, 1.0),
    ] {
        for reach in [1500.0, -1500.0] {
            let altitude = SignedBam((degrees / 360.0 * 2f64.powi(32)).round() as i32);
            let reach_um = SignedMicrometres((reach * 1e3) as i32);
            let fixed = eyepiece_height_fx(um(1600.0), reach_um, altitude).unwrap().0;
            let float = eyepiece_height(1600.0, reach, degrees).unwrap();
            check(fixed, 1e3, float, 1600.0 + reach * sine, 1500.0 * 0.000005);
        }
    }
}
