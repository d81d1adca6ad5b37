//! Each form against the exact value: within the error owed, and refused just where it should be.

use super::big::{Big, big};
use super::cases;
use super::registry::{Argument, FloatOwed, Row, rows};
use fieldstop::{Cause, Error};

/// What the checks of the arguments say, in their fixed order.
fn refusal(row: &Row, values: &[Big], own: impl Fn(usize, &Argument) -> Option<Cause>) -> Option<Error> {
    let refused = row.arguments.iter().enumerate().find_map(|(i, a)| {
        let cause = own(i, a).or_else(|| (row.refuses)(i, values).then_some(Cause::OutOfRange))?;
        Some(Error::new(cause, i as u8 + 1))
    });
    refused.or_else(|| (row.unanswered)(values))
}

pub fn fixed_refusal(row: &Row, case: &[i64]) -> Option<Error> {
    refusal(row, &row.in_float_units(case), |i, a| own_of_count(a, case[i]))
}

/// What an integer is refused for by itself.
fn own_of_count(a: &Argument, x: i64) -> Option<Cause> {
    if x == 0 && a.zero_refused {
        Some(Cause::Zero)
    } else if x < a.range.0 || x > a.range.1 {
        Some(Cause::OutOfRange)
    } else {
        None
    }
}

pub fn float_refusal(row: &Row, case: &[f64]) -> Option<Error> {
    if let Some(i) = case.iter().position(|x| !x.is_finite()) {
        // The exact value of what stands before it can still be refused first.
        let before = Row { arguments: &row.arguments[..i], unanswered: |_| None, ..*row };
        return float_refusal(&before, &case[..i]).or(Some(Error::new(Cause::NotFinite, i as u8 + 1)));
    }
    let values: Vec<Big> = case.iter().map(|&x| big(x)).collect();
    refusal(row, &values, |i, a| {
        let x = case[i];
        let limit = |steps: i64, whole: i64, otherwise: f64| {
            if steps == whole { otherwise } else { a.unit.value(steps as f64) }
        };
        let most = limit(a.range.1 + a.under as i64, a.unit.most, a.unit.float_most());
        let least = limit(a.range.0, a.unit.least, if a.unit.least < 0 { -most } else { 0.0 });
        if a.unit.count {
            own_of_count(a, x as i64)
        } else if x == 0.0 && a.zero_refused {
            Some(Cause::Zero)
        } else if x < least
            || x > most
            || (a.under && x >= a.unit.value((a.range.1 + 1) as f64))
            || (a.zero_refused && x.abs() < 2f64.powi(-32))
        {
            Some(Cause::OutOfRange)
        } else {
            None
        }
    })
}

/// The error of a call in LSB, or as a share of what is owed where that is a part of the result; it fails if more than
/// that is owed, or if the call is refused where it should not be.
pub fn fixed_error(row: &Row, case: &[i64]) -> f64 {
    let got = (row.fixed)(case);
    if let Some(error) = fixed_refusal(row, case) {
        assert_eq!(got, Err(error), "{}_fx{case:?}", row.stem);
        return 0.0;
    }
    let values = row.in_float_units(case);
    let exact = (row.exact)(&values) * big(row.result.steps);
    let largest = row.largest.map_or(big(0.0), |f| f(&values).abs() * big(row.result.steps)).max(exact.abs());
    let owed = row.owed.lsb.max(row.owed.part * largest.to_f64());
    match got {
        Ok(value) => {
            let mut error = (big(value as f64) - &exact).abs().to_f64();
            if let Some(turn) = row.circle {
                error = error.min(turn - error);
            }
            assert!(
                error <= owed,
                "{}_fx{case:?} = {value}, exactly {}: error {error} LSB, owed {owed}",
                row.stem,
                exact.to_f64()
            );
            // Where a part of the result is owed, steps count for small results only.
            if row.owed.part == 0.0 { error } else { error / owed }
        }
        Err(error) => {
            assert_eq!(error, Error::OVERFLOW, "{}_fx{case:?}", row.stem);
            let (least, most) = (big(row.result.least as f64), big(row.result.most as f64));
            assert!(
                exact.clone() + big(owed) > most || exact.clone() - big(owed) < least,
                "{}_fx{case:?} refused, but {} fits",
                row.stem,
                exact.to_f64()
            );
            0.0
        }
    }
}

#[test]
fn fixed_forms_are_within_the_error_owed() {
    for row in rows() {
        let cases = cases::fixed(&row, cases::count());
        let worst = cases.iter().map(|case| fixed_error(&row, case)).fold(0.0, f64::max);
        println!(
            "{:26} fx  {worst:.4} {}",
            row.stem,
            if row.owed.part == 0.0 { "LSB" } else { "of what is owed" }
        );
    }
}

/// Whether a float form may find no result: a count that does not fit, or less than nothing.
pub fn float_overflows(row: &Row, values: &[Big], single: bool) -> bool {
    let exact = (row.exact)(values);
    let largest = row.largest.map_or(big(0.0), |f| f(values).abs()).to_f64();
    let beyond = row.result.count && exact > big(row.result.most as f64);
    beyond || (row.result.least == 0 && exact < big(2.0 * ulp(largest, single)))
}

/// The error of a call in the unit in which it is owed, for a row with float forms; it fails as the fixed one does.
pub fn float_error(row: &Row, case: &[f64], single: bool) -> f64 {
    let owed = if single { row.single_owed } else { row.double_owed };
    let got = (row.float_form(single).unwrap().compute)(case);
    if let Some(error) = float_refusal(row, case) {
        assert_eq!(got, Err(error), "{}{case:?}", row.stem);
        return 0.0;
    }
    let values: Vec<Big> = case.iter().map(|&x| big(x)).collect();
    let exact = (row.exact)(&values);
    if got == Err(Error::OVERFLOW) {
        assert!(float_overflows(row, &values, single), "{}{case:?} refused", row.stem);
        return 0.0;
    }
    let value = got.unwrap_or_else(|e| panic!("{}{case:?} refused: {e}", row.stem));
    let distance = (big(value) - &exact).abs().to_f64();
    let (error, limit) = match owed {
        FloatOwed::Ulp(ulps) => {
            let largest = row.largest.map_or(exact.abs(), |f| f(&values).abs().max(exact.abs()));
            (distance / ulp(largest.to_f64(), single), ulps)
        }
        FloatOwed::Part(part) => (distance / exact.to_f64().abs().max(1e-300), part),
        FloatOwed::Absolute(limit) => (distance / limit(&values), 1.0),
    };
    assert!(
        error <= limit,
        "{}{case:?} = {value:e}, exactly {:e}: error {error}, owed {limit}",
        row.stem,
        exact.to_f64()
    );
    error
}

fn check_floats(single: bool) {
    for row in rows().iter().filter(|row| row.float_form(single).is_some()) {
        let cases = cases::float(row, cases::count(), single);
        let worst = cases.iter().map(|case| float_error(row, case, single)).fold(0.0, f64::max);
        println!("{:26} {} {worst:.3e}", row.stem, if single { "f32" } else { "f64" });
    }
}

/// The unit in the last place of the binade that holds `x`.
fn ulp(x: f64, single: bool) -> f64 {
    let (digits, lowest) = if single { (23, -149) } else { (52, -1074) };
    let exponent = if x == 0.0 { -1074 } else { ((x.to_bits() >> 52) as i32 - 1023).max(-1022) };
    // In two halves, as 2^-1074 in one is the inverse of an infinity.
    let exponent = (exponent - digits).max(lowest);
    2f64.powi(exponent / 2) * 2f64.powi(exponent - exponent / 2)
}

#[test]
fn f32_forms_are_within_the_error_owed() {
    check_floats(true);
}

#[test]
fn f64_forms_are_within_the_error_owed() {
    check_floats(false);
}
