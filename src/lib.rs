//! Optics readouts for telescope firmware: fixed point and float, no heap, no panic, with a C interface.
//!
//! # From equipment to a displayed line
//!
//! Describe the equipment as plain structs, ask for the values of a page, and write its lines:
//!
//! ```
//! use fieldstop::setup::{Eyepiece, Observer, Telescope, VisualReadout};
//! use fieldstop::text::{TextStyle, VISUAL_LABELS, visual_line};
//! use fieldstop::units::Q16;
//!
//! const TELESCOPE: Telescope = Telescope {
//!     aperture_um: 187_500,
//!     focal_length_um: 1_130_000,
//!     obstruction_um: 47_000,
//!     amplification_q16: Q16::ONE.0,
//!     throughput_q16: 53_740, // 0.82
//! };
//! let eyepiece = Eyepiece { focal_length_um: 37_000, field_stop_um: 43_200, ..Eyepiece::default() };
//! let observer = Observer {
//!     naked_eye_mmag: 5_300,
//!     eye_pupil_um: 6_200,
//!     wavelength_nm: 550,
//!     ..Observer::default()
//! };
//!
//! let readout = VisualReadout::compute(&TELESCOPE, &eyepiece, &observer, VisualReadout::ALL)?;
//! let mut line = [0; 20];
//! let length = visual_line(&readout, &VISUAL_LABELS, &TextStyle::ASCII, 20, 1, &mut line)?;
//! assert_eq!(&line[..length], b"True field     2d11'");
//! # Ok::<(), fieldstop::Error>(())
//! ```
//!
//! Or take one formula at a time from [`optics`], in integers or in float, and one value at a time from [`text::Value`].
//!
//! # Layers
//!
//! Each uses only those below it.
//!
//! | module | what it holds |
//! |---|---|
//! | `capi` | the C interface (feature `capi`) |
//! | [`text`] | a quantity as display characters, and the pages of character displays |
//! | [`profile`] | equipment, observer and site as a record in EEPROM or flash |
//! | [`setup`] | telescope, eyepiece, camera, observer: all readouts of one screen |
//! | [`optics`] | the formulas of the telescope |
//! | [`sky`] | the formulas of the sky: where things stand and how they move |
//! | [`convert`] | conversions between the fixed units |
//! | `math` | integer and float kernels |
//! | [`units`] | the quantities of the fixed forms |
//! | [`status`] | what can go wrong |
//! | `stored` | constants in program memory |
//!
//! # Caution
//!
//! Never look at or near the Sun through a telescope without a full-aperture filter made for it; nothing that this
//! library computes says that it is safe. At a high eyepiece stand on a stable platform, never on the top of a ladder,
//! and stay clear of a moving mount. Follow the makers' instructions and local rules.
//!
//! # Features
//! - `float` (default): the f32 and f64 forms, over libm.
//! - `heapless` (default): text as a `heapless::String`.
//! - `defmt`: quantities and errors print themselves by defmt.
//! - `embedded-storage`: records in whatever has the traits of that crate.
//! - `capi`: the C interface.
//! - `header`: the build script makes the C header again (a desktop job).
//! - `panic-handler`: one that stops, for a static library where there is no operating system.
#![no_std]
// The reader of program memory in src/stored.rs; other targets need nothing unstable.
#![cfg_attr(target_arch = "avr", feature(asm_experimental_arch))]
#![deny(unsafe_code)]
#![warn(missing_docs)]

// A C library for a desktop takes its panic handler from std.
#[cfg(any(test, all(feature = "capi", not(target_os = "none"))))]
extern crate std;

#[cfg(feature = "capi")]
pub mod capi;
mod math;
pub mod optics;
pub mod profile;
pub mod setup;
pub mod sky;
pub mod status;
mod stored;
pub mod text;
pub mod units;

pub use math::convert;
#[cfg(feature = "float")]
pub use math::float::Real;
pub use status::{Cause, Error};

// Its examples are tests too.
#[cfg(all(doctest, feature = "float"))]
#[doc = include_str!("../README.md")]
pub struct Readme;

#[cfg(all(feature = "panic-handler", target_os = "none"))]
#[panic_handler]
fn stop(_: &core::panic::PanicInfo) -> ! {
    loop {}
}
