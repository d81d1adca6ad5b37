//! Records over drivers that have the traits of `embedded-storage`.

use super::store::Storage;
use crate::status::{Cause, Error};
use embedded_storage::nor_flash::NorFlash;

/// A record in what can be written byte by byte without an erase: EEPROM, FRAM.
///
/// Not for a driver that itself reads, erases and writes whole pages of flash: where its page holds more than the slot,
/// a torn write takes the rest of the page too. [`OfFlash`] is for those.
pub struct OfStorage<S>(
    /// The driver.
    pub S,
);

impl<S: embedded_storage::Storage> Storage for OfStorage<S> {
    fn read(&mut self, offset: u32, bytes: &mut [u8]) -> Result<(), Error> {
        self.0.read(offset, bytes).map_err(|_| FAILED)
    }

    fn write(&mut self, offset: u32, bytes: &[u8]) -> Result<(), Error> {
        self.0.write(offset, bytes).map_err(|_| FAILED)
    }
}

/// A record in NOR flash.
///
/// [`SlotPair`](super::SlotPair) must suit the driver: `write_bytes` a multiple of its `WRITE_SIZE`, the slots whole erase
/// units (`ERASE_SIZE`) each. Its `READ_SIZE` is at most 32 bytes.
pub struct OfFlash<S>(
    /// The driver.
    pub S,
);

impl<S: NorFlash> Storage for OfFlash<S> {
    fn read(&mut self, offset: u32, bytes: &mut [u8]) -> Result<(), Error> {
        if S::READ_SIZE == 1 {
            return self.0.read(offset, bytes).map_err(|_| FAILED);
        }
        // Whole read units, and of each what was asked for.
        let mut unit = [0; 32];
        let unit = unit.get_mut(..S::READ_SIZE).ok_or(FAILED)?;
        let size = S::READ_SIZE as u32;
        let mut skipped = offset % size;
        let mut at = offset.wrapping_sub(skipped);
        let mut rest = bytes;
        while !rest.is_empty() {
            self.0.read(at, unit).map_err(|_| FAILED)?;
            let here = unit.get(skipped as usize..).unwrap_or_default();
            let count = here.len().min(rest.len());
            let (now, later) = rest.split_at_mut_checked(count).ok_or(FAILED)?;
            for (to, from) in now.iter_mut().zip(here) {
                *to = *from;
            }
            (rest, skipped, at) = (later, 0, at.wrapping_add(size));
        }
        Ok(())
    }

    fn write(&mut self, offset: u32, bytes: &[u8]) -> Result<(), Error> {
        self.0.write(offset, bytes).map_err(|_| FAILED)
    }

    fn erase(&mut self, offset: u32, length: u32) -> Result<bool, Error> {
        self.0.erase(offset, offset.wrapping_add(length)).map_err(|_| FAILED)?;
        Ok(true)
    }
}

const FAILED: Error = Error::new(Cause::Storage, 0);
