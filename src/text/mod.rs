//! A quantity as display characters.
mod digits;
mod style;
mod value;
mod write;

pub use style::{TextStyle, Unit, text};
pub use value::{AngleForm, Value};
