//! With the feature `header`, makes the C header out of src/capi, in the build folder; without it, nothing.

fn main() {
    println!("cargo::rerun-if-changed=build.rs");
    #[cfg(feature = "header")]
    header::write();
}

#[cfg(feature = "header")]
mod header {
    use std::path::{Path, PathBuf};
    use std::{env, fs};

    /// The order of the header's sections; other files of src/capi follow in the order of their names.
    const ORDER: [&str; 15] = [
        "status",
        "units",
        "field",
        "resolution",
        "light",
        "imaging",
        "focus",
        "layout",
        "colour",
        "direction",
        "motion",
        "sun",
        "setup",
        "profile",
        "text",
    ];

    pub fn write() {
        for input in ["src", "cbindgen.toml"] {
            println!("cargo::rerun-if-changed={input}");
        }
        let sources: Vec<(PathBuf, String)> = rust_files(Path::new("src"))
            .into_iter()
            .map(|path| {
                let text = fs::read_to_string(&path).unwrap();
                (path, text)
            })
            .filter(|(path, text)| path.starts_with("src/capi") || text.contains("#[repr(C)]"))
            .collect();
        let sections = sections(&sources);

        let mut config = cbindgen::Config::from_file("cbindgen.toml").unwrap();
        let mut builder = cbindgen::Builder::new();
        for (path, text) in &sources {
            // It finds the other files of src/capi from there.
            if path.ends_with("capi/mod.rs") || !path.starts_with("src/capi") {
                builder = builder.with_src(path);
            }
            for (name, c_name) in structs(text) {
                config.export.rename.insert(name, c_name);
            }
        }
        let mut bindings = Vec::new();
        builder.with_config(config).generate().unwrap().write(&mut bindings);
        let body = by_section(&String::from_utf8(bindings).unwrap(), &sections);

        let mut header = include_str!("src/capi/frame.h").replace("@BODY@", &body);
        for part in ["VERSION", "MAJOR", "MINOR", "PATCH"] {
            let variable = if part == "VERSION" { part.to_string() } else { format!("VERSION_{part}") };
            let value = env::var(format!("CARGO_PKG_{variable}")).unwrap();
            header = header.replace(&format!("@{part}@"), &value);
        }
        fs::write(Path::new(&env::var("OUT_DIR").unwrap()).join("fieldstop.h"), header).unwrap();
    }

    fn rust_files(folder: &Path) -> Vec<PathBuf> {
        let mut entries: Vec<PathBuf> = fs::read_dir(folder).unwrap().map(|e| e.unwrap().path()).collect();
        entries.sort();
        let mut files = Vec::new();
        for path in entries {
            if path.is_dir() {
                files.extend(rust_files(&path));
            } else if path.extension().is_some_and(|e| e == "rs") {
                files.push(path);
            }
        }
        files
    }

    /// The structs of a source, each with its name in C.
    fn structs(text: &str) -> Vec<(String, String)> {
        let mut found = Vec::new();
        for (at, before) in text.match_indices("#[repr(C)]\npub struct ") {
            let name = identifier(&text[at + before.len()..]);
            let mut c_name = String::from("fieldstop");
            for letter in name.chars() {
                if letter.is_uppercase() {
                    c_name.push('_');
                }
                c_name.push(letter.to_ascii_lowercase());
            }
            found.push((name.to_string(), c_name));
        }
        found
    }

    fn identifier(text: &str) -> &str {
        text.split(|c: char| !c.is_alphanumeric() && c != '_').next().unwrap()
    }

    struct Section {
        title: String,
        /// The C names that belong here.
        names: Vec<String>,
    }

    /// A section for each file of src/capi, with the first paragraph of the module that it exports as its title. What
    /// is not in src/capi belongs to the file of the same name as its folder or file.
    fn sections(sources: &[(PathBuf, String)]) -> Vec<Section> {
        let mut subjects: Vec<String> = Vec::new();
        for (path, _) in sources {
            if !subjects.contains(&subject(path)) {
                subjects.push(subject(path));
            }
        }
        subjects.sort_by_key(|s| (ORDER.iter().position(|o| o == s).unwrap_or(ORDER.len()), s.clone()));
        subjects
            .into_iter()
            .map(|subject_here| {
                let mut names = Vec::new();
                for (_, text) in sources.iter().filter(|(path, _)| subject(path) == subject_here) {
                    names.extend(structs(text).into_iter().map(|(_, c_name)| c_name));
                    for before in ["pub type ", "pub const ", "extern \"C\" fn "] {
                        let found = text.match_indices(before);
                        names.extend(found.map(|(at, _)| identifier(&text[at + before.len()..]).to_string()));
                    }
                }
                Section { title: title(&subject_here), names }
            })
            .collect()
    }

    /// `field` for src/capi/field.rs; `setup` for src/setup/camera.rs and src/capi/setup_choice.rs; what src/capi/mod.rs
    /// says belongs to `status`.
    fn subject(path: &Path) -> String {
        let mut parts: Vec<&str> = path.iter().map(|part| part.to_str().unwrap()).skip(1).collect();
        if matches!(parts[0], "capi" | "optics" | "sky") {
            parts.remove(0);
        }
        let name = parts[0].trim_end_matches(".rs").split('_').next().unwrap();
        if name == "mod" { "status".to_string() } else { name.to_string() }
    }

    fn title(subject: &str) -> String {
        for folder in ["src", "src/optics", "src/sky"] {
            for file in [format!("{subject}.rs"), format!("{subject}/mod.rs")] {
                if let Ok(text) = fs::read_to_string(Path::new(folder).join(file)) {
                    let lines = text.lines().map_while(|line| line.strip_prefix("//! "));
                    return lines.collect::<Vec<_>>().join(" ");
                }
            }
        }
        subject.to_string()
    }

    /// cbindgen gives its items by kind, a blank line between two; here they are put by subject.
    fn by_section(bindings: &str, sections: &[Section]) -> String {
        let items: Vec<&str> = bindings.trim().split("\n\n").collect();
        let mut placed = 0;
        let mut body = String::new();
        for section in sections {
            let mut here = String::new();
            let mut constants = false;
            for item in items.iter().filter(|item| section.names.iter().any(|name| name == declared(item))) {
                if constants && !item.contains("#define ") && !here.ends_with("\n\n") {
                    here.push('\n');
                }
                constants = item.contains("#define ");
                here.push_str(&plainer(item));
                placed += 1;
            }
            if !here.is_empty() {
                let here = here.trim_end();
                let rule = "-".repeat(98);
                body.push_str(&format!("/* {rule}\n{} */\n\n{here}\n\n", wrapped(&section.title)));
            }
        }
        assert_eq!(placed, items.len(), "an item of cbindgen's that no file of src/capi declares");
        body
    }

    /// Without Rust's marks for links, and short where a comment is.
    fn plainer(item: &str) -> String {
        let item =
            item.trim_matches('\n').replace("defined(FIELDSTOP_FLOAT)", "!defined(FIELDSTOP_NO_FLOAT)");
        let item = item.replace("[`", "`").replace("`]", "`");
        let lines: Vec<&str> = item.lines().collect();
        let mut plain = String::new();
        let mut at = 0;
        while at < lines.len() {
            let indent = &lines[at][..lines[at].len() - lines[at].trim_start().len()];
            if lines[at].trim() == "/**" && lines.get(at + 2).is_some_and(|line| line.trim() == "*/") {
                let text = lines[at + 1].trim_start().trim_start_matches("* ");
                plain.push_str(&format!("{indent}/** {text} */\n"));
                at += 3;
            } else {
                plain.push_str(lines[at]);
                plain.push('\n');
                at += 1;
            }
        }
        // Constants with their one line stand close together.
        if lines.len() > 4 || !item.contains("#define ") {
            plain.push('\n');
        }
        plain
    }

    fn wrapped(text: &str) -> String {
        let mut lines = vec![String::from("  ")];
        for word in text.split(' ') {
            if lines.last().unwrap().len() + word.len() > 94 {
                lines.push(String::from("  "));
            }
            let line = lines.last_mut().unwrap();
            line.push(' ');
            line.push_str(word);
        }
        lines.join("\n")
    }

    /// The C name that an item declares.
    fn declared(item: &str) -> &str {
        let code = match item.rfind("*/") {
            Some(end) if !item[end..].contains('}') || !item.contains("typedef struct") => &item[end + 2..],
            _ => item,
        };
        if let Some(at) = code.find("#define ") {
            return identifier(&code[at + 8..]);
        }
        if code.contains("typedef struct ") {
            let at = code.find("typedef struct ").unwrap();
            return identifier(&code[at + 15..]);
        }
        let code = code.split("\n#endif").next().unwrap();
        match code.find('(').filter(|_| !code.contains("typedef")) {
            // The last word before the arguments; `#if (…)` stands on a line before.
            _ if code.contains("typedef ") => code.trim().trim_end_matches(';').rsplit(' ').next().unwrap(),
            _ => {
                let prototype = code.find("FIELDSTOP_CHECKED").map_or(code, |at| &code[at..]);
                let prototype = prototype.split_once('(').map_or("", |(before, _)| before);
                prototype.rsplit(|c: char| !c.is_alphanumeric() && c != '_').next().unwrap()
            }
        }
    }
}
