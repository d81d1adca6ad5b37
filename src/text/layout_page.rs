//! The rows of the pages of focus and layout: which values, in which order and form.

use super::line::{Row, row_of, write_line};
use super::page::{Plan, Q16_PERCENT, Q16_RATIO, fact, label, plan, rows};
use super::style::{TextStyle, Unit};
use crate::setup::{FocusReadout, NewtonianReadout, TwoMirrorReadout};
use crate::status::Error;
use crate::stored::stored;

rows! {
    /// The rows of the focus pages. The numbers are frozen.
    FocusRow, 9:
    /// Each side, to a quarter wave.
    DepthOfFocus = 0,
    /// The same in steps of the motor; marked where one step is over it.
    DepthSteps = 1,
    /// The change of temperature that uses it up.
    Temperature = 2,
    /// Width of a star's image at the defocus; marked where that is over the depth.
    Blur = 3,
    /// The same on the sky.
    BlurAngle = 4,
    /// Error of the wavefront there.
    Wavefront = 5,
    /// With the Barlow or reducer.
    FocalRatio = 6,
    /// Fact: one step of the motor is over the depth of focus.
    CoarseStep = 7,
    /// Fact: the defocus is over the depth of focus.
    OutOfFocus = 8,
}

rows! {
    /// The rows of the pages of a Newtonian's layout. The numbers are frozen.
    NewtonianRow, 12:
    /// The smallest that lights the field; marked where the one in place is smaller.
    Diagonal = 0,
    /// Of its centre, away from the focuser and toward the primary.
    DiagonalOffset = 1,
    /// The diagonal in place over the aperture; marked where the telescope's struct tells less.
    Obstruction = 2,
    /// What the edge of the field gets of the light on the axis.
    EdgeLight = 3,
    /// Now; marked where it is over the height that the layout sets.
    EyepieceHeight = 4,
    /// Within its altitudes; marked likewise.
    GreatestHeight = 5,
    /// Its width at the diagonal.
    Beam = 6,
    /// Of the beam to the edge of the field.
    BeamShift = 7,
    /// Fact: the diagonal in place is smaller than the field needs.
    SmallDiagonal = 8,
    /// Fact: it is wider than the obstruction that the telescope's struct tells.
    WiderThanTold = 9,
    /// Fact: the eyepiece is over the height that the layout sets; show the caution.
    HighEyepiece = 10,
    /// Fact: within its altitudes it gets over that height; show the caution.
    HighReached = 11,
}

rows! {
    /// The rows of the pages of two mirrors' layout. The numbers are frozen.
    TwoMirrorRow, 8:
    /// From the primary's vertex to the secondary's.
    Separation = 0,
    /// Its diameter, with the margin for the lit field.
    Secondary = 1,
    /// Its radius of curvature, convex.
    Radius = 2,
    /// The secondary over the aperture; marked where the telescope's struct tells less.
    Obstruction = 3,
    /// How much longer it makes the focal length.
    SecondaryMagnification = 4,
    /// From the secondary to the focus.
    Length = 5,
    /// That length over the focal length.
    LengthShare = 6,
    /// Fact: the secondary is wider than the obstruction that the telescope's struct tells.
    WiderThanTold = 7,
}

stored! {
    static FOCUS: [Plan; FocusRow::ALL.len()] = [
        plan(1, 3, 1, Unit::Micrometre, 8, 0),
        plan(2, 0, 0, Unit::Step, 8, FocusReadout::FACT_COARSE_STEP),
        plan(3, 3, 1, Unit::Kelvin, 6, 0),
        plan(4, 3, 1, Unit::Micrometre, 8, FocusReadout::FACT_OUT_OF_FOCUS),
        plan(5, 6, 2, Unit::Second, 8, FocusReadout::FACT_OUT_OF_FOCUS),
        plan(6, 0, 0, Unit::Nanometre, 8, FocusReadout::FACT_OUT_OF_FOCUS),
        plan(0, Q16_RATIO, 1, Unit::FocalRatio, 7, 0),
        fact(2, 2, FocusReadout::FACT_COARSE_STEP),
        fact(1, 4, FocusReadout::FACT_OUT_OF_FOCUS),
    ];
    static NEWTONIAN: [Plan; NewtonianRow::ALL.len()] = [
        plan(0, 3, 1, Unit::Millimetre, 8, NewtonianReadout::FACT_SMALL_DIAGONAL),
        plan(1, 3, 1, Unit::Millimetre, 8, 0),
        plan(2, Q16_PERCENT, 1, Unit::Percent, 6, NewtonianReadout::FACT_WIDER_THAN_TOLD),
        plan(5, Q16_PERCENT, 0, Unit::Percent, 5, 0),
        plan(6, 6, 2, Unit::Metre, 7, NewtonianReadout::FACT_HIGH_EYEPIECE),
        plan(7, 6, 2, Unit::Metre, 7, NewtonianReadout::FACT_HIGH_REACHED),
        plan(3, 3, 1, Unit::Millimetre, 8, 0),
        plan(4, 3, 1, Unit::Millimetre, 8, 0),
        fact(0, 0, NewtonianReadout::FACT_SMALL_DIAGONAL),
        fact(2, 2, NewtonianReadout::FACT_WIDER_THAN_TOLD),
        fact(6, 6, NewtonianReadout::FACT_HIGH_EYEPIECE),
        fact(7, 7, NewtonianReadout::FACT_HIGH_REACHED),
    ];
    static TWO_MIRROR: [Plan; TwoMirrorRow::ALL.len()] = [
        plan(1, 3, 1, Unit::Millimetre, 8, 0),
        plan(2, 3, 1, Unit::Millimetre, 8, 0),
        plan(3, 3, 1, Unit::Millimetre, 8, 0),
        plan(4, Q16_PERCENT, 1, Unit::Percent, 6, TwoMirrorReadout::FACT_WIDER_THAN_TOLD),
        plan(0, Q16_RATIO, 2, Unit::Times, 6, 0),
        plan(5, 3, 0, Unit::Millimetre, 7, 0),
        plan(6, Q16_PERCENT, 0, Unit::Percent, 5, 0),
        fact(4, 4, TwoMirrorReadout::FACT_WIDER_THAN_TOLD),
    ];
}

/// A row of the focus pages.
pub fn focus_row(readout: &FocusReadout, row: FocusRow) -> Row {
    let plan = FOCUS.at(row as usize);
    let member = match plan.member {
        0 => readout.focal_ratio_q16,
        1 => readout.depth_nm,
        2 => readout.depth_steps,
        3 => readout.temperature_mk,
        4 => readout.blur_nm,
        5 => readout.blur_angle_uas,
        _ => readout.wavefront_nm,
    };
    plan.row(readout.available, readout.facts, member)
}

/// A row of the pages of a Newtonian's layout.
pub fn newtonian_row(readout: &NewtonianReadout, row: NewtonianRow) -> Row {
    let plan = NEWTONIAN.at(row as usize);
    let member = match plan.member {
        0 => readout.diagonal_um,
        1 => readout.diagonal_offset_um,
        2 => readout.obstruction_q16,
        3 => readout.beam_um,
        4 => readout.beam_shift_um,
        5 => readout.edge_light_q16,
        6 => readout.eyepiece_height_um,
        _ => readout.greatest_height_um,
    };
    plan.row(readout.available, readout.facts, member)
}

/// A row of the pages of two mirrors' layout.
pub fn two_mirror_row(readout: &TwoMirrorReadout, row: TwoMirrorRow) -> Row {
    let plan = TWO_MIRROR.at(row as usize);
    let member = match plan.member {
        0 => readout.secondary_magnification_q16,
        1 => readout.separation_um,
        2 => readout.secondary_um,
        3 => readout.secondary_radius_um,
        4 => readout.obstruction_q16,
        5 => readout.length_um,
        _ => readout.length_share_q16,
    };
    plan.row(readout.available, readout.facts, member)
}

/// Writes a line of the focus pages, as [`visual_line`](super::visual_line) does.
///
/// # Errors
///
/// Those of [`visual_line`](super::visual_line).
pub fn focus_line(
    readout: &FocusReadout,
    labels: &[&str; FocusRow::ALL.len()],
    style: &TextStyle,
    columns: u8,
    line: u8,
    out: &mut [u8],
) -> Result<usize, Error> {
    let number = row_of(line, columns);
    let row = FocusRow::from_number(number).map(|row| focus_row(readout, row));
    write_line(row, label(labels, number), style, columns, line, out)
}

/// Writes a line of the pages of a Newtonian's layout, as [`visual_line`](super::visual_line) does.
///
/// # Errors
///
/// Those of [`visual_line`](super::visual_line).
pub fn newtonian_line(
    readout: &NewtonianReadout,
    labels: &[&str; NewtonianRow::ALL.len()],
    style: &TextStyle,
    columns: u8,
    line: u8,
    out: &mut [u8],
) -> Result<usize, Error> {
    let number = row_of(line, columns);
    let row = NewtonianRow::from_number(number).map(|row| newtonian_row(readout, row));
    write_line(row, label(labels, number), style, columns, line, out)
}

/// Writes a line of the pages of two mirrors' layout, as [`visual_line`](super::visual_line) does.
///
/// # Errors
///
/// Those of [`visual_line`](super::visual_line).
pub fn two_mirror_line(
    readout: &TwoMirrorReadout,
    labels: &[&str; TwoMirrorRow::ALL.len()],
    style: &TextStyle,
    columns: u8,
    line: u8,
    out: &mut [u8],
) -> Result<usize, Error> {
    let number = row_of(line, columns);
    let row = TwoMirrorRow::from_number(number).map(|row| two_mirror_row(readout, row));
    write_line(row, label(labels, number), style, columns, line, out)
}
