//! Entries as quantities: tables of spellings, an independent reference in rationals, every beginning of what is
//! accepted, and what was printed read again.

use fieldstop::text::EntryKind::*;
use fieldstop::text::EntryReason::*;
use fieldstop::text::{AngleForm, EntryError, EntryKind, EntryReason, TextStyle, Value, read_entry};
use fieldstop::units::*;
use proptest::prelude::*;

const APERTURE: u32 = 187_500;

fn german() -> TextStyle {
    TextStyle { decimal_mark: b',', ..TextStyle::UTF8 }
}

fn styles() -> [TextStyle; 5] {
    [TextStyle::ASCII, TextStyle::UTF8, TextStyle::HD44780_A00, TextStyle::HD44780_A02, german()]
}

fn read(kind: EntryKind, text: &str) -> Result<u32, EntryError> {
    read_entry(text.as_bytes(), kind, APERTURE, &TextStyle::ASCII)
}

/// Every beginning is complete or partial.
fn check_beginnings(kind: EntryKind, text: &[u8], style: &TextStyle) {
    for end in 0..text.len() {
        if let Err(error) = read_entry(&text[..end], kind, APERTURE, style) {
            let shown = String::from_utf8_lossy(&text[..end]);
            assert!(error.partial, "{kind:?} {shown:?} of {:?}: {error:?}", String::from_utf8_lossy(text));
            assert!(error.at <= end);
        }
    }
}

#[test]
fn accepted() {
    let turn = |degrees: f64| (degrees / 360.0 * 4_294_967_296.0).round() as i64 as u32;
    let table: &[(EntryKind, &[&str], u32)] = &[
        (
            Length,
            &["1200", "1200mm", "1200 mm", " 1200 mm ", "1.2 m", "1.2m", "120cm", "1200000um", "01200.000"],
            1_200_000,
        ),
        (Length, &["47.24in", "47.24 in", "47.24\""], 1_199_896),
        (Length, &["0", "0.0", "0mm", ".0"], 0),
        (Length, &["4294967295um", "4294967.295", "4294.967295 m", "4294967.2954999999"], u32::MAX),
        (Length, &["550nm", "0.00055", "0.55 um", "0.55µm", ".55 μm"], 1),
        (FocalLength, &["f/8", "F/8", "f/ 8", "f/8.0", "1500", "1.5m", " f/8"], 1_500_000),
        (FocalLength, &["f/5.33333333333333333333333"], 1_000_000),
        (PixelPitch, &["3.76", "3.76um", "3.76 um", "3.76µm", "3.76 μm", "0.00376mm", "3760 nm"], 3760),
        (Wavelength, &["550", "550nm", "0.55um", "0.00055 mm"], 550),
        (
            Angle,
            &[
                "1d15'",
                "1d15",
                "1.25",
                "1.25d",
                "1.25 deg",
                "1°15′",
                "75'",
                "75 arcmin",
                "4500\"",
                "4500arcsec",
            ],
            4_500_000,
        ),
        (Angle, &["68 deg", "68", "68d", "68°", "68d00'", "68d00'00.000\"", "68d0\""], 244_800_000),
        (Angle, &["12'34\"", "12'34", "12′34″", "12' 34\"", "754\"", "0d12'34\""], 754_000),
        (Angle, &["12'34.5\"", "12'34.5", "12.575'"], 754_500),
        (SmallAngle, &["0.832", "0.832\"", "0.832 arcsec", "0.832″"], 832_000),
        (SmallAngle, &["1d", "60'", "3600"], 3_600_000_000),
        (Ratio, &["2.5", "2.50"], 163_840),
        (FocalRatio, &["8", "f/8", "F/8.0"], 8 << 16),
        (Magnification, &["2.5", "2.5x", "2.5 x", "2.5×"], 163_840),
        (Percent, &["82", "82%", "82 %", "82.0%"], 53_740),
        (Magnitude, &["5.3", "5.3 mag", "+5.3", "5.3mag", "+ 5.3"], 5300),
        (Magnitude, &["-1.46", "-1.46 mag", "- 1.46"], -1460i32 as u32),
        (Magnitude, &["-2147483.648"], i32::MIN as u32),
        (Magnitude, &["-0", "0", "-0.0001"], 0),
        (
            Latitude,
            &[
                "47.5",
                "47.5N",
                "+47.5",
                "47d30'",
                "47d30'N",
                "47d30'00\" N",
                "47:30",
                "47:30:00N",
                "47 deg 30' N",
            ],
            turn(47.5),
        ),
        (Latitude, &["-47.5", "47.5S", "47d30'S", "-47:30", "47:30 S"], turn(-47.5)),
        (Latitude, &["90", "90N", "5400'", "324000\""], 1 << 30),
        (Longitude, &["11.25", "11.25E", "+11.25", "11d15'E", "11:15"], turn(11.25)),
        (Longitude, &["348.75", "11.25W", "-11.25", "11d15'W", "-11:15:00"], turn(-11.25)),
        (Longitude, &["180", "180E", "180W", "-180", "+180d00'"], 1 << 31),
        (Longitude, &["359.99999999999", "0", "-0", "0W"], 0),
        (Declination, &["-5d27'", "-5.45", "-5:27", "-5:27:00.0"], turn(-5.45)),
        (
            RightAscension,
            &["13h10m46s", "13:10:46", "13h10m46", "13h10:46", "13 h 10 m 46 s", "13h10min46s"],
            turn(197.0 + 41.5 / 60.0),
        ),
        (RightAscension, &["12", "12h", "720m", "180d", "180 deg", "12:00", "43200s"], 1 << 31),
        (TimeOfDay, &["13h10m46s", "13:10:46", "13:10:46.000", "13h10m46"], 47_446_000),
        (TimeOfDay, &["23:59:59.9996", "0", "00:00"], 0),
        (Duration, &["90", "90s", "1m30s", "1m30", "1.5m", "1.5 min", "0h1m30s"], 90_000),
        (Count, &["4096", "4096 px", "4096px", "4096 steps", "04096"], 4096),
        (Count, &["1 step"], 1),
    ];
    for &(kind, texts, quantity) in table {
        for text in texts {
            assert_eq!(read(kind, text), Ok(quantity), "{kind:?} {text:?}");
            check_beginnings(kind, text.as_bytes(), &TextStyle::ASCII);
        }
    }
}

#[test]
fn partial() {
    let table: &[(EntryKind, &[&str])] = &[
        (Length, &["", " ", ".", "1.", "12 c", "12 u", "12 i", "12n"]),
        (FocalLength, &["f", "f/", "F/ ", "f/8."]),
        (Angle, &["1 de", "12arc", "12arcmi", "1d.", "1d12'3."]),
        (Magnitude, &["-", "+", "-.", "5.3 m", "5.3 ma"]),
        (RightAscension, &["13:", "13:10:", "13h10mi"]),
        (Count, &["4096 p", "4096 s", "4096 st"]),
    ];
    for &(kind, texts) in table {
        for text in texts {
            let at = text.len();
            assert_eq!(
                read(kind, text),
                Err(EntryError { reason: Ended, at, partial: true }),
                "{kind:?} {text:?}"
            );
            check_beginnings(kind, text.as_bytes(), &TextStyle::ASCII);
        }
    }
    // The unit can still become a smaller one.
    for (kind, text, whole) in [
        (Length, "5000 m", "5000 mm"),
        (Length, "5000000", "5000000um"),
        (Latitude, "91", "91'"),
        (Latitude, "-91.5", "-91.5'"),
        (RightAscension, "30", "30m"),
        (Angle, "1193d03", "1193d03\""),
    ] {
        let error = read(kind, text).unwrap_err();
        assert_eq!((error.reason, error.partial), (TooLarge, true), "{text}");
        assert!(read(kind, whole).is_ok(), "{whole}");
    }
}

#[test]
fn refused() {
    let table: &[(EntryKind, &str, EntryReason, usize)] = &[
        (Length, "x", Unexpected, 0),
        (Length, "-5", Unexpected, 0),
        (Length, "+5", Unexpected, 0),
        (Length, "1,2", Unexpected, 1),
        (Length, "1.2.3", Unexpected, 3),
        (Length, "1..2", Unexpected, 2),
        (Length, "1.mm", Unexpected, 2),
        (Length, "1e3", Unexpected, 1),
        (Length, "12 3", Unexpected, 3),
        (Length, "12 mm 3", Unexpected, 6),
        (Length, "12 mx", Unexpected, 4),
        (Length, "12 ft", Unexpected, 3),
        (Length, "12 ix", Unexpected, 4),
        (Length, "12 MM", Unexpected, 3),
        (Length, "f/8", Unexpected, 0),
        (Length, "mm", Unexpected, 0),
        (Length, "4294967.2955mm", TooLarge, 0),
        (Length, " 4294967296um ", TooLarge, 1),
        (Length, "99999999999999999999", TooLarge, 0),
        (Length, "4294967296", TooLarge, 0),
        (FocalLength, "f8", Unexpected, 1),
        (FocalLength, "f/8mm", Unexpected, 3),
        (FocalLength, "f/-8", Unexpected, 2),
        (FocalLength, "f/22907", TooLarge, 2),
        (PixelPitch, "5 m ", TooLarge, 0),
        (Wavelength, "550 mag", Unexpected, 5),
        (Angle, "1d60'", Sixty, 2),
        (Angle, "1d15'60\"", Sixty, 5),
        (Angle, "1d15'99", Sixty, 5),
        (Angle, "15'1d", Unexpected, 4),
        (Angle, "1.5d15'", Unexpected, 4),
        (Angle, "1 15", Unexpected, 2),
        (Angle, "1:15", Unexpected, 1),
        (Angle, "1d15\"3", Unexpected, 5),
        (Angle, "1dd", Unexpected, 2),
        (Angle, "1200d", TooLarge, 0),
        (Ratio, "2.5x", Unexpected, 3),
        (Ratio, "65536", TooLarge, 0),
        (Ratio, "65535.999993", TooLarge, 0),
        (Magnification, "x2.5", Unexpected, 0),
        (Percent, "82%%", Unexpected, 3),
        (Percent, "-1", Unexpected, 0),
        (Magnitude, "--5", Unexpected, 1),
        (Magnitude, "2147483.648", TooLarge, 0),
        (Magnitude, "-2147483.6485", TooLarge, 1),
        (Latitude, "-47.5N", Unexpected, 5),
        (Latitude, "47.5E", Unexpected, 4),
        (Latitude, "47.5NN", Unexpected, 5),
        (Latitude, "90.0001N", TooLarge, 0),
        (Latitude, "47:60", Sixty, 3),
        (Latitude, "47:30:00:1", Unexpected, 8),
        (Longitude, "180.5W", TooLarge, 0),
        (Longitude, "360d", TooLarge, 0),
        (Longitude, "-359.99999999999d", TooLarge, 1),
        (Declination, "47.5N", Unexpected, 4),
        (Declination, "-90d1", TooLarge, 4),
        (Declination, "-90d1'", TooLarge, 4),
        (RightAscension, "24h", TooLarge, 0),
        (RightAscension, "-1h", Unexpected, 0),
        (RightAscension, "13h10'", Unexpected, 5),
        (RightAscension, "13d10m", Unexpected, 5),
        (RightAscension, "13:10:60", Sixty, 6),
        (TimeOfDay, "24:00", TooLarge, 3),
        (TimeOfDay, "12d", Unexpected, 2),
        (Duration, "1:30", Unexpected, 1),
        (Duration, "1194h", TooLarge, 0),
        (Count, "12.5", Unexpected, 2),
        (Count, "4294967296", TooLarge, 0),
    ];
    for &(kind, text, reason, at) in table {
        assert_eq!(read(kind, text), Err(EntryError { reason, at, partial: false }), "{kind:?} {text:?}");
    }
    let unknown = read_entry(b"f/8", FocalLength, 0, &TextStyle::ASCII);
    assert_eq!(unknown, Err(EntryError { reason: NoAperture, at: 0, partial: false }));
    // The mark is that of the style.
    assert_eq!(read_entry(b"1,2m", Length, 0, &german()), Ok(1_200_000));
    assert_eq!(read_entry(b"1.2m", Length, 0, &german()).unwrap_err().at, 1);
    assert_eq!(read_entry(b"3.76 \xe4m", PixelPitch, 0, &TextStyle::HD44780_A00), Ok(3760));
    assert_eq!(read_entry(b"3.76 \xe4m", PixelPitch, 0, &TextStyle::ASCII).unwrap_err().at, 5);
    assert_eq!(read_entry(b"1\xdf15'", Angle, 0, &TextStyle::HD44780_A00), Ok(4_500_000));
    assert_eq!(read_entry(b"2.5\xd7", Magnification, 0, &TextStyle::HD44780_A02), Ok(163_840));
}

/// (whole + decimals) n / d to nearest, halves away from zero, in rationals of any size: schoolbook digits.
fn exact(whole: u32, decimals: &str, n: u64, d: u64) -> Option<u32> {
    // number = digits / 10^k; rounded = (2 digits n + 10^k d) / (2 10^k d), by digits of base 10^9 would do; here by
    // long division of the decimal digits of 2 digits n + 10^k d.
    let digits: Vec<u8> = format!("{whole}{decimals}").bytes().map(|b| b - b'0').collect();
    let mut sum = times(&digits, 2 * u128::from(n));
    let mut half = times(&[1], u128::from(d));
    half.extend(std::iter::repeat_n(0, decimals.len()));
    let length = sum.len().max(half.len()) + 1;
    let padded = |x: &[u8]| [vec![0; length - x.len()], x.to_vec()].concat();
    let (a, b) = (padded(&sum), padded(&half));
    let mut carry = 0;
    sum = vec![0; length];
    for i in (0..length).rev() {
        let digit = a[i] + b[i] + carry;
        (sum[i], carry) = (digit % 10, digit / 10);
    }
    // Cutting off k digits, then dividing: cut quotients follow one another.
    sum.truncate(length - decimals.len());
    let (mut quotient, mut rest) = (0u128, 0u128);
    for digit in sum {
        rest = rest * 10 + u128::from(digit);
        quotient = quotient * 10 + rest / (2 * u128::from(d));
        rest %= 2 * u128::from(d);
    }
    u32::try_from(quotient).ok()
}

fn times(digits: &[u8], factor: u128) -> Vec<u8> {
    let mut out = Vec::new();
    let mut carry = 0u128;
    for &digit in digits.iter().rev() {
        carry += u128::from(digit) * factor;
        out.push((carry % 10) as u8);
        carry /= 10;
    }
    while carry > 0 {
        out.push((carry % 10) as u8);
        carry /= 10;
    }
    out.reverse();
    out
}

const UNITS: &[(EntryKind, &str, u64, u64)] = &[
    (Length, "", 1000, 1),
    (Length, "in", 25_400, 1),
    (Length, "m", 1_000_000, 1),
    (Length, "nm", 1, 1000),
    (PixelPitch, "", 1000, 1),
    (PixelPitch, "in", 25_400_000, 1),
    (PixelPitch, "m", 1_000_000_000, 1),
    (Wavelength, "", 1, 1),
    (Angle, "", 3_600_000, 1),
    (Angle, "'", 60_000, 1),
    (SmallAngle, "d", 3_600_000_000, 1),
    (SmallAngle, "", 1_000_000, 1),
    (Ratio, "", 65_536, 1),
    (Percent, "%", 65_536, 100),
    (Duration, "h", 3_600_000, 1),
    (Duration, "", 1000, 1),
    (TimeOfDay, "s", 1000, 1),
    (RightAscension, "d", 1 << 32, 360),
    (RightAscension, "s", 1 << 32, 86_400),
    (Longitude, "\"", 1 << 32, 1_296_000),
];

proptest! {
    #![proptest_config(ProptestConfig::with_cases(2000))]

    #[test]
    fn rounds_exactly(
        row in 0..UNITS.len(),
        whole in prop_oneof![0u32..100, 0u32..70_000, any::<u32>()],
        decimals in prop_oneof!["[0-9]{0,12}", "[0-9]{0,4}(0{1,20}|4999999999999|5|50{20}|50{20}1|9{20})"],
    ) {
        let (kind, unit, n, d) = UNITS[row];
        let mark = if decimals.is_empty() { "" } else { "." };
        let text = format!("{whole}{mark}{decimals}{unit}");
        let mut expected = exact(whole, &decimals, n, d);
        let turn: u64 = match kind {
            RightAscension | Longitude => 1 << 32,
            TimeOfDay => 86_400_000,
            _ => 0,
        };
        if turn > 0 {
            let under = u128::from(whole) * u128::from(n) < u128::from(turn) * u128::from(d);
            expected = under.then(|| expected.filter(|&e| u64::from(e) < turn).unwrap_or(0));
        }
        match (read(kind, &text), expected) {
            (Ok(quantity), Some(expected)) => {
                prop_assert_eq!(quantity, expected, "{}", &text);
                check_beginnings(kind, text.as_bytes(), &TextStyle::ASCII);
            }
            (Err(error), None) => prop_assert_eq!(error.reason, TooLarge, "{}", &text),
            (read, expected) => prop_assert!(false, "{} {:?} {:?}", text, read, expected),
        }
    }

    #[test]
    fn a_focal_ratio_times_any_aperture(whole in 0u32..2000, decimals in "[0-9]{1,15}", aperture in 1u32..) {
        let text = format!("f/{whole}.{decimals}");
        let read = read_entry(text.as_bytes(), FocalLength, aperture, &TextStyle::ASCII);
        prop_assert_eq!(read.ok(), exact(whole, &decimals, aperture.into(), 1));
    }

    #[test]
    fn every_beginning_of_what_is_accepted(kind in 0u8..18, text in "[ +-]?(f/)?[0-9]{1,5}(\\.[0-9]{1,3})?( ?(m|mm|cm|um|nm|in|d|deg|'|\"|h|min|s|:|x|%|mag|px))?([0-9]{1,2}(m|'|:)?)?([0-9]{1,2}(\\.[0-9])?(s|\")?)? ?[NSEW]?") {
        let kind = EntryKind::from_number(kind).unwrap();
        if read(kind, &text).is_ok() {
            check_beginnings(kind, text.as_bytes(), &TextStyle::ASCII);
        }
    }

    #[test]
    fn any_bytes(kind in 0u8..18, text in proptest::collection::vec(any::<u8>(), 0..40)) {
        let kind = EntryKind::from_number(kind).unwrap();
        for style in &styles() {
            match read_entry(&text, kind, APERTURE, style) {
                Ok(_) => check_beginnings(kind, &text, style),
                Err(error) => prop_assert!(error.at <= text.len()),
            }
        }
    }

    #[test]
    fn what_is_printed_is_read(number in prop_oneof![0u32..100_000, 0u32..400_000_000, any::<u32>()], places in 0u8..5) {
        for style in &styles() {
            let printed: &[(EntryKind, &dyn Fn(u32) -> Value)] = &[
                (Length, &|n| Value::millimetres(Micrometres(n), places)),
                (PixelPitch, &|n| Value::micrometres(Nanometres(n), places)),
                (Ratio, &|n| Value::ratio(Q16(n), places)),
                (Magnification, &|n| Value::magnification(Q16(n), places)),
                (FocalRatio, &|n| Value::focal_ratio(Q16(n), places)),
                (Percent, &|n| Value::percent(Q16(n), places)),
                (SmallAngle, &|n| Value::arcseconds(Microarcseconds(n), places)),
                (Magnitude, &|n| Value::magnitude(Millimagnitudes(n as i32), places)),
                (Angle, &|n| Value::angle(Milliarcseconds(n), AngleForm::BySize, places)),
                (Angle, &|n| Value::angle(Milliarcseconds(n), AngleForm::DecimalDegrees, places)),
                (Angle, &|n| Value::angle(Milliarcseconds(n), AngleForm::DegreesMinutes, places)),
                (Angle, &|n| Value::angle(Milliarcseconds(n), AngleForm::MinutesSeconds, places)),
                (Angle, &|n| Value::angle(Milliarcseconds(n), AngleForm::DecimalSeconds, places)),
                (Count, &|n| Value::count(n, fieldstop::text::Unit::Pixel)),
                (Count, &|n| Value::count(n, fieldstop::text::Unit::Step)),
            ];
            for (kind, value) in printed {
                let mut first = [0; 40];
                let Ok(length) = value(number).write(style, 0, &mut first) else { continue };
                let first = &first[..length];
                let quantity = match read_entry(first, *kind, 0, style) {
                    Ok(quantity) => quantity,
                    // Rounded up past the end of the range.
                    Err(error) if error.reason == TooLarge && number > u32::MAX - 216_000_000 => continue,
                    Err(error) if *kind == Magnitude && error.reason == TooLarge => {
                        prop_assert!((number as i32).unsigned_abs() > i32::MAX as u32 - 1000);
                        continue;
                    }
                    Err(error) => panic!("{kind:?} {:?}: {error:?}", String::from_utf8_lossy(first)),
                };
                let mut again = [0; 40];
                let length = value(quantity).write(style, 0, &mut again).unwrap();
                prop_assert_eq!(&again[..length], first);
                check_beginnings(*kind, first, style);
            }
        }
    }
}

#[cfg(feature = "capi")]
mod c {
    use super::*;
    use core::ptr::{null, null_mut};
    use fieldstop::capi::entry::*;

    #[test]
    fn kinds_have_their_numbers() {
        for (number, kind) in EntryKind::ALL.into_iter().enumerate() {
            assert_eq!(kind as usize, number);
            assert_eq!(EntryKind::from_number(number as u8), Some(kind));
        }
        assert_eq!(EntryKind::from_number(18), None);
        assert_eq!(FIELDSTOP_ENTRY_COUNT, Count as u8);
        assert_eq!(FIELDSTOP_ENTRY_RIGHT_ASCENSION, RightAscension as u8);
        assert_eq!(FIELDSTOP_ENTRY_NO_APERTURE, NoAperture as u8);
    }

    #[test]
    fn statuses() {
        let style = &TextStyle::ASCII;
        let mut quantity = 77;
        let mut call = |text: &str, kind: u8, aperture| unsafe {
            let status = fieldstop_entry_read(
                text.as_ptr().cast(),
                text.len() as u16,
                kind,
                aperture,
                style,
                &mut quantity,
            );
            (status, quantity)
        };
        assert_eq!(call("1.2.", 0, 0), (0x103, 77));
        assert_eq!(call("1.", 0, 0), (0x103, 77));
        assert_eq!(call("4294967296", 0, 0), (0x105, 77));
        assert_eq!(call("1", 18, 0), (0x303, 77));
        assert_eq!(call("f/8", 1, 0), (0x402, 77));
        assert_eq!(call("f/8", 1, 100_000), (0, 800_000));
        let mut check = EntryState { quantity: 1, position: 2, state: 3, reason: 4 };
        let before = check;
        unsafe {
            let text = b"1".as_ptr().cast();
            assert_eq!(fieldstop_entry_read(null(), 1, 0, 0, null(), null_mut()), 0x101);
            assert_eq!(fieldstop_entry_read(text, 1, 99, 0, null(), null_mut()), 0x501);
            assert_eq!(fieldstop_entry_read(text, 1, 99, 0, style, null_mut()), 0x601);
            assert_eq!(fieldstop_entry_check(null(), 1, 0, 0, style, &mut check), 0x101);
            assert_eq!(fieldstop_entry_check(text, 1, 0, 0, null(), &mut check), 0x501);
            assert_eq!(fieldstop_entry_check(text, 1, 0, 0, style, null_mut()), 0x601);
            assert_eq!(fieldstop_entry_check(text, 1, 18, 0, style, &mut check), 0x303);
        }
        assert_eq!(check, before);
    }

    #[test]
    fn the_same_as_in_rust() {
        for text in ["1.5", "1.", "f/8", "f/", "1d60'", "5000 m", "", "13:10:46", "5q"] {
            for kind in EntryKind::ALL {
                let mut check = EntryState { quantity: 1, position: 2, state: 3, reason: 4 };
                let length = text.len() as u16;
                let status = unsafe {
                    fieldstop_entry_check(
                        text.as_ptr().cast(),
                        length,
                        kind as u8,
                        0,
                        &TextStyle::ASCII,
                        &mut check,
                    )
                };
                assert_eq!(status, 0);
                let expected = match read_entry(text.as_bytes(), kind, 0, &TextStyle::ASCII) {
                    Ok(quantity) => EntryState { quantity, position: length, state: 0, reason: 0 },
                    Err(EntryError { reason, at, partial }) => EntryState {
                        quantity: 0,
                        position: at as u16,
                        state: if partial { 1 } else { 2 },
                        reason: reason as u8,
                    },
                };
                assert_eq!(check, expected, "{kind:?} {text}");
            }
        }
    }
}
