//! What `tests/cost` counts: for each function, arguments of usual telescopes and arguments from the whole of their
//! types, all of them accepted, with the result. FIELDSTOP_COST_CASES names the folder to write them to, as C.

use super::cases;
use super::registry::{Argument, Row, all_rows};
use std::fmt::Write;
use std::path::Path;

const USUAL: usize = 64;
const WHOLE: usize = 256;

/// The first that the function takes, each with its result in the last place.
fn accepted(row: &Row, drawn: impl Iterator<Item = Vec<i64>>, count: usize) -> Vec<Vec<i64>> {
    let taken = drawn.filter_map(|mut case| {
        let result = (row.fixed)(&case).ok()?;
        case.push(result);
        Some(case)
    });
    taken.take(count).collect()
}

fn usual(row: &Row) -> Vec<Vec<i64>> {
    accepted(row, cases::usual(row, 16 * USUAL).into_iter(), USUAL)
}

fn whole(row: &Row) -> Vec<Vec<i64>> {
    accepted(row, cases::whole_types(row, 64 * WHOLE).into_iter(), WHOLE)
}

/// A table of words; a negative one is written as its 32 bits.
fn table(name: &str, cases: &[Vec<i64>]) -> String {
    let mut text = format!("static const uint32_t {name}[][WORDS] = {{\n");
    for case in cases {
        let words: Vec<String> = case.iter().map(|&x| format!("{}u", x as u32)).collect();
        writeln!(text, "    {{{}}},", words.join(", ")).unwrap();
    }
    text + "};\n"
}

fn header(row: &Row) -> String {
    let signed = |least: i64| if least < 0 { "1" } else { "0" };
    let bytes = |most: i64| match most {
        0xff => 1,
        0xffff => 2,
        _ => 4,
    };
    let units = row.arguments.iter().map(|a| a.unit).chain([row.result]).collect::<Vec<_>>();
    let list = |words: Vec<String>| words.join(", ");
    format!(
        "#define FUNCTION fieldstop_{}_fx\n#define ARGUMENTS {}\n#define WORDS (ARGUMENTS + 1)\n\
         /* Steps to the float unit, and whether signed; the result's last. */\n\
         static const double steps[WORDS] = {{{}}};\nstatic const uint8_t is_signed[WORDS] = {{{}}};\n\
         /* Bytes that each has in C. */\nstatic const uint8_t bytes[WORDS] = {{{}}};\n\
         /* Whether it is an integer in every form. */\nstatic const uint8_t is_count[WORDS] = {{{}}};\n{}{}",
        row.stem,
        row.arguments.len(),
        list(units.iter().map(|u| format!("{:?}", u.steps)).collect()),
        list(units.iter().map(|u| signed(u.least).to_string()).collect()),
        list(units.iter().map(|u| bytes(u.most).to_string()).collect()),
        list(units.iter().map(|u| u8::from(u.count).to_string()).collect()),
        table("usual", &usual(row)),
        table("whole", &whole(row)),
    )
}

/// Telescopes, for the screens: the usual arguments of their four functions at once.
fn telescopes(rows: &[Row]) -> String {
    let argument = |name: &str| *rows.iter().flat_map(|r| r.arguments).find(|a| a.name == name).unwrap();
    let arguments: Vec<Argument> =
        ["aperture_um", "focal_length_um", "eyepiece_um", "field_stop_um", "wavelength_nm"]
            .map(argument)
            .to_vec();
    let drawn = cases::usual_arguments("telescopes", &arguments, USUAL);
    format!("#define WORDS {}\n{}", arguments.len(), table("usual", &drawn))
}

#[test]
fn every_function_has_cases_to_count() {
    let rows = all_rows();
    for row in &rows {
        assert_eq!(usual(row).len(), USUAL, "{}", row.stem);
        assert_eq!(whole(row).len(), WHOLE, "{}", row.stem);
    }
    if let Ok(folder) = std::env::var("FIELDSTOP_COST_CASES") {
        let folder = Path::new(&folder);
        for row in &rows {
            std::fs::write(folder.join(format!("{}.h", row.stem)), header(row)).unwrap();
        }
        std::fs::write(folder.join("telescopes.h"), telescopes(&rows)).unwrap();
    }
}
