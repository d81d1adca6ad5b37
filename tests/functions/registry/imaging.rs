use super::super::big::{Big, big, radian};
use super::*;

/// Twice the tangent of half an angle in arcseconds.
fn twice_half_tangent(x: &Big) -> Big {
    big(2.0) * (x / (big(2.0) * radian())).tan()
}

const SIGNED_Q16: Unit = unit(65536.0, i32::MIN as i64, i32::MAX as i64);

const PIXEL: Argument = positive("pixel_nm", NM, (1_000, 15_000));
const PIXEL_SCALE: Argument = positive("pixel_scale_uas", UAS, (200_000, 5_000_000));
const HALF_TURN: i64 = 648_000_000;

pub fn rows() -> Vec<Row> {
    vec![
        row!(imaging::pixels_per_fwhm [0 positive("fwhm_uas", UAS, (500_000, 6_000_000)), 1 PIXEL_SCALE] -> Q16, RATIONAL, 2.0,
            |a| &a[0] / &a[1],
            pixels_per_fwhm_fx fieldstop_pixels_per_fwhm_fx fieldstop_pixels_per_fwhm_f32 fieldstop_pixels_per_fwhm_f64),
        row!(imaging::nyquist_pixel [0 FOCAL_LENGTH, 1 APERTURE, 2 WAVELENGTH] -> NM, RATIONAL, 2.0,
            |a| &a[0] * &a[2] / (big(2000.0) * &a[1]),
            nyquist_pixel_fx fieldstop_nyquist_pixel_fx fieldstop_nyquist_pixel_f32 fieldstop_nyquist_pixel_f64),
        row!(imaging::focal_length_for_pixel_scale [0 PIXEL, 1 PIXEL_SCALE] -> UM, IRRATIONAL, 2.0,
            |a| radian() * &a[0] / (big(1000.0) * &a[1]),
            focal_length_for_pixel_scale_fx fieldstop_focal_length_for_pixel_scale_fx fieldstop_focal_length_for_pixel_scale_f32 fieldstop_focal_length_for_pixel_scale_f64),
        row!(imaging::diagonal_field [0 PIXEL, 1 positive("columns", COUNT_16, (500, 10_000)), 2 positive("rows", COUNT_16, (500, 10_000)), 3 FOCAL_LENGTH] -> MAS, TRANSCENDENTAL, 3.0,
            |a| {
                let diagonal = (&a[1] * &a[1] + &a[2] * &a[2]).sqrt();
                big(2.0) * radian() * (&a[0] * diagonal / (big(2000.0) * &a[3])).atan()
            },
            diagonal_field_fx fieldstop_diagonal_field_fx fieldstop_diagonal_field_f32 fieldstop_diagonal_field_f64),
        row!(imaging::image_size [0 positive("field_mas", MAS, (30_000, 7_200_000)).under(HALF_TURN), 1 FOCAL_LENGTH] -> NM, TRANSCENDENTAL, 3.0,
            |a| big(1000.0) * &a[1] * twice_half_tangent(&a[0]),
            image_size_fx fieldstop_image_size_fx fieldstop_image_size_f32 fieldstop_image_size_f64),
        row!(imaging::exposure_stops [0 positive("from_focal_ratio_q16", Q16, (2 << 16, 16 << 16)), 1 positive("to_focal_ratio_q16", Q16, (2 << 16, 16 << 16))] -> SIGNED_Q16, TRANSCENDENTAL, 3.0,
            |a| big(2.0) * (&a[1] / &a[0]).ln() / big(2.0).ln(),
            exposure_stops_fx fieldstop_exposure_stops_fx fieldstop_exposure_stops_f32 fieldstop_exposure_stops_f64),
    ]
}
