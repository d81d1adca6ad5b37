//! Arbitrary bytes as a record: refused, or good in all its members and the same when written anew. As a storage: what
//! is loaded is good, and a save keeps it until the new one is there.
#![no_main]

use fieldstop::profile::{Crc, Editor, Kind, Newer, Record, SlotPair, Storage, load, save};
use fieldstop::{Cause, Error};
use libfuzzer_sys::fuzz_target;

const KINDS: [Kind; 6] =
    [Kind::Telescope, Kind::Eyepiece, Kind::Amplifier, Kind::Camera, Kind::Observer, Kind::Site];

fuzz_target!(|bytes: &[u8]| {
    let Some((first, bytes)) = bytes.split_first() else { return };
    let mut bytes = bytes.to_vec();
    // A checksum is hard to guess: it is made right now and then, and the frame too.
    if first & 1 == 1 && bytes.len() >= 28 {
        let length = bytes.len();
        bytes[..4].copy_from_slice(b"fdsp");
        if first & 2 == 2 {
            bytes[4..8].copy_from_slice(&[1, 0, length as u8, (length >> 8) as u8]);
        }
        let mut crc = Crc::new();
        crc.add(&bytes[..length - 4]);
        bytes[length - 4..].copy_from_slice(&crc.value().to_le_bytes());
    }
    match Record::check(&bytes) {
        Ok(record) => good(&record),
        Err(error) => {
            assert!(matches!(error.cause(), Cause::NoRecord | Cause::NewerRecord));
            let before = bytes.clone();
            assert_eq!(Editor::open(&mut bytes).err(), Some(error));
            assert_eq!(bytes, before);
        }
    }
    stored(&bytes, *first);
});

fn good(record: &Record) {
    let mut buffer = [0x55; Record::MOST];
    let mut editor = Editor::empty(&mut buffer).unwrap();
    let name = |kind, n| record.name(kind, n).unwrap();
    for kind in KINDS {
        assert!(record.count(kind) <= kind.most() && record.name(kind, record.count(kind)).is_none());
        for n in 0..record.count(kind) {
            let name = name(kind, n);
            name.check().unwrap();
            match kind {
                Kind::Telescope => editor.put_telescope(n, &record.telescope(n).unwrap(), &name),
                Kind::Eyepiece => editor.put_eyepiece(n, &record.eyepiece(n).unwrap(), &name),
                Kind::Amplifier => editor.put_amplifier(n, record.amplifier(n).unwrap(), &name),
                Kind::Camera => editor.put_camera(n, &record.camera(n).unwrap(), &name),
                Kind::Observer => editor.put_observer(n, &record.observer(n).unwrap(), &name),
                Kind::Site => editor.put_site(n, &record.site(n).unwrap(), &name),
            }
            .unwrap();
        }
    }
    editor.put_in_use(&record.in_use()).unwrap();
    let mut again = editor.record().unwrap().bytes().to_vec();
    // The sequence number is the store's.
    again[8..12].copy_from_slice(&record.bytes()[8..12]);
    let end = again.len() - 4;
    let mut crc = Crc::new();
    crc.add(&again[..end]);
    again[end..].copy_from_slice(&crc.value().to_le_bytes());
    assert_eq!(again, record.bytes());

    let mut left = record.bytes().to_vec();
    let mut editor = Editor::open(&mut left).unwrap();
    for kind in KINDS {
        while editor.remove(kind, 0).is_ok() {
            assert!(Record::check(editor.record().unwrap().bytes()).is_ok());
        }
    }
    assert_eq!(editor.record().unwrap().bytes().len(), Record::LEAST);
}

struct Memory {
    bytes: Vec<u8>,
    steps: usize,
    flash: bool,
}

impl Storage for Memory {
    fn read(&mut self, offset: u32, bytes: &mut [u8]) -> Result<(), Error> {
        bytes.copy_from_slice(&self.bytes[offset as usize..][..bytes.len()]);
        Ok(())
    }
    fn write(&mut self, offset: u32, bytes: &[u8]) -> Result<(), Error> {
        for (i, byte) in bytes.iter().enumerate() {
            self.steps = self.steps.checked_sub(1).ok_or(Error::new(Cause::Storage, 0))?;
            self.bytes[offset as usize + i] = *byte;
        }
        Ok(())
    }
    fn erase(&mut self, offset: u32, length: u32) -> Result<bool, Error> {
        if self.flash {
            self.bytes[offset as usize..][..length as usize].fill(0xFF);
        }
        Ok(self.flash)
    }
}

/// Two slots in the bytes; a save that is cut off after some steps.
fn stored(bytes: &[u8], choice: u8) {
    let write_bytes = 1 << (choice >> 5).min(5);
    let length = (bytes.len() / 2) as u32 & !(u32::from(write_bytes) - 1);
    let slots = SlotPair { first: 0, second: length, bytes: length, write_bytes, padding: [0; 3] };
    let mut storage = Memory { bytes: bytes.to_vec(), steps: bytes.len() / 3, flash: choice & 4 == 4 };
    let mut buffer = [0; 1024];
    let last = load(&mut storage, &slots, &mut buffer).map(|record| record.bytes().to_vec());
    if let Ok(last) = &last {
        good(&Record::check(last).unwrap());
    }
    let mut buffer = [0; 64];
    let editor = Editor::empty(&mut buffer).unwrap();
    let saved = save(&mut storage, &slots, &editor.record().unwrap(), Newer::Keep);
    let mut buffer = [0; 1024];
    let now = load(&mut storage, &slots, &mut buffer).map(|record| record.bytes().to_vec());
    match saved {
        Ok(()) => assert_eq!(now.unwrap()[12..24], editor.record().unwrap().bytes()[12..24]),
        Err(error) if error.cause() == Cause::Storage => {
            assert!(now == last || now.unwrap()[12..24] == editor.record().unwrap().bytes()[12..24]);
        }
        Err(_) => assert_eq!((now, &storage.bytes[..]), (last, bytes)),
    }
}
