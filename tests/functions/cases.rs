//! Argument sets: half from the usual telescope, half log-uniform over each whole type with its edges.

use super::registry::{Argument, Row};

pub struct Random(u64);

impl Random {
    pub fn new(name: &str) -> Random {
        // A different stream for each function, the same on every run.
        Random(name.bytes().fold(0x9e3779b97f4a7c15, |h, b| (h ^ b as u64).wrapping_mul(0x100000001b3)) | 1)
    }
    pub fn next(&mut self) -> u64 {
        self.0 ^= self.0 << 13;
        self.0 ^= self.0 >> 7;
        self.0 ^= self.0 << 17;
        self.0.wrapping_mul(0x2545f4914f6cdd1d)
    }
    pub fn below(&mut self, n: u64) -> u64 {
        self.next() % n
    }
    pub fn unit(&mut self) -> f64 {
        (self.next() >> 11) as f64 / (1u64 << 53) as f64
    }
    fn log_uniform(&mut self, least: f64, most: f64) -> f64 {
        (least.ln() + self.unit() * (most / least).ln()).exp()
    }
}

pub fn count() -> usize {
    std::env::var("FIELDSTOP_CASES").ok().and_then(|n| n.parse().ok()).unwrap_or(2000)
}

fn edge(a: &Argument, r: &mut Random) -> i64 {
    let (least, most) = a.range;
    let edges = [
        least,
        least + 1,
        most - 1,
        most,
        a.unit.least,
        a.unit.most,
        0,
        1,
        2,
        3,
        65535,
        65536,
        65537,
        most / 2,
    ];
    edges[r.below(edges.len() as u64) as usize].clamp(a.unit.least, a.unit.most)
}

fn whole(a: &Argument, r: &mut Random) -> i64 {
    if r.below(8) == 0 {
        return edge(a, r);
    }
    let (least, most) = a.range;
    let magnitude = (r.log_uniform(1.0, most as f64 + 1.0) as i64).min(most);
    let value = match r.below(4) {
        0 => most - magnitude,
        1 if least < 0 => -magnitude,
        _ => magnitude,
    };
    value.clamp(least, most)
}

/// A case near the others: an argument just beside another one, where the formula's borders often are.
fn pull_together(row: &Row, case: &mut [i64], r: &mut Random) {
    if case.len() < 2 {
        return;
    }
    let (i, j) = (r.below(case.len() as u64) as usize, r.below(case.len() as u64) as usize);
    let a = &row.arguments[i];
    if a.unit == row.arguments[j].unit {
        case[i] = (case[j] + r.below(5) as i64 - 2).clamp(a.unit.least, a.unit.most);
    }
}

/// The hardest found so far, from their file.
fn hard(row: &Row) -> impl Iterator<Item = Vec<i64>> {
    let lines = include_str!("hard_cases.txt").lines().map(|line| line.split(' ').collect::<Vec<_>>());
    lines
        .filter(|words| words[0] == row.stem)
        .map(|words| words[1..].iter().map(|x| x.parse().unwrap()).collect())
}

fn usual_value(a: &Argument, r: &mut Random) -> i64 {
    r.log_uniform(a.usual.0.max(1) as f64, a.usual.1 as f64 + 1.0) as i64
}

/// `n` sets of usual values for the arguments.
pub fn usual_arguments(name: &str, arguments: &[Argument], n: usize) -> Vec<Vec<i64>> {
    let mut r = Random::new(name);
    (0..n).map(|_| arguments.iter().map(|a| usual_value(a, &mut r)).collect()).collect()
}

pub fn usual(row: &Row, n: usize) -> Vec<Vec<i64>> {
    usual_arguments(row.stem, row.arguments, n)
}

pub fn whole_types(row: &Row, n: usize) -> Vec<Vec<i64>> {
    let mut r = Random::new(row.stem);
    (0..n).map(|_| row.arguments.iter().map(|a| whole(a, &mut r)).collect()).collect()
}

pub fn fixed(row: &Row, n: usize) -> Vec<Vec<i64>> {
    let mut r = Random::new(row.stem);
    let drawn = (0..n)
        .map(|k| {
            let mut case: Vec<i64> = row
                .arguments
                .iter()
                .map(|a| if k % 2 == 0 { usual_value(a, &mut r) } else { whole(a, &mut r) })
                .collect();
            if k % 8 == 1 {
                pull_together(row, &mut case, &mut r);
            }
            case
        })
        .collect::<Vec<_>>();
    hard(row).chain(drawn).collect()
}

/// Float arguments, each exact in f32 if `single`: the fixed cases in float units, not on their grid, and as far as
/// 2^-32 and 2^32.
pub fn float(row: &Row, n: usize, single: bool) -> Vec<Vec<f64>> {
    let mut r = Random::new(row.stem);
    let cut = |x: f64| if single { x as f32 as f64 } else { x };
    fixed(row, n)
        .iter()
        .map(|case| {
            let wild = r.below(8) == 0;
            row.arguments
                .iter()
                .zip(case)
                .map(|(a, &x)| {
                    if a.unit.count {
                        return x as f64;
                    }
                    let limit = a.unit.value(a.range.1 as f64);
                    if wild && !a.unit.angle && a.range == (a.unit.least, a.unit.most) {
                        return cut(2f64.powf(64.0 * r.unit() - 32.0));
                    }
                    let jitter = if x == 0 || r.below(16) == 0 { 0.0 } else { r.unit() - 0.5 };
                    let value = cut(a.unit.value(x as f64 + jitter));
                    if a.range.1 < a.unit.most && value > limit { cut(limit) } else { value }
                })
                .collect()
        })
        .collect()
}
