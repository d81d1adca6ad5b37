//! Imports point downward only, `unsafe` stays in its room, and no integer is wider than the parts can divide.

use std::collections::BTreeMap;
use std::fs;
use std::path::{Path, PathBuf};

/// From the top. Modules of one layer do not use each other.
const LAYERS: [&[&str]; 10] = [
    &["lib"],
    &["capi"],
    &["text"],
    &["profile"],
    &["setup"],
    &["optics", "sky"],
    &["math"],
    &["units"],
    &["status"],
    &["stored"],
];

fn layer(module: &str) -> usize {
    let found = LAYERS.iter().position(|layer| layer.contains(&module));
    found.unwrap_or_else(|| panic!("module `{module}` has no layer: say it in tests/layers.rs"))
}

struct Source {
    /// `["math", "divide"]` for src/math/divide.rs and `["math"]` for src/math/mod.rs.
    module: Vec<String>,
    lines: Vec<String>,
}

impl Source {
    fn top(&self) -> &str {
        &self.module[0]
    }
}

/// What users get: without comments and unit tests.
fn sources() -> Vec<Source> {
    let src = Path::new(env!("CARGO_MANIFEST_DIR")).join("src");
    let mut found = Vec::new();
    let mut folders = vec![src.clone()];
    while let Some(folder) = folders.pop() {
        for entry in fs::read_dir(folder).unwrap() {
            let path: PathBuf = entry.unwrap().path();
            if path.is_dir() {
                folders.push(path);
            } else if path.extension().is_some_and(|e| e == "rs") {
                let inner = path.strip_prefix(&src).unwrap().with_extension("");
                let mut module: Vec<String> = inner.iter().map(|p| p.to_str().unwrap().to_string()).collect();
                if module.last().unwrap() == "mod" {
                    module.pop();
                }
                let text = fs::read_to_string(&path).unwrap();
                let shipped = text.split("#[cfg(test)]\nmod ").next().unwrap();
                found.push(Source { module, lines: shipped.lines().map(str::to_string).collect() });
            }
        }
    }
    found
}

fn code(line: &str) -> &str {
    line.split("//").next().unwrap()
}

fn word(text: &str) -> &str {
    text.split(|c: char| !c.is_alphanumeric() && c != '_').next().unwrap()
}

/// Names that lib.rs gives out again, each with the module that it comes from.
fn given_out_again() -> BTreeMap<String, String> {
    let mut names = BTreeMap::new();
    for source in sources().iter().filter(|source| source.top() == "lib") {
        for line in &source.lines {
            if let Some(path) = line.strip_prefix("pub use ") {
                for name in path.split(|c: char| !c.is_alphanumeric()).filter(|n| !n.is_empty()) {
                    names.insert(name.to_string(), word(path).to_string());
                }
            }
        }
    }
    names
}

/// The modules right below the crate that a line names.
fn named(source: &Source, line: &str) -> Vec<String> {
    let code = code(line);
    let mut roots: Vec<&str> = code.match_indices("crate::").map(|(at, p)| &code[at + p.len()..]).collect();
    // As many `super::` as the module is deep lead to the crate.
    let way_up = "super::".repeat(source.module.len());
    if source.top() != "lib" {
        roots.extend(code.match_indices(&way_up).map(|(at, p)| &code[at + p.len()..]));
    }
    roots.into_iter().map(|rest| word(rest).to_string()).collect()
}

#[test]
fn imports_point_downward() {
    let given_out_again = given_out_again();
    let mut seen = 0;
    for source in sources() {
        let here = layer(source.top());
        for (number, line) in source.lines.iter().enumerate() {
            for name in named(&source, line) {
                let place = format!("src/{}, line {}: {line}", source.module.join("/"), number + 1);
                assert!(!name.is_empty(), "{place}\nName one module in each `use crate::`.");
                let module = given_out_again.get(&name).unwrap_or(&name);
                let downward = module == source.top() || here < layer(module);
                assert!(downward, "{place}\n`{}` must not use `{module}`.", source.top());
                seen += 1;
            }
        }
    }
    assert!(seen > 10);
}

#[test]
fn unsafe_stays_in_its_room() {
    for source in sources() {
        for (number, line) in source.lines.iter().enumerate() {
            let place = format!("src/{}, line {}: {line}", source.module.join("/"), number + 1);
            let is_unsafe = code(line).match_indices("unsafe").any(|(at, p)| word(&line[at..]) == p);
            // AVR's program memory and its kernels are the other ones.
            if !["capi", "stored"].contains(&source.top()) && source.module != ["math", "avr"] {
                assert!(!is_unsafe, "{place}");
            } else if code(line).contains("unsafe {") {
                let above =
                    source.lines[..number].iter().rev().take_while(|l| l.trim_start().starts_with("//"));
                assert!(above.into_iter().any(|l| l.contains("SAFETY: ")), "{place}\nsays no SAFETY");
            }
        }
    }
}

#[test]
fn no_integer_of_128_bits() {
    for source in sources() {
        for line in &source.lines {
            let wide = code(line).contains("u128") || code(line).contains("i128");
            assert!(!wide, "src/{}: {line}", source.module.join("/"));
        }
    }
}
