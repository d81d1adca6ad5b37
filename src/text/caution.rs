//! Cautions in words, and any sentence in lines of the display's width.

use super::line::NARROWEST;
use super::style::begins_character;
use super::write::{NO_ROOM, Place, blank};
use crate::status::{Cause, Error};

/// What to show where a fact tells that the eyepiece is high.
pub const HIGH_EYEPIECE_CAUTION: &str = "Caution: high eyepiece. Stand on a stable platform, never on the top of a ladder, clear of the moving mount. Follow the maker's instructions and local rules.";

/// What to show where the Sun may be near.
pub const SUN_CAUTION: &str = "Caution: never look through unfiltered optics at or near the Sun, nor point them there. Follow the maker's instructions and local rules.";

/// Writes a line of a sentence broken between words, always `columns` (8 to 255) characters long; a line behind the last
/// is blank. A word longer than a line is cut.
///
/// # Errors
///
/// [`Cause::OutOfRange`]: columns (2) under 8. [`Cause::NoRoom`]: `out` is too short; it is then as it was.
pub fn caution_line(sentence: &str, columns: u8, line: u8, out: &mut [u8]) -> Result<usize, Error> {
    line_of(sentence.bytes(), columns, line, out)
}

/// How many lines a sentence takes; columns under 8 count as 8.
pub fn caution_lines(sentence: &str, columns: u8) -> u8 {
    lines_of(sentence.bytes(), columns)
}

pub(crate) fn line_of<P: Place>(
    mut sentence: impl Iterator<Item = u8> + Clone,
    columns: u8,
    line: u8,
    out: &mut [P],
) -> Result<usize, Error> {
    if columns < NARROWEST {
        return Err(Error::new(Cause::OutOfRange, 2));
    }
    for _ in 0..line {
        let here = first_line(sentence.clone(), columns);
        pass(&mut sentence, here.passed);
    }
    let here = first_line(sentence.clone(), columns);
    let length = here.shown + usize::from(columns - here.characters);
    let out = out.get_mut(..length).ok_or(NO_ROOM)?;
    let (text, rest) = out.split_at_mut_checked(here.shown).ok_or(NO_ROOM)?;
    for (place, byte) in text.iter_mut().zip(sentence) {
        *place = P::of(byte);
    }
    blank(rest);
    Ok(length)
}

pub(crate) fn lines_of(mut sentence: impl Iterator<Item = u8> + Clone, columns: u8) -> u8 {
    let mut lines = 0;
    while lines < u8::MAX && sentence.clone().next().is_some() {
        let here = first_line(sentence.clone(), columns.max(NARROWEST));
        pass(&mut sentence, here.passed);
        lines += 1;
    }
    lines
}

fn pass(sentence: &mut impl Iterator<Item = u8>, bytes: usize) {
    for _ in 0..bytes {
        sentence.next();
    }
}

/// What of a sentence stands on its first line.
#[derive(Clone, Copy, Default)]
struct Part {
    /// Bytes of it, and with the blank behind it.
    shown: usize,
    passed: usize,
    characters: u8,
}

fn first_line(sentence: impl Iterator<Item = u8>, columns: u8) -> Part {
    let mut here = Part::default();
    let mut word_end = None;
    for byte in sentence {
        if byte == b' ' {
            word_end = Some(Part { passed: here.shown + 1, ..here });
        }
        if begins_character(byte) {
            if here.characters == columns {
                return word_end.unwrap_or(here);
            }
            here.characters += 1;
        }
        here.shown += 1;
        here.passed = here.shown;
    }
    here
}
