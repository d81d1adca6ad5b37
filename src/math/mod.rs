//! Integer and float kernels; they know nothing of optics.
//!
//! The machine to think of is a Cortex-M0: a 32 by 32 multiply that keeps the low word, no divide, no count of leading
//! zeros. Each kernel states its error, and the tests in its file find the worst one; those over
//! every input are `cargo test --release --lib -- --ignored`.

pub(crate) mod arc;
#[cfg(target_arch = "avr")]
pub(crate) mod avr;
#[cfg(test)]
pub(crate) mod chebyshev;
pub mod convert;
#[cfg(feature = "float")]
pub(crate) mod degrees;
pub(crate) mod divide;
#[cfg(feature = "float")]
pub(crate) mod double;
#[cfg(feature = "float")]
pub(crate) mod float;
pub(crate) mod logarithm;
pub(crate) mod multiply;
pub(crate) mod root;
pub(crate) mod segment;
pub(crate) mod sine;
