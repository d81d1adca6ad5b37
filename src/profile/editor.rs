use super::crc::Crc;
use super::entry::{BODY, Equipment, Kind};
use super::header::{CHECKSUM, HEADER, Header, InUse};
use super::name::EquipmentName;
use super::record::Record;
use crate::setup::{Camera, Eyepiece, Observer, Site, Telescope};
use crate::status::{Cause, Error};
use crate::units::Q16;
use core::cell::Cell;

/// Writes a record where it lies; after each call the buffer holds a good one. A refused call changes nothing.
pub struct Editor<'a> {
    buffer: &'a mut [u8],
}

const NO_ROOM: Error = Error::new(Cause::NoRoom, 0);

impl<'a> Editor<'a> {
    /// A record without entries, at the front of the buffer.
    ///
    /// # Errors
    ///
    /// [`Cause::NoRoom`] (1): under 28 bytes.
    pub fn empty(buffer: &'a mut [u8]) -> Result<Editor<'a>, Error> {
        if buffer.len() < HEADER + CHECKSUM {
            return Err(Error::new(Cause::NoRoom, 1));
        }
        let mut editor = Editor { buffer };
        let header = Header::empty();
        editor.seal(&header);
        Ok(editor)
    }

    /// The good record at the front of the buffer.
    ///
    /// # Errors
    ///
    /// Those of [`Record::check`].
    pub fn open(buffer: &'a mut [u8]) -> Result<Editor<'a>, Error> {
        Record::check(buffer)?;
        Ok(Editor { buffer })
    }

    /// As [`Editor::open`], where the record was checked before.
    #[cfg(feature = "capi")]
    pub(crate) fn reopen(buffer: &'a mut [u8]) -> Result<Editor<'a>, Error> {
        Record::outline(buffer)?;
        Ok(Editor { buffer })
    }

    /// The record as it is now.
    ///
    /// # Errors
    ///
    /// None, as long as this editor has the buffer.
    pub fn record(&self) -> Result<Record<'_>, Error> {
        Record::outline(self.buffer)
    }

    /// Replaces the telescope of that index, or adds one where the index is their number.
    ///
    /// # Errors
    ///
    /// [`Cause::OutOfRange`] (1): a greater index, or no more of them in a record. The cause of
    /// [`Telescope::check`] (2). [`Cause::OutOfRange`] (3): a name with bytes behind a zero. [`Cause::NoRoom`]: the
    /// buffer is too small.
    pub fn put_telescope(
        &mut self,
        index: u8,
        telescope: &Telescope,
        name: &EquipmentName,
    ) -> Result<(), Error> {
        self.put(index, telescope, name)
    }

    /// Replaces the eyepiece of that index, or adds one where the index is their number.
    ///
    /// # Errors
    ///
    /// As [`Editor::put_telescope`], with [`Eyepiece::check`].
    pub fn put_eyepiece(
        &mut self,
        index: u8,
        eyepiece: &Eyepiece,
        name: &EquipmentName,
    ) -> Result<(), Error> {
        self.put(index, eyepiece, name)
    }

    /// Replaces the Barlow or reducer of that index, or adds one where the index is their number.
    ///
    /// # Errors
    ///
    /// As [`Editor::put_telescope`]; an amplification of 0 is [`Cause::Zero`] (2).
    pub fn put_amplifier(
        &mut self,
        index: u8,
        amplification: Q16,
        name: &EquipmentName,
    ) -> Result<(), Error> {
        self.put(index, &amplification, name)
    }

    /// Replaces the camera of that index, or adds one where the index is their number.
    ///
    /// # Errors
    ///
    /// As [`Editor::put_telescope`], with [`Camera::check`].
    pub fn put_camera(&mut self, index: u8, camera: &Camera, name: &EquipmentName) -> Result<(), Error> {
        self.put(index, camera, name)
    }

    /// Replaces the observer of that index, or adds one where the index is their number.
    ///
    /// # Errors
    ///
    /// As [`Editor::put_telescope`], with [`Observer::check`].
    pub fn put_observer(
        &mut self,
        index: u8,
        observer: &Observer,
        name: &EquipmentName,
    ) -> Result<(), Error> {
        self.put(index, observer, name)
    }

    /// Replaces the site of that index, or adds one where the index is their number.
    ///
    /// # Errors
    ///
    /// As [`Editor::put_telescope`], with [`Site::check`].
    pub fn put_site(&mut self, index: u8, site: &Site, name: &EquipmentName) -> Result<(), Error> {
        self.put(index, site, name)
    }

    /// Says which entries are in use.
    ///
    /// # Errors
    ///
    /// [`Cause::OutOfRange`] (1): an index that is neither that of an entry nor [`InUse::NONE`].
    pub fn put_in_use(&mut self, in_use: &InUse) -> Result<(), Error> {
        let header = Header { in_use: in_use.array(), ..self.header() };
        if !header.is_consistent() {
            return Err(Error::new(Cause::OutOfRange, 1));
        }
        self.seal(&header);
        Ok(())
    }

    /// Takes an entry out. Those behind it move up by one, and what was in use stays in use; the entry itself is so no
    /// longer.
    ///
    /// # Errors
    ///
    /// [`Cause::OutOfRange`] (2): no entry of that index.
    pub fn remove(&mut self, kind: Kind, index: u8) -> Result<(), Error> {
        let mut header = self.header();
        if index >= header.count(kind) {
            return Err(Error::new(Cause::OutOfRange, 2));
        }
        let size = usize::from(kind.size());
        if let Some((lower, upper)) = gap(self.buffer, header.place(kind, index), header.length, size) {
            for (to, from) in lower.iter().zip(upper) {
                to.set(from.get());
            }
        }
        header.change(kind, false);
        if let Some(in_use) = header.in_use.get_mut(kind as usize)
            && *in_use != InUse::NONE
            && *in_use >= index
        {
            *in_use = if *in_use == index { InUse::NONE } else { in_use.wrapping_sub(1) };
        }
        self.seal(&header);
        Ok(())
    }

    pub(crate) fn put<T: Equipment>(
        &mut self,
        index: u8,
        equipment: &T,
        name: &EquipmentName,
    ) -> Result<(), Error> {
        if index > self.header().count(T::KIND) || index >= T::KIND.most() {
            return Err(Error::new(Cause::OutOfRange, 1));
        }
        equipment.check().map_err(|error| Error::new(error.cause(), 2))?;
        name.check().map_err(|error| Error::new(error.cause(), 3))?;
        let mut body = [0; BODY];
        equipment.encode(&mut body);
        self.put_bytes(T::KIND, index, name, &body)
    }

    /// For an index and bytes that are good.
    fn put_bytes(
        &mut self,
        kind: Kind,
        index: u8,
        name: &EquipmentName,
        body: &[u8; BODY],
    ) -> Result<(), Error> {
        let mut header = self.header();
        let (at, size) = (header.place(kind, index), usize::from(kind.size()));
        if index == header.count(kind) {
            let longer = usize::from(header.length) + size;
            if longer > self.buffer.len() {
                return Err(NO_ROOM);
            }
            // At most 976 bytes.
            let (lower, upper) = gap(self.buffer, at, longer as u16, size).ok_or(NO_ROOM)?;
            for (to, from) in upper.iter().zip(lower).rev() {
                to.set(from.get());
            }
            header.change(kind, true);
        }
        let entry = self.buffer.get_mut(at..).and_then(|bytes| bytes.get_mut(..size)).unwrap_or_default();
        for (to, from) in entry.iter_mut().zip(name.text.iter().chain(body)) {
            *to = *from;
        }
        self.seal(&header);
        Ok(())
    }

    fn header(&self) -> Header {
        Header::decode(self.buffer)
    }

    /// Writes the header and the checksum over all.
    fn seal(&mut self, header: &Header) {
        if let Some(first) = self.buffer.first_chunk_mut() {
            *first = header.encode();
        }
        let length = usize::from(header.length);
        if let Some((bytes, checksum)) =
            self.buffer.get_mut(..length).and_then(|bytes| bytes.split_last_chunk_mut::<CHECKSUM>())
        {
            let mut crc = Crc::new();
            crc.add(bytes);
            *checksum = crc.value().to_le_bytes();
        }
    }
}

type Cells<'a> = &'a [Cell<u8>];

/// The bytes from `at` to `end` less the last `size`, and those less the first `size`: copied one to the other, they
/// make or close a gap of that size.
fn gap(buffer: &mut [u8], at: usize, end: u16, size: usize) -> Option<(Cells<'_>, Cells<'_>)> {
    let bytes = Cell::from_mut(buffer.get_mut(..usize::from(end))?.get_mut(at..)?).as_slice_of_cells();
    let (_, upper) = bytes.split_at_checked(size)?;
    let (lower, _) = bytes.split_at_checked(upper.len())?;
    Some((lower, upper))
}

const _: () = assert!(size_of::<InUse>() == 6 && size_of::<EquipmentName>() == 12);
