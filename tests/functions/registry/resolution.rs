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

pub fn rows() -> Vec<Row> {
    vec![
        row!(resolution::rayleigh_limit [0 APERTURE, 1 WAVELENGTH] -> UAS, IRRATIONAL, 2.0,
            |a| angle(j11() / pi(), &a[1], &a[0]),
            rayleigh_limit_fx fieldstop_rayleigh_limit_fx fieldstop_rayleigh_limit_f32
            fieldstop_rayleigh_limit_f64),
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
    ]
}
