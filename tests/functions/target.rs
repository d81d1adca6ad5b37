//! The registry's rows as C, for the programs that run on the emulated parts: tests/target/rows.h. To renew it:
//! `FIELDSTOP_RENEW=1 cargo test --test functions target`.

use super::registry::{Argument, Row, all_rows};
use std::fmt::Write;
use std::fs;
use std::path::Path;

/// An integer of C that is read as 32 bits whatever its sign.
fn word(x: i64) -> String {
    format!("{}u", x as u32)
}

fn drawn(a: &Argument) -> String {
    let [lowest, highest] = [a.usual.0, a.usual.1].map(word);
    let [least, most] = [a.range.0, a.range.1].map(word);
    format!(" DRAW({lowest}, {highest}, {least}, {most})")
}

fn call(row: &Row) -> String {
    let arguments: Vec<String> = (row.arguments.iter().enumerate())
        .map(|(i, a)| {
            let cast = match (a.unit.least < 0, a.unit.most) {
                (true, _) => "(int32_t)",
                (_, 0xff) => "(uint8_t)",
                (_, 0xffff) => "(uint16_t)",
                _ => "",
            };
            format!("{cast}a[{i}], ")
        })
        .collect();
    let result = if row.result.least < 0 { "(int32_t *)&result" } else { "&result" };
    format!("fieldstop_{}_fx({}{result})", row.stem, arguments.concat())
}

fn header() -> String {
    let mut text = String::from(
        "/* Made from the registry of tests/functions: do not edit. Each row draws its arguments and calls. */\n",
    );
    for (i, row) in all_rows().iter().enumerate() {
        let draws: String = row.arguments.iter().map(drawn).collect();
        writeln!(text, "#if HAS_ROW({i})\nROW({},{draws}, {})\n#endif", row.stem, call(row)).unwrap();
    }
    writeln!(text, "#define ROWS {}", all_rows().len()).unwrap();
    text
}

#[test]
fn rows_of_the_target_programs_are_those_of_the_registry() {
    let path = Path::new(env!("CARGO_MANIFEST_DIR")).join("tests/target/rows.h");
    let expected = header();
    if std::env::var_os("FIELDSTOP_RENEW").is_some_and(|value| value == "1") {
        fs::write(&path, &expected).unwrap();
    }
    assert_eq!(fs::read_to_string(path).unwrap_or_default(), expected, "renew tests/target/rows.h");
}
