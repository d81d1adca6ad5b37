//! The C interface from C: programs built as C99 and as C++11 without a warning, linked with the static and the shared
//! library, run, and their output compared.
//!
//! A program `x.c` of tests/c or examples/c belongs here when there is a tests/c/x.expected; any other .c file of tests/c
//! must give nothing but success, but for those named in `NOT_PROGRAMS`.
//!
//! The C++ header is tried by the programs of tests/cpp, with every C++ compiler there is.
#![cfg(unix)]

mod support;

use std::fs;
use std::path::{Path, PathBuf};
use std::process::Command;
use std::sync::OnceLock;
use support::skipped;

const WARNINGS: [&str; 6] =
    ["-Wall", "-Wextra", "-Wpedantic", "-Wconversion", "-Wsign-conversion", "-Werror"];
const LANGUAGES: [(&str, &str); 3] = [("c", "c99"), ("c++", "c++11"), ("c++", "c++17")];
const NOT_PROGRAMS: [&str; 1] = ["ignored_status"];

fn root() -> &'static Path {
    Path::new(env!("CARGO_MANIFEST_DIR"))
}

fn scratch() -> PathBuf {
    let folder = Path::new(env!("CARGO_TARGET_TMPDIR")).join("c_programs");
    fs::create_dir_all(&folder).unwrap();
    folder
}

/// The folder of the C libraries, built as a user builds them; none where there is no C compiler.
fn libraries() -> Option<&'static Path> {
    static FOLDER: OnceLock<Option<PathBuf>> = OnceLock::new();
    FOLDER
        .get_or_init(|| {
            if Command::new("cc").arg("--version").output().is_err() {
                skipped("the C programs, which need a C compiler `cc`");
                return None;
            }
            let target = scratch().join("target");
            let mut cargo = Command::new(env!("CARGO"));
            cargo.args(["rustc", "--quiet", "--release", "--lib", "--crate-type", "staticlib,cdylib"]);
            cargo.args(["--features", "capi", "--target-dir"]).arg(&target).current_dir(root());
            assert!(cargo.status().unwrap().success(), "the C library does not build");
            Some(target.join("release"))
        })
        .as_deref()
}

fn compiler(language: &str, standard: &str) -> Command {
    let mut compiler = Command::new("cc");
    compiler.args(["-x", language, &format!("-std={standard}"), "-O1"]).args(WARNINGS);
    compiler.arg("-I").arg(root().join("include"));
    compiler
}

fn finish(mut command: Command, what: &str) -> String {
    let output = command.output().unwrap();
    let error = String::from_utf8_lossy(&output.stderr);
    let text = String::from_utf8_lossy(&output.stdout).into_owned();
    assert!(output.status.success(), "{what}: {}\n{error}{text}", output.status);
    text
}

/// Whether this machine's compiler knows the language at all: a C compiler may come without C++.
fn speaks(language: &str, standard: &str) -> bool {
    let source = scratch().join("empty.c");
    fs::write(&source, "int main(void) { return 0; }\n").unwrap();
    let mut compiler = compiler(language, standard);
    compiler.arg("-c").arg(&source).arg("-o").arg(scratch().join(format!("empty-{standard}.o")));
    let speaks = compiler.output().unwrap().status.success();
    if !speaks {
        skipped(&format!("the C programs as {standard}, which `cc` does not know"));
    }
    speaks
}

fn programs() -> Vec<PathBuf> {
    let mut programs = Vec::new();
    for folder in ["tests/c", "examples/c"] {
        let files = fs::read_dir(root().join(folder)).unwrap().map(|entry| entry.unwrap().path());
        programs.extend(files.filter(|file| file.extension().is_some_and(|e| e == "c")));
    }
    programs.retain(|file| !NOT_PROGRAMS.iter().any(|name| file.file_stem().unwrap() == *name));
    programs.sort();
    programs
}

#[test]
fn programs_print_what_is_expected() {
    let Some(libraries) = libraries() else { return };
    let programs = programs();
    assert!(programs.len() >= 4);
    for (language, standard) in LANGUAGES {
        if !speaks(language, standard) {
            continue;
        }
        for source in &programs {
            let name = source.file_stem().unwrap().to_str().unwrap();
            let program = scratch().join(format!("{name}-{standard}"));
            let mut build = compiler(language, standard);
            build.arg(source).args(["-x", "none"]).arg(libraries.join("libfieldstop.a"));
            build.args(["-lpthread", "-ldl", "-lm", "-o"]).arg(&program);
            finish(build, &format!("{name} as {standard}"));
            let mut run = Command::new(&program);
            // Where a program may leave a file.
            run.current_dir(scratch());
            let printed = finish(run, &format!("running {name} as {standard}"));
            let expected = fs::read_to_string(root().join(format!("tests/c/{name}.expected")));
            assert_eq!(printed, expected.unwrap_or_default(), "{name} as {standard}");
        }
    }
}

#[cfg(target_os = "linux")]
#[test]
fn shared_library_serves_the_same_program() {
    let Some(libraries) = libraries() else { return };
    let program = scratch().join("readout-shared");
    let mut build = compiler("c", "c99");
    build.arg(root().join("examples/c/readout.c")).arg("-L").arg(libraries);
    build.arg(format!("-Wl,-rpath,{}", libraries.display())).args(["-l:libfieldstop.so", "-o"]).arg(&program);
    finish(build, "readout with the shared library");
    let expected = fs::read_to_string(root().join("tests/c/readout.expected")).unwrap();
    assert_eq!(finish(Command::new(&program), "readout with the shared library"), expected);
}

#[test]
fn compiler_warns_of_an_ignored_status() {
    if libraries().is_none() {
        return;
    }
    for (language, standard) in
        LANGUAGES.into_iter().filter(|(language, standard)| speaks(language, standard))
    {
        let mut build = compiler(language, standard);
        build
            .arg("-c")
            .arg(root().join("tests/c/ignored_status.c"))
            .arg("-o")
            .arg(scratch().join("ignored.o"));
        let output = build.output().unwrap();
        let error = String::from_utf8_lossy(&output.stderr);
        assert!(!output.status.success(), "{standard} says nothing of an ignored status");
        assert!(error.contains("fieldstop_plate_scale_fx") && error.contains("unused-result"), "{error}");
    }
}

#[cfg(target_os = "linux")]
#[test]
fn header_of_another_abi_does_not_link() {
    let Some(libraries) = libraries() else { return };
    let include = scratch().join("another-abi");
    fs::create_dir_all(&include).unwrap();
    let header = fs::read_to_string(root().join("include/fieldstop.h")).unwrap();
    fs::write(include.join("fieldstop.h"), header.replace("fieldstop_abi_1", "fieldstop_abi_2")).unwrap();
    let mut build = Command::new("cc");
    build.arg("-I").arg(&include).arg(root().join("examples/c/readout.c"));
    build.arg(libraries.join("libfieldstop.a")).args(["-lpthread", "-ldl", "-lm", "-o"]);
    let output = build.arg(scratch().join("another-abi/readout")).output().unwrap();
    assert!(!output.status.success(), "a header of another ABI links");
    assert!(String::from_utf8_lossy(&output.stderr).contains("fieldstop_abi_2"));
}

const CPP_COMPILERS: [&str; 2] = ["g++", "clang++"];
const CPP_STANDARDS: [&str; 4] = ["c++11", "c++14", "c++17", "c++20"];

/// The C++ compilers of this machine, each with the standards that it knows.
fn cpp_compilers() -> Vec<(&'static str, Vec<&'static str>)> {
    let source = scratch().join("empty.cpp");
    fs::write(&source, "int main() { return 0; }\n").unwrap();
    let mut found = Vec::new();
    for compiler in CPP_COMPILERS {
        let knows = |standard: &&str| {
            let mut build = Command::new(compiler);
            build.arg(format!("-std={standard}")).arg("-c").arg(&source).arg("-o");
            build.arg(scratch().join("empty-cpp.o")).output().is_ok_and(|output| output.status.success())
        };
        let standards: Vec<&str> = CPP_STANDARDS.into_iter().filter(knows).collect();
        if standards.len() < CPP_STANDARDS.len() {
            let missing = CPP_STANDARDS.len() - standards.len();
            skipped(&format!("{missing} of {} standards of C++ with {compiler}", CPP_STANDARDS.len()));
        }
        found.push((compiler, standards));
    }
    found
}

fn cpp(compiler: &str, standard: &str, source: &str) -> Command {
    let mut build = Command::new(compiler);
    build.args([&format!("-std={standard}"), "-O1", "-fno-exceptions", "-fno-rtti"]);
    build.args([
        "-Wall",
        "-Wextra",
        "-Wpedantic",
        "-Wconversion",
        "-Wsign-conversion",
        "-Wshadow",
        "-Werror",
    ]);
    build.arg("-I").arg(root().join("include")).arg(root().join("tests/cpp").join(source));
    build
}

#[test]
fn cpp_header_works() {
    let Some(libraries) = libraries() else { return };
    let macros = root().join("tests/c/embedded_macros.h");
    let macros = macros.to_str().unwrap();
    for (compiler, standards) in cpp_compilers() {
        for standard in standards {
            for more in [&[][..], &["-DFIELDSTOP_NO_FLOAT"], &["-include", macros]] {
                let program = scratch().join("quantities");
                let mut build = cpp(compiler, standard, "quantities.cpp");
                build.args(more).arg(libraries.join("libfieldstop.a"));
                build.args(["-lpthread", "-ldl", "-lm", "-o"]).arg(&program);
                let what = format!("quantities as {standard} by {compiler} {more:?}");
                finish(build, &what);
                finish(Command::new(&program), &what);
            }
        }
    }
}

#[test]
fn cpp_mistakes_do_not_compile() {
    let text = fs::read_to_string(root().join("tests/cpp/refused.cpp")).unwrap();
    let mistakes = text.matches("if REFUSED == ").count();
    assert!(mistakes >= 14);
    for (compiler, standards) in cpp_compilers() {
        for standard in standards.into_iter().filter(|s| ["c++11", "c++17"].contains(s)) {
            for mistake in 0..=mistakes {
                let mut build = cpp(compiler, standard, "refused.cpp");
                build.arg(format!("-DREFUSED={mistake}")).args(["-fsyntax-only"]);
                let output = build.output().unwrap();
                let error = String::from_utf8_lossy(&output.stderr);
                assert_eq!(
                    output.status.success(),
                    mistake == 0,
                    "mistake {mistake} as {standard} by {compiler}\n{error}"
                );
            }
        }
    }
}

#[test]
fn value_of_a_result_without_one_stops() {
    let Some(libraries) = libraries() else { return };
    for (compiler, standards) in cpp_compilers() {
        for standard in standards.into_iter().take(1) {
            for (own, code) in [(true, Some(3)), (false, None)] {
                let program = scratch().join("stop");
                let mut build = cpp(compiler, standard, "stop.cpp");
                build.args(own.then_some("-DOWN_STOP")).arg(libraries.join("libfieldstop.a"));
                build.args(["-lpthread", "-ldl", "-lm", "-o"]).arg(&program);
                finish(build, &format!("stop as {standard} by {compiler}"));
                let ended = Command::new(&program).output().unwrap().status;
                assert_eq!(ended.code(), code, "{standard} by {compiler}: {ended}");
            }
        }
    }
}
