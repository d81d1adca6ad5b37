//! A value as characters: measured first, then written from the right.

use super::digits::{split_sixty, split_ten};
use super::style::{TextStyle, Unit};
use super::value::{Shape, Value};
use crate::status::{Cause, Error};
use core::sync::atomic::{Ordering, compiler_fence};

pub(super) const NO_ROOM: Error = Error::new(Cause::NoRoom, 0);

/// What a value is going to take.
#[derive(Clone, Copy)]
pub(super) struct Size {
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
        let size = self.measure(style)?;
        let width = usize::from(width);
        let blanks = if width == 0 { 0 } else { width.wrapping_sub(size.characters) };
        match out.get_mut(..blanks.wrapping_add(size.bytes)) {
            Some(out) if blanks <= width => {
                self.fill(style, out);
                Ok(out.len())
            }
            _ => Err(NO_ROOM),
        }
    }

    pub(super) fn measure(&self, style: &TextStyle) -> Result<Size, Error> {
        let mut size = Size { characters: 0, bytes: 0 };
        let mut add = |number| {
            let text = style.text(number);
            size.bytes += text.len();
            size.characters += style.characters(text);
        };
        add(self.text);
        let digits = match self.shape {
            Shape::Word => 0,
            Shape::Plain => count_digits(self.number, 1).max(usize::from(self.decimals) + 1),
            Shape::Sexagesimal => {
                let (groups, least) = self.groups();
                add(self.text - 1);
                if groups == 2 {
                    add(self.text - 2);
                }
                count_digits(self.number, least) + 2 * groups + usize::from(self.decimals)
            }
            Shape::Refused2 => return Err(Error::new(Cause::OutOfRange, 2)),
            Shape::Refused3 => return Err(Error::new(Cause::OutOfRange, 3)),
        };
        let single = digits + usize::from(self.decimals > 0) + usize::from(self.negative);
        size.characters += single;
        size.bytes += single;
        Ok(size)
    }

    /// The groups of two digits behind the first number of a sexagesimal angle, and what one of that number is worth.
    fn groups(&self) -> (usize, u32) {
        let mut one = 60; // at most 3600 * 10^3
        for _ in 0..self.decimals {
            one *= 10;
        }
        // Degree, minute and second are 1, 2 and 3.
        if self.text == Unit::Second as u8 && self.number >= 60 * one { (2, 60 * one) } else { (1, one) }
    }

    /// Writes the value to the end of `out`, and blanks before it.
    pub(super) fn fill(&self, style: &TextStyle, out: &mut [u8]) {
        let mut places = out.iter_mut();
        // There always is one: the value was measured.
        let mut put = |byte| {
            if let Some(place) = places.next_back() {
                *place = byte;
            }
        };
        let mut number = self.number;
        let mut text = self.text;
        let in_front = text == Unit::FocalRatio as u8;
        if !in_front {
            style.text(text).iter().rev().for_each(|&byte| put(byte));
        }
        if self.shape != Shape::Word {
            if self.decimals > 0 {
                for _ in 0..self.decimals {
                    let (rest, digit) = split_ten(number);
                    put(b'0' + digit);
                    number = rest;
                }
                put(style.decimal_mark);
            }
            if self.shape == Shape::Sexagesimal {
                loop {
                    let (rest, group) = split_sixty(number);
                    number = rest;
                    let tens = (group as u32 * 205 >> 11) as u8; // a tenth
                    put(b'0' + group - 10 * tens);
                    put(b'0' + tens);
                    text -= 1;
                    style.text(text).iter().rev().for_each(|&byte| put(byte));
                    if text <= Unit::Degree as u8 || number < 60 {
                        break;
                    }
                }
            }
            loop {
                let (rest, digit) = split_ten(number);
                put(b'0' + digit);
                number = rest;
                if number == 0 {
                    break;
                }
            }
            if self.negative {
                put(b'-');
            }
        }
        if in_front {
            style.text(text).iter().rev().for_each(|&byte| put(byte));
        }
        for place in places {
            *place = b' ';
            // Keeps this loop from becoming a call of memset, which costs more than so few blanks.
            compiler_fence(Ordering::SeqCst);
        }
    }
}

/// Digits of `number` in units of `one`, at least one. `one` is at most 3600 * 10^3.
fn count_digits(number: u32, one: u32) -> usize {
    let mut digits = 1;
    let mut next = one * 10;
    while number >= next {
        digits += 1;
        if next > u32::MAX / 10 {
            break;
        }
        next *= 10;
    }
    digits
}
