//! The promise: what has been published is never removed, renumbered or resized. `promise.txt` holds it, a fact a line.
//!
//! A fact that is gone or different fails, in a renewal too: who breaks the promise on purpose takes the line out by
//! hand. A new fact only asks for a renewal.

use crate::declared::{Declared, Function, read};
use crate::{header, holds, renewing, root};
use std::collections::{BTreeMap, BTreeSet};
use std::fmt::Write;
use std::fs;

const FILE: &str = "tests/interface/promise.txt";
const HEAD: &str = "# What is promised to C programs, a fact a line; see tests/interface/promise.rs.\n";

fn facts(declared: &Declared) -> BTreeSet<String> {
    let mut facts = BTreeSet::new();
    for constant in &declared.constants {
        facts.insert(format!("constant {} = {}", constant.name, constant.value));
    }
    for (name, arguments) in &declared.macros {
        facts.insert(format!("macro {name} of {arguments}"));
    }
    for (name, of) in &declared.types {
        facts.insert(format!("type {name} = {of}"));
    }
    for (name, of) in &declared.functions_given {
        facts.insert(format!("function given {name} = {of}"));
    }
    for of in &declared.structs {
        let name = &of.name;
        facts.insert(format!("struct {name}: {} bytes", of.size()));
        for member in &of.members {
            let lengths: String = member.lengths.iter().map(|length| format!("[{length}]")).collect();
            let (place, of, member) = (member.place, &member.of, &member.name);
            facts.insert(format!("struct {name}: at {place:03} {of} {member}{lengths}"));
        }
    }
    for function in &declared.functions {
        let condition = function.condition.as_ref().map_or(String::new(), |c| format!(" if {c}"));
        facts.insert(format!("function {}{condition}", prototype(function, true)));
    }
    facts
}

fn prototype(function: &Function, named: bool) -> String {
    let arguments: Vec<String> = function
        .arguments
        .iter()
        .map(|a| if named { format!("{} {}", a.of, a.name).replace("* ", "*") } else { a.of.clone() })
        .collect();
    let arguments = if arguments.is_empty() { "void".to_string() } else { arguments.join(", ") };
    let name = if named { function.name.clone() } else { "(*function)".to_string() };
    format!("{} {name}({arguments})", function.result).replace("* f", "*f")
}

/// What was promised and does not hold.
fn broken(promised: &BTreeSet<String>, now: &BTreeSet<String>) -> Vec<String> {
    promised.difference(now).cloned().collect()
}

fn promised() -> BTreeSet<String> {
    let text = fs::read_to_string(root().join(FILE)).unwrap_or_default();
    text.lines().filter(|line| !line.starts_with('#')).map(String::from).collect()
}

#[test]
fn nothing_promised_is_gone() {
    let now = facts(&read(&header()));
    let broken = broken(&promised(), &now);
    assert!(broken.is_empty(), "promised, and no longer so:\n{}\n{BREAK}", broken.join("\n"));
    holds(FILE, &format!("{HEAD}{}\n", now.into_iter().collect::<Vec<_>>().join("\n")));
}

const BREAK: &str =
    "Programs that are in use need it: give what is new a name of its own (DEVELOPERS.md, \"The promise\")";

/// The gate must be able to fail: each of these breaks is seen in a copy of the header, and an addition is none.
#[test]
fn planted_breaks_are_seen() {
    let header = header();
    let promised = facts(&read(&header));
    assert!(promised.len() > 200);
    let breaks = |from: &str, to: &str| {
        assert!(header.contains(from), "nothing to break: {from}");
        broken(&promised, &facts(&read(&header.replacen(from, to, 1))))
    };
    let magnification = &header[header.find("fieldstop_status fieldstop_magnification_fx").unwrap()..];
    let magnification = &magnification[..=magnification.find(';').unwrap()];
    let planted: BTreeMap<&str, Vec<String>> = BTreeMap::from([
        ("function removed", breaks(magnification, "")),
        ("function renamed", breaks("fieldstop_magnification_fx", "fieldstop_enlargement_fx")),
        (
            "argument widened",
            breaks(magnification, &magnification.replacen("uint32_t focal", "uint64_t focal", 1)),
        ),
        (
            "argument in another unit",
            breaks(magnification, &magnification.replace("eyepiece_um", "eyepiece_mm")),
        ),
        ("argument more", breaks(magnification, &magnification.replacen('(', "(uint32_t barlow_q16, ", 1))),
        ("cause renumbered", breaks("#define FIELDSTOP_OVERFLOW 5", "#define FIELDSTOP_OVERFLOW 6")),
        ("constant removed", breaks("#define FIELDSTOP_CAMERA_ALL 4095", "")),
        ("macro removed", breaks("#define FIELDSTOP_CAUSE(status)", "#define FIELDSTOP_REASON(status)")),
        (
            "status widened",
            breaks("typedef uint16_t fieldstop_status;", "typedef uint32_t fieldstop_status;"),
        ),
        (
            "member resized",
            breaks("uint8_t padding[3];\n} fieldstop_camera;", "uint8_t padding[7];\n} fieldstop_camera;"),
        ),
        (
            "member in the padding",
            breaks(
                "    uint8_t padding[3];\n} fieldstop_camera;",
                "    uint8_t gain;\n    uint8_t padding[2];\n} fieldstop_camera;",
            ),
        ),
        ("members swapped", breaks("    uint16_t first;\n", "    uint16_t second;\n")),
        ("member more", breaks("} fieldstop_observer;", "    uint32_t age_s;\n} fieldstop_observer;")),
        ("function given with another argument", breaks("uint8_t *bytes,\n", "uint16_t *bytes,\n")),
        ("struct removed", breaks("fieldstop_span {", "fieldstop_stretch {")),
        (
            "forms withdrawn from AVR",
            breaks(
                "#if !defined(FIELDSTOP_NO_FLOAT)\n",
                "#if (!defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__))\n",
            ),
        ),
    ]);
    for (what, seen) in planted {
        assert!(!seen.is_empty(), "not seen: {what}");
    }
    let added = header.replacen(
        "FIELDSTOP_CHECKED\nfieldstop_status fieldstop_magnification_fx",
        "#define FIELDSTOP_ONE_MORE 9\nuint32_t fieldstop_one_more(void);\n\nFIELDSTOP_CHECKED\nfieldstop_status fieldstop_magnification_fx",
        1,
    );
    let added = facts(&read(&added));
    assert_eq!(added.len(), promised.len() + 2);
    assert!(broken(&promised, &added).is_empty(), "an addition is no break");
}

/// tests/c/promise.c says the same to the compilers of every target: it is built with the C programs, linked with the
/// library and run, and `.ci/abi` compiles it for the parts.
#[test]
fn compilers_are_asked() {
    let declared = read(&header());
    let mut c = String::from(
        "/* What is promised, as each compiler sees it: sizes, offsets, numbers, prototypes; and that every function is in the\n   library. Made by tests/interface/promise.rs: do not edit. */\n#include \"fieldstop.h\"\n\n#define HOLDS(name, condition) typedef char name[(condition) ? 1 : -1]\n\n",
    );
    let mut count = 0;
    let mut hold = |c: &mut String, condition: String| {
        count += 1;
        writeln!(c, "HOLDS(holds_{count}, {condition});").unwrap();
    };
    hold(&mut c, "FIELDSTOP_CAUSE(0x0302u) == 2 && FIELDSTOP_ARGUMENT(0x0302u) == 3".into());
    for (name, of) in &declared.types {
        hold(&mut c, format!("sizeof({name}) == sizeof({of}) && ({name})-1 > 0"));
    }
    for of in &declared.structs {
        let name = &of.name;
        hold(&mut c, format!("sizeof({name}) == {}", of.size()));
        for member in &of.members {
            let (member, place, size) = (&member.name, member.place, member.size);
            hold(
                &mut c,
                format!("offsetof({name}, {member}) == {place} && sizeof((({name} *)0)->{member}) == {size}"),
            );
        }
    }
    for constant in &declared.constants {
        hold(&mut c, format!("{} == {}", constant.name, constant.value));
    }
    c.push_str(
        "\ntypedef void (*any_function)(void);\nstatic volatile any_function present;\n\nint main(void)\n{\n",
    );
    for (name, of) in &declared.functions_given {
        writeln!(c, "    {{\n        {of} = ({name})0;\n        present = (any_function)function;\n    }}")
            .unwrap();
    }
    for function in &declared.functions {
        let guard = function.condition.as_deref();
        if let Some(condition) = guard {
            writeln!(c, "#if {condition}").unwrap();
        }
        writeln!(
            c,
            "    {{\n        {} = {};\n        present = (any_function)function;\n    }}",
            prototype(function, false),
            function.name
        )
        .unwrap();
        if guard.is_some() {
            c.push_str("#endif\n");
        }
    }
    c.push_str("    return present == 0;\n}\n");
    holds("tests/c/promise.c", &c);
    assert!(renewing() || count > 100);
}
