use super::super::big::{Big, big, pi};
use super::*;

const FOCUS_DISTANCE: Argument = ordinary("focus_distance_um", UM, (80_000, 200_000));
const LIT_FIELD: Argument = ordinary("lit_field_um", UM, (1_000, 40_000));
const PRIMARY: Argument = positive("primary_focal_um", UM, (300_000, 2_000_000));
const SYSTEM: Argument = positive("system_focal_um", UM, (2_000_001, 10_000_000));
const BACK_FOCUS: Argument = ordinary("back_focus_um", UM, (50_000, 500_000));

/// The g and w of the diagonal, and 1 - g^2.
fn cone(a: &[Big]) -> (Big, Big, Big) {
    let g = (&a[0] - &a[3]) / (big(2.0) * &a[1]);
    let w = &a[3] / big(2.0) + &g * &a[2];
    let slope = (big(1.0) - &g) * (big(1.0) + &g);
    (g, w, slope)
}

fn refused_cone(i: usize, a: &[Big]) -> bool {
    match i {
        2 => a[2] > a[1],
        3 => a[3] >= a[0] || at_least(&a[0] - &a[3], big(2.0) * &a[1]),
        _ => false,
    }
}

/// From the second mirror to the primary's focus, given the primary's and the system's focal length and the back focus,
/// p = (f1 + b) / (m + 1).
fn before_focus(a: &[Big]) -> Big {
    (&a[0] + &a[2]) * &a[0] / (&a[1] + &a[0])
}

/// f1 - p over one denominator, so that the oracle gives 0 where it is 0.
fn separation(a: &[Big]) -> Big {
    &a[0] * (&a[1] - &a[2]) / (&a[1] + &a[0])
}

/// Of the argument `i` of those three.
fn refused_mirrors(i: usize, a: &[Big]) -> bool {
    match i {
        1 => a[1] <= a[0],
        2 => a[2] > a[1],
        _ => false,
    }
}

/// The area that two discs share over that of the first, by the angles that the corners make at the two centres.
pub fn illumination(beam: &Big, stop: &Big, offset: &Big) -> Big {
    let two = big(2.0);
    let (b, s) = (beam / &two, stop / &two);
    if offset >= &(&b + &s) {
        return big(0.0);
    }
    if offset <= &(&b - &s).abs() {
        return if b <= s { big(1.0) } else { &s * &s / (&b * &b) };
    }
    let angle = |near: &Big, distant: &Big| {
        let cosine = (offset * offset + near * near - distant * distant) / (&two * offset * near);
        cosine.max(big(-1.0)).min(big(1.0)).acos()
    };
    let segment = |t: Big| &t - t.sin() * t.cos();
    let (of_beam, of_stop) = (segment(angle(&b, &s)), segment(angle(&s, &b)));
    (of_beam + &s * &s / (&b * &b) * of_stop) / pi()
}

/// r sin(altitude)
fn rise(a: &[Big]) -> Big {
    &a[1] * (&a[2] * pi() / big(180.0)).sin()
}

pub fn rows() -> Vec<Row> {
    vec![
        Row {
            refuses: refused_cone,
            ..row!(layout::diagonal_minor_axis [0 APERTURE, 1 FOCAL_LENGTH, 2 FOCUS_DISTANCE, 3 LIT_FIELD] -> UM, RATIONAL, 2.0,
                |a| {
                    let (_, w, slope) = cone(a);
                    big(2.0) * w / slope
                },
                diagonal_minor_axis_fx fieldstop_diagonal_minor_axis_fx fieldstop_diagonal_minor_axis_f32 fieldstop_diagonal_minor_axis_f64)
        },
        Row {
            refuses: refused_cone,
            ..row!(layout::diagonal_offset [0 APERTURE, 1 FOCAL_LENGTH, 2 FOCUS_DISTANCE, 3 LIT_FIELD] -> UM, RATIONAL, 2.0,
                |a| {
                    let (g, w, slope) = cone(a);
                    w * g / slope
                },
                diagonal_offset_fx fieldstop_diagonal_offset_fx fieldstop_diagonal_offset_f32 fieldstop_diagonal_offset_f64)
        },
        Row {
            refuses: refused_cone,
            ..row!(layout::beam_width [0 APERTURE, 1 FOCAL_LENGTH, 2 FOCUS_DISTANCE] -> UM, RATIONAL, 2.0,
                |a| &a[0] * &a[2] / &a[1],
                beam_width_fx fieldstop_beam_width_fx fieldstop_beam_width_f32 fieldstop_beam_width_f64)
        },
        Row {
            refuses: refused_cone,
            ..row!(layout::beam_shift [0 ordinary("image_offset_um", UM, (1_000, 25_000)), 1 FOCAL_LENGTH, 2 FOCUS_DISTANCE] -> UM, RATIONAL, 2.0,
                |a| &a[0] * (&a[1] - &a[2]) / &a[1],
                beam_shift_fx fieldstop_beam_shift_fx fieldstop_beam_shift_f32 fieldstop_beam_shift_f64)
        },
        Row {
            refuses: refused_mirrors,
            ..row!(layout::secondary_magnification [0 PRIMARY, 1 SYSTEM] -> Q16, RATIONAL, 2.0,
                |a| &a[1] / &a[0],
                secondary_magnification_fx fieldstop_secondary_magnification_fx fieldstop_secondary_magnification_f32 fieldstop_secondary_magnification_f64)
        },
        Row {
            refuses: refused_mirrors,
            ..row!(layout::secondary_separation [0 PRIMARY, 1 SYSTEM, 2 BACK_FOCUS] -> UM, RATIONAL, 2.0,
                separation,
                secondary_separation_fx fieldstop_secondary_separation_fx fieldstop_secondary_separation_f32 fieldstop_secondary_separation_f64)
        },
        Row {
            refuses: |i, a| i > 0 && refused_mirrors(i - 1, &a[1..]),
            ..row!(layout::secondary_diameter [0 APERTURE, 1 PRIMARY, 2 SYSTEM, 3 BACK_FOCUS] -> UM, RATIONAL, 2.0,
                |a| &a[0] * before_focus(&a[1..]) / &a[1],
                secondary_diameter_fx fieldstop_secondary_diameter_fx fieldstop_secondary_diameter_f32 fieldstop_secondary_diameter_f64)
        },
        Row {
            refuses: refused_mirrors,
            ..row!(layout::secondary_field_margin [0 PRIMARY, 1 SYSTEM, 2 BACK_FOCUS, 3 LIT_FIELD] -> UM, RATIONAL, 2.0,
                |a| &a[3] * separation(a) / &a[1],
                secondary_field_margin_fx fieldstop_secondary_field_margin_fx fieldstop_secondary_field_margin_f32 fieldstop_secondary_field_margin_f64)
        },
        Row {
            refuses: refused_mirrors,
            ..row!(layout::secondary_radius [0 PRIMARY, 1 SYSTEM, 2 BACK_FOCUS] -> UM, RATIONAL, 2.0,
                |a| big(2.0) * before_focus(a) * &a[1] / (&a[1] - &a[0]),
                secondary_radius_fx fieldstop_secondary_radius_fx fieldstop_secondary_radius_f32 fieldstop_secondary_radius_f64)
        },
        Row {
            single_owed: FloatOwed::Absolute(|_| 1e-6),
            double_owed: FloatOwed::Absolute(|_| 1e-14),
            ..row!(layout::illumination [0 positive("beam_um", UM, (20_000, 80_000)), 1 ordinary("stop_um", UM, (30_000, 100_000)), 2 ordinary("offset_um", UM, (1_000, 40_000))] -> Q16, TRANSCENDENTAL, 0.0,
                |a| illumination(&a[0], &a[1], &a[2]),
                illumination_fx fieldstop_illumination_fx fieldstop_illumination_f32 fieldstop_illumination_f64)
        },
        row!(layout::swing_radius [0 ordinary("reach_um", UM, (300_000, 2_000_000)), 1 ordinary("tube_diameter_um", UM, (60_000, 600_000))] -> UM, RATIONAL, 2.0,
            |a| (&a[0] * &a[0] + &a[1] * &a[1] / big(4.0)).sqrt(),
            swing_radius_fx fieldstop_swing_radius_fx fieldstop_swing_radius_f32 fieldstop_swing_radius_f64),
        Row {
            largest: Some(|a| a[0].clone().max(rise(a).abs())),
            ..row!(layout::eyepiece_height [0 ordinary("axis_height_um", UM, (600_000, 1_800_000)), 1 ordinary("reach_um", SIGNED_UM, (100_000, 1_500_000)), 2 ordinary("altitude_bam", SIGNED_BAM, (1 << 20, 1 << 30)).within(0, 1 << 30)] -> UM, IRRATIONAL, 2.0,
                |a| &a[0] + rise(a),
                eyepiece_height_fx fieldstop_eyepiece_height_fx fieldstop_eyepiece_height_f32 fieldstop_eyepiece_height_f64)
        },
    ]
}
