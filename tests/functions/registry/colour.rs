use super::super::big::{Big, big, radian};
use super::*;

/// The index in the float form.
const N7: Unit = unit(1e7, 0, U32);
/// A plain number in the float form.
const PPM: Unit = unit(1e6, 0, U32);

const ABBE: Argument = positive("abbe_q16", Q16, (25 << 16, 85 << 16));
const CROWN: Argument = positive("crown_abbe_q16", Q16, (51 << 16, 85 << 16));
const FLINT: Argument = positive("flint_abbe_q16", Q16, (25 << 16, 50 << 16));

fn refused_pair(i: usize, a: &[Big]) -> bool {
    i == 2 && a[2] >= a[1]
}

pub fn rows() -> Vec<Row> {
    vec![
        Row {
            refuses: |i, a| match i {
                0 => a[0] <= big(1.0),
                2 => a[2] >= a[1],
                _ => false,
            },
            ..row!(colour::abbe_number [0 positive("index_d_n7", N7, (15_100_000, 15_250_000)), 1 positive("index_f_n7", N7, (15_260_000, 15_400_000)), 2 positive("index_c_n7", N7, (15_000_000, 15_100_000))] -> Q16, RATIONAL, 2.0,
                |a| (&a[0] - big(1.0)) / (&a[1] - &a[2]),
                abbe_number_fx fieldstop_abbe_number_fx fieldstop_abbe_number_f32 fieldstop_abbe_number_f64)
        },
        row!(colour::singlet_colour_shift [0 FOCAL_LENGTH, 1 ABBE] -> UM, RATIONAL, 2.0,
            |a| &a[0] / &a[1],
            singlet_colour_shift_fx fieldstop_singlet_colour_shift_fx fieldstop_singlet_colour_shift_f32 fieldstop_singlet_colour_shift_f64),
        row!(colour::singlet_colour_blur [0 positive("focal_ratio_q16", Q16, (3 << 16, 16 << 16)), 1 ABBE] -> UAS, IRRATIONAL, 2.0,
            |a| radian() / (big(2.0) * &a[0] * &a[1]),
            singlet_colour_blur_fx fieldstop_singlet_colour_blur_fx fieldstop_singlet_colour_blur_f32 fieldstop_singlet_colour_blur_f64),
        Row {
            refuses: refused_pair,
            ..row!(colour::achromat_crown [0 FOCAL_LENGTH, 1 CROWN, 2 FLINT] -> UM, RATIONAL, 2.0,
                |a| &a[0] * (&a[1] - &a[2]) / &a[1],
                achromat_crown_fx fieldstop_achromat_crown_fx fieldstop_achromat_crown_f32 fieldstop_achromat_crown_f64)
        },
        Row {
            refuses: refused_pair,
            ..row!(colour::achromat_flint [0 FOCAL_LENGTH, 1 CROWN, 2 FLINT] -> UM, RATIONAL, 2.0,
                |a| &a[0] * (&a[1] - &a[2]) / &a[2],
                achromat_flint_fx fieldstop_achromat_flint_fx fieldstop_achromat_flint_f32 fieldstop_achromat_flint_f64)
        },
        row!(colour::secondary_spectrum [0 FOCAL_LENGTH, 1 ordinary("partial_difference_ppm", PPM, (500, 50_000)), 2 positive("abbe_difference_q16", Q16, (10 << 16, 60 << 16))] -> UM, RATIONAL, 2.0,
            |a| &a[0] * &a[1] / &a[2],
            secondary_spectrum_fx fieldstop_secondary_spectrum_fx fieldstop_secondary_spectrum_f32 fieldstop_secondary_spectrum_f64),
    ]
}
