//! The formulas of the telescope, one file a subject, the fixed and the float form of each side by side.
//!
//! # Conventions
//! - `name_fx` takes and gives the integer quantities of [`crate::units`]; `name` is generic over `f32` and `f64`
//!   ([`Real`](crate::Real)) and takes the unit that each argument's name ends in.
//! - Fixed arguments are read as exact; the result is the exact value of the formula rounded to nearest. "Error" is
//!   the greatest distance from that exact value, in units of the result's last place (LSB) for the fixed form and in
//!   units in the last place (ulp) for the float forms.
//! - A fixed argument may be anything that its type holds and a float argument anything finite up to 2^32, unless its
//!   range is given; where zero is refused a float must be at least 2^-32.
//! - Refusals are checked from the first argument to the last, then the result: [`Zero`](crate::Cause::Zero) where the
//!   quantity must exist, [`OutOfRange`](crate::Cause::OutOfRange), [`NotFinite`](crate::Cause::NotFinite) for floats,
//!   [`Overflow`](crate::Cause::Overflow) where the result does not fit. Nothing wraps or saturates.

pub mod colour;
pub mod field;
pub mod focus;
pub mod imaging;
pub mod layout;
pub mod light;
pub mod resolution;

pub(crate) use crate::status::{allowed, present};
