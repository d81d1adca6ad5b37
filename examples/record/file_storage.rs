//! Records in a file: two slots in it, as an EEPROM would have them.

use fieldstop::profile::{SlotPair, Storage};
use fieldstop::{Cause, Error};
use std::fs::{File, OpenOptions};
use std::io::{self, Read, Seek, SeekFrom, Write};
use std::path::Path;

/// 1024 bytes take the longest record.
pub const SLOT_PAIR: SlotPair =
    SlotPair { first: 0, second: 1024, bytes: 1024, write_bytes: 1, padding: [0; 3] };

pub struct FileStorage(File);

impl FileStorage {
    /// The file, made where there is none; as long as both slots.
    pub fn open(path: &Path) -> io::Result<FileStorage> {
        let file = OpenOptions::new().read(true).write(true).create(true).truncate(false).open(path)?;
        if file.metadata()?.len() < 2048 {
            file.set_len(2048)?;
        }
        Ok(FileStorage(file))
    }

    fn at(&mut self, offset: u32) -> io::Result<&mut File> {
        self.0.seek(SeekFrom::Start(offset.into()))?;
        Ok(&mut self.0)
    }
}

impl Storage for FileStorage {
    fn read(&mut self, offset: u32, bytes: &mut [u8]) -> Result<(), Error> {
        self.at(offset).and_then(|file| file.read_exact(bytes)).map_err(failed)
    }

    fn write(&mut self, offset: u32, bytes: &[u8]) -> Result<(), Error> {
        // On the disk before the next: the order of writes is what keeps the last good record.
        self.at(offset)
            .and_then(|file| {
                file.write_all(bytes)?;
                file.sync_data()
            })
            .map_err(failed)
    }
}

fn failed(_: io::Error) -> Error {
    Error::new(Cause::Storage, 0)
}
