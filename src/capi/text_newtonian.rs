//! C exports of `text`: the pages of a Newtonian's layout.

use super::fieldstop_status;
use super::text::{Label, fill, null, put, write};
use crate::setup::NewtonianReadout;
use crate::status::{Cause, Error};
use crate::text::{
    Look, NEWTONIAN_LABELS_FOR_C, NEWTONIAN_LABELS_SHORT_FOR_C, NewtonianRow, TextStyle, Value,
    newtonian_row, row_of, write_line,
};
use core::ffi::c_char;

/// Rows of the pages of a Newtonian's layout, and labels that they need.
pub const FIELDSTOP_NEWTONIAN_ROWS: u8 = 12;
/// Newtonian row: diagonal.
pub const FIELDSTOP_NEWTONIAN_ROW_DIAGONAL: u8 = 0;
/// Newtonian row: diagonal offset.
pub const FIELDSTOP_NEWTONIAN_ROW_DIAGONAL_OFFSET: u8 = 1;
/// Newtonian row: obstruction.
pub const FIELDSTOP_NEWTONIAN_ROW_OBSTRUCTION: u8 = 2;
/// Newtonian row: edge light.
pub const FIELDSTOP_NEWTONIAN_ROW_EDGE_LIGHT: u8 = 3;
/// Newtonian row: eyepiece height.
pub const FIELDSTOP_NEWTONIAN_ROW_EYEPIECE_HEIGHT: u8 = 4;
/// Newtonian row: greatest height.
pub const FIELDSTOP_NEWTONIAN_ROW_GREATEST_HEIGHT: u8 = 5;
/// Newtonian row: beam.
pub const FIELDSTOP_NEWTONIAN_ROW_BEAM: u8 = 6;
/// Newtonian row: beam shift.
pub const FIELDSTOP_NEWTONIAN_ROW_BEAM_SHIFT: u8 = 7;
/// Newtonian row: small diagonal.
pub const FIELDSTOP_NEWTONIAN_ROW_SMALL_DIAGONAL: u8 = 8;
/// Newtonian row: wider than told.
pub const FIELDSTOP_NEWTONIAN_ROW_WIDER_THAN_TOLD: u8 = 9;
/// Newtonian row: high eyepiece.
pub const FIELDSTOP_NEWTONIAN_ROW_HIGH_EYEPIECE: u8 = 10;
/// Newtonian row: high reached.
pub const FIELDSTOP_NEWTONIAN_ROW_HIGH_REACHED: u8 = 11;

/// Gives the English labels of the pages of a Newtonian's layout for 20 columns and more, an array of FIELDSTOP_NEWTONIAN_ROWS; never null.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_newtonian_labels() -> *const *const c_char {
    NEWTONIAN_LABELS_FOR_C.address().cast()
}

/// Gives the English labels of the pages of a Newtonian's layout for 8 and 16 columns, an array of FIELDSTOP_NEWTONIAN_ROWS; never null.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_newtonian_labels_short() -> *const *const c_char {
    NEWTONIAN_LABELS_SHORT_FOR_C.address().cast()
}

/// Writes one line of the pages of a Newtonian's layout and gives its length in bytes; it is always `columns` characters long.
///
/// `line` counts over all pages: line r of page p is p rows + r. From 16 columns on a line has the label, cut where it
/// must be, a mark where a fact concerns the value, and the value in its field at the right end; below 16 columns the
/// label and the value have a line each. A line behind the last row is blank.
/// Ranges: columns 8 to 255; labels an array of FIELDSTOP_NEWTONIAN_ROWS.
/// Statuses: null pointer, out of range (columns), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_newtonian_line(
    readout: *const NewtonianReadout,
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
            let row = NewtonianRow::from_number(number);
            let label = match row {
                Some(_) => Label::new(labels, number),
                None => Label::empty(),
            };
            let row = row.map(|row| newtonian_row(&*readout, row));
            write_line(row, label, style, columns, line, out)
        })
    }
}

/// Writes a value of the pages of a Newtonian's layout with its unit and gives its length in bytes.
///
/// In the form that the pages show; a dash where it is not available.
/// Ranges: row one of FIELDSTOP_NEWTONIAN_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (row), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_newtonian_value(
    readout: *const NewtonianReadout,
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
        let value = match NewtonianRow::from_number(row) {
            Some(row) => newtonian_row(&*readout, row).value,
            None => Value::REFUSED_2,
        };
        write(&value, style, [3, width], text, capacity, length)
    }
}

/// Writes a value of the pages of a Newtonian's layout without its unit and gives its length in bytes.
///
/// In the form that the pages show; a dash where it is not available.
/// Ranges: row one of FIELDSTOP_NEWTONIAN_ROW_...; width 0 (as long as it is) or the characters to fill, right-aligned.
/// Statuses: null pointer, out of range (row), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_newtonian_number(
    readout: *const NewtonianReadout,
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
        let value = match NewtonianRow::from_number(row) {
            Some(row) => newtonian_row(&*readout, row).value.without_unit(),
            None => Value::REFUSED_2,
        };
        write(&value, style, [3, width], text, capacity, length)
    }
}

/// Writes the unit of a value of the pages of a Newtonian's layout and gives its length in bytes, which may be 0.
///
/// It belongs to the number that fieldstop_text_newtonian_number writes.
/// Ranges: row one of FIELDSTOP_NEWTONIAN_ROW_...
/// Statuses: null pointer, out of range (row), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_newtonian_unit(
    readout: *const NewtonianReadout,
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
            let row = NewtonianRow::from_number(row).ok_or(Error::new(Cause::OutOfRange, 2))?;
            put(style.text(newtonian_row(&*readout, row).value.unit() as u8), out)
        })
    }
}
