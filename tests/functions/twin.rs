//! The fixed form against the f64 form: two ways written apart must meet within their bounds.

use super::cases;
use super::registry::rows;

#[test]
fn fixed_agrees_with_f64() {
    for row in rows() {
        let Some(floats) = &row.floats else { continue };
        let mut met = 0;
        for case in cases::fixed(&row, cases::count()) {
            let arguments: Vec<f64> =
                row.arguments.iter().zip(&case).map(|(a, &x)| x as f64 / a.unit.steps).collect();
            let (Ok(fixed), Ok(float)) = ((row.fixed)(&case), (floats.double)(&arguments)) else { continue };
            met += 1;
            let float = float * row.result.steps;
            let owed = row.owed.lsb.max(row.owed.part * float.abs()) + 1e-5 + float.abs() * 1e-14;
            assert!((fixed as f64 - float).abs() <= owed, "{}{case:?}: fixed {fixed}, f64 {float}", row.stem);
        }
        assert!(met > cases::count() / 4, "{}: only {met} cases met", row.stem);
    }
}
