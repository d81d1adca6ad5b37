use super::*;

pub fn rows() -> Vec<Row> {
    vec![row!(field::magnification [0 FOCAL_LENGTH, 1 EYEPIECE] -> Q16, RATIONAL, 2.0, |a| &a[0] / &a[1],
        magnification_fx fieldstop_magnification_fx fieldstop_magnification_f32 fieldstop_magnification_f64)]
}
