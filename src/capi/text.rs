//! C exports of `text`.

use super::fieldstop_status;
use crate::status::{Cause, Error};
use crate::text::{AngleForm, TextStyle, Unit, Value};
use crate::units::{Microarcseconds, Micrometres, Milliarcseconds, Millimagnitudes, Nanometres, Q16};
use core::ffi::c_char;
use core::slice;

/// Angle: decimal seconds under one minute, whole seconds under one degree, whole minutes from there on.
pub const FIELDSTOP_ANGLE_BY_SIZE: u8 = 0;
/// Angle: degrees with decimals.
pub const FIELDSTOP_ANGLE_DECIMAL_DEGREES: u8 = 1;
/// Angle: degrees and minutes.
pub const FIELDSTOP_ANGLE_DEGREES_MINUTES: u8 = 2;
/// Angle: minutes and seconds, with degrees in front from sixty minutes on.
pub const FIELDSTOP_ANGLE_MINUTES_SECONDS: u8 = 3;
/// Angle: seconds, however many.
pub const FIELDSTOP_ANGLE_DECIMAL_SECONDS: u8 = 4;

/// Unit: a plain number.
pub const FIELDSTOP_UNIT_NONE: u8 = 0;
/// Unit: between degrees and minutes of arc.
pub const FIELDSTOP_UNIT_DEGREE: u8 = 1;
/// Unit: minutes of arc.
pub const FIELDSTOP_UNIT_MINUTE: u8 = 2;
/// Unit: seconds of arc.
pub const FIELDSTOP_UNIT_SECOND: u8 = 3;
/// Unit: degrees with decimals.
pub const FIELDSTOP_UNIT_DECIMAL_DEGREE: u8 = 4;
/// Unit: metres.
pub const FIELDSTOP_UNIT_METRE: u8 = 5;
/// Unit: millimetres.
pub const FIELDSTOP_UNIT_MILLIMETRE: u8 = 6;
/// Unit: micrometres.
pub const FIELDSTOP_UNIT_MICROMETRE: u8 = 7;
/// Unit: nanometres.
pub const FIELDSTOP_UNIT_NANOMETRE: u8 = 8;
/// Unit: magnification.
pub const FIELDSTOP_UNIT_TIMES: u8 = 9;
/// Unit: per hundred.
pub const FIELDSTOP_UNIT_PERCENT: u8 = 10;
/// Unit: magnitudes.
pub const FIELDSTOP_UNIT_MAGNITUDE: u8 = 11;
/// Unit: in front of a focal ratio.
pub const FIELDSTOP_UNIT_FOCAL_RATIO: u8 = 12;
/// Unit: pixels.
pub const FIELDSTOP_UNIT_PIXEL: u8 = 13;
/// Unit: seconds of arc to a pixel.
pub const FIELDSTOP_UNIT_SECOND_PER_PIXEL: u8 = 14;
/// Unit: seconds of arc to a millimetre.
pub const FIELDSTOP_UNIT_SECOND_PER_MILLIMETRE: u8 = 15;
/// Unit: seconds of arc in a second of time.
pub const FIELDSTOP_UNIT_SECOND_PER_TIME: u8 = 16;
/// Unit: cycles to a millimetre.
pub const FIELDSTOP_UNIT_PER_MILLIMETRE: u8 = 17;
/// Unit: seconds of time.
pub const FIELDSTOP_UNIT_TIME: u8 = 18;
/// Unit: steps of a motor.
pub const FIELDSTOP_UNIT_STEP: u8 = 19;
/// Unit: kelvin.
pub const FIELDSTOP_UNIT_KELVIN: u8 = 20;
/// Unit: watts.
pub const FIELDSTOP_UNIT_WATT: u8 = 21;

/// Gives the style of plain ASCII; never null.
///
/// `d` and `deg` stand for the degree sign, `u` for micro, `x` for times. Copy it to change the decimal mark or a text.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_style_ascii() -> *const TextStyle {
    static STYLE: TextStyle = TextStyle::ASCII;
    &STYLE
}

/// Gives the style of UTF-8, with the signs of degree, prime, double prime, micro and times; never null.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_style_utf8() -> *const TextStyle {
    static STYLE: TextStyle = TextStyle::UTF8;
    &STYLE
}

/// Gives the style of character displays with ROM A00 (Japanese) of the HD44780U; never null.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_style_hd44780_a00() -> *const TextStyle {
    static STYLE: TextStyle = TextStyle::HD44780_A00;
    &STYLE
}

/// Gives the style of character displays with ROM A02 (European) of the HD44780U; never null.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_style_hd44780_a02() -> *const TextStyle {
    static STYLE: TextStyle = TextStyle::HD44780_A02;
    &STYLE
}

/// Writes an integer with its unit as text and gives its length in bytes.
///
/// Ranges: unit one of FIELDSTOP_UNIT_...; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (unit), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_count(
    count: u32,
    unit: u8,
    style: *const TextStyle,
    width: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    let value = match Unit::from_number(unit) {
        Some(unit) => Value::count(count, unit),
        None => Value::REFUSED_2,
    };
    // SAFETY: the caller's promise about the pointers.
    unsafe { write(&value, style, 3, width, text, capacity, length) }
}

/// Writes a length in millimetres as text and gives its length in bytes.
///
/// length_um / 1000, to nearest, halves away from zero.
/// Ranges: decimals 0 to 3; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (decimals), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_length_mm(
    length_um: u32,
    decimals: u8,
    style: *const TextStyle,
    width: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    let value = Value::millimetres(Micrometres(length_um), decimals);
    // SAFETY: the caller's promise about the pointers.
    unsafe { write(&value, style, 3, width, text, capacity, length) }
}

/// Writes a length in micrometres as text and gives its length in bytes.
///
/// length_nm / 1000, to nearest, halves away from zero.
/// Ranges: decimals 0 to 3; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (decimals), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_length_um(
    length_nm: u32,
    decimals: u8,
    style: *const TextStyle,
    width: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    let value = Value::micrometres(Nanometres(length_nm), decimals);
    // SAFETY: the caller's promise about the pointers.
    unsafe { write(&value, style, 3, width, text, capacity, length) }
}

/// Writes a plain ratio as text and gives its length in bytes.
///
/// ratio_q16 / 65536, to nearest, halves away from zero.
/// Ranges: decimals 0 to 4; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (decimals), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_ratio(
    ratio_q16: u32,
    decimals: u8,
    style: *const TextStyle,
    width: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    let value = Value::ratio(Q16(ratio_q16), decimals);
    // SAFETY: the caller's promise about the pointers.
    unsafe { write(&value, style, 3, width, text, capacity, length) }
}

/// Writes a magnification, as in 62.5x as text and gives its length in bytes.
///
/// magnification_q16 / 65536, to nearest, halves away from zero.
/// Ranges: decimals 0 to 4; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (decimals), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_magnification(
    magnification_q16: u32,
    decimals: u8,
    style: *const TextStyle,
    width: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    let value = Value::magnification(Q16(magnification_q16), decimals);
    // SAFETY: the caller's promise about the pointers.
    unsafe { write(&value, style, 3, width, text, capacity, length) }
}

/// Writes a focal ratio, as in f/6.0 as text and gives its length in bytes.
///
/// focal_ratio_q16 / 65536, to nearest, halves away from zero.
/// Ranges: decimals 0 to 4; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (decimals), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_focal_ratio(
    focal_ratio_q16: u32,
    decimals: u8,
    style: *const TextStyle,
    width: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    let value = Value::focal_ratio(Q16(focal_ratio_q16), decimals);
    // SAFETY: the caller's promise about the pointers.
    unsafe { write(&value, style, 3, width, text, capacity, length) }
}

/// Writes a ratio in per cent as text and gives its length in bytes.
///
/// 100 ratio_q16 / 65536, to nearest, halves away from zero.
/// Ranges: decimals 0 to 2; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (decimals), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_percent(
    ratio_q16: u32,
    decimals: u8,
    style: *const TextStyle,
    width: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    let value = Value::percent(Q16(ratio_q16), decimals);
    // SAFETY: the caller's promise about the pointers.
    unsafe { write(&value, style, 3, width, text, capacity, length) }
}

/// Writes an angle in seconds of arc as text and gives its length in bytes.
///
/// angle_uas / 1000000, to nearest, halves away from zero.
/// Ranges: decimals 0 to 6; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (decimals), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_arcseconds(
    angle_uas: u32,
    decimals: u8,
    style: *const TextStyle,
    width: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    let value = Value::arcseconds(Microarcseconds(angle_uas), decimals);
    // SAFETY: the caller's promise about the pointers.
    unsafe { write(&value, style, 3, width, text, capacity, length) }
}

/// Writes a magnitude as text and gives its length in bytes.
///
/// magnitude_mmag / 1000, to nearest, halves away from zero.
/// Ranges: decimals 0 to 3; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (decimals), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_magnitude(
    magnitude_mmag: i32,
    decimals: u8,
    style: *const TextStyle,
    width: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    let value = Value::magnitude(Millimagnitudes(magnitude_mmag), decimals);
    // SAFETY: the caller's promise about the pointers.
    unsafe { write(&value, style, 3, width, text, capacity, length) }
}

/// Writes an angle in degrees, minutes and seconds as text and gives its length in bytes.
///
/// angle_mas / 1000 seconds of arc, to nearest in the last place shown, halves up, carried through: 59'59.6" in whole
/// seconds is one degree. By size is decided by the rounded angle; the decimals then are those of an angle under one
/// minute, larger ones have none.
/// Ranges: form one of FIELDSTOP_ANGLE_...; decimals 0 to 3, 0 to 4 for decimal degrees; width 0 (as long as it is) or
/// the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (form, decimals), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_angle(
    angle_mas: u32,
    form: u8,
    decimals: u8,
    style: *const TextStyle,
    width: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    let value = match AngleForm::from_number(form) {
        Some(form) => Value::angle(Milliarcseconds(angle_mas), form, decimals),
        None => Value::REFUSED_2,
    };
    // SAFETY: the caller's promise about the pointers.
    unsafe { write(&value, style, 4, width, text, capacity, length) }
}

/// The common end of these functions: width, text, capacity and length follow the style in the arguments.
///
/// # Safety
/// Each pointer is null or as its function promises.
unsafe fn write(
    value: &Value,
    style: *const TextStyle,
    style_position: u8,
    width: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    let null = if style.is_null() {
        0
    } else if text.is_null() {
        2
    } else if length.is_null() {
        4
    } else {
        // SAFETY: none is null; the caller promises a style, `capacity` bytes and a place for the length.
        let (style, text) = unsafe { (&*style, slice::from_raw_parts_mut(text.cast(), capacity.into())) };
        return match value.write(style, width, text) {
            Ok(bytes) => {
                // SAFETY: not null, and the caller's promise.
                unsafe { length.write(bytes as u16) };
                0
            }
            Err(error) => error.status(),
        };
    };
    Error::new(Cause::NullPointer, style_position + null).status()
}
