//! C exports of `status`.

use super::fieldstop_status;
use crate::status::Cause;
use crate::stored::stored_text;
use core::ffi::c_char;

/// Cause: a pointer is null.
pub const FIELDSTOP_NULL_POINTER: u8 = 1;
/// Cause: zero where the quantity must exist.
pub const FIELDSTOP_ZERO: u8 = 2;
/// Cause: outside the documented range.
pub const FIELDSTOP_OUT_OF_RANGE: u8 = 3;
/// Cause: a float argument is infinite or not a number.
pub const FIELDSTOP_NOT_FINITE: u8 = 4;
/// Cause: the result does not fit its type.
pub const FIELDSTOP_OVERFLOW: u8 = 5;
/// Cause: the text does not fit its width or buffer.
pub const FIELDSTOP_NO_ROOM: u8 = 6;
/// Cause: not defined or not known here.
pub const FIELDSTOP_UNDEFINED: u8 = 7;
/// Cause: never reached: a star or a place of the sky that never comes to what was asked about.
pub const FIELDSTOP_NEVER_REACHED: u8 = 8;
/// Cause: never left: a star or a place of the sky that stays in what was asked about, all around the pole.
pub const FIELDSTOP_NEVER_LEFT: u8 = 9;

/// Gives a static English sentence for the cause in a status; never null.
///
/// Success and causes that this version does not know have a sentence too. On AVR it is in program memory (PGM_P).
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_cause_text(status: fieldstop_status) -> *const c_char {
    match Cause::from_number(status as u8) {
        Some(cause) => cause.text_for_c(),
        None if status == 0 => stored_text!(OTHERS, "success"),
        None => stored_text!(OTHERS, "an unknown cause"),
    }
}

/// Gives the version of the library: major times 65536 plus minor times 256 plus patch.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_version() -> u32 {
    0x00_00_01_00
}

/// Does nothing; that it is there says that the library has ABI 1, so that a header of another ABI does not link.
#[unsafe(no_mangle)]
pub extern "C" fn fieldstop_abi_1() {}
