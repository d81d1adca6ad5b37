//! C exports of `text`: the pages of two mirrors' layout.

use super::fieldstop_status;
use super::text::{Label, fill, null, put, write};
use crate::setup::TwoMirrorReadout;
use crate::status::{Cause, Error};
use crate::text::{
    Look, TWO_MIRROR_LABELS_FOR_C, TWO_MIRROR_LABELS_SHORT_FOR_C, TextStyle, TwoMirrorRow, Value, row_of,
    two_mirror_row, write_line,
};
use core::ffi::c_char;

/// Rows of the pages of two mirrors' layout, and labels that they need.
pub const FIELDSTOP_TWO_MIRROR_ROWS: u8 = 8;
/// Two-mirror row: separation.
pub const FIELDSTOP_TWO_MIRROR_ROW_SEPARATION: u8 = 0;
/// Two-mirror row: secondary.
pub const FIELDSTOP_TWO_MIRROR_ROW_SECONDARY: u8 = 1;
/// Two-mirror row: radius.
pub const FIELDSTOP_TWO_MIRROR_ROW_RADIUS: u8 = 2;
/// Two-mirror row: obstruction.
pub const FIELDSTOP_TWO_MIRROR_ROW_OBSTRUCTION: u8 = 3;
/// Two-mirror row: secondary magnification.
pub const FIELDSTOP_TWO_MIRROR_ROW_SECONDARY_MAGNIFICATION: u8 = 4;
/// Two-mirror row: length.
pub const FIELDSTOP_TWO_MIRROR_ROW_LENGTH: u8 = 5;
/// Two-mirror row: length share.
pub const FIELDSTOP_TWO_MIRROR_ROW_LENGTH_SHARE: u8 = 6;
/// Two-mirror row: wider than told.
pub const FIELDSTOP_TWO_MIRROR_ROW_WIDER_THAN_TOLD: u8 = 7;

/// Gives the English labels of the pages of two mirrors' layout for 20 columns and more, an array of FIELDSTOP_TWO_MIRROR_ROWS; never null.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_two_mirror_labels() -> *const *const c_char {
    TWO_MIRROR_LABELS_FOR_C.address().cast()
}

/// Gives the English labels of the pages of two mirrors' layout for 8 and 16 columns, an array of FIELDSTOP_TWO_MIRROR_ROWS; never null.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_two_mirror_labels_short() -> *const *const c_char {
    TWO_MIRROR_LABELS_SHORT_FOR_C.address().cast()
}

/// Writes one line of the pages of two mirrors' layout and gives its length in bytes; it is always `columns` characters long.
///
/// `line` counts over all pages: line r of page p is p rows + r. From 16 columns on a line has the label, cut where it
/// must be, a mark where a fact concerns the value, and the value in its field at the right end; below 16 columns the
/// label and the value have a line each. A line behind the last row is blank.
/// Ranges: columns 8 to 255; labels an array of FIELDSTOP_TWO_MIRROR_ROWS.
/// Statuses: null pointer, out of range (columns), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_two_mirror_line(
    readout: *const TwoMirrorReadout,
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
            let row = TwoMirrorRow::from_number(number);
            let label = match row {
                Some(_) => Label::new(labels, number),
                None => Label::empty(),
            };
            let row = row.map(|row| two_mirror_row(&*readout, row));
            write_line(row, label, style, columns, line, out)
        })
    }
}

/// Writes a value of the pages of two mirrors' layout with its unit and gives its length in bytes.
///
/// In the form that the pages show; a dash where it is not available.
/// Ranges: row one of FIELDSTOP_TWO_MIRROR_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (row), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_two_mirror_value(
    readout: *const TwoMirrorReadout,
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
        let value = match TwoMirrorRow::from_number(row) {
            Some(row) => two_mirror_row(&*readout, row).value,
            None => Value::REFUSED_2,
        };
        write(&value, style, [3, width], text, capacity, length)
    }
}

/// Writes a value of the pages of two mirrors' layout without its unit and gives its length in bytes.
///
/// In the form that the pages show; a dash where it is not available.
/// Ranges: row one of FIELDSTOP_TWO_MIRROR_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (row), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_two_mirror_number(
    readout: *const TwoMirrorReadout,
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
        let value = match TwoMirrorRow::from_number(row) {
            Some(row) => two_mirror_row(&*readout, row).value.without_unit(),
            None => Value::REFUSED_2,
        };
        write(&value, style, [3, width], text, capacity, length)
    }
}

/// Writes the unit of a value of the pages of two mirrors' layout and gives its length in bytes, which may be 0.
///
/// It belongs to the number that fieldstop_text_two_mirror_number writes.
/// Ranges: row one of FIELDSTOP_TWO_MIRROR_ROW_...
/// Statuses: null pointer, out of range (row), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_two_mirror_unit(
    readout: *const TwoMirrorReadout,
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
            let row = TwoMirrorRow::from_number(row).ok_or(Error::new(Cause::OutOfRange, 2))?;
            put(style.text(two_mirror_row(&*readout, row).value.unit() as u8), out)
        })
    }
}
