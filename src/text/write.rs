//! A value as characters, with what stands before it on a line: measured first, then written from both ends.

use super::digits::{count, split_ten};
use super::style::{TextStyle, Unit, begins_character};
use super::value::{Kind, Value};
use crate::status::{Cause, Error};
use core::sync::atomic::{Ordering, compiler_fence};

impl Value {
    /// Writes the value into `out`, right-aligned to `width` characters (0: as long as it is), and tells its length
    /// in bytes.
    ///
    /// What is longer than `width` or `out` is refused with [`Cause::NoRoom`], too many decimals with
    /// [`Cause::OutOfRange`]; `out` is then as it was, and so it always is behind the length told.
    pub fn write(&self, style: &TextStyle, width: u8, out: &mut [u8]) -> Result<usize, Error> {
        write(*self, core::iter::empty(), Layout::value(width), style, out)
    }
}

/// Where things stand on a line.
#[derive(Clone, Copy)]
pub(crate) struct Layout {
    /// Characters of the line; 0: as many as the value has.
    pub(super) columns: u8,
    /// Characters kept for the value at the right end.
    pub(super) field: u8,
    /// Stands before the field; 0: there is no place for it.
    pub(super) mark: u8,
    /// A number that is too long for the line may lose its unit.
    pub(super) may_lose_unit: bool,
}

impl Layout {
    pub(crate) const fn value(width: u8) -> Layout {
        Layout { columns: width, field: 0, mark: 0, may_lose_unit: false }
    }
}

const NO_ROOM: Error = Error::new(Cause::NoRoom, 0);

/// Writes a label as far as it has room, a mark, and the value.
pub(crate) fn write(
    value: Value,
    label: impl Iterator<Item = u8> + Clone,
    layout: Layout,
    style: &TextStyle,
    out: &mut [u8],
) -> Result<usize, Error> {
    let mut text = style.text(value.text);
    let mut continued = style.continued(text);
    let mut characters = text.len();
    let mut digits = 0;
    match value.kind {
        Kind::Refused2 => return Err(Error::new(Cause::OutOfRange, 2)),
        Kind::Refused3 => return Err(Error::new(Cause::OutOfRange, 3)),
        Kind::Word => {}
        Kind::Positive | Kind::Negative => {
            let whole_from = usize::from(value.decimals) + 2 * usize::from(value.groups);
            digits = count(value.number).max(whole_from + 1);
            characters += digits;
            characters += usize::from(value.decimals > 0);
            characters += usize::from(value.kind == Kind::Negative);
            for before in 1..=value.groups {
                let sign = style.text(value.text.wrapping_sub(before));
                characters += sign.len();
                continued += style.continued(sign);
            }
        }
    }
    characters -= continued;

    let columns = if layout.columns == 0 { characters } else { layout.columns.into() };
    let most = columns - usize::from(layout.mark != 0);
    if characters > most && layout.may_lose_unit && value.groups == 0 {
        let lost = style.continued(text);
        characters -= text.len() - lost;
        continued -= lost;
        text = &[];
    }
    let field = characters.max(layout.field.into());
    let Some(room) = most.checked_sub(field) else { return Err(NO_ROOM) };
    let mut label_bytes = room;
    if style.utf8 != 0 {
        let cut = cut(label.clone(), room);
        label_bytes = cut.bytes;
        continued += cut.continued;
    }
    let Some(out) = out.get_mut(..columns + continued) else { return Err(NO_ROOM) };
    let length = out.len();

    let mut places = out.iter_mut();
    for byte in label.take(label_bytes) {
        if let Some(place) = places.next() {
            *place = byte;
        }
    }
    // There always is a place: all was measured.
    let mut put = |byte| {
        if let Some(place) = places.next_back() {
            *place = byte;
        }
    };
    let in_front = value.text == Unit::FocalRatio as u8;
    if !in_front {
        text.iter().rev().for_each(|&byte| put(byte));
    }
    let mut number = value.number;
    let mut sign = value.text;
    let mut next_sign = if value.groups > 0 { usize::from(value.decimals) + 2 } else { 0 };
    for at in 0..digits {
        if at == usize::from(value.decimals) && at > 0 {
            put(style.decimal_mark);
        }
        if at == next_sign && at > 0 {
            sign = sign.wrapping_sub(1);
            next_sign = if value.text.wrapping_sub(sign) < value.groups { at + 2 } else { 0 };
            style.text(sign).iter().rev().for_each(|&byte| put(byte));
        }
        let (rest, digit) = split_ten(number);
        put(b'0' + digit);
        number = rest;
    }
    if value.kind == Kind::Negative {
        put(b'-');
    }
    if in_front {
        text.iter().rev().for_each(|&byte| put(byte));
    }
    if layout.mark != 0 {
        for _ in characters..field {
            put(b' ');
        }
        put(layout.mark);
    }
    for place in places {
        *place = b' ';
        // Keeps this loop from becoming a call of memset, which costs more than so few blanks.
        compiler_fence(Ordering::SeqCst);
    }
    Ok(length)
}

/// A part of a UTF-8 text.
struct Cut {
    bytes: usize,
    /// Bytes of it that do not begin a character.
    continued: usize,
}

/// The part that has room.
fn cut(label: impl Iterator<Item = u8>, room: usize) -> Cut {
    let mut cut = Cut { bytes: 0, continued: 0 };
    for byte in label {
        if !begins_character(byte) {
            cut.continued += 1;
        } else if cut.bytes - cut.continued == room {
            break;
        }
        cut.bytes += 1;
    }
    cut
}
