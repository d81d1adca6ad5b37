//! Loading and saving, with the power on.

use super::samples::*;
use super::torn::{Kind, Model};
use fieldstop::profile::{Crc, Newer, Record, SlotPair, Storage, load, save};
use fieldstop::{Cause, Error};

pub const SLOTS: SlotPair = SlotPair { first: 64, second: 576, bytes: 512, write_bytes: 1, padding: [0; 3] };

fn sealed(mut bytes: Vec<u8>) -> Vec<u8> {
    let at = bytes.len() - 4;
    let mut sum = Crc::new();
    sum.add(&bytes[..at]);
    bytes[at..].copy_from_slice(&sum.value().to_le_bytes());
    bytes
}

fn with_sequence(mut bytes: Vec<u8>, sequence: u32) -> Vec<u8> {
    bytes[8..12].copy_from_slice(&sequence.to_le_bytes());
    sealed(bytes)
}

fn of_version(mut bytes: Vec<u8>, version: u16) -> Vec<u8> {
    bytes[4..6].copy_from_slice(&version.to_le_bytes());
    sealed(bytes)
}

fn loaded(storage: &mut impl Storage, slots: &SlotPair) -> Result<Vec<u8>, Error> {
    let mut buffer = [0; Record::MOST];
    load(storage, slots, &mut buffer).map(|record| record.bytes().to_vec())
}

fn store(storage: &mut impl Storage, slots: &SlotPair, bytes: &[u8]) -> Result<(), Error> {
    save(storage, slots, &Record::check(bytes).unwrap(), Newer::Keep)
}

#[test]
fn last_saved_is_loaded() {
    for kind in [Kind::Eeprom, Kind::Flash(1), Kind::Flash(2), Kind::Flash(8), Kind::Flash(32)] {
        let slots = kind.slots(SLOTS);
        let mut storage = Model::new(kind);
        assert_eq!(loaded(&mut storage, &slots), Err(Error::new(Cause::NoRecord, 0)));
        for n in 1..9 {
            let saved = record([1, n, 0, 1, 0, 1]);
            store(&mut storage, &slots, &saved).unwrap();
            assert_eq!(loaded(&mut storage, &slots), Ok(with_sequence(saved, n.into())), "{kind:?}");
        }
    }
}

#[test]
fn later_sequence_number_wins_and_wraps() {
    let (a, b) = (record([1, 0, 0, 0, 0, 0]), record([0, 1, 0, 0, 0, 0]));
    for (first, second, second_wins) in [
        (1, 2, true),
        (2, 1, false),
        (u32::MAX, 0, true),
        (0, u32::MAX, false),
        (7, 7, false),
        (0, 0x7FFF_FFFF, true),
        (0, 0x8000_0000, false),
        (0x8000_0000, 0, false),
        (0, 0x8000_0001, false),
        (0x8000_0001, 0, true),
    ] {
        let (a, b) = (with_sequence(a.clone(), first), with_sequence(b.clone(), second));
        let mut storage = Model::new(Kind::Eeprom);
        storage.bytes[64..64 + a.len()].copy_from_slice(&a);
        storage.bytes[576..576 + b.len()].copy_from_slice(&b);
        let last = if second_wins { &b } else { &a };
        assert_eq!(loaded(&mut storage, &SLOTS).as_ref(), Ok(last), "{first:#x} {second:#x}");
        // The next goes over the other one.
        store(&mut storage, &SLOTS, &record([0, 0, 0, 1, 0, 0])).unwrap();
        let next = if second_wins { second } else { first }.wrapping_add(1);
        assert_eq!(
            loaded(&mut storage, &SLOTS),
            Ok(with_sequence(record([0, 0, 0, 1, 0, 0]), next)),
            "{first:#x} {second:#x}"
        );
        let kept = if second_wins { 576 } else { 64 };
        assert_eq!(&storage.bytes[kept..kept + last.len()], last);
    }
}

#[test]
fn newer_version_is_kept_unless_told() {
    let (ours, newer) = (record([1; 6]), of_version(with_sequence(record([2; 6]), 9), 2));
    let refused = Err(Error::new(Cause::NewerRecord, 0));
    for (sequence, loads) in [(8, false), (10, true)] {
        let mut storage = Model::new(Kind::Eeprom);
        let old = with_sequence(ours.clone(), sequence);
        storage.bytes[64..64 + old.len()].copy_from_slice(&old);
        storage.bytes[576..576 + newer.len()].copy_from_slice(&newer);
        let before = storage.bytes.clone();
        let expected = if loads { Ok(old) } else { Err(Error::new(Cause::NewerRecord, 0)) };
        assert_eq!(loaded(&mut storage, &SLOTS), expected);
        assert_eq!(store(&mut storage, &SLOTS, &ours), refused);
        assert_eq!(storage.bytes, before);
        // It is the last good one until this is.
        let ours = Record::check(&ours).unwrap();
        save(&mut storage, &SLOTS, &ours, Newer::Replace).unwrap();
        assert_eq!(
            loaded(&mut storage, &SLOTS),
            Ok(with_sequence(ours.bytes().to_vec(), if loads { 11 } else { 10 }))
        );
        let is_there = storage.bytes[576..576 + newer.len()] == newer;
        assert_eq!(is_there, !loads);
        assert_eq!(store(&mut storage, &SLOTS, ours.bytes()).is_ok(), loads);
    }
}

#[test]
fn what_does_not_fit_is_refused() {
    let mut storage = Model::new(Kind::Eeprom);
    let before = storage.bytes.clone();
    assert_eq!(store(&mut storage, &SLOTS, &record(MOST)), Err(Error::new(Cause::NoRoom, 3)));
    assert_eq!(storage.bytes, before);
    store(&mut storage, &SLOTS, &record([1; 6])).unwrap();
    let mut small = [7; 100];
    assert_eq!(load(&mut storage, &SLOTS, &mut small).err(), Some(Error::new(Cause::NoRoom, 3)));
    assert_eq!(small, [7; 100]);
}

#[test]
fn slots_are_checked() {
    let refused = |slots: SlotPair, member| {
        assert_eq!(slots.check(), Err(Error::new(Cause::OutOfRange, member)), "{slots:?}");
        let mut storage = Model::new(Kind::Eeprom);
        let before = storage.bytes.clone();
        assert_eq!(loaded(&mut storage, &slots), Err(Error::new(Cause::OutOfRange, 2)));
        assert_eq!(store(&mut storage, &slots, &record([0; 6])), Err(Error::new(Cause::OutOfRange, 2)));
        assert_eq!(storage.bytes, before);
    };
    assert_eq!(SLOTS.check(), Ok(()));
    assert_eq!(SlotPair { first: 32, write_bytes: 32, ..SLOTS }.check(), Ok(()));
    refused(SlotPair { first: 65, write_bytes: 2, ..SLOTS }, 1);
    refused(SlotPair { first: u32::MAX - 510, ..SLOTS }, 1);
    refused(SlotPair { second: 575, ..SLOTS }, 2);
    refused(SlotPair { second: 577, write_bytes: 8, ..SLOTS }, 2);
    refused(SlotPair { second: 0, ..SLOTS }, 2);
    refused(SlotPair { second: u32::MAX - 510, ..SLOTS }, 2);
    refused(SlotPair { bytes: 27, ..SLOTS }, 3);
    refused(SlotPair { bytes: 510, write_bytes: 4, ..SLOTS }, 3);
    refused(SlotPair { write_bytes: 64, ..SLOTS }, 4);
    for write_bytes in [0, 3, 128] {
        assert!(SlotPair { first: 0, second: 0x6000, bytes: 0x3000, write_bytes, ..SLOTS }.check().is_err());
    }
}

/// A storage whose functions fail, one after the other.
struct Failing {
    model: Model,
    left: u32,
}

impl Failing {
    fn step(&mut self) -> Result<(), Error> {
        self.left = self.left.checked_sub(1).ok_or(Error::new(Cause::Storage, 0))?;
        Ok(())
    }
}

impl Storage for Failing {
    fn read(&mut self, offset: u32, bytes: &mut [u8]) -> Result<(), Error> {
        self.step()?;
        self.model.read(offset, bytes)
    }
    fn write(&mut self, offset: u32, bytes: &[u8]) -> Result<(), Error> {
        self.step()?;
        self.model.write(offset, bytes)
    }
    fn erase(&mut self, offset: u32, length: u32) -> Result<bool, Error> {
        self.step()?;
        self.model.erase(offset, length)
    }
}

#[test]
fn a_failure_at_each_step_is_told_and_loses_nothing() {
    for kind in [Kind::Eeprom, Kind::Flash(8)] {
        let slots = kind.slots(SLOTS);
        let mut model = Model::new(kind);
        store(&mut model, &slots, &record([1, 2, 0, 0, 0, 1])).unwrap();
        let old = loaded(&mut model, &slots).unwrap();
        let new = with_sequence(record([1, 3, 0, 0, 1, 1]), 2);
        for left in 0.. {
            let mut storage = Failing { model: model.clone(), left };
            let saved = store(&mut storage, &slots, &new);
            let after = loaded(&mut storage.model, &slots).unwrap();
            if saved.is_ok() {
                assert_eq!(after, new);
                assert!(left > 20);
                break;
            }
            assert_eq!(saved, Err(Error::new(Cause::Storage, 0)));
            assert!(after == old || after == new, "step {left}");
        }
        for left in 0.. {
            let mut storage = Failing { model: model.clone(), left };
            match loaded(&mut storage, &slots) {
                Ok(bytes) => {
                    assert_eq!(bytes, old);
                    break;
                }
                Err(error) => assert_eq!(error, Error::new(Cause::Storage, 0)),
            }
        }
    }
}

/// A storage that does not keep what it was given.
#[test]
fn what_does_not_read_as_written_is_told() {
    struct Deaf(Model);
    impl Storage for Deaf {
        fn read(&mut self, offset: u32, bytes: &mut [u8]) -> Result<(), Error> {
            self.0.read(offset, bytes)
        }
        fn write(&mut self, _: u32, _: &[u8]) -> Result<(), Error> {
            Ok(())
        }
    }
    let mut storage = Deaf(Model::new(Kind::Eeprom));
    let unreliable = Err(Error::new(Cause::Storage, 0));
    assert_eq!(store(&mut storage, &SLOTS, &record([1; 6])), unreliable);
}

/// Different bytes at the second reading of one place.
#[test]
fn bytes_that_change_between_two_readings_are_told() {
    struct Unsteady(Model, u32);
    impl Storage for Unsteady {
        fn read(&mut self, offset: u32, bytes: &mut [u8]) -> Result<(), Error> {
            self.0.read(offset, bytes)?;
            if bytes.len() > 32 {
                bytes[self.1 as usize] ^= 1;
            }
            Ok(())
        }
        fn write(&mut self, offset: u32, bytes: &[u8]) -> Result<(), Error> {
            self.0.write(offset, bytes)
        }
    }
    let mut storage = Unsteady(Model::new(Kind::Eeprom), 9);
    store(&mut storage, &SLOTS, &record([1; 6])).unwrap();
    assert_eq!(loaded(&mut storage, &SLOTS), Err(Error::new(Cause::Storage, 0)));
}
