//! Values as characters, against an independent reference: 128-bit integers and strings of the standard library.

use fieldstop::Cause;
#[cfg(feature = "heapless")]
use fieldstop::text::string;
use fieldstop::text::{AngleForm, TextStyle, Unit, Value, text};
use fieldstop::units::*;
use proptest::prelude::*;

fn shown(value: Value) -> String {
    let mut out = [0xaa; 40];
    let length = value.write(&TextStyle::ASCII, 0, &mut out).unwrap();
    String::from_utf8(out[..length].to_vec()).unwrap()
}

/// `numerator / denominator` with decimals, to nearest, halves away from zero.
fn decimal(numerator: i128, denominator: i128, decimals: u32) -> String {
    let power = 10i128.pow(decimals);
    let steps = (2 * numerator.abs() * power + denominator) / (2 * denominator);
    let sign = if numerator < 0 && steps > 0 { "-" } else { "" };
    let text = format!("{}{:0>width$}", steps / power, steps % power, width = decimals as usize);
    let (whole, broken) = text.split_at((steps / power).to_string().len());
    if decimals == 0 { format!("{sign}{whole}") } else { format!("{sign}{whole}.{broken}") }
}

/// Degrees, minutes and seconds with a least unit of `step` milliarcseconds.
fn sexagesimal(mas: u32, form: AngleForm, decimals: u32) -> String {
    let unit: i128 = if form == AngleForm::DegreesMinutes { 60_000 } else { 1000 };
    let all = decimal(mas.into(), unit, decimals);
    let (whole, broken) =
        all.split_once('.').map_or((&all[..], String::new()), |(w, b)| (w, format!(".{b}")));
    let whole: u64 = whole.parse().unwrap();
    match form {
        AngleForm::DegreesMinutes => format!("{}d{:02}{broken}'", whole / 60, whole % 60),
        _ if whole < 3600 => format!("{}'{:02}{broken}\"", whole / 60, whole % 60),
        _ => format!("{}d{:02}'{:02}{broken}\"", whole / 3600, whole / 60 % 60, whole % 60),
    }
}

fn by_size(mas: u32, decimals: u32) -> String {
    let seconds = decimal(mas.into(), 1000, decimals);
    if seconds.split('.').next().unwrap().parse::<u32>().unwrap() < 60 {
        return format!("{seconds}\"");
    }
    let text = sexagesimal(mas, AngleForm::MinutesSeconds, 0);
    if text.contains('d') { sexagesimal(mas, AngleForm::DegreesMinutes, 0) } else { text }
}

fn check_unsigned(n: u32) {
    assert_eq!(shown(Value::count(n, Unit::Pixel)), format!("{n} px"));
    for d in 0..=3 {
        let places = d as u8;
        assert_eq!(shown(Value::millimetres(Micrometres(n), places)), decimal(n.into(), 1000, d) + " mm");
        assert_eq!(shown(Value::micrometres(Nanometres(n), places)), decimal(n.into(), 1000, d) + " um");
    }
    for d in 0..=4 {
        let places = d as u8;
        let ratio = decimal(n.into(), 65536, d);
        assert_eq!(shown(Value::ratio(Q16(n), places)), ratio);
        assert_eq!(shown(Value::magnification(Q16(n), places)), format!("{ratio}x"));
        assert_eq!(shown(Value::focal_ratio(Q16(n), places)), format!("f/{ratio}"));
    }
    for d in 0..=2 {
        assert_eq!(shown(Value::percent(Q16(n), d as u8)), decimal(100 * i128::from(n), 65536, d) + "%");
    }
    for d in 0..=6 {
        assert_eq!(
            shown(Value::arcseconds(Microarcseconds(n), d as u8)),
            decimal(n.into(), 1_000_000, d) + "\""
        );
    }
    for places in 0..=9 {
        for d in 0..=places {
            let value = Value::decimal(n, places as u8, d as u8, Unit::None);
            assert_eq!(shown(value), decimal(n.into(), 10i128.pow(places), d), "{n} {places} {d}");
        }
    }
}

fn check_angle(n: u32) {
    let angle = |form, d: u32| shown(Value::angle(Milliarcseconds(n), form, d as u8));
    for d in 0..=3 {
        assert_eq!(angle(AngleForm::DecimalDegrees, d), decimal(n.into(), 3_600_000, d) + " deg", "{n} mas");
        assert_eq!(angle(AngleForm::DecimalSeconds, d), decimal(n.into(), 1000, d) + "\"", "{n} mas");
        for form in [AngleForm::DegreesMinutes, AngleForm::MinutesSeconds].into_iter().filter(|_| d < 3) {
            assert_eq!(angle(form, d), sexagesimal(n, form, d), "{n} mas");
        }
        assert_eq!(angle(AngleForm::BySize, d), by_size(n, d), "{n} mas");
    }
}

fn check_magnitude(n: i32) {
    for d in 0..=3 {
        let value = Value::magnitude(Millimagnitudes(n), d as u8);
        assert_eq!(shown(value), decimal(n.into(), 1000, d) + " mag", "{n} mmag");
    }
}

fn edges() -> impl Iterator<Item = u32> {
    let powers = (0..10).map(|p| 10u32.pow(p));
    let angles = (0..=65).chain([599, 600, 1192, 1193]).flat_map(|d| [d * 3_600_000, d * 60_000, d * 1000]);
    let shifts = (0..32).map(|s| 1 << s);
    let centres =
        powers.flat_map(|p| [p, 5 * (p / 10), p / 2]).chain(angles).chain(shifts).chain([u32::MAX, 1 << 31]);
    let offsets = [0, 1, 4, 5, 6, 49, 50, 51, 499, 500, 501, 2999, 3000, 3001, 29_999, 30_000, 30_001];
    centres.flat_map(move |c| offsets.into_iter().flat_map(move |o| [c.wrapping_sub(o), c.wrapping_add(o)]))
}

#[test]
fn every_edge() {
    for n in edges() {
        check_unsigned(n);
        check_angle(n);
        check_magnitude(n as i32);
    }
}

#[test]
fn dense_sweep() {
    let cases = std::env::var("FIELDSTOP_CASES").ok().and_then(|n| n.parse().ok()).unwrap_or(8_000u32);
    // A stride that is odd covers the whole type in a scattered order; the shift makes half of the cases small.
    for i in 0..cases {
        let n = i.wrapping_mul(0x9e37_79b1) >> (i % 2 * (i / 2 % 32));
        check_unsigned(n);
        check_angle(n);
        check_magnitude(n as i32);
    }
}

#[test]
fn carries_by_hand() {
    let angle = |mas, form, decimals| shown(Value::angle(Milliarcseconds(mas), form, decimals));
    use AngleForm::*;
    assert_eq!(angle(3_599_600, BySize, 0), "1d00'");
    assert_eq!(angle(3_599_600, MinutesSeconds, 0), "1d00'00\"");
    assert_eq!(angle(3_599_500, MinutesSeconds, 0), "1d00'00\"");
    assert_eq!(angle(3_599_499, MinutesSeconds, 0), "59'59\"");
    assert_eq!(angle(3_599_499, BySize, 0), "59'59\"");
    assert_eq!(angle(59_949, BySize, 1), "59.9\"");
    assert_eq!(angle(59_950, BySize, 1), "1'00\"");
    assert_eq!(angle(4_354_200, MinutesSeconds, 1), "1d12'34.2\"");
    assert_eq!(angle(4_354_200, DegreesMinutes, 0), "1d13'");
    assert_eq!(angle(754_000, DegreesMinutes, 1), "0d12.6'");
    assert_eq!(angle(34_000, MinutesSeconds, 0), "0'34\"");
    assert_eq!(angle(3_599_999, DecimalDegrees, 3), "1.000 deg");
    assert_eq!(angle(0, BySize, 0), "0\"");
    assert_eq!(angle(u32::MAX, MinutesSeconds, 2), "1193d02'47.30\"");
    assert_eq!(shown(Value::millimetres(Micrometres(9_950), 1)), "10.0 mm");
    assert_eq!(shown(Value::millimetres(Micrometres(9_949), 1)), "9.9 mm");
    assert_eq!(shown(Value::millimetres(Micrometres(999), 2)), "1.00 mm");
    assert_eq!(shown(Value::arcseconds(Microarcseconds(999_500), 3)), "1.000\"");
    assert_eq!(shown(Value::magnitude(Millimagnitudes(-1460), 2)), "-1.46 mag");
    assert_eq!(shown(Value::magnitude(Millimagnitudes(-1450), 1)), "-1.5 mag");
    assert_eq!(shown(Value::magnitude(Millimagnitudes(-49), 1)), "0.0 mag");
    assert_eq!(shown(Value::magnitude(Millimagnitudes(i32::MIN), 3)), "-2147483.648 mag");
    assert_eq!(shown(Value::focal_ratio(Q16(6 << 16), 1)), "f/6.0");
    assert_eq!(shown(Value::ratio(Q16(u32::MAX), 4)), "65536.0000");
    assert_eq!(shown(Value::NOT_AVAILABLE), "-");
}

#[test]
fn too_many_decimals_are_refused() {
    let refused = |value: Value, position| {
        let mut out = [0xaa; 24];
        let error = value.write(&TextStyle::ASCII, 0, &mut out).unwrap_err();
        assert_eq!((error.cause(), error.argument()), (Cause::OutOfRange, position));
        assert_eq!(out, [0xaa; 24]);
    };
    for extra in [0, 1, 100, 251 - 6] {
        refused(Value::millimetres(Micrometres(1), 4 + extra), 2);
        refused(Value::micrometres(Nanometres(1), 4 + extra), 2);
        refused(Value::ratio(Q16(1), 5 + extra), 2);
        refused(Value::magnification(Q16(1), 5 + extra), 2);
        refused(Value::focal_ratio(Q16(1), 5 + extra), 2);
        refused(Value::percent(Q16(1), 3 + extra), 2);
        refused(Value::arcseconds(Microarcseconds(1), 7 + extra), 2);
        refused(Value::magnitude(Millimagnitudes(1), 4 + extra), 2);
        for form in FORMS {
            for mas in [1, 60_000, 3_600_000] {
                let most = if [AngleForm::DegreesMinutes, AngleForm::MinutesSeconds].contains(&form) {
                    2
                } else {
                    3
                };
                refused(Value::angle(Milliarcseconds(mas), form, most + 1 + extra), 3);
            }
        }
    }
    refused(Value::ratio(Q16(1), 255), 2);
    refused(Value::percent(Q16(1), 255), 2);
}

const FORMS: [AngleForm; 5] = [
    AngleForm::BySize,
    AngleForm::DecimalDegrees,
    AngleForm::DegreesMinutes,
    AngleForm::MinutesSeconds,
    AngleForm::DecimalSeconds,
];

const STYLES: [TextStyle; 5] = [
    TextStyle::ASCII,
    TextStyle::UTF8,
    TextStyle::HD44780_A00,
    TextStyle::HD44780_A02,
    TextStyle { decimal_mark: b',', dash: text(b"~"), ..TextStyle::UTF8 },
];

#[test]
fn character_sets() {
    let written = |value: Value, style| {
        let mut out = [0xaa; 40];
        let length = value.write(style, 0, &mut out).unwrap();
        out[..length].to_vec()
    };
    let angle = Value::angle(Milliarcseconds(4_354_200), AngleForm::MinutesSeconds, 1);
    let degrees = Value::angle(Milliarcseconds(4_354_200), AngleForm::DecimalDegrees, 2);
    let small = Value::micrometres(Nanometres(3_760), 2);
    let times = Value::magnification(Q16(100 << 16), 0);
    let [ascii, utf8, a00, a02, comma] = &STYLES;
    assert_eq!(written(angle, ascii), b"1d12'34.2\"");
    assert_eq!(written(angle, utf8), "1°12′34.2″".as_bytes());
    assert_eq!(written(angle, a00), b"1\xdf12'34.2\"");
    assert_eq!(written(angle, a02), b"1\xb012'34.2\"");
    assert_eq!(written(angle, comma), "1°12′34,2″".as_bytes());
    assert_eq!(written(degrees, ascii), b"1.21 deg");
    assert_eq!(written(degrees, utf8), "1.21°".as_bytes());
    assert_eq!(written(degrees, a00), b"1.21\xdf");
    assert_eq!(written(degrees, a02), b"1.21\xb0");
    assert_eq!(written(small, ascii), b"3.76 um");
    assert_eq!(written(small, utf8), "3.76 µm".as_bytes());
    assert_eq!(written(small, a00), b"3.76 \xe4m");
    assert_eq!(written(small, a02), b"3.76 \xb5m");
    assert_eq!(written(times, ascii), b"100x");
    assert_eq!(written(times, utf8), "100×".as_bytes());
    assert_eq!(written(times, a00), b"100x");
    assert_eq!(written(times, a02), b"100\xd7");
    assert_eq!(written(Value::NOT_AVAILABLE, comma), b"~");
    for style in &STYLES {
        assert_eq!(style.unit(Unit::None), b"");
        assert_eq!(style.unit(Unit::Watt), b" W");
        for (number, text) in style.units.iter().enumerate() {
            assert_ne!(text[0], 0, "unit {number} has a text");
        }
    }
}

#[test]
fn number_and_unit_on_their_own() {
    let field = Value::angle(Milliarcseconds(4_354_200), AngleForm::DegreesMinutes, 0);
    assert_eq!((shown(field.without_unit()).as_str(), field.unit()), ("1d13'", Unit::None));
    let pupil = Value::millimetres(Micrometres(5_000), 1);
    assert_eq!((shown(pupil.without_unit()).as_str(), pupil.unit()), ("5.0", Unit::Millimetre));
}

fn any_value() -> impl Strategy<Value = Value> {
    let number = prop_oneof![any::<u32>(), (any::<u32>(), 0u32..32).prop_map(|(n, s)| n >> s)];
    (number, 0..11, 0u8..6).prop_map(|(n, kind, d)| match kind {
        0 => Value::count(n, Unit::Step),
        1 => Value::millimetres(Micrometres(n), d),
        2 => Value::micrometres(Nanometres(n), d),
        3 => Value::ratio(Q16(n), d),
        4 => Value::magnification(Q16(n), d),
        5 => Value::focal_ratio(Q16(n), d),
        6 => Value::percent(Q16(n), d),
        7 => Value::arcseconds(Microarcseconds(n), d),
        8 => Value::magnitude(Millimagnitudes(n as i32), d),
        9 => Value::NOT_AVAILABLE,
        _ => Value::angle(Milliarcseconds(n), FORMS[n as usize % 5], d),
    })
}

fn characters(style: &TextStyle, bytes: &[u8]) -> usize {
    if style.utf8 == 1 { std::str::from_utf8(bytes).unwrap().chars().count() } else { bytes.len() }
}

proptest! {
    /// Every width and capacity: exactly as wide as asked, right-aligned, or refused with nothing written.
    #[test]
    fn widths_and_capacities(value in any_value(), style in proptest::sample::select(&STYLES[..])) {
        let mut whole = [0xaa; 64];
        let alone = value.write(&style, 0, &mut whole);
        let Ok(alone) = alone else {
            prop_assert_eq!(alone.unwrap_err().cause(), Cause::OutOfRange);
            prop_assert_eq!(whole, [0xaa; 64]);
            return Ok(());
        };
        let count = characters(&style, &whole[..alone]);
        for width in 0..=30u8 {
            let blanks = if width == 0 { Some(0) } else { usize::from(width).checked_sub(count) };
            for capacity in 0..=40 {
                let mut out = [0xaa; 48];
                let result = value.write(&style, width, &mut out[..capacity]);
                match blanks.filter(|blanks| blanks + alone <= capacity) {
                    Some(blanks) => {
                        prop_assert_eq!(result, Ok(blanks + alone));
                        prop_assert!(out[..blanks].iter().all(|&byte| byte == b' '));
                        prop_assert_eq!(&out[blanks..blanks + alone], &whole[..alone]);
                        prop_assert!(out[blanks + alone..].iter().all(|&byte| byte == 0xaa));
                    }
                    None => {
                        prop_assert_eq!(result.unwrap_err(), fieldstop::Error::new(Cause::NoRoom, 0));
                        prop_assert_eq!(out, [0xaa; 48]);
                    }
                }
            }
        }
    }

    /// Any bytes at all as a style: no panic, and the width still holds.
    #[test]
    fn any_style(value in any_value(), bytes in any::<[u8; 195]>(), width in any::<u8>()) {
        let mut units = [[0; 8]; 21];
        for (place, &byte) in units.as_flattened_mut().iter_mut().zip(&bytes) {
            *place = byte;
        }
        let (dash, yes, no) = (units[3], units[4], units[5]);
        let [.., decimal_mark, fact_mark, utf8] = bytes;
        let style = TextStyle { units, dash, yes, no, decimal_mark, fact_mark, utf8: utf8 & 1 };
        let mut out = [0; 300];
        if let Ok(length) = value.write(&style, width, &mut out) && width > 0 && utf8 & 1 == 0 {
            prop_assert_eq!(length, usize::from(width));
        }
    }
}

#[cfg(feature = "heapless")]
#[test]
fn heapless_strings() {
    let angle = Value::angle(Milliarcseconds(754_000), AngleForm::BySize, 0);
    let text = string::<12>(|out| angle.write(&TextStyle::UTF8, 8, out)).unwrap();
    assert_eq!(text, "  12′34″");
    let error = string::<4>(|out| angle.write(&TextStyle::UTF8, 0, out)).unwrap_err();
    assert_eq!(error.cause(), Cause::NoRoom);
    let times = Value::micrometres(Nanometres(3_760), 2);
    let error = string::<12>(|out| times.write(&TextStyle::HD44780_A00, 0, out)).unwrap_err();
    assert_eq!(error.cause(), Cause::OutOfRange);
}
