//! Records as each version wrote them, committed beside what is in them: every later version reads the same.
//!
//! A record of a new version is added by a line in `made`, which writes the files that are not there. What is there is
//! never written again.

use super::samples::*;
use fieldstop::profile::{Kind, Record};
use std::fmt::Write;
use std::fs;
use std::path::Path;

fn made() -> [(&'static str, Vec<u8>); 3] {
    [
        ("version_1_empty", record([0; 6])),
        ("version_1_usual", record([1, 8, 2, 0, 1, 1])),
        ("version_1_full", record(MOST)),
    ]
}

fn described(record: &Record) -> String {
    let mut text = format!(
        "version {}, sequence number {}, {} bytes\nin use: {:?}\n",
        record.version(),
        record.sequence(),
        record.bytes().len(),
        record.in_use()
    );
    for kind in [Kind::Telescope, Kind::Eyepiece, Kind::Amplifier, Kind::Camera, Kind::Observer, Kind::Site] {
        for n in 0..record.count(kind) {
            let name = record.name(kind, n).unwrap();
            let name = str::from_utf8(name.bytes()).unwrap();
            let what = match kind {
                Kind::Telescope => format!("{:?}", record.telescope(n).unwrap()),
                Kind::Eyepiece => format!("{:?}", record.eyepiece(n).unwrap()),
                Kind::Amplifier => format!("{:?}", record.amplifier(n).unwrap()),
                Kind::Camera => format!("{:?}", record.camera(n).unwrap()),
                Kind::Observer => format!("{:?}", record.observer(n).unwrap()),
                Kind::Site => format!("{:?}", record.site(n).unwrap()),
            };
            writeln!(text, "{n} \"{name}\": {what}").unwrap();
        }
    }
    text.replace(", padding: [0, 0, 0]", "")
}

#[test]
fn records_of_every_version_are_read() {
    let folder = Path::new(env!("CARGO_MANIFEST_DIR")).join("tests/profile/golden");
    for (name, bytes) in made() {
        let file = folder.join(name).with_extension("bin");
        if !file.exists() {
            fs::write(file.with_extension("txt"), described(&Record::check(&bytes).unwrap())).unwrap();
            fs::write(file, bytes).unwrap();
        }
    }
    let mut count = 0;
    for entry in fs::read_dir(folder).unwrap() {
        let file = entry.unwrap().path();
        if file.extension().is_some_and(|e| e == "bin") {
            let bytes = fs::read(&file).unwrap();
            let record = Record::check(&bytes).unwrap_or_else(|error| panic!("{file:?}: {error}"));
            assert_eq!(record.bytes(), bytes);
            assert_eq!(
                described(&record),
                fs::read_to_string(file.with_extension("txt")).unwrap(),
                "{file:?}"
            );
            count += 1;
        }
    }
    assert!(count >= 3);
}

/// What this version writes is what it wrote when the record was committed.
#[test]
fn version_1_is_still_written_so() {
    let folder = Path::new(env!("CARGO_MANIFEST_DIR")).join("tests/profile/golden");
    for (name, bytes) in made() {
        if let Ok(committed) = fs::read(folder.join(name).with_extension("bin")) {
            assert_eq!(bytes, committed, "{name}");
        }
    }
}
