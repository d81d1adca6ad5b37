//! C exports of `text`.

use super::{fieldstop_status, short};
use crate::setup::{CameraReadout, VisualReadout};
use crate::status::{Cause, Error};
use crate::stored::{Stored, stored, stored_text};
use crate::text::{
    AngleForm, CAMERA_LABELS_FOR_C, CAMERA_LABELS_SHORT_FOR_C, CameraRow, Look, Place, Span, StyleOfC,
    TextStyle, Unit, VISUAL_LABELS_FOR_C, VISUAL_LABELS_SHORT_FOR_C, Value, VisualRow, camera_row, change,
    row_of, visual_row, write_line,
};
use crate::units::{Microarcseconds, Micrometres, Milliarcseconds, Millimagnitudes, Nanometres, Q16};
use core::ffi::c_char;
use core::mem::MaybeUninit;
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

/// Rows of the visual pages, and labels that they need.
pub const FIELDSTOP_VISUAL_ROWS: u8 = 16;
/// Visual row: magnification.
pub const FIELDSTOP_VISUAL_ROW_MAGNIFICATION: u8 = 0;
/// Visual row: true field.
pub const FIELDSTOP_VISUAL_ROW_TRUE_FIELD: u8 = 1;
/// Visual row: exit pupil.
pub const FIELDSTOP_VISUAL_ROW_EXIT_PUPIL: u8 = 2;
/// Visual row: resolution.
pub const FIELDSTOP_VISUAL_ROW_RESOLUTION: u8 = 3;
/// Visual row: faintest star.
pub const FIELDSTOP_VISUAL_ROW_FAINTEST_STAR: u8 = 4;
/// Visual row: surface brightness.
pub const FIELDSTOP_VISUAL_ROW_SURFACE_BRIGHTNESS: u8 = 5;
/// Visual row: focal ratio.
pub const FIELDSTOP_VISUAL_ROW_FOCAL_RATIO: u8 = 6;
/// Visual row: focal length.
pub const FIELDSTOP_VISUAL_ROW_FOCAL_LENGTH: u8 = 7;
/// Visual row: lowest magnification.
pub const FIELDSTOP_VISUAL_ROW_LOWEST_MAGNIFICATION: u8 = 8;
/// Visual row: resolving magnification.
pub const FIELDSTOP_VISUAL_ROW_RESOLVING_MAGNIFICATION: u8 = 9;
/// Visual row: dawes limit.
pub const FIELDSTOP_VISUAL_ROW_DAWES_LIMIT: u8 = 10;
/// Visual row: effective aperture.
pub const FIELDSTOP_VISUAL_ROW_EFFECTIVE_APERTURE: u8 = 11;
/// Visual row: wide exit pupil.
pub const FIELDSTOP_VISUAL_ROW_WIDE_EXIT_PUPIL: u8 = 12;
/// Visual row: empty magnification.
pub const FIELDSTOP_VISUAL_ROW_EMPTY_MAGNIFICATION: u8 = 13;
/// Visual row: field from apparent.
pub const FIELDSTOP_VISUAL_ROW_FIELD_FROM_APPARENT: u8 = 14;
/// Visual row: seeing limited.
pub const FIELDSTOP_VISUAL_ROW_SEEING_LIMITED: u8 = 15;

/// Rows of the camera pages, and labels that they need.
pub const FIELDSTOP_CAMERA_ROWS: u8 = 14;
/// Camera row: frame width.
pub const FIELDSTOP_CAMERA_ROW_FRAME_WIDTH: u8 = 0;
/// Camera row: frame height.
pub const FIELDSTOP_CAMERA_ROW_FRAME_HEIGHT: u8 = 1;
/// Camera row: pixel scale.
pub const FIELDSTOP_CAMERA_ROW_PIXEL_SCALE: u8 = 2;
/// Camera row: star width.
pub const FIELDSTOP_CAMERA_ROW_STAR_WIDTH: u8 = 3;
/// Camera row: star pixels.
pub const FIELDSTOP_CAMERA_ROW_STAR_PIXELS: u8 = 4;
/// Camera row: focal ratio.
pub const FIELDSTOP_CAMERA_ROW_FOCAL_RATIO: u8 = 5;
/// Camera row: t-number.
pub const FIELDSTOP_CAMERA_ROW_T_NUMBER: u8 = 6;
/// Camera row: focal length.
pub const FIELDSTOP_CAMERA_ROW_FOCAL_LENGTH: u8 = 7;
/// Camera row: plate scale.
pub const FIELDSTOP_CAMERA_ROW_PLATE_SCALE: u8 = 8;
/// Camera row: diagonal.
pub const FIELDSTOP_CAMERA_ROW_DIAGONAL: u8 = 9;
/// Camera row: cutoff.
pub const FIELDSTOP_CAMERA_ROW_CUTOFF: u8 = 10;
/// Camera row: nyquist pixel.
pub const FIELDSTOP_CAMERA_ROW_NYQUIST_PIXEL: u8 = 11;
/// Camera row: coarse sampling.
pub const FIELDSTOP_CAMERA_ROW_COARSE_SAMPLING: u8 = 12;
/// Camera row: fine sampling.
pub const FIELDSTOP_CAMERA_ROW_FINE_SAMPLING: u8 = 13;

/// Gives the style of plain ASCII; never null.
///
/// `d` and `deg` stand for the degree sign, `u` for micro, `x` for times. Copy it to change the decimal mark or a text.
/// On AVR this and all styles and labels are in program memory (PROGMEM).
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_style_ascii() -> *const TextStyle {
    stored! {
        static ASCII: TextStyle = TextStyle::ASCII;
    }
    ASCII.address()
}

/// Gives the style of UTF-8, with the signs of degree, prime, double prime, micro and times; never null.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_style_utf8() -> *const TextStyle {
    stored! {
        static UTF8: TextStyle = TextStyle::UTF8;
    }
    UTF8.address()
}

/// Gives the style of character displays with ROM A00 (Japanese) of the HD44780U; never null.
///
/// The codes are from memory of the data sheet: try them on your display.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_style_hd44780_a00() -> *const TextStyle {
    stored! {
        static HD44780_A00: TextStyle = TextStyle::HD44780_A00;
    }
    HD44780_A00.address()
}

/// Gives the style of character displays with ROM A02 (European) of the HD44780U; never null.
///
/// The codes are from memory of the data sheet: try them on your display.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_style_hd44780_a02() -> *const TextStyle {
    stored! {
        static HD44780_A02: TextStyle = TextStyle::HD44780_A02;
    }
    HD44780_A02.address()
}

/// Writes an integer with its unit as text and gives its length in bytes.
///
/// Ranges: count any; unit one of FIELDSTOP_UNIT_...; width 0 (as long as it is) or the characters to fill,
/// right-aligned.
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
    unsafe { write(&value, style, [3, width], text, capacity, length) }
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
    unsafe { write(&value, style, [3, width], text, capacity, length) }
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
    unsafe { write(&value, style, [3, width], text, capacity, length) }
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
    unsafe { write(&value, style, [3, width], text, capacity, length) }
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
    unsafe { write(&value, style, [3, width], text, capacity, length) }
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
    unsafe { write(&value, style, [3, width], text, capacity, length) }
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
    unsafe { write(&value, style, [3, width], text, capacity, length) }
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
    unsafe { write(&value, style, [3, width], text, capacity, length) }
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
    unsafe { write(&value, style, [3, width], text, capacity, length) }
}

/// Writes an angle in degrees, minutes and seconds as text and gives its length in bytes.
///
/// angle_mas / 1000 seconds of arc, to nearest in the last place shown, halves up, carried through: 59'59.6" in whole
/// seconds is one degree. By size is decided by the rounded angle; the decimals then are those of an angle under one
/// minute, larger ones have none.
/// Ranges: form one of FIELDSTOP_ANGLE_...; decimals 0 to 3, with minutes 0 to 2; width 0 (as long as it is) or
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
    unsafe { write(&value, style, [4, width], text, capacity, length) }
}

/// Writes the text of a unit and gives its length in bytes.
///
/// Ranges: unit one of FIELDSTOP_UNIT_...
/// Statuses: null pointer, out of range (unit), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_unit(
    unit: u8,
    style: *const TextStyle,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    // SAFETY: the caller's promise about the pointers.
    unsafe {
        fill(style, [2, 3, 5], text, capacity, length, |style, out| {
            let unit = Unit::from_number(unit).ok_or(Error::new(Cause::OutOfRange, 1))?;
            put(style.text(unit as u8), out)
        })
    }
}

/// Gives the English labels of the visual pages for 20 columns and more, an array of FIELDSTOP_VISUAL_ROWS; never null.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_visual_labels() -> *const *const c_char {
    VISUAL_LABELS_FOR_C.address().cast()
}

/// Gives the English labels of the visual pages for 8 and 16 columns, an array of FIELDSTOP_VISUAL_ROWS; never null.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_visual_labels_short() -> *const *const c_char {
    VISUAL_LABELS_SHORT_FOR_C.address().cast()
}

/// Writes one line of the visual pages and gives its length in bytes; it is always `columns` characters long.
///
/// `line` counts over all pages: line r of page p is p rows + r. From 16 columns on a line has the label, cut where it
/// must be, a mark where a fact concerns the value, and the value in its field at the right end; below 16 columns the
/// label and the value have a line each. A line behind the last row is blank.
/// Ranges: columns 8 to 255; labels an array of FIELDSTOP_VISUAL_ROWS.
/// Statuses: null pointer, out of range (columns), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_visual_line(
    readout: *const VisualReadout,
    labels: *const *const c_char,
    style: *const TextStyle,
    columns: u8,
    line: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    if readout.is_null() {
        return null(1);
    }
    if labels.is_null() {
        return null(2);
    }
    // SAFETY: not null, and the caller's promise about the pointers.
    unsafe {
        fill(style, [3, 6, 8], text, capacity, length, |style, out| {
            let number = row_of(line, columns);
            let row = VisualRow::from_number(number);
            let label = match row {
                Some(_) => Label::new(labels, number),
                None => Label::empty(),
            };
            let row = row.map(|row| visual_row(&*readout, row));
            write_line(row, label, style, columns, line, out)
        })
    }
}

/// Writes a value of the visual pages with its unit and gives its length in bytes.
///
/// In the form that the pages show; a dash where it is not available.
/// Ranges: row one of FIELDSTOP_VISUAL_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (row), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_visual_value(
    readout: *const VisualReadout,
    row: u8,
    style: *const TextStyle,
    width: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    if readout.is_null() {
        return null(1);
    }
    // SAFETY: not null, and the caller's promise about the pointers.
    unsafe {
        let value = match VisualRow::from_number(row) {
            Some(row) => visual_row(&*readout, row).value,
            None => Value::REFUSED_2,
        };
        write(&value, style, [3, width], text, capacity, length)
    }
}

/// Writes a value of the visual pages without its unit and gives its length in bytes.
///
/// In the form that the pages show; a dash where it is not available.
/// Ranges: row one of FIELDSTOP_VISUAL_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (row), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_visual_number(
    readout: *const VisualReadout,
    row: u8,
    style: *const TextStyle,
    width: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    if readout.is_null() {
        return null(1);
    }
    // SAFETY: not null, and the caller's promise about the pointers.
    unsafe {
        let value = match VisualRow::from_number(row) {
            Some(row) => visual_row(&*readout, row).value.without_unit(),
            None => Value::REFUSED_2,
        };
        write(&value, style, [3, width], text, capacity, length)
    }
}

/// Writes the unit of a value of the visual pages and gives its length in bytes, which may be 0.
///
/// It belongs to the number that fieldstop_text_visual_number writes.
/// Ranges: row one of FIELDSTOP_VISUAL_ROW_...
/// Statuses: null pointer, out of range (row), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_visual_unit(
    readout: *const VisualReadout,
    row: u8,
    style: *const TextStyle,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    if readout.is_null() {
        return null(1);
    }
    // SAFETY: not null, and the caller's promise about the pointers.
    unsafe {
        fill(style, [3, 4, 6], text, capacity, length, |style, out| {
            let row = VisualRow::from_number(row).ok_or(Error::new(Cause::OutOfRange, 2))?;
            put(style.text(visual_row(&*readout, row).value.unit() as u8), out)
        })
    }
}

/// Gives the English labels of the camera pages for 20 columns and more, an array of FIELDSTOP_CAMERA_ROWS; never null.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_camera_labels() -> *const *const c_char {
    CAMERA_LABELS_FOR_C.address().cast()
}

/// Gives the English labels of the camera pages for 8 and 16 columns, an array of FIELDSTOP_CAMERA_ROWS; never null.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_camera_labels_short() -> *const *const c_char {
    CAMERA_LABELS_SHORT_FOR_C.address().cast()
}

/// Writes one line of the camera pages and gives its length in bytes; it is always `columns` characters long.
///
/// `line` counts over all pages: line r of page p is p rows + r. From 16 columns on a line has the label, cut where it
/// must be, a mark where a fact concerns the value, and the value in its field at the right end; below 16 columns the
/// label and the value have a line each. A line behind the last row is blank.
/// Ranges: columns 8 to 255; labels an array of FIELDSTOP_CAMERA_ROWS.
/// Statuses: null pointer, out of range (columns), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_camera_line(
    readout: *const CameraReadout,
    labels: *const *const c_char,
    style: *const TextStyle,
    columns: u8,
    line: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    if readout.is_null() {
        return null(1);
    }
    if labels.is_null() {
        return null(2);
    }
    // SAFETY: not null, and the caller's promise about the pointers.
    unsafe {
        fill(style, [3, 6, 8], text, capacity, length, |style, out| {
            let number = row_of(line, columns);
            let row = CameraRow::from_number(number);
            let label = match row {
                Some(_) => Label::new(labels, number),
                None => Label::empty(),
            };
            let row = row.map(|row| camera_row(&*readout, row));
            write_line(row, label, style, columns, line, out)
        })
    }
}

/// Writes a value of the camera pages with its unit and gives its length in bytes.
///
/// In the form that the pages show; a dash where it is not available.
/// Ranges: row one of FIELDSTOP_CAMERA_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (row), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_camera_value(
    readout: *const CameraReadout,
    row: u8,
    style: *const TextStyle,
    width: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    if readout.is_null() {
        return null(1);
    }
    // SAFETY: not null, and the caller's promise about the pointers.
    unsafe {
        let value = match CameraRow::from_number(row) {
            Some(row) => camera_row(&*readout, row).value,
            None => Value::REFUSED_2,
        };
        write(&value, style, [3, width], text, capacity, length)
    }
}

/// Writes a value of the camera pages without its unit and gives its length in bytes.
///
/// In the form that the pages show; a dash where it is not available.
/// Ranges: row one of FIELDSTOP_CAMERA_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (row), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_camera_number(
    readout: *const CameraReadout,
    row: u8,
    style: *const TextStyle,
    width: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    if readout.is_null() {
        return null(1);
    }
    // SAFETY: not null, and the caller's promise about the pointers.
    unsafe {
        let value = match CameraRow::from_number(row) {
            Some(row) => camera_row(&*readout, row).value.without_unit(),
            None => Value::REFUSED_2,
        };
        write(&value, style, [3, width], text, capacity, length)
    }
}

/// Writes the unit of a value of the camera pages and gives its length in bytes, which may be 0.
///
/// It belongs to the number that fieldstop_text_camera_number writes.
/// Ranges: row one of FIELDSTOP_CAMERA_ROW_...
/// Statuses: null pointer, out of range (row), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_camera_unit(
    readout: *const CameraReadout,
    row: u8,
    style: *const TextStyle,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    if readout.is_null() {
        return null(1);
    }
    // SAFETY: not null, and the caller's promise about the pointers.
    unsafe {
        fill(style, [3, 4, 6], text, capacity, length, |style, out| {
            let row = CameraRow::from_number(row).ok_or(Error::new(Cause::OutOfRange, 2))?;
            put(style.text(camera_row(&*readout, row).value.unit() as u8), out)
        })
    }
}

/// Gives the part of a line that is different from what is shown, in characters.
///
/// span.count is 0 where nothing is. Where the two have different numbers of characters it reaches to the end of the line.
/// Ranges: shown_length, line_length in bytes, any.
/// Statuses: null pointer.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_changed(
    shown: *const c_char,
    shown_length: u16,
    line: *const c_char,
    line_length: u16,
    style: *const TextStyle,
    span: *mut Span,
) -> fieldstop_status {
    if shown.is_null() {
        return null(1);
    }
    if line.is_null() {
        return null(3);
    }
    if style.is_null() {
        return null(5);
    }
    if span.is_null() {
        return null(6);
    }
    // SAFETY: none is null; the caller promises texts of these lengths, a style and a place for the span.
    unsafe {
        let shown = slice::from_raw_parts(shown.cast(), shown_length.into());
        let line = slice::from_raw_parts(line.cast(), line_length.into());
        span.write(change(shown, line, &*style.cast::<StyleOfC>()));
    }
    0
}

/// The bytes of a label up to its zero byte.
#[derive(Clone)]
pub(super) struct Label(*const c_char);

impl Label {
    pub(super) fn empty() -> Label {
        Label(stored_text!(EMPTY, ""))
    }

    /// The label with this number; none for a null pointer.
    ///
    /// # Safety
    /// `labels` has one with this number, with a zero byte at its end, or a null pointer.
    pub(super) unsafe fn new(labels: *const *const c_char, number: u8) -> Label {
        // SAFETY: the caller's promise.
        unsafe { Label::of((*labels.add(number.into()).cast::<Stored<*const c_char>>()).get()) }
    }

    /// This text; none for a null pointer.
    ///
    /// # Safety
    /// `text` is null or has a zero byte at its end.
    pub(super) unsafe fn of(text: *const c_char) -> Label {
        if text.is_null() { Label::empty() } else { Label(text) }
    }
}

impl Iterator for Label {
    type Item = u8;

    fn next(&mut self) -> Option<u8> {
        // SAFETY: the caller promises a zero byte at the end, and it is not passed.
        let byte = unsafe { (*self.0.cast::<Stored<u8>>()).get() };
        if byte == 0 {
            return None;
        }
        self.0 = self.0.wrapping_add(1);
        Some(byte)
    }
}

pub(super) const fn null(position: u8) -> fieldstop_status {
    Error::new(Cause::NullPointer, position).status()
}

/// Copies a text into `out` and tells its length.
pub(super) fn put<P: Place>(text: impl Iterator<Item = u8> + Clone, out: &mut [P]) -> Result<usize, Error> {
    let length = text.clone().count();
    let out = out.get_mut(..length).ok_or(Error::new(Cause::NoRoom, 0))?;
    for (place, byte) in out.iter_mut().zip(text) {
        *place = P::of(byte);
    }
    Ok(length)
}

/// The end of the functions that write one value: width, text, capacity and length follow the style.
///
/// # Safety
/// Each pointer is null or as its function promises.
pub(super) unsafe fn write(
    value: &Value,
    style: *const TextStyle,
    // As one argument, so that all go in registers on AVR.
    [style_position, width]: [u8; 2],
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    let positions = [style_position, style_position + 2, style_position + 4];
    // SAFETY: the caller's promise about the pointers.
    unsafe {
        fill(style, positions, text, capacity, length, |style, out| {
            if let Some(short) = value.short()
                && width > 0
                && !style.is_utf8()
                && out.len() >= width.into()
            {
                return if short::put(short, style, out.as_mut_ptr().cast(), width.into()) {
                    Ok(width.into())
                } else {
                    Err(Error::new(Cause::NoRoom, 0))
                };
            }
            value.write_as(style, width, out)
        })
    }
}

/// Checks the pointers, has the text written and gives its length.
///
/// # Safety
/// Each pointer is null or goes to a style, to `capacity` bytes, to a place for the length.
#[inline(always)]
pub(super) unsafe fn fill(
    style: *const TextStyle,
    [style_position, text_position, length_position]: [u8; 3],
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
    write: impl FnOnce(&StyleOfC, &mut [MaybeUninit<u8>]) -> Result<usize, Error>,
) -> fieldstop_status {
    if style.is_null() {
        return null(style_position);
    }
    // SAFETY: not null, and the caller's promise.
    let style = unsafe { &*style.cast::<StyleOfC>() };
    // SAFETY: the caller's promise.
    unsafe {
        fill_without_style([text_position, length_position], text, capacity, length, |out| write(style, out))
    }
}

/// The same where no style is needed.
///
/// # Safety
/// Each pointer is null or goes to `capacity` bytes, to a place for the length.
#[inline(always)]
pub(super) unsafe fn fill_without_style(
    [text_position, length_position]: [u8; 2],
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
    write: impl FnOnce(&mut [MaybeUninit<u8>]) -> Result<usize, Error>,
) -> fieldstop_status {
    if text.is_null() {
        return null(text_position);
    }
    if length.is_null() {
        return null(length_position);
    }
    // SAFETY: not null, and the caller's promise.
    let out = unsafe { slice::from_raw_parts_mut(text.cast(), capacity.into()) };
    match write(out) {
        Ok(bytes) => {
            // SAFETY: not null, and the caller's promise.
            unsafe { length.write(bytes as u16) };
            0
        }
        Err(error) => error.status(),
    }
}
