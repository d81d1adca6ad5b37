use super::super::big::big;
use super::*;

const SIGNED_NM: Unit = unit(1000.0, i32::MIN as i64, i32::MAX as i64);
/// Metres in the float form.
const MM: Unit = unit(1000.0, 0, U32);
const MK: Unit = unit(1000.0, 0, U32);
const SIGNED_MK: Unit = unit(1000.0, i32::MIN as i64, i32::MAX as i64);
const PPB: Unit = unit(1000.0, 0, U32);
const SIGNED_PPB: Unit = unit(1000.0, i32::MIN as i64, i32::MAX as i64);

const FOCAL_RATIO: Argument = positive("focal_ratio_q16", Q16, (3 << 16, 16 << 16));
const DEFOCUS: Argument = ordinary("defocus_nm", NM, (1_000, 500_000));
const EXPANSION: Argument = positive("expansion_ppb_per_k", PPB, (100, 24_000));

pub fn rows() -> Vec<Row> {
    vec![
        row!(focus::depth_of_focus [0 FOCAL_RATIO, 1 WAVELENGTH] -> NM, RATIONAL, 2.0,
            |a| &a[0] * &a[0] * &a[1] / big(500.0),
            depth_of_focus_fx fieldstop_depth_of_focus_fx fieldstop_depth_of_focus_f32 fieldstop_depth_of_focus_f64),
        row!(focus::defocus_blur [0 DEFOCUS, 1 FOCAL_RATIO] -> NM, RATIONAL, 2.0,
            |a| &a[0] / &a[1],
            defocus_blur_fx fieldstop_defocus_blur_fx fieldstop_defocus_blur_f32 fieldstop_defocus_blur_f64),
        row!(focus::defocus_wavefront [0 DEFOCUS, 1 FOCAL_RATIO] -> NM_AS_NM, RATIONAL, 2.0,
            |a| big(125.0) * &a[0] / (&a[1] * &a[1]),
            defocus_wavefront_fx fieldstop_defocus_wavefront_fx fieldstop_defocus_wavefront_f32 fieldstop_defocus_wavefront_f64),
        row!(focus::motor_steps [0 ordinary("distance_nm", NM, (1_000, 5_000_000)), 1 positive("step_nm", NM, (50, 20_000))] -> PLAIN, RATIONAL, 2.0,
            |a| &a[0] / &a[1],
            motor_steps_fx fieldstop_motor_steps_fx fieldstop_motor_steps_f32 fieldstop_motor_steps_f64),
        row!(focus::thermal_shift [0 ordinary("length_um", UM, (200_000, 5_000_000)), 1 ordinary("expansion_ppb_per_k", SIGNED_PPB, (100, 24_000)), 2 ordinary("temperature_change_mk", SIGNED_MK, (100, 20_000))] -> SIGNED_NM, RATIONAL, 2.0,
            |a| &a[0] * &a[1] * &a[2] / big(1000.0),
            thermal_shift_fx fieldstop_thermal_shift_fx fieldstop_thermal_shift_f32 fieldstop_thermal_shift_f64),
        row!(focus::refocus_temperature [0 positive("length_um", UM, (200_000, 5_000_000)), 1 EXPANSION, 2 ordinary("tolerance_nm", NM, (10_000, 300_000))] -> MK, RATIONAL, 2.0,
            |a| big(1000.0) * &a[2] / (&a[0] * &a[1]),
            refocus_temperature_fx fieldstop_refocus_temperature_fx fieldstop_refocus_temperature_f32 fieldstop_refocus_temperature_f64),
        Row {
            refuses: |i, a| i == 1 && at_least(a[0].clone(), big(1000.0) * &a[1]),
            ..row!(focus::near_focus_travel [0 FOCAL_LENGTH, 1 ordinary("object_distance_mm", MM, (6_000, 1_000_000))] -> UM, RATIONAL, 2.0,
                |a| &a[0] * &a[0] / (big(1000.0) * &a[1] - &a[0]),
                near_focus_travel_fx fieldstop_near_focus_travel_fx fieldstop_near_focus_travel_f32 fieldstop_near_focus_travel_f64)
        },
        row!(focus::coma_length [0 ordinary("off_axis_mas", MAS, (60_000, 3_600_000)), 1 FOCAL_RATIO] -> UAS, RATIONAL, 2.0,
            |a| big(3.0) * &a[0] / (big(16.0) * &a[1] * &a[1]),
            coma_length_fx fieldstop_coma_length_fx fieldstop_coma_length_f32 fieldstop_coma_length_f64),
    ]
}
