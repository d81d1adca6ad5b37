//! Writes a call of every C function, out of src/capi, so that a new function is fuzzed from its first day.

use std::fmt::Write;
use std::path::Path;
use std::{env, fs};

fn main() {
    println!("cargo::rerun-if-changed=../src/capi");
    let mut files: Vec<_> = fs::read_dir("../src/capi").unwrap().map(|entry| entry.unwrap().path()).collect();
    files.retain(|file| file.extension().is_some_and(|e| e == "rs") && file.file_stem().unwrap() != "mod");
    files.sort();
    let mut calls = String::new();
    for file in files {
        let subject = file.file_stem().unwrap().to_str().unwrap();
        let text = fs::read_to_string(&file).unwrap();
        for function in text.split("extern \"C\" fn ").skip(1) {
            calls.push_str(&call(subject, function));
        }
    }
    let path = Path::new(&env::var("OUT_DIR").unwrap()).join("calls.rs");
    fs::write(path, format!("#[allow(unused_variables)]\nconst CALLS: &[fn(&mut Input)] = &[\n{calls}];\n"))
        .unwrap();
}

/// `function` begins with the name, `fieldstop_tiles_fx(target_mas: u32, …) -> …`.
fn call(subject: &str, function: &str) -> String {
    let (name, rest) = function.split_once('(').unwrap();
    let (arguments, rest) = rest.split_once(')').unwrap();
    let gives_status = rest.trim_start().starts_with("-> fieldstop_status");
    let arguments: Vec<(&str, &str)> = arguments
        .split(',')
        .filter(|argument| !argument.trim().is_empty())
        .map(|argument| argument.split_once(':').unwrap())
        .map(|(name, kind)| (name.trim(), kind.trim()))
        .collect();
    let mut code = format!("    |input| {{ // {name}\n");
    // From the last: the size of a buffer stands behind it.
    let mut size: Option<&str> = None;
    for (name, kind) in arguments.iter().rev() {
        let is_pointer = kind.starts_with('*');
        let value = match size.take() {
            // Given to the caller's functions as it is, and may be null.
            _ if *name == "context" => "std::ptr::null_mut()".to_string(),
            _ if *kind == "*const *const c_char" => "input.texts()".to_string(),
            _ if *name == "sentence" => "input.text()".to_string(),
            // May be null where the count behind it is 0.
            Some(size) if is_pointer && size.ends_with("_count") => format!("input.list({size} as usize)"),
            // As many as the byte behind it may say.
            _ if *name == "choices" => "input.take(255)".to_string(),
            Some(size) if is_pointer => format!("input.take({size} as usize)"),
            _ => "input.take(1)".to_string(),
        };
        let is_size = !is_pointer && ["capacity", "length", "_count"].iter().any(|end| name.ends_with(end));
        // All other types follow from the call.
        let kind = if is_size { kind } else { "_" };
        writeln!(code, "        let {name}: {kind} = {value};").unwrap();
        size = is_size.then_some(*name);
    }
    let names: Vec<&str> = arguments.iter().map(|(name, _)| *name).collect();
    let call = format!("fieldstop::capi::{subject}::{name}({})", names.join(", "));
    writeln!(code, "        #[allow(unused_unsafe)]").unwrap();
    if gives_status {
        writeln!(code, "        let status = unsafe {{ {call} }};\n        input.check(status);").unwrap();
    } else {
        writeln!(code, "        let _ = unsafe {{ {call} }};").unwrap();
    }
    code + "    },\n"
}
