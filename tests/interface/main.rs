//! What is promised to C and C++ programs: the snapshot of the C interface, and the C++ header over it.
//!
//! To renew what is made from the C header: `FIELDSTOP_RENEW=1 cargo test --test interface`.

mod cpp;
mod declared;
mod promise;
mod rust_api;

use std::fs;
use std::path::{Path, PathBuf};

fn root() -> &'static Path {
    Path::new(env!("CARGO_MANIFEST_DIR"))
}

fn header() -> String {
    fs::read_to_string(root().join("include/fieldstop.h")).unwrap()
}

fn renewing() -> bool {
    std::env::var_os("FIELDSTOP_RENEW").is_some_and(|value| value == "1")
}

/// Compares a committed file with what it must be, or writes it if that is asked.
fn holds(file: &str, made: &str) {
    let path: PathBuf = root().join(file);
    if renewing() {
        fs::write(&path, made).unwrap();
    }
    let committed = fs::read_to_string(&path).unwrap_or_default();
    for (number, (made, committed)) in made.lines().zip(committed.lines()).enumerate() {
        assert_eq!(committed, made, "{file}, line {}: out of date; {RENEW}", number + 1);
    }
    assert_eq!(committed, made, "{file} is out of date; {RENEW}");
}

const RENEW: &str = "renew it by FIELDSTOP_RENEW=1 cargo test --test interface";
