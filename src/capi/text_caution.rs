//! C exports of `text`: cautions in words.

use super::fieldstop_status;
use super::text::{Label, fill_without_style};
use crate::stored::stored_text;
use crate::text::{line_of, lines_of};
use core::ffi::c_char;

/// Caution: where a fact tells that the eyepiece is high.
pub const FIELDSTOP_CAUTION_HIGH_EYEPIECE: u8 = 0;
/// Caution: where the Sun may be near.
pub const FIELDSTOP_CAUTION_SUN: u8 = 1;

/// Gives a caution in English, one of FIELDSTOP_CAUTION_...; an empty text for any other number, never null.
///
/// On AVR it is in program memory (PROGMEM). A translation can take its place in fieldstop_text_caution_line.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_text_caution(caution: u8) -> *const c_char {
    // The same as text::HIGH_EYEPIECE_CAUTION and SUN_CAUTION, which a test compares.
    match caution {
        FIELDSTOP_CAUTION_HIGH_EYEPIECE => stored_text!(
            CAUTIONS,
            "Caution: high eyepiece. Stand on a stable platform, never on the top of a ladder, clear of the moving mount. Follow the maker's instructions and local rules."
        ),
        FIELDSTOP_CAUTION_SUN => stored_text!(
            CAUTIONS,
            "Caution: never look through unfiltered optics at or near the Sun, nor point them there. Follow the maker's instructions and local rules."
        ),
        _ => stored_text!(CAUTIONS, ""),
    }
}

/// Gives how many lines of `columns` characters a sentence takes, broken between words; 0 for a null pointer.
///
/// sentence: bytes with a zero byte at their end; on AVR in program memory. Columns under 8 count as 8.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_caution_lines(sentence: *const c_char, columns: u8) -> u8 {
    // SAFETY: the caller promises a zero byte at the end.
    lines_of(unsafe { Label::of(sentence) }, columns)
}

/// Writes one line of a sentence broken between words and gives its length in bytes; it is always `columns`
/// characters long.
///
/// sentence: bytes with a zero byte at their end, as fieldstop_text_caution gives; on AVR in program memory. A line
/// behind the last is blank; a word longer than a line is cut.
/// Ranges: columns 8 to 255.
/// Statuses: null pointer, out of range (columns), no room.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_text_caution_line(
    sentence: *const c_char,
    columns: u8,
    line: u8,
    text: *mut c_char,
    capacity: u16,
    length: *mut u16,
) -> fieldstop_status {
    if sentence.is_null() {
        return super::text::null(1);
    }
    // SAFETY: not null, and the caller's promise about the pointers.
    unsafe {
        fill_without_style([4, 6], text, capacity, length, |out| {
            line_of(Label::of(sentence), columns, line, out)
        })
    }
}
