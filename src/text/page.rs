//! The rows of the readouts' pages: which values, in which order and form.

use super::line::{Row, row_of, write_line};
use super::style::{TextStyle, Unit};
use super::value::{AngleForm, Value};
use crate::setup::{CameraReadout, VisualReadout};
use crate::status::Error;
use crate::units::{Microarcseconds, Micrometres, Milliarcseconds, Millimagnitudes, Q16};

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
    CameraRow, 11:
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
    /// Fact: under two pixels to the star image.
    CoarseSampling = 9,
    /// Fact: over three pixels to the star image.
    FineSampling = 10,
}

/// A row of the visual pages.
pub fn visual_row(readout: &VisualReadout, row: VisualRow) -> Row {
    use VisualReadout as R;
    let shown = |bit, value, field| shown(readout.available & bit != 0, value, field);
    let fact = |bit, needs| fact(readout.facts & bit != 0, readout.available & needs == needs);
    let marked = |row: Row, bit| Row { fact: readout.facts & bit != 0, ..row };
    match row {
        VisualRow::Magnification => marked(
            shown(R::MAGNIFICATION, magnification(readout.magnification_q16), 6),
            R::FACT_EMPTY_MAGNIFICATION,
        ),
        VisualRow::TrueField => marked(
            shown(R::TRUE_FIELD, field_of_view(readout.true_field_mas), 7),
            R::FACT_FIELD_FROM_APPARENT,
        ),
        VisualRow::ExitPupil => {
            let decimals = if readout.exit_pupil_um < 995 { 2 } else { 1 };
            let value = Value::millimetres(Micrometres(readout.exit_pupil_um), decimals);
            marked(shown(R::EXIT_PUPIL, value, 8), R::FACT_WIDE_EXIT_PUPIL)
        }
        VisualRow::Resolution => {
            marked(shown(R::RESOLUTION, small_angle(readout.resolution_uas), 8), R::FACT_SEEING_LIMITED)
        }
        VisualRow::FaintestStar => {
            let value = Value::magnitude(Millimagnitudes(readout.limiting_magnitude_mmag), 1);
            shown(R::LIMITING_MAGNITUDE, value, 8)
        }
        VisualRow::SurfaceBrightness => {
            shown(R::SURFACE_BRIGHTNESS, Value::percent(Q16(readout.surface_brightness_q16), 0), 5)
        }
        VisualRow::FocalRatio => {
            shown(R::FOCAL_RATIO, Value::focal_ratio(Q16(readout.focal_ratio_q16), 1), 7)
        }
        VisualRow::FocalLength => shown(R::FOCAL_LENGTH, whole_millimetres(readout.focal_length_um), 7),
        VisualRow::LowestMagnification => {
            shown(R::LOWEST_MAGNIFICATION, magnification(readout.lowest_magnification_q16), 6)
        }
        VisualRow::ResolvingMagnification => {
            shown(R::RESOLVING_MAGNIFICATION, magnification(readout.resolving_magnification_q16), 6)
        }
        VisualRow::DawesLimit => shown(R::DAWES_LIMIT, small_angle(readout.dawes_limit_uas), 8),
        VisualRow::EffectiveAperture => {
            shown(R::EFFECTIVE_APERTURE, whole_millimetres(readout.effective_aperture_um), 6)
        }
        VisualRow::WideExitPupil => fact(R::FACT_WIDE_EXIT_PUPIL, R::EXIT_PUPIL | R::LOWEST_MAGNIFICATION),
        VisualRow::EmptyMagnification => {
            fact(R::FACT_EMPTY_MAGNIFICATION, R::MAGNIFICATION | R::RESOLVING_MAGNIFICATION)
        }
        VisualRow::FieldFromApparent => fact(R::FACT_FIELD_FROM_APPARENT, R::TRUE_FIELD),
        VisualRow::SeeingLimited => fact(R::FACT_SEEING_LIMITED, u32::MAX),
    }
}

/// A row of the camera pages.
pub fn camera_row(readout: &CameraReadout, row: CameraRow) -> Row {
    use CameraReadout as R;
    let shown = |bit, value, field| shown(readout.available & bit != 0, value, field);
    let fact = |bit, needs| fact(readout.facts & bit != 0, readout.available & needs == needs);
    let sampling = readout.facts & (R::FACT_COARSE_SAMPLING | R::FACT_FINE_SAMPLING) != 0;
    match row {
        CameraRow::FrameWidth => shown(R::FRAME_WIDTH, field_of_view(readout.frame_width_mas), 7),
        CameraRow::FrameHeight => shown(R::FRAME_HEIGHT, field_of_view(readout.frame_height_mas), 7),
        CameraRow::PixelScale => {
            let value = Value::decimal(readout.pixel_scale_uas, 6, 2, Unit::SecondPerPixel);
            Row { fact: sampling, ..shown(R::PIXEL_SCALE, value, 8) }
        }
        CameraRow::StarWidth => shown(R::STAR_FWHM, small_angle(readout.star_fwhm_uas), 8),
        CameraRow::StarPixels => {
            let value = Value::from_q16(Q16(readout.pixels_per_fwhm_q16), 0, 1, Unit::Pixel);
            Row { fact: sampling, ..shown(R::PIXELS_PER_FWHM, value, 8) }
        }
        CameraRow::FocalRatio => {
            shown(R::FOCAL_RATIO, Value::focal_ratio(Q16(readout.focal_ratio_q16), 1), 7)
        }
        CameraRow::TNumber => shown(R::T_NUMBER, Value::ratio(Q16(readout.t_number_q16), 1), 7),
        CameraRow::FocalLength => shown(R::FOCAL_LENGTH, whole_millimetres(readout.focal_length_um), 7),
        CameraRow::PlateScale => {
            let decimals = if readout.plate_scale_mas_per_mm < 99_950 { 1 } else { 0 };
            let value =
                Value::decimal(readout.plate_scale_mas_per_mm, 3, decimals, Unit::SecondPerMillimetre);
            shown(R::PLATE_SCALE, value, 8)
        }
        CameraRow::CoarseSampling => fact(R::FACT_COARSE_SAMPLING, R::PIXELS_PER_FWHM),
        CameraRow::FineSampling => fact(R::FACT_FINE_SAMPLING, R::PIXELS_PER_FWHM),
    }
}

fn shown(available: bool, value: Value, field: u8) -> Row {
    Row { value: if available { value } else { Value::NOT_AVAILABLE }, field, fact: false }
}

fn fact(holds: bool, judged: bool) -> Row {
    shown(holds || judged, Value::answer(holds), 3)
}

/// Three figures at least, so no decimal from 100.
fn magnification(q16: u32) -> Value {
    // 99.95 * 65536 = 6550323.2
    Value::magnification(Q16(q16), if q16 <= 6_550_323 { 1 } else { 0 })
}

fn field_of_view(mas: u32) -> Value {
    Value::angle(Milliarcseconds(mas), AngleForm::BySize, 1)
}

fn small_angle(uas: u32) -> Value {
    Value::arcseconds(Microarcseconds(uas), 2)
}

fn whole_millimetres(um: u32) -> Value {
    Value::millimetres(Micrometres(um), 0)
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

fn label<'a>(labels: &'a [&str], number: u8) -> impl Iterator<Item = u8> + Clone + use<'a> {
    labels.get(usize::from(number)).map_or("", |label| label).bytes()
}
