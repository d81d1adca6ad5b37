//! For the tests: the rule by which the polynomials of the kernels are made.

use std::f64::consts::PI;
use std::vec::Vec;

/// The polynomial through `f` at `count` Chebyshev nodes of `from` to `to`, lowest power first.
pub(crate) fn interpolate(f: impl Fn(f64) -> f64, from: f64, to: f64, count: usize) -> Vec<f64> {
    let nodes: Vec<f64> = (0..count)
        .map(|k| (from + to) / 2.0 + (to - from) / 2.0 * (PI * (k as f64 + 0.5) / count as f64).cos())
        .collect();
    // Newton's divided differences, then the products multiplied out.
    let mut differences: Vec<f64> = nodes.iter().map(|&x| f(x)).collect();
    for j in 1..count {
        for i in (j..count).rev() {
            differences[i] = (differences[i] - differences[i - 1]) / (nodes[i] - nodes[i - j]);
        }
    }
    let mut powers = std::vec![0.0; count];
    for i in (0..count).rev() {
        for k in (0..count).rev() {
            let lower = if k == 0 { differences[i] } else { powers[k - 1] };
            powers[k] = lower - powers[k] * nodes[i];
        }
    }
    powers
}
