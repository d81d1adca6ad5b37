//! A simulated hand controller: a file's equipment on the pages of a display of four lines of twenty characters.

mod decimal;
mod display;
mod equipment;
mod keys;
mod pages;
mod table;
mod terminal;

use display::{CAUTION, Display};
use equipment::Equipment;
use pages::Choice;
use std::io::{IsTerminal, Write, stdin, stdout};
use std::process::ExitCode;

const USAGE: &str = "\
usage: handset [--once] [FILE]

Shows what the telescopes, eyepieces and camera of FILE give, page by page, as a display of
four lines of twenty characters. Without FILE it takes the shipped equipment.toml.

--once  prints every page once for the first telescope and eyepiece, and the layout of the other
        telescopes, and ends; so does a start without a terminal
";

const SHIPPED: (&str, &str) = ("equipment.toml", include_str!("equipment.toml"));

fn main() -> ExitCode {
    match run() {
        Ok(()) => ExitCode::SUCCESS,
        Err(problem) => {
            eprintln!("handset: {problem}");
            ExitCode::FAILURE
        }
    }
}

fn run() -> Result<(), String> {
    let mut once = !(stdin().is_terminal() && stdout().is_terminal());
    let mut path = None;
    for argument in std::env::args().skip(1) {
        match argument.as_str() {
            "--once" => once = true,
            "--help" => {
                print!("{USAGE}\n{CAUTION}\n");
                return Ok(());
            }
            option if option.starts_with('-') => return Err(format!("unknown option {option}\n{USAGE}")),
            _ if path.is_some() => return Err(format!("more than one file\n{USAGE}")),
            _ => path = Some(argument),
        }
    }
    let (name, file) = match &path {
        Some(path) => {
            let file = std::fs::read_to_string(path).map_err(|error| format!("{path}: {error}"))?;
            (path.as_str(), file)
        }
        None => (SHIPPED.0, SHIPPED.1.to_string()),
    };
    let equipment = Equipment::read(&file).map_err(|error| format!("{name}, {error}"))?;
    let shown = if once { print_pages(&equipment) } else { terminal::run(&equipment) };
    match shown {
        // Whoever read the pages has seen enough.
        Err(error) if error.kind() == std::io::ErrorKind::BrokenPipe => Ok(()),
        result => result.map_err(|error| error.to_string()),
    }
}

fn print_pages(equipment: &Equipment) -> std::io::Result<()> {
    let mut out = stdout().lock();
    let mut display = Display::new();
    writeln!(out, "{}", equipment.school)?;
    for telescope in 0..equipment.telescopes.len() {
        let pages = match telescope {
            0 => pages::of_telescope(equipment, telescope),
            _ => pages::of_layout(equipment, telescope),
        };
        for page in pages {
            let choice = Choice { telescope, ..Choice::default() };
            let content = page.content(equipment, choice).map_err(std::io::Error::other)?;
            display.show(&content);
            write!(out, "\n{}", display.draw(&content))?;
        }
    }
    writeln!(out, "\n{CAUTION}")
}
