//! The fixed form against the f64 form: two ways written apart must meet within their bounds.

use super::cases;
use super::registry::rows;

#[test]
fn fixed_agrees_with_f64() {
    for row in rows() {
        let Some(float_form) = row.float_form(false) else { continue };
        let mut met = 0;
        for case in cases::fixed(&row, cases::count()) {
            let arguments: Vec<f64> =
                row.arguments.iter().zip(&case).map(|(a, &x)| a.unit.value(x as f64)).collect();
            let (Ok(fixed), Ok(float)) = ((row.fixed)(&case), (float_form.compute)(&arguments)) else {
                continue;
            };
            met += 1;
            // What the last digit of an argument moves, for the decimal units are not exact in binary.
            let moved: f64 = (0..arguments.len())
                .filter(|&i| !row.arguments[i].unit.count)
                .filter_map(|i| {
                    let mut near = arguments.clone();
                    near[i] = if near[i] == 0.0 { 0.0 } else { f64::from_bits(near[i].to_bits() - 1) };
                    (float_form.compute)(&near).ok().map(|x| (x - float).abs())
                })
                .sum();
            let (float, moved) = (float * row.result.steps, moved * row.result.steps);
            let owed =
                row.owed.lsb.max(row.owed.part * float.abs()) + 1e-6 + float.abs() * 1e-14 + 2.0 * moved;
            assert!((fixed as f64 - float).abs() <= owed, "{}{case:?}: fixed {fixed}, f64 {float}", row.stem);
        }
        assert!(met > cases::count() / 4, "{}: only {met} cases met", row.stem);
    }
}
