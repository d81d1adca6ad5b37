use super::near;
use fieldstop::optics::colour::*;
use fieldstop::units::{Micrometres, PartsPerMillion, Q16, RefractiveIndex};

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

fn n7(index: f64) -> RefractiveIndex {
    RefractiveIndex((index * 1e7).round() as u32)
}

/// The lines d, F and C, micrometres: ISO 7944 (from memory).
const D: f64 = 0.5875618;
const F: f64 = 0.4861327;
const C: f64 = 0.6562725;

/// Two glasses by their constants in Sellmeier's formula (1872), as makers' data sheets give them for the codes 517642
/// and 620364 (from memory): n^2 - 1 = sum of B w^2 / (w^2 - C).
const CROWN: [[f64; 2]; 3] =
    [[1.03961212, 0.00600069867], [0.231792344, 0.0200179144], [1.01046945, 103.560653]];
const FLINT: [[f64; 2]; 3] =
    [[1.34533359, 0.00997743871], [0.209073176, 0.0470450767], [0.937357162, 111.886764]];

fn index(glass: &[[f64; 2]; 3], wavelength: f64) -> f64 {
    let square = wavelength * wavelength;
    (1.0 + glass.iter().map(|[b, c]| b * square / (square - c)).sum::<f64>()).sqrt()
}

fn abbe(d: f64, f: f64, c: f64) -> (i64, f64) {
    (abbe_number_fx(n7(d), n7(f), n7(c)).unwrap().0 as i64, abbe_number(d, f, c).unwrap())
}

/// The Abbe number of a glass by its constants.
fn abbe_of(glass: &[[f64; 2]; 3]) -> f64 {
    abbe(index(glass, D), index(glass, F), index(glass, C)).1
}

#[test]
fn glasses_of_a_data_sheet() {
    // Indices and Abbe numbers of the data sheets (from memory); the code itself is nd - 1 and ten times V.
    for (glass, [d, f, c], published) in
        [(&CROWN, [1.51680, 1.52238, 1.51432], 64.17), (&FLINT, [1.62004, 1.63208, 1.61503], 36.37)]
    {
        for (wavelength, printed) in [(D, d), (F, f), (C, c)] {
            near(index(glass, wavelength), printed, 1e-5);
        }
        // Printed to five places, the difference of two indices is good to 1 in 800.
        let (fixed, float) = abbe(d, f, c);
        check(fixed, 65536.0, float, published, 0.08);
        let (fixed, float) = abbe(index(glass, D), index(glass, F), index(glass, C));
        check(fixed, 65536.0, float, published, 0.006);
    }
}

/// Foci of a thin lens of the crown glass, by the lensmaker's equation (Hecht, Optics): with curvatures for a focal length
/// f in d it is f (nd - 1) / (n - 1), to the first order f / V apart.
#[test]
fn foci_of_a_single_lens() {
    let f = 1000.0;
    let focus = |wavelength| f * (index(&CROWN, D) - 1.0) / (index(&CROWN, wavelength) - 1.0);
    let spread = focus(C) - focus(F);
    let v = abbe_of(&CROWN);
    let fixed = singlet_colour_shift_fx(um(f), q16(v)).unwrap().0;
    check(fixed as i64, 1e3, singlet_colour_shift(f, v).unwrap(), spread, spread * 0.007);

    // Rays from the rim of an f/8 lens to the two foci: where they are as far from the axis they cross its narrowest
    // part, and its width there is seen from f.
    let (ratio, rim) = (8.0, f / 8.0 / 2.0);
    let height = |z: f64, wavelength| (rim * (1.0 - z / focus(wavelength))).abs();
    let (mut near_lens, mut beyond) = (focus(F), focus(C));
    for _ in 0..60 {
        let z = (near_lens + beyond) / 2.0;
        if height(z, F) < height(z, C) { near_lens = z } else { beyond = z }
    }
    let blur = 2.0 * height(near_lens, F) / f * 206_264.806;
    let fixed = singlet_colour_blur_fx(q16(ratio), q16(v)).unwrap().0;
    check(fixed as i64, 1e6, singlet_colour_blur(ratio, v).unwrap(), blur, blur * 0.01);
}

/// 1/60 of the focal length for ordinary crown glass, and at f/10 a blur of 1/1200 of a radian, 172 arcsec (arithmetic on
/// the rule in Kingslake, Lens Design Fundamentals; from memory).
#[test]
fn single_lens_by_the_rule() {
    let fixed = singlet_colour_shift_fx(um(900.0), q16(60.0)).unwrap().0;
    check(fixed as i64, 1e3, singlet_colour_shift(900.0, 60.0).unwrap(), 15.0, 1e-12);
    let fixed = singlet_colour_blur_fx(q16(10.0), q16(60.0)).unwrap().0;
    check(fixed as i64, 1e6, singlet_colour_blur(10.0, 60.0).unwrap(), 206_264.806_247 / 1200.0, 1e-9);
}

#[test]
fn worked_thin_achromat() {
    // A doublet of one metre of the two glasses, V 64.17 and 36.37: 433.2 and 764.4 mm (thin-lens example by the
    // equations in Hecht, Optics, 6.3.2, and Smith, Modern Optical Engineering).
    let (f, v1, v2) = (1000.0, 64.17, 36.37);
    let fixed = achromat_crown_fx(um(f), q16(v1), q16(v2)).unwrap().0;
    check(fixed as i64, 1e3, achromat_crown(f, v1, v2).unwrap(), 433.2, 0.05);
    let fixed = achromat_flint_fx(um(f), q16(v1), q16(v2)).unwrap().0;
    check(fixed as i64, 1e3, achromat_flint(f, v1, v2).unwrap(), 764.4, 0.05);
}

/// The same doublet by the lensmaker's equation at three wavelengths: F and C meet, and d falls short of them.
#[test]
fn foci_of_an_achromat() {
    let f = 1000.0;
    let (v1, v2) = (abbe_of(&CROWN), abbe_of(&FLINT));
    let (crown, flint) = (achromat_crown(f, v1, v2).unwrap(), achromat_flint(f, v1, v2).unwrap());
    let power = |wavelength| {
        let of = |glass, f: f64| (index(glass, wavelength) - 1.0) / (index(glass, D) - 1.0) / f;
        of(&CROWN, crown) - of(&FLINT, flint)
    };
    let focus = |wavelength| 1.0 / power(wavelength);
    near(focus(D), f, 1e-6);
    near(focus(F) - focus(C), 0.0, 1e-6);
    let partial = |glass| (index(glass, F) - index(glass, D)) / (index(glass, F) - index(glass, C));
    let (d_p, d_v) = ((partial(&FLINT) - partial(&CROWN)).abs(), v1 - v2);
    let short = focus(F) - focus(D);
    let fixed =
        secondary_spectrum_fx(um(f), PartsPerMillion((d_p * 1e6).round() as u32), q16(d_v)).unwrap().0;
    check(fixed as i64, 1e3, secondary_spectrum(f, d_p, d_v).unwrap(), short, short * 0.002);
    // About 1/2000 of the focal length for a doublet of ordinary glasses (Conrady, Applied Optics and Optical Design; from
    // memory).
    check(fixed as i64, 1e3, secondary_spectrum(f, d_p, d_v).unwrap(), f / 2000.0, 0.08);
}
