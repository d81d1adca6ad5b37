//! A value as characters: spelled out in places of its own, then copied to where it is wanted if it has room there.

use super::digits::split_ten;
use super::style::{Look, TextStyle, begins_character};
use super::value::Value;
use crate::status::{Cause, Error};
use core::mem::MaybeUninit;
use core::sync::atomic::{Ordering, compiler_fence};

pub(super) const NO_ROOM: Error = Error::new(Cause::NoRoom, 0);

/// Where a byte goes. The memory of C need not hold anything yet, and to clear our own would cost as much as a value.
pub(crate) trait Place: Copy {
    const EMPTY: Self;
    fn of(byte: u8) -> Self;
}

impl Place for u8 {
    const EMPTY: u8 = 0;

    fn of(byte: u8) -> u8 {
        byte
    }
}

impl Place for MaybeUninit<u8> {
    const EMPTY: MaybeUninit<u8> = MaybeUninit::uninit();

    fn of(byte: u8) -> MaybeUninit<u8> {
        MaybeUninit::new(byte)
    }
}

impl Value {
    /// Writes the value into `out`, right-aligned to `width` characters (0: as long as it is), and tells its length
    /// in bytes.
    ///
    /// # Errors
    ///
    /// What is longer than `width` or `out` is refused with [`Cause::NoRoom`], too many decimals with
    /// [`Cause::OutOfRange`]; `out` is then as it was, and so it always is behind the length told.
    #[inline]
    pub fn write(self, style: &TextStyle, width: u8, out: &mut [u8]) -> Result<usize, Error> {
        self.write_as(style, width, out)
    }

    #[inline(never)]
    pub(crate) fn write_as<P: Place>(
        self,
        style: &impl Look,
        width: u8,
        out: &mut [P],
    ) -> Result<usize, Error> {
        if let Some(position) = self.form.refused() {
            return Err(Error::new(Cause::OutOfRange, position));
        }
        let mut places = [P::EMPTY; PLACES];
        let spelled = self.spell(style, &mut places);
        let length = spelled.bytes();
        let mut bytes = usize::from(width) + length - spelled.characters(style);
        if width == 0 {
            bytes = length;
        }
        let (Some(blanks), Some(out)) = (bytes.checked_sub(length), out.get_mut(..bytes)) else {
            return Err(NO_ROOM);
        };
        let Some((head, tail)) = out.split_at_mut_checked(blanks) else { return Err(NO_ROOM) };
        blank(head);
        copy(spelled.text(&places), tail);
        Ok(bytes)
    }

    /// Spells out what has not been refused.
    #[inline(never)]
    pub(super) fn spell<P: Place>(self, style: &impl Look, places: &mut [P; PLACES]) -> Spelled {
        let form = self.form;
        let mut text = form.text();
        let mut end = UNIT as u32;
        if !form.is_in_front() {
            end = put_text(style, text, end, places);
        }
        let mut start = UNIT as u32;
        if form.is_word() {
            return Spelled { start, end };
        }
        let mut number = self.number;
        let mut decimals = form.decimals() as u32;
        if decimals > 0 {
            decimals |= MARKED | u32::from(style.decimal_mark()) << 16;
        }
        for _ in 0..form.groups() {
            (number, start) = put_digits(number, decimals | 2 << 24, start, places);
            decimals = 0;
            text = text.wrapping_sub(1);
            start = put_text_before(style, text, start, &mut end, places);
        }
        (_, start) = put_digits(number, decimals, start, places);
        if form.is_negative() {
            start -= 1;
            put(b'-', start, places);
        }
        if form.is_in_front() {
            start = put_text_before(style, text, start, &mut end, places);
        }
        Spelled { start, end }
    }
}

/// Most bytes before a unit: ten digits, a mark, a minus, two texts.
const UNIT: usize = 10 + 1 + 1 + 2 * 8;
pub(super) const PLACES: usize = UNIT + 8;

/// Where in its places a value is; in the upper half of `end` the bytes that continue a character of UTF-8.
pub(super) struct Spelled {
    start: u32,
    end: u32,
}

impl Spelled {
    /// The value, with places behind it.
    #[inline(always)]
    pub(super) fn text<'a, P>(&self, places: &'a [P; PLACES]) -> &'a [P] {
        places.get(self.start as usize..).unwrap_or(&[])
    }

    #[inline(always)]
    pub(super) fn bytes(&self) -> usize {
        (self.end as u16 as u32).wrapping_sub(self.start) as usize
    }

    #[inline(always)]
    pub(super) fn characters(&self, style: &impl Look) -> usize {
        if style.is_utf8() { self.bytes() - (self.end >> 16) as usize } else { self.bytes() }
    }
}

#[inline(always)]
fn put<P: Place>(byte: u8, at: u32, places: &mut [P; PLACES]) {
    if let Some(place) = places.get_mut(at as usize) {
        *place = P::of(byte);
    }
}

/// Writes a text and gives where it ends.
#[inline(never)]
fn put_text<P: Place>(style: &impl Look, number: u8, mut at: u32, places: &mut [P; PLACES]) -> u32 {
    for byte in style.text(number) {
        put(byte, at & 0xffff, places);
        at += 1;
        if !begins_character(byte) {
            at += 1 << 16;
        }
    }
    at
}

/// Writes a text before `start` and gives where it begins; `end` counts what continues a character.
#[inline(never)]
fn put_text_before<P: Place>(
    style: &impl Look,
    number: u8,
    start: u32,
    end: &mut u32,
    places: &mut [P; PLACES],
) -> u32 {
    let at = start - style.text(number).count() as u32;
    *end += put_text(style, number, at, places) - start;
    at
}

/// Decimals in the lowest byte are followed by a mark, which is in the third.
const MARKED: u32 = 0x100;

/// Writes digits before `at`, as `plan` says: decimals with their mark, if there are any, and as many digits as its
/// highest byte says, or all for 0. Gives the number that is left and where the digits begin.
#[inline(never)]
fn put_digits<P: Place>(mut number: u32, mut plan: u32, mut at: u32, places: &mut [P; PLACES]) -> (u32, u32) {
    let mut left = (plan & 0xff) as i32;
    if left == 0 {
        left = (plan >> 24) as i32;
    }
    loop {
        let (rest, digit) = split_ten(number);
        number = rest;
        at = at.wrapping_sub(1);
        put(b'0' + digit, at, places);
        left -= 1;
        if left == 0 {
            if plan & MARKED == 0 {
                break;
            }
            at = at.wrapping_sub(1);
            put((plan >> 16) as u8, at, places);
            left = (plan >> 24) as i32;
            plan = 0;
        } else if left < 0 && number == 0 {
            break;
        }
    }
    (number, at)
}

// The fences keep these loops from becoming calls of memset and memcpy, which cost more than so few bytes.

pub(super) fn blank<P: Place>(places: &mut [P]) {
    for place in places {
        *place = P::of(b' ');
        compiler_fence(Ordering::SeqCst);
    }
}

#[inline(always)]
pub(super) fn copy<P: Place>(text: &[P], places: &mut [P]) {
    for (place, byte) in places.iter_mut().zip(text) {
        *place = *byte;
        compiler_fence(Ordering::SeqCst);
    }
}
