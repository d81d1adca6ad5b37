//! The display in a terminal, with keys.

use crate::display::{CAUTION, Display};
use crate::equipment::Equipment;
use crate::keys::{HELP, Key, key};
use crate::pages::{self, Choice};
use crossterm::cursor::{Hide, MoveTo, Show};
use crossterm::style::Print;
use crossterm::terminal::{
    Clear, ClearType, EnterAlternateScreen, LeaveAlternateScreen, disable_raw_mode, enable_raw_mode,
};
use crossterm::{event, execute};
use std::io::{self, stdout};

pub fn run(equipment: &Equipment) -> io::Result<()> {
    enable_raw_mode()?;
    let result = execute!(stdout(), EnterAlternateScreen, Hide).and_then(|()| turn_pages(equipment));
    let restored = execute!(stdout(), Show, LeaveAlternateScreen);
    disable_raw_mode()?;
    result.and(restored)
}

fn turn_pages(equipment: &Equipment) -> io::Result<()> {
    let mut page = 0;
    let mut choice = Choice::default();
    let mut display = Display::new();
    loop {
        let pages = pages::of_telescope(equipment, choice.telescope);
        page = page.min(pages.len() - 1);
        let content = pages[page].content(equipment, choice).map_err(io::Error::other)?;
        display.show(&content);
        let screen = format!(
            "{}\n{} with {}, page {} of {}\n\n{}\n{HELP}\n\n{CAUTION}\n",
            equipment.school,
            equipment.telescopes[choice.telescope].name,
            equipment.eyepieces[choice.eyepiece].name,
            page + 1,
            pages.len(),
            display.draw(&content),
        );
        // A raw terminal does not go back to the left by itself.
        execute!(stdout(), Clear(ClearType::All), MoveTo(0, 0), Print(screen.replace('\n', "\r\n")))?;

        let pressed = loop {
            if let Some(pressed) = key(&event::read()?) {
                break pressed;
            }
        };
        match pressed {
            Key::Telescope(step) => {
                choice.telescope = step.from(choice.telescope, equipment.telescopes.len());
            }
            Key::Eyepiece(step) => choice.eyepiece = step.from(choice.eyepiece, equipment.eyepieces.len()),
            Key::Page(step) => page = step.from(page, pages.len()),
            Key::Redraw => {}
            Key::Quit => return Ok(()),
        }
    }
}
