//! English labels, of the length that the lines leave room for. A translation is another table of the same kind.

use super::layout_page::{FocusRow, NewtonianRow, TwoMirrorRow};
use super::page::{CameraRow, VisualRow};
#[cfg(feature = "capi")]
use crate::stored::{stored, stored_text};
#[cfg(feature = "capi")]
use core::ffi::c_char;

macro_rules! labels {
    ($($(#[$doc:meta])* $name:ident, $for_c:ident: $count:expr, [$($text:literal),* $(,)?];)*) => {$(
        $(#[$doc])*
        pub const $name: [&str; $count] = [$($text),*];

        #[cfg(feature = "capi")]
        stored! {
            /// The same for C.
            pub(crate) static $for_c: [*const c_char; $count] = [$(stored_text!($for_c, $text)),*];
        }
    )*};
}

labels! {
    /// Labels of the visual pages for 20 columns and more.
    VISUAL_LABELS, VISUAL_LABELS_FOR_C: VisualRow::ALL.len(), [
        "Magnification",
        "True field",
        "Exit pupil",
        "Resolution",
        "Stars to",
        "Surf. bright.",
        "Focal ratio",
        "Focal length",
        "Useful from",
        "Useful up to",
        "Dawes limit",
        "Eff. aperture",
        "Wide exit pupil",
        "Over-magnified",
        "Field estimated",
        "Seeing-limited",
    ];
    /// Labels of the visual pages for 8 and 16 columns.
    VISUAL_LABELS_SHORT, VISUAL_LABELS_SHORT_FOR_C: VisualRow::ALL.len(), [
        "Magnif.",
        "Field",
        "Pupil",
        "Resol.",
        "Stars",
        "Surface",
        "F ratio",
        "Focal",
        "Lowest",
        "Highest",
        "Dawes",
        "Eff.ap.",
        "WidePup",
        "OverMag",
        "Est.fld",
        "Seeing",
    ];
    /// Labels of the camera pages for 20 columns and more.
    CAMERA_LABELS, CAMERA_LABELS_FOR_C: CameraRow::ALL.len(), [
        "Frame width",
        "Frame height",
        "Pixel scale",
        "Star width",
        "Star pixels",
        "Focal ratio",
        "T-number",
        "Focal length",
        "Plate scale",
        "Diagonal",
        "Cutoff",
        "Pixel up to",
        "Coarse sampling",
        "Fine sampling",
    ];
    /// Labels of the camera pages for 8 and 16 columns.
    CAMERA_LABELS_SHORT, CAMERA_LABELS_SHORT_FOR_C: CameraRow::ALL.len(), [
        "Width",
        "Height",
        "Scale",
        "FWHM",
        "FWHM",
        "F ratio",
        "T",
        "Focal",
        "Plate",
        "Diag.",
        "Cutoff",
        "Pixel",
        "Coarse",
        "Fine",
    ];
    /// Labels of the focus pages for 20 columns and more.
    FOCUS_LABELS, FOCUS_LABELS_FOR_C: FocusRow::ALL.len(), [
        "Focus depth",
        "Motor steps",
        "Refocus after",
        "Blur",
        "Blur on sky",
        "Wavefront",
        "Focal ratio",
        "Coarse steps",
        "Out of focus",
    ];
    /// Labels of the focus pages for 8 and 16 columns.
    FOCUS_LABELS_SHORT, FOCUS_LABELS_SHORT_FOR_C: FocusRow::ALL.len(), [
        "Depth",
        "Steps",
        "Refocus",
        "Blur",
        "On sky",
        "Wave",
        "F ratio",
        "Coarse",
        "Outside",
    ];
    /// Labels of the pages of a Newtonian's layout for 20 columns and more.
    NEWTONIAN_LABELS, NEWTONIAN_LABELS_FOR_C: NewtonianRow::ALL.len(), [
        "Diagonal",
        "Offset",
        "Obstruction",
        "Edge light",
        "Eyepiece at",
        "Eyepiece max",
        "Beam",
        "Beam shift",
        "Small diagonal",
        "Wider than told",
        "High eyepiece",
        "High reached",
    ];
    /// Labels of the pages of a Newtonian's layout for 8 and 16 columns.
    NEWTONIAN_LABELS_SHORT, NEWTONIAN_LABELS_SHORT_FOR_C: NewtonianRow::ALL.len(), [
        "Diagon.",
        "Offset",
        "Obstr.",
        "Edge",
        "Height",
        "Highest",
        "Beam",
        "Shift",
        "Small",
        "Wider",
        "High",
        "Up high",
    ];
    /// Labels of the pages of two mirrors' layout for 20 columns and more.
    TWO_MIRROR_LABELS, TWO_MIRROR_LABELS_FOR_C: TwoMirrorRow::ALL.len(), [
        "Separation",
        "Secondary",
        "Its radius",
        "Obstruction",
        "Second. magn.",
        "Length",
        "Of focal len.",
        "Wider than told",
    ];
    /// Labels of the pages of two mirrors' layout for 8 and 16 columns.
    TWO_MIRROR_LABELS_SHORT, TWO_MIRROR_LABELS_SHORT_FOR_C: TwoMirrorRow::ALL.len(), [
        "Separ.",
        "Second.",
        "Radius",
        "Obstr.",
        "Magnif.",
        "Length",
        "Share",
        "Wider",
    ];
}
