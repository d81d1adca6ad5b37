//! A public function without its row fails, and so does a row without its C prototypes.

use super::registry::all_rows;
use std::collections::BTreeSet;
use std::fs;
use std::path::Path;

fn sources(folder: &str) -> Vec<(String, String)> {
    let root = Path::new(env!("CARGO_MANIFEST_DIR")).join(folder);
    let mut found = Vec::new();
    for entry in fs::read_dir(root).unwrap() {
        let path = entry.unwrap().path();
        if path.is_dir() {
            let inner = format!("{folder}/{}", path.file_name().unwrap().to_str().unwrap());
            found.extend(sources(&inner));
        } else if path.extension().is_some_and(|e| e == "rs") {
            let name = path.file_stem().unwrap().to_str().unwrap().to_string();
            found.push((name, fs::read_to_string(&path).unwrap()));
        }
    }
    found
}

fn names_after<'a>(text: &'a str, before: &str) -> Vec<&'a str> {
    text.match_indices(before)
        .map(|(at, _)| {
            let rest = &text[at + before.len()..];
            &rest[..rest.find(|c: char| !c.is_alphanumeric() && c != '_').unwrap()]
        })
        .collect()
}

#[test]
fn every_public_function_has_its_row() {
    let rows: BTreeSet<String> = all_rows().iter().map(|r| r.stem.to_string()).collect();
    let mut public = BTreeSet::new();
    for (_, text) in ["src/optics", "src/sky", "src/math"].into_iter().flat_map(sources) {
        for name in names_after(&text, "\npub fn ") {
            public.insert(name.strip_suffix("_fx").unwrap_or(name).to_string());
        }
    }
    assert_eq!(public, rows);
}

#[test]
fn every_row_has_its_c_functions() {
    let exported: BTreeSet<String> = sources("src/capi")
        .iter()
        .flat_map(|(_, text)| names_after(text, "extern \"C\" fn fieldstop_"))
        .map(str::to_string)
        .collect();
    for row in all_rows() {
        let floats = [("f32", row.single.is_some()), ("f64", row.double.is_some())];
        for (form, expected) in [("fx", true)].into_iter().chain(floats) {
            let name = format!("{}_{form}", row.stem);
            assert_eq!(exported.contains(&name), expected, "fieldstop_{name}");
        }
    }
}
