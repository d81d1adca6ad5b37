use super::crc::Crc;
use super::entry::{ENTRY, Entry, Equipment, KINDS, Kind, SIZES};
use super::header::{CHECKSUM, HEADER, Header, InUse, VERSION};
use super::name::EquipmentName;
use crate::setup::{Camera, Eyepiece, Observer, Site, Telescope};
use crate::status::{Cause, Error};
use crate::units::Q16;

/// A good record, where it lies: its accessors decode the members.
///
/// ```
/// use fieldstop::profile::{Editor, EquipmentName, Record};
/// use fieldstop::setup::Eyepiece;
///
/// let mut buffer = [0; 64];
/// let mut editor = Editor::empty(&mut buffer)?;
/// let eyepiece = Eyepiece { focal_length_um: 12_500, field_stop_um: 13_700, ..Eyepiece::default() };
/// editor.put_eyepiece(0, &eyepiece, &EquipmentName::new(b"Narrow 12.5")?)?;
///
/// let record = Record::check(&buffer)?;
/// assert_eq!(record.bytes().len(), 53);
/// assert_eq!(record.eyepiece(0), Some(eyepiece));
/// assert_eq!(record.eyepiece(1), None);
/// # Ok::<(), fieldstop::Error>(())
/// ```
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub struct Record<'a> {
    bytes: &'a [u8],
}

impl<'a> Record<'a> {
    /// Bytes of a record without entries.
    pub const LEAST: usize = HEADER + CHECKSUM;
    /// Bytes of the longest record.
    pub const MOST: usize = 976;

    /// The record at the front of these bytes; more may follow it.
    ///
    /// # Errors
    ///
    /// [`Cause::NoRecord`] (1): damaged, cut short, or none. [`Cause::NewerRecord`] (1): whole, but of a version that
    /// this one cannot read.
    pub fn check(bytes: &'a [u8]) -> Result<Record<'a>, Error> {
        let room = u32::try_from(bytes.len()).unwrap_or(u32::MAX);
        match inspect(&mut InMemory(bytes), room)? {
            Some(found) if found.version > VERSION => Err(Error::new(Cause::NewerRecord, 1)),
            Some(found) => Record::of_length(bytes, found.length),
            None => Err(Error::new(Cause::NoRecord, 1)),
        }
    }

    /// What has the outline of a record; that the bytes within are good was seen before.
    pub(crate) fn outline(bytes: &'a [u8]) -> Result<Record<'a>, Error> {
        let room = u32::try_from(bytes.len()).unwrap_or(u32::MAX);
        let header = Header::decode(bytes);
        if !header.is_framed(room) {
            return Err(Error::new(Cause::NoRecord, 1));
        }
        if header.version > VERSION {
            return Err(Error::new(Cause::NewerRecord, 1));
        }
        if !header.is_consistent() {
            return Err(Error::new(Cause::NoRecord, 1));
        }
        Record::of_length(bytes, header.length)
    }

    fn of_length(bytes: &'a [u8], length: u16) -> Result<Record<'a>, Error> {
        let bytes = bytes.get(..usize::from(length)).ok_or(Error::new(Cause::NoRecord, 1))?;
        Ok(Record { bytes })
    }

    /// The record's own bytes.
    pub const fn bytes(&self) -> &'a [u8] {
        self.bytes
    }

    /// The version of its format.
    pub fn version(&self) -> u16 {
        self.header().version
    }

    /// How often it has been saved, modulo 2^32.
    pub fn sequence(&self) -> u32 {
        self.header().sequence
    }

    /// How many entries of a kind there are.
    pub fn count(&self, kind: Kind) -> u8 {
        self.header().count(kind)
    }

    /// Which entries are in use.
    pub fn in_use(&self) -> InUse {
        InUse::of_array(self.header().in_use)
    }

    /// The name of an entry, if there is one of that index.
    pub fn name(&self, kind: Kind, index: u8) -> Option<EquipmentName> {
        self.entry(kind, index).map(|entry| entry.name)
    }

    /// A telescope, if there is one of that index.
    pub fn telescope(&self, index: u8) -> Option<Telescope> {
        self.get(index)
    }

    /// An eyepiece, if there is one of that index.
    pub fn eyepiece(&self, index: u8) -> Option<Eyepiece> {
        self.get(index)
    }

    /// What a Barlow or reducer multiplies the focal length by, if there is one of that index.
    pub fn amplifier(&self, index: u8) -> Option<Q16> {
        self.get(index)
    }

    /// A camera, if there is one of that index.
    pub fn camera(&self, index: u8) -> Option<Camera> {
        self.get(index)
    }

    /// An observer, if there is one of that index.
    pub fn observer(&self, index: u8) -> Option<Observer> {
        self.get(index)
    }

    /// A site, if there is one of that index.
    pub fn site(&self, index: u8) -> Option<Site> {
        self.get(index)
    }

    pub(super) fn header(&self) -> Header {
        Header::decode(self.bytes)
    }

    pub(crate) fn get<T: Equipment>(&self, index: u8) -> Option<T> {
        self.entry(T::KIND, index).map(|entry| T::decode(&entry.body))
    }

    fn entry(&self, kind: Kind, index: u8) -> Option<Entry> {
        let header = self.header();
        if index >= header.count(kind) {
            return None;
        }
        let bytes = self.bytes.get(header.place(kind, index)..)?;
        bytes.get(..usize::from(kind.size())).map(Entry::of)
    }
}

/// What gives the bytes of a record, from memory or from storage.
pub(super) trait Source {
    fn read(&mut self, at: u16, bytes: &mut [u8]) -> Result<(), Error>;
}

struct InMemory<'a>(&'a [u8]);

impl Source for InMemory<'_> {
    fn read(&mut self, at: u16, bytes: &mut [u8]) -> Result<(), Error> {
        let from = self.0.get(usize::from(at)..).unwrap_or_default();
        for (to, from) in bytes.iter_mut().zip(from) {
            *to = *from;
        }
        Ok(())
    }
}

/// A record that is good, or whole and newer.
#[derive(Clone, Copy, PartialEq)]
pub(super) struct Found {
    pub(super) version: u16,
    pub(super) length: u16,
    pub(super) sequence: u32,
    pub(super) checksum: u32,
}

/// Reads through what may be a record, once, a few bytes at a time. An error is the source's.
pub(super) fn inspect(source: &mut impl Source, room: u32) -> Result<Option<Found>, Error> {
    if room < (HEADER + CHECKSUM) as u32 {
        return Ok(None);
    }
    let mut buffer = [0; HEADER];
    source.read(0, &mut buffer)?;
    let mut crc = Crc::new();
    crc.add(&buffer);
    let header = Header::decode(&buffer);
    let is_ours = header.version == VERSION;
    if !header.is_framed(room) || is_ours && !header.is_consistent() {
        return Ok(None);
    }
    let counts = if is_ours { header.counts } else { [0; KINDS] };
    let mut at = HEADER as u16;
    let mut is_good = true;
    let mut buffer = [0; ENTRY];
    for (kind, (count, size)) in (0..KINDS as u8).zip(counts.into_iter().zip(SIZES.iter())) {
        let entry = buffer.get_mut(..usize::from(size)).unwrap_or_default();
        for _ in 0..count {
            source.read(at, entry)?;
            crc.add(entry);
            is_good &= Entry::of(entry).is_good(kind);
            at = at.wrapping_add(size.into());
        }
    }
    // What a newer version has there; of ours nothing is left.
    let end = header.length.wrapping_sub(CHECKSUM as u16);
    while at < end {
        let size = end.wrapping_sub(at).min(ENTRY as u16);
        let bytes = buffer.get_mut(..usize::from(size)).unwrap_or_default();
        source.read(at, bytes)?;
        crc.add(bytes);
        at = at.wrapping_add(size);
    }
    let mut checksum = [0; CHECKSUM];
    source.read(end, &mut checksum)?;
    let Header { version, length, sequence, .. } = header;
    let checksum = u32::from_le_bytes(checksum);
    is_good &= checksum == crc.value();
    Ok(is_good.then_some(Found { version, length, sequence, checksum }))
}
