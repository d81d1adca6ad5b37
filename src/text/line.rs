//! One line of a character display: a label, a mark, a value; and what of it changed.

use super::style::{Look, TextStyle, begins_character};
use super::value::Value;
use super::write::{NO_ROOM, PLACES, Place, blank, copy};
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
pub(super) const NARROWEST: u8 = 8;
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
pub(crate) fn write_line<P: Place>(
    row: Option<Row>,
    label: impl Iterator<Item = u8> + Clone,
    style: &impl Look,
    columns: u8,
    line: u8,
    out: &mut [P],
) -> Result<usize, Error> {
    if columns < NARROWEST {
        return Err(Error::new(Cause::OutOfRange, 4));
    }
    let mut plan = Plan { columns: columns.into(), value: Value::BLANK, field: 0, mark: Some(b' ') };
    if let Some(row) = row {
        if row.fact {
            plan.mark = Some(style.fact_mark());
        }
        if columns >= ONE_LINE {
            (plan.value, plan.field) = (row.value, row.field.into());
        } else if line % 2 == 1 {
            // The value has the line for itself.
            (plan.value, plan.field, plan.mark) = (row.value, columns.into(), None);
        }
    }
    plan.write(label, style, out)
}

struct Plan {
    columns: usize,
    value: Value,
    field: usize,
    /// The character before the field, if it has a place.
    mark: Option<u8>,
}

impl Plan {
    #[inline(always)]
    fn write<P: Place>(
        self,
        label: impl Iterator<Item = u8> + Clone,
        style: &impl Look,
        out: &mut [P],
    ) -> Result<usize, Error> {
        if let Some(position) = self.value.form.refused() {
            return Err(Error::new(Cause::OutOfRange, position));
        }
        let before = usize::from(self.mark.is_some());
        let most = self.columns - before;
        let mut value = self.value;
        let mut places = [P::EMPTY; PLACES];
        let spelled = loop {
            let spelled = value.spell(style, &mut places);
            if spelled.characters(style) <= most || value == value.without_unit() {
                break spelled;
            }
            value = value.without_unit();
        };
        let characters = spelled.characters(style);
        let room = most.checked_sub(self.field.max(characters)).ok_or(NO_ROOM)?;
        let label_end = if style.is_utf8() { bytes_of(label.clone(), room) } else { room };
        let head = label_end + (self.columns - room - characters);
        let out = out.get_mut(..head + spelled.bytes()).ok_or(NO_ROOM)?;
        let (head, tail) = out.split_at_mut_checked(head).ok_or(NO_ROOM)?;
        put_head(label, label_end, self.mark, head);
        copy(spelled.text(&places), tail);
        Ok(head.len() + tail.len())
    }
}

/// Writes what stands before a value: a label in so many places, with blanks behind it, the mark, blanks.
#[inline]
fn put_head<P: Place>(mut label: impl Iterator<Item = u8>, room: usize, mark: Option<u8>, head: &mut [P]) {
    let Some((places, rest)) = head.split_at_mut_checked(room) else { return };
    let mut places = places.iter_mut();
    for place in places.by_ref() {
        let Some(byte) = label.next() else {
            *place = P::of(b' ');
            break;
        };
        *place = P::of(byte);
    }
    blank(places.into_slice());
    let mut rest = rest.iter_mut();
    if let Some(mark) = mark
        && let Some(place) = rest.next()
    {
        *place = P::of(mark);
    }
    blank(rest.into_slice());
}

/// Bytes of a UTF-8 label in so many characters, with blanks behind a shorter one.
fn bytes_of(label: impl Iterator<Item = u8>, room: usize) -> usize {
    let mut left = room;
    let mut continued = 0;
    for byte in label {
        if !begins_character(byte) {
            continued += 1;
        } else if left == 0 {
            break;
        } else {
            left -= 1;
        }
    }
    room + continued
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
    change(shown, line, style)
}

pub(crate) fn change(shown: &[u8], line: &[u8], style: &impl Look) -> Span {
    let same = shown.iter().zip(line).take_while(|(a, b)| a == b).count();
    let begins =
        |text: &[u8], at: usize| !style.is_utf8() || text.get(at).is_none_or(|&byte| begins_character(byte));
    let mut start = same;
    while start > 0 && !(begins(shown, start) && begins(line, start)) {
        start -= 1;
    }
    let (shown_rest, rest) = (shown.get(start..).unwrap_or(&[]), line.get(start..).unwrap_or(&[]));
    let characters = |text: &[u8]| text.len() - style.continued(text.iter().copied());
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
