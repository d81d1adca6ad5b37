//! C exports of `entry`.

use super::fieldstop_status;
use crate::status::{Cause, Error};
use crate::text::{EntryError, EntryKind, EntryReason, StyleOfC, TextStyle, read_as};
use core::ffi::c_char;
use core::slice;

/// Entry: micrometres; a bare number is in mm; units m cm mm um nm in.
pub const FIELDSTOP_ENTRY_LENGTH: u8 = 0;
/// Entry: the same, and f/ in front of a focal ratio, which is multiplied by the aperture.
pub const FIELDSTOP_ENTRY_FOCAL_LENGTH: u8 = 1;
/// Entry: nanometres; a bare number is in um; units as for a length.
pub const FIELDSTOP_ENTRY_PIXEL_PITCH: u8 = 2;
/// Entry: nanometres; a bare number is in nm; units as for a length.
pub const FIELDSTOP_ENTRY_WAVELENGTH: u8 = 3;
/// Entry: milliarcseconds; a bare number is in degrees; units d deg, ' arcmin, " arcsec.
pub const FIELDSTOP_ENTRY_ANGLE: u8 = 4;
/// Entry: microarcseconds; a bare number is in seconds of arc; units as for an angle.
pub const FIELDSTOP_ENTRY_SMALL_ANGLE: u8 = 5;
/// Entry: Q16.16; no unit.
pub const FIELDSTOP_ENTRY_RATIO: u8 = 6;
/// Entry: Q16.16; f/ may stand in front.
pub const FIELDSTOP_ENTRY_FOCAL_RATIO: u8 = 7;
/// Entry: Q16.16; x may stand behind.
pub const FIELDSTOP_ENTRY_MAGNIFICATION: u8 = 8;
/// Entry: Q16.16, 65536 for a hundred per cent; % may stand behind.
pub const FIELDSTOP_ENTRY_PERCENT: u8 = 9;
/// Entry: millimagnitudes as int32_t; mag may stand behind.
pub const FIELDSTOP_ENTRY_MAGNITUDE: u8 = 10;
/// Entry: binary angle as int32_t, a quarter turn at most; a bare number is in degrees; a sign, or N or S behind.
pub const FIELDSTOP_ENTRY_LATITUDE: u8 = 11;
/// Entry: binary angle, positive east; under 360 degrees, or 180 at most with a sign, or E or W behind.
pub const FIELDSTOP_ENTRY_LONGITUDE: u8 = 12;
/// Entry: binary angle as int32_t, a quarter turn at most; a bare number is in degrees.
pub const FIELDSTOP_ENTRY_DECLINATION: u8 = 13;
/// Entry: binary angle under a turn; a bare number is in hours; units h m s, or those of an angle.
pub const FIELDSTOP_ENTRY_RIGHT_ASCENSION: u8 = 14;
/// Entry: milliseconds of a day, under 86400000; a bare number is in hours; units h m s.
pub const FIELDSTOP_ENTRY_TIME_OF_DAY: u8 = 15;
/// Entry: milliseconds; a bare number is in seconds; units h m s.
pub const FIELDSTOP_ENTRY_DURATION: u8 = 16;
/// Entry: an integer; px or steps may stand behind.
pub const FIELDSTOP_ENTRY_COUNT: u8 = 17;

/// State of an entry: it gives a quantity.
pub const FIELDSTOP_ENTRY_COMPLETE: u8 = 0;
/// State of an entry: it gives none yet; more characters can make it right.
pub const FIELDSTOP_ENTRY_PARTIAL: u8 = 1;
/// State of an entry: it gives none, whatever follows.
pub const FIELDSTOP_ENTRY_WRONG: u8 = 2;

/// Reason: none, for it is complete.
pub const FIELDSTOP_ENTRY_FINE: u8 = 0;
/// Reason: it ends where more must come.
pub const FIELDSTOP_ENTRY_ENDED: u8 = 1;
/// Reason: no entry has this byte here.
pub const FIELDSTOP_ENTRY_UNEXPECTED: u8 = 2;
/// Reason: the quantity is outside its range.
pub const FIELDSTOP_ENTRY_TOO_LARGE: u8 = 3;
/// Reason: minutes or seconds of 60 or more behind a greater unit.
pub const FIELDSTOP_ENTRY_SIXTY: u8 = 4;
/// Reason: a focal ratio where the aperture is not known.
pub const FIELDSTOP_ENTRY_NO_APERTURE: u8 = 5;

/// What an entry is worth.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq)]
#[repr(C)]
pub struct EntryState {
    /// The quantity in the unit of its kind, where the entry is complete; else 0.
    pub quantity: u32,
    /// The byte, counted from 0, that the reason is about; where it is complete or more must come, the length.
    pub position: u16,
    /// FIELDSTOP_ENTRY_COMPLETE, ..._PARTIAL or ..._WRONG.
    pub state: u8,
    /// FIELDSTOP_ENTRY_FINE, ..._ENDED and the others; callers take an unknown one as wrong.
    pub reason: u8,
}

// C sees this layout on every target: any other does not compile.
const _: () = assert!(size_of::<EntryState>() == 8 && core::mem::offset_of!(EntryState, state) == 6);

/// Reads what a person typed as a quantity, in the integer unit of its kind.
///
/// Digits, with the decimal mark of the style and decimals or without, then a unit or none. Units are those of the kind,
/// in the spelling of the style or m cm mm um nm in, d deg ' arcmin " arcsec, h m min s, x % mag px steps; in UTF-8 the
/// signs of degree, prime, double prime, micro and times too. An inch is 25.4 mm. Angles and times take several units,
/// as in 1d15'30" and 13h10m46s, with less than 60 of the later ones; the last may go without its unit, and where there is
/// a place or a time of day they may be separated by colons.
/// Rounding: to nearest, halves away from zero, exact for any count of decimals. What is 24 hours or 360 degrees only
/// when rounded is 0.
/// Ranges: text_length in bytes, any; kind one of FIELDSTOP_ENTRY_LENGTH and those behind it; aperture_um 0 where it is not known (only a focal
/// ratio as FIELDSTOP_ENTRY_FOCAL_LENGTH needs it). A signed quantity is in two's complement: convert it to int32_t.
/// Statuses: null pointer, out of range (kind; text that is partial or wrong), overflow (argument 1: the quantity is
/// outside its range), zero (aperture). fieldstop_entry_check tells where and why.
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_entry_read(
    text: *const c_char,
    text_length: u16,
    kind: u8,
    aperture_um: u32,
    style: *const TextStyle,
    quantity: *mut u32,
) -> fieldstop_status {
    if quantity.is_null() && !text.is_null() && !style.is_null() {
        return Error::new(Cause::NullPointer, 6).status();
    }
    // SAFETY: the caller's promise about the pointers.
    match unsafe { read(text, text_length, kind, aperture_um, style) } {
        Err(error) => error.status(),
        Ok(Ok(read)) => {
            // SAFETY: not null, and the caller's promise.
            unsafe { quantity.write(read) };
            0
        }
        Ok(Err(error)) => match error.reason {
            EntryReason::NoAperture => Error::new(Cause::Zero, 4),
            EntryReason::TooLarge => Error::new(Cause::Overflow, 1),
            _ => Error::new(Cause::OutOfRange, 1),
        }
        .status(),
    }
}

/// Tells whether what a person has typed so far is complete, partial or wrong, with the reason and the place.
///
/// The entry is read as by fieldstop_entry_read; that it is partial or wrong is a successful answer.
/// Every beginning of a complete entry is complete or partial.
/// Ranges: text, text_length, kind, aperture_um and style as there. Statuses: null pointer, out of range (kind).
#[must_use]
#[unsafe(no_mangle)]
pub unsafe extern "C" fn fieldstop_entry_check(
    text: *const c_char,
    text_length: u16,
    kind: u8,
    aperture_um: u32,
    style: *const TextStyle,
    check: *mut EntryState,
) -> fieldstop_status {
    if check.is_null() && !text.is_null() && !style.is_null() {
        return Error::new(Cause::NullPointer, 6).status();
    }
    // SAFETY: the caller's promise about the pointers.
    let answer = match unsafe { read(text, text_length, kind, aperture_um, style) } {
        Err(error) => return error.status(),
        Ok(Ok(quantity)) => EntryState { quantity, position: text_length, state: 0, reason: 0 },
        Ok(Err(error)) => EntryState {
            quantity: 0,
            position: error.at as u16,
            state: if error.partial { FIELDSTOP_ENTRY_PARTIAL } else { FIELDSTOP_ENTRY_WRONG },
            reason: error.reason as u8,
        },
    };
    // SAFETY: not null, and the caller's promise.
    unsafe { check.write(answer) };
    0
}

/// Checks the pointers and the kind, then reads.
///
/// # Safety
/// `text` is null or goes to so many bytes, `style` is null or goes to a style.
#[inline(never)]
unsafe fn read(
    text: *const c_char,
    text_length: u16,
    kind: u8,
    aperture_um: u32,
    style: *const TextStyle,
) -> Result<Result<u32, EntryError>, Error> {
    if text.is_null() {
        return Err(Error::new(Cause::NullPointer, 1));
    }
    if style.is_null() {
        return Err(Error::new(Cause::NullPointer, 5));
    }
    let Some(kind) = EntryKind::from_number(kind) else { return Err(Error::new(Cause::OutOfRange, 3)) };
    // SAFETY: neither is null; the caller promises a text of this length and a style.
    unsafe {
        let text = slice::from_raw_parts(text.cast(), text_length.into());
        Ok(read_as(text, kind, aperture_um, &*style.cast::<StyleOfC>()))
    }
}
