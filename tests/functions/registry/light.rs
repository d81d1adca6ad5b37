use super::super::big::{Big, big};
use super::*;

const fn share(name: &'static str) -> Argument {
    ordinary(name, Q16, (45_000, 65_536)).within(0, 65_536)
}

const THROUGHPUT: Argument = share("throughput_q16");
const OBSTRUCTION: Argument = ordinary("obstruction_um", UM, (10_000, 200_000));
const EFFECTIVE_APERTURE: Argument = positive("effective_aperture_um", UM, (40_000, 500_000));
const EYE_PUPIL: Argument = positive("eye_pupil_um", UM, (2_000, 8_000));

/// 5 log10(a / b)
fn five_log10(a: &Big, b: &Big) -> Big {
    big(5.0) * (a / b).log10()
}

/// x^n, exactly 1 for n = 0.
fn power(x: &Big, n: &Big) -> Big {
    if n.is_zero() { big(1.0) } else { x.powi(n.to_f64() as u32) }
}

/// 1 - (d / D)^2
fn clear(a: &[Big]) -> Big {
    (&a[0] - &a[1]) * (&a[0] + &a[1]) / (&a[0] * &a[0])
}

pub fn rows() -> Vec<Row> {
    vec![
        row!(light::throughput [0 ordinary("mirrors", COUNT_8, (0, 5)), 1 share("reflectance_q16"), 2 ordinary("surfaces", COUNT_8, (0, 12)), 3 share("transmittance_q16")] -> Q16, TRANSCENDENTAL, 3.0,
            |a| power(&a[1], &a[0]) * power(&a[3], &a[2]),
            throughput_fx fieldstop_throughput_fx fieldstop_throughput_f32 fieldstop_throughput_f64),
        Row {
            refuses: |i, a| i == 1 && a[1] >= a[0],
            ..row!(light::clear_fraction [0 APERTURE, 1 OBSTRUCTION] -> Q16, RATIONAL, 2.0,
                clear,
                clear_fraction_fx fieldstop_clear_fraction_fx fieldstop_clear_fraction_f32 fieldstop_clear_fraction_f64)
        },
        Row {
            refuses: |i, a| i == 1 && a[1] >= a[0],
            ..row!(light::effective_aperture [0 APERTURE, 1 OBSTRUCTION, 2 THROUGHPUT] -> UM, IRRATIONAL, 2.0,
                |a| &a[0] * (clear(a) * &a[2]).sqrt(),
                effective_aperture_fx fieldstop_effective_aperture_fx fieldstop_effective_aperture_f32 fieldstop_effective_aperture_f64)
        },
        row!(light::magnitude_gain [0 EFFECTIVE_APERTURE, 1 EYE_PUPIL] -> MMAG, TRANSCENDENTAL, 3.0,
            |a| five_log10(&a[0], &a[1]),
            magnitude_gain_fx fieldstop_magnitude_gain_fx fieldstop_magnitude_gain_f32 fieldstop_magnitude_gain_f64),
        Row {
            largest: Some(|a| a[0].abs().max(five_log10(&a[1], &a[2]).abs())),
            ..row!(light::limiting_magnitude [0 ordinary("naked_eye_mmag", MMAG, (3_000, 7_000)), 1 EFFECTIVE_APERTURE, 2 EYE_PUPIL] -> MMAG, TRANSCENDENTAL, 3.0,
                |a| &a[0] + five_log10(&a[1], &a[2]),
                limiting_magnitude_fx fieldstop_limiting_magnitude_fx fieldstop_limiting_magnitude_f32 fieldstop_limiting_magnitude_f64)
        },
        row!(light::surface_brightness [0 positive("exit_pupil_um", UM, (500, 8_000)), 1 EYE_PUPIL, 2 THROUGHPUT] -> Q16, RATIONAL, 2.0,
            |a| &a[2] * (&a[0] * &a[0] / (&a[1] * &a[1])).min(big(1.0)),
            surface_brightness_fx fieldstop_surface_brightness_fx fieldstop_surface_brightness_f32 fieldstop_surface_brightness_f64),
        row!(light::magnitude_difference [0 positive("flux_a", PLAIN, (1, 10_000_000)), 1 positive("flux_b", PLAIN, (1, 10_000_000))] -> MMAG, TRANSCENDENTAL, 3.0,
            |a| five_log10(&a[1], &a[0]) / big(2.0),
            magnitude_difference_fx fieldstop_magnitude_difference_fx fieldstop_magnitude_difference_f32 fieldstop_magnitude_difference_f64),
        row!(light::distance_dimming [0 positive("near_distance", PLAIN, (1, 10_000)), 1 positive("distant_distance", PLAIN, (1, 1_000_000))] -> MMAG, TRANSCENDENTAL, 3.0,
            |a| five_log10(&a[1], &a[0]),
            distance_dimming_fx fieldstop_distance_dimming_fx fieldstop_distance_dimming_f32 fieldstop_distance_dimming_f64),
        row!(light::extinction [0 ordinary("coefficient_mmag", UNSIGNED_MMAG, (100, 600)), 1 ordinary("airmass_q16", Q16, (65_536, 400_000))] -> MMAG, RATIONAL, 2.0,
            |a| &a[0] * &a[1],
            extinction_fx fieldstop_extinction_fx fieldstop_extinction_f32 fieldstop_extinction_f64),
        row!(light::t_number [0 positive("focal_ratio_q16", Q16, (3 << 16, 16 << 16)), 1 positive("throughput_q16", Q16, (30_000, 65_536)).within(0, 65_536)] -> Q16, IRRATIONAL, 2.0,
            |a| &a[0] / a[1].sqrt(),
            t_number_fx fieldstop_t_number_fx fieldstop_t_number_f32 fieldstop_t_number_f64),
    ]
}
