//! The pages: what is asked of the library for each, and its four lines.

use crate::equipment::{DISPLAY_COLUMNS, Equipment};
use fieldstop::setup::{CameraReadout, VisualReadout};
use fieldstop::text::{
    CAMERA_LABELS, CameraRow, TextStyle, VISUAL_LABELS, VisualRow, camera_line, visual_line,
};

pub const DISPLAY_LINES: usize = 4;
pub const STYLE: TextStyle = TextStyle::UTF8;

/// What is in use.
#[derive(Clone, Copy, Default)]
pub struct Choice {
    pub telescope: usize,
    pub eyepiece: usize,
}

#[derive(Clone, Copy)]
pub enum Page {
    Names,
    /// These rows of the visual readout.
    Visual(&'static [VisualRow]),
    /// These rows of the camera readout.
    Camera(&'static [CameraRow]),
}

/// The lines of a page, what each means, and the facts to tell below.
#[derive(Default)]
pub struct Content {
    pub lines: Vec<String>,
    pub meanings: Vec<&'static str>,
    pub facts: Vec<&'static str>,
}

/// Every page in its order, as many rows to each as the display has lines.
pub fn all() -> Vec<Page> {
    let visual = const { &VisualRow::ALL }.chunks(DISPLAY_LINES).map(Page::Visual);
    let camera = const { &CameraRow::ALL }.chunks(DISPLAY_LINES).map(Page::Camera);
    [Page::Names].into_iter().chain(visual).chain(camera).collect()
}

impl Page {
    pub fn content(self, equipment: &Equipment, choice: Choice) -> Result<Content, fieldstop::Error> {
        let telescope = &equipment.telescopes[choice.telescope];
        let eyepiece = &equipment.eyepieces[choice.eyepiece];
        let camera = &equipment.camera;
        let observer = &equipment.observer;
        let mut content = Content::default();
        match self {
            Page::Names => {
                content.lines =
                    vec!["In use".into(), telescope.name.clone(), eyepiece.name.clone(), camera.name.clone()];
                content.meanings = vec!["", "telescope", "eyepiece", "camera"];
            }
            Page::Visual(rows) => {
                let wanted = rows.iter().fold(0, |bits, &row| bits | visual_bits(row));
                let readout = VisualReadout::compute(&telescope.item, &eyepiece.item, observer, wanted)?;
                for &row in rows {
                    let mut line = [0; 64];
                    let columns = DISPLAY_COLUMNS as u8;
                    let bytes = visual_line(&readout, &VISUAL_LABELS, &STYLE, columns, row as u8, &mut line)?;
                    content.lines.push(String::from_utf8_lossy(&line[..bytes]).into());
                    content.meanings.push(visual_meaning(row));
                }
                let told = rows.iter().fold(0, |bits, &row| bits | visual_facts(row));
                content.facts = facts(&VISUAL_FACTS, readout.facts & told);
            }
            Page::Camera(rows) => {
                let wanted = rows.iter().fold(0, |bits, &row| bits | camera_bits(row));
                let readout = CameraReadout::compute(&telescope.item, &camera.item, observer, wanted)?;
                for &row in rows {
                    let mut line = [0; 64];
                    let columns = DISPLAY_COLUMNS as u8;
                    let bytes = camera_line(&readout, &CAMERA_LABELS, &STYLE, columns, row as u8, &mut line)?;
                    content.lines.push(String::from_utf8_lossy(&line[..bytes]).into());
                    content.meanings.push(camera_meaning(row));
                }
                let told = rows.iter().fold(0, |bits, &row| bits | camera_facts(row));
                content.facts = facts(&CAMERA_FACTS, readout.facts & told);
            }
        }
        Ok(content)
    }
}

fn facts(sentences: &[(u32, &'static str)], facts: u32) -> Vec<&'static str> {
    sentences.iter().filter(|(bit, _)| facts & bit != 0).map(|&(_, sentence)| sentence).collect()
}

const VISUAL_FACTS: [(u32, &str); 4] = [
    (
        VisualReadout::FACT_WIDE_EXIT_PUPIL,
        "Exit pupil wider than the eye's: the rest of the light falls on the iris.",
    ),
    (
        VisualReadout::FACT_EMPTY_MAGNIFICATION,
        "Magnified past what the resolution supports: larger, but no new detail.",
    ),
    (
        VisualReadout::FACT_FIELD_FROM_APPARENT,
        "True field by the apparent field: the eyepiece's field stop is unknown.",
    ),
    (
        VisualReadout::FACT_SEEING_LIMITED,
        "The air blurs more than the telescope tonight: it sets the finest detail.",
    ),
];

const CAMERA_FACTS: [(u32, &str); 2] = [
    (
        CameraReadout::FACT_COARSE_SAMPLING,
        "Under two pixels to a star's width: detail falls between the pixels.",
    ),
    (
        CameraReadout::FACT_FINE_SAMPLING,
        "Over three pixels to a star's width: no more detail, less light in each.",
    ),
];

/// The facts that belong to a row.
fn visual_facts(row: VisualRow) -> u32 {
    use VisualReadout as R;
    match row {
        VisualRow::ExitPupil | VisualRow::WideExitPupil => R::FACT_WIDE_EXIT_PUPIL,
        VisualRow::Magnification | VisualRow::EmptyMagnification => R::FACT_EMPTY_MAGNIFICATION,
        VisualRow::TrueField | VisualRow::FieldFromApparent => R::FACT_FIELD_FROM_APPARENT,
        VisualRow::Resolution | VisualRow::SeeingLimited => R::FACT_SEEING_LIMITED,
        _ => 0,
    }
}

fn camera_facts(row: CameraRow) -> u32 {
    use CameraReadout as R;
    match row {
        CameraRow::PixelScale | CameraRow::StarPixels => R::FACT_COARSE_SAMPLING | R::FACT_FINE_SAMPLING,
        CameraRow::CoarseSampling => R::FACT_COARSE_SAMPLING,
        CameraRow::FineSampling => R::FACT_FINE_SAMPLING,
        _ => 0,
    }
}

/// What must be asked for a row and the mark beside it.
fn visual_bits(row: VisualRow) -> u32 {
    use VisualReadout as R;
    match row {
        VisualRow::Magnification | VisualRow::EmptyMagnification => {
            R::MAGNIFICATION | R::RESOLVING_MAGNIFICATION
        }
        VisualRow::TrueField | VisualRow::FieldFromApparent => R::TRUE_FIELD,
        VisualRow::ExitPupil => R::EXIT_PUPIL,
        VisualRow::Resolution | VisualRow::SeeingLimited => R::RESOLUTION,
        VisualRow::FaintestStar => R::LIMITING_MAGNITUDE,
        VisualRow::SurfaceBrightness => R::SURFACE_BRIGHTNESS,
        VisualRow::FocalRatio => R::FOCAL_RATIO,
        VisualRow::FocalLength => R::FOCAL_LENGTH,
        VisualRow::LowestMagnification => R::LOWEST_MAGNIFICATION,
        VisualRow::ResolvingMagnification => R::RESOLVING_MAGNIFICATION,
        VisualRow::DawesLimit => R::DAWES_LIMIT,
        VisualRow::EffectiveAperture => R::EFFECTIVE_APERTURE,
        VisualRow::WideExitPupil => R::EXIT_PUPIL | R::LOWEST_MAGNIFICATION,
    }
}

fn camera_bits(row: CameraRow) -> u32 {
    use CameraReadout as R;
    match row {
        CameraRow::FrameWidth => R::FRAME_WIDTH,
        CameraRow::FrameHeight => R::FRAME_HEIGHT,
        CameraRow::PixelScale => R::PIXEL_SCALE | R::PIXELS_PER_FWHM,
        CameraRow::StarWidth => R::STAR_FWHM,
        CameraRow::StarPixels | CameraRow::CoarseSampling | CameraRow::FineSampling => R::PIXELS_PER_FWHM,
        CameraRow::FocalRatio => R::FOCAL_RATIO,
        CameraRow::TNumber => R::T_NUMBER,
        CameraRow::FocalLength => R::FOCAL_LENGTH,
        CameraRow::PlateScale => R::PLATE_SCALE,
    }
}

fn visual_meaning(row: VisualRow) -> &'static str {
    match row {
        VisualRow::Magnification => "how many times larger than to the bare eye",
        VisualRow::TrueField => "width of the sky in view",
        VisualRow::ExitPupil => "width of the beam that enters the eye",
        VisualRow::Resolution => "closest pair of stars that the optics part (Rayleigh)",
        VisualRow::FaintestStar => "magnitude of the faintest star in view",
        VisualRow::SurfaceBrightness => "a nebula's brightness against the bare eye's view",
        VisualRow::FocalRatio => "focal length over aperture, Barlow included",
        VisualRow::FocalLength => "of the telescope, Barlow included",
        VisualRow::LowestMagnification => "below this magnification light falls on the iris",
        VisualRow::ResolvingMagnification => "above this magnification no new detail shows",
        VisualRow::DawesLimit => "closest pair of equal stars, by Dawes's rule",
        VisualRow::EffectiveAperture => "aperture without obstruction and losses, as bright",
        VisualRow::WideExitPupil => "is the exit pupil wider than the eye's?",
        VisualRow::EmptyMagnification => "is the magnification past what the optics resolve?",
        VisualRow::FieldFromApparent => "does the true field rest on the apparent field?",
        VisualRow::SeeingLimited => "does the air blur more than the optics?",
    }
}

fn camera_meaning(row: CameraRow) -> &'static str {
    match row {
        CameraRow::FrameWidth => "sky across the width of the picture",
        CameraRow::FrameHeight => "sky across the height of the picture",
        CameraRow::PixelScale => "sky to one pixel, binning included",
        CameraRow::StarWidth => "width of a star's image at half its brightness",
        CameraRow::StarPixels => "the same in pixels; two to three are good",
        CameraRow::FocalRatio => "focal length over aperture, Barlow included",
        CameraRow::TNumber => "focal ratio that exposes as long, losses included",
        CameraRow::FocalLength => "of the telescope, Barlow included",
        CameraRow::PlateScale => "sky to one millimetre at the focus",
        CameraRow::CoarseSampling => "are there under two pixels to a star?",
        CameraRow::FineSampling => "are there over three pixels to a star?",
    }
}
