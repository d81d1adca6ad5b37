//! The stored record: its bytes, what is refused, and what a loss of power leaves.

#[path = "profile/bytes.rs"]
mod bytes;
#[cfg(feature = "embedded-storage")]
#[path = "profile/drivers.rs"]
mod drivers;
#[path = "profile/golden.rs"]
mod golden;
#[path = "profile/samples.rs"]
mod samples;
#[path = "profile/store.rs"]
mod store;
#[path = "profile/torn.rs"]
mod torn;
