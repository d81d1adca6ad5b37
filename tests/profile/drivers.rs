//! Records over the traits of `embedded-storage`.

use super::samples::*;
use embedded_storage::nor_flash::{
    ErrorType, NorFlash, NorFlashError, NorFlashErrorKind, ReadNorFlash, check_erase, check_read, check_write,
};
use embedded_storage::{ReadStorage, Storage};
use fieldstop::profile::{Newer, OfFlash, OfStorage, Record, SlotPair, load, save};
use fieldstop::{Cause, Error};

struct Eeprom([u8; 1024]);

impl ReadStorage for Eeprom {
    type Error = ();
    fn read(&mut self, offset: u32, bytes: &mut [u8]) -> Result<(), ()> {
        let end = offset as usize + bytes.len();
        bytes.copy_from_slice(self.0.get(offset as usize..end).ok_or(())?);
        Ok(())
    }
    fn capacity(&self) -> usize {
        1024
    }
}

impl Storage for Eeprom {
    fn write(&mut self, offset: u32, bytes: &[u8]) -> Result<(), ()> {
        let end = offset as usize + bytes.len();
        self.0.get_mut(offset as usize..end).ok_or(())?.copy_from_slice(bytes);
        Ok(())
    }
}

#[derive(Debug)]
struct Refused(NorFlashErrorKind);

impl NorFlashError for Refused {
    fn kind(&self) -> NorFlashErrorKind {
        self.0
    }
}

/// Pages of 512 bytes.
struct Flash<const READ: usize, const WRITE: usize>(Vec<u8>);

impl<const READ: usize, const WRITE: usize> ErrorType for Flash<READ, WRITE> {
    type Error = Refused;
}

impl<const READ: usize, const WRITE: usize> ReadNorFlash for Flash<READ, WRITE> {
    const READ_SIZE: usize = READ;
    fn read(&mut self, offset: u32, bytes: &mut [u8]) -> Result<(), Refused> {
        check_read(self, offset, bytes.len()).map_err(Refused)?;
        bytes.copy_from_slice(&self.0[offset as usize..][..bytes.len()]);
        Ok(())
    }
    fn capacity(&self) -> usize {
        self.0.len()
    }
}

impl<const READ: usize, const WRITE: usize> NorFlash for Flash<READ, WRITE> {
    const WRITE_SIZE: usize = WRITE;
    const ERASE_SIZE: usize = 512;
    fn erase(&mut self, from: u32, to: u32) -> Result<(), Refused> {
        check_erase(self, from, to).map_err(Refused)?;
        self.0[from as usize..to as usize].fill(0xFF);
        Ok(())
    }
    fn write(&mut self, offset: u32, bytes: &[u8]) -> Result<(), Refused> {
        check_write(self, offset, bytes.len()).map_err(Refused)?;
        for (cell, byte) in self.0[offset as usize..].iter_mut().zip(bytes) {
            assert_eq!(*cell, 0xFF, "written twice");
            *cell &= byte;
        }
        Ok(())
    }
}

fn keeps(storage: &mut impl fieldstop::profile::Storage, slots: &SlotPair) {
    for n in 1..6 {
        let bytes = record([1, n, 1, 1, 1, 1]);
        save(storage, slots, &Record::check(&bytes).unwrap(), Newer::Keep).unwrap();
        let mut buffer = [0; Record::MOST];
        let loaded = load(storage, slots, &mut buffer).unwrap();
        assert_eq!((loaded.sequence(), loaded.bytes()[12..24].to_vec()), (n.into(), bytes[12..24].to_vec()));
        assert_eq!(loaded.site(0), Some(site(0)));
    }
}

fn flash<const READ: usize, const WRITE: usize>() {
    let mut storage = OfFlash(Flash::<READ, WRITE>(vec![0; 2048]));
    let write_bytes = (WRITE as u8).max(4);
    keeps(&mut storage, &SlotPair { first: 512, second: 1024, bytes: 512, write_bytes, padding: [0; 3] });
}

#[test]
fn drivers_of_eeprom_keep_records() {
    let mut storage = OfStorage(Eeprom([0xA5; 1024]));
    let slots = SlotPair { first: 0, second: 512, bytes: 512, write_bytes: 1, padding: [0; 3] };
    keeps(&mut storage, &slots);
    let beyond = SlotPair { second: 800, ..slots };
    let mut buffer = [0; 64];
    let failed = Some(Error::new(Cause::Storage, 0));
    assert_eq!(load(&mut storage, &SlotPair { second: 1020, ..beyond }, &mut buffer).err(), failed);
}

#[test]
fn drivers_of_flash_keep_records_in_their_units() {
    flash::<1, 1>();
    flash::<1, 8>();
    flash::<4, 4>();
    flash::<4, 32>();
    flash::<32, 16>();
}

/// Slots that do not suit the driver are refused by it, and nothing is lost.
#[test]
fn slots_that_do_not_suit_the_driver_are_told() {
    let mut storage = OfFlash(Flash::<1, 8>(vec![0xFF; 2048]));
    let bytes = record([1; 6]);
    let record = Record::check(&bytes).unwrap();
    let slots = SlotPair { first: 0, second: 512, bytes: 512, write_bytes: 8, padding: [0; 3] };
    save(&mut storage, &slots, &record, Newer::Keep).unwrap();
    for wrong in [SlotPair { write_bytes: 1, ..slots }, SlotPair { second: 520, ..slots }] {
        let refused = save(&mut storage, &wrong, &record, Newer::Keep);
        assert_eq!(refused, Err(Error::new(Cause::Storage, 0)));
        let mut buffer = [0; 976];
        assert_eq!(load(&mut storage, &slots, &mut buffer).unwrap().sequence(), 1);
    }
}
