//! The handset example: its pages, its refusals, its numbers.

#[path = "../examples/handset/decimal.rs"]
mod decimal;
#[path = "../examples/handset/keys.rs"]
mod keys;

use decimal::Decimal;
use std::fs;
use std::path::{Path, PathBuf};
use std::process::{Command, Output, Stdio};
use std::sync::OnceLock;
use std::time::SystemTime;

const SHIPPED: &str = include_str!("../examples/handset/equipment.toml");

/// The built example, beside the folder of this test. `cargo test` builds it first, `cargo test --test handset`
/// does not.
fn handset() -> &'static Path {
    static BUILT: OnceLock<PathBuf> = OnceLock::new();
    BUILT.get_or_init(|| {
        let test = std::env::current_exe().unwrap();
        let profile = test.parent().unwrap().parent().unwrap();
        let example = profile.join(format!("examples/handset{}", std::env::consts::EXE_SUFFIX));
        let built = fs::metadata(&example).and_then(|data| data.modified());
        let root = Path::new(env!("CARGO_MANIFEST_DIR"));
        let changed = newest(&root.join("src")).max(newest(&root.join("examples/handset")));
        if built.is_err() || built.unwrap() < changed {
            let mut cargo = Command::new(env!("CARGO"));
            cargo.current_dir(root).args(["build", "--quiet", "--example", "handset"]);
            if profile.ends_with("release") {
                cargo.arg("--release");
            }
            assert!(cargo.status().unwrap().success());
        }
        example
    })
}

fn newest(folder: &Path) -> SystemTime {
    let entries = fs::read_dir(folder).unwrap().map(|entry| entry.unwrap().path());
    let times = entries.map(|path| {
        if path.is_dir() { newest(&path) } else { fs::metadata(&path).unwrap().modified().unwrap() }
    });
    times.max().unwrap_or(SystemTime::UNIX_EPOCH)
}

fn run(arguments: &[&str]) -> Output {
    Command::new(handset()).args(arguments).stdin(Stdio::null()).output().unwrap()
}

/// What the example says to a file with this text: exit code, pages, complaint.
fn run_on(name: &str, text: &str) -> (Option<i32>, String, String) {
    let path = Path::new(env!("CARGO_TARGET_TMPDIR")).join(format!("{name}.toml"));
    fs::write(&path, text).unwrap();
    let output = run(&["--once", path.to_str().unwrap()]);
    let said = String::from_utf8(output.stderr).unwrap().replace(path.to_str().unwrap(), "FILE");
    (output.status.code(), String::from_utf8(output.stdout).unwrap(), said)
}

/// The shipped file with one piece of it changed.
fn shipped_with(old: &str, new: &str) -> String {
    assert!(SHIPPED.contains(old), "{old}");
    SHIPPED.replacen(old, new, 1)
}

/// The lines between the display's edges.
fn display_lines(pages: &str) -> Vec<&str> {
    pages.lines().filter_map(|line| line.strip_prefix('│')?.split('│').next()).collect()
}

#[test]
fn prints_every_page_once_and_ends() {
    let output = run(&["--once"]);
    assert_eq!(output.status.code(), Some(0));
    assert_eq!(String::from_utf8_lossy(&output.stderr), "");
    let pages = String::from_utf8(output.stdout).unwrap();
    assert!(pages.starts_with("Tarnwick Night School\n"));
    assert!(pages.contains("never point unfiltered optics at the Sun"));
    assert!(pages.lines().all(|line| line.chars().count() < 80));
    let lines = display_lines(&pages);
    assert_eq!(lines.len(), 4 * pages.matches('┌').count());
    for line in &lines {
        assert_eq!(line.chars().count(), 20, "{line}");
    }
    // Worked by hand for the reflector of 187.5 mm and 1130 mm, the eyepiece of 37 mm and 43.2 mm of field stop,
    // the pixels of 4.1 um: 1130 / 37, 187.5 / 30.54, 2 atan(21.6 / 1130), 116 / 187.5, 1130 / 187.5, 187.5 / 6.2,
    // 187.5 sqrt((1 - (47 / 187.5)^2) 0.82), 6.0267 times the inverse of that root, 206.265 4.1 / 1130,
    // 206265 / 1130, 2 atan(4128 0.0041 / 2260), 5.3 + 5 log10(164.36 / 6.2).
    for value in [
        "30.5×",
        "6.1 mm",
        "2°11′",
        "0.62″",
        "f/6.0",
        "30.2×",
        "164 mm",
        " 6.9",
        "0.75″/px",
        "183″/mm",
        "51′29″",
        "12.4 mag",
        "1130 mm",
    ] {
        assert!(lines.iter().any(|line| line.ends_with(value)), "{value} in\n{pages}");
    }
    assert!(!lines.iter().any(|line| line.ends_with('-')), "all is known\n{pages}");
}

#[test]
fn without_a_terminal_it_does_the_same() {
    assert_eq!(run(&[]).stdout, run(&["--once"]).stdout);
    assert_eq!(run(&[]).status.code(), Some(0));
}

#[test]
fn what_is_unknown_is_a_dash_and_the_rest_is_shown() {
    let (code, pages, said) = run_on("unknown", &shipped_with("field_stop_mm = 43.2", ""));
    assert_eq!((code, said.as_str()), (Some(0), ""));
    let lines = display_lines(&pages);
    assert!(
        lines.iter().any(|line| line.starts_with("True field") && line.trim_end().ends_with('-')),
        "{pages}"
    );
    assert_eq!(
        lines.iter().filter(|line| line.ends_with(" -")).count(),
        2,
        "the field, and whether it is estimated\n{pages}"
    );
    assert!(lines.iter().any(|line| line.ends_with("30.5×")), "{pages}");
}

#[test]
fn decimals_reach_the_library_exactly() {
    // As floats, 1.005 mm and 0.29 mm are under 1005 and 290 micrometres.
    let (_, pages, _) = run_on("exact", &shipped_with("focal_length_mm = 37\n", "focal_length_mm = 1.005\n"));
    assert!(pages.contains("1124×"), "1130000 / 1005 = 1124.38\n{pages}");
}

#[test]
fn facts_are_told() {
    let (_, pages, _) = run_on("wide", &shipped_with("focal_length_mm = 37\n", "focal_length_mm = 50\n"));
    assert!(pages.contains("! Exit pupil wider than the eye's"), "{pages}");
    let (_, pages, _) = run_on("empty", &shipped_with("focal_length_mm = 37\n", "focal_length_mm = 3\n"));
    assert!(pages.contains("! Magnified past what the resolution supports"), "{pages}");
    let (_, pages, _) = run_on("coarse", &shipped_with("binning = 1", "binning = 2"));
    assert!(pages.contains("! Under two pixels to a star's width"), "{pages}");
}

#[test]
fn bad_files_are_told_with_line_field_and_reason() {
    let cases = [
        ("aperture_mm = 94\n", "aperture_mm = 0\n", "line 27: telescope 2, aperture_mm: must be over 0"),
        (
            "aperture_mm = 94\n",
            "aperture_mm = -94\n",
            "line 27: telescope 2, aperture_mm: must not be negative",
        ),
        ("aperture_mm = 94\n", "\n", "line 25: telescope 2, aperture_mm: missing; it must be over 0"),
        ("aperture_mm = 94\n", "apertur = 94\n", "line 27: telescope 2, apertur: unknown here; known are "),
        (
            "187.5",
            "187.50005",
            "line 20: telescope 1, aperture_mm: too fine: it lies between two steps of 1/1000",
        ),
        ("187.5", "\"187.5\"", "line 20: telescope 1, aperture_mm: must be a number"),
        ("187.5", "0xbb", "line 20: telescope 1, aperture_mm: must be a number"),
        ("187.5", "1.875e2", "line 20: telescope 1, aperture_mm: must be written as a plain decimal number"),
        ("187.5", "nan", "line 20: telescope 1, aperture_mm: must be written as a plain decimal number"),
        ("187.5", "inf", "line 20: telescope 1, aperture_mm: must be written as a plain decimal number"),
        ("187.5", "5000000000", "line 20: telescope 1, aperture_mm: too large"),
        ("187.5", "99999999999999999999", "line 20: telescope 1, aperture_mm: too many digits"),
        ("104.5", "312", "line 35: telescope 3, obstruction_mm: must be under the aperture"),
        ("amplification = 1.8", "amplification = 0", "line 36: telescope 3, amplification: must be over 0"),
        ("throughput = 0.95", "throughput = 1.1", "line 29: telescope 2, throughput: must be from 0 to 1"),
        ("deg = 66", "deg = 180", "line 47: eyepiece 2, apparent_field_deg: must be under 180"),
        ("mapping = \"rect", "mapping = \"bent", "line 54: eyepiece 3, mapping: must be \"equidistant\" or"),
        ("mapping = \"rect", "mapping = 7 #", "line 54: eyepiece 3, mapping: must be a text in quotes"),
        (
            "\"Old 5.7\"",
            "\"Old eyepiece nobody knows\"",
            "line 57: eyepiece 4, name: must have 1 to 20 characters",
        ),
        ("\"Old 5.7\"", "\"\"", "line 57: eyepiece 4, name: must have 1 to 20 characters"),
        ("name = \"Old 5.7\"", "", "line 56: eyepiece 4, name: missing"),
        ("columns = 4128", "columns = 66000", "line 63: camera, columns: too large"),
        ("columns = 4128", "columns = 41.5", "line 63: camera, columns: must be a whole number"),
        ("binning = 1 ", "binning = 0 ", "line 65: camera, binning: must be over 0"),
        ("[camera]", "[camra]", "line 60: camra: unknown here; known are school, observer"),
        ("[camera]", "[[camera]]", "line 60: camera: must be a table"),
        ("wavelength_nm = 550", "", "line 11: observer, wavelength_nm: missing"),
        ("naked_eye_mag = 5.3 ", "", "line 11: observer, naked_eye_mag: missing"),
        ("school = \"Tarnwick Night School\"", "", "line 1: school: missing"),
        (
            "school = \"Tarnwick",
            "school = \"Tarn\\u0007wick",
            "line 9: school: must have 1 to 60 characters, on one line",
        ),
        ("school = ", "school : ", "line 9: not TOML: "),
        ("name = \"Old 5.7\"", "name = ", "line 57: not TOML: "),
        ("[observer]", "[observer]\nseeing_arcsec = 2", "line 16: not TOML: duplicate key"),
    ];
    for (at, (old, new, complaint)) in cases.into_iter().enumerate() {
        let (code, pages, said) = run_on(&format!("bad-{at}"), &shipped_with(old, new));
        assert_eq!((code, pages.as_str()), (Some(1), ""), "{new}");
        assert!(said.starts_with(&format!("handset: FILE, {complaint}")), "{new}\n{said}");
        assert_eq!(said.lines().count(), 1, "{said}");
    }
    let (code, _, said) = run_on("bad-empty", "");
    assert_eq!((code, said.as_str()), (Some(1), "handset: FILE, line 1: school: missing\n"));
}

#[test]
fn bad_command_lines_are_told() {
    for arguments in [&["--nothing"][..], &["a.toml", "b.toml"], &["no-such-file.toml"]] {
        let output = run(arguments);
        assert_eq!(output.status.code(), Some(1));
        assert!(output.stdout.is_empty());
        assert!(output.stderr.starts_with(b"handset: "));
    }
    let help = run(&["--help"]);
    assert_eq!(help.status.code(), Some(0));
    assert!(String::from_utf8_lossy(&help.stdout).contains("usage: handset"));
}

#[test]
fn decimals_are_read_without_a_float() {
    let steps = |text: &str, per_unit| Decimal::read(text).and_then(|decimal| decimal.steps(per_unit)).ok();
    assert_eq!(steps("203.5", 1000), Some(203_500));
    assert_eq!(steps("1.005", 1000), Some(1005));
    assert_eq!(steps("0.29", 1000), Some(290));
    assert_eq!(steps("-0.001", 1000), Some(-1));
    assert_eq!(steps("+1_130", 1000), Some(1_130_000));
    assert_eq!(steps("5.000000000000000000000000", 1), Some(5));
    assert_eq!(steps("66.6", 3_600_000), Some(239_760_000));
    assert_eq!(steps("0.0005", 1000), None);
    for text in
        ["1e3", "inf", "nan", "0x10", "1.5.2", "--1", "", "99999999999999999999", "0.00000000000000000000001"]
    {
        assert_eq!(steps(text, 1000), None, "{text}");
    }
    let nearest = |text: &str| Decimal::read(text).and_then(|decimal| decimal.nearest_steps(65_536)).ok();
    assert_eq!(nearest("1"), Some(65_536));
    assert_eq!(nearest("1.8"), Some(117_965)); // 117964.8
    assert_eq!(nearest("0.82"), Some(53_740)); // 53739.52
    assert_eq!(nearest("0.00000762939453125"), Some(1)); // half a step
    assert_eq!(nearest("0.0000076"), Some(0));
}

#[test]
fn keys_go_round() {
    use crossterm::event::{Event, KeyCode, KeyEvent, KeyModifiers};
    use keys::{HELP, Key, Step, key};
    let press = |code| key(&Event::Key(KeyEvent::new(code, KeyModifiers::NONE)));
    assert!(matches!(press(KeyCode::Char('t')), Some(Key::Telescope(Step::Next))));
    assert!(matches!(press(KeyCode::Char('E')), Some(Key::Eyepiece(Step::Previous))));
    assert!(matches!(press(KeyCode::Right), Some(Key::Page(Step::Next))));
    assert!(matches!(press(KeyCode::Esc), Some(Key::Quit)));
    assert!(press(KeyCode::Char('x')).is_none());
    assert!(matches!(key(&Event::Resize(80, 24)), Some(Key::Redraw)));
    assert_eq!((Step::Next.from(2, 3), Step::Previous.from(0, 3), Step::Next.from(0, 1)), (0, 2, 0));
    assert!(HELP.contains("q quit"));
}

/// What the example shows comes through the integer forms only.
#[test]
fn no_float_in_the_example() {
    for entry in fs::read_dir(Path::new(env!("CARGO_MANIFEST_DIR")).join("examples/handset")).unwrap() {
        let path = entry.unwrap().path();
        let text = fs::read_to_string(&path).unwrap();
        assert!(!text.contains("f32") && !text.contains("f64"), "{}", path.display());
    }
}
