//! The stored record: equipment, observers and sites with their names, as bytes in EEPROM or flash.
#![doc = ""]
#![doc = include_str!("FORMAT.md")]

mod crc;
#[cfg(feature = "embedded-storage")]
mod drivers;
mod editor;
mod entry;
mod fields;
mod header;
mod name;
mod record;
mod store;

pub use crc::Crc;
#[cfg(feature = "embedded-storage")]
pub use drivers::{OfFlash, OfStorage};
pub use editor::Editor;
#[cfg(feature = "capi")]
pub(crate) use entry::Equipment;
pub use entry::Kind;
pub use header::InUse;
pub use name::EquipmentName;
pub use record::Record;
pub use store::{Newer, SlotPair, Storage, load, save};
