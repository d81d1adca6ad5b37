//! One line of a character display: a label, a mark, a value; and what of it changed.

use super::style::{TextStyle, begins_character};
use super::value::Value;
use super::write::{Layout, write};
use crate::status::{Cause, Error};

/// A value with its place on a page.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub struct Row {
    /// What is shown; [`Value::NOT_AVAILABLE`] where it is not known.
    pub value: Value,
    /// Characters kept for the value at the right end of the line, so that it stays in its place.
    pub field: u8,
    /// A fact of the readout concerns this value: the style's mark stands before it.
    pub fact: bool,
}

/// The narrowest display, and the narrowest on which label and value share a line.
const NARROWEST: u8 = 8;
const ONE_LINE: u8 = 16;

/// Lines that a number of rows take on a display so wide: one each from 16 columns on, two below.
pub const fn lines(rows: usize, columns: u8) -> usize {
    if columns < ONE_LINE { 2 * rows } else { rows }
}

/// The row that a line belongs to.
pub(crate) const fn row_of(line: u8, columns: u8) -> u8 {
    if columns < ONE_LINE { line / 2 } else { line }
}

/// Writes a line. It is always `columns` characters long; a line with no row is blank.
///
/// From 16 columns on: the label, cut where it must be, the mark, the value in its field at the right end. Below: the
/// label and the mark, or, for an odd `line`, the value. A value longer than its field takes room from the label; one
/// longer than the line loses its unit; one that is still too long is refused.
pub(crate) fn write_line(
    row: Option<Row>,
    label: impl Iterator<Item = u8> + Clone,
    style: &TextStyle,
    columns: u8,
    line: u8,
    out: &mut [u8],
) -> Result<usize, Error> {
    if columns < NARROWEST {
        return Err(Error::new(Cause::OutOfRange, 4));
    }
    let mut layout = Layout { columns, field: 0, mark: b' ', may_lose_unit: true };
    let mut value = Value::BLANK;
    if let Some(row) = row {
        if row.fact {
            layout.mark = style.fact_mark;
        }
        if columns >= ONE_LINE {
            (value, layout.field) = (row.value, row.field);
        } else if line % 2 == 1 {
            // The value has the line for itself: no label, no mark.
            (value, layout.field, layout.mark) = (row.value, columns, 0);
        }
    }
    write(value, label, layout, style, out)
}

/// A part of a line, in characters.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq)]
#[repr(C)]
pub struct Span {
    /// The first character that is different, counted from 0.
    pub first: u16,
    /// Characters from there to the last that is different; 0 where nothing is.
    pub count: u16,
}

/// The part of `line` that is different from what is `shown`: redraw these characters and no others.
///
/// Where the two have different numbers of characters it reaches to the end of `line`.
pub fn changed(shown: &[u8], line: &[u8], style: &TextStyle) -> Span {
    let same = shown.iter().zip(line).take_while(|(a, b)| a == b).count();
    let begins =
        |text: &[u8], at: usize| style.utf8 == 0 || text.get(at).is_none_or(|&byte| begins_character(byte));
    let mut start = same;
    while start > 0 && !(begins(shown, start) && begins(line, start)) {
        start -= 1;
    }
    let (shown_rest, rest) = (shown.get(start..).unwrap_or(&[]), line.get(start..).unwrap_or(&[]));
    let characters = |text: &[u8]| text.len() - style.continued(text);
    let mut end = rest.len();
    if characters(shown_rest) == characters(rest) {
        let alike = shown_rest.iter().rev().zip(rest.iter().rev()).take_while(|(a, b)| a == b).count();
        end = end.saturating_sub(alike);
        while end < rest.len() && !begins(rest, end) {
            end += 1;
        }
    }
    let count = |text: Option<&[u8]>| characters(text.unwrap_or(&[])) as u16;
    Span { first: count(line.get(..start)), count: count(rest.get(..end)) }
}
