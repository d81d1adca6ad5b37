//! Every argument at its edges, and the C forms: right cause, right position, output untouched.

use super::big::big;
use super::cases;
use super::oracle::{fixed_refusal, float_overflows, float_refusal};
use super::registry::{FloatForm, rows};
use fieldstop::{Cause, Error};

#[test]
fn fixed_edges_and_c() {
    for row in rows() {
        for mut case in cases::fixed(&row, 40) {
            let position = row.arguments.len() as u8 + 1;
            let null = Error::new(Cause::NullPointer, position).status();
            assert_eq!((row.c_fixed)(&case, None).0, null, "{} with a null pointer", row.stem);
            for i in 0..case.len() {
                let a = &row.arguments[i];
                let kept = case[i];
                for x in [0, 1, a.unit.least, a.unit.most, a.range.0 - 1, a.range.0, a.range.1, a.range.1 + 1]
                {
                    case[i] = x.clamp(a.unit.least, a.unit.most);
                    let rust = (row.fixed)(&case);
                    if let Some(error) = fixed_refusal(&row, &case) {
                        assert_eq!(rust, Err(error), "{}_fx{case:?}", row.stem);
                    }
                    let held = 77;
                    let expected = match rust {
                        Ok(value) => (0, value),
                        Err(error) => (error.status(), held),
                    };
                    assert_eq!((row.c_fixed)(&case, Some(held)), expected, "C {}_fx{case:?}", row.stem);
                }
                case[i] = kept;
            }
        }
    }
}

#[test]
fn float_edges_and_c() {
    let odd = [
        0.0,
        -0.0,
        1.0,
        -1.0,
        f64::NAN,
        f64::INFINITY,
        f64::NEG_INFINITY,
        1e-310,
        f32::MIN_POSITIVE as f64 / 4.0,
        f32::MAX as f64,
        2f64.powi(32),
        2f64.powi(-32),
        2f64.powi(33),
        2f64.powi(-33),
    ];
    for row in rows() {
        for single in [true, false] {
            let Some(FloatForm { compute, through_c }) = row.float_form(single) else { continue };
            for mut case in cases::float(&row, 40, single) {
                let null = Error::new(Cause::NullPointer, row.arguments.len() as u8 + 1).status();
                assert_eq!(through_c(&case, None).0, null, "{} with a null pointer", row.stem);
                for i in 0..case.len() {
                    let a = &row.arguments[i];
                    if a.unit.count {
                        continue;
                    }
                    let kept = case[i];
                    let (least, most) = (a.range.0 as f64, (a.range.1 + a.under as i64) as f64);
                    let (least, most) = (a.unit.value(least), a.unit.value(most));
                    for x in odd.into_iter().chain([least, most, most * 1.001, kept]) {
                        case[i] = if single { x as f32 as f64 } else { x };
                        let rust = compute(&case);
                        match float_refusal(&row, &case) {
                            Some(error) => assert_eq!(rust, Err(error), "{}{case:?}", row.stem),
                            None if rust == Err(Error::OVERFLOW) => {
                                let values: Vec<_> = case.iter().map(|&x| big(x)).collect();
                                assert!(float_overflows(&row, &values, single), "{}{case:?}", row.stem);
                            }
                            None => {
                                let value = rust.unwrap_or_else(|e| panic!("{}{case:?}: {e}", row.stem));
                                assert!(value.is_finite(), "{}{case:?} = {value}", row.stem);
                            }
                        }
                        let held = 77.0;
                        let expected = match rust {
                            Ok(value) => (0, value),
                            Err(error) => (error.status(), held),
                        };
                        assert_eq!(through_c(&case, Some(held)), expected, "C {}{case:?}", row.stem);
                    }
                    case[i] = kept;
                }
            }
        }
    }
}
