//! A value as characters: measured first, then written from the right.

use super::digits::{count, split_ten};
use super::style::{Look, TextStyle, Unit};
use super::value::Value;
use crate::status::{Cause, Error};
use core::sync::atomic::{Ordering, compiler_fence};

pub(super) const NO_ROOM: Error = Error::new(Cause::NoRoom, 0);

/// Places left for blanks, and bytes of the value behind them.
#[derive(Clone, Copy)]
pub(super) struct Written {
    pub(super) blanks: u8,
    bytes: u8,
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

    #[inline]
    pub(crate) fn write_as(self, style: &impl Look, width: u8, out: &mut [u8]) -> Result<usize, Error> {
        let written = if cfg!(target_arch = "avr") {
            self.write_right_here(style, width, out) // a call costs a hundred cycles there
        } else {
            self.write_right(style, width, out)
        };
        let written = written?;
        blank(out.iter_mut().take(written.blanks.into()));
        Ok(usize::from(written.blanks) + usize::from(written.bytes))
    }

    /// The same without the blanks.
    #[inline(never)]
    pub(super) fn write_right(self, style: &impl Look, width: u8, out: &mut [u8]) -> Result<Written, Error> {
        self.write_right_here(style, width, out)
    }

    #[inline(always)]
    fn write_right_here(self, style: &impl Look, width: u8, out: &mut [u8]) -> Result<Written, Error> {
        let form = self.form;
        let text = style.text(form.text());
        let Size { digits, bytes, characters } = self.measure_with(text.len(), style)?;
        let width = if width == 0 { characters } else { width.into() };
        let Some(blanks) = width.checked_sub(characters) else { return Err(NO_ROOM) };
        let Some(out) = out.get_mut(..blanks + bytes) else { return Err(NO_ROOM) };

        let mut places = out.iter_mut();
        // There always is a place: all was measured.
        let mut put = |byte| {
            if let Some(place) = places.next_back() {
                *place = byte;
            }
        };
        let in_front = form.text() == Unit::FocalRatio as u8;
        if !in_front {
            text.clone().rev().for_each(&mut put);
        }
        let mut number = self.number;
        let mut left = digits;
        let mut groups = form.groups();
        let mut sign = form.text();
        let mut mark = form.decimals() > 0;
        let mut run = form.decimals();
        while left > 0 {
            for _ in 0..run {
                let (rest, digit) = split_ten(number);
                put(b'0' + digit);
                number = rest;
            }
            left -= run;
            if run > 0 && left > 0 {
                if mark {
                    put(style.decimal_mark());
                    mark = false;
                } else {
                    sign -= 1;
                    groups -= 1;
                    style.text(sign).rev().for_each(&mut put);
                }
            }
            run = if groups > 0 { 2 } else { left };
        }
        if form.is_negative() {
            put(b'-');
        }
        if in_front {
            text.rev().for_each(&mut put);
        }
        Ok(Written { blanks: blanks as u8, bytes: bytes as u8 })
    }
}

/// What a value takes.
pub(super) struct Size {
    digits: usize,
    pub(super) bytes: usize,
    pub(super) characters: usize,
}

impl Value {
    #[inline(never)]
    pub(super) fn measure(self, style: &impl Look) -> Result<Size, Error> {
        self.measure_with(style.text(self.form.text()).len(), style)
    }

    #[inline(always)]
    fn measure_with(self, length: usize, style: &impl Look) -> Result<Size, Error> {
        let form = self.form;
        if let Some(position) = form.refused() {
            return Err(Error::new(Cause::OutOfRange, position));
        }
        let mut bytes = length;
        let mut digits = 0;
        if !form.is_word() {
            digits = count(self.number).max(form.decimals() + 2 * form.groups() + 1);
            bytes += digits + usize::from(form.decimals() > 0) + usize::from(form.is_negative());
            for back in 0..form.groups() {
                bytes += style.text(form.text().wrapping_sub(1 + back as u8)).len();
            }
        }
        let continued = if style.is_utf8() { self.continued(style) } else { 0 };
        Ok(Size { digits, bytes, characters: bytes - continued })
    }

    /// Bytes that do not begin a character.
    #[inline(never)]
    fn continued(self, style: &impl Look) -> usize {
        let last = self.form.text();
        (0..=self.form.groups() as u8).map(|back| style.continued(style.text(last.wrapping_sub(back)))).sum()
    }
}

pub(super) fn blank<'a>(places: impl Iterator<Item = &'a mut u8>) {
    for place in places {
        *place = b' ';
        // Keeps this loop from becoming a call of memset, which costs more than so few blanks.
        compiler_fence(Ordering::SeqCst);
    }
}
