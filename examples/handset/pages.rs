//! The pages: what is asked of the library for each, and its four lines.

use crate::equipment::{DISPLAY_COLUMNS, Equipment};
use fieldstop::setup::{CameraReadout, FocusReadout, NewtonianReadout, TwoMirrorReadout, VisualReadout};
use fieldstop::text::{
    CAMERA_LABELS, CameraRow, FOCUS_LABELS, FocusRow, HIGH_EYEPIECE_CAUTION, NEWTONIAN_LABELS, NewtonianRow,
    TWO_MIRROR_LABELS, TextStyle, TwoMirrorRow, VISUAL_LABELS, VisualRow, camera_line, caution_line,
    caution_lines, focus_line, newtonian_line, two_mirror_line, visual_line,
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
    /// And so on.
    Focus(&'static [FocusRow]),
    Newtonian(&'static [NewtonianRow]),
    TwoMirror(&'static [TwoMirrorRow]),
    /// Four lines of the caution for a high eyepiece, from this one on.
    HighEyepiece(u8),
}

/// The lines of a page, what each means, and the facts to tell below.
#[derive(Default)]
pub struct Content {
    pub lines: Vec<String>,
    pub meanings: Vec<&'static str>,
    pub facts: Vec<&'static str>,
}

/// A telescope's pages in their order, as many rows to each as the display has lines.
pub fn of_telescope(equipment: &Equipment, telescope: usize) -> Vec<Page> {
    let visual = const { &VisualRow::ALL }.chunks(DISPLAY_LINES).map(Page::Visual);
    let camera = const { &CameraRow::ALL }.chunks(DISPLAY_LINES).map(Page::Camera);
    let focus = const { &FocusRow::ALL }.chunks(DISPLAY_LINES).map(Page::Focus);
    let common = [Page::Names].into_iter().chain(visual).chain(camera).chain(focus);
    common.chain(of_layout(equipment, telescope)).collect()
}

/// Those of its layout alone.
pub fn of_layout(equipment: &Equipment, telescope: usize) -> Vec<Page> {
    let mut pages = Vec::new();
    if let Some(layout) = layout_of(&equipment.newtonians, telescope) {
        pages.extend(const { &NewtonianRow::ALL }.chunks(DISPLAY_LINES).map(Page::Newtonian));
        let readout =
            NewtonianReadout::compute(&equipment.telescopes[telescope].item, layout, NewtonianReadout::ALL);
        if readout.is_ok_and(|readout| readout.facts & HIGH != 0) {
            let lines = caution_lines(HIGH_EYEPIECE_CAUTION, DISPLAY_COLUMNS as u8);
            pages.extend((0..lines).step_by(DISPLAY_LINES).map(Page::HighEyepiece));
        }
    }
    if layout_of(&equipment.two_mirrors, telescope).is_some() {
        pages.extend(const { &TwoMirrorRow::ALL }.chunks(DISPLAY_LINES).map(Page::TwoMirror));
    }
    pages
}

fn layout_of<T>(layouts: &[(usize, T)], telescope: usize) -> Option<&T> {
    layouts.iter().find(|(place, _)| *place == telescope).map(|(_, layout)| layout)
}

const HIGH: u32 = NewtonianReadout::FACT_HIGH_EYEPIECE | NewtonianReadout::FACT_HIGH_REACHED;

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
                    content.add(visual_meaning(row), |columns, out| {
                        visual_line(&readout, &VISUAL_LABELS, &STYLE, columns, row as u8, out)
                    })?;
                }
                let told = rows.iter().fold(0, |bits, &row| bits | visual_facts(row));
                content.facts = facts(&VISUAL_FACTS, readout.facts & told);
            }
            Page::Camera(rows) => {
                let wanted = rows.iter().fold(0, |bits, &row| bits | camera_bits(row));
                let readout = CameraReadout::compute(&telescope.item, &camera.item, observer, wanted)?;
                for &row in rows {
                    content.add(camera_meaning(row), |columns, out| {
                        camera_line(&readout, &CAMERA_LABELS, &STYLE, columns, row as u8, out)
                    })?;
                }
                let told = rows.iter().fold(0, |bits, &row| bits | camera_facts(row));
                content.facts = facts(&CAMERA_FACTS, readout.facts & told);
            }
            Page::Focus(rows) => {
                let readout =
                    FocusReadout::compute(&telescope.item, &equipment.focuser, observer, FocusReadout::ALL)?;
                for &row in rows {
                    content.add(focus_meaning(row), |columns, out| {
                        focus_line(&readout, &FOCUS_LABELS, &STYLE, columns, row as u8, out)
                    })?;
                }
                let told = rows.iter().fold(0, |bits, &row| bits | focus_facts(row));
                content.facts = facts(&FOCUS_FACTS, readout.facts & told);
            }
            Page::Newtonian(rows) => {
                let layout = layout_of(&equipment.newtonians, choice.telescope).copied().unwrap_or_default();
                let readout = NewtonianReadout::compute(&telescope.item, &layout, NewtonianReadout::ALL)?;
                for &row in rows {
                    content.add(newtonian_meaning(row), |columns, out| {
                        newtonian_line(&readout, &NEWTONIAN_LABELS, &STYLE, columns, row as u8, out)
                    })?;
                }
                let told = rows.iter().fold(0, |bits, &row| bits | newtonian_facts(row));
                content.facts = facts(&NEWTONIAN_FACTS, readout.facts & told);
            }
            Page::TwoMirror(rows) => {
                let layout = layout_of(&equipment.two_mirrors, choice.telescope).copied().unwrap_or_default();
                let readout = TwoMirrorReadout::compute(&telescope.item, &layout, TwoMirrorReadout::ALL)?;
                for &row in rows {
                    content.add(two_mirror_meaning(row), |columns, out| {
                        two_mirror_line(&readout, &TWO_MIRROR_LABELS, &STYLE, columns, row as u8, out)
                    })?;
                }
                content.facts = facts(&TWO_MIRROR_FACTS, readout.facts);
            }
            Page::HighEyepiece(first) => {
                for line in first..first + DISPLAY_LINES as u8 {
                    content
                        .add("", |columns, out| caution_line(HIGH_EYEPIECE_CAUTION, columns, line, out))?;
                }
            }
        }
        Ok(content)
    }
}

impl Content {
    /// A line that the library writes.
    fn add(
        &mut self,
        meaning: &'static str,
        write: impl FnOnce(u8, &mut [u8]) -> Result<usize, fieldstop::Error>,
    ) -> Result<(), fieldstop::Error> {
        let mut line = [0; 64];
        let bytes = write(DISPLAY_COLUMNS as u8, &mut line)?;
        self.lines.push(String::from_utf8_lossy(&line[..bytes]).into());
        self.meanings.push(meaning);
        Ok(())
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

const FOCUS_FACTS: [(u32, &str); 2] = [
    (
        FocusReadout::FACT_COARSE_STEP,
        "One motor step is more than the depth of focus: the best may lie between two.",
    ),
    (FocusReadout::FACT_OUT_OF_FOCUS, "So far off the wavefront errs by more than a quarter wave."),
];

const NEWTONIAN_FACTS: [(u32, &str); 4] = [
    (NewtonianReadout::FACT_SMALL_DIAGONAL, "The diagonal in place does not light the whole field wanted."),
    (
        NewtonianReadout::FACT_WIDER_THAN_TOLD,
        "The diagonal is wider than the obstruction in the telescope's entry.",
    ),
    (NewtonianReadout::FACT_HIGH_EYEPIECE, "The eyepiece is above the height set: see the caution."),
    (NewtonianReadout::FACT_HIGH_REACHED, "The eyepiece gets above the height set: see the caution."),
];

const TWO_MIRROR_FACTS: [(u32, &str); 1] = [(
    TwoMirrorReadout::FACT_WIDER_THAN_TOLD,
    "The secondary is wider than the obstruction in the telescope's entry.",
)];

fn focus_facts(row: FocusRow) -> u32 {
    use FocusReadout as R;
    match row {
        FocusRow::DepthSteps | FocusRow::CoarseStep => R::FACT_COARSE_STEP,
        FocusRow::Blur | FocusRow::BlurAngle | FocusRow::Wavefront | FocusRow::OutOfFocus => {
            R::FACT_OUT_OF_FOCUS
        }
        _ => 0,
    }
}

fn newtonian_facts(row: NewtonianRow) -> u32 {
    use NewtonianReadout as R;
    match row {
        NewtonianRow::Diagonal | NewtonianRow::SmallDiagonal => R::FACT_SMALL_DIAGONAL,
        NewtonianRow::Obstruction | NewtonianRow::WiderThanTold => R::FACT_WIDER_THAN_TOLD,
        NewtonianRow::EyepieceHeight | NewtonianRow::HighEyepiece => R::FACT_HIGH_EYEPIECE,
        NewtonianRow::GreatestHeight | NewtonianRow::HighReached => R::FACT_HIGH_REACHED,
        _ => 0,
    }
}

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
        CameraRow::Diagonal => R::DIAGONAL,
        CameraRow::Cutoff => R::CUTOFF_FREQUENCY,
        CameraRow::NyquistPixel => R::NYQUIST_PIXEL,
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
        CameraRow::Diagonal => "sky from corner to corner of the picture",
        CameraRow::Cutoff => "finest detail that the optics pass at the focus",
        CameraRow::NyquistPixel => "largest pixel that loses nothing of it",
        CameraRow::CoarseSampling => "are there under two pixels to a star?",
        CameraRow::FineSampling => "are there over three pixels to a star?",
    }
}

fn focus_meaning(row: FocusRow) -> &'static str {
    match row {
        FocusRow::DepthOfFocus => "each side of the best focus, to a quarter wave",
        FocusRow::DepthSteps => "the same in steps of the motor",
        FocusRow::Temperature => "when the tube's growth has used it up",
        FocusRow::Blur => "a star's width at the defocus asked about",
        FocusRow::BlurAngle => "the same on the sky",
        FocusRow::Wavefront => "error of the wavefront there",
        FocusRow::FocalRatio => "focal length over aperture, Barlow included",
        FocusRow::CoarseStep => "is a step of the motor more than the depth?",
        FocusRow::OutOfFocus => "is the defocus more than the depth?",
    }
}

fn newtonian_meaning(row: NewtonianRow) -> &'static str {
    match row {
        NewtonianRow::Diagonal => "minor axis that the lit field needs",
        NewtonianRow::DiagonalOffset => "of its centre, from the focuser and to the primary",
        NewtonianRow::Obstruction => "the diagonal in place over the aperture",
        NewtonianRow::EdgeLight => "what the edge of the field gets of it",
        NewtonianRow::EyepieceHeight => "its height above the floor now",
        NewtonianRow::GreatestHeight => "the same at the altitude where it is highest",
        NewtonianRow::Beam => "width of the light at the diagonal",
        NewtonianRow::BeamShift => "off the axis there, for the field's edge",
        NewtonianRow::SmallDiagonal => "is the one in place under what is needed?",
        NewtonianRow::WiderThanTold => "does it hide more than the telescope's entry says?",
        NewtonianRow::HighEyepiece => "is the eyepiece above the height set?",
        NewtonianRow::HighReached => "does it get there?",
    }
}

fn two_mirror_meaning(row: TwoMirrorRow) -> &'static str {
    match row {
        TwoMirrorRow::Separation => "from mirror to mirror",
        TwoMirrorRow::Secondary => "its diameter, for the lit field",
        TwoMirrorRow::Radius => "of curvature, convex",
        TwoMirrorRow::Obstruction => "the secondary over the aperture",
        TwoMirrorRow::SecondaryMagnification => "how much longer it makes the focal length",
        TwoMirrorRow::Length => "from the secondary to the focus",
        TwoMirrorRow::LengthShare => "how short that is for the focal length",
        TwoMirrorRow::WiderThanTold => "does it hide more than the telescope's entry says?",
    }
}
