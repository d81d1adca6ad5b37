use super::near;
use fieldstop::optics::focus::*;
use fieldstop::units::{
    Micrometres, Milliarcseconds, Millimetres, Nanometres, PartsPerBillionPerKelvin, Q16, SignedMillikelvin,
    SignedPartsPerBillionPerKelvin,
};

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

fn nm(um: f64) -> Nanometres {
    Nanometres((um * 1000.0).round() as u32)
}

#[test]
fn a_quarter_wave() {
    // Born and Wolf, Principles of Optics: a quarter wave of defocus is 2 lambda N^2 from the focus: 64 um at f/8 and
    // 500 nm. In the middle of the visible it is nearly N^2 micrometres (rule of thumb in Smith, Modern Optical
    // Engineering; from memory).
    for (ratio, wavelength, published, tolerance) in
        [(8.0, 500, 64.0, 1e-12), (10.0, 500, 100.0, 1e-12), (4.0, 550, 16.0, 1.7), (15.0, 550, 225.0, 23.0)]
    {
        let fixed = depth_of_focus_fx(q16(ratio), Nanometres(wavelength)).unwrap().0;
        let float = depth_of_focus(ratio, wavelength as f64).unwrap();
        check(fixed as i64, 1e3, float, published, tolerance);
    }
    // And 64 um there are a quarter of 500 nm, from crest to trough.
    let fixed = defocus_wavefront_fx(nm(64.0), q16(8.0)).unwrap().0;
    check(fixed as i64, 1.0, defocus_wavefront(64.0, 8.0).unwrap(), 125.0, 1e-12);
}

/// The wavefront's error by its own definition: a sphere's sagitta at the edge of the pupil less that of the sphere
/// with its centre moved.
#[test]
fn wavefront_is_the_difference_of_two_sagittas() {
    let (focal_length, aperture) = (1000.0f64, 125.0f64);
    let sagitta = |radius: f64| {
        let half = aperture / 2.0;
        half * half / (radius + (radius * radius - half * half).sqrt())
    };
    let published = (sagitta(focal_length - 0.05) - sagitta(focal_length)) * 1e6; // nm
    let fixed = defocus_wavefront_fx(nm(50.0), q16(8.0)).unwrap().0;
    check(fixed as i64, 1.0, defocus_wavefront(50.0, 8.0).unwrap(), published, published * 0.004);
}

#[test]
fn blur_of_a_cone() {
    // Similar triangles (Smith, Modern Optical Engineering): 64 um from the focus of f/8 the cone is 8 um wide, less
    // than the Airy disc of 2.44 lambda N = 9.76 um.
    let fixed = defocus_blur_fx(nm(64.0), q16(8.0)).unwrap().0;
    check(fixed as i64, 1e3, defocus_blur(64.0, 8.0).unwrap(), 8.0, 1e-12);
    // A focuser of 200 steps a turn on a screw of 1 mm pitch: 5 um a step (common practice).
    assert_eq!(motor_steps_fx(nm(64.0), nm(5.0)), Ok(13));
    near(motor_steps(64.0, 5.0).unwrap(), 12.8, 1e-12);
}

#[test]
fn metals_grow() {
    let shift = |length_mm: f64, ppb: i32, mk: i32, published, tolerance| {
        let (a, dt) = (SignedPartsPerBillionPerKelvin(ppb), SignedMillikelvin(mk));
        let fixed = thermal_shift_fx(um(length_mm), a, dt).unwrap().0;
        let float = thermal_shift(length_mm, ppb as f64 / 1e3, mk as f64 / 1e3).unwrap();
        check(fixed as i64, 1e3, float, published, tolerance);
    };
    // CRC Handbook of Chemistry and Physics, linear expansion at 25 C in ppm per K: aluminium 23.1, iron 11.8
    // (from memory). A tube of a metre that cools by ten kelvin:
    shift(1000.0, 23_100, -10_000, -231.0, 1e-10);
    shift(1000.0, 11_800, -10_000, -118.0, 1e-10);
    // A steel tape of 50 m is 50.009 m long at 35 C instead of 20 C, at 12 ppm per K (Young and Freedman, University
    // Physics; from memory).
    shift(50_000.0, 12_000, 15_000, 9_000.0, 1e-9);
    // A steel bridge of 1 km grows by 33 cm in 30 K, at 11 ppm per K (Tipler, Physics; from memory).
    shift(1_000_000.0, 11_000, 30_000, 330_000.0, 1e-7);
}

#[test]
fn the_night_gets_colder() {
    // The depth of focus of f/8, 64 um, over 23.1 um a kelvin of an aluminium tube of a metre: 2.77 K.
    let fixed = refocus_temperature_fx(um(1000.0), PartsPerBillionPerKelvin(23_100), nm(64.0)).unwrap().0;
    check(fixed as i64, 1e3, refocus_temperature(1000.0, 23.1, 64.0).unwrap(), 2.77, 0.001);
}

#[test]
fn lens_equation_of_a_near_object() {
    // Hecht, Optics: 1 / s + 1 / s' = 1 / f.
    for (f, s) in [(100.0f64, 0.3), (1000.0, 11.0), (1220.0, 50.0), (400.0, 0.801)] {
        let image = 1.0 / (1.0 / f - 1.0 / (s * 1e3));
        let fixed = near_focus_travel_fx(um(f), Millimetres((s * 1e3_f64).round() as u32)).unwrap().0;
        check(fixed as i64, 1e3, near_focus_travel(f, s).unwrap(), image - f, 1e-9);
    }
    // At twice the focal length the image is as far (any textbook).
    assert_eq!(near_focus_travel_fx(um(500.0), Millimetres(1000)), Ok(um(500.0)));
}

#[test]
fn coma_of_a_paraboloid() {
    // Schroeder, Astronomical Optics: 3 t / 16 N^2 is 4.5 arcsec at f/5 and 10 arcmin (from memory).
    let fixed = coma_length_fx(Milliarcseconds(600_000), q16(5.0)).unwrap().0;
    check(fixed as i64, 1e6, coma_length(600.0, 5.0).unwrap(), 4.5, 1e-12);
}

/// Rays at an angle to the axis, reflected by the paraboloid z = r^2 / 4f at the law of reflection: where those of the
/// rim and the one of the vertex cross the focal plane.
#[test]
fn coma_of_traced_rays() {
    let (f, ratio, off_axis_arcsec) = (1000.0f64, 6.0f64, 120.0f64);
    let angle = off_axis_arcsec / 206_264.806;
    let crossing = |y: f64| {
        let direction = (-angle.sin(), -angle.cos());
        let z = y * y / (4.0 * f);
        let normal = (-y / (2.0 * f), 1.0);
        let length = normal.0 * normal.0 + normal.1 * normal.1;
        let along = 2.0 * (direction.0 * normal.0 + direction.1 * normal.1) / length;
        let (dy, dz) = (direction.0 - along * normal.0, direction.1 - along * normal.1);
        y + dy * (f - z) / dz
    };
    let rim = f / ratio / 2.0;
    let length = ((crossing(rim) + crossing(-rim)) / 2.0 - crossing(0.0)).abs() / f * 206_264.806;
    let fixed = coma_length_fx(Milliarcseconds((off_axis_arcsec * 1e3) as u32), q16(ratio)).unwrap().0;
    check(fixed as i64, 1e6, coma_length(off_axis_arcsec, ratio).unwrap(), length, length * 0.01);
}
