//! The header's comment of each function quotes the error bound of its row.

use super::registry::{FloatOwed, Owed, all_rows};
use std::collections::BTreeSet;
use std::fs;
use std::path::Path;

/// The comment before the prototype of `name`.
fn comment<'a>(header: &'a str, name: &str) -> &'a str {
    let prototype = format!("fieldstop_status {name}(");
    let at = header.find(&prototype).unwrap_or_else(|| panic!("{name} is not in the header"));
    &header[header[..at].rfind("/**").unwrap()..at]
}

fn part(part: f64) -> String {
    let power = if part < 1e-6 { 7 } else { 6 };
    let count = (part * 10f64.powi(power) * 1000.0).round() / 1000.0;
    let parts = if count == 1.0 { "part" } else { "parts" };
    format!("{count} {parts} in 10^{power}")
}

fn fixed(owed: Owed) -> String {
    match owed {
        Owed { lsb: 0.0, .. } => "0".to_string(),
        Owed { lsb, part: 0.0 } => format!("{lsb} LSB"),
        Owed { lsb, part: p } => format!("{lsb} LSB or {}, the larger", part(p)),
    }
}

fn float(owed: FloatOwed) -> String {
    match owed {
        FloatOwed::Ulp(0.0) => "0".to_string(),
        FloatOwed::Ulp(ulp) => format!("{ulp} ulp"),
        FloatOwed::Part(p) => part(p),
        // A formula; the row's own file stands for it.
        FloatOwed::Absolute(_) => String::new(),
    }
}

#[test]
fn header_quotes_every_bound() {
    let path = Path::new(env!("CARGO_MANIFEST_DIR")).join("include/fieldstop.h");
    let header = fs::read_to_string(path).unwrap();
    for row in all_rows() {
        let mut bounds = vec![("fx", fixed(row.owed))];
        bounds.extend(row.single.map(|_| ("f32", float(row.single_owed))));
        bounds.extend(row.double.map(|_| ("f64", float(row.double_owed))));
        for (form, bound) in bounds {
            let name = format!("fieldstop_{}_{form}", row.stem);
            let comment = comment(&header, &name);
            // In one line, so that a bound may be wrapped.
            let comment =
                comment.split([' ', '\n', '*']).filter(|w| !w.is_empty()).collect::<Vec<_>>().join(" ");
            let quoted = format!("Error: at most {bound}");
            let at = comment.find(&quoted).unwrap_or_else(|| panic!("{name} does not say \"{quoted}\""));
            let after = &comment[at + quoted.len()..];
            let ends =
                bound.is_empty() || after.starts_with(['.', ',', ' ', ';']) && !after.starts_with(" or ");
            assert!(ends, "{name}: \"{quoted}{after}\" is another bound");
        }
    }
}

#[test]
fn header_has_the_arguments_of_every_row() {
    let root = Path::new(env!("CARGO_MANIFEST_DIR"));
    let header = fs::read_to_string(root.join("include/fieldstop.h")).unwrap();
    let mut subjects = BTreeSet::new();
    for row in all_rows() {
        let prototype = format!("fieldstop_{}_fx(", row.stem);
        let at = header.find(&prototype).unwrap_or_else(|| panic!("{} is not in the header", row.stem));
        let rest = &header[at + prototype.len()..];
        let arguments: Vec<&str> = rest[..rest.find(')').unwrap()]
            .split(',')
            .map(|a| a.rsplit([' ', '*']).next().unwrap())
            .collect();
        let named: Vec<&str> = row.arguments.iter().map(|argument| argument.name).collect();
        assert_eq!(arguments[..arguments.len() - 1], named, "fieldstop_{}_fx", row.stem);
        subjects.insert(row.subject);
    }
    for subject in subjects {
        assert!(root.join(format!("src/capi/{subject}.rs")).exists(), "{subject}");
    }
}
