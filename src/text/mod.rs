//! A quantity as display characters.
mod digits;
mod labels;
mod line;
mod page;
mod style;
mod value;
mod write;

pub use labels::{CAMERA_LABELS, CAMERA_LABELS_SHORT, VISUAL_LABELS, VISUAL_LABELS_SHORT};
pub use line::{Row, Span, changed, lines};
pub use page::{CameraRow, VisualRow, camera_line, camera_row, visual_line, visual_row};
pub use style::{TextStyle, Unit, text};
pub use value::{AngleForm, Value};

#[cfg(feature = "capi")]
pub(crate) use {
    labels::{
        CAMERA_LABELS_FOR_C, CAMERA_LABELS_SHORT_FOR_C, VISUAL_LABELS_FOR_C, VISUAL_LABELS_SHORT_FOR_C,
    },
    line::{row_of, write_line},
};
