//! Entries of any bytes: what is read can be printed, and read and printed again with the same characters; every
//! beginning of what is read is complete or partial.
#![no_main]

use fieldstop::text::{AngleForm, EntryKind, TextStyle, Unit, Value, read_entry};
use fieldstop::units::{Microarcseconds, Micrometres, Milliarcseconds, Millimagnitudes, Nanometres, Q16};
use libfuzzer_sys::fuzz_target;

fuzz_target!(|input: (u8, u8, u8, u32, &[u8])| {
    let (kind, look, decimals, aperture, text) = input;
    let kind = EntryKind::ALL[usize::from(kind) % EntryKind::ALL.len()];
    let mut style = match look % 4 {
        0 => TextStyle::ASCII,
        1 => TextStyle::UTF8,
        2 => TextStyle::HD44780_A00,
        _ => TextStyle::HD44780_A02,
    };
    if look & 4 != 0 {
        style.decimal_mark = b',';
    }
    let quantity = match read_entry(text, kind, aperture, &style) {
        Ok(quantity) => quantity,
        Err(error) => {
            assert!(error.at <= text.len());
            return;
        }
    };
    for end in 0..text.len() {
        if let Err(error) = read_entry(&text[..end], kind, aperture, &style) {
            assert!(error.partial && error.at <= end, "{error:?}");
        }
    }
    let Some(value) = value(kind, quantity, decimals, look) else { return };
    let mut first = [0; 64];
    let length = value.write(&style, 0, &mut first).unwrap();
    let first = &first[..length];
    let Ok(again) = read_entry(first, kind, aperture, &style) else {
        // Rounded up past the end of the range.
        let size =
            if kind == EntryKind::Magnitude { (quantity as i32).unsigned_abs() << 1 } else { quantity };
        assert!(size > u32::MAX - 216_000_000, "{first:?} is not read");
        return;
    };
    let mut second = [0; 64];
    let value = self::value(kind, again, decimals, look).unwrap();
    let length = value.write(&style, 0, &mut second).unwrap();
    assert_eq!(first, &second[..length]);
});

/// The quantity as text, where there is a form for its kind.
fn value(kind: EntryKind, quantity: u32, decimals: u8, look: u8) -> Option<Value> {
    let few = decimals % 4;
    Some(match kind {
        EntryKind::Length | EntryKind::FocalLength => Value::millimetres(Micrometres(quantity), few),
        EntryKind::PixelPitch => Value::micrometres(Nanometres(quantity), few),
        EntryKind::Wavelength => Value::count(quantity, Unit::Nanometre),
        EntryKind::Angle => {
            let form = AngleForm::from_number((look >> 3) % 5)?;
            Value::angle(Milliarcseconds(quantity), form, decimals % 3)
        }
        EntryKind::SmallAngle => Value::arcseconds(Microarcseconds(quantity), decimals % 7),
        EntryKind::Ratio => Value::ratio(Q16(quantity), decimals % 5),
        EntryKind::FocalRatio => Value::focal_ratio(Q16(quantity), decimals % 5),
        EntryKind::Magnification => Value::magnification(Q16(quantity), decimals % 5),
        EntryKind::Percent => Value::percent(Q16(quantity), decimals % 3),
        EntryKind::Magnitude => Value::magnitude(Millimagnitudes(quantity as i32), few),
        EntryKind::Duration => Value::decimal(quantity, 3, few, Unit::Time),
        EntryKind::Count => Value::count(quantity, Unit::Pixel),
        _ => return None,
    })
}
