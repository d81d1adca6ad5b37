//! Quantities as characters of a display: integers only, into a buffer of the caller's.
//!
//! # One value
//!
//! A [`Value`] is a quantity with the form in which it is shown. [`Value::write`] rounds it correctly, carries
//! included, and writes it right-aligned to a width in characters; what does not fit is an error, and the buffer is then
//! as it was.
//!
//! ```
//! use fieldstop::text::{AngleForm, TextStyle, Value};
//! use fieldstop::units::Milliarcseconds;
//!
//! let mut out = [0; 16];
//! let field = Value::angle(Milliarcseconds(3_599_600), AngleForm::MinutesSeconds, 0);
//! let length = field.write(&TextStyle::UTF8, 9, &mut out)?;
//! assert_eq!(&out[..length], " 1°00′00″".as_bytes()); // never 60′00″
//! # Ok::<(), fieldstop::Error>(())
//! ```
//!
//! | form | shown |
//! |---|---|
//! | [`Value::count`] | `4096 px` |
//! | [`Value::millimetres`], [`Value::micrometres`] | `5.0 mm`, `3.76 um` |
//! | [`Value::ratio`], [`Value::magnification`], [`Value::focal_ratio`], [`Value::percent`] | `0.33`, `62.5x`, `f/6.0`, `89%` |
//! | [`Value::angle`] | `1.21 deg`, `1d13'`, `12'34"`, `1d12'34"`, `34.2"`, or by size |
//! | [`Value::arcseconds`] | `0.832"` |
//! | [`Value::magnitude`] | `-1.46 mag` |
//! | [`Value::decimal`], [`Value::signed_decimal`] | any other integer of a decimal unit |
//!
//! # Back from a keypad
//!
//! [`read_entry`] makes a quantity of what a person types, and tells what is unfinished from what is wrong:
//!
//! ```
//! use fieldstop::text::{EntryKind, TextStyle, read_entry};
//!
//! let read = |text: &str| read_entry(text.as_bytes(), EntryKind::FocalLength, 187_500, &TextStyle::ASCII);
//! assert_eq!(read("1.13 m"), Ok(1_130_000)); // micrometres
//! assert_eq!(read("f/6"), Ok(1_125_000));
//! assert!(read("f/").unwrap_err().partial);
//! assert_eq!(read("1,13 m").unwrap_err().at, 1);
//! ```
//!
//! # Style
//!
//! A [`TextStyle`] says how a number looks: the text of each [`Unit`], the decimal mark, the dash for what is not
//! available, the words for yes and no. It is plain data. Four are ready: [`TextStyle::ASCII`], [`TextStyle::UTF8`], and
//! one for each character ROM of the HD44780U. Change what you like:
//!
//! ```
//! use fieldstop::text::{TextStyle, text};
//!
//! const GERMAN: TextStyle = TextStyle { decimal_mark: b',', yes: text(b"ja"), no: text(b"nein"), ..TextStyle::UTF8 };
//! ```
//!
//! # Pages
//!
//! [`visual_line`], [`camera_line`], [`focus_line`], [`newtonian_line`] and [`two_mirror_line`] write one line of a character display at a time, for 8x2, 16x2, 20x2, 16x4, 20x4
//! and any other size from 8 columns on: say the columns, and count the lines over all pages. Line `r` of page `p` is
//! `p * rows + r`; [`lines`] tells how many there are, and a line behind the last is blank.
//!
//! ```text
//! Magnification  62.5x
//! True field     1d13'
//! Exit pupil !  7.3 mm
//! Resolution !   0.83"
//! ```
//!
//! Each value ends in the last column and has a field of its own that does not move, so that a refresh changes no more
//! than the value; [`changed`] tells the characters to redraw. A label is cut where it must be, a value never: one longer
//! than its field takes room from the label, and one longer than the line loses its unit before it is refused. Below 16
//! columns the label and the value have a line each. Numbers have as many decimals as three figures allow.
//!
//! The mark before a value, `!`, says that a fact concerns it; the last page tells each fact in words. What is not
//! available is a dash.
//!
//! On AVR the C interface reads styles and labels from program memory; Rust code gives them as ordinary data.
//!
//! Labels come from a table of the caller's: [`VISUAL_LABELS`] and [`CAMERA_LABELS`] for 20 columns,
//! [`VISUAL_LABELS_SHORT`] and [`CAMERA_LABELS_SHORT`] for less, or a translation, one text for each [`VisualRow`] or
//! [`CameraRow`]. For a graphic display, take the parts: the label from the table, and the [`Row`] of [`visual_row`] or
//! [`camera_row`] with its value, which has [`Value::without_unit`] and [`Value::unit`].

mod caution;
mod digits;
mod entry;
mod labels;
mod layout_page;
mod line;
mod page;
mod spelling;
#[cfg(feature = "heapless")]
mod string;
mod style;
mod value;
mod write;

pub use caution::{HIGH_EYEPIECE_CAUTION, SUN_CAUTION, caution_line, caution_lines};
pub use entry::{EntryError, EntryKind, EntryReason, read_entry};
pub use labels::{
    CAMERA_LABELS, CAMERA_LABELS_SHORT, FOCUS_LABELS, FOCUS_LABELS_SHORT, NEWTONIAN_LABELS,
    NEWTONIAN_LABELS_SHORT, TWO_MIRROR_LABELS, TWO_MIRROR_LABELS_SHORT, VISUAL_LABELS, VISUAL_LABELS_SHORT,
};
pub use layout_page::{
    FocusRow, NewtonianRow, TwoMirrorRow, focus_line, focus_row, newtonian_line, newtonian_row,
    two_mirror_line, two_mirror_row,
};
pub use line::{Row, Span, changed, lines};
pub use page::{CameraRow, VisualRow, camera_line, camera_row, visual_line, visual_row};
#[cfg(feature = "heapless")]
pub use string::string;
pub use style::{TextStyle, Unit, text};
pub use value::{AngleForm, Value};

#[cfg(feature = "capi")]
pub(crate) use {
    caution::{line_of, lines_of},
    digits::{has_at_most, split_small_hundred, split_small_ten},
    entry::read_as,
    labels::{
        CAMERA_LABELS_FOR_C, CAMERA_LABELS_SHORT_FOR_C, FOCUS_LABELS_FOR_C, FOCUS_LABELS_SHORT_FOR_C,
        NEWTONIAN_LABELS_FOR_C, NEWTONIAN_LABELS_SHORT_FOR_C, TWO_MIRROR_LABELS_FOR_C,
        TWO_MIRROR_LABELS_SHORT_FOR_C, VISUAL_LABELS_FOR_C, VISUAL_LABELS_SHORT_FOR_C,
    },
    line::{change, row_of, write_line},
    style::{Look, StyleOfC},
    value::Short,
    write::Place,
};

// C sees these layouts on every target: any other does not compile.
const _: () = {
    use core::mem::{align_of, offset_of, size_of};
    assert!(size_of::<TextStyle>() == 195 && align_of::<TextStyle>() == 1);
    assert!(offset_of!(TextStyle, dash) == 168 && offset_of!(TextStyle, decimal_mark) == 192);
    assert!(size_of::<Span>() == 4);
};
