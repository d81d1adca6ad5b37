use super::entry::{KINDS, Kind, MOST, SIZES};
use super::fields::{Fields, FieldsMut};

/// Bytes of the header.
pub(super) const HEADER: usize = 24;
/// Bytes of the checksum at the end.
pub(super) const CHECKSUM: usize = 4;
/// "fdsp"
const MAGIC: u32 = 0x7073_6466;
pub(super) const VERSION: u16 = 1;

/// Which entry of each kind is in use: its index, or 255 for none.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct InUse {
    /// Index of the telescope, or 255.
    pub telescope: u8,
    /// Index of the eyepiece, or 255.
    pub eyepiece: u8,
    /// Index of the Barlow or reducer, or 255.
    pub amplifier: u8,
    /// Index of the camera, or 255.
    pub camera: u8,
    /// Index of the observer, or 255.
    pub observer: u8,
    /// Index of the site, or 255.
    pub site: u8,
}

impl InUse {
    /// None of that kind.
    ///
    /// cbindgen:ignore
    pub const NONE: u8 = 255;

    pub(super) const fn array(self) -> [u8; KINDS] {
        [self.telescope, self.eyepiece, self.amplifier, self.camera, self.observer, self.site]
    }

    pub(super) const fn of_array(array: [u8; KINDS]) -> InUse {
        let [telescope, eyepiece, amplifier, camera, observer, site] = array;
        InUse { telescope, eyepiece, amplifier, camera, observer, site }
    }
}

impl Default for InUse {
    fn default() -> InUse {
        InUse::of_array([InUse::NONE; KINDS])
    }
}

/// The first bytes of a record. What is before `counts` is at the same place in every version.
#[derive(Clone, Copy, PartialEq)]
pub(super) struct Header {
    pub(super) magic: u32,
    pub(super) version: u16,
    pub(super) length: u16,
    pub(super) sequence: u32,
    pub(super) counts: [u8; KINDS],
    pub(super) in_use: [u8; KINDS],
}

impl Header {
    pub(super) const fn empty() -> Header {
        let length = (HEADER + CHECKSUM) as u16;
        let (counts, in_use) = ([0; KINDS], [InUse::NONE; KINDS]);
        Header { magic: MAGIC, version: VERSION, length, sequence: 0, counts, in_use }
    }

    pub(super) fn decode(bytes: &[u8]) -> Header {
        let mut fields = Fields(bytes);
        Header {
            magic: fields.u32(),
            version: fields.u16(),
            length: fields.u16(),
            sequence: fields.u32(),
            counts: fields.bytes(),
            in_use: fields.bytes(),
        }
    }

    pub(super) fn encode(&self) -> [u8; HEADER] {
        let mut bytes = [0; HEADER];
        let mut fields = FieldsMut(&mut bytes);
        fields.u32(self.magic);
        fields.u16(self.version);
        fields.u16(self.length);
        fields.u32(self.sequence);
        fields.bytes(self.counts);
        fields.bytes(self.in_use);
        bytes
    }

    /// What holds in every version: the magic bytes, and a length that there is room for.
    pub(super) fn is_framed(&self, room: u32) -> bool {
        let least = (HEADER + CHECKSUM) as u16;
        self.magic == MAGIC && self.version != 0 && self.length >= least && u32::from(self.length) <= room
    }

    /// What holds in this version: no more entries than fit, a length that is that of the entries, and nothing in use
    /// that is not there.
    pub(super) fn is_consistent(&self) -> bool {
        let most = self.counts.iter().zip(MOST.iter()).all(|(count, most)| *count <= most);
        let in_use = self.in_use.iter().zip(self.counts);
        most && self.length == self.length_of_entries()
            && in_use.into_iter().all(|(at, count)| *at == InUse::NONE || *at < count)
    }

    fn length_of_entries(&self) -> u16 {
        let entries = self.counts.iter().zip(SIZES.iter());
        // At most 976: the counts are bounded by MOST.
        entries.fold((HEADER + CHECKSUM) as u16, |sum, (count, size)| {
            sum.wrapping_add(u16::from(*count).wrapping_mul(u16::from(size)))
        })
    }

    pub(super) fn count(&self, kind: Kind) -> u8 {
        self.counts.get(kind as usize).copied().unwrap_or(0)
    }

    /// Where an entry begins, or would.
    pub(super) fn place(&self, kind: Kind, index: u8) -> usize {
        let before = self.counts.iter().zip(SIZES.iter()).take(kind as usize);
        let lists = before.fold(HEADER, |sum, (count, size)| sum + usize::from(*count) * usize::from(size));
        lists + usize::from(index) * usize::from(kind.size())
    }

    /// For one entry more or less.
    pub(super) fn change(&mut self, kind: Kind, more: bool) {
        if let Some(count) = self.counts.get_mut(kind as usize) {
            *count = if more { count.wrapping_add(1) } else { count.wrapping_sub(1) };
        }
        self.length = self.length_of_entries();
    }
}
