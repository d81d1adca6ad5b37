//! The Rust interface: every `pub` item of the sources, in rustfmt's shape, against a list that is kept. An item that is gone
//! or different fails; one that is new asks for a renewal.
//!
//! What a macro makes (the quantities, the rows of pages, the causes) is held by the lists that the macro is given, which
//! stand in the sources as they are, and by the constants of the C header.

use crate::{holds, root};
use std::collections::BTreeSet;
use std::fs;
use std::path::Path;

/// Macros whose lists are the interface.
const LISTS: [&str; 3] = ["quantity! {", "rows! {", "causes! {"];

fn public_items(folder: &Path, items: &mut BTreeSet<String>) {
    for entry in fs::read_dir(folder).unwrap() {
        let path = entry.unwrap().path();
        if path.is_dir() && !path.ends_with("capi") {
            public_items(&path, items);
        } else if path.extension().is_some_and(|e| e == "rs") {
            let module = path.strip_prefix(root().join("src")).unwrap().with_extension("");
            let module = module.to_str().unwrap().replace(['/', '\\'], "::");
            items_of(&module, &fs::read_to_string(&path).unwrap(), items);
        }
    }
}

fn items_of(module: &str, text: &str, items: &mut BTreeSet<String>) {
    let text = text.split("\n#[cfg(test)]\nmod tests").next().unwrap();
    let mut owner = String::new();
    let mut in_list = false;
    let mut lines = text.lines();
    while let Some(line) = lines.next() {
        let inner = line.trim();
        if line == "}" {
            (owner, in_list) = (String::new(), false);
        } else if LISTS.contains(&line) {
            (owner, in_list) = (line.to_string(), true);
        } else if in_list && !inner.starts_with("//") && !inner.is_empty() {
            items.insert(format!("{module} {owner} {inner}"));
        } else if let Some(of) = line.strip_prefix("impl").filter(|_| line.ends_with('{')) {
            owner = format!("impl{}", of.trim_end_matches(" {"));
            if owner.contains(" for ") {
                items.insert(format!("{module} {owner}"));
            }
        } else if inner.starts_with("pub ") && !inner.starts_with("pub mod tests") {
            let mut item = inner.to_string();
            while !item.ends_with(['{', ';', ',']) || item.ends_with("(,") || open(&item) {
                match lines.next() {
                    Some(more) => item = format!("{item} {}", more.trim()),
                    None => break,
                }
            }
            let item = item.trim_end_matches('{').trim_end();
            items.insert(format!("{module} {owner} {item}").replace("  ", " "));
            if line.starts_with("pub struct ")
                || line.starts_with("pub enum ")
                || line.starts_with("pub trait ")
            {
                owner = line.trim_end_matches(" {").trim_start_matches("pub ").to_string();
            }
        } else if owner.starts_with("enum ")
            && line.starts_with("    ")
            && inner.ends_with(',')
            && !inner.starts_with('/')
        {
            items.insert(format!("{module} {owner} {inner}"));
        } else if owner.starts_with("trait ") && inner.starts_with("fn ") {
            items.insert(format!("{module} {owner} {}", inner.trim_end_matches('{')));
        }
    }
}

/// Whether a bracket is still open: arguments on lines of their own.
fn open(item: &str) -> bool {
    let count = |c| item.matches(c).count();
    count('(') > count(')')
        || count('[') > count(']')
        || item.starts_with("pub use") && count('{') > count('}')
}

fn now() -> BTreeSet<String> {
    let mut items = BTreeSet::new();
    public_items(&root().join("src"), &mut items);
    items
}

fn gone(kept: &str, now: &BTreeSet<String>) -> Vec<String> {
    kept.lines().filter(|line| !line.starts_with('#') && !now.contains(*line)).map(String::from).collect()
}

#[test]
fn nothing_public_is_gone() {
    let file = "tests/interface/rust_api.txt";
    let now = now();
    assert!(now.len() > 500, "{}", now.len());
    let kept = fs::read_to_string(root().join(file)).unwrap_or_default();
    let gone = gone(&kept, &now);
    assert!(
        gone.is_empty(),
        "public, and no longer so:\n{}\n(DEVELOPERS.md, \"The promise\")",
        gone.join("\n")
    );
    let text: String = now.iter().map(|item| format!("{item}\n")).collect();
    holds(file, &text);
}

#[test]
fn planted_breaks_of_the_rust_interface_are_seen() {
    let source = "pub struct Lens {\n    pub focal_length_um: u32,\n}\n\nimpl Lens {\n    pub const fn check(\n        &self,\n        limit: u32,\n    ) -> bool {\n        true\n    }\n}\n\npub enum Kind {\n    /// One.\n    Flat = 1,\n}\n";
    let items = |text: &str| {
        let mut items = BTreeSet::new();
        items_of("lens", text, &mut items);
        items
    };
    let kept: String = items(source).iter().map(|item| format!("{item}\n")).collect();
    assert_eq!(gone(&kept, &items(source)), [""; 0]);
    for (from, to) in [
        ("limit: u32", "limit: u64"),
        ("pub const fn check", "pub fn check"),
        ("pub const fn check", "const fn check"),
        ("-> bool", "-> u8"),
        ("pub focal_length_um: u32", "pub focal_length_um: u16"),
        ("pub focal_length_um", "focal_length_um"),
        ("pub struct Lens", "struct Lens"),
        ("Flat = 1", "Flat = 2"),
        ("pub enum Kind", "pub enum Sort"),
    ] {
        assert!(source.contains(from), "{from}");
        assert!(!gone(&kept, &items(&source.replacen(from, to, 1))).is_empty(), "{from} to {to}");
    }
    let more = source.replace("    pub focal", "    pub index_n7: u32,\n    pub focal");
    assert_eq!(gone(&kept, &items(&more)), [""; 0]);
}
