//! Integer and float kernels; they know nothing of optics.
//!
//! The machine to think of is a Cortex-M0: a 32 by 32 multiply that keeps the low word, no divide, no count of leading
//! zeros. Each kernel states its error; `tests/kernels.rs` finds the worst one.

pub(crate) mod arc;
pub mod convert;
pub(crate) mod divide;
#[cfg(feature = "float")]
pub(crate) mod double;
#[cfg(feature = "float")]
pub(crate) mod float;
pub(crate) mod logarithm;
pub(crate) mod multiply;
pub(crate) mod root;
