//! A save is cut off at every byte, erase and bit: then the record before is there, or the new one, whole.

use super::samples::*;
use super::store::SLOTS;
use fieldstop::profile::{Newer, Record, SlotPair, Storage, load, save};
use fieldstop::{Cause, Error};

#[derive(Clone, Copy, Debug, PartialEq)]
pub enum Kind {
    /// Each byte is written over on its own.
    Eeprom,
    /// NOR flash: pages of 128 bytes are erased to 0xFF, units of so many bytes are written once after that.
    Flash(u8),
}

const PAGE: usize = 128;

impl Kind {
    pub fn slots(self, slots: SlotPair) -> SlotPair {
        match self {
            Kind::Eeprom => slots,
            Kind::Flash(write_bytes) => SlotPair { first: 0, second: 512, write_bytes, ..slots },
        }
    }
}

/// A storage whose power fails after so many steps; a step is a byte written or a byte erased.
#[derive(Clone)]
pub struct Model {
    kind: Kind,
    pub bytes: Vec<u8>,
    /// Units that may be written: erased, and not written since.
    blank: Vec<bool>,
    steps_left: Option<usize>,
    /// Where the power failed, and what would have come there.
    cut: Option<(usize, u8)>,
    /// What must not be touched.
    sacred: std::ops::Range<usize>,
}

const POWER_FAILED: Error = Error::new(Cause::Storage, 0);

impl Model {
    pub fn new(kind: Kind) -> Model {
        Model {
            kind,
            bytes: vec![0xFF; 1088],
            blank: vec![false; 1088],
            steps_left: None,
            cut: None,
            sacred: 0..0,
        }
    }

    fn put(&mut self, at: usize, byte: u8) -> Result<(), Error> {
        assert!(!self.sacred.contains(&at), "byte {at} belongs to the last good record");
        if self.steps_left == Some(0) {
            self.cut.get_or_insert((at, byte));
            return Err(POWER_FAILED);
        }
        if let Some(left) = &mut self.steps_left {
            *left -= 1;
        }
        self.bytes[at] = byte;
        Ok(())
    }
}

impl Storage for Model {
    fn read(&mut self, offset: u32, bytes: &mut [u8]) -> Result<(), Error> {
        if self.cut.is_some() {
            return Err(POWER_FAILED);
        }
        bytes.copy_from_slice(&self.bytes[offset as usize..][..bytes.len()]);
        Ok(())
    }

    fn write(&mut self, offset: u32, bytes: &[u8]) -> Result<(), Error> {
        let start = offset as usize;
        assert!(!bytes.is_empty() && start % 32 + bytes.len() <= 32);
        if let Kind::Flash(unit) = self.kind {
            let unit = usize::from(unit);
            assert_eq!((start % unit, bytes.len() % unit), (0, 0), "not whole write units");
            let here = start..start + bytes.len();
            assert!(self.blank[here.clone()].iter().all(|blank| *blank), "a unit written twice at {here:?}");
            self.blank[here].fill(false);
        }
        bytes.iter().enumerate().try_for_each(|(i, byte)| self.put(start + i, *byte))
    }

    fn erase(&mut self, offset: u32, length: u32) -> Result<bool, Error> {
        if self.kind == Kind::Eeprom {
            return Ok(false);
        }
        let (start, length) = (offset as usize, length as usize);
        assert_eq!((start % PAGE, length % PAGE), (0, 0), "not whole pages");
        for at in start..start + length {
            self.put(at, 0xFF)?;
            self.blank[at] = true;
        }
        Ok(true)
    }
}

fn loaded(storage: &Model, slots: &SlotPair) -> Result<Vec<u8>, Error> {
    let mut storage = storage.clone();
    (storage.steps_left, storage.cut) = (None, None);
    let mut buffer = [0; Record::MOST];
    load(&mut storage, slots, &mut buffer).map(|record| record.bytes().to_vec())
}

fn try_save(storage: &mut Model, slots: &SlotPair, bytes: &[u8]) -> Result<(), Error> {
    save(storage, slots, &Record::check(bytes).unwrap(), Newer::Keep)
}

/// A reproducible row of numbers (Marsaglia 2003, xorshift).
struct Random(u32);

impl Random {
    fn next(&mut self) -> u32 {
        for (left, by) in [(true, 13), (false, 17), (true, 5)] {
            self.0 ^= if left { self.0 << by } else { self.0 >> by };
        }
        self.0
    }
}

/// The slot with the last good record.
fn sacred(storage: &Model, slots: &SlotPair, last: &Result<Vec<u8>, Error>) -> std::ops::Range<usize> {
    let Ok(last) = last else { return 0..0 };
    let starts = [slots.first as usize, slots.second as usize];
    let start = starts.into_iter().find(|start| storage.bytes[*start..].starts_with(last)).unwrap();
    start..start + slots.bytes as usize
}

/// After a cut: what is loaded, for each value that the byte being written may have; then the next save works.
fn survives(cut: &Model, slots: &SlotPair, old: &Result<Vec<u8>, Error>, new: &[u8], exhaustive: bool) {
    let (at, coming) = cut.cut.unwrap();
    let there = cut.bytes[at];
    let mut torn = cut.clone();
    for value in 0..=255u8 {
        // Flash goes from the one value to the other bit by bit; EEPROM may be anywhere between.
        let possible = match cut.kind {
            Kind::Eeprom => exhaustive || [0, 0xFF, there, coming].contains(&value),
            Kind::Flash(_) => {
                value & (there & coming) == there & coming && value | there | coming == there | coming
            }
        };
        if !possible {
            continue;
        }
        torn.bytes[at] = value;
        let last = loaded(&torn, slots);
        // Its last byte makes it.
        let made = last.as_deref() == Ok(new);
        assert!(last == *old || made, "byte {at} with {value:#04x}: {last:?}");
        assert!(!made || value == coming, "byte {at} with {value:#04x}");
    }
}

fn cut_everywhere(kind: Kind, counts: &[[u8; 6]], exhaustive: bool) {
    let slots = kind.slots(SLOTS);
    let mut storage = Model::new(kind);
    let mut cuts = 0;
    for (n, counts) in counts.iter().enumerate() {
        let mut new = record(*counts);
        new[8..12].copy_from_slice(&(n as u32 + 1).to_le_bytes());
        let old = loaded(&storage, &slots);
        let sacred = sacred(&storage, &slots, &old);
        let expected = {
            let mut whole = storage.clone();
            try_save(&mut whole, &slots, &record(*counts)).unwrap();
            loaded(&whole, &slots).unwrap()
        };
        for steps in 0.. {
            let mut cut = storage.clone();
            (cut.steps_left, cut.sacred) = (Some(steps), sacred.clone());
            if try_save(&mut cut, &slots, &record(*counts)).is_ok() {
                assert!(steps > expected.len(), "{kind:?}: a save of {steps} steps");
                break;
            }
            survives(&cut, &slots, &old, &expected, exhaustive);
            cuts += 1;
            if steps % 13 == 0 {
                again(&cut, &slots, &old, &expected);
            }
        }
        try_save(&mut storage, &slots, &record(*counts)).unwrap();
        assert_eq!(loaded(&storage, &slots).unwrap(), expected);
    }
    println!("{kind:?}: the power cut at {cuts} places");
}

/// After a cut the next save is cut too, now and then, and the one after that goes through.
fn again(cut: &Model, slots: &SlotPair, old: &Result<Vec<u8>, Error>, new: &[u8]) {
    let mut storage = cut.clone();
    storage.cut = None;
    for steps in (0..600).step_by(41).map(Some).chain([None]) {
        storage.steps_left = steps;
        let last = loaded(&storage, slots);
        assert!(last == *old || last.as_deref() == Ok(new));
        storage.sacred = sacred(&storage, slots, &last);
        let saved = try_save(&mut storage, slots, new);
        storage.cut = None;
        if saved.is_ok() {
            let now = loaded(&storage, slots).unwrap();
            assert_eq!(now[12..now.len() - 4], new[12..new.len() - 4]);
            return;
        }
    }
    panic!("no save went through");
}

/// Growing, shrinking, equal but for a number, and of every kind.
const SAVES: [[u8; 6]; 5] =
    [[1, 1, 0, 0, 0, 1], [1, 2, 0, 0, 0, 1], [1, 2, 0, 0, 0, 1], [1; 6], [0, 1, 0, 0, 0, 0]];

#[test]
fn eeprom_cut_at_every_byte_with_every_value() {
    cut_everywhere(Kind::Eeprom, &SAVES, true);
}

#[test]
fn longer_records_in_eeprom_cut_at_every_byte() {
    cut_everywhere(Kind::Eeprom, &[[1, 8, 2, 0, 1, 1], [2, 8, 2, 1, 1, 1], [1, 1, 1, 1, 1, 1]], false);
}

#[test]
fn flash_cut_at_every_byte_with_every_bit_of_it() {
    for unit in [1, 2, 4, 8, 16, 32] {
        cut_everywhere(Kind::Flash(unit), &SAVES, true);
    }
}

/// A unit of flash is programmed as a whole: any of its bits may be there.
#[test]
fn flash_cut_in_the_midst_of_a_unit() {
    let mut random = Random(0x9E37_79B9);
    for unit in [2u8, 4, 8, 16, 32] {
        let slots = Kind::Flash(unit).slots(SLOTS);
        let mut storage = Model::new(Kind::Flash(unit));
        try_save(&mut storage, &slots, &record([1, 1, 0, 0, 0, 0])).unwrap();
        let old = loaded(&storage, &slots);
        let mut whole = storage.clone();
        try_save(&mut whole, &slots, &record([1; 6])).unwrap();
        let new = loaded(&whole, &slots).unwrap();
        let first = &new[..usize::from(unit)];
        for n in 0..40_000u32 {
            let mut torn = whole.clone();
            // Few bits missing, or many, or all in the bytes behind the magic ones.
            for (at, byte) in first.iter().enumerate() {
                let mut missing = random.next() as u8;
                for _ in 0..n % 5 {
                    missing &= random.next() as u8;
                }
                if at >= 4 || n % 3 > 0 {
                    torn.bytes[slots.second as usize + at] = byte | missing;
                }
            }
            let last = loaded(&torn, &slots);
            let is_new = torn.bytes == whole.bytes;
            assert_eq!(last.as_deref().ok(), if is_new { Some(&new[..]) } else { old.as_deref().ok() });
        }
    }
}

/// An erase that went half way: any bits of the old record are ones.
#[test]
fn half_erased_slot_is_no_record() {
    let kind = Kind::Flash(8);
    let slots = kind.slots(SLOTS);
    let mut storage = Model::new(kind);
    for counts in [[1, 1, 0, 0, 0, 0], [1, 2, 0, 0, 0, 1]] {
        try_save(&mut storage, &slots, &record(counts)).unwrap();
    }
    let last = loaded(&storage, &slots).unwrap();
    let mut random = Random(0x1234_5678);
    for n in 0..60_000u32 {
        let mut torn = storage.clone();
        for byte in &mut torn.bytes[..512] {
            let mut erased = random.next() as u8;
            for _ in 0..n % 8 {
                erased &= random.next() as u8;
            }
            *byte |= erased;
        }
        assert_eq!(loaded(&torn, &slots).as_deref(), Ok(&last[..]), "{n}");
    }
}

/// Damage to the slots later on: the last record that is whole, or none, and never another.
#[test]
fn damaged_slots_give_the_other_record_or_none() {
    let slots = SLOTS;
    let mut storage = Model::new(Kind::Eeprom);
    let mut records = Vec::new();
    for counts in [[1, 1, 0, 0, 0, 1], [1, 2, 0, 0, 0, 1]] {
        try_save(&mut storage, &slots, &record(counts)).unwrap();
        records.push(loaded(&storage, &slots).unwrap());
    }
    let (old, new) = (&records[0], &records[1]);
    let starts = [slots.first as usize, slots.second as usize];
    let none = Err(Error::new(Cause::NoRecord, 0));
    for bit in 0..new.len() * 8 {
        let mut torn = storage.clone();
        torn.bytes[starts[1] + bit / 8] ^= 1 << (bit % 8);
        assert_eq!(loaded(&torn, &slots).as_ref(), Ok(old), "bit {bit}");
        for other in (bit % 7..old.len() * 8).step_by(97) {
            let mut both = torn.clone();
            both.bytes[starts[0] + other / 8] ^= 1 << (other % 8);
            assert_eq!(loaded(&both, &slots), none, "bits {bit} and {other}");
        }
    }
    for bit in 0..old.len() * 8 {
        let mut torn = storage.clone();
        torn.bytes[starts[0] + bit / 8] ^= 1 << (bit % 8);
        assert_eq!(loaded(&torn, &slots).as_ref(), Ok(new), "bit {bit}");
    }
    // Bursts across the two.
    for fill in [0, 0xFF] {
        for start in (0..1088).step_by(3) {
            for end in (start..=1088).step_by(5) {
                let mut torn = storage.clone();
                torn.bytes[start..end].fill(fill);
                let whole = |at: usize, of: &[u8]| torn.bytes[at..].starts_with(of);
                let expected = match (whole(starts[0], old), whole(starts[1], new)) {
                    (_, true) => Ok(new),
                    (true, false) => Ok(old),
                    (false, false) => Err(&Error::new(Cause::NoRecord, 0)),
                };
                assert_eq!(loaded(&torn, &slots).as_ref(), expected, "{start}..{end} with {fill}");
            }
        }
    }
}

#[test]
fn pairs_of_damaged_bytes_give_no_other_record() {
    let slots = SLOTS;
    let mut storage = Model::new(Kind::Eeprom);
    for counts in [[1, 1, 0, 0, 0, 1], [1, 2, 0, 0, 0, 1]] {
        try_save(&mut storage, &slots, &record(counts)).unwrap();
    }
    let new = loaded(&storage, &slots).unwrap();
    let start = slots.second as usize;
    let mut random = Random(77);
    for one in 0..new.len() {
        for other in 0..one {
            for _ in 0..8 {
                let mut torn = storage.clone();
                let numbers = random.next();
                torn.bytes[start + one] ^= (numbers as u8).max(1);
                torn.bytes[start + other] ^= ((numbers >> 8) as u8).max(1);
                assert_ne!(loaded(&torn, &slots).as_deref(), Ok(&new[..]));
                assert_eq!(loaded(&torn, &slots).unwrap()[8..12], [1, 0, 0, 0]);
            }
        }
    }
}
