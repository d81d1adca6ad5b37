//! A character display of four lines of twenty: it keeps what was written, and takes only what changed.

use crate::equipment::DISPLAY_COLUMNS;
use crate::pages::{Content, DISPLAY_LINES, STYLE};
use fieldstop::text::changed;

/// What a person must know before looking through any of this.
pub const CAUTION: &str =
    "Caution: never point unfiltered optics at the Sun. Follow the maker's\ninstructions and local rules.";

pub struct Display {
    lines: [String; DISPLAY_LINES],
}

impl Display {
    pub fn new() -> Display {
        Display { lines: [const { String::new() }; DISPLAY_LINES].map(|_| " ".repeat(DISPLAY_COLUMNS)) }
    }

    /// Puts a page on the display as firmware does on a slow bus: of each line only the characters that changed.
    pub fn show(&mut self, content: &Content) {
        for (at, shown) in self.lines.iter_mut().enumerate() {
            let line = content.lines.get(at).map_or("", String::as_str);
            let line = format!("{line:DISPLAY_COLUMNS$}");
            let span = changed(shown.as_bytes(), line.as_bytes(), &STYLE);
            let (first, count) = (usize::from(span.first), usize::from(span.count));
            let kept = |from, to| shown.chars().skip(from).take(to).collect::<String>();
            let new: String = line.chars().skip(first).take(count).collect();
            *shown = kept(0, first) + &new + &kept(first + count, DISPLAY_COLUMNS);
        }
    }

    /// The display in its frame, with what each line means beside it and the facts below.
    pub fn draw(&self, content: &Content) -> String {
        let edge = "─".repeat(DISPLAY_COLUMNS);
        let mut drawing = format!("┌{edge}┐\n");
        for (at, line) in self.lines.iter().enumerate() {
            let meaning = content.meanings.get(at).copied().unwrap_or_default();
            drawing += format!("│{line}│  {meaning}").trim_end();
            drawing += "\n";
        }
        drawing += &format!("└{edge}┘\n");
        for fact in &content.facts {
            drawing += &format!("! {fact}\n");
        }
        drawing
    }
}
