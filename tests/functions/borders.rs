//! The contrast where its formula changes: rings that just touch, just cover or are as thin as the type allows.

use super::big::{Big, big};
use super::cases::{self, Random};
use super::registry::{Row, all_rows};

fn contrast() -> Row {
    all_rows().into_iter().find(|row| row.stem == "contrast").unwrap()
}

#[test]
fn contrast_at_its_borders_fixed() {
    let row = contrast();
    let mut r = Random::new("borders");
    let mut worst = 0.0f64;
    let random = (0..cases::count() / 50).map(|k| (r.next() & 0xffff) as i64 >> (k % 16));
    let ratios: Vec<i64> = random.flat_map(|x| [x, 65_535 - x]).chain(0..8).chain(65_528..65_536).collect();
    for e in ratios {
        let borders = [0, (65_536 - e) / 2, (65_536 + e) / 2, e, 65_536, (r.next() & 0xffff) as i64];
        for v in borders.iter().flat_map(|v| v - 2..=v + 2).filter(|v| (0..=65_536).contains(v)) {
            let got = (row.fixed)(&[v, e]).unwrap();
            let exact = (row.exact)(&row.in_float_units(&[v, e])) * big(65536.0);
            let error = (big(got as f64) - exact).abs().to_f64();
            assert!(error <= row.owed.lsb, "{v}, {e}: {got}, error {error}");
            assert!(v != 0 || got == 65_536);
            assert!(v != 65_536 || got == 0);
            worst = worst.max(error);
        }
    }
    println!("contrast at its borders    fx  {worst:.4}");
}

/// The neighbours of `x` in the type, and `x`.
fn around(x: f64, single: bool) -> [f64; 3] {
    if single {
        let x = x as f32;
        [x.next_down() as f64, x as f64, x.next_up() as f64]
    } else {
        [x.next_down(), x, x.next_up()]
    }
}

fn check_float(single: bool, owed: impl Fn(f64) -> f64) {
    let row = contrast();
    let compute = row.float_form(single).unwrap().compute;
    let digits = if single { 24 } else { 53 };
    let mut r = Random::new("thin");
    let mut worst = 0.0f64;
    let mut check = |v: f64, e: f64| {
        if !(0.0..=1.0).contains(&v) || !(0.0..1.0).contains(&e) {
            return;
        }
        let got = compute(&[v, e]).unwrap();
        let values: Vec<Big> = vec![big(v), big(e)];
        let error = (big(got) - (row.exact)(&values)).abs().to_f64();
        assert!(error <= owed(e), "{v:e}, {e:e}: {got:e}, error {error:e}");
        worst = worst.max(error / owed(e));
    };
    let cut = |x: f64| if single { x as f32 as f64 } else { x };
    let count = cases::count() / 100;
    for k in 0..count {
        // Obstructions from nothing to the thinnest ring.
        let small = 2f64.powf(-(digits as f64) * (k as f64 + r.unit()) / count as f64);
        for e in [0.0, small, 1.0 - small].into_iter().flat_map(|e| around(e, single)) {
            for border in [0.0, (1.0 - e) / 2.0, (1.0 + e) / 2.0, e, 1.0] {
                around(border, single).into_iter().for_each(|v| check(v, e));
                // Beside it at any scale.
                for _ in 0..2 {
                    let aside = 2f64.powf(-(digits as f64) * r.unit());
                    check(cut(border + aside), e);
                    check(cut(border - aside), e);
                }
            }
        }
    }
    println!("contrast at its borders    {} {worst:.3e}", if single { "f32" } else { "f64" });
}

#[test]
fn contrast_at_its_borders_f32() {
    check_float(true, |_| 4e-6);
}

#[test]
fn contrast_at_its_borders_f64() {
    check_float(false, |e| 1e-14 / (1.0 - e));
}

/// The product of a squared aperture and a tiny throughput keeps its bits in f32.
#[test]
fn effective_aperture_of_a_tiny_throughput() {
    use fieldstop::optics::light::effective_aperture;
    for throughput in [1e-9f32, 1e-12, 1e-30, 1e-38, 1e-42, f32::from_bits(1)] {
        for aperture in [2f32.powi(-32), 0.1, 203.5, 2f32.powi(32)] {
            let single = effective_aperture(aperture, 0.0, throughput).unwrap() as f64;
            let double = effective_aperture(aperture as f64, 0.0, throughput as f64).unwrap();
            assert!(
                (single / double - 1.0).abs() < 2f64.powi(-23),
                "{aperture} {throughput}: {single} {double}"
            );
        }
    }
}
