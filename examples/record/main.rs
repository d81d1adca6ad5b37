//! Keeps equipment in a file, and shows what is there: each run adds an eyepiece, up to four.
//!
//!     cargo run --example record [FILE]

mod file_storage;

use fieldstop::profile::{Editor, EquipmentName, InUse, Kind, Newer, Record, load, save};
use fieldstop::setup::{Eyepiece, Telescope};
use fieldstop::units::Q16;
use fieldstop::{Cause, Error};
use file_storage::{FileStorage, SLOT_PAIR};
use std::path::PathBuf;

/// Invented ones: the name, focal length and field stop.
const EYEPIECES: [(&str, u32, u32); 4] = [
    ("Wide 28", 28_000, 33_500),
    ("Middle 13", 13_000, 15_200),
    ("Close 8", 8_000, 10_100),
    ("Close 4.5", 4_500, 6_300),
];

fn main() -> Result<(), Box<dyn std::error::Error>> {
    let path =
        std::env::args_os().nth(1).map_or(std::env::temp_dir().join("fieldstop_record.bin"), PathBuf::from);
    let mut storage = FileStorage::open(&path)?;
    let mut buffer = [0; Record::MOST];
    let is_there = match load(&mut storage, &SLOT_PAIR, &mut buffer) {
        Ok(_) => true,
        Err(error) if error.cause() == Cause::NoRecord => false,
        Err(error) => return Err(error.into()),
    };
    let mut editor = if is_there { Editor::open(&mut buffer)? } else { first(&mut buffer)? };
    let count = editor.record()?.count(Kind::Eyepiece);
    if let Some((name, focal_length_um, field_stop_um)) = EYEPIECES.get(usize::from(count)) {
        let eyepiece = Eyepiece {
            focal_length_um: *focal_length_um,
            field_stop_um: *field_stop_um,
            ..Eyepiece::default()
        };
        editor.put_eyepiece(count, &eyepiece, &EquipmentName::new(name.as_bytes())?)?;
        save(&mut storage, &SLOT_PAIR, &editor.record()?, Newer::Keep)?;
    }

    let record = load(&mut storage, &SLOT_PAIR, &mut buffer)?;
    println!("{}: saved {} times, {} bytes", path.display(), record.sequence(), record.bytes().len());
    for index in 0..record.count(Kind::Eyepiece) {
        let name = record.name(Kind::Eyepiece, index).unwrap_or_default();
        let focal_length = record.eyepiece(index).map_or(0, |eyepiece| eyepiece.focal_length_um);
        println!("  {:12} {} um", String::from_utf8_lossy(name.bytes()), focal_length);
    }
    Ok(())
}

fn first(buffer: &mut [u8]) -> Result<Editor<'_>, Error> {
    let mut editor = Editor::empty(buffer)?;
    let telescope = Telescope {
        aperture_um: 180_000,
        focal_length_um: 1_130_000,
        obstruction_um: 46_000,
        amplification_q16: Q16::ONE.0,
        throughput_q16: 0,
    };
    editor.put_telescope(0, &telescope, &EquipmentName::new(b"Valley tube")?)?;
    editor.put_in_use(&InUse { telescope: 0, ..InUse::default() })?;
    Ok(editor)
}
