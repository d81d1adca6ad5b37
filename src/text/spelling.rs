//! The spellings of units in an entry: those of the trade and of SI, and the style's own.

use super::style::{Look, Unit};
use crate::stored::stored;

// Classes of units. Each counts in a least unit: nanometres; seconds of arc, of which a second of time has 15.
pub(super) const LENGTH: u32 = 1;
pub(super) const ARC: u32 = 2;
pub(super) const TIME: u32 = 4;
pub(super) const TIMES: u32 = 8;
pub(super) const PERCENT: u32 = 16;
pub(super) const MAGNITUDE: u32 = 32;
pub(super) const COUNT: u32 = 64;

/// Up to 6 bytes, the class, and the number of the style's text for the same.
const fn row(spelling: &[u8], class: u32, unit: Unit) -> [u8; 8] {
    let mut row = super::style::text(spelling);
    row[6] = class as u8;
    row[7] = unit as u8;
    row
}

const ROWS: usize = 31;

stored! {
    static SPELLINGS: [[u8; 8]; ROWS] = [
        row(b"m", LENGTH, Unit::Metre),
        row(b"cm", LENGTH, Unit::None),
        row(b"mm", LENGTH, Unit::Millimetre),
        row(b"um", LENGTH, Unit::Micrometre),
        row("µm".as_bytes(), LENGTH, Unit::None),
        // The Greek letter, U+03BC.
        row("μm".as_bytes(), LENGTH, Unit::None),
        row(b"nm", LENGTH, Unit::Nanometre),
        row(b"in", LENGTH, Unit::None),
        row(b"\"", LENGTH, Unit::None),
        row(b"d", ARC, Unit::Degree),
        row(b"deg", ARC, Unit::DecimalDegree),
        row("°".as_bytes(), ARC, Unit::None),
        row(b"'", ARC, Unit::Minute),
        row("′".as_bytes(), ARC, Unit::None),
        row(b"arcmin", ARC, Unit::None),
        row(b"\"", ARC, Unit::Second),
        row("″".as_bytes(), ARC, Unit::None),
        row(b"arcsec", ARC, Unit::None),
        row(b"h", TIME, Unit::None),
        row(b"m", TIME, Unit::None),
        row(b"min", TIME, Unit::None),
        row(b"s", TIME, Unit::Time),
        row(b"x", TIMES, Unit::Times),
        row("×".as_bytes(), TIMES, Unit::None),
        row(b"%", PERCENT, Unit::Percent),
        row(b"mag", MAGNITUDE, Unit::Magnitude),
        row(b"px", COUNT, Unit::Pixel),
        row(b"steps", COUNT, Unit::Step),
        row(b"step", COUNT, Unit::None),
        // In front of a number: no class takes them.
        row(b"f/", 0, Unit::FocalRatio),
        row(b"F/", 0, Unit::None),
    ];
    /// How many of the least unit of its class each is.
    static SIZES: [u32; ROWS] = [
        1_000_000_000, 10_000_000, 1_000_000, 1000, 1000, 1000, 1, 25_400_000, 25_400_000,
        3600, 3600, 3600, 60, 60, 60, 1, 1, 1, 54_000, 900, 900, 15, 1, 1, 1, 1, 1, 1, 1, 1, 1,
    ];
}

/// How spellings fit to the beginning of a text.
pub(super) struct Found {
    /// The length of the longest that fits whole, and its size; 0 and 0 where none does.
    pub length: usize,
    pub unit: u32,
    /// The text ends within one.
    pub open: bool,
    /// The size of the smallest of these, 0 where there is none.
    pub smaller: u32,
    /// The most bytes of any that fit.
    pub reach: usize,
}

impl Found {
    const NONE: Found = Found { length: 0, unit: 0, open: false, smaller: 0, reach: 0 };

    fn see(&mut self, text: &[u8], spelling: impl Iterator<Item = u8>, size: u32) {
        let mut length = 0;
        // Blanks before a unit have been skipped.
        for byte in spelling.skip_while(|&byte| byte == b' ') {
            match text.get(length) {
                None => {
                    self.open = true;
                    if self.smaller == 0 || size < self.smaller {
                        self.smaller = size;
                    }
                    self.reach = self.reach.max(length);
                    return;
                }
                Some(&here) if here == byte => length += 1,
                _ => {
                    self.reach = self.reach.max(length);
                    return;
                }
            }
        }
        self.reach = self.reach.max(length);
        if length > self.length {
            (self.length, self.unit) = (length, size);
        }
    }

    fn see_row(&mut self, text: &[u8], row: usize, style: &impl Look) {
        // Never more; the compiler does not see it.
        let row = row.min(ROWS - 1);
        let spelling = SPELLINGS.entry(row);
        let size = SIZES.at(row);
        self.see(text, (0..6).map(|at| spelling.at(at & 7)).take_while(|&byte| byte != 0), size);
        self.see(text, style.text(spelling.at(7)), size);
    }
}

/// The units of these classes under a size.
pub(super) fn fitting(text: &[u8], classes: u32, larger: u32, style: &impl Look) -> Found {
    let mut found = Found::NONE;
    for row in 0..ROWS {
        if classes & u32::from(SPELLINGS.entry(row).at(6)) != 0 && SIZES.at(row) < larger {
            found.see_row(text, row, style);
        }
    }
    found
}

/// What stands in front of a focal ratio.
pub(super) fn before(text: &[u8], style: &impl Look) -> Found {
    let mut found = Found::NONE;
    for row in [ROWS - 2, ROWS - 1] {
        found.see_row(text, row, style);
    }
    found
}
