//! The version stands in several files: it is the crate's in all.

use std::fs;
use std::path::Path;

#[test]
fn versions_are_the_crates() {
    let version = env!("CARGO_PKG_VERSION");
    let numbers: Vec<&str> = version.split('.').collect();
    for (file, text) in [
        ("CMakeLists.txt", format!("project(fieldstop VERSION {version} ")),
        ("cmake/fieldstop-config-version.cmake", format!("set(PACKAGE_VERSION \"{version}\")")),
        (
            "cmake/fieldstop-config-version.cmake",
            format!("MAJOR EQUAL {} AND PACKAGE_FIND_VERSION_MINOR EQUAL {}", numbers[0], numbers[1]),
        ),
        ("README.md", format!("version = \"{}.{}\"", numbers[0], numbers[1])),
    ] {
        let path = Path::new(env!("CARGO_MANIFEST_DIR")).join(file);
        assert!(fs::read_to_string(path).unwrap().contains(&text), "{file}: no {text}");
    }
}
