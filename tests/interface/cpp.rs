//! include/fieldstop.hpp, made from the C header and the hand-written frame src/capi/frame.hpp.

use crate::declared::{Argument, Declared, Function, Struct, read};
use crate::{header, holds, root};
use std::collections::BTreeSet;
use std::fmt::Write;
use std::fs;

/// The end of a name in the C header, the C++ type's name, what kind of thing it measures, and the unit's size among
/// those of its kind; a kind of its own where there is no other.
const UNITS: [(&str, &str, &str, u64); 29] = [
    ("_mas_per_mm", "milliarcseconds_per_millimetre", "plate scale", 1),
    ("_arcsec_per_mm", "arcseconds_per_millimetre", "plate scale", 1000),
    ("_uas_per_s", "microarcseconds_per_second", "rate", 1),
    ("_mas_per_s", "milliarcseconds_per_second", "rate", 1000),
    ("_arcsec_per_s", "arcseconds_per_second", "rate", 1_000_000),
    ("_ppb_per_k", "parts_per_billion_per_kelvin", "expansion", 1),
    ("_ppm_per_k", "parts_per_million_per_kelvin", "expansion", 1000),
    ("_day_ms", "day_milliseconds", "time of day", 1),
    ("_nm", "nanometres", "length", 1),
    ("_um", "micrometres", "length", 1000),
    ("_mm", "millimetres", "length", 1_000_000),
    ("_m", "metres", "length", 1_000_000_000),
    ("_uas", "microarcseconds", "angle", 1),
    ("_mas", "milliarcseconds", "angle", 1000),
    ("_arcsec", "arcseconds", "angle", 1_000_000),
    ("_deg", "degrees_of_arc", "angle", 3_600_000_000),
    ("_bam", "binary_angle", "binary angle", 1),
    ("_q16", "q16", "ratio", 1),
    ("_milli", "thousandths", "thousandths", 1),
    ("_mmag", "millimagnitudes", "magnitude", 1),
    ("_mag", "magnitudes", "magnitude", 1000),
    ("_us", "microseconds", "time", 1),
    ("_ms", "milliseconds", "time", 1000),
    ("_s", "seconds", "time", 1_000_000),
    ("_mk", "millikelvin", "temperature", 1),
    ("_k", "kelvin", "temperature", 1000),
    ("_n7", "index_n7", "index", 1),
    ("_ppm", "parts_per_million", "share", 1),
    ("_mw", "milliwatts", "power", 1),
];

/// The unit that a name ends in: the longest that fits.
fn unit_of(name: &str) -> Option<(&'static str, &'static str)> {
    let fitting = UNITS.iter().filter(|(end, ..)| name.ends_with(end));
    fitting.max_by_key(|(end, ..)| end.len()).map(|(end, unit, ..)| (*end, *unit))
}

/// The name of a quantity in C++; none for a plain number.
fn quantity(of: &str, name: &str) -> Option<String> {
    let (_, unit) = unit_of(name)?;
    Some(match of {
        // Magnitudes have a sign as a rule.
        "int32_t" if unit == "millimagnitudes" => unit.to_string(),
        "uint32_t" if unit == "millimagnitudes" => format!("unsigned_{unit}"),
        "uint32_t" => unit.to_string(),
        "int32_t" => format!("signed_{unit}"),
        "float" => format!("{unit}_f32"),
        "double" => format!("{unit}_f64"),
        _ => return None,
    })
}

/// What a struct is called in C++, and whether it is a class there: one with a unit in it.
fn wrapped<'a>(declared: &Declared, of: &'a str) -> Option<(&'a str, bool)> {
    let name = of.split_whitespace().find(|word| word.starts_with("fieldstop_"))?.trim_end_matches('*');
    let found = declared.structs.iter().find(|s| s.name == name)?;
    Some((name.strip_prefix("fieldstop_")?, typed(found)))
}

fn typed(of: &Struct) -> bool {
    of.members.iter().any(|member| quantity(&member.of, &member.name).is_some())
}

fn short(name: &str) -> String {
    name.to_lowercase().trim_start_matches("fieldstop_").to_string()
}

/// Of a comment, the first sentence, without the number of a member.
fn sentence(comment: &str) -> String {
    let comment = comment
        .strip_prefix("Member ")
        .and_then(|rest| rest.split_once(". "))
        .map_or(comment, |(_, rest)| rest);
    comment.split_once(". ").map_or(comment, |(first, _)| first).trim_end_matches('.').to_string()
}

fn units(text: &mut String, literals: &mut String) {
    let mut kinds: Vec<&str> = Vec::new();
    for (end, unit, kind, size) in UNITS {
        let number = kinds.iter().position(|k| *k == kind).unwrap_or_else(|| {
            kinds.push(kind);
            kinds.len() - 1
        });
        writeln!(text, "struct {unit} : measure<{number}, {size}> {{}};").unwrap();
        if end == "_q16" {
            continue;
        }
        for (class, number) in [("whole", "unsigned long long"), ("pointed", "long double")] {
            let call = if class == "whole" { "whole_of<unit::" } else { "pointed<unit::" };
            writeln!(
                literals,
                "constexpr {class}<unit::{unit}> operator\"\"{end}({number} count) {{ return {call}{unit}>(count); }}"
            )
            .unwrap();
        }
    }
}

/// The types of the quantities that the header has.
fn aliases(declared: &Declared) -> String {
    let mut used = BTreeSet::new();
    let arguments = declared
        .functions
        .iter()
        .flat_map(|f| &f.arguments)
        .map(|a| (a.of.trim_end_matches([' ', '*']), &a.name));
    for (of, name) in
        arguments.chain(declared.structs.iter().flat_map(|s| &s.members).map(|m| (m.of.as_str(), &m.name)))
    {
        if let Some(alias) = quantity(of, name) {
            used.insert((unit_of(name).unwrap().1, of.to_string(), alias));
        }
    }
    let mut text = String::new();
    for (unit, of, alias) in used {
        writeln!(text, "typedef quantity<unit::{unit}, {of}> {alias};").unwrap();
    }
    text
}

fn constants(declared: &Declared, causes: &mut String) -> String {
    let sources: String = fs::read_dir(root().join("src/capi"))
        .unwrap()
        .map(|entry| entry.unwrap().path())
        .filter(|path| path.extension().is_some_and(|e| e == "rs"))
        .map(|path| fs::read_to_string(path).unwrap())
        .collect();
    let mut text = String::new();
    for constant in &declared.constants {
        let (name, c_name) = (short(&constant.name), &constant.name);
        if let Some(comment) = constant.comment.strip_prefix("Cause: ") {
            writeln!(causes, "    /** {} */\n    {name} = {c_name},", sentence(comment)).unwrap();
            continue;
        }
        let (_, rest) = sources.split_once(&format!("const {c_name}: ")).expect("a constant of src/capi");
        let of = match rest.split(' ').next().unwrap() {
            "u8" => "uint8_t",
            "u16" => "uint16_t",
            "u32" => "uint32_t",
            other => panic!("{c_name}: {other}"),
        };
        writeln!(text, "/** {} */\nconstexpr {of} {name} = {c_name};", sentence(&constant.comment)).unwrap();
    }
    text
}

fn structs(declared: &Declared) -> String {
    let mut text = String::new();
    for of in &declared.structs {
        let (c_name, name) = (&of.name, short(&of.name));
        writeln!(text, "/** {} */", sentence(&of.comment)).unwrap();
        if !typed(of) {
            writeln!(text, "typedef ::{c_name} {name};\n{}\n", by_reference(&name)).unwrap();
            continue;
        }
        let readout = of.members.iter().any(|member| member.name == "available");
        writeln!(text, "class {name};\n{}", by_reference(&name)).unwrap();
        writeln!(text, "class {name} {{\npublic:").unwrap();
        if !readout {
            writeln!(
                text,
                "    /** Every member 0. */\n    FIELDSTOP_INLINE constexpr {name}() : raw_() {{}}"
            )
            .unwrap();
        }
        writeln!(
            text,
            "    FIELDSTOP_INLINE constexpr explicit {name}(const ::{c_name} &raw) : raw_(raw) {{}}"
        )
        .unwrap();
        writeln!(text, "    FIELDSTOP_INLINE constexpr const ::{c_name} &c() const {{ return raw_; }}")
            .unwrap();
        for member in of.members.iter().filter(|member| member.name != "padding") {
            member_of(declared, of, member, &name, readout, &mut text);
        }
        writeln!(text, "\nprivate:").unwrap();
        if readout {
            writeln!(text, "    {name}() = default;").unwrap();
        }
        writeln!(
            text,
            "    friend struct access;\n    friend class result<{name}>;\n    FIELDSTOP_INLINE explicit {name}(const access &) {{}}"
        )
        .unwrap();
        writeln!(text, "    ::{c_name} raw_;\n}};\nstatic_assert(sizeof({name}) == sizeof(::{c_name}), \"no more than in C\");\n").unwrap();
    }
    text
}

/// A result gives a struct where it lies, without a copy.
fn by_reference(name: &str) -> String {
    format!("template <> struct given_as<{name}> {{\n    typedef const {name} &type;\n}};")
}

fn member_of(
    declared: &Declared,
    of: &Struct,
    member: &crate::declared::Member,
    name: &str,
    readout: bool,
    text: &mut String,
) {
    assert!(member.lengths.is_empty(), "{}: an array in a struct with units", member.name);
    let raw = &member.name;
    let alias = quantity(&member.of, raw);
    let plain = alias.as_ref().map_or(raw.as_str(), |_| raw.strip_suffix(unit_of(raw).unwrap().0).unwrap());
    let type_name = alias.clone().unwrap_or_else(|| member.of.clone());
    writeln!(text, "    /** {} */", sentence(&member.comment)).unwrap();
    if readout {
        let group = of.name.strip_prefix("fieldstop_").unwrap().strip_suffix("_readout").unwrap_or_default();
        let told = match group {
            "" => format!("{}, available: {raw}.", name.replace('_', " ")),
            group => format!("{} readout, wanted and available: {raw}.", group.replace('_', " ")),
        };
        match declared.constants.iter().find(|c| c.comment.to_lowercase() == told) {
            Some(bit) => writeln!(
                text,
                "    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<{type_name}> {plain}() const\n    {{\n        return (raw_.available & {}) != 0 ? result<{type_name}>({type_name}(raw_.{raw})) : result<{type_name}>(status(FIELDSTOP_UNDEFINED));\n    }}",
                bit.name
            ),
            None => {
                assert!(alias.is_none(), "{raw} has no bit in `available`");
                writeln!(text, "    FIELDSTOP_INLINE constexpr {type_name} {plain}() const {{ return raw_.{raw}; }}")
            }
        }
        .unwrap();
        return;
    }
    writeln!(
        text,
        "    FIELDSTOP_INLINE constexpr {type_name} {plain}() const {{ return {type_name}(raw_.{raw}); }}"
    )
    .unwrap();
    let members: Vec<String> = of
        .members
        .iter()
        .map(|m| match (&m.name == raw, m.lengths.is_empty()) {
            (true, _) if alias.is_some() => format!("{raw}.count()"),
            (true, _) => raw.clone(),
            (false, true) => format!("raw_.{}", m.name),
            (false, false) => format!("{{{}}}", vec!["0"; m.size].join(", ")),
        })
        .collect();
    writeln!(
        text,
        "    FIELDSTOP_INLINE constexpr {name} with_{plain}({type_name} {raw}) const\n    {{\n        return {name}(::{}{{{}}});\n    }}",
        of.name,
        members.join(", ")
    )
    .unwrap();
}

/// An argument in C++, and what C gets of it.
fn argument(declared: &Declared, of: &Argument) -> (String, String) {
    let name = &of.name;
    if let Some((class, typed)) =
        wrapped(declared, &of.of).filter(|_| of.of.starts_with("const") && of.of.ends_with('*'))
    {
        return (format!("const {class} &{name}"), format!("&{name}{}", if typed { ".c()" } else { "" }));
    }
    if of.of == "fieldstop_status" {
        return (format!("status {name}"), format!("{name}.number()"));
    }
    match quantity(&of.of, name) {
        Some(alias) => (format!("{alias} {name}"), format!("{name}.count()")),
        None => (format!("{} {name}", of.of).replace("* ", "*"), name.clone()),
    }
}

fn function(declared: &Declared, of: &Function) -> String {
    let name = short(&of.name);
    let mut arguments = of.arguments.as_slice();
    let mut out = None;
    if let Some((last, before)) = arguments.split_last()
        && last.of.ends_with('*')
        && !last.of.starts_with("const")
        && last.name != "choice_count"
    {
        (out, arguments) = (Some(last), before);
    }
    let (mut taken, mut given) = (Vec::new(), Vec::new());
    let mut skip = false;
    for (at, here) in arguments.iter().enumerate() {
        if std::mem::take(&mut skip) {
            continue;
        }
        if here.of == "char *" && arguments.get(at + 1).is_some_and(|next| next.name == "capacity") {
            taken.push(format!("buffer {}", here.name));
            given.push(format!("{0}.text(), {0}.capacity()", here.name));
            skip = true;
            continue;
        }
        if let Some(next) = arguments.get(at + 1).filter(|next| next.name.ends_with("count"))
            && let Some((class, true)) = wrapped(declared, &here.of)
        {
            let name = &here.name;
            if next.name == "choice_count" {
                // Filled as C's structs, since a readout is made by its call only; `class(name[i])` reads one.
                taken.push(format!("::fieldstop_{class} *{name}"));
                given.push(name.clone());
            } else {
                taken.push(format!("const {class} *{name}"));
                given.push(format!("{name} == nullptr ? nullptr : &{name}->c()"));
            }
            continue;
        }
        let (cpp, c) = argument(declared, here);
        taken.push(cpp);
        given.push(c);
    }
    let (taken, mut given) = (taken.join(", "), given.join(", "));
    let c_name = &of.name;
    let body = match (of.result.as_str(), out) {
        ("fieldstop_status", Some(out)) => {
            let pointee = out.of.trim_end_matches([' ', '*']);
            if !given.is_empty() {
                given.push_str(", ");
            }
            match wrapped(declared, pointee) {
                Some((value, true)) => format!(
                    "FIELDSTOP_CHECKED FIELDSTOP_INLINE result<{value}> {name}({taken})\n{{\n    result<{value}> given = access::blank<{value}>();\n    access::finish(given, ::{c_name}({given}access::place(given)));\n    return given;\n}}\n"
                ),
                Some((value, false)) => format!(
                    "FIELDSTOP_CHECKED FIELDSTOP_INLINE result<{value}> {name}({taken})\n{{\n    result<{value}> given = access::plain_blank<{value}>();\n    access::finish(given, ::{c_name}({given}access::plain_place(given)));\n    return given;\n}}\n"
                ),
                small => {
                    let value = small.map(|(class, _)| class.to_string()).or(quantity(pointee, &out.name));
                    let value = value.unwrap_or_else(|| pointee.to_string());
                    format!(
                        "FIELDSTOP_CHECKED FIELDSTOP_INLINE result<{value}> {name}({taken})\n{{\n    {} given;\n    const fieldstop_status number = ::{c_name}({given}&given);\n    return access::given<{value}>(number, given);\n}}\n",
                        pointee.trim_start_matches("struct ")
                    )
                }
            }
        }
        ("fieldstop_status", None) => {
            format!(
                "FIELDSTOP_CHECKED FIELDSTOP_INLINE status {name}({taken})\n{{\n    return status(::{c_name}({given}));\n}}\n"
            )
        }
        (result, _) => match wrapped(declared, result) {
            Some((class, false)) => {
                format!(
                    "FIELDSTOP_INLINE const {class} &{name}({taken})\n{{\n    return *::{c_name}({given});\n}}\n"
                )
            }
            _ => format!(
                "FIELDSTOP_INLINE {result} {name}({taken})\n{{\n    return ::{c_name}({given});\n}}\n"
            )
            .replace("* ", "*"),
        },
    };
    let comment = format!("/** {}. */\n", sentence(&of.comment));
    match &of.condition {
        Some(condition) => format!("#if {condition}\n{comment}{body}#endif\n"),
        None => format!("{comment}{body}"),
    }
}

fn made() -> String {
    let declared = read(&header());
    let (mut units_text, mut literals, mut causes) = (String::new(), String::new(), String::new());
    units(&mut units_text, &mut literals);
    let constants = constants(&declared, &mut causes);
    let mut functions = String::new();
    let mut section = "";
    // That of the ABI is for the linker only.
    for of in declared.functions.iter().filter(|of| !of.name.starts_with("fieldstop_abi_")) {
        if of.section != section {
            section = &of.section;
            writeln!(functions, "/* {section} */\n").unwrap();
        }
        writeln!(functions, "{}", function(&declared, of)).unwrap();
    }
    fs::read_to_string(root().join("src/capi/frame.hpp"))
        .unwrap()
        .replace("@CAUSES@", &causes)
        .replace("@UNITS@", &units_text)
        .replace("@ALIASES@", &aliases(&declared))
        .replace("@LITERALS@", &literals)
        .replace("@CONSTANTS@", &constants)
        .replace("@STRUCTS@", structs(&declared).trim_end())
        .replace("@FUNCTIONS@", functions.trim_end())
}

#[test]
fn cpp_header_is_that_of_the_c_header() {
    holds("include/fieldstop.hpp", &made());
}

/// tests/cpp/same_code.cpp: each call in C and in C++, for `.ci/cpp` to compare the code that is made of them.
#[test]
fn pairs_of_calls_are_those_of_the_header() {
    let declared = read(&header());
    let mut text = String::from(
        "/* Each call as in C and as in C++; .ci/cpp compares the code that is made of the two. Made by\n   tests/interface/cpp.rs: do not edit. */\n#include \"fieldstop.hpp\"\n\nextern \"C\" {\n",
    );
    // Those with lists look for null once more.
    let lists = |of: &&Function| of.arguments.iter().any(|argument| argument.name == "choice_count");
    for of in declared.functions.iter().filter(|of| of.result == "fieldstop_status" && !lists(of)) {
        let pair = pair(&declared, of);
        match &of.condition {
            Some(condition) => writeln!(text, "\n#if {condition}\n{pair}#endif").unwrap(),
            None => write!(text, "\n{pair}").unwrap(),
        }
    }
    text.push_str("\n}\n");
    holds("tests/cpp/same_code.cpp", &text);
}

fn pair(declared: &Declared, of: &Function) -> String {
    let name = short(&of.name);
    let (last, before) = of.arguments.split_last().unwrap();
    let out = Some(last).filter(|last| last.of.ends_with('*') && !last.of.starts_with("const"));
    let arguments = if out.is_some() { before } else { of.arguments.as_slice() };
    let (mut taken, mut in_c, mut in_cpp) = (Vec::new(), Vec::new(), Vec::new());
    for (at, here) in arguments.iter().enumerate() {
        let name = &here.name;
        match wrapped(declared, &here.of) {
            Some((class, typed)) => {
                taken.push(format!("const fieldstop::{class} *{name}"));
                in_c.push(if typed { format!("&{name}->c()") } else { name.clone() });
                in_cpp.push(format!("*{name}"));
                continue;
            }
            None => taken.push(format!("{} {name}", here.of)),
        }
        in_c.push(name.clone());
        match quantity(&here.of, name) {
            _ if here.of == "char *" => in_cpp.push(format!("fieldstop::buffer({name}, capacity)")),
            _ if name == "capacity" && arguments[at - 1].of == "char *" => {}
            Some(alias) => in_cpp.push(format!("fieldstop::{alias}({name})")),
            None => in_cpp.push(name.clone()),
        }
    }
    let c_name = &of.name;
    let (mut plain, mut typed) = (String::new(), String::new());
    match out {
        None => {
            writeln!(plain, "    return ::{c_name}({});", in_c.join(", ")).unwrap();
            writeln!(typed, "    return fieldstop::{name}({}).number();", in_cpp.join(", ")).unwrap();
        }
        Some(out) => {
            let pointee = out.of.trim_end_matches([' ', '*']);
            let value = match (wrapped(declared, pointee), quantity(pointee, &out.name)) {
                (Some((_, true)), _) => ".c()",
                (_, Some(_)) => ".count()",
                _ => "",
            };
            taken.push(format!("{pointee} *out"));
            in_c.push("&given".to_string());
            writeln!(
                plain,
                "    {pointee} given;\n    const fieldstop_status number = ::{c_name}({});",
                in_c.join(", ")
            )
            .unwrap();
            plain.push_str("    if (number == 0) {\n        *out = given;\n    }\n    return number;\n");
            writeln!(typed, "    const auto given = fieldstop::{name}({});", in_cpp.join(", ")).unwrap();
            writeln!(typed, "    if (given) {{\n        *out = given.value(){value};\n    }}\n    return given.status().number();").unwrap();
        }
    }
    let taken = taken.join(", ").replace("* ", "*");
    // A struct may lie elsewhere on the stack.
    let filled = out.is_some_and(|out| out.of.contains("struct "));
    let name = if filled { format!("filled_{name}") } else { name };
    format!(
        "fieldstop_status plain_{name}({taken})\n{{\n{plain}}}\nfieldstop_status typed_{name}({taken})\n{{\n{typed}}}\n"
    )
}
