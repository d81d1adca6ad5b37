use super::crc::Crc;
use super::header::{CHECKSUM, HEADER, Header, VERSION};
use super::record::{Found, Record, Source, inspect};
use crate::status::{Cause, Error};

/// Where records can be kept: EEPROM, FRAM, flash, a file.
///
/// A function that fails says so by an error, as a rule `Error::new(Cause::Storage, 0)`; it ends the call that asked.
/// Where the part reports that bytes are damaged (flash with an error-correcting code, after a torn write), `read`
/// gives zeros in their place and no error: the record's checksum does the rest.
pub trait Storage {
    /// Fills `bytes` from `offset` on. Any offset and length within a slot may be asked for.
    ///
    /// # Errors
    ///
    /// The bytes could not be read.
    fn read(&mut self, offset: u32, bytes: &mut [u8]) -> Result<(), Error>;

    /// Writes `bytes` from `offset` on: whole write units, at most 32 bytes, and never across a multiple of 32 bytes
    /// from the slot's start.
    ///
    /// # Errors
    ///
    /// The bytes could not be written.
    fn write(&mut self, offset: u32, bytes: &[u8]) -> Result<(), Error>;

    /// Erases a whole slot, and tells `true`; `false` where bytes can be written over as they are.
    ///
    /// # Errors
    ///
    /// The slot could not be erased.
    fn erase(&mut self, offset: u32, length: u32) -> Result<bool, Error> {
        let _ = (offset, length);
        Ok(false)
    }
}

/// Two places for a record in a storage.
///
/// Where the storage must be erased, both begin and end where its erase units do.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct SlotPair {
    /// Member 1. Where the first begins; a multiple of `write_bytes`.
    pub first: u32,
    /// Member 2. Where the second begins; a multiple of `write_bytes`, and not within the first.
    pub second: u32,
    /// Member 3. Bytes of each; a multiple of `write_bytes`, and at least 28.
    pub bytes: u32,
    /// Member 4. Bytes that the storage writes at once: 1, 2, 4, 8, 16 or 32.
    pub write_bytes: u8,
    /// Ignored.
    pub padding: [u8; 3],
}

impl SlotPair {
    /// The first bad member: its number is the error's argument.
    ///
    /// # Errors
    ///
    /// [`Cause::OutOfRange`]: what the members' documentation says, and a slot (1, 2) that ends beyond 2^32.
    pub const fn check(&self) -> Result<(), Error> {
        let unit = self.write_bytes as u32;
        let rest = unit.wrapping_sub(1);
        if self.first & rest != 0 || self.first.checked_add(self.bytes).is_none() {
            return Err(Error::new(Cause::OutOfRange, 1));
        }
        let apart = self.first.abs_diff(self.second);
        if self.second & rest != 0 || self.second.checked_add(self.bytes).is_none() || apart < self.bytes {
            return Err(Error::new(Cause::OutOfRange, 2));
        }
        if self.bytes & rest != 0 || self.bytes < (HEADER + CHECKSUM) as u32 {
            return Err(Error::new(Cause::OutOfRange, 3));
        }
        if unit & rest != 0 || unit == 0 || unit > CHUNK as u32 {
            return Err(Error::new(Cause::OutOfRange, 4));
        }
        Ok(())
    }
}

/// What to do about a good record of a newer version.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
pub enum Newer {
    /// Refuse to save.
    #[default]
    Keep,
    /// Save over it.
    Replace,
}

/// The last good record, read into the front of the buffer.
///
/// # Errors
///
/// [`Cause::OutOfRange`] (2): [`SlotPair::check`] refuses. [`Cause::NoRecord`]: neither slot has a good one.
/// [`Cause::NewerRecord`]: the last good one is of a newer version. [`Cause::NoRoom`] (3): it is longer than the
/// buffer. [`Cause::Storage`], or what the storage gives: it could not be read, or did not give the same bytes twice;
/// only then the buffer's bytes may have changed.
pub fn load<'a>(
    storage: &mut impl Storage,
    slots: &SlotPair,
    buffer: &'a mut [u8],
) -> Result<Record<'a>, Error> {
    let (first, second) = look(storage, slots)?;
    let (slot, found) = match newest(first, second) {
        Some((false, found)) => (slots.first, found),
        Some((true, found)) => (slots.second, found),
        None => return Err(Error::new(Cause::NoRecord, 0)),
    };
    if found.version > VERSION {
        return Err(Error::new(Cause::NewerRecord, 0));
    }
    let bytes = buffer.get_mut(..usize::from(found.length)).ok_or(Error::new(Cause::NoRoom, 3))?;
    storage.read(slot, bytes)?;
    match Record::check(bytes) {
        Ok(record) if record.sequence() == found.sequence => Ok(record),
        _ => Err(UNRELIABLE),
    }
}

/// Saves a record into the slot that does not have the last good one, with the next sequence number. Until its last
/// write the other record is the last good one, from then on this is.
///
/// The bytes given are not changed, and their sequence number does not matter. At the end the slot is read again.
///
/// # Errors
///
/// [`Cause::OutOfRange`] (2): [`SlotPair::check`] refuses. [`Cause::NoRoom`] (3): the record is longer than a slot.
/// [`Cause::NewerRecord`]: a slot has a good record of a newer version, and `newer` does not say to replace it.
/// [`Cause::Storage`], or what the storage gives: it could not be read, erased or written, or does not read as
/// written; the last good record is still there.
pub fn save(
    storage: &mut impl Storage,
    slots: &SlotPair,
    record: &Record<'_>,
    newer: Newer,
) -> Result<(), Error> {
    let (first, second) = look(storage, slots)?;
    let header = record.header();
    let length = u32::from(header.length);
    if length > slots.bytes {
        return Err(Error::new(Cause::NoRoom, 3));
    }
    let is_newer = |found: Option<Found>| found.is_some_and(|found| found.version > VERSION);
    if newer == Newer::Keep && (is_newer(first) || is_newer(second)) {
        return Err(Error::new(Cause::NewerRecord, 0));
    }
    let (slot, sequence) = match newest(first, second) {
        Some((false, found)) => (slots.second, found.sequence.wrapping_add(1)),
        Some((true, found)) => (slots.first, found.sequence.wrapping_add(1)),
        None => (slots.first, 1),
    };
    let image = Image::of(record, &Header { sequence, ..header });
    // The magic bytes go first and come last: between the two there is nothing that could be taken for a record.
    let unit = usize::from(slots.write_bytes);
    if !storage.erase(slot, slots.bytes)? {
        let zeros = [0; CHUNK];
        storage.write(slot, zeros.get(..unit).unwrap_or_default())?;
    }
    let length = usize::from(header.length);
    let mut at = unit;
    while at < length {
        let chunk = (CHUNK - (at & (CHUNK - 1))).min(length - at);
        image.write(storage, slot, at, chunk, unit)?;
        at += chunk;
    }
    image.write(storage, slot, 0, unit.min(length), unit)?;
    let written = inspect(&mut Slot { storage, at: slot }, slots.bytes)?;
    let is_right = |found: Found| found.sequence == sequence && found.checksum == image.checksum();
    if written.is_some_and(is_right) { Ok(()) } else { Err(UNRELIABLE) }
}

const UNRELIABLE: Error = Error::new(Cause::Storage, 0);
/// The most bytes of a write.
const CHUNK: usize = 32;

struct Slot<'a, S> {
    storage: &'a mut S,
    at: u32,
}

impl<S: Storage> Source for Slot<'_, S> {
    fn read(&mut self, at: u16, bytes: &mut [u8]) -> Result<(), Error> {
        self.storage.read(self.at.wrapping_add(at.into()), bytes)
    }
}

/// What each slot has. A read that fails is no reason to take the other for the last.
fn look(storage: &mut impl Storage, slots: &SlotPair) -> Result<(Option<Found>, Option<Found>), Error> {
    slots.check().map_err(|error| Error::new(error.cause(), 2))?;
    let first = inspect(&mut Slot { storage, at: slots.first }, slots.bytes)?;
    let second = inspect(&mut Slot { storage, at: slots.second }, slots.bytes)?;
    Ok((first, second))
}

/// The newer of two, and whether it is the second. A sequence number is after another if it is less than 2^31 steps
/// on, wrapping; where neither is after the other, the first counts.
fn newest(first: Option<Found>, second: Option<Found>) -> Option<(bool, Found)> {
    match (first, second) {
        (Some(a), Some(b)) if b.sequence.wrapping_sub(a.sequence).cast_signed() > 0 => Some((true, b)),
        (Some(a), _) => Some((false, a)),
        (None, Some(b)) => Some((true, b)),
        (None, None) => None,
    }
}

/// A record as it is to be written, with another header.
struct Image<'a> {
    header: [u8; HEADER],
    entries: &'a [u8],
    checksum: [u8; CHECKSUM],
}

impl<'a> Image<'a> {
    fn of(record: &Record<'a>, header: &Header) -> Image<'a> {
        let header = header.encode();
        let entries = record.bytes().split_last_chunk::<CHECKSUM>().map_or(&[][..], |(bytes, _)| bytes);
        let entries = entries.get(HEADER..).unwrap_or_default();
        let mut crc = Crc::new();
        crc.add(&header);
        crc.add(entries);
        Image { header, entries, checksum: crc.value().to_le_bytes() }
    }

    const fn checksum(&self) -> u32 {
        u32::from_le_bytes(self.checksum)
    }

    /// Writes so many bytes from `at` on, and as many ones behind them as fill the write unit.
    fn write(
        &self,
        storage: &mut impl Storage,
        slot: u32,
        at: usize,
        count: usize,
        unit: usize,
    ) -> Result<(), Error> {
        let mut chunk = [0xFF; CHUNK];
        let whole = self.header.iter().chain(self.entries).chain(&self.checksum);
        for (to, from) in chunk.iter_mut().zip(whole.skip(at).take(count)) {
            *to = *from;
        }
        let rest = unit.wrapping_sub(1);
        let units = (count.wrapping_add(rest)) & !rest;
        storage.write(slot.wrapping_add(at as u32), chunk.get(..units).unwrap_or_default())
    }
}
