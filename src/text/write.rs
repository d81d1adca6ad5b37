//! A value as characters, with what stands before it on a line: measured first, then written from both ends.

use super::digits::{count, split_ten};
use super::style::{TextStyle, Unit, begins_character};
use super::value::Value;
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
    mut value: Value,
    label: impl Iterator<Item = u8> + Clone,
    layout: Layout,
    style: &TextStyle,
    out: &mut [u8],
) -> Result<usize, Error> {
    let mut size = measure(value, style)?;
    let columns = if layout.columns == 0 { size.characters } else { layout.columns.into() };
    let most = columns - usize::from(layout.mark != 0);
    if size.characters > most && layout.may_lose_unit {
        value = value.without_unit();
        size = measure(value, style)?;
    }
    let field = size.characters.max(layout.field.into());
    let Some(room) = most.checked_sub(field) else { return Err(NO_ROOM) };
    let (mut head, mut label_bytes) = (room, room);
    if style.utf8 != 0 {
        let cut = cut(label.clone(), room);
        label_bytes = cut.bytes;
        head += cut.continued;
    }
    let length = head + (columns - most) + field + size.continued;
    let Some(out) = out.get_mut(..length) else { return Err(NO_ROOM) };
    let Some((head, mut tail)) = out.split_at_mut_checked(head) else { return Err(NO_ROOM) };
    put_label(label, label_bytes, head);
    if layout.mark != 0
        && let Some(mark) = tail.split_off_first_mut()
    {
        *mark = layout.mark;
    }
    put_value(value, size.digits, style, tail);
    Ok(length)
}

/// Writes so many bytes of a label, and blanks behind it.
#[inline(never)]
fn put_label(mut label: impl Iterator<Item = u8>, bytes: usize, out: &mut [u8]) {
    let Some((head, tail)) = out.split_at_mut_checked(bytes) else { return };
    let mut places = head.iter_mut();
    for place in places.by_ref() {
        let Some(byte) = label.next() else {
            *place = b' ';
            break;
        };
        *place = byte;
    }
    blank(places);
    blank(tail.iter_mut());
}

fn blank<'a>(places: impl Iterator<Item = &'a mut u8>) {
    for place in places {
        *place = b' ';
        // Keeps this loop from becoming a call of memset, which costs more than so few blanks.
        compiler_fence(Ordering::SeqCst);
    }
}

struct Size {
    digits: usize,
    characters: usize,
    /// Bytes that do not begin a character.
    continued: usize,
}

#[inline]
fn measure(value: Value, style: &TextStyle) -> Result<Size, Error> {
    let form = value.form;
    if let Some(position) = form.refused() {
        return Err(Error::new(Cause::OutOfRange, position));
    }
    let text = style.text(form.text());
    let mut continued = style.continued(text);
    let mut bytes = text.len();
    let mut digits = 0;
    if !form.is_word() {
        let whole_from = form.decimals() + 2 * form.groups();
        digits = count(value.number).max(whole_from + 1);
        bytes += digits;
        bytes += usize::from(form.decimals() > 0);
        bytes += usize::from(form.is_negative());
        for back in 0..form.groups() {
            let sign = style.text(form.text().wrapping_sub(1 + back as u8));
            bytes += sign.len();
            continued += style.continued(sign);
        }
    }
    Ok(Size { digits, characters: bytes - continued, continued })
}

/// Writes the value at the end of `out`, and blanks before it.
#[inline(never)]
fn put_value(value: Value, digits: usize, style: &TextStyle, mut out: &mut [u8]) {
    let form = value.form;
    let mut text = form.text();
    let in_front = text == Unit::FocalRatio as u8;
    if !in_front {
        put_text(style.text(text), &mut out);
    }
    if digits > 0 {
        let mut number = value.number;
        let mut whole = digits;
        if form.decimals() > 0 {
            number = put_digits(number, form.decimals(), &mut out);
            put_text(&[style.decimal_mark], &mut out);
            whole = whole.wrapping_sub(form.decimals());
        }
        for _ in 0..form.groups() {
            number = put_digits(number, 2, &mut out);
            text = text.wrapping_sub(1);
            put_text(style.text(text), &mut out);
            whole = whole.wrapping_sub(2);
        }
        put_digits(number, whole, &mut out);
        if form.is_negative() {
            put_text(b"-", &mut out);
        }
        if in_front {
            put_text(style.text(text), &mut out);
        }
    }
    blank(out.iter_mut());
}

/// The last places, taken off. They always are there, since all was measured.
#[inline(always)]
fn last<'a>(out: &mut &'a mut [u8], count: usize) -> &'a mut [u8] {
    out.split_off_mut(out.len().wrapping_sub(count)..).unwrap_or(&mut [])
}

fn put_text(text: &[u8], out: &mut &mut [u8]) {
    for (place, byte) in last(out, text.len()).iter_mut().zip(text) {
        *place = *byte;
        compiler_fence(Ordering::SeqCst);
    }
}

/// Writes so many of the number's last digits and gives what is left of it.
fn put_digits(mut number: u32, count: usize, out: &mut &mut [u8]) -> u32 {
    for place in last(out, count).iter_mut().rev() {
        let (rest, digit) = split_ten(number);
        *place = b'0' + digit;
        number = rest;
    }
    number
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
