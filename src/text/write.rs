//! A value as characters: first the digits from the right, then everything into the buffer from the left.

use super::digits::{Radix, split};
use super::style::{TextStyle, Unit};
use super::value::{Shape, Value};
use crate::status::{Cause, Error};

/// The longest: 1193°02'47.295".
const LONGEST: usize = 16;

/// The code that the style's decimal mark replaces.
const MARK: u8 = b'.';

/// A value worked out and measured, nothing written yet.
pub(super) struct Composed<'a> {
    style: &'a TextStyle,
    /// Filled from the right. Under a blank: the number of a text of the style.
    codes: [u8; LONGEST],
    first: usize,
    pub(super) characters: usize,
    pub(super) bytes: usize,
}

impl Value {
    /// Writes the value into `out`, right-aligned to `width` characters (0: as long as it is), and tells its length
    /// in bytes.
    ///
    /// What is longer than `width` or `out` is refused with [`Cause::NoRoom`], too many decimals with
    /// [`Cause::OutOfRange`]; `out` is then as it was, and so it always is behind the length told.
    pub fn write(&self, style: &TextStyle, width: u8, out: &mut [u8]) -> Result<usize, Error> {
        Composed::new(self, style)?.write(width, out)
    }
}

impl<'a> Composed<'a> {
    pub(super) fn new(value: &Value, style: &'a TextStyle) -> Result<Composed<'a>, Error> {
        let mut text = Composed { style, codes: [0; LONGEST], first: LONGEST, characters: 0, bytes: 0 };
        match value.shape {
            Shape::Word => text.push_text(value.text),
            Shape::Refused2 => return Err(Error::new(Cause::OutOfRange, 2)),
            Shape::Refused3 => return Err(Error::new(Cause::OutOfRange, 3)),
            Shape::Plain | Shape::Sexagesimal => text.push_number(value),
        }
        Ok(text)
    }

    fn push_number(&mut self, value: &Value) {
        let mut number = value.number;
        let mut unit = value.text;
        let in_front = unit == Unit::FocalRatio as u8;
        if !in_front {
            self.push_text(unit);
        }
        if value.decimals > 0 {
            for _ in 0..value.decimals {
                number = self.push_digit(number, Radix::Ten);
            }
            self.push(MARK);
        }
        if value.shape == Shape::Sexagesimal {
            // Degree, minute and second are 1, 2 and 3.
            loop {
                number = self.push_digit(number, Radix::Ten);
                number = self.push_digit(number, Radix::Six);
                unit -= 1;
                self.push_text(unit);
                if unit <= Unit::Degree as u8 || number < 60 {
                    break;
                }
            }
        }
        loop {
            number = self.push_digit(number, Radix::Ten);
            if number == 0 {
                break;
            }
        }
        if value.negative {
            self.push(b'-');
        }
        if in_front {
            self.push_text(unit);
        }
    }

    fn push_digit(&mut self, number: u32, radix: Radix) -> u32 {
        let (rest, digit) = split(number, radix);
        self.push(b'0' + digit);
        rest
    }

    fn push(&mut self, code: u8) {
        self.push_code(code);
        self.characters += 1;
        self.bytes += 1;
    }

    fn push_code(&mut self, code: u8) {
        self.first = self.first.wrapping_sub(1);
        if let Some(place) = self.codes.get_mut(self.first) {
            *place = code;
        }
    }

    fn push_text(&mut self, number: u8) {
        if number != 0 {
            self.push_code(number);
            for &byte in self.style.text(number) {
                self.characters += self.style.begins_character(byte) as usize;
                self.bytes += 1;
            }
        }
    }

    pub(super) fn write(&self, width: u8, out: &mut [u8]) -> Result<usize, Error> {
        let blanks = match width {
            0 => Some(0),
            _ => usize::from(width).checked_sub(self.characters),
        };
        let Some((blanks, out)) = blanks.and_then(|n| Some((n, out.get_mut(..n + self.bytes)?))) else {
            return Err(Error::new(Cause::NoRoom, 0));
        };
        let length = out.len();
        let mut out = out.iter_mut();
        let mut put = |byte| {
            if let Some(place) = out.next() {
                *place = byte;
            }
        };
        for _ in 0..blanks {
            put(b' ');
        }
        for &code in self.codes.get(self.first..).unwrap_or(&[]) {
            match code {
                b'0'.. => put(code),
                MARK => put(self.style.decimal_mark),
                b'-' => put(code),
                number => self.style.text(number).iter().for_each(|&byte| put(byte)),
            }
        }
        Ok(length)
    }
}
