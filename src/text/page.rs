//! The rows of the readouts' pages: which values, in which order and form.

use super::line::{Row, row_of, write_line};
use super::style::{TextStyle, Unit};
use super::value::Value;
use crate::setup::{CameraReadout, VisualReadout};
use crate::status::Error;
use crate::stored::stored;
use crate::units::{Milliarcseconds, Millimagnitudes, Q16};

macro_rules! rows {
    ($(#[$doc:meta])* $name:ident, $count:literal: $($(#[$row_doc:meta])* $row:ident = $number:literal,)*) => {
        $(#[$doc])*
        #[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
        #[repr(u8)]
        pub enum $name {
            $($(#[$row_doc])* $row = $number,)*
        }

        impl $name {
            /// Every row, in the order of the pages.
            pub const ALL: [$name; $count] = [$($name::$row),*];

            /// The row with this number, if there is one.
            pub const fn from_number(number: u8) -> Option<$name> {
                Some(match number {
                    $($number => $name::$row,)*
                    _ => return None,
                })
            }
        }
    };
}
pub(super) use rows;

rows! {
    /// The rows of the visual pages. The numbers are frozen.
    VisualRow, 16:
    /// Marked where it is over the one that shows all detail.
    Magnification = 0,
    /// Marked where it comes from the apparent field.
    TrueField = 1,
    /// Marked where it is wider than the eye's.
    ExitPupil = 2,
    /// Marked where the seeing is wider.
    Resolution = 3,
    /// Limiting magnitude.
    FaintestStar = 4,
    /// Of an extended object, in per cent of the bare eye's view.
    SurfaceBrightness = 5,
    /// With the Barlow or reducer.
    FocalRatio = 6,
    /// With the Barlow or reducer.
    FocalLength = 7,
    /// The magnification whose exit pupil fills the eye's.
    LowestMagnification = 8,
    /// The magnification above which no new detail shows.
    ResolvingMagnification = 9,
    /// For a double star.
    DawesLimit = 10,
    /// As if nothing were lost.
    EffectiveAperture = 11,
    /// Fact: the exit pupil is wider than the eye's.
    WideExitPupil = 12,
    /// Fact: the magnification is beyond what the resolution supports.
    EmptyMagnification = 13,
    /// Fact: the true field comes from the apparent field.
    FieldFromApparent = 14,
    /// Fact: the seeing is wider than the resolution. Never answered with no, since the seeing may be unknown.
    SeeingLimited = 15,
}

rows! {
    /// The rows of the camera pages. The numbers are frozen.
    CameraRow, 14:
    /// Across the columns.
    FrameWidth = 0,
    /// Across the rows.
    FrameHeight = 1,
    /// Sky to a pixel; marked where the sampling is coarse or fine.
    PixelScale = 2,
    /// Full width at half maximum of a star.
    StarWidth = 3,
    /// The same in pixels; marked where the sampling is coarse or fine.
    StarPixels = 4,
    /// With the Barlow or reducer.
    FocalRatio = 5,
    /// With the light that is lost.
    TNumber = 6,
    /// With the Barlow or reducer.
    FocalLength = 7,
    /// Sky to a millimetre at the focus.
    PlateScale = 8,
    /// From corner to corner.
    Diagonal = 9,
    /// The finest detail that the optics pass.
    Cutoff = 10,
    /// The coarsest pixel that loses nothing of it.
    NyquistPixel = 11,
    /// Fact: under two pixels to the star image.
    CoarseSampling = 12,
    /// Fact: over three pixels to the star image.
    FineSampling = 13,
}

/// How a row is shown.
#[derive(Clone, Copy)]
pub(super) struct Plan {
    /// Number of the member, which is the bit in `available`; for a fact, of the one that it is judged by.
    pub(super) member: u8,
    /// Decimal places of the member's unit, or one of the codes below.
    scale: u8,
    /// At most, while no more than three figures come of it; for a fact, the second member that it is judged by.
    decimals: u8,
    unit: Unit,
    field: u8,
    /// Bits of `facts` that concern it.
    facts: u8,
}

pub(super) const Q16_RATIO: u8 = 16;
pub(super) const Q16_PERCENT: u8 = Q16_RATIO + 2;
pub(super) const ANGLE: u8 = 32;
const MAGNITUDE: u8 = 33;
const FACT: u8 = 34;
/// No member has this bit.
const NEVER: u8 = 31;

pub(super) const fn plan(member: u8, scale: u8, decimals: u8, unit: Unit, field: u8, facts: u32) -> Plan {
    Plan { member, scale, decimals, unit, field, facts: facts as u8 }
}

pub(super) const fn fact(member: u8, second: u8, fact: u32) -> Plan {
    plan(member, FACT, second, Unit::None, 3, fact)
}

stored! {
    static VISUAL: [Plan; VisualRow::ALL.len()] = [
        plan(2, Q16_RATIO, 1, Unit::Times, 6, VisualReadout::FACT_EMPTY_MAGNIFICATION),
        plan(4, ANGLE, 1, Unit::None, 7, VisualReadout::FACT_FIELD_FROM_APPARENT),
        plan(3, 3, 1, Unit::Millimetre, 8, VisualReadout::FACT_WIDE_EXIT_PUPIL),
        plan(5, 6, 2, Unit::Second, 8, VisualReadout::FACT_SEEING_LIMITED),
        plan(10, MAGNITUDE, 1, Unit::Magnitude, 8, 0),
        plan(11, Q16_PERCENT, 0, Unit::Percent, 5, 0),
        plan(1, Q16_RATIO, 1, Unit::FocalRatio, 7, 0),
        plan(0, 3, 0, Unit::Millimetre, 7, 0),
        plan(7, Q16_RATIO, 1, Unit::Times, 6, 0),
        plan(8, Q16_RATIO, 1, Unit::Times, 6, 0),
        plan(6, 6, 2, Unit::Second, 8, 0),
        plan(9, 3, 0, Unit::Millimetre, 6, 0),
        fact(3, 7, VisualReadout::FACT_WIDE_EXIT_PUPIL),
        fact(2, 8, VisualReadout::FACT_EMPTY_MAGNIFICATION),
        fact(4, 4, VisualReadout::FACT_FIELD_FROM_APPARENT),
        fact(NEVER, NEVER, VisualReadout::FACT_SEEING_LIMITED),
    ];
}

const SAMPLING: u32 = CameraReadout::FACT_COARSE_SAMPLING | CameraReadout::FACT_FINE_SAMPLING;

stored! {
    static CAMERA: [Plan; CameraRow::ALL.len()] = [
        plan(3, ANGLE, 1, Unit::None, 7, 0),
        plan(4, ANGLE, 1, Unit::None, 7, 0),
        plan(5, 6, 2, Unit::SecondPerPixel, 8, SAMPLING),
        plan(7, 6, 2, Unit::Second, 8, 0),
        plan(8, Q16_RATIO, 1, Unit::Pixel, 8, SAMPLING),
        plan(1, Q16_RATIO, 1, Unit::FocalRatio, 7, 0),
        plan(2, Q16_RATIO, 1, Unit::None, 7, 0),
        plan(0, 3, 0, Unit::Millimetre, 7, 0),
        plan(6, 3, 1, Unit::SecondPerMillimetre, 8, 0),
        plan(11, ANGLE, 1, Unit::None, 7, 0),
        plan(9, Q16_RATIO, 1, Unit::PerMillimetre, 8, 0),
        plan(10, 3, 2, Unit::Micrometre, 8, 0),
        fact(8, 8, CameraReadout::FACT_COARSE_SAMPLING),
        fact(8, 8, CameraReadout::FACT_FINE_SAMPLING),
    ];
}

/// A row of the visual pages.
pub fn visual_row(readout: &VisualReadout, row: VisualRow) -> Row {
    let plan = VISUAL.at(row as usize);
    let member = match plan.member {
        0 => readout.focal_length_um,
        1 => readout.focal_ratio_q16,
        2 => readout.magnification_q16,
        3 => readout.exit_pupil_um,
        4 => readout.true_field_mas,
        5 => readout.resolution_uas,
        6 => readout.dawes_limit_uas,
        7 => readout.lowest_magnification_q16,
        8 => readout.resolving_magnification_q16,
        9 => readout.effective_aperture_um,
        10 => readout.limiting_magnitude_mmag as u32,
        _ => readout.surface_brightness_q16,
    };
    plan.row(readout.available, readout.facts, member)
}

/// A row of the camera pages.
pub fn camera_row(readout: &CameraReadout, row: CameraRow) -> Row {
    let plan = CAMERA.at(row as usize);
    let member = match plan.member {
        0 => readout.focal_length_um,
        1 => readout.focal_ratio_q16,
        2 => readout.t_number_q16,
        3 => readout.frame_width_mas,
        4 => readout.frame_height_mas,
        5 => readout.pixel_scale_uas,
        6 => readout.plate_scale_mas_per_mm,
        7 => readout.star_fwhm_uas,
        9 => readout.cutoff_frequency_q16,
        10 => readout.nyquist_pixel_nm,
        11 => readout.diagonal_mas,
        _ => readout.pixels_per_fwhm_q16,
    };
    plan.row(readout.available, readout.facts, member)
}

impl Plan {
    pub(super) fn row(&self, available: u32, facts: u32, member: u32) -> Row {
        let holds = facts & u32::from(self.facts) != 0;
        let known = |member: u8| available >> (member & 31) & 1 != 0;
        let (value, fact) = if self.scale == FACT {
            let judged = holds || known(self.member) && known(self.decimals);
            (if judged { Value::answer(holds) } else { Value::NOT_AVAILABLE }, false)
        } else {
            (if known(self.member) { self.value(member) } else { Value::NOT_AVAILABLE }, holds)
        };
        Row { value, field: self.field, fact }
    }

    fn value(&self, member: u32) -> Value {
        if self.scale == ANGLE {
            return Value::angle_by_size(Milliarcseconds(member), self.decimals);
        }
        if self.scale == MAGNITUDE {
            return Value::magnitude(Millimagnitudes(member as i32), self.decimals);
        }
        let mut decimals = self.decimals;
        loop {
            let value = match self.scale.checked_sub(Q16_RATIO) {
                Some(shift) => Value::from_q16(Q16(member), shift, decimals, self.unit),
                None => Value::decimal(member, self.scale, decimals, self.unit),
            };
            if value.number < 1000 || decimals == 0 {
                return value;
            }
            decimals -= 1;
        }
    }
}

/// Writes a line of the visual pages: `line` counts over all pages, so line `r` of page `p` is `p * rows + r` on a
/// display with so many rows.
///
/// The line is always `columns` (8 to 255) characters long. A line behind the last row is blank. See [`crate::text`] for the
/// layout.
///
/// # Errors
///
/// [`Cause::OutOfRange`](crate::Cause::OutOfRange): columns (4) under 8.
/// [`Cause::NoRoom`](crate::Cause::NoRoom): `out` is too short, or the value longer than a line; `out` is then as it was.
pub fn visual_line(
    readout: &VisualReadout,
    labels: &[&str; VisualRow::ALL.len()],
    style: &TextStyle,
    columns: u8,
    line: u8,
    out: &mut [u8],
) -> Result<usize, Error> {
    let number = row_of(line, columns);
    let row = VisualRow::from_number(number).map(|row| visual_row(readout, row));
    write_line(row, label(labels, number), style, columns, line, out)
}

/// Writes a line of the camera pages, as [`visual_line`] does.
///
/// # Errors
///
/// Those of [`visual_line`].
pub fn camera_line(
    readout: &CameraReadout,
    labels: &[&str; CameraRow::ALL.len()],
    style: &TextStyle,
    columns: u8,
    line: u8,
    out: &mut [u8],
) -> Result<usize, Error> {
    let number = row_of(line, columns);
    let row = CameraRow::from_number(number).map(|row| camera_row(readout, row));
    write_line(row, label(labels, number), style, columns, line, out)
}

pub(super) fn label<'a>(labels: &'a [&str], number: u8) -> impl Iterator<Item = u8> + Clone + use<'a> {
    labels.get(usize::from(number)).map_or("", |label| label).bytes()
}
