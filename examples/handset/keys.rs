//! What the keys do.

use crossterm::event::{Event, KeyCode, KeyEventKind, KeyModifiers};

pub enum Key {
    Telescope(Step),
    Eyepiece(Step),
    Page(Step),
    /// No key: the window changed.
    Redraw,
    Quit,
}

#[derive(Clone, Copy)]
pub enum Step {
    Next,
    Previous,
}

impl Step {
    /// The place after or before this one, round and round.
    pub fn from(self, place: usize, count: usize) -> usize {
        match self {
            Step::Next => (place + 1) % count,
            Step::Previous => (place + count - 1) % count,
        }
    }
}

pub const HELP: &str = "t telescope   e eyepiece   p page   (capital letters: back)   q quit";

pub fn key(event: &Event) -> Option<Key> {
    let event = match event {
        Event::Key(event) if event.kind != KeyEventKind::Release => event,
        Event::Resize(..) => return Some(Key::Redraw),
        _ => return None,
    };
    match event.code {
        KeyCode::Char('c' | 'd') if event.modifiers.contains(KeyModifiers::CONTROL) => Some(Key::Quit),
        KeyCode::Char('t') => Some(Key::Telescope(Step::Next)),
        KeyCode::Char('T') => Some(Key::Telescope(Step::Previous)),
        KeyCode::Char('e') | KeyCode::Down => Some(Key::Eyepiece(Step::Next)),
        KeyCode::Char('E') | KeyCode::Up => Some(Key::Eyepiece(Step::Previous)),
        KeyCode::Char('p') | KeyCode::Right => Some(Key::Page(Step::Next)),
        KeyCode::Char('P') | KeyCode::Left => Some(Key::Page(Step::Previous)),
        KeyCode::Char('q') | KeyCode::Esc => Some(Key::Quit),
        _ => None,
    }
}
