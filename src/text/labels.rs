//! English labels, of the length that the lines leave room for. A translation is another table of the same kind.

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
        "Coarse",
        "Fine",
    ];
}
