//! The C interface: plain functions, written out, one file a subject. With src/stored.rs
//! and src/math/avr.rs the only room with `unsafe`.
//!
//! Each function checks its pointers first, then calls the Rust function of the same stem; it writes its result only on
//! success.
#![allow(unsafe_code, non_camel_case_types, clippy::missing_safety_doc)]

pub mod colour;
pub mod entry;
pub mod field;
pub mod focus;
pub mod imaging;
pub mod layout;
pub mod light;
pub mod motion;
pub mod profile;
pub mod resolution;
pub mod setup;
pub mod setup_choice;
pub mod setup_layout;
mod short;
pub mod status;
pub mod sun;
pub mod text;
pub mod text_caution;
pub mod text_focus;
pub mod text_newtonian;
pub mod text_two_mirror;
pub mod units;

use crate::status::{Cause, Error};

/// 0 on success; otherwise the cause in the low byte, and in the high byte the position of the offending argument
/// counted from 1, or 0 where no single argument is to blame.
pub type fieldstop_status = u16;

/// Runs `compute` unless `out` is null, and writes its result there if there is one.
///
/// # Safety
/// `out` is null or points to a T that may be written.
#[inline(always)]
unsafe fn give<T, Q: Into<T>>(
    out: *mut T,
    position: u8,
    compute: impl FnOnce() -> Result<Q, Error>,
) -> fieldstop_status {
    if out.is_null() {
        return Error::new(Cause::NullPointer, position).status();
    }
    match compute() {
        Ok(result) => {
            // SAFETY: not null, and the caller's promise.
            unsafe { out.write(result.into()) };
            0
        }
        Err(error) => error.status(),
    }
}
