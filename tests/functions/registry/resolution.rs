use super::*;
use crate::big::{decimal, j11, pi, radian};

const SEEING: Argument = positive("seeing_uas", UAS, (300_000, 10_000_000));

/// Arcseconds that `k` nanometres over millimetres make.
fn angle(k: Big, wavelength_nm: &Big, aperture_mm: &Big) -> Big {
    k * wavelength_nm / aperture_mm * radian() / big(1e6)
}

/// Where the second derivative of (J1(v) / v)^2 is zero, times 2 / pi.
fn sparrow() -> Big {
    decimal("0.947155252709185544503804594874827561783646115")
}

/// Where (2 J1(v) / v)^2 is 1/2, times 2 / pi.
fn half_width() -> Big {
    decimal("1.02899396996218805148057131876754548886300971")
}

/// J0 and J1 by their series, for arguments up to 4.
fn bessel(x: &Big) -> (Big, Big) {
    let quarter = -(x * x) / big(4.0);
    let (mut j0, mut j1) = (big(1.0), big(1.0));
    let (mut term0, mut term1) = (big(1.0), big(1.0));
    for k in 1..32 {
        let k = k as f64;
        term0 = term0 * &quarter / big(k * k);
        term1 = term1 * &quarter / big(k * (k + 1.0));
        j0 = j0 + &term0;
        j1 = j1 + &term1;
    }
    (j0, j1 * x / big(2.0))
}

/// The first positive root of J1(x) = e J1(e x) by Newton's method.
fn dark_ring(e: &Big) -> Big {
    let m = (big(1.0) - e) / (big(1.0) + e);
    // Within 0.01 of the root; four steps make that 10^-32.
    let mut x = (big(2.405) - big(0.489) * &m * &m) * (big(1.0) + &m);
    for _ in 0..4 {
        let inner = e * &x;
        let ((j0, j1), (i0, i1)) = (bessel(&x), bessel(&inner));
        // J1'(x) = J0(x) - J1(x) / x; the second term of d/dx (e J1(e x)) is e J1(e x) / x.
        let value = &j1 - e * &i1;
        let slope = j0 - e * e * i0 - &value / &x;
        x = x - value / slope;
    }
    x
}

const FREQUENCY: Argument = ordinary("frequency_q16", Q16, (3_000, 65_536)).within(0, 65_536);
const OBSTRUCTION_RATIO: Argument = ordinary("obstruction_q16", Q16, (6_000, 30_000)).under(65_536);
/// Twice the area of a circle's segment that is 2 t wide, over the square of its radius.
fn segment(cosine: &Big) -> Big {
    let t = cosine.acos();
    &t - t.sin() * t.cos()
}

/// The overlap of two annuli: the outer discs', less each outer disc's with the other inner one, plus the inner ones'.
pub fn contrast(v: &Big, e: &Big) -> Big {
    let (one, two) = (big(1.0), big(2.0));
    let (s, square) = (&two * v, e * e);
    let mut area = &two * segment(v);
    if v < e {
        area = area + &two * &square * segment(&(v / e));
    }
    if s <= &one - e {
        area = area - &two * pi() * &square;
    } else if s < &one + e {
        let a = (&s * &s + &one - &square) / (&two * &s);
        let b = (&s * &s + &square - &one) / (&two * &s * e);
        area = area - &two * (segment(&a) + &square * segment(&b));
    }
    area / (pi() * (one - square))
}

const RMS: Argument = ordinary("rms_nm", NM_AS_NM, (5, 200));
const AIRMASS: Argument = ordinary("airmass_q16", Q16, (65_536, 400_000)).within(65_536, 40 << 16);
const fn width(name: &'static str) -> Argument {
    ordinary(name, UAS, (300_000, 10_000_000))
}
const OBSTRUCTION: Argument = ordinary("obstruction_um", UM, (10_000, 200_000));

pub fn rows() -> Vec<Row> {
    vec![
        row!(resolution::rayleigh_limit [0 APERTURE, 1 WAVELENGTH] -> UAS, IRRATIONAL, 2.0,
            |a| angle(j11() / pi(), &a[1], &a[0]),
            rayleigh_limit_fx fieldstop_rayleigh_limit_fx fieldstop_rayleigh_limit_f32
            fieldstop_rayleigh_limit_f64),
        Row {
            owed: Owed { lsb: 1.0, part: 2e-6 },
            single_owed: FloatOwed::Part(2e-6),
            double_owed: FloatOwed::Part(2e-6),
            refuses: |i, a| i == 1 && a[1] >= a[0],
            ..row!(resolution::rayleigh_limit_obstructed [0 APERTURE, 1 OBSTRUCTION, 2 WAVELENGTH] -> UAS, RATIONAL,
                0.0, |a| angle(dark_ring(&(&a[1] / &a[0])) / pi(), &a[2], &a[0]),
                rayleigh_limit_obstructed_fx fieldstop_rayleigh_limit_obstructed_fx
                fieldstop_rayleigh_limit_obstructed_f32 fieldstop_rayleigh_limit_obstructed_f64)
        },
        row!(resolution::dawes_limit [0 APERTURE] -> UAS, RATIONAL, 2.0,
            |a| big(116.0) / &a[0],
            dawes_limit_fx fieldstop_dawes_limit_fx fieldstop_dawes_limit_f32 fieldstop_dawes_limit_f64),
        row!(resolution::sparrow_limit [0 APERTURE, 1 WAVELENGTH] -> UAS, IRRATIONAL, 2.0,
            |a| angle(sparrow(), &a[1], &a[0]),
            sparrow_limit_fx fieldstop_sparrow_limit_fx fieldstop_sparrow_limit_f32 fieldstop_sparrow_limit_f64),
        row!(resolution::airy_fwhm [0 APERTURE, 1 WAVELENGTH] -> UAS, IRRATIONAL, 2.0,
            |a| angle(half_width(), &a[1], &a[0]),
            airy_fwhm_fx fieldstop_airy_fwhm_fx fieldstop_airy_fwhm_f32 fieldstop_airy_fwhm_f64),
        row!(resolution::airy_radius [0 FOCAL_LENGTH, 1 APERTURE, 2 WAVELENGTH] -> NM, IRRATIONAL, 2.0,
            |a| j11() / pi() * &a[2] * &a[0] / &a[1] / big(1e3),
            airy_radius_fx fieldstop_airy_radius_fx fieldstop_airy_radius_f32 fieldstop_airy_radius_f64),
        row!(resolution::cutoff_frequency [0 FOCAL_LENGTH, 1 APERTURE, 2 WAVELENGTH] -> Q16, RATIONAL, 2.0,
            |a| &a[1] * big(1e6) / (&a[2] * &a[0]),
            cutoff_frequency_fx fieldstop_cutoff_frequency_fx fieldstop_cutoff_frequency_f32
            fieldstop_cutoff_frequency_f64),
        row!(resolution::fried_parameter [0 SEEING, 1 WAVELENGTH] -> UM, IRRATIONAL, 2.0,
            |a| decimal("0.98") * &a[1] / &a[0] * radian() / big(1e6),
            fried_parameter_fx fieldstop_fried_parameter_fx fieldstop_fried_parameter_f32
            fieldstop_fried_parameter_f64),
        Row {
            single_owed: FloatOwed::Absolute(|_| 4e-6),
            double_owed: FloatOwed::Absolute(|a| 1e-14 / (big(1.0) - &a[1]).to_f64()),
            ..row!(resolution::contrast [0 FREQUENCY, 1 OBSTRUCTION_RATIO] -> Q16, TRANSCENDENTAL, 0.0,
                |a| contrast(&a[0], &a[1]),
                contrast_fx fieldstop_contrast_fx fieldstop_contrast_f32 fieldstop_contrast_f64)
        },
        row!(resolution::strehl_ratio [0 RMS, 1 WAVELENGTH] -> Q16, TRANSCENDENTAL, 3.0,
            |a| {
                let phase = big(2.0) * pi() * &a[0] / &a[1];
                let square = &phase * &phase;
                // Beyond, the exponential is below the least f64.
                if square > big(800.0) { big(0.0) } else { (-square).exp() }
            },
            strehl_ratio_fx fieldstop_strehl_ratio_fx fieldstop_strehl_ratio_f32 fieldstop_strehl_ratio_f64),
        Row {
            owed: Owed { lsb: 1.0, part: 1e-6 },
            ..row!(resolution::seeing_at_airmass [0 SEEING, 1 AIRMASS] -> UAS, RATIONAL, 3.0,
                |a| &a[0] * a[1].pow(&decimal("0.6")),
                seeing_at_airmass_fx fieldstop_seeing_at_airmass_fx fieldstop_seeing_at_airmass_f32
                fieldstop_seeing_at_airmass_f64)
        },
        row!(resolution::combined_fwhm [0 width("a_uas"), 1 width("b_uas"), 2 width("c_uas")] -> UAS, RATIONAL, 2.0,
            |a| (&a[0] * &a[0] + &a[1] * &a[1] + &a[2] * &a[2]).sqrt(),
            combined_fwhm_fx fieldstop_combined_fwhm_fx fieldstop_combined_fwhm_f32 fieldstop_combined_fwhm_f64),
    ]
}
