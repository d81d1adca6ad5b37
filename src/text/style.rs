//! How numbers look: the characters of the display, the decimal mark and the unit texts.

#[cfg(any(test, target_arch = "avr"))]
use crate::stored::Stored;
use core::slice::Iter;

/// What stands behind a number, or in front of it for [`Unit::FocalRatio`].
///
/// The number of a unit is its place in [`TextStyle::units`], counted from 1; 0 is no unit. Numbers are frozen.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(u8)]
pub enum Unit {
    /// A plain number.
    #[default]
    None = 0,
    /// Between degrees and minutes of arc, as in 1°12'.
    Degree = 1,
    /// Minutes of arc.
    Minute = 2,
    /// Seconds of arc.
    Second = 3,
    /// Degrees with decimals.
    DecimalDegree = 4,
    /// Metres.
    Metre = 5,
    /// Millimetres.
    Millimetre = 6,
    /// Micrometres.
    Micrometre = 7,
    /// Nanometres.
    Nanometre = 8,
    /// Magnification.
    Times = 9,
    /// Per hundred.
    Percent = 10,
    /// Brightness on the magnitude scale.
    Magnitude = 11,
    /// In front of a focal ratio.
    FocalRatio = 12,
    /// Pixels.
    Pixel = 13,
    /// Seconds of arc to a pixel.
    SecondPerPixel = 14,
    /// Seconds of arc to a millimetre.
    SecondPerMillimetre = 15,
    /// Seconds of arc in a second of time.
    SecondPerTime = 16,
    /// Cycles to a millimetre.
    PerMillimetre = 17,
    /// Seconds of time.
    Time = 18,
    /// Steps of a motor.
    Step = 19,
    /// Temperature.
    Kelvin = 20,
    /// Power.
    Watt = 21,
}

impl Unit {
    /// The unit with this number, if there is one.
    pub const fn from_number(number: u8) -> Option<Unit> {
        Some(match number {
            0 => Unit::None,
            1 => Unit::Degree,
            2 => Unit::Minute,
            3 => Unit::Second,
            4 => Unit::DecimalDegree,
            5 => Unit::Metre,
            6 => Unit::Millimetre,
            7 => Unit::Micrometre,
            8 => Unit::Nanometre,
            9 => Unit::Times,
            10 => Unit::Percent,
            11 => Unit::Magnitude,
            12 => Unit::FocalRatio,
            13 => Unit::Pixel,
            14 => Unit::SecondPerPixel,
            15 => Unit::SecondPerMillimetre,
            16 => Unit::SecondPerTime,
            17 => Unit::PerMillimetre,
            18 => Unit::Time,
            19 => Unit::Step,
            20 => Unit::Kelvin,
            21 => Unit::Watt,
            _ => return None,
        })
    }
}

/// Numbers of the texts that stand in place of a number, behind those of the units.
pub(super) const DASH: u8 = 22;
pub(super) const YES: u8 = 23;
pub(super) const NO: u8 = 24;

/// The look of all text. Plain data that the caller owns: copy one of the ready ones and change what you like.
///
/// A text is up to 8 bytes of the display's character set, filled up with zeros.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
#[repr(C)]
pub struct TextStyle {
    /// The text of unit number n in place n - 1, with the blank before it where one is wanted.
    pub units: [[u8; 8]; 21],
    /// Stands where a value is not available.
    pub dash: [u8; 8],
    /// Answers whether a fact holds.
    pub yes: [u8; 8],
    /// Answers whether a fact holds.
    pub no: [u8; 8],
    /// Point or comma, one byte; in UTF-8 one of ASCII.
    pub decimal_mark: u8,
    /// Stands before a value that a fact of the readout concerns, one byte; in UTF-8 one of ASCII.
    pub fact_mark: u8,
    /// 1: texts are UTF-8, and a character may take several bytes. 0: every byte is a character.
    pub utf8: u8,
}

/// The ready styles.
///
/// cbindgen:ignore
impl TextStyle {
    /// Letters and signs of ASCII only; `d` and `deg` stand for the degree sign, `u` for micro, `x` for times.
    pub const ASCII: TextStyle = TextStyle {
        units: [
            text(b"d"),
            text(b"'"),
            text(b"\""),
            text(b" deg"),
            text(b" m"),
            text(b" mm"),
            text(b" um"),
            text(b" nm"),
            text(b"x"),
            text(b"%"),
            text(b" mag"),
            text(b"f/"),
            text(b" px"),
            text(b"\"/px"),
            text(b"\"/mm"),
            text(b"\"/s"),
            text(b"/mm"),
            text(b" s"),
            text(b" steps"),
            text(b" K"),
            text(b" W"),
        ],
        dash: text(b"-"),
        yes: text(b"yes"),
        no: text(b"no"),
        decimal_mark: b'.',
        fact_mark: b'!',
        utf8: 0,
    };

    /// UTF-8: degree sign U+00B0, prime U+2032, double prime U+2033, micro sign U+00B5, multiplication sign U+00D7.
    pub const UTF8: TextStyle =
        TextStyle { utf8: 1, ..TextStyle::with_signs("°", "′", "″", " µm", "×") };

    /// Dot-matrix displays with character ROM A00 (Japanese) of the HD44780U: degree 0xDF, micro 0xE4.
    /// The ROM has no prime and no multiplication sign: `'`, `"` and `x` stand for them.
    /// Codes from memory of the HD44780U data sheet, table of the character codes of ROM A00.
    pub const HD44780_A00: TextStyle = TextStyle::with_signs_of(b"\xdf", b"'", b"\"", b" \xe4m", b"x");

    /// Dot-matrix displays with character ROM A02 (European) of the HD44780U: degree 0xB0, micro 0xB5, times 0xD7.
    /// The ROM has no prime: `'` and `"` stand for it.
    /// Codes from memory of the HD44780U data sheet, table of the character codes of ROM A02.
    pub const HD44780_A02: TextStyle = TextStyle::with_signs_of(b"\xb0", b"'", b"\"", b" \xb5m", b"\xd7");

    const fn with_signs(
        degree: &str,
        minute: &str,
        second: &str,
        micrometre: &str,
        times: &str,
    ) -> TextStyle {
        TextStyle::with_signs_of(
            degree.as_bytes(),
            minute.as_bytes(),
            second.as_bytes(),
            micrometre.as_bytes(),
            times.as_bytes(),
        )
    }

    const fn with_signs_of(
        degree: &[u8],
        minute: &[u8],
        second: &[u8],
        micrometre: &[u8],
        times: &[u8],
    ) -> TextStyle {
        let mut style = TextStyle::ASCII;
        style.units[Unit::Degree as usize - 1] = text(degree);
        style.units[Unit::DecimalDegree as usize - 1] = text(degree);
        style.units[Unit::Minute as usize - 1] = text(minute);
        style.units[Unit::Second as usize - 1] = text(second);
        style.units[Unit::Micrometre as usize - 1] = text(micrometre);
        style.units[Unit::Times as usize - 1] = text(times);
        style.units[Unit::SecondPerPixel as usize - 1] = joined(second, b"/px");
        style.units[Unit::SecondPerMillimetre as usize - 1] = joined(second, b"/mm");
        style.units[Unit::SecondPerTime as usize - 1] = joined(second, b"/s");
        style
    }

    /// The text of a unit, without the zeros that fill it up; empty for [`Unit::None`].
    pub fn unit(&self, unit: Unit) -> &[u8] {
        let text = self.bytes(unit as u8);
        let length = text.iter().position(|&byte| byte == 0).unwrap_or(text.len());
        text.get(..length).unwrap_or(text)
    }

    #[inline(always)]
    fn bytes(&self, number: u8) -> &[u8; 8] {
        match self.units.get(usize::from(number).wrapping_sub(1)) {
            Some(text) => text,
            None => self.word(number),
        }
    }

    #[inline(never)]
    fn word(&self, number: u8) -> &[u8; 8] {
        match number {
            DASH => &self.dash,
            YES => &self.yes,
            NO => &self.no,
            _ => &[0; 8],
        }
    }
}

/// What the writers ask of a style, wherever it is.
pub(crate) trait Look {
    type Text<'a>: Iterator<Item = u8> + Clone
    where
        Self: 'a;

    /// The text with a number: of a unit, or one of those behind.
    fn text(&self, number: u8) -> Self::Text<'_>;
    fn decimal_mark(&self) -> u8;
    fn fact_mark(&self) -> u8;
    fn is_utf8(&self) -> bool;

    /// How many of these bytes do not begin a character.
    fn continued(&self, text: impl Iterator<Item = u8>) -> usize {
        if !self.is_utf8() {
            return 0;
        }
        text.filter(|&byte| !begins_character(byte)).count()
    }
}

/// The bytes of a text up to the first zero.
#[derive(Clone)]
pub(crate) struct UpToZero<'a>(Iter<'a, u8>);

impl Iterator for UpToZero<'_> {
    type Item = u8;

    #[inline(always)]
    fn next(&mut self) -> Option<u8> {
        self.0.next().copied().filter(|&byte| byte != 0)
    }
}

impl Look for TextStyle {
    type Text<'a> = UpToZero<'a>;

    #[inline(always)]
    fn text(&self, number: u8) -> UpToZero<'_> {
        UpToZero(self.bytes(number).iter())
    }

    fn decimal_mark(&self) -> u8 {
        self.decimal_mark
    }

    fn fact_mark(&self) -> u8 {
        self.fact_mark
    }

    fn is_utf8(&self) -> bool {
        self.utf8 != 0
    }
}

/// A style as the C interface gets it.
#[cfg(all(feature = "capi", not(target_arch = "avr")))]
pub(crate) type StyleOfC = TextStyle;
#[cfg(all(feature = "capi", target_arch = "avr"))]
pub(crate) type StyleOfC = StoredStyle;

/// A style in program memory: laid out as [`TextStyle`] is.
#[cfg(any(test, target_arch = "avr"))]
#[repr(C)]
pub(crate) struct StoredStyle {
    texts: Stored<[[u8; 8]; NO as usize]>,
    decimal_mark: Stored<u8>,
    fact_mark: Stored<u8>,
    utf8: Stored<u8>,
}

#[cfg(any(test, target_arch = "avr"))]
impl Look for StoredStyle {
    type Text<'a> = StoredText<'a>;

    fn text(&self, number: u8) -> StoredText<'_> {
        let index = number.wrapping_sub(1);
        let known = index < NO;
        let text = self.texts.entry(if known { index.into() } else { 0 });
        let mut end = 0;
        while known && end < 8 && text.at(end.into()) != 0 {
            end += 1;
        }
        StoredText { text, at: 0, end }
    }

    fn decimal_mark(&self) -> u8 {
        self.decimal_mark.get()
    }

    fn fact_mark(&self) -> u8 {
        self.fact_mark.get()
    }

    fn is_utf8(&self) -> bool {
        self.utf8.get() != 0
    }
}

/// The bytes of a text that are left.
#[cfg(any(test, target_arch = "avr"))]
#[derive(Clone)]
pub(crate) struct StoredText<'a> {
    text: &'a Stored<[u8; 8]>,
    at: u8,
    end: u8,
}

#[cfg(any(test, target_arch = "avr"))]
impl Iterator for StoredText<'_> {
    type Item = u8;

    fn next(&mut self) -> Option<u8> {
        if self.at == self.end {
            return None;
        }
        self.at += 1;
        Some(self.text.at(usize::from((self.at - 1) & 7)))
    }

    fn size_hint(&self) -> (usize, Option<usize>) {
        let left = usize::from(self.end - self.at);
        (left, Some(left))
    }
}

/// Whether this byte of UTF-8 begins a character, so that counting these counts characters.
#[inline]
pub(super) fn begins_character(byte: u8) -> bool {
    byte & 0xc0 != 0x80
}

/// A unit's text for [`TextStyle::units`]: filled up with zeros; what is longer than 8 bytes is cut.
pub const fn text(characters: &[u8]) -> [u8; 8] {
    joined(characters, &[])
}

const fn joined(mut first: &[u8], mut second: &[u8]) -> [u8; 8] {
    let mut text = [0; 8];
    let mut at = 0;
    while at < text.len() {
        if let [byte, rest @ ..] = first {
            text[at] = *byte;
            first = rest;
        } else if let [byte, rest @ ..] = second {
            text[at] = *byte;
            second = rest;
        }
        at += 1;
    }
    text
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn a_stored_style_looks_the_same() {
        let mut style = TextStyle::UTF8;
        style.fact_mark = b'*';
        style.units[3] = *b"12345678";
        let mut texts = [[0; 8]; NO as usize];
        let all = style.units.iter().chain([&style.dash, &style.yes, &style.no]);
        texts.iter_mut().zip(all).for_each(|(place, text)| *place = *text);
        let stored = StoredStyle {
            texts: Stored::new(texts),
            decimal_mark: Stored::new(style.decimal_mark),
            fact_mark: Stored::new(style.fact_mark),
            utf8: Stored::new(style.utf8),
        };
        for number in 0..=u8::MAX {
            assert!(stored.text(number).eq(style.text(number)), "{number}");
        }
        assert_eq!(
            (stored.decimal_mark(), stored.fact_mark(), stored.is_utf8()),
            (style.decimal_mark(), style.fact_mark(), style.is_utf8())
        );
    }
}
