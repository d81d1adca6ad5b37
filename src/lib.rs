//! Telescope optics readouts for firmware.
#![no_std]
#![deny(unsafe_code)]
#![warn(missing_docs)]

pub mod setup;
pub mod status;
pub mod text;
pub mod units;

pub use status::{Cause, Error};
