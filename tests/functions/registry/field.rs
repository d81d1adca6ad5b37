use super::super::big::{Big, big, radian};
use super::*;

/// 2 atan(x) in arcseconds.
fn angle(x: Big) -> Big {
    big(2.0) * radian() * x.atan()
}

/// tan(x / 2) of arcseconds.
fn half_tangent(x: &Big) -> Big {
    (x / (big(2.0) * radian())).tan()
}

const AMPLIFICATION: Argument = positive("amplification_q16", Q16, (26_000, 330_000));
const APPARENT_FIELD: Argument = positive("apparent_field_mas", MAS, (108_000_000, 432_000_000));
const PIXEL: Argument = positive("pixel_nm", NM, (1_000, 15_000));
const HALF_TURN: i64 = 648_000_000;

pub fn rows() -> Vec<Row> {
    vec![
        row!(field::focal_ratio [0 FOCAL_LENGTH, 1 APERTURE] -> Q16, RATIONAL, 2.0,
            |a| &a[0] / &a[1],
            focal_ratio_fx fieldstop_focal_ratio_fx fieldstop_focal_ratio_f32 fieldstop_focal_ratio_f64),
        row!(field::amplified_focal_length [0 FOCAL_LENGTH, 1 AMPLIFICATION] -> UM, RATIONAL, 2.0,
            |a| &a[0] * &a[1],
            amplified_focal_length_fx fieldstop_amplified_focal_length_fx fieldstop_amplified_focal_length_f32 fieldstop_amplified_focal_length_f64),
        Row {
            refuses: |i, a| i == 1 && a[0] > big(0.0) && a[1] >= a[0],
            ..row!(field::amplification [0 positive("element_focal_length_um", SIGNED_UM, (20_000, 200_000)), 1 ordinary("image_distance_um", UM, (10_000, 150_000))] -> Q16, RATIONAL, 2.0,
            |a| big(1.0) - &a[1] / &a[0],
            amplification_fx fieldstop_amplification_fx fieldstop_amplification_f32 fieldstop_amplification_f64)
        },
        row!(field::magnification [0 FOCAL_LENGTH, 1 EYEPIECE] -> Q16, RATIONAL, 2.0,
            |a| &a[0] / &a[1],
            magnification_fx fieldstop_magnification_fx fieldstop_magnification_f32 fieldstop_magnification_f64),
        row!(field::exit_pupil [0 APERTURE, 1 FOCAL_LENGTH, 2 EYEPIECE] -> UM, RATIONAL, 2.0,
            |a| &a[0] * &a[2] / &a[1],
            exit_pupil_fx fieldstop_exit_pupil_fx fieldstop_exit_pupil_f32 fieldstop_exit_pupil_f64),
        row!(field::eyepiece_for_exit_pupil [0 positive("exit_pupil_um", UM, (500, 8_000)), 1 FOCAL_LENGTH, 2 APERTURE] -> UM, RATIONAL, 2.0,
            |a| &a[0] * &a[1] / &a[2],
            eyepiece_for_exit_pupil_fx fieldstop_eyepiece_for_exit_pupil_fx fieldstop_eyepiece_for_exit_pupil_f32 fieldstop_eyepiece_for_exit_pupil_f64),
        row!(field::eyepiece_for_magnification [0 FOCAL_LENGTH, 1 positive("magnification_q16", Q16, (10 << 16, 500 << 16))] -> UM, RATIONAL, 2.0,
            |a| &a[0] / &a[1],
            eyepiece_for_magnification_fx fieldstop_eyepiece_for_magnification_fx fieldstop_eyepiece_for_magnification_f32 fieldstop_eyepiece_for_magnification_f64),
        row!(field::true_field_from_stop [0 positive("field_stop_um", UM, (2_000, 47_000)), 1 FOCAL_LENGTH] -> MAS, TRANSCENDENTAL, 3.0,
            |a| angle(&a[0] / (big(2.0) * &a[1])),
            true_field_from_stop_fx fieldstop_true_field_from_stop_fx fieldstop_true_field_from_stop_f32 fieldstop_true_field_from_stop_f64),
        row!(field::true_field_rectilinear [0 APPARENT_FIELD.under(HALF_TURN), 1 FOCAL_LENGTH, 2 EYEPIECE] -> MAS, TRANSCENDENTAL, 3.0,
            |a| angle(half_tangent(&a[0]) * &a[2] / &a[1]),
            true_field_rectilinear_fx fieldstop_true_field_rectilinear_fx fieldstop_true_field_rectilinear_f32 fieldstop_true_field_rectilinear_f64),
        row!(field::true_field_equidistant [0 APPARENT_FIELD, 1 FOCAL_LENGTH, 2 EYEPIECE] -> MAS, RATIONAL, 2.0,
            |a| &a[0] * &a[2] / &a[1],
            true_field_equidistant_fx fieldstop_true_field_equidistant_fx fieldstop_true_field_equidistant_f32 fieldstop_true_field_equidistant_f64),
        row!(field::frame_field [0 PIXEL, 1 positive("pixel_count", COUNT, (500, 10_000)), 2 FOCAL_LENGTH] -> MAS, TRANSCENDENTAL, 3.0,
            |a| angle(&a[0] * &a[1] / (big(2000.0) * &a[2])),
            frame_field_fx fieldstop_frame_field_fx fieldstop_frame_field_f32 fieldstop_frame_field_f64),
        row!(field::plate_scale [0 FOCAL_LENGTH] -> MAS_PER_MM, IRRATIONAL, 2.0,
            |a| radian() / &a[0],
            plate_scale_fx fieldstop_plate_scale_fx fieldstop_plate_scale_f32 fieldstop_plate_scale_f64),
        row!(field::pixel_scale [0 PIXEL, 1 FOCAL_LENGTH] -> UAS, IRRATIONAL, 2.0,
            |a| radian() * &a[0] / (big(1000.0) * &a[1]),
            pixel_scale_fx fieldstop_pixel_scale_fx fieldstop_pixel_scale_f32 fieldstop_pixel_scale_f64),
        row!(field::focal_length_for_field [0 positive("extent_um", UM, (2_000, 50_000)), 1 positive("field_mas", MAS, (600_000, 40_000_000)).under(HALF_TURN)] -> UM, TRANSCENDENTAL, 3.0,
            |a| &a[0] / (big(2.0) * half_tangent(&a[1])),
            focal_length_for_field_fx fieldstop_focal_length_for_field_fx fieldstop_focal_length_for_field_f32 fieldstop_focal_length_for_field_f64),
        Row {
            refuses: |i, a| i == 2 && a[2] >= a[1],
            ..row!(count field::tiles [0 positive("target_mas", MAS, (100_000, 40_000_000)), 1 positive("frame_mas", MAS, (100_000, 40_000_000)), 2 ordinary("overlap_mas", MAS, (1_000, 100_000))] -> COUNT, EXACT, 0.0,
            // Less a trace, for thousandths are not exact in the oracle.
            |a| ((&a[0] - &a[1]) / (&a[1] - &a[2]) - big(2f64.powi(-100))).ceil().max(big(0.0)) + big(1.0),
            tiles_fx fieldstop_tiles_fx fieldstop_tiles_f32 fieldstop_tiles_f64)
        },
    ]
}
