//! Telescope optics readouts for firmware: fixed point and float, no heap, no panic, with a C interface.
//!
//! Layers, each using only those below it:
//!
//! | module | what it holds |
//! |---|---|
//! | `capi` | the C interface (feature `capi`) |
//! | [`setup`] | telescope, eyepiece, camera, observer: all readouts of one screen |
//! | [`text`] | a quantity as display characters |
//! | [`optics`] | the formulas |
//! | [`convert`] | conversions between the fixed units |
//! | `math` | integer and float kernels |
//! | [`units`] | the quantities of the fixed forms |
//! | [`status`] | what can go wrong |
//!
//! # Features
//! - `float` (default): the f32 and f64 forms, over libm.
//! - `heapless` (default): text as a `heapless::String`.
//! - `capi`: the C interface.
//! - `header`: the build script makes the C header again (a desktop job).
//! - `panic-handler`: one that stops, for a static library where there is no operating system.
#![no_std]
#![deny(unsafe_code)]
#![warn(missing_docs)]

// A C library for a desktop takes its panic handler from std.
#[cfg(any(test, all(feature = "capi", not(target_os = "none"))))]
extern crate std;

#[cfg(feature = "capi")]
pub mod capi;
mod math;
pub mod optics;
pub mod setup;
pub mod status;
pub mod text;
pub mod units;

pub use math::convert;
#[cfg(feature = "float")]
pub use math::float::Real;
pub use status::{Cause, Error};

#[cfg(all(feature = "panic-handler", target_os = "none"))]
#[panic_handler]
fn stop(_: &core::panic::PanicInfo) -> ! {
    loop {}
}
