//! Equipment as plain structs in fixed units, and all readouts of one screen in one call.
//!
//! Fill a [`Telescope`], an [`Eyepiece`] or a [`Camera`], and an [`Observer`]; [`check`](Telescope::check)
//! each when it is entered; then ask [`VisualReadout::compute`] or [`CameraReadout::compute`] for the values
//! that a screen shows, as bits. [`FocusReadout`], [`NewtonianReadout`] and [`TwoMirrorReadout`] do the same for a focuser
//! and for the layout of a tube; [`VisualOutfit`] and [`CameraOutfit`] choose what to put in. Only those are computed, and what they share is computed once: a value is what
//! the functions of [`optics`](crate::optics) give one after the other, with each result in between rounded to its
//! unit.
//!
//! In C the structs are `fieldstop_telescope` and so on, with the same members. Their layout never changes:
//! more comes as a new struct under a new name. A member named `padding` is ignored.
//!
//! ```
//! use fieldstop::setup::{Eyepiece, Observer, Telescope, VisualReadout};
//!
//! const TELESCOPE: Telescope = Telescope {
//!     aperture_um: 187_500,
//!     focal_length_um: 1_130_000,
//!     obstruction_um: 47_000,
//!     amplification_q16: 1 << 16,
//!     throughput_q16: 0, // unknown
//! };
//! const _: () = assert!(TELESCOPE.check().is_ok()); // a check can run in the compiler
//!
//! let eyepiece = Eyepiece { focal_length_um: 37_000, field_stop_um: 43_200, ..Eyepiece::default() };
//! let observer = Observer { wavelength_nm: 550, ..Observer::default() };
//! let wanted = VisualReadout::MAGNIFICATION | VisualReadout::TRUE_FIELD | VisualReadout::LIMITING_MAGNITUDE;
//! let readout = VisualReadout::compute(&TELESCOPE, &eyepiece, &observer, wanted)?;
//! assert_eq!(readout.available, VisualReadout::MAGNIFICATION | VisualReadout::TRUE_FIELD);
//! assert_eq!(readout.magnification_q16 >> 16, 30);
//! assert_eq!(readout.true_field_mas / 60_000, 131); // minutes of arc
//! # Ok::<(), fieldstop::Error>(())
//! ```
//!
//! # Checks
//!
//! A check tells the first bad member, in the order of declaration, as the [`Error`]'s
//! argument, counted from 1. Within a readout call the argument is the struct's own position in the call.
//!
//! # Unknown is zero
//!
//! Where a member's documentation says "0: unknown", what depends on it is not available and the rest still
//! comes.
//! A value that does not fit its type is not available either. What is not available has its bit in
//! `available` clear and is 0.

/// Stores a member whose bit is wanted and whose value is known, and says so.
macro_rules! tell {
    ($out:ident, $wanted:ident, $bit:ident, $member:ident, $value:expr) => {
        if $wanted & Self::$bit != 0
            && let Ok(value) = $value
        {
            $out.$member = value.0;
            $out.available |= Self::$bit;
        }
    };
}

use crate::math::divide;
use crate::status::{Cause, Error};
use crate::units::Q16;
use core::iter;

mod camera;
mod camera_choice;
mod camera_readout;
mod eyepiece;
mod focus_readout;
mod focuser;
mod newtonian;
mod observer;
mod ranking;
mod site;
mod telescope;
mod two_mirror;
mod visual_choice;
mod visual_readout;

pub use camera::Camera;
pub use camera_choice::{CameraChoice, CameraOutfit, CameraTarget};
pub use camera_readout::CameraReadout;
pub use eyepiece::Eyepiece;
pub use focus_readout::FocusReadout;
pub use focuser::Focuser;
pub use newtonian::{NewtonianLayout, NewtonianReadout};
pub use observer::Observer;
pub use site::Site;
pub use telescope::Telescope;
pub use two_mirror::{TwoMirrorLayout, TwoMirrorReadout};
pub use visual_choice::{VisualChoice, VisualOutfit, VisualTarget};
pub use visual_readout::VisualReadout;

/// a / b in Q16.16, for quantities that no formula of `optics` divides yet; a is below 2^47.
fn ratio_q16(a: u64, b: u32) -> Result<Q16, Error> {
    match b {
        0 => Err(Error::new(Cause::Undefined, 0)),
        b => divide::rounded(a << 16, b).map(Q16),
    }
}

/// The most Barlows and reducers that a choice takes.
const MOST_AMPLIFIERS: usize = 8;

/// Those of a choice: argument 4, their number argument 5.
fn check_amplifiers(amplifiers: &[Q16]) -> Result<(), Error> {
    if amplifiers.len() > MOST_AMPLIFIERS {
        return Err(Error::new(Cause::OutOfRange, 5));
    }
    if amplifiers.contains(&Q16(0)) {
        return Err(Error::new(Cause::Zero, 4));
    }
    Ok(())
}

/// The telescope with none of the amplifiers, and with each, beside that one's place in the list; 255 for none.
fn with_each(telescope: &Telescope, amplifiers: &[Q16]) -> impl Iterator<Item = (u8, Telescope)> {
    // Copies: a constant behind a reference would be in RAM on AVR.
    let amplifications = iter::once(Q16::ONE).chain(amplifiers.iter().copied());
    iter::once(NO_AMPLIFIER)
        .chain(0..)
        .zip(amplifications)
        .map(|(place, amplification)| (place, Telescope { amplification_q16: amplification.0, ..*telescope }))
}

/// The place of an amplifier where there is none.
const NO_AMPLIFIER: u8 = 255;

/// Half a turn in milliarcseconds: a field of view must be narrower.
const HALF_TURN_MAS: u32 = 648_000_000;

// C sees these layouts on 8, 16 and 32-bit targets alike: any other does not compile.
const _: () = {
    use core::mem::{offset_of, size_of};
    assert!(size_of::<Telescope>() == 20);
    assert!(size_of::<Eyepiece>() == 16 && offset_of!(Eyepiece, mapping) == 12);
    assert!(size_of::<Camera>() == 12 && offset_of!(Camera, rows) == 6 && offset_of!(Camera, binning) == 8);
    assert!(size_of::<Observer>() == 20 && size_of::<Site>() == 8);
    assert!(size_of::<VisualTarget>() == 20 && size_of::<CameraTarget>() == 12);
    assert!(size_of::<VisualChoice>() == 28 && offset_of!(VisualChoice, eyepiece) == 24);
    assert!(size_of::<CameraChoice>() == 36 && offset_of!(CameraChoice, camera) == 32);
    assert!(size_of::<VisualReadout>() == 56 && offset_of!(VisualReadout, limiting_magnitude_mmag) == 48);
    assert!(size_of::<CameraReadout>() == 56 && offset_of!(CameraReadout, pixels_per_fwhm_q16) == 40);
    assert!(size_of::<Focuser>() == 16 && size_of::<FocusReadout>() == 36);
    assert!(size_of::<NewtonianLayout>() == 40 && offset_of!(NewtonianLayout, reach_um) == 20);
    assert!(size_of::<NewtonianReadout>() == 40);
    assert!(size_of::<TwoMirrorLayout>() == 12 && size_of::<TwoMirrorReadout>() == 36);
};
