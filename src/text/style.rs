//! How numbers look: the characters of the display, the decimal mark and the unit texts.

#[cfg(any(test, target_arch = "avr"))]
use crate::stored::Stored;
#[cfg(any(test, target_arch = "avr"))]
use core::mem::{offset_of, size_of};
use core::ops::Deref;

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
        self.text(unit as u8)
    }
}

/// What the writers ask of a style, wherever it is.
pub(crate) trait Look {
    type Text<'a>: Deref<Target = [u8]>
    where
        Self: 'a;

    /// The text with a number: of a unit, or one of those behind.
    fn text(&self, number: u8) -> Self::Text<'_>;
    fn decimal_mark(&self) -> u8;
    fn fact_mark(&self) -> u8;
    fn is_utf8(&self) -> bool;

    /// How many of these bytes do not begin a character.
    fn continued(&self, text: &[u8]) -> usize {
        if !self.is_utf8() {
            return 0;
        }
        text.iter().filter(|&&byte| !begins_character(byte)).count()
    }
}

impl Look for TextStyle {
    type Text<'a> = &'a [u8];

    fn text(&self, number: u8) -> &[u8] {
        let text = match self.units.get(usize::from(number).wrapping_sub(1)) {
            Some(text) => text,
            None => match number {
                DASH => &self.dash,
                YES => &self.yes,
                NO => &self.no,
                _ => return &[],
            },
        };
        let mut length = 0;
        while length < 8 && text[length] != 0 {
            length += 1;
        }
        &text[..length]
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

/// The bytes of a style in program memory.
#[cfg(any(test, target_arch = "avr"))]
pub(crate) type StoredStyle = Stored<[u8; size_of::<TextStyle>()]>;

#[cfg(any(test, target_arch = "avr"))]
impl Look for StoredStyle {
    type Text<'a> = CopiedText;

    fn text(&self, number: u8) -> CopiedText {
        let mut copied = CopiedText { bytes: [0; 8], length: 0 };
        if (1..=NO).contains(&number) {
            let first = 8 * (usize::from(number) - 1);
            for (place, byte) in copied.bytes.iter_mut().zip(self.iter().skip(first)) {
                if byte == 0 {
                    break;
                }
                *place = byte;
                copied.length += 1;
            }
        }
        copied
    }

    fn decimal_mark(&self) -> u8 {
        self.at(offset_of!(TextStyle, decimal_mark))
    }

    fn fact_mark(&self) -> u8 {
        self.at(offset_of!(TextStyle, fact_mark))
    }

    fn is_utf8(&self) -> bool {
        self.at(offset_of!(TextStyle, utf8)) != 0
    }
}

#[cfg(any(test, target_arch = "avr"))]
pub(crate) struct CopiedText {
    bytes: [u8; 8],
    length: u8,
}

#[cfg(any(test, target_arch = "avr"))]
impl Deref for CopiedText {
    type Target = [u8];

    fn deref(&self) -> &[u8] {
        self.bytes.get(..self.length.into()).unwrap_or(&[])
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
        let mut bytes = [0; 195];
        let texts = style.units.iter().chain([&style.dash, &style.yes, &style.no]).flatten();
        let marks = [style.decimal_mark, style.fact_mark, style.utf8];
        bytes.iter_mut().zip(texts.copied().chain(marks)).for_each(|(place, byte)| *place = byte);
        let stored = StoredStyle::new(bytes);
        for number in 0..=u8::MAX {
            assert_eq!(*stored.text(number), *Look::text(&style, number), "{number}");
        }
        assert_eq!(
            (stored.decimal_mark(), stored.fact_mark(), stored.is_utf8()),
            (style.decimal_mark(), style.fact_mark(), style.is_utf8())
        );
    }
}
