//! The C header: nothing exported is missing from it, no name in it can clash, and it is what the build script makes.
//!
//! The last needs cbindgen: `cargo test --features header --test header`. To renew the header:
//! `FIELDSTOP_RENEW=1 cargo test --features header --test header`.

mod support;

use std::collections::{BTreeMap, BTreeSet};
use std::fs;
use std::path::PathBuf;
use std::sync::OnceLock;

fn root() -> PathBuf {
    PathBuf::from(env!("CARGO_MANIFEST_DIR"))
}

#[cfg(feature = "header")]
const MADE: Option<&str> = Some(include_str!(concat!(env!("OUT_DIR"), "/fieldstop.h")));
#[cfg(not(feature = "header"))]
const MADE: Option<&str> = None;

/// The committed header, renewed first if that is asked.
fn header() -> &'static str {
    static HEADER: OnceLock<String> = OnceLock::new();
    HEADER.get_or_init(|| {
        let path = root().join("include/fieldstop.h");
        if std::env::var_os("FIELDSTOP_RENEW").is_some_and(|value| value == "1") {
            fs::write(&path, MADE.expect("to renew the header, add --features header")).unwrap();
        }
        fs::read_to_string(path).unwrap()
    })
}

fn sources() -> String {
    let mut files: Vec<PathBuf> =
        fs::read_dir(root().join("src/capi")).unwrap().map(|entry| entry.unwrap().path()).collect();
    files.retain(|file| file.extension().is_some_and(|e| e == "rs"));
    files.sort();
    files.iter().map(|file| fs::read_to_string(file).unwrap()).collect()
}

fn is_name(c: char) -> bool {
    c.is_ascii_alphanumeric() || c == '_'
}

fn name_at(text: &str) -> &str {
    text.split(|c| !is_name(c)).next().unwrap()
}

/// C without its comments and strings.
fn code(text: &str) -> String {
    let mut code = String::new();
    let mut rest = text;
    while let Some(start) = rest.find("/*") {
        code.push_str(&rest[..start]);
        rest = &rest[start + rest[start..].find("*/").unwrap() + 2..];
        code.push(' ');
    }
    code.push_str(rest);
    code.lines().filter(|line| !line.starts_with("__asm__")).collect::<Vec<_>>().join("\n")
}

fn names(code: &str) -> BTreeSet<&str> {
    code.split(|c| !is_name(c)).filter(|word| word.starts_with(|c: char| !c.is_ascii_digit())).collect()
}

/// A declaration: the comment's lines before it, and the names of what stands in its brackets.
#[derive(Debug, PartialEq)]
struct Declared {
    comment: Vec<String>,
    arguments: Vec<String>,
}

/// The last word of each argument.
fn in_c(arguments: &str) -> Vec<String> {
    let all = arguments.split(',').filter(|a| a.trim() != "void");
    all.map(|a| a.rsplit(|c| !is_name(c)).next().unwrap().to_string()).collect()
}

/// The word before each colon.
fn in_rust(arguments: &str) -> Vec<String> {
    arguments.split(',').filter_map(|a| a.split_once(':')).map(|(name, _)| name.trim().to_string()).collect()
}

/// Lines above `line` that stand in a comment, as `text` makes them of a line.
fn comment_above(lines: &[&str], text: fn(&str) -> Option<&str>, passed: fn(&str) -> bool) -> Vec<String> {
    let above = lines.iter().rev().skip_while(|line| passed(line));
    let mut comment: Vec<String> = above.map_while(|line| text(line)).map(|t| t.trim().to_string()).collect();
    comment.reverse();
    comment.retain(|line| !line.is_empty());
    comment
}

fn exported() -> BTreeMap<String, Declared> {
    let sources = sources();
    let mut found = BTreeMap::new();
    for (at, before) in sources.match_indices("extern \"C\" fn ") {
        let rest = &sources[at + before.len()..];
        let (start, end) = (rest.find('(').unwrap(), rest.find(')').unwrap());
        let lines: Vec<&str> = sources[..sources[..at].rfind('\n').unwrap()].lines().collect();
        let comment =
            comment_above(&lines, |line| line.trim().strip_prefix("///"), |line| line.starts_with("#["));
        let comment = comment.iter().map(|line| line.replace("[`", "`").replace("`]", "`")).collect();
        found.insert(
            name_at(rest).to_string(),
            Declared { comment, arguments: in_rust(&rest[start + 1..end]) },
        );
    }
    found
}

fn c_comment(line: &str) -> Option<&str> {
    match line.trim() {
        "*/" => Some(""),
        line => line.strip_prefix("/**").or(line.strip_prefix('*')).map(|text| text.trim_end_matches("*/")),
    }
}

fn prototypes() -> BTreeMap<String, Declared> {
    let header = header();
    let mut found = BTreeMap::new();
    for (at, _) in header.match_indices('(') {
        let name = header[..at].rsplit(|c| !is_name(c)).next().unwrap();
        let line_start = header[..at].rfind('\n').unwrap() + 1;
        let line = &header[line_start..at];
        if !name.starts_with("fieldstop_") || line.starts_with(['#', ' ', '/']) {
            continue;
        }
        let end = at + header[at..].find(')').unwrap();
        let lines: Vec<&str> = header[..line_start].lines().collect();
        let comment = comment_above(&lines, c_comment, |line| line == "FIELDSTOP_CHECKED");
        found.insert(name.to_string(), Declared { comment, arguments: in_c(&header[at + 1..end]) });
    }
    found
}

#[test]
fn every_export_is_in_the_header_with_its_comment() {
    let (exported, prototypes) = (exported(), prototypes());
    assert!(exported.len() > 3);
    for (name, declared) in &exported {
        assert!(!declared.comment.is_empty(), "{name} has no comment");
        assert_eq!(
            prototypes.get(name),
            Some(declared),
            "{name}: the header is out of date, see tests/header.rs"
        );
    }
    let only_there: Vec<_> = prototypes.keys().filter(|name| !exported.contains_key(*name)).collect();
    assert!(only_there.is_empty(), "not exported: {only_there:?}");
}

#[test]
fn every_constant_is_in_the_header() {
    let (sources, header) = (sources(), header());
    let mut count = 0;
    for (at, before) in sources.match_indices("pub const ") {
        let rest = &sources[at + before.len()..];
        let name = name_at(rest);
        if name == "fn" || name == "unsafe" {
            continue;
        }
        assert!(name.starts_with("FIELDSTOP_"), "{name}");
        let define = format!("#define {name} ");
        assert!(
            header.contains(&define),
            "{name} is not in the header: cbindgen drops what must be computed"
        );
        count += 1;
    }
    assert!(count >= 7);
}

#[test]
fn names_are_short_and_clash_with_nothing() {
    let header = header();
    let code = code(header);
    let macros = fs::read_to_string(root().join("tests/c/embedded_macros.h")).unwrap();
    let theirs: BTreeSet<&str> =
        macros.lines().filter_map(|line| line.strip_prefix("#define ")).map(name_at).collect();
    assert!(theirs.len() > 50);
    for name in names(&code) {
        assert!(name.len() <= 48, "{name} has {} characters", name.len());
        assert!(!theirs.contains(name), "{name} is a macro of embedded cores");
    }
    for name in exported().keys() {
        assert!(name.starts_with("fieldstop_"), "{name}");
    }
}

/// avr-gcc passes 18 bytes in registers, each argument from an even one on; on the stack they arrive wrong in Rust there.
#[test]
fn arguments_fit_the_registers_of_avr() {
    let code = code(header());
    let mut seen = 0;
    for prototype in code.split(';').filter(|prototype| prototype.contains("fieldstop_status fieldstop_")) {
        let (before, arguments) =
            prototype.rsplit_once("fieldstop_status ").unwrap().1.split_once('(').unwrap();
        if before.ends_with("_f64") {
            continue;
        }
        let sizes = arguments.split(',').map(|argument| match argument.split_whitespace().next().unwrap() {
            _ if argument.contains('*') => 2,
            "fieldstop_read" | "fieldstop_write" | "fieldstop_erase" => 2,
            "uint32_t" | "int32_t" | "float" => 4,
            "uint16_t" | "int16_t" | "uint8_t" | "int8_t" => 2,
            other => panic!(
                "{before} has an argument of type {other}: only integers of a fixed width and pointers"
            ),
        });
        assert!(sizes.sum::<u32>() <= 18, "{before}");
        seen += 1;
    }
    assert!(seen > 20);
}

#[test]
fn version_is_that_of_the_crate() {
    let header = header();
    let parts: Vec<u32> = ["MAJOR", "MINOR", "PATCH"]
        .iter()
        .map(|part| {
            let define = format!("#define FIELDSTOP_VERSION_{part} ");
            let at = header.find(&define).unwrap() + define.len();
            name_at(&header[at..]).parse().unwrap()
        })
        .collect();
    assert_eq!(format!("{}.{}.{}", parts[0], parts[1], parts[2]), env!("CARGO_PKG_VERSION"));
    assert_eq!(fieldstop::capi::status::fieldstop_version(), parts[0] << 16 | parts[1] << 8 | parts[2]);
}

#[test]
fn committed_header_is_what_the_build_script_makes() {
    let Some(made) = MADE else {
        support::skipped("the header line by line: cargo test --features header --test header");
        return;
    };
    let committed = header();
    for (number, (made, committed)) in made.lines().zip(committed.lines()).enumerate() {
        assert_eq!(committed, made, "line {}: the header is out of date, see tests/header.rs", number + 1);
    }
    assert_eq!(committed.len(), made.len(), "the header is out of date, see tests/header.rs");
}

/// Units that the header's top names, and the word for each in the comment of a function that gives it.
const RESULTS: [(&str, &str); 8] = [
    ("_um", "micrometres"),
    ("_nm", "nanometres"),
    ("_mm", "millimetres"),
    ("_mas", "milliarcseconds"),
    ("_uas", "microarcseconds"),
    ("_arcsec", "arcseconds"),
    ("_mmag", "millimagnitudes"),
    ("_q16", "Q16.16"),
];

/// What a comment leaves out: an argument and its range, the result's unit, the statuses.
fn gaps(name: &str, declared: &Declared, conventions: &str) -> Vec<String> {
    let comment = declared.comment.join(" ");
    let names_it = |text: &str, argument: &str| text.split(|c| !is_name(c)).any(|word| word == argument);
    let mut gaps = Vec::new();
    let readout = ["_fx", "_f32", "_f64"].iter().any(|form| name.ends_with(form));
    let ranges = comment
        .split_once("Ranges: ")
        .map_or("", |(_, rest)| rest.split(" Error: ").next().unwrap().split(" Statuses: ").next().unwrap());
    let (result, arguments) = declared.arguments.split_last().unwrap();
    for argument in arguments {
        let told = if readout { ranges } else { comment.as_str() };
        let text = name.starts_with("fieldstop_text_") && conventions.contains(&format!("`{argument}`"));
        if !text && !names_it(told, argument) {
            gaps.push(format!("no range of {argument}"));
        }
    }
    if readout {
        for (unit, word) in RESULTS {
            if result.ends_with(unit) && !result.contains("_per_") && !comment.contains(word) {
                gaps.push(format!("{result} has no unit"));
            }
        }
        if !comment.contains("Error: at most ") {
            gaps.push("no error bound".to_string());
        }
    }
    if !comment.contains("Statuses: null pointer") {
        gaps.push("no statuses".to_string());
    }
    gaps
}

#[test]
fn comments_leave_nothing_out() {
    let header = header();
    let conventions = &header[header.find(" * Text. ").unwrap()..header.find(" * Errors. ").unwrap()];
    let mut seen = 0;
    let mut found = Vec::new();
    for (name, declared) in prototypes() {
        if !header.contains(&format!("FIELDSTOP_CHECKED\nfieldstop_status {name}(")) {
            continue;
        }
        let whole = gaps(&name, &declared, conventions);
        seen += 1;
        if !whole.is_empty() {
            found.push(format!("{name}: {}", whole.join(", ")));
            continue;
        }
        // A comment that loses its last line is seen.
        let Declared { mut comment, arguments } = declared;
        let statuses = comment.iter().position(|line| line.contains("Statuses: ")).unwrap();
        comment.truncate(statuses);
        assert!(!gaps(&name, &Declared { comment, arguments }, conventions).is_empty(), "{name}");
    }
    assert!(found.is_empty(), "{}", found.join("\n"));
    assert!(seen > 200);
}
