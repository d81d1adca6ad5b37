//! Equipment as plain structs in fixed units, and all readouts of one screen in one call.
//!
//! Fill a [`Telescope`], an [`Eyepiece`] or a [`Camera`], and an [`Observer`]; [`check`](Telescope::check) each when
//! it is entered; then ask [`VisualReadout::compute`] or [`CameraReadout::compute`] for the values that a screen
//! shows, as bits. Only those are computed, and what they share is computed once.
//!
//! In C the structs are `fieldstop_telescope` and so on, with the same members. Their layout never changes: more
//! comes as a new struct under a new name. A member named `padding` is ignored.
//!
//! # Checks
//!
//! A check tells the first bad member, in the order of declaration, as the [`Error`](crate::Error)'s argument,
//! counted from 1. Within a readout call the argument is the struct's own position in the call.
//!
//! # Unknown is zero
//!
//! Where a member's documentation says "0: unknown", what depends on it is not available and the rest still comes.
//! A value that does not fit its type is not available either. What is not available has its bit in `available`
//! clear and is 0.

mod camera;
mod camera_readout;
mod eyepiece;
mod observer;
mod telescope;
mod visual_readout;

pub use camera::Camera;
pub use camera_readout::CameraReadout;
pub use eyepiece::Eyepiece;
pub use observer::Observer;
pub use telescope::Telescope;
pub use visual_readout::VisualReadout;

/// Half a turn in milliarcseconds: a field of view must be narrower.
const HALF_TURN_MAS: u32 = 648_000_000;

// C sees these layouts on 8, 16 and 32-bit targets alike: any other does not compile.
const _: () = {
    use core::mem::{offset_of, size_of};
    assert!(size_of::<Telescope>() == 20);
    assert!(size_of::<Eyepiece>() == 16 && offset_of!(Eyepiece, mapping) == 12);
    assert!(size_of::<Camera>() == 12 && offset_of!(Camera, rows) == 6 && offset_of!(Camera, binning) == 8);
    assert!(size_of::<Observer>() == 20);
    assert!(size_of::<VisualReadout>() == 56 && offset_of!(VisualReadout, limiting_magnitude_mmag) == 48);
    assert!(size_of::<CameraReadout>() == 44 && offset_of!(CameraReadout, pixels_per_fwhm_q16) == 40);
};
