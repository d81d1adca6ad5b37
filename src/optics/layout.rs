//! Layout of mirrors and tube: how large the mirrors are and where they stand, what they leave of the light, and what the
//! tube needs around it.

use super::{allowed, present};

mod diagonal;
mod illumination;
mod mirrors;
mod tube;

pub use diagonal::*;
pub use illumination::*;
pub use mirrors::*;
pub use tube::*;
