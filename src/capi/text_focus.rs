//! C exports of `text`: the focus pages.

use super::fieldstop_status;
use super::text::{Label, fill, null, put, write};
use crate::setup::FocusReadout;
use crate::status::{Cause, Error};
use crate::text::{
    FOCUS_LABELS_FOR_C, FOCUS_LABELS_SHORT_FOR_C, FocusRow, Look, TextStyle, Value, focus_row, row_of,
    write_line,
};
use core::ffi::c_char;

/// Rows of the focus pages, and labels that they need.
pub const FIELDSTOP_FOCUS_ROWS: u8 = 9;
/// Focus row: depth of focus.
pub const FIELDSTOP_FOCUS_ROW_DEPTH_OF_FOCUS: u8 = 0;
/// Focus row: depth steps.
pub const FIELDSTOP_FOCUS_ROW_DEPTH_STEPS: u8 = 1;
/// Focus row: temperature.
pub const FIELDSTOP_FOCUS_ROW_TEMPERATURE: u8 = 2;
/// Focus row: blur.
pub const FIELDSTOP_FOCUS_ROW_BLUR: u8 = 3;
/// Focus row: blur angle.
pub const FIELDSTOP_FOCUS_ROW_BLUR_ANGLE: u8 = 4;
/// Focus row: wavefront.
pub const FIELDSTOP_FOCUS_ROW_WAVEFRONT: u8 = 5;
/// Focus row: focal ratio.
pub const FIELDSTOP_FOCUS_ROW_FOCAL_RATIO: u8 = 6;
/// Focus row: coarse step.
pub const FIELDSTOP_FOCUS_ROW_COARSE_STEP: u8 = 7;
/// Focus row: out of focus.
pub const FIELDSTOP_FOCUS_ROW_OUT_OF_FOCUS: u8 = 8;

/// Gives the English labels of the focus pages for 20 columns and more, an array of FIELDSTOP_FOCUS_ROWS; never null.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_focus_labels() -> *const *const c_char {
    FOCUS_LABELS_FOR_C.address().cast()
}

/// Gives the English labels of the focus pages for 8 and 16 columns, an array of FIELDSTOP_FOCUS_ROWS; never null.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_focus_labels_short() -> *const *const c_char {
    FOCUS_LABELS_SHORT_FOR_C.address().cast()
}

/// Writes one line of the focus pages and gives its length in bytes; it is always `columns` characters long.
///
/// `line` counts over all pages: line r of page p is p rows + r. From 16 columns on a line has the label, cut where it
/// must be, a mark where a fact concerns the value, and the value in its field at the right end; below 16 columns the
/// label and the value have a line each. A line behind the last row is blank.
/// Ranges: columns 8 to 255; labels an array of FIELDSTOP_FOCUS_ROWS.
/// Statuses: null pointer, out of range (columns), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_focus_line(
    readout: *const FocusReadout,
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
            let row = FocusRow::from_number(number);
            let label = match row {
                Some(_) => Label::new(labels, number),
                None => Label::empty(),
            };
            let row = row.map(|row| focus_row(&*readout, row));
            write_line(row, label, style, columns, line, out)
        })
    }
}

/// Writes a value of the focus pages with its unit and gives its length in bytes.
///
/// In the form that the pages show; a dash where it is not available.
/// Ranges: row one of FIELDSTOP_FOCUS_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (row), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_focus_value(
    readout: *const FocusReadout,
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
        let value = match FocusRow::from_number(row) {
            Some(row) => focus_row(&*readout, row).value,
            None => Value::REFUSED_2,
        };
        write(&value, style, [3, width], text, capacity, length)
    }
}

/// Writes a value of the focus pages without its unit and gives its length in bytes.
///
/// In the form that the pages show; a dash where it is not available.
/// Ranges: row one of FIELDSTOP_FOCUS_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (row), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_focus_number(
    readout: *const FocusReadout,
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
        let value = match FocusRow::from_number(row) {
            Some(row) => focus_row(&*readout, row).value.without_unit(),
            None => Value::REFUSED_2,
        };
        write(&value, style, [3, width], text, capacity, length)
    }
}

/// Writes the unit of a value of the focus pages and gives its length in bytes, which may be 0.
///
/// It belongs to the number that fieldstop_text_focus_number writes.
/// Ranges: row one of FIELDSTOP_FOCUS_ROW_...
/// Statuses: null pointer, out of range (row), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_focus_unit(
    readout: *const FocusReadout,
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
            let row = FocusRow::from_number(row).ok_or(Error::new(Cause::OutOfRange, 2))?;
            put(style.text(focus_row(&*readout, row).value.unit() as u8), out)
        })
    }
}
